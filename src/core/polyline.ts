/** Points of a polyline: `at` strictly rising, `value` of the same length; at least one point. */
export interface Polyline {
  readonly at: readonly number[];
  readonly value: readonly number[];
}

/**
 * Value of a polyline, its ends held (MODEL: 'held' means clamped to the nearest end).
 *
 * @param line at least one point, `at` strictly rising
 * @param x any finite number, in the unit of `at`
 * @returns the interpolated value, in the unit of `value`
 * @example polylineAt({ at: [0, 10], value: [50, 30] }, 5) // 40
 */
export function polylineAt(line: Polyline, x: number): number {
  const { at, value } = line;
  const last = at.length - 1;
  if (x <= (at[0] as number)) return value[0] as number;
  if (x >= (at[last] as number)) return value[last] as number;
  let i = 1;
  while (x > (at[i] as number)) i++;
  const x0 = at[i - 1] as number;
  const x1 = at[i] as number;
  const y0 = value[i - 1] as number;
  const y1 = value[i] as number;
  return y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
}
