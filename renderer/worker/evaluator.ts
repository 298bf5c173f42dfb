import type { Evaluation } from '../../core/evaluation';
import type { Scenario } from '../../core/scenario/scenario';

/** Answers with the evaluation of the newest scenario asked for; older questions still waiting are never answered. */
export type Evaluator = (scenario: Scenario) => Promise<Evaluation>;

export interface Question {
  readonly id: number;
  readonly scenario: Scenario;
}

export type Answer =
  | { readonly id: number; readonly evaluation: Evaluation }
  | { readonly id: number; readonly fault: string };

/** What the evaluator needs of a worker, so that tests can give it a hanging or a dying one. */
export interface WorkerLike {
  onmessage: ((event: { readonly data: Answer }) => void) | null;
  onerror: ((event: { preventDefault?: () => void }) => void) | null;
  postMessage(question: Question): void;
  terminate(): void;
}

export interface Timer {
  now_ms(): number;
  after(delay_ms: number, task: () => void): () => void;
}

/** A large scenario takes a second or two; longer means that it will never answer. */
const ANSWER_WITHIN_ms = 20_000;
const REPLACEMENTS_PER_MINUTE = 3;
const MINUTE_ms = 60_000;

interface Waiting {
  readonly question: Question;
  readonly resolve: (evaluation: Evaluation) => void;
  readonly reject: (fault: Error) => void;
}

/**
 * One worker, one question at a time. While it works only the newest of the questions that arrive is kept. A worker that
 * dies or does not answer in time is replaced and the question fails in words; after three in a minute the evaluator
 * says so at once until the minute is over.
 */
export function createEvaluator(startWorker: () => WorkerLike, timer: Timer): { evaluate: Evaluator; close(): void } {
  let worker: WorkerLike | null = null;
  let current: Waiting | null = null;
  let next: Waiting | null = null;
  let stopWatching: () => void = () => undefined;
  let replaced_ms: readonly number[] = [];
  let count = 0;

  const replaceWorker = (fault: string): void => {
    worker?.terminate();
    worker = null;
    replaced_ms = [...replaced_ms, timer.now_ms()];
    finish(({ reject }) => reject(new Error(fault)));
  };

  const finish = (settle: (waiting: Waiting) => void): void => {
    stopWatching();
    const finished = current;
    current = null;
    if (finished !== null) settle(finished);
    if (next !== null) {
      const waiting = next;
      next = null;
      send(waiting);
    }
  };

  const freshWorker = (): WorkerLike => {
    const started = startWorker();
    started.onmessage = ({ data }) => {
      if (started !== worker || data.id !== current?.question.id) return;
      if ('evaluation' in data) finish(({ resolve }) => resolve(data.evaluation));
      else finish(({ reject }) => reject(new Error(data.fault)));
    };
    started.onerror = (event) => {
      event.preventDefault?.();
      if (started === worker) replaceWorker('The calculation broke off and was started anew.');
    };
    return started;
  };

  const send = (waiting: Waiting): void => {
    replaced_ms = replaced_ms.filter((time_ms) => timer.now_ms() - time_ms < MINUTE_ms);
    if (worker === null && replaced_ms.length >= REPLACEMENTS_PER_MINUTE) {
      waiting.reject(new Error('The calculation broke off several times in a row; it rests for a minute.'));
      return;
    }
    worker ??= freshWorker();
    current = waiting;
    stopWatching = timer.after(ANSWER_WITHIN_ms, () =>
      replaceWorker('The calculation did not answer in time and was started anew.'),
    );
    worker.postMessage(waiting.question);
  };

  return {
    evaluate: (scenario) =>
      new Promise((resolve, reject) => {
        count += 1;
        const waiting = { question: { id: count, scenario }, resolve, reject };
        if (current === null) send(waiting);
        else next = waiting;
      }),
    close: () => {
      stopWatching();
      worker?.terminate();
      worker = null;
    },
  };
}
