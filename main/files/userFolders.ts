import { existsSync, readFileSync } from 'node:fs';
import { homedir } from 'node:os';
import { isAbsolute, join } from 'node:path';

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

/** Linux desktops note the place of the documents folder, named in the user's language, in a file. */
function notedDocuments(environment: Environment, home: string): string | null {
  const { XDG_CONFIG_HOME: settings } = environment;
  try {
    const text = readFileSync(join(given(settings) ? settings : join(home, '.config'), 'user-dirs.dirs'), 'utf8');
    const noted = /^XDG_DOCUMENTS_DIR="([^"]+)"/m.exec(text)?.[1]?.replace(/^\$HOME(?=\/|$)/, home) ?? '';
    return isAbsolute(noted) ? noted : null;
  } catch {
    // No desktop, or one that does not do so.
    return null;
  }
}

/** The user's documents; where there is no such folder, the home folder. */
function documentsOf(environment: Environment, platform: NodeJS.Platform, home: string): string {
  const noted = platform === 'linux' ? notedDocuments(environment, home) : null;
  return [noted, join(home, 'Documents')].find((folder) => folder !== null && existsSync(folder)) ?? home;
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
    documents: given(documents) ? documents : join(documentsOf(environment, platform, home), 'Sunder'),
  };
}
