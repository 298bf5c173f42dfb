/**
 * The units formulators write, with exact factors to SI. Data only.
 *
 * Source  SI Brochure, 9th ed. (BIPM 2019): prefixes table 7, units outside the SI table 8 (day, hour, minute, litre,
 *         dalton, electronvolt), °C section 2.3.1. Inch, pound and US gallon: NIST SP 811 (2008), appendix B.8 (exact).
 *         Poise, erg, ångström: SI Brochure, 8th ed. (2006), tables 8 and 9. Week: 7 d. Year: the Julian year of
 *         365.25 d; month: its twelfth. Degrees of hardness: 1 °dH = 10 mg CaO per litre (DIN 38409-6),
 *         1 °fH = 10 mg CaCO₃ per litre, counted as mol of Ca + Mg with M(CaO) = 56.0774 g/mol and
 *         M(CaCO₃) = 100.0869 g/mol (IUPAC standard atomic weights, abridged; hardness definitions from memory).
 */
export type Dimension =
  | 'number'
  | 'length'
  | 'potential'
  | 'concentration'
  | 'hardness'
  | 'ratio'
  | 'volumeRatio'
  | 'massRatio'
  | 'temperature'
  | 'viscosity'
  | 'density'
  | 'massPerArea'
  | 'molarMass'
  | 'time'
  | 'energy';

/** SI unit of the factors below; hardness counts the ions and shares the unit of concentration. */
export const dimensionNouns: Readonly<Record<Dimension, string>> = {
  number: 'a number without a unit',
  length: 'a length',
  potential: 'a potential',
  concentration: 'a concentration',
  hardness: 'a water hardness',
  ratio: 'a percentage',
  volumeRatio: 'a percentage by volume',
  massRatio: 'a percentage by mass',
  temperature: 'a temperature',
  viscosity: 'a viscosity',
  density: 'a density',
  massPerArea: 'a mass per area',
  molarMass: 'a molar mass',
  time: 'a time',
  energy: 'an energy',
};

export interface Unit {
  /** As it is written on the screen. */
  readonly symbol: string;
  readonly dimension: Dimension;
  /** One such unit is factor / divisor of the SI unit; decimal text, so that it is exact. */
  readonly factor: string;
  readonly divisor: string;
  /** Added before the factor is applied: SI value = (typed + offset) · factor / divisor. */
  readonly offset: string;
  /**
   * Other ways to type it, in canonical form: powers as plain digits (`m2`, `cm-3`), a space for a product,
   * μ as U+03BC. `canonicalText` brings typed text to this form.
   */
  readonly spellings: readonly string[];
}

const unit = (
  symbol: string,
  dimension: Dimension,
  factor: string,
  spellings: readonly string[],
  { divisor = '1', offset = '0' }: { readonly divisor?: string; readonly offset?: string } = {},
): Unit => ({ symbol, dimension, factor, divisor, offset, spellings });

/** Both spellings of the litre, and the two ways to write a quotient: `mol/L`, `mol l-1`. */
const perLitre = (amount: string): readonly string[] => [
  `${amount}/L`,
  `${amount}/l`,
  `${amount} L-1`,
  `${amount} l-1`,
  `${amount}/dm3`,
  `${amount} dm-3`,
];
const over = (top: string, bottom: string): readonly string[] => {
  const power = /\d$/.exec(bottom)?.[0] ?? '1';
  return [`${top}/${bottom}`, `${top} ${bottom.replace(/\d$/, '')}-${power}`];
};

