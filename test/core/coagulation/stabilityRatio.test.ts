import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hydrodynamicFactor } from '../../../core/coagulation/hydrodynamicFactor';
import { lnStabilityRatio } from '../../../core/coagulation/stabilityRatio';
import { BOLTZMANN_J_K, CONTACT_SEPARATION_m } from '../../../core/constants';
import { rapidCoagulation } from '../../published/lipsSmartWillis1971';
import { measuredEfficiency } from '../../published/shaw1992HalfLife';
import cases from '../../reference/rates/cases.json';
import numbers from '../../reference/rates/numbers.json';
import { alike, bornOverA, deviation, energyOf, inverseDebyeLength } from './closedForms';

const unhindered = () => 1;
const spheres = (radius_m: number) => ({ radius1_m: radius_m, radius2_m: radius_m });
/** As the reference starts: so near that attraction has made the integrand vanish. */
const nearlyNothing = (radius_m: number) => 1e-14 * radius_m;

describe('lnStabilityRatio against closed forms, without hydrodynamics', () => {
  it('is that of a square barrier (1e-6: the step falls inside a panel)', () => {
    const { height_kT, widthOverRadius, lnStabilityRatio: expected } = cases.square;
    const ours = lnStabilityRatio({
      ...spheres(1e-7),
      energy_kT: (h_m) => (h_m < widthOverRadius * 1e-7 ? height_kT : 0),
      contact_m: nearlyNothing(1e-7),
      hydrodynamics: unhindered,
    });
    expect(deviation(ours, expected)).toBeLessThan(1e-6);
  });

  it.each(cases.coulomb)('$id: V = y 2a/r gives (eʸ − 1)/y, Debye 1942', (row) => {
    const ours = lnStabilityRatio({
      ...spheres(1e-7),
      energy_kT: (h_m) => row.contactEnergy_kT / (1 + h_m / 2e-7),
      contact_m: nearlyNothing(1e-7),
      hydrodynamics: unhindered,
    });
    expect(deviation(ours, row.lnStabilityRatio)).toBeLessThan(1e-6);
    expect(deviation(ours / Math.LN10, row.log10StabilityRatio)).toBeLessThan(1e-6);
  });

  it('is that of hydrodynamics alone, from a gap of 1e-4 radii (partial fractions)', () => {
    const { from, stabilityRatio } = cases.hydrodynamicIntegral;
    const ours = lnStabilityRatio({ ...spheres(1e-7), energy_kT: () => 0, contact_m: from * 1e-7 });
    expect(deviation(ours, Math.log(stabilityRatio))).toBeLessThan(1e-9);
  });
});

describe('lnStabilityRatio against the separate program (1e-6)', () => {
  it.each([...cases.curves, ...cases.variations])('$id', (row) => {
    const ours = lnStabilityRatio({
      ...spheres(row.radius_m),
      energy_kT: energyOf(alike(row)),
      contact_m: nearlyNothing(row.radius_m),
    });
    expect(deviation(ours, row.lnStabilityRatio)).toBeLessThan(1e-6);
  });

  it.each(cases.curves)('$id without hydrodynamics, and for attraction alone', (row) => {
    const of = (potential_V: number, hydrodynamics = hydrodynamicFactor) =>
      lnStabilityRatio({
        ...spheres(row.radius_m),
        energy_kT: energyOf(alike({ ...row, potential_V })),
        contact_m: nearlyNothing(row.radius_m),
        hydrodynamics,
      });
    expect(deviation(of(row.potential_V, unhindered), row.lnWithoutHydrodynamics)).toBeLessThan(1e-6);
    expect(deviation(of(0), row.lnRapid)).toBeLessThan(1e-6);
    expect(deviation(of(0, unhindered), row.lnRapidWithoutHydrodynamics)).toBeLessThan(1e-6);
  });

  it('with a Born wall, from the primary minimum (1e-4: the place was read off a grid)', () => {
    const row = cases.born;
    const dlvo_kT = energyOf(alike(row));
    const born_kT = row.hamakerConstant_J / (BOLTZMANN_J_K * row.temperature_K);
    const ours = lnStabilityRatio({
      ...spheres(row.radius_m),
      energy_kT: (h_m) => dlvo_kT(h_m) + born_kT * bornOverA(h_m, row.radius_m, row.collisionDiameter_m),
      contact_m: row.primaryMinimum_m,
    });
    expect(deviation(ours, row.lnStabilityRatio)).toBeLessThan(row.agreement);
  });

  it.each(cases.rapid)('$id: efficiency of rapid coagulation', (row) => {
    const { radius_m } = row;
    const energy_kT = energyOf(alike({ ...row, potential_V: 0, ionicStrength_mol_m3: 1, relativePermittivity: 78.3 }));
    const ours = lnStabilityRatio({ ...spheres(radius_m), energy_kT, contact_m: nearlyNothing(radius_m) });
    expect(deviation(Math.exp(-ours), row.efficiency)).toBeLessThan(1e-6);
  });
});

