import * as whole from 'mathjs';
import * as numbersOnly from 'mathjs/number';
import { describe, expect, it } from 'vitest';
import type { QuantityKind } from '../../../core/quantities/quantityKinds';
import { quantityKinds } from '../../../core/quantities/quantityKinds';
import { readQuantity } from '../../../core/quantities/readQuantity';

const problemOf = (typed: string, kind: QuantityKind) => {
  const read = readQuantity(typed, kind);
  return read.ok ? undefined : read.problems[0];
};

/** Expected values by hand from the definitions of the units; compared exactly, since the fractions are exact. */
const readable: readonly [string, QuantityKind, number][] = [
  ['240', 'diameter_nm', 240],
  ['240 nm', 'diameter_nm', 240],
  ['240nm', 'diameter_nm', 240],
  ['0.1 um', 'diameter_nm', 100],
  ['0.1 µm', 'diameter_nm', 100],
  ['0.1 μm', 'diameter_nm', 100],
  ['0,1 µm', 'diameter_nm', 100],
  ['0,24µm', 'diameter_nm', 240],
  ['.24 micron', 'diameter_nm', 240],
  ['0.07 µm', 'diameter_nm', 70],
  ['2400 Å', 'diameter_nm', 240],
  ['2400 Å', 'diameter_nm', 240],
  ['2400 angstrom', 'diameter_nm', 240],
  ['2,4e-4 mm', 'diameter_nm', 240],
  ['2.4E-7 m', 'diameter_nm', 240],
  ['2.4×10⁻⁷ m', 'diameter_nm', 240],
  ['2,4·10^-7 m', 'diameter_nm', 240],
  ['2.4 x 10^-7 m', 'diameter_nm', 240],
  ['２４０ ｎｍ', 'diameter_nm', 240],
  ['240\u00A0nm', 'diameter_nm', 240],
  ['1\u202F234,5 nm', 'diameter_nm', 1234.5],
  ['1 234.5 nm', 'diameter_nm', 1234.5],
  ["1'234.5", 'diameter_nm', 1234.5],
  ['1’234.5', 'diameter_nm', 1234.5],
  ['1,234.5', 'diameter_nm', 1234.5],
  ['1.234,5', 'diameter_nm', 1234.5],
  ['12,34.5', 'diameter_nm', Number.NaN],
  ['12,345.5', 'diameter_nm', 12345.5],
  ['1,00,000', 'diameter_nm', 100_000],
  ['12.345,5', 'diameter_nm', 12345.5],
  ['1,234', 'diameter_nm', 1.234],
  ['1.234', 'diameter_nm', 1.234],
  ['100,000.0', 'diameter_nm', 100_000],
  ['1 mil', 'diameter_nm', 25_400],
  ['2*35 nm', 'diameter_nm', 70],
  ['(12+3)*2 nm', 'diameter_nm', 30],
  ['0.2 µm + 40 nm', 'diameter_nm', 240],
  ['2 × 120 nm', 'diameter_nm', 240],
  ['480 nm / 2', 'diameter_nm', 240],
  ['2 * (100 + 20) nm', 'diameter_nm', 240],
  ['½ µm', 'diameter_nm', 500],
  ['2½ nm', 'diameter_nm', 2.5],
  ['2^8 nm', 'diameter_nm', 256],
  ['2³ nm', 'diameter_nm', 8],
  ['--240', 'diameter_nm', 240],
  ['-38', 'zeta_mV', -38],
  ['\u221238 mV', 'zeta_mV', -38],
  ['\u201338 mV', 'zeta_mV', -38],
  ['+38 mV', 'zeta_mV', 38],
  ['-0,038 V', 'zeta_mV', -38],
  ['-0', 'zeta_mV', 0],
  ['0.1+0.2', 'zeta_mV', 0.3],
  ['10 mM', 'concentration_mM', 10],
  ['10 mmol/L', 'concentration_mM', 10],
  ['10 mmol / l', 'concentration_mM', 10],
  ['10 mmol per L', 'concentration_mM', 10],
  ['0.01 M', 'concentration_mM', 10],
  ['0,01 mol/l', 'concentration_mM', 10],
  ['0.01 mol·L⁻¹', 'concentration_mM', 10],
  ['0.01 mol L-1', 'concentration_mM', 10],
  ['10 mol/m³', 'concentration_mM', 10],
  ['10 mol m^-3', 'concentration_mM', 10],
  ['500 µmol/L', 'concentration_mM', 0.5],
  ['500 uM', 'concentration_mM', 0.5],
  ['5e-3 M', 'concentration_mM', 5],
  ['12 °dH', 'hardness_dH', 12],
  ['12 dH', 'hardness_dH', 12],
  ['56.0774 mmol/L', 'hardness_dH', 314.473_442_707_6],
  ['1 mmol/L', 'hardness_dH', 5.607_74],
  ['100,0869 ppm CaCO3', 'hardness_dH', 5.607_74],
  ['10.00869 °fH', 'hardness_dH', 5.607_74],
  ['12 %', 'loading_percent', 12],
  ['12%', 'volumeLoading_percent', 12],
  ['12 vol%', 'volumeLoading_percent', 12],
  ['12 Vol.-%', 'volumeLoading_percent', 12],
  ['12 % v/v', 'volumeLoading_percent', 12],
  ['12 wt%', 'massLoading_percent', 12],
  ['12 % w/w', 'massLoading_percent', 12],
  ['5 ‰', 'loading_percent', 0.5],
  ['1/3 %', 'loading_percent', 1 / 3],
  ['25', 'temperature_degC', 25],
  ['25 °C', 'temperature_degC', 25],
  ['25 ºC', 'temperature_degC', 25],
  ['25 ℃', 'temperature_degC', 25],
  ['25 degC', 'temperature_degC', 25],
  ['298.15 K', 'temperature_degC', 25],
  ['77 °F', 'temperature_degC', 25],
  ['-4 F', 'temperature_degC', -20],
  ['20+5 °C', 'temperature_degC', 25],
  ['2.5 mPa·s', 'viscosity_mPa_s', 2.5],
  ['2.5 mPa s', 'viscosity_mPa_s', 2.5],
  ['2.5 mPas', 'viscosity_mPa_s', 2.5],
  ['2,5 cP', 'viscosity_mPa_s', 2.5],
  ['0.0025 Pa*s', 'viscosity_mPa_s', 2.5],
  ['1 P', 'viscosity_mPa_s', 100],
  ['4.1 g/cm³', 'density_kg_m3', 4100],
  ['4.1 g/cm^3', 'density_kg_m3', 4100],
  ['4.1 g cm-3', 'density_kg_m3', 4100],
  ['4.1 g/mL', 'density_kg_m3', 4100],
  ['4,1 kg/L', 'density_kg_m3', 4100],
  ['4100 kg/m3', 'density_kg_m3', 4100],
  ['4.1-1.0 g/cm3', 'density_kg_m3', 3100],
  ['1.5 mg/m²', 'adsorbedAmount_mg_m2', 1.5],
  ['1.5 mg / m^2', 'adsorbedAmount_mg_m2', 1.5],
  ['1.5 mg·m⁻²', 'adsorbedAmount_mg_m2', 1.5],
  ['0.0015 g/m2', 'adsorbedAmount_mg_m2', 1.5],
  ['5 kDa', 'chainMolarMass_g_mol', 5000],
  ['5 kg/mol', 'chainMolarMass_g_mol', 5000],
  ['365 d', 'shelfLife_days', 365],
  ['365 days', 'shelfLife_days', 365],
  ['12 months', 'shelfLife_days', 365.25],
  ['1 month', 'shelfLife_days', 30.4375],
  ['4 weeks', 'shelfLife_days', 28],
  ['2 years', 'shelfLife_days', 730.5],
  ['36 h', 'shelfLife_days', 1.5],
  ['10 cm', 'fillHeight_mm', 100],
  ['4 in', 'fillHeight_mm', 101.6],
  ['45 zJ', 'entered_zJ', 45],
  ['4.5e-20 J', 'entered_zJ', 45],
  ['4.5×10⁻¹³ erg', 'entered_zJ', 45],
  ['1 eV', 'entered_zJ', 160.217_663_4],
  ['8,5', 'pH', 8.5],
  ['1 - 0.55', 'floryChi', 0.45],
  ['6 µm / 4 µm', 'floryChi', 1.5],
];

