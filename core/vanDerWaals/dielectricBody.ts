import type { DielectricResponse, Material } from '../materials/material';
import { responseOf } from './dielectricResponse';

export type ResponseLevel = DielectricResponse['level'];

/** What the Lifshitz theory needs to know of a particle or of the medium. */
export interface DielectricBody {
  readonly name: string;
  /** ε_r at frequency zero; Infinity for a conductor. */
  readonly staticPermittivity: number;
  /** ε_r(iξ) for ξ above zero. */
  permittivityAt(frequency_rad_s: number): number;
  /** null when the response has not exactly one ultraviolet oscillator, and for vacuum. */
  readonly opticalLimit: OpticalLimit | null;
  /** Expected relative uncertainty of A across vacuum and across a liquid, from the data of this body. */
  readonly relativeUncertainty: { readonly acrossVacuum: number; readonly acrossLiquid: number };
}

/**
 * A matched pair: n₀ = √(1 + C_UV) and ω_UV of one and the same oscillator. n_D with a ν_e from elsewhere is not
 * such a pair, and gives up to four times too much for TiO₂.
 */
export interface OpticalLimit {
  readonly refractiveIndex: number;
  readonly frequency_rad_s: number;
}

export const vacuum: DielectricBody = {
  name: 'Vacuum',
  staticPermittivity: 1,
  permittivityAt: () => 1,
  opticalLimit: null,
  relativeUncertainty: { acrossVacuum: 0, acrossLiquid: 0 },
};

/**
 * The body of a material, with its first response of the wanted level; without one (or without a wish) its recommended
 * response. The static permittivity is given by the caller, since that of a liquid depends on temperature and recipe.
 */
export function bodyOf(
  material: Material,
  staticPermittivity: number,
  level: ResponseLevel | null = null,
): DielectricBody {
  if (!(staticPermittivity >= 1)) {
    throw new RangeError(
      `bodyOf: staticPermittivity of ${material.name} must be at least 1, got ${staticPermittivity}`,
    );
  }
  const response = responseAt(material, level);
  return {
    name: material.name,
    staticPermittivity,
    permittivityAt: responseOf(response),
    opticalLimit: opticalLimitOf(response),
    relativeUncertainty: material.hamakerUncertainty,
  };
}

export function responseAt(material: Material, level: ResponseLevel | null): DielectricResponse {
  return material.dielectricResponses.find((one) => one.level === level) ?? material.dielectricResponses[0];
}

/** ε_r at frequency zero of a solid: Infinity for a conductor, null when no value is known. */
export function staticPermittivityOfSolid(material: Material): number | null {
  if (material.conductor) return Number.POSITIVE_INFINITY;
  return material.staticPermittivity?.value ?? null;
}

/** Below this an oscillator is a lattice or molecular vibration (λ above 1.9 µm). */
const opticalFrom_rad_s = 1e15;

function opticalLimitOf(response: DielectricResponse): OpticalLimit | null {
  if (response.level !== 'single-uv') return null;
  if (response.dampedOscillators.some(({ frequency_rad_s }) => frequency_rad_s > opticalFrom_rad_s)) return null;
  const optical = response.oscillators.filter(({ frequency_rad_s }) => frequency_rad_s > opticalFrom_rad_s);
  if (optical.length !== 1) return null;
  const [{ strength, frequency_rad_s }] = optical;
  return { refractiveIndex: Math.sqrt(1 + strength), frequency_rad_s };
}
