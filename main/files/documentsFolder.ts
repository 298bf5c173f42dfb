import { lstat, mkdir, readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { done, type Problem, refused } from '../../core/problem';
import { faultInWords, systemCodeOf } from './faultsInWords';
import type { Places } from './places';
import { displayNameOf, fileNameOf, isPlainName, SCENARIO_ENDING } from './scenarioNames';

const BAD_NAME: Problem = {
  code: 'bad-name',
  at: '',
  message: 'This cannot be the name of a file.',
  remedy: 'Use letters, digits, spaces and - _ . , ( ) only, at most 80 of them.',
};

const exists = async (path: string): Promise<boolean> => {
  try {
    await lstat(path);
    return true;
  } catch (error) {
    if (systemCodeOf(error) === 'ENOENT') return false;
    throw error;
  }
};

/** Places for a host without dialogs: every scenario is a file of one folder. */
export const documentsFolder = (folder: string): Places => ({
  toOpen: async (name) =>
    name === null || !isPlainName(name) ? refused(BAD_NAME) : done({ path: join(folder, fileNameOf(name)) }),
  toSave: async (name, overwrite) => {
    if (!isPlainName(name)) return refused(BAD_NAME);
    const path = join(folder, fileNameOf(name));
    try {
      await mkdir(folder, { recursive: true });
      return done(!overwrite && (await exists(path)) ? 'exists' : { path });
    } catch (error) {
      return refused(faultInWords(error, 'save'));
    }
  },
  names: async () => {
    try {
      const files = await readdir(folder);
      const ours = files.filter((file) => file.endsWith(SCENARIO_ENDING) && isPlainName(file)).map(displayNameOf);
      return done(ours.sort((one, other) => one.localeCompare(other)));
    } catch (error) {
      return systemCodeOf(error) === 'ENOENT' ? done([]) : refused(faultInWords(error, 'read'));
    }
  },
});
