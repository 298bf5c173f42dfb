import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { findFeatures } from '../../../core/pairEnergy/curveFeatures';
import { separationGrid } from '../../../core/pairEnergy/separationGrid';
import cases from '../../reference/rates/cases.json';
import numbers from '../../reference/rates/numbers.json';
import { alike, deviation, energyOf, inverseDebyeLength } from '../coagulation/closedForms';

const grid = (range_m = 10e-9, contact_m = 0.165e-9, edges_m: readonly number[] = []) =>
  separationGrid({ contact_m, edges_m, ranges_m: [range_m, 100e-9] });
const rise = (h_m: number, place_m: number, width_m: number) => Math.exp(-(((h_m - place_m) / width_m) ** 2));

describe('findFeatures against the separate program', () => {
  it.each(cases.curves.filter(({ features }) => features !== null))('$id: barrier and outer minimum', (row) => {
    const features = row.features as NonNullable<typeof row.features>;
    const energy_kT = energyOf(alike(row));
    const ours = findFeatures(energy_kT, grid(1 / inverseDebyeLength(row)));
    expect(deviation(ours.barrier?.energy_kT ?? 0, features.barrier_kT)).toBeLessThan(1e-6);
    expect(deviation(ours.barrier?.separation_m ?? 0, features.barrier_m)).toBeLessThan(1e-6);
    expect(deviation(ours.outerMinimum?.energy_kT ?? 0, features.outerMinimum_kT)).toBeLessThan(1e-6);
    expect(deviation(ours.outerMinimum?.separation_m ?? 0, features.outerMinimum_m)).toBeLessThan(1e-6);
    // Large, highly charged spheres (curve F) repel even at contact.
    expect(ours.primaryMinimum?.separation_m).toBe(energy_kT(0.165e-9) < 0 ? 0.165e-9 : undefined);
  });

  it.each(cases.variations)('$id: barrier', (row) => {
    const { barrier } = findFeatures(energyOf(alike(row)), grid(1 / inverseDebyeLength(row)));
    expect(deviation(barrier?.energy_kT ?? 0, row.barrier_kT)).toBeLessThan(1e-6);
  });

  it.each(numbers.wells)('a well of $well_kT kT behind $barrier_kT kT, to 30 digits', (row) => {
    const { barrier, outerMinimum } = findFeatures(energyOf(row), grid(1 / inverseDebyeLength(row)));
    expect(deviation(barrier?.energy_kT ?? 0, row.barrier_kT)).toBeLessThan(1e-11);
    expect(deviation(barrier?.separation_m ?? 0, row.barrier_m)).toBeLessThan(1e-6);
    expect(deviation(outerMinimum?.energy_kT ?? 0, row.well_kT)).toBeLessThan(1e-11);
    expect(deviation(outerMinimum?.separation_m ?? 0, row.well_m)).toBeLessThan(1e-6);
  });
});

