import { DAYS_OF_MONTH, dayNumber, isLeapYear, MINUTES_PER_DAY, weekdayOf } from '../core/civilDate.ts';
import { HOURS_OF_COMMON_YEAR, HOURS_OF_LEAP_YEAR, HOURS_PER_DAY } from '../core/constants.ts';
import { type Problem, shown } from '../core/problem.ts';
import { type OffsetSpan, zoneOffsets } from '../core/zoneOffsets.ts';

/**
 * Minutes of one civil date that follow one another without a change of the clocks. Minutes are counted in the series:
 * step i holds minutes 60·i to 60·i + 59.
 */
export interface DayStretch {
  /** First minute, included. */
  readonly fromMinute: number;
  /** Last minute, excluded. */
  readonly toMinute: number;
  /** Civil time of the first minute, minutes of the day. */
  readonly minuteOfDay: number;
  /** 1 Monday to 7 Sunday. */
  readonly weekday: number;
  readonly year: number;
  /** 1 to 12. */
  readonly month: number;
  readonly dayOfMonth: number;
  /** As in `CivilClock.civilDay`. */
  readonly civilDay: number;
}

/** Civil time of every step of a year; the columns stand for the step's beginning (MODEL section 1). */
export interface CivilClock {
  readonly hours: number;
  readonly calendarYear: number;
  /** Offset of the series' standard time from UTC, minutes. */
  readonly offsetMinutes: number;
  readonly zone: string;
  /** Instant of the beginning, ms since 1970-01-01T00:00Z. */
  readonly startMillis: Float64Array;
  /** 0 to 1439. */
  readonly minuteOfDay: Int16Array;
  /** 1 Monday to 7 Sunday: that of the real date, also where this lies in the neighbouring year. */
  readonly weekday: Uint8Array;
  /** That of the real date: the calendar year or, at the ends of the series, a neighbour. */
  readonly year: Int16Array;
  /** 1 to 12. */
  readonly month: Uint8Array;
  readonly dayOfMonth: Uint8Array;
  /**
   * Number of the civil date in a year of hours/24 days, 1 January being 0, the year taken as periodic: a step whose
   * date is 31 December of the year before has the last number. Where 29 February is skipped, what the zone leaves of
   * it counts as 28 February.
   */
  readonly civilDay: Int16Array;
  /** Days of each civil month; 28 for February where the 29th is skipped. */
  readonly daysOfMonth: readonly number[];
  /** Every minute of the year, in order. */
  readonly stretches: readonly DayStretch[];
}

export interface CivilClockInput {
  /** 8760 or 8784. */
  readonly hours: number;
  /** Offset of the series' standard time from UTC, whole minutes (+60 for UTC+1). */
  readonly offsetMinutes: number;
  /** Name of the IANA list. */
  readonly zone: string;
  /** 1970 to 2100. */
  readonly calendarYear: number;
}

const MILLIS_PER_MINUTE = 60_000;
const FIRST_YEAR = 1970;
const LAST_YEAR = 2100;

/** Minute of the series at which 1 March begins in standard time where 29 February is skipped. */
const SKIP_MINUTE = (31 + 28) * MINUTES_PER_DAY;

/**
 * Lays a series of hours on a calendar year and gives each step its civil time.
 *
 * Step i begins i hours after 1 January 00:00 of the series' standard time. 8760 hours on a leap year skip
 * 29 February of standard time; the weekday stays that of the real date.
 *
 * @returns the clock; or a problem, its path one of `hours`, `calendarYear`, `zone`, its file empty
 * @example civilClock({ hours: 8760, offsetMinutes: 60, zone: 'Europe/Berlin', calendarYear: 2025 }).clock?.weekday[0] // 3
 */
export function civilClock(input: CivilClockInput): { clock?: CivilClock; problem?: Problem } {
  const problem = clockProblem(input);
  if (problem) return { problem };
  const { hours, offsetMinutes, zone, calendarYear } = input;
  const skips = hours === HOURS_OF_COMMON_YEAR && isLeapYear(calendarYear);
  const startMinute = dayNumber(calendarYear, 1, 1) * MINUTES_PER_DAY - offsetMinutes;
  const endMinute = startMinute + hours * 60 + (skips ? MINUTES_PER_DAY : 0);
  const spans = zoneOffsets(zone, startMinute, endMinute);
  if (!spans) return { problem: fault('clock.unknown-zone', 'zone', zone) };
  const daysOfMonth = DAYS_OF_MONTH.map((days, i) => (i === 1 && hours === HOURS_OF_LEAP_YEAR ? 29 : days));
  const stretches = stretchesOf({ hours, startMinute, skips, spans, daysOfMonth });
  const startMillis = new Float64Array(hours);
  for (let i = 0; i < hours; i++) {
    startMillis[i] = instantOf(i * 60, startMinute, skips) * MILLIS_PER_MINUTE;
  }
  const clock = {
    ...{ hours, calendarYear, offsetMinutes, zone, startMillis, daysOfMonth, stretches },
    ...columnsOf(hours, stretches),
  };
  return { clock };
}

