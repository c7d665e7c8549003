import { carnotCop } from './carnot.ts';
import type { PerformanceTable } from './performanceTable.ts';

/** How COP is read between the points of a map (MODEL section 6). */
export type MapInterpolation = 'carnotShare' | 'linear';

/**
 * One level of a unit, ready to be read: a full grid without gaps. `quality` is the share of κ that each point reaches,
 * η = COP/κ, or the COP itself where interpolation is linear.
 */
export interface HeatPumpMap {
  readonly outdoor: Float64Array;
  readonly flow: Float64Array;
  /** kW, row-major outdoor × flow. */
  readonly capacity: Float64Array;
  readonly quality: Float64Array;
  readonly linear: boolean;
}

/** Capacity lost per kelvin below the coldest row: at least this share of the capacity there, and never below the floor. */
const LEAST_COLD_SLOPE = 0.01;
const COLD_CAPACITY_FLOOR = 0.3;
/** κ sees at most so many kelvins above the warmest row. */
export const WARMEST_BEYOND = 5;
/** COP gained per kelvin below the lowest flow column, over at most so many kelvins (common practice, no source). */
export const LOW_FLOW_GAIN = 0.02;
export const LOW_FLOW_REACH = 10;

/**
 * Fills the gaps of a table along the outdoor axis and turns COP into its share of κ.
 *
 * @param table at least one flow column, each with at least two points of capacity and of COP
 * @param interpolation how COP is read between points
 * @returns the grid; a column with fewer than two points is refused by the loader before it comes here
 *
 * Reference: MODEL section 6.
 */
export function prepareMap(table: PerformanceTable, interpolation: MapInterpolation): HeatPumpMap {
  const { outdoor, flow } = table;
  const linear = interpolation === 'linear';
  const eta = table.cop.map((cop, at) =>
    cop === null
      ? null
      : cop / carnotCop(outdoor[Math.floor(at / flow.length)] as number, flow[at % flow.length] as number),
  );
  const filledEta = fillColumns(outdoor, flow.length, eta);
  const quality = linear
    ? filledEta.map((share, at) => {
        const cop = table.cop[at];
        const kappa = carnotCop(outdoor[Math.floor(at / flow.length)] as number, flow[at % flow.length] as number);
        return typeof cop === 'number' ? cop : share * kappa;
      })
    : filledEta;
  return {
    outdoor: Float64Array.from(outdoor),
    flow: Float64Array.from(flow),
    capacity: fillColumns(outdoor, flow.length, table.capacity),
    quality,
    linear,
  };
}

/** Interpolates the gaps of each flow column along the outdoor axis, its ends held. */
function fillColumns(outdoor: readonly number[], columns: number, values: readonly (number | null)[]): Float64Array {
  const filled = new Float64Array(values.length);
  for (let column = 0; column < columns; column++) {
    const known = outdoor.flatMap((at, row) => {
      const value = values[row * columns + column];
      return typeof value === 'number' ? [{ at, value }] : [];
    });
    for (let row = 0; row < outdoor.length; row++) {
      filled[row * columns + column] = interpolateHeld(known, outdoor[row] as number);
    }
  }
  return filled;
}

function interpolateHeld(known: readonly { at: number; value: number }[], x: number): number {
  const above = known.find((point) => point.at >= x);
  const below = known.findLast((point) => point.at <= x);
  if (above === undefined) return below?.value ?? 0;
  if (below === undefined || below.at === above.at) return above.value;
  return below.value + ((above.value - below.value) * (x - below.at)) / (above.at - below.at);
}

/**
 * Reads capacity and COP at a point, inside or outside the grid, into `out`.
 *
 * @param map a prepared level
 * @param outdoor outdoor temperature, °C, any finite number
 * @param flow flow temperature, °C, any finite number
 * @param out receives at `at` the capacity in kW and at `at + 1` the COP; nothing is allocated
 * @param at first index to write
 *
 * Inside: capacity and η bilinear, COP = η·κ. Outside: each coordinate held on its own; see the constants above.
 * Reference: MODEL section 6.
 */
