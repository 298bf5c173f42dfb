/**
 * Exact fractions. A decimal such as 0.1 has no exact double, so 0.1 µm times 1000 can end in 99.99999999999999 nm;
 * kept as a fraction it is 100 nm, and the double is formed once, at the end.
 */
export interface Rational {
  readonly numerator: bigint;
  /** Always above zero. Not reduced: entries are short, see {@link MAX_DIGITS}. */
  readonly denominator: bigint;
}

/** Fractions longer than this are refused, so that a few nested powers cannot keep the machine busy. */
const MAX_DIGITS = 3000;
/** The midpoint between two doubles has at most 767 significant digits: with more, rounding is always right. */
const DIGITS_FOR_A_DOUBLE = 770;

/** The entry is too long to be worked out, or has no value. */
export class NoExactValue extends Error {
  readonly why: 'too-complex' | 'no-value';
  constructor(why: 'too-complex' | 'no-value') {
    super(why);
    this.why = why;
  }
}

const digitsOf = (whole: bigint): number => whole.toString().replace('-', '').length;

function fraction(numerator: bigint, denominator: bigint): Rational {
  if (denominator === 0n) throw new NoExactValue('no-value');
  // A bigint of d decimal digits has at least 0.83 d hexadecimal ones: a cheap test before the exact work goes on.
  if (numerator.toString(16).length > MAX_DIGITS || denominator.toString(16).length > MAX_DIGITS) {
    throw new NoExactValue('too-complex');
  }
  return denominator < 0n ? { numerator: -numerator, denominator: -denominator } : { numerator, denominator };
}

/** Reads `12`, `0.5`, `1e-9`, `-2.5E+3`: what `String(number)` writes. */
export function rational(decimal: string): Rational {
  const parts = /^([+-]?)(\d+)(?:\.(\d+))?(?:[eE]([+-]?\d{1,4}))?$/.exec(decimal);
  if (parts === null) throw new RangeError(`rational: "${decimal}" is not a decimal number`);
  const [, sign, whole, decimals = '', exponent = '0'] = parts;
  const digits = BigInt(`${whole}${decimals}`) * (sign === '-' ? -1n : 1n);
  const shift = Number(exponent) - decimals.length;
  if (Math.abs(shift) > MAX_DIGITS) throw new NoExactValue('too-complex');
  return shift >= 0 ? fraction(digits * 10n ** BigInt(shift), 1n) : fraction(digits, 10n ** BigInt(-shift));
}

export const add = (a: Rational, b: Rational): Rational =>
  fraction(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator);
export const negative = (a: Rational): Rational => ({ numerator: -a.numerator, denominator: a.denominator });
export const subtract = (a: Rational, b: Rational): Rational => add(a, negative(b));
export const multiply = (a: Rational, b: Rational): Rational =>
  fraction(a.numerator * b.numerator, a.denominator * b.denominator);
export const divide = (a: Rational, b: Rational): Rational =>
  fraction(a.numerator * b.denominator, a.denominator * b.numerator);

/** Whole powers only: any other power is rarely a fraction. */
export function power(base: Rational, exponent: Rational): Rational {
  if (exponent.numerator % exponent.denominator !== 0n) throw new NoExactValue('no-value');
  const whole = exponent.numerator / exponent.denominator;
  const times = whole < 0n ? -whole : whole;
  const longest = BigInt(Math.max(digitsOf(base.numerator), digitsOf(base.denominator)));
  if (times > 1000n || longest * times > BigInt(MAX_DIGITS)) throw new NoExactValue('too-complex');
  const raised = fraction(base.numerator ** times, base.denominator ** times);
  return whole < 0n ? divide({ numerator: 1n, denominator: 1n }, raised) : raised;
}

/** The nearest double; Infinity or 0 beyond the range of doubles. */
export function numberOf({ numerator, denominator }: Rational): number {
  if (numerator === 0n) return 0;
  const size = numerator < 0n ? -numerator : numerator;
  const shift = DIGITS_FOR_A_DOUBLE - digitsOf(size) + digitsOf(denominator);
  const top = shift >= 0 ? size * 10n ** BigInt(shift) : size;
  const bottom = shift >= 0 ? denominator : denominator * 10n ** BigInt(-shift);
  // A trailing 1 stands for the digits cut off, so that a value just above a tie is not rounded down.
  const tail = top % bottom === 0n ? '0' : '1';
  return Number(`${numerator < 0n ? '-' : ''}${top / bottom}${tail}e${-shift - 1}`);
}
