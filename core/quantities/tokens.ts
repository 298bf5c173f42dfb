import { NUMERAL, readNumeral } from './numeral';
import { type Unit, units, unitsToRefuse } from './units';

/**
 * What a person typed, cut into numbers, units and operators. Nothing typed goes further as text: the parser behind
 * sees only numbers written by us, stand-ins for units, and the signs + - * / ^ ( ).
 */
export type Token =
  | { readonly kind: 'number'; readonly decimal: string }
  | { readonly kind: 'unit'; readonly unit: Unit }
  | { readonly kind: 'sign'; readonly sign: string };

/** Why the cutting stopped; code and sentences as in a `Problem`. */
export interface Stumble {
  readonly code: string;
  readonly message: string;
  readonly remedy: string;
}

export type Tokens =
  | { readonly ok: true; readonly tokens: readonly Token[]; readonly ambiguousNumeral: string | null }
  | { readonly ok: false; readonly stumble: Stumble };

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const plainDigits = (raised: string): string =>
  [...raised].map((sign) => (sign === '⁻' ? '-' : sign === '⁺' ? '' : SUPERSCRIPTS.indexOf(sign))).join('');

/**
 * One form for the many ways to type the same thing: full-width and superscript characters, the micro signs, minus
 * signs, no-break blanks, `cm^3`, `mPa·s`, `mg / m²`, `per`.
 */
export function canonicalText(typed: string): string {
  return typed
    .replace(/[º˚]/g, '°')
    .replace(/(\p{L}?)([⁺⁻]?[⁰¹²³⁴-⁹]+)/gu, (_, letter: string, raised: string) =>
      letter === '' ? `^(${plainDigits(raised)})` : `${letter}${plainDigits(raised)}`,
    )
    .replace(/(\d+) ?([¼-¾⅐-⅞])/g, '($1+$2)')
    .normalize('NFKC')
    .replace(/[\u2212\u2010\u2011]/g, '-')
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/(?<=^|[-+*/^(eE] ?)\u2013/g, '-')
    .replace(/[÷∕⁄]/g, '/')
    .replace(/(?<=\p{L}) per (?=\p{L})/gu, '/')
    .replace(/(?<=\p{L}) ?[·⋅∙*] ?(?=\p{L})/gu, ' ')
    .replace(/(?<=[\p{L}%]) ?\/ ?(?=\p{L})/gu, '/')
    .replace(/(?<=\p{L})(?:\^|\*\*)(?=-?\d)/gu, '');
}

interface Spelling {
  readonly text: string;
  readonly unit: Unit | null;
}

/** Longest first, so that `mg/m2` is not taken for `m`. */
const spellings: readonly Spelling[] = [
  ...units.flatMap((unit) => unit.spellings.map((text) => ({ text: text.normalize('NFKC'), unit }))),
  ...unitsToRefuse.map(({ spelling }) => ({ text: spelling, unit: null })),
].sort((a, b) => b.text.length - a.text.length);

const partOfAWord = /[\p{L}\p{N}]/u;

const spellingAt = (text: string, at: number): Spelling | undefined =>
  spellings.find(
    (spelling) => text.startsWith(spelling.text, at) && !partOfAWord.test(text[at + spelling.text.length] ?? ''),
  );

const quoted = (text: string): string => `"${text.length > 30 ? `${text.slice(0, 30)}…` : text}"`;

function unknownUnit(text: string, at: number): Stumble {
  const word = /^[\p{L}°%‰][^\s()+*]*/u.exec(text.slice(at))?.[0] ?? text.slice(at);
  const near = units.filter((unit) => unit.spellings.some((one) => one.toLowerCase() === word.toLowerCase()));
  return {
    code: 'unknown-unit',
    message: `The unit ${quoted(word)} is not known here.`,
    remedy:
      near.length === 0
        ? 'Use another unit, or the one beside the field.'
        : `Write ${near.map(({ symbol }) => symbol).join(' or ')} if that is meant.`,
  };
}

