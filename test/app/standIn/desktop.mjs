// The small modules that speak with the desktop: shell, clipboard, screen, nativeTheme, net, and what only exists.
import { EventEmitter } from 'node:events';
import { readFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { modelled } from './notModelled.mjs';

/** Nothing is opened; what would have been is kept for tests to look at. */
const opened = /** @type {string[]} */ ([]);
export const shell = modelled('shell', {
  opened,
  openExternal: async (/** @type {string} */ url) => {
    opened.push(url);
  },
  openPath: async (/** @type {string} */ path) => {
    opened.push(path);
    return '';
  },
  showItemInFolder: (/** @type {string} */ path) => {
    opened.push(path);
  },
  beep: () => undefined,
});

let text = '';
export const clipboard = modelled('clipboard', {
  readText: () => text,
  writeText: (/** @type {string} */ written) => {
    text = written;
  },
  clear: () => {
    text = '';
  },
});

const area = { x: 0, y: 0, width: 1440, height: 960 };
const display = { id: 1, bounds: area, workArea: area, size: area, workAreaSize: area, scaleFactor: 1, rotation: 0 };
export const screen = modelled(
  'screen',
  Object.assign(new EventEmitter(), {
    getPrimaryDisplay: () => display,
    getAllDisplays: () => [display],
    getDisplayMatching: () => display,
    getDisplayNearestPoint: () => display,
    getCursorScreenPoint: () => ({ x: 0, y: 0 }),
  }),
);

export const nativeTheme = modelled(
  'nativeTheme',
  Object.assign(new EventEmitter(), {
    themeSource: 'system',
    shouldUseDarkColors: false,
    shouldUseHighContrastColors: false,
    shouldUseInvertedColorScheme: false,
    prefersReducedTransparency: false,
  }),
);

const TYPES = new Map(
  Object.entries({
    html: 'text/html',
    js: 'text/javascript',
    css: 'text/css',
    svg: 'image/svg+xml',
    json: 'application/json',
  }),
);
export const net = modelled('net', {
  /** Files only: anything else would leave the machine. @param {string | Request} asked */
  fetch: async (asked) => {
    const url = typeof asked === 'string' ? asked : asked.url;
    if (!url.startsWith('file:')) throw new Error(`The stand-in for Electron does not model net.fetch of ${url}`);
    const type = TYPES.get(url.split('.').at(-1) ?? '') ?? 'application/octet-stream';
    return new Response(new Uint8Array(await readFile(fileURLToPath(url))), { headers: { 'content-type': type } });
  },
  isOnline: () => false,
});

export const nativeImage = modelled('nativeImage', {
  createFromPath: (/** @type {string} */ path) => ({ path, isEmpty: () => false }),
  createEmpty: () => ({ path: '', isEmpty: () => true }),
});

/** A crash of the real thing cannot be played here, so nothing is collected. */
export const crashReporter = modelled('crashReporter', { start: () => undefined });
export const powerMonitor = modelled('powerMonitor', new EventEmitter());
