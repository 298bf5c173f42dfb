import type { FormulationEvaluation } from '../../../core/evaluation';
import { useDeskTop } from '../deskTop';

/** The result of the selected candidate; null while it is not there, or was refused. */
export function useSelectedResult(): FormulationEvaluation | null {
  const { workbench } = useDeskTop();
  const outcome = workbench.outcomeOf(workbench.selected.value.id);
  return outcome?.kind === 'evaluated' ? outcome.result : null;
}
