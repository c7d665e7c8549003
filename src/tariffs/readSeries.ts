import { type Problem, shown } from '../core/problem.ts';
import { type SeriesFaults, seriesFaults } from './seriesFaults.ts';
import { seriesSize } from './seriesSize.ts';
import { type SeriesTable, seriesTable } from './seriesTable.ts';
import { instantsOfRows, stepOfRows } from './seriesTimes.ts';
import type { SeriesKind, SeriesSettings, TimeSeries } from './timeSeries.ts';

/** A text to read values over time from. */
export interface SeriesInput {
  readonly text: string;
  /** Its name as the user gave it, for the problems. */
  readonly file: string;
  readonly settings: SeriesSettings;
  readonly kind: SeriesKind;
  /** Zone of stamps in local time, a name of the IANA list. */
  readonly zone: string;
}

/**
 * Reads a CSV text of values over time; a stamp that carries its own offset is always taken at its word.
 *
 * @returns regular values; or problems with line and column, at most twenty and a count of the rest
 */
export function readSeries(input: SeriesInput): { series?: TimeSeries; problems: Problem[] } {
  const { text, file, settings, kind, zone } = input;
  const oversize = seriesSize(text, file);
  if (oversize !== undefined) return { problems: [oversize] };
  const { table, problems } = seriesTable(text, file, settings, kind);
  if (!table) return { problems };
  const faults = seriesFaults(file);
  const instants = instantsOfRows(table, settings, zone, faults);
  const stepMinutes = stepOfRows(instants, { table, kind }, faults);
  const values = valuesOf(table, settings, kind, faults);
  const startMinute = instants[0];
  const found = faults.list();
  if (found.length > 0 || stepMinutes === undefined || startMinute === undefined) return { problems: found };
  return { series: { file, startMinute, stepMinutes, values }, problems: [] };
}

function valuesOf(table: SeriesTable, settings: SeriesSettings, kind: SeriesKind, faults: SeriesFaults): Float64Array {
  const values = new Float64Array(table.rows.length);
  const isComma = decimalIsComma(table, settings, faults);
  const mark = isComma ? /^[+-]?\d*,?\d+(e[+-]?\d+)?$/i : /^[+-]?\d*\.?\d+(e[+-]?\d+)?$/i;
  table.rows.forEach((row, i) => {
    const value = mark.test(row.value) ? Number(row.value.replace(',', '.')) / kind.divisor : Number.NaN;
    if (value >= kind.least && value <= kind.most) {
      values[i] = value;
      return;
    }
    const allowed = `a number with a decimal ${isComma ? 'comma' : 'point'}, ${kind.range}`;
    const found = shown(row.value === '' ? 'an empty cell' : row.value);
    faults.add({ code: 'series.value', ...table.placeOf(row, 'value'), found, allowed, unit: kind.one });
  });
  return values;
}

/** Whether the comma is the decimal sign: as the settings say, else as the file shows. */
function decimalIsComma(table: SeriesTable, settings: SeriesSettings, faults: SeriesFaults): boolean {
  if (settings.decimal !== undefined) return settings.decimal === 'comma';
  const withComma = table.rows.filter((row) => row.value.includes(','));
  if (withComma.length === 0) return false;
  if (withComma.every((row) => /^[+-]?[1-9]\d{0,2},\d{3}$/.test(row.value))) {
    const place = table.placeOf(withComma[0], 'value');
    faults.add({ code: 'series.decimal', ...place, found: shown(withComma[0].value) });
  }
  return !table.rows.some((row) => row.value.includes('.'));
}
