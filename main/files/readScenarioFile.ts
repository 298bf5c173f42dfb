import { createHash } from 'node:crypto';
import { open, stat } from 'node:fs/promises';
import { done, type Problem, type Result, refused } from '../../core/problem';
import { parseScenario } from '../../core/scenario/parse';
import type { Scenario } from '../../core/scenario/scenario';
import { faultInWords } from './faultsInWords';

/** No scenario of 200 formulations comes near this. */
export const MAX_FILE_bytes = 5_000_000;

export interface ReadFile {
  readonly scenario: Scenario;
  readonly sha256: string;
}

const problem = (code: string, message: string, remedy: string): Problem => ({ code, at: '', message, remedy });
const TOO_LARGE = problem('too-large', 'The file is larger than 5 MB.', 'No scenario is that large: choose another.');
const NOT_A_FILE = problem('not-a-file', 'This is not a file.', 'Choose a file that ends in .sunder.json.');
const NOT_UTF8 = problem('not-utf8', 'The file is not UTF-8 text.', 'Choose another file, or save it as UTF-8.');

export const sha256Of = (bytes: Uint8Array | string): string => createHash('sha256').update(bytes).digest('hex');

/** The bytes of a plain file of at most 5 MB. Throws the system's errors. */
export async function readBounded(path: string): Promise<Result<Uint8Array>> {
  // Before opening: opening a pipe would wait for a writer.
  if (!(await stat(path)).isFile()) return refused(NOT_A_FILE);
  const handle = await open(path, 'r');
  try {
    const { size } = await handle.stat();
    if (size > MAX_FILE_bytes) return refused(TOO_LARGE);
    const bytes = new Uint8Array(MAX_FILE_bytes + 1);
    let length = 0;
    // Some files say size 0 and yet have content, so read to the end.
    while (length < bytes.length) {
      const { bytesRead } = await handle.read(bytes, length, bytes.length - length, length);
      if (bytesRead === 0) return done(bytes.slice(0, length));
      length += bytesRead;
    }
    return refused(TOO_LARGE);
  } finally {
    await handle.close();
  }
}

/** Reads a scenario from a file nobody vouches for. */
export async function readScenarioFile(path: string): Promise<Result<ReadFile>> {
  let bytes: Result<Uint8Array>;
  try {
    bytes = await readBounded(path);
  } catch (error) {
    return refused(faultInWords(error, 'read'));
  }
  if (!bytes.ok) return bytes;
  let text: string;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes.value);
  } catch {
    return refused(NOT_UTF8);
  }
  const scenario = parseScenario(text);
  return scenario.ok ? done({ scenario: scenario.value, sha256: sha256Of(bytes.value) }) : scenario;
}
