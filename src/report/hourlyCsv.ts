import Papa from 'papaparse';
import { visibleText } from '../core/problem.ts';
import type { Answer } from '../scenario/answer/answer.ts';
import { type HourColumn, hourColumns } from './hourColumns.ts';
import { civilStamps, standardStamp } from './hourStamps.ts';

/** Hours that are written at once: few enough to keep the text small, many enough to be quick. */
const HOURS_AT_ONCE = 744;

/** Text that a spreadsheet would take for a formula gets an apostrophe before it; a number as text does not. */
const FORMULA_START = /^[=+@\t\r]|^-(?![\d.]+$)/;

/**
 * Every hour of the year as CSV: comma, decimal point, UTF-8, one row an hour, numbers in full precision.
 *
 * `stamp` is standard time with its offset on the calendar year, `civilTime` the time on the wall; both mark the hour's
 * beginning. The other columns are those of `hourColumns`, the unit behind the name in brackets. Flow temperature and
 * capacity are blank in hours in which the rooms ask for no heat.
 *
 * @param answer of one scenario
 * @returns the text in pieces, the header first; the same answer gives the same pieces
 */
export function* hourlyCsv(answer: Answer): Generator<string> {
  const columns = hourColumns(answer);
  const names = columns.map(({ name, unit }) => `${name} [${unit}]`);
  const rates = rateColumn(answer);
  yield csv([['stamp', 'civilTime', ...(rates === undefined ? [] : ['rate']), ...names]]);
  const { clock } = answer.loaded;
  const civil = civilStamps(clock);
  for (let from = 0; from < clock.hours; from += HOURS_AT_ONCE) {
    const rows: (string | number | null)[][] = [];
    const to = Math.min(clock.hours, from + HOURS_AT_ONCE);
    for (let hour = from; hour < to; hour++) {
      const rate = rates === undefined ? [] : [rates(hour)];
      rows.push([standardStamp(clock, hour), civil[hour], ...rate, ...columns.map((column) => cell(column, hour))]);
    }
    yield csv(rows);
  }
}

/** Name of the first tariff's rate by hour; nothing without a tariff. */
function rateColumn({ loaded }: Answer): ((hour: number) => string) | undefined {
  const prepared = loaded.tariffs[0]?.prepared;
  if (prepared === undefined) return undefined;
  const names = prepared.rateNames.map((name) => visibleText(name));
  return (hour) => names[prepared.rateOfStep[hour]];
}

function cell({ values, blank }: HourColumn, hour: number): number | null {
  return blank?.(hour) === true ? null : values[hour];
}

function csv(rows: (string | number | null)[][]): string {
  return `${Papa.unparse(rows, { newline: '\n', escapeFormulae: FORMULA_START })}\n`;
}
