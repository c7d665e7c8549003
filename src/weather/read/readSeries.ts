import type { WeatherSeries } from '../series.ts';
import { checkAbsentHours } from './absentHours.ts';
import { createCellPlaces } from './cellPlace.ts';
import { checkValues } from './checkValues.ts';
import { columnLabel, type UsedColumn } from './columnPlan.ts';
import { checkGaps, fillGaps } from './fillGaps.ts';
import { hourLines, hourlyMeans } from './hourlyMeans.ts';
import type { YearOfRows } from './layOnYear.ts';
import { type Quantity, quantityTexts } from './quantities.ts';
import type { ReadContext, Reading } from './readContext.ts';
import type { WeatherTable } from './readTable.ts';
import type { ReadYear } from './readYear.ts';
import { reportSpikes } from './spikes.ts';
import { type DecidedUnit, decideUnit, inOwnUnit } from './units.ts';

/** Everything that the columns of a series are made from. */
interface SeriesSource {
  readonly table: WeatherTable;
  readonly year: ReadYear;
  readonly context: ReadContext;
  readonly reading: Reading;
}

/** Problems that take rows out of the year: the hours that these leave are no news. */
const ROWS_LOST = [
  'weather.stamp',
  'weather.off-step',
  'weather.no-such-clock-time',
  'weather.some-offsets',
  'weather.wide-row',
] as const;

/**
 * Turns the rows of a year into hourly columns: units, checks, means of the hours, gaps.
 *
 * @returns nothing where a column cannot be completed, which is a problem
 */
export function readSeries(source: SeriesSource): WeatherSeries | undefined {
  const { table, year, context, reading } = source;
  const { findings } = reading;
  const lines = hourLines(table.raw.lines, year);
  const rowsLost = ROWS_LOST.some((code) => findings.failed(code));
  const complete = !rowsLost && checkAbsentHours(lines, context.settings.absentHours ?? 'refuse', findings);
  const rows = rowsInUse(year, table.raw.count);
  const read = createColumnReader(source, { rows, lines, complete });
  const columns = new Map<Quantity, Float64Array>();
  for (const [quantity, used] of table.plan.quantities) {
    const values = read(quantity, used);
    if (values !== undefined) columns.set(quantity, values);
  }
  const temperature = columns.get('temperature');
  if (temperature === undefined || findings.failed()) return undefined;
  const index = table.plan.quantities.get('temperature')?.index ?? 0;
  reportSpikes(temperature, lines, { label: labelOf(table, 'temperature', index), findings });
  return seriesOf(year, temperature, columns);
}

/** Rows that have their place in the year, in the order of the file. */
function rowsInUse({ rowOfSlot }: YearOfRows, count: number): Int32Array {
  const used = new Uint8Array(count);
  let all = 0;
  for (const row of rowOfSlot) {
    if (row < 0) continue;
    used[row] = 1;
    all++;
  }
  const rows = new Int32Array(all);
  let next = 0;
  for (let row = 0; row < count; row++) if (used[row] === 1) rows[next++] = row;
  return rows;
}

function labelOf({ head }: WeatherTable, quantity: Quantity, index: number): string {
  return `${quantityTexts[quantity].name} in ${columnLabel(index, head.names)}`;
}

interface HoursOfFile {
  readonly rows: Int32Array;
  readonly lines: Int32Array;
  /** Whether hours without a row may be filled. */
  readonly complete: boolean;
}

/** A function that makes the hourly values of one column, or reports why they cannot be made. */
function createColumnReader(source: SeriesSource, { rows, lines, complete }: HoursOfFile) {
  const { table, year, context, reading } = source;
  const { known, findings } = reading;
  const place = createCellPlaces(table.cells);
  let temperatureUnit: DecidedUnit | undefined;
  return (quantity: Quantity, { index }: UsedColumn): Float64Array | undefined => {
    const label = labelOf(table, quantity, index);
    const written = table.raw.numbers.get(quantity) ?? new Float64Array(0);
    if (quantity !== 'temperature' && isEmpty(written, rows)) {
      known.empty = [...known.empty, quantity];
      return undefined;
    }
    const decided = decideUnit({
      ...{ quantity, values: () => finiteValues(written, rows), header: table.head.texts[index] ?? '', findings },
      units: context.settings.units ?? {},
      altitude: context.altitude,
      temperatureUnit,
      line: table.head.headerLine || undefined,
    });
    if (quantity === 'temperature') temperatureUnit = decided;
    known.columns = known.columns.map((column) =>
      column.number === index + 1 ? { ...column, unit: decided.unit, unitDecidedBy: decided.how } : column,
    );
    const values = inOwnUnit(written, decided.unit, year.step);
    const { good, held } = checkValues({
      quantity,
      index,
      label,
      values,
      rows,
      lines: table.raw.lines,
      place,
      findings,
    });
    if (!good) return undefined;
    const hourly = { values: hourlyMeans(values, year), lines, label, findings };
    if (!complete) {
      checkGaps(hourly);
      return undefined;
    }
    const filled = fillGaps(hourly);
    if (filled === undefined) return undefined;
    known.filled = [...known.filled, { quantity, ...filled, held }];
    return hourly.values;
  };
}

function isEmpty(values: Float64Array, rows: Int32Array): boolean {
  for (const row of rows) if (!Number.isNaN(values[row])) return false;
  return true;
}

function finiteValues(values: Float64Array, rows: Int32Array): Float64Array {
  const finite = new Float64Array(rows.length);
  let count = 0;
  for (const row of rows) {
    const value = values[row] as number;
    if (Number.isFinite(value)) finite[count++] = value;
  }
  return finite.subarray(0, count);
}

function seriesOf(
  { hours, offsetMinutes }: ReadYear,
  temperature: Float64Array,
  columns: ReadonlyMap<Quantity, Float64Array>,
): WeatherSeries {
  const humidity = (['relativeHumidity', 'dewPoint', 'wetBulb'] as const).flatMap((quantity) => {
    const values = columns.get(quantity);
    return values === undefined
      ? []
      : [{ kind: quantity === 'relativeHumidity' ? ('relative' as const) : quantity, values }];
  })[0];
  const globalRadiation = columns.get('globalRadiation');
  const pressure = columns.get('pressure');
  return {
    ...{ hours, offsetMinutes, temperature },
    ...(humidity === undefined ? {} : { humidity }),
    ...(globalRadiation === undefined ? {} : { globalRadiation }),
    ...(pressure === undefined ? {} : { pressure }),
  };
}
