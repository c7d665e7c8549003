import { IANAZone } from 'luxon';
import { MINUTES_PER_DAY } from './civilDate.ts';

/** From this instant on, and until the next span begins, civil time is UTC plus the offset. */
export interface OffsetSpan {
  /** Minutes since 1970-01-01T00:00Z. */
  readonly fromMinute: number;
  /** Civil time less UTC, minutes. */
  readonly offsetMinutes: number;
}

const MILLIS_PER_MINUTE = 60_000;

/**
 * The offsets of a time zone between two instants: a look a day, and bisection to the minute where it changed.
 *
 * A zone that changed and changed back within one day would be missed; none did since 1970.
 *
 * @param zone name of the IANA list
 * @param fromMinute first instant, minutes since 1970-01-01T00:00Z
 * @param toMinute last instant, the same unit
 * @returns spans in order, the first beginning at `fromMinute`; nothing for a zone that is not known
 * @example zoneOffsets('Europe/Berlin', 28_927_680, 29_000_000) // [{ fromMinute: 28_927_680, offsetMinutes: 60 }]
 */
export function zoneOffsets(zone: string, fromMinute: number, toMinute: number): OffsetSpan[] | undefined {
  if (!IANAZone.isValidZone(zone)) return undefined;
  const iana = IANAZone.create(zone);
  const offsetAt = (minute: number): number => Math.round(iana.offset(minute * MILLIS_PER_MINUTE));
  let offset = offsetAt(fromMinute);
  const spans: OffsetSpan[] = [{ fromMinute, offsetMinutes: offset }];
  for (let before = fromMinute; before < toMinute; before += MINUTES_PER_DAY) {
    const after = Math.min(before + MINUTES_PER_DAY, toMinute);
    const next = offsetAt(after);
    if (next === offset) continue;
    spans.push({ fromMinute: firstMinuteOf(next, before, after, offsetAt), offsetMinutes: next });
    offset = next;
  }
  return spans;
}

/** The first minute in (before, after] at which the new offset holds. */
function firstMinuteOf(offset: number, before: number, after: number, offsetAt: (minute: number) => number): number {
  let old = before;
  let changed = after;
  while (changed - old > 1) {
    const middle = Math.floor((old + changed) / 2);
    if (offsetAt(middle) === offset) changed = middle;
    else old = middle;
  }
  return changed;
}
