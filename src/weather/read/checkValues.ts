import { shown } from '../../core/problem.ts';
import type { CellPlace } from './cellPlace.ts';
import type { Findings } from './findings.ts';
import { MOST_OF_A_KIND } from './findings.ts';
import { type Quantity, quantityTexts } from './quantities.ts';

/** Values of one column at the rows in use. */
export interface CheckedColumn {
  readonly quantity: Quantity;
  /** Index of the column, counted from 0, and what it is called in messages. */
  readonly index: number;
  readonly label: string;
  /** One a row in the units used here: NaN missing, Infinity other text. Held values are changed in place. */
  readonly values: Float64Array;
  /** Rows in use, in the order of the file. */
  readonly rows: Int32Array;
  /** Physical line of each row. */
  readonly lines: Int32Array;
  readonly place: (line: number, index: number) => CellPlace;
  readonly findings: Findings;
}

/** What became of a column's values. */
export interface CheckedValues {
  /** Whether every value is a number or missing, and possible. */
  readonly good: boolean;
  /** Values held at an end: humidity above 100 %, radiation below 0. */
  readonly held: number;
}

/**
 * Looks for text and impossible values in a column, and holds those that lie within the error of an instrument.
 *
 * @returns whether the column can be used, and how many values were held
 */
export function checkValues(column: CheckedColumn): CheckedValues {
  const { values, rows } = column;
  const { least, most } = quantityTexts[column.quantity];
  let finite = 0;
  const text: number[] = [];
  const impossible: number[] = [];
  for (const row of rows) {
    const value = values[row] as number;
    if (value === Number.POSITIVE_INFINITY) text.push(row);
    else if (value < least || value > most) impossible.push(row);
    if (Number.isFinite(value)) finite++;
  }
  reportText(column, text);
  if (impossible.length > 0.5 * finite) reportImplausible(column, impossible);
  else reportImpossible(column, impossible);
  const good = text.length + impossible.length === 0;
  return { good, held: good ? hold(column) : 0 };
}

function reportText(column: CheckedColumn, rows: readonly number[]): void {
  const { lines, place, index, label, findings } = column;
  rows.forEach((row, n) => {
    const line = lines[row] as number;
    const cell = n < MOST_OF_A_KIND ? place(line, index) : { text: '' };
    findings.add({
      code: 'weather.text-cell',
      severity: 'error',
      ...at(line, cell),
      path: label,
      found: `“${shown(cell.text, 40)}”`,
    });
  });
}

function reportImpossible(column: CheckedColumn, rows: readonly number[]): void {
  const { lines, place, index, label, values, quantity, findings } = column;
  rows.forEach((row, n) => {
    const line = lines[row] as number;
    findings.add({
      code: 'weather.impossible-value',
      severity: 'error',
      ...at(line, n < MOST_OF_A_KIND ? place(line, index) : { text: '' }),
      path: label,
      found: rounded(values[row] as number),
      unit: quantityTexts[quantity].unit,
      allowed: rangeText(quantity),
    });
  });
}

/** A column in another unit, or another quantity altogether: one problem instead of one for each line. */
function reportImplausible({ quantity, values, lines, label, findings }: CheckedColumn, rows: readonly number[]): void {
  const [first] = rows;
  if (first === undefined) return;
  findings.add({
    code: 'weather.column-implausible',
    severity: 'error',
    line: lines[first] as number,
    path: label,
    found: `${rounded(values[first] as number)} ${quantityTexts[quantity].unit}`,
    allowed: rangeText(quantity),
  });
}

function at(line: number, { column }: CellPlace): { line: number; column?: number } {
  return column === undefined ? { line } : { line, column };
}

function rangeText(quantity: Quantity): string {
  const { least, most, unit } = quantityTexts[quantity];
  return `${least} to ${most} ${unit}`;
}

/** Six digits; a value that the change of its unit has carried beyond the numbers is shown as the lowest of them. */
function rounded(value: number): string {
  return String(Number(Math.max(value, -Number.MAX_VALUE).toPrecision(6)));
}

/** Holds humidity at 100 % and radiation at 0. Returns how many values were held. */
function hold({ quantity, values, rows }: CheckedColumn): number {
  if (quantity !== 'relativeHumidity' && quantity !== 'globalRadiation') return 0;
  let held = 0;
  for (const row of rows) {
    const value = values[row] as number;
    if (quantity === 'relativeHumidity' ? value > 100 : value < 0) {
      values[row] = quantity === 'relativeHumidity' ? 100 : 0;
      held++;
    }
  }
  return held;
}
