import { shown } from '../../core/problem.ts';
import { type DateOrder, type StampParts, scanStamp } from './scanStamp.ts';
import { emptyFields, numberStamps, type StampFields, type StampSource, type Stamps } from './stampFields.ts';
import { addMinutesOfHour, timesOfDay } from './timesOfDay.ts';

/**
 * Reads stamps that are written in one column, or as a date and a time of day in two.
 *
 * @param source rows with a `stamp`, or with a `date` and a `time` or `hour`
 * @returns the stamps; none are read where day and month cannot be told apart, which is a problem
 */
export function readWrittenStamps(source: StampSource): Stamps {
  const { raw, findings } = source;
  const cells = raw.stamps.get('stamp') ?? raw.stamps.get('date') ?? [];
  const fields = emptyFields(raw.count);
  const order = scanColumn(cells, fields);
  const withTime = addTimes(source, fields);
  const dayFirst = order === 'open' ? isDayFirst(fields) : order === 'day-month';
  if (dayFirst === undefined) {
    const found = `“${shown(cells[0] ?? '', 40)}”`;
    findings.add({ code: 'weather.day-month-order', severity: 'error', line: raw.lines[0] as number, found });
    return { minutes: fields.minute.fill(Number.NaN), hasYears: false, to24: false, form: 'not decided' };
  }
  const date = order === 'year-month-day' ? 'year, month, day' : dayFirst ? 'day, month' : 'month, day';
  const ordered = dayFirst ? { ...fields, month: fields.day, day: fields.month } : fields;
  const times = raw.stamps.get('time') ?? raw.stamps.get('hour');
  return numberStamps(ordered, source, {
    form: withTime ? `${date}, time of day` : date,
    path: 'the stamp',
    cell: (row) => (times === undefined ? `${cells[row]}` : `${cells[row]} ${times[row]}`),
  });
}

/** Scans all cells; a cell in another order than the first one is left out, and so becomes a problem. */
function scanColumn(cells: readonly string[], fields: StampFields): DateOrder | undefined {
  const parts: StampParts = { order: 'none', year: 0, first: 0, second: 0, minute: 0, offset: 0 };
  let order: DateOrder | undefined;
  for (let i = 0; i < cells.length; i++) {
    if (!scanStamp((cells[i] as string).trim(), parts) || parts.order === 'none') continue;
    order ??= parts.order;
    if (parts.order !== order) continue;
    fields.year[i] = parts.year;
    fields.month[i] = parts.first;
    fields.day[i] = parts.second;
    fields.minute[i] = parts.minute;
    fields.offset[i] = parts.offset;
  }
  return order;
}

/** Adds the times of a column of their own; a stamp without time is midnight. Returns whether there are any times. */
function addTimes({ raw, mark }: StampSource, fields: StampFields): boolean {
  const times = raw.stamps.get('time') ?? raw.stamps.get('hour');
  if (times !== undefined) {
    fields.minute.set(timesOfDay(times, mark));
    const minutes = raw.stamps.get('minute');
    if (minutes !== undefined) addMinutesOfHour(fields.minute, minutes, mark);
    return true;
  }
  const any = fields.minute.some((minute) => !Number.isNaN(minute));
  for (let i = 0; i < raw.count; i++) if (Number.isNaN(fields.minute[i])) fields.minute[i] = 0;
  return any;
}

/** Whether the first of two numbers is the day: the whole column decides, by days beyond the twelfth. */
function isDayFirst({ month: first, day: second }: StampFields): boolean | undefined {
  let firstBeyond = 0;
  let secondBeyond = 0;
  for (let i = 0; i < first.length; i++) {
    if ((first[i] as number) > 12) firstBeyond++;
    if ((second[i] as number) > 12) secondBeyond++;
  }
  if (firstBeyond === secondBeyond) return undefined;
  return firstBeyond > secondBeyond;
}
