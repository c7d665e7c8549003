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
  const coil = coilTemperature(temperature);
  if (coil >= 0) return 0;
  const settling = ratio - ratioOverIce(coil, pressure);
  if (settling <= 0) return 0;
  return Math.min((stayingShare(coil) * settling) / referenceSettling(pressure), LARGEST_INDEX);
}

/** Temperature of the outdoor coil, °C, for air of a temperature in °C. */
export function coilTemperature(temperature: number): number {
  return temperature - COIL_DEPRESSION;
}

/** Humidity ratio of air saturated over ice of a temperature in °C, at most 0, at a pressure in Pa, kg/kg. */
export function ratioOverIce(temperature: number, pressure: number): number {
  return humidityRatio(saturationPressureOverIce(temperature), pressure);
}

/** Share of the settling water that stays as frost on a coil of a temperature in °C, at most 0; 0 … 1. */
export function stayingShare(coil: number): number {
  return Math.min(-coil / FULL_FROST_DEPTH, 1);
}

/** Difference of humidity ratio between reference air and its coil at the same pressure, kg/kg; above 0. */
export function referenceSettling(pressure: number): number {
  return humidityRatio(REFERENCE_VAPOUR_PRESSURE, pressure) - humidityRatio(REFERENCE_COIL_PRESSURE, pressure);
}
