import type { OffsetSpan } from '../../core/zoneOffsets.ts';

/** Rows lie within this of a clock change to tell something about it, minutes. */
const NEAR = 240;
/** A clock that is set back repeats less than this, minutes. */
const LONGEST_REPEAT = 180;

/** More rows out of step than clock changes and gaps explain. */
const MOST_IRREGULAR = 5000;

/** A local clock: its offsets, and the offset of standard time onto which it is converted. */
export interface LocalClock {
  readonly spans: readonly OffsetSpan[];
  readonly standardOffset: number;
  /** Whether the file runs backwards in time. */
  readonly backwards: boolean;
}

/**
 * Stamps of a local clock as standard time. Of the hour that occurs twice the first reading in time is summer time.
 *
 * @param readings minutes of the local clock in the order of the file
 * @param clock the zone's offsets
 * @returns minutes of standard time, NaN for a reading over which the clock is put forward
 */
export function localToStandard(readings: Float64Array, clock: LocalClock): Float64Array {
  const { spans, standardOffset, backwards } = clock;
  const count = readings.length;
  const standard = new Float64Array(count);
  let k = 0;
  let before = Number.NEGATIVE_INFINITY;
  for (let n = 0; n < count; n++) {
    const i = backwards ? count - 1 - n : n;
    const reading = readings[i] as number;
    k = earliestSpan(spans, reading, k);
    let instant = reading - offsetOf(spans, k);
    if (instant < fromOf(spans, k)) instant = Number.NaN;
    else if (before >= instant && before < instant + LONGEST_REPEAT && k + 1 < spans.length) {
      const second = reading - offsetOf(spans, k + 1);
      if (second >= fromOf(spans, k + 1)) instant = second;
    }
    standard[i] = instant + standardOffset;
    if (!Number.isNaN(instant)) before = instant;
  }
  return standard;
}

/** The first span that has not ended at this reading of its clock, searched from a near one. */
function earliestSpan(spans: readonly OffsetSpan[], reading: number, near: number): number {
  let k = near;
  while (k > 0 && reading - offsetOf(spans, k - 1) < fromOf(spans, k)) k--;
  while (reading - offsetOf(spans, k) >= fromOf(spans, k + 1)) k++;
  return k;
}

function offsetOf(spans: readonly OffsetSpan[], k: number): number {
  return (spans[k] as OffsetSpan).offsetMinutes;
}

/** The first span holds for all that lies before it too. */
function fromOf(spans: readonly OffsetSpan[], k: number): number {
  if (k === 0) return Number.NEGATIVE_INFINITY;
  return spans[k]?.fromMinute ?? Number.POSITIVE_INFINITY;
}

/**
 * Rows that are not one step before the next, by index; a reading that does not exist is never in step.
 *
 * @param stride minutes from one row to the next, negative in a file that runs backwards
 */
export function irregularRows(minutes: Float64Array, stride: number): number[] {
  const rows: number[] = [];
  for (let i = 1; i < minutes.length; i++) {
    if ((minutes[i] as number) - (minutes[i - 1] as number) !== stride) rows.push(i - 1);
  }
  return rows;
}

/**
 * Whether stamps keep the local clock: at a change in spring and at one in autumn they are out of step as they stand and
 * in step once converted, and at no change the other way round.
 *
 * @param readings minutes as they stand
 * @param converted the same as standard time
 * @param stride minutes from one row to the next
 * @param spans the zone's offsets
 */
export function keepsLocalClock(
  readings: Float64Array,
  converted: Float64Array,
  stride: number,
  spans: readonly OffsetSpan[],
): boolean {
  const asTheyStand = irregularRows(readings, stride).map((i) => readings[i] as number);
  const once = irregularRows(converted, stride).map((i) => readings[i] as number);
  if (asTheyStand.length === 0 || asTheyStand.length > MOST_IRREGULAR || once.length > MOST_IRREGULAR) return false;
  let forward = 0;
  let back = 0;
  for (let k = 1; k < spans.length; k++) {
    const change = fromOf(spans, k) + offsetOf(spans, k - 1);
    const isNear = (reading: number) => Math.abs(reading - change) <= NEAR;
    if (once.some(isNear)) return false;
    if (!asTheyStand.some(isNear)) continue;
    if (offsetOf(spans, k) > offsetOf(spans, k - 1)) forward++;
    else back++;
  }
  return forward > 0 && back > 0;
}
