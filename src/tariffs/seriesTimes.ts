import { MINUTES_PER_DAY } from '../core/civilDate.ts';
import { shown } from '../core/problem.ts';
import { type OffsetSpan, zoneOffsets } from '../core/zoneOffsets.ts';
import type { SeriesFaults } from './seriesFaults.ts';
import { instantsOf, readStamp, type Stamp } from './seriesStamps.ts';
import type { SeriesTable } from './seriesTable.ts';
import type { SeriesKind, SeriesSettings } from './timeSeries.ts';

const LONGEST_STEP = 60;

const ALLOWED_STAMP = {
  withOffset: 'YYYY-MM-DDTHH:MM with Z or an offset such as +01:00',
  utc: 'YYYY-MM-DDTHH:MM',
  local: 'YYYY-MM-DDTHH:MM',
} as const;

/**
 * The instants of the rows of a file. In local time the clock that is put back shows an hour twice: the first row of
 * that hour is taken for its first pass, and a row that would not be later than the one before for its second.
 *
 * @param faults takes the stamps that cannot be read
 * @returns minutes since 1970-01-01T00:00Z; nothing where a stamp cannot be read
 */
export function instantsOfRows(
  table: SeriesTable,
  { stamps: kind }: SeriesSettings,
  zone: string,
  faults: SeriesFaults,
): (number | undefined)[] {
  const stamps = table.rows.map((row) => readStamp(row.time));
  const spans = kind === 'local' ? spansAround(stamps, zone) : [];
  let before = Number.NEGATIVE_INFINITY;
  return stamps.map((stamp, i) => {
    const row = table.rows[i];
    const place = () => ({ ...table.placeOf(row, 'time'), found: shown(row.time === '' ? 'an empty cell' : row.time) });
    if (!stamp || (stamp.offsetMinutes === undefined && kind === 'withOffset')) {
      faults.add({ code: 'series.stamp', ...place(), allowed: ALLOWED_STAMP[kind] });
      return undefined;
    }
    if (stamp.offsetMinutes !== undefined || kind !== 'local') {
      before = stamp.clockMinute - (stamp.offsetMinutes ?? 0);
      return before;
    }
    const instants = instantsOf(stamp.clockMinute, spans);
    if (instants.length === 0) {
      faults.add({ code: 'series.no-such-time', ...place(), allowed: zone });
      return undefined;
    }
    before = instants.find((instant) => instant > before) ?? instants[0];
    return before;
  });
}

/** The zone's offsets over the whole file, a day or two beyond both ends. */
function spansAround(stamps: readonly (Stamp | undefined)[], zone: string): OffsetSpan[] {
  let first = Number.POSITIVE_INFINITY;
  let last = Number.NEGATIVE_INFINITY;
  for (const stamp of stamps) {
    if (!stamp) continue;
    first = Math.min(first, stamp.clockMinute);
    last = Math.max(last, stamp.clockMinute);
  }
  if (first > last) return [];
  return zoneOffsets(zone, first - 2 * MINUTES_PER_DAY, last + 2 * MINUTES_PER_DAY) ?? [];
}

/**
 * The step of a regular file: the distance that most rows keep. Gaps, repeats, disorder and rows out of step become
 * faults.
 *
 * @param instants minutes since 1970-01-01T00:00Z, as of `instantsOfRows`
 * @returns minutes, 1 to 60; nothing where the step is not allowed
 */
export function stepOfRows(
  instants: readonly (number | undefined)[],
  { table, kind }: { readonly table: SeriesTable; readonly kind: SeriesKind },
  faults: SeriesFaults,
): number | undefined {
  const unit = kind.many;
  const step = commonDistance(instants) ?? LONGEST_STEP;
  if (step > LONGEST_STEP) {
    const place = table.placeOf(table.rows[0], 'time');
    faults.add({ code: 'series.step', ...place, found: `${step} minutes`, allowed: 'at most 60 minutes', unit });
    return undefined;
  }
  for (let i = 1; i < instants.length; i++) {
    const [before, at] = [instants[i - 1], instants[i]];
    if (before === undefined || at === undefined || at - before === step) continue;
    const row = table.rows[i];
    const place = { ...table.placeOf(row, 'time'), found: shown(row.time) };
    const distance = at - before;
    if (distance === 0) faults.add({ code: 'series.repeat', ...place, unit: kind.one });
    else if (distance < 0) faults.add({ code: 'series.disorder', ...place });
    else if (distance % step !== 0) {
      faults.add({ code: 'series.irregular', ...place, allowed: `${step} minutes`, unit });
    } else faults.add({ code: 'series.gap', ...place, allowed: `${distance / step - 1} of ${step} minutes`, unit });
  }
  return step;
}

function commonDistance(instants: readonly (number | undefined)[]): number | undefined {
  const counts = new Map<number, number>();
  let best: number | undefined;
  for (let i = 1; i < instants.length; i++) {
    const [before, at] = [instants[i - 1], instants[i]];
    if (before === undefined || at === undefined || at <= before) continue;
    const count = (counts.get(at - before) ?? 0) + 1;
    counts.set(at - before, count);
    if (best === undefined || count > (counts.get(best) ?? 0)) best = at - before;
  }
  return best;
}
