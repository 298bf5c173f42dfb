import { chmodSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { type Browser, chromium, type Page } from '@playwright/test';
import { browserArguments, findBrowser } from '../browser.mjs';
import {
  endProgram,
  environment,
  type Folders,
  found,
  type Program,
  type RunningApp,
  type StartOptions,
  startProgram,
} from './host';

const ADDRESS = /https?:\/\/(?:127\.0\.0\.1|localhost|\[::1\]):\d+\/\S*/;

/** The host for machines without Electron, in a real window or, where there is no display, at its printed address. */
export async function startLoopback(folders: Folders, options: StartOptions, realWindow: boolean): Promise<RunningApp> {
  const env = environment(folders, options);
  if (realWindow) {
    env.SUNDER_BROWSER = await browserWithDoor(folders);
    for (const stale of portFiles(folders.all)) rmSync(stale, { force: true });
  } else {
    // Set and empty is taken for "none", as a shell without a display has it.
    env.DISPLAY = '';
    env.WAYLAND_DISPLAY = '';
  }
  const program = startProgram('dist/main/loopback.js', options.args ?? [], env);
  try {
    const requests: string[] = [];
    const violations: string[] = [];
    const { browser, page } = await (realWindow
      ? joinWindow(folders, program)
      : openAddress(program, requests, violations));
    if (realWindow) page.on('request', (request) => requests.push(request.url()));
    // The first page only takes the key in and leads on to the app, which then puts its bridge together.
    await page.waitForURL(({ pathname }) => pathname !== '/start');
    await page.waitForLoadState();
    await found('bridge in the page', async () => (await page.evaluate(() => 'desk' in window)) || null, program);
    const end = async (asked: () => void): Promise<void> => {
      await endProgram(program, asked);
      await browser.close().catch(() => undefined);
    };
    return {
      page,
      evaluateInMain: null,
      answerDialog: async () => {
        throw new Error('This host has no system dialogs');
      },
      requests,
      violations,
      ended: program.ended,
      end: () => end(() => program.child.kill('SIGTERM')),
      kill: () => end(() => program.child.kill('SIGKILL')),
    };
  } catch (error) {
    program.signalGroup('SIGKILL');
    throw error;
  }
}

/**
 * The app has no switch that would let others steer its window, and shall have none: the browser it is given is a
 * script that adds the one argument and becomes the browser.
 */
async function browserWithDoor(folders: Folders): Promise<string> {
  const browser = await findBrowser();
  if (browser === null) throw new Error('No browser was found');
  const script = join(folders.all, 'browser');
  writeFileSync(script, `#!/bin/sh\nexec '${browser.replaceAll("'", "'\\''")}' --remote-debugging-port=0 "$@"\n`);
  chmodSync(script, 0o755);
  return script;
}

/** The address the program prints for a user without a display. */
export const printedAddress = (program: Program): Promise<string> =>
  found('printed address', () => ADDRESS.exec(program.said())?.[0], program);

async function openAddress(program: Program, requests: string[], violations: string[]) {
  const address = await printedAddress(program);
  const executablePath = await findBrowser();
  if (executablePath === null) throw new Error('No browser was found');
  const browser = await chromium.launch({ executablePath, args: browserArguments() });
  const page = await browser.newPage();
  page.on('request', (request) => requests.push(request.url()));
  await reportViolations(page, violations);
  await page.goto(address);
  return { browser, page };
}

/** Told by the page's own events, from before its first script. */
export async function reportViolations(page: Page, violations: string[]): Promise<void> {
  await page.exposeFunction('__violation', (text: string) => violations.push(text));
  await page.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', (event) => {
      Reflect.get(globalThis, '__violation')(`${event.effectiveDirective} ${event.blockedURI}`);
    });
  });
}

/** The browser writes the port it chose into its profile, which lies below the folders of the test. */
const portFiles = (folder: string): string[] =>
  readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return portFiles(path);
    return entry.name === 'DevToolsActivePort' ? [path] : [];
  });

function chosenPort(folder: string): string | null {
  try {
    const [file] = portFiles(folder);
    const port = file === undefined ? '' : (readFileSync(file, 'utf8').split('\n')[0] ?? '');
    return /^\d+$/.test(port) ? port : null;
  } catch {
    // The profile is being written: folders in it come and go.
    return null;
  }
}

async function joinWindow(folders: Folders, program: Program): Promise<{ browser: Browser; page: Page }> {
  const port = await found('port of the window', () => chosenPort(folders.all), program);
  const browser = await chromium.connectOverCDP(`http://127.0.0.1:${port}`);
  const page = await found(
    'page in the window',
    () =>
      browser
        .contexts()
        .flatMap((context) => context.pages())
        .find((one) => ADDRESS.test(one.url())),
    program,
  );
  return { browser, page };
}