function refusedUnit(spelling: string): Stumble {
  const facts = unitsToRefuse.find((one) => one.spelling === spelling);
  return {
    code: 'unit-needs-more',
    message: `${quoted(spelling)} cannot be read here: ${facts?.why ?? 'its meaning is open'}.`,
    remedy: facts?.remedy ?? 'Use another unit.',
  };
}

const strangeSigns: readonly { readonly pattern: RegExp; readonly message: string; readonly remedy: string }[] = [
  {
    pattern: /±|\+\/-|\+-/,
    message: 'An uncertainty cannot stand in the same field.',
    remedy: 'Enter the value here and its uncertainty in its own field.',
  },
  {
    pattern: /[–—~]|\.\.|…/,
    message: 'A range or an approximate value cannot be read.',
    remedy: 'Enter one number.',
  },
  {
    pattern: /[×x·⋅] ?10 ?-/,
    message: 'The power of ten has lost its place.',
    remedy: 'Write it as 5e-3 or 5×10^-3.',
  },
];

const notUnderstood = (text: string, at: number): Stumble => ({
  code: 'not-understood',
  message: `${quoted(text)} cannot be read as a number: reading stopped at ${quoted([...text.slice(at)][0] ?? '')}.`,
  remedy: 'Enter a number and, if you like, a unit.',
});

/** `e-3` directly behind the digits, or `×10^-3`. */
const EXPONENT = /(?:[eE]([+-]?\d{1,4})| ?[×x·⋅*] ?10 ?\^ ?(?:\(([+-]?\d{1,4})\)|([+-]?\d{1,4})))(?![\d.,])/y;

const matchAt = (pattern: RegExp, text: string, at: number): RegExpExecArray | null => {
  pattern.lastIndex = at;
  return pattern.exec(text);
};

const signs = new Map([
  ...[...'+-*/^()'].map((sign): [string, string] => [sign, sign]),
  ...[...'×·⋅∙∗'].map((sign): [string, string] => [sign, '*']),
]);

export function tokensOf(text: string): Tokens {
  const strange = strangeSigns.find(({ pattern }) => pattern.test(text));
  if (strange !== undefined) {
    return { ok: false, stumble: { code: 'not-understood', message: strange.message, remedy: strange.remedy } };
  }
  const tokens: Token[] = [];
  let ambiguousNumeral: string | null = null;
  let at = 0;
  while (at < text.length) {
    const character = text[at];
    const sign = signs.get(character);
    const typed = matchAt(NUMERAL, text, at)?.[0];
    if (character === ' ') at += 1;
    else if (sign !== undefined) {
      tokens.push({ kind: 'sign', sign });
      at += 1;
    } else if (typed !== undefined) {
      const numeral = readNumeral(typed);
      if (numeral === undefined) return { ok: false, stumble: notUnderstood(text, at + typed.search(/[^\d]/)) };
      at += typed.length;
      const exponent = matchAt(EXPONENT, text, at);
      at += exponent?.[0].length ?? 0;
      const power = exponent?.[1] ?? exponent?.[2] ?? exponent?.[3];
      const decimal = power === undefined ? numeral.decimal : `${numeral.decimal}e${power}`;
      const value = Number(decimal);
      if (!Number.isFinite(value) || (value === 0 && /[1-9]/.test(numeral.decimal))) {
        return {
          ok: false,
          stumble: {
            code: 'too-complex',
            message: 'The number is too large or too small.',
            remedy: 'Check its power of ten.',
          },
        };
      }
      if (numeral.ambiguous && power === undefined) ambiguousNumeral ??= typed;
      tokens.push({ kind: 'number', decimal });
    } else if (/[\p{L}°%‰]/u.test(character)) {
      const spelling = spellingAt(text, at);
      if (spelling === undefined) return { ok: false, stumble: unknownUnit(text, at) };
      if (spelling.unit === null) return { ok: false, stumble: refusedUnit(spelling.text) };
      tokens.push({ kind: 'unit', unit: spelling.unit });
      at += spelling.text.length;
    } else return { ok: false, stumble: notUnderstood(text, at) };
  }
  return { ok: true, tokens, ambiguousNumeral };
}
