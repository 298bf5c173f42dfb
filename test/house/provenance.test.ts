import { describe, expect, it } from 'vitest';
import { findMaterial, materials } from '../../core/materials/catalogue';
import type { DielectricResponse, Material } from '../../core/materials/material';
import type { Provenance, Sourced } from '../../core/materials/provenance';
import { sources } from '../../core/materials/sources';
import { ionSpecies } from '../../core/medium/ionSpecies';

/** No number without a source, a place in it, a word on how it was read, and an uncertainty. */

const listed = new Set(sources.map(({ key }) => key));
const readings = new Set<string>(['source', 'transcription', 'derived', 'memory']);
const kebabCase = /^[a-z0-9]+(-[a-z0-9]+)*$/;

/** Sodium D line, 589.3 nm. */
const SODIUM_LINE_rad_s = 3.197e15;

function flawsOfProvenance(at: string, { source, where, read, note }: Provenance): string[] {
  const flaws: string[] = [];
  if (!listed.has(source)) flaws.push(`${at}: source "${source}" is not in sources.ts`);
  if (where.trim() === '') flaws.push(`${at}: where is empty`);
  if (!readings.has(read)) flaws.push(`${at}: read is "${read}"`);
  if (note !== undefined && note.trim() === '') flaws.push(`${at}: note is empty`);
  return flaws;
}

const isUncertainty = (share: number, largest: number): boolean => share > 0 && share <= largest;
const isPositive = (value: number): boolean => Number.isFinite(value) && value > 0;

/** `least`: the lowest value that nature allows, included. */
function flawsOfNumber(at: string, number: Sourced | null, least: number): string[] {
  if (number === null) return [];
  const flaws = flawsOfProvenance(at, number);
  if (!Number.isFinite(number.value) || number.value < least) flaws.push(`${at}: value ${number.value}`);
  if (!isUncertainty(number.relativeUncertainty, 1)) flaws.push(`${at}: uncertainty ${number.relativeUncertainty}`);
  if (number.temperature_K !== undefined && !(number.temperature_K > 200 && number.temperature_K < 400)) {
    flaws.push(`${at}: temperature ${number.temperature_K} K`);
  }
  return flaws;
}

function flawsOfResponse(at: string, response: DielectricResponse): string[] {
  const { id, level, oscillators, dampedOscillators, relativeUncertainty } = response;
  const flaws = flawsOfProvenance(at, response);
  if (!kebabCase.test(id)) flaws.push(`${at}: id is not in kebab case`);
  if (!isUncertainty(relativeUncertainty, 1)) flaws.push(`${at}: uncertainty ${relativeUncertainty}`);
  if (oscillators.length + dampedOscillators.length === 0) flaws.push(`${at}: no oscillator`);
  const numbers = [
    ...oscillators.flatMap(({ strength, frequency_rad_s }) => [strength, frequency_rad_s]),
    ...dampedOscillators.flatMap((one) => [one.strength_rad2_s2, one.frequency_rad_s, one.damping_rad_s]),
  ];
  if (!numbers.every(isPositive)) flaws.push(`${at}: an oscillator is not positive and finite`);
  const bands = oscillators.filter(({ band }) => band === 'ultraviolet').length;
  if (level === 'single-uv' && bands > 1) flaws.push(`${at}: more than one ultraviolet term on the single-uv level`);
  return flaws;
}

/** The ultraviolet term has to give the index back where the material is transparent, or a digit is wrong. */
function flawsOfIndex(material: Material): string[] {
  const { refractiveIndex, refractiveIndexIsOpticalLimit, dielectricResponses, id } = material;
  if (refractiveIndex === null || !refractiveIndexIsOpticalLimit) return [];
  return dielectricResponses.flatMap((response) => {
    const ultraviolet = response.oscillators.find(({ band }) => band === 'ultraviolet');
    if (ultraviolet === undefined) return [];
    const { strength, frequency_rad_s } = ultraviolet;
    const index = Math.sqrt(1 + strength / (1 - (SODIUM_LINE_rad_s / frequency_rad_s) ** 2));
    const off = Math.abs(index / refractiveIndex.value - 1);
    return off < 0.04 ? [] : [`${id} ${response.id}: gives n = ${index.toFixed(3)}, not ${refractiveIndex.value}`];
  });
}

