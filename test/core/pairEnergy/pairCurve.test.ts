import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pairCurve } from '../../../core/pairEnergy/pairCurve';
import { type PairForces, totalEnergy } from '../../../core/pairEnergy/pairForces';
import { curveEnd, separationGrid } from '../../../core/pairEnergy/separationGrid';

const kT_J = 4.1e-21;
const forces: PairForces = {
  thermalEnergy_J: kT_J,
  contact_m: 2e-9,
  edges_m: [8e-9, 16e-9],
  ranges_m: [5e-9, 100e-9],
  vanDerWaals_J: (h_m) => -1e-29 / h_m,
  doubleLayer_J: (h_m) => 50 * kT_J * Math.exp(-h_m / 5e-9),
  stericLayer_J: (h_m) => (h_m < 16e-9 ? 1e18 * kT_J * (16e-9 - h_m) ** 2 : 0),
};

describe('separationGrid', () => {
  it('starts at contact, rises throughout and has a point on every edge', () => {
    const gaps_m = separationGrid(forces);
    expect(gaps_m[0]).toBe(2e-9);
    expect(gaps_m.slice(1).every((gap_m, index) => gap_m > gaps_m[index])).toBe(true);
    for (const edge_m of forces.edges_m) expect(gaps_m).toContain(edge_m);
  });

  it('reaches thirty ranges and four times the last edge, and no farther than 20 µm', () => {
    expect(curveEnd({ ranges_m: [5e-9], edges_m: [] })).toBeCloseTo(150e-9, 15);
    expect(curveEnd({ ranges_m: [1e-9], edges_m: [] })).toBe(100e-9);
    expect(curveEnd({ ranges_m: [], edges_m: [80e-9] })).toBeCloseTo(320e-9, 15);
    expect(curveEnd({ ranges_m: [1e-6], edges_m: [] })).toBe(20e-6);
  });

  it('keeps neighbours within 3 % of one another, with 300 to 500 points', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.165e-9, max: 2e-8, noNaN: true }),
        fc.double({ min: 0.3e-9, max: 1e-6, noNaN: true }),
        (contact_m, range_m) => {
          const gaps_m = separationGrid({ contact_m, ranges_m: [range_m], edges_m: [3 * contact_m] });
          expect(gaps_m.length).toBeGreaterThan(300);
          expect(gaps_m.length).toBeLessThan(500);
          expect(Math.max(...gaps_m.slice(1).map((gap_m, index) => gap_m / gaps_m[index]))).toBeLessThan(1.03);
        },
      ),
    );
  });
});

describe('pairCurve', () => {
  it('is the sum of its parts, in kT, at every gap', () => {
    const gaps_m = separationGrid(forces);
    const curve = pairCurve(forces, gaps_m);
    const total_kT = totalEnergy(forces);
    expect(curve.separation_m).toBe(gaps_m);
    gaps_m.forEach((gap_m, index) => {
      const parts_kT = curve.vanDerWaals_kT[index] + curve.doubleLayer_kT[index] + curve.stericLayer_kT[index];
      expect(curve.total_kT[index]).toBe(parts_kT);
      expect(Math.abs(curve.total_kT[index] - total_kT(gap_m))).toBeLessThan(1e-12 * (1 + Math.abs(parts_kT)));
      expect(curve.vanDerWaals_kT[index]).toBe(forces.vanDerWaals_J(gap_m) / kT_J);
    });
  });
});
