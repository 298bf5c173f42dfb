import type { Sources } from './sources';

/** Checks over the text of files. Each returns one line per breach, so that a failure says where to look. */
const MAX_LINES = 400;
const HOUSE_CODE = /^(core|main|renderer)\/.*\.(ts|tsx|mjs|css)$/;
const DATA_TABLE = /^core\/materials\//;

export function longFiles(sources: Sources): string[] {
  return [...sources].flatMap(([path, text]) => {
    const lines = text.split('\n').length - 1;
    return HOUSE_CODE.test(path) && !DATA_TABLE.test(path) && lines > MAX_LINES ? [`${path}: ${lines} lines`] : [];
  });
}

const ALLOWED_TOP_LEVEL = new Set([
  'main',
  'renderer',
  'core',
  'test',
  'assets',
  'package.json',
  'package-lock.json',
  'electron-builder.yml',
  'README.md',
  'DEVELOPERS.md',
  'LICENSE',
  'biome.json',
  'tsconfig.base.json',
  'vitest.config.ts',
  '.gitignore',
  '.ci',
  '.git',
  'node_modules',
  'dist',
  'test-results',
]);

export const strangersAtTheTop = (names: readonly string[]): string[] =>
  names.filter((name) => !ALLOWED_TOP_LEVEL.has(name));

interface Forbidden {
  readonly pattern: RegExp;
  readonly why: string;
}

/** Matches of the patterns, each with its line; `where` says which files are looked at. */
function matches(sources: Sources, where: RegExp, forbidden: readonly Forbidden[]): string[] {
  return [...sources].flatMap(([path, text]) =>
    where.test(path)
      ? text
          .split('\n')
          .flatMap((line, index) =>
            forbidden.flatMap(({ pattern, why }) => (pattern.test(line) ? [`${path}:${index + 1}: ${why}`] : [])),
          )
      : [],
  );
}

/** Written in pieces, so that this file passes its own check. */
const word = (...pieces: readonly string[]): RegExp => new RegExp(`\\b${pieces.join('')}\\b`);
const anyCase = (...pieces: readonly string[]): RegExp => new RegExp(`\\b${pieces.join('')}s?\\b`, 'i');

const unfinished: readonly Forbidden[] = [
  { pattern: anyCase('tran', 'script'), why: 'not a matter of this project' },
  { pattern: anyCase('lec', 'ture'), why: 'not a matter of this project' },
  { pattern: word('TO', 'DO'), why: 'finish it or leave it out' },
  { pattern: word('FIX', 'ME'), why: 'finish it or leave it out' },
  { pattern: word('as ', 'any'), why: 'a cast that silences the compiler' },
  {
    pattern: new RegExp(['@ts-', '(ignore|nocheck|expect-error)'].join('')),
    why: 'a comment that silences the compiler',
  },
  { pattern: new RegExp(['\\b(it|test|describe)\\.', '(only|todo|fixme|fails)\\b'].join('')), why: 'all tests run' },
  {
    pattern: new RegExp(['\\b(it|test|describe)\\.', 'skip(If|\\.each)?\\(\\s*[\'"`\\[]'].join('')),
    why: 'no test is left out',
  },
];

/** The lock file holds names of others. */
export const unfinishedWork = (sources: Sources): string[] => matches(sources, /^(?!package-lock\.json$)/, unfinished);

const unsafeInThePage: readonly Forbidden[] = [
  { pattern: /type=\{?["'`]number/, why: 'half-typed or comma numbers get lost; use a text field' },
  {
    pattern: /dangerouslySetInnerHTML|\.(inner|outer)HTML\b|insertAdjacentHTML|document\.write\b/,
    why: 'text is not markup',
  },
  { pattern: /\beval\(|new Function\(/, why: 'text is not code' },
  {
    pattern: /\b(https?|wss?):\/\/(?!www\.w3\.org\/(2000\/svg|1999\/xhtml|1999\/xlink|XML\/1998\/namespace))/,
    why: 'the page never goes to the network',
  },
  { pattern: /\bfetch\(\s*['"`]\/\//, why: 'the page never goes to the network' },
];

export const unsafePage = (sources: Sources): string[] => matches(sources, /^renderer\//, unsafeInThePage);

const VAGUE_NAME = /(^|\/)(index|utils?|helpers?|misc|common)\.(ts|tsx|mjs)$/;
const RE_EXPORT_ALL = /^export \* from/m;

/** Names that say nothing, and files that hide who imports what. */
export const vagueFiles = (sources: Sources): string[] =>
  [...sources].flatMap(([path, text]) => {
    if (!HOUSE_CODE.test(path)) return [];
    if (VAGUE_NAME.test(path)) return [`${path}: name it after what it holds`];
    return RE_EXPORT_ALL.test(text) ? [`${path}: import from where it is defined`] : [];
  });
