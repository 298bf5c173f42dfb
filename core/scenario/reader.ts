import type { Problem } from '../problem';

/**
 * Small readers for untrusted JSON values. Each checks one shape and reports every slip it meets, with its place,
 * instead of stopping at the first. Objects are built anew, field by field, so no key of the file reaches a prototype;
 * the depth is that of the schema, so a deeply nested file cannot exhaust the stack.
 */
export interface Reading {
  readonly problems: Problem[];
}

/** Returns the value, or undefined after noting a problem. */
export type Reader<T> = (value: unknown, at: string, reading: Reading) => T | undefined;

export const pointerTo = (at: string, key: string | number): string =>
  `${at}/${String(key).replaceAll('~', '~0').replaceAll('/', '~1')}`;

const shown = (value: unknown): string => {
  if (value === null) return 'null';
  if (typeof value === 'string') return value.length > 40 ? `"${value.slice(0, 40)}…"` : `"${value}"`;
  if (typeof value === 'number' || typeof value === 'boolean') return String(value);
  return Array.isArray(value) ? 'a list' : 'a group of entries';
};

const note = (reading: Reading, code: string, at: string, message: string, remedy: string): undefined => {
  reading.problems.push({ code, at, message, remedy });
  return undefined;
};

type Fields<T> = { readonly [K in keyof T]: Reader<T[K]> };

/** An object with exactly these keys. An unknown key is a slip of the pen, so it is reported, never dropped. */
export const group =
  <T extends object>(what: string, fields: Fields<T>): Reader<T> =>
  (value, at, reading) => {
    if (typeof value !== 'object' || value === null || Array.isArray(value)) {
      return note(
        reading,
        'not-a-group',
        at,
        `Here ${what} is expected, but ${shown(value)} was found.`,
        'Compare with a file saved by Sunder.',
      );
    }
    const before = reading.problems.length;
    const entries = new Map(Object.entries(value));
    const read: Partial<T> = {};
    for (const key of Object.keys(fields) as (keyof T & string)[]) {
      const place = pointerTo(at, key);
      if (!entries.has(key)) {
        note(
          reading,
          'missing',
          place,
          `The entry "${key}" is missing from ${what}.`,
          'Add it, or open the file in Sunder’s own format.',
        );
        continue;
      }
      const entry = fields[key](entries.get(key), place, reading);
      if (entry !== undefined) read[key] = entry;
      entries.delete(key);
    }
    for (const key of entries.keys()) {
      note(
        reading,
        'unknown-entry',
        pointerTo(at, key),
        `The entry "${key}" is not known in ${what}.`,
        'Correct its spelling or remove it.',
      );
    }
    return reading.problems.length === before ? (read as T) : undefined;
  };

export const list =
  <T>(what: string, item: Reader<T>, count: { readonly min: number; readonly max: number }): Reader<readonly T[]> =>
  (value, at, reading) => {
    if (!Array.isArray(value)) {
      return note(
        reading,
        'not-a-list',
        at,
        `A list of ${what} is expected, but ${shown(value)} was found.`,
        'Put the entries between square brackets.',
      );
    }
    if (value.length < count.min || value.length > count.max) {
      return note(
        reading,
        'wrong-count',
        at,
        `Between ${count.min} and ${count.max} ${what} are expected, but there are ${value.length}.`,
        value.length < count.min ? 'Add the missing ones.' : 'Remove some, or split the scenario in two files.',
      );
    }
    const before = reading.problems.length;
    const items: T[] = [];
    value.forEach((entry, index) => {
      const read = item(entry, pointerTo(at, index), reading);
      if (read !== undefined) items.push(read);
    });
    return reading.problems.length === before ? items : undefined;
  };

/** C0 and C1 controls and the marks that turn the reading direction: a name must look like what it is. */
const isDisguise = (codePoint: number): boolean =>
  (codePoint < 0x20 && codePoint !== 0x0a && codePoint !== 0x09) ||
  (codePoint >= 0x7f && codePoint <= 0x9f) ||
  (codePoint >= 0x202a && codePoint <= 0x202e) ||
  (codePoint >= 0x2066 && codePoint <= 0x2069) ||
  (codePoint >= 0xd800 && codePoint <= 0xdfff);

export const text =
  (maxLength: number, minLength = 0): Reader<string> =>
  (value, at, reading) => {
    if (typeof value !== 'string') {
      return note(
        reading,
        'not-text',
        at,
        `Text is expected, but ${shown(value)} was found.`,
        'Put the text between double quotes.',
      );
    }
    if (value.length > maxLength || value.length < minLength) {
      return note(
        reading,
        'wrong-length',
        at,
        `Text of ${minLength} to ${maxLength} characters is expected, but it has ${value.length}.`,
        'Change its length.',
      );
    }
    for (const character of value) {
      if (isDisguise(character.codePointAt(0) ?? 0)) {
        return note(
          reading,
          'control-character',
          at,
          'The text holds an invisible control character.',
          'Type the text anew.',
        );
      }
    }
    return value;
  };

export const oneOf =
  <T extends string>(choices: readonly T[]): Reader<T> =>
  (value, at, reading) =>
    choices.find((choice) => choice === value) ??
    note(
      reading,
      'not-a-choice',
      at,
      `One of ${choices.map((c) => `"${c}"`).join(', ')} is expected, but ${shown(value)} was found.`,
      'Use one of these words.',
    );

export const orNull =
  <T>(reader: Reader<T>): Reader<T | null> =>
  (value, at, reading) =>
    value === null ? null : reader(value, at, reading);

export interface NumberLimits {
  readonly min: number;
  readonly max: number;
  readonly unit: string;
}

export const number =
  (limits: NumberLimits): Reader<number> =>
  (value, at, reading) => {
    const range = `${limits.min} to ${limits.max}${limits.unit === '' ? '' : ` ${limits.unit}`}`;
    if (typeof value !== 'number' || !Number.isFinite(value)) {
      return note(
        reading,
        'not-a-number',
        at,
        `A number from ${range} is expected, but ${typeof value === 'number' ? 'the number is too large' : `${shown(value)} was found`}.`,
        'Enter a number without a unit; the unit stands in the name of the entry.',
      );
    }
    if (value < limits.min || value > limits.max) {
      return note(
        reading,
        'out-of-range',
        at,
        `A number from ${range} is expected, but ${value} was found.`,
        'Check the value and its unit.',
      );
    }
    return value === 0 ? 0 : value;
  };

/** A key that must exist in a catalogue. */
export const keyOf =
  (what: string, exists: (key: string) => boolean): Reader<string> =>
  (value, at, reading) =>
    typeof value === 'string' && exists(value)
      ? value
      : note(
          reading,
          'unknown-name',
          at,
          `${shown(value)} is not ${what} that Sunder knows.`,
          'Choose one from the list in the window, or check its spelling.',
        );
