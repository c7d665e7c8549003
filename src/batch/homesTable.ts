import Papa from 'papaparse';
import { decodeText } from '../core/decodeText.ts';
import { type Problem, shown } from '../core/problem.ts';
import { listed } from '../scenario/entries/allowedText.ts';
import type { Change } from './changes.ts';
import { type CsvRecord, LONGEST_RECORD } from './csvRecords.ts';
import { cellValue, notSingle, quoted, type ScenarioPlace, scenarioPlace } from './scenarioPlaces.ts';

/** How a table of homes is written, and what its columns say. */
export interface HomesHeader {
  readonly file: string;
  readonly delimiter: string;
  readonly names: readonly string[];
  readonly nameColumn: number;
  readonly columns: readonly { readonly index: number; readonly name: string; readonly place: ScenarioPlace }[];
}

/** One home: its name, its line, and what it says otherwise than the base scenario. */
export interface Home {
  readonly name: string;
  readonly line?: number;
  readonly changes: readonly Change[];
  /** Problems of the row as such; then it cannot be simulated. */
  readonly problems: readonly Problem[];
}

const DELIMITERS = [',', ';', '\t'];

/** Whether a row holds nothing: it is passed over. */
export function isBlank({ bytes }: CsvRecord): boolean {
  return bytes.every((byte) => byte === 32 || byte === 44 || byte === 59 || byte === 9);
}

/** Whether a row above the names of the columns is a remark. */
export function isRemark(record: CsvRecord): boolean {
  return decodeText(record.bytes).text.startsWith('#');
}

/**
 * Understands the names of the columns; each is a place in a scenario, but for the column of the homes' names.
 *
 * @param record the first row that is neither blank nor a remark
 * @returns the header; a column that no scenario has is a problem of the whole table
 */
export function homesHeader(
  record: CsvRecord,
  file: string,
  nameColumn: string,
): { header?: HomesHeader; problems: Problem[] } {
  const { text } = decodeText(record.bytes);
  const delimiter = delimiterOf(text);
  const names = cellsOf(text, delimiter).map((name) => name.trim());
  const at = { severity: 'error', file, line: record.line } as const;
  const problems: Problem[] = [];
  const nameIndex = names.indexOf(nameColumn);
  if (nameIndex < 0) {
    problems.push({
      ...at,
      code: 'batch.no-name-column',
      found: quoted(nameColumn),
      allowed: shown(listed(names), 200),
    });
  }
  const columns = names.flatMap((name, index) => {
    if (index === nameIndex) return [];
    const place = placeOfColumn(name, { ...at, column: columnOf(text, delimiter, index) }, problems);
    const repeated = names.indexOf(name) < index;
    if (repeated) problems.push({ ...at, code: 'batch.repeated-column', found: quoted(name) });
    return place === undefined || repeated ? [] : [{ index, name, place }];
  });
  if (problems.length > 0) return { problems };
  return { header: { file, delimiter, names, nameColumn: nameIndex, columns }, problems };
}

function placeOfColumn(
  name: string,
  at: Pick<Problem, 'severity' | 'file' | 'line' | 'column'>,
  problems: Problem[],
): ScenarioPlace | undefined {
  const place = scenarioPlace(name);
  if (!('path' in place)) {
    const hint = place.near === undefined ? {} : { hint: `perhaps ${place.near} is meant` };
    problems.push({ ...at, code: 'batch.unknown-column', found: quoted(name), allowed: place.known, ...hint });
    return undefined;
  }
  const single = notSingle(place);
  if (single === undefined) return place;
  problems.push({ ...at, code: 'batch.column-not-single', found: quoted(name), allowed: single });
  return undefined;
}

/**
 * Reads the row of a home. An empty cell leaves what the base scenario says.
 *
 * @param record a row below the names of the columns
 * @param number of the home, counted from 1: its name where the row gives none
 */
export function homeOf(header: HomesHeader, record: CsvRecord, number: number): Home {
  const { file, delimiter, names } = header;
  const { line } = record;
  if (record.bytes.length > LONGEST_RECORD) return brokenRow(header, line, number);
  const { text } = decodeText(record.bytes);
  const cells = cellsOf(text, delimiter).map((cell) => cell.trim());
  const name = cells[header.nameColumn] || `home ${number}`;
  const problems: Problem[] = [];
  if (cells.length !== names.length) {
    const counts = { found: String(cells.length), allowed: String(names.length) };
    problems.push({ code: 'batch.row-length', severity: 'error', file, line, ...counts });
  }
  const changes = header.columns.flatMap(({ index, place }): Change[] => {
    const cell = cells[index];
    if (cell === undefined || cell === '') return [];
    const origin = { file, line, column: columnOf(text, delimiter, index) };
    return [{ path: place.path, value: cellValue(place, cell, delimiter !== ','), origin }];
  });
  return { name, line, changes, problems };
}

function brokenRow({ file }: HomesHeader, line: number, number: number): Home {
  const allowed = `${LONGEST_RECORD} bytes`;
  const problem = { code: 'batch.open-quote', severity: 'error', file, line, allowed } as const;
  return { name: `home ${number}`, line, changes: [], problems: [problem] };
}

function delimiterOf(header: string): string {
  const counts = DELIMITERS.map((mark) => header.split(mark).length);
  return DELIMITERS[counts.indexOf(Math.max(...counts))];
}

function cellsOf(text: string, delimiter: string): string[] {
  if (!text.includes('"')) return text.split(delimiter);
  return Papa.parse<string[]>(text, { delimiter, newline: '\n' }).data[0] ?? [];
}

/** Where a cell begins in its row, counted from 1; quotes are looked at, line ends within them are not. */
function columnOf(text: string, delimiter: string, index: number): number {
  let at = 0;
  let open = false;
  for (let i = 0; i < text.length && at < index; i++) {
    if (text[i] === '"') open = !open;
    if (text[i] === delimiter && !open) {
      at++;
      if (at === index) return i + 2;
    }
  }
  return 1;
}
