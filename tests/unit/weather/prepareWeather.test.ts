import { describe, expect, test } from 'vitest';
import { frostIndex } from '../../../src/weather/frostIndex.ts';
import {
  humidityRatioFromDewPoint,
  humidityRatioFromRelativeHumidity,
} from '../../../src/weather/humidAir/humidityRatio.ts';
import { humidityRatioFromWetBulb } from '../../../src/weather/humidAir/wetBulb.ts';
import { prepareWeather } from '../../../src/weather/prepareWeather.ts';
import type { WeatherSeries } from '../../../src/weather/series.ts';

const HOURS = 8760;
const site = { altitude: 0, defaultRelativeHumidity: 85 };
const column = (of: (i: number) => number, hours = HOURS) => Float64Array.from({ length: hours }, (_, i) => of(i));
// An invented year: a cosine of the season and one of the day.
const temperature = column((i) => 8 - 11 * Math.cos(i / 1394) - 4 * Math.cos(((i % 24) - 3) / 3.82));
const plain: WeatherSeries = { hours: HOURS, offsetMinutes: 60, temperature };
const cases = [0, 1, 100, 3000, 4380, 8759];

describe('prepared weather', () => {
  test('a file of temperatures alone gets the default humidity, standard pressure and no sun', () => {
    const weather = prepareWeather(plain, { altitude: 1000, defaultRelativeHumidity: 85 });
    // ISO 2533: 89 875 Pa at 1000 m, printed whole.
    expect(Math.abs((weather.pressure[17] as number) - 89_875)).toBeLessThanOrEqual(0.5);
    expect(new Set(weather.pressure).size).toBe(1);
    for (const i of cases) {
      const expected = humidityRatioFromRelativeHumidity(temperature[i]!, 85, weather.pressure[i]!);
      expect(weather.humidityRatio[i]).toBe(expected);
      expect(weather.frostIndex[i]).toBe(frostIndex(temperature[i]!, expected, weather.pressure[i]!));
    }
    expect(weather.hasRadiation).toBe(false);
    expect(weather.globalRadiation).toEqual(new Float64Array(HOURS));
    expect(weather.trailingMeanRadiation).toEqual(new Float64Array(HOURS));
  });

  test('at sea level the pressure is that of the standard atmosphere', () => {
    expect(prepareWeather(plain, site).pressure[0]).toBe(101_325);
  });

  test('hours, offset, temperatures and months are those of the series', () => {
    const weather = prepareWeather(plain, site);
    expect([weather.hours, weather.offsetMinutes]).toEqual([HOURS, 60]);
    expect(weather.temperature).toBe(temperature);
    expect([weather.monthStart[1], weather.monthStart[2], weather.monthStart[12]]).toEqual([744, 1416, HOURS]);
  });

  test.each([
    { kind: 'relative', values: column((i) => 60 + (i % 40)), ratioOf: humidityRatioFromRelativeHumidity },
    { kind: 'dewPoint', values: temperature.map((t) => t - 2), ratioOf: humidityRatioFromDewPoint },
    { kind: 'wetBulb', values: temperature.map((t) => t - 1), ratioOf: humidityRatioFromWetBulb },
  ] as const)('a $kind column is read by its own equation, at the measured pressure', ({ kind, values, ratioOf }) => {
    const pressure = column((i) => 97_000 + (i % 3000));
    const weather = prepareWeather({ ...plain, pressure, humidity: { kind, values } }, site);
    expect(weather.pressure).toBe(pressure);
    for (const i of cases) {
      const expected = ratioOf(temperature[i]!, values[i]!, pressure[i]!);
      expect(weather.humidityRatio[i]).toBe(expected);
      expect(weather.frostIndex[i]).toBe(frostIndex(temperature[i]!, expected, pressure[i]!));
    }
  });

  test('measured sun is kept and averaged over the last 24 hours', () => {
    const globalRadiation = column((i) => (i % 24 === 12 ? 480 : 0));
    const weather = prepareWeather({ ...plain, globalRadiation }, site);
    expect(weather.hasRadiation).toBe(true);
    expect(weather.globalRadiation).toBe(globalRadiation);
    expect([...new Set(weather.trailingMeanRadiation)]).toEqual([20]);
  });

  test('the trailing temperature of the first hour looks back at the end of the year', () => {
    const weather = prepareWeather({ ...plain, temperature: column((i) => (i >= HOURS - 23 ? 24 : 0)) }, site);
    expect(weather.trailingMeanTemperature[0]).toBe(23);
  });

  test('a leap year is prepared in full', () => {
    const weather = prepareWeather({ ...plain, hours: 8784, temperature: new Float64Array(8784).fill(2) }, site);
    expect(weather.monthStart[12]).toBe(8784);
    expect(weather.frostIndex).toHaveLength(8784);
    expect(weather.frostIndex[8783]).toBeGreaterThan(1);
  });

  test.each(['relative', 'dewPoint', 'wetBulb'] as const)('absurd %s readings and pressures leave no hole', (kind) => {
    const absurd = [-1e9, -300, -5, 0, 130, 1e9];
    const values = column((i) => absurd[i % 6]!);
    const pressure = column((i) => [0, -4, 100, 1e9][Math.floor(i / 36) % 4]!);
    const hot = column((i) => absurd[Math.floor(i / 6) % 6]!);
    const weather = prepareWeather({ ...plain, temperature: hot, pressure, humidity: { kind, values } }, site);
    const sound = (x: number) => Number.isFinite(x) && x >= 0;
    expect(weather.humidityRatio.every(sound)).toBe(true);
    expect(weather.frostIndex.every((x) => sound(x) && x <= 1.5)).toBe(true);
  });
});
