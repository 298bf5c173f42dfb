import { LIGHT_SPEED_m_s } from '../constants';
import type { DielectricBody } from './dielectricBody';

/** Gregory's usual value, for a body without a single ultraviolet band. */
export const USUAL_WAVELENGTH_m = 100e-9;

/**
 * Wavelength at which retardation sets in [m]: the geometric mean over the two bodies of that of their UV band.
 *
 *     λ_i = 2π c/ω_UV,   λ = √(λ₁ λ₂)
 *
 * Source  Gregory, J. Colloid Interface Sci. 83 (1981) 138, who takes 100 nm for most materials (from memory);
 *         for TiO₂ the band gives 245 nm. The mean: our own choice.
 */
export function retardationWavelength(first: DielectricBody, second: DielectricBody): number {
  return Math.sqrt(bandWavelength(first) * bandWavelength(second));
}

function bandWavelength({ opticalLimit }: DielectricBody): number {
  return opticalLimit === null ? USUAL_WAVELENGTH_m : (2 * Math.PI * LIGHT_SPEED_m_s) / opticalLimit.frequency_rad_s;
}
