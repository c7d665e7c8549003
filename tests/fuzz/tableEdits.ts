import fc from 'fast-check';
import { factor, hostileWord } from './hostileWords.ts';
import { place } from './textEdits.ts';

/** A change of a table of rows and cells. */
export type TableEdit = Readonly<{
  row: number;
  other: number;
  column: number;
  count: number;
  minutes: number;
  factor: number;
  word: string;
  how: TableHow;
}>;

type TableHow = (typeof tableHows)[number];

const tableHows = [
  ...(['cell', 'cell', 'scale', 'scale', 'blank', 'stamp', 'stamp', 'cutRows', 'doubleRow', 'exchangeRows'] as const),
  ...([
    'addCell',
    'cutCell',
    'headerWord',
    'cutColumn',
    'delimiter',
    'decimal',
    'quote',
    'cutFrom',
    'allStamps',
  ] as const),
];

export const tableEdit: fc.Arbitrary<TableEdit> = fc.record({
  row: place,
  other: place,
  column: fc.nat(5),
  count: fc.integer({ min: 1, max: 40 }),
  minutes: fc.constantFrom(-1440, -60, -30, -1, 1, 15, 30, 60, 120, 1440, 525_600),
  factor,
  word: hostileWord,
  how: fc.constantFrom(...tableHows),
});

/** Makes some changes to a table of comma-separated cells; lines that begin with # stay before it. */
export function editedTable(text: string, edits: readonly TableEdit[]): string {
  return edits.reduce((changed, edit) => editedOnce(changed, edit), text);
}

function editedOnce(text: string, edit: TableEdit): string {
  const lines = text.trimEnd().split('\n');
  const header = lines.findIndex((line) => !line.startsWith('#'));
  const i = header + 1 + Math.floor(edit.row * (lines.length - header - 1));
  if (edit.how === 'cutFrom') return text.slice(0, Math.floor(edit.row * text.length));
  if (edit.how === 'delimiter') return text.replaceAll(',', edit.row < 0.7 ? ';' : edit.word.slice(0, 1));
  if (edit.how === 'decimal') return text.replaceAll(',', ';').replaceAll('.', ',');
  if (edit.how === 'allStamps' || edit.how === 'cutColumn') {
    return `${lines.map((line, k) => (k <= header && edit.how === 'allStamps' ? line : wholeColumn(line, edit))).join('\n')}\n`;
  }
  changeRows(lines, { edit, header, i });
  return `${lines.join('\n')}\n`;
}

function wholeColumn(line: string, { how, minutes, column }: TableEdit): string {
  const cells = line.split(',');
  if (how === 'allStamps') cells[0] = shifted(cells[0] ?? '', minutes);
  else cells.splice(column % cells.length, 1);
  return cells.join(',');
}

function changeRows(lines: string[], { edit, header, i }: { edit: TableEdit; header: number; i: number }): void {
  const { how, word, count, other } = edit;
  const line = lines[i] ?? '';
  const j = header + 1 + Math.floor(other * (lines.length - header - 1));
  if (how === 'cutRows') lines.splice(i, count);
  else if (how === 'doubleRow') lines.splice(i, 0, line);
  else if (how === 'exchangeRows') [lines[i], lines[j]] = [lines[j] ?? '', line];
  else if (how === 'quote') lines[i] = `"${line}`;
  else if (how === 'headerWord') lines[header] = withCell(lines[header] ?? '', edit.column, () => word);
  else if (how === 'blank')
    for (let k = i; k < i + count && k < lines.length; k++) lines[k] = withCell(lines[k] ?? '', edit.column, () => '');
  else lines[i] = changedRow(line, edit);
}

function changedRow(line: string, { how, column, word, factor: by, minutes }: TableEdit): string {
  if (how === 'cell') return withCell(line, column, () => word);
  if (how === 'scale') return withCell(line, column, (cell) => (cell === '' ? cell : String(Number(cell) * by)));
  if (how === 'stamp') return withCell(line, 0, (cell) => shifted(cell, minutes));
  if (how === 'addCell') return `${line},${word}`;
  return line.split(',').slice(0, -1).join(',');
}

function withCell(line: string, column: number, change: (cell: string) => string): string {
  const cells = line.split(',');
  const i = column % cells.length;
  cells[i] = change(cells[i] ?? '');
  return cells.join(',');
}

/** A stamp so many minutes later, in its own form; what is no stamp stays. */
function shifted(stamp: string, minutes: number): string {
  const [, date, time, rest] = /^(\d{4}-\d\d-\d\d)(T\d\d:\d\d)?(.*)$/.exec(stamp) ?? [];
  if (date === undefined) return stamp;
  const moved = new Date(Date.parse(`${date}${time ?? 'T00:00'}Z`) + minutes * 60_000).toISOString();
  return moved.slice(0, time === undefined ? 10 : 16) + (rest ?? '');
}
