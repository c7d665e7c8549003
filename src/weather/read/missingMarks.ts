import type { Quantity } from './quantities.ts';

/** Words that stand for a missing value, in lower case. */
const WORDS = [
  '',
  '-',
  '--',
  '---',
  '.',
  '*',
  '?',
  'na',
  'n/a',
  '#n/a',
  'nan',
  '-nan',
  'null',
  'none',
  'nil',
  'missing',
  'm',
  'x',
  '//',
  '///',
  '////',
];

/** Common practice, no source: these cannot be a value of any of the quantities in any of their units. */
const NUMBERS = [-999, -999.9, -999.99, -9999, -9999.9, -99999, -999999];

const TOO_HIGH = [9999, 9999.9, 99_999.9, 999_999];
const NUMBERS_BY_QUANTITY: Record<Quantity, readonly number[]> = {
  temperature: [...TOO_HIGH, 999, 999.9, 99_999],
  dewPoint: [...TOO_HIGH, 999, 999.9, 99_999],
  wetBulb: [...TOO_HIGH, 999, 999.9, 99_999],
  relativeHumidity: [...TOO_HIGH, 999, 999.9, 99_999],
  globalRadiation: [...TOO_HIGH, 99_999],
  // 999 hPa, 999.9 hPa and 99 999 Pa are the weather of an ordinary day.
  pressure: TOO_HIGH,
};

/** What counts as missing in one column. */
export interface MissingMarks {
  readonly numbers: ReadonlySet<number>;
  /** The smallest of the numbers without its sign: smaller values need not be looked up. */
  readonly least: number;
  readonly words: ReadonlySet<string>;
}

/**
 * The marks of a missing value in a column: the usual ones and those of the settings.
 *
 * @param quantity what the column holds; the marks are compared before any unit is converted
 * @param further numbers or words of the settings
 * @example missingMarks('temperature', []).numbers.has(-9999) // true
 */
export function missingMarks(quantity: Quantity, further: readonly (string | number)[]): MissingMarks {
  const words = new Set(WORDS);
  const numbers = new Set([...NUMBERS, ...NUMBERS_BY_QUANTITY[quantity]]);
  for (const mark of further) {
    if (typeof mark === 'number') numbers.add(mark);
    else words.add(mark.trim().toLowerCase());
    const asNumber = typeof mark === 'string' ? Number(mark) : Number.NaN;
    if (Number.isFinite(asNumber) && mark !== '') numbers.add(asNumber);
  }
  return { numbers, words, least: Math.min(...[...numbers].map(Math.abs)) };
}

/** Whether a cell that is no number is a usual mark of a missing value. */
export function isMissingWord(cell: string, words: ReadonlySet<string> = usualWords): boolean {
  return words.has(cell.trim().toLowerCase());
}

const usualWords: ReadonlySet<string> = new Set(WORDS);
