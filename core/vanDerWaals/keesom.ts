import { BOLTZMANN_J_K, VACUUM_PERMITTIVITY_F_m } from '../constants';
import { mustBePositive, mustNotBeNegative } from '../validity';

export interface KeesomPair {
  readonly dipoleMoment1_C_m: number;
  readonly dipoleMoment2_C_m: number;
  readonly temperature_K: number;
}

/**
 * Keesom's orientation coefficient C [J m⁶] of two freely turning dipoles; the energy is −C/r⁶.
 *
 *     C = u₁² u₂² / [3 (4π ε₀)² k_B T]
 *
 * Source  Keesom, Phys. Z. 22 (1921) 129; as in Israelachvili, Intermolecular and Surface Forces, 3rd ed. 2011,
 *         eq. 4.19 (both from memory).
 * Valid   dipole energy well below k_B T, as in gases. In liquids the pairs hinder one another: do not sum it there.
 * Throws  RangeError for a negative dipole moment or a temperature that is not positive.
 */
export function keesom({ dipoleMoment1_C_m, dipoleMoment2_C_m, temperature_K }: KeesomPair): number {
  mustNotBeNegative('keesom', { dipoleMoment1_C_m, dipoleMoment2_C_m });
  mustBePositive('keesom', { temperature_K });
  const coulomb_C2_J_m = 4 * Math.PI * VACUUM_PERMITTIVITY_F_m;
  const dipoles_J_m3 = (dipoleMoment1_C_m * dipoleMoment2_C_m) / coulomb_C2_J_m;
  return dipoles_J_m3 ** 2 / (3 * BOLTZMANN_J_K * temperature_K);
}
