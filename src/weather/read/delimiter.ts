import Papa from 'papaparse';
import type { DecimalName, DelimiterName } from '../readSettings.ts';
import { cellKind } from './cellKinds.ts';

/** The character between cells; runs of blanks are made single blanks before the text is split. */
export const delimiterCharacters: Record<DelimiterName, string> = {
  comma: ',',
  semicolon: ';',
  tab: '\t',
  pipe: '|',
  blanks: ' ',
};

const CANDIDATES: readonly DelimiterName[] = ['tab', 'semicolon', 'pipe', 'comma', 'blanks'];
const SAMPLE_LINES = 30;
const LONGEST_SAMPLE_LINE = 10_000;

/** Runs of blanks as single blanks, none at the ends of lines. */
export function singleBlanks(text: string): string {
  return text.replace(/[ \t\u00a0]+/g, ' ').replace(/^ | $/gm, '');
}

/** Lines from the middle of the text, where neither preamble nor footer stands; a short text whole. */
export function sampleLines(text: string): string[] {
  const lines: string[] = [];
  let at = text.length < 4000 ? 0 : text.indexOf('\n', Math.floor(text.length / 2)) + 1;
  while (lines.length < SAMPLE_LINES && at < text.length) {
    const end = text.indexOf('\n', at);
    const stop = end < 0 ? text.length : end;
    if (stop > at) lines.push(text.slice(at, Math.min(stop, at + LONGEST_SAMPLE_LINE)));
    at = stop + 1;
  }
  return lines;
}

/**
 * The delimiter that splits the sample into the most cells that look like numbers or stamps.
 *
 * @param lines some lines of the table itself
 * @returns the delimiter; comma where no candidate splits the lines
 * @example guessDelimiter(['01.01.2019 00:00;1,5', '01.01.2019 01:00;1,2']) // 'semicolon'
 */
export function guessDelimiter(lines: readonly string[]): DelimiterName {
  let best: DelimiterName = 'comma';
  let bestShare = 0;
  let mostCells = 1;
  for (const candidate of CANDIDATES) {
    const { share, cells } = trySplit(lines, candidate);
    // Blanks also split stamps from their times: they must do better than the rest, not only find more cells.
    const asGood = candidate !== 'blanks' && share > bestShare - 0.001 && cells > mostCells;
    if (cells > 1 && (share > bestShare + 0.001 || asGood)) {
      best = candidate;
      bestShare = share;
      mostCells = cells;
    }
  }
  return best;
}

function trySplit(lines: readonly string[], candidate: DelimiterName): { share: number; cells: number } {
  const text = lines.join('\n');
  const rows = Papa.parse<string[]>(candidate === 'blanks' ? singleBlanks(text) : text, {
    delimiter: delimiterCharacters[candidate],
    newline: '\n',
    skipEmptyLines: true,
  }).data;
  let good = 0;
  let all = 0;
  for (const row of rows) {
    const last = row.length - 1;
    row.forEach((cell, i) => {
      if (i === last && cell.trim() === '') return;
      all++;
      if (cellKind(cell) !== 'text') good++;
    });
  }
  return { share: all === 0 ? 0 : good / all, cells: rows.length === 0 ? 0 : all / rows.length };
}

const WITH_COMMA = /^\s*[-+−–]?\d*,\d+\s*$/;
const WITH_POINT = /^\s*[-+−–]?\d*\.\d+\s*$/;

/**
 * The decimal mark that the cells use: the comma where cells such as `1,5` prevail over cells such as `1.5`.
 *
 * @param rows cells of the sample
 * @returns nothing where all numbers are whole
 * @example guessDecimal([['1,5', '80']]) // 'comma'
 */
export function guessDecimal(rows: readonly (readonly string[])[]): DecimalName | undefined {
  let commas = 0;
  let points = 0;
  for (const row of rows) {
    for (const cell of row) {
      if (WITH_COMMA.test(cell)) commas++;
      else if (WITH_POINT.test(cell)) points++;
    }
  }
  if (commas + points === 0) return undefined;
  return commas > points ? 'comma' : 'point';
}

/** The decimal mark of a text whose sample holds whole numbers alone: the comma if one number anywhere is written so. */
export function guessDecimalOfText(text: string, delimiter: DelimiterName): DecimalName {
  if (delimiter === 'comma') return 'point';
  return /(?:^|[;\t| ])[-+−–]?\d*,\d+(?=[;\t| ]|$)/m.test(text) ? 'comma' : 'point';
}
