import Papa from 'papaparse';
import { delimiterCharacters } from './delimiter.ts';
import type { CellText } from './rows.ts';

/** A cell found again in the file: its text, and the character column where the line tells it. */
export interface CellPlace {
  readonly text: string;
  readonly column?: number;
}

const LONGEST_ROW = 200_000;

/**
 * Finds cells again for messages, so that the rows themselves need not be kept.
 *
 * @param cells the opened text
 * @returns a function of line (counted from 1) and index of the column (from 0); rising lines are found fastest
 */
export function createCellPlaces(cells: CellText): (line: number, index: number) => CellPlace {
  const { original, delimiter, quoted } = cells;
  let line = 1;
  let start = 0;
  return (wanted, index) => {
    if (wanted < line) {
      line = 1;
      start = 0;
    }
    for (; line < wanted; line++) start = original.indexOf('\n', start) + 1;
    const end = original.indexOf('\n', start);
    const first = original.slice(start, end < 0 ? original.length : end);
    if (delimiter === 'blanks') return blankPlace(first, index);
    const mark = delimiterCharacters[delimiter];
    if (quoted && first.includes('"')) {
      const row = original.slice(start, start + LONGEST_ROW);
      const [parsed] = Papa.parse<string[]>(row, { delimiter: mark, newline: '\n', preview: 1 }).data;
      return { text: parsed?.[index] ?? '' };
    }
    const row = first.split(mark);
    const before = row.slice(0, index).reduce((sum, cell) => sum + cell.length + 1, 0);
    return { text: row[index] ?? '', column: before + 1 };
  };
}

function blankPlace(line: string, index: number): CellPlace {
  let at = 0;
  for (const match of line.matchAll(/[^ \t\u00a0]+/g)) {
    if (at === index) return { text: match[0], column: match.index + 1 };
    at++;
  }
  return { text: '' };
}
