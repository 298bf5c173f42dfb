import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lnEscapeTime } from '../../../core/coagulation/wellEscape';
import { pairedShare } from '../../../core/coagulation/wellOccupation';
import numbers from '../../reference/rates/numbers.json';
import { deviation, energyOf } from './closedForms';

const numberOf = (volumeFraction: number, radius_m: number) => (3 * volumeFraction) / (4 * Math.PI * radius_m ** 3);

/** A parabola around `well_m`, cut off where it crosses zero. */
const bowl =
  (depth_kT: number, well_m: number, width_m: number) =>
  (h_m: number): number =>
    Math.min(0, depth_kT * (((h_m - well_m) / width_m) ** 2 - 1));

describe('pairedShare against 30 digits (1e-5: the zero crossing of the energy falls inside a panel)', () => {
  it.each(numbers.wells)('a well of $well_kT kT', (row) => {
    const ours = pairedShare({
      energy_kT: energyOf(row),
      radius_m: row.radius1_m,
      from_m: row.barrier_m,
      to_m: row.far_m,
      numberDensity_per_m3: numberOf(row.volumeFraction, row.radius1_m),
    });
    expect(deviation(ours, row.pairedShare)).toBeLessThan(1e-5);
  });
});

describe('pairedShare obeys its law', () => {
  const share = (depth_kT: number, numberDensity_per_m3: number) =>
    pairedShare({
      energy_kT: bowl(depth_kT, 1e-8, 5e-9),
      radius_m: 1e-7,
      from_m: 2e-9,
      to_m: 1e-7,
      numberDensity_per_m3,
    });

  it('lies between nothing and all, and grows with depth and crowding', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 2000, noNaN: true }),
        fc.double({ min: 1e15, max: 1e22, noNaN: true }),
        (depth_kT, density_per_m3) => {
          const here = share(depth_kT, density_per_m3);
          expect(here).toBeGreaterThan(0);
          expect(here).toBeLessThanOrEqual(1);
          expect(share(depth_kT + 1, density_per_m3)).toBeGreaterThanOrEqual(here);
          expect(share(depth_kT, 2 * density_per_m3)).toBeGreaterThanOrEqual(here);
        },
      ),
    );
  });

  it('for a shallow well is 2n times its volume integral, to all digits however rare the pairs (1e-5: the crossing)', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-9, max: 1e-6, noNaN: true }),
        fc.double({ min: 1e6, max: 1e15, noNaN: true }),
        (depth_kT, density_per_m3) => {
          const touch_m = 2e-7 + 1e-8;
          // ∫ (2a + h)² (1 − (h − w)²/s²) dh over w ± s
          const volume_m3 = 2 * Math.PI * depth_kT * 5e-9 * ((4 / 3) * touch_m ** 2 + (4 / 15) * 5e-9 ** 2);
          expect(deviation(share(depth_kT, density_per_m3), 2 * density_per_m3 * volume_m3)).toBeLessThan(1e-5);
        },
      ),
    );
  });

  it('obeys the law of mass action: share/(1 − share)² is proportional to the number of particles', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 8, noNaN: true }),
        fc.double({ min: 1e12, max: 1e19, noNaN: true }),
        fc.double({ min: 1, max: 30, noNaN: true }),
        (depth_kT, density_per_m3, times) => {
          const ratio = (density: number) => share(depth_kT, density) / (1 - share(depth_kT, density)) ** 2;
          expect(deviation(ratio(times * density_per_m3), times * ratio(density_per_m3))).toBeLessThan(1e-9);
        },
      ),
    );
  });

  it('is nothing without attraction', () => {
    expect(
      pairedShare({ energy_kT: () => 1, radius_m: 1e-7, from_m: 1e-9, to_m: 1e-7, numberDensity_per_m3: 1e20 }),
    ).toBe(0);
  });
});

describe('lnEscapeTime against 20 digits', () => {
  it.each(numbers.wells)('from a well of $well_kT kT (1e-9)', (row) => {
    const ours = lnEscapeTime({ ...row, energy_kT: energyOf(row), parted_m: row.far_m });
    expect(deviation(Math.exp(ours), row.escapeTime_s)).toBeLessThan(1e-9);
  });
});

describe('lnEscapeTime obeys its law', () => {
  const pair = {
    radius1_m: 1e-7,
    radius2_m: 1e-7,
    barrier_m: 5e-9,
    well_m: 1e-8,
    parted_m: 2e-8,
    temperature_K: 298.15,
    viscosity_Pa_s: 1e-3,
  };
  const of = (depth_kT: number, parted_m = pair.parted_m) =>
    lnEscapeTime({ ...pair, parted_m, energy_kT: bowl(depth_kT, 1e-8, 5e-9) });

  it('for deep wells grows as exp(V), over √V for the narrower bottom, and over V more where the exit is a slope', () => {
    // The saddle values; what is left out falls as 1/V, here 1/200.
    expect(Math.abs(of(400) - of(200) - (200 - 0.5 * Math.LN2))).toBeLessThan(0.01);
    expect(Math.abs(of(400, 1.5e-8) - of(200, 1.5e-8) - (200 - 1.5 * Math.LN2))).toBeLessThan(0.01);
  });

  it('is proportional to viscosity, and finite in its logarithm for wells of thousands of kT', () => {
    const energy_kT = bowl(10, 1e-8, 5e-9);
    const thick = lnEscapeTime({ ...pair, energy_kT, viscosity_Pa_s: 1 });
    expect(thick - lnEscapeTime({ ...pair, energy_kT })).toBeCloseTo(Math.log(1000), 10);
    expect(Number.isFinite(of(5000))).toBe(true);
  });

  it('without energy is that of diffusion over the distance, slowed by the liquid between', () => {
    const free_s = 1e-8 ** 2 / ((2 * 2 * 1.380649e-23 * 298.15) / (6 * Math.PI * 1e-3 * 1e-7));
    const ours_s = Math.exp(lnEscapeTime({ ...pair, energy_kT: () => 0, barrier_m: 1e-8 * (1 - 1e-9) }));
    // B is 5.8 to 3.4 between gaps of 0.1 and 0.2 radii... weighted towards the far end.
    expect(ours_s / free_s).toBeGreaterThan(3);
    expect(ours_s / free_s).toBeLessThan(7.5);
  });

  it('refuses gaps out of order', () => {
    expect(() => lnEscapeTime({ ...pair, energy_kT: () => 0, well_m: 3e-8 })).toThrow(/gaps must rise/);
    expect(() => lnEscapeTime({ ...pair, energy_kT: () => 0, barrier_m: 0 })).toThrow(/barrier_m/);
  });
});
