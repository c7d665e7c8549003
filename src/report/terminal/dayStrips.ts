import { visibleText } from '../../core/problem.ts';
import { figure } from '../figures.ts';
import { heading } from '../layout.ts';
import type { Words } from '../words.ts';
import { heightStrip, type Range, rangeOf } from './blocks.ts';
import type { HoursOfDay } from './hoursOfDay.ts';

/** Letters of an hour, and of the hours of a day that are numbered under the strips. */
const WIDTH_OF_HOUR = 2;
const NUMBERED = [0, 6, 12, 18];
const PRICE_DECIMALS = 2;
const SHARE_DECIMALS = 0;
/** Names in front of the strips are cut here, so that a line stays within 80 columns. */
const LONGEST_NAME = 18;

/**
 * Strips of the day, an hour two letters wide: what a kWh costs on each tariff, and when the heating takes its electricity.
 * Prices of one currency share their scale; the lowest and the highest stand behind each strip in figures.
 *
 * @returns lines; none where there is no tariff with a price by the hour
 */
export function dayStrips({ tariffs, electricity }: HoursOfDay, words: Words): string[] {
  if (tariffs.length === 0) return [];
  const currencies = new Set(tariffs.map(({ currency }) => currency));
  const unit = currencies.size === 1 ? `, ${tariffs[0].currency}/kWh` : '';
  const rangeOfAll = (wanted: string) =>
    rangeOf(tariffs.filter(({ currency }) => currency === wanted).flatMap(({ price }) => price));
  const lines = tariffs.map(({ tariff, currency, price }) => {
    const strip = heightStrip(price, WIDTH_OF_HOUR, rangeOfAll(currency));
    return lineOf(tariff, strip, rangeText(rangeOf(price), PRICE_DECIMALS, currencies.size > 1 ? ` ${currency}` : ''));
  });
  const year = electricity.reduce((sum, kWh) => sum + kWh, 0);
  const shares = electricity.map((kWh) => (year === 0 ? 0 : (100 * kWh) / year));
  const hours = Array.from({ length: 24 }, (_, h) => (NUMBERED.includes(h) ? String(h) : ''));
  return [
    heading(words.headings.hoursOfDay(unit)),
    `${' '.repeat(LONGEST_NAME + 1)}${hours.map((hour) => hour.padEnd(WIDTH_OF_HOUR)).join('')}`.trimEnd(),
    ...lines,
    lineOf(
      words.heatingByHour,
      heightStrip(shares, WIDTH_OF_HOUR, rangeOf(shares)),
      rangeText(rangeOf(shares), SHARE_DECIMALS, ' %'),
    ),
  ];
}

function lineOf(name: string, strip: string, range: string): string {
  return `${nameOf(name)} ${strip} ${range}`;
}

function rangeText({ least, most }: Range, decimals: number, unit: string): string {
  const [lowest, highest] = [least, most].map((value) => figure(value, decimals));
  return `${lowest === highest ? lowest : `${lowest}–${highest}`}${unit}`;
}

function nameOf(name: string): string {
  const letters = [...visibleText(name)];
  const cut = letters.length > LONGEST_NAME ? [...letters.slice(0, LONGEST_NAME - 1), '…'] : letters;
  return cut.join('').padEnd(LONGEST_NAME);
}
