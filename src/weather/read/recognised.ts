import type { AbsentHours, DecimalName, DelimiterName, StampClock, StampEnd } from '../readSettings.ts';
import type { Decided } from './columnPlan.ts';
import type { Quantity, QuantityUnit } from './quantities.ts';
import type { DecidedUnit } from './units.ts';

/** One column and what it is used for. */
export interface RecognisedColumn {
  /** A quantity, or a part of the stamps. */
  readonly use: string;
  /** Counted from 1. */
  readonly number: number;
  /** Name in the header; absent where it has none. */
  readonly name?: string | undefined;
  readonly decidedBy: Decided;
  readonly unit?: QuantityUnit | undefined;
  readonly unitDecidedBy?: DecidedUnit['how'] | undefined;
}

/** Hours of one column that were interpolated, and values that were held. */
export interface FilledColumn {
  readonly quantity: Quantity;
  readonly hours: number;
  readonly longest: number;
  readonly held: number;
}

/** How a weather file was understood. What could not be settled is absent. */
export interface Recognised {
  readonly delimiter?: DelimiterName | undefined;
  readonly decimal?: DecimalName | undefined;
  /** Lines before the header, or before the data where there is no header. */
  readonly linesSkipped?: number | undefined;
  readonly header?: boolean | undefined;
  readonly headerLine?: number | undefined;
  readonly columns: readonly RecognisedColumn[];
  /** Form of the stamps in words. */
  readonly stampForm?: string | undefined;
  readonly stamps?: StampEnd | undefined;
  readonly stampsDecidedBy?: 'settings' | 'recognised' | 'assumed' | undefined;
  readonly stepMinutes?: number | undefined;
  readonly offsetMinutes?: number | undefined;
  readonly offsetFrom?: 'settings' | 'stamps' | 'header' | 'zone' | 'site' | undefined;
  readonly clock?: StampClock | undefined;
  readonly clockDecidedBy?: 'settings' | 'recognised' | 'assumed' | undefined;
  readonly station?: string | undefined;
  readonly year?: number | undefined;
  readonly sorted?: boolean | undefined;
  readonly rowsRead?: number | undefined;
  readonly footerRows?: number | undefined;
  readonly absentHours?: AbsentHours | undefined;
  readonly filled: readonly FilledColumn[];
  /** Columns without a single value, which were left out. */
  readonly empty: readonly Quantity[];
  /** All of it in sentences. */
  readonly lines: readonly string[];
}

/** What is known so far, while a file is read. */
export type Recognising = { -readonly [Key in keyof Omit<Recognised, 'lines'>]: Recognised[Key] };
