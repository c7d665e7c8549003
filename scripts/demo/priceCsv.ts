import { HALF_HOUR, type HalfHourlyPrices } from './dayAheadPrices.ts';
import { fixed } from './weatherCsv.ts';

/**
 * The text of `data/demo/tariffs/prices.csv`: a header whose column name says that the prices are invented, and one line a
 * half-hour, stamped at its beginning in UTC.
 *
 * @param prices half-hours that follow each other
 * @returns lines ended by a line feed; EUR/kWh to five decimals
 */
export function priceCsv(prices: HalfHourlyPrices): string {
  const lines = ['time,invented price EUR/kWh'];
  prices.price.forEach((price, i) => {
    const stamp = new Date(prices.start + i * HALF_HOUR).toISOString().slice(0, 16);
    lines.push(`${stamp}Z,${fixed(price, 5)}`);
  });
  return `${lines.join('\n')}\n`;
}
