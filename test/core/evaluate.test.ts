import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { evaluate } from '../../core/evaluate';
import type { FormulationEvaluation } from '../../core/evaluation';
import { parseScenario } from '../../core/scenario/parse';
import type { Formulation, Particle, Scenario } from '../../core/scenario/scenario';
import { leversFor } from '../../core/verdict/limitInputs';

const parsed = parseScenario(
  readFileSync(new URL('../../assets/demo/white-base.sunder.json', import.meta.url), 'utf8'),
);
if (!parsed.ok) throw new Error('the demo scenario is not valid');
const demo: Scenario = parsed.value;
const [base] = demo.formulations;
const [pigment] = base.particles;

const one = (formulation: Formulation): FormulationEvaluation => {
  const [outcome] = evaluate({ ...demo, formulations: [formulation] }).formulations;
  if (outcome?.kind !== 'evaluated') throw new Error(JSON.stringify(outcome));
  return outcome.result;
};
const withPigment = (change: Partial<Particle>): Formulation => ({ ...base, particles: [{ ...pigment, ...change }] });
const withZeta = (zeta_mV: number): Formulation =>
  withPigment({ charge: { zeta_mV, zetaUncertainty_mV: 5, slipPlane_nm: 0.5 } });
const withSalt = (concentration_mM: number): Formulation => ({
  ...base,
  salts: [{ salt: 'sodium-chloride', concentration_mM }],
});
const barrier_kT = (result: FormulationEvaluation): number => result.pairs[0].features.barrier?.energy_kT ?? 0;

/** Every number in a result, with its place; typed arrays included. */
function numbersOf(value: unknown, at = ''): [string, number][] {
  if (typeof value === 'number') return [[at, value]];
  if (value instanceof Float64Array) return Array.from(value, (entry, index) => [`${at}/${index}`, entry]);
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, entry]) => numbersOf(entry, `${at}/${key}`));
}

describe('evaluate', () => {
  const evaluation = evaluate(demo);

  it('evaluates every formulation of the demo', () => {
    expect(evaluation.formulations.map(({ kind }) => kind)).toEqual(demo.formulations.map(() => 'evaluated'));
  });

  it('lets no number out that is not a number, and infinity only where the contract says so', () => {
    for (const [at, value] of numbersOf(evaluation)) {
      if (/\/(halfLife_s|timeToClear_s)$/.test(at)) expect(value, at).not.toBeNaN();
      else expect(Number.isFinite(value), `${at} is ${value}`).toBe(true);
    }
  });

  it('gives the same digits every time, and whatever else was evaluated before', () => {
    const again = evaluate({ ...demo, formulations: [...demo.formulations].reverse() });
    expect(JSON.stringify([...again.formulations].reverse())).toBe(JSON.stringify(evaluation.formulations));
  });

  it('refuses one formulation without touching the others', () => {
    const packed = { ...base, id: 'packed', particles: [{ ...pigment, loading_percent: 97 }] };
    const [refused, evaluated] = evaluate({ ...demo, formulations: [packed, base] }).formulations;
    expect(refused).toMatchObject({
      kind: 'refused',
      problems: [{ code: 'too-much-solid', at: '/formulations/0/particles/0/loading_percent' }],
    });
    expect(evaluated).toEqual(evaluation.formulations[0]);
  });

  it('asks for ions when a charge is entered in a medium without any', () => {
    const dry = { ...base, salts: [], pH: null, hardness_dH: 0 };
    const [outcome] = evaluate({ ...demo, formulations: [dry] }).formulations;
    expect(outcome).toMatchObject({
      kind: 'refused',
      problems: [{ code: 'charge-without-ions', at: '/formulations/0/particles/0/charge' }],
    });
  });
});

describe('what a formulator expects of the barrier', () => {
  it('falls with salt', () => {
    const barriers = [2, 5, 12, 30, 80].map((salt_mM) => barrier_kT(one(withSalt(salt_mM))));
    expect(barriers).toEqual([...barriers].sort((a, b) => b - a));
    expect(barriers[0]).toBeGreaterThan(barriers[4]);
  });

  it('grows with zeta, whatever its sign', () => {
    const barriers = [20, 30, 40, 60].map((zeta_mV) => barrier_kT(one(withZeta(zeta_mV))));
    expect(barriers).toEqual([...barriers].sort((a, b) => a - b));
    // In a salt of one-valued ions both signs are alike; the polyelectrolyte's counter-ions are one-valued too.
    expect(barrier_kT(one(withZeta(-40)))).toBeCloseTo(barriers[2], 6);
  });

  it('is the same however the loading is written', () => {
    const byMass = one(base);
    const byVolume = one(
      withPigment({ loadingBasis: 'volume', loading_percent: 100 * byMass.particles[0].volumeFraction }),
    );
    expect(byVolume.particles[0].massFraction).toBeCloseTo(pigment.loading_percent / 100, 10);
    expect(barrier_kT(byVolume)).toBe(barrier_kT(byMass));
  });

  it('carries the doubt of the zeta potential as its main one', () => {
    expect(one(base).pairs[0].barrierDoubt.contributions[0]?.input).toBe('zeta');
  });
});

describe('limits are places where the verdict turns', () => {
  const evaluation = evaluate(demo);
  const cases = demo.formulations.flatMap((formulation, index) => {
    const outcome = evaluation.formulations[index];
    if (outcome?.kind !== 'evaluated') return [];
    return outcome.result.verdict.lines.flatMap((line) =>
      line.limits
        .filter(({ value }) => value !== null)
        .map((limit) => ({ formulation, result: outcome.result, line, limit })),
    );
  });

  it('finds some in the demo', () => {
    expect(cases.length).toBeGreaterThan(10);
  });

  it.each(cases)('$formulation.name: $line.subject, $limit.statement', ({ formulation, result, line, limit }) => {
    const pair = result.pairs[result.weakestPair];
    const [lever] = leversFor([limit.input], {
      formulation,
      kinds: line.subject === 'settling' ? [0] : [pair.first, pair.second],
      viscosity_mPa_s: 1000 * result.medium.viscosity_Pa_s,
    });
    // 0.5 %: the limit itself is found to 0.1 %.
    const margins = [0.995, 1.005].map((side) => {
      const changed = one(lever.set((limit.value ?? Number.NaN) * side));
      return changed.verdict.lines.find(({ subject }) => subject === line.subject)?.margin.margin ?? Number.NaN;
    });
    expect(margins[0] > 0).not.toBe(margins[1] > 0);
  });
});
