import { _electron } from '@playwright/test';
import { electronBinary } from '../../../main/commandLine/electronBinary.mjs';
import { browserArguments } from '../browser.mjs';
import { type EvaluateInMain, environment, type Folders, type RunningApp, root, type StartOptions } from './host';
import { reportViolations } from './loopbackHost';

/** The real thing, where its binary is. */
export async function startElectron(folders: Folders, options: StartOptions): Promise<RunningApp> {
  const executablePath = electronBinary();
  if (executablePath === null) throw new Error('no Electron binary on this machine');
  const app = await _electron.launch({
    executablePath,
    args: [...browserArguments(), root, ...(options.args ?? [])],
    cwd: root,
    env: environment(folders, options),
    timeout: 30_000,
  });
  const ended = new Promise<number | null>((resolve) => app.process().once('exit', resolve));
  const page = await app.firstWindow();
  const requests: string[] = [];
  const violations: string[] = [];
  page.on('request', (request) => requests.push(request.url()));
  await reportViolations(page, violations);
  // The first load is over by now; a second one is heard from its beginning.
  await page.reload();
  const evaluateInMain: EvaluateInMain = async (fn, argument) =>
    (await app.evaluate(fn as never, argument as never)) as never;
  return {
    page,
    evaluateInMain,
    answerDialog: (path) =>
      evaluateInMain(({ dialog }, answer) => {
        const filePaths = answer === null ? [] : [answer];
        dialog.showOpenDialog = async () => ({ canceled: answer === null, filePaths });
        dialog.showSaveDialog = async () => ({ canceled: answer === null, filePath: answer ?? '' });
      }, path),
    requests,
    violations,
    ended,
    end: async () => {
      await evaluateInMain(({ app: main }) => main.exit(0)).catch(() => undefined);
      await app.close();
    },
    kill: async () => {
      app.process().kill('SIGKILL');
      await app.close().catch(() => undefined);
    },
  };
}
