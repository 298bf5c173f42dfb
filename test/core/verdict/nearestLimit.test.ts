import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearestLimit } from '../../../core/verdict/nearestLimit';

describe('nearestLimit', () => {
  it('finds a single turning point to 0.1 %, whichever side it lies on', () => {
    const place = fc.double({ min: 0.02, max: 900, noNaN: true });
    fc.assert(
      fc.property(place, place, (turn, current) => {
        fc.pre(Math.abs(turn / current - 1) > 1e-6);
        const found = nearestLimit({ current, from: 0.01, to: 1000, margin: (value) => turn - value });
        expect(found?.holds).toBe('below');
        expect(Math.abs((found?.value ?? 0) / turn - 1)).toBeLessThan(2e-3);
      }),
    );
  });

  it('holds on one side of the limit and fails on the other, both evaluated', () => {
    const margin = (value: number) => Math.sin(value);
    const found = nearestLimit({ current: 2, from: 0.5, to: 6, margin });
    expect(found?.value).toBeCloseTo(Math.PI, 2);
    expect(margin((found?.value ?? 0) * 0.998)).toBeGreaterThan(0);
    expect(margin((found?.value ?? 0) * 1.002)).toBeLessThan(0);
  });

  it('says that there is none', () => {
    expect(nearestLimit({ current: 1, from: 0.1, to: 10, margin: () => -1 })).toBeNull();
  });

  it('starts from zero where there is none of it yet', () => {
    const found = nearestLimit({ current: 0, from: 0, to: 1000, margin: (value) => 3 - value });
    expect(found).toMatchObject({ holds: 'below' });
    expect(found?.value).toBeCloseTo(3, 2);
  });

  it('counts a value that cannot be told as not holding', () => {
    const found = nearestLimit({ current: 1, from: 0.1, to: 10, margin: (v) => (v > 5 ? Number.NaN : 1) });
    expect(found?.value).toBeCloseTo(5, 1);
  });
});
