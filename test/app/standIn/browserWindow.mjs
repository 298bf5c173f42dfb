// `BrowserWindow` of the stand-in: each is a page of the one real Chromium.
import { EventEmitter } from 'node:events';
import { realAddress } from './addresses.mjs';
import { app, isReady, noteWindow, preventable } from './app.mjs';
import { browserContext, debuggingAddress } from './chromium.mjs';
import { invoke, receive } from './ipcMain.mjs';
import { pressed } from './menu.mjs';
import { modelled, onlyKnown } from './notModelled.mjs';
import { LINE, pageScript } from './page.mjs';
import { answer } from './protocol.mjs';
import { tellTest } from './testChannel.mjs';
import { createWebContents, webFrame } from './webContents.mjs';
import { allWindows, focusedWindow, windows } from './windowList.mjs';

/** What this stand-in is: a window that asks for anything weaker is not started. */
const REQUIRED = { contextIsolation: true, sandbox: true, nodeIntegration: false };
/** Left out, these have safe values; said, they must be these. */
const SAFE_IF_SAID = {
  webSecurity: true,
  nodeIntegrationInWorker: false,
  nodeIntegrationInSubFrames: false,
  allowRunningInsecureContent: false,
  experimentalFeatures: false,
  webviewTag: false,
  plugins: false,
};
const WITHOUT_EFFECT_HERE = ['preload', 'spellcheck', 'devTools', 'session', 'additionalArguments', 'partition'].concat(
  [
    'navigateOnDragDrop',
    'disableDialogs',
    'safeDialogs',
    'enableWebSQL',
    'v8CacheOptions',
    'backgroundThrottling',
    'autoplayPolicy',
    'defaultEncoding',
    'disableBlinkFeatures',
    'images',
    'textAreasAreResizable',
    'zoomFactor',
  ],
);

const WINDOW_OPTIONS = [
  ...['width', 'height', 'minWidth', 'minHeight', 'x', 'y', 'show', 'title', 'backgroundColor', 'icon'],
  ...['name', 'windowStatePersistence', 'autoHideMenuBar', 'webPreferences'],
];

/** @param {Record<string, unknown>} preferences */
function refuseWeak(preferences) {
  onlyKnown('webPreferences', preferences, [
    ...Object.keys(REQUIRED),
    ...Object.keys(SAFE_IF_SAID),
    ...WITHOUT_EFFECT_HERE,
  ]);
  for (const [key, value] of Object.entries(REQUIRED)) {
    if (preferences[key] !== value) throw new Error(`webPreferences.${key} has to be ${value}, and said so`);
  }
  for (const [key, value] of Object.entries(SAFE_IF_SAID)) {
    if (key in preferences && preferences[key] !== value) throw new Error(`webPreferences.${key} has to be ${value}`);
  }
}

class Window extends EventEmitter {
  #bounds;
  #visible;
  #closing = false;
  /** @type {ReturnType<typeof createWebContents>['own']} */ #contents;
  #title;
  /** @type {Promise<import('playwright-core').Page>} */ #page;
  id = allWindows().length + 1;
  documentEdited = false;

