import { basename } from 'node:path';

export const SCENARIO_ENDING = '.sunder.json';

const MAX_NAME_LENGTH = 80;
/** Names that mean a device on Windows, with any ending. */
const DEVICE = /^(con|prn|aux|nul|com[0-9]|lpt[0-9])(\.|$)/i;
const ALLOWED = /^[\p{L}\p{N}_][\p{L}\p{M}\p{N} _.,()+&–-]*$/u;

const withoutEnding = (name: string): string => name.replace(/\.sunder\.json$/i, '').replace(/\.json$/i, '');

/** What the user calls a file: its name without the ending. */
export const displayNameOf = (path: string): string => withoutEnding(basename(path));

/** True for a name that is one file in one folder on every platform, with or without the ending. */
export function isPlainName(name: string): boolean {
  const stem = withoutEnding(name);
  return (
    stem.length > 0 && stem.length <= MAX_NAME_LENGTH && ALLOWED.test(stem) && !/[ .]$/.test(stem) && !DEVICE.test(stem)
  );
}

export const fileNameOf = (name: string): string => `${withoutEnding(name)}${SCENARIO_ENDING}`;

/** A file name to suggest in a dialog, made from any text. */
export function suggestedFileName(text: string): string {
  const stem = withoutEnding(text)
    .normalize('NFC')
    .replace(/[^\p{L}\p{M}\p{N} _.,()+&–-]+/gu, ' ')
    .replace(/ +/g, ' ')
    .replace(/^[^\p{L}\p{N}_]+/u, '')
    .slice(0, MAX_NAME_LENGTH)
    // A cut may leave half of a character behind.
    .replace(/\p{Cs}$/u, '')
    .replace(/[ .]+$/, '');
  return fileNameOf(isPlainName(stem) ? stem : 'Scenario');
}
