import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lnStabilityRatio } from '../../../core/coagulation/stabilityRatio';
import { CONTACT_SEPARATION_m } from '../../../core/constants';
import { coagulationMarginOf, pairRates } from '../../../core/formulation/pairRates';
import { pairIndices, solve } from '../../../core/formulation/solve';
import { totalEnergy } from '../../../core/pairEnergy/pairForces';
import type { Formulation } from '../../../core/scenario/scenario';
import cases from '../../reference/rates/cases.json';
import { deviation } from '../coagulation/closedForms';
import { charge, layer, pigment, solved, whiteBase, withParticles } from './whiteBase';

const requirement = { shelfLife_s: 365.25 * 86_400, acceptedLoss: 0.01 };
const ratesOf = (formulation: Formulation, index = 0, asked = requirement) => {
  const one = solved(formulation);
  return pairRates({ solved: one, pair: one.pairs[index], requirement: asked });
};

describe('solve', () => {
  it('pairs every kind with every other, each once', () => {
    expect(pairIndices(1)).toEqual([[0, 0]]);
    expect(pairIndices(2)).toEqual([
      [0, 0],
      [0, 1],
      [1, 1],
    ]);
    expect(pairIndices(5)).toHaveLength(15);
  });

  it('a second kind leaves the pair of the first as it was (salt and medium being the same)', () => {
    const alone = solved(whiteBase).pairs[0];
    const together = solved(withParticles({}, { diameter_nm: 150 })).pairs[0];
    expect(together.features).toEqual(alone.features);
    expect(together.lnStabilityRatio).toBe(alone.lnStabilityRatio);
  });

  it('does not ask which kind is named first', () => {
    const small = { diameter_nm: 120, charge: { ...charge, zeta_mV: -25 } };
    const one = solved(withParticles({}, small)).pairs;
    const other = solved(withParticles(small, {})).pairs;
    expect(deviation(one[1].lnStabilityRatio, other[1].lnStabilityRatio)).toBeLessThan(1e-9);
    expect(deviation(one[0].lnStabilityRatio, other[2].lnStabilityRatio)).toBeLessThan(1e-9);
  });

  it('hands on the stability ratio of its own curve, from its own contact', () => {
    const [pair] = solved(whiteBase).pairs;
    const again = lnStabilityRatio({
      energy_kT: totalEnergy(pair.model.forces),
      radius1_m: 150e-9,
      radius2_m: 150e-9,
      contact_m: pair.model.forces.contact_m,
    });
    expect(pair.lnStabilityRatio).toBe(again);
    expect(pair.separation_m[0]).toBe(pair.features.contact_m);
  });

  it('refuses what cannot be built, with the place of the fault', () => {
    const answer = solve({ ...whiteBase, hamaker: { route: 'entered', entered_zJ: null } });
    expect(answer.ok).toBe(false);
    expect(answer.ok ? [] : answer.problems.map(({ at }) => at)).toEqual([expect.stringMatching(/^\/hamaker/)]);
  });
});

describe('the forces of a pair', () => {
  it('attraction is proportional to the scale of the Hamaker constant, and nothing else moves', () => {
    const once = solved(whiteBase).pairs[0].model.forces;
    fc.assert(
      fc.property(
        fc.double({ min: 0.3, max: 3, noNaN: true }),
        fc.double({ min: 0.2e-9, max: 50e-9, noNaN: true }),
        (scale, gap_m) => {
          const scaled = solved(whiteBase, scale).pairs[0].model.forces;
          expect(deviation(scaled.vanDerWaals_J(gap_m), scale * once.vanDerWaals_J(gap_m))).toBeLessThan(1e-12);
          expect(scaled.doubleLayer_J(gap_m)).toBe(once.doubleLayer_J(gap_m));
        },
      ),
      { numRuns: 30 },
    );
  });

  it('bare particles meet at contact, covered ones at their dry layers, with edges where the layers touch', () => {
    const bare = solved(whiteBase).pairs[0].model.forces;
    expect(bare.contact_m).toBe(CONTACT_SEPARATION_m);
    expect(bare.edges_m).toEqual([]);
    const covered = solved(withParticles({ layer })).pairs[0].model.forces;
    expect(covered.contact_m).toBeCloseTo((2 * 2e-6) / 1100, 15);
    expect(covered.edges_m).toEqual([expect.closeTo(8e-9, 15), expect.closeTo(16e-9, 15)]);
  });

  it('without charge no double layer acts and no Debye length is named a range; without layer no layer does', () => {
    const { model } = solved(withParticles({ charge: null })).pairs[0];
    expect(model.doubleLayer).toBeNull();
    expect(model.forces.ranges_m).toHaveLength(1);
    expect(model.forces.doubleLayer_J(1e-9)).toBe(0);
    expect(model.forces.stericLayer_J(1e-9)).toBe(0);
    expect(solved(whiteBase).pairs[0].model.forces.ranges_m).toHaveLength(2);
  });

  it('a charged particle against an uncharged one has no double layer either', () => {
    const pairs = solved(withParticles({}, { charge: null })).pairs;
    expect(pairs.map(({ model }) => model.doubleLayer !== null)).toEqual([true, false, false]);
  });
});

