import { type Problem, refused } from '../../core/problem';
import type { ScenarioFiles } from '../files/scenarioFiles';
import type { ElectronHandlers } from './contract';

const NO_PATH: Problem = {
  code: 'no-path',
  at: '',
  message: 'The place of this file is not known.',
  remedy: 'Drop a file that ends in .sunder.json, or use Open.',
};

/** Opens a file dropped on the page. Only a scenario file of the usual ending is even read. */
export const openPathHandler = (files: ScenarioFiles): Pick<ElectronHandlers, 'scenario:open-path'> => ({
  'scenario:open-path': async (path) =>
    typeof path === 'string' && path.toLowerCase().endsWith('.json') ? files.openAt(path) : refused(NO_PATH),
});
