export interface Wanted {
  readonly file: string;
  readonly format: 'json' | 'table' | 'csv';
  /** Name or id of the only formulation asked for; null means all. */
  readonly formulation: string | null;
  readonly curves: boolean;
}

export const USAGE =
  'Use: npm run --silent evaluate -- FILE.json [--format json|table|csv] [--formulation NAME] [--curves]';

const formats = ['json', 'table', 'csv'] as const;

/** Reads the command line, or says in one sentence what is wrong with it. */
export function readArguments(commandLine: readonly string[]): Wanted | string {
  let file: string | null = null;
  let format: Wanted['format'] = 'table';
  let formulation: string | null = null;
  let curves = false;
  for (let index = 0; index < commandLine.length; index += 1) {
    const word = commandLine[index];
    switch (word) {
      case '--format': {
        index += 1;
        const known = formats.find((one) => one === commandLine[index]);
        if (known === undefined) return `--format takes ${formats.join(', ')}.`;
        format = known;
        break;
      }
      case '--formulation': {
        index += 1;
        const name = commandLine[index];
        if (name === undefined) return '--formulation takes the name of a formulation.';
        formulation = name;
        break;
      }
      case '--curves':
        curves = true;
        break;
      default:
        if (word.startsWith('--')) return `${word} is not known here.`;
        if (file !== null) return 'One file at a time.';
        file = word;
    }
  }
  if (file === null) return 'Which file?';
  if (curves && format !== 'json') return '--curves goes with --format json.';
  return { file, format, formulation, curves };
}
