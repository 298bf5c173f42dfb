export interface Heartbeat {
  /** How many pages are there now. */
  readonly note: (pages: number) => void;
  readonly stop: () => void;
}

/** Calls `onGone` once no page has been there for `linger_ms`, after one was: a reload is no farewell. */
export function createHeartbeat(linger_ms: number, onGone: () => void): Heartbeat {
  let lingering: ReturnType<typeof setTimeout> | null = null;
  let wasHere = false;
  const stop = (): void => {
    if (lingering !== null) clearTimeout(lingering);
    lingering = null;
  };
  return {
    note: (pages) => {
      stop();
      if (pages > 0) wasHere = true;
      else if (wasHere) {
        lingering = setTimeout(() => {
          lingering = null;
          wasHere = false;
          onGone();
        }, linger_ms);
      }
    },
    stop,
  };
}
