import { mkdtemp, readFile, rm, utimes, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { createRecentFiles } from '../../../main/files/recentFiles';
import { createScenarioFiles, type ScenarioFiles } from '../../../main/files/scenarioFiles';
import { createTickets } from '../../../main/files/tickets';
import { demo, demoText } from '../bridge/scenario';

let folder = '';
let path = '';
let files: ScenarioFiles;
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
  path = join(folder, 'white.sunder.json');
  await writeFile(path, demoText);
  files = createScenarioFiles(createTickets(), createRecentFiles(join(folder, 'data')));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

const opened = async () => {
  const file = await files.openAt(path);
  if (!file.ok) throw new Error('The demo does not open');
  return file.value;
};

describe('tickets', () => {
  it('are the same for the same file and say nothing of its place', async () => {
    const [one, other] = [await opened(), await opened()];
    expect(one.ticket).toBe(other.ticket);
    expect(one.ticket).toMatch(/^[0-9a-f]{32}$/);
    expect(one.displayName).toBe('white');
  });

  it.each([[undefined], [null], [''], ['../x'], [{}], [['a']], [7], ['__proto__']])(
    'that we did not give open and save nothing: %j',
    async (ticket) => {
      expect(await files.openTicket(ticket)).toMatchObject({ ok: false, problems: [{ code: 'unknown-file' }] });
      expect(await files.save(ticket, demo)).toMatchObject({ ok: false, problems: [{ code: 'unknown-file' }] });
    },
  );
});

describe('saving over a file', () => {
  it('is refused when another program changed it, and leaves its work alone', async () => {
    const { ticket } = await opened();
    const theirs = demoText.replace('White base', 'Whiter base');
    await writeFile(path, theirs);
    expect(await files.save(ticket, demo)).toMatchObject({ ok: false, problems: [{ code: 'changed-on-disk' }] });
    expect(await readFile(path, 'utf8')).toBe(theirs);
  });

  it('is done when the file was only touched', async () => {
    const { ticket } = await opened();
    await utimes(path, new Date(), new Date(Date.now() + 60_000));
    expect(await files.save(ticket, demo)).toEqual({ ok: true, value: 'saved' });
  });

  it('is done again and again, and when the file was removed meanwhile', async () => {
    const { ticket } = await opened();
    expect(await files.save(ticket, { ...demo, title: 'One' })).toEqual({ ok: true, value: 'saved' });
    expect(await files.save(ticket, { ...demo, title: 'Two' })).toEqual({ ok: true, value: 'saved' });
    await rm(path);
    expect(await files.save(ticket, demo)).toEqual({ ok: true, value: 'saved' });
    expect(await opened()).toMatchObject({ scenario: demo });
  });

  it('says in words when the folder is gone', async () => {
    const result = await files.saveAt(join(folder, 'gone', 'x.sunder.json'), demo);
    expect(result).toMatchObject({ ok: false, problems: [{ code: 'file-enoent' }] });
  });
});

describe('recent files', () => {
  it('are kept for the next start, newest first, without those that are gone', async () => {
    const second = join(folder, 'second.sunder.json');
    await files.openAt(path);
    await files.saveAt(second, demo);
    const next = createScenarioFiles(createTickets(), createRecentFiles(join(folder, 'data')));
    expect((await next.recent()).map(({ displayName }) => displayName)).toEqual(['second', 'white']);
    await rm(second);
    expect((await next.recent()).map(({ displayName }) => displayName)).toEqual(['white']);
  });

  it.each(['', '{', '{"a":1}', '[1,"relative/path",null]'])('survive a spoilt list: %j', async (text) => {
    await files.openAt(path);
    await writeFile(join(folder, 'data', 'recent.json'), text);
    expect(await files.recent()).toEqual([]);
    await files.openAt(path);
    expect(await files.recent()).toHaveLength(1);
  });
});
