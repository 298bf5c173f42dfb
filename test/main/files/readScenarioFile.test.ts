import { execFileSync } from 'node:child_process';
import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { MAX_FILE_bytes, readScenarioFile } from '../../../main/files/readScenarioFile';
import { demo, demoText } from '../bridge/scenario';

let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

async function reading(content: string | Uint8Array): Promise<unknown> {
  const path = join(folder, 'file.sunder.json');
  await writeFile(path, content);
  const result = await readScenarioFile(path);
  return result.ok ? result.value.scenario : result.problems[0]?.code;
}

describe('readScenarioFile', () => {
  it('reads a scenario, with or without a byte order mark', async () => {
    expect(await reading(demoText)).toEqual(demo);
    expect(await reading(`\uFEFF${demoText}`)).toEqual(demo);
  });

  it('refuses a file one byte too large, and reads one that just fits', async () => {
    const filling = ' '.repeat(MAX_FILE_bytes - Buffer.byteLength(demoText));
    expect(await reading(demoText + filling)).toEqual(demo);
    expect(await reading(`${demoText}${filling} `)).toBe('too-large');
  });

  it('refuses bytes that are not UTF-8', async () => {
    expect(await reading(Buffer.from(demoText.replace('White', 'Wei\u00df'), 'latin1'))).toBe('not-utf8');
  });

  it('refuses text that nests a million deep', async () => {
    expect(await reading('['.repeat(1_000_000) + ']'.repeat(1_000_000))).toBeTypeOf('string');
  });

  it('says in words why a file cannot be read', async () => {
    expect(await readScenarioFile(join(folder, 'nowhere'))).toMatchObject({ problems: [{ code: 'file-enoent' }] });
    await mkdir(join(folder, 'folder'));
    expect(await readScenarioFile(join(folder, 'folder'))).toMatchObject({ problems: [{ code: 'not-a-file' }] });
  });

  it.runIf(process.platform !== 'win32')('does not wait for a pipe', async () => {
    execFileSync('mkfifo', [join(folder, 'pipe')]);
    expect(await readScenarioFile(join(folder, 'pipe'))).toMatchObject({ problems: [{ code: 'not-a-file' }] });
  });
});
