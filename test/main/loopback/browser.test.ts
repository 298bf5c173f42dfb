import { chmod, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { findBrowser, hasDisplay, windowArguments } from '../../../main/loopback/browser';

let folder = '';
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

const program = async (name: string): Promise<string> => {
  const path = join(folder, name);
  await writeFile(path, '');
  await chmod(path, 0o755);
  return path;
};

describe('findBrowser', () => {
  it('takes the one that is named, and no other', async () => {
    const named = await program('own-browser');
    await program('chromium');
    expect(findBrowser({ PATH: folder, SUNDER_BROWSER: named })).toBe(named);
    expect(findBrowser({ PATH: folder, SUNDER_BROWSER: join(folder, 'absent') })).toBeNull();
  });

  it('prefers Chromium to Chrome to Edge, wherever in the path they stand', async () => {
    const edge = await program('microsoft-edge');
    expect(findBrowser({ PATH: folder })).toBe(edge);
    const chrome = await program('google-chrome');
    expect(findBrowser({ PATH: folder })).toBe(chrome);
    const chromium = await program('chromium');
    expect(findBrowser({ PATH: folder })).toBe(chromium);
  });
});

describe('hasDisplay', () => {
  it.each([
    [{}, 'linux', false],
    [{ DISPLAY: '' }, 'linux', false],
    [{ DISPLAY: ':0' }, 'linux', true],
    [{ WAYLAND_DISPLAY: 'wayland-0' }, 'linux', true],
    [{}, 'darwin', true],
    [{}, 'win32', true],
  ] as const)('with %j on %s: %s', (environment, platform, expected) => {
    expect(hasDisplay(environment, platform)).toBe(expected);
  });
});

describe('the words a window is opened with', () => {
  const words = windowArguments('/profile', '/profile/start.html');

  it('show the start page in a profile of its own', () => {
    expect(words).toContain('--app=file:///profile/start.html');
    expect(words).toContain('--user-data-dir=/profile');
  });

  it('hold no secret: other users can read them', () => {
    expect(words.join(' ')).not.toMatch(/ticket|start\?/);
  });

  it('open no door and leave the sandbox on', () => {
    expect(words.join(' ')).not.toMatch(/remote-debugging|no-sandbox|disable-web-security/);
  });
});
