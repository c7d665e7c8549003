import { type Problem, shown } from '../core/problem.ts';
import { PRICES } from '../tariffs/readPriceSeries.ts';
import { readSeries } from '../tariffs/readSeries.ts';
import { readStamp } from '../tariffs/seriesStamps.ts';
import type { SeriesKind } from '../tariffs/timeSeries.ts';
import type { InputBytes } from './fileSource.ts';
import { FACTORS } from './loadCarbon.ts';
import { READINGS } from './loadHousehold.ts';
import { weatherFrom } from './loadWeather.ts';
import { meterPeriods } from './readings/meterPeriods.ts';
import { readMeter } from './readings/readMeter.ts';
import type { RecognisedTable, TableKind } from './tableKind.ts';

/** What was recognised in a file, in sentences, and what is wrong with it. */
export interface Looked {
  readonly about: string[];
  readonly problems: Problem[];
}

interface TableFile {
  readonly input: InputBytes;
  readonly text: string;
  readonly table: RecognisedTable;
}

/** What the kinds are called in a sentence. */
const NAMES: Record<TableKind, string> = {
  weather: 'weather',
  priceSeries: 'prices',
  carbonFactors: 'carbon factors',
  meter: 'the meter of a household',
  readings: 'meter readings',
  homes: 'homes of a batch',
};

/** Looks through a table as that what its header shows it to be. */
export function checkTable(file: TableFile): Looked {
  const { about, problems } = look[file.table.kind](file);
  const others = file.table.others.map((kind) => NAMES[kind]).join(' or ');
  if (others === '') return { about, problems };
  const said = `its columns may be ${others} too: check the file that names it, where the column is named`;
  return { about: [...about, said], problems };
}

const look: Record<TableKind, (file: TableFile) => Looked> = {
  weather: ({ input, table }) => {
    const { recognised, problems } = weatherFrom(input, {}, {});
    return { about: [...(recognised?.lines ?? [])], problems: table.byHeader ? problems : problems.map(unclear) };
  },
  priceSeries: (file) => series(file, { ...PRICES, divisor: 1 }),
  carbonFactors: (file) => {
    const inGrams = /\bg(?:rams?)?\b|\bg\s*co/i.test(file.table.valueColumn ?? '');
    return series(file, { ...FACTORS, divisor: inGrams ? 1000 : 1 });
  },
  meter: (file) =>
    series(file, { ...READINGS, divisor: /(?<![km])wh\b/i.test(file.table.valueColumn ?? '') ? 1000 : 1 }),
  readings: ({ input, text }) => {
    const { meter, problems } = readMeter(text, input.name, undefined);
    if (meter === undefined) return { about: [], problems };
    const { made, problems: faults } = meterPeriods(meter, input.name);
    const about = [`${meter.rows.length} rows of ${shown(meter.label)}, for winterledger fit`];
    if (made !== undefined) about.push(`${made.periods.length} periods from reading to reading`);
    return { about, problems: [...problems, ...faults] };
  },
  homes: () => ({
    about: ['a home a row; what a row says is held against a scenario when the plan that names the table is checked'],
    problems: [],
  }),
};

/** Looks through values over time; what a stamp without an offset means is for the file to say that names the series. */
function series({ input, text, table }: TableFile, kind: SeriesKind): Looked {
  const { timeColumn, valueColumn } = table;
  const withOffset = hasOffsets(text);
  const settings = { stamps: withOffset ? 'withOffset' : 'utc', timeColumn, valueColumn } as const;
  const read = readSeries({ text, file: input.name, settings, kind, zone: 'UTC' });
  if (read.series === undefined) return { about: [], problems: read.problems };
  const { values, stepMinutes } = read.series;
  const about = [`${values.length} ${kind.many}, one every ${stepMinutes} minutes`];
  if (!withOffset)
    about.push('its stamps have no offset: the file that names it has to say whether they are utc or local');
  return { about, problems: read.problems };
}

/** Whether the first stamps that can be read have an offset; without any stamp, a fault says what they have to look like. */
function hasOffsets(text: string): boolean {
  const cells = text.slice(0, 20_000).split(/[\r\n\t;|,]+/);
  const stamp = cells.map((cell) => readStamp(cell.trim())).find((each) => each !== undefined);
  return stamp === undefined || stamp.offsetMinutes !== undefined;
}

/** A table whose header says nothing may be of another kind than weather. */
function unclear(problem: Problem): Problem {
  if (problem.code !== 'weather.no-temperature') return problem;
  const hint =
    "for weather, name the column by 'columns: {temperature: …}'; for other tables write the unit into its name: EUR/kWh a price, g/kWh carbon, kWh a meter";
  return { ...problem, hint };
}
