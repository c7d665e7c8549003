import { HOURS_PER_DAY } from '../../core/constants.ts';
import { compensatedSum } from '../../core/sum.ts';
import { LONGEST_FILLED } from '../../weather/read/absentHours.ts';
import type { DatedTemperatures } from './datedTemperatures.ts';
import { dayText } from './readingDates.ts';

/** Mean outdoor temperature by day of standard time. */
export interface WeatherDays {
  /** Number of the first day, 1970-01-01 being 0. */
  readonly firstDay: number;
  /** °C; NaN where the day is not whole. */
  readonly means: Float64Array;
  /** Hours that were interpolated. */
  readonly filledHours: number;
}

const MINUTES_PER_HOUR = 60;

/**
 * Joins weather files and takes the means of whole days. Gaps of up to 6 hours are interpolated, also where two files meet;
 * a day with a longer one has no mean. Where files overlap, the first counts.
 *
 * @param files at least one; all are laid on the standard time of the first
 * @returns days from the first to the last hour of all files
 *
 * Reference: MODEL sections 1 and 2 (`mean`).
 */
export function weatherDays(files: readonly DatedTemperatures[]): WeatherDays {
  const begins = files.map(
    ({ firstHour, offsetMinutes }) => firstHour + laterBy(files[0].offsetMinutes, offsetMinutes),
  );
  const ends = begins.map((begin, i) => begin + files[i].temperature.length);
  const firstDay = Math.floor(begins.reduce((a, b) => Math.min(a, b)) / HOURS_PER_DAY);
  const days = Math.ceil(ends.reduce((a, b) => Math.max(a, b)) / HOURS_PER_DAY) - firstDay;
  const hours = new Float64Array(days * HOURS_PER_DAY).fill(Number.NaN);
  files.forEach(({ temperature }, i) => {
    const shift = begins[i] - firstDay * HOURS_PER_DAY;
    temperature.forEach((value, hour) => {
      if (Number.isNaN(hours[hour + shift])) hours[hour + shift] = value;
    });
  });
  const filledHours = fillShortGaps(hours);
  const means = Float64Array.from(
    { length: days },
    (_, day) => compensatedSum(hours, day * HOURS_PER_DAY, (day + 1) * HOURS_PER_DAY) / HOURS_PER_DAY,
  );
  return { firstDay, means, filledHours };
}

/** Means of the days from one to another, or nothing where a day is missing. */
export function meansBetween(
  { firstDay, means }: WeatherDays,
  fromDay: number,
  toDay: number,
): Float64Array | undefined {
  if (fromDay < firstDay || toDay > firstDay + means.length) return undefined;
  const part = means.slice(fromDay - firstDay, toDay - firstDay);
  return part.some((mean) => Number.isNaN(mean)) ? undefined : part;
}

/** Stretches of whole days for people, at most three: `2024-01-01 to 2025-12-31`. */
export function coveredText({ firstDay, means }: WeatherDays): string {
  const spans: string[] = [];
  let begin = -1;
  for (let day = 0; day <= means.length; day++) {
    const whole = day < means.length && !Number.isNaN(means[day]);
    if (whole && begin < 0) begin = day;
    if (whole || begin < 0) continue;
    spans.push(`${dayText(firstDay + begin)} to ${dayText(firstDay + day - 1)}`);
    begin = -1;
  }
  if (spans.length === 0) return 'no whole day';
  return spans.length > 3 ? `${spans.slice(0, 3).join(', ')} and ${spans.length - 3} more stretches` : spans.join(', ');
}

/** Hours by which a clock of one offset is ahead of a clock of another. */
function laterBy(offsetMinutes: number, other: number): number {
  return Math.round((offsetMinutes - other) / MINUTES_PER_HOUR);
}

/** Interpolates gaps inside the hours, in place; returns how many hours were filled. */
function fillShortGaps(hours: Float64Array): number {
  let filled = 0;
  let last = -1;
  for (let hour = 0; hour < hours.length; hour++) {
    if (Number.isNaN(hours[hour])) continue;
    const gap = hour - last - 1;
    if (last >= 0 && gap > 0 && gap <= LONGEST_FILLED) {
      const step = (hours[hour] - hours[last]) / (gap + 1);
      for (let i = 1; i <= gap; i++) hours[last + i] = hours[last] + i * step;
      filled += gap;
    }
    last = hour;
  }
  return filled;
}
