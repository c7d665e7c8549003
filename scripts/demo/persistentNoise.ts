import { HOURS_PER_DAY } from '../../src/core/constants.ts';
import type { Draws } from './seededDraws.ts';

/**
 * First-order autoregressive noise of mean about 0 and standard deviation about 1, whose end joins its beginning.
 *
 * @param draws where the noise comes from; `length` normal draws are used
 * @param length number of steps, at least some 50, so that the start is forgotten within one turn
 * @param persistence correlation of a step with the one before, 0 ≤ persistence < 1
 * @returns one value a step
 *
 * Reference: G. E. P. Box, G. M. Jenkins, Time Series Analysis, AR(1).
 */
export function persistentNoise(draws: Draws, length: number, persistence: number): Float64Array {
  const shocks = Float64Array.from({ length }, () => draws.normal());
  const scale = Math.sqrt(1 - persistence * persistence);
  const noise = new Float64Array(length);
  let state = 0;
  // Two turns over the same shocks: the second begins where the first ended, so that the year is periodic.
  for (let step = 0; step < 2 * length; step++) {
    state = persistence * state + scale * shocks[step % length];
    noise[step % length] = state;
  }
  return noise;
}

/**
 * Hourly values on a smooth periodic curve through daily ones, each standing at the noon of its day (Catmull–Rom).
 *
 * @param daily one value a day, at least four
 * @returns 24 values a day, in the same unit, each at the middle of its hour
 *
 * Reference: E. Catmull, R. Rom, A class of local interpolating splines (1974), uniform, tension 1/2.
 */
export function smoothHours(daily: Float64Array): Float64Array {
  const days = daily.length;
  const at = (day: number) => daily[(day + days) % days];
  return Float64Array.from({ length: days * HOURS_PER_DAY }, (_, hour) => {
    const position = (hour + 0.5) / HOURS_PER_DAY - 0.5 + days;
    const day = Math.floor(position);
    const t = position - day;
    const [a, b, c, d] = [at(day - 1 - days), at(day - days), at(day + 1 - days), at(day + 2 - days)];
    return b + 0.5 * t * (c - a + t * (2 * a - 5 * b + 4 * c - d + t * (3 * (b - c) + d - a)));
  });
}
