import { randomBytes } from 'node:crypto';
import { constants } from 'node:fs';
import * as nodeFiles from 'node:fs/promises';
import { basename, dirname, join, resolve } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { systemCodeOf } from './faultsInWords';

/** What of the file system a durable write uses; tests put faults in here. */
export type Files = Pick<typeof nodeFiles, 'open' | 'rename' | 'unlink' | 'realpath' | 'stat' | 'readdir'>;

interface Options {
  readonly files?: Files;
  readonly platform?: NodeJS.Platform;
  /** How long a rename is tried again on Windows, where a virus scanner or cloud folder may hold the file. */
  readonly patience_ms?: number;
}

const PATIENCE_ms = 10_000;
const STALE_AFTER_ms = 3_600_000;
const OUR_TEMPORARY = /^\.sunder-(\d+)-[0-9a-f]{16}\.tmp$/;
const HELD_ELSEWHERE = new Set(['EPERM', 'EACCES', 'EBUSY']);
/** The file system or the folder's rights do not allow a folder to be synced: then the rename is all there is. */
const NO_FOLDER_SYNC = new Set(['EINVAL', 'ENOTSUP', 'EACCES']);

/**
 * One writer per file: a second save of the same file waits for the first, so that the newest wins. The place in the
 * queue is taken at once, before anything that waits; two saves would overtake each other otherwise.
 */
const queues = new Map<string, Promise<void>>();

/**
 * Replaces the file by `text` so that at every moment, crash or power cut, the name holds the old or the new text whole.
 * Returns once the new text is on the disk. On a fault the old file is as it was and the system's error is thrown.
 */
export async function durableWrite(path: string, text: string, options: Options = {}): Promise<void> {
  const { files = nodeFiles } = options;
  const place = resolve(path);
  const before = queues.get(place) ?? Promise.resolve();
  // A save that failed was told to its own caller; the next one starts afresh.
  const turn = before
    .catch(() => undefined)
    .then(async () => replace(await realPath(place, files), text, files, options));
  queues.set(place, turn);
  try {
    await turn;
  } finally {
    if (queues.get(place) === turn) queues.delete(place);
  }
}

/** The file behind a link: a rename would put a file in the link's place. */
async function realPath(path: string, files: Files): Promise<string> {
  try {
    return await files.realpath(path);
  } catch (error) {
    if (systemCodeOf(error) === 'ENOENT') return path;
    throw error;
  }
}

async function replace(target: string, text: string, files: Files, options: Options): Promise<void> {
  const { platform = process.platform, patience_ms = PATIENCE_ms } = options;
  const folder = dirname(target);
  // The name has a fixed length, so that a long file name does not become too long here.
  const temporary = join(folder, `.sunder-${process.pid}-${randomBytes(8).toString('hex')}.tmp`);
  const mode = await modeOf(target, files);
  const handle = await files.open(temporary, constants.O_CREAT | constants.O_EXCL | constants.O_WRONLY, mode);
  try {
    try {
      // Writes until all bytes are written, or throws.
      await handle.writeFile(text, 'utf8');
      if (platform !== 'win32') await handle.chmod(mode);
      await handle.sync();
    } finally {
      await handle.close();
    }
    await renamePatiently(temporary, target, files, platform === 'win32' ? patience_ms : 0);
  } catch (error) {
    await files.unlink(temporary).catch(() => undefined);
    throw error;
  }
  if (platform !== 'win32') await syncFolder(folder, files);
  await sweep(folder, basename(temporary), files);
}

async function modeOf(target: string, files: Files): Promise<number> {
  try {
    return (await files.stat(target)).mode & 0o777;
  } catch (error) {
    if (systemCodeOf(error) === 'ENOENT') return 0o666 & ~process.umask();
    throw error;
  }
}

async function renamePatiently(from: string, to: string, files: Files, patience_ms: number): Promise<void> {
  const end_ms = Date.now() + patience_ms;
  for (let wait_ms = 10; ; wait_ms = Math.min(2 * wait_ms, 100)) {
    try {
      return await files.rename(from, to);
    } catch (error) {
      const held = HELD_ELSEWHERE.has(systemCodeOf(error) ?? '');
      if (!held || Date.now() >= end_ms) throw error;
    }
    await pause(wait_ms);
  }
}

/** Without it a power cut may undo the rename after "saved" was said. */
async function syncFolder(folder: string, files: Files): Promise<void> {
  try {
    const handle = await files.open(folder, constants.O_RDONLY);
    try {
      await handle.sync();
    } finally {
      await handle.close();
    }
  } catch (error) {
    if (!NO_FOLDER_SYNC.has(systemCodeOf(error) ?? '')) throw error;
  }
}

const isAlive = (pid: number): boolean => {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return systemCodeOf(error) === 'EPERM';
  }
};

/** Removes what a killed save left behind. The file is saved already, so a fault here is nobody's concern. */
async function sweep(folder: string, ours: string, files: Files): Promise<void> {
  const names = await files.readdir(folder).catch((): string[] => []);
  for (const name of names) {
    const pid = Number(OUR_TEMPORARY.exec(name)?.[1] ?? Number.NaN);
    if (name === ours || Number.isNaN(pid) || isAlive(pid)) continue;
    const path = join(folder, name);
    const age_ms = await files.stat(path).then(
      ({ mtimeMs }) => Date.now() - mtimeMs,
      () => 0,
    );
    if (age_ms > STALE_AFTER_ms) await files.unlink(path).catch(() => undefined);
  }
}
