import { lineAt, type PlainCase, type PlainUnit } from './plainCase.ts';
import { frostIndexOf } from './plainFrost.ts';
import { type FilledTable, filled, mapAt } from './plainMap.ts';

/** A unit with its tables filled. */
export interface PlainMaps {
  readonly full: FilledTable;
  readonly lowest: FilledTable | null;
}

export function mapsOf(unit: PlainUnit): PlainMaps {
  return {
    full: filled(unit.full),
    lowest: unit.lowest.kind === 'table' ? filled(unit.lowest.table) : null,
  };
}

/** Capacity (kW) and COP of both levels after frost loss and allowance. */
export interface PlainLevels {
  readonly C: number;
  readonly cop: number;
  readonly Cmin: number;
  readonly copMin: number;
}

/** MODEL sections 6, 7 and 9 (lowest level, allowance): both levels in hour i at a flow temperature, °C. */
export function levelsAt({ unit, weather }: PlainCase, maps: PlainMaps, i: number, flow: number): PlainLevels {
  const outdoor = weather.temperature[i];
  const full = mapAt(maps.full, outdoor, flow, unit.linear);
  const lowest =
    unit.lowest.kind === 'share'
      ? { capacity: unit.lowest.capacity * full.capacity, cop: unit.lowest.cop * full.cop }
      : mapAt(maps.lowest ?? maps.full, outdoor, flow, unit.linear);

  let capacityFactor = 1;
  let copFactor = 1;
  let lowestCapacityFactor = 1;
  let lowestCopFactor = 1;
  if (unit.defrost.kind === 'humidity') {
    const phi = frostIndexOf(outdoor, weather.humidityRatio[i], weather.pressure[i]);
    const capacityLoss = Math.min(0.5, unit.defrost.capacityLoss * phi);
    const copLoss = Math.min(0.5, unit.defrost.copLoss * phi);
    const lessCold = lowest.capacity / full.capacity;
    capacityFactor = 1 - capacityLoss;
    copFactor = 1 - copLoss;
    lowestCapacityFactor = 1 - capacityLoss * lessCold;
    lowestCopFactor = 1 - copLoss * lessCold;
  } else if (unit.defrost.kind === 'table') {
    capacityFactor = lineAt(unit.defrost.capacity, outdoor);
    copFactor = lineAt(unit.defrost.cop, outdoor);
    lowestCapacityFactor = capacityFactor;
    lowestCopFactor = copFactor;
  }
  const inUse = 1 - unit.allowance;
  return {
    C: full.capacity * capacityFactor,
    cop: full.cop * copFactor * inUse,
    Cmin: lowest.capacity * lowestCapacityFactor,
    copMin: lowest.cop * lowestCopFactor * inUse,
  };
}

/** MODEL section 6, envelope: highest flow of the unit in hour i, °C. */
export function highestFlowAt({ unit, weather }: PlainCase, i: number): number {
  if (unit.highestFlow !== null) return lineAt(unit.highestFlow, weather.temperature[i]);
  return unit.full.flow[unit.full.flow.length - 1];
}

/** MODEL sections 6 and 10: whether the heat pump rests in hour i, too cold or by an alternative backup. */
export function isResting({ unit, weather, backup }: PlainCase, i: number): boolean {
  const outdoor = weather.temperature[i];
  const tooCold = unit.lowestOutdoor !== null && outdoor < unit.lowestOutdoor;
  return tooCold || (backup.mode.kind === 'alternative' && outdoor < backup.mode.switchTemperature);
}

/** MODEL section 9, starts: water content that a cycle works on, L. */
export function cycleWaterOf(unit: PlainUnit, maps: PlainMaps): number {
  if (unit.cycleWater !== null) return unit.cycleWater;
  const table = maps.lowest ?? maps.full;
  let nearest = 0;
  for (let row = 1; row < table.outdoor.length; row++) {
    if (Math.abs(table.outdoor[row] - 7) < Math.abs(table.outdoor[nearest] - 7)) nearest = row;
  }
  const share = unit.lowest.kind === 'share' ? unit.lowest.capacity : 1;
  return Math.max(100, 20 * share * table.capacity[nearest][0]);
}
