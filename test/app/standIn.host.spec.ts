import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from './fixture';
import { environment, type Folders, startProgram } from './hosts/host';

/** The stand-in is only worth something where it refuses what Electron would refuse, or what it cannot show. */
async function outcomeOf(folders: Folders, main: string) {
  writeFileSync(join(folders.all, 'package.json'), '{ "name": "trial", "version": "1.0.0", "type": "module" }\n');
  const path = join(folders.all, 'main.js');
  writeFileSync(path, main);
  const env = environment(folders, { env: { SUNDER_STAND_IN_TIMEOUT_MS: '1500' } });
  const program = startProgram('test/app/standIn/launch.mjs', [path], env);
  const code = await program.ended;
  return { code, said: program.said() };
}

const opening = (preferences: string): string =>
  `import { app, BrowserWindow } from 'electron';
   void app.whenReady().then(() => new BrowserWindow({ webPreferences: ${preferences} }));`;

test.describe('the stand-in for Electron', { tag: '@stand-in' }, () => {
  test('ends a main module that waits for "ready" at its top level', async ({ folders }) => {
    const { code, said } = await outcomeOf(folders, `import { app } from 'electron';\nawait app.whenReady();\n`);
    expect(code).toBe(70);
    expect(said).toContain('asked for no window');
  });

  for (const preferences of [
    '{}',
    '{ contextIsolation: false, sandbox: true, nodeIntegration: false }',
    '{ contextIsolation: true, sandbox: false, nodeIntegration: false }',
    '{ contextIsolation: true, sandbox: true, nodeIntegration: true }',
    '{ contextIsolation: true, sandbox: true, nodeIntegration: false, webSecurity: false }',
    '{ contextIsolation: true, sandbox: true, nodeIntegration: false, webviewTag: true }',
  ]) {
    test(`opens no window with ${preferences}`, async ({ folders }) => {
      const { code, said } = await outcomeOf(folders, opening(preferences));
      expect(code).not.toBe(0);
      expect(said).toMatch(/webPreferences\.\w+ has to be/);
    });
  }

  test('names what it does not model', async ({ folders }) => {
    const { code, said } = await outcomeOf(
      folders,
      `import { app } from 'electron';\nvoid app.whenReady().then(() => app.getGPUFeatureStatus());\n`,
    );
    expect(code).not.toBe(0);
    expect(said).toContain('does not model app.getGPUFeatureStatus');
  });

  test('knows no scheme that was registered too late', async ({ folders }) => {
    const { code, said } = await outcomeOf(
      folders,
      `import { app, protocol } from 'electron';
       void app.whenReady().then(() => protocol.registerSchemesAsPrivileged([]));\n`,
    );
    expect(code).not.toBe(0);
    expect(said).toContain('before app is ready');
  });
});
