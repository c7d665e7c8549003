import { MINUTES_PER_DAY, minuteOfDay, WEEKDAY_NAMES, type WrittenDate, writtenDate } from '../../core/civilDate.ts';
import type { CivilClock } from '../../tariffs/civilClock.ts';
import type { Weekday } from '../../tariffs/tariff.ts';

/** When a rule holds; whatever is left out does not limit it. */
export interface WhenRule {
  readonly start?: string | undefined;
  readonly end?: string | undefined;
  readonly weekdays?: readonly Weekday[] | undefined;
  readonly from?: string | undefined;
  readonly to?: string | undefined;
}

/**
 * Marks the steps in which a rule holds, read at the civil time of each step's beginning (MODEL section 1); the weekday
 * is that of the step, also after midnight.
 *
 * @param rule times, weekdays and dates; an end before its start runs across midnight or the new year
 * @param clock civil time of the year
 * @returns 1 where it holds, one entry a step
 */
export function stepsOfRule(rule: WhenRule, clock: CivilClock): Uint8Array {
  const start = rule.start === undefined ? 0 : (minuteOfDay(rule.start) ?? 0);
  const end = rule.end === undefined ? MINUTES_PER_DAY : (minuteOfDay(rule.end) ?? MINUTES_PER_DAY);
  const weekdays = rule.weekdays?.map((day) => WEEKDAY_NAMES.indexOf(day) + 1);
  const inDates = dateTest(rule, clock);
  const holds = new Uint8Array(clock.hours);
  for (let i = 0; i < clock.hours; i++) {
    const minute = clock.minuteOfDay[i];
    const inTime = start < end ? minute >= start && minute < end : minute >= start || minute < end;
    const inWeek = weekdays === undefined || weekdays.includes(clock.weekday[i]);
    holds[i] = inTime && inWeek && inDates(i) ? 1 : 0;
  }
  return holds;
}

/**
 * Whether the civil date of a step lies in the days from … to, both included: of the very years written, else of every
 * year and then also across the new year.
 */
function dateTest(rule: WhenRule, clock: CivilClock): (step: number) => boolean {
  const from = rule.from === undefined ? undefined : writtenDate(rule.from);
  const to = rule.to === undefined ? undefined : writtenDate(rule.to);
  const withYear = from?.year !== undefined || to?.year !== undefined;
  const first = dateKey(from ?? { month: 1, dayOfMonth: 1 });
  const last = dateKey(to ?? { month: 12, dayOfMonth: 31 });
  return (step) => {
    const year = withYear ? clock.year[step] : 0;
    const at = dateKey({ year, month: clock.month[step], dayOfMonth: clock.dayOfMonth[step] });
    return first <= last ? at >= first && at <= last : at >= first || at <= last;
  };
}

/** A date as a number that sorts. */
function dateKey({ year = 0, month, dayOfMonth }: WrittenDate): number {
  return (year * 100 + month) * 100 + dayOfMonth;
}
