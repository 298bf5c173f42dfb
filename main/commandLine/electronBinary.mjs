// Looks for Electron's own program and, once, lets its installer fetch it. Never loads the package `electron`:
// that alone would start a download.
import { spawn } from 'node:child_process';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const packageFolder = fileURLToPath(new URL('../../node_modules/electron/', import.meta.url));

const usualName = () =>
  process.platform === 'darwin'
    ? 'Electron.app/Contents/MacOS/Electron'
    : process.platform === 'win32'
      ? 'electron.exe'
      : 'electron';

/** Path of the program, or null. ELECTRON_OVERRIDE_DIST_PATH names the folder that holds it. */
export function electronBinary(environment = process.env, folder = packageFolder) {
  const override = environment.ELECTRON_OVERRIDE_DIST_PATH ?? '';
  const named = join(folder, 'path.txt');
  const name = existsSync(named) ? readFileSync(named, 'utf8').trim() : usualName();
  const path = override === '' ? join(folder, 'dist', name) : join(override, name);
  if (override === '' && !existsSync(named)) return null;
  return existsSync(path) ? path : null;
}

const sizeOfFilesIn_bytes = (folder) => {
  try {
    return readdirSync(folder).reduce((sum, name) => sum + statSync(join(folder, name)).size, 0);
  } catch {
    // Not there yet, or removed while we looked.
    return 0;
  }
};

/** Changes while the installer receives or unpacks anything. */
const received_bytes = () =>
  [
    join(packageFolder, 'dist'),
    ...readdirSync(tmpdir())
      .filter((name) => name.startsWith('electron-download-'))
      .map((name) => join(tmpdir(), name)),
  ].reduce((sum, folder) => sum + sizeOfFilesIn_bytes(folder), 0);

const PROGRESS_EVERY_ms = 10_000;
const SIGNALS = ['SIGINT', 'SIGTERM', 'SIGHUP'];

function stop(child) {
  try {
    if (process.platform === 'win32') child.kill('SIGKILL');
    else process.kill(-child.pid, 'SIGKILL');
  } catch {
    // It has ended already.
  }
}

/** Runs Electron's installer; null when it succeeded, else the reason in a few words. */
export function installElectron({
  script = join(packageFolder, 'install.js'),
  stall_ms = 8_000,
  limit_ms = 300_000,
  progress = received_bytes,
  onProgress = () => undefined,
} = {}) {
  if (!existsSync(script)) return Promise.resolve('its package is not installed');
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [script], {
      stdio: ['ignore', 'pipe', 'pipe'],
      detached: process.platform !== 'win32',
    });
    let heard = 0;
    const listen = (piece) => {
      heard += piece.length;
    };
    child.stdout.on('data', listen);
    child.stderr.on('data', listen);
    const start_ms = Date.now();
    let moved_ms = start_ms;
    let told_ms = start_ms;
    let before = '';
    // The installer has a process group of its own: Ctrl-C here has to be passed on.
    const interrupted = () => {
      stop(child);
      process.exit(130);
    };
    for (const signal of SIGNALS) process.once(signal, interrupted);
    const watch = setInterval(() => {
      const received = progress();
      const now = `${heard} ${received}`;
      if (now !== before) moved_ms = Date.now();
      before = now;
      if (Date.now() - moved_ms > stall_ms) end('its download does not move');
      else if (Date.now() - start_ms > limit_ms) end('its download takes too long');
      else if (Date.now() - told_ms > PROGRESS_EVERY_ms) {
        told_ms = Date.now();
        onProgress(received);
      }
    }, 250);
    const end = (reason) => {
      clearInterval(watch);
      for (const signal of SIGNALS) process.off(signal, interrupted);
      stop(child);
      resolve(reason);
    };
    child.once('error', () => end('its installer does not start'));
    child.once('exit', (code) => end(code === 0 ? null : 'its download was refused'));
  });
}
