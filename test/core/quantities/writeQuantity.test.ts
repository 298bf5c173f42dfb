import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type QuantityKind, quantityKinds } from '../../../core/quantities/quantityKinds';
import { readQuantity } from '../../../core/quantities/readQuantity';
import { type DecimalSign, writeQuantity } from '../../../core/quantities/writeQuantity';

const write = (value: number, digits: number, unit = '', decimalSign: DecimalSign = '.'): string =>
  writeQuantity(value, { unit, digits, decimalSign });

describe('writeQuantity', () => {
  it.each([
    [0, 3, '0'],
    [-0, 3, '0'],
    [240, 3, '240'],
    [240.4, 3, '240'],
    [0.1 + 0.2, 4, '0.3'],
    [99.99999999999999, 6, '100'],
    [-38, 3, '\u221238'],
    [1234.5, 3, '1230'],
    [123456, 6, '123456'],
    [999_999.5, 3, '1×10⁶'],
    [1_234_567, 3, '1.23×10⁶'],
    [0.00123, 3, '0.00123'],
    [0.000123, 3, '1.23×10⁻⁴'],
    [-1.5e-21, 2, '\u22121.5×10⁻²¹'],
    [5e-324, 3, '4.94×10⁻³²⁴'],
    [Number.MAX_VALUE, 3, '1.8×10³⁰⁸'],
    [1 / 3, 15, '0.333333333333333'],
  ])('%d with %d digits is %s', (value, digits, expected) => {
    expect(write(value, digits)).toBe(expected);
  });

  it('puts a no-break space before the unit and takes the decimal sign of the reader', () => {
    expect(write(1.5, 3, 'mPa·s', ',')).toBe('1,5\u00A0mPa·s');
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])('throws for %d', (value) => {
    expect(() => write(value, 3)).toThrow(RangeError);
  });

  it.each([0, 16, 2.5])('throws for %d digits', (digits) => {
    expect(() => write(1, digits)).toThrow(/digits/);
  });
});

describe('what is written can be read back', () => {
  const kinds = Object.keys(quantityKinds) as QuantityKind[];

  it.each(kinds)('%s, with either decimal sign', (kind) => {
    const { min, max, fileUnit } = quantityKinds[kind];
    const within = fc.double({ min, max, noNaN: true }).map((value) => Number(value.toPrecision(15)));
    fc.assert(
      fc.property(within, fc.constantFrom<DecimalSign>('.', ','), (value, decimalSign) => {
        fc.pre(value >= min && value <= max);
        const text = write(value, 15, fileUnit, decimalSign);
        const read = readQuantity(text, kind);
        expect(read.ok && read.value.value).toBe(value === 0 ? 0 : value);
      }),
    );
  });

  /** Numbers below a thousand or with decimals: `1.234` from a German for 1234 is the one reading that cannot be told. */
  it.each(['en', 'de', 'fr', 'de-CH', 'sv', 'en-IN', 'pt-BR', 'nb'])('numbers grouped as in %s', (locale) => {
    const format = new Intl.NumberFormat(locale, { minimumFractionDigits: 2, maximumFractionDigits: 2 });
    fc.assert(
      fc.property(fc.integer({ min: 100, max: 10_000_000 }), (hundredths) => {
        const read = readQuantity(format.format(hundredths / 100), 'diameter_nm');
        expect(read.ok && read.value.value).toBe(hundredths / 100);
      }),
    );
  });

  it.each(['µm', 'nm', 'Å', 'mm', 'm'])('the same length in %s gives the same number', (unit) => {
    const perNanometre = new Map([
      ['µm', -3],
      ['nm', 0],
      ['Å', 1],
      ['mm', -6],
      ['m', -9],
    ]).get(unit);
    fc.assert(
      fc.property(fc.integer({ min: 10, max: 1_000_000 }), (tenths_nm) => {
        const read = readQuantity(`${tenths_nm}e${(perNanometre ?? 0) - 1} ${unit}`, 'diameter_nm');
        expect(read.ok && read.value.value).toBe(tenths_nm / 10);
      }),
    );
  });
});

describe('readQuantity on any text', () => {
  const fragments = [
    '1',
    '2,5',
    '.',
    ',',
    'e',
    '-',
    '+',
    '(',
    ')',
    '^',
    '*',
    '/',
    ' ',
    'nm',
    'µm',
    '%',
    '°C',
    '×10⁻³',
    '9',
    "'",
  ];
  it('answers with a finite number within the limits, or with problems', () => {
    const { min, max } = quantityKinds.diameter_nm;
    const anything = fc.oneof(
      fc.string({ unit: 'binary', maxLength: 210 }),
      fc.array(fc.constantFrom(...fragments), { maxLength: 60 }).map((parts) => parts.join('')),
    );
    fc.assert(
      fc.property(anything, (text) => {
        const read = readQuantity(text, 'diameter_nm');
        if (read.ok) {
          expect(read.value.value).toBeGreaterThanOrEqual(min);
          expect(read.value.value).toBeLessThanOrEqual(max);
        } else expect(read.problems.length).toBeGreaterThan(0);
      }),
      { numRuns: 3000 },
    );
  });
});
