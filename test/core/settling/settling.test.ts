import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hindrance } from '../../../core/settling/hinderedSettling';
import { settlingState } from '../../../core/settling/settlingState';
import { stokesVelocity } from '../../../core/settling/stokes';
import { suspendingYieldStress } from '../../../core/settling/suspendingYieldStress';
import { exponents } from '../../published/brzinskiDurian2018';
import cases from '../../reference/rates/cases.json';

const deviation = (ours: number, theirs: number): number => Math.abs(ours / theirs - 1);
const can = { volumeFraction: 0.1, fillHeight_m: 0.1, acceptedClearLayer: 0.05 };
const paint = {
  radius_m: 1.5e-7,
  densityDifference_kg_m3: 3100,
  viscosity_Pa_s: 0.00089,
  temperature_K: 298.15,
  ...can,
};

describe('against the separate program (1e-6)', () => {
  it.each(cases.gravity)('$id', (row) => {
    const ours = settlingState({ ...row, ...can });
    expect(deviation(stokesVelocity(row), row.velocity_m_s)).toBeLessThan(1e-6);
    expect(deviation(ours.stokesVelocity_m_s, row.velocity_m_s)).toBeLessThan(1e-6);
    expect(deviation(ours.gravitationalLength_m, row.gravitationalLength_m)).toBeLessThan(1e-6);
    expect(deviation(ours.pecletNumber, row.pecletNumber)).toBeLessThan(1e-6);
    const held_Pa = suspendingYieldStress(row.radius_m, row.densityDifference_kg_m3);
    expect(deviation(held_Pa, row.yieldStress_Pa)).toBeLessThan(1e-6);
  });

  it.each(cases.hindrance.rows)('(1 − φ)ⁿ at φ = $volumeFraction, Pe = $pecletNumber', (row) => {
    expect(deviation(hindrance(row.volumeFraction, row.pecletNumber), row.hindrance)).toBeLessThan(1e-6);
  });
});

describe('hindrance', () => {
  it('has the two exponents and the crossover of Brzinski & Durian 2018', () => {
    const exponentAt = (pecletNumber: number) => Math.log(hindrance(0.3, pecletNumber)) / Math.log(0.7);
    const { brownian, nonBrownian, crossoverPeclet } = exponents;
    expect(exponentAt(crossoverPeclet / 2)).toBeCloseTo(brownian.exponent, 12);
    expect(exponentAt(crossoverPeclet * 2)).toBeCloseTo(nonBrownian.exponent, 12);
  });

  it('lies above Batchelor 1972 (1 − 6.55 φ, from memory) by 3 % at φ = 0.02', () => {
    expect(hindrance(0.02, 1) / cases.hindrance.batchelorAt2Percent - 1).toBeCloseTo(0.028, 3);
  });

  it('is one for a lone particle and falls with loading', () => {
    expect(hindrance(0, 1)).toBe(1);
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 0.9, noNaN: true }),
        (share) => hindrance(share + 0.05, 1) < hindrance(share, 1),
      ),
    );
  });

  it.each([-0.01, 1, 1.5, Number.NaN])('refuses a share of %s', (share) => {
    expect(() => hindrance(share, 1)).toThrow(/volumeFraction/);
  });
});

describe('settlingState obeys its laws', () => {
  it('velocity goes with the square of the radius, the gravitational length with its inverse cube', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-8, max: 1e-5, noNaN: true }), (radius_m) => {
        const one = settlingState({ ...paint, radius_m });
        const two = settlingState({ ...paint, radius_m: 2 * radius_m });
        expect(two.stokesVelocity_m_s / one.stokesVelocity_m_s).toBeCloseTo(4, 9);
        expect(one.gravitationalLength_m / two.gravitationalLength_m).toBeCloseTo(8, 9);
        expect(two.pecletNumber / one.pecletNumber).toBeCloseTo(16, 9);
      }),
    );
  });

  it('a lighter particle rises as fast as a heavier one sinks', () => {
    const sinks = settlingState(paint);
    const rises = settlingState({ ...paint, densityDifference_kg_m3: -3100 });
    expect(rises.hinderedVelocity_m_s).toBe(-sinks.hinderedVelocity_m_s);
    expect(rises.timeToClear_s).toBe(sinks.timeToClear_s);
  });

  it('the accepted layer has formed when the hindered velocity has covered it', () => {
    const { hinderedVelocity_m_s, stokesVelocity_m_s, timeToClear_s } = settlingState(paint);
    expect(hinderedVelocity_m_s * timeToClear_s).toBeCloseTo(0.05 * 0.1, 12);
    expect(hinderedVelocity_m_s / stokesVelocity_m_s).toBeCloseTo(0.9 ** 5.6, 12);
  });

  it('never clears when the densities match', () => {
    const matched = settlingState({ ...paint, densityDifference_kg_m3: 0 });
    expect(matched.timeToClear_s).toBe(Number.POSITIVE_INFINITY);
    expect(matched.hinderedVelocity_m_s).toBe(0);
    expect(Number.isFinite(matched.pecletNumber)).toBe(true);
  });

  it.each(['radius_m', 'viscosity_Pa_s', 'temperature_K', 'fillHeight_m', 'acceptedClearLayer'])(
    'refuses a zero %s',
    (name) => {
      expect(() => settlingState({ ...paint, [name]: 0 })).toThrow(name);
    },
  );
});

describe('suspendingYieldStress', () => {
  it('is the same for a lighter particle, and none for a matched one', () => {
    expect(suspendingYieldStress(1e-6, -500)).toBe(suspendingYieldStress(1e-6, 500));
    expect(suspendingYieldStress(1e-6, 0)).toBe(0);
  });

  it('refuses a radius that is none and a density difference that is no number', () => {
    expect(() => suspendingYieldStress(0, 500)).toThrow(/radius_m/);
    expect(() => suspendingYieldStress(1e-6, Number.NaN)).toThrow(/densityDifference_kg_m3/);
  });
});
