import { gregoryRetardation } from './gregoryRetardation';
import { hamakerGeometry } from './hamakerSpheres';
import { zeroFrequencyScreening } from './zeroFrequencyScreening';

export interface VanDerWaalsPair {
  readonly zeroFrequency_J: number;
  readonly dispersion_J: number;
  readonly retardationWavelength_m: number;
  readonly radius1_m: number;
  readonly radius2_m: number;
  /** κ; zero without ions. */
  readonly inverseDebyeLength_per_m: number;
  readonly separation_m: number;
}

/**
 * Van der Waals energy of two spheres [J], negative for attraction.
 *
 *     V = (V/A) · [ A₀ (1 + 2κh) e^(−2κh) + A_disp/(1 + 14 h/λ) ]
 *
 * Source  the three factors in their files; the split after Parsegian, Van der Waals Forces, 2006, level 1
 *         (from memory).
 * Valid   any gap above zero; see the factors.
 * Throws  RangeError for a gap or radius that is not positive, or a negative κ.
 */
export function vanDerWaalsEnergy(pair: VanDerWaalsPair): number {
  const screening = zeroFrequencyScreening(pair.inverseDebyeLength_per_m, pair.separation_m);
  const retardation = gregoryRetardation(pair.separation_m, pair.retardationWavelength_m);
  return hamakerGeometry(pair) * (pair.zeroFrequency_J * screening + pair.dispersion_J * retardation);
}
