import { AT } from '../../sim/hourScratch.ts';
import { readLevels } from '../../sim/levels.ts';
import type { DeclaredPoint } from '../../sim/season/declaredSeason.ts';
import type { OutletPoints } from '../../sim/season/outletTemperature.ts';
import { partLoadRatio } from '../../sim/season/seasonCase.ts';
import type { HeatPumpUnit } from '../../sim/unit.ts';
import { layUnitOnWeather } from '../../sim/unitOnWeather.ts';
import { prepareWeather } from '../../weather/prepareWeather.ts';
import { type SeasonName, standardSeasons } from '../../weather/seasonBins.ts';
import { outletHeld } from './outletsOf.ts';

/** Relative humidity at which the frost of a season is found, %, as for the season itself. Reference: MODEL section 14. */
const SEASON_HUMIDITY = 85;

/** A declared point beside what the map says of it. */
export interface PointBesideMap {
  readonly outdoor: number;
  readonly outlet: number;
  /** Part load, kW. */
  readonly load: number;
  readonly declared: DeclaredPoint;
  /** Capacity at which the map meets the part load, or comes nearest to it, kW; COP there while the compressor runs. */
  readonly map: { readonly capacity: number; readonly cop: number };
  /** Declared over map, less one. */
  readonly capacityDeviation: number;
  readonly copDeviation: number;
}

/**
 * Declared points held against the map at the same outdoor and outlet temperature and part load.
 *
 * @param points at least one, each temperature once
 * @param rating climate, design load in kW, and outlet temperatures of the season
 * @param unit the prepared unit
 * @returns one entry a point, from the coldest up; without any loss by cycling, which a declared COP does not hold either
 *
 * Reference: EN 14825; MODEL sections 6, 7, 9 and 14.
 */
export function mapAtPoints(
  points: readonly DeclaredPoint[],
  rating: { climate: SeasonName; designLoad: number; outlets: OutletPoints },
  unit: HeatPumpUnit,
): PointBesideMap[] {
  const sorted = points.toSorted((a, b) => a.outdoor - b.outdoor);
  const temperature = Float64Array.from(sorted, ({ outdoor }) => outdoor);
  const weather = prepareWeather(
    { hours: temperature.length, offsetMinutes: 0, temperature },
    { altitude: 0, defaultRelativeHumidity: SEASON_HUMIDITY },
  );
  const onWeather = layUnitOnWeather(unit, weather);
  const hour = new Float64Array(AT.size);
  const design = standardSeasons[rating.climate].designTemperature;
  return sorted.map((declared, i) => {
    const { outdoor } = declared;
    const outlet = outletHeld(rating.outlets, outdoor);
    const load = rating.designLoad * partLoadRatio(outdoor, design);
    readLevels(onWeather, i, outdoor, Math.min(outlet, onWeather.highestFlow[i]), hour);
    const map = runningAt(load, hour);
    const capacityDeviation = declared.capacity / map.capacity - 1;
    return { outdoor, outlet, load, declared, map, capacityDeviation, copDeviation: declared.cop / map.cop - 1 };
  });
}

/** The level nearest to a load between the lowest and full load, and the COP there. */
function runningAt(load: number, hour: Float64Array): { capacity: number; cop: number } {
  const full = hour[AT.capacity];
  const least = hour[AT.lowestCapacity];
  if (least >= full || load >= full) return { capacity: full, cop: hour[AT.cop] };
  const capacity = Math.max(load, least);
  const leastCop = hour[AT.lowestCop];
  return { capacity, cop: leastCop + ((hour[AT.cop] - leastCop) * (capacity - least)) / (full - least) };
}
