import { shown } from '../../core/problem.ts';
import { offsetText } from '../../core/stampText.ts';
import { quantityTexts } from './quantities.ts';
import type { FilledColumn, RecognisedColumn, Recognising } from './recognised.ts';
import { englishRecognised, type RecognisedWords } from './recognisedWords.ts';

/**
 * How a file was understood, in sentences for people.
 *
 * @param words of their language
 */
export function recognisedLines(known: Recognising, words: RecognisedWords = englishRecognised): string[] {
  return [
    ...tableLines(known, words),
    ...known.columns.map((column) => columnLine(column, words)),
    ...stampLines(known, words),
    ...known.filled.flatMap((column) => filledLines(column, words)),
    ...known.empty.map((quantity) => words.empty(words.quantity(quantity))),
  ];
}

function tableLines(known: Recognising, words: RecognisedWords): string[] {
  const lines: string[] = [];
  if (known.delimiter !== undefined) lines.push(words.cells(known.delimiter, String(known.decimal)));
  if (known.header !== undefined) {
    const head = known.header ? words.header(known.headerLine ?? 1) : words.noHeader;
    lines.push(known.linesSkipped ? `${head}${words.skipped(known.linesSkipped)}` : head);
  }
  if (known.station !== undefined) lines.push(words.station(shown(known.station, 40)));
  if (known.rowsRead !== undefined) {
    lines.push(`${words.rows(known.rowsRead)}${known.footerRows ? words.footer(known.footerRows) : ''}`);
  }
  return lines;
}

function columnLine({ use, number, name, unit, decidedBy, unitDecidedBy }: RecognisedColumn, words: RecognisedWords) {
  const how = [words.decided[decidedBy], ...(unitDecidedBy === undefined ? [] : [words.unitDecided[unitDecidedBy]])];
  return words.column({
    use: words.use(use),
    number,
    name: name === undefined ? '' : shown(name, 40),
    unit: unit === undefined ? '' : (words.units[unit] ?? unit),
    how: how.join(', '),
  });
}

function stampLines(known: Recognising, words: RecognisedWords): string[] {
  const lines: string[] = [];
  if (known.stampForm !== undefined) lines.push(words.form(shown(known.stampForm)));
  if (known.stamps !== undefined) lines.push(words.marks(known.stamps, words.how[known.stampsDecidedBy ?? 'assumed']));
  if (known.stepMinutes !== undefined) lines.push(words.step(known.stepMinutes));
  if (known.clock === 'local') lines.push(words.localClock(words.how[known.clockDecidedBy ?? 'assumed']));
  if (known.offsetMinutes !== undefined && known.offsetFrom !== undefined) {
    lines.push(words.offset(offsetText(known.offsetMinutes), words.offsetFrom[known.offsetFrom]));
  }
  if (known.year !== undefined) lines.push(words.year(known.year));
  if (known.sorted === true) lines.push(words.sorted);
  return lines;
}

function filledLines({ quantity, hours, longest, held }: FilledColumn, words: RecognisedWords): string[] {
  const name = words.quantity(quantity);
  const lines: string[] = [];
  if (hours > 0) lines.push(words.interpolated(name, hours, longest));
  if (held > 0) {
    const at = `${quantity === 'relativeHumidity' ? 100 : 0} ${quantityTexts[quantity].unit}`;
    lines.push(words.held(name, held, at));
  }
  return lines;
}
