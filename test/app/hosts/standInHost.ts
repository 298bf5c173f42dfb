import { chromium } from '@playwright/test';
import {
  type EvaluateInMain,
  endProgram,
  environment,
  type Folders,
  found,
  type RunningApp,
  type StartOptions,
  startProgram,
} from './host';

type News =
  | { readonly kind: 'window'; readonly address: string }
  | { readonly kind: 'request'; readonly url: string }
  | { readonly kind: 'violation'; readonly text: string }
  | { readonly kind: 'answer'; readonly id: number; readonly value?: unknown; readonly error?: string };

/** The app's own main process over the stand-in for Electron. */
export async function startStandIn(folders: Folders, options: StartOptions): Promise<RunningApp> {
  const words = ['dist/main/main.js', ...(options.args ?? [])];
  const program = startProgram('test/app/standIn/launch.mjs', words, environment(folders, options), true);
  const requests: string[] = [];
  const violations: string[] = [];
  const waiting = new Map<number, (news: News & { kind: 'answer' }) => void>();
  let address: string | null = null;
  program.child.on('message', (news: News) => {
    if (news.kind === 'window') address ??= news.address;
    if (news.kind === 'request') requests.push(news.url);
    if (news.kind === 'violation') violations.push(news.text);
    if (news.kind === 'answer') waiting.get(news.id)?.(news);
  });

  let last = 0;
  const ask = (message: object): Promise<unknown> =>
    new Promise((resolve, reject) => {
      last += 1;
      const id = last;
      waiting.set(id, ({ value, error }) => {
        waiting.delete(id);
        if (error === undefined) resolve(value);
        else reject(new Error(error));
      });
      void program.ended.then((code) => reject(new Error(`Main ended with ${code}.\n${program.said()}`)));
      program.child.send({ ...message, id }, (failed) => {
        if (failed !== null) reject(failed);
      });
    });
  // What comes back is what the function gave: the type is the caller's, as with Playwright's own evaluate.
  const evaluateInMain: EvaluateInMain = async (fn, argument) => (await ask({ fn: `${fn}`, argument })) as never;

  const hasEnded = program.ended.then((code) => {
    throw new Error(`The app ended with ${code} before its window was there.\n${program.said()}`);
  });
  const join = async () => {
    const at = await found('window', () => address, program);
    const browser = await chromium.connectOverCDP(at);
    const page = await found(
      'page of the app',
      () =>
        browser
          .contexts()
          .flatMap((context) => context.pages())
          .find((one) => one.url().includes('.app.test/')),
      program,
    );
    await page.waitForLoadState();
    return { browser, page };
  };
  try {
    const { page, browser } = await Promise.race([join(), hasEnded]);
    const end = (asked: () => void) => endProgram(program, asked).finally(() => browser.close().catch(() => undefined));
    return {
      page,
      evaluateInMain,
      answerDialog: async (path) => {
        await ask({ dialogAnswer: path });
      },
      requests,
      violations,
      ended: program.ended,
      end: () => end(() => void evaluateInMain(({ app }) => app.exit(0)).catch(() => undefined)),
      // Main alone is killed: its browser has to go with it.
      kill: () => end(() => program.child.kill('SIGKILL')),
    };
  } catch (error) {
    program.signalGroup('SIGKILL');
    throw error;
  }
}
