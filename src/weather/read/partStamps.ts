import { parseNumber } from './parseNumber.ts';
import { rangeOf } from './rangeOf.ts';
import { emptyFields, nominalStart, numberStamps, type StampSource, type Stamps } from './stampFields.ts';
import { addMinutesOfHour, timesOfDay } from './timesOfDay.ts';

const HOURS_OF_A_YEAR = [8760, 8784];

/**
 * Reads stamps from columns of year (which may be absent), month, day, hour and minute (which may be absent).
 *
 * @param source rows with at least `month` and `day`
 */
export function readPartStamps(source: StampSource): Stamps {
  const { raw, mark } = source;
  const fields = emptyFields(raw.count);
  const numbers = (role: 'year' | 'month' | 'day', into: Float64Array) => {
    raw.stamps.get(role)?.forEach((cell, i) => {
      into[i] = parseNumber(cell, mark);
    });
  };
  numbers('year', fields.year);
  numbers('month', fields.month);
  numbers('day', fields.day);
  const times = raw.stamps.get('hour') ?? raw.stamps.get('time');
  if (times === undefined) fields.minute.fill(0);
  else fields.minute.set(timesOfDay(times, mark));
  const minutes = raw.stamps.get('minute');
  if (minutes !== undefined) addMinutesOfHour(fields.minute, minutes, mark);
  for (let i = 0; i < raw.count; i++) if (!isWhole(fields, i)) fields.month[i] = Number.NaN;
  const columns = [...raw.stamps.values()];
  return numberStamps(fields, source, {
    form: `separate columns for ${[...raw.stamps.keys()].join(', ')}`,
    path: 'the stamp',
    cell: (row) => columns.map((cells) => cells[row]).join(' '),
  });
}

function isWhole(
  { year, month, day }: { year: Float64Array; month: Float64Array; day: Float64Array },
  i: number,
): boolean {
  return Number.isInteger(month[i]) && Number.isInteger(day[i]) && (Number.isNaN(year[i]) || Number.isInteger(year[i]));
}

/**
 * Reads a column that counts the hours of the year, from 0 or from 1, with fractions for finer steps.
 *
 * Counted from 1, a number names the hour that ends with it, as hours from 1 to 24 do.
 *
 * @param source rows with an `hourOfYear`
 */
export function readHoursOfYear({ raw, mark, findings }: StampSource): Stamps {
  const cells = raw.stamps.get('hourOfYear') ?? [];
  const hours = Float64Array.from(cells, (cell) => parseNumber(cell, mark));
  const { least, most } = rangeOf(hours);
  const fromOne = least > 0 && HOURS_OF_A_YEAR.includes(most);
  const start = nominalStart(most > 8760 || (most > 8759 && !fromOne));
  const fields = emptyFields(raw.count);
  const read = numberStamps(
    {
      ...fields,
      month: hours.map((hour) => (hour >= 0 && hour <= 8784 ? 1 : Number.NaN)),
      day: fields.day.fill(1),
      minute: fields.minute.fill(0),
    },
    { raw, findings },
    { form: 'hours of the year', path: 'the hour of the year', cell: (row) => cells[row] ?? '' },
  );
  return {
    minutes: read.minutes.map((minute, i) =>
      Number.isNaN(minute) ? minute : start + Math.round((hours[i] as number) * 60),
    ),
    hasYears: false,
    to24: fromOne,
    form: `hours of the year, counted from ${least === 0 ? '0' : '1'}`,
  };
}
