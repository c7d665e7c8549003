/** Largest table that is taken from a paste, rows and columns. */
const MOST_PASTED = 100;

/**
 * Cells of a spreadsheet as they come from the clipboard: tabs between columns, a line a row.
 *
 * @returns one cell where there is neither
 */
export function pastedCells(text: string): string[][] {
  const lines = text.replace(/(?:\r\n|\n|\r)+$/, '').split(/\r\n|\n|\r/);
  return lines.slice(0, MOST_PASTED).map((line) =>
    line
      .split('\t')
      .slice(0, MOST_PASTED)
      .map((cell) => cell.trim()),
  );
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
