import Table from 'cli-table3';

/** Columns of a terminal that a report keeps to. */
const WIDTH = 80;

/**
 * Text in lines of at most 80 columns, broken at blanks; a longer word stands alone on its line.
 *
 * @param text any; line breaks in it count as blanks
 * @param first what the first line begins with
 * @param further what the further lines begin with
 * @example wrapped('a b', '- ', '  ') // '- a b'
 */
export function wrapped(text: string, first = '', further = first): string {
  const lines: string[] = [];
  let line = first;
  let begun = false;
  for (const word of text.split(/[ \n]+/)) {
    if (begun && [...line].length + 1 + [...word].length > WIDTH) {
      lines.push(line);
      line = further;
      begun = false;
    }
    line += begun ? ` ${word}` : word;
    begun = true;
  }
  return [...lines, line].join('\n');
}

/** A column of a table: its heading, the cells below, and whether they are figures, which stand to the right. */
export interface Column {
  readonly heading: string;
  readonly cells: readonly string[];
  readonly figures: boolean;
}

/** The first column is never made narrower than this to save space. */
const NARROWEST_FIRST = 12;

/**
 * A table in box lines.
 *
 * @param columns all with as many cells; text in the first is broken at blanks where the table would be wider than 80
 *   columns
 */
export function table(columns: readonly Column[]): string {
  const [first, ...others] = columns.map(longestOf);
  // A column takes a border and a blank on either side of its text, the table one border more.
  const room = WIDTH - 1 - others.reduce((sum, longest) => sum + longest + 3, 0) - 3;
  const narrowed = first > room ? Math.max(NARROWEST_FIRST, room) : undefined;
  const made = new Table({
    head: columns.map(({ heading }) => heading),
    colAligns: columns.map(({ figures }) => (figures ? 'right' : 'left')),
    colWidths: [narrowed === undefined ? null : narrowed + 2],
    wordWrap: true,
    style: { head: [], border: [], compact: true },
  });
  columns[0].cells.forEach((_, row) => {
    made.push(columns.map(({ cells }) => cells[row]));
  });
  return made.toString();
}

/** Letters of the longest line of a column; a heading may have several. */
function longestOf({ heading, cells }: Column): number {
  const lines = [heading, ...cells].flatMap((text) => text.split('\n'));
  return Math.max(...lines.map((line) => [...line].length));
}

/** A heading with a line under it. */
export function heading(text: string): string {
  return `${text}\n${'─'.repeat([...text].length)}`;
}
