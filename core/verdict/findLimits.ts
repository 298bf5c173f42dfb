import type { Limit, LimitInput } from '../evaluation';
import type { Formulation } from '../scenario/scenario';
import { type LeverQuestion, leversFor, limitSentence } from './limitInputs';
import { nearestLimit } from './nearestLimit';

/**
 * How far each input may move before this verdict line turns, on the full model.
 * `margin` evaluates a changed formulation: positive when the line holds, not a number when it cannot be evaluated.
 */
export function findLimits(
  inputs: readonly LimitInput[],
  question: LeverQuestion,
  margin: (formulation: Formulation) => number,
): readonly Limit[] {
  const holdsNow = margin(question.formulation) > 0;
  return leversFor(inputs, question).flatMap((lever) => {
    const found = nearestLimit({
      current: lever.current,
      from: lever.from,
      to: lever.to,
      margin: (value) => margin(lever.set(value)),
    });
    // Nothing in the whole range makes a sound formulation fail: that is no limit.
    if (found === null && holdsNow) return [];
    return [
      {
        input: lever.input,
        value: found?.value ?? null,
        unit: lever.unit,
        statement: limitSentence(lever, found, holdsNow),
      },
    ];
  });
}
