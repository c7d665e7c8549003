import { humidityRatio } from './humidAir/humidityRatio.ts';
import { saturationPressureOverIce, saturationPressureOverWater } from './humidAir/saturationPressure.ts';

/** How much colder than the air the outdoor coil is taken to be, K. Reference: MODEL section 7. */
const COIL_DEPRESSION = 8;
/** Coil temperature below 0 °C from which on all water that settles stays as frost, K. Reference: MODEL section 7. */
const FULL_FROST_DEPTH = 6;
/** Largest frost index: damper air does not lose more. Reference: MODEL section 7. */
const LARGEST_INDEX = 1.5;

/** The reference is air of 2 °C at 84 %, which is close to the rating point A2 with a wet bulb of 1 °C. */
const REFERENCE_TEMPERATURE = 2;
const REFERENCE_VAPOUR_PRESSURE = 0.84 * saturationPressureOverWater(REFERENCE_TEMPERATURE);
const REFERENCE_COIL_PRESSURE = saturationPressureOverIce(REFERENCE_TEMPERATURE - COIL_DEPRESSION);

/**
 * Frost index φ of an hour: how fast frost grows on the outdoor coil, relative to air of 2 °C at 84 % relative humidity.
 *
 * @param temperature outdoor dry bulb, °C
 * @param ratio humidity ratio of the outdoor air, kg/kg, at least 0
 * @param pressure air pressure, Pa
 * @returns 0 (no frost: warm or dry) … 1.5; from 8 °C upwards 0
 * @example frostIndex(2, humidityRatioFromRelativeHumidity(2, 84, 101325), 101325) // 1
 *
 * Reference: MODEL section 7.
 */
export function frostIndex(temperature: number, ratio: number, pressure: number): number {
  const coil = temperature - COIL_DEPRESSION;
  if (coil >= 0) return 0;
  const settling = ratio - humidityRatio(saturationPressureOverIce(coil), pressure);
  if (settling <= 0) return 0;
  const staying = Math.min(-coil / FULL_FROST_DEPTH, 1);
  return Math.min((staying * settling) / referenceSettling(pressure), LARGEST_INDEX);
}

/** Difference of humidity ratio between reference air and its coil at the same pressure, kg/kg; above 0. */
function referenceSettling(pressure: number): number {
  return humidityRatio(REFERENCE_VAPOUR_PRESSURE, pressure) - humidityRatio(REFERENCE_COIL_PRESSURE, pressure);
}
