import { type HeatPumpMap, readMap } from '../../sim/heatPumpMap.ts';
import type { Field } from '../charts/contourLines.ts';

/** Values of COP that have a line. */
export const COP_LEVELS = [1.5, 2, 2.5, 3, 3.5, 4, 4.5, 5, 6, 7, 8];

/**
 * COP of a map, kelvin by kelvin.
 *
 * @param map a prepared level
 * @param outdoor range of outdoor temperatures, whole °C
 * @param flow range of flow temperatures, whole °C
 */
export function copField(
  map: HeatPumpMap,
  [west, east]: readonly [number, number],
  [south, north]: readonly [number, number],
): Field {
  const x = Array.from({ length: east - west + 1 }, (_, i) => west + i);
  const y = Array.from({ length: north - south + 1 }, (_, i) => south + i);
  const point = new Float64Array(2);
  const values = y.flatMap((flow) =>
    x.map((outdoor) => {
      readMap(map, outdoor, flow, point, 0);
      return point[1];
    }),
  );
  return { x, y, values };
}

/**
 * The least range of whole fives that holds all values.
 *
 * @example wholeFives([-7, 12]) // [-10, 15]
 */
export function wholeFives(values: readonly number[]): [number, number] {
  return [5 * Math.floor(Math.min(...values) / 5), 5 * Math.ceil(Math.max(...values) / 5)];
}