export const units: readonly Unit[] = [
  unit('m', 'length', '1', ['m', 'metre', 'metres', 'meter', 'meters']),
  unit('cm', 'length', '1e-2', ['cm', 'centimetre', 'centimetres', 'centimeter', 'centimeters']),
  unit('mm', 'length', '1e-3', ['mm', 'millimetre', 'millimetres', 'millimeter', 'millimeters']),
  unit('µm', 'length', '1e-6', [
    'μm',
    'um',
    'micron',
    'microns',
    'micrometre',
    'micrometres',
    'micrometer',
    'micrometers',
  ]),
  unit('nm', 'length', '1e-9', ['nm', 'nanometre', 'nanometres', 'nanometer', 'nanometers']),
  unit('Å', 'length', '1e-10', ['Å', 'angstrom', 'Angstrom', 'ångström', 'Ångström', 'angstroms']),
  unit('in', 'length', '0.0254', ['in', 'inch', 'inches']),
  unit('mil', 'length', '2.54e-5', ['mil', 'mils', 'thou']),

  unit('V', 'potential', '1', ['V', 'volt', 'volts']),
  unit('mV', 'potential', '1e-3', ['mV', 'millivolt', 'millivolts']),
  unit('µV', 'potential', '1e-6', ['μV', 'uV']),

  unit('M', 'concentration', '1e3', ['M', ...perLitre('mol')]),
  unit('mM', 'concentration', '1', ['mM', ...perLitre('mmol'), ...over('mol', 'm3')]),
  unit('µM', 'concentration', '1e-3', ['μM', 'uM', ...perLitre('μmol'), ...perLitre('umol'), ...over('mmol', 'm3')]),
  unit('kmol/m³', 'concentration', '1e3', over('kmol', 'm3')),

  unit('°dH', 'hardness', '10', ['°dH', 'dH', '°d', 'degdH', 'deg dH'], { divisor: '56.0774' }),
  unit('°fH', 'hardness', '10', ['°fH', 'fH', '°f', 'degfH', 'deg fH'], { divisor: '100.0869' }),
  unit(
    'ppm CaCO₃',
    'hardness',
    '1',
    ['ppm CaCO3', 'mg/L CaCO3', 'mg/l CaCO3', 'ppm as CaCO3', 'mg/L as CaCO3', 'mg/l as CaCO3'],
    { divisor: '100.0869' },
  ),

  unit('%', 'ratio', '1e-2', ['%', 'percent', 'per cent', 'pct']),
  unit('‰', 'ratio', '1e-3', ['‰', 'per mille', 'permille']),
  unit('vol%', 'volumeRatio', '1e-2', [
    'vol%',
    'vol %',
    'vol.%',
    'vol.-%',
    'vol-%',
    'Vol%',
    'Vol %',
    'Vol.-%',
    'Vol-%',
    '%vol',
    '% vol',
    '% v/v',
    '%v/v',
    '% (v/v)',
    '% by volume',
    'v/v %',
  ]),
  unit('wt%', 'massRatio', '1e-2', [
    'wt%',
    'wt %',
    'wt.%',
    'wt.-%',
    'wt-%',
    'Wt%',
    'mass%',
    'mass %',
    'mass-%',
    'Gew.-%',
    '%w',
    '% w/w',
    '%w/w',
    '% (w/w)',
    '% m/m',
    '% by weight',
    '% by mass',
    'w/w %',
  ]),

  unit('K', 'temperature', '1', ['K', 'kelvin', 'Kelvin']),
  unit('°C', 'temperature', '1', ['°C', '° C', 'C', 'degC', 'deg C', 'celsius', 'Celsius'], { offset: '273.15' }),
  unit('°F', 'temperature', '5', ['°F', '° F', 'F', 'degF', 'deg F', 'fahrenheit', 'Fahrenheit'], {
    divisor: '9',
    offset: '459.67',
  }),

  unit('Pa·s', 'viscosity', '1', ['Pa s', 'Pas', 'Pa.s', 'N s/m2']),
  unit('mPa·s', 'viscosity', '1e-3', ['mPa s', 'mPas', 'mPa.s']),
  unit('µPa·s', 'viscosity', '1e-6', ['μPa s', 'uPa s', 'μPas', 'uPas']),
  unit('P', 'viscosity', '1e-1', ['P', 'poise', 'Poise']),
  unit('cP', 'viscosity', '1e-3', ['cP', 'cp', 'cps', 'cPs', 'centipoise']),

  unit('kg/m³', 'density', '1', [...over('kg', 'm3'), 'g/L', 'g/l', 'g L-1']),
  unit('g/cm³', 'density', '1e3', [
    ...over('g', 'cm3'),
    'g/cc',
    'g/ccm',
    ...over('g', 'mL'),
    ...over('g', 'ml'),
    ...perLitre('kg'),
    't/m3',
  ]),
  unit('lb/gal', 'density', '0.45359237', ['lb/gal', 'lbs/gal', 'lb/US gal', 'ppg'], { divisor: '3.785411784e-3' }),

  unit('mg/m²', 'massPerArea', '1e-6', over('mg', 'm2')),
  unit('g/m²', 'massPerArea', '1e-3', [...over('g', 'm2'), 'gsm']),
  unit('µg/cm²', 'massPerArea', '1e-5', [...over('μg', 'cm2'), ...over('ug', 'cm2')]),
  unit('kg/m²', 'massPerArea', '1', over('kg', 'm2')),
  unit('ng/cm²', 'massPerArea', '1e-8', over('ng', 'cm2')),

  unit('g/mol', 'molarMass', '1e-3', [...over('g', 'mol'), 'Da', 'dalton', 'daltons', 'u']),
  unit('kg/mol', 'molarMass', '1', [...over('kg', 'mol'), 'kDa', 'kilodalton', 'kilodaltons']),
  unit('MDa', 'molarMass', '1e3', ['MDa']),

  unit('s', 'time', '1', ['s', 'sec', 'second', 'seconds']),
  unit('min', 'time', '60', ['min', 'mins', 'minute', 'minutes']),
  unit('h', 'time', '3600', ['h', 'hr', 'hrs', 'hour', 'hours']),
  unit('d', 'time', '86400', ['d', 'day', 'days']),
  unit('week', 'time', '604800', ['week', 'weeks', 'wk', 'wks']),
  unit('month', 'time', '2629800', ['month', 'months', 'mo']),
  unit('year', 'time', '31557600', ['year', 'years', 'yr', 'yrs', 'y']),

  unit('J', 'energy', '1', ['J', 'joule', 'joules']),
  unit('aJ', 'energy', '1e-18', ['aJ']),
  unit('zJ', 'energy', '1e-21', ['zJ', 'zeptojoule', 'zeptojoules']),
  unit('yJ', 'energy', '1e-24', ['yJ']),
  unit('eV', 'energy', '1.602176634e-19', ['eV']),
  unit('meV', 'energy', '1.602176634e-22', ['meV']),
  unit('erg', 'energy', '1e-7', ['erg', 'ergs']),
];

