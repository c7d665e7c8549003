import { IANAZone } from 'luxon';
import { MINUTES_PER_DAY } from './civilDays.ts';

/** From this instant on, and until the next span begins, the clock shows UTC plus the offset. */
export interface ZoneSpan {
  /** Minutes since 1970-01-01T00:00Z; −Infinity for the first. */
  readonly from: number;
  /** Minutes. */
  readonly offset: number;
}

const MILLIS_PER_MINUTE = 60_000;

/**
 * The offsets of a zone between two instants, found by a look a day and bisection to the minute.
 *
 * @param zone name of the IANA list
 * @param from first instant, minutes since 1970-01-01T00:00Z
 * @param to last instant, the same unit
 * @returns spans in order, the first without beginning; nothing for a zone that is not known
 * @example zoneSpans('Europe/Berlin', 25_771_680, 25_803_360)?.[0]?.offset // 60, in January 2019
 */
export function zoneSpans(zone: string, from: number, to: number): ZoneSpan[] | undefined {
  if (!IANAZone.isValidZone(zone)) return undefined;
  const iana = IANAZone.create(zone);
  const offsetAt = (minute: number) => Math.round(iana.offset(minute * MILLIS_PER_MINUTE));
  let offset = offsetAt(from);
  const spans: ZoneSpan[] = [{ from: Number.NEGATIVE_INFINITY, offset }];
  for (let day = from; day < to; day += MINUTES_PER_DAY) {
    const next = offsetAt(day + MINUTES_PER_DAY);
    if (next === offset) continue;
    let old = day;
    let changed = day + MINUTES_PER_DAY;
    while (changed - old > 1) {
      const middle = Math.floor((old + changed) / 2);
      if (offsetAt(middle) === next) changed = middle;
      else old = middle;
    }
    spans.push({ from: changed, offset: next });
    offset = next;
  }
  return spans;
}
