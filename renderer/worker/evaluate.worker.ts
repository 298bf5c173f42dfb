import { evaluate } from '../../core/evaluate';
import type { Answer, Question } from './evaluator';

/** The part of the worker's global scope that is used, since the room's types are those of a page. */
interface WorkerScope {
  onmessage: ((event: { readonly data: Question }) => void) | null;
  postMessage(answer: Answer): void;
}
const scope = globalThis as unknown as WorkerScope;

scope.onmessage = ({ data: { id, scenario } }) => {
  try {
    // Copied, not handed over: core keeps its answers for the next question.
    scope.postMessage({ id, evaluation: evaluate(scenario) });
  } catch (fault) {
    const message = fault instanceof Error ? fault.message : String(fault);
    scope.postMessage({ id, fault: `The calculation failed: ${message}.` });
  }
};
