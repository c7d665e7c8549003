import { STANDARD_PRESSURE } from '../../core/constants.ts';
import { generalPower } from '../../core/power.ts';

/** Range of altitudes in which the equation is stated, m. */
const LOWEST_ALTITUDE = -5000;
const HIGHEST_ALTITUDE = 11_000;

/**
 * Air pressure of the standard atmosphere, for stations that report none.
 *
 * @param altitude above sea level, m, −5000 … 11 000; held at these ends
 * @returns pressure, Pa
 * @example standardPressure(1000) // 89875
 *
 * Reference: ISO 2533 standard atmosphere; ASHRAE Handbook Fundamentals, chapter 1, equation 3, with the exponent of
 * MODEL section 3.
 */
export function standardPressure(altitude: number): number {
  const height = Math.min(Math.max(altitude, LOWEST_ALTITUDE), HIGHEST_ALTITUDE);
  return STANDARD_PRESSURE * generalPower(1 - 2.25577e-5 * height, 5.25588);
}
