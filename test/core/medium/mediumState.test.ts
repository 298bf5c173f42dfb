import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { materials } from '../../../core/materials/catalogue';
import { mediumShares } from '../../../core/medium/mediumShares';
import { type MediumInput, mediumState } from '../../../core/medium/mediumState';
import { viscosityIsKnown } from '../../../core/medium/mediumViscosity';
import { salts } from '../../../core/medium/salts';
import { volumeFractions } from '../../../core/medium/volumeFractions';
import type { MediumRecipe } from '../../../core/scenario/scenario';
import { permittivityOfMixtures, viscosityOfMixtures } from '../../published/waterEthanol';

const recipe = (parts: Readonly<Record<string, number>>, measured: Partial<MediumRecipe> = {}): MediumRecipe => ({
  components: Object.entries(parts).map(([material, volumeParts]) => ({ material, volumeParts })),
  measuredRelativePermittivity: null,
  measuredViscosity_mPa_s: null,
  measuredDensity_kg_m3: null,
  ...measured,
});

const input = (of: MediumRecipe, change: Partial<MediumInput> = {}): MediumInput => ({
  recipe: of,
  temperature_degC: 25,
  salts: [],
  hardness_dH: 0,
  pH: null,
  ...change,
});

const codes = (of: MediumInput) => mediumState(of).caveats.map(({ code }) => code);

describe('mediumState of water at 25 °C', () => {
  const { state, caveats } = mediumState(input(recipe({ water: 1 }), { pH: 8 }));

  it('has the handbook values', () => {
    expect(state.relativePermittivity).toBeCloseTo(78.3, 2);
    expect(state.viscosity_Pa_s).toBeCloseTo(0.89e-3, 6);
    expect(state.density_kg_m3).toBeCloseTo(997.05, 1);
    expect(state.refractiveIndex).toBeCloseTo(1.3325, 10);
    expect(state.temperature_K).toBe(298.15);
    expect(state.measured).toEqual([]);
  });

  it('has no doubts', () => {
    expect(caveats).toEqual([]);
  });
});

describe('measured values', () => {
  it('win over the rules, and silence their caveats', () => {
    const measured = {
      measuredRelativePermittivity: 55,
      measuredViscosity_mPa_s: 3,
      measuredDensity_kg_m3: 1040,
    };
    const { state, caveats } = mediumState(input(recipe({ water: 1, 'propylene-glycol': 1 }, measured), { pH: 8 }));
    expect(state.relativePermittivity).toBe(55);
    expect(state.viscosity_Pa_s).toBe(0.003);
    expect(state.density_kg_m3).toBe(1040);
    expect(state.measured).toEqual(['relativePermittivity', 'viscosity_Pa_s', 'density_kg_m3']);
    expect(caveats).toEqual([]);
  });
});

describe('mixtures', () => {
  it('only ratios count', () => {
    const one = mediumState(input(recipe({ toluene: 1, 'butyl-acetate': 3 }))).state;
    const other = mediumState(input(recipe({ toluene: 25, 'butyl-acetate': 75 }))).state;
    expect(other).toEqual(one);
  });

  it('says which numbers are estimated', () => {
    expect(codes(input(recipe({ toluene: 1, 'butyl-acetate': 3 })))).toEqual([
      'permittivity-mixing',
      'viscosity-mixing',
    ]);
  });

  it('a dissolved resin needs a measured viscosity', () => {
    expect(codes(input(recipe({ 'white-spirit': 1, alkyd: 1 })))).toContain('viscosity-without-resin');
  });

  it('density is additive by volume', () => {
    const { state } = mediumState(input(recipe({ toluene: 1, 'butyl-acetate': 1 })));
    expect(state.density_kg_m3).toBeCloseTo((863.9 + 875.9) / 2, 10);
  });
});

describe('mixing rules against aqueous ethanol at 25 °C (from memory): what the caveats promise', () => {
  /** Parts by volume before mixing, from parts by mass. */
  const byMass = (ethanol_percent: number) =>
    input(recipe({ ethanol: ethanol_percent / 785.9, water: (100 - ethanol_percent) / 997.05 }), { pH: 7 });

  it.each(permittivityOfMixtures.rows)('$ethanol_percent %: about a tenth below $relativePermittivity', (row) => {
    const ratio = mediumState(byMass(row.ethanol_percent)).state.relativePermittivity / row.relativePermittivity;
    expect(ratio).toBeGreaterThan(0.87);
    expect(ratio).toBeLessThan(1);
  });

  it.each(viscosityOfMixtures.rows)(
    '$ethanol_percent %: two to three times thinner than $viscosity_mPa_s mPa s',
    (row) => {
      const thicker = row.viscosity_mPa_s / 1000 / mediumState(byMass(row.ethanol_percent)).state.viscosity_Pa_s;
      expect(thicker).toBeGreaterThan(2);
      expect(thicker).toBeLessThan(3);
    },
  );
});

