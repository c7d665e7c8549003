import type { CivilClock } from '../tariffs/civilClock.ts';

const MILLIS_PER_MINUTE = 60_000;

/**
 * Standard time of an hour's beginning with its offset.
 *
 * @param clock of the year
 * @param hour 0 … hours − 1
 * @returns ISO 8601
 * @example standardStamp(clock, 0) // '2025-01-01T00:00+01:00' with UTC+1
 */
export function standardStamp(clock: CivilClock, hour: number): string {
  return stamp(clock.startMillis[hour], clock.offsetMinutes);
}

/**
 * Civil time of every hour's beginning with its offset, so that the two hours of one name in autumn differ.
 *
 * @param clock of the year
 * @returns ISO 8601, one an hour
 * @example civilStamps(clock)[4344] // '2025-07-01T01:00+02:00' in Berlin
 */
export function civilStamps(clock: CivilClock): string[] {
  const stamps: string[] = [];
  for (const day of clock.stretches) {
    const midnight = Date.UTC(day.year, day.month - 1, day.dayOfMonth);
    for (let hour = Math.ceil(day.fromMinute / 60); hour * 60 < day.toMinute; hour++) {
      const local = midnight + (day.minuteOfDay + hour * 60 - day.fromMinute) * MILLIS_PER_MINUTE;
      const instant = clock.startMillis[hour];
      stamps.push(stamp(instant, Math.round((local - instant) / MILLIS_PER_MINUTE)));
    }
  }
  return stamps;
}

/** An instant in ms since 1970-01-01T00:00Z as ISO 8601 in minutes, on a clock so many minutes ahead of UTC. */
export function stamp(instant: number, offsetMinutes: number): string {
  const local = new Date(instant + offsetMinutes * MILLIS_PER_MINUTE).toISOString().slice(0, 16);
  const size = Math.abs(offsetMinutes);
  const two = (value: number) => String(value).padStart(2, '0');
  return `${local}${offsetMinutes < 0 ? '-' : '+'}${two(Math.floor(size / 60))}:${two(size % 60)}`;
}
