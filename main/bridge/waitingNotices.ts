type Listener<P extends readonly unknown[]> = (...payload: P) => void;

export interface WaitingNotices<P extends readonly unknown[]> {
  readonly tell: (payload: P) => void;
  /** Returns what stops the listening. */
  readonly listen: (listener: Listener<P>) => () => void;
}

/** Passes notices on; those told while nobody listens wait for the first listener. */
export function createWaitingNotices<P extends readonly unknown[]>(): WaitingNotices<P> {
  const listeners = new Set<Listener<P>>();
  const waiting: P[] = [];
  return {
    tell: (payload) => {
      if (listeners.size === 0) waiting.push(payload);
      for (const listener of [...listeners]) listener(...payload);
    },
    listen: (listener) => {
      // One entry for each call, so that stopping one of two equal listeners leaves the other.
      const own: Listener<P> = (...payload) => listener(...payload);
      listeners.add(own);
      // Not at once: whoever listens has first to hold the function that stops it.
      for (const payload of waiting.splice(0)) queueMicrotask(() => own(...payload));
      return () => {
        listeners.delete(own);
      };
    },
  };
}
