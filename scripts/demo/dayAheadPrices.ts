import { MINUTES_PER_DAY } from '../../src/core/civilDate.ts';
import { HOURS_PER_DAY } from '../../src/core/constants.ts';
import { zoneOffsets } from '../../src/core/zoneOffsets.ts';
import { persistentNoise, smoothHours } from './persistentNoise.ts';
import { seededDraws } from './seededDraws.ts';
import type { TownWeather } from './townWeather.ts';

/** The seed of the prices that are committed. */
export const PRICE_SEED = 'Nebelquellingen half-hourly prices 1';

/** Prices of half-hours that follow each other. */
export interface HalfHourlyPrices {
  /** Begin of the first half-hour, milliseconds since 1 January 1970 UTC. */
  readonly start: number;
  /** EUR/kWh before network rates and taxes; below zero in some sunny hours. */
  readonly price: Float64Array;
}

export const HALF_HOUR = 30 * 60 * 1000;

/** Civil 2025 of the demo's zone: it begins at this instant and has no leap day. */
const ZONE = 'Europe/Berlin';
const START = Date.UTC(2024, 11, 31, 23);
const HALF_HOURS_OF_DAY = 2 * HOURS_PER_DAY;

/** All numbers below are invented, in EUR/MWh, to look like a day-ahead market with much sun and wind. */
const market = {
  mean: 88,
  winterExtra: 12,
  morningPeak: 30,
  eveningPeak: 46,
  nightDip: 22,
  weekendDiscount: 14,
  windSwing: 22,
  /** Per W/m² of sun. */
  sunDiscount: 0.13,
  /** Per kelvin below 3 °C. */
  coldExtra: 2,
  least: -140,
} as const;

/**
 * Invents a year of half-hourly prices that fit the town's weather: cheap in sun and wind, dear on cold dark evenings.
 *
 * @param weather hourly year of the town; hour i is laid on hour i of 2025 in UTC+1
 * @param seed any text; the same seed gives the same year
 * @returns 17,520 prices from 2024-12-31T23:00Z, the begin of the civil year 2025 in the town
 */
export function inventPrices(weather: TownWeather, seed: string): HalfHourlyPrices {
  const draws = seededDraws(seed);
  const length = 2 * weather.temperature.length;
  const wind = smoothHours(persistentNoise(draws, length / HALF_HOURS_OF_DAY, 0.6));
  const noise = persistentNoise(draws, length, 0.7);
  const civilMinutes = civilMinutesOf(length);
  const price = new Float64Array(length);
  for (let i = 0; i < length; i++) {
    const hour = Math.floor(i / 2);
    const civil = civilMinutes[i];
    // 1 January 1970 was a Thursday
    const weekend = (Math.floor(civil / MINUTES_PER_DAY) + 3) % 7 > 4;
    const weatherShare =
      market.coldExtra * Math.max(0, 3 - weather.temperature[hour]) -
      market.sunDiscount * radiationOfHalfHour(weather.globalRadiation, i) -
      market.windSwing * wind[hour];
    const perMegawattHour =
      market.mean +
      season(hour) +
      shapeOfDay((civil % MINUTES_PER_DAY) / 60 + 0.25, weekend) +
      weatherShare +
      5 * noise[i];
    price[i] = Math.max(market.least, perMegawattHour) / 1000;
  }
  return { start: START, price };
}

/** Civil time at the begin of each half-hour, minutes as if its clock were UTC. */
function civilMinutesOf(length: number): number[] {
  const minuteOf = (i: number) => (START + i * HALF_HOUR) / 60_000;
  const spans = zoneOffsets(ZONE, minuteOf(0), minuteOf(length)) ?? [];
  return Array.from({ length }, (_, i) => {
    const minute = minuteOf(i);
    return minute + (spans.findLast(({ fromMinute }) => fromMinute <= minute)?.offsetMinutes ?? 0);
  });
}

function season(hour: number): number {
  return market.winterExtra * Math.cos((2 * Math.PI * (hour / HOURS_PER_DAY - 17)) / 365);
}

/** What the time of day adds; weekends are flatter and cheaper. */
function shapeOfDay(time: number, weekend: boolean): number {
  const shape =
    market.morningPeak * bell(time, 8, 1.6) +
    market.eveningPeak * bell(time, 19, 2) -
    market.nightDip * bell(time, 3, 3);
  return weekend ? 0.7 * shape - market.weekendDiscount : shape;
}

function bell(time: number, middle: number, width: number): number {
  return Math.exp(-0.5 * ((time - middle) / width) ** 2);
}

/** Radiation at the middle of a half-hour, on the line between the middles of the hours. */
function radiationOfHalfHour(hourly: Float64Array, halfHour: number): number {
  const hour = Math.floor(halfHour / 2);
  const neighbour = hour + (halfHour % 2 === 0 ? -1 : 1);
  return 0.75 * hourly[hour] + 0.25 * hourly[(neighbour + hourly.length) % hourly.length];
}
