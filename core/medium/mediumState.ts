import type { MediumState } from '../evaluation';
import { K_from_degC, Pa_s_from_mPa_s } from '../quantities/convert';
import type { Formulation, MediumRecipe } from '../scenario/scenario';
import type { Caveat } from '../validity';
import { ionCaveats } from './ionCaveats';
import { ionsOf } from './ionsOf';
import { looyenga } from './looyenga';
import { lorentzLorenz } from './lorentzLorenz';
import { type MediumShare, mediumShares } from './mediumShares';
import { mediumViscosity } from './mediumViscosity';
import { componentDensity, componentPermittivity, type Property } from './solventProperties';
import { volumeFractions } from './volumeFractions';

/** The medium without what double-layer theory makes of it. */
export type MediumWithoutScreening = Omit<MediumState, 'debyeLength_m' | 'bjerrumLength_m'>;

export interface MediumInput extends Pick<Formulation, 'temperature_degC' | 'salts' | 'hardness_dH' | 'pH'> {
  readonly recipe: MediumRecipe;
}

function mediumPermittivity(shares: readonly MediumShare[], temperature_K: number): Property {
  const caveats: Caveat[] = [];
  const value = looyenga(
    shares.map(({ material, volumeFraction }) => {
      const permittivity = componentPermittivity(material, temperature_K);
      caveats.push(...permittivity.caveats);
      return { volumeFraction, relativePermittivity: permittivity.value };
    }),
  );
  if (shares.length > 1) {
    caveats.push({
      code: 'permittivity-mixing',
      message:
        'The permittivity of the mixture is estimated from its components: expect ±10 %; alcohols and glycols in water come out about a tenth too low.',
    });
  }
  return { value, caveats };
}

/** Index at 20–30 °C: a liquid loses 4e-4 per kelvin, its mixture with it, so no temperature is carried through. */
function mediumIndex(shares: readonly MediumShare[]): number {
  return lorentzLorenz(
    shares.map(({ material, volumeFraction }) => {
      if (material.refractiveIndex === null) {
        throw new RangeError(`mediumState: ${material.name} has no refractive index and cannot be a medium`);
      }
      return { volumeFraction, refractiveIndex: material.refractiveIndex.value };
    }),
  );
}

/** Volumes are added: mixing shrinks water with alcohols or glycols by up to 3 %, other pairs by less than 1 %. */
function mediumDensity(shares: readonly MediumShare[], temperature_K: number): Property {
  const caveats: Caveat[] = [];
  let value = 0;
  for (const { material, volumeFraction } of shares) {
    const density = componentDensity(material, temperature_K);
    value += volumeFraction * density.value;
    caveats.push(...density.caveats);
  }
  return { value, caveats };
}

/** A measured value is taken as it is and carries no caveat. */
const measuredOr = (measured: number | null, computed: () => Property): Property =>
  measured === null ? computed() : { value: measured, caveats: [] };

/**
 * The medium of a formulation in SI, at its temperature, with its ions and every doubt about them. Measured values win
 * over the mixing rules. Debye and Bjerrum length are left to double-layer theory.
 * Throws RangeError for unknown materials or salts, and when the viscosity cannot be known: all refused at the door,
 * the last by `viscosityIsKnown`.
 */
export function mediumState({ recipe, temperature_degC, salts, hardness_dH, pH }: MediumInput): {
  readonly state: MediumWithoutScreening;
  /** In the order of the recipe; they add up to one. */
  readonly volumeFractions: readonly number[];
  readonly caveats: readonly Caveat[];
} {
  const temperature_K = K_from_degC(temperature_degC);
  const shares = mediumShares(recipe);
  const { measuredRelativePermittivity, measuredViscosity_mPa_s, measuredDensity_kg_m3 } = recipe;

  const permittivity = measuredOr(measuredRelativePermittivity, () => mediumPermittivity(shares, temperature_K));
  const viscosity = measuredOr(measuredViscosity_mPa_s === null ? null : Pa_s_from_mPa_s(measuredViscosity_mPa_s), () =>
    mediumViscosity(shares, temperature_K),
  );
  const density = measuredOr(measuredDensity_kg_m3, () => mediumDensity(shares, temperature_K));

  const measured: MediumState['measured'][number][] = [];
  if (measuredRelativePermittivity !== null) measured.push('relativePermittivity');
  if (measuredViscosity_mPa_s !== null) measured.push('viscosity_Pa_s');
  if (measuredDensity_kg_m3 !== null) measured.push('density_kg_m3');

  const hasWater = shares.some(({ material }) => material.id === 'water');
  const found = ionsOf({ salts, hardness_dH, pH: hasWater ? pH : null, temperature_K });
  const relativePermittivity = permittivity.value;
  return {
    state: {
      temperature_K,
      relativePermittivity,
      refractiveIndex: mediumIndex(shares),
      density_kg_m3: density.value,
      viscosity_Pa_s: viscosity.value,
      measured,
      ...found,
    },
    volumeFractions: volumeFractions(recipe),
    caveats: [
      ...permittivity.caveats,
      ...viscosity.caveats,
      ...density.caveats,
      ...ionCaveats(found, { salts, pH, hasWater, relativePermittivity, temperature_K }),
    ],
  };
}
