import { HOURS_OF_LEAP_YEAR, HOURS_PER_DAY } from '../core/constants.ts';

const DAYS_OF_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/**
 * First step of each month of standard time.
 *
 * @param hours steps of the year, 8760 or 8784 (with a 29 February); any other length counts as the beginning of a
 *   common year, and months that it does not reach are empty
 * @returns 13 entries: the first step of January … December, then the number of steps
 * @example monthStarts(8760)[2] // 1416, the first hour of March
 *
 * Reference: MODEL section 1.
 */
export function monthStarts(hours: number): Int32Array {
  const starts = new Int32Array(13);
  let step = 0;
  DAYS_OF_MONTH.forEach((days, month) => {
    const leapDay = month === 1 && hours === HOURS_OF_LEAP_YEAR ? 1 : 0;
    step += (days + leapDay) * HOURS_PER_DAY;
    starts[month + 1] = Math.min(step, hours);
  });
  return starts;
}
