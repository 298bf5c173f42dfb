// One real Chromium for all windows of the app under test.
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { chromium } from 'playwright-core';
import { browserArguments, findBrowser } from '../browser.mjs';

/** @typedef {import('playwright-core').BrowserContext} BrowserContext */

/** @type {Promise<BrowserContext> | undefined} */
let starting;
/** @type {string | undefined} */
let profile;

/** Starts on the first call. @returns {Promise<BrowserContext>} */
export function browserContext() {
  starting ??= start();
  return starting;
}

async function start() {
  const executablePath = await findBrowser();
  if (executablePath === null) throw new Error('No browser was found for the stand-in');
  profile = mkdtempSync(join(tmpdir(), 'sunder-stand-in-'));
  const folder = profile;
  process.on('exit', () => rmSync(folder, { recursive: true, force: true, maxRetries: 3 }));
  return chromium.launchPersistentContext(profile, {
    executablePath,
    headless: false,
    // The new headless mode is the whole browser; Playwright's own `headless` would look for the old shell.
    args: ['--headless=new', '--remote-debugging-port=0', ...browserArguments()],
    viewport: null,
    handleSIGINT: true,
    handleSIGTERM: true,
    timeout: 30_000,
  });
}

/** Where a second client joins: the browser writes its port into the profile. @returns {Promise<string>} */
export async function debuggingAddress() {
  await browserContext();
  const file = join(profile ?? '', 'DevToolsActivePort');
  for (let tries = 0; tries < 200; tries += 1) {
    const port = portIn(file);
    if (port !== null) return `http://127.0.0.1:${port}`;
    await wait(50);
  }
  throw new Error(`The browser wrote no ${file} within 10 s`);
}

/** @param {string} file */
function portIn(file) {
  try {
    const [port] = readFileSync(file, 'utf8').split('\n');
    return port !== undefined && /^\d+$/.test(port) ? port : null;
  } catch {
    return null;
  }
}

/** Ends the browser if it ever began. */
export async function closeBrowser() {
  const context = await starting?.catch(() => undefined);
  await context?.close().catch(() => undefined);
}