describe('lnStabilityRatio against 30 digits (1e-8 absolute)', () => {
  it.each(numbers.stabilityRatio)('$name, from contact', (row) => {
    let asked = 0;
    const energy_kT = energyOf(row);
    const ours = lnStabilityRatio({
      ...row,
      energy_kT: (h_m) => {
        asked += 1;
        return energy_kT(h_m);
      },
      contact_m: CONTACT_SEPARATION_m,
    });
    expect(Math.abs(ours - row.lnStabilityRatioFromContact)).toBeLessThan(1e-8);
    expect(asked).toBeLessThan(3000);
  });

  it.each(numbers.attractionAlone)('attraction alone, A = $hamakerConstant_J J, a = $radius_m m', (row) => {
    const energy_kT = energyOf(alike({ ...row, potential_V: 0, ionicStrength_mol_m3: 1, relativePermittivity: 78.3 }));
    const from = (contact_m: number) => lnStabilityRatio({ ...spheres(row.radius_m), energy_kT, contact_m });
    expect(Math.abs(from(CONTACT_SEPARATION_m) - row.lnStabilityRatioFromContact)).toBeLessThan(1e-8);
    expect(Math.abs(from(1e-17) - row.lnStabilityRatioFromNothing)).toBeLessThan(1e-8);
  });
});

describe('rapid coagulation as measured', () => {
  const efficiency = (hamakerConstant_J: number, radius_m: number) => {
    const energy_kT = energyOf({
      ...spheres(radius_m),
      hamakerConstant_J,
      potential_V: 0,
      ionicStrength_mol_m3: 1,
      relativePermittivity: 78.3,
      temperature_K: 298.15,
    });
    return Math.exp(-lnStabilityRatio({ ...spheres(radius_m), energy_kT, contact_m: CONTACT_SEPARATION_m }));
  };

  it('runs at half to seven tenths of the free rate: the measured 0.5 and 0.67–0.69 lie in the range of latex', () => {
    const radius_m = rapidCoagulation.diameter_m / 2;
    // Latex in water has A between about 5e-21 and 3e-20 J; weaker attraction captures less.
    expect(efficiency(5e-21, radius_m)).toBeGreaterThan(measuredEfficiency);
    expect(efficiency(5e-21, radius_m)).toBeLessThan(rapidCoagulation.efficiency.low);
    expect(efficiency(3e-20, radius_m)).toBeGreaterThan(rapidCoagulation.efficiency.high - 0.02);
  });
});

describe('the textbook estimate of Reerink & Overbeek 1954, W = exp(V)/2κa', () => {
  it.each(cases.curves.filter(({ features }) => features !== null))('$id: lies within 2.5 of ln W', (row) => {
    const features = row.features as NonNullable<typeof row.features>;
    const estimate = features.barrier_kT - Math.log(2 * inverseDebyeLength(row) * row.radius_m);
    expect(deviation(estimate, features.lnReerinkOverbeek)).toBeLessThan(1e-6);
    const exact = lnStabilityRatio({
      ...spheres(row.radius_m),
      energy_kT: energyOf(alike(row)),
      contact_m: CONTACT_SEPARATION_m,
    });
    expect(Math.abs(exact - estimate)).toBeLessThan(2.5);
  });
});

