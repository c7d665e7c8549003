import { shown } from '../../core/problem.ts';
import type { Quantity } from './quantities.ts';

/** How the use of a column was decided. */
export type Decided = 'settings' | 'name' | 'content' | 'position';

/** One column in use. */
export interface UsedColumn {
  /** Index, counted from 0. */
  readonly index: number;
  readonly how: Decided;
}

/** What makes up the stamps; all absent where the rows have none. */
export interface StampColumns {
  readonly stamp?: UsedColumn | undefined;
  readonly date?: UsedColumn | undefined;
  readonly time?: UsedColumn | undefined;
  readonly year?: UsedColumn | undefined;
  readonly month?: UsedColumn | undefined;
  readonly day?: UsedColumn | undefined;
  readonly hour?: UsedColumn | undefined;
  readonly minute?: UsedColumn | undefined;
  readonly hourOfYear?: UsedColumn | undefined;
}

/** Which column is used for what. */
export interface ColumnPlan {
  readonly quantities: ReadonlyMap<Quantity, UsedColumn>;
  readonly stamps: StampColumns;
  readonly station?: UsedColumn | undefined;
}

/**
 * A column for people: its number counted from 1, and its name where it has one.
 *
 * @example columnLabel(1, ['date', 'T_out']) // 'column 2 “T_out”'
 */
export function columnLabel(index: number, names: readonly string[]): string {
  const name = names[index];
  return name === undefined || name === '' ? `column ${index + 1}` : `column ${index + 1} “${shown(name, 40)}”`;
}

/** Columns for people, at most twelve by name. */
export function columnList(indices: readonly number[], names: readonly string[]): string {
  if (indices.length === 0) return 'none';
  const listed = indices.slice(0, 12).map((index) => columnLabel(index, names));
  return indices.length > 12 ? `${listed.join(', ')} and ${indices.length - 12} more` : listed.join(', ');
}
