/**
 * Runs in the page, before its scripts; it is sent there as text and so must not use anything from outside itself.
 * A sandboxed preload script may `require` very little, and what it exposes is copied, wrapped and frozen on its way
 * to the page (electronjs.org/docs/latest: tutorial/sandbox, api/context-bridge).
 * Limit: both sides share one JavaScript world here; under Electron they have one each.
 *
 * @param {{ deliver: string, line: string, versions: object, platform: string, argv: string[] }} facts
 * @param {(require: (name: string) => unknown, module: object, exports: object, process: object) => void} preload
 */
export function roomOfPreload(facts, preload) {
  const scope = /** @type {Record<string | symbol, unknown>} */ (/** @type {unknown} */ (globalThis));
  const line = /** @type {(message: object) => Promise<{ value?: unknown, error?: string }>} */ (scope[facts.line]);
  delete scope[facts.line];
  const isAppPage = /\.test$/.test(location.hostname) && window.top === window;
  if (!isAppPage) return;

  /** @type {Map<string, Set<(event: object, ...args: unknown[]) => void>>} */
  const listeners = new Map();
  Object.defineProperty(scope, Symbol.for(facts.deliver), {
    value: (/** @type {string} */ channel, /** @type {unknown[]} */ args) => {
      for (const listener of [...(listeners.get(channel) ?? [])]) listener({ sender: ipcRenderer, ports: [] }, ...args);
    },
  });

  /** @param {string} name @param {object} target */
  const modelled = (name, target) =>
    new Proxy(target, {
      get(object, key) {
        if (typeof key === 'string' && !(key in object) && key !== 'then' && key !== 'toJSON') {
          throw new Error(`The stand-in for Electron does not model ${name}.${key}`);
        }
        return Reflect.get(object, key);
      },
    });

  const stop = (/** @type {string} */ channel, /** @type {(...args: never[]) => void} */ listener) => {
    listeners.get(channel)?.delete(/** @type {never} */ (listener));
    return ipcRenderer;
  };
  const ipcRenderer = modelled('ipcRenderer', {
    invoke: async (/** @type {string} */ channel, /** @type {unknown[]} */ ...args) => {
      const { value, error } = await line({ kind: 'invoke', channel, args: structuredClone(args) });
      if (error !== undefined) throw new Error(error);
      return value;
    },
    send: (/** @type {string} */ channel, /** @type {unknown[]} */ ...args) => {
      void line({ kind: 'send', channel, args: structuredClone(args) });
    },
    on: (/** @type {string} */ channel, /** @type {(event: object, ...args: unknown[]) => void} */ listener) => {
      listeners.set(channel, (listeners.get(channel) ?? new Set()).add(listener));
      return ipcRenderer;
    },
    once: (/** @type {string} */ channel, /** @type {(event: object, ...args: unknown[]) => void} */ listener) => {
      const once = (/** @type {object} */ event, /** @type {unknown[]} */ ...args) => {
        stop(channel, once);
        listener(event, ...args);
      };
      listeners.set(channel, (listeners.get(channel) ?? new Set()).add(once));
      return ipcRenderer;
    },
    off: stop,
    removeListener: stop,
    removeAllListeners: (/** @type {string} */ channel) => {
      listeners.delete(channel);
      return ipcRenderer;
    },
  });

  /** Same function in, same wrapper out. @type {WeakMap<Function, Function>} */
  const wrappers = new WeakMap();

  /** @param {Function} fn */
  const wrapped = (fn) => {
    const known = wrappers.get(fn);
    if (known !== undefined) return known;
    const wrapper = (/** @type {unknown[]} */ ...args) => {
      try {
        return passed(fn(...args.map(passed)));
      } catch (error) {
        throw passed(error);
      }
    };
    wrappers.set(fn, wrapper);
    return wrapper;
  };

  /** A value as it arrives on the other side of the bridge. @param {unknown} value @returns {unknown} */
  const passed = (value) => {
    if (typeof value === 'symbol') throw new TypeError('Symbols cannot be sent across the context bridge');
    if (typeof value === 'function') return wrapped(value);
    if (typeof value !== 'object' || value === null) return value;
    if (value instanceof Promise) {
      return value.then(passed, (reason) => {
        throw passed(reason);
      });
    }
    if (value instanceof Error) return new Error(value.message);
    if (value instanceof Blob || value instanceof Element) return value;
    if (Array.isArray(value)) return value.map(passed);
    const isBuffer = value instanceof ArrayBuffer || ArrayBuffer.isView(value) || value instanceof Date;
    if (isBuffer || value instanceof Map || value instanceof Set) return structuredClone(value);
    // Prototypes do not cross: an instance of a class arrives as a plain object of its own properties.
    return Object.fromEntries(Object.entries(value).map(([key, item]) => [key, passed(item)]));
  };

  /** @param {unknown} value @returns {unknown} */
  const frozen = (value) => {
    if (typeof value !== 'object' || value === null) return value;
    for (const item of Object.values(value)) frozen(item);
    return Object.freeze(value);
  };

  const contextBridge = modelled('contextBridge', {
    exposeInMainWorld: (/** @type {string} */ key, /** @type {unknown} */ api) => {
      if (key in scope)
        throw new Error(`Cannot bind an API on top of an existing property on the window object: ${key}`);
      Object.defineProperty(scope, key, { value: frozen(passed(api)), enumerable: true });
    },
  });

  /** Places of files that a test drops: Chromium tells them to nobody. @type {Map<string, string>} */
  const places = new Map();
  window.addEventListener('stand-in:file-place', (event) => {
    const { name, path } = /** @type {CustomEvent<{ name: string, path: string }>} */ (event).detail;
    places.set(name, path);
  });
  const webUtils = modelled('webUtils', {
    getPathForFile: (/** @type {unknown} */ file) => {
      if (!(file instanceof File)) throw new TypeError('getPathForFile: not a File');
      return places.get(file.name) ?? '';
    },
  });

  document.addEventListener('securitypolicyviolation', (event) => {
    void line({ kind: 'violation', text: `${event.effectiveDirective} ${event.blockedURI}` });
  });
  // The page sees a key first; what it does not claim goes to the menu. After the event: only then is that known.
  const toMenu = (/** @type {KeyboardEvent} */ event) =>
    setTimeout(() => {
      const { key, code, ctrlKey, shiftKey, altKey, metaKey, defaultPrevented } = event;
      if (!defaultPrevented) void line({ kind: 'key', key: { key, code, ctrlKey, shiftKey, altKey, metaKey } });
    });
  window.addEventListener('keydown', toMenu, { capture: true });
  window.open = (url, frameName) => {
    void line({ kind: 'open', url: new URL(url ?? '', location.href).href, frameName: frameName ?? '' });
    return null;
  };

  const rooms = new Map([
    ['electron', modelled('electron of a sandboxed preload', { contextBridge, ipcRenderer, webUtils })],
    ['timers', { setTimeout, clearTimeout, setInterval, clearInterval }],
    ['url', { URL, URLSearchParams }],
  ]);
  const require = (/** @type {string} */ name) => {
    const room = rooms.get(name.replace(/^node:/, ''));
    if (room === undefined) throw new Error(`module not found: ${name}`);
    return room;
  };
  const module = { exports: {} };
  const { versions, platform, argv } = facts;
  const process = modelled('process of a sandboxed preload', {
    versions,
    platform,
    argv,
    env: {},
    type: 'renderer',
    sandboxed: true,
    contextIsolated: true,
  });
  try {
    preload(require, module, module.exports, process);
  } catch (error) {
    void line({ kind: 'preload-error', text: error instanceof Error ? (error.stack ?? error.message) : String(error) });
    throw error;
  }
}
