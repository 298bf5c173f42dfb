import { describe, expect, it } from 'vitest';
import type { Evaluation } from '../../../core/evaluation';
import { newScenario } from '../../../renderer/state/templates';
import { type Answer, createEvaluator, type Question, type WorkerLike } from '../../../renderer/worker/evaluator';

/** Workers that answer when told to, and a clock that moves when told to. */
function laboratory() {
  const workers: (WorkerLike & { questions: Question[]; ended: boolean })[] = [];
  let time_ms = 0;
  let alarms: { at_ms: number; task: () => void }[] = [];
  const evaluator = createEvaluator(
    () => {
      const worker = {
        onmessage: null as WorkerLike['onmessage'],
        onerror: null as WorkerLike['onerror'],
        questions: [] as Question[],
        ended: false,
        postMessage(question: Question) {
          worker.questions.push(question);
        },
        terminate() {
          worker.ended = true;
        },
      };
      workers.push(worker);
      return worker;
    },
    {
      now_ms: () => time_ms,
      after: (delay_ms, task) => {
        const alarm = { at_ms: time_ms + delay_ms, task };
        alarms.push(alarm);
        return () => {
          alarms = alarms.filter((other) => other !== alarm);
        };
      },
    },
  );
  const pass = (span_ms: number): void => {
    time_ms += span_ms;
    const due = alarms.filter(({ at_ms }) => at_ms <= time_ms);
    alarms = alarms.filter((alarm) => !due.includes(alarm));
    for (const { task } of due) task();
  };
  const answer = (worker: number, reply: (question: Question) => Answer): void => {
    const question = workers[worker].questions.at(-1);
    if (question === undefined) throw new Error('nothing was asked');
    workers[worker].onmessage?.({ data: reply(question) });
  };
  return { ...evaluator, workers, pass, answer };
}

const evaluation: Evaluation = { formulations: [] };
const titled = (title: string) => ({ ...newScenario(), title });
const outcome = (promise: Promise<Evaluation>) =>
  promise.then(
    () => 'answered',
    (fault: Error) => fault.message,
  );

describe('createEvaluator', () => {
  it('passes the answer on', async () => {
    const { evaluate, answer } = laboratory();
    const asked = evaluate(titled('one'));
    answer(0, ({ id }) => ({ id, evaluation }));
    expect(await asked).toBe(evaluation);
  });

  it('keeps only the newest of the questions that wait', async () => {
    const { evaluate, answer, workers } = laboratory();
    const first = evaluate(titled('one'));
    void evaluate(titled('two'));
    const third = evaluate(titled('three'));
    expect(workers[0].questions).toHaveLength(1);
    answer(0, ({ id }) => ({ id, evaluation }));
    await first;
    expect(workers[0].questions.map(({ scenario }) => scenario.title)).toEqual(['one', 'three']);
    answer(0, ({ id }) => ({ id, evaluation }));
    expect(await third).toBe(evaluation);
  });

  it('says that a calculation failed, and goes on with the same worker', async () => {
    const { evaluate, answer, workers } = laboratory();
    const failing = outcome(evaluate(titled('one')));
    answer(0, ({ id }) => ({ id, fault: 'no such law' }));
    expect(await failing).toBe('no such law');
    void evaluate(titled('two'));
    expect(workers).toHaveLength(1);
  });

  it('replaces a worker that does not answer', async () => {
    const { evaluate, pass, workers } = laboratory();
    const hanging = outcome(evaluate(titled('one')));
    pass(60_000);
    expect(await hanging).toMatch(/did not answer/);
    expect(workers[0].ended).toBe(true);
    void evaluate(titled('two'));
    expect(workers).toHaveLength(2);
  });

  it('replaces a worker that dies, and asks the next question of the new one', async () => {
    const { evaluate, workers, answer } = laboratory();
    const dying = outcome(evaluate(titled('one')));
    const waiting = evaluate(titled('two'));
    workers[0].onerror?.({});
    expect(await dying).toMatch(/broke off/);
    answer(1, ({ id }) => ({ id, evaluation }));
    expect(await waiting).toBe(evaluation);
  });

  it('rests after three deaths in a minute, and works again afterwards', async () => {
    const { evaluate, workers, pass } = laboratory();
    for (let death = 0; death < 3; death += 1) {
      const dying = outcome(evaluate(titled(`${death}`)));
      workers[death].onerror?.({});
      await dying;
    }
    expect(await outcome(evaluate(titled('four')))).toMatch(/rests/);
    pass(61_000);
    void evaluate(titled('five'));
    expect(workers).toHaveLength(4);
  });

  it('ignores the late answer of a worker that was replaced', async () => {
    const { evaluate, workers, answer } = laboratory();
    const dying = outcome(evaluate(titled('one')));
    workers[0].onerror?.({});
    await dying;
    const second = evaluate(titled('two'));
    answer(0, ({ id }) => ({ id: id + 1, evaluation: { formulations: [] } }));
    answer(1, ({ id }) => ({ id, evaluation }));
    expect(await second).toBe(evaluation);
  });
});
