import { VACUUM_PERMITTIVITY_F_m } from '../constants';
import { mustNotBeNegative } from '../validity';

export interface InductionPair {
  readonly dipoleMoment1_C_m: number;
  readonly dipoleMoment2_C_m: number;
  readonly polarizabilityVolume1_m3: number; // α/(4πε₀)
  readonly polarizabilityVolume2_m3: number;
}

/**
 * Debye's induction coefficient C [J m⁶]: each dipole polarizes the other molecule; the energy is −C/r⁶.
 *
 *     C = (u₁² α₂ + u₂² α₁)/(4π ε₀)
 *
 * Source  Debye, Phys. Z. 21 (1920) 178; as in Israelachvili, Intermolecular and Surface Forces, 3rd ed. 2011,
 *         eq. 5.22 (both from memory).
 * Valid   as {@link ./keesom}: gases, not liquids.
 * Throws  RangeError for a negative input.
 */
export function debyeInduction(pair: InductionPair): number {
  mustNotBeNegative('debyeInduction', { ...pair });
  const { dipoleMoment1_C_m, dipoleMoment2_C_m, polarizabilityVolume1_m3, polarizabilityVolume2_m3 } = pair;
  const coulomb_C2_J_m = 4 * Math.PI * VACUUM_PERMITTIVITY_F_m;
  return (
    (dipoleMoment1_C_m ** 2 * polarizabilityVolume2_m3 + dipoleMoment2_C_m ** 2 * polarizabilityVolume1_m3) /
    coulomb_C2_J_m
  );
}
