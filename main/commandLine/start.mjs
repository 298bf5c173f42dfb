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

/** Path of Electron's program, or null after one line that says why not. */
async function findElectron() {
  if (process.env.SUNDER_HOST === 'loopback') return null;
  const found = electronBinary();
  if (found !== null) return found;
  process.stdout.write('Fetching Electron, once…\n');
  const refusal = await installElectron();
  const fetched = electronBinary();
  if (fetched !== null) return fetched;
  const reason = refusal ?? 'its program is missing';
  process.stdout.write(`Electron is not here (${reason}): Sunder opens in a browser window instead.\n`);
  return null;
}

/** Runs a program to its end, passes Ctrl-C on, and ends as it ends. */
function runToEnd(command, words) {
  const child = spawn(command, words, { stdio: 'inherit' });
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => child.kill(signal));
  child.once('error', (error) => {
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 1;
  });
  child.once('exit', (code, signal) => {
    process.exit(code ?? 128 + (constants.signals[signal] ?? 0));
  });
}

await ensureBuilt(['renderer', 'hosts', 'preload']);
const words = process.argv.slice(2).map((word) => (word.startsWith('-') ? word : resolve(word)));
const electron = await findElectron();
if (electron === null) {
  runToEnd(process.execPath, [loopback, ...words]);
} else {
  // Chromium refuses to start its sandbox as root.
  const asRoot = process.getuid?.() === 0 ? ['--no-sandbox'] : [];
  if (asRoot.length > 0) process.stdout.write('Started as root: the window runs without its sandbox (--no-sandbox).\n');
  runToEnd(electron, [...asRoot, root, ...words]);
}
