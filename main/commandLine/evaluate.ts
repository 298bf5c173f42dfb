import { readFile, stat } from 'node:fs/promises';
import { evaluate } from '../../core/evaluate';
import type { Problem } from '../../core/problem';
import { parseScenario } from '../../core/scenario/parse';
import { readArguments, USAGE } from './arguments';
import { asCsv, asJson, asTable } from './outputs';

const EXIT_DONE = 0;
const EXIT_BAD_INPUT = 2;
const MAX_FILE_bytes = 5_000_000;

const complain = (problems: readonly Problem[]): number => {
  for (const { at, message, remedy } of problems.slice(0, 20)) {
    process.stderr.write(`${at === '' ? 'file' : at}: ${message} ${remedy}\n`);
  }
  if (problems.length > 20) process.stderr.write(`… and ${problems.length - 20} more.\n`);
  return EXIT_BAD_INPUT;
};

const fault = (code: string, message: string, remedy: string): number => complain([{ code, at: '', message, remedy }]);

async function textOf(path: string): Promise<string | number> {
  try {
    const { size } = await stat(path);
    if (size > MAX_FILE_bytes) return fault('too-large', 'The file is larger than 5 MB.', 'No scenario is that large.');
    return new TextDecoder('utf-8', { fatal: true }).decode(await readFile(path));
  } catch (error) {
    if (error instanceof TypeError) {
      return fault('not-utf8', 'The file is not UTF-8 text.', 'Save it as UTF-8.');
    }
    const { code } = error as NodeJS.ErrnoException;
    return fault(
      'unreadable',
      `"${path}" cannot be read (${code ?? 'unknown fault'}).`,
      'Check the name and the rights.',
    );
  }
}

/** Evaluates a scenario file without a window; returns the exit code. */
export async function run(commandLine: readonly string[]): Promise<number> {
  const wanted = readArguments(commandLine);
  if (typeof wanted === 'string') {
    process.stderr.write(`${wanted}\n${USAGE}\n`);
    return EXIT_BAD_INPUT;
  }
  const text = await textOf(wanted.file);
  if (typeof text === 'number') return text;
  const parsed = parseScenario(text);
  if (!parsed.ok) return complain(parsed.problems);
  const scenario = parsed.value;
  const formulations =
    wanted.formulation === null
      ? scenario.formulations
      : scenario.formulations.filter(({ name, id }) => name === wanted.formulation || id === wanted.formulation);
  if (formulations.length === 0) {
    const names = scenario.formulations.map(({ name }) => `"${name}"`).join(', ');
    return fault('unknown-formulation', `There is no formulation "${wanted.formulation}".`, `The file holds ${names}.`);
  }
  const evaluation = evaluate({ ...scenario, formulations });
  const refusals = evaluation.formulations.flatMap((outcome, index) =>
    outcome.kind === 'refused'
      ? outcome.problems.map((problem) => ({
          ...problem,
          at: `/formulations/${scenario.formulations.indexOf(formulations[index])}${problem.at.replace(/^\/formulations\/\d+/, '')}`,
        }))
      : [],
  );
  if (refusals.length > 0) return complain(refusals);
  const write = { json: asJson, table: asTable, csv: asCsv }[wanted.format];
  process.stdout.write(write(scenario, evaluation, { curves: wanted.curves }));
  return EXIT_DONE;
}
