import { readFileSync } from 'node:fs';
import { parseScenario } from '../../../core/scenario/parse';
import type { Scenario } from '../../../core/scenario/scenario';

/** The text of the demo and what it means. */
export const demoText = readFileSync(new URL('../../../assets/demo/white-base.sunder.json', import.meta.url), 'utf8');

const parsed = parseScenario(demoText);
if (!parsed.ok) throw new Error('The demo is not a scenario');
export const demo: Scenario = parsed.value;
