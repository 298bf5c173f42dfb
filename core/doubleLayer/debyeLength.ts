import { AVOGADRO_per_mol, BOLTZMANN_J_K, ELEMENTARY_CHARGE_C, VACUUM_PERMITTIVITY_F_m } from '../constants';
import { mustBePositive } from '../validity';

export interface ScreeningMedium {
  /** I = ½ Σ c z², over every ion of the bulk. */
  readonly ionicStrength_mol_m3: number;
  /** Static, of the medium. */
  readonly relativePermittivity: number;
  readonly temperature_K: number;
}

/**
 * Debye length 1/κ [m]: over this distance the potential of a weakly charged surface falls to 1/e.
 *
 *     1/κ = √( ε_r ε₀ k T / (2 N_A e² I) )
 *
 * Source  Debye & Hückel, Phys. Z. 24 (1923) 185; IUPAC Gold Book T06343 (both from memory), with R = N_A k, F = N_A e.
 * Valid   point ions in a continuum: little meaning above about 500 mol/m³ of 1:1 salt, or for ions of three charges
 *         and more. The number is still returned; the caveats of the medium say so.
 * Throws  RangeError for an input that is not positive and finite.
 */
export function debyeLength({ ionicStrength_mol_m3, relativePermittivity, temperature_K }: ScreeningMedium): number {
  mustBePositive('debyeLength', { ionicStrength_mol_m3, relativePermittivity, temperature_K });
  const permittivity_F_m = relativePermittivity * VACUUM_PERMITTIVITY_F_m;
  const thermalEnergy_J = BOLTZMANN_J_K * temperature_K;
  const ionsAsMonovalent_per_m3 = 2 * AVOGADRO_per_mol * ionicStrength_mol_m3;
  return Math.sqrt((permittivity_F_m * thermalEnergy_J) / ionsAsMonovalent_per_m3) / ELEMENTARY_CHARGE_C;
}
