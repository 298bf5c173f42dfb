import { chmodSync, existsSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { electronBinary } from '../../main/commandLine/electronBinary.mjs';
import { findBrowser } from '../../main/loopback/browser';
import { expect, test } from './fixture';
import { endProgram, environment, type Folders, type Program, startProgram } from './hosts/host';
import { printedAddress } from './hosts/loopbackHost';

const withoutDisplay = { env: { DISPLAY: '', WAYLAND_DISPLAY: '' } };

/** A program that ends at once, and not well. */
function failing(folders: Folders, name: string): string {
  const path = join(folders.all, name);
  writeFileSync(path, '#!/bin/sh\nexit 3\n');
  chmodSync(path, 0o755);
  return path;
}

async function addressFrom(program: Program): Promise<string> {
  try {
    return await printedAddress(program);
  } finally {
    await endProgram(program, () => program.child.kill('SIGTERM'));
  }
}

test.describe('without Electron', { tag: '@loopback' }, () => {
  test('a start without a display prints an address of this machine only', async ({ folders }) => {
    const address = await addressFrom(startProgram('dist/main/loopback.js', [], environment(folders, withoutDisplay)));
    expect(new URL(address).hostname).toBe('127.0.0.1');
  });

  test('the start command falls back by itself', async ({ folders }) => {
    test.skip(electronBinary() !== null, 'Electron is here, so the start command has no need to fall back');
    const program = startProgram('main/commandLine/start.mjs', [], environment(folders, withoutDisplay));
    expect(new URL(await addressFrom(program)).hostname).toBe('127.0.0.1');
  });

  test('without a browser it serves until it is told to end', async ({ folders }) => {
    const env = environment(folders, { env: { PATH: '', SUNDER_BROWSER: '', DISPLAY: ':4242' } });
    test.skip(findBrowser(env) !== null, 'a browser is found here even without a search path');
    const program = startProgram('dist/main/loopback.js', [], env);
    const address = await printedAddress(program);
    expect(program.said()).toContain('There is no browser');
    const { status } = await fetch(address, { redirect: 'manual' });
    expect(status).toBe(303);
    program.child.kill('SIGINT');
    expect(await program.ended).toBe(0);
  });

  test('a browser that opens no window is given up, and the address printed', async ({ folders }) => {
    test.skip(process.platform === 'win32', 'the browser that fails is a shell script');
    const env = environment(folders, { env: { SUNDER_BROWSER: failing(folders, 'browser'), DISPLAY: ':4242' } });
    const program = startProgram('dist/main/loopback.js', [], env);
    await addressFrom(program);
    expect(program.said()).toContain('The browser window did not open');
  });

  test('an Electron that opens no window is given up for the browser', async ({ folders }) => {
    test.skip(process.platform === 'win32', 'the Electron that fails is a shell script');
    failing(folders, 'electron');
    const env = environment(folders, {
      env: {
        ELECTRON_OVERRIDE_DIST_PATH: folders.all,
        SUNDER_BROWSER: failing(folders, 'browser'),
        SUNDER_HOST: '',
        DISPLAY: ':4242',
      },
    });
    const program = startProgram('main/commandLine/start.mjs', [], env);
    expect(new URL(await addressFrom(program)).hostname).toBe('127.0.0.1');
    expect(program.said()).toMatch(/Electron is not here \(it ended with code 3[^\n]*\n/);
  });

  test('whoever does not hold the key of the page is refused', async ({ desk }) => {
    const { origin } = new URL(desk.page.url());
    const pages = ['/', '/index.html', '/notices', '/start', '/start?ticket=guess'];
    const asked = [
      ...pages.map((path) => fetch(`${origin}${path}`)),
      fetch(`${origin}/desk/host:facts`, {
        method: 'POST',
        headers: { origin, 'x-sunder': '1', 'content-type': 'application/json' },
        body: '[]',
      }),
    ];
    expect((await Promise.all(asked)).map(({ status }) => status)).toEqual(asked.map(() => 403));
  });

  test('a printed address opens the page once only', async ({ desk }) => {
    const [address] = desk.requests;
    expect(address).toContain('/start?');
    expect((await fetch(address ?? '')).status).toBe(403);
  });

  test.describe('in a real window', () => {
    test.use({ realWindow: true });

    test('the page is there and is answered', async ({ desk, folders }) => {
      const facts = await desk.page.evaluate(() => window.desk.hostFacts());
      expect(facts).toMatchObject({ ok: true, value: { kind: 'loopback' } });
      expect(existsSync(join(folders.all, 'data'))).toBe(true);
      expect(await desk.page.evaluate(() => window.matchMedia('(display-mode: standalone)').matches)).toBe(true);
    });

    test('closing it ends the program and leaves no profile behind', async ({ desk, folders }) => {
      const profiles = () => readdirSync(folders.temporary).filter((name) => name.startsWith('sunder-'));
      expect(profiles()).toHaveLength(1);
      expect(statSync(join(folders.temporary, profiles()[0] ?? '')).mode & 0o777).toBe(0o700);
      await desk.page.close();
      expect(await desk.ended).toBe(0);
      expect(profiles()).toEqual([]);
    });

    test('with unsaved work the browser asks before it closes', async ({ desk }) => {
      const { page } = desk;
      await page.getByRole('button', { name: 'Duplicate' }).first().click();
      await expect.poll(() => page.title()).toMatch(/^\* /);
      const question = page.waitForEvent('dialog');
      await page.close({ runBeforeUnload: true });
      const asked = await question;
      expect(asked.type()).toBe('beforeunload');
      await asked.dismiss();
      expect((await page.evaluate(() => window.desk.hostFacts())).ok).toBe(true);
    });
  });
});
