import { HOURS_OF_COMMON_YEAR, HOURS_PER_DAY } from '../../src/core/constants.ts';
import { persistentNoise, smoothHours } from './persistentNoise.ts';
import { type Draws, seededDraws } from './seededDraws.ts';
import { clearSkyRadiation, cloudFactor } from './skyRadiation.ts';
import { type Place, sineOfSunHeight } from './sunHeight.ts';

/** The invented town. Its place only sets the sun's height and the air pressure. */
export const town = {
  name: 'Nebelquellingen',
  latitude: 49.4,
  longitude: 10.6,
  altitude: 420,
  /** Standard time of the file, hours ahead of UTC. */
  utcOffset: 1,
} as const satisfies Place & Record<string, unknown>;

/** The seed of the weather that is committed. */
export const WEATHER_SEED = 'Nebelquellingen typical year 672';

/** Hourly columns of one common year in the town's standard time. */
export interface TownWeather {
  /** °C */
  readonly temperature: Float64Array;
  /** Relative humidity over liquid water, % */
  readonly relativeHumidity: Float64Array;
  /** Mean of the hour on level ground, W/m² */
  readonly globalRadiation: Float64Array;
  /** Station pressure, hPa */
  readonly pressure: Float64Array;
}

const DAYS = HOURS_OF_COMMON_YEAR / HOURS_PER_DAY;

/** All numbers below are invented for a damp central-European climate of 9 to 10 °C: none is a measurement. */
const climate = {
  meanTemperature: 9.4,
  seasonalSwing: 9.2,
  /** Day of the year in which it is coldest, 1 January being 0. */
  coldestDay: 17,
  /** Hour of standard time at which the first wave of the day is highest; with the second it is half an hour sooner. */
  warmestHour: 15.2,
  meanPressure: 963.9,
} as const;

/**
 * Invents a typical year of hourly weather: season, slow noise of the days, and a daily swing that clouds damp.
 *
 * @param seed any text; the same seed gives the same year
 * @returns 8760 hours whose end joins their beginning, unrounded
 *
 * Reference: none, it is invented; saturation pressure after O. A. Alduchov, R. E. Eskridge, J. Appl. Meteorology 35
 * (1996) 601–609, eq. 21.
 */
export function inventWeather(seed: string): TownWeather {
  const sky = inventSky(seededDraws(seed));
  const cloud = cloudHours(sky);
  const length = HOURS_OF_COMMON_YEAR;
  const temperature = new Float64Array(length);
  const relativeHumidity = new Float64Array(length);
  const globalRadiation = new Float64Array(length);
  const pressure = new Float64Array(length);
  for (let i = 0; i < length; i++) {
    const winter = winterShare(i);
    const dayCloud = coverage(sky.overcast[i], winter);
    const dayMean = meanOfDay(winter, sky.warmth[i], dayCloud);
    const swing = (1.1 + 5.6 * (1 - dayCloud)) * (1 - 0.45 * winter);
    temperature[i] = dayMean + swing * shapeOfDay(i) + 0.35 * sky.flicker[i];
    const dewPoint = dayMean - 0.75 * swing - dewPointDepression(winter, dayCloud, sky.damp[i]);
    relativeHumidity[i] = relativeHumidityAt(temperature[i], dewPoint);
    globalRadiation[i] = clearSkyOfHour(i) * cloudFactor(cloud[i]);
    pressure[i] = climate.meanPressure + (5 + 3 * winter) * (0.8 * sky.airMass[i] - 0.5 * sky.overcast[i]);
  }
  return { temperature, relativeHumidity, globalRadiation, pressure };
}

interface Sky {
  readonly warmth: Float64Array;
  readonly overcast: Float64Array;
  readonly airMass: Float64Array;
  readonly damp: Float64Array;
  /** Noise from hour to hour. */
  readonly flicker: Float64Array;
}

function inventSky(draws: Draws): Sky {
  const ofDays = (persistence: number) => smoothHours(persistentNoise(draws, DAYS, persistence));
  return {
    warmth: ofDays(0.78),
    overcast: ofDays(0.55),
    airMass: ofDays(0.8),
    damp: ofDays(0.6),
    flicker: persistentNoise(draws, HOURS_OF_COMMON_YEAR, 0.85),
  };
}

/** 1 on the coldest day, 0 half a year later. */
function winterShare(hour: number): number {
  return (1 + Math.cos((2 * Math.PI * (hour / HOURS_PER_DAY - climate.coldestDay)) / DAYS)) / 2;
}

function cloudHours(sky: Sky): Float64Array {
  return sky.overcast.map((overcast, i) => coverage(overcast + 0.5 * sky.flicker[i], winterShare(i)));
}

/** Covered share of the sky, 0…1: winters are greyer than summers. */
function coverage(overcast: number, winter: number): number {
  return 1 / (1 + Math.exp(-1.7 * (overcast + 0.75 + 0.6 * winter)));
}

/** Mean temperature of the day, °C: a clear sky warms the summer and cools the winter. */
function meanOfDay(winter: number, warmth: number, cloud: number): number {
  const season = climate.meanTemperature - climate.seasonalSwing * (2 * winter - 1);
  const clearSky = (0.7 - cloud) * (3.5 - 8.5 * winter);
  const coldSpell = 0.4 * winter * Math.min(0, warmth) ** 2;
  return season + (3 + 0.9 * winter) * warmth + clearSky - coldSpell;
}

function shapeOfDay(hour: number): number {
  const angle = (2 * Math.PI * ((hour % HOURS_PER_DAY) + 0.5 - climate.warmestHour)) / HOURS_PER_DAY;
  // The second wave moves the coldest hour towards sunrise and makes the morning steeper than the evening.
  return 0.88 * Math.cos(angle) + 0.19 * Math.cos(2 * angle + 0.9);
}

/** How far the dew point stays below the night's lowest temperature, K. */
function dewPointDepression(winter: number, cloud: number, damp: number): number {
  return 0.7 + 1.1 * (1 - cloud) + 1.3 * (1 - winter) + (0.5 + 0.5 * (1 - winter)) * damp;
}

function relativeHumidityAt(temperature: number, dewPoint: number): number {
  return Math.min(100, (100 * saturationPressure(dewPoint)) / saturationPressure(temperature));
}

function saturationPressure(temperature: number): number {
  return 610.94 * Math.exp((17.625 * temperature) / (temperature + 243.04));
}

/** Mean of six instants: sunrise falls within an hour. */
function clearSkyOfHour(hour: number): number {
  let sum = 0;
  for (let part = 0; part < 6; part++) {
    const utcHours = hour - town.utcOffset + (part + 0.5) / 6;
    sum += clearSkyRadiation(sineOfSunHeight(town, utcHours));
  }
  return sum / 6;
}
