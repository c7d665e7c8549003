import { HOURS_OF_LEAP_YEAR } from '../../core/constants.ts';
import { stampText } from '../../core/stampText.ts';
import { nominalStart } from './stampFields.ts';

/** Consecutive hours of the year, which may run over its end. */
export interface HourRun {
  /** First hour, counted from 0. */
  readonly first: number;
  /** Number of hours. */
  readonly length: number;
}

/**
 * The runs of hours that have a property, the year taken as periodic.
 *
 * @param hours hours of the year
 * @param has whether an hour has it
 * @returns runs in order; one that crosses the year's end stands last
 * @example hourRuns(24, (hour) => hour === 23 || hour === 0) // [{ first: 23, length: 2 }]
 */
export function hourRuns(hours: number, has: (hour: number) => boolean): HourRun[] {
  let start = 0;
  while (start < hours && has(start)) start++;
  if (start === hours) return [{ first: 0, length: hours }];
  const runs: HourRun[] = [];
  let length = 0;
  for (let n = 1; n <= hours; n++) {
    const hour = (start + n) % hours;
    if (has(hour)) length++;
    else if (length > 0) {
      runs.push({ first: (hour - length + hours) % hours, length });
      length = 0;
    }
  }
  return runs;
}

/** An hour of the year for people: `03-31 02:00`. */
export function hourText(hour: number, hours: number): string {
  return stampText(nominalStart(hours === HOURS_OF_LEAP_YEAR) + hour * 60, false);
}

/** Runs of hours for people, at most six of them. */
export function runList(runs: readonly HourRun[], hours: number): string {
  const listed = runs.slice(0, 6).map(({ first, length }) => {
    const begin = hourText(first, hours);
    if (length === 1) return `${begin} (1 hour)`;
    return `${begin} to ${hourText((first + length - 1) % hours, hours)} (${length} hours)`;
  });
  return runs.length > 6 ? `${listed.join(', ')} and ${runs.length - 6} more spans` : listed.join(', ');
}

/**
 * Line of the last row before a run, for messages; nothing where no hour has a row.
 *
 * @param run hours without a row or value
 * @param lines line of the last row of each hour, 0 where it has none
 */
export function lineBefore({ first }: HourRun, lines: Int32Array): number | undefined {
  const hours = lines.length;
  for (let back = 1; back <= hours; back++) {
    const line = lines[(first - back + hours) % hours] as number;
    if (line > 0) return line;
  }
  return undefined;
}
