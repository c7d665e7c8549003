import { dayExists } from '../../core/civilDate.ts';
import { isMissingWord } from './missingMarks.ts';
import { DECIMAL_COMMA, DECIMAL_POINT, parseNumber } from './parseNumber.ts';
import { type StampParts, scanStamp } from './scanStamp.ts';

/** What a cell looks like. `stamp` is date and time, `blank` includes the marks of a missing value. */
export type CellKind = 'blank' | 'number' | 'stamp' | 'date' | 'time' | 'text';

const parts: StampParts = { order: 'none', year: 0, first: 0, second: 0, minute: 0, offset: 0 };

/**
 * What a cell looks like, whichever decimal mark the file uses.
 *
 * Eight, ten or twelve digits that make a date of this age are a stamp, not a number.
 *
 * @example cellKind('20190101:0010') // 'stamp'
 */
export function cellKind(cell: string): CellKind {
  const text = cell.trim();
  if (isMissingWord(text)) return 'blank';
  const isNumber = !Number.isNaN(parseNumber(text, DECIMAL_POINT)) || !Number.isNaN(parseNumber(text, DECIMAL_COMMA));
  if (isNumber && !isCompactStamp(text)) return 'number';
  if (!scanStamp(text, parts)) return isNumber ? 'number' : 'text';
  if (parts.order === 'none') return 'time';
  return Number.isNaN(parts.minute) ? 'date' : 'stamp';
}

function isCompactStamp(text: string): boolean {
  if (!/^(?:1[89]|2[01])\d{6}(?:\d{2}){0,3}$/.test(text) || !scanStamp(text, parts)) return false;
  return dayExists(parts.year, parts.first, parts.second);
}

/**
 * What the cells of a column look like: the kind of at least nine in ten of those that are not blank.
 *
 * @returns `blank` for a column without any content, `text` where no kind prevails
 * @example columnKind(['1.5', '', '2']) // 'number'
 */
export function columnKind(cells: readonly string[]): CellKind {
  const counts = new Map<CellKind, number>();
  for (const cell of cells) {
    const kind = cellKind(cell);
    if (kind !== 'blank') counts.set(kind, (counts.get(kind) ?? 0) + 1);
  }
  const filled = [...counts.values()].reduce((sum, count) => sum + count, 0);
  if (filled === 0) return 'blank';
  for (const [kind, count] of counts) if (count >= 0.9 * filled) return kind;
  return 'text';
}
