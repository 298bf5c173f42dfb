// What is put into a page before its own scripts: the preload script, in a room like that of a sandboxed preload.
import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { roomOfPreload } from './preloadRoom.mjs';

/** The page's side of `webContents.send`; a symbol, so that no key of the page's global object shows it. */
export const DELIVER = 'sunder.standIn.deliver';
/** The page's line to main; the room takes it away before the page's own scripts can see it. */
export const LINE = '__standInLine';

const versions = { ...process.versions, electron: '0.0.0-stand-in' };

/**
 * @param {string} preload path of the built script
 * @param {readonly string[]} additionalArguments
 */
export function pageScript(preload, additionalArguments) {
  if (preload.endsWith('.mjs')) throw new Error('A sandboxed preload script has to be CommonJS, not .mjs');
  createRequire(import.meta.url).resolve(preload);
  const facts = {
    deliver: DELIVER,
    line: LINE,
    versions,
    platform: process.platform,
    argv: ['app', ...additionalArguments],
  };
  const source = readFileSync(preload, 'utf8');
  return `(${roomOfPreload})(${JSON.stringify(facts)}, function (require, module, exports, process) {\n${source}\n});`;
}
