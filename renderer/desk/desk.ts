import type { Desk } from '../../main/bridge/contract';
import { createLoopbackDesk } from './loopbackDesk';

/** Where Electron's preload script puts its desk; in a browser window we put ours there. */
type Place = { readonly desk?: Desk };

/** The way to the host, whichever host it is. */
export function theDesk(): Desk {
  const found = (window as Place).desk;
  if (found !== undefined) return found;
  const made = Object.freeze(createLoopbackDesk());
  Object.defineProperty(window, 'desk', { value: made, enumerable: true });
  return made;
}
