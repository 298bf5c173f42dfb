import type { Result } from '../../core/problem';
import type { Cancelled } from '../bridge/contract';

/** How the user says where a file is: a system dialog under Electron, names in one folder in the loopback host. */
export interface Places {
  readonly toOpen: (name: string | null) => Promise<Result<{ readonly path: string } | Cancelled>>;
  readonly toSave: (
    suggestedName: string,
    overwrite: boolean,
  ) => Promise<Result<{ readonly path: string } | Cancelled | 'exists'>>;
  /** Names of the files that `toOpen` can find by name. */
  readonly names: () => Promise<Result<readonly string[]>>;
}
