/**
 * What the stand-in does not know has to fail loudly: a silent `undefined` would let a test pass for no reason.
 */

/** Asked for by `await`, by printing and by `JSON.stringify`: their absence says nothing about Electron. */
const ASKED_BY_THE_LANGUAGE = new Set(['then', 'toJSON', 'inspect', 'constructor', 'prototype', 'nodeType']);

/**
 * The object itself; every name it lacks throws.
 * @template {object} T
 * @param {string} name how the object is called in Electron
 * @param {T} target
 * @returns {T}
 */
export function modelled(name, target) {
  return new Proxy(target, {
    get(object, key) {
      if (typeof key === 'string' && !(key in object) && !ASKED_BY_THE_LANGUAGE.has(key)) {
        throw new Error(`The stand-in for Electron does not model ${name}.${key}`);
      }
      // Getters run on the object itself: private members are not reached through a proxy.
      return Reflect.get(object, key);
    },
  });
}

/**
 * Options that would change what a window is must not be passed over.
 * @param {string} name
 * @param {object} options
 * @param {readonly string[]} known
 */
export function onlyKnown(name, options, known) {
  const strange = Object.keys(options).filter((key) => !known.includes(key));
  if (strange.length > 0) throw new Error(`The stand-in for Electron does not model ${name}: ${strange.join(', ')}`);
}
