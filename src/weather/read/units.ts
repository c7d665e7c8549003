import { KELVIN_AT_ZERO_CELSIUS } from '../../core/constants.ts';
import { standardPressure } from '../humidAir/standardPressure.ts';
import type { UnitSettings } from '../readSettings.ts';
import type { Findings } from './findings.ts';
import { type Quantity, type QuantityUnit, quantityTexts } from './quantities.ts';
import { rangeOf } from './rangeOf.ts';
import { unitOfHeader, unitOfSettings } from './unitWords.ts';

/** The unit of a column, and how it was decided. */
export interface DecidedUnit {
  readonly unit: QuantityUnit;
  readonly how: 'settings' | 'header' | 'values' | 'assumed';
}

/** What the unit of a column is decided by. */
export interface UnitSource {
  readonly quantity: Quantity;
  /** Gives the finite values of the rows in use, in the unit of the file. */
  readonly values: () => Float64Array;
  /** All header cells of the column. */
  readonly header: string;
  readonly units: UnitSettings;
  /** Unit of the temperature, once that is decided: dew point and wet bulb share it. */
  readonly temperatureUnit: DecidedUnit | undefined;
  /** Of the site, m above sea level. */
  readonly altitude: number;
  /** Line of the header, for a warning. */
  readonly line: number | undefined;
  readonly findings: Findings;
}

/** Conventional millimetre and inch of mercury, Pa. Reference: ISO 80000-4:2019, annex; 25.4 mm to the inch. */
const MM_HG = 133.322387415;
const PASCALS: readonly (readonly [QuantityUnit, number])[] = [
  ['Pa', 1],
  ['hPa', 100],
  ['kPa', 1000],
  ['mmHg', MM_HG],
  ['inHg', 25.4 * MM_HG],
];

/** Watt-hours per square metre in one unit of energy. */
const WATT_HOURS: readonly (readonly [QuantityUnit, number])[] = [
  ['Wh/m2', 1],
  ['kWh/m2', 1000],
  ['kJ/m2', 1 / 3.6],
  ['MJ/m2', 1000 / 3.6],
  ['J/cm2', 10 / 3.6],
];

/**
 * The unit of a column: by the settings, else by the header, else by what the values can be.
 *
 * A guess that the values force beyond doubt (kelvin, humidity as a fraction) is made silently here and said in what was
 * recognised; one that they only suggest is a warning.
 */
export function decideUnit(source: UnitSource): DecidedUnit {
  const { quantity, header, units } = source;
  const stated = unitOfSettings(quantity, units);
  if (stated !== undefined) return { unit: stated, how: 'settings' };
  const named = unitOfHeader(quantity, header);
  if (named !== undefined) return { unit: named, how: 'header' };
  switch (quantity) {
    case 'relativeHumidity':
      return rangeOf(source.values()).most <= 1.5
        ? { unit: 'fraction', how: 'values' }
        : { unit: 'percent', how: 'assumed' };
    case 'globalRadiation':
      return { unit: 'W/m2', how: 'assumed' };
    case 'pressure':
      return guessPressure(source);
    default:
      return source.temperatureUnit ?? guessTemperature(source);
  }
}

function guessTemperature(source: UnitSource): DecidedUnit {
  const values = source.values();
  const { least, most } = rangeOf(values);
  if (least >= 220 && most <= 330) return { unit: 'K', how: 'values' };
  if (most <= quantityTexts.temperature.most) return { unit: 'C', how: 'assumed' };
  const hot = values.reduce((count, value) => count + (value > quantityTexts.temperature.most ? 1 : 0), 0);
  if (hot <= 0.01 * values.length || least < -80 || most > 140) return { unit: 'C', how: 'assumed' };
  warnOfGuess(source, '°F');
  return { unit: 'F', how: 'values' };
}

/** The unit in which the mean lies nearest to the standard pressure at the site's altitude. */
function guessPressure(source: UnitSource): DecidedUnit {
  const values = source.values();
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  const expected = standardPressure(source.altitude);
  const distance = (pascals: number) => (mean > 0 ? Math.abs(Math.log((mean * pascals) / expected)) : 1);
  const [unit, pascals] = PASCALS.reduce((a, b) => (distance(b[1]) < distance(a[1]) ? b : a));
  if (distance(pascals) > 0.2) return { unit: 'Pa', how: 'assumed' };
  return { unit, how: 'values' };
}

function warnOfGuess({ quantity, values, line, findings }: UnitSource, unit: string): void {
  const { least, most } = rangeOf(values());
  findings.add({
    code: 'weather.unit-guessed',
    severity: 'warning',
    ...(line === undefined ? {} : { line }),
    path: quantityTexts[quantity].name,
    unit,
    found: `from ${least} to ${most}`,
  });
}

/**
 * Values in the units used here: °C, %, W/m², Pa.
 *
 * @param values in the unit of the file; NaN and Infinity stay what they are
 * @param unit of the file
 * @param step minutes, over which energies of radiation are spread
 */
export function inOwnUnit(values: Float64Array, unit: QuantityUnit, step: number): Float64Array {
  switch (unit) {
    case 'F':
      return values.map((value) => (value - 32) / 1.8);
    case 'K':
      return values.map((value) => value - KELVIN_AT_ZERO_CELSIUS);
    case '0.1C':
      return values.map((value) => value / 10);
    case 'fraction':
      return values.map((value) => value * 100);
    default:
      return scaled(values, factorOf(unit, step));
  }
}

function factorOf(unit: QuantityUnit, step: number): number {
  const pascals = PASCALS.find(([name]) => name === unit);
  if (pascals) return pascals[1];
  const wattHours = WATT_HOURS.find(([name]) => name === unit);
  return wattHours ? (wattHours[1] * 60) / step : 1;
}

function scaled(values: Float64Array, factor: number): Float64Array {
  return factor === 1 ? values : values.map((value) => value * factor);
}
