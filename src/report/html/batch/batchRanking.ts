import { criteria, type RankedRow } from '../../../batch/ranking.ts';
import { type Markup, markup } from '../../charts/markup.ts';
import { dataTable, type TableColumn } from '../dataTable.ts';
import { variedAxes } from './axisValues.ts';
import type { BatchReportInput } from './batchReportInput.ts';
import { cellName, quantityOf } from './writtenFigures.ts';

/** The best and the worst years with their labels. */
export function batchRanking(input: BatchReportInput): Markup {
  const { years, words, figures, by } = input;
  const { ranking: said, criteria: names } = words.batch;
  const title = markup`<h3>${said.title(names[by])}</h3>`;
  if (years.best.length === 0) return markup`${title}<p>${said.none}</p>`;
  const count = figures.number(years.best.length, 0);
  return markup`${title}${tableOf(input, years.best, said.best(count))}${tableOf(input, years.worst, said.worst(count))}`;
}

function tableOf(input: BatchReportInput, rows: readonly RankedRow[], caption: string): Markup {
  const { manifest, words, figures, by } = input;
  const { ranking: said } = words.batch;
  const axes = variedAxes(manifest).sort((a, b) => a - b);
  const columns: TableColumn[] = [
    { heading: said.home, figures: false },
    ...axes.map((axis) => ({ heading: cellName(manifest.axes[axis].name), figures: false })),
    { heading: said.job, figures: true },
    { heading: quantityOf(input), figures: true },
  ];
  return dataTable({
    caption,
    columns,
    rows: rows.map(({ home, axes: labels, job, value }) => [
      cellName(home),
      ...axes.map((axis) => cellName(String(labels[axis]))),
      figures.number(job, 0),
      figures.number(value, criteria[by].decimals),
    ]),
  });
}
