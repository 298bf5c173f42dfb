import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { positionOf, type SliderRange, valueAt } from '../../../renderer/controls/Slider';

const ranges: readonly SliderRange[] = [
  { min: -100, max: 100, decimals: 0 },
  { min: 0.1, max: 500, logarithmic: true, decimals: 1 },
  { min: 10, max: 3000, logarithmic: true, decimals: 0 },
];

describe('slider', () => {
  it.each(ranges)('gives its ends exactly: %j', (range) => {
    expect(valueAt(0, range)).toBe(range.min);
    expect(valueAt(400, range)).toBe(range.max);
  });

  it('rises with its position and stays in its range', () => {
    fc.assert(
      fc.property(fc.constantFrom(...ranges), fc.integer({ min: 0, max: 399 }), (range, position) => {
        expect(valueAt(position + 1, range)).toBeGreaterThanOrEqual(valueAt(position, range));
        expect(valueAt(position, range)).toBeGreaterThanOrEqual(range.min);
      }),
    );
  });

  it('shows a value beyond its range at its end', () => {
    expect(positionOf(-1e9, ranges[1])).toBe(0);
    expect(positionOf(1e9, ranges[1])).toBe(400);
  });
});
