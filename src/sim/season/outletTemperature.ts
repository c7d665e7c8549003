import { type SeasonName, standardSeasons } from '../../weather/seasonBins.ts';
import type { Application } from './seasonCase.ts';

/** Outlet temperatures with a variable outlet at the points of a season: [outdoor °C, outlet °C], the coldest first. */
export type OutletPoints = readonly (readonly [outdoor: number, outlet: number])[];

/**
 * Published outlet temperatures; at the design temperature it is the application's own.
 *
 * Reference: EN 14825, variable outlet (from memory); 52 °C at −7 °C, application 55: Regulation (EU) 813/2013 annex I (52).
 */
const published: Readonly<Record<SeasonName, Partial<Record<Application, OutletPoints>>>> = {
  average: {
    35: points([-7, 34], [2, 30], [7, 27], [12, 24]),
    45: points([-7, 43], [2, 37], [7, 33], [12, 28]),
    55: points([-7, 52], [2, 42], [7, 36], [12, 30]),
    65: points([-7, 61], [2, 49], [7, 41], [12, 32]),
  },
  warmer: { 35: points([7, 31], [12, 26]), 55: points([7, 46], [12, 34]) },
  colder: { 35: points([-7, 30], [2, 27], [7, 25], [12, 24]), 55: points([-7, 44], [2, 37], [7, 32], [12, 30]) },
};

function points(...list: [number, number][]): OutletPoints {
  return list;
}

/**
 * Outlet temperatures of a season and application, from its design temperature up.
 *
 * @returns the points, or nothing where no published ones are kept here
 */
export function outletPoints(season: SeasonName, application: Application): OutletPoints | undefined {
  const warmer = published[season][application];
  if (warmer === undefined) return undefined;
  return [[standardSeasons[season].designTemperature, application], ...warmer];
}

/**
 * Outlet temperature at an outdoor temperature.
 *
 * @param list at least two points
 * @param outdoor °C, not below the design temperature
 * @returns °C, linear between the points, extended along the two warmest above them
 * @example outletTemperature(outletPoints('average', 55) ?? [], -7) // 52
 *
 * Reference: MODEL section 14.
 */
export function outletTemperature(list: OutletPoints, outdoor: number): number {
  let next = list.findIndex(([at]) => at >= outdoor);
  if (next === -1) next = list.length - 1;
  if (next === 0) next = 1;
  const [x0, y0] = list[next - 1];
  const [x1, y1] = list[next];
  return y0 + ((y1 - y0) * (outdoor - x0)) / (x1 - x0);
}
