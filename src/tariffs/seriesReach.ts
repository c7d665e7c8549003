import type { Problem } from '../core/problem.ts';
import { dateText, timeText } from '../core/stampText.ts';
import type { RegularValues, SeriesMeans } from './seriesMeans.ts';
import type { SeriesKind } from './timeSeries.ts';

/** Hours that the offset of the weather may differ from the zone's before a borrowed value tells of a wrong year. */
const BORROWED_HOURS_WITHOUT_WARNING = 24;

/**
 * Whether a series held the year for which it was looked up.
 *
 * @param series with the name of its file
 * @param means of it, after every step was asked for
 * @param kind what the values are called
 * @returns an error where an instant has no value at all, a warning where many were taken from the year before or after
 */
export function seriesReach(
  series: RegularValues & { readonly file: string },
  means: SeriesMeans,
  kind: Pick<SeriesKind, 'one' | 'many'>,
): Problem[] {
  const { file } = series;
  const missing = means.firstMissing();
  if (missing !== undefined) {
    return [{ code: 'series.short', severity: 'error', file, found: utcText(missing), unit: kind.one }];
  }
  const hours = means.borrowedMinutes() / 60;
  if (hours <= BORROWED_HOURS_WITHOUT_WARNING) return [];
  const end = series.startMinute + series.values.length * series.stepMinutes;
  const allowed = `${utcText(series.startMinute)} to ${utcText(end)}`;
  return [{ code: 'series.of-other-year', severity: 'warning', file, found: String(hours), allowed, unit: kind.one }];
}

/** An instant as a stamp in UTC. */
function utcText(minute: number): string {
  const date = new Date(minute * 60_000);
  const day = dateText(date.getUTCFullYear(), date.getUTCMonth() + 1, date.getUTCDate());
  return `${day}T${timeText(date.getUTCHours() * 60 + date.getUTCMinutes())}Z`;
}