function flawsOf(material: Material): string[] {
  const { id, name, cas, conductor, staticPermittivity, hamakerUncertainty, dielectricResponses, note } = material;
  const flaws: string[] = [];
  if (!kebabCase.test(id)) flaws.push(`${id}: id is not in kebab case`);
  if (name.trim() === '' || note?.trim() === '') flaws.push(`${id}: an empty name or note`);
  if (cas !== null && !/^\d{2,7}-\d{2}-\d$/.test(cas)) flaws.push(`${id}: CAS number ${cas}`);
  if (conductor && staticPermittivity !== null) flaws.push(`${id}: a conductor has no static permittivity`);
  flaws.push(
    ...flawsOfNumber(`${id} static permittivity`, staticPermittivity, 1),
    ...flawsOfNumber(`${id} refractive index`, material.refractiveIndex, 1),
    ...flawsOfNumber(`${id} molar mass`, material.molarMass_kg_mol, 0.001),
    ...flawsOfNumber(`${id} density`, material.density_kg_m3, 100),
    ...flawsOfNumber(`${id} viscosity`, material.viscosity_Pa_s, 1e-4),
    ...flawsOfNumber(`${id} polarizability`, material.polarizabilityVolume_A3, 0.1),
    ...flawsOfNumber(`${id} ionization energy`, material.ionizationEnergy_eV, 4),
    ...flawsOfNumber(`${id} dipole moment`, material.dipoleMoment_D, 0),
    ...dielectricResponses.flatMap((response) => flawsOfResponse(`${id} ${response.id}`, response)),
    ...flawsOfIndex(material),
  );
  const responseIds = new Set(dielectricResponses.map((response) => response.id));
  if (responseIds.size !== dielectricResponses.length) flaws.push(`${id}: two responses share an id`);
  const { acrossVacuum, acrossLiquid } = hamakerUncertainty;
  // across a liquid the difference of two bodies counts, so the doubt may exceed the value itself
  if (!isUncertainty(acrossVacuum, 1) || !isUncertainty(acrossLiquid, 1.5)) {
    flaws.push(`${id}: Hamaker uncertainty ${acrossVacuum}, ${acrossLiquid}`);
  }
  const polynomial = staticPermittivity?.temperaturePolynomial ?? null;
  if (staticPermittivity !== null && polynomial !== null) {
    const at_K = staticPermittivity.temperature_K ?? Number.NaN;
    const there = polynomial.coefficients.reduceRight((sum, coefficient) => sum * at_K + coefficient, 0);
    if (!(Math.abs(there / staticPermittivity.value - 1) < 0.001)) flaws.push(`${id}: polynomial gives ${there}`);
    if (!(polynomial.valid_K.from < polynomial.valid_K.to)) flaws.push(`${id}: polynomial without a span`);
  }
  return flaws;
}

describe('every material', () => {
  it.each(materials.map((material) => [material.id, material] as const))('%s', (id, material) => {
    expect(flawsOf(material)).toEqual([]);
    expect(findMaterial(id)).toBe(material);
  });

  it('has an id of its own', () => {
    expect(new Set(materials.map(({ id }) => id)).size).toBe(materials.length);
  });

  it('liquids can be a medium: permittivity, index, molar mass and viscosity are known', () => {
    for (const { id, kind, ...solvent } of materials) {
      if (kind !== 'solvent') continue;
      expect([id, solvent.staticPermittivity, solvent.refractiveIndex]).not.toContain(null);
      expect([id, solvent.molarMass_kg_mol, solvent.viscosity_Pa_s]).not.toContain(null);
    }
  });
});

describe('every ion with a dissociation constant', () => {
  it.each(ionSpecies.filter(({ pKa }) => pKa.length > 0).map((species) => [species.key, species] as const))(
    '%s',
    (key, { provenance }) => {
      expect(provenance === null ? [`${key}: no provenance`] : flawsOfProvenance(key, provenance)).toEqual([]);
    },
  );
});

