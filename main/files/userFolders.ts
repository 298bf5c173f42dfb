import { homedir } from 'node:os';
import { join } from 'node:path';

export interface UserFolders {
  /** Our own notes: recent files, browser profile. */
  readonly data: string;
  /** The user's scenarios, where the host has no dialogs. */
  readonly documents: string;
}

type Environment = Readonly<Record<string, string | undefined>>;

const given = (value: string | undefined): value is string => value !== undefined && value !== '';

function dataFolder(environment: Environment, platform: NodeJS.Platform, home: string): string {
  if (given(environment.SUNDER_DATA_DIR)) return environment.SUNDER_DATA_DIR;
  if (platform === 'darwin') return join(home, 'Library', 'Application Support', 'Sunder');
  if (platform === 'win32') {
    return join(given(environment.APPDATA) ? environment.APPDATA : join(home, 'AppData', 'Roaming'), 'Sunder');
  }
  const shared = environment.XDG_DATA_HOME;
  return join(given(shared) ? shared : join(home, '.local', 'share'), 'sunder');
}

/** Where Sunder keeps things; SUNDER_DATA_DIR and SUNDER_DOCUMENTS_DIR win over the habits of the platform. */
export function userFolders(
  environment: Environment = process.env,
  platform: NodeJS.Platform = process.platform,
  home: string = homedir(),
): UserFolders {
  const { SUNDER_DOCUMENTS_DIR: documents } = environment;
  return {
    data: dataFolder(environment, platform, home),
    documents: given(documents) ? documents : join(home, 'Documents', 'Sunder'),
  };
}
