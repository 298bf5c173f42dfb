import { useState } from 'preact/hooks';
import type { VerdictLevel } from '../../../core/evaluation';
import { CAUTION } from '../../../core/report/caution';
import { type ComparisonRow, comparisonColumns, comparisonRow } from '../../../core/report/comparison';
import { timeSpan } from '../../../core/verdict/words';
import { useSettings } from '../../controls/settingsContext';
import { shortNumber } from '../../format/numbers';
import { useDeskTop } from '../deskTop';
import { LevelMark } from '../LevelMark';
import { CopyButton } from './CopyButton';

interface Sorting {
  readonly column: number;
  readonly rising: boolean;
}

const order: readonly VerdictLevel[] = ['fails', 'borderline', 'holds'];
const rank = (value: number | string | null): number => {
  if (value === null) return Number.NEGATIVE_INFINITY;
  return typeof value === 'number' ? value : (order as readonly string[]).indexOf(value);
};

interface IdentifiedRow extends ComparisonRow {
  readonly id: string;
}

const LOG_HALF_LIFE = comparisonColumns.findIndex(({ key }) => key === 'log10HalfLife_s');

/** All candidates side by side. A heading sorts, a row selects. */
export function ComparisonTable() {
  const { workbench } = useDeskTop();
  const decimalSign = useSettings().decimalSign.value;
  const [sorting, setSorting] = useState<Sorting | null>(null);
  const evaluation = workbench.evaluation.value;
  const rows: IdentifiedRow[] =
    evaluation?.formulations.map((outcome) => ({ id: outcome.id, ...comparisonRow(outcome) })) ?? [];
  const sorted =
    sorting === null
      ? rows
      : [...rows].sort(
          (a, b) => (rank(a.values[sorting.column]) - rank(b.values[sorting.column])) * (sorting.rising ? 1 : -1),
        );
  const headings = comparisonColumns.map(({ heading, unit }) => (unit === '' ? heading : `${heading} / ${unit}`));
  const sortBy = (column: number) =>
    setSorting((now) => ({ column, rising: now?.column === column ? !now.rising : true }));
  const cell = (value: number | string | null, column: number) => {
    if (column === LOG_HALF_LIFE && typeof value === 'number') return timeSpan(value);
    const level = order.find((one) => one === value);
    if (level !== undefined) return <LevelMark level={level} />;
    return typeof value === 'string' ? value : shortNumber(value, decimalSign);
  };
  const headingOf = (column: number) => (column === LOG_HALF_LIFE ? 'Half-life' : headings[column]);
  return (
    <>
      <div class="scroll">
        <table class="numbers">
          <caption class="visually-hidden">Comparison of all candidates</caption>
          <thead>
            <tr>
              <th scope="col">Candidate</th>
              {comparisonColumns.map(({ key }, column) => (
                <th
                  key={key}
                  scope="col"
                  aria-sort={sorting?.column === column ? (sorting.rising ? 'ascending' : 'descending') : 'none'}
                >
                  <button type="button" class="sort" onClick={() => sortBy(column)}>
                    {headingOf(column)}
                  </button>
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {sorted.map((row) => (
              <tr key={row.id} data-chosen={row.id === workbench.selected.value.id ? 'true' : undefined}>
                <th scope="row">
                  <button type="button" class="quiet" onClick={() => workbench.select(row.id)}>
                    {row.name}
                  </button>
                </th>
                {row.refusal === null ? (
                  row.values.map((value, column) => <td key={comparisonColumns[column].key}>{cell(value, column)}</td>)
                ) : (
                  <td colSpan={comparisonColumns.length} class="field-error">
                    {row.refusal}
                  </td>
                )}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <CopyButton
        rows={() => [['Candidate', ...headings], ...sorted.map((row) => [row.name, ...row.values]), [CAUTION]]}
      />
    </>
  );
}
