import type { CivilClock } from './civilClock.ts';

/** Regular values from an instant on. */
export interface RegularValues {
  /** Beginning of the first value, minutes since 1970-01-01T00:00Z. */
  readonly startMinute: number;
  /** 1 to 60 whole minutes. */
  readonly stepMinutes: number;
  readonly values: Float64Array;
}

/** The series' means over a clock's steps, and where it could not give one. */
export interface SeriesMeans {
  /** Mean of minutes [from, to) of a step. */
  meanOf(step: number, from: number, to: number): number;
  /** Minutes for which the value of a year before or after was taken, so far. */
  borrowedMinutes(): number;
  /** First instant without a value so far, minutes since 1970-01-01T00:00Z. */
  firstMissing(): number | undefined;
}

const MILLIS_PER_MINUTE = 60_000;

/**
 * Looks up a series at the minutes of a year. An instant that the series does not reach takes the value of one year later
 * or earlier: the year is taken as periodic, so that a series in local time serves weather in another offset.
 *
 * @param clock the year's civil time; where 29 February is skipped, the year that is added or taken off still has it
 * @param series regular steps of 1 to 60 minutes
 */
export function seriesMeans(clock: CivilClock, series: RegularValues): SeriesMeans {
  const { startMinute, stepMinutes, values } = series;
  const length = values.length * stepMinutes;
  const { startMillis, hours } = clock;
  const yearMinutes = (startMillis[hours - 1] - startMillis[0]) / MILLIS_PER_MINUTE + 60;
  let borrowed = 0;
  let missing: number | undefined;

  const reached = (minute: number): number => {
    if (minute >= 0 && minute < length) return minute;
    const other = minute < 0 ? minute + yearMinutes : minute - yearMinutes;
    return other >= 0 && other < length ? other : -1;
  };

  const meanOf = (step: number, from: number, to: number): number => {
    const first = startMillis[step] / MILLIS_PER_MINUTE + from - startMinute;
    const index = Math.floor(first / stepMinutes);
    const end = first + to - from;
    if (index >= 0 && index < values.length && end <= (index + 1) * stepMinutes) return values[index];
    let sum = 0;
    for (let minute = first; minute < end; ) {
      const found = reached(minute);
      const at = Math.floor(found / stepMinutes);
      const count = found < 0 ? 1 : Math.min(end - minute, (at + 1) * stepMinutes - found);
      if (found < 0) missing ??= minute + startMinute;
      else sum += count * values[at];
      if (found !== minute) borrowed += count;
      minute += count;
    }
    return sum / (to - from);
  };

  return { meanOf, borrowedMinutes: () => borrowed, firstMissing: () => missing };
}
