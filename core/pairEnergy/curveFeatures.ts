import type { CurveFeatures, CurvePoint } from '../evaluation';
import { placeOfMaximum } from '../numerics/peak';

/** Wells and barriers smaller than this are noise to a particle that kT shakes. */
const SMALLEST_kT = 1e-3;

/** In ln h: a place is found to this share of itself. */
const PLACE_TOLERANCE = 1e-7;

type Energy = (separation_m: number) => number;

interface Scan {
  readonly energy_kT: Energy;
  readonly separation_m: Float64Array;
  readonly values_kT: Float64Array;
}

const pointAt = ({ separation_m, values_kT }: Scan, index: number): CurvePoint => ({
  separation_m: separation_m[index],
  energy_kT: values_kT[index],
});

/** The extremum between the neighbours of a grid point, found on the function itself; in ln h, where peaks are broad. */
function refined({ energy_kT, separation_m, values_kT }: Scan, index: number, sign: 1 | -1): CurvePoint {
  const at = placeOfMaximum(
    (logSeparation) => sign * energy_kT(Math.exp(logSeparation)),
    Math.log(separation_m[index - 1]),
    Math.log(separation_m[index + 1]),
    PLACE_TOLERANCE,
  );
  const place_m = Math.exp(at);
  const value_kT = energy_kT(place_m);
  // On a kink the grid point itself is the extremum.
  return sign * value_kT > sign * values_kT[index]
    ? { separation_m: place_m, energy_kT: value_kT }
    : { separation_m: separation_m[index], energy_kT: values_kT[index] };
}

/** Indices of grid points that stand above both neighbours (sign 1) or below both (sign −1). */
function extrema(values_kT: Float64Array, sign: 1 | -1): number[] {
  const found: number[] = [];
  for (let index = 1; index < values_kT.length - 1; index += 1) {
    const here = sign * values_kT[index];
    if (here > sign * values_kT[index - 1] && here >= sign * values_kT[index + 1]) found.push(index);
  }
  return found;
}

const highest = (points: readonly CurvePoint[]): CurvePoint | null =>
  points.reduce<CurvePoint | null>(
    (best, point) => (best === null || point.energy_kT > best.energy_kT ? point : best),
    null,
  );

const deepest = (points: readonly CurvePoint[]): CurvePoint | null =>
  points.reduce<CurvePoint | null>(
    (best, point) => (best === null || point.energy_kT < best.energy_kT ? point : best),
    null,
  );

/**
 * Barrier and minima of an energy curve, refined on the function to 1e-7 of their place.
 *
 * The barrier is the highest maximum above zero; a curve that climbs all the way to contact (a polymer wall) has its
 * barrier there. With no barrier, a maximum below zero, or such a climb to contact that ends below zero, still parts the
 * contact side from the outer side: the well before a polymer wall is an outer one, however weak the wall. The primary
 * minimum is the deepest point on the contact side, the outer minimum the deepest local minimum beyond.
 */
export function findFeatures(energy_kT: Energy, separation_m: Float64Array): CurveFeatures {
  const values_kT = separation_m.map((gap_m) => energy_kT(gap_m));
  const scan: Scan = { energy_kT, separation_m, values_kT };
  const contact = pointAt(scan, 0);
  const maxima = extrema(values_kT, 1).map((index) => refined(scan, index, 1));
  const wall = values_kT[0] > values_kT[1] ? [contact] : [];
  const barrier = highest([...maxima, ...wall].filter((point) => point.energy_kT > SMALLEST_kT));
  const minima = extrema(values_kT, -1).map((index) => refined(scan, index, -1));
  const wells = minima.filter((point) => point.energy_kT < -SMALLEST_kT);
  // In the far tail rounding makes maxima of no height, and they stand above any maximum below zero: only one with a
  // well beyond it parts the curve.
  const parts = (point: CurvePoint): boolean => wells.some((well) => well.separation_m > point.separation_m);
  const divide = barrier ?? highest([...maxima, ...wall].filter(parts));
  const isInside = (point: CurvePoint): boolean => divide === null || point.separation_m < divide.separation_m;
  const contactSide = [contact, ...wells].filter((point) => point.energy_kT < -SMALLEST_kT && isInside(point));
  const outside = divide === null ? [] : wells.filter((point) => point.separation_m > divide.separation_m);
  return {
    contact_m: separation_m[0],
    barrier,
    primaryMinimum: deepest(contactSide),
    outerMinimum: deepest(outside),
  };
}
