import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import * as exported from '../../../core/quantities/convert';

const convert = { ...exported };

describe('conversions are exact at decimal inputs', () => {
  it.each<[keyof typeof convert, number, number]>([
    ['m_from_nm', 240, 2.4e-7],
    ['m_from_nm', 0.1, 1e-10],
    ['nm_from_m', 2.4e-7, 240],
    ['m_from_mm', 100, 0.1],
    ['mm_from_m', 0.1, 100],
    ['m_from_um', 0.07, 7e-8],
    ['um_from_m', 7e-8, 0.07],
    ['V_from_mV', -38, -0.038],
    ['mV_from_V', -0.0257, -25.7],
    ['K_from_degC', 25, 298.15],
    ['K_from_degC', -20.3, 252.85],
    ['degC_from_K', 298.15, 25],
    ['degC_from_K', 252.85, -20.3],
    ['mol_m3_from_mM', 10, 10],
    ['mM_from_mol_m3', 0.1, 0.1],
    ['kg_m2_from_mg_m2', 1.5, 1.5e-6],
    ['mg_m2_from_kg_m2', 1.5e-6, 1.5],
    ['kg_mol_from_g_mol', 5600, 5.6],
    ['g_mol_from_kg_mol', 5.6, 5600],
    ['Pa_s_from_mPa_s', 0.89, 0.00089],
    ['mPa_s_from_Pa_s', 0.00089, 0.89],
    ['s_from_days', 30.4375, 2_629_800],
    ['days_from_s', 8640, 0.1],
    ['J_from_zJ', 45.3, 4.53e-20],
    ['zJ_from_J', 4.53e-20, 45.3],
    ['fraction_from_percent', 7, 0.07],
    ['percent_from_fraction', 0.07, 7],
  ])('%s(%d) is %d', (name, given, expected) => {
    expect(convert[name](given)).toBe(expected);
  });

  const pairs: readonly [keyof typeof convert, keyof typeof convert][] = [
    ['m_from_nm', 'nm_from_m'],
    ['m_from_mm', 'mm_from_m'],
    ['m_from_um', 'um_from_m'],
    ['V_from_mV', 'mV_from_V'],
    ['kg_m2_from_mg_m2', 'mg_m2_from_kg_m2'],
    ['kg_mol_from_g_mol', 'g_mol_from_kg_mol'],
    ['Pa_s_from_mPa_s', 'mPa_s_from_Pa_s'],
    ['J_from_zJ', 'zJ_from_J'],
    ['fraction_from_percent', 'percent_from_fraction'],
    ['K_from_degC', 'degC_from_K'],
    ['s_from_days', 'days_from_s'],
  ];
  it.each(pairs)('%s and %s undo each other for ten typed digits', (there, back) => {
    fc.assert(
      fc.property(fc.integer({ min: -1_000_000_000, max: 1_000_000_000 }), (millionths) => {
        const typed = millionths / 1e6;
        expect(convert[back](convert[there](typed))).toBe(typed === 0 ? 0 : typed);
      }),
    );
  });

  it.each(Object.entries(convert))('%s refuses NaN', (_, one) => {
    expect(() => one(Number.NaN)).toThrow(RangeError);
  });

  it('lets an infinite time stay infinite', () => {
    expect(convert.days_from_s(Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
  });
});
