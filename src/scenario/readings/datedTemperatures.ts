import { civilDay } from '../../core/civilDate.ts';
import { hasErrors, type Problem } from '../../core/problem.ts';
import { stampText } from '../../core/stampText.ts';
import { createCellPlaces } from '../../weather/read/cellPlace.ts';
import { checkValues } from '../../weather/read/checkValues.ts';
import { columnLabel } from '../../weather/read/columnPlan.ts';
import { offsetOfHeader } from '../../weather/read/columnWords.ts';
import { createFindings, type Findings } from '../../weather/read/findings.ts';
import { measureText, plainLines } from '../../weather/read/measureText.ts';
import { DECIMAL_COMMA, DECIMAL_POINT } from '../../weather/read/parseNumber.ts';
import { quantityTexts } from '../../weather/read/quantities.ts';
import { rangeOf } from '../../weather/read/rangeOf.ts';
import type { ReadContext, Reading } from '../../weather/read/readContext.ts';
import { readStamps } from '../../weather/read/readStamps.ts';
import { readTable, type WeatherTable } from '../../weather/read/readTable.ts';
import type { Recognising } from '../../weather/read/recognised.ts';
import { recognisedLines } from '../../weather/read/recognisedLines.ts';
import { type StandardTime, toStandardTime } from '../../weather/read/standardTime.ts';
import { findRowOrder, isUsableStep } from '../../weather/read/timeStep.ts';
import { decideUnit, inOwnUnit } from '../../weather/read/units.ts';

/** Outdoor temperatures by date: as many years, or as small a part of one, as the file holds. */
export interface DatedTemperatures {
  /** Hours from 1970-01-01 00:00 of the file's standard time to its first hour. */
  readonly firstHour: number;
  /** Means of the hours, °C; NaN where the file has none. */
  readonly temperature: Float64Array;
  /** Standard time less UTC, minutes. */
  readonly offsetMinutes: number;
}

/** A weather file read by date, and how it was understood. */
export interface DatedReading {
  readonly dated?: DatedTemperatures;
  readonly lines: readonly string[];
  readonly problems: Problem[];
}

const MINUTES_PER_HOUR = 60;

/**
 * Reads the outdoor temperatures of a weather file at the dates of its stamps. Unlike a year to be simulated it may hold any
 * stretch of time; stamps without a year are refused, and so are months of several years in one year's worth of hours.
 *
 * @param text the decoded file; anything at all
 * @param context settings (the year among them does not count), zone, offset and altitude
 * @returns the hours only where no error was found
 *
 * Reference: MODEL sections 1 and 13.
 */
export function datedTemperatures(text: string, context: ReadContext): DatedReading {
  const findings = createFindings(context.file);
  const known: Recognising = { columns: [], filled: [], empty: [] };
  const dated = readInto(text, context, { known, findings });
  const problems = findings.list();
  const lines = recognisedLines(known);
  return dated === undefined || hasErrors(problems) ? { lines, problems } : { dated, lines, problems };
}

function readInto(text: string, context: ReadContext, reading: Reading): DatedTemperatures | undefined {
  const { findings } = reading;
  const plain = plainLines(text);
  if (plain.trim() === '') {
    findings.add({ code: 'file.empty', severity: 'error' });
    return undefined;
  }
  const lines = measureText(plain, findings);
  if (findings.failed()) return undefined;
  const table = readTable(plain, lines, { ...reading, settings: context.settings });
  const time = table === undefined ? undefined : timeOfRows(table, context, reading);
  if (table === undefined || time === undefined || findings.failed()) return undefined;
  const values = temperatureOfRows(table, time.step, { context, reading });
  return values === undefined ? undefined : meansOfHours({ table, time, values, findings });
}

interface TimeOfRows extends StandardTime {
  readonly step: number;
}

