import { clamp } from './plainCase.ts';

/** ASHRAE Fundamentals ch. 1 eq. 5: saturation pressure over ice, Pa, at t °C. */
export function saturationOverIce(t: number): number {
  const T = t + 273.15;
  return Math.exp(
    -5.6745359e3 / T +
      6.3925247 -
      9.677843e-3 * T +
      6.2215701e-7 * T ** 2 +
      2.0747825e-9 * T ** 3 -
      9.484024e-13 * T ** 4 +
      4.1635019 * Math.log(T),
  );
}

/** ASHRAE Fundamentals ch. 1 eq. 6: saturation pressure over liquid water, Pa, at t °C. */
export function saturationOverWater(t: number): number {
  const T = t + 273.15;
  return Math.exp(
    -5.8002206e3 / T +
      1.3914993 -
      4.8640239e-2 * T +
      4.1764768e-5 * T ** 2 -
      1.4452093e-8 * T ** 3 +
      6.5459673 * Math.log(T),
  );
}

/** MODEL section 3: w = 0.621945·pv/(p − pv). */
export function humidityRatio(vapourPressure: number, pressure: number): number {
  return (0.621945 * vapourPressure) / (pressure - vapourPressure);
}

/** MODEL section 7, `humidity`: φ of one hour; outdoor °C, humidity ratio kg/kg, pressure Pa. */
export function frostIndexOf(outdoor: number, w: number, pressure: number): number {
  const excess = (t: number, ratio: number) => Math.max(0, ratio - humidityRatio(saturationOverIce(t - 8), pressure));
  const reference = excess(2, humidityRatio(0.84 * saturationOverWater(2), pressure));
  const coil = outdoor - 8;
  return Math.min(1.5, (clamp(-coil / 6, 0, 1) * excess(outdoor, w)) / reference);
}
