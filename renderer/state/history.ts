/** Undo as a list of past values: nothing is computed backwards, so undo cannot go wrong. */
export interface History<T> {
  readonly past: readonly Change<T>[];
  readonly present: T;
  readonly future: readonly Change<T>[];
  /** Edits with the same key shortly after one another are one step: typing in one field, dragging one slider. */
  readonly openStep: { readonly key: string; readonly time_ms: number } | null;
}

export interface Change<T> {
  /** What the change was, in words: `Edit salt`. */
  readonly label: string;
  /** The value on the other side of the change. */
  readonly value: T;
}

export const MAX_STEPS = 500;
const SAME_STEP_WITHIN_ms = 800;

export const startHistory = <T>(present: T): History<T> => ({ past: [], present, future: [], openStep: null });

export interface Edit<T> {
  readonly label: string;
  readonly value: T;
  /** null: always a step of its own. */
  readonly stepKey: string | null;
  readonly time_ms: number;
}

export function edited<T>(history: History<T>, { label, value, stepKey, time_ms }: Edit<T>): History<T> {
  const { openStep } = history;
  const goesOn = stepKey !== null && openStep?.key === stepKey && time_ms - openStep.time_ms < SAME_STEP_WITHIN_ms;
  return {
    past: goesOn ? history.past : [...history.past, { label, value: history.present }].slice(-MAX_STEPS),
    present: value,
    future: [],
    openStep: stepKey === null ? null : { key: stepKey, time_ms },
  };
}

export function undone<T>(history: History<T>): History<T> {
  const last = history.past.at(-1);
  if (last === undefined) return history;
  return {
    past: history.past.slice(0, -1),
    present: last.value,
    future: [{ label: last.label, value: history.present }, ...history.future],
    openStep: null,
  };
}

export function redone<T>(history: History<T>): History<T> {
  const [next, ...later] = history.future;
  if (next === undefined) return history;
  return {
    past: [...history.past, { label: next.label, value: history.present }],
    present: next.value,
    future: later,
    openStep: null,
  };
}
