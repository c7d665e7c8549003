import { type Problem, shown } from '../core/problem.ts';
import { type SeriesFaults, seriesFaults } from './seriesFaults.ts';
import { type SeriesTable, seriesTable } from './seriesTable.ts';
import { instantsOfRows, stepOfRows } from './seriesTimes.ts';
import type { PriceSeries, PriceSeriesSettings } from './tariff.ts';

const KWH_PER_UNIT = { perKWh: 1, perMWh: 1000, centsPerKWh: 100 } as const;
const HIGHEST_PRICE = 1e6;

/**
 * Reads a CSV text of prices over time.
 *
 * @param input.text the file's text
 * @param input.file its name as the user gave it, for the problems
 * @param input.settings how to read it; a stamp that carries its own offset is always taken at its word
 * @param input.zone zone of stamps in local time, a name of the IANA list
 * @returns regular prices per kWh; or problems with line and column, at most twenty and a count of the rest
 * @example '2025-01-01T00:00Z,250' and so on, perMWh: prices[0] is 0.25
 */
export function readPriceSeries(input: {
  readonly text: string;
  readonly file: string;
  readonly settings: PriceSeriesSettings;
  readonly zone: string;
}): { series?: PriceSeries; problems: Problem[] } {
  const { text, file, settings, zone } = input;
  const { table, problems } = seriesTable(text, file, settings);
  if (!table) return { problems };
  const faults = seriesFaults(file);
  const instants = instantsOfRows(table, settings, zone, faults);
  const stepMinutes = stepOfRows(instants, table, faults);
  const prices = pricesOf(table, settings, faults);
  const startMinute = instants[0];
  const found = faults.list();
  if (found.length > 0 || stepMinutes === undefined || startMinute === undefined) return { problems: found };
  return { series: { file, startMinute, stepMinutes, prices }, problems: [] };
}

/** Money per kWh. */
function pricesOf(table: SeriesTable, settings: PriceSeriesSettings, faults: SeriesFaults): Float64Array {
  const prices = new Float64Array(table.rows.length);
  const isComma = decimalIsComma(table, settings, faults);
  const perKWh = KWH_PER_UNIT[settings.unit];
  const mark = isComma ? /^[+-]?\d*,?\d+(e[+-]?\d+)?$/i : /^[+-]?\d*\.?\d+(e[+-]?\d+)?$/i;
  table.rows.forEach((row, i) => {
    const value = mark.test(row.price) ? Number(row.price.replace(',', '.')) / perKWh : Number.NaN;
    if (Math.abs(value) <= HIGHEST_PRICE) {
      prices[i] = value;
      return;
    }
    const allowed = `a number with a decimal ${isComma ? 'comma' : 'point'}, up to a million per kWh`;
    const found = shown(row.price === '' ? 'an empty cell' : row.price);
    faults.add({ code: 'tariff.series-price', ...table.placeOf(row, 'price'), found, allowed });
  });
  return prices;
}

/** Whether the comma is the decimal sign: as the settings say, else as the file shows. */
function decimalIsComma(table: SeriesTable, settings: PriceSeriesSettings, faults: SeriesFaults): boolean {
  if (settings.decimal !== undefined) return settings.decimal === 'comma';
  const withComma = table.rows.filter((row) => row.price.includes(','));
  if (withComma.length === 0) return false;
  if (withComma.every((row) => /^[+-]?[1-9]\d{0,2},\d{3}$/.test(row.price))) {
    const place = table.placeOf(withComma[0], 'price');
    faults.add({ code: 'tariff.series-decimal', ...place, found: shown(withComma[0].price) });
  }
  return !table.rows.some((row) => row.price.includes('.'));
}
