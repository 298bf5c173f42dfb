import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { test as base, type Page } from '@playwright/test';
import type { Desk } from '../../main/bridge/contract';
import { electronBinary } from '../../main/commandLine/electronBinary.mjs';
import { startElectron } from './hosts/electronHost';
import { type EvaluateInMain, type Folders, makeFolders, type RunningApp, type StartOptions } from './hosts/host';
import { startLoopback } from './hosts/loopbackHost';
import { startStandIn } from './hosts/standInHost';

export { expect } from '@playwright/test';

declare global {
  interface Window {
    readonly desk: Desk;
  }
}

export type Project = 'stand-in' | 'loopback' | 'electron';

/** The app as a spec sees it; `page` and the lists are those of the latest start. */
export interface DeskUnderTest {
  readonly page: Page;
  readonly project: Project;
  /** null under `loopback`. */
  readonly evaluateInMain: EvaluateInMain | null;
  readonly answerDialog: (path: string | null) => Promise<void>;
  readonly dataFolder: string;
  readonly documentsFolder: string;
  /** Ends the app and starts it again on the same folders. */
  readonly reopen: (options?: StartOptions) => Promise<void>;
  readonly kill: () => Promise<void>;
  /** The exit code of the host, once it has ended. */
  readonly ended: Promise<number | null>;
  readonly requests: readonly string[];
  readonly violations: readonly string[];
}

interface Fixtures {
  /** Loopback only: a real window on the display, for which the spec is left out where there is no display. */
  readonly realWindow: boolean;
  readonly folders: Folders;
  readonly desk: DeskUnderTest;
}

const isProject = (name: string): name is Project => ['stand-in', 'loopback', 'electron'].includes(name);

export const hasDisplay = (): boolean =>
  process.platform !== 'linux' || Boolean(process.env.DISPLAY) || Boolean(process.env.WAYLAND_DISPLAY);

function start(project: Project, folders: Folders, options: StartOptions, realWindow: boolean): Promise<RunningApp> {
  if (project === 'stand-in') return startStandIn(folders, options);
  if (project === 'loopback') return startLoopback(folders, options, realWindow);
  return startElectron(folders, options);
}

export const test = base.extend<Fixtures>({
  realWindow: [false, { option: true }],

  // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the names of the fixtures out of this pattern.
  folders: async ({}, use) => {
    const all = mkdtempSync(join(tmpdir(), 'sunder-test-'));
    await use(makeFolders(all));
    rmSync(all, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
  },

  desk: async ({ folders, realWindow }, use, info) => {
    const project = info.project.name;
    if (!isProject(project)) throw new Error(`No host is called ${project}`);
    test.skip(project === 'electron' && electronBinary() === null, 'no Electron binary on this machine');
    test.skip(project === 'electron' && !hasDisplay(), 'no display on this machine');
    test.skip(realWindow && project === 'loopback' && !hasDisplay(), 'no display on this machine');
    test.skip(realWindow && process.platform === 'win32', 'the window is joined through a shell script');
    let app = await start(project, folders, {}, realWindow);
    await use({
      project,
      get page() {
        return app.page;
      },
      get evaluateInMain() {
        return app.evaluateInMain;
      },
      get requests() {
        return app.requests;
      },
      get ended() {
        return app.ended;
      },
      get violations() {
        return app.violations;
      },
      answerDialog: (path) => app.answerDialog(path),
      dataFolder: folders.data,
      documentsFolder: folders.documents,
      reopen: async (options = {}) => {
        await app.end();
        app = await start(project, folders, options, realWindow);
      },
      kill: () => app.kill(),
    });
    await app.end();
  },
});
