/** A row of a table: its bytes without the line end, the line on which it begins, and where it begins in the file. */
export interface CsvRecord {
  /** Counted from 1. */
  readonly line: number;
  /** Bytes before it in the file. */
  readonly offset: number;
  readonly bytes: Uint8Array;
}

/** A row of more bytes than this has a quote that was not closed. */
export const LONGEST_RECORD = 65_536;

const LINE_FEED = 10;
const RETURN = 13;
const QUOTE = 34;

/**
 * Parts the bytes of a CSV table into its rows as they come, so that a table of any length takes little memory. A line end
 * within quotes does not end a row. Works on bytes, since line ends and quotes are the same in UTF-8 and in Latin-1.
 */
export class CsvRecords {
  #rest = new Uint8Array(0);
  #offset: number;
  #line: number;

  /** @param start where the first byte stands in the file; line counted from 1 */
  constructor(start: { readonly offset: number; readonly line: number } = { offset: 0, line: 1 }) {
    this.#offset = start.offset;
    this.#line = start.line;
  }

  /**
   * Takes the next bytes.
   *
   * @returns the rows that are whole now; the first one that is longer than `LONGEST_RECORD` may be cut anywhere
   */
  push(bytes: Uint8Array): CsvRecord[] {
    const all = joined(this.#rest, bytes);
    const records: CsvRecord[] = [];
    let begin = 0;
    let lines = 1;
    let open = false;
    for (let i = 0; i < all.length; i++) {
      const byte = all[i];
      if (byte === QUOTE) open = !open;
      if (byte !== LINE_FEED) continue;
      if (open && i - begin <= LONGEST_RECORD) {
        lines++;
        continue;
      }
      records.push(this.#record(all.subarray(begin, i)));
      this.#offset += i + 1 - begin;
      this.#line += lines;
      begin = i + 1;
      lines = 1;
      open = false;
    }
    // a line without end is handed on as it stands: gathered up, each block would be copied behind all that came before
    if (all.length - begin > LONGEST_RECORD) {
      records.push(this.#record(all.subarray(begin)));
      this.#offset += all.length - begin;
      begin = all.length;
    }
    this.#rest = all.slice(begin);
    return records;
  }

  /** The last row, where the file does not end with a line end. */
  end(): CsvRecord[] {
    return this.#rest.length === 0 ? [] : [this.#record(this.#rest)];
  }

  #record(bytes: Uint8Array): CsvRecord {
    const withoutReturn = bytes.at(-1) === RETURN ? bytes.subarray(0, -1) : bytes;
    return { line: this.#line, offset: this.#offset, bytes: withoutReturn };
  }
}

function joined(a: Uint8Array, b: Uint8Array): Uint8Array {
  if (a.length === 0) return b;
  const all = new Uint8Array(a.length + b.length);
  all.set(a);
  all.set(b, a.length);
  return all;
}
