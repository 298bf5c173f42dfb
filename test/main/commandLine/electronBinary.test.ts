import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { electronBinary, installElectron } from '../../../main/commandLine/electronBinary.mjs';

let folder = '';
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

describe('electronBinary', () => {
  it('finds the program only when it is really there', async () => {
    expect(electronBinary({}, folder)).toBeNull();
    await writeFile(join(folder, 'path.txt'), 'electron');
    expect(electronBinary({}, folder)).toBeNull();
    await mkdir(join(folder, 'dist'));
    await writeFile(join(folder, 'dist', 'electron'), '');
    expect(electronBinary({}, folder)).toBe(join(folder, 'dist', 'electron'));
  });

  it('takes the folder that the environment names', async () => {
    await writeFile(join(folder, 'path.txt'), 'electron');
    await mkdir(join(folder, 'elsewhere'));
    const environment = { ELECTRON_OVERRIDE_DIST_PATH: join(folder, 'elsewhere') };
    expect(electronBinary(environment, folder)).toBeNull();
    await writeFile(join(folder, 'elsewhere', 'electron'), '');
    expect(electronBinary(environment, folder)).toBe(join(folder, 'elsewhere', 'electron'));
  });
});

describe('installElectron', () => {
  const outcome = async (code: string, options = {}): Promise<string | null> => {
    const script = join(folder, 'install.mjs');
    await writeFile(script, code);
    return installElectron({ script, progress: () => 0, ...options });
  };

  it('says nothing when it went well, and why when not', async () => {
    expect(await outcome('')).toBeNull();
    expect(await outcome('process.exit(1)')).toMatch(/refused/);
    expect(await installElectron({ script: join(folder, 'none.js') })).toMatch(/not installed/);
  });

  it('gives up when nothing moves', async () => {
    expect(await outcome('setInterval(() => undefined, 1000)', { stall_ms: 500 })).toMatch(/does not move/);
  });

  it('gives up after a while even when something moves', async () => {
    let received = 0;
    const progress = () => (received += 1);
    expect(await outcome('setInterval(() => undefined, 1000)', { limit_ms: 1200, progress })).toMatch(/too long/);
  });
});
