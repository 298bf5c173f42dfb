import { describe, expect, it } from 'vitest';
import { waterDensity } from '../../../core/medium/waterDensity';
import { waterHardness } from '../../../core/medium/waterHardness';
import { waterIonProduct } from '../../../core/medium/waterIonProduct';
import { waterPermittivity } from '../../../core/medium/waterPermittivity';
import { waterViscosity } from '../../../core/medium/waterViscosity';
import { K_from_degC, mPa_s_from_Pa_s } from '../../../core/quantities/convert';
import { germanDegree } from '../../published/waterHardnessDin';
import { waterIonProductTable } from '../../published/waterIonProductHarned1958';
import { waterDensityTable } from '../../published/waterKell1975';
import { waterViscosityTable } from '../../published/waterKestin1978';
import { waterPermittivityTable } from '../../published/waterMalmbergMaryott1956';

describe('waterPermittivity against Malmberg & Maryott 1956 (from memory), within their 0.1 %', () => {
  it.each(waterPermittivityTable.rows)('$temperature_degC °C: $relativePermittivity', (row) => {
    const ours = waterPermittivity(K_from_degC(row.temperature_degC));
    expect(Math.abs(ours / row.relativePermittivity - 1)).toBeLessThan(waterPermittivityTable.tolerance);
  });
});

describe('waterViscosity against Kestin, Sokolov & Wakeham 1978 (from memory), within 0.5 %', () => {
  it.each(waterViscosityTable.rows)('$temperature_degC °C: $viscosity_mPa_s mPa s', (row) => {
    const ours_mPa_s = mPa_s_from_Pa_s(waterViscosity(K_from_degC(row.temperature_degC)));
    expect(Math.abs(ours_mPa_s / row.viscosity_mPa_s - 1)).toBeLessThan(waterViscosityTable.tolerance);
  });
});

describe('waterDensity against Kell 1975 (from memory), within half a unit of the last digit', () => {
  it.each(waterDensityTable.rows)('$temperature_degC °C: $density_kg_m3 kg/m³', (row) => {
    const ours_kg_m3 = waterDensity(K_from_degC(row.temperature_degC));
    expect(Math.abs(ours_kg_m3 - row.density_kg_m3)).toBeLessThan(waterDensityTable.tolerance_kg_m3);
  });
});

describe('waterIonProduct against Harned & Owen 1958 (from memory), within the 0.01 of the fit', () => {
  it.each(waterIonProductTable.rows)('$temperature_degC °C: $pKw', (row) => {
    const ours = waterIonProduct(K_from_degC(row.temperature_degC));
    expect(Math.abs(ours - row.pKw)).toBeLessThan(waterIonProductTable.tolerance);
  });
});

describe('waterHardness against the definition of the German degree', () => {
  it.each(germanDegree.rows)('$hardness_dH °dH: $alkalineEarth_mol_m3 mmol/L', (row) => {
    const ours_mol_m3 = waterHardness(row.hardness_dH);
    expect(Math.abs(ours_mol_m3 / row.alkalineEarth_mol_m3 - 1)).toBeLessThan(germanDegree.tolerance);
  });

  it('refuses a negative hardness, naming it', () => {
    expect(() => waterHardness(-1)).toThrow(/hardness_dH/);
  });
});

describe('water between 0 and 100 °C', () => {
  const each_K = Array.from({ length: 101 }, (_, degrees) => K_from_degC(degrees));

  it('is densest at 4 °C', () => {
    const densest_K = each_K.reduce((best, next) => (waterDensity(next) > waterDensity(best) ? next : best));
    expect(densest_K).toBe(K_from_degC(4));
  });

  it.each([
    ['permittivity', waterPermittivity],
    ['viscosity', waterViscosity],
    ['ion product exponent', waterIonProduct],
  ])('%s falls at every step', (_, law) => {
    for (let index = 1; index < each_K.length; index++) {
      expect(law(each_K[index])).toBeLessThan(law(each_K[index - 1]));
    }
  });

  it.each([
    ['waterPermittivity', waterPermittivity],
    ['waterViscosity', waterViscosity],
    ['waterDensity', waterDensity],
    ['waterIonProduct', waterIonProduct],
  ])('%s refuses a temperature that is no number', (name, law) => {
    expect(() => law(Number.NaN)).toThrow(new RegExp(name));
  });
});
