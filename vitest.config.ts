import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    include: ['test/{core,main,renderer,house,published}/**/*.test.{ts,tsx}'],
    environment: 'node',
    setupFiles: ['test/setup.ts'],
    testTimeout: 60_000,
  },
});
