import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { electronBinary } from '../../main/commandLine/electronBinary.mjs';
import { expect, test } from './fixture';
import { endProgram, environment, type Program, startProgram } from './hosts/host';
import { printedAddress } from './hosts/loopbackHost';

const withoutDisplay = { env: { DISPLAY: '', WAYLAND_DISPLAY: '' } };

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
  });
});
