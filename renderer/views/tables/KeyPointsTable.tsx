import { BOLTZMANN_J_K } from '../../../core/constants';
import type { CurvePoint, FormulationEvaluation, PairEvaluation } from '../../../core/evaluation';
import { nm_from_m } from '../../../core/quantities/convert';
import { CAUTION } from '../../../core/report/caution';
import { useSettings } from '../../controls/settingsContext';
import { NO_VALUE, shortNumber } from '../../format/numbers';
import { CopyButton } from './CopyButton';
import { useSelectedResult } from './useSelectedResult';

const points: readonly (readonly [string, (pair: PairEvaluation) => CurvePoint | null])[] = [
  ['Primary minimum', ({ features }) => features.primaryMinimum],
  ['Barrier', ({ features }) => features.barrier],
  ['Outer minimum', ({ features }) => features.outerMinimum],
];

const nameOf = (result: FormulationEvaluation, { first, second }: PairEvaluation): string =>
  `${result.particles[first].name} – ${result.particles[second].name}`;

const curveRows = (result: FormulationEvaluation) => [
  ['pair', 'gap_nm', 'total_kT', 'vanDerWaals_kT', 'doubleLayer_kT', 'stericLayer_kT'],
  ...result.pairs.flatMap((pair) =>
    Array.from(pair.curve.separation_m, (gap_m, index) => [
      nameOf(result, pair),
      nm_from_m(gap_m),
      pair.curve.total_kT[index],
      pair.curve.vanDerWaals_kT[index],
      pair.curve.doubleLayer_kT[index],
      pair.curve.stericLayer_kT[index],
    ]),
  ),
  [CAUTION],
];

/** Barrier and minima of every pair of the selected candidate; the whole curve goes to the clipboard. */
export function KeyPointsTable() {
  const result = useSelectedResult();
  const decimalSign = useSettings().decimalSign.value;
  if (result === null) return <p class="hint">No result yet.</p>;
  const thermalEnergy_J = BOLTZMANN_J_K * result.medium.temperature_K;
  return (
    <>
      <table class="numbers">
        <caption class="visually-hidden">Key points of the energy curves of {result.name}</caption>
        <thead>
          <tr>
            <th scope="col">Pair</th>
            <th scope="col">Point</th>
            <th scope="col">Gap / nm</th>
            <th scope="col">Energy / kT</th>
            <th scope="col">Energy / J</th>
          </tr>
        </thead>
        <tbody>
          {result.pairs.flatMap((pair) =>
            points.map(([words, find]) => {
              const point = find(pair);
              return (
                <tr key={`${pair.first}${pair.second}${words}`}>
                  <th scope="row">{nameOf(result, pair)}</th>
                  <td>{words}</td>
                  <td>{point === null ? NO_VALUE : shortNumber(nm_from_m(point.separation_m), decimalSign)}</td>
                  <td>{point === null ? 'none' : shortNumber(point.energy_kT, decimalSign)}</td>
                  <td>{point === null ? NO_VALUE : shortNumber(point.energy_kT * thermalEnergy_J, decimalSign)}</td>
                </tr>
              );
            }),
          )}
        </tbody>
      </table>
      <p class="hint">Copying takes the whole curve with all its parts.</p>
      <CopyButton rows={() => curveRows(result)} />
    </>
  );
}
