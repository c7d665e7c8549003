import house from '../../data/demo/house.yaml?raw';
import flat from '../../data/demo/tariffs/flat.yaml?raw';
import halfHourly from '../../data/demo/tariffs/half-hourly.yaml?raw';
import night from '../../data/demo/tariffs/night.yaml?raw';
import prices from '../../data/demo/tariffs/prices.csv?packed';
import threeBand from '../../data/demo/tariffs/three-band.yaml?raw';
import unit from '../../data/demo/units/quarkenfels-8.yaml?raw';
import weather from '../../data/demo/weather.csv?packed';
import type { SheetFile } from './memorySource.ts';
import { fileOf } from './startFiles.ts';
import { unpackTable } from './unpackTable.ts';

/** The invented house with all that it names. */
export const demoFiles: readonly SheetFile[] = [
  fileOf('house.yaml', house),
  fileOf('weather.csv', unpackTable(weather)),
  fileOf('units/quarkenfels-8.yaml', unit),
  fileOf('tariffs/flat.yaml', flat),
  fileOf('tariffs/night.yaml', night),
  fileOf('tariffs/three-band.yaml', threeBand),
  fileOf('tariffs/half-hourly.yaml', halfHourly),
  fileOf('tariffs/prices.csv', unpackTable(prices)),
];
