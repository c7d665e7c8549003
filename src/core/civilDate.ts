/** Minutes of a day. */
export const MINUTES_PER_DAY = 1440;

/** Monday is 1, Sunday 7, as in ISO 8601. */
export const WEEKDAY_NAMES = ['mon', 'tue', 'wed', 'thu', 'fri', 'sat', 'sun'] as const;

/** Days of the months of a year without 29 February. */
export const DAYS_OF_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;

const DAYS_BEFORE_MONTH = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334];

/** A day of the Gregorian calendar. */
export interface CivilDay {
  readonly year: number;
  /** 1 … 12 */
  readonly month: number;
  /** 1 … 31 */
  readonly day: number;
}

/** A date as written: with its year, or for every year. */
export interface WrittenDate {
  readonly year?: number;
  readonly month: number;
  readonly dayOfMonth: number;
}

/** Whether a year of the Gregorian calendar has a 29 February. */
export function isLeapYear(year: number): boolean {
  return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);
}

/**
 * Whether a day exists in the Gregorian calendar.
 *
 * @example dayExists(2025, 2, 29) // false
 */
export function dayExists(year: number, month: number, day: number): boolean {
  if (!(month >= 1 && month <= 12 && day >= 1)) return false;
  return day <= (DAYS_OF_MONTH[month - 1] as number) + (month === 2 && isLeapYear(year) ? 1 : 0);
}

/**
 * Number of a day, counted from 1970-01-01 as 0.
 *
 * @param year whole number; month 1 … 12, day 1 … 31 of a day that exists
 * @example dayNumber(1970, 3, 1) // 59
 *
 * Reference: Gregorian calendar, ISO 8601-1:2019.
 */
export function dayNumber(year: number, month: number, day: number): number {
  const past = year - 1;
  const daysBeforeYear = past * 365 + Math.floor(past / 4) - Math.floor(past / 100) + Math.floor(past / 400);
  const leapDay = month > 2 && isLeapYear(year) ? 1 : 0;
  return daysBeforeYear - 719_162 + (DAYS_BEFORE_MONTH[month - 1] as number) + leapDay + day - 1;
}

/**
 * The day of a number: the inverse of `dayNumber`.
 *
 * @example civilDay(59) // { year: 1970, month: 3, day: 1 }
 */
export function civilDay(number: number): CivilDay {
  let year = 1970 + Math.floor(number / 365.2425);
  if (number < dayNumber(year, 1, 1)) year--;
  else if (number >= dayNumber(year + 1, 1, 1)) year++;
  let month = 12;
  while (number < dayNumber(year, month, 1)) month--;
  return { year, month, day: number - dayNumber(year, month, 1) + 1 };
}

/**
 * Index of a day in a year of 365 or 366 days; in the former 29 February counts as 1 March.
 *
 * @example dayOfYear({ month: 3, day: 1 }, false) // 59
 */
export function dayOfYear({ month, day }: Pick<CivilDay, 'month' | 'day'>, leap: boolean): number {
  return (DAYS_BEFORE_MONTH[month - 1] as number) + (leap && month > 2 ? 1 : 0) + day - 1;
}

/**
 * Weekday of a day number, 1 for Monday to 7 for Sunday.
 *
 * @example weekdayOf(0) // 4: 1 January 1970 was a Thursday
 */
export function weekdayOf(day: number): number {
  return ((((day + 3) % 7) + 7) % 7) + 1;
}

/**
 * Reads `YYYY-MM-DD` or, for every year, `MM-DD`.
 *
 * @returns the date, or nothing where the text is no date or the date does not exist (29 February exists in `MM-DD`)
 * @example writtenDate('12-24') // { month: 12, dayOfMonth: 24 }
 */
export function writtenDate(text: string): WrittenDate | undefined {
  const match = /^(?:(\d{4})-)?(\d{2})-(\d{2})$/.exec(text);
  if (!match) return undefined;
  const month = Number(match[2]);
  const dayOfMonth = Number(match[3]);
  const year = match[1] === undefined ? undefined : Number(match[1]);
  // in every year means: in a leap year at least
  if (!dayExists(year ?? 2000, month, dayOfMonth)) return undefined;
  return year === undefined ? { month, dayOfMonth } : { year, month, dayOfMonth };
}

/**
 * Reads `HH:MM` into minutes of the day.
 *
 * @param text 00:00 to 23:59, and 24:00 where it ends something
 * @returns 0 to 1440 minutes, or nothing where the text is no time of day
 * @example minuteOfDay('22:30') // 1350
 */
export function minuteOfDay(text: string): number | undefined {
  const match = /^(\d{2}):(\d{2})$/.exec(text);
  if (!match) return undefined;
  const minutes = Number(match[1]) * 60 + Number(match[2]);
  return Number(match[2]) < 60 && minutes <= MINUTES_PER_DAY ? minutes : undefined;
}
