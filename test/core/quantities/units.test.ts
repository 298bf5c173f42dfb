import { describe, expect, it } from 'vitest';
import { readNumeral } from '../../../core/quantities/numeral';
import { quantityKinds } from '../../../core/quantities/quantityKinds';
import { numberOf, power, rational } from '../../../core/quantities/rational';
import { canonicalText } from '../../../core/quantities/tokens';
import { unitOf, units, unitsToRefuse } from '../../../core/quantities/units';

describe('the table of units', () => {
  const spellings = [...units.flatMap((unit) => unit.spellings), ...unitsToRefuse.map(({ spelling }) => spelling)];

  it('gives no spelling two meanings', () => {
    expect(spellings.filter((one, index) => spellings.indexOf(one) !== index)).toEqual([]);
  });

  it.each(spellings)('has %j in the form in which typed text arrives', (spelling) => {
    expect(canonicalText(spelling)).toBe(spelling.normalize('NFKC'));
  });

  it.each(units.map((unit) => unit.symbol))('can read the symbol %s as the screen writes it', (symbol) => {
    expect(unitOf(symbol).spellings.map((one) => one.normalize('NFKC'))).toContain(canonicalText(symbol));
  });

  it('holds the unit of every field, with the dimension of that field', () => {
    for (const { fileUnit, dimensions } of Object.values(quantityKinds)) {
      if (fileUnit === '') expect(dimensions).toEqual(['number']);
      else expect(dimensions).toContain(unitOf(fileUnit).dimension);
    }
  });

  it('throws for a symbol that we misspelt', () => {
    expect(() => unitOf('furlong')).toThrow(/furlong/);
  });
});

describe('readNumeral', () => {
  it.each([
    ['5', '5'],
    ['5,', '5'],
    ['5.', '5'],
    [',5', '0.5'],
    ['1,234,567', '1234567'],
    ['1.234.567', '1234567'],
    ['12,34,567.25', '1234567.25'],
    ['1 234 567,5', '1234567.5'],
    ["1'234'567.5", '1234567.5'],
    ['0.123 456', '0.123456'],
  ])('%s is %s', (typed, decimal) => {
    expect(readNumeral(typed)?.decimal).toBe(decimal);
  });

  it.each(['1,2,3', '1.23.456', '1,2.3', '1.234,567,8', "1'23", '12 34', "1'234 567"])('refuses %s', (typed) => {
    expect(readNumeral(typed)).toBeUndefined();
  });
});

describe('exact fractions', () => {
  it.each(['0.1', '1e-21', '123456789.123456789', '-2.5E+3', '5e-324', '1.7976931348623157e308'])(
    '%s stays itself',
    (text) => {
      expect(numberOf(rational(text))).toBe(Number(text));
    },
  );

  it('rounds just above a tie upwards: 1 + 2⁻⁵³ lies between two doubles', () => {
    const tie = '1.00000000000000011102230246251565404236316680908203125';
    expect(numberOf(rational(tie))).toBe(1);
    expect(numberOf(rational(`${tie}1`))).toBe(1 + Number.EPSILON);
  });

  it('raises to negative powers and refuses endless ones', () => {
    expect(numberOf(power(rational('10'), rational('-3')))).toBe(0.001);
    expect(() => power(rational('10'), rational('1e9'))).toThrow('too-complex');
    expect(() => power(rational('0'), rational('-1'))).toThrow('no-value');
  });

  it('throws for text that is no decimal number', () => {
    expect(() => rational('0x10')).toThrow(RangeError);
  });
});