describe('every file of published values', () => {
  const texts = import.meta.glob<string>('../published/*.ts', { query: '?raw', import: 'default', eager: true });
  const modules = import.meta.glob<Record<string, unknown>>('../published/*.ts', { eager: true });

  it.each(Object.keys(texts))('%s names its source in its first comment, with a year', (file) => {
    const head = texts[file].match(/^\/\*\*[\s\S]*?\*\//)?.[0] ?? '';
    expect(head).toMatch(/\b(1[89]|20)\d\d\b/);
  });

  it.each(Object.keys(modules))('%s: a table that carries a source key carries it in full', (file) => {
    const tables = Object.entries(modules[file]).filter(
      (entry): entry is [string, Provenance] =>
        typeof entry[1] === 'object' && entry[1] !== null && 'source' in entry[1] && 'where' in entry[1],
    );
    expect(tables.flatMap(([name, table]) => flawsOfProvenance(name, table))).toEqual([]);
  });
});

describe('sources.ts', () => {
  it('lists each source once, in alphabetical order, with a citation', () => {
    const keys = sources.map(({ key }) => key);
    expect(keys).toEqual([...new Set(keys)].sort());
    for (const { citation } of sources) expect(citation.length).toBeGreaterThan(20);
  });

  it('lists no source that nothing refers to', () => {
    const modules = import.meta.glob<Record<string, unknown>>('../published/*.ts', { eager: true });
    const used = new Set<unknown>();
    const collect = (value: unknown): void => {
      if (typeof value !== 'object' || value === null) return;
      if ('source' in value) used.add(value.source);
      Object.values(value).forEach(collect);
    };
    collect([materials, ionSpecies, modules]);
    expect([...listed].filter((key) => !used.has(key))).toEqual([]);
  });
});

const idsInUse = `water methanol ethanol 1-propanol isopropanol 1-butanol isobutanol 1-octanol benzyl-alcohol ethylene-glycol
  propylene-glycol glycerol diethylene-glycol thf pgme butoxyethanol acetone mek mibk cyclohexanone
  ethyl-acetate butyl-acetate pgmea propylene-carbonate pentane hexane heptane octane decane dodecane hexadecane
  isooctane cyclohexane isoparaffin white-spirit mineral-oil toluene o-xylene m-xylene p-xylene benzene
  chloroform carbon-tetrachloride dichloromethane dmf dmso nmp acetonitrile styrene mma oleic-acid methyl-oleate
  linseed-oil soybean-oil tio2-rutile tio2-anatase zno zns hematite magnetite goethite chromia ceria
  pigment-blue-15 pigment-organic-generic carbon-black graphite gold silver silica-amorphous quartz
  alumina-alpha alumina-gamma zro2 mgo batio3 sic si3n4 calcite baso4 kaolin mica talc ath dolomite wollastonite
  polystyrene pmma ptfe polyethylene pvc pvac pvoh nylon66 pet polycarbonate pdms polyisoprene cellulose epoxy
  polyurethane acrylic-resin alkyd nitrocellulose sbr-latex melamine`;

/** Pinned so that no number changes in silence. After an intended change put the new sum here, and say why in the log. */
describe('the data as they were checked', () => {
  const sum = (values: readonly (number | undefined)[]) =>
    values.reduce<number>((total, value) => total + (value ?? 0), 0);
  const responses = materials.flatMap(({ dielectricResponses }) => dielectricResponses);
  const oscillators = responses.flatMap((response) => response.oscillators);
  const damped = responses.flatMap(({ dampedOscillators }) => dampedOscillators);

  it.each(idsInUse.split(/\s+/))('the id %s, stored in files, is still there', (id) => {
    expect(findMaterial(id)?.id).toBe(id);
  });

  it.each([
    ['solvents', materials.filter(({ kind }) => kind === 'solvent').length, 54],
    ['pigments', materials.filter(({ kind }) => kind === 'pigment').length, 15],
    ['fillers', materials.filter(({ kind }) => kind === 'filler').length, 17],
    ['polymers', materials.filter(({ kind }) => kind === 'polymer').length, 20],
    ['responses', responses.length, 123],
    ['oscillators', oscillators.length, 248],
    ['damped oscillators', damped.length, 21],
    ['sources', sources.length, 47],
  ])('number of %s', (_, ours, pinned) => {
    expect(ours).toBe(pinned);
  });

  it.each([
    ['static permittivity', sum(materials.map((one) => one.staticPermittivity?.value)), 3250.3794],
    [
      'permittivity polynomials at 300 K',
      sum(
        materials.map((one) =>
          one.staticPermittivity?.temperaturePolynomial?.coefficients.reduceRight(
            (total, next) => total * 300 + next,
            0,
          ),
        ),
      ),
      677.25429764002,
    ],
    ['refractive index', sum(materials.map((one) => one.refractiveIndex?.value)), 167.5024],
    ['molar mass', sum(materials.map((one) => one.molarMass_kg_mol?.value)), 13.56717],
    ['density', sum(materials.map((one) => one.density_kg_m3.value)), 213451.2],
    ['viscosity', sum(materials.map((one) => one.viscosity_Pa_s?.value)), 1.2425851],
    ['polarizability', sum(materials.map((one) => one.polarizabilityVolume_A3?.value)), 582.281],
    ['ionization energy', sum(materials.map((one) => one.ionizationEnergy_eV?.value)), 366.62],
    ['dipole moment', sum(materials.map((one) => one.dipoleMoment_D?.value)), 71.288],
    ['oscillator strength', sum(oscillators.map(({ strength }) => strength)), 53857.424758165],
    [
      'logarithm of oscillator frequency',
      sum(oscillators.map((one) => Math.log(one.frequency_rad_s))),
      8973.0157703964,
    ],
    ['logarithm of damped strength', sum(damped.map((one) => Math.log(one.strength_rad2_s2))), 1390.3542988262],
    ['logarithm of damped frequency', sum(damped.map((one) => Math.log(one.frequency_rad_s))), 715.23339818311],
    ['logarithm of damping', sum(damped.map((one) => Math.log(one.damping_rad_s))), 684.51479280619],
    ['uncertainty of responses', sum(responses.map((one) => one.relativeUncertainty)), 14.14],
    ['uncertainty across vacuum', sum(materials.map((one) => one.hamakerUncertainty.acrossVacuum)), 25.24],
    ['uncertainty across a liquid', sum(materials.map((one) => one.hamakerUncertainty.acrossLiquid)), 41.6],
    ['pKa', sum(ionSpecies.flatMap(({ pKa }) => pKa)), 144.77],
  ])('sum of %s', (_, ours, pinned) => {
    // the sum of a hundred doubles, in any order, agrees to twelve digits
    expect(ours / pinned).toBeCloseTo(1, 11);
  });
});

describe('the check itself', () => {
  const [good] = materials;
  const withResponse = (change: Partial<DielectricResponse>): Material => ({
    ...good,
    dielectricResponses: [{ ...good.dielectricResponses[0], ...change }],
  });
  const withDensity = (change: Partial<Sourced>): Material => ({
    ...good,
    density_kg_m3: { ...good.density_kg_m3, ...change },
  });

  it('passes the entry that is broken below', () => {
    expect(flawsOf(good)).toEqual([]);
  });

  it.each([
    ['an unlisted source', withDensity({ source: 'Nobody1900' }), /Nobody1900/],
    ['an empty place', withDensity({ where: ' ' }), /where is empty/],
    ['an unknown reading', withDensity({ read: 'guessed' as Provenance['read'] }), /guessed/],
    ['no uncertainty', withDensity({ relativeUncertainty: 0 }), /uncertainty 0/],
    ['an uncertainty above one', withDensity({ relativeUncertainty: 1.01 }), /uncertainty 1.01/],
    ['a value that is no number', withDensity({ value: Number.NaN }), /value NaN/],
    ['a density in g/cm³', withDensity({ value: 0.997 }), /density: value/],
    ['a temperature in °C', withDensity({ temperature_K: 25 }), /temperature 25 K/],
    ['an id that is not kebab case', { ...good, id: 'Tap_water' }, /kebab/],
    ['a broken CAS number', { ...good, cas: '7732-185' }, /CAS/],
    ['a conductor with a permittivity', { ...good, conductor: true }, /conductor/],
    ['no oscillators', withResponse({ oscillators: [], dampedOscillators: [] }), /no oscillator/],
    [
      'a negative strength',
      withResponse({ oscillators: [{ strength: -0.7, frequency_rad_s: 1.9e16, band: 'fitted' }] }),
      /not positive/,
    ],
    [
      'an ultraviolet term that does not give the index',
      withResponse({ oscillators: [{ strength: 1.754, frequency_rad_s: 1.8883e16, band: 'ultraviolet' }] }),
      /gives n = /,
    ],
    ['a doubt of nothing', { ...good, hamakerUncertainty: { acrossVacuum: 0, acrossLiquid: 0.2 } }, /Hamaker/],
  ])('catches %s', (_, broken, complaint) => {
    expect(flawsOf(broken)).toHaveLength(1);
    expect(flawsOf(broken)[0]).toMatch(complaint);
  });
});
