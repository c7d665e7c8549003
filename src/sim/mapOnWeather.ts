import type { PreparedWeather } from '../weather/series.ts';
import { CONDENSING_OFFSET, LEAST_LIFT, LIFT_OFFSET } from './carnot.ts';
import { between, cellOf, type HeatPumpMap, lowFlowGain, readMap, shareInCell, WARMEST_BEYOND } from './heatPumpMap.ts';

/**
 * A map laid on a weather series: the outdoor axis is read once an hour and for all flow columns, so that a run only
 * reads along the flow axis. Where that would not be the same as reading the map itself (colder than its coldest row, or
 * linear COP), the map is read.
 */
export interface MapOnWeather {
  readonly map: HeatPumpMap;
  /** Flow axis, °C, at least two entries: a single column stands twice. */
  readonly flow: Float64Array;
  /** 1 / width of each cell of the flow axis; 0 where a single column stands twice. */
  readonly perCell: Float64Array;
  /** Per hour and flow column: capacity in kW and share of κ. */
  readonly values: Float64Array;
  /** Outdoor temperature that κ sees, °C. */
  readonly kappaOutdoor: Float64Array;
  /** 1 in hours that are read from the map itself. */
  readonly direct: Uint8Array;
}

/**
 * Lays a map on a weather series.
 *
 * @returns columns for each hour and flow column; made once for a map and a weather, used by every run of both
 */
export function layMapOnWeather(map: HeatPumpMap, weather: PreparedWeather): MapOnWeather {
  const { hours, temperature } = weather;
  const single = map.flow.length === 1;
  const flow = single ? Float64Array.of(map.flow[0], map.flow[0]) : map.flow;
  const columns = flow.length;
  const values = new Float64Array(hours * columns * 2);
  const kappaOutdoor = new Float64Array(hours);
  const direct = new Uint8Array(hours);
  const coldest = map.outdoor[0];
  const warmest = map.outdoor[map.outdoor.length - 1];
  for (let i = 0; i < hours; i++) {
    const outdoor = temperature[i];
    kappaOutdoor[i] = Math.min(outdoor, warmest + WARMEST_BEYOND);
    direct[i] = map.linear || outdoor < coldest ? 1 : 0;
    layHour(map, Math.min(Math.max(outdoor, coldest), warmest), values, i * columns * 2);
    if (single) values.copyWithin((i * columns + 1) * 2, i * columns * 2, i * columns * 2 + 2);
  }
  const perCell = Float64Array.from({ length: columns - 1 }, (_, j) => (single ? 0 : 1 / (flow[j + 1] - flow[j])));
  return { map, flow, perCell, values, kappaOutdoor, direct };
}

/** Capacity and share of κ of all flow columns at an outdoor temperature on the axis. */
function layHour(map: HeatPumpMap, outdoor: number, values: Float64Array, at: number): void {
  const { outdoor: rows, flow, capacity, quality } = map;
  const row = cellOf(rows, outdoor);
  const u = shareInCell(rows, row, outdoor);
  for (let column = 0; column < flow.length; column++) {
    const a = row * flow.length + column;
    const b = a + flow.length;
    values[at + 2 * column] = between(capacity[a], capacity[b], u);
    values[at + 2 * column + 1] = between(quality[a], quality[b], u);
  }
}

/**
 * Reads capacity and COP of an hour at a flow temperature; the same figures as `readMap` at the hour's outdoor temperature.
 *
 * @param laid the map on its weather
 * @param i hour
 * @param outdoor the hour's outdoor temperature, °C
 * @param flow flow temperature, °C
 * @param out receives at `at` the capacity in kW and at `at + 1` the COP
 * @param at first index to write
 *
 * Reference: MODEL section 6.
 */
export function readHour(
  laid: MapOnWeather,
  i: number,
  outdoor: number,
  flow: number,
  out: Float64Array,
  at: number,
): void {
  if (laid.direct[i] === 1) {
    readMap(laid.map, outdoor, flow, out, at);
    return;
  }
  const axis = laid.flow;
  const cell = cellOf(axis, flow);
  const v = shareInFlowCell(laid, cell, flow);
  const values = laid.values;
  const a = (i * axis.length + cell) * 2;
  const lowest = axis[0];
  const kappaFlow = Math.max(flow, lowest);
  const kappa = (kappaFlow + CONDENSING_OFFSET) / Math.max(kappaFlow - laid.kappaOutdoor[i] + LIFT_OFFSET, LEAST_LIFT);
  const gain = lowFlowGain(kappaFlow - flow);
  out[at] = between(values[a], values[a + 2], v);
  out[at + 1] = between(values[a + 1], values[a + 3], v) * kappa * gain;
}

/** How far a flow lies in a cell of the flow axis, 0 … 1; held at its ends. */
export function shareInFlowCell(laid: MapOnWeather, cell: number, flow: number): number {
  return Math.min(Math.max((flow - laid.flow[cell]) * laid.perCell[cell], 0), 1);
}
