import type { ReadSettings } from '../readSettings.ts';
import { type CellKind, cellKind, columnKind } from './cellKinds.ts';
import { quantityOf } from './columnWords.ts';
import { isMissingWord } from './missingMarks.ts';

/** Where the table begins and what its columns are called. */
export interface TableHead {
  /** Index of the first row of data. */
  readonly firstRow: number;
  /** Index of the row with the names, or −1 without a header. */
  readonly headerRow: number;
  /** Physical lines of these two, counted from 1; the latter is 0 without a header. */
  readonly firstLine: number;
  readonly headerLine: number;
  /** Cells of a row: as many as the header has, else as most rows have; a trailing delimiter counts for none. */
  readonly width: number;
  /** Name of each column; empty without a header. */
  readonly names: readonly string[];
  /** All header cells of each column in one text: its name, and a line of units. */
  readonly texts: readonly string[];
  /** What the cells of each column look like. */
  readonly kinds: readonly CellKind[];
}

const MOST_HEADER_ROWS = 4;
const ROWS_IN_A_ROW = 5;

/**
 * Finds header and first row of data in the first rows of a file: data begins where rows of one form follow each other.
 *
 * @param rows the first rows of the file
 * @param settings `header` and `skipLines` are obeyed
 * @returns nothing where no rows of numbers are found
 */
export function findHead(rows: readonly string[][], settings: ReadSettings): TableHead | undefined {
  const skip = settings.skipLines ?? 0;
  const body = rows.slice(skip);
  const form = typicalForm(body);
  if (form === undefined) return undefined;
  const start = body.findIndex((_, i) => followsForm(body, i, form));
  if (start < 0) return undefined;
  const firstRow = skip + start;
  const above = settings.header === false ? [] : headerRows(rows, firstRow, { skip, form });
  const headerRow = settings.header === false ? -1 : namesRow(rows, above, { settings, width: form.width });
  const used = above.filter((i) => i >= headerRow);
  const names = headerRow < 0 ? [] : (rows[headerRow] as string[]).map((cell) => cell.trim());
  while (names.length > 0 && names[names.length - 1] === '') names.pop();
  const width = Math.max(names.length, headerRow < 0 ? form.width : 0);
  return {
    firstRow,
    headerRow,
    firstLine: lineOfRow(rows, firstRow),
    headerLine: headerRow < 0 ? 0 : lineOfRow(rows, headerRow),
    width,
    names,
    texts: Array.from({ length: width }, (_, c) =>
      used
        .map((i) => rows[i]?.[c]?.trim() ?? '')
        .join(' ')
        .trim(),
    ),
    kinds: form.kinds,
  };
}

/** Physical line on which a row begins: cells in quotation marks may hold line ends. */
function lineOfRow(rows: readonly string[][], index: number): number {
  let line = index + 1;
  for (const row of rows.slice(0, index)) line += lineEndsIn(row);
  return line;
}

/** Line ends within the cells of a row. */
export function lineEndsIn(row: readonly string[]): number {
  let count = 0;
  for (const cell of row) {
    for (let at = cell.indexOf('\n'); at >= 0; at = cell.indexOf('\n', at + 1)) count++;
  }
  return count;
}

/** What most rows look like: number of cells and kind of each column. */
interface RowForm {
  readonly width: number;
  readonly kinds: readonly CellKind[];
}

function typicalForm(rows: readonly string[][]): RowForm | undefined {
  const later = rows.slice(Math.floor(rows.length / 2)).filter((row) => row.some((cell) => cell.trim() !== ''));
  const counts = new Map<number, number>();
  for (const row of later) counts.set(filledWidth(row), (counts.get(filledWidth(row)) ?? 0) + 1);
  let width = 0;
  for (const [cells, count] of counts) if (count > (counts.get(width) ?? 0)) width = cells;
  const alike = later.filter((row) => filledWidth(row) === width);
  const kinds = Array.from({ length: width }, (_, c) => columnKind(alike.map((row) => row[c] ?? '')));
  return kinds.some((kind) => kind === 'number') ? { width, kinds } : undefined;
}

function filledWidth(row: readonly string[]): number {
  const last = row[row.length - 1];
  return row.length > 1 && last !== undefined && last.trim() === '' ? row.length - 1 : row.length;
}

/** Whether this row and those after it are data. */
function followsForm(rows: readonly string[][], from: number, form: RowForm): boolean {
  if (!isData(rows[from] as string[], form)) return false;
  const next = rows.slice(from + 1, from + ROWS_IN_A_ROW).filter((row) => row.length > 1 || row[0]?.trim() !== '');
  const good = next.filter((row) => isData(row, form)).length;
  return good >= 0.7 * next.length;
}

/** Data agrees with the form in at least half of the cells that are not blank, the first stamp being one of them. */
function isData(row: readonly string[], { width, kinds }: RowForm): boolean {
  if (row.length < Math.min(width, 2) || row.length < width / 2) return false;
  let good = 0;
  let bad = 0;
  let stampSeen = false;
  for (let c = 0; c < width; c++) {
    const kind = kinds[c] as CellKind;
    const cell = row[c] ?? '';
    if (kind === 'text' || kind === 'blank' || isMissingWord(cell)) continue;
    const same = cellKind(cell) === kind;
    if (same && kind !== 'number') stampSeen = true;
    if (same) good++;
    else bad++;
  }
  return good > 0 && (stampSeen || good >= bad);
}

/** Rows right above the data that may belong to the header, from the top. */
function headerRows(
  rows: readonly string[][],
  firstRow: number,
  { skip, form }: { skip: number; form: RowForm },
): number[] {
  const found: number[] = [];
  for (let i = firstRow - 1; i >= skip && found.length < MOST_HEADER_ROWS; i--) {
    const row = rows[i] as string[];
    const filled = row.filter((cell) => cell.trim() !== '').length;
    if (filled === 0) continue;
    if (filled < form.width / 2) break;
    found.unshift(i);
  }
  return found;
}

/** The row that names the most quantities; at a tie the one nearest to the top. A row that names none must fit the table. */
function namesRow(
  rows: readonly string[][],
  above: readonly number[],
  { settings, width }: { settings: ReadSettings; width: number },
): number {
  const asked = Object.values(settings.columns ?? {}).filter((choice) => typeof choice === 'string');
  if (settings.header === true && settings.skipLines !== undefined) return above.length > 0 ? (above[0] as number) : -1;
  let best = -1;
  let most = -1;
  for (const i of above) {
    const row = rows[i] as string[];
    const named = row.filter((cell) => quantityOf(cell) !== undefined || asked.includes(cell.trim())).length;
    const fits = named > 0 || settings.header === true || filledWidth(row) === width;
    if (fits && named > most) {
      best = i;
      most = named;
    }
  }
  return best;
}
