import { checkScenario } from './parse';
import type { Scenario } from './scenario';

/**
 * The text of a scenario file: JSON, keys in fixed order, two spaces, a line end at the end, every number in full.
 * The same scenario always gives the same bytes, so that two saved files can be compared line by line.
 * Throws RangeError when the scenario is not one that `parseScenario` would accept: that would be our bug.
 */
export function writeScenario(scenario: Scenario): string {
  const checked = checkScenario(scenario);
  if (!checked.ok) {
    const [first] = checked.problems;
    throw new RangeError(`writeScenario: not a valid scenario at ${first?.at}: ${first?.message}`);
  }
  return `${JSON.stringify(checked.value, null, 2)}\n`;
}
