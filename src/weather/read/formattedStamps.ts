import { DateTime } from 'luxon';
import { shown } from '../../core/problem.ts';
import { emptyFields, numberStamps, type StampSource, type Stamps } from './stampFields.ts';

/** A year that only an absent year token gives: luxon then takes the present one. */
const HAS_YEAR_TOKEN = /y|kk|D|f|X|x/;

/** Reads one stamp by a form, in UTC; a form without a year reads as of the year 2000. */
function readStamp(text: string, format: string): DateTime {
  const options = { zone: 'utc', locale: 'en', setZone: true };
  if (hasYear(format)) return DateTime.fromFormat(text, format, options);
  return DateTime.fromFormat(`2000 ${text}`, `yyyy ${format}`, options);
}

function hasYear(format: string): boolean {
  return HAS_YEAR_TOKEN.test(bareTokens(format));
}

/** A form without its quoted text. */
function bareTokens(format: string): string {
  return format.replace(/'[^']*'/g, '');
}

/** Whether a cell has a form stated in the tokens of the luxon library. */
export function hasForm(cell: string, format: string): boolean {
  return readStamp(cell.trim(), format).isValid;
}

/**
 * Reads stamps by a form that the settings state, in the tokens of the luxon library.
 *
 * Where date and time have columns of their own, the form is that of the two joined by a blank.
 *
 * @param source rows with a `stamp`, or with a `date` and a `time`
 * @param format such as `dd-MMM-yyyy HH:mm`
 */
export function readFormattedStamps(source: StampSource, format: string): Stamps {
  const { raw, findings } = source;
  const dates = raw.stamps.get('stamp') ?? raw.stamps.get('date') ?? [];
  const times = raw.stamps.get('time');
  const cell = (row: number) => (times === undefined ? `${dates[row]}` : `${dates[row]} ${times[row]}`).trim();
  const fields = emptyFields(raw.count);
  const withYear = hasYear(format);
  const withOffset = /Z|z/.test(bareTokens(format));
  let read = 0;
  for (let i = 0; i < raw.count; i++) {
    const stamp = readStamp(cell(i), format);
    if (!stamp.isValid) continue;
    read++;
    fields.year[i] = withYear ? stamp.year : Number.NaN;
    fields.month[i] = stamp.month;
    fields.day[i] = stamp.day;
    fields.minute[i] = stamp.hour * 60 + stamp.minute + stamp.second / 60;
    if (withOffset) fields.offset[i] = stamp.offset;
  }
  if (read === 0) {
    const [found, allowed] = [`“${shown(format)}”`, `“${shown(cell(0), 40)}”`];
    findings.add({ code: 'weather.stamp-format', severity: 'error', path: 'stampFormat', found, allowed });
    return { minutes: fields.minute, hasYears: false, to24: false, form: 'not read' };
  }
  return numberStamps(fields, source, { form: format, path: 'the stamp', cell });
}
