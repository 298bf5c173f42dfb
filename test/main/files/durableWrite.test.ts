import { type ChildProcess, spawn } from 'node:child_process';
import * as nodeFiles from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { durableWrite, type Files } from '../../../main/files/durableWrite';

let folder = '';
beforeEach(async () => {
  folder = await nodeFiles.mkdtemp(join(tmpdir(), 'sunder-unit-'));
});
afterEach(() => nodeFiles.rm(folder, { recursive: true, force: true }));

const fault = (code: string): Error => Object.assign(new Error(code), { code });
const read = (name: string) => nodeFiles.readFile(join(folder, name), 'utf8');

describe('a save that goes well', () => {
  it('writes a new file and replaces an old one', async () => {
    const path = join(folder, 'one.sunder.json');
    await durableWrite(path, 'first');
    await durableWrite(path, 'second ü');
    expect(await read('one.sunder.json')).toBe('second ü');
    expect(await nodeFiles.readdir(folder)).toEqual(['one.sunder.json']);
  });

  it('keeps the rights of the file', async () => {
    const path = join(folder, 'one');
    await nodeFiles.writeFile(path, 'old');
    await nodeFiles.chmod(path, 0o640);
    await durableWrite(path, 'new');
    expect((await nodeFiles.stat(path)).mode & 0o777).toBe(0o640);
  });

  it('follows a link instead of replacing it', async () => {
    await nodeFiles.writeFile(join(folder, 'real'), 'old');
    await nodeFiles.symlink(join(folder, 'real'), join(folder, 'link'));
    await durableWrite(join(folder, 'link'), 'new');
    expect(await read('real')).toBe('new');
    expect((await nodeFiles.lstat(join(folder, 'link'))).isSymbolicLink()).toBe(true);
  });

  it('lets the last of many quick saves win', async () => {
    const path = join(folder, 'one');
    await Promise.all(Array.from({ length: 20 }, (_, index) => durableWrite(path, `text ${index}`)));
    expect(await read('one')).toBe('text 19');
  });

  it('takes a name as long as the file system does', async () => {
    const path = join(folder, 'a'.repeat(255));
    await durableWrite(path, 'text');
    expect(await nodeFiles.readFile(path, 'utf8')).toBe('text');
  });

  it('sweeps what a killed save left an hour ago, and nothing else', async () => {
    const child = spawn(process.execPath, ['-e', '']);
    await new Promise((ended) => child.once('exit', ended));
    const [stale, fresh] = ['0123456789abcdef', 'fedcba9876543210'].map((word) => `.sunder-${child.pid}-${word}.tmp`);
    const living = `.sunder-${process.pid}-0123456789abcdef.tmp`;
    for (const name of [stale, fresh, living, '.other.tmp']) await nodeFiles.writeFile(join(folder, name), '');
    const longAgo = new Date(Date.now() - 2 * 3_600_000);
    for (const name of [stale, living, '.other.tmp']) await nodeFiles.utimes(join(folder, name), longAgo, longAgo);
    await durableWrite(join(folder, 'one'), 'text');
    expect((await nodeFiles.readdir(folder)).sort()).toEqual([fresh, living, '.other.tmp', 'one'].sort());
  });
});

type Step = 'open' | 'write' | 'chmod' | 'sync' | 'rename';

/** The real file system, with one step that fails. */
function failingAt(step: Step, code: string): Files {
  const open: Files['open'] = async (path, flags, mode) => {
    if (step === 'open' && String(path).endsWith('.tmp')) throw fault(code);
    const handle = await nodeFiles.open(path, flags, mode);
    if (step === 'write') {
      handle.writeFile = async () => {
        await handle.write('half of');
        throw fault(code);
      };
    }
    if (step === 'chmod') handle.chmod = () => Promise.reject(fault(code));
    if (step === 'sync') handle.sync = () => Promise.reject(fault(code));
    return handle;
  };
  const rename: Files['rename'] = (from, to) =>
    step === 'rename' ? Promise.reject(fault(code)) : nodeFiles.rename(from, to);
  return { ...nodeFiles, open, rename };
}

