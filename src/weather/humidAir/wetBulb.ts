import { humidityRatio } from './humidityRatio.ts';
import { saturationPressureOverIce, saturationPressureOverWater } from './saturationPressure.ts';

/** Range of the saturation pressures that the psychrometer equations stand on, °C. */
const COLDEST = -100;
const WARMEST = 200;

/**
 * Humidity ratio from the wet bulb by the psychrometer equations, with ice on the bulb below 0 °C.
 *
 * @param temperature dry bulb, °C, −100 … 200; held at these ends
 * @param wetBulb °C; above the dry bulb (by rounding of the two) it is held there; so low that the air would hold less
 *   than no water, the air is dry
 * @param pressure air pressure, Pa
 * @returns kg water per kg dry air, at least 0
 * @example humidityRatioFromWetBulb(7, 6, 101325) // 0.005386
 *
 * Reference: ASHRAE Handbook Fundamentals, chapter 1, equations 33 (water) and 35 (ice). MODEL section 3.
 */
export function humidityRatioFromWetBulb(temperature: number, wetBulb: number, pressure: number): number {
  const dry = Math.min(Math.max(temperature, COLDEST), WARMEST);
  const bulb = Math.min(Math.max(wetBulb, COLDEST), dry);
  const ratio = bulb < 0 ? overIce(dry, bulb, pressure) : overWater(dry, bulb, pressure);
  return Math.max(0, ratio);
}

function overWater(dry: number, bulb: number, pressure: number): number {
  const saturated = humidityRatio(saturationPressureOverWater(bulb), pressure);
  return ((2501 - 2.326 * bulb) * saturated - 1.006 * (dry - bulb)) / (2501 + 1.86 * dry - 4.186 * bulb);
}

function overIce(dry: number, bulb: number, pressure: number): number {
  const saturated = humidityRatio(saturationPressureOverIce(bulb), pressure);
  return ((2830 - 0.24 * bulb) * saturated - 1.006 * (dry - bulb)) / (2830 + 1.86 * dry - 2.1 * bulb);
}
