// `Menu` and `MenuItem` of the stand-in: nothing is drawn; items can be clicked, and keys of the page reach them.
import { EventEmitter } from 'node:events';
import { app } from './app.mjs';
import { onlyKnown } from './notModelled.mjs';
import { focusedWindow } from './windowList.mjs';

/** @typedef {{ key: string, code: string, ctrlKey: boolean, shiftKey: boolean, altKey: boolean, metaKey: boolean }} Key */

const KNOWN = [
  ...['id', 'label', 'sublabel', 'toolTip', 'type', 'role', 'accelerator', 'registerAccelerator'],
  ...['click', 'enabled', 'visible', 'checked', 'submenu', 'icon', 'acceleratorWorksWhenHidden'],
];
/** Roles whose work is Chromium's or the desktop's own: clicking them here would prove nothing. */
const ROLES_WITH_WORK = new Map([
  ['quit', () => app.quit()],
  ['close', () => focusedWindow()?.close()],
]);

export class MenuItem {
  /** @param {Record<string, unknown>} options */
  constructor(options) {
    onlyKnown('MenuItem', options, KNOWN);
    const { id, label, type, role, accelerator, submenu } = options;
    this.id = /** @type {string | undefined} */ (id);
    this.role = /** @type {string | undefined} */ (role);
    this.label = String(label ?? role ?? '');
    this.type = String(type ?? (submenu === undefined ? 'normal' : 'submenu'));
    this.accelerator = /** @type {string | undefined} */ (accelerator);
    this.registerAccelerator = options.registerAccelerator !== false;
    this.enabled = options.enabled !== false;
    this.visible = options.visible !== false;
    this.checked = options.checked === true;
    this.submenu = Array.isArray(submenu) ? buildFromTemplate(submenu) : /** @type {Menu | undefined} */ (submenu);
    const does = /** @type {((item: MenuItem, window: object | undefined, event: object) => void) | undefined} */ (
      options.click
    );
    this.click = (event = {}, window = focusedWindow() ?? undefined) => {
      if (!this.enabled) return;
      if (this.type === 'checkbox') this.checked = !this.checked;
      if (does !== undefined) {
        does(this, window, event);
        return;
      }
      const work = ROLES_WITH_WORK.get(this.role?.toLowerCase() ?? '');
      if (work === undefined) throw new Error(`The stand-in for Electron cannot click "${this.label}"`);
      work();
    };
  }
}

export class Menu extends EventEmitter {
  /** @type {MenuItem[]} */
  items = [];
  append = (/** @type {MenuItem} */ item) => {
    this.items.push(item);
  };
  /** @param {string} id @returns {MenuItem | null} */
  getMenuItemById = (id) => everyItem(this).find((item) => item.id === id) ?? null;

  static buildFromTemplate = (/** @type {readonly object[]} */ template) => buildFromTemplate(template);
  static setApplicationMenu = (/** @type {Menu | null} */ menu) => {
    current = menu;
  };
  static getApplicationMenu = () => current;
}

/** @type {Menu | null} */
let current = null;

/** @param {readonly object[]} template */
function buildFromTemplate(template) {
  const menu = new Menu();
  for (const item of template) {
    menu.append(item instanceof MenuItem ? item : new MenuItem(/** @type {Record<string, unknown>} */ (item)));
  }
  return menu;
}

/** @param {Menu} menu @returns {MenuItem[]} */
const everyItem = (menu) =>
  menu.items.flatMap((item) => [item, ...(item.submenu === undefined ? [] : everyItem(item.submenu))]);

const isMac = process.platform === 'darwin';
const NAMES = new Map(
  Object.entries({
    plus: '+',
    space: ' ',
    return: 'enter',
    esc: 'escape',
    up: 'arrowup',
    down: 'arrowdown',
    left: 'arrowleft',
    right: 'arrowright',
  }),
);

/** @param {string} accelerator @param {Key} key */
export function fits(accelerator, key) {
  const words = accelerator.toLowerCase().split('+');
  const held = { ctrlKey: false, shiftKey: false, altKey: false, metaKey: false };
  let wanted = '';
  for (const word of words) {
    if (word === 'commandorcontrol' || word === 'cmdorctrl') held[isMac ? 'metaKey' : 'ctrlKey'] = true;
    else if (word === 'ctrl' || word === 'control') held.ctrlKey = true;
    else if (word === 'cmd' || word === 'command' || word === 'super' || word === 'meta') held.metaKey = true;
    else if (word === 'alt' || word === 'option') held.altKey = true;
    else if (word === 'shift') held.shiftKey = true;
    else wanted = NAMES.get(word) ?? word;
  }
  const typed = key.key.toLowerCase();
  // "+" and "?" need Shift on most keyboards: there the sign, not the key, is what was meant.
  const isSign = typed.length === 1 && !/[a-z0-9]/.test(typed);
  return (
    typed === wanted &&
    key.ctrlKey === held.ctrlKey &&
    key.altKey === held.altKey &&
    key.metaKey === held.metaKey &&
    (isSign || key.shiftKey === held.shiftKey)
  );
}

/** A key that the page did not claim. @param {Key} key @param {object} window */
export function pressed(key, window) {
  if (current === null) return;
  const item = everyItem(current).find(
    ({ accelerator, registerAccelerator, enabled, visible }) =>
      accelerator !== undefined && registerAccelerator && enabled && visible && fits(accelerator, key),
  );
  item?.click({ triggeredByAccelerator: true }, /** @type {never} */ (window));
}
