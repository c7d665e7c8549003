import { HOURS_OF_COMMON_YEAR, HOURS_OF_LEAP_YEAR } from '../../core/constants.ts';
import { stampText } from '../../core/stampText.ts';
import type { Findings } from './findings.ts';
import type { RawRows } from './readRows.ts';
import { stepText } from './timeStep.ts';
import { hasLeapDay, hasYear, minuteOfYear, type PlacedRows, placeRows, rowsOfYear, yearList } from './yearOfRows.ts';

/** The rows laid on one year, whatever their years and their order. */
export interface YearOfRows {
  /** 8760 or 8784. */
  readonly hours: number;
  /** Rows to one hour. */
  readonly slotsPerHour: number;
  /** Row of each step of the year, −1 where there is none. */
  readonly rowOfSlot: Int32Array;
  /** Whether the rows were not in the order of time. */
  readonly sorted: boolean;
}

/** What is laid on the year. */
export interface LayingSource {
  readonly raw: RawRows;
  /** Standard time at the beginning of each row's step; NaN where not known. */
  readonly minutes: Float64Array;
  readonly step: number;
  /** Whether the stamps carry years, for the stamps in messages. */
  readonly hasYears: boolean;
  /** The year that the settings name. */
  readonly year: number | undefined;
  readonly findings: Findings;
}

/**
 * Lays the rows on one year by month, day and time; years are ignored as long as no step of the year occurs twice.
 *
 * @returns nothing where the year cannot be told, which is a problem; two rows for one step are a problem as well
 */
export function layOnYear(source: LayingSource): YearOfRows | undefined {
  const { minutes, step, findings } = source;
  const placed = placeRows(minutes);
  if (source.year !== undefined && source.hasYears && !hasYear(placed, source.year, findings)) return undefined;
  const { rows, spare } = rowsOfYear(minutes, placed, source.hasYears ? source.year : undefined);
  const leap = hasLeapDay(placed, rows);
  const hours = leap ? HOURS_OF_LEAP_YEAR : HOURS_OF_COMMON_YEAR;
  const slotsPerHour = 60 / step;
  const rowOfSlot = new Int32Array(hours * slotsPerHour).fill(-1);
  const slotOf = (row: number) => Math.floor(minuteOfYear(placed.minuteOfLeapYear[row] as number, leap) / step);
  const inStep = onCommonPhase(source, placed, rows);
  if (!placeAll(source, placed, { rows: inStep, slotOf, rowOfSlot })) return undefined;
  for (const row of spare) {
    const slot = slotOf(row);
    if (rowOfSlot[slot] === -1) rowOfSlot[slot] = row;
  }
  return { hours, slotsPerHour, rowOfSlot, sorted: reportDisorder(source, inStep, slotOf) };
}

/** The rows whose stamps lie on the same minutes past the step as most others; the rest are problems. */
function onCommonPhase(source: LayingSource, { minuteOfLeapYear }: PlacedRows, rows: Int32Array): Int32Array {
  const { minutes, step, raw, hasYears, findings } = source;
  const counts = new Int32Array(step);
  const phaseOf = (row: number) => (minuteOfLeapYear[row] as number) % step;
  for (const row of rows) {
    const phase = phaseOf(row);
    counts[phase] = (counts[phase] as number) + 1;
  }
  const common = counts.indexOf(counts.reduce((a, b) => Math.max(a, b), 0));
  const off = (row: number) => phaseOf(row) !== common;
  if ((counts[common] ?? 0) === rows.length) return rows;
  for (const row of rows) {
    if (!off(row)) continue;
    findings.add({
      code: 'weather.off-step',
      severity: 'error',
      line: raw.lines[row] as number,
      found: stampText(minutes[row] as number, hasYears),
      allowed: `${stepText(step)} apart${common === 0 ? '' : `, ${common} min past the step`}`,
    });
  }
  return rows.filter((row) => !off(row));
}

interface Placing {
  readonly rows: Int32Array;
  readonly slotOf: (row: number) => number;
  readonly rowOfSlot: Int32Array;
}

/** Puts each row on its step; false where several years claim the same steps. */
function placeAll(source: LayingSource, { year }: PlacedRows, { rows, slotOf, rowOfSlot }: Placing): boolean {
  for (const row of rows) {
    const slot = slotOf(row);
    const other = rowOfSlot[slot] as number;
    if (other === -1) rowOfSlot[slot] = row;
    else if (source.hasYears && year[other] !== year[row]) {
      source.findings.add({ code: 'weather.several-years', severity: 'error', found: yearList(year) });
      return false;
    }
  }
  for (const row of rows) {
    const first = rowOfSlot[slotOf(row)] as number;
    if (first !== row) reportTwice(source, first, row);
  }
  return true;
}

function reportTwice({ raw, minutes, hasYears, findings }: LayingSource, first: number, second: number): void {
  const same = [...raw.numbers.values()].every((values) => Object.is(values[first], values[second]));
  findings.add({
    code: same ? 'weather.repeated-row' : 'weather.duplicate',
    severity: same ? 'warning' : 'error',
    line: raw.lines[second] as number,
    found: stampText(minutes[second] as number, hasYears),
    allowed: String(raw.lines[first]),
  });
}

/** Warns of rows out of order. A year that begins elsewhere than in January runs over its end once: that is in order. */
function reportDisorder(source: LayingSource, rows: Int32Array, slotOf: (row: number) => number): boolean {
  const { raw, minutes, hasYears, findings } = source;
  if (rows.length === 0) return false;
  const first = slotOf(rows[0] as number);
  const last = slotOf(rows[rows.length - 1] as number);
  let before = first;
  let falls = last > first ? 1 : 0;
  for (const row of rows) {
    const slot = slotOf(row);
    if (slot < before) falls++;
    before = slot;
    if (falls < 2) continue;
    const found = stampText(minutes[row] as number, hasYears);
    findings.add({ code: 'weather.disorder', severity: 'warning', line: raw.lines[row] as number, found });
    return true;
  }
  return false;
}
