import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { type DeskUnderTest, expect, test } from './fixture';

/** Saves the example under a new name, as this host does it; null when the user cancels. */
async function saveExample(desk: DeskUnderTest, path: string | null) {
  if (desk.project !== 'loopback') await desk.answerDialog(path);
  return desk.page.evaluate(async () => {
    const example = await window.desk.exampleScenario();
    return example.ok ? window.desk.saveScenarioAs(example.value.scenario, 'Trial', false) : example;
  });
}

test('a scenario saved, opened after a new start and saved again is the same to the byte', async ({ desk }) => {
  const chosen = join(desk.documentsFolder, 'Trial.sunder.json');
  const saved = await saveExample(desk, chosen);
  expect(saved).toMatchObject({ ok: true, value: { displayName: expect.stringContaining('Trial') } });
  const [name, ...others] = readdirSync(desk.documentsFolder);
  expect(others).toEqual([]);
  const path = join(desk.documentsFolder, name ?? '');
  const first = readFileSync(path);
  expect(first.length).toBeGreaterThan(100);

  await desk.reopen();
  if (desk.project !== 'loopback') await desk.answerDialog(path);
  const again = await desk.page.evaluate(async () => {
    const names = await window.desk.documentNames();
    const opened = await window.desk.openScenario(names.ok ? (names.value[0] ?? null) : null);
    if (!opened.ok || opened.value === 'cancelled' || opened.value.ticket === null) return opened;
    return window.desk.saveScenario(opened.value.ticket, opened.value.scenario);
  });
  expect(again).toEqual({ ok: true, value: 'saved' });
  expect(readFileSync(path).equals(first)).toBe(true);
});

test('cancelling leaves no file', { tag: '@main-process' }, async ({ desk }) => {
  expect(await saveExample(desk, null)).toEqual({ ok: true, value: 'cancelled' });
  expect(readdirSync(desk.documentsFolder)).toEqual([]);
});

test('a saved file is among the recent ones after a new start, and opens', async ({ desk }) => {
  await saveExample(desk, join(desk.documentsFolder, 'Trial.sunder.json'));
  await desk.reopen();
  const opened = await desk.page.evaluate(async () => {
    const recent = await window.desk.recentFiles();
    const [first] = recent.ok ? recent.value : [];
    return first === undefined ? recent : window.desk.openRecent(first.ticket);
  });
  expect(opened).toMatchObject({ ok: true, value: { displayName: expect.stringContaining('Trial') } });
});

test('a broken file comes back as a problem in words, and is left alone', { tag: '@main-process' }, async ({
  desk,
}) => {
  const path = join(desk.documentsFolder, 'Broken.sunder.json');
  writeFileSync(path, '{ "format": ');
  await desk.answerDialog(path);
  const opened = await desk.page.evaluate(() => window.desk.openScenario(null));
  expect(opened).toMatchObject({ ok: false, problems: [{ message: expect.stringMatching(/\w/) }] });
  expect(readFileSync(path, 'utf8')).toBe('{ "format": ');
});

test('what was saved outlives a power cut', async ({ desk }) => {
  expect(await saveExample(desk, join(desk.documentsFolder, 'Trial.sunder.json'))).toMatchObject({ ok: true });
  const [name] = readdirSync(desk.documentsFolder);
  const saved = readFileSync(join(desk.documentsFolder, name ?? ''));
  await desk.kill();
  await desk.reopen();
  expect(readdirSync(desk.documentsFolder)).toEqual([name]);
  expect(readFileSync(join(desk.documentsFolder, name ?? '')).equals(saved)).toBe(true);
});

test('a file named at the start is shown in place of the example', async ({ desk }) => {
  const path = join(desk.documentsFolder, 'From the start.sunder.json');
  const text = await desk.page.evaluate(async () => {
    const example = await window.desk.exampleScenario();
    return example.ok ? JSON.stringify({ ...example.value.scenario, title: 'Named at the start' }) : '';
  });
  writeFileSync(path, text);
  await desk.reopen({ args: [path] });
  await expect.poll(() => desk.page.title()).toBe('From the start — Sunder');
});

test('a ticket that the page made up opens and overwrites nothing', async ({ desk }) => {
  const target = join(desk.documentsFolder, 'Other.sunder.json');
  const answers = await desk.page.evaluate(async (path) => {
    const example = await window.desk.exampleScenario();
    if (!example.ok) return [];
    const ticket = path as Parameters<typeof window.desk.openRecent>[0];
    return [await window.desk.openRecent(ticket), await window.desk.saveScenario(ticket, example.value.scenario)];
  }, target);
  expect(answers.map(({ ok }) => ok)).toEqual([false, false]);
  expect(existsSync(target)).toBe(false);
});

test('a dropped file opens at its place', { tag: '@stand-in' }, async ({ desk }) => {
  const path = join(desk.documentsFolder, 'Trial.sunder.json');
  await saveExample(desk, path);
  const opened = await desk.page.evaluate(async (place) => {
    const name = 'Trial.sunder.json';
    window.dispatchEvent(new CustomEvent('stand-in:file-place', { detail: { name, path: place } }));
    return [
      await window.desk.openDropped(new File([''], name)),
      await window.desk.openDropped(new File([''], 'unknown')),
    ];
  }, path);
  expect(opened.map(({ ok }) => ok)).toEqual([true, false]);
});
