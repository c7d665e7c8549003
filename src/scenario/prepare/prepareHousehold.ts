import { columnSum } from '../../core/columnSum.ts';
import type { CivilClock } from '../../tariffs/civilClock.ts';
import type { HouseholdEntry } from '../householdSchema.ts';

type Profile = Extract<HouseholdEntry, { given: 'profile' }>;

const EVEN = Array.from({ length: 24 }, () => 1);
const SATURDAY = 6;

/**
 * Electricity of a household by its profile, read at the civil time of each step's beginning and brought to its year
 * exactly.
 *
 * @returns kWh a step; nothing where the shares that occur are all zero and electricity is asked for
 * @example profileOfHousehold({ given: 'profile', kWhPerYear: 8760 }, clock)?.[0] // 1 in a year of 8760 hours
 *
 * Reference: MODEL sections 1 and 12.
 */
export function profileOfHousehold(profile: Profile, clock: CivilClock): Float64Array | undefined {
  const { kWhPerYear, shares = EVEN, weekendShares = shares } = profile;
  const weights = new Float64Array(clock.hours);
  for (let i = 0; i < clock.hours; i++) {
    const day = clock.weekday[i] >= SATURDAY ? weekendShares : shares;
    weights[i] = day[Math.floor(clock.minuteOfDay[i] / 60)];
  }
  const sum = columnSum(weights, 0, clock.hours);
  if (sum === 0) return undefined;
  return weights.map((weight) => (kWhPerYear * weight) / sum);
}
