import { dayNumber, MINUTES_PER_DAY, minuteOfDay, WEEKDAY_NAMES, writtenDate } from '../core/civilDate.ts';
import { type Problem, shown } from '../core/problem.ts';
import type { CivilClock, DayStretch } from './civilClock.ts';
import type { Rate, Tariff } from './tariff.ts';

/** A rate made ready for comparing. */
export interface RateRule {
  readonly name: string;
  /** Money per kWh. */
  readonly price: number;
  /** Minutes of the day, [from, to); from > to runs across midnight. */
  readonly from: number;
  readonly to: number;
  /** By weekday 1 to 7 and by month 1 to 12. */
  readonly weekdays: readonly boolean[];
  readonly months: readonly boolean[];
  /** 100 · month + day, both included; from > to runs across the new year. */
  readonly season?: { readonly from: number; readonly to: number };
  readonly holidays?: Rate['holidays'];
}

/**
 * Makes the rates of a tariff ready, and says what is wrong with their times and dates.
 *
 * @param tariff one that passed the schema
 * @param file name of its file, for the problems
 * @returns a rule a rate, in order; the rules are of use only where no problem is an error
 */
export function rateRules(tariff: Tariff, file: string): { rules: RateRule[]; problems: Problem[] } {
  const rates = tariff.rates ?? [];
  const problems = rates.flatMap((rate, i) => [
    ...timeProblems(rate, `rates[${i}]`, file),
    ...dateProblems(rate, `rates[${i}]`, file),
    ...holidayProblems(rate, `rates[${i}]`, { file, listed: tariff.holidays.length }),
  ]);
  return { rules: rates.map(ruleOf), problems };
}

function ruleOf(rate: Rate): RateRule {
  const begins = writtenDate(rate.dates?.from ?? '');
  const ends = writtenDate(rate.dates?.to ?? '');
  return {
    ...{ name: rate.name, price: rate.price, holidays: rate.holidays },
    from: minuteOfDay(rate.from ?? '00:00') ?? 0,
    to: minuteOfDay(rate.to ?? '24:00') ?? MINUTES_PER_DAY,
    weekdays: [false, ...WEEKDAY_NAMES.map((day) => rate.weekdays?.includes(day) ?? true)],
    months: Array.from({ length: 13 }, (_, month) => rate.months?.includes(month) ?? true),
    ...(begins && ends && { season: { from: monthAndDay(begins), to: monthAndDay(ends) } }),
  };
}

function timeProblems(rate: Rate, path: string, file: string): Problem[] {
  const problems: Problem[] = [];
  const from = minuteOfDay(rate.from ?? '00:00');
  const to = minuteOfDay(rate.to ?? '24:00');
  if (from === undefined || from === MINUTES_PER_DAY) {
    problems.push(fault('tariff.time-of-day', { file, path: `${path}.from`, found: rate.from }));
  }
  if (to === undefined) problems.push(fault('tariff.time-of-day', { file, path: `${path}.to`, found: rate.to }));
  else if (from === to) problems.push(fault('tariff.rate-without-time', { file, path: `${path}.to`, found: rate.to }));
  return problems;
}

function dateProblems({ dates }: Rate, path: string, file: string): Problem[] {
  if (!dates) return [];
  return (['from', 'to'] as const).flatMap((end) => {
    const date = writtenDate(dates[end]);
    const isEveryYear = date !== undefined && date.year === undefined;
    const place = { file, path: `${path}.dates.${end}`, found: dates[end] };
    return isEveryYear ? [] : [fault('tariff.no-such-date', place)];
  });
}

function holidayProblems({ holidays }: Rate, path: string, tariff: { file: string; listed: number }): Problem[] {
  if (holidays === undefined || tariff.listed > 0) return [];
  const place = { file: tariff.file, path: `${path}.holidays`, found: holidays };
  return [{ ...fault('tariff.no-holidays', place), severity: 'warning' }];
}

function fault(code: Problem['code'], place: { file: string; path: string; found: string | undefined }): Problem {
  return { code, severity: 'error', ...place, found: shown(place.found ?? 'left out') };
}

function monthAndDay({ month, dayOfMonth }: { readonly month: number; readonly dayOfMonth: number }): number {
  return 100 * month + dayOfMonth;
}

/** Whether a rule holds on the day of a stretch, its times of day apart. */
export function holdsOnDay(rule: RateRule, day: DayStretch, isHoliday: boolean): boolean {
  if (!rule.months[day.month]) return false;
  if (rule.season) {
    const { from, to } = rule.season;
    const date = monthAndDay(day);
    if (from <= to ? date < from || date > to : date < from && date > to) return false;
  }
  if (rule.holidays === 'also' && isHoliday) return true;
  if (rule.holidays === 'only' && !isHoliday) return false;
  if (rule.holidays === 'never' && isHoliday) return false;
  return rule.weekdays[day.weekday];
}

/**
 * The day numbers of a tariff's holidays. A date with a year is that very day; one without is a day of the calendar year
 * and of the two beside it, into which the zone may carry the first or the last hours.
 *
 * @returns days since 1970-01-01
 */
export function holidayNumbers(
  tariff: Tariff,
  clock: CivilClock,
  file: string,
): { days: Set<number>; problems: Problem[] } {
  const days = new Set<number>();
  const problems: Problem[] = [];
  const year = clock.calendarYear;
  let ofThisYear = 0;
  tariff.holidays.forEach((text, i) => {
    const date = writtenDate(text);
    if (!date) {
      const place = { file, path: `holidays[${i}]`, found: shown(text) };
      problems.push({ code: 'tariff.no-such-date', severity: 'error', ...place });
      return;
    }
    if (date.year === undefined || date.year === year) ofThisYear++;
    for (const y of date.year === undefined ? [year - 1, year, year + 1] : [date.year]) {
      if (writtenDate(`${y}-${text.slice(-5)}`)) days.add(dayNumber(y, date.month, date.dayOfMonth));
    }
  });
  if (tariff.holidays.length > 0 && ofThisYear === 0 && problems.length === 0) {
    const place = { file, path: 'holidays', found: shown(tariff.holidays[0]), allowed: String(year) };
    problems.push({ code: 'tariff.holidays-of-other-years', severity: 'warning', ...place });
  }
  return { days, problems };
}
