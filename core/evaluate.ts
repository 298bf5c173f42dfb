import { evaluateFormulation } from './evaluateFormulation';
import type { Evaluation, FormulationEvaluation, FormulationOutcome } from './evaluation';
import type { Result } from './problem';
import { pointerTo } from './scenario/reader';
import type { Formulation, Requirement, Scenario } from './scenario/scenario';

/** While one candidate is edited the others stay as they are; their results are kept. */
const CAPACITY = 256;
const remembered = new Map<string, Result<FormulationEvaluation>>();

/** As `evaluateFormulation`, answered from memory when exactly this was asked before. The answer never differs. */
function rememberedEvaluation(formulation: Formulation, requirement: Requirement): Result<FormulationEvaluation> {
  const key = JSON.stringify([formulation, requirement]);
  const known = remembered.get(key);
  if (known !== undefined) return known;
  const answer = evaluateFormulation(formulation, requirement);
  if (remembered.size >= CAPACITY) remembered.clear();
  remembered.set(key, answer);
  return answer;
}

/**
 * The front door: what becomes of every formulation of a checked scenario. Deterministic to the last digit; a
 * formulation that cannot be evaluated is refused with its problems and does not touch the others.
 */
export function evaluate(scenario: Scenario): Evaluation {
  return {
    formulations: scenario.formulations.map((formulation, index): FormulationOutcome => {
      const { id, name } = formulation;
      const result = rememberedEvaluation(formulation, scenario.requirement);
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
