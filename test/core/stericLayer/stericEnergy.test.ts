import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BOLTZMANN_J_K } from '../../../core/constants';
import { layerProperties } from '../../../core/stericLayer/layerProperties';
import { oneSidedOsmoticEnergy } from '../../../core/stericLayer/oneSidedLayer';
import { prepareStericLayer, type StericPair } from '../../../core/stericLayer/stericEnergy';
import { elasticEnergy } from '../../../core/stericLayer/vincent1986';
import cases from '../../reference/rates/cases.json';

const deviation = (ours: number, theirs: number): number => Math.abs(ours / theirs - 1);

const layer = {
  thickness_m: 8e-9,
  adsorbedAmount_kg_m2: 2e-6,
  chainMolarMass_kg_mol: 10,
  polymerDensity_kg_m3: 1100,
  floryChi: 0.4,
};
const pair: StericPair = {
  radius1_m: 1e-7,
  radius2_m: 1e-7,
  layer1: layer,
  layer2: layer,
  solventMolecule_m3: 2.99e-29,
  temperature_K: 298.15,
};

function prepared(change: Partial<StericPair> = {}) {
  const ready = prepareStericLayer({ ...pair, ...change });
  if (ready === null) throw new Error('no layer');
  return ready;
}
const codes = (change: Partial<StericPair>) => prepared(change).caveats.map(({ code }) => code);

describe('layerProperties', () => {
  it('chains, spacing and polymer share follow from mass (separate program, 1e-6)', () => {
    const row = cases.grafting;
    const ours = layerProperties({ ...row, floryChi: 0.4 });
    expect(deviation(ours.chains_per_m2, row.chains_per_m2)).toBeLessThan(1e-6);
    expect(deviation(ours.chainSpacing_m, row.chainSpacing_m)).toBeLessThan(1e-6);
    expect(deviation(ours.volumeFraction, row.volumeFraction)).toBeLessThan(1e-6);
    expect(deviation(ours.dryThickness_m, row.volumeFraction * row.thickness_m)).toBeLessThan(1e-6);
  });

  it('refuses a layer thinner than its dry polymer, and lets a just dry one pass', () => {
    const dry_m = 2e-6 / 1100;
    expect(() => layerProperties({ ...layer, thickness_m: 0.99 * dry_m })).toThrow(/dry thickness/);
    expect(layerProperties({ ...layer, thickness_m: dry_m }).volumeFraction).toBeCloseTo(1, 12);
  });

  it.each(['thickness_m', 'adsorbedAmount_kg_m2', 'chainMolarMass_kg_mol', 'polymerDensity_kg_m3'])(
    'refuses a zero %s',
    (name) => {
      expect(() => layerProperties({ ...layer, [name]: 0 })).toThrow(name);
    },
  );
});