describe('a save that fails', () => {
  const steps: readonly Step[] = ['open', 'write', 'chmod', 'sync', 'rename'];
  const codes = ['ENOSPC', 'EDQUOT', 'EACCES', 'EROFS', 'EIO', 'EBUSY'];
  it.each(steps.flatMap((step) => codes.map((code) => [step, code] as const)))(
    'at %s with %s leaves the old file as it was and nothing besides',
    async (step, code) => {
      const path = join(folder, 'one');
      await nodeFiles.writeFile(path, 'old');
      await expect(durableWrite(path, 'new', { files: failingAt(step, code) })).rejects.toMatchObject({ code });
      expect(await read('one')).toBe('old');
      expect(await nodeFiles.readdir(folder)).toEqual(['one']);
    },
  );

  it('does not stop the next save of the same file', async () => {
    const path = join(folder, 'one');
    const first = durableWrite(path, 'first', { files: failingAt('sync', 'EIO') });
    const second = durableWrite(path, 'second');
    await expect(first).rejects.toMatchObject({ code: 'EIO' });
    await second;
    expect(await read('one')).toBe('second');
  });

  it('says so when the folder cannot be synced for a fault of the drive', async () => {
    let opened = 0;
    const open: Files['open'] = async (...given) => {
      const handle = await nodeFiles.open(...given);
      opened += 1;
      if (opened === 2) handle.sync = () => Promise.reject(fault('EIO'));
      return handle;
    };
    const files: Files = { ...nodeFiles, open };
    await expect(durableWrite(join(folder, 'one'), 'new', { files })).rejects.toMatchObject({ code: 'EIO' });
  });

  it('on Windows tries again while another program holds the file', async () => {
    let tries = 0;
    const rename: Files['rename'] = (from, to) => {
      tries += 1;
      return tries < 4 ? Promise.reject(fault('EPERM')) : nodeFiles.rename(from, to);
    };
    await durableWrite(join(folder, 'one'), 'new', { files: { ...nodeFiles, rename }, platform: 'win32' });
    expect(tries).toBe(4);
    expect(await read('one')).toBe('new');
  });
});

/** Saves texts of ever the same letter in a loop, so that a torn file shows. */
const SAVER = `
import { durableWrite } from ${JSON.stringify(fileURLToPath(new URL('../../../main/files/durableWrite.ts', import.meta.url)))};
for (let index = 0; ; index += 1) {
  await durableWrite(process.argv[2], String.fromCharCode(97 + (index % 26)).repeat(100_000));
  if (index === 0) process.stdout.write('saving\\n');
}
`;

async function killWhileSaving(script: string, path: string, delay_ms: number): Promise<void> {
  const child: ChildProcess = spawn(process.execPath, [script, path], { stdio: ['ignore', 'pipe', 'inherit'] });
  const ended = new Promise((resolve) => child.once('exit', resolve));
  await new Promise((resolve) => child.stdout?.once('data', resolve));
  await new Promise((resolve) => setTimeout(resolve, delay_ms));
  child.kill('SIGKILL');
  await ended;
}

describe('a program that is killed while it saves', () => {
  it('leaves a whole file, 200 times out of 200', { timeout: 180_000 }, async () => {
    const source = join(folder, 'saver.mjs');
    await nodeFiles.writeFile(source, SAVER);
    await build({
      configFile: false,
      root: folder,
      logLevel: 'error',
      build: { ssr: source, outDir: join(folder, 'built'), minify: false },
    });
    const script = join(folder, 'built', 'saver.mjs');
    const path = join(folder, 'victim');
    const torn: number[] = [];
    const kill = async (index: number): Promise<void> => {
      const own = `${path}${index % 8}`;
      await killWhileSaving(script, own, index % 13);
      const text = await nodeFiles.readFile(own, 'utf8');
      if (text.length !== 100_000 || new Set(text).size !== 1) torn.push(index);
    };
    const chain = async (first: number): Promise<void> => {
      for (let index = first; index < 200; index += 8) await kill(index);
    };
    await Promise.all(Array.from({ length: 8 }, (_, first) => chain(first)));
    expect(torn).toEqual([]);
  });
});
