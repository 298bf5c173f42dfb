import { evaluateFormulation } from './evaluateFormulation';
import type { Evaluation, FormulationOutcome } from './evaluation';
import { pointerTo } from './scenario/reader';
import type { Scenario } from './scenario/scenario';

/**
 * The front door: what becomes of every formulation of a checked scenario. Deterministic to the last digit; a
 * formulation that cannot be evaluated is refused with its problems and does not touch the others.
 */
export function evaluate(scenario: Scenario): Evaluation {
  return {
    formulations: scenario.formulations.map((formulation, index): FormulationOutcome => {
      const { id, name } = formulation;
      const result = evaluateFormulation(formulation, scenario.requirement);
      if (result.ok) return { kind: 'evaluated', id, result: result.value };
      const at = pointerTo('/formulations', index);
      return {
        kind: 'refused',
        id,
        name,
        problems: result.problems.map((problem) => ({ ...problem, at: `${at}${problem.at}` })),
      };
    }),
  };
}