describe('prepareStericLayer', () => {
  it('is nothing without layers', () => {
    expect(prepareStericLayer({ ...pair, layer1: null, layer2: null })).toBeNull();
  });

  it.each(cases.vincent)('$id: two equal layers give osmotic and elastic energy together (1e-6)', (row) => {
    const equal = {
      ...row,
      adsorbedAmount_kg_m2: row.volumeFraction * row.thickness_m * row.polymerDensity_kg_m3,
    };
    const { energy_J } = prepared({ ...row, layer1: equal, layer2: equal });
    const ours_kT = energy_J(row.separation_m) / (BOLTZMANN_J_K * row.temperature_K);
    expect(deviation(ours_kT, row.osmotic_kT + row.elastic_kT)).toBeLessThan(1e-6);
  });

  it('takes unlike spheres by Derjaguin: 150 and 75 nm as two of 100 nm', () => {
    const unlike = prepared({ radius1_m: 150e-9, radius2_m: 75e-9 });
    expect(deviation(unlike.energy_J(1e-8), prepared().energy_J(1e-8))).toBeLessThan(1e-12);
  });

  it('comes no nearer than the dry polymer, and says where its law changes', () => {
    const dry_m = 2e-6 / 1100;
    expect(prepared().contact_m).toBeCloseTo(2 * dry_m, 20);
    expect(prepared().edges_m).toEqual([8e-9, 16e-9]);
    expect(prepared({ layer2: null }).contact_m).toBeCloseTo(dry_m, 20);
    expect(prepared({ layer2: null }).edges_m).toEqual([8e-9]);
  });

  it('a single layer acts from its own thickness, on either side alike', () => {
    const one = prepared({ layer2: null });
    const other = prepared({ layer1: null });
    expect(one.energy_J(8.001e-9)).toBe(0);
    expect(one.energy_J(5e-9)).toBeGreaterThan(0);
    expect(other.energy_J(5e-9)).toBe(one.energy_J(5e-9));
    expect(one.energy_J(5e-9)).toBeLessThan(prepared().energy_J(5e-9));
  });

  it('a single layer stores its own osmotic energy and half the elastic energy of two', () => {
    const { volumeFraction, chains_per_m2 } = layerProperties(layer);
    const overlap = { separation_m: 5e-9, meanRadius_m: 1e-7, thickness_m: layer.thickness_m, volumeFraction };
    const osmotic_kT = oneSidedOsmoticEnergy(overlap, layer.floryChi, pair.solventMolecule_m3);
    const elastic_kT = elasticEnergy(overlap, chains_per_m2) / 2;
    expect(elastic_kT).toBeGreaterThan(0.01 * osmotic_kT);
    const ours_kT = prepared({ layer2: null }).energy_J(5e-9) / (BOLTZMANN_J_K * pair.temperature_K);
    expect(deviation(ours_kT, osmotic_kT + elastic_kT)).toBeLessThan(1e-12);
  });

  it('keeps mass, dry volume and chains of unlike layers, so that no pair comes out denser than dry polymer', () => {
    const dense = { ...layer, polymerDensity_kg_m3: 2000, thickness_m: 1e-8, adsorbedAmount_kg_m2: 2e-5 };
    const light = { ...layer, polymerDensity_kg_m3: 900, thickness_m: 1e-9, adsorbedAmount_kg_m2: 9e-7 };
    const unlike = prepared({ layer1: dense, layer2: light });
    expect(unlike.contact_m).toBeCloseTo(1e-8 + 1e-9, 18);
    expect(unlike.energy_J(2e-8)).toBe(prepared({ layer1: light, layer2: dense }).energy_J(2e-8));
  });

  it('lies between its two halves for unlike thickness', () => {
    const thick = { ...layer, thickness_m: 12e-9 };
    const mixed = prepared({ layer2: thick });
    expect(mixed.energy_J(19.9e-9)).toBeGreaterThan(0);
    expect(mixed.energy_J(20.1e-9)).toBe(0);
  });

  it.each([
    ['good solvent, thin', {}, []],
    ['χ close to one half', { layer1: { ...layer, floryChi: 0.48 } }, ['marginal-solvency']],
    ['χ above one half', { layer1: { ...layer, floryChi: 0.55 } }, ['poor-solvency']],
    ['one bare particle', { layer2: null }, ['one-sided-layer']],
    ['unlike thickness', { layer2: { ...layer, thickness_m: 9e-9 } }, ['unlike-layers']],
    ['a particle hardly larger than its layer', { radius2_m: 2e-8 }, ['layer-thick-against-particle']],
  ])('says what there is to doubt: %s', (_, change, expected) => {
    expect(codes(change)).toEqual(expected);
  });

  it('attracts above χ = ½ and repels below', () => {
    const at = (floryChi: number) =>
      prepared({ layer1: { ...layer, floryChi }, layer2: { ...layer, floryChi } }).energy_J(12e-9);
    expect(at(0.55)).toBeLessThan(0);
    expect(at(0.5)).toBe(0);
    expect(at(0.45)).toBeGreaterThan(0);
  });

  it('is finite at every gap down to the dry layers', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: -1, max: 2, noNaN: true }),
        (share, floryChi) => {
          const { energy_J, contact_m } = prepared({ layer1: { ...layer, floryChi } });
          return Number.isFinite(energy_J(contact_m + share * 3e-8));
        },
      ),
    );
  });
});
