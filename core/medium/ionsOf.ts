import type { IonState } from '../evaluation';
import { mol_m3_from_mM } from '../quantities/convert';
import type { SaltDose } from '../scenario/scenario';
import { mustBeFinite, mustNotBeNegative } from '../validity';
import { ionicStrength } from './ionicStrength';
import { ionSpeciesOf } from './ionSpecies';
import { protonation } from './protonation';
import { findSalt, type SaltIon } from './salts';
import { waterHardness } from './waterHardness';
import { waterIonProduct } from './waterIonProduct';

export interface IonSources {
  readonly salts: readonly SaltDose[];
  readonly hardness_dH: number;
  readonly pH: number | null;
  /** Moves the ion product of water; 25 °C when absent. */
  readonly temperature_K?: number;
}

export interface Ions {
  readonly ions: readonly IonState[];
  readonly ionicStrength_mol_m3: number;
}

/** What hardness is made of: calcium stands for magnesium too, and natural water carries it as bicarbonate. */
const hardnessIons: readonly SaltIon[] = [
  { species: 'calcium', form: 0, perFormula: 1 },
  { species: 'carbonate', form: 1, perFormula: 2 },
];

/** Ions that the pH alone decides, once it is known. */
const setByPH = new Set(['proton', 'hydroxide']);

/** Sums of products round at the 16th digit; a charge below this share of all charges is such a rest. */
const ROUNDING = 1e-12;

const MOL_m3_PER_MOL_L = 1000;

/**
 * The ions of a medium [mol/m³], each kind once, and their ionic strength; the bulk is electrically neutral.
 *
 * - Salts fall apart completely. The same ion from several salts is added up.
 * - Hardness: calcium with two bicarbonates, see {@link waterHardness}.
 * - With a pH, H⁺ and OH⁻ follow from it (and pK_w) alone, whatever acids and bases are dosed; those bring their other
 *   ion. Weak acids and bases take the forms that the pH asks for, see {@link protonation}. Charge still missing is
 *   made up by one unnamed monovalent ion: the counter-ion of whatever set the pH, which is not in the list.
 *   So 10 mM NaOH at pH 12 needs none, and 10 mM NaOH at pH 9 has reacted with 9.99 mM of an unnamed acid.
 * - Without a pH, everything stays as its formula is written: neutral by itself.
 *
 * Valid   concentrations for activities; pH as −log₁₀ of the concentration, off by 0.1 at 0.1 mol/L.
 * Throws  RangeError for an unknown salt, or a concentration or hardness below zero.
 */
export function ionsOf({ salts, hardness_dH, pH, temperature_K = 298.15 }: IonSources): Ions {
  const byName = new Map<string, IonState>();
  const add = (name: string, valence: number, concentration_mol_m3: number): void => {
    if (valence === 0 || concentration_mol_m3 === 0) return;
    const before_mol_m3 = byName.get(name)?.concentration_mol_m3 ?? 0;
    byName.set(name, { name, valence, concentration_mol_m3: before_mol_m3 + concentration_mol_m3 });
  };
  const addAll = (parts: readonly SaltIon[], dose_mol_m3: number): void => {
    for (const { species, form, perFormula } of parts) {
      if (pH !== null && setByPH.has(species)) continue;
      const { forms, pKa } = ionSpeciesOf(species);
      const shares = pH === null ? forms.map((_, index) => (index === form ? 1 : 0)) : protonation(pKa, pH);
      forms.forEach(({ name, valence }, index) => {
        add(name, valence, dose_mol_m3 * perFormula * shares[index]);
      });
    }
  };

  for (const { salt, concentration_mM } of salts) {
    mustNotBeNegative('ionsOf', { concentration_mM });
    const found = findSalt(salt);
    if (found === undefined) throw new RangeError(`ionsOf: salt "${salt}" is not in the list`);
    addAll(found.ions, mol_m3_from_mM(concentration_mM));
  }
  addAll(hardnessIons, waterHardness(hardness_dH));
  if (pH !== null) {
    mustBeFinite('ionsOf', { pH });
    add('H⁺', 1, MOL_m3_PER_MOL_L * 10 ** -pH);
    add('OH⁻', -1, MOL_m3_PER_MOL_L * 10 ** (pH - waterIonProduct(temperature_K)));
  }

  const named = [...byName.values()];
  const charge_mol_m3 = named.reduce((sum, one) => sum + one.valence * one.concentration_mol_m3, 0);
  const charges_mol_m3 = named.reduce((sum, one) => sum + Math.abs(one.valence) * one.concentration_mol_m3, 0);
  if (Math.abs(charge_mol_m3) > ROUNDING * charges_mol_m3) {
    const [name, valence] =
      charge_mol_m3 > 0 ? (['Unnamed anion 1−', -1] as const) : (['Unnamed cation 1+', 1] as const);
    add(name, valence, Math.abs(charge_mol_m3));
  }
  const ions = [...byName.values()];
  return { ions, ionicStrength_mol_m3: ionicStrength(ions) };
}