describe('readQuantity reads what formulators type', () => {
  it.each(readable)('%s as %s', (typed, kind, expected) => {
    const read = readQuantity(typed, kind);
    if (Number.isNaN(expected) || expected > quantityKinds[kind].max) expect(read.ok).toBe(false);
    // Thirteen digits for the hardness, whose expected values were rounded when written down; all others exact.
    else if (kind === 'hardness_dH' && read.ok) expect(read.value.value).toBeCloseTo(expected, 12);
    else expect(read.ok && read.value.value).toBe(expected);
  });

  it('reads pounds per US gallon (1 lb/gal = 119.826427 kg/m³, NIST SP 811 B.8, nine digits)', () => {
    const read = readQuantity('10 lb/gal', 'density_kg_m3');
    expect(read.ok && read.value.value).toBeCloseTo(1198.264_27, 5);
  });

  it('says how it was read, with the decimal sign of the reader', () => {
    const read = readQuantity('0,0715 µm', 'diameter_nm', ',');
    expect(read.ok && read.value.readAs).toBe('71,5\u00A0nm');
    expect(read.ok && read.value.note).toBeNull();
  });

  it.each(['1,234', '1.234 nm', '12,500'])('adds a note to %s, which is a thousand in half the world', (typed) => {
    const read = readQuantity(typed, 'diameter_nm');
    expect(read.ok && read.value.note).toMatch(/^Read as .*nm: /);
  });

  it.each(['0,234 µm', '1 234', '1,2345', '1,234.5', '12,34 nm'])('adds none to %s', (typed) => {
    const read = readQuantity(typed, 'diameter_nm');
    expect(read.ok && read.value.note).toBeNull();
  });

  it.each(Object.entries(quantityKinds))('reads its own examples and limits: %s', (kind, facts) => {
    const wanted = facts.example.split(' or ').map((one) => readQuantity(one, kind as QuantityKind));
    for (const read of wanted) expect(read.ok).toBe(true);
    // Two examples say the same thing, to the two digits that the second one is written with.
    const values = wanted.map((read) => (read.ok ? read.value.value : Number.NaN));
    for (const value of values) expect(value / values[0]).toBeCloseTo(1, 1);
    for (const limit of [facts.min, facts.max]) {
      const read = readQuantity(String(limit), kind as QuantityKind);
      expect(read.ok && read.value.value).toBe(limit);
    }
    for (const beyond of [facts.min - 1, facts.max * 1.01 + 1]) {
      expect(problemOf(String(beyond), kind as QuantityKind)?.code).toBe('out-of-range');
    }
  });
});

