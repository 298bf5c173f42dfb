import type { MenuItemConstructorOptions } from 'electron';
import { describe, expect, it, vi } from 'vitest';
import { menuTemplate } from '../../../main/electron/menu';
import { keyCommands } from '../../../renderer/views/keys';

// The package itself would look for its program, and fetch it.
vi.mock('electron', () => ({ Menu: {} }));

const itemsOf = (template: readonly MenuItemConstructorOptions[]): MenuItemConstructorOptions[] =>
  template.flatMap((item) => [item, ...(Array.isArray(item.submenu) ? itemsOf(item.submenu) : [])]);

const platforms = ['linux', 'win32', 'darwin'] as const;

describe('the menu', () => {
  it.each(platforms)('on %s has each command once and sends it', (platform) => {
    const sent: string[] = [];
    const items = itemsOf(menuTemplate(platform, (command) => sent.push(command)));
    const own = items.filter(({ id }) => id !== undefined);
    for (const item of own) item.click?.({} as never, undefined, {} as never);
    expect(sent).toEqual(own.map(({ id }) => id));
    expect([...sent].sort()).toEqual(
      ['about', 'duplicate-formulation', 'new', 'open', 'redo', 'save', 'save-as', 'shortcuts', 'undo'].sort(),
    );
  });

  it.each(platforms)('on %s gives no key twice and takes no plain letter', (platform) => {
    const keys = itemsOf(menuTemplate(platform, () => undefined)).flatMap(({ accelerator }) =>
      accelerator === undefined ? [] : [accelerator],
    );
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys.filter((key) => !/^(CmdOrCtrl|Cmd|Ctrl)\+|^F\d+$/.test(key))).toEqual([]);
  });

  it.each([
    ['linux', ['&File', '&Edit', '&View', '&Help']],
    ['win32', ['&File', '&Edit', '&View', '&Help']],
    ['darwin', ['Sunder', '&File', '&Edit', '&View', 'windowMenu', '&Help']],
  ] as const)('on %s has its menus in order', (platform, expected) => {
    expect(menuTemplate(platform, () => undefined).map(({ label, role }) => label ?? role)).toEqual(expected);
  });

  it('is left by Quit in the first menu of its platform', () => {
    for (const platform of platforms) {
      const [first] = menuTemplate(platform, () => undefined);
      const roles = itemsOf([first ?? {}]).map(({ role }) => role);
      expect(roles).toContain('quit');
    }
  });

  it('has the keys that the list in the window tells', () => {
    const listed = new Set(keyCommands.flatMap(({ keys }) => keys.split(' or ')));
    const inMenu = itemsOf(menuTemplate('linux', () => undefined)).flatMap(({ id, accelerator }) =>
      accelerator === undefined || id === 'shortcuts' ? [] : [accelerator.replace('CmdOrCtrl', 'Ctrl')],
    );
    expect(inMenu.length).toBeGreaterThan(5);
    expect(inMenu.filter((key) => !listed.has(key))).toEqual([]);
  });
});
