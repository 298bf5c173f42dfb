import { describe, expect, it } from 'vitest';
import { bjerrumLength } from '../../../core/doubleLayer/bjerrumLength';
import { nm_from_m } from '../../../core/quantities/convert';
import { bjerrumLengthOfWater_nm } from '../../published/israelachvili2011DoubleLayer';
import numbers from '../../reference/doubleLayer/numbers.json';

describe('bjerrumLength', () => {
  it('is 0.71 nm in water at 25 °C (Israelachvili 2011, from memory, two digits)', () => {
    const ours_nm = nm_from_m(bjerrumLength({ relativePermittivity: 78.5, temperature_K: 298.15 }));
    expect(Math.abs(ours_nm - bjerrumLengthOfWater_nm)).toBeLessThan(0.005);
  });

  it.each(numbers.lengths)('equals 30-digit arithmetic at permittivity $relativePermittivity', (row) => {
    expect(bjerrumLength(row) / row.bjerrumLength_m).toBeCloseTo(1, 14);
  });

  it('refuses a permittivity of zero', () => {
    expect(() => bjerrumLength({ relativePermittivity: 0, temperature_K: 298 })).toThrow(/relativePermittivity/);
  });
});
