import { dayExists, dayNumber, MINUTES_PER_DAY } from '../../core/civilDate.ts';
import { shown } from '../../core/problem.ts';
import type { Findings } from './findings.ts';
import type { RawRows } from './readRows.ts';

/** The stamps of all rows as minutes of their own clock. */
export interface Stamps {
  /** Minutes since 1970-01-01 00:00 of the clock of the stamps; NaN where a stamp could not be read. */
  readonly minutes: Float64Array;
  /** Offset from UTC that each stamp carries, minutes; absent where they carry none. */
  readonly offsets?: Float64Array | undefined;
  /** Whether the stamps carry years. */
  readonly hasYears: boolean;
  /** Whether hours run from 1 to 24, as they do where a stamp marks the end of its hour. */
  readonly to24: boolean;
  /** The form of the stamps, in words. */
  readonly form: string;
}

/** Rows, the settings that concern stamps, and where problems go. */
export interface StampSource {
  readonly raw: RawRows;
  readonly stampFormat: string | undefined;
  /** Code of the decimal mark. */
  readonly mark: number;
  readonly findings: Findings;
}

/** What stamps read into, before days are numbered; NaN for what is not written. */
export interface StampFields {
  readonly year: Float64Array;
  readonly month: Float64Array;
  readonly day: Float64Array;
  /** Minutes of the day with seconds as a fraction, 0 … 1440. */
  readonly minute: Float64Array;
  readonly offset: Float64Array;
}

/** Years for stamps without one: with a 29 February only where one is written. */
const NOMINAL_YEAR = 2001;
const NOMINAL_LEAP_YEAR = 2000;

/** Fields of so many rows, all of them NaN. */
export function emptyFields(count: number): StampFields {
  const column = () => new Float64Array(count).fill(Number.NaN);
  return { year: column(), month: column(), day: column(), minute: column(), offset: column() };
}

/** The first minute of the year that stands for years not written. */
export function nominalStart(leap: boolean): number {
  return dayNumber(leap ? NOMINAL_LEAP_YEAR : NOMINAL_YEAR, 1, 1) * MINUTES_PER_DAY;
}

/**
 * Numbers the days of the fields, and reports stamps whose day or time does not exist.
 *
 * @param fields year, month, day and minute of each row
 * @param source the rows, for the lines of problems
 * @param words form of the stamps in words, and the cell that a problem shows
 */
export function numberStamps(
  fields: StampFields,
  { raw, findings }: Pick<StampSource, 'raw' | 'findings'>,
  words: { readonly form: string; readonly path: string; readonly cell: (row: number) => string },
): Stamps {
  const minutes = new Float64Array(raw.count);
  const hasYears = fields.year.some((year) => !Number.isNaN(year));
  const nominal = hasLeapDay(fields) ? NOMINAL_LEAP_YEAR : NOMINAL_YEAR;
  let dayKey = Number.NaN;
  let dayStart = Number.NaN;
  let midnights = 0;
  let ends = 0;
  for (let i = 0; i < raw.count; i++) {
    const year = hasYears ? (fields.year[i] as number) : nominal;
    const month = fields.month[i] as number;
    const day = fields.day[i] as number;
    const key = (year * 16 + month) * 32 + day;
    if (key !== dayKey) {
      dayKey = key;
      dayStart = dayExists(year, month, day) ? dayNumber(year, month, day) * MINUTES_PER_DAY : Number.NaN;
    }
    const minute = fields.minute[i] as number;
    minutes[i] = dayStart + Math.round(minute);
    if (minute === 0) midnights++;
    if (minute === MINUTES_PER_DAY) ends++;
    if (Number.isNaN(minutes[i])) {
      findings.add({
        code: 'weather.stamp',
        severity: 'error',
        line: raw.lines[i] as number,
        path: words.path,
        found: `“${shown(words.cell(i), 40)}”`,
        allowed: words.form,
      });
    }
  }
  return { minutes, offsets: offsetsOf(fields.offset), hasYears, to24: ends > 0 && midnights === 0, form: words.form };
}

function hasLeapDay({ month, day }: StampFields): boolean {
  return day.some((value, i) => value === 29 && month[i] === 2);
}

function offsetsOf(offset: Float64Array): Float64Array | undefined {
  return offset.some((value) => !Number.isNaN(value)) ? offset : undefined;
}
