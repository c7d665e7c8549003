import { shown } from '../../core/problem.ts';
import type { Findings } from './findings.ts';

const MOST_STATIONS = 1000;
const LISTED = 12;

/** Lets the rows of one station pass. */
export interface StationFilter {
  takes(row: readonly string[]): boolean;
  /** Reports a file of several stations of which none was chosen, or a chosen one that is not there. */
  report(findings: Findings, index: number): void;
  /** The station of all rows that passed, if they name one. */
  only(): string | undefined;
}

/**
 * A filter for the rows of one station; without a choice all rows pass, and several stations are an error.
 *
 * @param index column of the station, counted from 0; absent where no column names stations
 * @param value the station that the settings choose
 */
export function createStationFilter(index: number | undefined, value: string | number | undefined): StationFilter {
  const counts = new Map<string, number>();
  if (index === undefined) return { takes: () => true, report: () => {}, only: () => undefined };
  const wanted = value === undefined ? undefined : stationKey(String(value));
  return {
    takes(row) {
      const station = stationKey(row[index] ?? '');
      const known = counts.get(station);
      if (known !== undefined || counts.size < MOST_STATIONS) counts.set(station, (known ?? 0) + 1);
      return wanted === undefined || station === wanted;
    },
    report(findings, column) {
      if (wanted === undefined && counts.size > 1) {
        findings.add({
          code: 'weather.several-stations',
          severity: 'error',
          path: String(column + 1),
          found: listed(counts),
        });
      } else if (wanted !== undefined && !counts.has(wanted)) {
        const found = `“${shown(String(value))}”`;
        findings.add({ code: 'weather.no-such-station', severity: 'error', found, allowed: listed(counts) });
      }
    },
    only() {
      return wanted ?? (counts.size === 1 ? [...counts.keys()][0] : undefined);
    },
  };
}

/** A number with leading zeros names the same station as without. */
function stationKey(text: string): string {
  const bare = text.trim();
  return /^\d+$/.test(bare) ? bare.replace(/^0+(?=\d)/, '') : bare;
}

function listed(counts: ReadonlyMap<string, number>): string {
  const all = [...counts].map(([station, rows]) => `“${shown(station, 30)}” (${rows} rows)`);
  if (all.length <= LISTED) return all.join(', ');
  return `${all.slice(0, LISTED).join(', ')} and ${counts.size - LISTED} more`;
}