describe('lnStabilityRatio obeys its law', () => {
  const pairs = fc.record({
    radius1_m: fc.double({ min: 2e-8, max: 1e-6, noNaN: true }),
    radius2_m: fc.double({ min: 2e-8, max: 1e-6, noNaN: true }),
    hamakerConstant_J: fc.double({ min: 1e-21, max: 1e-19, noNaN: true }),
    potential_V: fc.double({ min: 0, max: 0.08, noNaN: true }),
    ionicStrength_mol_m3: fc.double({ min: 0.1, max: 200, noNaN: true }),
    relativePermittivity: fc.constant(78.3),
    temperature_K: fc.constant(298.15),
  });
  const lnOf = (pair: Parameters<typeof energyOf>[0], added = (_: number) => 0) => {
    const energy_kT = energyOf(pair);
    return lnStabilityRatio({
      ...pair,
      energy_kT: (h_m) => energy_kT(h_m) + added(h_m),
      contact_m: CONTACT_SEPARATION_m,
    });
  };

  it('is always a finite number', () => {
    fc.assert(
      fc.property(pairs, (pair) => Number.isFinite(lnOf(pair))),
      { numRuns: 60 },
    );
  });

  it('never falls when a positive energy is added (1e-8: the quadrature)', () => {
    const bumps = fc.record({
      height_kT: fc.double({ min: 0, max: 50, noNaN: true }),
      range_m: fc.double({ min: 1e-9, max: 5e-8, noNaN: true }),
    });
    fc.assert(
      fc.property(
        pairs,
        bumps,
        (pair, { height_kT, range_m }) =>
          lnOf(pair, (h_m) => height_kT * Math.exp(-h_m / range_m)) >= lnOf(pair) - 1e-8,
      ),
      { numRuns: 60 },
    );
  });

  it('rises with the height of a barrier, by less than the barrier does', () => {
    const withBump = (height_kT: number) =>
      lnStabilityRatio({
        ...spheres(1e-7),
        energy_kT: (h_m) => height_kT * Math.exp(-((h_m / 3e-9 - 1) ** 2)),
        contact_m: CONTACT_SEPARATION_m,
      });
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 500, noNaN: true }),
        fc.double({ min: 0.01, max: 500, noNaN: true }),
        (height_kT, more_kT) => {
          const gain = withBump(height_kT + more_kT) - withBump(height_kT);
          return gain > 0 && gain <= more_kT + 1e-8;
        },
      ),
      { numRuns: 60 },
    );
  });

  it('does not change when all lengths are scaled together', () => {
    fc.assert(
      fc.property(pairs, fc.double({ min: 0.1, max: 10, noNaN: true }), (pair, factor) => {
        const energy_kT = energyOf(pair);
        const scaled = lnStabilityRatio({
          radius1_m: factor * pair.radius1_m,
          radius2_m: factor * pair.radius2_m,
          contact_m: factor * CONTACT_SEPARATION_m,
          energy_kT: (h_m) => energy_kT(h_m / factor),
        });
        expect(scaled).toBeCloseTo(lnOf(pair), 7);
      }),
      { numRuns: 40 },
    );
  });

  it('is the same whichever sphere is named first', () => {
    fc.assert(
      fc.property(pairs, (pair) => {
        const turned = lnOf({ ...pair, radius1_m: pair.radius2_m, radius2_m: pair.radius1_m });
        expect(turned).toBeCloseTo(lnOf(pair), 8);
      }),
      { numRuns: 30 },
    );
  });

  it('asks for the energy fewer than 40 000 times, up to barriers of 1e5 kT, narrow and broad', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 5, noNaN: true }),
        fc.double({ min: 0.5e-9, max: 30e-9, noNaN: true }),
        (decades, range_m) => {
          let asked = 0;
          const ln = lnStabilityRatio({
            ...spheres(1e-7),
            energy_kT: (h_m) => {
              asked += 1;
              return 2 * 10 ** decades * (2 * Math.exp(-h_m / range_m) - 1.5 * Math.exp(-(2 * h_m) / range_m));
            },
            contact_m: CONTACT_SEPARATION_m,
          });
          expect(asked).toBeLessThan(40_000);
          // The top of 2q − 1.5q² is 2/3, at a gap of 0.4 ranges; the rest is how narrow it is.
          expect(ln).toBeLessThan((4 / 3) * 10 ** decades + 3);
          expect(ln).toBeGreaterThan((4 / 3) * 10 ** decades - 14);
        },
      ),
      { numRuns: 60 },
    );
  });

  it('refuses what is no gap, no radius or no energy', () => {
    const sound = { ...spheres(1e-7), energy_kT: () => 0, contact_m: 1e-10 };
    expect(() => lnStabilityRatio({ ...sound, contact_m: 0 })).toThrow(/contact_m/);
    expect(() => lnStabilityRatio({ ...sound, radius2_m: Number.NaN })).toThrow(/radius2_m/);
    expect(() => lnStabilityRatio({ ...sound, energy_kT: () => Number.NaN })).toThrow(/no energy/);
  });
});
