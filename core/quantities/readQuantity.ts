import { done, type Problem, type Result, refused } from '../problem';
import { type Amount, amountFrom, outOfSI, Refusal } from './arithmetic';
import { type KindFacts, type QuantityKind, quantityKinds } from './quantityKinds';
import { NoExactValue, numberOf, type Rational } from './rational';
import { canonicalText, type Token, tokensOf } from './tokens';
import { dimensionNouns, unitOf } from './units';
import { type DecimalSign, writeQuantity } from './writeQuantity';

export interface ReadQuantity {
  /** In the unit of the file, see `quantityKinds`. */
  readonly value: number;
  /** How the entry was read, for example `240 nm`. */
  readonly readAs: string;
  /** Said beside the field when the entry could be read in two ways. */
  readonly note: string | null;
}

const MAX_CHARACTERS = 200;
const DIGITS_SHOWN = 6;

const capital = (text: string): string => `${text[0].toUpperCase()}${text.slice(1)}`;
const problem = (code: string, message: string, remedy: string): Result<never> =>
  refused({ code, at: '', message, remedy } satisfies Problem);

const quoted = (text: string): string => `"${text.length > 40 ? `${text.slice(0, 40)}…` : text}"`;

/** `-0` would be shown with a sign and stored with one. */
const withoutMinusZero = (value: number): number => (value === 0 ? 0 : value);

function wrongDimension(typed: string, { dimension }: Amount, kind: KindFacts): Result<never> {
  const [expected] = kind.dimensions;
  const found = dimension === null ? 'a number without a unit' : dimensionNouns[dimension];
  const basis = dimension === 'volumeRatio' || dimension === 'massRatio';
  return problem(
    'wrong-unit',
    `${capital(dimensionNouns[expected])} is expected here, for example ${kind.example}; ${quoted(typed)} is ${found}.`,
    basis && kind.dimensions.includes('ratio')
      ? 'Choose the basis of the loading first, then enter the percentage.'
      : `Enter ${dimensionNouns[expected]}.`,
  );
}

const isMeant = ({ dimension }: Amount, kind: KindFacts): boolean =>
  dimension === null ? kind.dimensions.includes('number') : kind.dimensions.includes(dimension);

function fileValue(tokens: readonly Token[], typed: string, kind: KindFacts): Result<number> {
  const fileUnit = kind.fileUnit === '' ? null : unitOf(kind.fileUnit);
  try {
    const amount = amountFrom(tokens, fileUnit);
    if (!isMeant(amount, kind)) return wrongDimension(typed, amount, kind);
    const inFileUnit: Rational = fileUnit === null ? amount.value : outOfSI(amount.value, fileUnit);
    return done(withoutMinusZero(numberOf(inFileUnit)));
  } catch (error) {
    if (error instanceof NoExactValue) {
      return problem(
        'too-complex',
        'The number is too long to be read.',
        `Enter a shorter one, for example ${kind.example}.`,
      );
    }
    if (!(error instanceof Refusal)) throw error;
    return problem(error.code, error.message, `Enter a number and a unit, for example ${kind.example}.`);
  }
}

/**
 * Reads what was typed into a field. A bare number has the unit of the file; comma and point are both decimal signs;
 * small sums are worked out. Every refusal is a problem whose place (`at`) is empty: the caller knows the field.
 */
export function readQuantity(
  typed: string,
  quantityKind: QuantityKind,
  decimalSign: DecimalSign = '.',
): Result<ReadQuantity> {
  const kind = quantityKinds[quantityKind];
  if (typed.length > MAX_CHARACTERS) {
    return problem(
      'too-long',
      `The entry is longer than ${MAX_CHARACTERS} characters.`,
      'Enter one number and a unit.',
    );
  }
  const text = canonicalText(typed);
  if (text === '') return problem('empty', `The ${kind.name} is missing.`, `Enter it, for example ${kind.example}.`);
  const cut = tokensOf(text);
  if (!cut.ok) return refused({ ...cut.stumble, at: '' });
  const read = fileValue(cut.tokens, typed.trim(), kind);
  if (!read.ok) return read;
  const value = read.value;
  const write = (number: number): string =>
    writeQuantity(number, { unit: kind.fileUnit, digits: DIGITS_SHOWN, decimalSign });
  if (!(value >= kind.min && value <= kind.max)) {
    const readAs = Number.isFinite(value) ? write(value) : 'beyond every number';
    return problem(
      'out-of-range',
      `The ${kind.name} has to lie between ${write(kind.min)} and ${write(kind.max)}; ${quoted(typed.trim())} is ${readAs}.`,
      'Check the number and its unit.',
    );
  }
  const note =
    cut.ambiguousNumeral === null
      ? null
      : `Read as ${write(value)}: a single comma or point is the decimal sign. Leave it out to enter thousands.`;
  return done({ value, readAs: write(value), note });
}
