import type { Limit, PairRates, VerdictLine } from '../evaluation';
import type { PairDoubt } from '../formulation/doubt';
import type { SolvedPair } from '../formulation/solve';
import { levelOf } from './level';
import { number, timeSpan } from './words';

export const COAGULATION_LEVERS = ['zeta', 'salt', 'layerThickness', 'diameter'] as const;

export interface CoagulationCase {
  readonly pair: SolvedPair;
  readonly rates: PairRates;
  readonly doubt: PairDoubt;
  readonly limits: readonly Limit[];
}

/** Decades of the stability ratio above what the shelf life asks for. */
export const coagulationMargin = (
  rates: Pick<PairRates, 'log10StabilityRatio' | 'requiredLog10StabilityRatio'>,
): number => rates.log10StabilityRatio - rates.requiredLog10StabilityRatio;

function statement({ pair, rates, doubt }: CoagulationCase): string {
  const { barrier, contact_m } = pair.features;
  const needed = `about ${number(rates.requiredBarrier_kT)} kT are needed for this shelf life at this loading`;
  const halfLife = `half the particles would be lost in ${timeSpan(rates.log10HalfLife_s)}`;
  if (barrier === null) return `Nothing holds the particles apart: no barrier, while ${needed}; ${halfLife}.`;
  const doubtText = `${number(barrier.energy_kT)} ± ${number(doubt.barrier.standardUncertainty_kT, 2)} kT`;
  const place =
    barrier.separation_m > contact_m * 1.0001
      ? `at a gap of ${number(barrier.separation_m * 1e9, 2)} nm`
      : 'where the polymer layers meet in full';
  return `A barrier of ${doubtText} ${place}; ${needed}; ${halfLife}.`;
}

/** Will the particles touch and stay together for good within the shelf life? */
export function coagulationLine(one: CoagulationCase): VerdictLine {
  const { rates, doubt } = one;
  const margin = coagulationMargin(rates);
  return {
    subject: 'coagulation',
    level: levelOf(margin, doubt.log10WDown, doubt.log10WUp),
    statement: statement(one),
    margin: {
      quantity: 'log₁₀ of the stability ratio',
      unit: 'decades',
      actual: rates.log10StabilityRatio,
      needed: rates.requiredLog10StabilityRatio,
      margin,
    },
    limits: one.limits,
  };
}
