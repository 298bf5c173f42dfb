import type { Evaluation } from '../../core/evaluation';
import { CAUTION } from '../../core/report/caution';
import { comparisonColumns, comparisonRow } from '../../core/report/comparison';
import { delimited } from '../../core/report/delimited';
import type { Scenario } from '../../core/scenario/scenario';
import packageFacts from '../../package.json';

export interface OutputChoice {
  readonly curves: boolean;
}

/**
 * Every result the screens show. Keys name their unit; a number that exceeds the number range (a half-life of 1e400 s)
 * is null and stands beside it as a logarithm. Curves are long and come only on request.
 */
export function asJson(scenario: Scenario, evaluation: Evaluation, { curves }: OutputChoice): string {
  const output = {
    program: packageFacts.productName,
    version: packageFacts.version,
    caution: CAUTION,
    title: scenario.title,
    requirement: scenario.requirement,
    formulations: evaluation.formulations,
  };
  const text = JSON.stringify(
    output,
    (key, value: unknown) => {
      if (key === 'curve' && !curves) return undefined;
      return value instanceof Float64Array ? Array.from(value) : value;
    },
    2,
  );
  return `${text}\n`;
}

const headings = comparisonColumns.map(({ heading, unit }) => (unit === '' ? heading : `${heading} (${unit})`));

const short = (value: number | string | null): string => {
  if (value === null) return '–';
  if (typeof value === 'string') return value;
  return String(Number(value.toPrecision(4)));
};

export function asTable(scenario: Scenario, evaluation: Evaluation): string {
  const rows = evaluation.formulations.map(comparisonRow);
  const cells = [['Formulation', ...headings], ...rows.map((row) => [row.name, ...row.values.map(short)])];
  const widths = cells[0].map((_, column) => Math.max(...cells.map((line) => [...line[column]].length)));
  const lines = cells.map((line) =>
    line
      .map((cell, column) => {
        const room = ' '.repeat(widths[column] - [...cell].length);
        return column === 0 ? cell + room : room + cell;
      })
      .join('  ')
      .trimEnd(),
  );
  const verdicts = evaluation.formulations.flatMap((outcome) =>
    outcome.kind === 'refused'
      ? []
      : [
          '',
          `${outcome.result.name}: ${outcome.result.verdict.level}`,
          ...outcome.result.verdict.lines.flatMap((line) => [
            `  ${line.subject} (${line.level}): ${line.statement}`,
            ...line.limits.map((limit) => `    ${limit.statement}`),
          ]),
          ...outcome.result.caveats.map((caveat) => `  Note: ${caveat.message}`),
        ],
  );
  return `${scenario.title}\n\n${[...lines, ...verdicts].join('\n')}\n\n${CAUTION}\n`;
}

export function asCsv(_scenario: Scenario, evaluation: Evaluation): string {
  const header = ['formulation', ...comparisonColumns.map(({ key }) => key)];
  const rows = evaluation.formulations.map(comparisonRow).map((row) => [row.name, ...row.values]);
  return delimited([header, ...rows, [`# ${CAUTION}`]], ',');
}
