import { civilDay, dayNumber, dayOfYear, MINUTES_PER_DAY } from '../../core/civilDate.ts';
import type { Findings } from './findings.ts';

/** Rows placed in their year: one entry a row. */
export interface PlacedRows {
  /** Year of standard time; 0 where the stamp could not be read. */
  readonly year: Int16Array;
  /** Minutes since the beginning of a year of 366 days, a common year jumping over 29 February. */
  readonly minuteOfLeapYear: Int32Array;
}

/** Minutes of a year of 366 days before and after its 29 February. */
const LEAP_DAY_BEGIN = 59 * MINUTES_PER_DAY;
const LEAP_DAY_END = 60 * MINUTES_PER_DAY;

/** Year and place within the year of each row. */
export function placeRows(minutes: Float64Array): PlacedRows {
  const year = new Int16Array(minutes.length);
  const minuteOfLeapYear = new Int32Array(minutes.length);
  let day = Number.NaN;
  let dayYear = 0;
  let dayStart = 0;
  for (let i = 0; i < minutes.length; i++) {
    const minute = minutes[i] as number;
    if (Number.isNaN(minute)) continue;
    const number = Math.floor(minute / MINUTES_PER_DAY);
    if (number !== day) {
      day = number;
      const civil = civilDay(number);
      dayYear = civil.year;
      dayStart = dayOfYear(civil, true) * MINUTES_PER_DAY;
    }
    year[i] = dayYear;
    minuteOfLeapYear[i] = dayStart + minute - number * MINUTES_PER_DAY;
  }
  return { year, minuteOfLeapYear };
}

/**
 * Rows of the year that the settings name, first those within it, then those within a day of its ends: a file may run
 * some hours over the year's end because of its offset.
 *
 * @param minutes standard time of the rows
 * @param placed their years
 * @param wanted the year, or nothing to take all rows
 * @returns rows to place, and rows that may fill hours left empty
 */
export function rowsOfYear(
  minutes: Float64Array,
  { year }: PlacedRows,
  wanted: number | undefined,
): { readonly rows: Int32Array; readonly spare: Int32Array } {
  const rows: number[] = [];
  const spare: number[] = [];
  const begin = wanted === undefined ? 0 : dayNumber(wanted, 1, 1) * MINUTES_PER_DAY;
  const end = wanted === undefined ? 0 : dayNumber(wanted + 1, 1, 1) * MINUTES_PER_DAY;
  for (let i = 0; i < minutes.length; i++) {
    const minute = minutes[i] as number;
    if (Number.isNaN(minute)) continue;
    if (wanted === undefined || year[i] === wanted) rows.push(i);
    else if (minute >= begin - MINUTES_PER_DAY && minute < end + MINUTES_PER_DAY) spare.push(i);
  }
  return { rows: Int32Array.from(rows), spare: Int32Array.from(spare) };
}

/** The years of the file with their rows, for people. */
export function yearList(year: Int16Array): string {
  const counts = new Map<number, number>();
  for (const one of year) if (one !== 0) counts.set(one, (counts.get(one) ?? 0) + 1);
  const years = [...counts].sort(([a], [b]) => a - b);
  const listed = years.slice(0, 12).map(([one, rows]) => `${one} (${rows} ${rows === 1 ? 'row' : 'rows'})`);
  return years.length > 12 ? `${listed.join(', ')} and ${years.length - 12} more` : listed.join(', ');
}

/** Whether the wanted year is among the rows; a problem if not. */
export function hasYear(placed: PlacedRows, wanted: number, findings: Findings): boolean {
  if (placed.year.includes(wanted)) return true;
  findings.add({
    code: 'weather.no-such-year',
    severity: 'error',
    found: String(wanted),
    allowed: yearList(placed.year),
  });
  return false;
}

/**
 * Whether the rows make a year with a 29 February. A single stamp at its first minute does not: that is how 24:00 of
 * 28 February is written in a leap year.
 */
export function hasLeapDay({ minuteOfLeapYear }: PlacedRows, rows: Int32Array): boolean {
  for (const row of rows) {
    const minute = minuteOfLeapYear[row] as number;
    if (minute > LEAP_DAY_BEGIN && minute < LEAP_DAY_END) return true;
  }
  return false;
}

/** Minute of the year of 365 or 366 days; in the former 29 February counts as 1 March. */
export function minuteOfYear(minuteOfLeapYear: number, leap: boolean): number {
  return leap || minuteOfLeapYear < LEAP_DAY_END ? minuteOfLeapYear : minuteOfLeapYear - MINUTES_PER_DAY;
}
