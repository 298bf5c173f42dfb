import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { edited, type History, MAX_STEPS, redone, startHistory, undone } from '../../../renderer/state/history';

const step = (history: History<number>, value: number, time_ms = 0, stepKey: string | null = null) =>
  edited(history, { label: `to ${value}`, value, stepKey, time_ms });

describe('history', () => {
  it('undoing everything gives the first value, redoing everything the last', () => {
    fc.assert(
      fc.property(fc.array(fc.integer(), { maxLength: 60 }), (values) => {
        let history = startHistory(-1);
        for (const value of values) history = step(history, value);
        let back = history;
        for (const _ of values) back = undone(back);
        expect(back.present).toBe(-1);
        expect(back.past).toEqual([]);
        let forth = back;
        for (const _ of values) forth = redone(forth);
        expect(forth.present).toBe(history.present);
        expect(forth.past).toEqual(history.past);
      }),
    );
  });

  it('any mixture of edits, undo and redo behaves like a list with a finger on it', () => {
    const command = fc.oneof(fc.integer(), fc.constant('undo' as const), fc.constant('redo' as const));
    fc.assert(
      fc.property(fc.array(command, { maxLength: 80 }), (commands) => {
        let history = startHistory(0);
        let list = [0];
        let finger = 0;
        for (const one of commands) {
          if (one === 'undo') {
            history = undone(history);
            finger = Math.max(0, finger - 1);
          } else if (one === 'redo') {
            history = redone(history);
            finger = Math.min(list.length - 1, finger + 1);
          } else {
            history = step(history, one);
            list = [...list.slice(0, finger + 1), one];
            finger += 1;
          }
          expect(history.present).toBe(list[finger]);
        }
      }),
      { numRuns: 1000 },
    );
  });

  it('takes quick edits of one field as one step, and those of another as the next', () => {
    let history = startHistory(0);
    history = step(history, 1, 0, 'zeta');
    history = step(history, 2, 500, 'zeta');
    history = step(history, 3, 900, 'salt');
    history = step(history, 4, 3000, 'salt');
    expect(history.past.map(({ value }) => value)).toEqual([0, 2, 3]);
  });

  it('starts a new step after an undo, however quick', () => {
    let history = step(startHistory(0), 1, 0, 'zeta');
    history = undone(history);
    history = step(history, 2, 1, 'zeta');
    expect(undone(history).present).toBe(0);
  });

  it('forgets the oldest steps beyond its length', () => {
    let history = startHistory(0);
    for (let value = 1; value <= MAX_STEPS + 10; value += 1) history = step(history, value);
    expect(history.past).toHaveLength(MAX_STEPS);
  });
});
