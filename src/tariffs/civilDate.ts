/** Monday is 1, Sunday 7, as in ISO 8601. */
export const WEEKDAY_NAMES = ['mon', 'tue', 'wed', 'thu', 'fri', 'sat', 'sun'] as const;

/** Days of the months of a year without 29 February. */
export const DAYS_OF_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;

const MILLIS_PER_DAY = 86_400_000;

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
 * The number of a day, counted from 1970-01-01 as 0.
 *
 * @example dayNumber(1970, 3, 1) // 59
 */
export function dayNumber(year: number, month: number, dayOfMonth: number): number {
  return Date.UTC(year, month - 1, dayOfMonth) / MILLIS_PER_DAY;
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
  const longest = month === 2 && (year === undefined || isLeapYear(year)) ? 29 : (DAYS_OF_MONTH[month - 1] ?? 0);
  if (dayOfMonth < 1 || dayOfMonth > longest) return undefined;
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
  return Number(match[2]) < 60 && minutes <= 1440 ? minutes : undefined;
}

/** `YYYY-MM-DD` of a day. */
export function dateText(year: number, month: number, dayOfMonth: number): string {
  return `${year}-${twoDigits(month)}-${twoDigits(dayOfMonth)}`;
}

/** `HH:MM` of a minute of the day. */
export function timeText(minute: number): string {
  return `${twoDigits(Math.floor(minute / 60))}:${twoDigits(minute % 60)}`;
}

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}
