import type { Page } from '@playwright/test';
import { expect, test } from './fixture';

/** Collects what the menu tells the page. */
const listen = (page: Page): Promise<void> =>
  page.evaluate(() => {
    const heard: string[] = [];
    Reflect.set(window, 'heard', heard);
    window.desk.onMenuCommand((command) => heard.push(command));
  });
const heard = (page: Page): Promise<string[]> => page.evaluate(() => Reflect.get(window, 'heard'));

test('a click in the menu reaches the page', { tag: '@main-process' }, async ({ sharedDesk: desk }) => {
  await listen(desk.page);
  await desk.evaluateInMain?.(({ Menu }) => {
    for (const id of ['save', 'undo', 'about']) Menu.getApplicationMenu()?.getMenuItemById(id)?.click();
  });
  await expect.poll(() => heard(desk.page)).toEqual(['save', 'undo', 'about']);
});

test('its keys reach the page', { tag: '@stand-in' }, async ({ sharedDesk: desk }) => {
  await listen(desk.page);
  await desk.page.evaluate(() => {
    document.body.tabIndex = -1;
    document.body.focus();
    // The page may claim these keys for itself; here the menu is under test.
    window.addEventListener('keydown', (event) => event.stopImmediatePropagation(), { capture: true });
  });
  await desk.page.keyboard.press('ControlOrMeta+s');
  await desk.page.keyboard.press('ControlOrMeta+Shift+s');
  await expect.poll(() => heard(desk.page)).toEqual(['save', 'save-as']);
});

test('a listener that was taken away hears no more', { tag: '@main-process' }, async ({ sharedDesk: desk }) => {
  await desk.page.evaluate(() => window.desk.onMenuCommand(() => document.body.setAttribute('data-late', ''))());
  await listen(desk.page);
  await desk.evaluateInMain?.(({ Menu }) => Menu.getApplicationMenu()?.getMenuItemById('save')?.click());
  await expect.poll(() => heard(desk.page)).toEqual(['save']);
  expect(await desk.page.evaluate(() => document.body.hasAttribute('data-late'))).toBe(false);
});
