import type { Quantity } from '../weather/read/quantities.ts';
import type { Recognised } from '../weather/read/readWeather.ts';

/** How a weather file was understood, as plain data. What the file does not settle is left out. */
export interface WeatherLines {
  /** What its columns were taken for, in words. */
  readonly columns: string[];
  readonly rows?: number;
  readonly stepMinutes?: number;
  /** Whether a stamp marks the beginning or the end of its step. */
  readonly stamps?: 'begin' | 'end';
  /** Offset of its standard time from UTC, minutes. */
  readonly offsetMinutes?: number;
  /** All of it in sentences, without their full stops. */
  readonly recognised: string[];
  /** What was mended, a column each. */
  readonly repairs: { quantity: Quantity; hours: number; longest: number; held: number }[];
}

/** What a reader of weather recognised and mended, for a document. */
export function weatherLines(known: Recognised): WeatherLines {
  const { columns, rowsRead, stepMinutes, stamps, offsetMinutes, lines, filled } = known;
  return {
    columns: columns.map(({ use }) => use),
    ...(rowsRead === undefined ? {} : { rows: rowsRead }),
    ...(stepMinutes === undefined ? {} : { stepMinutes }),
    ...(stamps === undefined ? {} : { stamps }),
    ...(offsetMinutes === undefined ? {} : { offsetMinutes }),
    recognised: [...lines],
    repairs: filled
      .filter(({ hours, held }) => hours > 0 || held > 0)
      .map(({ quantity, hours, longest, held }) => ({ quantity, hours, longest, held })),
  };
}
