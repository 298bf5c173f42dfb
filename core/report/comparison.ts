import type { FormulationEvaluation, FormulationOutcome, PairEvaluation } from '../evaluation';
import { nm_from_m, zJ_from_J } from '../quantities/convert';

/** One column of the comparison of candidates: the same on screen, on the command line and in a spreadsheet. */
export interface ComparisonColumn {
  /** Name with the unit, as used in files: `barrier_kT`. */
  readonly key: string;
  readonly heading: string;
  readonly unit: string;
  /** null where the formulation has no such value; the heading's caption says what that means. */
  readonly value: (result: FormulationEvaluation) => number | string | null;
}

export const weakestPairOf = (result: FormulationEvaluation): PairEvaluation => result.pairs[result.weakestPair];

const S_PER_DAY = 86_400;

export const comparisonColumns: readonly ComparisonColumn[] = [
  { key: 'verdict', heading: 'Verdict', unit: '', value: (result) => result.verdict.level },
  {
    key: 'hamakerConstant_zJ',
    heading: 'Hamaker constant',
    unit: 'zJ',
    value: (result) => zJ_from_J(weakestPairOf(result).hamaker.hamakerConstant_J),
  },
  {
    key: 'hamakerUncertainty_zJ',
    heading: '±',
    unit: 'zJ',
    value: (result) => {
      const { hamakerConstant_J, relativeUncertainty } = weakestPairOf(result).hamaker;
      return Math.abs(zJ_from_J(hamakerConstant_J)) * relativeUncertainty;
    },
  },
  {
    key: 'debyeLength_nm',
    heading: 'Debye length',
    unit: 'nm',
    value: ({ medium }) => (medium.debyeLength_m === null ? null : nm_from_m(medium.debyeLength_m)),
  },
  {
    key: 'barrier_kT',
    heading: 'Barrier',
    unit: 'kT',
    value: (result) => weakestPairOf(result).features.barrier?.energy_kT ?? null,
  },
  {
    key: 'barrierUncertainty_kT',
    heading: '±',
    unit: 'kT',
    value: (result) => weakestPairOf(result).barrierDoubt.standardUncertainty_kT,
  },
  {
    key: 'requiredBarrier_kT',
    heading: 'Barrier needed',
    unit: 'kT',
    value: (result) => weakestPairOf(result).rates.requiredBarrier_kT,
  },
  {
    key: 'outerMinimum_kT',
    heading: 'Outer minimum',
    unit: 'kT',
    value: (result) => weakestPairOf(result).features.outerMinimum?.energy_kT ?? null,
  },
  {
    key: 'log10StabilityRatio',
    heading: 'log W',
    unit: '',
    value: (result) => weakestPairOf(result).rates.log10StabilityRatio,
  },
  {
    key: 'log10HalfLife_s',
    heading: 'log half-life',
    unit: 'log s',
    value: (result) => weakestPairOf(result).rates.log10HalfLife_s,
  },
  {
    key: 'timeToClear_days',
    heading: 'Clear layer after',
    unit: 'days',
    value: ({ particles }) => {
      const soonest_s = Math.min(...particles.map((particle) => particle.settling.timeToClear_s));
      return Number.isFinite(soonest_s) ? soonest_s / S_PER_DAY : null;
    },
  },
];

export interface ComparisonRow {
  readonly name: string;
  /** In the order of {@link comparisonColumns}; a refused formulation has nulls and its first problem as `refusal`. */
  readonly values: readonly (number | string | null)[];
  readonly refusal: string | null;
}

export const comparisonRow = (outcome: FormulationOutcome): ComparisonRow =>
  outcome.kind === 'refused'
    ? {
        name: outcome.name,
        values: comparisonColumns.map(() => null),
        refusal: outcome.problems[0]?.message ?? 'This formulation cannot be evaluated.',
      }
    : {
        name: outcome.result.name,
        values: comparisonColumns.map((column) => column.value(outcome.result)),
        refusal: null,
      };
