import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { answer } from '../../../main/bridge/answer';
import type { Handlers } from '../../../main/bridge/contract';
import { createHandlers } from '../../../main/bridge/handlers';
import { openPathHandler } from '../../../main/bridge/openPathHandler';
import { documentsFolder } from '../../../main/files/documentsFolder';
import { createRecentFiles } from '../../../main/files/recentFiles';
import { createScenarioFiles } from '../../../main/files/scenarioFiles';
import { createTickets } from '../../../main/files/tickets';
import { demo } from './scenario';

let folder = '';
let handlers: Handlers;
let openPath: ReturnType<typeof openPathHandler>;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'sunder-unit-'));
  const files = createScenarioFiles(createTickets(), createRecentFiles(join(folder, 'data')));
  handlers = createHandlers({
    facts: { kind: 'loopback', appVersion: '1.2.3', documentsFolderName: 'Documents' },
    places: documentsFolder(join(folder, 'documents')),
    files,
    window: { noteUnsaved: () => undefined, close: () => undefined },
  });
  openPath = openPathHandler(files);
});
afterAll(() => rm(folder, { recursive: true, force: true }));

describe('handlers', () => {
  it('give the example, which has no file yet', async () => {
    expect(await handlers['scenario:example']()).toMatchObject({ ok: true, value: { ticket: null, scenario: demo } });
  });

  it('save under a name, refuse to replace it unasked, list it and open it', async () => {
    expect(await handlers['scenario:save-as'](demo, 'One', false)).toMatchObject({ ok: true });
    expect(await handlers['scenario:save-as'](demo, 'One', false)).toEqual({ ok: true, value: 'exists' });
    const changed = { ...demo, title: 'Changed' };
    expect(await handlers['scenario:save-as'](changed, 'One', true)).toMatchObject({ ok: true });
    expect(await handlers['documents:list']()).toEqual({ ok: true, value: ['One'] });
    expect(await handlers['scenario:open']('One')).toMatchObject({ ok: true, value: { scenario: changed } });
  });

  it.each(['../escaped', '/etc/passwd', 'a/b', '..', 'C:\\x', ''])('leave the folder for no name: %j', async (name) => {
    expect(await handlers['scenario:save-as'](demo, name, true)).toMatchObject({ problems: [{ code: 'bad-name' }] });
    expect(await handlers['scenario:open'](name)).toMatchObject({ problems: [{ code: 'bad-name' }] });
  });

  it('read no file by path that is not a scenario', async () => {
    const open = openPath['scenario:open-path'];
    for (const path of ['/etc/passwd', '', null, 7, {}, '/etc/hostname\0.sunder.json']) {
      expect(await open(path).catch(() => ({ ok: false }))).toMatchObject({ ok: false });
    }
  });

  it('answer anything at all, never save it, and never throw', async () => {
    const names = Object.keys(handlers) as (keyof Handlers)[];
    const odd = fc.oneof(
      fc.anything({ withNullPrototype: true, withTypedArray: true, withMap: true }),
      fc.constantFrom('__proto__', 'constructor', '../x', '', Number.NaN, Number.POSITIVE_INFINITY),
    );
    await fc.assert(
      fc.asyncProperty(fc.constantFrom(...names), fc.array(odd, { maxLength: 4 }), async (name, untrusted) => {
        const result: { readonly ok: boolean; readonly problems?: unknown } = await handlers[name](...untrusted);
        expect(result.ok || Array.isArray(result.problems)).toBe(true);
      }),
      { numRuns: 1500 },
    );
    expect(await readdir(folder)).toEqual(expect.not.arrayContaining(['x.sunder.json']));
    expect(Object.keys(Object.prototype)).toEqual([]);
  });
});

describe('answer', () => {
  it('tells the page of a fault, and not where it was', async () => {
    const write = process.stderr.write;
    const said: string[] = [];
    process.stderr.write = (text) => said.push(String(text)) > 0;
    try {
      const result = await answer('trial', () => Promise.reject(new Error('/secret/place')), []);
      expect(result).toMatchObject({ ok: false, problems: [{ code: 'host-fault' }] });
      expect(JSON.stringify(result)).not.toContain('secret');
      expect(said.join('')).toContain('/secret/place');
    } finally {
      process.stderr.write = write;
    }
  });
});
