import { Menu, type MenuItemConstructorOptions } from 'electron';
import type { MenuCommand } from '../bridge/contract';

type Item = MenuItemConstructorOptions;
const SEPARATOR: Item = { type: 'separator' };

/** The menu bar: each of our own items sends its command to the page, which knows whether it applies. */
export function menuTemplate(platform: NodeJS.Platform, send: (command: MenuCommand) => void): Item[] {
  const mac = platform === 'darwin';
  const item = (label: string, command: MenuCommand, accelerator?: string): Item => ({
    id: command,
    label,
    click: () => send(command),
    ...(accelerator === undefined ? {} : { accelerator }),
  });
  const about = item('About Sunder', 'about');
  const program: Item = {
    label: 'Sunder',
    submenu: [
      about,
      SEPARATOR,
      { role: 'hide' },
      { role: 'hideOthers' },
      { role: 'unhide' },
      SEPARATOR,
      { role: 'quit' },
    ],
  };
  const file: Item = {
    label: '&File',
    submenu: [
      item('&New', 'new', 'CmdOrCtrl+N'),
      item('&Open…', 'open', 'CmdOrCtrl+O'),
      SEPARATOR,
      item('&Save', 'save', 'CmdOrCtrl+S'),
      item('Save &As…', 'save-as', 'CmdOrCtrl+Shift+S'),
      SEPARATOR,
      mac ? { role: 'close' } : { role: 'quit' },
    ],
  };
  const edit: Item = {
    label: '&Edit',
    submenu: [
      item('&Undo', 'undo', 'CmdOrCtrl+Z'),
      item('&Redo', 'redo', mac ? 'Cmd+Shift+Z' : 'Ctrl+Y'),
      SEPARATOR,
      { role: 'cut' },
      { role: 'copy' },
      { role: 'paste' },
      { role: 'selectAll' },
      SEPARATOR,
      item('&Duplicate Formulation', 'duplicate-formulation', 'CmdOrCtrl+D'),
    ],
  };
  const view: Item = {
    label: '&View',
    submenu: [{ role: 'zoomIn' }, { role: 'zoomOut' }, { role: 'resetZoom' }, SEPARATOR, { role: 'togglefullscreen' }],
  };
  const help: Item = {
    role: 'help',
    label: '&Help',
    submenu: [item('&Keyboard Shortcuts', 'shortcuts', 'CmdOrCtrl+/'), ...(mac ? [] : [about])],
  };
  return [...(mac ? [program] : []), file, edit, view, ...(mac ? [{ role: 'windowMenu' } as const] : []), help];
}

export function setMenu(send: (command: MenuCommand) => void): void {
  Menu.setApplicationMenu(Menu.buildFromTemplate(menuTemplate(process.platform, send)));
}