describe('findFeatures names what a curve has', () => {
  const attraction = (h_m: number) => -1e-9 / h_m;

  it('attraction alone: no barrier, no outer minimum, contact the primary one', () => {
    const found = findFeatures(attraction, grid());
    expect(found.barrier).toBeNull();
    expect(found.outerMinimum).toBeNull();
    expect(found.primaryMinimum).toEqual({ separation_m: 0.165e-9, energy_kT: attraction(0.165e-9) });
    expect(found.contact_m).toBe(0.165e-9);
  });

  it('repulsion alone: the barrier is contact, and there is no minimum', () => {
    const found = findFeatures((h_m) => 30 * Math.exp(-h_m / 5e-9), grid());
    expect(found.barrier?.separation_m).toBe(0.165e-9);
    expect(found.primaryMinimum).toBeNull();
    expect(found.outerMinimum).toBeNull();
  });

  it('nothing at all: nothing', () => {
    const found = findFeatures(() => 0, grid());
    expect([found.barrier, found.primaryMinimum, found.outerMinimum]).toEqual([null, null, null]);
  });

  it.each([1, 1000, 100_000])('a barrier of %s kT is found with its place, between the two minima', (height_kT) => {
    const total = (h_m: number) => height_kT * rise(h_m, 4e-9, 1e-9) - 3 * rise(h_m, 20e-9, 8e-9) - 1e-8 / h_m;
    const { barrier, primaryMinimum, outerMinimum } = findFeatures(total, grid());
    // The tails of the other terms move the top a little.
    expect(Math.abs((barrier?.energy_kT ?? 0) / (height_kT - 2.5) - 1)).toBeLessThan(height_kT > 1 ? 0.01 : 3);
    expect(primaryMinimum?.separation_m).toBe(0.165e-9);
    expect(outerMinimum?.separation_m).toBeCloseTo(20e-9, 9);
  });

  it('a polymer wall: the barrier is contact, the well before it the outer minimum', () => {
    const wall = (h_m: number) => (h_m < 16e-9 ? 5e18 * (16e-9 - h_m) ** 2 : 0);
    const found = findFeatures((h_m) => wall(h_m) - 8e-8 / h_m, grid(10e-9, 4e-9, [8e-9, 16e-9]));
    expect(found.barrier?.separation_m).toBe(4e-9);
    expect(found.primaryMinimum).toBeNull();
    expect(found.outerMinimum?.energy_kT).toBeLessThan(-4.9);
    expect(Math.abs((found.outerMinimum?.separation_m ?? 0) - 16e-9)).toBeLessThan(1e-9);
  });

  it('a weak wall that ends below zero at contact: no barrier, and still the well before it is an outer one', () => {
    const wall = (h_m: number) => (h_m < 16e-9 ? 1e17 * (16e-9 - h_m) ** 2 : 0);
    const total = (h_m: number) => wall(h_m) - 20 * Math.exp(-h_m / 40e-9);
    const found = findFeatures(total, grid(10e-9, 4e-9, [8e-9, 16e-9]));
    expect(total(4e-9)).toBeLessThan(0);
    expect(found.barrier).toBeNull();
    expect(found.primaryMinimum).toBeNull();
    expect(found.outerMinimum?.energy_kT).toBeLessThan(total(4e-9));
    expect(found.outerMinimum?.separation_m).toBeGreaterThan(10e-9);
  });

  it('a maximum below zero is no barrier, and parts the two minima', () => {
    const total = (h_m: number) => -1e-7 / h_m + 6 * rise(h_m, 10e-9, 3e-9);
    const { barrier, primaryMinimum, outerMinimum } = findFeatures(total, grid());
    expect(total(10e-9)).toBeLessThan(0);
    expect(barrier).toBeNull();
    expect(primaryMinimum?.separation_m).toBe(0.165e-9);
    expect(outerMinimum?.separation_m).toBeGreaterThan(10e-9);
  });

  it('overlooks what is below a thousandth of kT', () => {
    const found = findFeatures((h_m) => 9e-4 * rise(h_m, 5e-9, 2e-9) - 9e-4 * rise(h_m, 20e-9, 5e-9), grid());
    expect(found.barrier).toBeNull();
    expect(found.outerMinimum).toBeNull();
  });

  it('of two barriers it takes the higher, and the well between counts by its side', () => {
    const total = (h_m: number) =>
      20 * rise(h_m, 3e-9, 1e-9) + 10 * rise(h_m, 20e-9, 4e-9) - 6 * rise(h_m, 9e-9, 3e-9) - 2e-9 / h_m;
    const { barrier, outerMinimum } = findFeatures(total, grid());
    expect(barrier?.separation_m).toBeCloseTo(3e-9, 9);
    expect(outerMinimum?.separation_m).toBeCloseTo(9e-9, 9);
  });

  it('a barrier is never lower than any point of the grid', () => {
    const pairs = fc.record({
      radius_m: fc.double({ min: 2e-8, max: 1e-6, noNaN: true }),
      hamakerConstant_J: fc.double({ min: 1e-21, max: 1e-19, noNaN: true }),
      potential_V: fc.double({ min: 0, max: 0.1, noNaN: true }),
      ionicStrength_mol_m3: fc.double({ min: 0.1, max: 500, noNaN: true }),
    });
    fc.assert(
      fc.property(pairs, (row) => {
        const pair = alike({ ...row, relativePermittivity: 78.3, temperature_K: 298.15 });
        const energy_kT = energyOf(pair);
        const gaps_m = grid(1 / inverseDebyeLength(pair));
        const highest_kT = Math.max(...gaps_m.map((gap_m) => energy_kT(gap_m)));
        const { barrier, outerMinimum } = findFeatures(energy_kT, gaps_m);
        expect(barrier?.energy_kT ?? 1e-3).toBeGreaterThanOrEqual(
          Math.min(highest_kT, barrier === null ? 1e-3 : highest_kT),
        );
        if (barrier !== null && outerMinimum !== null) {
          expect(outerMinimum.separation_m).toBeGreaterThan(barrier.separation_m);
          expect(outerMinimum.energy_kT).toBeLessThan(0);
        }
      }),
      { numRuns: 100 },
    );
  });
});
