import type { HamakerRoute } from '../scenario/scenario';
import type { DielectricBody } from './dielectricBody';
import { isBeyondTwoPoint, isNearIndexMatch } from './indexContrast';

/** Absolute floor near an index match: the interval within which published values scatter there (judgement). */
export const INDEX_MATCH_FLOOR_J = 0.3e-20;
/** Keeps the quotient finite when A vanishes. */
const smallest_J = 1e-27;

/**
 * What a route adds of its own to the doubt of the data, relative to the value it gives: judgement, from each route over
 * the full sum for every solid of the catalogue in every liquid, index matches left out (5th, 50th, 95th percentile):
 * two-point 0.4, 1.0, 2.2; molecular 0.5, 0.8, 1.4; combining 0.2, 0.7, 0.8.
 */
const routeUncertainty: Readonly<Record<HamakerRoute, number>> = {
  lifshitz: 0,
  'two-point': 0.5,
  molecular: 0.5,
  combining: 1,
  entered: 0,
};
/** The same with an index above 1.9: 1.3, 2.2, 4.2, so over half of the value is in doubt. */
const twoPointBeyondRange = 0.6;

/**
 * Relative uncertainty of A across a liquid [dimensionless], about one standard deviation.
 *
 *     u = √( [(u₁ + u₂)/2]² + u_route² ),   and u |A| at least 0.3e-20 J near an index match
 *
 * A is proportional to about the root of each body's own constant, hence u/2 of each; the halves are added
 * in full, not in quadrature, since both share the data of the medium. A value entered by hand carries the doubt of
 * the materials too: that doubt was itself set from the scatter of published values.
 *
 * Source  own judgement, from the scatter between published tables.
 */
export function hamakerUncertainty(
  route: HamakerRoute,
  hamakerConstant_J: number,
  {
    first,
    second,
    medium,
  }: { readonly first: DielectricBody; readonly second: DielectricBody; readonly medium: DielectricBody },
): number {
  const data = (first.relativeUncertainty.acrossLiquid + second.relativeUncertainty.acrossLiquid) / 2;
  const beyond = route === 'two-point' && isBeyondTwoPoint(first, second);
  const relative = Math.hypot(data, beyond ? twoPointBeyondRange : routeUncertainty[route]);
  if (!isNearIndexMatch(first, second, medium)) return relative;
  return Math.max(relative, INDEX_MATCH_FLOOR_J / Math.max(Math.abs(hamakerConstant_J), smallest_J));
}
