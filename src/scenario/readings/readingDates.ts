import { civilDay, dayExists, dayNumber } from '../../core/civilDate.ts';
import { shown } from '../../core/problem.ts';
import { dateText } from '../../core/stampText.ts';
import { type StampParts, scanStamp } from '../../weather/read/scanStamp.ts';
import type { MeterTable } from './meterTable.ts';
import type { ReadingFaults } from './readingFaults.ts';

const FIRST_YEAR = 1970;
const LAST_YEAR = 2100;
const ALLOWED = `as 2024-03-31 or 31.3.2024, from ${FIRST_YEAR} to ${LAST_YEAR}`;

/**
 * The dates of the readings: year-month-day, day.month.year, or with slashes where some date tells day from month. A time
 * of day is allowed and does not count.
 *
 * @param table the readings
 * @param index of the column, counted from 0
 * @param faults takes the dates that cannot be read
 * @returns day numbers, 1970-01-01 being 0; nothing where a date cannot be read
 */
export function readingDates(table: MeterTable, index: number, faults: ReadingFaults): (number | undefined)[] {
  const parts = table.records.map(({ cells }) => dateParts(cells[index] ?? ''));
  const open = parts.flatMap((part) => (part?.order === 'open' ? [part] : []));
  const dayFirst = open.some(({ first }) => first > 12);
  if (open.length > 0 && !dayFirst && !open.some(({ second }) => second > 12)) {
    const row = parts.findIndex((part) => part?.order === 'open');
    const { line, cells } = table.records[row];
    const found = `“${shown(cells[index] ?? '', 40)}”`;
    faults.add({ code: 'readings.day-month-order', ...table.placeOf(line, index), found });
    return parts.map(() => undefined);
  }
  return parts.map((part, i) => {
    const day = part === undefined ? undefined : dayOf(part, dayFirst);
    if (day === undefined) {
      const { line, cells } = table.records[i];
      const cell = cells[index] ?? '';
      const found = cell === '' ? 'an empty cell' : `“${shown(cell, 40)}”`;
      faults.add({ code: 'readings.date', ...table.placeOf(line, index), found, allowed: ALLOWED });
    }
    return day;
  });
}

/** A day for people: `2024-03-31`. @param day number, 1970-01-01 being 0 */
export function dayText(day: number): string {
  const { year, month, day: dayOfMonth } = civilDay(day);
  return dateText(year, month, dayOfMonth);
}

function dateParts(cell: string): StampParts | undefined {
  const parts: StampParts = { order: 'none', year: 0, first: 0, second: 0, minute: 0, offset: 0 };
  return scanStamp(cell, parts) && parts.order !== 'none' ? parts : undefined;
}

function dayOf({ order, year, first, second }: StampParts, dayFirst: boolean): number | undefined {
  const swap = order === 'day-month' || (order === 'open' && dayFirst);
  const [month, dayOfMonth] = swap ? [second, first] : [first, second];
  if (!(year >= FIRST_YEAR && year <= LAST_YEAR) || !dayExists(year, month, dayOfMonth)) return undefined;
  return dayNumber(year, month, dayOfMonth);
}
