import { GAUSS_NODES, GAUSS_WEIGHTS } from './gaussLegendre';

/** ln(eᵃ + eᵇ) without overflow. */
export function logAdd(a: number, b: number): number {
  const high = Math.max(a, b);
  if (high === Number.NEGATIVE_INFINITY) return high;
  return high + Math.log1p(Math.exp(Math.min(a, b) - high));
}

const FIRST_PANELS = 48;
const MAX_DEPTH = 16;
/** A panel this far below the sum, in natural logarithm, adds nothing that a double could hold. */
const NEGLIGIBLE = 40;
/** Panels are halved until halving changes the whole by less than this share ... */
const RELATIVE_TOLERANCE = 1e-9;
/** ... or by less than the rounding of an integrand of this size leaves, in units of the last place. */
const ROUNDING = 8 * Number.EPSILON;

const HALF = GAUSS_NODES.length;
/** Filled anew for each panel, so that thousands of panels leave no garbage. */
const below = new Float64Array(HALF);
const above = new Float64Array(HALF);

function panel(logIntegrand: (x: number) => number, from: number, to: number): number {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  let highest = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < HALF; i += 1) {
    below[i] = logIntegrand(middle - half * GAUSS_NODES[i]);
    above[i] = logIntegrand(middle + half * GAUSS_NODES[i]);
    highest = Math.max(highest, below[i], above[i]);
  }
  if (highest === Number.NEGATIVE_INFINITY) return highest;
  let sum = 0;
  for (let i = 0; i < HALF; i += 1) {
    sum += GAUSS_WEIGHTS[i] * (Math.exp(below[i] - highest) + Math.exp(above[i] - highest));
  }
  return highest + Math.log(half * sum);
}

/**
 * Natural logarithm of ∫ exp(f(x)) dx over [from, to], for f that may reach hundreds of thousands.
 *
 * Eight-point Gauss panels, halved where halving still changes the sum; panels negligible against the whole are left as
 * they are. Nothing is exponentiated that could overflow. Accurate to 1e-8 in the logarithm, or to the rounding of f where
 * that is larger. A peak narrower than about a hundredth of the first panels can be missed: choose a variable in which
 * the features are broad.
 */
export function logIntegral(logIntegrand: (x: number) => number, from: number, to: number): number {
  const step = (to - from) / FIRST_PANELS;
  const first: number[] = [];
  let total = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < FIRST_PANELS; i += 1) {
    const value = panel(logIntegrand, from + i * step, from + (i + 1) * step);
    first.push(value);
    total = logAdd(total, value);
  }
  const refined = (low: number, high: number, whole: number, depth: number): number => {
    if (!(whole > total - NEGLIGIBLE) || depth === 0) return whole;
    const middle = (low + high) / 2;
    const left = panel(logIntegrand, low, middle);
    const right = panel(logIntegrand, middle, high);
    const halves = logAdd(left, right);
    const change = Math.abs(Math.expm1(whole - halves)) * Math.exp(Math.min(0, halves - total));
    if (change < RELATIVE_TOLERANCE + ROUNDING * Math.abs(halves)) return halves;
    return logAdd(refined(low, middle, left, depth - 1), refined(middle, high, right, depth - 1));
  };
  let sum = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < FIRST_PANELS; i += 1) {
    sum = logAdd(sum, refined(from + i * step, from + (i + 1) * step, first[i], MAX_DEPTH));
  }
  return sum;
}
