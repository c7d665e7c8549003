import type { CivilClock } from './civilClock.ts';
import type { DayRange } from './rateSlices.ts';
import type { Tariff } from './tariff.ts';

/** How much of each civil month some days are: by days. */
export interface DayShares {
  readonly daysOfMonth: Float64Array;
  readonly shareOfMonth: Float64Array;
}

/** Counts the days of each month that lie in a range. */
export function dayShares(clock: CivilClock, days: DayRange): DayShares {
  const daysOfMonth = new Float64Array(12);
  const shareOfMonth = new Float64Array(12);
  let first = 0;
  clock.daysOfMonth.forEach((length, m) => {
    daysOfMonth[m] = Math.max(0, Math.min(days.until, first + length) - Math.max(days.from, first));
    shareOfMonth[m] = daysOfMonth[m] / length;
    first += length;
  });
  return { daysOfMonth, shareOfMonth };
}

/**
 * Standing charge of each month: what is asked per day, month and year adds up. For a part of the year the charge per
 * month and the charge per year are shared out by days.
 *
 * @returns 12 sums of money, before tax
 * @example standingOfMonths({ perDay: 0.5, perMonth: 10, perYear: 24 }, { daysOfMonth: Float64Array.of(31), shareOfMonth: Float64Array.of(1) }, 365)[0] // 31·0.50 + 10 + 24·31/365 = 27.538
 */
export function standingOfMonths(standing: Tariff['standing'], shares: DayShares, yearDays: number): Float64Array {
  const { perDay = 0, perMonth = 0, perYear = 0 } = standing ?? {};
  return shares.daysOfMonth.map(
    (days, m) => perDay * days + perMonth * shares.shareOfMonth[m] + (perYear * days) / yearDays,
  );
}

/** Credits of each month: the year's amount shared out by days. */
export function creditsOfMonths(credits: Tariff['credits'], shares: DayShares, yearDays: number): Float64Array {
  const perYear = credits.reduce((sum, credit) => sum + credit.amount, 0);
  return shares.daysOfMonth.map((days) => (perYear * days) / yearDays);
}