  /** @param {Record<string, unknown> & { webPreferences?: Record<string, unknown> }} options */
  constructor(options) {
    super();
    onlyKnown('BrowserWindow', options, WINDOW_OPTIONS);
    const { webPreferences: preferences = {} } = options;
    refuseWeak(preferences);
    this.#bounds = { x: 0, y: 0, width: Number(options.width ?? 800), height: Number(options.height ?? 600) };
    this.#visible = options.show !== false;
    this.#title = String(options.title ?? app.getName());
    this.#page = this.#openPage(preferences);
    const { own, shown } = createWebContents(this.#page);
    this.#contents = own;
    this.webContents = shown;
    own.on('-close-asked', () => this.close());
    this.#page.catch((error) => {
      process.stderr.write(`The stand-in could not open a window: ${error}\n`);
      app.exit(71);
    });
  }

  /** @param {Record<string, unknown>} preferences */
  async #openPage(preferences) {
    const script =
      typeof preferences.preload === 'string'
        ? pageScript(preferences.preload, /** @type {string[]} */ (preferences.additionalArguments ?? []))
        : '';
    const context = await browserContext();
    const first = context.pages().find((page) => page.url() === 'about:blank' && allWindows().length === 1);
    const page = first ?? (await context.newPage());
    await page.setViewportSize({ width: this.#bounds.width, height: this.#bounds.height });
    await page.exposeBinding(LINE, ({ frame }, message) => this.#heard(frame, message));
    await page.addInitScript(script);
    await page.route('**/*', (route) => this.#asked(route));
    page.on('popup', (popup) => {
      this.#contents.mayOpen(realAddress(popup.url()), '');
      void popup.close();
    });
    page.on('close', () => this.destroy());
    page.on('crash', () =>
      this.#contents.emit('render-process-gone', preventable(), { reason: 'crashed', exitCode: 1 }),
    );
    page.on('framenavigated', (frame) => {
      if (frame === page.mainFrame())
        this.#contents.emit('did-navigate', preventable(), realAddress(frame.url()), 200, '');
    });
    page.on('domcontentloaded', () => this.emit('ready-to-show', preventable()));
    tellTest({ kind: 'window', address: await debuggingAddress() });
    return page;
  }

  /** @param {import('playwright-core').Route} route */
  #asked(route) {
    const request = route.request();
    const url = realAddress(request.url());
    // What main loads, and a reload, are not the page's own wish to go elsewhere.
    const own = request.isNavigationRequest() && !this.#contents.isLoading() && request.frame().url() !== request.url();
    if (own && !this.#contents.mayNavigate(url, request.frame())) return route.abort('aborted');
    return answer(route);
  }

  /**
   * @param {import('playwright-core').Frame} frame
   * @param {{ kind: string, channel: string, args: unknown[], url: string, frameName: string, text: string, key: import('./menu.mjs').Key }} said
   */
  #heard(frame, said) {
    const sender = webFrame(frame);
    const event = preventable({
      sender: this.webContents,
      senderFrame: sender,
      frameId: sender.routingId,
      processId: sender.processId,
      type: 'frame',
    });
    if (said.kind === 'invoke') return invoke(event, said.channel, said.args);
    if (said.kind === 'send') receive(event, said.channel, said.args);
    if (said.kind === 'key') pressed(said.key, this);
    if (said.kind === 'open') this.#contents.mayOpen(realAddress(said.url), said.frameName);
    if (said.kind === 'violation') tellTest({ kind: 'violation', text: realAddress(said.text) });
    if (said.kind === 'preload-error') process.stderr.write(`The preload script failed: ${said.text}\n`);
    return {};
  }

  loadURL = (/** @type {string} */ url) => this.#contents.loadURL(url);

  close = () => {
    if (this.#closing) return;
    const event = preventable();
    this.emit('close', event);
    if (!event.defaultPrevented) this.destroy();
  };
  destroy = () => {
    if (this.#closing) return;
    this.#closing = true;
    windows.delete(/** @type {never} */ (this.front));
    this.#contents.destroyed();
    this.emit('closed', preventable());
    const done = () => {
      if (allWindows().length > 0) return;
      if (app.listenerCount('window-all-closed') > 0) app.emit('window-all-closed');
      else app.quit();
    };
    // The last page stays until the browser ends: Chromium would end with it, before main has said its last word.
    if (allWindows().length === 0) queueMicrotask(done);
    else void this.#page.then((page) => page.close()).catch(() => undefined);
  };
  /** The proxy that apps hold; set once, below. @type {unknown} */ front = null;

  isDestroyed = () => this.#closing;
  isVisible = () => this.#visible;
  isMinimized = () => false;
  isMaximized = () => false;
  isFullScreen = () => false;
  isFocused = () => focusedWindow() === this.front;
  isDocumentEdited = () => this.documentEdited;
  show = () => {
    this.#visible = true;
    this.emit('show', preventable());
  };
  showInactive = () => this.show();
  hide = () => {
    this.#visible = false;
  };
  focus = () => undefined;
  restore = () => undefined;
  maximize = () => undefined;
  minimize = () => undefined;
  setFullScreen = () => undefined;
  getBounds = () => ({ ...this.#bounds });
  getNormalBounds = () => ({ ...this.#bounds });
  getContentBounds = () => ({ ...this.#bounds });
  getSize = () => [this.#bounds.width, this.#bounds.height];
  setBounds = (/** @type {Partial<{ x: number, y: number, width: number, height: number }>} */ bounds) => {
    this.#bounds = { ...this.#bounds, ...bounds };
  };
  setMinimumSize = () => undefined;
  setTitle = (/** @type {string} */ title) => {
    this.#title = title;
  };
  getTitle = () => this.#title;
  setDocumentEdited = (/** @type {boolean} */ edited) => {
    this.documentEdited = edited;
  };
  setRepresentedFilename = () => undefined;
  setBackgroundColor = () => undefined;
  setMenu = () => undefined;
  removeMenu = () => undefined;
  setMenuBarVisibility = () => undefined;
  setAutoHideMenuBar = () => undefined;
  setContentProtection = () => undefined;
}

/** @param {Record<string, unknown>} [options] */
function open(options = {}) {
  if (!isReady()) throw new Error('Cannot create BrowserWindow before app is ready');
  noteWindow();
  const own = new Window(options);
  const front = modelled('BrowserWindow', own);
  own.front = front;
  windows.add(/** @type {never} */ (front));
  queueMicrotask(() => app.emit('browser-window-created', preventable(), front));
  return front;
}

// A function, so that `new BrowserWindow()` gives the proxy; `instanceof` holds by the shared prototype.
export const BrowserWindow = modelled(
  'BrowserWindow',
  function BrowserWindow(/** @type {Record<string, unknown>} */ options) {
    return open(options);
  },
);
BrowserWindow.prototype = Window.prototype;
Object.assign(BrowserWindow, {
  getAllWindows: allWindows,
  getFocusedWindow: focusedWindow,
  fromId: (/** @type {number} */ id) => allWindows().find((window) => window.id === id) ?? null,
  fromWebContents: (/** @type {unknown} */ contents) =>
    allWindows().find((window) => window.webContents === contents) ?? null,
});
