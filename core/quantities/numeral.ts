/** A number as it was typed, without sign and unit, brought to the form `1234.5e-3`. */
export interface Numeral {
  readonly decimal: string;
  /** True for `1,234` and `1.234`: in half the world that is one thousand. It is read as a decimal, and shown. */
  readonly ambiguous: boolean;
}

/** Digits with any separators between them; a blank only before a group of exactly three digits. */
export const NUMERAL = /(?:\d+(?:[.,'’ʼ]\d+| \d{3}(?!\d))*[.,]?|[.,]\d+)/y;

const byThrees = (groups: readonly string[]): boolean =>
  /^\d{1,3}$/.test(groups[0] ?? '') && groups.slice(1).every((group) => group.length === 3);

/** 12,34,567: the last group has three digits, the others two. */
const byTwosThenThree = (groups: readonly string[]): boolean =>
  /^\d{1,2}$/.test(groups[0] ?? '') &&
  groups.slice(1, -1).every((group) => group.length === 2) &&
  groups.at(-1)?.length === 3;

/** Whole part with at most one kind of grouping sign; undefined when the groups make no sense. */
function ungrouped(whole: string): string | undefined {
  const signs = new Set(whole.replace(/\d/g, ''));
  if (signs.size === 0) return whole;
  const [sign] = signs;
  if (signs.size > 1 || sign === undefined) return undefined;
  const groups = whole.split(sign);
  if (byThrees(groups) || (sign === ',' && byTwosThenThree(groups))) return groups.join('');
  return undefined;
}

/**
 * Decimal comma and point are both taken, whatever the country. One separator alone is the decimal sign; of two kinds
 * the last is the decimal sign and the other groups; several of one kind group. Blanks and apostrophes always group.
 * Returns undefined when no such reading fits.
 */
export function readNumeral(typed: string): Numeral | undefined {
  const points = typed.split('.').length - 1;
  const commas = typed.split(',').length - 1;
  const last = Math.max(typed.lastIndexOf('.'), typed.lastIndexOf(','));
  const hasDecimalSign = points + commas === 1 || (points > 0 && commas > 0);
  if (points > 0 && commas > 0 && (typed[last] === '.' ? points : commas) > 1) return undefined;
  const whole = hasDecimalSign ? typed.slice(0, last) : typed;
  const decimals = hasDecimalSign ? typed.slice(last + 1) : '';
  const digits = whole === '' ? '0' : ungrouped(whole);
  if (digits === undefined || !/^(?:\d*|\d{3}(?: \d{3})+)$/.test(decimals)) return undefined;
  const tail = decimals.replaceAll(' ', '');
  return {
    decimal: tail === '' ? digits : `${digits}.${tail}`,
    ambiguous: hasDecimalSign && /^[1-9]\d{0,2}[.,]\d{3}$/.test(typed),
  };
}
