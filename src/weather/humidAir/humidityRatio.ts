import { saturationPressureOverWater } from './saturationPressure.ts';

/** Ratio of the molar masses of water and dry air. Reference: ASHRAE Handbook Fundamentals, chapter 1, equation 20. */
const MOLAR_MASS_RATIO = 0.621945;

/** Lowest air pressure that is taken at its word, Pa: about 16 km up, far above any house. */
const LOWEST_PRESSURE = 10_000;

/** Vapour is at most this share of the air pressure: at the whole of it the air boils and the ratio has no bound. */
const LARGEST_VAPOUR_SHARE = 0.99;

/**
 * Humidity ratio of moist air from the pressure of its vapour.
 *
 * @param vapourPressure Pa, 0 … 99 % of the air pressure; held at these ends
 * @param pressure air pressure, Pa; less than 10 000 Pa counts as 10 000
 * @returns kg water per kg dry air, at least 0
 * @example humidityRatio(1000, 101325) // 0.0061993
 *
 * Reference: ASHRAE Handbook Fundamentals, chapter 1, equation 20. MODEL section 3.
 */
export function humidityRatio(vapourPressure: number, pressure: number): number {
  const air = Math.max(pressure, LOWEST_PRESSURE);
  const vapour = Math.min(Math.max(vapourPressure, 0), LARGEST_VAPOUR_SHARE * air);
  return (MOLAR_MASS_RATIO * vapour) / (air - vapour);
}

/**
 * Humidity ratio from relative humidity, which refers to liquid water at every temperature, as sensors report it.
 *
 * @param temperature dry bulb, °C
 * @param relativeHumidity %, 0 … 100; held at these ends
 * @param pressure air pressure, Pa
 * @returns kg water per kg dry air, at least 0
 * @example humidityRatioFromRelativeHumidity(20, 50, 101325) // 0.0072617
 *
 * Reference: ASHRAE Handbook Fundamentals, chapter 1, equations 6, 20 and 22. MODEL section 3.
 */
export function humidityRatioFromRelativeHumidity(
  temperature: number,
  relativeHumidity: number,
  pressure: number,
): number {
  const share = Math.min(relativeHumidity, 100) / 100;
  return humidityRatio(share * saturationPressureOverWater(temperature), pressure);
}

/**
 * Humidity ratio from the dew point over liquid water, as weather services report it also in frost.
 *
 * @param temperature dry bulb, °C
 * @param dewPoint °C; above the dry bulb it is held there, as air over 100 % does not last
 * @param pressure air pressure, Pa
 * @returns kg water per kg dry air, at least 0
 * @example humidityRatioFromDewPoint(20, 10, 101325) // 0.0076301
 *
 * Reference: ASHRAE Handbook Fundamentals, chapter 1, equations 6 and 20. MODEL section 3.
 */
export function humidityRatioFromDewPoint(temperature: number, dewPoint: number, pressure: number): number {
  return humidityRatio(saturationPressureOverWater(Math.min(dewPoint, temperature)), pressure);
}
