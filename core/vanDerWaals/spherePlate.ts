import { mustBePositive } from '../validity';
import { hamakerBracket } from './hamakerBracket';

/**
 * Van der Waals energy of a sphere and a thick flat plate over their Hamaker constant, V/A [dimensionless], negative.
 *
 *     V/A = −(1/6) { a/h + a/(h + 2a) + ln[h/(h + 2a)] }
 *
 * Source  Hamaker, Physica 4 (1937) 1058, limit of one radius without bound (from memory).
 * Valid   as two spheres; for a particle at a wall or against a very much larger one.
 * Throws  RangeError for an input that is not positive.
 */
export function spherePlate({
  radius_m,
  separation_m,
}: {
  readonly radius_m: number;
  readonly separation_m: number;
}): number {
  mustBePositive('spherePlate', { radius_m, separation_m });
  const outer_m = separation_m + 2 * radius_m;
  return -hamakerBracket((2 * radius_m) / outer_m, separation_m / outer_m) / 6;
}
