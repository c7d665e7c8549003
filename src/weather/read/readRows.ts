import type { ReadSettings } from '../readSettings.ts';
import { cellKind } from './cellKinds.ts';
import type { ColumnPlan, StampColumns } from './columnPlan.ts';
import type { Findings } from './findings.ts';
import { lineEndsIn, type TableHead } from './header.ts';
import { isMissingWord, type MissingMarks, missingMarks } from './missingMarks.ts';
import { DECIMAL_COMMA, DECIMAL_POINT, parseNumber } from './parseNumber.ts';
import type { Quantity } from './quantities.ts';
import { type CellText, eachPortion } from './rows.ts';
import { createStationFilter } from './stations.ts';

export type StampRoleName = keyof StampColumns;

/** The rows of the file as columns. In the numbers NaN is a missing value and Infinity a cell with other text. */
export interface RawRows {
  readonly count: number;
  /** Physical line on which each row begins. */
  readonly lines: Int32Array;
  readonly numbers: ReadonlyMap<Quantity, Float64Array>;
  readonly stamps: ReadonlyMap<StampRoleName, string[]>;
  /** The station that was read, where the file names stations. */
  readonly station?: string | undefined;
  /** Rows of remarks after the data, which were left out. */
  readonly footerRows: number;
}

const MOST_COLUMNS = 1000;

/** So many short rows are remembered; a file with more has a fault that the first ones show. */
const MOST_SHORT_ROWS = 100_000;

interface NumberColumn {
  readonly quantity: Quantity;
  readonly index: number;
  readonly marks: MissingMarks;
  readonly values: Float64Array;
}

interface RowSink {
  readonly head: TableHead;
  readonly findings: Findings;
  readonly numbers: readonly NumberColumn[];
  readonly stamps: readonly { readonly index: number; readonly cells: string[] }[];
  readonly lines: Int32Array;
  readonly takes: (row: readonly string[]) => boolean;
  readonly mark: number;
  readonly quoted: boolean;
  /** Columns that a row must have. */
  readonly needed: number;
  readonly shortRows: { readonly at: number; readonly found: number }[];
  row: number;
  line: number;
  count: number;
}

/**
 * Reads all rows of data into columns: numbers are converted, stamps kept as text.
 *
 * @param cells the opened text
 * @param table its head, the plan of its columns, the settings, the number of lines, and where problems go
 */
export function readRows(
  cells: CellText,
  table: {
    readonly head: TableHead;
    readonly plan: ColumnPlan;
    readonly settings: ReadSettings;
    readonly lines: number;
    readonly findings: Findings;
  },
): RawRows {
  const { plan, head, settings, findings } = table;
  const numbers = [...plan.quantities].map(([quantity, { index }]) => ({
    quantity,
    index,
    marks: missingMarks(quantity, settings.missing ?? []),
    values: new Float64Array(table.lines),
  }));
  const roles = Object.entries(plan.stamps).flatMap(([role, column]) =>
    column === undefined ? [] : [{ role: role as StampRoleName, index: column.index, cells: [] as string[] }],
  );
  const stations = createStationFilter(plan.station?.index, settings.station?.value);
  const sink: RowSink = {
    ...{ head, findings, numbers, stamps: roles, shortRows: [] },
    lines: new Int32Array(table.lines),
    takes: stations.takes,
    mark: cells.decimal === 'comma' ? DECIMAL_COMMA : DECIMAL_POINT,
    quoted: cells.quoted,
    needed: Math.max(...numbers.map(({ index }) => index), ...roles.map(({ index }) => index)) + 1,
    ...{ row: 0, line: 1, count: 0 },
  };
  eachPortion(cells, (rows) => takeRows(sink, rows));
  stations.report(findings, plan.station?.index ?? 0);
  const count = countWithoutFooter(sink);
  reportShortRows(sink, count);
  for (const { cells: column } of roles) column.length = count;
  return {
    count,
    lines: sink.lines.subarray(0, count),
    numbers: new Map(numbers.map(({ quantity, values }) => [quantity, values.subarray(0, count)])),
    stamps: new Map(roles.map(({ role, cells: column }) => [role, column])),
    station: stations.only(),
    footerRows: sink.count - count,
  };
}

/** Remarks after the data have neither a temperature nor a stamp. */
function countWithoutFooter({ numbers, stamps, count }: RowSink): number {
  const temperature = numbers.find(({ quantity }) => quantity === 'temperature')?.values;
  if (temperature === undefined) return count;
  let rows = count;
  while (rows > 0 && !isRow(rows - 1, temperature, stamps)) rows--;
  return rows;
}

function isRow(at: number, temperature: Float64Array, stamps: RowSink['stamps']): boolean {
  if (Number.isFinite(temperature[at])) return true;
  const [stamp] = stamps;
  if (stamp === undefined) return Number.isNaN(temperature[at]);
  const kind = cellKind(stamp.cells[at] ?? '');
  return kind !== 'text' && kind !== 'blank';
}

function reportShortRows({ shortRows, lines, needed, findings }: RowSink, count: number): void {
  for (const { at, found } of shortRows) {
    if (at >= count) break;
    findings.add({
      code: 'weather.short-row',
      severity: 'error',
      line: lines[at] as number,
      found: String(found),
      allowed: String(needed),
    });
  }
}

function takeRows(sink: RowSink, rows: readonly string[][]): boolean {
  for (const row of rows) {
    const { line } = sink;
    sink.line += 1 + (sink.quoted ? lineEndsIn(row) : 0);
    if (sink.row++ < sink.head.firstRow) continue;
    if (row.length > MOST_COLUMNS) {
      const [found, allowed] = [String(row.length), String(MOST_COLUMNS)];
      sink.findings.add({ code: 'weather.too-many-columns', severity: 'error', line, found, allowed });
      return false;
    }
    if (row.length === 1 && (row[0] as string).trim() === '') continue;
    if (!sink.takes(row)) continue;
    if (row.length > sink.head.width && isTooWide(sink, row, line)) continue;
    takeRow(sink, row, line);
  }
  return true;
}

/** Rows may end in empty cells beyond the header, but not in filled ones. */
function isTooWide({ head: { width }, findings }: RowSink, row: readonly string[], line: number): boolean {
  if (row.slice(width).every((cell) => cell.trim() === '')) return false;
  const [found, allowed] = [String(row.length), String(width)];
  findings.add({ code: 'weather.wide-row', severity: 'error', line, found, allowed });
  return true;
}

function takeRow(sink: RowSink, row: readonly string[], line: number): void {
  const at = sink.count++;
  sink.lines[at] = line;
  if (row.length < sink.needed && sink.shortRows.length < MOST_SHORT_ROWS) {
    sink.shortRows.push({ at, found: row.length });
  }
  for (const { index, cells } of sink.stamps) cells.push(row[index] ?? '');
  for (const column of sink.numbers) {
    const cell = row[column.index] ?? '';
    const value = parseNumber(cell, sink.mark);
    column.values[at] = Number.isNaN(value) ? unknownValue(cell, column.marks) : knownValue(value, column.marks);
  }
}

function knownValue(value: number, { numbers, least }: MissingMarks): number {
  return (value >= least || value <= -least) && numbers.has(value) ? Number.NaN : value;
}

function unknownValue(cell: string, { words }: MissingMarks): number {
  return isMissingWord(cell, words) ? Number.NaN : Number.POSITIVE_INFINITY;
}
