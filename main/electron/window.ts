import { BrowserWindow } from 'electron';
import type { Notices } from '../bridge/contract';
import type { HostWindow } from '../bridge/handlers';
import { isOurPage } from '../bridge/listen';
import { PAGE_ADDRESS } from './page';

export interface DeskWindow extends HostWindow {
  readonly window: BrowserWindow;
  /** Waits until the page listens. */
  readonly notify: <N extends keyof Notices>(notice: N, ...payload: Parameters<Notices[N]>) => void;
  readonly focus: () => void;
}

/** The page stays where it is: no other page, window or guest. */
function keepInPlace({ webContents }: BrowserWindow): void {
  webContents.setWindowOpenHandler(() => ({ action: 'deny' }));
  const stay = (event: { preventDefault: () => void }) => event.preventDefault();
  webContents.on('will-navigate', stay);
  webContents.on('will-frame-navigate', stay);
  webContents.on('will-redirect', stay);
  webContents.on('will-attach-webview', stay);
}

/** Opens the one window of the program and loads the page in it. */
export function openDeskWindow(preloadPath: string): DeskWindow {
  const window = new BrowserWindow({
    width: 1360,
    height: 860,
    minWidth: 800,
    minHeight: 560,
    show: false,
    title: 'Sunder',
    webPreferences: {
      preload: preloadPath,
      contextIsolation: true,
      sandbox: true,
      nodeIntegration: false,
      webviewTag: false,
      spellcheck: false,
    },
  });
  let unsaved = false;
  let leaving = false;
  let pageAnswers = true;
  let pageListens = false;
  const waiting: (() => void)[] = [];

  const notify: DeskWindow['notify'] = (notice, ...payload) => {
    const send = () => window.webContents.send(notice, ...payload);
    if (pageListens) send();
    else waiting.push(send);
  };

  keepInPlace(window);
  window.once('ready-to-show', () => window.show());
  // Our own title stands; the page has none to add.
  window.on('page-title-updated', (event) => event.preventDefault());
  window.on('unresponsive', () => {
    pageAnswers = false;
  });
  window.on('responsive', () => {
    pageAnswers = true;
  });
  window.webContents.on('render-process-gone', (_event, { reason }) => {
    pageAnswers = false;
    process.stderr.write(`The page ended (${reason}).\n`);
  });
  window.webContents.on('did-finish-load', () => {
    if (!isOurPage(window.webContents.getURL())) return;
    pageListens = true;
    for (const send of waiting.splice(0)) send();
  });
  window.on('close', (event) => {
    // A page that hangs or has ended can ask nobody: then the window must still close.
    if (leaving || !unsaved || !pageAnswers) return;
    event.preventDefault();
    notify('window:closing');
  });
  void window.loadURL(PAGE_ADDRESS);

  return {
    window,
    notify,
    noteUnsaved: (isUnsaved, displayName) => {
      unsaved = isUnsaved;
      window.setTitle(`${isUnsaved ? '• ' : ''}${displayName === '' ? '' : `${displayName} – `}Sunder`);
    },
    close: () => {
      leaving = true;
      // After the answer has left for the page.
      setImmediate(() => window.close());
    },
    focus: () => {
      if (window.isMinimized()) window.restore();
      window.focus();
    },
  };
}
