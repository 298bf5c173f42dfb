import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ionSpecies, ionSpeciesOf } from '../../../core/medium/ionSpecies';
import { ionsOf } from '../../../core/medium/ionsOf';
import { protonation } from '../../../core/medium/protonation';
import { findSalt, salts } from '../../../core/medium/salts';

const dose = fc.record({
  salt: fc.constantFrom(...salts.map(({ id }) => id)),
  concentration_mM: fc.double({ min: 0, max: 1000, noNaN: true }),
});
const doses = fc.array(dose, { maxLength: 5 });
const hardness = fc.double({ min: 0, max: 60, noNaN: true });
const acidity = fc.option(fc.double({ min: 0, max: 14, noNaN: true }), { nil: null });

const idsInUse = `generic-1-1 generic-2-1 generic-1-2 generic-2-2 generic-3-1 sodium-chloride potassium-chloride
  lithium-chloride ammonium-chloride sodium-nitrate potassium-nitrate calcium-chloride magnesium-chloride
  barium-chloride zinc-chloride calcium-nitrate magnesium-sulfate sodium-sulfate potassium-sulfate
  aluminium-chloride lanthanum-nitrate sodium-bicarbonate sodium-carbonate trisodium-phosphate sodium-citrate
  tetrasodium-pyrophosphate sodium-tripolyphosphate sodium-acetate sodium-polyacrylate ammonium-polyacrylate
  hydrochloric-acid nitric-acid acetic-acid sodium-hydroxide potassium-hydroxide ammonia amp
  dimethylethanolamine triethanolamine triethylamine`;

const concentration = (found: ReturnType<typeof ionsOf>, name: string): number =>
  found.ions.find((ion) => ion.name === name)?.concentration_mol_m3 ?? 0;

const alone = { hardness_dH: 0, pH: null };

describe('ionsOf, whatever is dosed', () => {
  it('leaves the bulk electrically neutral', () => {
    fc.assert(
      fc.property(doses, hardness, acidity, (dosed, hardness_dH, pH) => {
        const { ions } = ionsOf({ salts: dosed, hardness_dH, pH });
        const charge = ions.reduce((sum, ion) => sum + ion.valence * ion.concentration_mol_m3, 0);
        const charges = ions.reduce((sum, ion) => sum + Math.abs(ion.valence) * ion.concentration_mol_m3, 0);
        return Math.abs(charge) <= 1e-11 * charges;
      }),
    );
  });

  it('gives each ion once, charged and above zero', () => {
    fc.assert(
      fc.property(doses, hardness, acidity, (dosed, hardness_dH, pH) => {
        const { ions } = ionsOf({ salts: dosed, hardness_dH, pH });
        const names = new Set(ions.map(({ name }) => name));
        return names.size === ions.length && ions.every((ion) => ion.valence !== 0 && ion.concentration_mol_m3 > 0);
      }),
    );
  });

  it('adds ionic strengths up when the salts are added up, as long as no pH moves them', () => {
    fc.assert(
      fc.property(doses, doses, hardness, (some, others, hardness_dH) => {
        const whole = ionsOf({ salts: [...some, ...others], hardness_dH, pH: null }).ionicStrength_mol_m3;
        const parts =
          ionsOf({ salts: some, hardness_dH, pH: null }).ionicStrength_mol_m3 +
          ionsOf({ salts: others, hardness_dH: 0, pH: null }).ionicStrength_mol_m3;
        return Math.abs(whole - parts) <= 1e-11 * Math.max(whole, parts);
      }),
    );
  });

  it('does not depend on the order of the salts', () => {
    fc.assert(
      fc.property(doses, acidity, (dosed, pH) => {
        const forwards = ionsOf({ salts: dosed, hardness_dH: 0, pH }).ionicStrength_mol_m3;
        const backwards = ionsOf({ salts: [...dosed].reverse(), hardness_dH: 0, pH }).ionicStrength_mol_m3;
        return Math.abs(forwards - backwards) <= 1e-11 * Math.max(forwards, backwards);
      }),
    );
  });
});

describe('ionic strength of 1 mM, by hand from ½ Σ c z²', () => {
  it.each([
    ['sodium-chloride', 1],
    ['calcium-chloride', 3],
    ['sodium-sulfate', 3],
    ['magnesium-sulfate', 4],
    ['aluminium-chloride', 6],
    ['lanthanum-nitrate', 6],
    ['trisodium-phosphate', 6],
    ['tetrasodium-pyrophosphate', 10],
    ['sodium-tripolyphosphate', 15],
    ['generic-1-1', 1],
    ['generic-2-1', 3],
    ['generic-1-2', 3],
    ['generic-2-2', 4],
    ['generic-3-1', 6],
  ])('%s: %d mM', (salt, expected) => {
    const found = ionsOf({ salts: [{ salt, concentration_mM: 1 }], ...alone });
    expect(found.ionicStrength_mol_m3).toBeCloseTo(expected, 12);
  });
});

