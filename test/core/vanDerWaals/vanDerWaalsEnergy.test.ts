import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gregoryRetardation } from '../../../core/vanDerWaals/gregoryRetardation';
import { hamakerGeometry } from '../../../core/vanDerWaals/hamakerSpheres';
import { vanDerWaalsEnergy } from '../../../core/vanDerWaals/vanDerWaalsEnergy';
import { zeroFrequencyScreening } from '../../../core/vanDerWaals/zeroFrequencyScreening';

const pair = {
  zeroFrequency_J: 3e-21,
  dispersion_J: 6e-21,
  retardationWavelength_m: 100e-9,
  radius1_m: 100e-9,
  radius2_m: 150e-9,
  inverseDebyeLength_per_m: 1e8,
  separation_m: 5e-9,
};

describe('zeroFrequencyScreening', () => {
  it('tends to one without ions or gap, by -2(kappa h)²', () => {
    expect(zeroFrequencyScreening(0, 1e-9)).toBe(1);
    expect(zeroFrequencyScreening(1e8, 0)).toBe(1);
    expect((1 - zeroFrequencyScreening(1e5, 1e-9)) / (2 * 1e-8)).toBeCloseTo(1, 3);
  });

  it('falls steadily and stays between 0 and 1', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 50, noNaN: true }), (kappaH) => {
        const near = zeroFrequencyScreening(1, kappaH);
        expect(near).toBeLessThan(1);
        expect(zeroFrequencyScreening(1, kappaH * 1.01)).toBeLessThan(near);
        expect(near).toBeGreaterThan(0);
      }),
    );
  });

  it('underflows to zero quietly, and refuses what is not finite', () => {
    expect(zeroFrequencyScreening(1e10, 1e-6)).toBe(0);
    expect(() => zeroFrequencyScreening(-1, 1e-9)).toThrow(/inverseDebyeLength_per_m/);
    expect(() => zeroFrequencyScreening(1e8, Number.POSITIVE_INFINITY)).toThrow(/separation_m/);
  });

  it('gives polystyrene in water the screened constants of an independent calculation', () => {
    // A0 3.14298534e-21 and dispersion 6.39243798e-21 J from the same calculation; 1e-6 is its printed precision.
    const screened = (kappaH: number) =>
      3.1429853434412216e-21 * zeroFrequencyScreening(1, kappaH) + 6.392437983815689e-21;
    expect(Math.abs(screened(0.1) / 9.480348492394118e-21 - 1)).toBeLessThan(1e-6);
    expect(Math.abs(screened(3) / 6.446972756144687e-21 - 1)).toBeLessThan(1e-6);
  });
});

describe('gregoryRetardation', () => {
  it('is one at contact, one half at lambda/14 and falls with the gap', () => {
    expect(gregoryRetardation(0, 1e-7)).toBe(1);
    expect(gregoryRetardation(1e-7 / 14, 1e-7)).toBeCloseTo(0.5, 14);
    expect(gregoryRetardation(10e-9, 1e-7)).toBeCloseTo(1 / 2.4, 14);
  });

  it.each([0, -1, Number.NaN])('refuses a wavelength of %s', (bad) => {
    expect(() => gregoryRetardation(1e-9, bad)).toThrow(/wavelength_m/);
  });
});

describe('vanDerWaalsEnergy', () => {
  it('is geometry times A without ions and without retardation', () => {
    const energy_J = vanDerWaalsEnergy({ ...pair, inverseDebyeLength_per_m: 0, retardationWavelength_m: 1e3 });
    expect(energy_J / (9e-21 * hamakerGeometry(pair))).toBeCloseTo(1, 9);
  });

  it('keeps only the dispersion part in strong salt', () => {
    const energy_J = vanDerWaalsEnergy({ ...pair, inverseDebyeLength_per_m: 1e11 });
    expect(energy_J).toBe(hamakerGeometry(pair) * 6e-21 * gregoryRetardation(5e-9, 100e-9));
  });

  it('is linear in both parts', () => {
    const zeroOnly = vanDerWaalsEnergy({ ...pair, dispersion_J: 0 });
    const dispersionOnly = vanDerWaalsEnergy({ ...pair, zeroFrequency_J: 0 });
    expect((zeroOnly + dispersionOnly) / vanDerWaalsEnergy(pair)).toBeCloseTo(1, 14);
  });

  it('repels when A is negative', () => {
    expect(vanDerWaalsEnergy({ ...pair, zeroFrequency_J: 0, dispersion_J: -5e-21 })).toBeGreaterThan(0);
  });
});
