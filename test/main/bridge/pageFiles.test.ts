import { mkdir, mkdtemp, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, relative, sep } from 'node:path';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { pagePath, readPageFile } from '../../../main/bridge/pageFiles';

let folder = '';
let root = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
  root = join(folder, 'renderer');
  await mkdir(join(root, 'assets'), { recursive: true });
  await mkdir(join(folder, 'main'));
  for (const name of ['package.json', 'main/main.js', 'renderer/index.html', 'renderer/assets/page.js']) {
    await writeFile(join(folder, name), name);
  }
  await symlink(join(folder, 'package.json'), join(root, 'assets', 'link.json'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

const attacks = [
  '/../main/main.js',
  '/..%2fmain/main.js',
  '/%2e%2e/%2e%2e/package.json',
  '/..\\..\\package.json',
  '/%5c..%5c..',
  '/assets/..%00.js',
  '/assets/page.js%00.html',
  '//etc/passwd',
  '/C:/x.js',
  '/index.html::$DATA',
  '/%E0%A4%A',
  '/assets/',
  '/assets',
  '/assets/link.json',
  '/assets/../../package.json',
  '/%252e%252e/package.json',
  'package.json',
  '',
];

describe('files of the page', () => {
  it('are there by their own address, and the start page by the bare one', async () => {
    for (const address of ['/', '/index.html', '/assets/page.js']) {
      expect(await readPageFile(root, address)).not.toBeNull();
    }
  });

  it.each(attacks)('are all there is: %j', async (address) => {
    expect(await readPageFile(root, address)).toBeNull();
  });

  it('never lead out of their folder', () => {
    const token = fc.constantFrom(
      '/',
      '..',
      '.',
      '%2e',
      '%2f',
      '%5c',
      '\\',
      '%00',
      ':',
      'a',
      'main',
      '.js',
      '.json',
      '%',
    );
    fc.assert(
      fc.property(fc.array(token, { maxLength: 12 }), (tokens) => {
        const place = pagePath(root, `/${tokens.join('')}`);
        // A file may be called "..a.js"; a step up is the whole of a name.
        expect(place === null || relative(root, place.path).split(sep)[0] !== '..').toBe(true);
      }),
      { numRuns: 20_000 },
    );
  });
});
