import type { Provenance } from '../materials/provenance';

/** One form of an ion. Valence zero: the form carries no charge and does not count. */
export interface IonForm {
  readonly name: string;
  readonly valence: number;
}

/**
 * An ion as salts bring it. `forms` runs from the most protonated to the least, `pKa[i]` lies between form i and i + 1:
 * with a pH the share of each form follows, without one the form that the salt names is kept.
 */
export interface IonSpecies {
  readonly key: string;
  readonly forms: readonly IonForm[];
  readonly pKa: readonly number[];
  readonly provenance: Provenance | null;
}

const strong = (key: string, name: string, valence: number): IonSpecies => ({
  key,
  forms: [{ name, valence }],
  pKa: [],
  provenance: null,
});

const crc: Provenance = {
  source: 'CRC2014',
  where: 'dissociation constants in water at 25 °C, row of this acid or base',
  read: 'memory',
};

const martellSmith: Provenance = {
  source: 'MartellSmith1976',
  where: 'stepwise protonation constants at 25 °C',
  read: 'memory',
  note: 'Values depend on ionic strength; the last digit is uncertain.',
};

const base = (key: string, ion: string, molecule: string, pKa: number): IonSpecies => ({
  key,
  forms: [
    { name: ion, valence: 1 },
    { name: molecule, valence: 0 },
  ],
  pKa: [pKa],
  provenance: crc,
});

export const ionSpecies: readonly IonSpecies[] = [
  strong('proton', 'H⁺', 1),
  strong('hydroxide', 'OH⁻', -1),
  strong('lithium', 'Li⁺', 1),
  strong('sodium', 'Na⁺', 1),
  strong('potassium', 'K⁺', 1),
  strong('magnesium', 'Mg²⁺', 2),
  strong('calcium', 'Ca²⁺', 2),
  strong('barium', 'Ba²⁺', 2),
  strong('zinc', 'Zn²⁺', 2),
  strong('aluminium', 'Al³⁺', 3),
  strong('lanthanum', 'La³⁺', 3),
  strong('chloride', 'Cl⁻', -1),
  strong('nitrate', 'NO₃⁻', -1),
  strong('cation-1', 'Cation 1+', 1),
  strong('cation-2', 'Cation 2+', 2),
  strong('cation-3', 'Cation 3+', 3),
  strong('anion-1', 'Anion 1−', -1),
  strong('anion-2', 'Anion 2−', -2),
  strong('polymer-acid-group', 'Acid group of polymer, 1−', -1),
  base('ammonium', 'NH₄⁺', 'NH₃', 9.25),
  base('triethanolammonium', 'Triethanolammonium⁺', 'Triethanolamine', 7.76),
  base('dimethylethanolammonium', 'Dimethylethanolammonium⁺', 'Dimethylethanolamine', 9.2),
  base('aminomethylpropanolammonium', 'AMP-H⁺', 'AMP', 9.7),
  base('triethylammonium', 'Triethylammonium⁺', 'Triethylamine', 10.75),
  {
    key: 'acetate',
    forms: [
      { name: 'CH₃COOH', valence: 0 },
      { name: 'CH₃COO⁻', valence: -1 },
    ],
    pKa: [4.76],
    provenance: crc,
  },
  {
    key: 'sulfate',
    forms: [
      { name: 'HSO₄⁻', valence: -1 },
      { name: 'SO₄²⁻', valence: -2 },
    ],
    pKa: [1.99],
    provenance: crc,
  },
  {
    key: 'carbonate',
    forms: [
      { name: 'CO₂(aq)', valence: 0 },
      { name: 'HCO₃⁻', valence: -1 },
      { name: 'CO₃²⁻', valence: -2 },
    ],
    pKa: [6.35, 10.33],
    provenance: crc,
  },
  {
    key: 'phosphate',
    forms: [
      { name: 'H₃PO₄', valence: 0 },
      { name: 'H₂PO₄⁻', valence: -1 },
      { name: 'HPO₄²⁻', valence: -2 },
      { name: 'PO₄³⁻', valence: -3 },
    ],
    pKa: [2.16, 7.21, 12.32],
    provenance: crc,
  },
  {
    key: 'citrate',
    forms: [
      { name: 'H₃Cit', valence: 0 },
      { name: 'H₂Cit⁻', valence: -1 },
      { name: 'HCit²⁻', valence: -2 },
      { name: 'Cit³⁻', valence: -3 },
    ],
    pKa: [3.13, 4.76, 6.4],
    provenance: crc,
  },
  {
    key: 'pyrophosphate',
    forms: [
      { name: 'H₄P₂O₇', valence: 0 },
      { name: 'H₃P₂O₇⁻', valence: -1 },
      { name: 'H₂P₂O₇²⁻', valence: -2 },
      { name: 'HP₂O₇³⁻', valence: -3 },
      { name: 'P₂O₇⁴⁻', valence: -4 },
    ],
    pKa: [0.9, 2.1, 6.7, 9.3],
    provenance: crc,
  },
  {
    key: 'tripolyphosphate',
    forms: [
      { name: 'H₅P₃O₁₀', valence: 0 },
      { name: 'H₄P₃O₁₀⁻', valence: -1 },
      { name: 'H₃P₃O₁₀²⁻', valence: -2 },
      { name: 'H₂P₃O₁₀³⁻', valence: -3 },
      { name: 'HP₃O₁₀⁴⁻', valence: -4 },
      { name: 'P₃O₁₀⁵⁻', valence: -5 },
    ],
    pKa: [1, 2.2, 2.3, 5.7, 8.5],
    provenance: martellSmith,
  },
];

const byKey: ReadonlyMap<string, IonSpecies> = new Map(ionSpecies.map((species) => [species.key, species]));

/** Throws RangeError for an unknown key: the keys are ours, in `salts.ts`. */
export function ionSpeciesOf(key: string): IonSpecies {
  const species = byKey.get(key);
  if (species === undefined) throw new RangeError(`ionSpeciesOf: no ion is called "${key}"`);
  return species;
}
