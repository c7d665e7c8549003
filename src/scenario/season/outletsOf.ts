import { type OutletPoints, outletPoints, outletTemperature } from '../../sim/season/outletTemperature.ts';
import type { Application } from '../../sim/season/seasonCase.ts';
import { type SeasonName, standardSeasons } from '../../weather/seasonBins.ts';
import type { Label } from '../labelSchema.ts';

/** Climates and applications of the label, in the order in which they are listed. */
export const CLIMATES: readonly SeasonName[] = ['average', 'warmer', 'colder'];
export const APPLICATIONS: readonly Application[] = [35, 45, 55, 65];

/**
 * Outlet temperatures of a climate and application: those that the unit file enters, else the published ones.
 *
 * @param label the label section of the unit file, if it has one
 * @returns the points from the design temperature up, there the application's own; undefined where none are known
 *
 * Reference: MODEL section 14.
 */
export function outletsOf(
  label: Label | undefined,
  climate: SeasonName,
  application: Application,
): OutletPoints | undefined {
  const entered = label?.outlets.find((each) => each.climate === climate && each.application === application);
  if (entered === undefined) return outletPoints(climate, application);
  const design = standardSeasons[climate].designTemperature;
  return [[design, application], ...entered.points.filter(([outdoor]) => outdoor > design)];
}

/**
 * Outlet temperature at any outdoor temperature: below the coldest point, which is the design temperature, it is held.
 *
 * @param outlets at least two points
 * @param outdoor °C
 * @returns °C
 * @example outletHeld([[-10, 35], [-7, 34]], -22) // 35
 */
export function outletHeld(outlets: OutletPoints, outdoor: number): number {
  return outletTemperature(outlets, Math.max(outdoor, outlets[0][0]));
}

/** Climates and applications whose outlet temperatures are kept here, in words. */
export function knownOutlets(): string {
  return CLIMATES.map((climate) => {
    const known = APPLICATIONS.filter((application) => outletPoints(climate, application) !== undefined);
    return `${climate} ${known.join(', ')} °C`;
  }).join('; ');
}
