import { inventPrices, PRICE_SEED } from './dayAheadPrices.ts';
import { HOMES_SEED, homesCsv } from './homesCsv.ts';
import { METER_SEED, meterCsv } from './meterReadings.ts';
import { priceCsv } from './priceCsv.ts';
import { inventWeather, WEATHER_SEED } from './townWeather.ts';
import { weatherCsv } from './weatherCsv.ts';

/**
 * The generated files of the demo, made in memory.
 *
 * @returns names relative to the project's folder, with their whole text
 */
export function demoFiles(): { readonly name: string; readonly text: string }[] {
  const weather = inventWeather(WEATHER_SEED);
  return [
    { name: 'data/demo/weather.csv', text: weatherCsv(weather) },
    { name: 'data/demo/tariffs/prices.csv', text: priceCsv(inventPrices(weather, PRICE_SEED)) },
    { name: 'data/demo/meter.csv', text: meterCsv(weather, METER_SEED) },
    { name: 'data/demo/homes.csv', text: homesCsv(120, HOMES_SEED) },
  ];
}
