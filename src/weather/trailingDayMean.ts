import { HOURS_PER_DAY } from '../core/constants.ts';

/**
 * Mean of each hour and the 23 before it, the year taken as periodic.
 *
 * Each window is the end of one day and the beginning of the next, so it is a sum carried backwards through the one plus
 * a sum carried forwards through the other: nothing is ever subtracted and nothing can drift. What each addition rounds
 * away is kept and put back, because a mean is compared with a heating limit, and readings in tenths meet it exactly.
 *
 * @param values whole days of hours
 * @returns a new column of the same length and unit
 * @example trailingDayMean(aYearOfFifteenDegrees)[0] // 15
 *
 * Reference: MODEL section 4; compensation after D. E. Knuth, The Art of Computer Programming, vol. 2, section 4.2.2.
 */
export function trailingDayMean(values: Float64Array): Float64Array {
  const means = new Float64Array(values.length);
  const later = new Float64Array(HOURS_PER_DAY);
  const laterLost = new Float64Array(HOURS_PER_DAY);
  for (let day = 0; day < values.length; day += HOURS_PER_DAY) {
    const dayBefore = day === 0 ? values.length - HOURS_PER_DAY : day - HOURS_PER_DAY;
    sumLaterHours(values, dayBefore, later, laterLost);
    let sum = 0;
    let lost = 0;
    for (let hour = 0; hour < HOURS_PER_DAY; hour++) {
      const value = values[day + hour];
      lost += roundedAway(sum, value);
      sum += value;
      const total = sum + later[hour];
      means[day + hour] = (total + (roundedAway(sum, later[hour]) + lost + laterLost[hour])) / HOURS_PER_DAY;
    }
  }
  return means;
}

/** Sums of the hours after each hour of a day, and what those sums rounded away. */
function sumLaterHours(values: Float64Array, day: number, sums: Float64Array, losses: Float64Array): void {
  let sum = 0;
  let lost = 0;
  for (let hour = HOURS_PER_DAY - 1; hour >= 0; hour--) {
    sums[hour] = sum;
    losses[hour] = lost;
    const value = values[day + hour];
    lost += roundedAway(sum, value);
    sum += value;
  }
}

/** What a + b loses by rounding, exactly. */
function roundedAway(a: number, b: number): number {
  const sum = a + b;
  const partOfB = sum - a;
  return a - (sum - partOfB) + (b - partOfB);
}
