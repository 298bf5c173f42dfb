import { type ChildProcess, spawn } from 'node:child_process';
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { Page } from '@playwright/test';

export const root = fileURLToPath(new URL('../../../', import.meta.url));

export type Electron = typeof import('electron');

/** Runs `fn` in the main process, like Playwright's `electronApp.evaluate`: it sees nothing of the file it stands in. */
export type EvaluateInMain = <R, A>(
  fn: (electron: Electron, argument: A) => R | Promise<R>,
  argument?: A,
) => Promise<Awaited<R>>;

/** Folders of one test: a second start on the same ones finds what the first has left. */
export interface Folders {
  readonly all: string;
  readonly data: string;
  readonly documents: string;
  readonly temporary: string;
}

export interface StartOptions {
  /** Arguments as a user would give them: a file to open. */
  readonly args?: readonly string[];
  readonly env?: Readonly<Record<string, string>>;
}

/** The app, started once. */
export interface RunningApp {
  readonly page: Page;
  readonly evaluateInMain: EvaluateInMain | null;
  /** What the next system dialog for opening or saving answers; null is "cancel". */
  readonly answerDialog: (path: string | null) => Promise<void>;
  /** Every address the page has asked for, as the app sees it. */
  readonly requests: string[];
  readonly violations: string[];
  /** The exit code of the host, once it has ended. */
  readonly ended: Promise<number | null>;
  readonly end: () => Promise<void>;
  /** As a power cut would: nothing of the app gets to say a last word. */
  readonly kill: () => Promise<void>;
}

export function makeFolders(all: string): Folders {
  const folders = {
    all,
    data: join(all, 'data'),
    documents: join(all, 'documents'),
    temporary: join(all, 'temporary'),
  };
  for (const folder of Object.values(folders)) mkdirSync(folder, { recursive: true });
  return folders;
}

export function environment(folders: Folders, { env = {} }: StartOptions): Record<string, string> {
  const own = Object.entries(process.env).flatMap(([key, value]) =>
    value === undefined || key.startsWith('NODE_') || key === 'FORCE_COLOR' ? [] : [[key, value] as const],
  );
  return {
    ...Object.fromEntries(own),
    SUNDER_DATA_DIR: folders.data,
    SUNDER_DOCUMENTS_DIR: folders.documents,
    // Profiles of browsers and the like go where the test can find them and where they end with it.
    TMPDIR: folders.temporary,
    ...env,
  };
}

/** A program of ours in a process group of its own, with all it has said so far. */
export interface Program {
  readonly child: ChildProcess;
  readonly said: () => string;
  readonly ended: Promise<number | null>;
  readonly hasEnded: () => boolean;
  readonly signalGroup: (signal: NodeJS.Signals) => void;
}

export function startProgram(
  script: string,
  args: readonly string[],
  env: Record<string, string>,
  line = false,
): Program {
  const child = spawn(process.execPath, [join(root, script), ...args], {
    cwd: root,
    env,
    detached: process.platform !== 'win32',
    stdio: line ? ['ignore', 'pipe', 'pipe', 'ipc'] : ['ignore', 'pipe', 'pipe'],
    serialization: 'advanced',
  });
  let said = '';
  for (const stream of [child.stdout, child.stderr]) {
    stream?.setEncoding('utf8').on('data', (piece: string) => {
      said += piece;
    });
  }
  let over = false;
  const ended = new Promise<number | null>((resolve) => {
    const end = (code: number | null): void => {
      over = true;
      resolve(code);
    };
    child.on('exit', end);
    child.on('error', () => end(null));
  });
  const signalGroup = (signal: NodeJS.Signals): void => {
    if (child.pid === undefined) return;
    try {
      if (process.platform === 'win32') child.kill(signal);
      else process.kill(-child.pid, signal);
    } catch {
      // Nothing of the group is left.
    }
  };
  return { child, said: () => said, ended, hasEnded: () => over, signalGroup };
}

/** Waits until `look` finds something; says what was awaited, and what the program had said, when it does not come. */
export async function found<T>(
  what: string,
  look: () => T | null | undefined | Promise<T | null | undefined>,
  { said, hasEnded }: Pick<Program, 'said' | 'hasEnded'>,
  within_ms = 30_000,
): Promise<T> {
  const end_ms = performance.now() + within_ms;
  for (;;) {
    // Asked first: what the program said last is still looked at.
    const last = hasEnded();
    const seen = await look();
    if (seen !== null && seen !== undefined) return seen;
    if (last) throw new Error(`No ${what}: the program has ended. It said:\n${said()}`);
    if (performance.now() > end_ms) throw new Error(`No ${what} within ${within_ms} ms. The program said:\n${said()}`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

/** Ends a program: first politely, then not. */
export async function endProgram({ ended, signalGroup }: Program, ask: () => void, patience_ms = 5_000): Promise<void> {
  ask();
  const late = new Promise((resolve) => setTimeout(resolve, patience_ms));
  await Promise.race([ended, late]);
  signalGroup('SIGKILL');
  await ended;
}
