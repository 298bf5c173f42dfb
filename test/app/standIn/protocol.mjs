// `protocol` and `session` of the stand-in: who answers which address, and what is refused.
import { EventEmitter } from 'node:events';
import { realAddress, schemeOf, shownPolicy } from './addresses.mjs';
import { isReady } from './app.mjs';
import { modelled } from './notModelled.mjs';
import { tellTest } from './testChannel.mjs';

/** @type {Map<string, { readonly standard?: boolean, readonly secure?: boolean }>} */
const privileged = new Map();
/** @type {Map<string, (request: Request) => Response | Promise<Response>>} */
const handlers = new Map();
let registered = false;

export const protocol = modelled('protocol', {
  /** @param {readonly { scheme: string, privileges?: { standard?: boolean, secure?: boolean } }[]} schemes */
  registerSchemesAsPrivileged: (schemes) => {
    if (isReady()) throw new Error('protocol.registerSchemesAsPrivileged should be called before app is ready');
    if (registered) throw new Error('protocol.registerSchemesAsPrivileged: a second call replaces the first');
    registered = true;
    for (const { scheme, privileges = {} } of schemes) privileged.set(scheme, privileges);
  },
  /** @param {string} scheme @param {(request: Request) => Response | Promise<Response>} handler */
  handle: (scheme, handler) => {
    if (!isReady()) throw new Error('protocol can only be used after app is ready');
    if (handlers.has(scheme)) throw new Error(`Protocol ${scheme} is handled already`);
    const { standard, secure } = privileged.get(scheme) ?? {};
    if (!standard || !secure) throw new Error(`The stand-in models only standard, secure schemes: ${scheme}`);
    handlers.set(scheme, handler);
  },
  unhandle: (/** @type {string} */ scheme) => handlers.delete(scheme),
  isProtocolHandled: (/** @type {string} */ scheme) => handlers.has(scheme),
});

/** @typedef {(details: object, callback: (answer: { cancel?: boolean, responseHeaders?: Record<string, string | string[]> }) => void) => void} WebRequestListener */
/** @type {Map<string, WebRequestListener>} */
const webRequestListeners = new Map();

/** @param {string} event @returns {(filter: unknown, listener?: WebRequestListener | null) => void} */
const listensTo = (event) => (filter, listener) => {
  if (listener === undefined && typeof filter === 'object' && filter !== null) {
    throw new Error(`webRequest.${event}: a filter without a listener`);
  }
  // A filter would narrow it; asked about every request, a listener that refuses by address refuses the same.
  const own = typeof filter === 'function' ? /** @type {WebRequestListener} */ (filter) : listener;
  if (own === null || own === undefined) webRequestListeners.delete(event);
  else webRequestListeners.set(event, own);
};

class Session extends EventEmitter {
  protocol = protocol;
  /** What the app answers to a page that asks for a permission: for tests to call, Chromium does not ask here. */
  permissionHandlers = /** @type {Record<string, unknown>} */ ({});
  webRequest = modelled('session.webRequest', {
    onBeforeRequest: listensTo('onBeforeRequest'),
    onHeadersReceived: listensTo('onHeadersReceived'),
  });
  setPermissionRequestHandler = (/** @type {unknown} */ handler) => {
    this.permissionHandlers.request = handler;
  };
  setPermissionCheckHandler = (/** @type {unknown} */ handler) => {
    this.permissionHandlers.check = handler;
  };
  setDevicePermissionHandler = (/** @type {unknown} */ handler) => {
    this.permissionHandlers.device = handler;
  };
  setDisplayMediaRequestHandler = (/** @type {unknown} */ handler) => {
    this.permissionHandlers.displayMedia = handler;
  };
  setUSBProtectedClassesHandler = (/** @type {unknown} */ handler) => {
    this.permissionHandlers.usb = handler;
  };
  setBluetoothPairingHandler = (/** @type {unknown} */ handler) => {
    this.permissionHandlers.bluetooth = handler;
  };
  setSpellCheckerEnabled = () => undefined;
  setSpellCheckerLanguages = () => undefined;
  setSpellCheckerDictionaryDownloadURL = () => undefined;
  setProxy = async () => undefined;
  clearCache = async () => undefined;
  clearStorageData = async () => undefined;
  getPreloadScripts = () => [];
}

const defaultSession = modelled('session.defaultSession', new Session());
export const session = modelled('session', { defaultSession });

/** @param {string} event @param {object} details @returns {Promise<{ cancel?: boolean, responseHeaders?: Record<string, string | string[]> }>} */
const askListener = (event, details) =>
  new Promise((resolve) => {
    const listener = webRequestListeners.get(event);
    if (listener === undefined) resolve({});
    else listener(details, resolve);
  });

/** Answers one request of a page as the app would; whatever the app has no handler for does not leave the machine.
 * @param {import('playwright-core').Route} route */
export async function answer(route) {
  const request = route.request();
  const url = realAddress(request.url());
  tellTest({ kind: 'request', url });
  const scheme = schemeOf(request.url());
  const handler = scheme === null ? undefined : handlers.get(scheme);
  const details = { url, method: request.method(), resourceType: request.resourceType() };
  const { cancel } = await askListener('onBeforeRequest', details);
  if (cancel || scheme === null || handler === undefined) return route.abort('blockedbyclient');
  try {
    const response = await handler(asked(request, url));
    const headers = new Map(response.headers);
    const changed = await askListener('onHeadersReceived', { ...details, responseHeaders: lists(headers) });
    for (const [name, value] of Object.entries(changed.responseHeaders ?? {})) {
      headers.set(name.toLowerCase(), [value].flat().join(', '));
    }
    const policy = headers.get('content-security-policy');
    if (policy !== undefined) headers.set('content-security-policy', shownPolicy(policy, scheme));
    // The body is plain by now: its length and coding are Chromium's to say.
    for (const name of ['content-length', 'content-encoding']) headers.delete(name);
    const body = Buffer.from(await response.arrayBuffer());
    return await route.fulfill({ status: response.status, headers: Object.fromEntries(headers), body });
  } catch (error) {
    process.stderr.write(`The handler of ${url} failed: ${error instanceof Error ? error.stack : error}\n`);
    return route.abort('failed').catch(() => undefined);
  }
}

/** @param {Map<string, string>} headers */
const lists = (headers) => Object.fromEntries([...headers].map(([name, value]) => [name, [value]]));

/** @param {import('playwright-core').Request} request @param {string} url */
function asked(request, url) {
  const headers = new Headers();
  for (const [name, value] of Object.entries(request.headers())) {
    if (!name.startsWith(':')) headers.set(name, realAddress(value));
  }
  const body = request.postDataBuffer();
  return new Request(url, {
    method: request.method(),
    headers,
    ...(body === null ? {} : { body: new Uint8Array(body) }),
  });
}
