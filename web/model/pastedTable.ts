import { cellValue } from '../../src/scenario/map/tableNumbers.ts';

/** Largest table that is taken from a paste, rows and columns. */
const MOST_PASTED = 100;

/** What may part the cells of a pasted table, the surest first. */
const PARTED_BY = [/\t/, /\s*[;|]\s*/, /,?\s+/, /,/];

/** Units that stand apart from their numbers where blanks part the cells. */
const UNITS = new Set(['kW', '°C']);

/**
 * Cells of a pasted table: a line a row, its cells parted by tabs as a spreadsheet does, or by semicolons, strokes, blanks or
 * commas as a data sheet does. A head that lacks the corner gets one.
 *
 * @returns one cell where nothing parts the text
 * @example pastedCells('35 45\n-7 5,1 4,9') // [['', '35', '45'], ['-7', '5,1', '4,9']]
 */
export function pastedCells(text: string): string[][] {
  const lines = linesOf(text);
  const isTable = lines.length > 1 || /[\t;|]/.test(text);
  // a column of numbers with decimal commas is no table of two columns
  const isColumn = lines.every((line) => typeof cellValue(line) === 'number');
  const mark = (isColumn ? undefined : PARTED_BY.find((each) => lines.every((line) => each.test(line.trim())))) ?? /\t/;
  const rows = lines.map((line) => {
    // blanks at the ends are cells only between tabs
    const cells = isTable ? (line.includes('\t') ? line : line.trim()).split(mark) : [line];
    return cells
      .map((cell) => cell.trim())
      .filter((cell) => !UNITS.has(cell))
      .slice(0, MOST_PASTED);
  });
  const [head, ...body] = rows;
  const lacksCorner = body.length > 0 && body.every((row) => row.length === head.length + 1);
  return lacksCorner ? [['', ...head], ...body] : rows;
}

/** Whether a text is more than one cell. */
export function isPastedTable(text: string): boolean {
  return /[\t;|]|\n\s*\S/.test(text);
}

/** A point in the notation of EN 14511, `A-7/W35`, and what stands behind it. */
const POINT =
  /^\s*[AL]\s*([−–-]?\d+(?:[.,]\d+)?)\s*(?:°C)?\s*[/ ]?\s*[WF]\s*(\d+(?:[.,]\d+)?)\s*(?:°C)?[\s:;|,]+(.+)$/i;

/**
 * Tables of a list of points as data sheets print them: a line a point, `A-7/W35  6.5  2.92`, the heat first, then COP or
 * input power where it is given.
 *
 * @returns heat and the second quantity as grids; nothing where a line is no such point
 * @example listedPoints('A2/W35 8,0 3,9\nA7/W35 9,6 4,7')?.[0] // [['', '35'], ['2', '8,0'], ['7', '9,6']]
 */
export function listedPoints(text: string): [string[][], string[][]] | undefined {
  const points = linesOf(text).map((line) => {
    const [, outdoor = '', flow = '', rest = ''] = POINT.exec(line) ?? [];
    const values = rest.split(/[\s;|]+/).filter((word) => typeof cellValue(word) === 'number');
    return { outdoor, flow, values };
  });
  if (points.length === 0 || points.some(({ values }) => values.length === 0)) return undefined;
  const axis = (key: 'outdoor' | 'flow') =>
    [...new Set(points.map((point) => point[key]))].sort((a, b) => Number(cellValue(a)) - Number(cellValue(b)));
  const [outdoors, flows] = [axis('outdoor'), axis('flow')];
  const grid = (which: number) => [
    ['', ...flows],
    ...outdoors.map((outdoor) => [
      outdoor,
      ...flows.map(
        (flow) => points.find((point) => point.outdoor === outdoor && point.flow === flow)?.values[which] ?? '',
      ),
    ]),
  ];
  return [grid(0), grid(1)];
}

function linesOf(text: string): string[] {
  const lines = text.replace(/(?:\r\n|\n|\r)+$/, '').split(/\r\n|\n|\r/);
  return lines.slice(0, MOST_PASTED * MOST_PASTED).filter((line, i) => i === 0 || line.trim() !== '');
}

/**
 * A grid with other cells laid on it from a place; it grows where they reach beyond it. At the corner they take the place
 * of the whole grid.
 */
export function laidOn(
  cells: readonly (readonly string[])[],
  pasted: readonly (readonly string[])[],
  [row, column]: readonly [number, number],
): string[][] {
  if (row === 0 && column === 0) return pasted.map((line) => [...line]);
  const height = Math.max(cells.length, row + pasted.length);
  const width = Math.max(...cells.map((line) => line.length), column + Math.max(...pasted.map((line) => line.length)));
  return Array.from({ length: height }, (_, r) =>
    Array.from({ length: width }, (__, c) => pasted[r - row]?.[c - column] ?? cells[r]?.[c] ?? ''),
  );
}
