import { fileURLToPath } from 'node:url';
import { defineConfig } from '@playwright/test';

const root = fileURLToPath(new URL('../../', import.meta.url));

/**
 * One set of errands, three hosts. `stand-in` runs the built main process with a stand-in for Electron, `loopback` the
 * host for machines without Electron, `electron` the real one where its binary is. Which errands belong to which host
 * is said by the specs; `fixture.ts` reads the name of the project.
 */
export default defineConfig({
  testDir: '.',
  outputDir: `${root}test-results/app`,
  fullyParallel: false,
  workers: 2,
  retries: 0,
  forbidOnly: true,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  reporter: 'list',
  projects: [{ name: 'stand-in' }, { name: 'loopback' }, { name: 'electron' }],
});
