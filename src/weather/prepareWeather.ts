import { frostIndex } from './frostIndex.ts';
import { humidityRatioFromDewPoint, humidityRatioFromRelativeHumidity } from './humidAir/humidityRatio.ts';
import { standardPressure } from './humidAir/standardPressure.ts';
import { humidityRatioFromWetBulb } from './humidAir/wetBulb.ts';
import { monthStarts } from './monthSteps.ts';
import type { HumidityKind, PreparedWeather, WeatherSeries } from './series.ts';
import { trailingDayMean } from './trailingDayMean.ts';

/** What the site adds where the weather file is silent. */
export interface WeatherSite {
  /** Altitude, m, for the air pressure. */
  readonly altitude: number;
  /** Constant relative humidity, %, 0 … 100, where the file has no humidity. */
  readonly defaultRelativeHumidity: number;
}

/** How each kind of humidity column becomes a humidity ratio: (dry bulb °C, reading, pressure Pa) → kg/kg. */
const humidityRatioOf: Record<HumidityKind, (temperature: number, reading: number, pressure: number) => number> = {
  relative: humidityRatioFromRelativeHumidity,
  dewPoint: humidityRatioFromDewPoint,
  wetBulb: humidityRatioFromWetBulb,
};

/**
 * Everything that depends on weather alone, once for all runs on that weather.
 *
 * @param series a year of finite values, 8760 or 8784 hours
 * @param site what stands in for missing columns: pressure of the standard atmosphere, a constant relative humidity, no sun
 * @returns columns of the same length; humidity, frost index and pressure are finite whatever the readings are. The
 *   temperature column, and radiation and pressure where the file has them, are shared with the series, not copied
 * @example prepareWeather(series, { altitude: 0, defaultRelativeHumidity: 85 }).pressure[0] // 101325
 *
 * Reference: MODEL sections 1, 3, 4 and 7.
 */
export function prepareWeather(series: WeatherSeries, site: WeatherSite): PreparedWeather {
  const { hours, temperature } = series;
  const pressure = series.pressure ?? new Float64Array(hours).fill(standardPressure(site.altitude));
  const humidityRatio = humidityRatios(series, pressure, site.defaultRelativeHumidity);
  const globalRadiation = series.globalRadiation ?? new Float64Array(hours);
  return {
    hours,
    offsetMinutes: series.offsetMinutes,
    temperature,
    trailingMeanTemperature: trailingDayMean(temperature),
    globalRadiation,
    trailingMeanRadiation: trailingDayMean(globalRadiation),
    hasRadiation: series.globalRadiation !== undefined,
    humidityRatio,
    pressure,
    frostIndex: frostIndices(temperature, humidityRatio, pressure),
    monthStart: monthStarts(hours),
  };
}

function humidityRatios(series: WeatherSeries, pressure: Float64Array, defaultRelativeHumidity: number): Float64Array {
  const { hours, temperature, humidity } = series;
  const readings = humidity?.values ?? new Float64Array(hours).fill(defaultRelativeHumidity);
  const ratioOf = humidityRatioOf[humidity?.kind ?? 'relative'];
  const ratios = new Float64Array(hours);
  for (let i = 0; i < hours; i++) ratios[i] = ratioOf(temperature[i], readings[i], pressure[i]);
  return ratios;
}

function frostIndices(temperature: Float64Array, ratio: Float64Array, pressure: Float64Array): Float64Array {
  const indices = new Float64Array(temperature.length);
  for (let i = 0; i < indices.length; i++) indices[i] = frostIndex(temperature[i], ratio[i], pressure[i]);
  return indices;
}
