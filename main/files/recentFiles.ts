import { mkdir, readFile, stat } from 'node:fs/promises';
import { isAbsolute, join } from 'node:path';
import { durableWrite } from './durableWrite';
import { systemCodeOf } from './faultsInWords';

const MAX_RECENT = 10;

export interface RecentFiles {
  /** Newest first; files that are gone are left out. */
  readonly paths: () => Promise<readonly string[]>;
  readonly note: (path: string) => Promise<void>;
}

function pathsIn(text: string): readonly string[] {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    // A list that cannot be read is worth no more than an empty one.
    return [];
  }
  if (!Array.isArray(value)) return [];
  return value.filter((path): path is string => typeof path === 'string' && isAbsolute(path)).slice(0, MAX_RECENT);
}

const isThere = (path: string): Promise<boolean> =>
  stat(path).then(
    (entry) => entry.isFile(),
    () => false,
  );

/** The files last opened or saved, kept in the data folder. */
export function createRecentFiles(dataFolder: string): RecentFiles {
  const listPath = join(dataFolder, 'recent.json');
  const load = async (): Promise<readonly string[]> => {
    try {
      return pathsIn(await readFile(listPath, 'utf8'));
    } catch (error) {
      if (systemCodeOf(error) === undefined) throw error;
      return [];
    }
  };
  let turn: Promise<void> = Promise.resolve();
  const put = async (path: string): Promise<void> => {
    const others = (await load()).filter((other) => other !== path);
    try {
      await mkdir(dataFolder, { recursive: true, mode: 0o700 });
      await durableWrite(listPath, `${JSON.stringify([path, ...others].slice(0, MAX_RECENT), null, 2)}\n`);
    } catch (error) {
      // The scenario itself is safe; a list of shortcuts must not turn that into a failure.
      if (systemCodeOf(error) === undefined) throw error;
      process.stderr.write(`The list of recent files was not saved (${systemCodeOf(error)}).\n`);
    }
  };
  return {
    paths: async () => {
      const paths = await load();
      const there = await Promise.all(paths.map(isThere));
      return paths.filter((_, index) => there[index]);
    },
    note: (path) => {
      turn = turn.then(() => put(path));
      return turn;
    },
  };
}
