import type { Problem } from '../../core/problem.ts';
import type { MeterFile, MeterRow } from './readMeter.ts';

/** Use between two days of reading. */
export interface MeterPeriod {
  /** First day, included. */
  readonly fromDay: number;
  /** Day of the next reading, excluded. */
  readonly toDay: number;
  /** In the unit of the meter. */
  readonly amount: number;
  /** Line of the reading that ends it. */
  readonly line: number;
}

/** Periods of a file of readings, and what became of the rest. */
export interface MeterPeriods {
  readonly periods: readonly MeterPeriod[];
  /** Readings marked as estimated, at which no period begins or ends. */
  readonly estimated: number;
  /** Days between the first and the last reading that no period covers: estimated ends, a meter exchanged unseen. */
  readonly unused: readonly { readonly fromDay: number; readonly toDay: number }[];
}

/**
 * Turns readings into periods, from reading day to reading day. An estimated reading parts nothing: the periods before and
 * after it are one. A new meter begins anew. Use and fills belong to the time since the date before; the first only starts.
 *
 * @param meter rows in the order of time
 * @param file name of the file, for problems
 * @returns the periods; a reading below the one before is a problem, unless a new meter begins there
 *
 * Reference: MODEL section 13.
 */
export function meterPeriods(meter: MeterFile, file: string): { made?: MeterPeriods; problems: Problem[] } {
  const problems: Problem[] = [];
  const periods: MeterPeriod[] = [];
  for (const chain of meter.kind === 'reading' ? chainsOf(meter.rows) : [meter.rows]) {
    let start: MeterRow | undefined;
    let sum = 0;
    for (const row of chain) {
      sum += row.value;
      if (row.estimated) continue;
      if (start !== undefined) {
        const amount = meter.kind === 'reading' ? row.value - start.value : sum;
        if (amount < 0) problems.push(falls(file, start, row));
        periods.push({ fromDay: start.day, toDay: row.day, amount, line: row.line });
      }
      start = row;
      sum = 0;
    }
  }
  if (problems.length > 0) return { problems };
  const estimated = meter.rows.filter((row) => row.estimated).length;
  return { made: { periods, estimated, unused: gapsOf(periods, meter.rows) }, problems };
}

/** Rows of one meter after the other. */
function chainsOf(rows: readonly MeterRow[]): MeterRow[][] {
  const chains: MeterRow[][] = [];
  for (const row of rows) {
    const last = chains.at(-1);
    if (last === undefined || row.exchange) chains.push([row]);
    else last.push(row);
  }
  return chains;
}

function falls(file: string, before: MeterRow, { line, column, value }: MeterRow): Problem {
  return {
    code: 'readings.falls',
    severity: 'error',
    file,
    line,
    ...(column === undefined ? {} : { column }),
    found: String(value),
    allowed: `${before.value} in line ${before.line}`,
  };
}

function gapsOf(periods: readonly MeterPeriod[], rows: readonly MeterRow[]): MeterPeriods['unused'] {
  const gaps: { fromDay: number; toDay: number }[] = [];
  let covered = rows[0]?.day ?? 0;
  for (const { fromDay, toDay } of periods) {
    if (fromDay > covered) gaps.push({ fromDay: covered, toDay: fromDay });
    covered = toDay;
  }
  const end = rows.at(-1)?.day ?? covered;
  if (end > covered) gaps.push({ fromDay: covered, toDay: end });
  return gaps;
}
