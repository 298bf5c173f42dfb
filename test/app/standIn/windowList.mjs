// The open windows, oldest first. Apart from BrowserWindow so that app, menu and dialog need not import it.

/**
 * As far as menu, app and window need one another.
 * @typedef {object} OpenWindow
 * @property {number} id
 * @property {object} webContents
 * @property {() => void} close
 */

/** @type {Set<OpenWindow>} */
export const windows = new Set();

export const allWindows = () => [...windows];

/** There is no real focus here: the window opened last has it. */
export const focusedWindow = () => allWindows().at(-1) ?? null;