function clockProblem({ hours, calendarYear }: CivilClockInput): Problem | undefined {
  if (hours !== HOURS_OF_COMMON_YEAR && hours !== HOURS_OF_LEAP_YEAR) {
    const allowed = `${HOURS_OF_COMMON_YEAR}, or ${HOURS_OF_LEAP_YEAR} with 29 February`;
    return { ...fault('clock.hours', 'hours', hours), allowed };
  }
  if (!Number.isInteger(calendarYear) || calendarYear < FIRST_YEAR || calendarYear > LAST_YEAR) {
    const allowed = `a year from ${FIRST_YEAR} to ${LAST_YEAR}`;
    return { ...fault('clock.calendar-year', 'calendarYear', calendarYear), allowed };
  }
  if (hours === HOURS_OF_LEAP_YEAR && !isLeapYear(calendarYear)) {
    return fault('clock.common-year', 'calendarYear', hours);
  }
  return undefined;
}

function fault(code: Problem['code'], path: string, found: unknown): Problem {
  return { code, severity: 'error', file: '', path, found: shown(found) };
}

/** Instant of a minute of the series, minutes since 1970-01-01T00:00Z. */
function instantOf(minute: number, startMinute: number, skips: boolean): number {
  return startMinute + minute + (skips && minute >= SKIP_MINUTE ? MINUTES_PER_DAY : 0);
}

interface YearOfInstants {
  readonly hours: number;
  readonly startMinute: number;
  readonly skips: boolean;
  readonly spans: readonly OffsetSpan[];
  readonly daysOfMonth: readonly number[];
}

/** Cuts the year at civil midnights, at changes of the clocks and where 29 February is skipped. */
function stretchesOf(year: YearOfInstants): DayStretch[] {
  const { startMinute, skips, spans, daysOfMonth } = year;
  const end = year.hours * 60;
  const stretches: DayStretch[] = [];
  let at = 0;
  let minute = 0;
  while (minute < end) {
    const instant = instantOf(minute, startMinute, skips);
    while (at + 1 < spans.length && spans[at + 1].fromMinute <= instant) at++;
    const local = instant + spans[at].offsetMinutes;
    const day = Math.floor(local / MINUTES_PER_DAY);
    const minuteOfDay = local - day * MINUTES_PER_DAY;
    let length = Math.min(MINUTES_PER_DAY - minuteOfDay, end - minute);
    if (at + 1 < spans.length) length = Math.min(length, spans[at + 1].fromMinute - instant);
    if (skips && minute < SKIP_MINUTE) length = Math.min(length, SKIP_MINUTE - minute);
    stretches.push({ fromMinute: minute, toMinute: minute + length, minuteOfDay, ...dateOf(day, daysOfMonth) });
    minute += length;
  }
  return stretches;
}

function dateOf(day: number, daysOfMonth: readonly number[]) {
  const date = new Date(day * MINUTES_PER_DAY * MILLIS_PER_MINUTE);
  const month = date.getUTCMonth() + 1;
  const dayOfMonth = date.getUTCDate();
  let civilDay = Math.min(dayOfMonth, daysOfMonth[month - 1]) - 1;
  for (let m = 0; m < month - 1; m++) civilDay += daysOfMonth[m];
  return { weekday: weekdayOf(day), year: date.getUTCFullYear(), month, dayOfMonth, civilDay };
}

function columnsOf(hours: number, stretches: readonly DayStretch[]) {
  const minuteOfDay = new Int16Array(hours);
  const weekday = new Uint8Array(hours);
  const year = new Int16Array(hours);
  const month = new Uint8Array(hours);
  const dayOfMonth = new Uint8Array(hours);
  const civilDay = new Int16Array(hours);
  for (const day of stretches) {
    for (let i = Math.ceil(day.fromMinute / 60); i * 60 < day.toMinute; i++) {
      minuteOfDay[i] = day.minuteOfDay + i * 60 - day.fromMinute;
      weekday[i] = day.weekday;
      year[i] = day.year;
      month[i] = day.month;
      dayOfMonth[i] = day.dayOfMonth;
      civilDay[i] = day.civilDay;
    }
  }
  return { minuteOfDay, weekday, year, month, dayOfMonth, civilDay };
}

/** Number of days of the clock's year: hours/24. */
export function daysOfYear(clock: CivilClock): number {
  return clock.hours / HOURS_PER_DAY;
}
