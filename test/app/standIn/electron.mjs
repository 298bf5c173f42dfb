/**
 * Stands for the `electron` module, so that the app's own built main process and preload script run over a real
 * Chromium where the Electron binary cannot be had. It follows what electronjs.org/docs says of each member.
 *
 * It cannot show: the separation of worlds, the sandbox and the processes; native menus, dialogs and window frames;
 * real permission prompts; the scheme `app:` itself (see addresses.mjs); the order of `did-*` events; Windows and macOS.
 */
import { app } from './app.mjs';
import { BrowserWindow } from './browserWindow.mjs';
import { clipboard, crashReporter, nativeImage, nativeTheme, net, powerMonitor, screen, shell } from './desktop.mjs';
import { dialog } from './dialog.mjs';
import { ipcMain } from './ipcMain.mjs';
import { Menu, MenuItem } from './menu.mjs';
import { modelled } from './notModelled.mjs';
import { protocol, session } from './protocol.mjs';
import { webContents } from './webContents.mjs';

const known = {
  ...{ app, BrowserWindow, clipboard, crashReporter, dialog, ipcMain, Menu, MenuItem, nativeImage, nativeTheme, net },
  ...{ powerMonitor, protocol, screen, session, shell, webContents },
};

export default modelled('electron', known);
export {
  app,
  BrowserWindow,
  clipboard,
  crashReporter,
  dialog,
  ipcMain,
  Menu,
  MenuItem,
  nativeImage,
  nativeTheme,
  net,
  powerMonitor,
  protocol,
  screen,
  session,
  shell,
  webContents,
};
