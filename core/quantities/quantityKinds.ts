import type { Dimension } from './units';

/**
 * Every kind of number a scenario holds: its unit in the file, what may be typed, and its limits.
 * The limits keep slips out (a radius in metres, a density in g/cm³ taken as kg/m³); a value inside them can still lie
 * outside the range of a law, which is then said as a caveat. No mathjs here: the file reader shares these limits.
 */
export interface KindFacts {
  /** What the field holds, for sentences: `The diameter has to lie between …`. */
  readonly name: string;
  /** Symbol in `units.ts`; empty for a number without a unit. */
  readonly fileUnit: string;
  /** Typed units may have any of these dimensions; the first one names what is expected. */
  readonly dimensions: readonly [Dimension, ...Dimension[]];
  readonly min: number;
  readonly max: number;
  /** Why the limits are where they are. */
  readonly reason: string;
  readonly example: string;
}

const length = (name: string, min: number, max: number, reason: string, example: string): KindFacts => ({
  name,
  fileUnit: 'nm',
  dimensions: ['length'],
  min,
  max,
  reason,
  example,
});
const percent = (
  name: string,
  dimensions: KindFacts['dimensions'],
  min: number,
  max: number,
  reason: string,
  example: string,
): KindFacts => ({ name, fileUnit: '%', dimensions, min, max, reason, example });
const density = (name: string, min: number, max: number, reason: string, example: string): KindFacts => ({
  name,
  fileUnit: 'kg/m³',
  dimensions: ['density'],
  min,
  max,
  reason,
  example,
});
const bare = (name: string, min: number, max: number, reason: string, example: string): KindFacts => ({
  name,
  fileUnit: '',
  dimensions: ['number'],
  min,
  max,
  reason,
  example,
});

const facts = {
  diameter_nm: length('diameter', 1, 100_000, 'below 1 nm are molecules, above 0.1 mm are grains', '0.24 µm or 240 nm'),
  slipPlane_nm: length('slip plane distance', 0, 50, 'a slip plane lies within the adsorbed layer', '0.5 nm'),
  layerThickness_nm: length(
    'layer thickness',
    0.05,
    500,
    'from less than one atom to the longest stretched chains',
    '8 nm',
  ),
  zeta_mV: {
    name: 'zeta potential',
    fileUnit: 'mV',
    dimensions: ['potential'],
    min: -300,
    max: 300,
    reason: 'no zeta potential beyond this is measured in a liquid',
    example: '-38 mV',
  },
  zetaUncertainty_mV: {
    name: 'uncertainty of the zeta potential',
    fileUnit: 'mV',
    dimensions: ['potential'],
    min: 0,
    max: 300,
    reason: 'an uncertainty is not negative, and not above the largest zeta potential',
    example: '5 mV',
  },
  adsorbedAmount_mg_m2: {
    name: 'adsorbed amount',
    fileUnit: 'mg/m²',
    dimensions: ['massPerArea'],
    min: 0.001,
    max: 500,
    reason: 'the thickest layer above holds about 500 mg/m² of polymer',
    example: '1.5 mg/m²',
  },
  chainMolarMass_g_mol: {
    name: 'molar mass of the chain',
    fileUnit: 'g/mol',
    dimensions: ['molarMass'],
    min: 50,
    max: 1e8,
    reason: 'from a few carbon atoms to the largest soluble polymers',
    example: '5000 g/mol or 5 kDa',
  },
  polymerDensity_kg_m3: density('density of the polymer', 500, 3000, 'dry polymers lie between', '1.1 g/cm³'),
  floryChi: bare('Flory–Huggins parameter', -1, 2, 'solvents from strongly binding to precipitating', '0.45'),
  temperature_degC: {
    name: 'temperature',
    fileUnit: '°C',
    dimensions: ['temperature'],
    min: -30,
    max: 150,
    reason: 'coatings and inks are liquid and stored between',
    example: '25 °C',
  },
  pH: bare('pH', 0, 14, 'the usual scale in water', '8.5'),
  hardness_dH: {
    name: 'water hardness',
    fileUnit: '°dH',
    dimensions: ['hardness', 'concentration'],
    min: 0,
    max: 200,
    reason: 'sea water has less than 400, tap water rarely more than 40',
    example: '12 °dH or 2.1 mmol/L',
  },
  concentration_mM: {
    name: 'salt concentration',
    fileUnit: 'mM',
    dimensions: ['concentration'],
    min: 0,
    max: 5000,
    reason: 'few salts dissolve further',
    example: '10 mM or 0.01 mol/L',
  },
  loading_percent: percent('loading', ['ratio'], 0.0001, 98, 'a paste still needs some liquid', '20 %'),
  volumeLoading_percent: percent(
    'loading by volume',
    ['ratio', 'volumeRatio'],
    0.0001,
    74,
    'equal spheres fill at most π/√18 = 74 % of the space',
    '20 %',
  ),
  massLoading_percent: percent(
    'loading by mass',
    ['ratio', 'massRatio'],
    0.0001,
    98,
    'a paste still needs some liquid',
    '45 %',
  ),
  density_kg_m3: density(
    'density of the particle',
    10,
    25_000,
    'from hollow spheres to the heaviest metals',
    '4.1 g/cm³',
  ),
  mediumDensity_kg_m3: density(
    'density of the medium',
    300,
    5000,
    'liquids other than molten metals lie between',
    '0.998 g/mL',
  ),
  relativePermittivity: bare('relative permittivity', 1, 200, 'from vacuum to the most polar liquids', '78.4'),
  viscosity_mPa_s: {
    name: 'viscosity',
    fileUnit: 'mPa·s',
    dimensions: ['viscosity'],
    min: 0.05,
    max: 1e7,
    reason: 'from liquefied gas to a paste that hardly flows',
    example: '2.5 mPa·s or 2.5 cP',
  },
  volumeParts: bare('volume parts', 0, 1e6, 'only the ratios count', '80'),
  shelfLife_days: {
    name: 'shelf life',
    fileUnit: 'd',
    dimensions: ['time'],
    min: 0.01,
    max: 36_525,
    reason: 'from a quarter of an hour to a century',
    example: '365 d or 12 months',
  },
  acceptedLoss_percent: percent(
    'accepted loss',
    ['ratio'],
    0.001,
    99.9,
    'none at all and all of it cannot be asked',
    '10 %',
  ),
  fillHeight_mm: {
    name: 'fill height',
    fileUnit: 'mm',
    dimensions: ['length'],
    min: 0.1,
    max: 100_000,
    reason: 'from a film to a storage tank',
    example: '100 mm or 10 cm',
  },
  acceptedClearLayer_percent: percent(
    'accepted clear layer',
    ['ratio'],
    0.001,
    99.9,
    'none at all and all of it cannot be asked',
    '5 %',
  ),
  entered_zJ: {
    name: 'Hamaker constant',
    fileUnit: 'zJ',
    dimensions: ['energy'],
    min: -1000,
    max: 1000,
    reason: 'metals across vacuum reach about 500 zJ',
    example: '45 zJ or 4.5e-20 J',
  },
} as const satisfies Readonly<Record<string, KindFacts>>;

export type QuantityKind = keyof typeof facts;

export const quantityKinds: Readonly<Record<QuantityKind, KindFacts>> = facts;

/** Limits, ends included, in the unit of the file. */
export function limitsOf(kind: QuantityKind): {
  readonly min: number;
  readonly max: number;
  readonly fileUnit: string;
} {
  const { min, max, fileUnit } = quantityKinds[kind];
  return { min, max, fileUnit };
}
