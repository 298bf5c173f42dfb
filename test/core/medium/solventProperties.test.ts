import { describe, expect, it } from 'vitest';
import { findMaterial, materials } from '../../../core/materials/catalogue';
import type { Material } from '../../../core/materials/material';
import { lewisSquires } from '../../../core/medium/lewisSquires';
import { componentDensity, componentPermittivity, componentViscosity } from '../../../core/medium/solventProperties';
import { K_from_degC, mPa_s_from_Pa_s } from '../../../core/quantities/convert';
import { permittivityPoints, viscosityOfLiquids } from '../../published/crcLiquids';

function material(id: string): Material {
  const found = findMaterial(id);
  if (found === undefined) throw new Error(`no material ${id}`);
  return found;
}

const solvents = materials.filter(({ kind }) => kind === 'solvent');
const codes = (property: { readonly caveats: readonly { readonly code: string }[] } | null) =>
  property?.caveats.map(({ code }) => code);

describe('componentPermittivity against measured points of CRC 2014, within the 2 % of that table', () => {
  it.each(permittivityPoints.rows)('$material at $temperature_K K: $relativePermittivity', (row) => {
    const ours = componentPermittivity(material(row.material), row.temperature_K).value;
    expect(Math.abs(ours / row.relativePermittivity - 1)).toBeLessThan(permittivityPoints.tolerance);
  });
});

describe('componentViscosity away from 25 °C against CRC 2014 (from memory)', () => {
  /** What the caveat promises: 15 % in general, 45 % for glycols. */
  const promised = (id: string) => (id.endsWith('glycol') ? 0.45 : 0.15);

  it.each(viscosityOfLiquids.rows)('$material at $temperature_degC °C: $viscosity_mPa_s mPa s', (row) => {
    const ours = componentViscosity(material(row.material), K_from_degC(row.temperature_degC));
    const ours_mPa_s = mPa_s_from_Pa_s(ours?.value ?? 0);
    expect(Math.abs(ours_mPa_s / row.viscosity_mPa_s - 1)).toBeLessThan(promised(row.material));
    expect(codes(ours)).toEqual([`viscosity-temperature-${row.material}`]);
  });
});

describe('every solvent between −30 and 150 °C', () => {
  it.each(solvents.map(({ id }) => id))('%s stays positive and finite, and thins on warming', (id) => {
    const solvent = material(id);
    let before_Pa_s = Number.POSITIVE_INFINITY;
    for (let temperature_degC = -30; temperature_degC <= 150; temperature_degC += 5) {
      const temperature_K = K_from_degC(temperature_degC);
      const permittivity = componentPermittivity(solvent, temperature_K).value;
      const viscosity_Pa_s = componentViscosity(solvent, temperature_K)?.value ?? Number.NaN;
      const density_kg_m3 = componentDensity(solvent, temperature_K).value;
      expect(permittivity).toBeGreaterThan(1);
      expect(permittivity).toBeLessThan(150);
      expect(viscosity_Pa_s).toBeGreaterThan(0);
      expect(viscosity_Pa_s).toBeLessThan(before_Pa_s);
      expect(density_kg_m3).toBeGreaterThan(500);
      expect(density_kg_m3).toBeLessThan(1800);
      before_Pa_s = viscosity_Pa_s;
    }
  });

  it.each(solvents.map(({ id }) => id))('%s changes smoothly where one law hands over to another', (id) => {
    const solvent = material(id);
    const span = solvent.staticPermittivity?.temperaturePolynomial?.valid_K;
    for (const edge_K of [298.15, ...(span === undefined ? [] : [span.from, span.to])]) {
      for (const law of [componentPermittivity, componentViscosity, componentDensity]) {
        const below = law(solvent, edge_K - 0.001)?.value ?? Number.NaN;
        const above = law(solvent, edge_K + 0.001)?.value ?? Number.NaN;
        // 0.002 K moves even glycerol by less than 0.03 %
        expect(Math.abs(above / below - 1)).toBeLessThan(3e-4);
      }
    }
  });
});

describe('caveats', () => {
  it('says nothing at 25 °C where values were measured there', () => {
    const toluene = material('toluene');
    expect(codes(componentPermittivity(toluene, 298.15))).toEqual([]);
    expect(codes(componentViscosity(toluene, 298.15))).toEqual([]);
    expect(codes(componentDensity(toluene, 298.15))).toEqual([]);
  });

  it('warns when a polynomial is left', () => {
    const methanol = material('methanol'); // measured up to 293 K
    expect(codes(componentPermittivity(methanol, 298.15))).toEqual([]);
    expect(codes(componentPermittivity(methanol, 323.15))).toEqual(['permittivity-temperature-methanol']);
  });

  it('warns when the one value is used away from its temperature', () => {
    expect(codes(componentPermittivity(material('pgmea'), 323.15))).toEqual(['permittivity-temperature-pgmea']);
  });

  it('warns for water beyond 0–100 °C', () => {
    const water = material('water');
    expect(codes(componentViscosity(water, 260))).toEqual(['water-viscosity-range']);
    expect(codes(componentViscosity(water, 300))).toEqual([]);
  });

  it('takes n² where no permittivity is known, and says so', () => {
    const alcohol = material('pvoh');
    expect(componentPermittivity(alcohol, 298.15).value).toBeCloseTo(1.52 ** 2, 12);
    expect(codes(componentPermittivity(alcohol, 298.15))).toEqual(['permittivity-from-index-pvoh']);
  });
});

describe('refusals', () => {
  it('a metal is no medium', () => {
    expect(() => componentPermittivity(material('gold'), 298.15)).toThrow(/Gold/);
  });

  it('a resin has no viscosity of its own', () => {
    expect(componentViscosity(material('alkyd'), 298.15)).toBeNull();
  });

  it('lewisSquires does not go downwards', () => {
    expect(() => lewisSquires({ viscosity_Pa_s: 1e-3, reference_K: 298.15, temperature_K: 290 })).toThrow(
      /temperature_K/,
    );
  });
});
