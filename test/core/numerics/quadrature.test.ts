import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { forEachGaussPoint } from '../../../core/numerics/gaussLegendre';
import { logAdd, logIntegral } from '../../../core/numerics/logIntegral';
import { placeOfMaximum } from '../../../core/numerics/peak';

function integral(f: (x: number) => number, from: number, to: number): number {
  let sum = 0;
  forEachGaussPoint(from, to, (x, weight) => {
    sum += weight * f(x);
  });
  return sum;
}

describe('forEachGaussPoint', () => {
  it.each(Array.from({ length: 16 }, (_, degree) => degree))('is exact for x to the power %i', (degree) => {
    expect(integral((x) => x ** degree, 0.5, 2)).toBeCloseTo(
      (2 ** (degree + 1) - 0.5 ** (degree + 1)) / (degree + 1),
      9,
    );
  });

  it('is not for the power 16, where eight points end', () => {
    expect(Math.abs(integral((x) => x ** 16, -1, 1) - 2 / 17)).toBeGreaterThan(1e-6);
  });
});

describe('logAdd', () => {
  it('adds what could not be exponentiated, and keeps nothing as nothing', () => {
    expect(logAdd(5000, 5000)).toBeCloseTo(5000 + Math.LN2, 12);
    expect(logAdd(-5000, -5000)).toBeCloseTo(-5000 + Math.LN2, 12);
    expect(logAdd(Number.NEGATIVE_INFINITY, 3)).toBe(3);
    expect(logAdd(Number.NEGATIVE_INFINITY, Number.NEGATIVE_INFINITY)).toBe(Number.NEGATIVE_INFINITY);
  });

  it('is the logarithm of the sum', () => {
    const logs = fc.double({ min: -300, max: 300, noNaN: true });
    fc.assert(
      fc.property(logs, logs, (a, b) => {
        expect(logAdd(a, b)).toBeCloseTo(Math.log(Math.exp(a) + Math.exp(b)), 10);
      }),
    );
  });
});

describe('logIntegral', () => {
  it('of a bell curve far above the range of a double is its height and ½ ln 2π of its width', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e5, max: 1e5, noNaN: true }),
        fc.double({ min: -3, max: 3, noNaN: true }),
        fc.double({ min: 0.02, max: 0.5, noNaN: true }),
        (height, middle, width) => {
          const ours = logIntegral((x) => height - ((x - middle) / width) ** 2 / 2, -10, 10);
          const exact = height + 0.5 * Math.log(2 * Math.PI) + Math.log(width);
          expect(Math.abs(ours - exact)).toBeLessThan(1e-8 + 1e-14 * Math.abs(height));
        },
      ),
    );
  });

  it('of exp(x) is the difference of its ends', () => {
    expect(logIntegral((x) => x, 0, 30)).toBeCloseTo(Math.log(Math.expm1(30)), 10);
  });

  it('of nothing is nothing', () => {
    expect(logIntegral(() => Number.NEGATIVE_INFINITY, 0, 1)).toBe(Number.NEGATIVE_INFINITY);
  });

  it('follows a jump and a kink', () => {
    expect(logIntegral((x) => (x < 0.377 ? 5 : 0), 0, 1)).toBeCloseTo(Math.log(0.377 * Math.exp(5) + 0.623), 5);
    expect(logIntegral((x) => -Math.abs(x - 0.377), 0, 1)).toBeCloseTo(
      Math.log(2 - Math.exp(-0.377) - Math.exp(-0.623)),
      8,
    );
  });
});

describe('placeOfMaximum', () => {
  it('finds the top of a peak to the tolerance asked for, wherever it lies', () => {
    fc.assert(
      fc.property(fc.double({ min: -0.9, max: 0.9, noNaN: true }), (top) => {
        expect(Math.abs(placeOfMaximum((x) => -((x - top) ** 2), -1, 1, 1e-7) - top)).toBeLessThan(1e-7);
      }),
    );
  });

  it('goes to the end when the function only rises', () => {
    expect(placeOfMaximum((x) => x, 2, 3, 1e-7)).toBeCloseTo(3, 6);
  });
});
