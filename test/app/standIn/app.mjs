// `app` of the stand-in: life cycle, paths and the few facts an app asks about itself.
import { EventEmitter } from 'node:events';
import { existsSync, readFileSync } from 'node:fs';
import { homedir, tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { closeBrowser } from './chromium.mjs';
import { modelled } from './notModelled.mjs';
import { allWindows } from './windowList.mjs';

let ready = false;
let quitting = false;
let askedForWindow = false;
/** @type {() => void} */
let announceReady = () => undefined;
const whenReady = new Promise((/** @type {(value?: unknown) => void} */ done) => {
  announceReady = () => done();
});

export const noteWindow = () => {
  askedForWindow = true;
};
export const hasAskedForWindow = () => askedForWindow;
export const hasQuit = () => quitting;
export const isReady = () => ready;

/** Electron says so once the main module has been evaluated, not before. */
export function emitReady() {
  ready = true;
  announceReady();
  app.emit('ready', {}, {});
}

/** An event whose default can be prevented. @param {object} [facts] */
export const preventable = (facts = {}) => {
  const event = { ...facts, defaultPrevented: false, preventDefault: () => undefined };
  event.preventDefault = () => {
    event.defaultPrevented = true;
  };
  return event;
};

function packageFile() {
  for (let folder = dirname(resolve(process.argv[1] ?? '.')); ; folder = dirname(folder)) {
    const file = join(folder, 'package.json');
    if (existsSync(file)) return { folder, facts: JSON.parse(readFileSync(file, 'utf8')) };
    if (folder === dirname(folder)) throw new Error('No package.json above the main module');
  }
}

/** @type {Map<string, string>} */
const paths = new Map();
let name = '';

/** @param {string} key */
function defaultPath(key) {
  const settings = process.env.XDG_CONFIG_HOME ?? join(homedir(), '.config');
  const usual = new Map([
    ['home', homedir()],
    ['appData', settings],
    ['userData', join(paths.get('appData') ?? settings, app.getName())],
    ['sessionData', paths.get('userData') ?? join(settings, app.getName())],
    ['temp', tmpdir()],
    ['exe', process.execPath],
    ['documents', join(homedir(), 'Documents')],
    ['desktop', join(homedir(), 'Desktop')],
    ['downloads', join(homedir(), 'Downloads')],
    ['logs', join(paths.get('userData') ?? join(settings, app.getName()), 'logs')],
  ]);
  const path = usual.get(key);
  if (path === undefined) throw new Error(`Failed to get '${key}' path`);
  return path;
}

class App extends EventEmitter {
  isPackaged = false;
  /** What was asked of the desktop, for tests to look at. */
  recentDocuments = /** @type {string[]} */ ([]);
  commandLine = modelled('app.commandLine', {
    appendSwitch: () => undefined,
    appendArgument: () => undefined,
    hasSwitch: (/** @type {string} */ key) => process.argv.some((word) => word.split('=')[0] === `--${key}`),
    getSwitchValue: (/** @type {string} */ key) =>
      process.argv.find((word) => word.startsWith(`--${key}=`))?.slice(key.length + 3) ?? '',
  });

  whenReady = () => whenReady.then(() => undefined);
  isReady = () => ready;
  getVersion = () => String(packageFile().facts.version);
  getName = () => name || String(packageFile().facts.productName ?? packageFile().facts.name);
  setName = (/** @type {string} */ text) => {
    name = text;
  };
  getAppPath = () => packageFile().folder;
  getPath = (/** @type {string} */ key) => paths.get(key) ?? defaultPath(key);
  setPath = (/** @type {string} */ key, /** @type {string} */ path) => {
    defaultPath(key);
    paths.set(key, path);
  };
  getLocale = () => 'en-GB';
  getSystemLocale = () => 'en-GB';
  getPreferredSystemLanguages = () => ['en-GB'];
  /** Always granted: a second start is played with `app.emit('second-instance', ...)`. */
  requestSingleInstanceLock = () => true;
  hasSingleInstanceLock = () => true;
  releaseSingleInstanceLock = () => undefined;
  enableSandbox = () => {
    if (ready) throw new Error('app.enableSandbox() can only be called before app is ready');
  };
  disableHardwareAcceleration = () => {
    if (ready) throw new Error('app.disableHardwareAcceleration() can only be called before app is ready');
  };
  setAppUserModelId = () => undefined;
  setAboutPanelOptions = () => undefined;
  addRecentDocument = (/** @type {string} */ path) => {
    this.recentDocuments.push(path);
  };
  clearRecentDocuments = () => {
    this.recentDocuments.length = 0;
  };
  focus = () => undefined;

  quit = () => {
    if (quitting) return;
    const event = preventable();
    this.emit('before-quit', event);
    if (event.defaultPrevented) return;
    for (const window of allWindows()) window.close();
    if (allWindows().length > 0) return;
    const last = preventable();
    this.emit('will-quit', last);
    if (last.defaultPrevented) return;
    quitting = true;
    this.emit('quit', {}, 0);
    this.exit(0);
  };
  exit = (code = 0) => {
    quitting = true;
    closeBrowser().finally(() => process.exit(code));
  };
}

export const app = modelled('app', new App());
