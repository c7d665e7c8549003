import type { YearOfRows } from './layOnYear.ts';

/**
 * Means of the hours over whatever rows of the hour hold a value.
 *
 * @param values one a row, NaN or Infinity where a row has none
 * @param year the rows laid on the year
 * @returns one value an hour, NaN for an hour without any: to be filled before it is used
 *
 * Reference: MODEL section 1.
 */
export function hourlyMeans(values: Float64Array, { hours, slotsPerHour, rowOfSlot }: YearOfRows): Float64Array {
  const means = new Float64Array(hours);
  for (let hour = 0; hour < hours; hour++) {
    let sum = 0;
    let count = 0;
    for (let slot = hour * slotsPerHour; slot < (hour + 1) * slotsPerHour; slot++) {
      const row = rowOfSlot[slot] as number;
      const value = row < 0 ? Number.NaN : (values[row] as number);
      if (!Number.isFinite(value)) continue;
      sum += value;
      count++;
    }
    means[hour] = count === 0 ? Number.NaN : sum / count;
  }
  return means;
}

/**
 * Line of the last row of each hour, 0 for hours that the file leaves out.
 *
 * @param lines physical line of each row
 */
export function hourLines(lines: Int32Array, { hours, slotsPerHour, rowOfSlot }: YearOfRows): Int32Array {
  const last = new Int32Array(hours);
  for (let hour = 0; hour < hours; hour++) {
    for (let slot = hour * slotsPerHour; slot < (hour + 1) * slotsPerHour; slot++) {
      const row = rowOfSlot[slot] as number;
      if (row >= 0) last[hour] = lines[row] as number;
    }
  }
  return last;
}
