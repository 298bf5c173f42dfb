import type { PairForces } from './pairForces';

/** Neighbours differ by about 2 %, which resolves barriers of thousands of kT. */
const POINTS = 420;
/** After this many ranges an exponential force has fallen by 1e-13, and dispersion by a thousand from a nanometre. */
const RANGES = 30;
const NEAREST_END_m = 100e-9;
const FARTHEST_END_m = 20e-6;

/** Where the curve ends: beyond every range. */
export function curveEnd({ ranges_m, edges_m }: Pick<PairForces, 'ranges_m' | 'edges_m'>): number {
  const longest_m = Math.max(0, ...ranges_m.map((range_m) => RANGES * range_m), ...edges_m.map((edge_m) => 4 * edge_m));
  return Math.min(Math.max(longest_m, NEAREST_END_m), FARTHEST_END_m);
}

const withoutDoubles = (rising: Float64Array): Float64Array =>
  rising.filter((value, index) => index === 0 || value > rising[index - 1]);

/** Gaps in rising order, in equal ratios from contact to the end of the curve, with a point on every edge. */
export function separationGrid(forces: Pick<PairForces, 'contact_m' | 'edges_m' | 'ranges_m'>): Float64Array {
  const { contact_m, edges_m } = forces;
  const end_m = Math.max(curveEnd(forces), 10 * contact_m);
  const step = Math.log(end_m / contact_m) / (POINTS - 1);
  const inside = edges_m.filter((edge_m) => edge_m > contact_m && edge_m < end_m);
  const grid = new Float64Array(POINTS + inside.length);
  for (let index = 0; index < POINTS; index += 1) grid[index] = contact_m * Math.exp(index * step);
  grid.set(inside, POINTS);
  return inside.length === 0 ? grid : withoutDoubles(grid.sort());
}
