import { WATER_HEAT_CAPACITY } from '../core/constants.ts';
import { AT } from './hourScratch.ts';
import type { YearPlan } from './yearPlan.ts';

/** Swing of the water in a short run, K, and the most starts of an hour (MODEL section 9). */
const CYCLE_SWING = 5;
const MOST_STARTS = 6;

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
  const full = hour[AT.capacity];
  const singleSpeed = hour[AT.lowestCapacity] >= full;
  const least = singleSpeed ? full : hour[AT.lowestCapacity];
  const leastCop = singleSpeed ? hour[AT.cop] : hour[AT.lowestCop];
  const rate = given / share;
  const inUse = 1 - plan.inUseAllowance;
  if (rate >= least) {
    const cop = singleSpeed ? leastCop : leastCop + ((hour[AT.cop] - leastCop) * (rate - least)) / (full - least);
    hour[AT.electricity] = given / (cop * inUse);
    hour[AT.starts] = 0;
    return;
  }
  const on = rate / least;
  hour[AT.starts] = Math.min(
    MOST_STARTS,
    (least * on * (1 - on) * share) / (plan.cycleWater * WATER_HEAT_CAPACITY * CYCLE_SWING),
  );
  if (cycling.method === 'degradation') {
    hour[AT.electricity] = given / (leastCop * (1 - cycling.coefficient * (1 - on)) * inUse);
  } else {
    hour[AT.electricity] = given / (leastCop * inUse) + cycling.power * (1 - on) * share;
  }
}
