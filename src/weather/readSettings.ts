/** A column by its name in the header or by its number, counted from 1. */
export type ColumnChoice = string | number;

export type DelimiterName = 'comma' | 'semicolon' | 'tab' | 'pipe' | 'blanks';
export type DecimalName = 'point' | 'comma';
export type TemperatureUnit = 'C' | 'F' | 'K' | '0.1C';
export type RadiationUnit = 'W/m2' | 'Wh/m2' | 'kWh/m2' | 'kJ/m2' | 'MJ/m2' | 'J/cm2';
export type PressureUnit = 'Pa' | 'hPa' | 'kPa' | 'mmHg' | 'inHg';
export type HumidityUnit = 'percent' | 'fraction';
export type StampEnd = 'begin' | 'end';
export type StampClock = 'standard' | 'local';
export type AbsentHours = 'fill' | 'refuse';

/** Which column holds what. `false` leaves a column of the file unused. */
export interface ColumnSettings {
  readonly temperature?: ColumnChoice | undefined;
  readonly relativeHumidity?: ColumnChoice | false | undefined;
  readonly dewPoint?: ColumnChoice | false | undefined;
  readonly wetBulb?: ColumnChoice | false | undefined;
  readonly globalRadiation?: ColumnChoice | false | undefined;
  readonly pressure?: ColumnChoice | false | undefined;
  readonly stamp?: ColumnChoice | undefined;
  readonly date?: ColumnChoice | undefined;
  readonly time?: ColumnChoice | undefined;
  readonly year?: ColumnChoice | undefined;
  readonly month?: ColumnChoice | undefined;
  readonly day?: ColumnChoice | undefined;
  readonly hour?: ColumnChoice | undefined;
  readonly minute?: ColumnChoice | undefined;
  readonly hourOfYear?: ColumnChoice | undefined;
}

/** Units of the file; the one for temperature holds for dew point and wet bulb too. */
export interface UnitSettings {
  readonly temperature?: TemperatureUnit | undefined;
  readonly relativeHumidity?: HumidityUnit | undefined;
  readonly globalRadiation?: RadiationUnit | undefined;
  readonly pressure?: PressureUnit | undefined;
}

/** What a weather file does not say by itself. Everything may be left out; then the reader recognises it and says how. */
export interface ReadSettings {
  readonly delimiter?: DelimiterName | undefined;
  readonly decimal?: DecimalName | undefined;
  /** Lines before the header, or before the first row where there is no header. */
  readonly skipLines?: number | undefined;
  readonly header?: boolean | undefined;
  readonly columns?: ColumnSettings | undefined;
  readonly units?: UnitSettings | undefined;
  /** Form of the stamps in the tokens of the luxon library, such as `dd-MMM-yyyy HH:mm`. */
  readonly stampFormat?: string | undefined;
  /** Whether a stamp marks the beginning or the end of its step. */
  readonly stamps?: StampEnd | undefined;
  /** Offset of the file's standard time from UTC: `+01:00`, or minutes. */
  readonly offset?: string | number | undefined;
  /** Whether the clock of the stamps is put forward in summer by the rules of the site's zone. */
  readonly clock?: StampClock | undefined;
  /** The one station to read of a file that holds several. */
  readonly station?: { readonly column: ColumnChoice; readonly value: string | number } | undefined;
  /** The one year to read of a file that holds several. */
  readonly year?: number | undefined;
  /** Further marks of a missing value, besides the usual ones. */
  readonly missing?: readonly (string | number)[] | undefined;
  /** What becomes of up to 6 hours on end that the file leaves out: they are refused, or filled like blank cells. */
  readonly absentHours?: AbsentHours | undefined;
}
