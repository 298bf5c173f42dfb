import type { ElectronRequests, Requests } from '../../main/bridge/contract';
import { expect, test } from './fixture';

/** Typed, so that a request added to the contract has to be added here. */
const channels = Object.keys({
  'host:facts': true,
  'scenario:example': true,
  'scenario:open': true,
  'scenario:open-recent': true,
  'scenario:open-path': true,
  'scenario:save': true,
  'scenario:save-as': true,
  'recent:list': true,
  'documents:list': true,
  'window:unsaved': true,
  'window:close': true,
} satisfies Record<keyof (Requests & ElectronRequests), true>).sort();

const hostileAddresses = [
  'https://foreign.example/index.html',
  'http://bundle/index.html',
  'app://bundle.foreign.example/index.html',
  'app://bundle@foreign.example/index.html',
  'app://foreign/bundle/index.html',
  'file:///bundle/index.html',
  'data:text/html,app://bundle/',
  'about:blank',
  '',
];

test.describe('a request is heard from the page in the window only', { tag: '@main-process' }, () => {
  test('every channel of the contract is there, and no other', async ({ sharedDesk: desk }) => {
    const there = await desk.evaluateInMain?.(({ ipcMain }) => {
      const handlers: Map<string, unknown> = Reflect.get(ipcMain, '_invokeHandlers');
      return [...handlers.keys()].sort();
    });
    expect(there).toEqual(channels);
  });

  test('every hostile sender is refused on every channel', async ({ sharedDesk: desk }) => {
    const heard = await desk.evaluateInMain?.(async ({ ipcMain, BrowserWindow }, addresses) => {
      const handlers: Map<string, (event: object, ...args: unknown[]) => unknown> = Reflect.get(
        ipcMain,
        '_invokeHandlers',
      );
      const sender = BrowserWindow.getAllWindows()[0]?.webContents;
      const page = { url: 'app://bundle/index.html', parent: null };
      const senders: [string, object][] = [
        ['no frame', { sender, senderFrame: null }],
        ['a frame in the page', { sender, senderFrame: { ...page, parent: page } }],
        ['another window', { sender: { id: 99 }, senderFrame: page }],
        ['no window', { sender: null, senderFrame: page }],
        ...addresses.map((url): [string, object] => [url, { sender, senderFrame: { url, parent: null } }]),
      ];
      const got: string[] = [];
      for (const [channel, handler] of handlers) {
        for (const [name, event] of senders) {
          try {
            await handler(event);
            got.push(`${channel} answered ${name}`);
          } catch {
            // Refused, as it has to be.
          }
        }
      }
      // The check has to let the true page through, or refusing would prove nothing.
      const facts = await handlers.get('host:facts')?.({ sender, senderFrame: page });
      return { got, facts };
    }, hostileAddresses);
    expect(heard).toMatchObject({ got: [], facts: { ok: true } });
  });
});

test('no permission is given but writing to the clipboard', { tag: '@stand-in' }, async ({ sharedDesk: desk }) => {
  const given = await desk.evaluateInMain?.(({ session }) => {
    const handlers = Reflect.get(session.defaultSession, 'permissionHandlers');
    const wanted = ['media', 'geolocation', 'notifications', 'midi', 'fullscreen', 'openExternal', 'clipboard-read'];
    const asked: string[] = [];
    for (const permission of [...wanted, 'clipboard-sanitized-write']) {
      handlers.request({}, permission, (yes: boolean) => yes && asked.push(permission));
      if (handlers.check({}, permission, 'app://bundle', {})) asked.push(permission);
    }
    return { asked, device: handlers.device({ deviceType: 'usb' }) };
  });
  expect(given).toEqual({ asked: ['clipboard-sanitized-write', 'clipboard-sanitized-write'], device: false });
});
