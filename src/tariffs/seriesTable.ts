import Papa from 'papaparse';
import { type Problem, shown } from '../core/problem.ts';
import { readStamp } from './seriesStamps.ts';
import type { SeriesKind, SeriesSettings } from './timeSeries.ts';

/** One line of values, as text. */
export interface SeriesRow {
  /** Line in the file, counted from 1. */
  readonly line: number;
  readonly time: string;
  readonly value: string;
}

/** The two columns of a file of values over time, and where a cell stands. */
export interface SeriesTable {
  readonly rows: readonly SeriesRow[];
  /** Column of the first character of a row's time or value, counted from 1. */
  placeOf(row: SeriesRow, cell: 'time' | 'value'): { readonly line: number; readonly column: number };
}

const LINE_ENDS = /\r\n|\n|\r/;

/**
 * Takes the columns of stamps and values out of a CSV text: any of tab, semicolon, bar and comma between its cells, a
 * line of names or none. Without names in the settings the file must have just two columns, the stamps first.
 *
 * @returns the rows that are not blank, or the problem that keeps the columns from being found
 */
export function seriesTable(
  text: string,
  file: string,
  settings: SeriesSettings,
  kind: SeriesKind,
): { table?: SeriesTable; problems: Problem[] } {
  const plain = text.replace(/^\ufeff/, '');
  const delimiter = delimiterOf(plain);
  const parsed = Papa.parse<string[]>(plain, { delimiter, skipEmptyLines: false });
  const quotes = parsed.errors.find((error) => error.type === 'Quotes');
  const records = withLines(parsed.data);
  if (quotes) {
    const line = records.find(({ row }) => row >= (quotes.row ?? 0))?.line ?? 1;
    return { problems: [{ code: 'series.quotes', severity: 'error', file, line }] };
  }
  const first = records[0];
  if (!first) return { problems: [emptyFault(file, 0, kind)] };
  const hasNames = readStamp(first.cells[0] ?? '') === undefined || settings.timeColumn !== undefined;
  const names = hasNames ? first.cells : first.cells.map((_, i) => `column ${i + 1}`);
  const time = columnOf({ names, wanted: settings.timeColumn, other: 0, kind }, file);
  const value = columnOf({ names, wanted: settings.valueColumn, other: 1, kind }, file);
  const problems = [time, value].flatMap((column) => (typeof column === 'number' ? [] : [column]));
  if (typeof time !== 'number' || typeof value !== 'number') return { problems };
  const body = hasNames ? records.slice(1) : records;
  if (body.length < 2) return { problems: [emptyFault(file, body.length, kind)] };
  const rows = body.map(({ line, cells }) => ({ line, time: cells[time] ?? '', value: cells[value] ?? '' }));
  let lines: string[] | undefined;
  const placeOf: SeriesTable['placeOf'] = ({ line }, cell) => {
    lines ??= plain.split(LINE_ENDS);
    return { line, column: characterOf(lines[line - 1] ?? '', delimiter, cell === 'time' ? time : value) };
  };
  return { table: { rows, placeOf }, problems: [] };
}

function emptyFault(file: string, lines: number, { many }: SeriesKind): Problem {
  const found = `${lines === 1 ? 'one' : 'no'} line of ${many}`;
  return { code: 'series.empty', severity: 'error', file, found, allowed: 'two lines' };
}

/** The first of these that the first line with text contains: stamps hold none of them, values at most the comma. */
function delimiterOf(text: string): string {
  const first = text.split(LINE_ENDS, 100).find((line) => line.trim() !== '') ?? '';
  return ['\t', ';', '|'].find((mark) => first.includes(mark)) ?? ',';
}

interface TextRecord {
  /** Number among all records, blank ones too. */
  readonly row: number;
  readonly line: number;
  readonly cells: readonly string[];
}

/** Records that are not blank, with trimmed cells; a quoted cell may hold line ends, which are counted. */
function withLines(data: readonly string[][]): TextRecord[] {
  const records: TextRecord[] = [];
  let line = 1;
  for (const [row, record] of data.entries()) {
    const cells = record.map((cell) => cell.trim());
    if (cells.some((cell) => cell !== '')) records.push({ row, line, cells });
    line++;
    for (const cell of record) if (cell.includes('\n') || cell.includes('\r')) line += cell.split(LINE_ENDS).length - 1;
  }
  return records;
}

interface ColumnSearch {
  readonly names: readonly string[];
  readonly wanted: string | undefined;
  /** Column that is taken where none is named and the file has two. */
  readonly other: number;
  readonly kind: SeriesKind;
}

function columnOf({ names, wanted, other, kind }: ColumnSearch, file: string): number | Problem {
  const at = wanted === undefined ? other : names.indexOf(wanted.trim());
  const isClear = wanted === undefined ? names.length === 2 : at >= 0 && names.lastIndexOf(names[at]) === at;
  if (isClear) return at;
  const found = wanted === undefined ? (other === 0 ? 'of stamps' : `of ${kind.many}`) : shown(wanted);
  const allowed = shown(names.join(', '), 200);
  const { section, valueKey } = kind;
  const path = `${section}.${other === 0 ? 'timeColumn' : valueKey}`;
  return { code: 'series.column', severity: 'error', file, line: 1, path, found, allowed, unit: valueKey };
}

/** Where the n-th cell of a line begins, counted from 1. */
function characterOf(line: string, delimiter: string, cell: number): number {
  let quoted = false;
  let passed = 0;
  for (let i = 0; i < line.length && passed < cell; i++) {
    if (line[i] === '"') quoted = !quoted;
    else if (line[i] === delimiter && !quoted) passed++;
    if (passed === cell) return i + 2;
  }
  return passed < cell ? line.length + 1 : 1;
}
