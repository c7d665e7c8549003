import Papa from 'papaparse';
import { axisNumber, cellValue } from './tableNumbers.ts';

/** One cell of a table with its place in the text, both counted from 1. */
export interface TableCell {
  readonly text: string;
  readonly line: number;
  readonly column: number;
}

/** A table taken apart: its flow temperatures, and a row for each outdoor temperature. */
export interface SplitTable {
  readonly flows: readonly TableCell[];
  readonly rows: readonly { readonly label: TableCell; readonly cells: readonly TableCell[] }[];
}

type Delimiter = '\t' | ';' | ',' | 'blanks';

/** Units that stand apart from their numbers where blanks part the cells. */
const UNIT_WORDS = new Set(['°C', '℃', 'kW']);

/**
 * Takes a table apart, finding out what parts its cells: tabs, semicolons, commas or blanks.
 *
 * Papaparse splits the lines; which delimiter holds is decided here by how much of the table then reads as numbers, because
 * a guess by counting fails on tables of two or three lines. Empty lines and lines that begin with # are passed over.
 *
 * @param text any text
 * @returns the cells as they stand, rows possibly of unequal length; no rows where there is nothing to read
 */
export function splitTable(text: string): SplitTable {
  const lines = text
    .split(/\r\n|\n|\r/)
    .map((line, i) => ({ line, number: i + 1 }))
    .filter(({ line }) => line.trim() !== '' && !line.trimStart().startsWith('#'));
  let best: SplitTable = { flows: [], rows: [] };
  let most = -1;
  for (const delimiter of ['\t', ';', ',', 'blanks'] as const) {
    const table = arranged(
      lines.map(({ line, number }) => splitLine(line, number, delimiter)),
      delimiter,
    );
    const score = readableShare(table);
    if (score > most) {
      best = table;
      most = score;
    }
  }
  return best;
}

function splitLine(text: string, line: number, delimiter: Delimiter): TableCell[] {
  if (delimiter === 'blanks') {
    return [...text.matchAll(/\S+/g)]
      .map((match) => ({ text: match[0], line, column: match.index + 1 }))
      .filter((cell) => !UNIT_WORDS.has(cell.text));
  }
  const cells = Papa.parse<string[]>(text, { delimiter }).data[0] ?? [];
  let from = 0;
  return cells.map((cell): TableCell => {
    const word = cell.trim();
    const at = Math.max(from, text.indexOf(word, from));
    from = at + word.length;
    return { text: word, line, column: at + 1 };
  });
}

/** Tells the corner from the flow temperatures: what stands left of the columns that the rows fill. */
function arranged(lines: readonly TableCell[][], delimiter: Delimiter): SplitTable {
  const [first = [], ...body] = withoutPadding(lines);
  const head = first.slice(0, first.findLastIndex((cell) => cell.text !== '') + 1);
  const width = mostFrequent(body.map((cells) => cells.length)) - 1;
  const withoutCorner = head.length === width || (delimiter === 'blanks' && head.length >= width);
  const flows = width > 0 && withoutCorner ? head.slice(head.length - width) : head.slice(1);
  const rows = body.flatMap((cells) => {
    const [label, ...rest] = cells;
    return label === undefined ? [] : [{ label, cells: rest }];
  });
  return { flows, rows };
}

/** The lines without columns at the right that are empty in all of them, as exports with a final delimiter have. */
function withoutPadding(lines: readonly TableCell[][]): TableCell[][] {
  const used = lines.reduce((most, cells) => Math.max(most, cells.findLastIndex((cell) => cell.text !== '') + 1), 0);
  return lines.map((cells) => cells.slice(0, used));
}

/** Share of the lines that read as they should with this delimiter. */
function readableShare(table: SplitTable): number {
  if (table.flows.length === 0 || table.rows.length === 0) return 0;
  const heads = table.flows.filter((cell) => axisNumber(cell.text) !== undefined).length / table.flows.length;
  const rows = table.rows.filter(
    ({ label, cells }) =>
      axisNumber(label.text) !== undefined &&
      cells.length === table.flows.length &&
      cells.every((cell) => cellValue(cell.text) !== undefined),
  ).length;
  // Single words that read well still tell one delimiter from another where a slip spoils every row.
  const cells = table.rows.flatMap((row) => [row.label, ...row.cells]);
  const words = cells.filter((cell) => cellValue(cell.text) !== undefined).length / cells.length;
  return heads + rows / table.rows.length + words * 0.1;
}

function mostFrequent(counts: readonly number[]): number {
  const times = new Map<number, number>();
  for (const count of counts) times.set(count, (times.get(count) ?? 0) + 1);
  return [...times].sort((a, b) => b[1] - a[1] || b[0] - a[0])[0]?.[0] ?? 0;
}
