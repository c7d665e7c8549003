import { KELVIN_AT_ZERO_CELSIUS } from '../../core/constants.ts';

/** Coldest temperature of the published equations, °C; colder is held there. */
const COLDEST = -100;
/** Warmest temperature of the equation over water, °C; warmer is held there. */
const WARMEST_OVER_WATER = 200;
/** There is no ice above this temperature, °C; warmer is held there. */
const WARMEST_OVER_ICE = 0;

/**
 * Saturation pressure of water vapour over liquid water, extrapolated below 0 °C, where humidity sensors and dew
 * points still refer to (supercooled) water.
 *
 * @param temperature °C, −100 … 200; held at these ends
 * @returns pressure, Pa
 * @example saturationPressureOverWater(20) // 2338.8
 *
 * Reference: Hyland and Wexler 1983, as printed in ASHRAE Handbook Fundamentals, chapter 1, equation 6; its stated
 * range is 0 … 200 °C. MODEL section 3.
 */
export function saturationPressureOverWater(temperature: number): number {
  const t = Math.min(Math.max(temperature, COLDEST), WARMEST_OVER_WATER) + KELVIN_AT_ZERO_CELSIUS;
  const polynomial = 1.3914993 + t * (-4.8640239e-2 + t * (4.1764768e-5 + t * -1.4452093e-8));
  return Math.exp(-5.8002206e3 / t + polynomial + 6.5459673 * Math.log(t));
}

/**
 * Saturation pressure of water vapour over ice.
 *
 * @param temperature °C, −100 … 0; held at these ends
 * @returns pressure, Pa
 * @example saturationPressureOverIce(-10) // 259.90
 *
 * Reference: Hyland and Wexler 1983, as printed in ASHRAE Handbook Fundamentals, chapter 1, equation 5. MODEL section 3.
 */
export function saturationPressureOverIce(temperature: number): number {
  const t = Math.min(Math.max(temperature, COLDEST), WARMEST_OVER_ICE) + KELVIN_AT_ZERO_CELSIUS;
  const polynomial = 6.3925247 + t * (-9.677843e-3 + t * (6.2215701e-7 + t * (2.0747825e-9 + t * -9.484024e-13)));
  return Math.exp(-5.6745359e3 / t + polynomial + 4.1635019 * Math.log(t));
}
