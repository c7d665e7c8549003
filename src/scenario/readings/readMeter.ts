import { type Problem, shown } from '../../core/problem.ts';
import { columnLabel } from '../../weather/read/columnPlan.ts';
import { DECIMAL_COMMA, DECIMAL_POINT, parseNumber } from '../../weather/read/parseNumber.ts';
import type { DecimalName } from '../../weather/readSettings.ts';
import { type MeterColumns, type MeterUnit, meterColumns, type ReadingKind } from './meterColumns.ts';
import { type MeterTable, meterTable } from './meterTable.ts';
import { dayText, readingDates } from './readingDates.ts';
import { type ReadingFaults, readingFaults } from './readingFaults.ts';

/** One reading, use or fill. */
export interface MeterRow {
  /** Line in the file, counted from 1. */
  readonly line: number;
  /** Character column of its value, counted from 1, where that is known. */
  readonly column?: number;
  /** Number of the day, 1970-01-01 being 0. */
  readonly day: number;
  /** In the unit of the meter, at least 0. */
  readonly value: number;
  readonly estimated: boolean;
  /** Whether a new meter begins here. */
  readonly exchange: boolean;
}

/** A file of readings, its rows in the order of time. */
export interface MeterFile {
  readonly kind: ReadingKind;
  readonly unit: MeterUnit | undefined;
  /** Name of the column of values, and the line of the names. */
  readonly label: string;
  readonly headerLine: number;
  readonly rows: readonly MeterRow[];
}

const HIGHEST_VALUE = 1e9;
const YES = /^(?:x|yes|y|true|1|e|est|estimated|exchanged?|new|ja|j|oui|s[ií])$/i;
const NO = /^(?:no?|false|0|-|–|nein|non|a|actual|read)?$/i;

/**
 * Reads a file of meter readings, of use by period, or of fills of a tank.
 *
 * @param text the file's text; anything at all
 * @param file its name as the user gave it, for the problems
 * @param decimal the decimal mark, where the user states it
 * @returns the rows; or problems with line and column, at most twenty and a count of the rest
 */
export function readMeter(
  text: string,
  file: string,
  decimal: DecimalName | undefined,
): { meter?: MeterFile; problems: Problem[] } {
  const faults = readingFaults(file);
  const table = meterTable(text, decimal, faults);
  const columns = table === undefined ? undefined : meterColumns(table, faults);
  if (table === undefined || columns === undefined) return { problems: faults.list() };
  checkDecimal(table, columns, { stated: decimal !== undefined, faults });
  const days = readingDates(table, columns.date, faults);
  const backwards = runsBackwards(days);
  const rows = table.records.flatMap((_, i) => {
    const first = i === (backwards ? table.records.length - 1 : 0);
    return meterRow({ table, columns, faults }, { at: i, day: days[i], first }) ?? [];
  });
  if (backwards) rows.reverse();
  checkOrder(rows, table, { columns, faults });
  if (faults.any()) return { problems: faults.list() };
  const label = columnLabel(columns.value, table.names);
  return { meter: { kind: columns.kind, unit: columns.unit, label, headerLine: table.headerLine, rows }, problems: [] };
}

interface Source {
  readonly table: MeterTable;
  readonly columns: MeterColumns;
  readonly faults: ReadingFaults;
}

function meterRow(
  { table, columns, faults }: Source,
  { at, day, first }: { at: number; day: number | undefined; first: boolean },
): MeterRow | undefined {
  const { line, cells } = table.records[at];
  const place = table.placeOf(line, columns.value);
  const cell = cells[columns.value] ?? '';
  // What was used or filled before the first date is of no period: it need not be written.
  const value = cell === '' && first && columns.kind !== 'reading' ? 0 : meterValue(cell, table.decimal);
  if (value === undefined) {
    const allowed = `it is a number from 0 with a decimal ${table.decimal}`;
    const found = cell === '' ? 'an empty cell' : `“${shown(cell, 40)}”`;
    faults.add({ code: 'readings.value', ...place, path: table.names[columns.value], found, allowed });
  }
  const marks = { estimated: false, exchange: false };
  for (const role of ['estimated', 'exchange'] as const) {
    const index = columns[role];
    if (index === undefined) continue;
    const mark = cells[index] ?? '';
    marks[role] = YES.test(mark);
    if (marks[role] || NO.test(mark)) continue;
    const found = `“${shown(mark, 40)}”`;
    const allowed = 'it is x, or empty';
    faults.add({ code: 'readings.mark', ...table.placeOf(line, index), path: table.names[index], found, allowed });
  }
  return day === undefined || value === undefined ? undefined : { ...place, day, value, ...marks };
}

function meterValue(cell: string, decimal: DecimalName): number | undefined {
  const value = parseNumber(cell, decimal === 'comma' ? DECIMAL_COMMA : DECIMAL_POINT);
  return value >= 0 && value <= HIGHEST_VALUE ? value : undefined;
}

/** `1.234` may be a thousand and some, or one and some: a file of nothing else does not tell. */
function checkDecimal(
  { records, placeOf }: MeterTable,
  { value }: MeterColumns,
  { stated, faults }: { stated: boolean; faults: ReadingFaults },
): void {
  if (stated) return;
  const marked = records.filter(({ cells }) => /[.,]/.test(cells[value] ?? ''));
  if (marked.length === 0 || !marked.every(({ cells }) => /^[1-9]\d{0,2}[.,]\d{3}$/.test(cells[value]))) return;
  const [{ line, cells }] = marked;
  faults.add({ code: 'readings.decimal', ...placeOf(line, value), found: `“${shown(cells[value], 40)}”` });
}

function runsBackwards(days: readonly (number | undefined)[]): boolean {
  const known = days.filter((day) => day !== undefined);
  return (
    known.length > 1 && known[0] > known[known.length - 1] && known.every((day, i) => i === 0 || day <= known[i - 1])
  );
}

function checkOrder(
  rows: readonly MeterRow[],
  { placeOf }: MeterTable,
  { columns, faults }: { columns: MeterColumns; faults: ReadingFaults },
): void {
  for (let i = 1; i < rows.length; i++) {
    const [before, row] = [rows[i - 1], rows[i]];
    const place = placeOf(row.line, columns.date);
    const found = dayText(row.day);
    if (row.day < before.day) {
      faults.add({ code: 'readings.disorder', ...place, found, allowed: dayText(before.day) });
    } else if (row.day === before.day && !(row.exchange && columns.kind === 'reading')) {
      faults.add({ code: 'readings.same-day', ...place, found, allowed: String(before.line) });
    }
  }
}
