import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hydrodynamicFactor } from '../../../core/coagulation/hydrodynamicFactor';
import cases from '../../reference/rates/cases.json';
import numbers from '../../reference/rates/numbers.json';
import { deviation } from './closedForms';

describe('hydrodynamicFactor, Honig, Roebersen & Wiersema 1971', () => {
  it.each(cases.hydrodynamic)('$id: the formula and its own error (1e-6)', (row) => {
    const ours = hydrodynamicFactor(row.gapOverRadius);
    expect(deviation(ours, row.honig)).toBeLessThan(1e-6);
    expect(ours / row.exactSeries - 1).toBeCloseTo(row.fitError, 6);
  });

  it.each(numbers.hydrodynamic)('x = $gapOverRadius: within 3.1 % of the exact series, Brenner 1961', (row) => {
    expect(deviation(hydrodynamicFactor(row.gapOverRadius), row.exact)).toBeLessThan(0.031);
  });

  it('goes to 1/2x at contact and to 1 far away', () => {
    expect(2e-9 * hydrodynamicFactor(1e-9)).toBeCloseTo(1, 7);
    expect(hydrodynamicFactor(1e9)).toBeCloseTo(1, 7);
  });

  it('only ever slows, and slows more the nearer', () => {
    const gaps = fc.double({ min: 1e-12, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(gaps, fc.double({ min: 1.001, max: 100, noNaN: true }), (x, farther) => {
        expect(hydrodynamicFactor(x)).toBeGreaterThan(hydrodynamicFactor(x * farther));
        expect(hydrodynamicFactor(x * farther)).toBeGreaterThan(1);
      }),
    );
  });
});
