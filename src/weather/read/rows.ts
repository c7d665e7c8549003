import Papa from 'papaparse';
import type { DecimalName, DelimiterName } from '../readSettings.ts';
import {
  delimiterCharacters,
  guessDecimal,
  guessDecimalOfText,
  guessDelimiter,
  sampleLines,
  singleBlanks,
} from './delimiter.ts';

/** A text ready to be split into rows of cells. */
export interface CellText {
  readonly text: string;
  readonly delimiter: DelimiterName;
  readonly decimal: DecimalName;
  /** Whether cells may stand in quotation marks, and so hold line ends. */
  readonly quoted: boolean;
  /** The text before runs of blanks were made single, for the place of a cell in its line. */
  readonly original: string;
}

/** Characters of a portion: few enough that its cells are gone before the next one is split. */
const CHUNK_LENGTH = 256_000;
const PREVIEW_LENGTH = 2_000_000;
const PREVIEW_LINES = 200;

/**
 * Settles delimiter, decimal mark and quotation marks of a text.
 *
 * An odd number of quotation marks means that they are none (inches, seconds of arc): then they are plain characters.
 *
 * @param text with line feeds only
 * @param settings what the user stated; the rest is guessed from lines in the middle of the text
 */
export function openCells(
  text: string,
  settings: { readonly delimiter?: DelimiterName | undefined; readonly decimal?: DecimalName | undefined },
): CellText {
  const lines = sampleLines(text);
  const delimiter = settings.delimiter ?? guessDelimiter(lines);
  const quoted = hasPairedQuotes(text);
  const split = delimiter === 'blanks' ? singleBlanks(text) : text;
  const cells = { text: split, delimiter, decimal: 'point' as DecimalName, quoted, original: text };
  if (settings.decimal !== undefined) return { ...cells, decimal: settings.decimal };
  const decimal = guessDecimal(Papa.parse<string[]>(lines.join('\n'), papaOptions(cells)).data);
  return { ...cells, decimal: decimal ?? guessDecimalOfText(text, delimiter) };
}

function hasPairedQuotes(text: string): boolean {
  let count = 0;
  for (let at = text.indexOf('"'); at >= 0; at = text.indexOf('"', at + 1)) count++;
  return count > 0 && count % 2 === 0;
}

function papaOptions({ delimiter, quoted }: Pick<CellText, 'delimiter' | 'quoted'>) {
  return { delimiter: delimiterCharacters[delimiter], newline: '\n' as const, fastMode: !quoted };
}

/** The first rows of the text, for finding header and columns. */
export function previewRows(cells: CellText): string[][] {
  const { text } = cells;
  let end = 0;
  for (let line = 0; line < PREVIEW_LINES && end < text.length; line++) {
    const next = text.indexOf('\n', end);
    end = next < 0 ? text.length : next + 1;
  }
  const part = text.slice(0, Math.min(end, PREVIEW_LENGTH));
  return Papa.parse<string[]>(part, papaOptions(cells)).data;
}

/**
 * Hands on every row of the text in order, in portions, so that a large file never lies in memory as cells at once.
 *
 * @param cells an opened text
 * @param take receives some rows and returns whether to go on
 */
export function eachPortion(cells: CellText, take: (rows: string[][]) => boolean): void {
  const { text } = cells;
  for (let at = 0; at < text.length; ) {
    const end = portionEnd(cells, at);
    const portion = at === 0 && end === text.length ? text : text.slice(at, end);
    if (!take(Papa.parse<string[]>(portion, papaOptions(cells)).data)) return;
    at = end + 1;
  }
}

/** The line end that closes a portion: the first beyond its length that does not lie between quotation marks. */
function portionEnd({ text, quoted }: CellText, from: number): number {
  let end = from;
  let open = false;
  let length = CHUNK_LENGTH;
  do {
    const next = text.indexOf('\n', end + length);
    if (next < 0) return text.length;
    for (let at = text.indexOf('"', end); quoted && at >= 0 && at < next; at = text.indexOf('"', at + 1)) open = !open;
    end = next;
    length = 1;
  } while (open);
  return end;
}
