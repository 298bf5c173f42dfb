const STEPS = 200;

/**
 * Root of a continuous function between two ends at which its signs differ, to a relative width of 4e-16 (or `tolerance`
 * in x where that is wider). Inverse quadratic and secant steps, bisection where they do not gain: never slower than a few
 * bisections.
 *
 * Source  Brent, Algorithms for Minimization without Derivatives, 1973, chapter 4 (from memory).
 * Valid   a root at or within rounding of zero has no relative width: give a tolerance.
 * Throws  RangeError when the signs at the ends do not differ, the function is not a number, or 200 steps do not do.
 */
export function brentRoot(f: (x: number) => number, from: number, to: number, tolerance = 0): number {
  let previous = from;
  let atPrevious = f(previous);
  let best = to;
  let atBest = f(best);
  if (!(atPrevious * Math.sign(atBest) <= 0)) {
    throw new RangeError(`brentRoot: no change of sign between ${from} (${atPrevious}) and ${to} (${atBest})`);
  }
  // `counter` stands across the root from `best`.
  let counter = previous;
  let atCounter = atPrevious;
  let step = best - previous;
  let stepBefore = step;
  for (let count = 0; count < STEPS; count += 1) {
    if (Math.sign(atCounter) === Math.sign(atBest)) {
      counter = previous;
      atCounter = atPrevious;
      step = best - previous;
      stepBefore = step;
    }
    if (Math.abs(atCounter) < Math.abs(atBest)) {
      [previous, best, counter] = [best, counter, best];
      [atPrevious, atBest, atCounter] = [atBest, atCounter, atBest];
    }
    const width = 2 * Number.EPSILON * Math.abs(best) + tolerance / 2;
    const half = (counter - best) / 2;
    if (atBest === 0 || Math.abs(half) <= width) return best;
    const guessed = interpolatedStep(previous, best, counter, atPrevious, atBest, atCounter);
    const gains = Math.abs(guessed) < 1.5 * Math.abs(half) && Math.abs(guessed) < Math.abs(stepBefore) / 2;
    if (gains && guessed * half > 0 && Math.abs(atPrevious) > Math.abs(atBest)) {
      stepBefore = step;
      step = guessed;
    } else {
      step = half;
      stepBefore = half;
    }
    previous = best;
    atPrevious = atBest;
    best += Math.abs(step) > width ? step : Math.sign(half) * width;
    atBest = f(best);
    if (Number.isNaN(atBest)) throw new RangeError(`brentRoot: the function is not a number at ${best}`);
  }
  throw new RangeError(`brentRoot: no root to the width asked for after ${STEPS} steps, near ${best}`);
}

/** Secant through two points, inverse parabola through three. */
function interpolatedStep(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const s = fb / fa;
  if (a === c) return ((c - b) * s) / (s - 1);
  const q = fa / fc;
  const r = fb / fc;
  const p = s * ((c - b) * q * (q - r) - (b - a) * (r - 1));
  return -p / ((q - 1) * (r - 1) * (s - 1));
}
