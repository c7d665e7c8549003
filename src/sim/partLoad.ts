import { WATER_HEAT_CAPACITY } from '../core/constants.ts';
import { AT } from './hourScratch.ts';
import type { Cycling } from './unit.ts';
import type { YearPlan } from './yearPlan.ts';

/** Swing of the water in a short run, K, and the most starts of an hour (MODEL section 9). */
export const CYCLE_SWING = 5;
export const MOST_STARTS = 6;

/**
 * Electricity and starts for heat given at a rate: linear COP between the lowest level and full load, cycling below.
 *
 * @param plan its unit's cycling and the in-use allowance
 * @param given heat of the hour, kWh, above 0
 * @param share part of the hour that is left for space heat, above 0 … 1
 * @param hour scratch with the hour's levels; receives electricity (kWh) and starts
 *
 * A lowest level at or above full load means a single-speed unit: it cycles below full load. Reference: MODEL section 9;
 * degradation coefficient 0.25 as the default of EN 14825 (air-to-air) and AHRI 210/240.
 */
export function priceRate(plan: YearPlan, given: number, share: number, hour: Float64Array): void {
  const { cycling } = plan.unitOnWeather.unit;
  const least = leastCapacity(hour);
  const rate = given / share;
  hour[AT.electricity] = given / (copAtRate(cycling, rate, hour) * (1 - plan.inUseAllowance));
  hour[AT.starts] = 0;
  if (rate >= least) return;
  const on = rate / least;
  hour[AT.starts] = Math.min(
    MOST_STARTS,
    (least * on * (1 - on) * share) / (plan.cycleWater * WATER_HEAT_CAPACITY * CYCLE_SWING),
  );
  if (cycling.method === 'offPower') hour[AT.electricity] += cycling.power * (1 - on) * share;
}

/** Lowest rate without cycling, kW: full capacity for a single-speed unit. */
export function leastCapacity(hour: Float64Array): number {
  return Math.min(hour[AT.lowestCapacity], hour[AT.capacity]);
}

/**
 * COP at a rate, before the in-use allowance: linear between the levels, with degradation below the lowest.
 *
 * @param rate kW, above 0 and at most full capacity
 * @param hour scratch with the hour's levels
 */
export function copAtRate(cycling: Cycling, rate: number, hour: Float64Array): number {
  const full = hour[AT.capacity];
  const singleSpeed = hour[AT.lowestCapacity] >= full;
  const least = leastCapacity(hour);
  const leastCop = singleSpeed ? hour[AT.cop] : hour[AT.lowestCop];
  if (rate < least) {
    return cycling.method === 'degradation' ? leastCop * (1 - cycling.coefficient * (1 - rate / least)) : leastCop;
  }
  return singleSpeed ? leastCop : leastCop + ((hour[AT.cop] - leastCop) * (rate - least)) / (full - least);
}
