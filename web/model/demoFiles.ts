/// <reference types="vite/client" />
import house from '../../data/demo/house.yaml?raw';
import flat from '../../data/demo/tariffs/flat.yaml?raw';
import halfHourly from '../../data/demo/tariffs/half-hourly.yaml?raw';
import night from '../../data/demo/tariffs/night.yaml?raw';
import threeBand from '../../data/demo/tariffs/three-band.yaml?raw';
import unit from '../../data/demo/units/quarkenfels-8.yaml?raw';
import { inventPrices, PRICE_SEED } from '../../scripts/demo/dayAheadPrices.ts';
import { priceCsv } from '../../scripts/demo/priceCsv.ts';
import { inventWeather, WEATHER_SEED } from '../../scripts/demo/townWeather.ts';
import { weatherCsv } from '../../scripts/demo/weatherCsv.ts';
import type { SheetFile } from './memorySource.ts';
import { fileOf } from './startFiles.ts';

const town = inventWeather(WEATHER_SEED);

/** The invented house with all that it names; its tables are invented anew, the same as those of `data/demo`. */
export const demoFiles: readonly SheetFile[] = [
  fileOf('house.yaml', house),
  fileOf('weather.csv', weatherCsv(town)),
  fileOf('units/quarkenfels-8.yaml', unit),
  fileOf('tariffs/flat.yaml', flat),
  fileOf('tariffs/night.yaml', night),
  fileOf('tariffs/three-band.yaml', threeBand),
  fileOf('tariffs/half-hourly.yaml', halfHourly),
  fileOf('tariffs/prices.csv', priceCsv(inventPrices(town, PRICE_SEED))),
];
