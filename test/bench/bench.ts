/**
 * Speed as ratios against a reference in the same run (a million exponentials), so that figures from different machines
 * can be compared. Each figure is the best of several rounds, since other programs only ever make it slower.
 */
import { readFileSync } from 'node:fs';
import { evaluate } from '../../core/evaluate';
import { solve } from '../../core/formulation/solve';
import { parseScenario } from '../../core/scenario/parse';
import type { Scenario } from '../../core/scenario/scenario';

const ROUNDS = 9;

function best_ms(task: () => void): number {
  let best = Number.POSITIVE_INFINITY;
  for (let round = 0; round < ROUNDS; round += 1) {
    const start = performance.now();
    task();
    best = Math.min(best, performance.now() - start);
  }
  return best;
}

let sink = 0;
function millionExponentials(): void {
  let sum = 0;
  for (let i = 0; i < 1_000_000; i += 1) sum += Math.exp(-i * 1e-6);
  sink += sum;
}

const parsed = parseScenario(readFileSync('assets/demo/white-base.sunder.json', 'utf8'));
if (!parsed.ok) throw new Error('the demo scenario is not valid');
const demo: Scenario = parsed.value;
const [base] = demo.formulations;
const [particle] = base.particles;

let step = 0;
/** Another shelf life each time, so that no result is remembered. */
const nextDemo = (): Scenario => {
  step += 1;
  return { ...demo, requirement: { ...demo.requirement, shelfLife_days: 365 + step } };
};

/** A slider drag: every step is a new zeta potential, so nothing but the Hamaker constant is remembered. */
const nextZeta = () => {
  step += 1;
  const charge = { zeta_mV: -45 + (step % 400) / 100, zetaUncertainty_mV: 5, slipPlane_nm: 0.5 };
  return { ...base, particles: [{ ...particle, charge }] };
};

const reference_ms = best_ms(millionExponentials);
const tasks: readonly (readonly [string, () => void])[] = [
  ['solve one formulation (curve, barrier, log W)', () => void solve(nextZeta())],
  ['evaluate one formulation after a slider step', () => void evaluate({ ...demo, formulations: [nextZeta()] })],
  [`evaluate the demo (${demo.formulations.length} formulations)`, () => void evaluate(nextDemo())],
];

console.log(`reference: a million exponentials, ${reference_ms.toFixed(2)} ms`);
for (const [name, task] of tasks) {
  task();
  const time_ms = best_ms(task);
  console.log(`${name}: ${time_ms.toFixed(2)} ms, ratio ${(time_ms / reference_ms).toFixed(3)}`);
}
if (!Number.isFinite(sink)) throw new Error('the reference loop went wrong');
