import { mean } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { inventPrices } from '../../../scripts/demo/dayAheadPrices.ts';

const column = (value: number) => new Float64Array(8760).fill(value);

function evenWeather(radiation: number, temperature = 10) {
  return {
    temperature: column(temperature),
    relativeHumidity: column(80),
    globalRadiation: column(radiation),
    pressure: column(964),
  };
}

const dark = inventPrices(evenWeather(0), 'seed');

/** Mean price of a month's half-hours that begin at a UTC time of day. */
function meanPrice(month: number, hour: number, minute: number): number {
  const chosen = Array.from(dark.price).filter((_, i) => {
    const begin = new Date(dark.start + i * 1_800_000);
    return begin.getUTCMonth() + 1 === month && begin.getUTCHours() === hour && begin.getUTCMinutes() === minute;
  });
  return mean(chosen);
}

describe('invented prices', () => {
  it('cover the half-hours of the civil year 2025, which begins at 23:00 UTC', () => {
    expect(new Date(dark.start).toISOString()).toBe('2024-12-31T23:00:00.000Z');
    expect(dark.price.length).toBe(2 * 8760);
  });

  it('peak at seven in the evening of civil time, in winter and in summer', () => {
    // 19:00 in the town is 18:00 UTC in January and 17:00 UTC in July.
    expect(meanPrice(1, 18, 0)).toBeGreaterThan(meanPrice(1, 16, 30));
    expect(meanPrice(1, 18, 0)).toBeGreaterThan(meanPrice(1, 19, 30));
    expect(meanPrice(7, 17, 0)).toBeGreaterThan(meanPrice(7, 15, 30));
    expect(meanPrice(7, 17, 0)).toBeGreaterThan(meanPrice(7, 18, 30));
  });

  it('are cheaper in the sun and dearer in the cold, everything else being equal', () => {
    const sunny = inventPrices(evenWeather(500), 'seed');
    const cold = inventPrices(evenWeather(0, -7), 'seed');
    dark.price.forEach((price, i) => {
      expect(sunny.price[i]).toBeCloseTo(price - 0.065, 9); // 0.13 EUR/MWh for each W/m²
      expect(cold.price[i]).toBeCloseTo(price + 0.02, 9); // 2 EUR/MWh for each of 10 K below 3 °C
    });
  });
});
