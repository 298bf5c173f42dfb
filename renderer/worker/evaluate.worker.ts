import { evaluate } from '../../core/evaluate';
import type { Evaluation } from '../../core/evaluation';
import type { Answer, Question } from './evaluator';

/** The part of the worker's global scope that is used, since the room's types are those of a page. */
interface WorkerScope {
  onmessage: ((event: { readonly data: Question }) => void) | null;
  postMessage(answer: Answer, transfer: Transferable[]): void;
}
const scope = globalThis as unknown as WorkerScope;

const buffersOf = ({ formulations }: Evaluation): ArrayBuffer[] =>
  formulations.flatMap((outcome) =>
    outcome.kind === 'refused'
      ? []
      : outcome.result.pairs.flatMap(({ curve }) => Object.values(curve).map(({ buffer }) => buffer as ArrayBuffer)),
  );

scope.onmessage = ({ data: { id, scenario } }) => {
  try {
    const evaluation = evaluate(scenario);
    scope.postMessage({ id, evaluation }, buffersOf(evaluation));
  } catch (fault) {
    const message = fault instanceof Error ? fault.message : String(fault);
    scope.postMessage({ id, fault: `The calculation failed: ${message}.` }, []);
  }
};
