import { type Criterion, criteria } from '../../../batch/ranking.ts';
import { shown } from '../../../core/problem.ts';
import { type Markup, markup } from '../../charts/markup.ts';
import type { BatchReportInput } from './batchReportInput.ts';

const NO_BREAK = '\u00a0';
/** Letters of a name in a table, and in a sentence or heading; results.csv has the whole of it. */
const LONGEST_NAME = 80;
const LONGEST_IN_TEXT = 40;

/** A name from a file for a table, in a direction of its own. */
export function cellName(text: string): Markup {
  return markup`<bdi>${shown(text, LONGEST_NAME)}</bdi>`;
}

/** A name from a file for a sentence or a heading. */
export function textName(text: string): string {
  return shown(text, LONGEST_IN_TEXT);
}

/** The currency of the years; a word where they have several, or none. */
export function currencyOf({ years, words }: BatchReportInput): string {
  return years.currencies.length === 1 ? shown(years.currencies[0]) : words.batch.money;
}

/** A figure of a criterion with its unit. */
export function written(input: BatchReportInput, value: number, by: Criterion = input.by): string {
  const figure = input.figures.number(value, criteria[by].decimals);
  if (by === 'cost') return `${figure}${NO_BREAK}${currencyOf(input)}`;
  if (by === 'carbon') return `${figure}${NO_BREAK}kg`;
  return by === 'backupHours' ? `${figure}${NO_BREAK}h` : figure;
}

/** What is measured by the criterion, with its unit: for axes and captions. */
export function quantityOf(input: BatchReportInput): string {
  const said = input.words.batch.quantities;
  return input.by === 'cost' ? said.cost(currencyOf(input)) : said[input.by];
}
