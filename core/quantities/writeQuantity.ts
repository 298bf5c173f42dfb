export type DecimalSign = '.' | ',';

export interface Writing {
  /** Symbol behind the number, after a no-break space; empty for none. */
  readonly unit: string;
  /** Most significant digits shown; zeros at the end are left out. */
  readonly digits: number;
  readonly decimalSign: DecimalSign;
}

const NO_BREAK_SPACE = '\u00A0';
const MINUS = '\u2212';
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

const raised = (exponent: number): string =>
  `${exponent < 0 ? '⁻' : ''}${[...String(Math.abs(exponent))].map((digit) => superscripts[Number(digit)]).join('')}`;

const withoutZerosAtTheEnd = (digits: string): string => (digits.includes('.') ? digits.replace(/\.?0+$/, '') : digits);

/**
 * A number as a person reads it: a true minus, `×10ⁿ` below 0.001 and from a million up, no grouping (so that it can be
 * read back in any country), never more digits than asked for.
 * Throws RangeError for a number that is not finite: those are put in words where they are shown.
 */
export function writeQuantity(value: number, { unit, digits, decimalSign }: Writing): string {
  if (!Number.isFinite(value)) throw new RangeError(`writeQuantity: the value must be finite, got ${value}`);
  if (!Number.isInteger(digits) || digits < 1 || digits > 15) {
    throw new RangeError(`writeQuantity: digits must be a whole number from 1 to 15, got ${digits}`);
  }
  const [mantissa, exponentText] = Math.abs(value)
    .toExponential(digits - 1)
    .split('e');
  const exponent = Number(exponentText);
  const plain = value === 0 || (exponent >= -3 && exponent < 6);
  const figures = plain
    ? withoutZerosAtTheEnd(Number(`${mantissa}e${exponent}`).toFixed(Math.max(0, digits - 1 - exponent)))
    : `${withoutZerosAtTheEnd(mantissa)}×10${raised(exponent)}`;
  const sign = value < 0 ? MINUS : '';
  return `${sign}${figures.replace('.', decimalSign)}${unit === '' ? '' : `${NO_BREAK_SPACE}${unit}`}`;
}
