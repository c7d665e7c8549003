/** Minutes of a day. */
export const MINUTES_PER_DAY = 1440;

const DAYS_BEFORE_MONTH = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334];
const DAYS_OF_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/** A day of the Gregorian calendar. */
export interface CivilDay {
  readonly year: number;
  /** 1 … 12 */
  readonly month: number;
  /** 1 … 31 */
  readonly day: number;
}

/** Whether a year of the Gregorian calendar has a 29 February. */
export function isLeap(year: number): boolean {
  return year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);
}

/** Whether a day exists in the Gregorian calendar. */
export function dayExists(year: number, month: number, day: number): boolean {
  if (!(month >= 1 && month <= 12 && day >= 1)) return false;
  return day <= (DAYS_OF_MONTH[month - 1] as number) + (month === 2 && isLeap(year) ? 1 : 0);
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
  const leapDay = month > 2 && isLeap(year) ? 1 : 0;
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

/** A stamp for people: `2019-07-01 14:00`, without the year `07-01 14:00`. */
export function stampText(minute: number, withYear: boolean): string {
  const number = Math.floor(minute / MINUTES_PER_DAY);
  const { year, month, day } = civilDay(number);
  const date = `${twoDigits(month)}-${twoDigits(day)}`;
  return `${withYear ? `${year}-` : ''}${date} ${clockText(minute - number * MINUTES_PER_DAY)}`;
}

/** `14:30` of minutes of the day. */
export function clockText(minute: number): string {
  return `${twoDigits(Math.floor(minute / 60))}:${twoDigits(minute % 60)}`;
}

/** An offset from UTC for people: `UTC+05:30`. */
export function offsetText(minutes: number): string {
  return `UTC${minutes < 0 ? '-' : '+'}${clockText(Math.abs(minutes))}`;
}

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}
