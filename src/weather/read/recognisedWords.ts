import type { Quantity } from './quantities.ts';
import { quantityTexts } from './quantities.ts';
import type { Recognised, RecognisedColumn } from './recognised.ts';
import { stepText } from './timeStep.ts';

/** How the reading of a weather file is told, in one language. */
export interface RecognisedWords {
  readonly cells: (delimiter: string, decimal: string) => string;
  readonly header: (line: number) => string;
  readonly noHeader: string;
  readonly skipped: (lines: number) => string;
  readonly station: (name: string) => string;
  readonly rows: (count: number) => string;
  readonly footer: (lines: number) => string;
  /** A column: what it is used for, its number, its name in quotes or nothing, its unit or nothing, how that was decided. */
  readonly column: (column: { use: string; number: number; name: string; unit: string; how: string }) => string;
  readonly use: (use: string) => string;
  readonly units: Readonly<Record<string, string>>;
  readonly decided: Readonly<Record<RecognisedColumn['decidedBy'], string>>;
  readonly unitDecided: Readonly<Record<NonNullable<RecognisedColumn['unitDecidedBy']>, string>>;
  readonly form: (form: string) => string;
  readonly marks: (end: 'begin' | 'end', how: string) => string;
  readonly how: Readonly<Record<NonNullable<Recognised['stampsDecidedBy']>, string>>;
  readonly step: (minutes: number) => string;
  readonly localClock: (how: string) => string;
  readonly offset: (offset: string, from: string) => string;
  readonly offsetFrom: Readonly<Record<NonNullable<Recognised['offsetFrom']>, string>>;
  readonly year: (year: number) => string;
  readonly sorted: string;
  readonly quantity: (quantity: Quantity) => string;
  readonly interpolated: (name: string, hours: number, longest: number) => string;
  readonly held: (name: string, values: number, at: string) => string;
  readonly empty: (name: string) => string;
}

/** How the reading of a weather file is told in English. */
export const englishRecognised: RecognisedWords = {
  cells: (delimiter, decimal) => `cells are separated by ${delimiter}, the decimal mark is the ${decimal}`,
  header: (line) => `the header is line ${line}`,
  noHeader: 'there is no header',
  skipped: (lines) => `; ${counted(lines, 'line')} before it skipped`,
  station: (name) => `station ${name}`,
  rows: (count) => `${counted(count, 'row')} read`,
  footer: (lines) => `; ${counted(lines, 'line')} of remarks after them left out`,
  column: ({ use, number, name, unit, how }) =>
    `${use}: column ${number}${name === '' ? '' : ` “${name}”`}${unit === '' ? '' : `, ${unit}`} (${how})`,
  use: (use) => use,
  units: {
    C: '°C',
    F: '°F',
    K: 'K',
    '0.1C': 'tenths of a °C',
    percent: '%',
    fraction: '0 to 1',
    'W/m2': 'W/m²',
    'Wh/m2': 'Wh/m²',
    'kWh/m2': 'kWh/m²',
    'kJ/m2': 'kJ/m²',
    'MJ/m2': 'MJ/m²',
    'J/cm2': 'J/cm²',
  },
  decided: {
    settings: 'by the settings',
    name: 'by its name',
    content: 'by what it holds',
    position: 'the only column of numbers',
  },
  unitDecided: {
    settings: 'unit by the settings',
    header: 'unit from the header',
    values: 'unit judged by the values',
    assumed: 'unit assumed',
  },
  form: (form) => `stamps: ${form}`,
  marks: (end, how) => `each stamp marks the ${end === 'end' ? 'end' : 'beginning'} of its step (${how})`,
  how: { settings: 'by the settings', recognised: 'recognised', assumed: 'assumed' },
  step: (minutes) => `one row every ${stepText(minutes)}`,
  localClock: (how) => `the clock changed in summer; converted to standard time (${how})`,
  offset: (offset, from) => `offset ${offset} (${from})`,
  offsetFrom: {
    settings: 'from the settings',
    stamps: 'from the stamps',
    header: 'from the header',
    zone: "standard time of the site's zone",
    site: "standard time of the site's zone, assumed",
  },
  year: (year) => `the year ${year}`,
  sorted: 'the rows were sorted by time',
  quantity: (quantity) => quantityTexts[quantity].name,
  interpolated: (name, hours, longest) =>
    `${name}: ${counted(hours, 'hour')} interpolated, the longest gap ${counted(longest, 'hour')}`,
  held: (name, values, at) => `${name}: ${counted(values, 'value')} held at ${at}`,
  empty: (name) => `${name}: the column is empty and was left out`,
};

function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? '' : 's'}`;
}
