/** Values over time as read: regular, without gaps. */
export interface TimeSeries {
  /** Name of the file as the user gave it. */
  readonly file: string;
  /** Beginning of the first value, minutes since 1970-01-01T00:00Z. */
  readonly startMinute: number;
  /** 1 to 60 whole minutes. */
  readonly stepMinutes: number;
  readonly values: Float64Array;
}

/** How a file of values over time is laid out. */
export interface SeriesSettings {
  /** What a stamp without its own offset means; with `withOffset` it is a fault. */
  readonly stamps: 'withOffset' | 'utc' | 'local';
  readonly timeColumn?: string | undefined;
  readonly valueColumn?: string | undefined;
  /** Absent: seen from the file. */
  readonly decimal?: 'point' | 'comma' | undefined;
}

/** What the values are, for reading them and for the messages. */
export interface SeriesKind {
  /** What one value and several are called: `price` and `prices`. */
  readonly one: string;
  readonly many: string;
  /** Place of the settings in their file, and the key that names the column of values: `series` and `priceColumn`. */
  readonly section: string;
  readonly valueKey: string;
  /** A value of the file is divided by this. */
  readonly divisor: number;
  /** Ends of what is possible after that, and the same in words. */
  readonly least: number;
  readonly most: number;
  readonly range: string;
}
