import Papa from 'papaparse';
import { createCellPlaces } from '../../weather/read/cellPlace.ts';
import { delimiterCharacters } from '../../weather/read/delimiter.ts';
import { plainLines } from '../../weather/read/measureText.ts';
import { type CellText, openCells } from '../../weather/read/rows.ts';
import type { DecimalName } from '../../weather/readSettings.ts';
import type { ReadingFaults } from './readingFaults.ts';

/** A line of the table: its number in the file, counted from 1, and its trimmed cells. */
export interface MeterRecord {
  readonly line: number;
  readonly cells: readonly string[];
}

/** A table of readings as text: names and records. */
export interface MeterTable {
  readonly names: readonly string[];
  readonly headerLine: number;
  readonly records: readonly MeterRecord[];
  readonly decimal: DecimalName;
  /** Where a cell stands. */
  placeOf(line: number, index: number): { readonly line: number; readonly column?: number };
}

/** Daily readings of half a century. */
const MOST_LINES = 20_000;

/** Characters of a line; one of readings needs about forty. */
const LONGEST_LINE = 10_000;

/**
 * Splits the text of a file of readings: any of comma, semicolon, tab, bar and blanks between cells; blank lines and lines
 * that begin with # are left out; the first line that remains names the columns.
 *
 * @param text of any kind
 * @param decimal the decimal mark, where the user states it
 * @returns nothing where there are no records, which is a fault
 */
export function meterTable(
  text: string,
  decimal: DecimalName | undefined,
  faults: ReadingFaults,
): MeterTable | undefined {
  const plain = plainLines(text);
  if (isTooMuch(plain.split('\n'), faults)) return undefined;
  const cells = openCells(withoutRemarks(plain), { decimal });
  const [head, ...records] = recordsOf(cells);
  if (head === undefined || records.length === 0) {
    faults.add({ code: 'readings.no-rows' });
    return undefined;
  }
  const places = createCellPlaces(cells);
  return {
    names: head.cells,
    headerLine: head.line,
    records,
    decimal: cells.decimal,
    placeOf(line, index) {
      const { column } = places(line, index);
      return column === undefined ? { line } : { line, column };
    },
  };
}

/** A text so long that taking it apart would use up memory or time is a fault. */
function isTooMuch(lines: readonly string[], faults: ReadingFaults): boolean {
  if (lines.length > MOST_LINES) {
    faults.add({ code: 'readings.too-many-lines', found: String(lines.length), allowed: String(MOST_LINES) });
    return true;
  }
  const long = lines.findIndex((line) => line.length > LONGEST_LINE);
  if (long < 0) return false;
  const found = String(lines[long].length);
  faults.add({ code: 'readings.long-line', line: long + 1, found, allowed: String(LONGEST_LINE) });
  return true;
}

/** Remarks become blank lines, so that the others keep their numbers. */
function withoutRemarks(text: string): string {
  return text.replace(/^[ \t]*#.*$/gm, '');
}

function recordsOf({ text, delimiter, quoted }: CellText): MeterRecord[] {
  const rows = Papa.parse<string[]>(text, {
    delimiter: delimiterCharacters[delimiter],
    newline: '\n',
    fastMode: !quoted,
  }).data;
  const records: MeterRecord[] = [];
  let line = 1;
  for (const row of rows) {
    const cells = row.map((cell) => cell.trim());
    if (cells.some((cell) => cell !== '')) records.push({ line, cells });
    line += row.reduce((ends, cell) => ends + cell.split('\n').length - 1, 1);
  }
  return records;
}
