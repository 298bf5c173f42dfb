// `node test/app/standIn/launch.mjs dist/main/main.js [arguments]`: runs a built Electron main process without Electron.
import { register } from 'node:module';
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';

/** Generous: the time goes into importing the app's own code on a busy machine, before any browser starts. */
const WINDOW_WITHIN_MS = Number(process.env.SUNDER_STAND_IN_TIMEOUT_MS ?? 30_000);
const NO_WINDOW = 70;

const [, launcher, main, ...rest] = process.argv;
if (main === undefined) {
  process.stderr.write('Usage: node launch.mjs dist/main/main.js [arguments]\n');
  process.exit(64);
}

register('./hooks.mjs', import.meta.url);
const { emitReady, hasAskedForWindow, hasQuit } = await import('./app.mjs');
const { listenToTest } = await import('./testChannel.mjs');

setTimeout(() => {
  if (hasAskedForWindow() || hasQuit()) return;
  process.stderr.write(
    `${main} asked for no window within ${WINDOW_WITHIN_MS} ms. Electron says "ready" only after the main module has ` +
      `been evaluated: an "await app.whenReady()" at its top level waits for ever.\n`,
  );
  process.exit(NO_WINDOW);
}, WINDOW_WITHIN_MS).unref();
// A main module that waits for ever leaves nothing to do, and Node would end with code 13 before the message.
const alive = setInterval(() => {
  if (hasAskedForWindow()) clearInterval(alive);
}, 50);

// A packaged app sees its own program first; an unpackaged one, as here, the program and the path of the app.
process.argv = [launcher ?? '', main, ...rest];
await listenToTest();
await import(pathToFileURL(resolve(main)).href);
emitReady();
