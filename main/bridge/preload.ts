import { contextBridge, ipcRenderer, webUtils } from 'electron';
import type { Desk, ElectronRequests, Notices, Requests } from './contract';
import { createWaitingNotices } from './waitingNotices';

type AllRequests = Requests & ElectronRequests;

/** One named function per request: the page never gets a channel of its own choice. */
const ask =
  <C extends keyof AllRequests>(channel: C) =>
  (...given: Parameters<AllRequests[C]>): ReturnType<AllRequests[C]> =>
    ipcRenderer.invoke(channel, ...given) as ReturnType<AllRequests[C]>;

/**
 * The listener gets the payload only, never Electron's event. The page listens only once it has drawn itself: what
 * comes before, a file named at the start, waits for the first listener.
 */
function hear<N extends keyof Notices>(
  channel: N,
): (listener: (...payload: Parameters<Notices[N]>) => void) => () => void {
  const waiting = createWaitingNotices<Parameters<Notices[N]>>();
  ipcRenderer.on(channel, (_event, ...payload) => waiting.tell(payload as Parameters<Notices[N]>));
  return waiting.listen;
}

const openPath = ask('scenario:open-path');

const desk: Desk = {
  hostFacts: ask('host:facts'),
  exampleScenario: ask('scenario:example'),
  openScenario: ask('scenario:open'),
  openRecent: ask('scenario:open-recent'),
  openDropped: (file) => openPath(webUtils.getPathForFile(file)),
  saveScenario: ask('scenario:save'),
  saveScenarioAs: ask('scenario:save-as'),
  recentFiles: ask('recent:list'),
  documentNames: ask('documents:list'),
  noteUnsaved: ask('window:unsaved'),
  closeWindow: ask('window:close'),
  onMenuCommand: hear('menu:command'),
  onScenarioOpened: hear('scenario:opened'),
  onWindowClosing: hear('window:closing'),
};

// Under context isolation Electron freezes what it hands over.
contextBridge.exposeInMainWorld('desk', Object.freeze(desk));
