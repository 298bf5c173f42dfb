import { mustBeFinite, mustBePositive, mustNotBeNegative } from '../validity';
import { gregoryRetardation } from './gregoryRetardation';
import { hamakerBracket } from './hamakerBracket';
import { zeroFrequencyScreening } from './zeroFrequencyScreening';

export interface VanDerWaalsSpheres {
  readonly zeroFrequency_J: number;
  readonly dispersion_J: number;
  readonly retardationWavelength_m: number;
  readonly radius1_m: number;
  readonly radius2_m: number;
  /** κ; zero without ions. */
  readonly inverseDebyeLength_per_m: number;
}

export interface VanDerWaalsPair extends VanDerWaalsSpheres {
  readonly separation_m: number;
}

/**
 * Van der Waals energy [J] of two spheres against the gap between them, negative for attraction.
 *
 *     V = (V/A) · [ A₀ (1 + 2κh) e^(−2κh) + A_disp/(1 + 14 h/λ) ]
 *
 * Whatever does not depend on the gap is checked and worked out once: a curve asks thousands of times.
 *
 * Source  the three factors in their files (geometry: hamakerSpheres.ts); the split after Parsegian, Van der Waals
 *         Forces, 2006, level 1 (from memory).
 * Valid   any gap above zero; see the factors.
 * Throws  RangeError for a radius or wavelength that is not positive, or a negative κ; the function returned, for a gap
 *         that is not positive.
 */
export function prepareVanDerWaals(spheres: VanDerWaalsSpheres): (separation_m: number) => number {
  const { zeroFrequency_J, dispersion_J, retardationWavelength_m, radius1_m, radius2_m, inverseDebyeLength_per_m } =
    spheres;
  mustBePositive('prepareVanDerWaals', { radius1_m, radius2_m, retardationWavelength_m });
  mustBeFinite('prepareVanDerWaals', { zeroFrequency_J, dispersion_J });
  mustNotBeNegative('prepareVanDerWaals', { inverseDebyeLength_per_m });
  const product = 4 * radius1_m * radius2_m;
  const twiceReach_m = 2 * (radius1_m + radius2_m);
  return (separation_m) => {
    if (!(separation_m > 0)) throw new RangeError(`vanDerWaals: separation_m must be above zero, got ${separation_m}`);
    const inner = separation_m * (separation_m + twiceReach_m);
    const outer = inner + product;
    const geometry = -hamakerBracket(product / outer, inner / outer) / 6;
    const screened_J = zeroFrequency_J * zeroFrequencyScreening(inverseDebyeLength_per_m, separation_m);
    return geometry * (screened_J + dispersion_J * gregoryRetardation(separation_m, retardationWavelength_m));
  };
}

/** As {@link prepareVanDerWaals}, at one gap. */
export const vanDerWaalsEnergy = ({ separation_m, ...spheres }: VanDerWaalsPair): number =>
  prepareVanDerWaals(spheres)(separation_m);
