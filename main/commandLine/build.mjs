// Builds the parts of Sunder into dist/. A part is built again only when one of its sources is newer than its stamp.
import { mkdirSync, readdirSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../../', import.meta.url));
const inRoot = (...names) => join(root, ...names);
const dist = inRoot('dist');

/** What decides about every part, besides its own rooms. */
const COMMON_SOURCES = ['package.json', 'package-lock.json', 'main/commandLine/build.mjs'];

const base = (mode) => ({
  configFile: false,
  envDir: false,
  mode,
  logLevel: 'warn',
  clearScreen: false,
});

/** A build for Node or for the preload script: `external` stays as it is, all else is taken in. */
const forNode = (input, outDir, output) => ({
  ...base('production'),
  root,
  publicDir: false,
  ssr: { noExternal: true, external: ['electron'], target: 'node' },
  build: {
    ssr: true,
    target: 'node20',
    outDir,
    emptyOutDir: false,
    minify: false,
    reportCompressedSize: false,
    rolldownOptions: { input, external: ['electron', /^node:/], output },
  },
});

const esm = { format: 'es', entryFileNames: '[name].js', chunkFileNames: 'shared-[name].js' };

const parts = {
  renderer: {
    sources: ['renderer', 'core', 'main/bridge'],
    result: 'renderer/index.html',
    settings: async () => {
      const { preact } = await import('@preact/preset-vite');
      return {
        ...base('production'),
        root: inRoot('renderer'),
        base: './',
        plugins: [preact({ devToolsEnabled: false, prefreshEnabled: false })],
        worker: { format: 'es' },
        build: {
          target: 'es2022',
          outDir: join(dist, 'renderer'),
          emptyOutDir: true,
          // Fonts and pictures stay files: the content policy then needs no data: for them.
          assetsInlineLimit: 0,
          modulePreload: { polyfill: false },
          reportCompressedSize: false,
          chunkSizeWarningLimit: 2000,
        },
      };
    },
  },
  hosts: {
    sources: ['main/electron', 'main/loopback', 'main/bridge', 'main/files', 'core', 'assets/demo'],
    result: 'main/main.js',
    settings: () =>
      forNode(
        { main: inRoot('main/electron/main.ts'), loopback: inRoot('main/loopback/main.ts') },
        join(dist, 'main'),
        esm,
      ),
  },
  preload: {
    sources: ['main/bridge'],
    result: 'main/preload.cjs',
    // A sandboxed preload script is one CommonJS file.
    settings: () =>
      forNode({ preload: inRoot('main/bridge/preload.ts') }, join(dist, 'main'), {
        format: 'cjs',
        entryFileNames: 'preload.cjs',
        codeSplitting: false,
      }),
  },
  commandLine: {
    sources: ['main/commandLine', 'core'],
    result: 'commandLine/evaluate.js',
    settings: () => forNode({ evaluate: inRoot('main/commandLine/evaluate.ts') }, join(dist, 'commandLine'), esm),
  },
};

const changed_ms = (path) => statSync(path, { throwIfNoEntry: false })?.mtimeMs ?? 0;

/** Folders count too: their time changes when a file in them is removed or renamed. */
function newestIn_ms(path) {
  const entry = statSync(path, { throwIfNoEntry: false });
  if (entry === undefined) return 0;
  if (!entry.isDirectory()) return entry.mtimeMs;
  return readdirSync(path).reduce((newest, name) => Math.max(newest, newestIn_ms(join(path, name))), entry.mtimeMs);
}

const stampOf = (name) => join(dist, `.${name}.stamp`);

const isCurrent = (name) => {
  const { sources, result } = parts[name];
  const stamp_ms = changed_ms(stampOf(name));
  if (stamp_ms === 0 || changed_ms(join(dist, result)) === 0) return false;
  return [...COMMON_SOURCES, ...sources].every((source) => newestIn_ms(inRoot(source)) <= stamp_ms);
};

/** Builds what is missing or older than its sources; returns the names of the parts that were built. */
export async function ensureBuilt(names = Object.keys(parts), { force = false, onBuild = () => undefined } = {}) {
  const wanted = names.filter((name) => force || !isCurrent(name));
  if (wanted.length === 0) return [];
  onBuild(wanted);
  const { build } = await import('vite');
  for (const name of wanted) {
    const start = new Date();
    await build(await parts[name].settings());
    mkdirSync(dirname(stampOf(name)), { recursive: true });
    writeFileSync(stampOf(name), `${start.toISOString()}\n`);
    // A source saved while the build ran has to count as newer.
    utimesSync(stampOf(name), start, start);
  }
  return wanted;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const built = await ensureBuilt(undefined, { force: process.argv.includes('--force') });
  process.stdout.write(built.length === 0 ? 'Nothing to build.\n' : `Built: ${built.join(', ')}.\n`);
}
