import { isLeapYear } from '../core/civilDate.ts';
import { type Problem, type ProblemCode, shown } from '../core/problem.ts';
import { type OffsetSpan, zoneOffsets } from '../core/zoneOffsets.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import { instantsOf, readStamp, type Stamp } from '../tariffs/seriesStamps.ts';
import { civilStamps, stamp } from './hourStamps.ts';

/** The hour of a year that holds a time. */
export interface AskedHour {
  /** 0 … hours − 1. */
  readonly hour: number;
  /** Whether the time is the hour's beginning. */
  readonly isBeginning: boolean;
}

const MILLIS_PER_MINUTE = 60_000;
const MILLIS_PER_HOUR = 3_600_000;
/** Changes of the clocks are looked for so many minutes around a time. */
const AROUND = 2 * 1440;

/** What a problem of the time calls its place. */
const PLACE = '--at';

/**
 * Finds the hour that holds a time.
 *
 * @param text ISO 8601 date and time in whole minutes; civil time of the clock's zone unless an offset is written
 * @param clock civil time of the simulated year
 * @returns the hour; or a problem where the time cannot be read, occurs twice or never, or is not simulated
 * @example askedHour('2025-01-14T06:00', clock).asked?.hour // 318 in Berlin, with weather in UTC+1
 *
 * Reference: MODEL section 1.
 */
export function askedHour(text: string, clock: CivilClock): { asked?: AskedHour; problem?: Problem } {
  const written = readStamp(text.trim());
  if (written === undefined) return { problem: fault('hour.unreadable', text, '') };
  const spans = zoneOffsets(clock.zone, written.clockMinute - AROUND, written.clockMinute + AROUND) ?? [];
  const instants =
    written.offsetMinutes === undefined
      ? instantsOf(written.clockMinute, spans)
      : [written.clockMinute - written.offsetMinutes];
  const [first, second] = instants;
  if (first === undefined) return { problem: fault('hour.skipped', text, timeAfter(written, spans)) };
  if (second !== undefined) return { problem: fault('hour.twice', text, bothTimes(written, first, second)) };
  return hourOf(first * MILLIS_PER_MINUTE, text, written, clock);
}

function hourOf(instant: number, text: string, written: Stamp, clock: CivilClock): ReturnType<typeof askedHour> {
  const hour = clock.startMillis.findLastIndex((start) => start <= instant);
  const start = clock.startMillis[hour];
  if (hour >= 0 && instant < start + MILLIS_PER_HOUR) return { asked: { hour, isBeginning: instant === start } };
  const year = new Date(written.clockMinute * MILLIS_PER_MINUTE).getUTCFullYear();
  if (year !== clock.calendarYear) return { problem: fault('hour.other-year', text, String(clock.calendarYear)) };
  return { problem: fault('hour.not-simulated', text, simulatedHours(clock)) };
}

/** The first time after the hour that the clocks skip. */
function timeAfter({ clockMinute }: Stamp, spans: readonly OffsetSpan[]): string {
  const next = spans.find(({ fromMinute, offsetMinutes }) => fromMinute + offsetMinutes > clockMinute);
  return next === undefined ? '' : civil(next.fromMinute + next.offsetMinutes);
}

function bothTimes({ clockMinute }: Stamp, first: number, second: number): string {
  const text = (instant: number) => stamp(instant * MILLIS_PER_MINUTE, clockMinute - instant);
  return `${text(first)} for the first or ${text(second)} for the second`;
}

function simulatedHours(clock: CivilClock): string {
  const stamps = civilStamps(clock);
  const skips = isLeapYear(clock.calendarYear) && clock.daysOfMonth[1] === 28 ? ', without 29 February' : '';
  return `${stamps[0]} to ${stamps[stamps.length - 1]} in civil time${skips}`;
}

/** Minutes of a clock as it shows them. */
function civil(minute: number): string {
  return new Date(minute * MILLIS_PER_MINUTE).toISOString().slice(0, 16);
}

function fault(code: ProblemCode, text: string, allowed: string): Problem {
  return { code, severity: 'error', file: PLACE, path: 'at', found: shown(text), allowed };
}
