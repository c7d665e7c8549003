import type { SeasonName } from '../../weather/seasonBins.ts';

/** Outlet temperature at design of an application of the label, °C. */
export type Application = 35 | 45 | 55 | 65;

/** Electric power in the idle states, kW. */
export interface IdlePowers {
  readonly off: number;
  readonly thermostatOff: number;
  readonly standby: number;
  readonly crankcase: number;
}

/** One season of the label: climate, application, and what the unit is rated for. */
export interface SeasonCase {
  readonly season: SeasonName;
  readonly application: Application;
  /** Design load P_design of the rating, kW, above 0. */
  readonly designLoad: number;
  /** Lowest outdoor temperature at which the unit runs (TOL), °C. */
  readonly operatingLimit: number;
  /** Whether the unit also cools: it sets the idle hours. */
  readonly reversible: boolean;
  readonly idle: IdlePowers;
}

/** No heat is needed in the seasons from here upwards, °C (EN 14825). */
export const SEASON_LIMIT = 16;

/**
 * Load at an outdoor temperature as a share of the design load.
 *
 * @param outdoor °C
 * @param design design temperature of the season, °C
 * @returns (T_j − 16)/(T_design − 16), never below 0
 * @example partLoadRatio(-7, -10) // 0.8846
 *
 * Reference: Regulation (EU) 813/2013 annex III; EN 14825.
 */
export function partLoadRatio(outdoor: number, design: number): number {
  return Math.max(0, (outdoor - SEASON_LIMIT) / (design - SEASON_LIMIT));
}

/**
 * COP of a unit that cycles at part load with water.
 *
 * @param cop at the capacity, above 0
 * @param ratio capacity ratio CR = load/capacity, 0 … 1
 * @param degradation C_c, 0 … 1 (default 0.9)
 * @returns COP·CR/(C_c·CR + 1 − C_c)
 * @example cyclingCop(1, 0.5, 0.9) // 0.5/0.55 = 0.90909
 *
 * Reference: EN 14825, air to water (from memory); MODEL section 14.
 */
export function cyclingCop(cop: number, ratio: number, degradation: number): number {
  return (cop * ratio) / (degradation * ratio + 1 - degradation);
}
