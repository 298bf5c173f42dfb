import { fileURLToPath } from 'node:url';
import { defineConfig } from '@playwright/test';

const root = fileURLToPath(new URL('../../', import.meta.url));

/**
 * One set of errands, three hosts. `stand-in` runs the built main process with a stand-in for Electron, `loopback` the
 * host for machines without Electron, `electron` the real one where its binary is. An errand without a tag is run
 * on all three; `@main-process` needs Electron or its stand-in, `@stand-in` and `@loopback` are for that host alone.
 */
export default defineConfig({
  testDir: '.',
  outputDir: `${root}test-results/app`,
  fullyParallel: false,
  workers: 2,
  retries: 0,
  forbidOnly: true,
  timeout: 180_000,
  expect: { timeout: 20_000 },
  reporter: 'list',
  projects: [
    { name: 'stand-in', grepInvert: /@loopback/ },
    { name: 'loopback', grepInvert: /@main-process|@stand-in/ },
    { name: 'electron', grepInvert: /@loopback|@stand-in/ },
  ],
});
