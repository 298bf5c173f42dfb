// Answers `electron` with the stand-in; every other import goes its usual way.
const standIn = new URL('./electron.mjs', import.meta.url).href;

/** @type {import('node:module').ResolveHook} */
export const resolve = (specifier, context, next) =>
  specifier === 'electron' || specifier === 'electron/main' || specifier === 'electron/common'
    ? { url: standIn, shortCircuit: true }
    : next(specifier, context);
