import type { DampedOscillator, Material, Oscillator } from '../../../core/materials/material';
import { type DielectricBody, vacuum } from '../../../core/vanDerWaals/dielectricBody';
import { responseOf } from '../../../core/vanDerWaals/dielectricResponse';
import numbers from '../../reference/vanDerWaals/numbers.json';

/** Small invented materials and the bodies of the reference script, so that laws are tested without the catalogue. */
const invented = { source: 'invented', where: 'test', read: 'derived' } as const;
export const sourced = (value: number) => ({ ...invented, value, relativeUncertainty: 0 });

export interface Recipe {
  readonly static: number;
  readonly oscillators: readonly (readonly [number, number])[];
  readonly damped: readonly (readonly [number, number, number])[];
}

export function materialFrom(id: string, recipe: Recipe, change: Partial<Material> = {}): Material {
  return {
    id,
    name: id,
    kind: 'filler',
    cas: null,
    conductor: false,
    staticPermittivity: { ...sourced(recipe.static), temperaturePolynomial: null },
    refractiveIndex: null,
    refractiveIndexIsOpticalLimit: false,
    molarMass_kg_mol: null,
    density_kg_m3: sourced(1000),
    viscosity_Pa_s: null,
    polarizabilityVolume_A3: null,
    ionizationEnergy_eV: null,
    dipoleMoment_D: null,
    dielectricResponses: [responseFrom(recipe)],
    hamakerUncertainty: { acrossVacuum: 0.1, acrossLiquid: 0.25 },
    note: null,
    ...change,
  };
}

export function responseFrom(recipe: Recipe, level: 'single-uv' | 'full-spectrum' = 'single-uv') {
  const oscillators: Oscillator[] = recipe.oscillators.map(([strength, frequency_rad_s]) => ({
    strength,
    frequency_rad_s,
    band: frequency_rad_s > 1e15 ? 'ultraviolet' : 'infrared',
  }));
  const dampedOscillators: DampedOscillator[] = recipe.damped.map(
    ([strength_rad2_s2, frequency_rad_s, damping_rad_s]) => ({ strength_rad2_s2, frequency_rad_s, damping_rad_s }),
  );
  return { ...invented, id: level, level, relativeUncertainty: 0.1, oscillators, dampedOscillators };
}

export function bodyFrom(recipe: Recipe): DielectricBody {
  return {
    ...vacuum,
    name: 'test',
    staticPermittivity: recipe.static,
    permittivityAt: responseOf(responseFrom(recipe)),
  };
}

/** JSON gives number[][]; each row is checked for its length on the way in. */
export function recipeOf(name: keyof typeof numbers.bodies): Recipe {
  const { static: staticPermittivity, oscillators, damped } = numbers.bodies[name];
  return {
    static: staticPermittivity,
    oscillators: oscillators.map((row) => {
      const [strength, frequency, ...rest] = row;
      if (strength === undefined || frequency === undefined || rest.length > 0) throw new Error('two numbers expected');
      return [strength, frequency] as const;
    }),
    damped: damped.map((row: readonly number[]) => {
      const [f, omega, g, ...rest] = row;
      if (f === undefined || omega === undefined || g === undefined || rest.length > 0) {
        throw new Error('three numbers expected');
      }
      return [f, omega, g] as const;
    }),
  };
}
