import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { AVOGADRO_per_mol } from '../../../core/constants';
import { forEachGaussPoint } from '../../../core/numerics/gaussLegendre';
import { oneSidedOsmoticEnergy } from '../../../core/stericLayer/oneSidedLayer';
import { elasticEnergy, osmoticEnergy } from '../../../core/stericLayer/vincent1986';
import cases from '../../reference/rates/cases.json';
import numbers from '../../reference/rates/numbers.json';

const deviation = (ours: number, theirs: number): number => Math.abs(ours / theirs - 1);
const layer = { meanRadius_m: 1e-7, thickness_m: 5e-9, volumeFraction: 0.15 };
const solventMolecule_m3 = 2.99e-29;
const osmoticAt = (separation_m: number, floryChi = 0.45) =>
  osmoticEnergy({ ...layer, separation_m }, floryChi, solventMolecule_m3);
const elasticAt = (separation_m: number) => elasticEnergy({ ...layer, separation_m }, 1e17);
const oneSidedAt = (separation_m: number, floryChi = 0.45) =>
  oneSidedOsmoticEnergy({ ...layer, separation_m }, floryChi, solventMolecule_m3);

describe('Vincent, Edwards, Emmett & Jones 1986 against the separate program (1e-6)', () => {
  it.each(cases.vincent)('$id', (row) => {
    const overlap = { ...row, meanRadius_m: row.radius_m };
    const chains_per_m2 =
      (row.volumeFraction * row.thickness_m * row.polymerDensity_kg_m3 * AVOGADRO_per_mol) / row.chainMolarMass_kg_mol;
    expect(deviation(osmoticEnergy(overlap, row.floryChi, row.solventMolecule_m3), row.osmotic_kT)).toBeLessThan(1e-6);
    const elastic = elasticEnergy(overlap, chains_per_m2);
    if (row.elastic_kT === 0) expect(elastic).toBe(0);
    else expect(deviation(elastic, row.elastic_kT)).toBeLessThan(1e-6);
  });
});

describe('osmotic terms against the free energy of unit area, integrated to 30 digits (1e-12)', () => {
  it.each(numbers.layers)('h = $separation_m m', (row) => {
    const two = osmoticEnergy(row, row.floryChi, row.solventMolecule_m3);
    const one = oneSidedOsmoticEnergy(row, row.floryChi, row.solventMolecule_m3);
    expect(deviation(two, row.twoLayers_kT)).toBeLessThan(1e-12);
    // Near its edge the one-sided form is the small difference of numbers near one.
    if (row.oneLayer_kT === 0) expect(one).toBe(0);
    else expect(deviation(one, row.oneLayer_kT)).toBeLessThan(1e-10);
  });
});

describe('the layer energies join', () => {
  const δ = layer.thickness_m;
  const nudge = 1e-9;
  const slope = (f: (h_m: number) => number, h_m: number) => (f(h_m * (1 + 1e-6)) - f(h_m * (1 - 1e-6))) / (2e-6 * h_m);

  it.each([
    ['osmotic at δ', osmoticAt, δ, osmoticAt(δ)],
    ['osmotic at 2δ', osmoticAt, 2 * δ, osmoticAt(δ)],
    ['elastic at δ', elasticAt, δ, elasticAt(δ / 2)],
    ['one-sided at δ', oneSidedAt, δ, oneSidedAt(δ / 2)],
  ])('%s, in energy and in force', (_, f, edge_m, scale_kT) => {
    expect(Math.abs(f(edge_m * (1 + nudge)) - f(edge_m * (1 - nudge))) / scale_kT).toBeLessThan(1e-7);
    const jump = slope(f, edge_m * (1 + 2e-6)) - slope(f, edge_m * (1 - 2e-6));
    expect(Math.abs(jump) / (scale_kT / δ)).toBeLessThan(1e-4);
  });

  it('vanish beyond touch', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 1e3, noNaN: true }), (times) => {
        expect(osmoticAt(2 * δ * times)).toBe(0);
        expect(elasticAt(δ * times)).toBe(0);
        expect(oneSidedAt(δ * times)).toBe(0);
      }),
    );
  });

  it('rise inwards in a good solvent; the osmotic terms turn their sign, and only that, in a poor one', () => {
    const inside = fc.double({ min: 0.01, max: 0.99, noNaN: true });
    fc.assert(
      fc.property(inside, (share) => {
        expect(osmoticAt(2 * δ * share * 0.99)).toBeGreaterThan(osmoticAt(2 * δ * share));
        expect(elasticAt(δ * share * 0.99)).toBeGreaterThan(elasticAt(δ * share));
        expect(oneSidedAt(δ * share * 0.99)).toBeGreaterThan(oneSidedAt(δ * share));
        expect(osmoticAt(2 * δ * share, 0.55)).toBeCloseTo(-osmoticAt(2 * δ * share, 0.45), 9);
        expect(oneSidedAt(δ * share, 0.55)).toBeCloseTo(-oneSidedAt(δ * share, 0.45), 9);
      }),
    );
  });

  it('a layer against a bare surface stores less than two against each other', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 0.999, noNaN: true }), (share) => {
        expect(oneSidedAt(δ * share)).toBeLessThan(osmoticAt(δ * share));
      }),
    );
  });
});

