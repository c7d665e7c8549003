import { HOURS_PER_DAY } from '../core/constants.ts';
import { compensatedSum } from '../core/sum.ts';
import { monthStarts } from './monthSteps.ts';

/**
 * How the degree days of a day are taken: from its `hours` (ISO 15927-6), its `mean`, the middle of its extremes
 * (`minmax`, the US convention), the UK rules for days that cross the base (`fourcase`), or the mean below a fixed
 * `threshold` (the convention of European statistics).
 */
export type DegreeDayMethod = 'hours' | 'mean' | 'minmax' | 'fourcase' | 'threshold';

/** Whether what lies below the base counts, or what lies above it. */
export type DegreeDayKind = 'heating' | 'cooling';

/** Methods that need no more than the highest and the lowest temperature of each day. */
export type DailyExtremesMethod = 'minmax' | 'fourcase';

/** Degree days of a year and of its twelve months of standard time, K·d. */
export interface DegreeDays {
  readonly annual: number;
  readonly monthly: readonly number[];
}

/** Highest and lowest temperature of each day of a year, °C: 365 or 366 days. */
export interface DailyExtremes {
  readonly highest: ArrayLike<number>;
  readonly lowest: ArrayLike<number>;
}

/** A day counts at a mean of `limit` or less, with its distance to `reference`, °C. */
interface Threshold {
  readonly limit: number;
  readonly reference: number;
}

/** Reference: Eurostat, energy statistics, heating degree days: 15 and 18 °C. MODEL section 2. */
const HEATING_THRESHOLD: Threshold = { limit: 15, reference: 18 };
/** Reference: Eurostat, energy statistics, cooling degree days: 24 and 21 °C, here with their signs turned. MODEL section 2. */
const COOLING_THRESHOLD: Threshold = { limit: -24, reference: -21 };

/**
 * Heating degree days of a year of hours.
 *
 * @param temperature outdoor, °C, 8760 or 8784 hours of standard time from 1 January 00:00
 * @param base base temperature, °C; `threshold` has its own 15 and 18 °C and does not look at it
 * @param method how a day is counted
 * @returns K·d, at least 0; the year is the sum of its months
 * @example heatingDegreeDays(aYearOfFiveDegrees, 15.5, 'hours').annual // 3832.5
 *
 * Reference: ISO 15927-6:2007 (`hours`); MODEL section 2.
 */
export function heatingDegreeDays(temperature: Float64Array, base: number, method: DegreeDayMethod): DegreeDays {
  return degreeDays(temperature, base, method, HEATING_THRESHOLD);
}

/**
 * Cooling degree days of a year of hours: the heating degree days of the year mirrored at 0 °C.
 *
 * @param temperature outdoor, °C, 8760 or 8784 hours of standard time from 1 January 00:00
 * @param base base temperature, °C; `threshold` has its own 24 and 21 °C and does not look at it
 * @param method how a day is counted
 * @returns K·d, at least 0; the year is the sum of its months
 * @example coolingDegreeDays(aYearOfThirtyDegrees, 22, 'mean').annual // 2920
 *
 * Reference: MODEL section 2.
 */
export function coolingDegreeDays(temperature: Float64Array, base: number, method: DegreeDayMethod): DegreeDays {
  const mirrored = temperature.map((t) => -t);
  return degreeDays(mirrored, -base, method, COOLING_THRESHOLD);
}

/**
 * Heating degree days of a year of daily extremes, as weather services publish them.
 *
 * @param days highest and lowest temperature of each day, °C, from 1 January; 365 or 366 days
 * @param base base temperature, °C
 * @param method how a day is counted
 * @returns K·d, at least 0; the year is the sum of its months
 * @example heatingDegreeDaysFromDailyExtremes(aYearFromFourToTen, 15.5, 'minmax').annual // 3102.5
 *
 * Reference: `minmax` US National Weather Service; `fourcase` UK Met Office rules; MODEL section 2.
 */
export function heatingDegreeDaysFromDailyExtremes(
  days: DailyExtremes,
  base: number,
  method: DailyExtremesMethod,
): DegreeDays {
  const { highest, lowest } = days;
  const count = method === 'minmax' ? middleRule : fourCaseRule;
  return sumByMonth(highest.length, (day) => count(highest[day] as number, lowest[day] as number, base));
}

function degreeDays(
  temperature: Float64Array,
  base: number,
  method: DegreeDayMethod,
  { limit, reference }: Threshold,
): DegreeDays {
  const days = Math.floor(temperature.length / HOURS_PER_DAY);
  switch (method) {
    case 'hours':
      return sumByMonth(days, (day) => hoursRule(temperature, day, base));
    case 'mean':
      return sumByMonth(days, (day) => Math.max(0, base - dayMean(temperature, day)));
    case 'threshold':
      return sumByMonth(days, (day) => {
        const mean = dayMean(temperature, day);
        return mean <= limit ? reference - mean : 0;
      });
    case 'minmax':
    case 'fourcase':
      return heatingDegreeDaysFromDailyExtremes(dailyExtremes(temperature, days), base, method);
  }
}

function sumByMonth(days: number, ofDay: (day: number) => number): DegreeDays {
  const starts = monthStarts(days * HOURS_PER_DAY);
  const monthly: number[] = [];
  for (let month = 0; month < 12; month++) {
    let sum = 0;
    const end = starts[month + 1] / HOURS_PER_DAY;
    for (let day = starts[month] / HOURS_PER_DAY; day < end; day++) sum += ofDay(day);
    monthly.push(sum);
  }
  return { annual: compensatedSum(monthly), monthly };
}

function hoursRule(temperature: Float64Array, day: number, base: number): number {
  let sum = 0;
  const end = (day + 1) * HOURS_PER_DAY;
  for (let i = day * HOURS_PER_DAY; i < end; i++) sum += Math.max(0, base - temperature[i]);
  return sum / HOURS_PER_DAY;
}

/** The sum is compensated because `threshold` jumps at its limit, and readings in tenths meet it exactly. */
function dayMean(temperature: Float64Array, day: number): number {
  return compensatedSum(temperature, day * HOURS_PER_DAY, (day + 1) * HOURS_PER_DAY) / HOURS_PER_DAY;
}

function dailyExtremes(temperature: Float64Array, days: number): DailyExtremes {
  const highest = new Float64Array(days).fill(Number.NEGATIVE_INFINITY);
  const lowest = new Float64Array(days).fill(Number.POSITIVE_INFINITY);
  for (let day = 0; day < days; day++) {
    const end = (day + 1) * HOURS_PER_DAY;
    for (let i = day * HOURS_PER_DAY; i < end; i++) {
      highest[day] = Math.max(highest[day], temperature[i]);
      lowest[day] = Math.min(lowest[day], temperature[i]);
    }
  }
  return { highest, lowest };
}

function middleRule(highest: number, lowest: number, base: number): number {
  return Math.max(0, base - (highest + lowest) / 2);
}

function fourCaseRule(highest: number, lowest: number, base: number): number {
  if (highest <= base) return base - (highest + lowest) / 2;
  if (lowest >= base) return 0;
  const above = highest - base;
  const below = base - lowest;
  return above < below ? below / 2 - above / 4 : below / 4;
}