/** Units that are well known but cannot be read as they stand, with the way out. */
export const unitsToRefuse: readonly { readonly spelling: string; readonly why: string; readonly remedy: string }[] = [
  {
    spelling: 'kT',
    why: 'the size of kT depends on the temperature',
    remedy: 'Give the energy in zJ; 1 kT is 4.11 zJ at 25 °C.',
  },
  {
    spelling: 'kBT',
    why: 'the size of kT depends on the temperature',
    remedy: 'Give the energy in zJ; 1 kT is 4.11 zJ at 25 °C.',
  },
  {
    spelling: 'cSt',
    why: 'it is a kinematic viscosity',
    remedy: 'Multiply it by the density in g/cm³ and give mPa·s.',
  },
  {
    spelling: 'mm2/s',
    why: 'it is a kinematic viscosity',
    remedy: 'Multiply it by the density in g/cm³ and give mPa·s.',
  },
  { spelling: 'ppm', why: 'it does not say of what', remedy: 'Write ppm CaCO3 for a hardness, or mmol/L for a salt.' },
  { spelling: 'mg/L', why: 'it does not say of what', remedy: 'Divide by the molar mass and give mmol/L.' },
  { spelling: 'mg/l', why: 'it does not say of what', remedy: 'Divide by the molar mass and give mmol/L.' },
  { spelling: 'mol/kg', why: 'it counts per mass of solvent', remedy: 'Multiply by the density and give mol/L.' },
  { spelling: 'N', why: 'it counts charges', remedy: 'Divide by the valence and give mol/L.' },
  { spelling: 'mS/cm', why: 'it is a conductivity', remedy: 'Give the salt in mmol/L.' },
  { spelling: 'μS/cm', why: 'it is a conductivity', remedy: 'Give the salt in mmol/L.' },
];

const bySymbol = new Map(units.map((one) => [one.symbol, one]));

/** Throws RangeError for a symbol that is not in the table: symbols are written by us. */
export function unitOf(symbol: string): Unit {
  const found = bySymbol.get(symbol);
  if (found === undefined) throw new RangeError(`unitOf: no unit "${symbol}"`);
  return found;
}
