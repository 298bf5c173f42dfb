// `npm start [-- FILE]`: builds when sources changed, then starts Sunder in Electron, or in a browser window where
// Electron cannot be had. SUNDER_HOST=loopback goes straight to the browser window.
import { spawn } from 'node:child_process';
import { constants } from 'node:os';
import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureBuilt } from './build.mjs';
import { electronBinary, installElectron } from './electronBinary.mjs';

const root = fileURLToPath(new URL('../../', import.meta.url));
const loopback = fileURLToPath(new URL('../../dist/main/loopback.js', import.meta.url));

/** How long Electron may take to show its window. */
const OPEN_ms = 45_000;
const say = (line) => process.stdout.write(`${line}\n`);
const instead = (reason) => say(`Electron is not here (${reason}): Sunder opens in a browser window instead.`);

/** Electron needs a display; the loopback host says what to do without one. */
const hasDisplay =
  process.platform !== 'linux' || [process.env.DISPLAY, process.env.WAYLAND_DISPLAY].some((name) => Boolean(name));

let interrupted = false;

/** Path of Electron's program, or null after one line that says why not. */
async function findElectron() {
  if (process.env.SUNDER_HOST === 'loopback' || !hasDisplay) return null;
  const found = electronBinary();
  if (found !== null) return found;
  say('Fetching Electron, once…');
  const refusal = await installElectron({
    onProgress: (received_bytes) => say(`Fetching Electron: ${Math.round(received_bytes / 1e6)} MB so far.`),
  });
  const fetched = electronBinary();
  if (fetched === null) instead(refusal ?? 'its program is missing');
  return fetched;
}

/** Runs a program to its end and passes signals on. Resolves to the exit code. */
function run(command, words, { stdio = 'inherit', env = process.env, watch = () => undefined } = {}) {
  return new Promise((done) => {
    const child = spawn(command, words, { stdio, env });
    const passOn = new Map(
      ['SIGINT', 'SIGTERM', 'SIGHUP'].map((signal) => [
        signal,
        () => {
          interrupted = true;
          child.kill(signal);
        },
      ]),
    );
    for (const [signal, listener] of passOn) process.on(signal, listener);
    const end = (code) => {
      for (const [signal, listener] of passOn) process.off(signal, listener);
      done(code);
    };
    child.once('error', (error) => {
      process.stderr.write(`${error.message}\n`);
      end(1);
    });
    child.once('exit', (code, signal) => end(code ?? 128 + (constants.signals[signal] ?? 0)));
    watch(child);
  });
}

/** Exit code of Electron, or null when it never showed a window: then the browser is tried. */
async function runElectron(program, words) {
  let isOpen = false;
  let isLate = false;
  const code = await run(program, words, {
    stdio: ['inherit', 'pipe', 'inherit'],
    env: { ...process.env, SUNDER_SAY_WHEN_OPEN: '1' },
    watch: (child) => {
      const late = setTimeout(() => {
        isLate = true;
        child.kill('SIGKILL');
      }, OPEN_ms);
      child.stdout?.setEncoding('utf8').on('data', (text) => {
        process.stdout.write(text);
        if (!text.includes('the window is open')) return;
        isOpen = true;
        clearTimeout(late);
      });
      child.once('exit', () => clearTimeout(late));
      child.once('error', () => clearTimeout(late));
    },
  });
  // Without a window and yet well: a Sunder was running already and has taken the file over.
  if (isOpen || interrupted || code === 0) return code;
  instead(isLate ? 'its window does not open' : `it ended with code ${code} before its window was open`);
  return null;
}

await ensureBuilt(['renderer', 'hosts', 'preload'], {
  onBuild: () => say('Building Sunder, since its sources changed…'),
});
const words = process.argv.slice(2).map((word) => (word.startsWith('-') ? word : resolve(word)));
const electron = await findElectron();
let code = null;
if (electron !== null) {
  // Chromium refuses to start its sandbox as root.
  const asRoot = process.getuid?.() === 0 ? ['--no-sandbox'] : [];
  if (asRoot.length > 0) say('Started as root: the window runs without its sandbox (--no-sandbox).');
  code = await runElectron(electron, [...asRoot, root, ...words]);
}
code ??= await run(process.execPath, [loopback, ...words]);
process.exit(code);
