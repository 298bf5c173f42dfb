import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BOLTZMANN_J_K, VACUUM_PERMITTIVITY_F_m } from '../../../core/constants';
import { constantChargeEnergy } from '../../../core/doubleLayer/constantCharge';
import { constantPotentialEnergy } from '../../../core/doubleLayer/constantPotential';
import { gregorySuperpositionEnergy } from '../../../core/doubleLayer/gregorySuperposition';

/** Laws that the two linear models share, and their place against superposition. */
const models = [
  { name: 'constantPotentialEnergy', energy: constantPotentialEnergy },
  { name: 'constantChargeEnergy', energy: constantChargeEnergy },
];
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** Potentials that matter: squares of smaller ones leave the number range. */
const potential = between(-0.025, 0.025).filter((value) => value === 0 || Math.abs(value) > 1e-9);
const spheres = fc.record({
  kappaGap: between(1e-3, 30),
  radius1_m: between(1e-8, 1e-6),
  radius2_m: between(1e-8, 1e-6),
  potential1_V: potential,
  potential2_V: potential,
  inverseDebyeLength_per_m: between(1e7, 3e9),
  relativePermittivity: between(2, 90),
});
const placed = ({ kappaGap, ...rest }: { kappaGap: number; inverseDebyeLength_per_m: number }) => ({
  ...rest,
  gap_m: kappaGap / rest.inverseDebyeLength_per_m,
});
const equal = {
  gap_m: 2e-9,
  radius1_m: 1e-7,
  radius2_m: 1e-7,
  potential1_V: 0.02,
  potential2_V: 0.02,
  inverseDebyeLength_per_m: 5e8,
  relativePermittivity: 78.5,
};
const scale_J = 2 * Math.PI * 78.5 * VACUUM_PERMITTIVITY_F_m * 1e-7 * 0.02 ** 2;

describe.each(models)('$name', ({ energy }) => {
  it('does not ask which sphere comes first, nor for the sign of all charges', () => {
    fc.assert(
      fc.property(spheres, (drawn) => {
        const s = { ...drawn, ...placed(drawn) };
        const swapped = {
          ...s,
          radius1_m: s.radius2_m,
          radius2_m: s.radius1_m,
          potential1_V: s.potential2_V,
          potential2_V: s.potential1_V,
        };
        const value_J = energy(s);
        expect(Math.abs(energy(swapped) - value_J)).toBeLessThanOrEqual(1e-13 * Math.abs(value_J));
        expect(energy({ ...s, potential1_V: -s.potential1_V, potential2_V: -s.potential2_V })).toBe(value_J);
      }),
    );
  });

  it('decays as e^(−κh) far out', () => {
    const at = (kappaGap: number) => energy({ ...equal, gap_m: kappaGap / 5e8 });
    expect(at(20) / at(21) / Math.E).toBeCloseTo(1, 7);
  });

  it('falls with more salt at a fixed potential, from one Debye length on', () => {
    fc.assert(
      fc.property(spheres, between(1.05, 3), between(1, 10), (drawn, factor, kappaGap) => {
        const potential2_V = drawn.potential1_V * 0.9;
        const s = { ...drawn, ...placed({ ...drawn, kappaGap }), potential2_V };
        fc.pre(Math.abs(s.potential1_V) > 1e-6);
        const saltier = { ...s, inverseDebyeLength_per_m: factor * s.inverseDebyeLength_per_m };
        expect(energy(saltier)).toBeLessThan(energy(s));
      }),
    );
  });

  it('is finite at 500 mV, at 1e-12 m, and at 10 000 Debye lengths', () => {
    const strong = { ...equal, potential1_V: 0.5, potential2_V: -0.5 };
    for (const gap_m of [1e-300, 1e-12, 1e-9, 2e-5, 1]) {
      for (const s of [equal, strong]) expect(Number.isFinite(energy({ ...s, gap_m }))).toBe(true);
    }
    expect(energy({ ...equal, gap_m: 2e-5 })).toBeCloseTo(0, 300);
  });

  it('refuses contact, and a potential that is no number', () => {
    expect(() => energy({ ...equal, gap_m: 0 })).toThrow(/gap_m/);
    expect(() => energy({ ...equal, potential2_V: Number.NaN })).toThrow(/potential2_V/);
  });
});

