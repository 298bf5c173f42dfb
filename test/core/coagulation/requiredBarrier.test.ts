import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { collisionRate } from '../../../core/coagulation/collisionRate';
import { lnRequiredStabilityRatio } from '../../../core/coagulation/losses';
import { requiredBarrier } from '../../../core/coagulation/requiredBarrier';
import { lnStabilityRatio } from '../../../core/coagulation/stabilityRatio';
import { CONTACT_SEPARATION_m } from '../../../core/constants';
import cases from '../../reference/rates/cases.json';
import barriers from '../../reference/rates/neededBarriers.json';
import { alike, deviation, energyOf, inverseDebyeLength } from './closedForms';

interface Case {
  readonly radius_m: number;
  readonly volumeFraction: number;
  readonly time_s: number;
  readonly acceptedLoss: number;
  readonly temperature_K: number;
  readonly viscosity_Pa_s: number;
  readonly relativePermittivity: number;
  readonly ionicStrength_mol_m3: number;
}

const barrierOf = (row: Case): number =>
  requiredBarrier({
    lnRequiredStabilityRatio: lnRequiredStabilityRatio(row.time_s, row.acceptedLoss, {
      collisionRate_m3_s: collisionRate({ ...row, radius1_m: row.radius_m, radius2_m: row.radius_m }),
      numberDensity_per_m3: (3 * row.volumeFraction) / (4 * Math.PI * row.radius_m ** 3),
      alike: true,
    }),
    meanRadius_m: row.radius_m,
    repulsionRange_m: 1 / inverseDebyeLength(row),
  });

describe('requiredBarrier against the separate program', () => {
  it.each(cases.needed)('$id (1e-6)', (row) => {
    expect(deviation(barrierOf(row), row.barrier_kT)).toBeLessThan(1e-6);
  });

  const { rows, ...water } = barriers;
  it.each(rows)('$radius_nm nm at φ = $volumeFraction, $time_days days, loss $acceptedLoss: $barrier_kT kT', (row) => {
    const ours = barrierOf({ ...water, ...row, radius_m: row.radius_nm * 1e-9, time_s: row.time_days * 86_400 });
    // Printed to a tenth, so within half of that.
    expect(Math.abs(ours - row.barrier_kT)).toBeLessThan(0.0501);
  });
});

describe('requiredBarrier against the full integral', () => {
  const measurable = [...cases.curves.slice(0, 2), ...cases.variations];
  it.each(measurable)('$id: the barrier that has this ln W is found to 2 kT', (row) => {
    const energy_kT = energyOf(alike(row));
    const ln = lnStabilityRatio({
      radius1_m: row.radius_m,
      radius2_m: row.radius_m,
      energy_kT,
      contact_m: CONTACT_SEPARATION_m,
    });
    const height_kT = 'features' in row ? (row.features?.barrier_kT ?? Number.NaN) : row.barrier_kT;
    const ours = requiredBarrier({
      lnRequiredStabilityRatio: ln,
      meanRadius_m: row.radius_m,
      repulsionRange_m: 1 / inverseDebyeLength(row),
    });
    expect(Math.abs(ours - height_kT)).toBeLessThan(2);
  });
});

describe('requiredBarrier obeys its law', () => {
  const ask = (ln: number, range_m = 3e-9) =>
    requiredBarrier({ lnRequiredStabilityRatio: ln, meanRadius_m: 1e-7, repulsionRange_m: range_m });

  it('rises with what is asked, never by less than ln W does', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 5, max: 5000, noNaN: true }),
        fc.double({ min: 0.1, max: 100, noNaN: true }),
        (ln, more) => {
          expect(ask(ln + more) - ask(ln)).toBeGreaterThanOrEqual(more * (1 - 1e-9));
        },
      ),
    );
  });

  it('is zero where encounters are rarer than asked', () => {
    expect(ask(-20)).toBe(0);
  });

  it('refuses lengths and ratios that are none', () => {
    expect(() => ask(Number.NaN)).toThrow(/lnRequiredStabilityRatio/);
    expect(() => ask(10, 0)).toThrow(/repulsionRange_m/);
  });
});
