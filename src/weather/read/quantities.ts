import type { HumidityUnit, PressureUnit, RadiationUnit, TemperatureUnit } from '../readSettings.ts';

/** What a weather file may hold of use here. */
export type Quantity = 'temperature' | 'relativeHumidity' | 'dewPoint' | 'wetBulb' | 'globalRadiation' | 'pressure';

export type QuantityUnit = TemperatureUnit | HumidityUnit | RadiationUnit | PressureUnit;

/** A quantity's name for people, the unit inside, and what is possible in it. */
interface QuantityText {
  readonly name: string;
  readonly unit: string;
  readonly least: number;
  readonly most: number;
}

const temperatures = { unit: '°C', least: -90, most: 60 };

/**
 * Values outside these limits do not occur: −89.2 °C and 56.7 °C are the records of the World Meteorological
 * Organization (from memory); the rest is common practice, no source.
 */
export const quantityTexts: Record<Quantity, QuantityText> = {
  temperature: { name: 'temperature', ...temperatures },
  relativeHumidity: { name: 'relative humidity', unit: '%', least: 0, most: 105 },
  dewPoint: { name: 'dew point', ...temperatures },
  wetBulb: { name: 'wet bulb', ...temperatures },
  globalRadiation: { name: 'global radiation', unit: 'W/m²', least: -20, most: 1600 },
  pressure: { name: 'pressure', unit: 'Pa', least: 45_000, most: 110_000 },
};

export const quantityNames: readonly Quantity[] = [
  'temperature',
  'relativeHumidity',
  'dewPoint',
  'wetBulb',
  'globalRadiation',
  'pressure',
];
