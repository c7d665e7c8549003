import { MARK } from './columns.ts';
import type { HeatPumpMap } from './heatPumpMap.ts';

/** Points so near to the edge of the grid count as on it, K: rounding only. */
export const ON_THE_EDGE = 1e-9;

/**
 * How a point lies to the grid of a map.
 *
 * @param map the full-load level
 * @param outdoor °C
 * @param flow °C
 * @returns bits of MARK: outside the map, below its lowest flow, both, or 0
 *
 * Reference: MODEL section 6, hours outside the grid.
 */
export function marksOfPoint(map: HeatPumpMap, outdoor: number, flow: number): number {
  const { outdoor: rows, flow: columns } = map;
  const outside =
    outdoor < rows[0] - ON_THE_EDGE ||
    outdoor > rows[rows.length - 1] + ON_THE_EDGE ||
    flow > columns[columns.length - 1] + ON_THE_EDGE;
  const below = flow < columns[0] - ON_THE_EDGE;
  return (outside ? MARK.outsideMap : 0) | (below ? MARK.belowLowestFlow : 0);
}
