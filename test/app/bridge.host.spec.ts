import type { Desk } from '../../main/bridge/contract';
import { expect, test } from './fixture';

/** Typed, so that a request added to the contract has to be added here. */
const members = {
  hostFacts: true,
  exampleScenario: true,
  openScenario: true,
  openRecent: true,
  openDropped: true,
  saveScenario: true,
  saveScenarioAs: true,
  recentFiles: true,
  documentNames: true,
  noteUnsaved: true,
  closeWindow: true,
  onMenuCommand: true,
  onScenarioOpened: true,
  onWindowClosing: true,
} satisfies Record<keyof Desk, true>;

test('the page finds the bridge of the contract, complete', async ({ sharedDesk: desk }) => {
  const [names, kinds] = await desk.page.evaluate(() => [
    Object.keys(window.desk).sort(),
    [...new Set(Object.values(window.desk).map((member) => typeof member))],
  ]);
  expect(names).toEqual(Object.keys(members).sort());
  expect(kinds).toEqual(['function']);
  const facts = await desk.page.evaluate(() => window.desk.hostFacts());
  expect(facts).toMatchObject({ ok: true, value: { kind: desk.project === 'loopback' ? 'loopback' : 'electron' } });
});

test('the bridge cannot be changed or replaced', async ({ sharedDesk: desk }) => {
  const changed = await desk.page.evaluate(() => {
    const before = window.desk;
    const tried = [
      Reflect.set(window.desk, 'saveScenario', () => undefined),
      Reflect.set(window.desk, 'more', 1),
      Reflect.deleteProperty(window.desk, 'hostFacts'),
      Reflect.set(window, 'desk', {}),
      Reflect.deleteProperty(window, 'desk'),
    ];
    return { tried, same: window.desk === before };
  });
  expect(changed).toEqual({ tried: [false, false, false, false, false], same: true });
});

test('the page has no Node and no channel of its own', async ({ sharedDesk: desk }) => {
  const seen = await desk.page.evaluate(() =>
    ['require', 'process', 'module', 'Buffer', 'global', 'ipcRenderer', 'electron', '__dirname'].filter(
      (name) => name in globalThis,
    ),
  );
  expect(seen).toEqual([]);
});
