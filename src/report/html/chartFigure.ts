import { type Markup, markup } from '../charts/markup.ts';
import { type DataTable, dataTable } from './dataTable.ts';

/** A chart with what is said beside it. */
export interface ChartFigure {
  readonly title: string;
  readonly chart: Markup;
  /** What each surface and line is: a sample and its name. */
  readonly legend: readonly (readonly [Markup, string])[];
  /** What is to be seen, in a sentence. */
  readonly says: string;
  /** The figures behind the drawing. */
  readonly table: DataTable;
  /** What the table is called where it is opened. */
  readonly figures: string;
}

/** A chart under its heading, with legend, sentence, and its figures behind a fold. */
export function chartFigure({ title, chart, legend, says, table, figures }: ChartFigure): Markup {
  const names = legend.map(([sample, name]) => markup`<li>${sample} ${name}</li>`);
  const key = names.length === 0 ? undefined : markup`<ul class="key">${names}</ul>`;
  return markup`<figure><h4>${title}</h4>${chart}${key}<figcaption>${says}</figcaption><details><summary>${figures}: ${title}</summary>${dataTable(table)}</details></figure>`;
}