describe('pairRates', () => {
  it.each(cases.needed.filter(({ radius_m }) => radius_m > 1e-7))(
    '$id: what the shelf life asks for, through the whole formulation (separate program)',
    (row) => {
      const formulation: Formulation = {
        ...withParticles({ diameter_nm: 2e9 * row.radius_m, loading_percent: 100 * row.volumeFraction }),
        // pH 7 adds 1e-4 mM of its own.
        salts: [{ salt: 'sodium-chloride', concentration_mM: row.ionicStrength_mol_m3 }],
      };
      const rates = ratesOf(formulation, 0, { shelfLife_s: row.time_s, acceptedLoss: row.acceptedLoss });
      expect(deviation(rates.requiredLog10StabilityRatio, row.log10StabilityRatio)).toBeLessThan(1e-6);
      expect(Math.abs(rates.requiredBarrier_kT - row.barrier_kT)).toBeLessThan(1e-3);
    },
  );

  it('decades are natural logarithms over ln 10, and the half-life is that of the count at the loading given', () => {
    const rates = ratesOf(whiteBase);
    const { radius_m, volumeFraction, halfLifeUnhindered_s } = cases.halfLifeByLoading;
    expect([2e9 * radius_m, 100 * volumeFraction]).toEqual([pigment.diameter_nm, pigment.loading_percent]);
    expect(deviation(rates.log10StabilityRatio * Math.LN10, rates.lnStabilityRatio)).toBeLessThan(1e-12);
    const free_s = 10 ** (rates.log10HalfLife_s - rates.log10StabilityRatio);
    expect(deviation(free_s, halfLifeUnhindered_s)).toBeLessThan(1e-6);
    expect(deviation(Math.log10(rates.halfLife_s), rates.log10HalfLife_s)).toBeLessThan(1e-12);
  });

  it('the margin is what the ratio is above what is asked, in decades', () => {
    const one = solved(whiteBase);
    const rates = ratesOf(whiteBase);
    const margin = coagulationMarginOf({ solved: one, pair: one.pairs[0], requirement });
    expect(margin).toBeCloseTo(rates.log10StabilityRatio - rates.requiredLog10StabilityRatio, 10);
  });

  it('ten times the shelf life costs one decade, half the solids give back 0.3', () => {
    const now = ratesOf(whiteBase).requiredLog10StabilityRatio;
    const longer = ratesOf(whiteBase, 0, { ...requirement, shelfLife_s: 10 * requirement.shelfLife_s });
    expect(longer.requiredLog10StabilityRatio - now).toBeCloseTo(1, 9);
    const thinner = ratesOf(withParticles({ loading_percent: 10 }));
    expect(now - thinner.requiredLog10StabilityRatio).toBeCloseTo(Math.log10(2), 9);
  });

  it('unlike pairs count by the more numerous kind', () => {
    const few = { diameter_nm: 600, loading_percent: 1 };
    const both = withParticles({}, few);
    const model = solved(both).model.particles;
    expect(model[0].numberDensity_per_m3).toBeGreaterThan(model[1].numberDensity_per_m3);
    const rates = ratesOf(both, 1);
    const free_s = 10 ** (rates.log10HalfLife_s - rates.log10StabilityRatio);
    const expected_s = Math.LN2 / (rates.collisionRate_m3_s * model[0].numberDensity_per_m3);
    expect(deviation(free_s, expected_s)).toBeLessThan(1e-9);
  });

  it('a barrier is asked for even where nothing repels, and the half-life stays in its logarithm', () => {
    const bare = ratesOf(withParticles({ charge: null }));
    expect(bare.requiredBarrier_kT).toBeGreaterThan(20);
    expect(bare.log10StabilityRatio).toBeLessThan(1);
    const wall = ratesOf(withParticles({ charge: null, layer, diameter_nm: 2000 }));
    expect(Number.isFinite(wall.log10HalfLife_s)).toBe(true);
  });
});
