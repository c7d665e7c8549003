import { civilDay, MINUTES_PER_DAY } from './civilDate.ts';

/** `YYYY-MM-DD` of a day. @example dateText(2025, 3, 1) // '2025-03-01' */
export function dateText(year: number, month: number, dayOfMonth: number): string {
  return `${year}-${twoDigits(month)}-${twoDigits(dayOfMonth)}`;
}

/** `HH:MM` of a minute of the day. @example timeText(870) // '14:30' */
export function timeText(minute: number): string {
  return `${twoDigits(Math.floor(minute / 60))}:${twoDigits(minute % 60)}`;
}

/**
 * A stamp for people: `2019-07-01 14:00`, without the year `07-01 14:00`.
 *
 * @param minute since 1970-01-01 00:00 of the clock that is shown
 * @example stampText(1470, true) // '1970-01-02 00:30'
 */
export function stampText(minute: number, withYear: boolean): string {
  const number = Math.floor(minute / MINUTES_PER_DAY);
  const { year, month, day } = civilDay(number);
  const date = `${twoDigits(month)}-${twoDigits(day)}`;
  return `${withYear ? `${year}-` : ''}${date} ${timeText(minute - number * MINUTES_PER_DAY)}`;
}

/** An offset from UTC for people. @example offsetText(330) // 'UTC+05:30' */
export function offsetText(minutes: number): string {
  return `UTC${minutes < 0 ? '-' : '+'}${timeText(Math.abs(minutes))}`;
}

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}
