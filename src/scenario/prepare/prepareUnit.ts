import type { Polyline } from '../../core/polyline.ts';
import { type HeatPumpMap, prepareMap } from '../../sim/heatPumpMap.ts';
import type { Cycling, Defrost, HeatPumpUnit, LowestLevel } from '../../sim/unit.ts';
import type { LoadedUnit } from '../loadUnit.ts';
import type { Unit } from '../unitSchema.ts';

/** A unit's maps, limits and powers, ready to be laid on a weather series; W become kW. */
export function prepareUnit({ unit, fullLoad, lowestLevel }: LoadedUnit): HeatPumpUnit {
  const { interpolation } = unit.map;
  const full = prepareMap(fullLoad, interpolation);
  const lowestMap = lowestLevel === undefined ? undefined : prepareMap(lowestLevel, interpolation);
  return {
    full,
    lowest: lowestOf(unit, lowestMap),
    defrost: defrostOf(unit.defrost),
    cycling: cyclingOf(unit.cycling),
    lowestOutdoorTemperature: unit.limits.lowestOutdoorTemperature ?? Number.NEGATIVE_INFINITY,
    highestFlow: highestFlowOf(unit, full),
    standbyPower: unit.standbyPower / 1000,
    crankcasePower: unit.crankcase.power / 1000,
    crankcaseBelow: unit.crankcase.belowTemperature ?? Number.POSITIVE_INFINITY,
  };
}

function lowestOf(unit: Unit, map: HeatPumpMap | undefined): LowestLevel {
  const { lowestLevel } = unit.map;
  if (lowestLevel.given === 'share') {
    return { given: 'share', capacity: lowestLevel.capacity, cop: lowestLevel.cop };
  }
  // the loader refuses a table that it could not read, so there is a map here
  return map === undefined ? { given: 'share', capacity: 1, cop: 1 } : { given: 'table', map };
}

function defrostOf(defrost: Unit['defrost']): Defrost {
  if (defrost.method !== 'table') return defrost;
  return { method: 'table', capacity: polylineOf(defrost.capacity), cop: polylineOf(defrost.cop) };
}

function cyclingOf(cycling: Unit['cycling']): Cycling {
  return cycling.method === 'offPower' ? { method: 'offPower', power: cycling.power / 1000 } : cycling;
}

/** The unit's own limit, else the highest flow of its map (MODEL section 6). */
function highestFlowOf(unit: Unit, full: HeatPumpMap): Polyline {
  const { highestFlow } = unit.limits;
  if (highestFlow === undefined) return { at: [0], value: [full.flow[full.flow.length - 1]] };
  return typeof highestFlow === 'number' ? { at: [0], value: [highestFlow] } : polylineOf(highestFlow);
}

/** [x, y] pairs as a polyline. */
export function polylineOf(points: readonly (readonly [number, number])[]): Polyline {
  return { at: points.map(([x]) => x), value: points.map(([, y]) => y) };
}
