// The line between the stand-in and the test that started it: news one way, functions to run in main the other.

/** @param {{ readonly kind: string } & Record<string, unknown>} news */
export function tellTest(news) {
  if (process.connected) process.send?.(news);
}

/**
 * Runs what the test sends, `fn(electron, argument)`, as Playwright does with a real Electron. Also ends with the test.
 */
export async function listenToTest() {
  if (process.send === undefined) return;
  const electron = await import('./electron.mjs');
  const { answers } = await import('./dialog.mjs');
  process.on(
    'message',
    async (/** @type {{ id: number, fn?: string, argument?: unknown, dialogAnswer?: unknown }} */ m) => {
      try {
        if (m.fn === undefined) {
          answers.push(m.dialogAnswer);
          tellTest({ kind: 'answer', id: m.id, value: undefined });
          return;
        }
        // biome-ignore lint/security/noGlobalEval: the text comes from the test's own source, over its own process line.
        const run = globalThis.eval(`(${m.fn})`);
        tellTest({ kind: 'answer', id: m.id, value: await run(electron.default, m.argument) });
      } catch (error) {
        tellTest({
          kind: 'answer',
          id: m.id,
          error: error instanceof Error ? (error.stack ?? error.message) : String(error),
        });
      }
    },
  );
  // A stand-in without its test is of no use to anyone, and would keep a browser running.
  process.on('disconnect', () => process.exit(0));
}
