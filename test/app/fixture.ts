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

/** What a spec may use of an app that other specs use as well: nothing that ends or changes it. */
export type SharedDesk = Pick<DeskUnderTest, 'page' | 'project' | 'evaluateInMain' | 'requests' | 'violations'>;

interface Fixtures {
  /** Loopback only: a real window on the display, for which the spec is left out where there is no display. */
  readonly realWindow: boolean;
  readonly folders: Folders;
  /** An app of the test's own. */
  readonly desk: DeskUnderTest;
  /** One app for all tests of a worker that only look at it; its lists begin with the test. */
  readonly sharedDesk: SharedDesk;
}

interface WorkerFixtures {
  /** Started when it is first asked for. */
  readonly sharedApp: () => Promise<RunningApp>;
}

const isProject = (name: string): name is Project => ['stand-in', 'loopback', 'electron'].includes(name);

export const hasDisplay = (): boolean =>
  process.platform !== 'linux' || Boolean(process.env.DISPLAY) || Boolean(process.env.WAYLAND_DISPLAY);

function start(project: Project, folders: Folders, options: StartOptions, realWindow: boolean): Promise<RunningApp> {
  if (project === 'stand-in') return startStandIn(folders, options);
  if (project === 'loopback') return startLoopback(folders, options, realWindow);
  return startElectron(folders, options);
}

function projectCalled(name: string): Project {
  if (!isProject(name)) throw new Error(`No host is called ${name}`);
  return name;
}

/** Leaves the test out, with the reason, where the real Electron cannot be had. */
function needsElectron(project: Project): void {
  test.skip(project === 'electron' && electronBinary() === null, 'no Electron binary on this machine');
  test.skip(project === 'electron' && !hasDisplay(), 'no display on this machine');
}

const removed = (folder: string): void =>
  rmSync(folder, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });

export const test = base.extend<Fixtures, WorkerFixtures>({
  realWindow: [false, { option: true }],

  // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the names of the fixtures out of this pattern.
  folders: async ({}, use) => {
    const all = mkdtempSync(join(tmpdir(), 'sunder-test-'));
    await use(makeFolders(all));
    removed(all);
  },

  sharedApp: [
    // biome-ignore lint/correctness/noEmptyPattern: as above.
    async ({}, use, { project }) => {
      const all = mkdtempSync(join(tmpdir(), 'sunder-test-'));
      let app: Promise<RunningApp> | null = null;
      await use(() => {
        app ??= start(projectCalled(project.name), makeFolders(all), {}, false);
        return app;
      });
      // Read through a function: the assignment above happens where the compiler cannot see it.
      const begun = ((): Promise<RunningApp> | null => app)();
      if (begun !== null) await (await begun).end();
      removed(all);
    },
    { scope: 'worker' },
  ],

  sharedDesk: async ({ sharedApp }, use, info) => {
    const project = projectCalled(info.project.name);
    needsElectron(project);
    const app = await sharedApp();
    const begin = { requests: app.requests.length, violations: app.violations.length };
    await use({
      project,
      page: app.page,
      evaluateInMain: app.evaluateInMain,
      get requests() {
        return app.requests.slice(begin.requests);
      },
      get violations() {
        return app.violations.slice(begin.violations);
      },
    });
  },

  desk: async ({ folders, realWindow }, use, info) => {
    const project = projectCalled(info.project.name);
    needsElectron(project);
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
