import { polylineAt } from '../../core/polyline.ts';
import { MARK } from '../../sim/columns.ts';
import { marksOfPoint } from '../../sim/mapMarks.ts';
import { mapSeason } from '../../sim/season/mapSeason.ts';
import type { OutletPoints } from '../../sim/season/outletTemperature.ts';
import type { SeasonCase } from '../../sim/season/seasonCase.ts';
import type { HeatPumpUnit } from '../../sim/unit.ts';
import { standardSeasons } from '../../weather/seasonBins.ts';
import { outletHeld } from './outletsOf.ts';
import type { MapRating } from './seasonAnswer.ts';

/**
 * Rates a map in one season, and counts the hours in which it had to be extended.
 *
 * @param seasonCase climate, design load, idle powers
 * @param unit the prepared unit
 * @param outlets outlet temperatures of the season
 * @param degradation C_c below the lowest level
 * @returns the rating; the unit runs at no outdoor temperature below its own limit, whatever the label says
 */
export function rateMap(
  seasonCase: SeasonCase,
  unit: HeatPumpUnit,
  outlets: OutletPoints,
  degradation: number,
): MapRating {
  const operatingLimit = Math.max(seasonCase.operatingLimit, unit.lowestOutdoorTemperature);
  const limited = { ...seasonCase, operatingLimit };
  const hours = { outsideMap: 0, belowLowestFlow: 0, aboveHighestFlow: 0 };
  for (const bin of standardSeasons[seasonCase.season].bins) {
    if (bin.temperature < operatingLimit) continue;
    const outlet = outletHeld(outlets, bin.temperature);
    const highest = polylineAt(unit.highestFlow, bin.temperature);
    const marks = marksOfPoint(unit.full, bin.temperature, Math.min(outlet, highest));
    if ((marks & MARK.outsideMap) !== 0) hours.outsideMap += bin.hours;
    if ((marks & MARK.belowLowestFlow) !== 0) hours.belowLowestFlow += bin.hours;
    if (outlet > highest) hours.aboveHighestFlow += bin.hours;
  }
  return { seasonCase: limited, outlets, degradation, hours, result: mapSeason(limited, unit, outlets, degradation) };
}
