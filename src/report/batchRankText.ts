import type { Distribution } from '../batch/distribution.ts';
import { type Criterion, criteria, type RankedRow, type RankingResult } from '../batch/ranking.ts';
import { visibleText } from '../core/problem.ts';
import { figure } from './figures.ts';
import { type Column, heading, table } from './layout.ts';

/** What a criterion is called in a heading. */
const names: Record<Criterion, string> = {
  cost: 'Running cost of the heating on the first tariff',
  carbon: 'Carbon dioxide, kg a year',
  seasonalFactor: 'Seasonal factor H4',
  backupHours: 'Backup hours',
};

/** A ranking with what it is about. */
export interface RankedBatch {
  readonly by: Criterion;
  readonly axes: readonly string[];
  readonly rows: number;
  /** Rows without the figure: failed, or without an answer to the question. */
  readonly unranked: number;
  readonly result: RankingResult;
}

/** A ranking as text: the spread, the best and the worst rows, the values of each axis side by side. */
export function rankText({ by, axes, rows, unranked, result }: RankedBatch): string {
  const { decimals } = criteria[by];
  const { spread, best, worst } = result;
  const good = criteria[by].best === 'least' ? 'the least first' : 'the most first';
  const title = heading(`${names[by]}: ${figure(rows - unranked, 0)} years, ${good}`);
  const left = unranked === 0 ? '' : `\n${figure(unranked, 0)} years have no such figure and are left out.`;
  if (spread === undefined) return `${title}${left}\n`;
  const blocks = [
    `${title}${left}`,
    table(spreadColumns([{ label: 'all', spread }], '', decimals)),
    `Best\n${rowTable(best, axes, decimals)}`,
    `Worst\n${rowTable(worst, axes, decimals)}`,
    ...result.axes.map(({ axis, values }) => {
      const lines = values.map(({ value, spread: each }) => ({ label: visibleText(String(value)), spread: each }));
      return `By ${visibleText(axis)}\n${table(spreadColumns(lines, visibleText(axis), decimals))}`;
    }),
  ];
  return `${blocks.join('\n\n')}\n`;
}

function spreadColumns(
  lines: readonly { label: string; spread: Distribution }[],
  name: string,
  decimals: number,
): Column[] {
  const column = (title: string, of: (spread: Distribution) => number, digits = decimals): Column => ({
    heading: title,
    figures: true,
    cells: lines.map(({ spread }) => figure(of(spread), digits)),
  });
  return [
    { heading: name, figures: false, cells: lines.map(({ label }) => label) },
    column('Years', ({ count }) => count, 0),
    column('Mean', ({ mean }) => mean),
    column('Least', ({ least }) => least),
    column('10 %', ({ q10 }) => q10),
    column('Median', ({ median }) => median),
    column('90 %', ({ q90 }) => q90),
    column('Most', ({ most }) => most),
  ];
}

function rowTable(rows: readonly RankedRow[], axes: readonly string[], decimals: number): string {
  return table([
    { heading: 'Home', figures: false, cells: rows.map(({ home }) => visibleText(home)) },
    ...axes.map((axis, a) => ({
      heading: visibleText(axis),
      figures: false,
      cells: rows.map((row) => visibleText(String(row.axes[a]))),
    })),
    { heading: 'Job', figures: true, cells: rows.map(({ job }) => String(job)) },
    { heading: 'Value', figures: true, cells: rows.map(({ value }) => figure(value, decimals)) },
  ]);
}

/** A ranking as plain data, as `--json` writes it. */
export function rankDocument({ by, rows, unranked, axes, result }: RankedBatch, version: string): object {
  const rowOf = ({ job, home, axes: values, value }: RankedRow) => ({
    job,
    home,
    axes: Object.fromEntries(axes.map((axis, a) => [axis, values[a]])),
    value,
  });
  return {
    version,
    by,
    figure: criteria[by].figure,
    best: criteria[by].best,
    rows,
    unranked,
    spread: result.spread ?? 'no values',
    bestRows: result.best.map(rowOf),
    worstRows: result.worst.map(rowOf),
    axes: result.axes.map(({ axis, values }) => ({
      axis,
      values: values.map(({ value, spread }) => ({ value, ...spread })),
    })),
  };
}