describe('readQuantity explains a slip', () => {
  it('names what is expected and what was typed', () => {
    expect(problemOf('5 mV', 'diameter_nm')).toEqual({
      code: 'wrong-unit',
      at: '',
      message: 'A length is expected here, for example 0.24 µm or 240 nm; "5 mV" is a potential.',
      remedy: 'Enter a length.',
    });
  });

  it('gives both limits in the unit of the file', () => {
    expect(problemOf('5 m', 'diameter_nm')?.message).toBe(
      'The diameter has to lie between 1\u00A0nm and 100000\u00A0nm; "5 m" is 5×10⁹\u00A0nm.',
    );
  });

  it.each([
    ['', 'diameter_nm', 'empty', /missing/],
    [' \u00A0 ', 'diameter_nm', 'empty', /missing/],
    ['10 kT', 'entered_zJ', 'unit-needs-more', /temperature/],
    ['5 NM', 'diameter_nm', 'unknown-unit', /"NM"/],
    ['5 foo', 'diameter_nm', 'unknown-unit', /"foo"/],
    ['5 nm2', 'diameter_nm', 'unknown-unit', /nm2/],
    ['5 cSt', 'viscosity_mPa_s', 'unit-needs-more', /kinematic/],
    ['5 ppm', 'hardness_dH', 'unit-needs-more', /of what/],
    ['5 °dH', 'concentration_mM', 'wrong-unit', /water hardness/],
    ['20 wt%', 'volumeLoading_percent', 'wrong-unit', /by mass/],
    ['20 vol%', 'loading_percent', 'wrong-unit', /by volume/],
    ['7 %', 'pH', 'wrong-unit', /without a unit/],
    ['6 µm / 2 µm', 'diameter_nm', 'wrong-unit', /without a unit/],
    ['38 ± 5 mV', 'zeta_mV', 'not-understood', /uncertainty/i],
    ['100–200 nm', 'diameter_nm', 'not-understood', /range/],
    ['~5 nm', 'diameter_nm', 'not-understood', /approximate/],
    ['5×10-3 M', 'concentration_mM', 'not-understood', /power of ten/],
    ['100 nm + 5', 'diameter_nm', 'mixed-units', /mixed/],
    ['5 nm + 5 mV', 'diameter_nm', 'mixed-units', /mixed/],
    ['5 nm * 5 nm', 'diameter_nm', 'mixed-units', /multiplied/],
    ['20 °C + 5 °C', 'temperature_degC', 'mixed-units', /Degrees/],
    ['1/0', 'diameter_nm', 'no-value', /zero/],
    ['2^0.5 nm', 'diameter_nm', 'no-value', /root/],
    ['1,2.5', 'diameter_nm', 'not-understood', /cannot be read/],
    ['1.2.3', 'diameter_nm', 'not-understood', /cannot be read/],
    ['1e-999', 'diameter_nm', 'too-complex', /too large or too small/],
    ['nm', 'diameter_nm', 'not-understood', /./],
    ['nm 5', 'diameter_nm', 'not-understood', /follow/],
  ] as const)('%s in %s is %s', (typed, kind, code, message) => {
    const problem = problemOf(typed, kind);
    expect(problem?.code).toBe(code);
    expect(problem?.message).toMatch(message);
    expect(problem?.remedy).toMatch(/\.$/);
    expect(problem?.at).toBe('');
  });
});