/** ∫ f over [from, to], in panels that keep ln x and its like well inside eight points. */
function integral(f: (x: number) => number, from: number, to: number): number {
  const ratio = (to / from) ** (1 / 32);
  let sum = 0;
  for (let panel = 0; panel < 32; panel += 1) {
    forEachGaussPoint(from * ratio ** panel, from * ratio ** (panel + 1), (x, weight) => {
      sum += weight * f(x);
    });
  }
  return sum;
}

describe('spheres are 2πR times the integral of the energy of unit area, Derjaguin 1934 (1e-9)', () => {
  const δ = layer.thickness_m;
  const chi = 0.45;
  const strength = ((0.5 - chi) * layer.volumeFraction ** 2) / solventMolecule_m3;
  // 2πR of two equal spheres
  const derjaguin_m = Math.PI * layer.meanRadius_m;
  /** kT/m²: overlap of two layers at 2φ, then both squeezed into the gap. */
  const osmoticPlates = (h_m: number) =>
    h_m >= δ ? 2 * strength * (2 * δ - h_m) : strength * ((4 * δ * δ) / h_m - 2 * δ);
  const onePlate = (h_m: number) => strength * ((δ * δ) / h_m - δ);
  const elasticPlates = (h_m: number) => -2 * 1e17 * Math.log((h_m / δ) * ((3 - h_m / δ) / 2) ** 2);
  const shares = fc.double({ min: 0.02, max: 0.98, noNaN: true });

  it('osmotic, in both branches', () => {
    fc.assert(
      fc.property(shares, (share) => {
        const pressed_m = δ * share;
        const overlapped_m = δ * (1 + share);
        const outer = derjaguin_m * integral(osmoticPlates, δ, 2 * δ);
        const inner = derjaguin_m * integral(osmoticPlates, pressed_m, δ);
        expect(deviation(osmoticAt(pressed_m), outer + inner)).toBeLessThan(1e-9);
        const rest = derjaguin_m * integral(osmoticPlates, overlapped_m, 2 * δ);
        expect(deviation(osmoticAt(overlapped_m), rest)).toBeLessThan(1e-9);
      }),
    );
  });

  it('elastic, and a single layer against a bare surface', () => {
    fc.assert(
      fc.property(shares, (share) => {
        const elastic = derjaguin_m * integral(elasticPlates, δ * share, δ);
        // Near its edge each is the small difference of numbers near one: 1e-15 of the whole.
        expect(Math.abs(elasticAt(δ * share) - elastic)).toBeLessThan(1e-9 * elastic + 1e-13 * elasticAt(δ / 2));
        const single = derjaguin_m * integral(onePlate, δ * share, δ);
        expect(Math.abs(oneSidedAt(δ * share) - single)).toBeLessThan(1e-9 * single + 1e-13 * oneSidedAt(δ / 2));
      }),
    );
  });

  it('two squeezed layers are two single ones against the plane between them: 4 V₁(h/2), but for a constant', () => {
    fc.assert(
      fc.property(shares, (share) => {
        const two_kT = osmoticAt(δ * share) - osmoticAt(δ);
        const single_kT = oneSidedAt((δ * share) / 2) - oneSidedAt(δ / 2);
        expect(Math.abs(two_kT - 4 * single_kT)).toBeLessThan(1e-12 * osmoticAt(δ * share));
      }),
    );
  });
});
