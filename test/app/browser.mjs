// Finds a Chromium-like browser for the tests of the built app, or gets one.
import { spawn } from 'node:child_process';
import { accessSync, constants, existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../../', import.meta.url));

const NAMES = [
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'microsoft-edge',
  'microsoft-edge-stable',
];
const USUAL_PLACES = [
  '/usr/bin/chromium',
  '/usr/lib/chromium/chromium',
  '/opt/google/chrome/chrome',
  '/opt/microsoft/msedge/msedge',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
  ...[process.env.PROGRAMFILES, process.env['PROGRAMFILES(X86)'], process.env.LOCALAPPDATA].flatMap((folder) =>
    folder === undefined
      ? []
      : [
          join(folder, 'Google', 'Chrome', 'Application', 'chrome.exe'),
          join(folder, 'Microsoft', 'Edge', 'Application', 'msedge.exe'),
        ],
  ),
];

const canRun = (path) => {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
};

export const findInPath = (name) =>
  (process.env.PATH ?? '')
    .split(delimiter)
    .map((folder) => join(folder, name))
    .find(canRun) ?? null;

/** Path of a browser on this machine, or null. SUNDER_BROWSER names one outright. */
export async function findBrowser() {
  const named = process.env.SUNDER_BROWSER;
  if (named !== undefined && named !== '') return canRun(named) ? named : null;
  for (const name of NAMES) {
    const found = findInPath(name);
    if (found !== null) return found;
  }
  const usual = USUAL_PLACES.find(canRun);
  if (usual !== undefined) return usual;
  const { chromium } = await import('@playwright/test');
  const own = chromium.executablePath();
  return own !== '' && existsSync(own) ? own : null;
}

const isRoot = () => process.getuid?.() === 0;

/** Chromium refuses to start its sandbox as root. */
export const browserArguments = () => (isRoot() ? ['--no-sandbox'] : []);

/** Runs a command, silent, in a process group of its own; true when it ended well in time. */
export function ranWell(command, commandArguments, timeout_ms) {
  return new Promise((resolve) => {
    const child = spawn(command, commandArguments, {
      cwd: root,
      stdio: 'ignore',
      detached: process.platform !== 'win32',
      env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    });
    const timer = setTimeout(() => stop(child), timeout_ms);
    const end = (well) => {
      clearTimeout(timer);
      stop(child);
      resolve(well);
    };
    child.on('error', () => end(false));
    child.on('exit', (code) => end(code === 0));
  });
}

function stop(child) {
  if (child.pid === undefined) return;
  try {
    if (process.platform === 'win32') child.kill('SIGKILL');
    else process.kill(-child.pid, 'SIGKILL');
  } catch {
    // The whole group has ended already.
  }
}

const playwright = () => join(root, 'node_modules', '@playwright', 'test', 'cli.js');

/** Installs a Debian package when that is possible here. */
export async function installedByApt(name, run = ranWell) {
  if (!isRoot() || findInPath('apt-get') === null) return false;
  return (await run('apt-get', ['update'], 180_000)) && (await run('apt-get', ['install', '-y', name], 600_000));
}

/**
 * Finds a browser or gets one: by Playwright where the network allows, else by apt as root on Debian.
 * Throws an Error whose message is the one command to run.
 */
export async function ensureBrowser({ find = findBrowser, run = ranWell } = {}) {
  const found = await find();
  if (found !== null) return found;
  await run(process.execPath, [playwright(), 'install', 'chromium'], 240_000);
  const downloaded = await find();
  if (downloaded !== null) return downloaded;
  await installedByApt('chromium', run);
  const installed = await find();
  if (installed !== null) return installed;
  throw new Error('No browser was found. Run: npx playwright install --with-deps chromium');
}
