import { dayNumber, MINUTES_PER_DAY, WEEKDAY_NAMES } from '../core/civilDate.ts';
import { dateText, timeText } from '../core/stampText.ts';
import type { CivilClock, DayStretch } from './civilClock.ts';
import { holdsOnDay, type RateRule } from './rateRules.ts';

/** Minutes that follow one another in the series and have one month and one rule. */
export interface RateSlice {
  /** Minutes of the series, [from, to). */
  readonly from: number;
  to: number;
  /** Civil month, 0 to 11. */
  readonly month: number;
  /** Index of the rule. */
  readonly rule: number;
}

/** Civil days of the year that a tariff is in force, [from, until), counted as in `CivilClock.civilDay`. */
export interface DayRange {
  readonly from: number;
  readonly until: number;
}

export interface RateSlices {
  readonly slices: RateSlice[];
  /** The first minute that no rule prices, in civil time, and the number of such minutes. */
  readonly unpriced?: { readonly first: string; readonly minutes: number };
}

const NO_RULE = -1;

/**
 * Cuts the year, or the days of it that are asked for, into slices of one rule: the first that matches a minute.
 * Weekday, month and holiday are those of the minute, also after midnight.
 *
 * @param clock the year's civil time
 * @param rules at least one
 * @param holidays day numbers since 1970-01-01
 * @param days the days that count
 */
export function rateSlices(
  clock: CivilClock,
  rules: readonly RateRule[],
  holidays: ReadonlySet<number>,
  days: DayRange,
): RateSlices {
  const patterns = new Map<string, DayPattern>();
  const slices: RateSlice[] = [];
  let first: string | undefined;
  let minutes = 0;
  for (const day of clock.stretches) {
    if (day.civilDay < days.from || day.civilDay >= days.until) continue;
    for (const { from, to, rule } of patternOf(day, rules, holidays, patterns)) {
      const begin = Math.max(from, day.minuteOfDay);
      const end = Math.min(to, day.minuteOfDay + day.toMinute - day.fromMinute);
      if (begin >= end) continue;
      if (rule === NO_RULE) {
        first ??= minuteText(day, begin);
        minutes += end - begin;
        continue;
      }
      const shift = day.fromMinute - day.minuteOfDay;
      append(slices, { from: begin + shift, to: end + shift, month: day.month - 1, rule });
    }
  }
  return first === undefined ? { slices } : { slices, unpriced: { first, minutes } };
}

/** Which rule holds from minute to minute of a civil day, from 0 to 1440. */
type DayPattern = readonly { readonly from: number; readonly to: number; readonly rule: number }[];

/** Days on which the same rules hold share one pattern. */
function patternOf(
  day: DayStretch,
  rules: readonly RateRule[],
  holidays: ReadonlySet<number>,
  patterns: Map<string, DayPattern>,
): DayPattern {
  const isHoliday = holidays.size > 0 && holidays.has(dayNumber(day.year, day.month, day.dayOfMonth));
  const today: number[] = [];
  for (let r = 0; r < rules.length; r++) if (holdsOnDay(rules[r], day, isHoliday)) today.push(r);
  const key = today.join();
  const known = patterns.get(key);
  if (known) return known;
  const made = dayPattern(rules, today);
  patterns.set(key, made);
  return made;
}

function dayPattern(rules: readonly RateRule[], today: readonly number[]): DayPattern {
  const edges = new Set([0, MINUTES_PER_DAY, ...today.flatMap((r) => [rules[r].from, rules[r].to])]);
  const sorted = [...edges].sort((a, b) => a - b);
  return sorted.slice(1).map((to, i) => {
    const from = sorted[i];
    return { from, to, rule: today.find((r) => holdsAt(rules[r], from)) ?? NO_RULE };
  });
}

function holdsAt({ from, to }: RateRule, minute: number): boolean {
  return from < to ? minute >= from && minute < to : minute >= from || minute < to;
}

function append(slices: RateSlice[], slice: RateSlice): void {
  const last = slices.at(-1);
  if (last && last.to === slice.from && last.month === slice.month && last.rule === slice.rule) last.to = slice.to;
  else slices.push(slice);
}

function minuteText(day: DayStretch, minute: number): string {
  return `${WEEKDAY_NAMES[day.weekday - 1]} ${dateText(day.year, day.month, day.dayOfMonth)} ${timeText(minute)}`;
}
