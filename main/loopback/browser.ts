import { type ChildProcess, spawn } from 'node:child_process';
import { accessSync, constants, existsSync } from 'node:fs';
import { chmod, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { homedir, tmpdir } from 'node:os';
import { basename, delimiter, join } from 'node:path';
import { pathToFileURL } from 'node:url';

const NAMES = [
  'chromium',
  'chromium-browser',
  'google-chrome',
  'google-chrome-stable',
  'microsoft-edge',
  'microsoft-edge-stable',
];

const PLACES = [
  '/opt/google/chrome/chrome',
  '/opt/microsoft/msedge/msedge',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge',
];

const canRun = (path: string): boolean => {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
};

type Environment = Readonly<Record<string, string | undefined>>;

/** A browser that can show one page as a window. SUNDER_BROWSER names one, or is `none` for no window. */
export function findBrowser(environment: Environment = process.env): string | null {
  const named = environment.SUNDER_BROWSER ?? '';
  if (named !== '') return canRun(named) ? named : null;
  const inPath = NAMES.flatMap((name) => (environment.PATH ?? '').split(delimiter).map((folder) => join(folder, name)));
  const onWindows = [environment.PROGRAMFILES, environment['PROGRAMFILES(X86)'], environment.LOCALAPPDATA].flatMap(
    (folder) =>
      folder === undefined
        ? []
        : [
            join(folder, 'Google', 'Chrome', 'Application', 'chrome.exe'),
            join(folder, 'Microsoft', 'Edge', 'Application', 'msedge.exe'),
          ],
  );
  return [...inPath, ...PLACES, ...onWindows].find(canRun) ?? null;
}

export function hasDisplay(environment: Environment = process.env, platform = process.platform): boolean {
  if (platform === 'win32' || platform === 'darwin') return true;
  return [environment.DISPLAY, environment.WAYLAND_DISPLAY].some((name) => name !== undefined && name !== '');
}

/** A browser packed as a snap sees neither the temporary folder nor hidden ones. */
const profileParent = (browser: string): string => {
  const snapFolder = join(homedir(), 'snap', 'chromium', 'common');
  const isSnap = browser.startsWith('/snap/') || (basename(browser) === 'chromium-browser' && existsSync('/snap/bin'));
  return isSnap && existsSync(snapFolder) ? snapFolder : tmpdir();
};

export const isRoot = (): boolean => process.getuid?.() === 0;

/** SUNDER_BROWSER_ARGUMENTS: more words for the browser, for tests and odd machines. */
const moreArguments = (): readonly string[] =>
  (process.env.SUNDER_BROWSER_ARGUMENTS ?? '').split(' ').filter((word) => word !== '');

export interface BrowserWindow {
  readonly process: ChildProcess;
  readonly isOpen: () => boolean;
  /** Closes the window and removes its profile. */
  readonly close: () => Promise<void>;
}

const LEAVE_ms = 3_000;

/** A window of its own on one page: nothing kept, and nothing reached beyond this computer. */
export const windowArguments = (profile: string, startPage: string): readonly string[] => [
  `--app=${pathToFileURL(startPage).href}`,
  `--user-data-dir=${profile}`,
  '--window-size=1360,860',
  '--no-first-run',
  '--no-default-browser-check',
  '--disable-sync',
  '--disable-extensions',
  '--disable-default-apps',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-domain-reliability',
  '--disable-features=Translate,MediaRouter,OptimizationHints',
  // Nobody answers there; what goes to this computer itself takes no proxy.
  '--proxy-server=127.0.0.1:9',
  // The profile is thrown away, so no key ring of the desktop need be opened for it.
  '--password-store=basic',
  '--use-mock-keychain',
];

/** Opens the page as a window of its own, with a profile of its own that is gone afterwards. */
export async function openWindow(browser: string, address: string): Promise<BrowserWindow> {
  const profile = await mkdtemp(join(profileParent(browser), 'sunder-'));
  await chmod(profile, 0o700);
  // Other users can read the arguments of a process, so the ticket travels in a file only we can read.
  const startPage = join(profile, 'start.html');
  await writeFile(
    startPage,
    `<!doctype html><title>Sunder</title><meta http-equiv="refresh" content="0;url=${address}">\n`,
    { mode: 0o600 },
  );
  const child = spawn(
    browser,
    [...windowArguments(profile, startPage), ...(isRoot() ? ['--no-sandbox'] : []), ...moreArguments()],
    // What a browser says about itself is no message of ours.
    { stdio: 'ignore' },
  );
  let open = true;
  const ended = new Promise<void>((resolve) => {
    const end = () => {
      open = false;
      resolve();
    };
    child.once('exit', end);
    child.once('error', end);
  });
  return {
    process: child,
    isOpen: () => open,
    close: async () => {
      if (open) child.kill('SIGTERM');
      const timer = setTimeout(() => child.kill('SIGKILL'), LEAVE_ms);
      await ended;
      clearTimeout(timer);
      // Helpers of the browser may write for a moment longer.
      await rm(profile, { recursive: true, force: true, maxRetries: 10, retryDelay: 100 }).catch(() => undefined);
    },
  };
}
