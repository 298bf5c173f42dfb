import { BOLTZMANN_J_K, ELEMENTARY_CHARGE_C, VACUUM_PERMITTIVITY_F_m } from '../constants';
import { mustBePositive } from '../validity';

export interface PolarMedium {
  readonly relativePermittivity: number;
  readonly temperature_K: number;
}

/**
 * Bjerrum length [m]: two elementary charges this far apart hold an energy of kT.
 *
 *     λ_B = e² / (4π ε_r ε₀ k T)
 *
 * Source  Bjerrum 1926, as in Israelachvili, Intermolecular and Surface Forces, 3rd ed. 2011 (from memory). Some authors
 *         call half of this length by the same name.
 * Valid   a medium without structure on this scale.
 * Throws  RangeError for an input that is not positive and finite.
 */
export function bjerrumLength({ relativePermittivity, temperature_K }: PolarMedium): number {
  mustBePositive('bjerrumLength', { relativePermittivity, temperature_K });
  const permittivity_F_m = relativePermittivity * VACUUM_PERMITTIVITY_F_m;
  return ELEMENTARY_CHARGE_C ** 2 / (4 * Math.PI * permittivity_F_m * BOLTZMANN_J_K * temperature_K);
}
