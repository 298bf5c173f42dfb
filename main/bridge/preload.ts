import { contextBridge, ipcRenderer, webUtils } from 'electron';
import type { Desk, ElectronRequests, Notices, Requests } from './contract';

type AllRequests = Requests & ElectronRequests;

/** One named function per request: the page never gets a channel of its own choice. */
const ask =
  <C extends keyof AllRequests>(channel: C) =>
  (...given: Parameters<AllRequests[C]>): ReturnType<AllRequests[C]> =>
    ipcRenderer.invoke(channel, ...given) as ReturnType<AllRequests[C]>;

/** The listener gets the payload only, never Electron's event. */
const hear =
  <N extends keyof Notices>(channel: N) =>
  (listener: (...payload: Parameters<Notices[N]>) => void): (() => void) => {
    const forward = (_event: unknown, ...payload: unknown[]) => listener(...(payload as Parameters<Notices[N]>));
    ipcRenderer.on(channel, forward);
    return () => {
      ipcRenderer.removeListener(channel, forward);
    };
  };

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