describe('every salt as written', () => {
  it.each(salts.map(({ id }) => id))('%s is neutral and names forms that exist', (id) => {
    const charge = findSalt(id)?.ions.reduce((sum, { species, form, perFormula }) => {
      return sum + ionSpeciesOf(species).forms[form].valence * perFormula;
    }, 0);
    expect(charge).toBe(0);
  });

  it.each(idsInUse.split(/\s+/))('the id %s, stored in files, is still there', (id) => {
    expect(findSalt(id)?.id).toBe(id);
  });

  it('has an id of its own, in kebab case', () => {
    expect(new Set(salts.map(({ id }) => id)).size).toBe(salts.length);
    for (const { id } of salts) expect(id).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
  });

  it('every ion falls by one charge per step, with rising pKa, and is used by a salt', () => {
    const used = new Set(salts.flatMap(({ ions }) => ions.map(({ species }) => species)));
    for (const { key, forms, pKa } of ionSpecies) {
      expect(used).toContain(key);
      expect(pKa).toHaveLength(forms.length - 1);
      forms.slice(1).forEach((form, index) => {
        expect(form.valence).toBe(forms[index].valence - 1);
      });
      expect([...pKa].sort((a, b) => a - b)).toEqual(pKa);
    }
  });
});

describe('merging and hardness', () => {
  it('adds the same ion from several salts', () => {
    const found = ionsOf({
      salts: [
        { salt: 'sodium-chloride', concentration_mM: 2 },
        { salt: 'potassium-chloride', concentration_mM: 3 },
      ],
      ...alone,
    });
    expect(concentration(found, 'Cl⁻')).toBe(5);
    expect(found.ions).toHaveLength(3);
  });

  it('10 °dH is 1.783 mM calcium with twice as much bicarbonate', () => {
    const found = ionsOf({ salts: [], hardness_dH: 10, pH: null });
    expect(concentration(found, 'Ca²⁺')).toBeCloseTo(1.783, 3);
    expect(concentration(found, 'HCO₃⁻')).toBeCloseTo(3.566, 3);
    expect(found.ionicStrength_mol_m3).toBeCloseTo(3 * 1.7832, 3);
  });
});

describe('pH', () => {
  it('pure water at pH 7 and 25 °C has an ionic strength of 1e-7 mol/L', () => {
    const found = ionsOf({ salts: [], hardness_dH: 0, pH: 7 });
    // pK_w is 13.995, not 14: half a per cent more OH⁻ than H⁺
    expect(found.ionicStrength_mol_m3 / 1e-4).toBeCloseTo(1, 1);
  });

  it('pH 3 without any acid in the list brings 1 mM of an unnamed anion', () => {
    const found = ionsOf({ salts: [], hardness_dH: 0, pH: 3 });
    expect(concentration(found, 'H⁺')).toBeCloseTo(1, 12);
    expect(concentration(found, 'Unnamed anion 1−')).toBeCloseTo(1, 6);
  });

  it('10 mM hydrochloric acid at pH 2 is counted once', () => {
    const found = ionsOf({ salts: [{ salt: 'hydrochloric-acid', concentration_mM: 10 }], hardness_dH: 0, pH: 2 });
    expect(found.ionicStrength_mol_m3).toBeCloseTo(10, 6);
    expect(concentration(found, 'Unnamed anion 1−')).toBe(0);
  });

  it('10 mM caustic soda at pH 9 has been neutralised by an unnamed acid', () => {
    const found = ionsOf({ salts: [{ salt: 'sodium-hydroxide', concentration_mM: 10 }], hardness_dH: 0, pH: 9 });
    expect(concentration(found, 'Unnamed anion 1−')).toBeCloseTo(9.99, 3);
    expect(found.ionicStrength_mol_m3).toBeCloseTo(10, 3);
  });

  it('ammonia is half protonated at its pKa', () => {
    const found = ionsOf({ salts: [{ salt: 'ammonia', concentration_mM: 10 }], hardness_dH: 0, pH: 9.25 });
    expect(concentration(found, 'NH₄⁺')).toBeCloseTo(5, 10);
  });

  it('phosphate near pH 9.8 is nearly all doubly charged', () => {
    const found = ionsOf({ salts: [{ salt: 'trisodium-phosphate', concentration_mM: 1 }], hardness_dH: 0, pH: 9.8 });
    expect(concentration(found, 'HPO₄²⁻')).toBeGreaterThan(0.99);
  });

  it('the shares of the forms add up to one, from pH −20 to 40', () => {
    for (const { pKa } of ionSpecies) {
      for (let pH = -20; pH <= 40; pH += 5) {
        const shares = protonation(pKa, pH);
        expect(shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
      }
    }
  });
});

describe('refusals', () => {
  it('names a salt that is not in the list', () => {
    expect(() => ionsOf({ salts: [{ salt: 'unobtainium', concentration_mM: 1 }], ...alone })).toThrow(/unobtainium/);
    expect(findSalt('unobtainium')).toBeUndefined();
  });

  it.each([-1, Number.NaN])('refuses a dose of %s', (concentration_mM) => {
    expect(() => ionsOf({ salts: [{ salt: 'sodium-chloride', concentration_mM }], ...alone })).toThrow(
      /concentration_mM/,
    );
  });
});
