import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BOLTZMANN_J_K, CONTACT_SEPARATION_m } from '../../../core/constants';
import { layerNeeded } from '../../../core/stericLayer/layerNeeded';
import cases from '../../reference/rates/cases.json';
import { deviation, hamakerOverA } from '../coagulation/closedForms';

const row = cases.layerNeeded;
const thermalEnergy_J = BOLTZMANN_J_K * row.temperature_K;
const full = (hamakerConstant_J: number, radius_m: number) => (h_m: number) =>
  hamakerConstant_J * hamakerOverA(h_m, radius_m, radius_m);
const ask = (attraction_J: (h_m: number) => number, toleratedDepth_kT = 1) =>
  layerNeeded({ attraction_J, thermalEnergy_J, toleratedDepth_kT, contact_m: CONTACT_SEPARATION_m });

describe('layerNeeded', () => {
  it(`${row.id}: on the full Hamaker energy (separate program, 1e-6)`, () => {
    expect(deviation(ask(full(row.hamakerConstant_J, row.radius_m)), row.thickness_m)).toBeLessThan(1e-6);
  });

  it('with the near-contact form is A a/24 n kT, and asks for 2.6 times as much (separate program, 1e-6)', () => {
    const near = (h_m: number) => -(row.hamakerConstant_J * row.radius_m) / (12 * h_m);
    expect(deviation(ask(near), row.thicknessDerjaguin_m)).toBeLessThan(1e-6);
    expect(row.thicknessDerjaguin_m / row.thickness_m).toBeCloseTo(2.635, 3);
  });

  it('leaves just the tolerated depth where the layers touch', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-21, max: 2e-19, noNaN: true }),
        fc.double({ min: 1e-8, max: 1e-6, noNaN: true }),
        fc.double({ min: 0.5, max: 5, noNaN: true }),
        (hamakerConstant_J, radius_m, depth_kT) => {
          const attraction_J = full(hamakerConstant_J, radius_m);
          const thickness_m = ask(attraction_J, depth_kT);
          if (thickness_m === 0)
            expect(-attraction_J(CONTACT_SEPARATION_m)).toBeLessThanOrEqual(depth_kT * thermalEnergy_J);
          else expect(-attraction_J(2 * thickness_m) / thermalEnergy_J / depth_kT).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  it('is zero when bare contact is no deeper, and refuses what never ends', () => {
    expect(ask(() => 0)).toBe(0);
    expect(() => ask(() => -1e-18)).toThrow(RangeError);
    expect(() => ask(() => 0, 0)).toThrow(/toleratedDepth_kT/);
  });
});
