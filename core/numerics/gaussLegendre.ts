/**
 * Gauss–Legendre quadrature with eight points: exact for polynomials up to degree 15.
 * Source  Abramowitz & Stegun, Handbook of Mathematical Functions, 1964, table 25.4.
 */
/** The positive half; the other half mirrors it. */
export const GAUSS_NODES = [0.1834346424956498, 0.525532409916329, 0.7966664774136267, 0.9602898564975363] as const;
export const GAUSS_WEIGHTS = [0.362683783378362, 0.3137066458778873, 0.2223810344533745, 0.1012285362903763] as const;

/** Calls `visit` with each point of [from, to] and its weight; the weights add up to `to − from`. */
export function forEachGaussPoint(from: number, to: number, visit: (x: number, weight: number) => void): void {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  for (let i = 0; i < GAUSS_NODES.length; i += 1) {
    visit(middle - half * GAUSS_NODES[i], half * GAUSS_WEIGHTS[i]);
    visit(middle + half * GAUSS_NODES[i], half * GAUSS_WEIGHTS[i]);
  }
}