describe('what a medium holds', () => {
  const twiceWater: MediumRecipe = {
    ...recipe({}),
    components: [
      { material: 'water', volumeParts: 2 },
      { material: 'ethanol', volumeParts: 0 },
      { material: 'glycerol', volumeParts: 1 },
      { material: 'water', volumeParts: 1 },
    ],
  };

  it('volumeFractions keeps the order of the recipe and adds up to one', () => {
    expect(volumeFractions(twiceWater)).toEqual([0.5, 0, 0.25, 0.25]);
    expect(mediumState(input(twiceWater)).volumeFractions).toEqual([0.5, 0, 0.25, 0.25]);
  });

  it('mediumShares leaves out what is not there and counts a material once', () => {
    const shares = mediumShares(twiceWater).map(({ material, volumeFraction }) => [material.id, volumeFraction]);
    expect(shares).toEqual([
      ['water', 0.75],
      ['glycerol', 0.25],
    ]);
  });

  it('refuses an unknown material, negative parts and nothing at all', () => {
    expect(() => mediumShares(recipe({ unobtainium: 1 }))).toThrow(/unobtainium/);
    expect(() => volumeFractions(recipe({ water: -1 }))).toThrow(/volumeParts/);
    expect(() => volumeFractions(recipe({ water: 0 }))).toThrow(/totalParts/);
  });
});

describe('caveats of ions', () => {
  const saltWater = (salt: string, concentration_mM: number) =>
    input(recipe({ water: 1 }), { pH: 7, salts: [{ salt, concentration_mM }] });

  it('high ionic strength', () => {
    expect(codes(saltWater('sodium-chloride', 400))).toEqual([]);
    expect(codes(saltWater('sodium-chloride', 600))).toEqual(['ionic-strength-high']);
  });

  it('three charges and more', () => {
    expect(codes(saltWater('generic-3-1', 1))).toEqual(['highly-charged-ions']);
    expect(codes(saltWater('generic-2-2', 1))).toEqual([]);
  });

  it('salt in a medium of low permittivity is mostly pairs, with the Bjerrum length', () => {
    const { caveats } = mediumState(
      input(recipe({ toluene: 1 }), { salts: [{ salt: 'generic-1-1', concentration_mM: 1 }] }),
    );
    expect(caveats.map(({ code }) => code)).toEqual(['ion-pairs']);
    // e²/(4π ε_r ε₀ kT) is 56.0 nm at 25 °C over ε_r 2.374
    expect(caveats[0].message).toContain('23.6 nm');
  });

  it('water without pH, and pH without water', () => {
    expect(codes(input(recipe({ water: 1 })))).toEqual(['ph-missing']);
    const dry = input(recipe({ toluene: 1 }), { pH: 7 });
    expect(codes(dry)).toEqual(['ph-without-water']);
    expect(mediumState(dry).state.ions).toEqual([]);
  });

  it('tells what a salt does that is not counted, once', () => {
    const twice = input(recipe({ water: 1 }), {
      pH: 9,
      salts: [
        { salt: 'sodium-polyacrylate', concentration_mM: 5 },
        { salt: 'sodium-polyacrylate', concentration_mM: 5 },
      ],
    });
    expect(codes(twice)).toEqual(['salt-sodium-polyacrylate']);
  });

  it('frost: water laws and ion product are continued', () => {
    expect(codes(input(recipe({ water: 1 }), { temperature_degC: -10, pH: 8 }))).toEqual([
      'water-permittivity-range',
      'water-viscosity-range',
      'water-density-range',
      'ion-product-range',
    ]);
  });
});

describe('any recipe of the catalogue', () => {
  const media = materials.filter(({ kind }) => kind === 'solvent' || kind === 'polymer').map(({ id }) => id);
  const anyRecipe = fc
    .dictionary(fc.constantFrom(...media), fc.double({ min: 0.01, max: 100, noNaN: true }), { minKeys: 1, maxKeys: 4 })
    .map((parts) => recipe(parts));

  it('has finite positive properties or needs a measured viscosity; no caveat is said twice', () => {
    fc.assert(
      fc.property(
        anyRecipe,
        fc.double({ min: -30, max: 150, noNaN: true }),
        fc.option(fc.double({ min: 0, max: 14, noNaN: true }), { nil: null }),
        fc.constantFrom(...salts.map(({ id }) => id)),
        (of, temperature_degC, pH, salt) => {
          const asked = input(of, { temperature_degC, pH, salts: [{ salt, concentration_mM: 3 }], hardness_dH: 5 });
          if (!viscosityIsKnown(of)) {
            expect(() => mediumState(asked)).toThrow(/viscosity/);
            return;
          }
          const { state, caveats } = mediumState(asked);
          for (const value of [
            state.relativePermittivity,
            state.refractiveIndex,
            state.density_kg_m3,
            state.viscosity_Pa_s,
            state.ionicStrength_mol_m3,
          ]) {
            expect(Number.isFinite(value) && value > 0).toBe(true);
          }
          expect(new Set(caveats.map(({ code }) => code)).size).toBe(caveats.length);
        },
      ),
    );
  });

  it('a resin alone is refused without a measured viscosity, and taken with one', () => {
    expect(viscosityIsKnown(recipe({ alkyd: 1 }))).toBe(false);
    const measured = recipe({ alkyd: 1 }, { measuredViscosity_mPa_s: 5000 });
    expect(viscosityIsKnown(measured)).toBe(true);
    expect(mediumState(input(measured)).state.viscosity_Pa_s).toBe(5);
  });
});
