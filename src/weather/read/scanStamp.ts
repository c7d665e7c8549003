/** How the two first numbers of a date are to be understood. */
export type DateOrder = 'year-month-day' | 'day-month' | 'open' | 'none';

/** A stamp as written, before the order of day and month is decided. */
export interface StampParts {
  /** `open`: day/month or month/day; `none`: a time without a date. */
  order: DateOrder;
  /** The year, or NaN where none is written. */
  year: number;
  /** Month and day where the order is year-month-day, else the two as they stand. */
  first: number;
  second: number;
  /** Minutes of the day with seconds as a fraction, 0 … 1440, or NaN where no time is written. */
  minute: number;
  /** Offset from UTC in minutes, or NaN where none is written. */
  offset: number;
}

const MOST_GROUPS = 9;
const ZERO = 48;
const BLANK = 32;
const MINUS = 45;
const SLASH = 47;
const POINT = 46;
const COLON = 58;
const PLUS = 43;
const COMMA = 44;
const LETTER_T = 84;
const UNDERSCORE = 95;
const UNICODE_MINUS = 0x2212;

// Scratch of one scan: nothing in it outlives a call.
const value = new Float64Array(MOST_GROUPS);
const length = new Uint8Array(MOST_GROUPS);
/** Code of the sign before a group: the last one that is no blank, else a blank. */
const before = new Uint16Array(MOST_GROUPS);
let groups = 0;
let tail = '';

/**
 * Reads the common forms of a stamp: ISO 8601 with or without offset, dates with slashes, points or hyphens, compact
 * digits (YYYYMMDD, then hh, hhmm or hhmmss), and times of day alone.
 *
 * @param cell text of any kind, without blanks around it
 * @param into receives what was read; unspecified where the result is false
 * @returns whether the cell is a stamp; whether the day exists is checked where the order is known
 * @example scanStamp('2019-07-01T14:30+02:00', parts) // true: first 7, second 1, minute 870, offset 120
 *
 * Reference: ISO 8601-1:2019; the other forms are common practice, no source.
 */
export function scanStamp(cell: string, into: StampParts): boolean {
  if (cell.length === 16 && scanPlain(cell, into)) return true;
  if (cell.length > 40 || !scanGroups(cell)) return false;
  const next = readDate(into);
  return next >= 0 && readTime(next, into);
}

/** `2019-07-01T14:30` and `2019-07-01 14:30`, the commonest forms, at a fraction of the time. */
function scanPlain(cell: string, into: StampParts): boolean {
  const middle = cell.charCodeAt(10);
  if ((middle !== LETTER_T && middle !== BLANK) || cell.charCodeAt(13) !== COLON) return false;
  if (cell.charCodeAt(4) !== MINUS || cell.charCodeAt(7) !== MINUS) return false;
  const century = twoDigitsAt(cell, 0);
  const year = twoDigitsAt(cell, 2);
  const hour = twoDigitsAt(cell, 11);
  const minute = twoDigitsAt(cell, 14);
  into.order = 'year-month-day';
  into.year = century * 100 + year;
  into.first = twoDigitsAt(cell, 5);
  into.second = twoDigitsAt(cell, 8);
  into.minute = hour * 60 + minute;
  into.offset = Number.NaN;
  return century + year + into.first + into.second + hour + minute >= 0 && hour < 24 && minute < 60;
}

/** The number of two digits, NaN where there are none. */
function twoDigitsAt(cell: string, at: number): number {
  const tens = cell.charCodeAt(at) - ZERO;
  const ones = cell.charCodeAt(at + 1) - ZERO;
  return tens >= 0 && tens <= 9 && ones >= 0 && ones <= 9 ? tens * 10 + ones : Number.NaN;
}

function scanGroups(cell: string): boolean {
  groups = 0;
  tail = '';
  let inside = false;
  let sign = 0;
  for (let i = 0; i < cell.length; i++) {
    const code = cell.charCodeAt(i);
    const digit = code - ZERO;
    if (digit >= 0 && digit <= 9) {
      if (!inside && !beginGroup(sign)) return false;
      inside = true;
      value[groups - 1] = (value[groups - 1] as number) * 10 + digit;
      length[groups - 1] = (length[groups - 1] as number) + 1;
    } else if (isSign(code)) {
      sign = inside ? code : strongerSign(sign, code);
      inside = false;
    } else {
      tail = cell.slice(i).trim();
      return groups > 0 && isTail(tail);
    }
  }
  return inside;
}

function beginGroup(sign: number): boolean {
  if (groups === MOST_GROUPS || (groups === 0 && sign !== 0)) return false;
  value[groups] = 0;
  length[groups] = 0;
  before[groups] = sign;
  groups++;
  return true;
}

/** A blank beside another sign says nothing: `1.1. 00:00`, `01:00 +01:00`; a comma is as weak as a blank. */
function strongerSign(sign: number, code: number): number {
  return code === BLANK && sign !== 0 && sign !== COMMA ? sign : code;
}

function isSign(code: number): boolean {
  return (
    code === MINUS ||
    code === SLASH ||
    code === POINT ||
    code === COLON ||
    code === BLANK ||
    code === LETTER_T ||
    code === PLUS ||
    code === COMMA ||
    code === UNDERSCORE ||
    code === UNICODE_MINUS ||
    code === 116
  );
}

