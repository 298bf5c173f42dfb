// `webContents` and its frames: one page of the real Chromium, seen from main.
import { EventEmitter } from 'node:events';
import { realAddress, shownAddress } from './addresses.mjs';
import { app, preventable } from './app.mjs';
import { modelled, onlyKnown } from './notModelled.mjs';
import { DELIVER } from './page.mjs';
import { session } from './protocol.mjs';

/** @typedef {import('playwright-core').Page} Page */
/** @typedef {import('playwright-core').Frame} Frame */

/** @type {WeakMap<Frame, ReturnType<typeof frameOf>>} */
const frames = new WeakMap();
let lastFrame = 0;

/** The same frame is the same object each time: apps compare `event.senderFrame` with `mainFrame`.
 * @param {Frame} frame */
export function webFrame(frame) {
  const known = frames.get(frame) ?? frameOf(frame);
  frames.set(frame, known);
  return known;
}

/** @param {Frame} frame */
function frameOf(frame) {
  lastFrame += 1;
  const routingId = lastFrame;
  return modelled('WebFrameMain', {
    routingId,
    processId: 1,
    frameTreeNodeId: routingId,
    get url() {
      return realAddress(frame.url());
    },
    get origin() {
      const { protocol, host } = new URL(realAddress(frame.url()));
      return `${protocol}//${host}`;
    },
    get name() {
      return frame.name();
    },
    get detached() {
      return frame.isDetached();
    },
    isDestroyed: () => frame.isDetached(),
    /** @returns {object | null} */
    get parent() {
      const parent = frame.parentFrame();
      return parent === null ? null : webFrame(parent);
    },
    get top() {
      return webFrame(frame.page().mainFrame());
    },
  });
}

let lastId = 0;
/** @type {Map<number, WebContents>} */
const all = new Map();

class WebContents extends EventEmitter {
  /** @type {Promise<Page>} */ #page;
  /** @type {Page | null} */ #open = null;
  #destroyed = false;
  #loading = false;
  /** Messages keep their order: each waits for the one before. @type {Promise<unknown>} */ #sent = Promise.resolve();
  id = 0;
  session = session.defaultSession;
  /** @type {(details: object) => { action: string }} */
  #onNewWindow = () => ({ action: 'allow' });

  /** @param {Promise<Page>} page */
  constructor(page) {
    super();
    lastId += 1;
    this.id = lastId;
    this.#page = page.then((opened) => {
      this.#open = opened;
      return opened;
    });
    this.#page.catch(() => undefined);
  }

  get mainFrame() {
    if (this.#open === null) throw new Error('The stand-in has no main frame before the page is open');
    return webFrame(this.#open.mainFrame());
  }
  getURL = () => (this.#open === null ? '' : realAddress(this.#open.url()));
  getTitle = () => '';
  getType = () => 'window';
  isDestroyed = () => this.#destroyed;
  isLoading = () => this.#loading;
  isCrashed = () => false;
  isDevToolsOpened = () => false;
  closeDevTools = () => undefined;
  focus = () => undefined;
  setWindowOpenHandler = (/** @type {(details: object) => { action: string }} */ handler) => {
    this.#onNewWindow = handler;
  };

  send = (/** @type {string} */ channel, /** @type {unknown[]} */ ...args) => {
    const message = { channel, args: structuredClone(args), name: DELIVER };
    void this.#inPage((page) =>
      page.evaluate(({ name, channel, args }) => {
        Reflect.get(globalThis, Symbol.for(name))?.(channel, args);
      }, message),
    );
  };

  /** @param {(page: Page) => Promise<unknown>} work */
  #inPage(work) {
    this.#sent = this.#sent
      .then(() => this.#page)
      .then((page) => (this.#destroyed ? undefined : work(page)))
      .catch(() => undefined); // The page is gone or has moved on: Electron drops such messages too.
    return this.#sent;
  }

  loadURL = async (/** @type {string} */ url) => {
    const page = await this.#page;
    this.#loading = true;
    this.emit('did-start-loading', preventable());
    const target = /^[a-z]+:\/\//.test(url) && !url.startsWith('http') ? shownAddress(url) : url;
    try {
      await page.goto(target, { waitUntil: 'load', timeout: 30_000 });
    } catch (error) {
      if (this.#destroyed) return;
      this.emit('did-fail-load', preventable(), -2, String(error), url, true);
      throw new Error(`ERR_FAILED (-2) loading '${url}': ${error}`);
    } finally {
      this.#loading = false;
    }
    this.emit('dom-ready', preventable());
    this.emit('did-finish-load', preventable());
    this.emit('did-stop-loading', preventable());
  };
  reload = () => void this.#inPage((page) => page.reload());

  close = () => this.emit('-close-asked');

  // From here on: called by the stand-in itself, not by apps.

  /** Whether the page may go there by itself. @param {string} url @param {Frame} frame */
  mayNavigate(url, frame) {
    const isMainFrame = frame.parentFrame() === null;
    const event = preventable({ url, isMainFrame, isSameDocument: false, frame: webFrame(frame) });
    this.emit('will-frame-navigate', event);
    if (isMainFrame) this.emit('will-navigate', event, url, false, true);
    return !event.defaultPrevented;
  }
  /** @param {string} url @param {string} frameName */
  mayOpen(url, frameName) {
    const answer = this.#onNewWindow({ url, frameName, features: '', disposition: 'foreground-tab' });
    onlyKnown('the answer to a new window', answer, ['action']);
    if (answer.action !== 'deny') throw new Error(`The stand-in for Electron does not model new windows: ${url}`);
  }
  page = () => this.#page;
  destroyed() {
    if (this.#destroyed) return;
    this.#destroyed = true;
    all.delete(this.id);
    this.emit('destroyed', preventable());
  }
}

/** `own` for the stand-in, `shown` for the app. @param {Promise<Page>} page */
export function createWebContents(page) {
  const own = new WebContents(page);
  const shown = modelled('webContents', own);
  all.set(own.id, shown);
  queueMicrotask(() => app.emit('web-contents-created', preventable(), shown));
  return { own, shown };
}

export const webContents = modelled('webContents', {
  fromId: (/** @type {number} */ id) => all.get(id),
  getAllWebContents: () => [...all.values()],
});
