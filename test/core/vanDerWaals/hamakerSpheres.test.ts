import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { derjaguin } from '../../../core/vanDerWaals/derjaguin';
import { hamakerGeometry, type SpherePair } from '../../../core/vanDerWaals/hamakerSpheres';
import { spherePlate } from '../../../core/vanDerWaals/spherePlate';
import numbers from '../../reference/vanDerWaals/numbers.json';

const anyLength_m = fc.double({ min: -9.3, max: -5, noNaN: true }).map((exponent) => 10 ** exponent);
const anyPair: fc.Arbitrary<SpherePair> = fc.record({
  radius1_m: anyLength_m,
  radius2_m: anyLength_m,
  separation_m: fc.double({ min: -10, max: -4, noNaN: true }).map((exponent) => 10 ** exponent),
});

describe('hamakerGeometry against Hamaker 1937 in mpmath at 60 digits', () => {
  // h/a from 1e-6 to 1e6, radii 1 to 250 apart; 1e-12 is what the curve and its integrals are promised.
  it.each(numbers.spherePair)('a1 $radius1_m, a2 $radius2_m, h $separation_m', ({ energyOverHamaker, ...pair }) => {
    expect(Math.abs(hamakerGeometry(pair) / energyOverHamaker - 1)).toBeLessThan(1e-12);
  });

  it.each(numbers.spherePlate)('sphere and plate, h/a = $separation_m', ({ energyOverHamaker, ...pair }) => {
    expect(Math.abs(spherePlate(pair) / energyOverHamaker - 1)).toBeLessThan(1e-12);
  });
});

describe('hamakerGeometry against a second independent calculation', () => {
  // Numbers given to 16 digits, made from the same closed form in another program, in plain double precision.
  it.each([
    {
      radius1_m: 1e-7,
      radius2_m: 1e-7,
      separation_m: 1e-9,
      pair: -7.626283430573307,
      limit: -8.33333333333333,
      plate: -15.86570125495864,
    },
    {
      radius1_m: 5e-8,
      radius2_m: 5e-7,
      separation_m: 5e-9,
      pair: -1.095655080122527,
      limit: -1.5151515151515147,
      plate: -1.2386113397445089,
    },
  ])('a1 $radius1_m, a2 $radius2_m, h $separation_m', ({ pair, limit, plate, ...spheres }) => {
    expect(hamakerGeometry(spheres) / pair).toBeCloseTo(1, 12);
    expect(derjaguin(spheres) / limit).toBeCloseTo(1, 12);
    expect(spherePlate({ radius_m: spheres.radius1_m, separation_m: spheres.separation_m }) / plate).toBeCloseTo(1, 12);
  });
});

describe('hamakerGeometry obeys its law', () => {
  it('depends only on ratios of lengths', () => {
    fc.assert(
      fc.property(anyPair, fc.double({ min: 1e-3, max: 1e6, noNaN: true }), (pair, scale) => {
        const scaled = {
          radius1_m: pair.radius1_m * scale,
          radius2_m: pair.radius2_m * scale,
          separation_m: pair.separation_m * scale,
        };
        expect(Math.abs(hamakerGeometry(scaled) / hamakerGeometry(pair) - 1)).toBeLessThan(1e-12);
      }),
    );
  });

  it('does not care which sphere is which', () => {
    fc.assert(
      fc.property(anyPair, ({ radius1_m, radius2_m, separation_m }) => {
        const other = hamakerGeometry({ radius1_m: radius2_m, radius2_m: radius1_m, separation_m });
        expect(hamakerGeometry({ radius1_m, radius2_m, separation_m }) / other).toBeCloseTo(1, 12);
      }),
    );
  });

  it('is negative and weakens steadily with the gap', () => {
    fc.assert(
      fc.property(anyPair, fc.double({ min: 1e-6, max: 10, noNaN: true }), (pair, step) => {
        const near = hamakerGeometry(pair);
        const far = hamakerGeometry({ ...pair, separation_m: pair.separation_m * (1 + step) });
        expect(near).toBeLessThan(far);
        expect(far).toBeLessThan(0);
      }),
    );
  });

  it('tends to Derjaguin near contact: ratio above 0.99999 at h = a/10^7', () => {
    fc.assert(
      fc.property(anyLength_m, fc.double({ min: 0.2, max: 5, noNaN: true }), (radius1_m, ratio) => {
        const pair = { radius1_m, radius2_m: radius1_m * ratio, separation_m: radius1_m * 1e-7 };
        const quotient = hamakerGeometry(pair) / derjaguin(pair);
        expect(quotient).toBeGreaterThan(0.99998);
        expect(quotient).toBeLessThan(1);
      }),
    );
  });

  it('tends to -(16/9) a1³ a2³/R⁶ far away, by (a/R)² in the relative sense', () => {
    fc.assert(
      fc.property(anyLength_m, fc.double({ min: 0.1, max: 10, noNaN: true }), (radius1_m, ratio) => {
        const radius2_m = radius1_m * ratio;
        const distance_m = 1e4 * (radius1_m + radius2_m);
        const separation_m = distance_m - radius1_m - radius2_m;
        const far = -(16 / 9) * ((radius1_m * radius2_m) / distance_m ** 2) ** 3;
        expect(Math.abs(hamakerGeometry({ radius1_m, radius2_m, separation_m }) / far - 1)).toBeLessThan(1e-7);
      }),
    );
  });

  it('tends to sphere and plate when one sphere is far larger', () => {
    const pair = { radius1_m: 1e-7, radius2_m: 1e3, separation_m: 3e-9 };
    expect(hamakerGeometry(pair) / spherePlate({ radius_m: 1e-7, separation_m: 3e-9 })).toBeCloseTo(1, 8);
  });

  it('shows Derjaguin 9 % too strong at h = a/100 and 69 % at h = a/10', () => {
    const excess = (separation_m: number) => {
      const pair = { radius1_m: 1, radius2_m: 1, separation_m };
      return derjaguin(pair) / hamakerGeometry(pair) - 1;
    };
    expect(excess(0.01)).toBeCloseTo(0.09, 2);
    expect(excess(0.1)).toBeCloseTo(0.69, 2);
  });

  it.each([0, -1e-9, Number.NaN, Number.POSITIVE_INFINITY])('refuses a gap of %s', (separation_m) => {
    expect(() => hamakerGeometry({ radius1_m: 1e-7, radius2_m: 1e-7, separation_m })).toThrow(/separation_m/);
    expect(() => spherePlate({ radius_m: 1e-7, separation_m })).toThrow(/separation_m/);
    expect(() => derjaguin({ radius1_m: 1e-7, radius2_m: 1e-7, separation_m })).toThrow(/separation_m/);
  });
});
