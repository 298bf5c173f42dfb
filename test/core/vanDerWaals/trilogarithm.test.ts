import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { APERY, trilogarithm } from '../../../core/vanDerWaals/trilogarithm';
import numbers from '../../reference/vanDerWaals/numbers.json';

describe('trilogarithm against mpmath at 40 digits', () => {
  // A few units in the last place of a double.
  it.each(numbers.trilogarithm)('Li3($x) = $value', ({ x, value }) => {
    expect(Math.abs(trilogarithm(x) / value - 1)).toBeLessThan(1e-15);
  });
});

describe('trilogarithm obeys its law', () => {
  it('is zeta(3) at 1, -3/4 zeta(3) at -1 and 0 at 0', () => {
    expect(trilogarithm(1)).toBe(APERY);
    expect(trilogarithm(-1)).toBeCloseTo(-0.75 * APERY, 15);
    expect(trilogarithm(0)).toBe(0);
  });

  it('equals its series wherever that converges fast enough', () => {
    fc.assert(
      fc.property(fc.double({ min: -0.9, max: 0.9, noNaN: true }), (x) => {
        let sum = 0;
        for (let s = 400; s >= 1; s--) sum += x ** s / s ** 3;
        expect(Math.abs(trilogarithm(x) - sum)).toBeLessThanOrEqual(4e-15 * Math.abs(x));
      }),
    );
  });

  it('joins without a step where the three forms meet', () => {
    for (const seam of [0.5, -0.5, Math.SQRT1_2, -Math.SQRT1_2]) {
      expect(trilogarithm(seam * (1 + 1e-14)) / trilogarithm(seam * (1 - 1e-14))).toBeCloseTo(1, 13);
    }
  });

  it.each([1.0000001, -1.0000001, Number.NaN])('refuses %s', (bad) => {
    expect(() => trilogarithm(bad)).toThrow(/trilogarithm/);
  });
});