/** Standard time of the rows; as for a year that is simulated, but the stamps must carry their years. */
function timeOfRows(table: WeatherTable, context: ReadContext, { known, findings }: Reading): TimeOfRows | undefined {
  const { raw, head, plan, cells } = table;
  const { settings } = context;
  const mark = cells.decimal === 'comma' ? DECIMAL_COMMA : DECIMAL_POINT;
  const stamps = readStamps({ raw, stampFormat: settings.stampFormat, mark, findings });
  known.stampForm = stamps.form;
  if (findings.failed()) return undefined;
  if (!stamps.hasYears) {
    findings.add({ code: 'readings.weather-undated', severity: 'error' });
    return undefined;
  }
  const order = findRowOrder(stamps.minutes);
  if (order === undefined) {
    findings.add({ code: 'weather.part-year', severity: 'error', found: '1 hour', allowed: 'the rest' });
    return undefined;
  }
  known.stepMinutes = order.step;
  if (!isUsableStep(order.step, findings)) return undefined;
  const stated = settings.stamps;
  known.stamps = stated ?? (stamps.to24 ? 'end' : 'begin');
  known.stampsDecidedBy = stated !== undefined ? 'settings' : stamps.to24 ? 'recognised' : 'assumed';
  const stampColumn = plan.stamps.stamp ?? plan.stamps.time ?? plan.stamps.date;
  const time = toStandardTime({
    ...{ stamps, order, settings, lines: raw.lines, findings },
    atEnd: known.stamps === 'end',
    zone: context.zone,
    defaultOffsetMinutes: context.defaultOffsetMinutes,
    headerOffset: stampColumn === undefined ? undefined : offsetOfHeader(head.texts[stampColumn.index] ?? ''),
  });
  if (time === undefined || isTypicalYear(time.minutes, order.step, findings)) return undefined;
  known.offsetMinutes = time.offsetMinutes;
  known.offsetFrom = time.offsetFrom;
  known.clock = time.clock;
  known.clockDecidedBy = time.clockFrom;
  return { ...time, step: order.step };
}

const LEAST_HOURS_OF_YEAR = 8000;
const MOST_HOURS_OF_YEAR = 8785;

/** A year's worth of hours whose dates lie far more than a year apart. */
function isTypicalYear(minutes: Float64Array, step: number, findings: Findings): boolean {
  const hours = (minutes.length * step) / MINUTES_PER_HOUR;
  const { least, most } = rangeOf(minutes);
  const span = (most - least) / MINUTES_PER_HOUR;
  if (hours < LEAST_HOURS_OF_YEAR || hours > MOST_HOURS_OF_YEAR || span < 1.5 * MOST_HOURS_OF_YEAR) return false;
  const years = new Set<number>();
  for (const minute of minutes) years.add(civilDay(Math.floor(minute / 1440)).year);
  findings.add({ code: 'readings.weather-typical', severity: 'error', found: String(years.size) });
  return true;
}

function temperatureOfRows(
  { head, plan, raw, cells }: WeatherTable,
  step: number,
  { context, reading: { known, findings } }: { context: ReadContext; reading: Reading },
): Float64Array | undefined {
  const index = plan.quantities.get('temperature')?.index ?? 0;
  const written = raw.numbers.get('temperature') ?? new Float64Array(0);
  const decided = decideUnit({
    ...{ quantity: 'temperature', values: () => written.filter(Number.isFinite), header: head.texts[index] ?? '' },
    ...{ units: context.settings.units ?? {}, altitude: context.altitude, temperatureUnit: undefined, findings },
    line: head.headerLine || undefined,
  });
  known.columns = known.columns.map((column) =>
    column.number === index + 1 ? { ...column, unit: decided.unit, unitDecidedBy: decided.how } : column,
  );
  const values = inOwnUnit(written, decided.unit, step);
  const { good } = checkValues({
    ...{ quantity: 'temperature', index, values, lines: raw.lines, place: createCellPlaces(cells), findings },
    label: `${quantityTexts.temperature.name} in ${columnLabel(index, head.names)}`,
    rows: Int32Array.from({ length: raw.count }, (_, row) => row),
  });
  return good ? values : undefined;
}

interface DatedRows {
  readonly table: WeatherTable;
  readonly time: TimeOfRows;
  readonly values: Float64Array;
  readonly findings: Findings;
}

/** Means of the hours over the rows in them. Rows that repeat an hour with another value are problems. */
function meansOfHours({ table, time, values, findings }: DatedRows): DatedTemperatures {
  const { minutes, step, offsetMinutes } = time;
  const { least, most } = rangeOf(minutes);
  const firstHour = Math.floor(least / MINUTES_PER_HOUR);
  const hours = Math.floor(most / MINUTES_PER_HOUR) - firstHour + 1;
  const [sums, counts] = [new Float64Array(hours), new Int32Array(hours)];
  const [rows, lines] = [new Int32Array(hours), new Int32Array(hours)];
  minutes.forEach((minute, row) => {
    const hour = Math.floor(minute / MINUTES_PER_HOUR) - firstHour;
    rows[hour]++;
    if (rows[hour] > MINUTES_PER_HOUR / step) {
      if (Object.is(values[row], sums[hour]) && step === MINUTES_PER_HOUR) return;
      findings.add({
        ...{ code: 'readings.weather-twice', severity: 'error', line: table.raw.lines[row] },
        ...{ found: stampText(minute, true), allowed: String(lines[hour]) },
      });
      return;
    }
    lines[hour] ||= table.raw.lines[row];
    if (!Number.isFinite(values[row])) return;
    sums[hour] += values[row];
    counts[hour]++;
  });
  const temperature = sums.map((sum, hour) => (counts[hour] === 0 ? Number.NaN : sum / counts[hour]));
  return { firstHour, temperature, offsetMinutes };
}
