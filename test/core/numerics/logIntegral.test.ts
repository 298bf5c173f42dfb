import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { logIntegral } from '../../../core/numerics/logIntegral';

/** Counts how often the integrand is asked for. */
function counted(logIntegrand: (x: number) => number) {
  const count = { asked: 0 };
  const f = (x: number): number => {
    count.asked += 1;
    return logIntegrand(x);
  };
  return { f, count };
}

const heights = fc.double({ min: 0, max: 5, noNaN: true }).map((decades) => 10 ** decades);
const ROOM = 1e-8;
/** What the rounding of an integrand of this size may leave. */
const rounding = (height: number) => 1e-14 * Math.abs(height);

describe('logIntegral against closed forms', () => {
  it('a bell curve narrower than a panel, down to a hundredth of it, is not missed', () => {
    fc.assert(
      fc.property(
        heights,
        fc.double({ min: -8, max: 8, noNaN: true }),
        fc.double({ min: 0.005, max: 0.05, noNaN: true }),
        (height, middle, width) => {
          const ours = logIntegral((x) => height - ((x - middle) / width) ** 2 / 2, -10, 10);
          const exact = height + Math.log(Math.sqrt(2 * Math.PI) * width);
          expect(Math.abs(ours - exact)).toBeLessThan(ROOM + rounding(height));
        },
      ),
    );
  });

  it('a bell curve far broader than the range counts by its height alone', () => {
    fc.assert(
      fc.property(heights, fc.double({ min: 1e4, max: 1e8, noNaN: true }), (height, width) => {
        const ours = logIntegral((x) => height - (x / width) ** 2 / 2, -10, 10);
        // The mean of x² over the range is 100/3.
        const exact = height + Math.log(20) - 100 / 3 / 2 / width ** 2;
        expect(Math.abs(ours - exact)).toBeLessThan(ROOM + rounding(height));
      }),
    );
  });

  it('exp of a bell, a barrier as in Fuchs’ integral, is its saddle value with two corrections', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 3, max: 5, noNaN: true }),
        fc.double({ min: 0.2, max: 1, noNaN: true }),
        fc.double({ min: -3, max: 3, noNaN: true }),
        (decades, width, middle) => {
          const height = 10 ** decades;
          const { f, count } = counted((x) => height * Math.exp(-(((x - middle) / width) ** 2) / 2));
          const ours = logIntegral(f, -10, 10);
          // Own expansion: ∫ exp(H e^(−t²/2)) dt = e^H √(2π/H) (1 + 3/8H + 65/128H² + ...)
          const series = 1 + 3 / (8 * height) + 65 / (128 * height ** 2);
          const exact = height + Math.log(width * Math.sqrt((2 * Math.PI) / height)) + Math.log(series);
          expect(Math.abs(ours - exact)).toBeLessThan(ROOM + rounding(height));
          expect(count.asked).toBeLessThan(40_000);
        },
      ),
    );
  });

  it('does not count on where the range is cut in two', () => {
    fc.assert(
      fc.property(heights, fc.double({ min: -2, max: 2, noNaN: true }), (height, cut) => {
        const f = (x: number) => height * Math.exp(-(x ** 2));
        const left = logIntegral(f, -6, cut);
        const right = logIntegral(f, cut, 6);
        const high = Math.max(left, right);
        const parts = high + Math.log(Math.exp(left - high) + Math.exp(right - high));
        expect(Math.abs(logIntegral(f, -6, 6) - parts)).toBeLessThan(3 * ROOM + rounding(height));
      }),
    );
  });
});

describe('logIntegral asks the integrand a bounded number of times', () => {
  it.each([0, 1, 1e3, 1e5])('a barrier of %s kT behind a fall into contact', (height) => {
    const { f, count } = counted((x) => height * Math.exp(-((x - 1) ** 2)) - Math.exp(-3 * x - 6) + x);
    expect(Number.isFinite(logIntegral(f, -6, 8))).toBe(true);
    expect(count.asked).toBeLessThan(40_000);
  });

  it('even where a wall or a jump of 1e5 keeps it from settling', () => {
    const { f, count } = counted((x) => (x < Math.SQRT1_2 ? 1e5 : 0));
    expect(logIntegral(f, 0, 10)).toBeCloseTo(1e5 + Math.log(Math.SQRT1_2), 5);
    expect(count.asked).toBeLessThan(40_000);
  });
});
