import { BOLTZMANN_J_K, REDUCED_PLANCK_J_s } from '../constants';
import { mustBePositive } from '../validity';

/**
 * First Matsubara frequency ξ₁ [rad/s]; the others are its whole multiples.
 *
 *     ξ_n = n · 2π k_B T / ħ
 *
 * Source  Lifshitz, Sov. Phys. JETP 2 (1956) 73; Parsegian, Van der Waals Forces, 2006, level 1 (from memory).
 * Valid   any temperature. At 298.15 K ξ₁ = 2.45e14 rad/s, above every microwave relaxation.
 * Throws  RangeError for a temperature that is not positive.
 */
export function firstMatsubaraFrequency({ temperature_K }: { readonly temperature_K: number }): number {
  mustBePositive('firstMatsubaraFrequency', { temperature_K });
  return (2 * Math.PI * BOLTZMANN_J_K * temperature_K) / REDUCED_PLANCK_J_s;
}
