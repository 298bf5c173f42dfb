import { describe, expect, it } from 'vitest';
import { ensureBrowser } from '../app/browser.mjs';

describe('a browser for the tests of the built app', () => {
  it('is taken where there is one, and nothing is fetched', async () => {
    const ran: string[] = [];
    const path = await ensureBrowser({
      find: async () => '/usr/bin/chromium',
      run: async (command) => ran.push(command) > 0,
    });
    expect(path).toBe('/usr/bin/chromium');
    expect(ran).toEqual([]);
  });

  it('is fetched where there is none', async () => {
    const ran: string[] = [];
    const path = await ensureBrowser({
      find: async () => (ran.length === 0 ? null : '/home/someone/chrome'),
      run: async (_, words) => ran.push(words.slice(-2).join(' ')) > 0,
    });
    expect(path).toBe('/home/someone/chrome');
    expect(ran).toEqual(['install chromium']);
  });

  it('is missed in words that name the one command to run', async () => {
    await expect(ensureBrowser({ find: async () => null, run: async () => false })).rejects.toThrow(
      /Run: npx playwright install/,
    );
  });
});
