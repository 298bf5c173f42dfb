import type { FormulationEvaluation } from './evaluation';
import { pairDoubt } from './formulation/doubt';
import { pairEvaluation } from './formulation/pairEvaluation';
import { particleState } from './formulation/particleState';
import { requirementModel } from './formulation/requirementModel';
import { solve } from './formulation/solve';
import { done, type Result } from './problem';
import type { Formulation, Requirement } from './scenario/scenario';
import type { Caveat } from './validity';
import { coagulationMargin } from './verdict/coagulationLine';
import { verdict } from './verdict/verdict';

/** The same doubt is said once, however many pairs raise it. */
const unrepeated = (caveats: readonly Caveat[]): readonly Caveat[] =>
  caveats.filter(({ message }, index) => caveats.findIndex((other) => other.message === message) === index);

/** One formulation against the requirement. Problems carry pointers within the formulation. */
export function evaluateFormulation(formulation: Formulation, asked: Requirement): Result<FormulationEvaluation> {
  const solved = solve(formulation);
  if (!solved.ok) return solved;
  const requirement = requirementModel(asked);
  const { model } = solved.value;
  const doubts = solved.value.pairs.map((_, index) => pairDoubt(formulation, solved.value, index));
  const answers = doubts.map((doubt, index) => pairEvaluation(formulation, solved.value, index, doubt, requirement));
  const pairs = answers.map(({ evaluation }) => evaluation);
  const margins = pairs.map(({ rates }) => coagulationMargin(rates));
  const weakestPair = margins.indexOf(Math.min(...margins));
  const particles = model.particles.map((particle) => particleState(particle, model, requirement));
  return done({
    name: formulation.name,
    medium: model.medium,
    particles,
    pairs,
    weakestPair,
    verdict: verdict({ formulation, solved: solved.value, requirement, doubts, pairs, particles, weakestPair }),
    caveats: unrepeated([...model.caveats, ...answers.flatMap(({ caveats }) => caveats)]),
  });
}
