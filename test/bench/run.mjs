// `npm run bench`: builds the benchmark with the app's own bundler and runs it.
import { fileURLToPath } from 'node:url';
import { build } from 'vite';

const root = fileURLToPath(new URL('../../', import.meta.url));
await build({
  configFile: false,
  root,
  logLevel: 'warn',
  build: {
    ssr: 'test/bench/bench.ts',
    outDir: 'dist/bench',
    target: 'node20',
    emptyOutDir: true,
  },
});
await import(new URL('../../dist/bench/bench.js', import.meta.url).href);
