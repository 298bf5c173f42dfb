import { brentRoot } from '../numerics/brentRoot';

/** One input moved while all others stay: how far it may go before the answer turns. */
export interface LimitSearch {
  /** Value now, in the unit of `from` and `to`. */
  readonly current: number;
  readonly from: number;
  readonly to: number;
  /** Positive when the formulation holds at this value, negative when it fails; not a number where it cannot be told. */
  readonly margin: (value: number) => number;
}

export interface TurningPoint {
  readonly value: number;
  /** `above`: the formulation holds above the value; `below`: it holds below. */
  readonly holds: 'above' | 'below';
}

const STEPS_EACH_WAY = 12;
/** Beyond this a value is as good as zero against the other, and equal steps serve better. */
const WIDEST_RATIO = 1e9;
const RELATIVE_TOLERANCE = 1e-3;

/** From `current` outwards to `end`: equal ratios where both are of one sign, equal steps otherwise. */
function outward(current: number, end: number): number[] {
  const ratio = end / current;
  const byRatio = ratio > 1 / WIDEST_RATIO && ratio < WIDEST_RATIO;
  return Array.from({ length: STEPS_EACH_WAY }, (_, index) => {
    const share = (index + 1) / STEPS_EACH_WAY;
    // Steps grow with the distance, so that a limit close by is not jumped over.
    const reach = share ** 1.5;
    return byRatio ? current * ratio ** reach : current + (end - current) * reach;
  });
}

function bisect(search: LimitSearch, inside: number, outside: number, insidePositive: boolean): number {
  let near = inside;
  let far = outside;
  while (Math.abs(far - near) > RELATIVE_TOLERANCE * Math.max(Math.abs(far), Math.abs(near))) {
    const middle = (near + far) / 2;
    if (middle === near || middle === far) break;
    if (search.margin(middle) > 0 === insidePositive) near = middle;
    else far = middle;
  }
  return (near + far) / 2;
}

/** Where the margin is a number on both sides Brent's method needs a third of the evaluations of plain halving. */
function turnBetween(search: LimitSearch, inside: number, outside: number, insidePositive: boolean): number {
  const ends = [search.margin(inside), search.margin(outside)];
  const tolerance = RELATIVE_TOLERANCE * Math.max(Math.abs(inside), Math.abs(outside));
  const narrow = Math.abs(inside) > 0 && Math.abs(outside / inside) < 4 && Math.abs(outside / inside) > 0.25;
  if (!narrow || !ends.every(Number.isFinite)) return bisect(search, inside, outside, insidePositive);
  try {
    return brentRoot(search.margin, inside, outside, tolerance);
  } catch {
    // A value in between that cannot be evaluated: it counts as failing, which halving can live with.
    return bisect(search, inside, outside, insidePositive);
  }
}

/**
 * Value nearest to the current one (as a ratio) at which the margin changes sign, or null when it keeps its sign in
 * the whole range. Found on the full model by stepping outwards and bisecting to 0.1 %, so a limit is always a place
 * where both sides were evaluated; a window narrower than a step (1/12 of the way) can be missed.
 */
export function nearestLimit(search: LimitSearch): TurningPoint | null {
  const { current, from, to } = search;
  const holdsNow = search.margin(current) > 0;
  const found: TurningPoint[] = [];
  for (const end of [from, to]) {
    if (end === current) continue;
    let previous = current;
    for (const value of outward(current, end)) {
      const holds = search.margin(value) > 0;
      if (holds !== holdsNow) {
        const limit = turnBetween(search, previous, value, holdsNow);
        const currentSide = end > current ? 'below' : 'above';
        found.push({ value: limit, holds: holdsNow ? currentSide : currentSide === 'below' ? 'above' : 'below' });
        break;
      }
      previous = value;
    }
  }
  const distance = ({ value }: TurningPoint): number =>
    value * current > 0 ? Math.abs(Math.log(value / current)) : Math.abs(value - current) / (to - from) + 1;
  return found.sort((a, b) => distance(a) - distance(b)).at(0) ?? null;
}
