import { carnotCop } from '../carnot.ts';
import { between, cellOf, coldSlope, type HeatPumpMap, lowFlowGain, shareInCell } from '../heatPumpMap.ts';
import { type MapOnWeather, readHour, shareInFlowCell } from '../mapOnWeather.ts';
import type { Figures } from './figures.ts';
import { type ExplainedStage, explainedStage, type Finding, type StageName } from './stage.ts';

/** Where a map is read. */
export interface MapPoint {
  readonly i: number;
  readonly outdoor: number;
  readonly flow: number;
}

/** The cell of a map that holds a point: its corners as places of the map's columns, and how far the point lies in it. */
interface Cell {
  readonly row: number;
  readonly column: number;
  readonly nextColumn: number;
  readonly u: number;
  readonly v: number;
}

/**
 * How the map of one level is read at a point (MODEL section 6).
 *
 * @param stage under which name
 * @param laid the level on its weather
 * @param point hour, outdoor and flow temperature
 * @param before figures that show how the point was found
 */
export function mapStage(stage: StageName, laid: MapOnWeather, point: MapPoint, before: Figures): ExplainedStage {
  const { map } = laid;
  const { outdoor, flow } = point;
  const cell = cellAt(laid, point);
  const out = new Float64Array(2);
  readHour(laid, point.i, outdoor, flow, out, 0);
  const kappaFlow = Math.max(flow, map.flow[0]);
  const kappaOutdoor = laid.kappaOutdoor[point.i];
  const colder = outdoor < map.outdoor[0];
  const findings = findingsOf(map, point);
  return explainedStage(stage, {
    figures: {
      ...before,
      outdoorBelow: map.outdoor[cell.row],
      outdoorAbove: map.outdoor[cell.row + 1],
      flowBelow: map.flow[cell.column],
      ...(cell.nextColumn === cell.column ? {} : { flowAbove: map.flow[cell.nextColumn] }),
      ...capacityCorners(map, cell),
      ...qualityCorners(map, cell),
      outdoorShare: cell.u,
      flowShare: cell.v,
      ...(colder ? coldFigures(map, cell) : {}),
      mapCapacity: out[0],
      ...(map.linear ? { heldCop: qualityAt(laid, cell, point.i) } : { mapQuality: qualityAt(laid, cell, point.i) }),
      kappaOutdoor,
      kappaFlow,
      kappa: carnotCop(kappaOutdoor, kappaFlow),
      ...(map.linear ? { heldKappa: carnotCop(held(map.outdoor, outdoor), held(map.flow, flow)) } : {}),
      ...(flow < map.flow[0] ? { lowFlowGain: lowFlowGain(map.flow[0] - flow) } : {}),
      mapCop: out[1],
    },
    findings,
    formulas: [
      map.linear ? 'mapLinear' : 'mapInside',
      'kappa',
      colder && 'coldCapacity',
      flow < map.flow[0] && 'lowFlow',
    ],
  });
}

function held(axis: Float64Array, value: number): number {
  return Math.min(Math.max(value, axis[0]), axis[axis.length - 1]);
}

/** The cell as the simulation finds it: by the columns laid on the weather, or by the map itself where that is read. */
function cellAt(laid: MapOnWeather, { i, outdoor, flow }: MapPoint): Cell {
  const { map } = laid;
  const heldOutdoor = held(map.outdoor, outdoor);
  const row = cellOf(map.outdoor, heldOutdoor);
  const u = shareInCell(map.outdoor, row, heldOutdoor);
  if (map.flow.length === 1) return { row, column: 0, nextColumn: 0, u, v: 0 };
  const heldFlow = held(map.flow, flow);
  const column = cellOf(map.flow, heldFlow);
  const v = laid.direct[i] === 1 ? shareInCell(map.flow, column, heldFlow) : shareInFlowCell(laid, column, flow);
  return { row, column, nextColumn: column + 1, u, v };
}

/** Places of the corners: colder and lower, colder and higher, warmer and lower, warmer and higher. */
function cornersOf(map: HeatPumpMap, { row, column, nextColumn }: Cell): readonly [number, number, number, number] {
  const cold = row * map.flow.length;
  const warm = cold + map.flow.length;
  return [cold + column, cold + nextColumn, warm + column, warm + nextColumn];
}

function capacityCorners(map: HeatPumpMap, cell: Cell): Figures {
  const [coldLow, coldHigh, warmLow, warmHigh] = cornersOf(map, cell).map((at) => map.capacity[at]);
  if (cell.nextColumn === cell.column) return { capacityColdLow: coldLow, capacityWarmLow: warmLow };
  return {
    capacityColdLow: coldLow,
    capacityColdHigh: coldHigh,
    capacityWarmLow: warmLow,
    capacityWarmHigh: warmHigh,
  };
}

/** Shares of κ at the corners; COPs where the map is read linearly. */
function qualityCorners(map: HeatPumpMap, cell: Cell): Figures {
  const [coldLow, coldHigh, warmLow, warmHigh] = cornersOf(map, cell).map((at) => map.quality[at]);
  const single = cell.nextColumn === cell.column;
  if (map.linear) {
    return single
      ? { copColdLow: coldLow, copWarmLow: warmLow }
      : { copColdLow: coldLow, copColdHigh: coldHigh, copWarmLow: warmLow, copWarmHigh: warmHigh };
  }
  return single
    ? { qualityColdLow: coldLow, qualityWarmLow: warmLow }
    : { qualityColdLow: coldLow, qualityColdHigh: coldHigh, qualityWarmLow: warmLow, qualityWarmHigh: warmHigh };
}

/** What lies between the corners, in the order of the simulation. */
function qualityAt(laid: MapOnWeather, cell: Cell, i: number): number {
  const { quality } = laid.map;
  const [coldLow, coldHigh, warmLow, warmHigh] = cornersOf(laid.map, cell).map((at) => quality[at]);
  const { u, v } = cell;
  return laid.direct[i] === 1
    ? between(between(coldLow, coldHigh, v), between(warmLow, warmHigh, v), u)
    : between(between(coldLow, warmLow, u), between(coldHigh, warmHigh, u), v);
}

function coldFigures(map: HeatPumpMap, cell: Cell): Figures {
  const [coldLow, coldHigh, warmLow, warmHigh] = cornersOf(map, cell).map((at) => map.capacity[at]);
  const coldest = between(coldLow, coldHigh, cell.v);
  return {
    coldestCapacity: coldest,
    coldSlope: coldSlope(map.outdoor, coldest, between(warmLow, warmHigh, cell.v)),
  };
}

function findingsOf({ outdoor: rows, flow: columns }: HeatPumpMap, { outdoor, flow }: MapPoint): Finding[] {
  const outside: (Finding | false)[] = [
    outdoor < rows[0] && 'colderThanMap',
    outdoor > rows[rows.length - 1] && 'warmerThanMap',
    flow < columns[0] && 'belowLowestFlow',
    flow > columns[columns.length - 1] && 'hotterThanMap',
  ];
  const found = outside.filter((each) => each !== false);
  const first: Finding[] = found.length === 0 ? ['insideMap'] : found;
  return columns.length === 1 ? [...first, 'oneFlowColumn'] : first;
}
