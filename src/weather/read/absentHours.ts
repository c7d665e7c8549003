import type { AbsentHours } from '../readSettings.ts';
import type { Findings } from './findings.ts';
import { type HourRun, hourRuns, lineBefore, runList } from './hourRuns.ts';

/** Longest run of hours that is interpolated. Reference: MODEL section 1. */
export const LONGEST_FILLED = 6;

/**
 * Looks for hours of the year that the file leaves out. Six on end may be filled where the settings allow it; more, and
 * the file holds a part of a year.
 *
 * @param lines line of the last row of each hour, 0 where it has none
 * @param allowed what the settings say about such hours
 * @returns whether the year may be used
 */
export function checkAbsentHours(lines: Int32Array, allowed: AbsentHours, findings: Findings): boolean {
  const hours = lines.length;
  const runs = hourRuns(hours, (hour) => lines[hour] === 0);
  const long = runs.filter(({ length }) => length > LONGEST_FILLED);
  const [first] = long.length > 0 ? long : runs;
  if (first === undefined) return true;
  if (long.length > 0) {
    const present = hours - runs.reduce((sum, { length }) => sum + length, 0);
    findings.add({
      code: 'weather.part-year',
      severity: 'error',
      ...atLineBefore(first, lines),
      found: `${present} of the ${hours} hours`,
      allowed: runList(runs, hours),
    });
    return false;
  }
  if (allowed === 'fill') return true;
  const found = runList(runs, hours);
  findings.add({ code: 'weather.absent-hours', severity: 'error', ...atLineBefore(first, lines), found });
  return false;
}

/** The line of the row before a run, where there is one. */
export function atLineBefore(run: HourRun, lines: Int32Array): { line?: number } {
  const line = lineBefore(run, lines);
  return line === undefined ? {} : { line };
}
