import type { Problem } from '../core/problem.ts';
import { readSeries } from './readSeries.ts';
import type { PriceSeries, PriceSeriesSettings } from './tariff.ts';
import type { SeriesKind } from './timeSeries.ts';

const KWH_PER_UNIT = { perKWh: 1, perMWh: 1000, centsPerKWh: 100 } as const;
const HIGHEST_PRICE = 1e6;

/** What a price series holds. */
export const PRICES: Omit<SeriesKind, 'divisor'> = {
  one: 'price',
  many: 'prices',
  section: 'series',
  valueKey: 'priceColumn',
  least: -HIGHEST_PRICE,
  most: HIGHEST_PRICE,
  range: 'up to a million per kWh',
};

/**
 * Reads a CSV text of prices over time.
 *
 * @param input.text the file's text
 * @param input.file its name as the user gave it, for the problems
 * @param input.settings how to read it; a stamp that carries its own offset is always taken at its word
 * @param input.zone zone of stamps in local time, a name of the IANA list
 * @returns regular prices per kWh; or problems with line and column, at most twenty and a count of the rest
 * @example readPriceSeries({ text, file: 'prices.csv', settings, zone: 'UTC' }).series?.prices[0] // 0.25 where the text begins with 250 per MWh
 */
export function readPriceSeries(input: {
  readonly text: string;
  readonly file: string;
  readonly settings: PriceSeriesSettings;
  readonly zone: string;
}): { series?: PriceSeries; problems: Problem[] } {
  const { unit, stamps, timeColumn, priceColumn, decimal } = input.settings;
  const { series, problems } = readSeries({
    ...input,
    settings: { stamps, timeColumn, valueColumn: priceColumn, decimal },
    kind: { ...PRICES, divisor: KWH_PER_UNIT[unit] },
  });
  if (series === undefined) return { problems };
  const { file, startMinute, stepMinutes, values } = series;
  return { series: { file, startMinute, stepMinutes, prices: values }, problems };
}
