import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findFeatures } from '../../../core/pairEnergy/curveFeatures';
import { separationGrid } from '../../../core/pairEnergy/separationGrid';
import { deviation } from '../coagulation/closedForms';
import { type CubicPlaces, cubicCurve } from './cubicCurve';

const CONTACT_m = 0.165e-9;
const gridFor = ({ range_m }: CubicPlaces) =>
  separationGrid({ contact_m: CONTACT_m, edges_m: [], ranges_m: [range_m, 100e-9] });

/** `apart` is the distance of barrier and outer minimum in ranges: the top is above zero from ln 3 = 1.099 on. */
const placesWith = (apart: { min: number; max: number }) =>
  fc
    .record({
      range_m: fc.double({ min: 0.5e-9, max: 20e-9, noNaN: true }),
      barrierInRanges: fc.double({ min: 0.6, max: 4, noNaN: true }),
      apart: fc.double({ ...apart, noNaN: true }),
    })
    .map((one) => {
      const barrier_m = CONTACT_m + one.barrierInRanges * one.range_m;
      return { range_m: one.range_m, barrier_m, outerMinimum_m: barrier_m + one.apart * one.range_m };
    });

const ordinary: CubicPlaces = { range_m: 3e-9, barrier_m: 3e-9, outerMinimum_m: 9e-9 };

describe('findFeatures on curves with known extrema (1e-6 of energy and place)', () => {
  it.each([1, 1000, 100_000])('a barrier of %s kT, and the well behind it', (height_kT) => {
    const curve = cubicCurve(ordinary, height_kT);
    const found = findFeatures(curve.energy_kT, gridFor(ordinary));
    expect(deviation(found.barrier?.energy_kT ?? 0, height_kT)).toBeLessThan(1e-9);
    expect(deviation(found.barrier?.separation_m ?? 0, curve.barrier.separation_m)).toBeLessThan(1e-6);
    expect(deviation(found.outerMinimum?.energy_kT ?? 0, curve.outerMinimum.energy_kT)).toBeLessThan(1e-9);
    expect(deviation(found.outerMinimum?.separation_m ?? 0, curve.outerMinimum.separation_m)).toBeLessThan(1e-6);
    expect(found.primaryMinimum).toEqual({ separation_m: CONTACT_m, energy_kT: curve.energy_kT(CONTACT_m) });
  });

  it('whatever the height from 0.1 to 1e5 kT, the range and the places', () => {
    fc.assert(
      fc.property(placesWith({ min: 1.2, max: 6 }), fc.double({ min: -1, max: 5, noNaN: true }), (places, decades) => {
        const curve = cubicCurve(places, 10 ** decades);
        const { barrier, outerMinimum } = findFeatures(curve.energy_kT, gridFor(places));
        expect(deviation(barrier?.energy_kT ?? 0, curve.barrier.energy_kT)).toBeLessThan(1e-6);
        expect(deviation(barrier?.separation_m ?? 0, places.barrier_m)).toBeLessThan(1e-6);
        if (curve.outerMinimum.energy_kT > -2e-3) return;
        expect(deviation(outerMinimum?.energy_kT ?? 0, curve.outerMinimum.energy_kT)).toBeLessThan(1e-6);
        expect(deviation(outerMinimum?.separation_m ?? 0, places.outerMinimum_m)).toBeLessThan(1e-6);
      }),
      { numRuns: 200 },
    );
  });

  it('a maximum below zero is no barrier, and the outer minimum is found all the same', () => {
    fc.assert(
      fc.property(
        placesWith({ min: 0.3, max: 1.05 }),
        fc.double({ min: -1, max: 3, noNaN: true }),
        (places, decades) => {
          const curve = cubicCurve(places, -(10 ** decades));
          const found = findFeatures(curve.energy_kT, gridFor(places));
          expect(found.barrier).toBeNull();
          expect(deviation(found.outerMinimum?.energy_kT ?? 0, curve.outerMinimum.energy_kT)).toBeLessThan(1e-6);
          expect(found.primaryMinimum?.separation_m).toBe(CONTACT_m);
        },
      ),
    );
  });

  it('a tail that rounds to nothing hides neither: at 3 µm this one is zero to the last bit', () => {
    const places: CubicPlaces = { range_m: 0.5e-9, barrier_m: 0.465e-9, outerMinimum_m: 0.615e-9 };
    const curve = cubicCurve(places, -1);
    const found = findFeatures(curve.energy_kT, gridFor(places));
    expect(Math.abs(curve.energy_kT(3e-6))).toBe(0);
    expect(deviation(found.outerMinimum?.energy_kT ?? 0, curve.outerMinimum.energy_kT)).toBeLessThan(1e-9);
    expect(found.primaryMinimum?.separation_m).toBe(CONTACT_m);
  });

  it('places do not move when the curve is made higher', () => {
    const low = findFeatures(cubicCurve(ordinary, 1).energy_kT, gridFor(ordinary));
    const high = findFeatures(cubicCurve(ordinary, 1e5).energy_kT, gridFor(ordinary));
    expect(deviation(high.barrier?.separation_m ?? 0, low.barrier?.separation_m ?? 1)).toBeLessThan(1e-6);
    expect(deviation(high.outerMinimum?.separation_m ?? 0, low.outerMinimum?.separation_m ?? 1)).toBeLessThan(1e-6);
  });
});