function isTail(text: string): boolean {
  return /^(?:z|utc|gmt|[ap]\.?m\.?)$/i.test(text);
}

/** Reads the date of the scanned groups and returns the index of the first group of the time, or −1. */
function readDate(into: StampParts): number {
  const digits = length[0] as number;
  const sign = groups > 1 ? (before[1] as number) : 0;
  if (digits === 4 && isDateSign(sign) && groups > 2 && before[2] === sign) {
    setDate(into, 'year-month-day', value[0] as number, [value[1] as number, value[2] as number]);
    return 3;
  }
  if (digits === 8 || digits === 10 || digits === 12 || digits === 14) return readCompact(digits, into);
  if (digits > 2) return -1;
  if (sign === COLON) {
    setDate(into, 'none', Number.NaN, [0, 0]);
    return 0;
  }
  if (!isDateSign(sign) || (length[1] as number) > 2) return -1;
  return readShortDate(sign, into);
}

/** Dates that begin with the day or the month, with or without a year. */
function readShortDate(sign: number, into: StampParts): number {
  const order = sign === POINT ? 'day-month' : 'open';
  const pair: [number, number] = [value[0] as number, value[1] as number];
  const yearDigits =
    groups > 2 && before[2] === sign && (groups === 3 || before[3] !== COLON) ? (length[2] as number) : 0;
  if (yearDigits === 4 || yearDigits === 2) {
    const year = value[2] as number;
    setDate(into, order, yearDigits === 4 ? year : year + (year < 70 ? 2000 : 1900), pair);
    return 3;
  }
  if (sign !== SLASH && groups < 3) return -1;
  setDate(into, order, Number.NaN, pair);
  // The point of `1.7. 14:30` closes the date and does not belong to the time.
  if (before[3] === COLON && before[2] === sign) before[2] = BLANK;
  return 2;
}

function readCompact(digits: number, into: StampParts): number {
  const scale = 10 ** (digits - 8);
  const date = Math.floor((value[0] as number) / scale);
  const year = Math.floor(date / 10_000);
  if (year < 1800 || year > 2200) return -1;
  setDate(into, 'year-month-day', year, [Math.floor(date / 100) % 100, date % 100]);
  if (digits === 8) return 1;
  // The rest of the digits is the time: handed on as a group of its own.
  value[0] = (value[0] as number) - date * scale;
  length[0] = digits - 8;
  before[0] = BLANK;
  return 0;
}

function setDate(into: StampParts, order: DateOrder, year: number, pair: readonly [number, number]): void {
  into.order = order;
  into.year = year;
  into.first = pair[0];
  into.second = pair[1];
}

function isDateSign(code: number): boolean {
  return code === MINUS || code === SLASH || code === POINT;
}

/** Reads time of day and offset from a group on; false where something is left over or impossible. */
function readTime(from: number, into: StampParts): boolean {
  into.minute = Number.NaN;
  into.offset = Number.NaN;
  if (from >= groups) return tail === '';
  const sign = before[from];
  if (sign === SLASH || sign === POINT || sign === PLUS) return false;
  const digits = length[from] as number;
  if (digits === 4 || digits === 6) {
    const clock = (value[from] as number) * (digits === 4 ? 100 : 1);
    return (
      setMinute(into, Math.floor(clock / 10_000), [Math.floor(clock / 100) % 100, clock % 100]) &&
      readOffset(from + 1, into)
    );
  }
  if (digits > 2) return false;
  let g = from + 1;
  const minute = g < groups && before[g] === COLON ? (value[g++] as number) : 0;
  const second = g < groups && before[g] === COLON ? (value[g++] as number) : 0;
  if (g < groups && (before[g] === POINT || before[g] === COMMA)) g++;
  return setMinute(into, value[from] as number, [minute, second]) && readOffset(g, into);
}

function setMinute(into: StampParts, written: number, [minute, second]: readonly [number, number]): boolean {
  const hour = onTwelveHourClock(written);
  if (hour > 24 || minute > 59 || second > 59 || (hour === 24 && minute + second > 0)) return false;
  into.minute = hour * 60 + minute + second / 60;
  return true;
}

function onTwelveHourClock(hour: number): number {
  const letter = tail.charCodeAt(0) | 32;
  if (letter !== 97 && letter !== 112) return hour;
  if (hour < 1 || hour > 12) return 99;
  return (hour % 12) + (letter === 112 ? 12 : 0);
}

function readOffset(from: number, into: StampParts): boolean {
  const letter = tail.charCodeAt(0) | 32;
  if (letter === 122 || letter === 117 || letter === 103) into.offset = 0;
  if (from === groups) return true;
  const sign = before[from] as number;
  if (tail !== '' || (sign !== PLUS && sign !== MINUS && sign !== UNICODE_MINUS)) return false;
  const written = value[from] as number;
  const digits = length[from] as number;
  const hours = digits === 4 ? Math.floor(written / 100) : written;
  const minutes = digits === 4 ? written % 100 : from + 1 < groups ? (value[from + 1] as number) : 0;
  const used = digits === 4 || from + 1 >= groups ? 1 : 2;
  if (digits === 3 || digits > 4 || hours > 14 || minutes > 59 || from + used !== groups) return false;
  if (used === 2 && before[from + 1] !== COLON) return false;
  into.offset = (sign === PLUS ? 1 : -1) * (hours * 60 + minutes);
  return true;
}
