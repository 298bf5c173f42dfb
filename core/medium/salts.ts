/** A salt, acid or base as dosed. `id` is stored in users' files: never renamed, never reused. */
export interface Salt {
  readonly id: string;
  readonly name: string;
  readonly ions: readonly SaltIon[];
  /** Shown as a caveat when the salt is dosed; null when it simply falls apart into its ions. */
  readonly note: string | null;
}

export interface SaltIon {
  /** Key into `ionSpecies.ts`. */
  readonly species: string;
  /** Index of the form that the formula of the salt shows. */
  readonly form: number;
  readonly perFormula: number;
}

const ion = (species: string, perFormula = 1, form = 0): SaltIon => ({ species, form, perFormula });

const salt = (id: string, name: string, ions: readonly SaltIon[], note: string | null = null): Salt => ({
  id,
  name,
  ions,
  note,
});

const POLYMER_NOTE =
  'Dose the acid groups of the polymer (mmol per litre). Each free counter-ion is paired with one charge; the chain is not counted as an ion of high charge, and counter-ions bound to it make the true ionic strength smaller, by up to two thirds.';
const SEQUESTRANT_NOTE =
  'It binds calcium and magnesium, which lowers their free amount; this is not counted, so hardness weighs too heavily here.';
const HYDROLYSIS_NOTE =
  'The ion reacts with water and forms hydroxides except at low pH; the charge counted is that of the bare ion, so its effect is an upper limit.';
const GAS_NOTE = 'Below pH 7 it turns into carbon dioxide, which may leave; the pH then drifts upwards.';

/** Fully dissociated unless an acid or base is weak: then the pH decides, see {@link ionsOf}. */
export const salts: readonly Salt[] = [
  salt('generic-1-1', 'Any 1:1 salt', [ion('cation-1'), ion('anion-1')]),
  salt('generic-2-1', 'Any 2:1 salt (divalent cation)', [ion('cation-2'), ion('anion-1', 2)]),
  salt('generic-1-2', 'Any 1:2 salt (divalent anion)', [ion('cation-1', 2), ion('anion-2')]),
  salt('generic-2-2', 'Any 2:2 salt', [ion('cation-2'), ion('anion-2')]),
  salt('generic-3-1', 'Any 3:1 salt (trivalent cation)', [ion('cation-3'), ion('anion-1', 3)]),
  salt('sodium-chloride', 'Sodium chloride, NaCl', [ion('sodium'), ion('chloride')]),
  salt('potassium-chloride', 'Potassium chloride, KCl', [ion('potassium'), ion('chloride')]),
  salt('lithium-chloride', 'Lithium chloride, LiCl', [ion('lithium'), ion('chloride')]),
  salt('ammonium-chloride', 'Ammonium chloride, NH₄Cl', [ion('ammonium'), ion('chloride')]),
  salt('sodium-nitrate', 'Sodium nitrate, NaNO₃', [ion('sodium'), ion('nitrate')]),
  salt('potassium-nitrate', 'Potassium nitrate, KNO₃', [ion('potassium'), ion('nitrate')]),
  salt('calcium-chloride', 'Calcium chloride, CaCl₂', [ion('calcium'), ion('chloride', 2)]),
  salt('magnesium-chloride', 'Magnesium chloride, MgCl₂', [ion('magnesium'), ion('chloride', 2)]),
  salt('barium-chloride', 'Barium chloride, BaCl₂', [ion('barium'), ion('chloride', 2)]),
  salt('zinc-chloride', 'Zinc chloride, ZnCl₂', [ion('zinc'), ion('chloride', 2)], HYDROLYSIS_NOTE),
  salt('calcium-nitrate', 'Calcium nitrate, Ca(NO₃)₂', [ion('calcium'), ion('nitrate', 2)]),
  salt('magnesium-sulfate', 'Magnesium sulfate, MgSO₄', [ion('magnesium'), ion('sulfate', 1, 1)]),
  salt('sodium-sulfate', 'Sodium sulfate, Na₂SO₄', [ion('sodium', 2), ion('sulfate', 1, 1)]),
  salt('potassium-sulfate', 'Potassium sulfate, K₂SO₄', [ion('potassium', 2), ion('sulfate', 1, 1)]),
  salt('aluminium-chloride', 'Aluminium chloride, AlCl₃', [ion('aluminium'), ion('chloride', 3)], HYDROLYSIS_NOTE),
  salt('lanthanum-nitrate', 'Lanthanum nitrate, La(NO₃)₃', [ion('lanthanum'), ion('nitrate', 3)], HYDROLYSIS_NOTE),
  salt('sodium-bicarbonate', 'Sodium bicarbonate, NaHCO₃', [ion('sodium'), ion('carbonate', 1, 1)], GAS_NOTE),
  salt('sodium-carbonate', 'Sodium carbonate (soda), Na₂CO₃', [ion('sodium', 2), ion('carbonate', 1, 2)], GAS_NOTE),
  salt('trisodium-phosphate', 'Trisodium phosphate (TSP), Na₃PO₄', [ion('sodium', 3), ion('phosphate', 1, 3)]),
  salt('sodium-citrate', 'Trisodium citrate', [ion('sodium', 3), ion('citrate', 1, 3)], SEQUESTRANT_NOTE),
  salt(
    'tetrasodium-pyrophosphate',
    'Tetrasodium pyrophosphate (TSPP), Na₄P₂O₇',
    [ion('sodium', 4), ion('pyrophosphate', 1, 4)],
    SEQUESTRANT_NOTE,
  ),
  salt(
    'sodium-tripolyphosphate',
    'Sodium tripolyphosphate (STPP), Na₅P₃O₁₀',
    [ion('sodium', 5), ion('tripolyphosphate', 1, 5)],
    SEQUESTRANT_NOTE,
  ),
  salt('sodium-acetate', 'Sodium acetate', [ion('sodium'), ion('acetate', 1, 1)]),
  salt(
    'sodium-polyacrylate',
    'Sodium polyacrylate (acid groups)',
    [ion('sodium'), ion('polymer-acid-group')],
    POLYMER_NOTE,
  ),
  salt(
    'ammonium-polyacrylate',
    'Ammonium polyacrylate (acid groups)',
    [ion('ammonium'), ion('polymer-acid-group')],
    POLYMER_NOTE,
  ),
  salt('hydrochloric-acid', 'Hydrochloric acid, HCl', [ion('proton'), ion('chloride')]),
  salt('nitric-acid', 'Nitric acid, HNO₃', [ion('proton'), ion('nitrate')]),
  salt('acetic-acid', 'Acetic acid', [ion('acetate')]),
  salt('sodium-hydroxide', 'Caustic soda, NaOH', [ion('sodium'), ion('hydroxide')]),
  salt('potassium-hydroxide', 'Caustic potash, KOH', [ion('potassium'), ion('hydroxide')]),
  salt('ammonia', 'Ammonia solution', [ion('ammonium', 1, 1)]),
  salt('amp', 'Aminomethylpropanol (AMP)', [ion('aminomethylpropanolammonium', 1, 1)]),
  salt('dimethylethanolamine', 'Dimethylethanolamine (DMEA)', [ion('dimethylethanolammonium', 1, 1)]),
  salt('triethanolamine', 'Triethanolamine (TEA)', [ion('triethanolammonium', 1, 1)]),
  salt('triethylamine', 'Triethylamine', [ion('triethylammonium', 1, 1)]),
];

const byId: ReadonlyMap<string, Salt> = new Map(salts.map((one) => [one.id, one]));

/** The salt stored under an id in a scenario, or undefined when there is none. */
export const findSalt = (id: string): Salt | undefined => byId.get(id);
