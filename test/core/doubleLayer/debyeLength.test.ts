import { describe, expect, it } from 'vitest';
import { debyeLength } from '../../../core/doubleLayer/debyeLength';
import { ionicStrength } from '../../../core/medium/ionicStrength';
import { K_from_degC, mol_m3_from_mM, nm_from_m } from '../../../core/quantities/convert';
import { debyeLengths } from '../../published/israelachvili2011DoubleLayer';
import numbers from '../../reference/doubleLayer/numbers.json';

const { relativePermittivity } = debyeLengths;
const temperature_K = K_from_degC(debyeLengths.temperature_degC);
const saltWater = (ionicStrength_mol_m3: number) => ({ ionicStrength_mol_m3, relativePermittivity, temperature_K });

describe('debyeLength against 0.304/√c and its kin in water at 25 °C (Israelachvili 2011, from memory)', () => {
  // Half of the last of three digits, and the permittivity that the author took is not known to more than that.
  it.each(debyeLengths.rows)('$salt: $coefficient/√c', ({ valences, parts, coefficient }) => {
    for (const concentration_mM of [0.1, 10, 100]) {
      const ions = valences.map((valence, i) => ({
        name: String(valence),
        valence,
        concentration_mol_m3: mol_m3_from_mM(concentration_mM) * parts[i],
      }));
      const ours_nm = nm_from_m(debyeLength(saltWater(ionicStrength(ions))));
      expect(Math.abs(ours_nm / (coefficient / Math.sqrt(concentration_mM / 1000)) - 1)).toBeLessThan(0.003);
    }
  });
});

describe('debyeLength obeys its law', () => {
  it.each(numbers.lengths)('equals 30-digit arithmetic for $valence:$valence, $relativePermittivity', (row) => {
    const ionicStrength_mol_m3 = row.valence ** 2 * row.concentration_mol_m3;
    expect(debyeLength({ ...row, ionicStrength_mol_m3 }) / row.debyeLength_m).toBeCloseTo(1, 14);
  });

  it('halves when the salt is quadrupled, and is shorter in a less polar medium', () => {
    expect(debyeLength(saltWater(40)) / debyeLength(saltWater(10))).toBeCloseTo(0.5, 14);
    expect(debyeLength({ ...saltWater(10), relativePermittivity: 20 })).toBeLessThan(debyeLength(saltWater(10)));
  });

  it.each([0, -1, Number.NaN, Infinity])('refuses an ionic strength of %s, naming the input', (bad) => {
    expect(() => debyeLength(saltWater(bad))).toThrow(/debyeLength: ionicStrength_mol_m3/);
  });
});
