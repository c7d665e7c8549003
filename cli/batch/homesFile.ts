import { createHash } from 'node:crypto';
import { closeSync, fstatSync, openSync, readSync } from 'node:fs';
import { type CsvRecord, CsvRecords, LONGEST_RECORD } from '../../src/batch/csvRecords.ts';
import { type Home, type HomesHeader, homeOf, homesHeader, isBlank, isRemark } from '../../src/batch/homesTable.ts';
import type { Problem } from '../../src/core/problem.ts';
import { faultCode, faultText } from '../faultWords.ts';

/** Bytes read at once. */
const BLOCK = 262_144;
/** Of every so many homes the place in the file is noted, so that a worker begins near the home it wants. */
const HOMES_A_MARK = 50;

/** Where a home begins. */
export interface HomePlace {
  /** Number of the home, counted from 0. */
  readonly home: number;
  readonly offset: number;
  readonly line: number;
}

/** The names of the columns as they stand in the file, for a worker that reads from the middle. */
export interface HeaderRow {
  readonly file: string;
  readonly line: number;
  readonly bytes: Uint8Array;
  readonly nameColumn: string;
}

/** What one pass through a table of homes finds; of the homes themselves nothing is kept. */
export interface HomesSurvey {
  readonly header: HomesHeader;
  readonly headerRow: HeaderRow;
  readonly homes: number;
  readonly first: Home;
  readonly sha256: string;
  /** The place of home 0, 50, 100, … */
  readonly marks: readonly HomePlace[];
}

/**
 * Goes once through a table of homes: its columns, how many homes, where they stand.
 *
 * @param file name as shown, and as it is opened
 * @param nameColumn column of the homes' names
 */
export function surveyHomes(file: string, nameColumn: string): { survey?: HomesSurvey; problems: Problem[] } {
  let handle: number | undefined;
  try {
    handle = openSync(file, 'r');
    if (!fstatSync(handle).isFile()) return { problems: [fault(file, 'file.not-a-file', 'no regular file')] };
    return survey(handle, file, nameColumn);
  } catch (cause) {
    const missing = ['ENOENT', 'ENOTDIR'].includes(faultCode(cause));
    return { problems: [fault(file, missing ? 'file.missing' : 'file.unreadable', faultText(cause))] };
  } finally {
    if (handle !== undefined) closeSync(handle);
  }
}

function survey(handle: number, file: string, nameColumn: string): { survey?: HomesSurvey; problems: Problem[] } {
  const hash = createHash('sha256');
  const records = recordsOf(handle, { offset: 0, line: 1 }, (bytes) => hash.update(bytes));
  const named = headerIn(records);
  if (named === undefined) return { problems: [fault(file, 'file.empty')] };
  const tooLong = named.bytes.length > LONGEST_RECORD;
  const { header, problems } = tooLong
    ? { header: undefined, problems: [openQuote(file, named)] }
    : homesHeader(named, file, nameColumn);
  if (header === undefined) return { problems };
  const headerRow = { file, line: named.line, bytes: named.bytes.slice(), nameColumn };
  const marks: HomePlace[] = [];
  let first: Home | undefined;
  let homes = 0;
  for (const record of records) {
    if (isBlank(record)) continue;
    if (homes % HOMES_A_MARK === 0) marks.push({ home: homes, offset: record.offset, line: record.line });
    homes++;
    first ??= homeOf(header, record, homes);
  }
  if (first === undefined) return { problems: [fault(file, 'batch.no-homes')] };
  return { survey: { header, headerRow, homes, first, sha256: hash.digest('hex'), marks }, problems: [] };
}

/** The first row that is neither blank nor a remark; undefined where there is none. */
function headerIn(records: Iterator<CsvRecord>): CsvRecord | undefined {
  for (let next = records.next(); next.done !== true; next = records.next()) {
    const record = withoutMark(next.value);
    if (!isBlank(record) && !isRemark(record)) return record;
  }
  return undefined;
}

function openQuote(file: string, { line }: CsvRecord): Problem {
  return { ...fault(file, 'batch.open-quote'), line, allowed: `${LONGEST_RECORD} bytes` };
}

/** A byte-order mark is no part of the first name. */
function withoutMark(record: CsvRecord): CsvRecord {
  const [a, b, c] = record.bytes;
  return a === 0xef && b === 0xbb && c === 0xbf ? { ...record, bytes: record.bytes.subarray(3) } : record;
}

function fault(file: string, code: Problem['code'], found?: string): Problem {
  return { code, severity: 'error', file, ...(found === undefined ? {} : { found }) };
}

/** The mark from which a home is reached. */
export function markBefore({ marks }: HomesSurvey, home: number): HomePlace {
  return marks[Math.floor(home / HOMES_A_MARK)];
}

/** A table of homes that is read from any place in it. */
export class HomesReader {
  readonly #handle: number;
  readonly #header: HomesHeader;

  constructor({ file, line, bytes, nameColumn }: HeaderRow) {
    const { header } = homesHeader({ line, offset: 0, bytes }, file, nameColumn);
    if (header === undefined) throw new Error(`the table of homes ${file} cannot be understood any more`);
    this.#header = header;
    this.#handle = openSync(file, 'r');
  }

  /** Homes from a place on, one after the other. */
  *homesFrom(place: HomePlace): Generator<{ readonly index: number; readonly home: Home }> {
    let index = place.home;
    for (const record of recordsOf(this.#handle, place)) {
      if (isBlank(record)) continue;
      yield { index, home: homeOf(this.#header, record, index + 1) };
      index++;
    }
  }
}

/** Rows of an open file from a place on. */
function* recordsOf(
  handle: number,
  start: { readonly offset: number; readonly line: number },
  seen: (bytes: Uint8Array) => void = () => {},
): Generator<CsvRecord> {
  const records = new CsvRecords(start);
  const block = new Uint8Array(BLOCK);
  let at = start.offset;
  for (;;) {
    const count = readSync(handle, block, 0, BLOCK, at);
    if (count === 0) break;
    at += count;
    const bytes = block.subarray(0, count);
    seen(bytes);
    yield* records.push(bytes);
  }
  yield* records.end();
}
