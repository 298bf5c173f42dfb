import { BOLTZMANN_J_K } from '../../../core/constants';
import type { Evaluation, FormulationEvaluation, PairCurve, PairEvaluation } from '../../../core/evaluation';
import { zJ_from_J } from '../../../core/quantities/convert';
import { weakestPairOf } from '../../../core/report/comparison';
import type { Picture, Series } from '../../charts/curveChart';
import { lineStyle } from '../../charts/palette';

export interface CurveView {
  readonly logarithmic: boolean;
  /** null: chosen from the curves. */
  readonly energyReach_kT: number | null;
  readonly hidden: ReadonlySet<string>;
  readonly cursor_nm: number | null;
  readonly dark: boolean;
}

export interface ShownCurve {
  readonly key: string;
  readonly label: string;
  readonly colour: string;
  readonly dash: readonly number[];
  readonly width: number;
  readonly separation_nm: Float64Array;
  readonly energy_kT: Float64Array;
  readonly thermalEnergy_J: number;
  /** Part of the selected candidate's curve, not a candidate of its own. */
  readonly component: boolean;
}

export const componentWords: readonly (readonly [keyof PairCurve, string])[] = [
  ['vanDerWaals_kT', 'van der Waals'],
  ['doubleLayer_kT', 'double layer'],
  ['stericLayer_kT', 'polymer layer'],
];

const inNm = (separation_m: Float64Array): Float64Array => separation_m.map((gap_m) => gap_m * 1e9);

function curveOf(result: FormulationEvaluation, curve: PairCurve, part: keyof PairCurve) {
  return {
    separation_nm: inNm(curve.separation_m),
    energy_kT: curve[part],
    thermalEnergy_J: BOLTZMANN_J_K * result.medium.temperature_K,
  };
}

/** The total of every evaluated candidate, and the parts of the selected one that act at all. */
export function shownCurves(evaluation: Evaluation, selectedId: string, dark: boolean): readonly ShownCurve[] {
  const totals: ShownCurve[] = [];
  const parts: ShownCurve[] = [];
  evaluation.formulations.forEach((outcome, index) => {
    if (outcome.kind === 'refused') return;
    const { curve } = weakestPairOf(outcome.result);
    const style = lineStyle(index, dark);
    const selected = outcome.id === selectedId;
    totals.push({
      key: outcome.id,
      label: outcome.result.name,
      ...style,
      width: selected ? 3 : 1.5,
      component: false,
      ...curveOf(outcome.result, curve, 'total_kT'),
    });
    if (!selected) return;
    for (const [part, label] of componentWords) {
      if (curve[part].every((value) => value === 0)) continue;
      parts.push({
        key: `part-${part}`,
        label,
        colour: style.colour,
        dash: [
          [1, 3],
          [4, 3],
          [8, 3],
        ][parts.length % 3],
        width: 1,
        component: true,
        ...curveOf(outcome.result, curve, part),
      });
    }
  });
  return [...totals, ...parts];
}

const NICE_kT = [10, 25, 50, 100, 250, 500, 1000] as const;

/** Enough to show the selected barrier and what it must reach, not the fall into contact. */
function reachOf(pair: PairEvaluation | null): number {
  const barrier_kT = pair?.features.barrier?.energy_kT ?? 0;
  const needed_kT = pair?.rates.requiredBarrier_kT ?? 0;
  const wanted = 1.2 * Math.max(Math.min(barrier_kT, 400), needed_kT, 15);
  return NICE_kT.find((nice) => nice >= wanted) ?? 1000;
}

const LOG_START_nm = 0.15;
const LINEAR_END_nm = 30;
const LOG_END_nm = 200;

/** A sharp fall leaves the plot between two points: values beyond are drawn at the edge of what a canvas can take. */
const FAR_OUTSIDE = 20;

export interface Palette {
  readonly text: string;
  readonly grid: string;
  readonly strong: string;
  readonly font: string;
}

export function curvePicture(
  curves: readonly ShownCurve[],
  selected: FormulationEvaluation | null,
  view: CurveView,
  palette: Palette,
): Picture {
  const pair = selected === null ? null : weakestPairOf(selected);
  const reach = view.energyReach_kT ?? reachOf(pair);
  const limit = FAR_OUTSIDE * reach;
  const series = curves
    .filter(({ key }) => !view.hidden.has(key))
    .map(
      (curve): Series => ({
        label: curve.label,
        colour: curve.colour,
        dash: curve.dash,
        width: curve.width,
        endLabel: null,
        points: Array.from(curve.separation_nm, (x, index) => ({
          x,
          y: Math.max(-limit, Math.min(limit, curve.energy_kT[index])),
        })),
      }),
    );
  const { barrier, outerMinimum } = pair?.features ?? { barrier: null, outerMinimum: null };
  const marks = [
    ...(barrier === null ? [] : [{ point: barrier, label: `barrier ${barrier.energy_kT.toFixed(0)} kT` }]),
    ...(outerMinimum === null
      ? []
      : [{ point: outerMinimum, label: `outer minimum ${outerMinimum.energy_kT.toFixed(1).replace('-', '−')} kT` }]),
  ].map(({ point, label }) => ({
    x: point.separation_m * 1e9,
    y: point.energy_kT,
    colour: palette.strong,
    label,
  }));
  const temperature_K = selected?.medium.temperature_K ?? 298.15;
  return {
    series,
    x: view.logarithmic
      ? { title: 'Gap between the surfaces / nm', min: LOG_START_nm, max: LOG_END_nm, logarithmic: true }
      : { title: 'Gap between the surfaces / nm', min: 0, max: LINEAR_END_nm, logarithmic: false },
    y: { title: 'Energy / kT', min: -reach / 2, max: reach },
    secondY: { title: 'Energy / zJ', factor: zJ_from_J(BOLTZMANN_J_K * temperature_K) },
    levels:
      pair === null || pair.rates.requiredBarrier_kT <= 0
        ? []
        : [{ y: pair.rates.requiredBarrier_kT, label: `needed ${pair.rates.requiredBarrier_kT.toFixed(0)} kT` }],
    marks,
    cursorX: view.cursor_nm,
    colours: palette,
    font: palette.font,
  };
}

/** Energy of a curve at a gap, between its points; null outside. */
export function energyAt({ separation_nm, energy_kT }: ShownCurve, gap_nm: number): number | null {
  const last = separation_nm.length - 1;
  if (gap_nm < separation_nm[0] || gap_nm > separation_nm[last]) return null;
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (separation_nm[middle] <= gap_nm) low = middle;
    else high = middle;
  }
  const share = (gap_nm - separation_nm[low]) / (separation_nm[high] - separation_nm[low]);
  return energy_kT[low] + share * (energy_kT[high] - energy_kT[low]);
}
