import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { collisionRate } from '../../../core/coagulation/collisionRate';
import { lnHalfLife, lnRequiredStabilityRatio } from '../../../core/coagulation/losses';
import { halfLifeRule } from '../../published/shaw1992HalfLife';
import cases from '../../reference/rates/cases.json';
import { deviation } from './closedForms';

const water = { temperature_K: 298.15, viscosity_Pa_s: 0.00089 };
const rate_m3_s = collisionRate({ ...water, radius1_m: 1e-7, radius2_m: 1e-7 });
const numberOf = (volumeFraction: number, radius_m: number) => (3 * volumeFraction) / (4 * Math.PI * radius_m ** 3);

const encounters = fc.record({
  collisionRate_m3_s: fc.double({ min: 1e-20, max: 1e-14, noNaN: true }),
  numberDensity_per_m3: fc.double({ min: 1e12, max: 1e24, noNaN: true }),
  alike: fc.boolean(),
});
const shares = fc.double({ min: 1e-9, max: 0.999, noNaN: true });

describe('lnHalfLife', () => {
  it('is 2/(K n₀) by count (separate program, 1e-6)', () => {
    const { numberDensity_per_m3, halfLife_s } = cases.halfLifeByCount;
    const ours = Math.exp(lnHalfLife(0, { collisionRate_m3_s: rate_m3_s, numberDensity_per_m3, alike: true }));
    expect(deviation(ours, halfLife_s)).toBeLessThan(1e-6);
  });

  it('is of the order 1e11/n₀ seconds, n₀ per cm³ (Shaw 1992: the order only)', () => {
    const { numberDensity_per_m3 } = cases.halfLifeByCount;
    const ours = Math.exp(lnHalfLife(0, { collisionRate_m3_s: rate_m3_s, numberDensity_per_m3, alike: true }));
    const rule = halfLifeRule.halfLifeTimesCount_s_per_cm3 / (numberDensity_per_m3 / 1e6);
    expect(ours / rule).toBeGreaterThan(0.5);
    expect(ours / rule).toBeLessThan(2);
  });

  it('is πηa³W/φkT by loading (separate program, 1e-6)', () => {
    const { radius_m, volumeFraction, stabilityRatio, halfLife_s, halfLifeUnhindered_s } = cases.halfLifeByLoading;
    const crowd = {
      collisionRate_m3_s: rate_m3_s,
      numberDensity_per_m3: numberOf(volumeFraction, radius_m),
      alike: true,
    };
    expect(deviation(Math.exp(lnHalfLife(0, crowd)), halfLifeUnhindered_s)).toBeLessThan(1e-6);
    expect(deviation(Math.exp(lnHalfLife(Math.log(stabilityRatio), crowd)), halfLife_s)).toBeLessThan(1e-6);
  });

  it('stays finite where the half-life itself does not fit a number', () => {
    const ln = lnHalfLife(5000, { collisionRate_m3_s: rate_m3_s, numberDensity_per_m3: 1e18, alike: true });
    expect(Number.isFinite(ln)).toBe(true);
    expect(Math.exp(ln)).toBe(Number.POSITIVE_INFINITY);
  });

  it('for like particles costs three quarters of the singles: half-life and required ratio undo each other', () => {
    fc.assert(
      fc.property(encounters, fc.double({ min: -2, max: 600, noNaN: true }), (one, ln) => {
        const crowd = { ...one, alike: true };
        expect(lnRequiredStabilityRatio(Math.exp(lnHalfLife(ln, crowd)), 0.75, crowd)).toBeCloseTo(ln, 8);
      }),
    );
  });

  it('for unlike particles halves the rarer kind: what the same time costs, asked back, is one half', () => {
    fc.assert(
      fc.property(encounters, (one) => {
        const crowd = { ...one, alike: false };
        expect(lnRequiredStabilityRatio(Math.exp(lnHalfLife(3, crowd)), 0.5, crowd)).toBeCloseTo(3, 9);
      }),
    );
  });
});

describe('lnRequiredStabilityRatio', () => {
  it.each(cases.needed)('$id (separate program, 1e-6)', (row) => {
    const ours = lnRequiredStabilityRatio(row.time_s, row.acceptedLoss, {
      collisionRate_m3_s: collisionRate({ ...row, radius1_m: row.radius_m, radius2_m: row.radius_m }),
      numberDensity_per_m3: numberOf(row.volumeFraction, row.radius_m),
      alike: true,
    });
    expect(deviation(Math.exp(ours), row.stabilityRatio)).toBeLessThan(1e-6);
    expect(deviation(ours / Math.LN10, row.log10StabilityRatio)).toBeLessThan(1e-6);
  });

  it('asks for no barrier when the loss is what free encounters cause: 3/4 of the singles after one half-life', () => {
    const { timeOverHalfLife, singlesLeft } = cases.singlets;
    const crowd = { collisionRate_m3_s: rate_m3_s, numberDensity_per_m3: 1e18, alike: true };
    const time_s = timeOverHalfLife * Math.exp(lnHalfLife(0, crowd));
    expect(lnRequiredStabilityRatio(time_s, 1 - singlesLeft, crowd)).toBeCloseTo(0, 12);
  });

  it('half of the singles are gone after 0.414 half-lives of the count', () => {
    const crowd = { collisionRate_m3_s: rate_m3_s, numberDensity_per_m3: 1e18, alike: true };
    const time_s = (Math.SQRT2 - 1) * Math.exp(lnHalfLife(0, crowd));
    expect(lnRequiredStabilityRatio(time_s, 0.5, crowd)).toBeCloseTo(0, 12);
  });

  it('grows with time as its logarithm, and with a stricter loss', () => {
    fc.assert(
      fc.property(encounters, shares, fc.double({ min: 1, max: 1e9, noNaN: true }), (crowd, share, time_s) => {
        const now = lnRequiredStabilityRatio(time_s, share, crowd);
        expect(lnRequiredStabilityRatio(10 * time_s, share, crowd) - now).toBeCloseTo(Math.LN10, 9);
        expect(lnRequiredStabilityRatio(time_s, share / 2, crowd)).toBeGreaterThan(now);
      }),
    );
  });

  it('for small losses does not care which of the two laws counts: t = f W/(K n)', () => {
    fc.assert(
      fc.property(encounters, (crowd) => {
        const share = 1e-9;
        const expected = Math.log(crowd.collisionRate_m3_s) + Math.log(crowd.numberDensity_per_m3) - Math.log(share);
        expect(lnRequiredStabilityRatio(1, share, crowd)).toBeCloseTo(expected, 6);
      }),
    );
  });

  it.each([
    [0, 0.5],
    [-1, 0.5],
    [Number.NaN, 0.5],
    [1, 0],
    [1, 1],
  ])('refuses a time of %s with a loss of %s', (time_s, share) => {
    const crowd = { collisionRate_m3_s: rate_m3_s, numberDensity_per_m3: 1e18, alike: true };
    expect(() => lnRequiredStabilityRatio(time_s, share, crowd)).toThrow(RangeError);
  });
});