export function readMap(map: HeatPumpMap, outdoor: number, flow: number, out: Float64Array, at: number): void {
  const rows = map.outdoor;
  const columns = map.flow;
  const lastRow = rows.length - 1;
  const lastColumn = columns.length - 1;
  const heldOutdoor = Math.min(Math.max(outdoor, rows[0] as number), rows[lastRow] as number);
  const heldFlow = Math.min(Math.max(flow, columns[0] as number), columns[lastColumn] as number);

  const row = cellOf(rows, heldOutdoor);
  const column = lastColumn === 0 ? 0 : cellOf(columns, heldFlow);
  const nextColumn = lastColumn === 0 ? 0 : column + 1;
  const rowA = row * (lastColumn + 1);
  const rowB = rowA + lastColumn + 1;
  const u = shareInCell(rows, row, heldOutdoor);
  const v = lastColumn === 0 ? 0 : shareInCell(columns, column, heldFlow);

  const { capacity, quality } = map;
  const capacityA = between(capacity[rowA + column], capacity[rowA + nextColumn], v);
  const capacityB = between(capacity[rowB + column], capacity[rowB + nextColumn], v);
  const qualityA = between(quality[rowA + column], quality[rowA + nextColumn], v);
  const qualityB = between(quality[rowB + column], quality[rowB + nextColumn], v);
  const held = between(qualityA, qualityB, u);

  let kW = between(capacityA, capacityB, u);
  if (outdoor < heldOutdoor) {
    kW = capacityInCold(capacityA, coldSlope(rows, capacityA, capacityB), heldOutdoor - outdoor);
  }

  const lowestFlow = columns[0] as number;
  const kappaOutdoor = Math.min(outdoor, (rows[lastRow] as number) + WARMEST_BEYOND);
  let cop = held * carnotCop(kappaOutdoor, Math.max(flow, lowestFlow));
  if (map.linear) cop /= carnotCop(heldOutdoor, heldFlow);
  if (flow < lowestFlow) cop *= lowFlowGain(lowestFlow - flow);
  out[at] = kW;
  out[at + 1] = cop;
}

/** Kilowatts lost per kelvin below the coldest row: the slope of the two coldest, at least 1 % of the capacity there. */
export function coldSlope(rows: Float64Array, coldest: number, next: number): number {
  return Math.max((next - coldest) / ((rows[1] as number) - (rows[0] as number)), LEAST_COLD_SLOPE * coldest);
}

/** Capacity so many kelvins below the coldest row, kW, from that at the row and the slope; at least 30 % of it. */
export function capacityInCold(coldest: number, slope: number, kelvins: number): number {
  return Math.max(coldest - kelvins * slope, COLD_CAPACITY_FLOOR * coldest);
}

/** Factor on the COP so many kelvins, 0 or above, below the lowest flow column. */
export function lowFlowGain(kelvins: number): number {
  return 1 + LOW_FLOW_GAIN * Math.min(kelvins, LOW_FLOW_REACH);
}

/** How far `x` lies in a cell of a rising axis: 0 at its beginning, 1 at its end. */
export function shareInCell(axis: Float64Array, cell: number, x: number): number {
  return (x - (axis[cell] as number)) / ((axis[cell + 1] as number) - (axis[cell] as number));
}

/** Value between two: the first at a share of 0, the second at 1. */
export function between(first: number, second: number, share: number): number {
  return (1 - share) * first + share * second;
}

/** Index of the cell of a rising axis of at least two entries that holds `x`; beyond the axis, the cell at its end. */
export function cellOf(axis: Float64Array, x: number): number {
  let cell = 0;
  const last = axis.length - 2;
  while (cell < last && x >= (axis[cell + 1] as number)) cell++;
  return cell;
}
