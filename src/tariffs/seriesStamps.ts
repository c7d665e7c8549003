import { dayNumber, writtenDate } from '../core/civilDate.ts';
import type { OffsetSpan } from '../core/zoneOffsets.ts';

/** A stamp as written. */
export interface Stamp {
  /** What the clock shows, minutes since 1970-01-01 00:00 of that clock. */
  readonly clockMinute: number;
  /** Offset of that clock from UTC where the stamp says so, minutes. */
  readonly offsetMinutes?: number;
}

const STAMP = /^(\d{4}-\d\d-\d\d)[T ](\d\d):(\d\d)(?::00(?:\.0+)?)?\s?(?:(Z)|([+-])(\d\d):?(\d\d)?)?$/;
const FIRST_YEAR = 1970;
const LAST_YEAR = 2100;

/**
 * Reads a stamp of ISO 8601 in whole minutes, with or without its offset from UTC.
 *
 * @returns nothing where the text is no such stamp, the date does not exist, or its year is not 1970 to 2100
 * @example readStamp('1970-01-02T00:30+01:00') // { clockMinute: 1470, offsetMinutes: 60 }
 */
export function readStamp(text: string): Stamp | undefined {
  const match = STAMP.exec(text);
  if (!match) return undefined;
  const date = writtenDate(match[1]);
  const hour = Number(match[2]);
  const minute = Number(match[3]);
  if (date?.year === undefined || date.year < FIRST_YEAR || date.year > LAST_YEAR) return undefined;
  if (hour > 23 || minute > 59) return undefined;
  const clockMinute = dayNumber(date.year, date.month, date.dayOfMonth) * 1440 + hour * 60 + minute;
  if (match[4]) return { clockMinute, offsetMinutes: 0 };
  if (!match[5]) return { clockMinute };
  const offset = Number(match[6]) * 60 + Number(match[7] ?? 0);
  if (offset > 18 * 60) return undefined;
  return { clockMinute, offsetMinutes: match[5] === '-' ? -offset : offset };
}

/**
 * The instants at which a zone's clocks show a time: none in the hour that is skipped, two in the one that is repeated.
 *
 * @param clockMinute what the clock shows, minutes since 1970-01-01 00:00
 * @param spans the zone's offsets around that time
 * @returns minutes since 1970-01-01T00:00Z, rising
 */
export function instantsOf(clockMinute: number, spans: readonly OffsetSpan[]): number[] {
  const instants: number[] = [];
  spans.forEach(({ fromMinute, offsetMinutes }, i) => {
    const instant = clockMinute - offsetMinutes;
    const end = spans[i + 1]?.fromMinute ?? Number.POSITIVE_INFINITY;
    if (instant >= fromMinute && instant < end) instants.push(instant);
  });
  return instants;
}
