import { stampText } from '../../core/stampText.ts';
import type { StampEnd } from '../readSettings.ts';
import { offsetOfHeader } from './columnWords.ts';
import { layOnYear, type YearOfRows } from './layOnYear.ts';
import { DECIMAL_COMMA, DECIMAL_POINT } from './parseNumber.ts';
import type { ReadContext, Reading } from './readContext.ts';
import { readStamps } from './readStamps.ts';
import type { WeatherTable } from './readTable.ts';
import type { Stamps } from './stampFields.ts';
import { toStandardTime } from './standardTime.ts';
import { findRowOrder, isUsableStep, type RowOrder } from './timeStep.ts';

/** The rows of a file on one year of standard time. */
export interface ReadYear extends YearOfRows {
  readonly offsetMinutes: number;
  /** Minutes between rows. */
  readonly step: number;
}

/**
 * Reads the stamps of a table and lays its rows on one year.
 *
 * @returns nothing where the year cannot be told, which is a problem
 */
export function readYear(table: WeatherTable, context: ReadContext, reading: Reading): ReadYear | undefined {
  const { raw, head, plan, cells } = table;
  const { settings } = context;
  const { known, findings } = reading;
  const mark = cells.decimal === 'comma' ? DECIMAL_COMMA : DECIMAL_POINT;
  const stamps = readStamps({ raw, stampFormat: settings.stampFormat, mark, findings });
  known.stampForm = stamps.form;
  if (findings.failed('weather.row-count')) return undefined;
  const order = findRowOrder(stamps.minutes);
  if (order === undefined) {
    if (!findings.failed())
      findings.add({ code: 'weather.part-year', severity: 'error', found: '1 hour', allowed: 'the rest' });
    return undefined;
  }
  known.stepMinutes = order.step;
  if (!isUsableStep(order.step, findings)) return undefined;
  const end = decideEnd(stamps, settings.stamps);
  known.stamps = end.stamps;
  known.stampsDecidedBy = end.how;
  if (end.how === 'assumed') warnOfEnd(stamps, order, reading);
  const stampColumn = plan.stamps.stamp ?? plan.stamps.time ?? plan.stamps.date;
  const time = toStandardTime({
    stamps,
    order,
    atEnd: end.stamps === 'end',
    settings,
    zone: context.zone,
    defaultOffsetMinutes: context.defaultOffsetMinutes,
    headerOffset: stampColumn === undefined ? undefined : offsetOfHeader(head.texts[stampColumn.index] ?? ''),
    lines: raw.lines,
    findings,
  });
  if (time === undefined) return undefined;
  known.offsetMinutes = time.offsetMinutes;
  known.offsetFrom = time.offsetFrom;
  known.clock = time.clock;
  known.clockDecidedBy = time.clockFrom;
  const { minutes } = time;
  const year = layOnYear({ raw, minutes, step: order.step, hasYears: stamps.hasYears, year: settings.year, findings });
  if (year === undefined) return undefined;
  known.sorted = year.sorted;
  if (settings.year !== undefined && stamps.hasYears) known.year = settings.year;
  return { ...year, offsetMinutes: time.offsetMinutes, step: order.step };
}

function decideEnd(
  stamps: Stamps,
  stated: StampEnd | undefined,
): { stamps: StampEnd; how: 'settings' | 'recognised' | 'assumed' } {
  if (stated !== undefined) return { stamps: stated, how: 'settings' };
  return stamps.to24 ? { stamps: 'end', how: 'recognised' } : { stamps: 'begin', how: 'assumed' };
}

/** Stamps from one step after the year's beginning to the beginning of the next: they look like ends of steps. */
function warnOfEnd({ minutes, hasYears }: Stamps, { step, backwards }: RowOrder, { findings }: Reading): void {
  const [first, last] = [minutes[0] as number, minutes[minutes.length - 1] as number];
  const [early, late] = backwards ? [last, first] : [first, last];
  const begin = stampText(early - step, false);
  if (begin !== '01-01 00:00' || stampText(late, false) !== begin) return;
  const found = `${stampText(early, hasYears)} to ${stampText(late, hasYears)}`;
  findings.add({ code: 'weather.looks-end-stamped', severity: 'warning', found });
}
