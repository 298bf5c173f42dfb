// `ipcMain` of the stand-in: the handlers, and how a call of the page reaches them.
import { EventEmitter } from 'node:events';
import { modelled } from './notModelled.mjs';

class IpcMain extends EventEmitter {
  /** Under the name that Electron itself uses, so that one test can play a hostile sender on both. */
  _invokeHandlers = /** @type {Map<string, (event: object, ...args: unknown[]) => unknown>} */ (new Map());

  handle = (/** @type {string} */ channel, /** @type {(event: object, ...args: unknown[]) => unknown} */ handler) => {
    if (this._invokeHandlers.has(channel)) {
      throw new Error(`Attempted to register a second handler for '${channel}'`);
    }
    if (typeof handler !== 'function')
      throw new TypeError(`Expected handler to be a function, but found ${typeof handler}`);
    this._invokeHandlers.set(channel, handler);
  };
  removeHandler = (/** @type {string} */ channel) => {
    this._invokeHandlers.delete(channel);
  };
}

const own = new IpcMain();
export const ipcMain = modelled('ipcMain', own);

/**
 * A rejection reaches the page as Electron sends it: a new Error with the text only.
 * @param {object} event
 * @param {string} channel
 * @param {unknown[]} args
 */
export async function invoke(event, channel, args) {
  const handler = own._invokeHandlers.get(channel);
  try {
    if (handler === undefined) throw new Error(`No handler registered for '${channel}'`);
    return { value: structuredClone(await handler(event, ...structuredClone(args))) };
  } catch (error) {
    return { error: `Error invoking remote method '${channel}': ${error}` };
  }
}

/** @param {object} event @param {string} channel @param {unknown[]} args */
export const receive = (event, channel, args) => own.emit(channel, event, ...structuredClone(args));
