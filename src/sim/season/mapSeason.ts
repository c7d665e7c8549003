import { prepareWeather } from '../../weather/prepareWeather.ts';
import { standardSeasons } from '../../weather/seasonBins.ts';
import { AT } from '../hourScratch.ts';
import { readLevels } from '../levels.ts';
import type { HeatPumpUnit } from '../unit.ts';
import { layUnitOnWeather } from '../unitOnWeather.ts';
import { type OutletPoints, outletTemperature } from './outletTemperature.ts';
import { type BinPerformance, type SeasonResult, seasonalSum } from './seasonalSum.ts';
import { cyclingCop, type SeasonCase } from './seasonCase.ts';

/** Relative humidity at which the frost of a season is found, %. Reference: MODEL section 14. */
const SEASON_HUMIDITY = 85;

/**
 * Season from the entered map: every bin at its outlet temperature and part load.
 *
 * @param seasonCase climate, design load, idle powers
 * @param unit the prepared unit with its map and frost setting
 * @param outlets outlet temperatures of the season and application
 * @param degradation C_c below the lowest level (default 0.9)
 * @returns the season
 *
 * Reference: EN 14825; MODEL section 14 with sections 6, 7 and 9.
 */
export function mapSeason(
  seasonCase: SeasonCase,
  unit: HeatPumpUnit,
  outlets: OutletPoints,
  degradation: number,
): SeasonResult {
  const temperature = Float64Array.from(standardSeasons[seasonCase.season].bins, (bin) => bin.temperature);
  const weather = prepareWeather(
    { hours: temperature.length, offsetMinutes: 0, temperature },
    { altitude: 0, defaultRelativeHumidity: SEASON_HUMIDITY },
  );
  const onWeather = layUnitOnWeather(unit, weather);
  const hour = new Float64Array(AT.size);
  return seasonalSum(seasonCase, (outdoor, load): BinPerformance => {
    const bin = temperature.indexOf(outdoor);
    const flow = Math.min(outletTemperature(outlets, outdoor), onWeather.highestFlow[bin]);
    readLevels(onWeather, bin, outdoor, flow, hour);
    return { capacity: hour[AT.capacity], cop: copAtRate(hour, Math.min(load, hour[AT.capacity]), degradation) };
  });
}

/** COP at a rate: linear between the lowest level and full load, cycling below. */
function copAtRate(hour: Float64Array, rate: number, degradation: number): number {
  const full = hour[AT.capacity];
  const singleSpeed = hour[AT.lowestCapacity] >= full;
  const least = singleSpeed ? full : hour[AT.lowestCapacity];
  const leastCop = singleSpeed ? hour[AT.cop] : hour[AT.lowestCop];
  if (rate < least) return cyclingCop(leastCop, rate / least, degradation);
  return singleSpeed ? leastCop : leastCop + ((hour[AT.cop] - leastCop) * (rate - least)) / (full - least);
}