describe('readQuantity suggests the unit that was meant', () => {
  it.each([
    ['5 NM', 'Write nm if that is meant.'],
    ['5 MM', 'Write mm or mM if that is meant.'],
  ])('%s', (typed, remedy) => {
    expect(problemOf(typed, 'diameter_nm')?.remedy).toBe(remedy);
  });
});

describe('readQuantity keeps hostile text out', () => {
  const hostile: readonly string[] = [
    'config({number:"BigNumber"})',
    'config({"epsilon":1})',
    'createUnit("foo")',
    'createUnit("nm","5 m")',
    'import({a:1})',
    'import({a:1},{override:true})',
    'evaluate("1+1")',
    'parse("1+1")',
    'simplify("x+x")',
    'derivative("x^2","x")',
    'zeros(100000,100000)',
    'ones(20000,20000)',
    'sum(1:1e8)',
    'range(1,1e7)',
    '1:1e9',
    'f(x)=f(x+1)',
    'f(x)=x; f(1)',
    'a=5',
    'x',
    'constructor',
    '__proto__',
    'constructor.constructor("return process")()',
    '"a".constructor',
    '[].constructor',
    '({}).constructor',
    '{a:1}',
    '{"__proto__":{"polluted":1}}',
    '[1,2,3]',
    '[1:1e9]',
    'cos.constructor("return this")()',
    'unit0',
    'unit0*5',
    '5 unit0',
    'unit("5 nm")',
    '5 nm to m',
    '5 nm in m',
    'i',
    'e',
    'pi',
    'Infinity',
    'NaN',
    'undefined',
    'null',
    'true',
    '1==1',
    '5 > 3',
    '1 ? 2 : 3',
    '5!',
    "5'",
    '5 | 3',
    '5 & 3',
    '~5',
    '5 mod 3',
    '5 % 3',
    '5;6',
    '5\n6 7',
    '2(3)',
    '(2)(3)',
    '2 3',
    '9^9^9^9',
    '9^999999999',
    '((9^60)^60)^60',
    '1e308*1e308*1e308*1e308*1e308*1e308*1e308*1e308*1e308*1e308*1e308*1e308*1e308',
    '1/0',
    '0/0',
    '0^-1',
    '0x10',
    '0b11',
    '1e999999999',
    '1_000',
    '$5{6}',
    '<img src=x>',
    '=5',
    '@5',
    '5 \u202Enm',
    '5\u0000',
    '\uD800',
    '(',
    ')',
    '()',
    '5+',
    '*5',
    '5**2',
    '.',
    ',',
    '(((((((((((((((((((((((((5)))))))))))))))))))))))))',
    `${'-'.repeat(150)}5`,
    `${'1+'.repeat(99)}1`,
    '('.repeat(200),
    '9'.repeat(201),
    '1'.repeat(100_000),
  ];

  it('counts more than sixty of them', () => {
    expect(new Set(hostile).size).toBeGreaterThanOrEqual(60);
  });

  it.each(hostile.map((text): [string] => [text]))('refuses %j', (text) => {
    const read = readQuantity(text, 'diameter_nm');
    expect(read.ok).toBe(false);
    if (!read.ok) for (const { message } of read.problems) expect(message.length).toBeLessThan(300);
  });

  it('leaves nothing behind: prototypes and mathjs are as they were', () => {
    for (const text of hostile) readQuantity(text, 'diameter_nm');
    expect(Object.keys(Object.prototype)).toEqual([]);
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
    for (const mathjs of [whole, numbersOnly]) {
      expect(mathjs.evaluate('1 / 4 + 1 / 4')).toBe(0.5); // a changed number type would give an object
      expect(mathjs.parse('2 * x').type).toBe('OperatorNode');
    }
    expect(() => whole.unit('5 foo')).toThrow();
    const read = readQuantity('0.1 µm', 'diameter_nm');
    expect(read.ok && read.value.value).toBe(100);
  });
});
