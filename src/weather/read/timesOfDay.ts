import { parseNumber } from './parseNumber.ts';
import { type StampParts, scanStamp } from './scanStamp.ts';

/**
 * Minutes of the day of a column of times: `13:30`, `1330`, whole hours, or hours with a fraction.
 *
 * Numbers are hours as long as none exceeds 24, else hours and minutes run together (`30` is then 00:30).
 *
 * @param cells the column
 * @param mark code of the decimal mark
 * @returns minutes from 0 to 1440, NaN for a cell that is no time
 * @example timesOfDay(['0', '30', '1330'], 46) // 0, 30, 810
 */
export function timesOfDay(cells: readonly string[], mark: number): Float64Array {
  const numbers = Float64Array.from(cells, (cell) => parseNumber(cell, mark));
  const runTogether = numbers.some((number) => number > 24);
  const parts: StampParts = { order: 'none', year: 0, first: 0, second: 0, minute: 0, offset: 0 };
  return numbers.map((number, i) => {
    if (!Number.isNaN(number)) return numberedTime(number, runTogether);
    const read = scanStamp((cells[i] as string).trim(), parts) && parts.order === 'none';
    return read ? parts.minute : Number.NaN;
  });
}

function numberedTime(number: number, runTogether: boolean): number {
  const minutes = runTogether ? Math.floor(number / 100) * 60 + (number % 100) : Math.round(number * 60);
  const possible = number >= 0 && minutes <= 1440 && (!runTogether || number % 100 < 60);
  return possible ? minutes : Number.NaN;
}

/**
 * Adds a column of minutes to the times of an hour column.
 *
 * A minute that is 60 throughout, or that stays the same while hours run to 24, tells nothing that the hour does not.
 *
 * @param times minutes of the day from the hour column; changed in place
 * @param cells the column of minutes
 * @param mark code of the decimal mark
 */
export function addMinutesOfHour(times: Float64Array, cells: readonly string[], mark: number): void {
  const minutes = Float64Array.from(cells, (cell) => parseNumber(cell, mark));
  const [first] = minutes;
  const constant = minutes.every((minute) => minute === first);
  if (constant && (first === 60 || times.includes(1440))) return;
  for (let i = 0; i < times.length; i++) {
    const minute = minutes[i] as number;
    const time = (times[i] as number) + minute;
    times[i] = minute >= 0 && minute < 60 && time <= 1440 ? time : Number.NaN;
  }
}