describe('constantPotentialEnergy (Hogg, Healy & Fuerstenau 1966)', () => {
  it('is 2πεaψ² ln(1+q) for equal spheres', () => {
    for (const kappaGap of [1e-6, 0.1, 1, 10]) {
      const ours_J = constantPotentialEnergy({ ...equal, gap_m: kappaGap / 5e8 });
      expect(ours_J / (scale_J * Math.log1p(Math.exp(-kappaGap)))).toBeCloseTo(1, 13);
    }
  });

  it('equals the published grouping of the terms, where that keeps its digits', () => {
    fc.assert(
      fc.property(spheres, between(0.3, 3), (drawn, kappaGap) => {
        const s = { ...drawn, ...placed({ ...drawn, kappaGap }) };
        const q = Math.exp(-kappaGap);
        const { potential1_V: one_V, potential2_V: two_V } = s;
        const bracket =
          2 * one_V * two_V * Math.log((1 + q) / (1 - q)) + (one_V ** 2 + two_V ** 2) * Math.log(1 - q * q);
        const size_m = (s.radius1_m * s.radius2_m) / (s.radius1_m + s.radius2_m);
        const front = Math.PI * s.relativePermittivity * VACUUM_PERMITTIVITY_F_m * size_m;
        const size_J = front * (one_V ** 2 + two_V ** 2);
        expect(Math.abs(constantPotentialEnergy(s) - front * bracket)).toBeLessThanOrEqual(1e-14 * size_J);
      }),
    );
  });

  it('turns like but unequal charges to attraction close in: what the formula says, and where to distrust it', () => {
    const unequal = { ...equal, potential1_V: 0.025, potential2_V: 0.01 };
    expect(constantPotentialEnergy({ ...unequal, gap_m: 4e-9 })).toBeGreaterThan(0);
    expect(constantPotentialEnergy({ ...unequal, gap_m: 1e-11 })).toBeLessThan(0);
  });

  it('attracts a bare surface, by its image', () => {
    expect(constantPotentialEnergy({ ...equal, potential2_V: 0 })).toBeLessThan(0);
  });
});

describe('constantChargeEnergy (Wiese & Healy 1970)', () => {
  it('is −2πεaψ² ln(1−q) for equal spheres', () => {
    for (const kappaGap of [1e-6, 0.1, 1]) {
      const ours_J = constantChargeEnergy({ ...equal, gap_m: kappaGap / 5e8 });
      expect(ours_J / (-scale_J * Math.log(-Math.expm1(-kappaGap)))).toBeCloseTo(1, 13);
    }
  });

  it('repels close in even from opposite charges that do not balance', () => {
    const opposite = { ...equal, potential1_V: 0.025, potential2_V: -0.01 };
    expect(constantChargeEnergy({ ...opposite, gap_m: 6e-9 })).toBeLessThan(0);
    expect(constantChargeEnergy({ ...opposite, gap_m: 1e-11 })).toBeGreaterThan(0);
  });
});

describe('the three models together', () => {
  it('stand in the order constant potential, superposition, constant charge, for equal low potentials', () => {
    fc.assert(
      // Up to 0.5 mV the curvature of tanh takes 2e-5; the models lie ½e^(−κh) apart, 2e-4 at κh of 8.
      fc.property(spheres, between(0.01, 8), between(1e-5, 5e-4), (drawn, kappaGap, potential_V) => {
        const low = { potential1_V: potential_V, potential2_V: potential_V, temperature_K: 298.15, valence: 1 };
        const s = { ...drawn, ...placed({ ...drawn, kappaGap }), ...low };
        const middle_J = gregorySuperpositionEnergy(s);
        expect(constantPotentialEnergy(s)).toBeLessThan(middle_J);
        expect(constantChargeEnergy(s)).toBeGreaterThan(middle_J);
      }),
    );
  });

  it('attract when the charges are opposite, from two Debye lengths on', () => {
    const opposite = { ...equal, gap_m: 4e-9, potential2_V: -0.02 };
    const salt = { temperature_K: 298.15, valence: 1 };
    expect(constantPotentialEnergy(opposite)).toBeLessThan(0);
    expect(constantChargeEnergy(opposite)).toBeLessThan(0);
    expect(gregorySuperpositionEnergy({ ...opposite, ...salt })).toBeLessThan(0);
  });

  it('are of the size formulators know: some tens of kT for 100 nm, 20 mV, one Debye length', () => {
    const kT_J = BOLTZMANN_J_K * 298.15;
    expect(constantPotentialEnergy(equal) / kT_J).toBeGreaterThan(10);
    expect(constantChargeEnergy(equal) / kT_J).toBeLessThan(50);
  });
});
