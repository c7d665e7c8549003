import { atLineBefore, LONGEST_FILLED } from './absentHours.ts';
import type { Findings } from './findings.ts';
import { type HourRun, hourRuns, runList } from './hourRuns.ts';

/** Hours that were interpolated in a column. */
export interface FilledGaps {
  /** Hours filled. */
  readonly hours: number;
  /** Hours of the longest run of them. */
  readonly longest: number;
}

/** A column that may have gaps. */
export interface GappyColumn {
  /** One an hour, NaN where there is none. */
  readonly values: Float64Array;
  /** Line of the last row of each hour, 0 where the file leaves it out. */
  readonly lines: Int32Array;
  /** What the column is called. */
  readonly label: string;
  readonly findings: Findings;
}

/**
 * Interpolates hours without a value linearly between their neighbours, also across the year's ends.
 *
 * @param column filled in place where no run is longer than 6 hours
 * @returns what was filled, or nothing where a gap is too long, which is a problem
 *
 * Reference: MODEL section 1.
 */
export function fillGaps(column: GappyColumn): FilledGaps | undefined {
  const { values } = column;
  const hours = values.length;
  const runs = hourRuns(hours, (hour) => Number.isNaN(values[hour]));
  if (reportLongGaps(column, runs)) return undefined;
  let filled = 0;
  let longest = 0;
  for (const { first, length } of runs) {
    const before = values[(first - 1 + hours) % hours] as number;
    const after = values[(first + length) % hours] as number;
    for (let n = 0; n < length; n++) {
      values[(first + n) % hours] = before + ((after - before) * (n + 1)) / (length + 1);
    }
    filled += length;
    longest = Math.max(longest, length);
  }
  return { hours: filled, longest };
}

/** Reports gaps that are too long among the hours that the file does hold, where others are a problem already. */
export function checkGaps(column: GappyColumn): void {
  const { values, lines } = column;
  reportLongGaps(
    column,
    hourRuns(values.length, (hour) => Number.isNaN(values[hour]) && lines[hour] !== 0),
  );
}

function reportLongGaps({ values, lines, label, findings }: GappyColumn, runs: readonly HourRun[]): boolean {
  const long = runs.filter(({ length }) => length > LONGEST_FILLED);
  for (const run of long) {
    findings.add({
      code: 'weather.long-gap',
      severity: 'error',
      ...atLineBefore(run, lines),
      path: label,
      found: runList([run], values.length),
      allowed: `${LONGEST_FILLED} hours`,
    });
  }
  return long.length > 0;
}
