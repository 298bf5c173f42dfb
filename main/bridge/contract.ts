/**
 * Everything the renderer may ask of the host, and all it may be told. Types only: this file emits no code,
 * so both hosts, the preload script and the renderer share it.
 * To add a request: one line in `Requests`; the compiler then points at the places to fill in.
 */
import type { Result } from '../../core/problem';
import type { Scenario } from '../../core/scenario/scenario';

/** Stands for a file the user chose. The host keeps the path; the renderer never sees or sends one. */
export type FileTicket = string & { readonly ticket: unique symbol };

export interface OpenFile {
  /** null: the scenario has no file yet (an example, or a file whose place is not known); saving asks for a name. */
  readonly ticket: FileTicket | null;
  readonly displayName: string;
  readonly scenario: Scenario;
}

export interface RecentFile {
  readonly ticket: FileTicket;
  readonly displayName: string;
  /** Folder as a person would say it, for telling namesakes apart. */
  readonly folderName: string;
}

export interface HostFacts {
  readonly kind: 'electron' | 'loopback';
  readonly appVersion: string;
  /** Where files go when the host has no dialogs of its own (loopback); null under Electron. */
  readonly documentsFolderName: string | null;
}

export type Cancelled = 'cancelled';

/** Renderer asks, host answers. Expected failures come back as problems, not as rejections. */
export interface Requests {
  'host:facts': () => Promise<Result<HostFacts>>;
  'scenario:example': () => Promise<Result<OpenFile>>;
  /** Electron: shows the system dialog. Loopback: `name` is a file in the documents folder, chosen in the page. */
  'scenario:open': (name: string | null) => Promise<Result<OpenFile | Cancelled>>;
  'scenario:open-recent': (ticket: FileTicket) => Promise<Result<OpenFile>>;
  'scenario:save': (ticket: FileTicket, scenario: Scenario) => Promise<Result<'saved'>>;
  /** Electron: shows the system dialog with `suggestedName`. Loopback: saves under that name. */
  'scenario:save-as': (
    scenario: Scenario,
    suggestedName: string,
    overwrite: boolean,
  ) => Promise<Result<OpenFile | Cancelled | 'exists'>>;
  'recent:list': () => Promise<Result<readonly RecentFile[]>>;
  /** Loopback only: names of the scenario files in the documents folder. */
  'documents:list': () => Promise<Result<readonly string[]>>;
  /** The page reports whether work is unsaved; the host asks before the window closes. */
  'window:unsaved': (unsaved: boolean, displayName: string) => Promise<Result<'noted'>>;
  /** The page's answer after a `window:closing` notice. */
  'window:close': () => Promise<Result<'closing'>>;
}

/** Asked by the preload script alone, for files dropped on the page; the loopback host has no such request. */
export interface ElectronRequests {
  'scenario:open-path': (path: string) => Promise<Result<OpenFile>>;
}

export type MenuCommand =
  | 'new'
  | 'open'
  | 'save'
  | 'save-as'
  | 'undo'
  | 'redo'
  | 'duplicate-formulation'
  | 'about'
  | 'shortcuts';

/** Host tells, renderer listens. */
export interface Notices {
  'menu:command': (command: MenuCommand) => void;
  /** A file was opened from outside the page: start argument, or dropped on the window's icon. */
  'scenario:opened': (file: OpenFile) => void;
  /** The user asked to close the window while work is unsaved: the page offers to save, then calls `closeWindow`. */
  'window:closing': () => void;
}

/** What the page finds as `window.desk`: one named function per request, never a raw channel. */
export interface Desk {
  hostFacts: Requests['host:facts'];
  exampleScenario: Requests['scenario:example'];
  openScenario: Requests['scenario:open'];
  openRecent: Requests['scenario:open-recent'];
  /** A file dropped on the page. Electron resolves its place, so that it can be saved back; loopback reads its text. */
  openDropped: (file: File) => Promise<Result<OpenFile>>;
  saveScenario: Requests['scenario:save'];
  saveScenarioAs: Requests['scenario:save-as'];
  recentFiles: Requests['recent:list'];
  documentNames: Requests['documents:list'];
  noteUnsaved: Requests['window:unsaved'];
  closeWindow: Requests['window:close'];
  /** Each returns a function that stops listening. */
  onMenuCommand: (listener: Notices['menu:command']) => () => void;
  onScenarioOpened: (listener: Notices['scenario:opened']) => () => void;
  onWindowClosing: (listener: Notices['window:closing']) => () => void;
}

/** The host answers every request; arguments arrive as unknown and are checked before use. */
export type Handlers = { readonly [C in keyof Requests]: (...untrusted: unknown[]) => ReturnType<Requests[C]> };
export type ElectronHandlers = Handlers & {
  readonly [C in keyof ElectronRequests]: (...untrusted: unknown[]) => ReturnType<ElectronRequests[C]>;
};
