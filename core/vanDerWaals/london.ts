import { mustBePositive } from '../validity';

export interface LondonPair {
  readonly polarizabilityVolume1_m3: number; // α/(4πε₀)
  readonly polarizabilityVolume2_m3: number;
  readonly ionizationEnergy1_J: number;
  readonly ionizationEnergy2_J: number;
}

/**
 * London's dispersion coefficient C [J m⁶] of two molecules; the energy is −C/r⁶.
 *
 *     C = (3/2) α₁ α₂ I₁ I₂/(I₁ + I₂)
 *
 * Source  London, Trans. Faraday Soc. 33 (1937) 8, eq. 12 (from memory).
 * Valid   molecules far apart against their size, with one main absorption band; typically within 25 %.
 * Throws  RangeError for an input that is not positive.
 */
export function london(pair: LondonPair): number {
  mustBePositive('london', { ...pair });
  const { polarizabilityVolume1_m3, polarizabilityVolume2_m3, ionizationEnergy1_J, ionizationEnergy2_J } = pair;
  const energy_J = (ionizationEnergy1_J * ionizationEnergy2_J) / (ionizationEnergy1_J + ionizationEnergy2_J);
  return 1.5 * polarizabilityVolume1_m3 * polarizabilityVolume2_m3 * energy_J;
}
