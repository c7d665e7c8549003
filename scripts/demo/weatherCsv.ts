import { type TownWeather, town, WEATHER_SEED } from './townWeather.ts';

/** A typical year has no year of its own: the stamps need one, and any common year would do. */
export const STAMPED_YEAR = 2025;

/**
 * The text of `data/demo/weather.csv`: a line that says that all of it is invented, a header, and one line an hour,
 * stamped at its beginning in standard time without offset.
 *
 * @param weather one common year
 * @returns lines ended by a line feed; temperatures and pressures to 0.1, humidity and radiation whole
 */
export function weatherCsv(weather: TownWeather): string {
  const lines = [
    `# invented weather of the invented town ${town.name} at ${town.altitude} m in UTC+${town.utcOffset} – made by scripts/demo/townWeather.ts from the seed '${WEATHER_SEED}'`,
    'time,temperature °C,relative humidity %,global radiation W/m²,pressure hPa',
  ];
  weather.temperature.forEach((temperature, i) => {
    lines.push(
      [
        new Date(Date.UTC(STAMPED_YEAR, 0, 1, i)).toISOString().slice(0, 16),
        fixed(temperature, 1),
        fixed(weather.relativeHumidity[i], 0),
        fixed(weather.globalRadiation[i], 0),
        fixed(weather.pressure[i], 1),
      ].join(','),
    );
  });
  return `${lines.join('\n')}\n`;
}

/**
 * A number with so many decimals, a rounded zero without a sign.
 *
 * @param value any finite number
 * @param decimals 0…20
 * @example fixed(-0.04, 1) // '0.0'
 */
export function fixed(value: number, decimals: number): string {
  return value.toFixed(decimals).replace(/^-(0(?:\.0+)?)$/, '$1');
}
