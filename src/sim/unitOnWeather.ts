import { polylineAt } from '../core/polyline.ts';
import type { PreparedWeather } from '../weather/series.ts';
import { layMapOnWeather, type MapOnWeather } from './mapOnWeather.ts';
import type { Defrost, HeatPumpUnit } from './unit.ts';

/** What follows from a unit and a weather series alone, by hour: made once for both, used by every run of them. */
export interface UnitOnWeather {
  readonly unit: HeatPumpUnit;
  readonly full: MapOnWeather;
  /** The lowest level where it has a table of its own. */
  readonly lowest: MapOnWeather | null;
  /** Share of capacity and of COP lost to frost at full load. */
  readonly capacityLoss: Float64Array;
  readonly copLoss: Float64Array;
  /** Whether at the lowest level the loss shrinks with the level (`humidity`), or is the same (`table`). */
  readonly lossFollowsLevel: boolean;
  /** Highest flow temperature, °C. */
  readonly highestFlow: Float64Array;
  /** 1 where it is too cold for the unit to run. */
  readonly tooCold: Uint8Array;
}

/** Frost takes at most half of capacity or COP. */
const MOST_FROST_LOSS = 0.5;

/**
 * Lays a unit on a weather series.
 *
 * @returns columns of `weather.hours` entries
 *
 * Reference: MODEL sections 6 (envelope) and 7 (defrost).
 */
export function layUnitOnWeather(unit: HeatPumpUnit, weather: PreparedWeather): UnitOnWeather {
  const { hours, temperature } = weather;
  const highestFlow = new Float64Array(hours);
  const tooCold = new Uint8Array(hours);
  for (let i = 0; i < hours; i++) {
    const outdoor = temperature[i] as number;
    highestFlow[i] = polylineAt(unit.highestFlow, outdoor);
    tooCold[i] = outdoor < unit.lowestOutdoorTemperature ? 1 : 0;
  }
  return {
    unit,
    full: layMapOnWeather(unit.full, weather),
    lowest: unit.lowest.given === 'table' ? layMapOnWeather(unit.lowest.map, weather) : null,
    ...frostLosses(unit.defrost, weather),
    lossFollowsLevel: unit.defrost.method === 'humidity',
    highestFlow,
    tooCold,
  };
}

function frostLosses(defrost: Defrost, weather: PreparedWeather) {
  const { hours, temperature, frostIndex } = weather;
  const capacityLoss = new Float64Array(hours);
  const copLoss = new Float64Array(hours);
  if (defrost.method === 'humidity') {
    for (let i = 0; i < hours; i++) {
      capacityLoss[i] = Math.min(defrost.capacityLoss * (frostIndex[i] as number), MOST_FROST_LOSS);
      copLoss[i] = Math.min(defrost.copLoss * (frostIndex[i] as number), MOST_FROST_LOSS);
    }
  }
  if (defrost.method === 'table') {
    for (let i = 0; i < hours; i++) {
      capacityLoss[i] = 1 - polylineAt(defrost.capacity, temperature[i] as number);
      copLoss[i] = 1 - polylineAt(defrost.cop, temperature[i] as number);
    }
  }
  return { capacityLoss, copLoss };
}
