import { BrowserWindow, dialog, nativeTheme } from 'electron';
import type { Notices } from '../bridge/contract';
import type { HostWindow } from '../bridge/handlers';
import { isOurPage } from '../bridge/listen';
import { PAGE_ADDRESS } from './page';
import { GROUND, titleOf } from './windowLook';

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
export function openDeskWindow(preloadPath: string, onOpen: () => void = () => undefined): DeskWindow {
  const window = new BrowserWindow({
    // Place and size come back at the next start, on a screen that is still there: Electron sees to both.
    name: 'desk',
    windowStatePersistence: true,
    width: 1360,
    height: 860,
    minWidth: 900,
    minHeight: 600,
    show: false,
    title: 'Sunder',
    backgroundColor: nativeTheme.shouldUseDarkColors ? GROUND.dark : GROUND.light,
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
  window.once('ready-to-show', () => {
    window.show();
    onOpen();
  });
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
    if (reason !== 'clean-exit') void offerNewPage(window);
  });
  window.webContents.on('did-finish-load', () => {
    pageAnswers = true;
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
      window.setTitle(titleOf(displayName, isUnsaved));
      window.setDocumentEdited(isUnsaved);
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

/** A page that has ended leaves an empty window; the user says whether to go on. */
async function offerNewPage(window: BrowserWindow): Promise<void> {
  const { response } = await dialog.showMessageBox({
    type: 'error',
    message: 'The window stopped unexpectedly.',
    detail: 'What was not saved is lost. Files are as they were saved last.',
    buttons: ['Open it again', 'Quit'],
    defaultId: 0,
    cancelId: 0,
  });
  if (window.isDestroyed()) return;
  if (response === 0) window.webContents.reload();
  else window.destroy();
}
