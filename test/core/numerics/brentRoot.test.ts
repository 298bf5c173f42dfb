import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { brentRoot } from '../../../core/numerics/brentRoot';

describe('brentRoot', () => {
  it.each([
    ['x² − 2', (x: number) => x * x - 2, 0, 2, Math.SQRT2],
    ['cos x', Math.cos, 1, 2, Math.PI / 2],
    ['a step of tanh', (x: number) => Math.tanh(1e6 * (x - 0.3)), -5, 7, 0.3],
    ['a triple root', (x: number) => (x - 0.25) ** 3, -1, 2, 0.25],
    ['an end that is the root', (x: number) => x - 1, 1, 3, 1],
    ['a pole on one side', (x: number) => 1 / x - 1e-3, 1e-300, 1e6, 1000],
    ['an infinite end', (x: number) => (x === 0 ? Number.POSITIVE_INFINITY : 1 - x), 0, 5, 1],
  ])('%s', (_, f, from, to, root) => {
    const found = brentRoot(f, from, to);
    // A triple root is flat: a third of the digits is all that a double can tell.
    expect(Math.abs(found - root)).toBeLessThan(_ === 'a triple root' ? 1e-5 : 4e-15 * Math.abs(root));
  });

  it('finds the root of any rising cubic, in far fewer steps than bisection', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -50, max: 50, noNaN: true }),
        fc.double({ min: 0.01, max: 10, noNaN: true }),
        (root, slope) => {
          let asked = 0;
          const f = (x: number) => {
            asked += 1;
            return (x - root) * ((x - root) ** 2 + slope);
          };
          expect(Math.abs(brentRoot(f, -100, 101, 1e-13) - root)).toBeLessThan(1e-13);
          expect(asked).toBeLessThan(60);
        },
      ),
    );
  });

  it('stops at the tolerance asked for', () => {
    let asked = 0;
    const f = (x: number) => {
      asked += 1;
      return Math.exp(x) - 2;
    };
    expect(Math.abs(brentRoot(f, -4, 5, 1e-3) - Math.LN2)).toBeLessThan(1e-3);
    const few = asked;
    brentRoot(f, -4, 5);
    expect(few).toBeLessThan(asked - few);
  });

  it('refuses ends of the same sign and functions that are no number', () => {
    expect(() => brentRoot((x) => x * x + 1, -1, 1)).toThrow(/no change of sign/);
    expect(() => brentRoot(() => Number.NaN, -1, 1)).toThrow(RangeError);
    // A root within rounding of zero has no relative width to stop at.
    const atNothing = (x: number) => (x > 1e-320 ? 1 : -1);
    expect(() => brentRoot(atNothing, -100, 101)).toThrow(/no root to the width/);
    expect(Math.abs(brentRoot(atNothing, -100, 101, 1e-12))).toBeLessThan(1e-12);
    expect(() => brentRoot((x) => (Math.abs(x) < 0.9 ? Number.NaN : x), -1, 1)).toThrow(/not a number/);
  });
});
