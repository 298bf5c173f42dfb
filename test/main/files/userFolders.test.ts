import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { userFolders } from '../../../main/files/userFolders';

let home = '';
beforeEach(async () => {
  home = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
});
afterEach(() => rm(home, { recursive: true, force: true }));

describe('the folders of a user', () => {
  it('are those the environment names', () => {
    const { data, documents } = userFolders({ SUNDER_DATA_DIR: '/d', SUNDER_DOCUMENTS_DIR: '/e' }, 'linux', home);
    expect([data, documents]).toEqual(['/d', '/e']);
  });

  it('are the usual ones of the platform', () => {
    expect(userFolders({}, 'linux', home).data).toBe(join(home, '.local', 'share', 'sunder'));
    expect(userFolders({ XDG_DATA_HOME: '/x' }, 'linux', home).data).toBe(join('/x', 'sunder'));
    expect(userFolders({}, 'darwin', home).data).toBe(join(home, 'Library', 'Application Support', 'Sunder'));
    expect(userFolders({ APPDATA: '/roaming' }, 'win32', home).data).toBe(join('/roaming', 'Sunder'));
  });

  it('put scenarios among the documents, or at home where there are none', async () => {
    expect(userFolders({}, 'linux', home).documents).toBe(join(home, 'Sunder'));
    await mkdir(join(home, 'Documents'));
    expect(userFolders({}, 'linux', home).documents).toBe(join(home, 'Documents', 'Sunder'));
  });

  it('follow the name a Linux desktop has noted, while that folder is there', async () => {
    await mkdir(join(home, 'Documents'));
    await mkdir(join(home, '.config'));
    await writeFile(join(home, '.config', 'user-dirs.dirs'), '# note\nXDG_DOCUMENTS_DIR="$HOME/Dokumente"\n');
    expect(userFolders({}, 'linux', home).documents).toBe(join(home, 'Documents', 'Sunder'));
    await mkdir(join(home, 'Dokumente'));
    expect(userFolders({}, 'linux', home).documents).toBe(join(home, 'Dokumente', 'Sunder'));
    expect(userFolders({}, 'darwin', home).documents).toBe(join(home, 'Documents', 'Sunder'));
  });
});
