import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { curvatureFactor } from '../../../core/doubleLayer/curvatureFactor';
import { flatEffectivePotential, sphereEffectivePotential } from '../../../core/doubleLayer/effectivePotential';
import { thermalVoltage } from '../../../core/doubleLayer/thermalVoltage';
import numbers from '../../reference/doubleLayer/numbers.json';

const temperature_K = 298.15;
const unit_V = thermalVoltage(temperature_K);
const salt = (cation: number, anion: number, scale = 1) => [
  { valence: cation, concentration_mol_m3: scale * anion },
  { valence: -anion, concentration_mol_m3: scale * cation },
];
const flat = (ions: Parameters<typeof flatEffectivePotential>[0]['ions'], reducedPotential: number) =>
  flatEffectivePotential({ ions, potential_V: reducedPotential * unit_V, temperature_K }).effectivePotential_V / unit_V;
const reduced = fc.double({ min: -20, max: 20, noNaN: true }).filter((y) => Math.abs(y) > 1e-6);

describe('flatEffectivePotential against independent values', () => {
  it.each(numbers.flat)('$salt, reduced potential $reducedPotential: 45-digit quadrature', (row) => {
    // Rounding only.
    expect(Math.abs(flat(row.ions, row.reducedPotential) / row.effectivePotential - 1)).toBeLessThan(1e-13);
  });

  it('is (4/z) tanh(zy/4) for a symmetric salt', () => {
    fc.assert(
      fc.property(reduced, fc.integer({ min: 1, max: 3 }), (y, z) => {
        expect(flat(salt(z, z, 7), y) / ((4 / z) * Math.tanh((z * y) / 4))).toBeCloseTo(1, 13);
      }),
    );
  });

  it('is 6(v−1)/(v+1), v² = (1 + 2e^y)/3, for a 2:1 salt, and its mirror image for 1:2', () => {
    // Follows from the first integral with v as the variable. v − 1 is written so that it does not cancel.
    const closed = (y: number) => {
      const v = Math.sqrt((1 + 2 * Math.exp(y)) / 3);
      return (4 * Math.expm1(y)) / (v + 1) ** 2;
    };
    fc.assert(
      fc.property(reduced, (y) => {
        expect(flat(salt(2, 1), y) / closed(y)).toBeCloseTo(1, 12);
        expect(flat(salt(1, 2), y) / -closed(-y)).toBeCloseTo(1, 12);
      }),
    );
  });
});

describe('flatEffectivePotential obeys its law', () => {
  it('is the potential itself while that is low, whatever the ions', () => {
    for (const ions of [salt(1, 1), salt(2, 1), salt(1, 3)]) expect(flat(ions, 1e-7) / 1e-7).toBeCloseTo(1, 6);
  });

  it('rises with the potential up to a limit, and is finite at 500 mV and beyond', () => {
    for (const [cation, anion] of [
      [1, 1],
      [2, 1],
      [3, 1],
      [1, 3],
    ]) {
      const ions = salt(cation, anion);
      const values = [0.1, 1, 3, 8, 19.5, 100, 2000].map((y) => flat(ions, -y));
      values.forEach((value, i) => {
        expect(Number.isFinite(value)).toBe(true);
        if (i > 0) expect(value).toBeLessThanOrEqual(values[i - 1] * (1 - 1e-15));
      });
      const { saturation } = flatEffectivePotential({ ions, potential_V: -50, temperature_K });
      expect(saturation).toBeCloseTo(1, 12);
    }
  });

  it('depends on ratios of concentration only', () => {
    expect(flat(salt(2, 1, 1e-3), -3)).toBeCloseTo(flat(salt(2, 1, 1e3), -3), 14);
  });

  it('sees its share of the highest as tanh(zy/4) for z:z', () => {
    const { saturation } = flatEffectivePotential({ ions: salt(2, 2), potential_V: 0.03, temperature_K });
    expect(saturation).toBeCloseTo(Math.tanh((2 * 0.03) / unit_V / 4), 13);
  });

  it('refuses ions that are none, not neutral, or negative', () => {
    const ask = (ions: Parameters<typeof flat>[0]) => () => flat(ions, 1);
    expect(ask([])).toThrow(/charges_mol_m3/);
    expect(ask([{ valence: 1, concentration_mol_m3: 1 }])).toThrow(/neutral/);
    expect(ask([{ valence: 1, concentration_mol_m3: -1 }])).toThrow(/concentration_mol_m3/);
  });
});

describe('sphereEffectivePotential', () => {
  it.each(numbers.bellLevineMcCartney)(
    'is Bell, Levine & McCartney’s for 1:1: y $reducedPotential, κa $kappaRadius',
    (row) => {
      const t = Math.tanh(row.reducedPotential / 4);
      // At κa of 0.1 the root of a small difference takes two digits.
      expect((4 * t * curvatureFactor(row.kappaRadius, t)) / row.effectivePotential).toBeCloseTo(1, 12);
      const ours_V = sphereEffectivePotential({
        ions: salt(1, 1),
        potential_V: row.reducedPotential * unit_V,
        temperature_K,
        kappaRadius: row.kappaRadius,
      });
      expect(ours_V / unit_V / row.effectivePotential).toBeCloseTo(1, 11);
    },
  );

  // Largest deviation from the equation solved around one sphere, up to 100 mV: as found, rounded up. The formula is
  // a first-order one in 1/κa made for symmetric salts, so it must worsen with smaller κa and with unlike valences.
  it.each([
    {
      name: '1:1',
      bounds: [
        [0.3, 0.034],
        [1, 0.004],
        [3, 0.002],
        [10, 0.0006],
        [50, 0.00004],
      ],
    },
    {
      name: '2:1',
      bounds: [
        [0.3, 0.171],
        [1, 0.12],
        [3, 0.068],
        [10, 0.028],
        [50, 0.0065],
      ],
    },
    {
      name: '1:2',
      bounds: [
        [0.3, 0.171],
        [1, 0.12],
        [3, 0.068],
        [10, 0.028],
        [50, 0.0065],
      ],
    },
    {
      name: 'sodium with calcium',
      bounds: [
        [0.3, 0.015],
        [1, 0.026],
        [3, 0.015],
        [10, 0.0045],
        [50, 0.0008],
      ],
    },
  ])('is near the solved sphere in $name', ({ name, bounds }) => {
    for (const [kappaRadius, bound] of bounds) {
      const rows = numbers.sphere.filter((row) => row.salt === name && row.kappaRadius === kappaRadius);
      expect(rows).toHaveLength(6);
      for (const row of rows) {
        const potential_V = row.reducedPotential * unit_V;
        const ours = sphereEffectivePotential({ ions: row.ions, potential_V, temperature_K, kappaRadius }) / unit_V;
        expect(Math.abs(ours / row.effectivePotential - 1)).toBeLessThan(bound);
      }
    }
  });

  it('exceeds the flat one, at most twice, the less the larger the sphere', () => {
    const at = (kappaRadius: number) =>
      sphereEffectivePotential({ ions: salt(1, 1), potential_V: 0.5, temperature_K, kappaRadius }) / unit_V;
    expect(at(1e9)).toBeCloseTo(flat(salt(1, 1), 0.5 / unit_V), 7);
    expect(at(1)).toBeGreaterThan(at(10));
    expect(at(1e-6)).toBeLessThan(8);
    expect(() => at(0)).toThrow(/kappaRadius/);
  });
});
