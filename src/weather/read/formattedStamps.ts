import { DateTime } from 'luxon';
import { type Problem, shown } from '../../core/problem.ts';
import { isLooseForm } from './looseForm.ts';
import { emptyFields, numberStamps, type StampSource, type Stamps } from './stampFields.ts';

/** A year that only an absent year token gives: luxon then takes the present one. */
const HAS_YEAR_TOKEN = /y|kk|D|f|X|x/;

/** Characters of a stamp; a longer cell is none. */
const LONGEST_STAMP = 100;

/** Reads one stamp by a form, in UTC; a form without a year reads as of the year 2000. */
function readStamp(text: string, format: string): DateTime {
  if (text.length > LONGEST_STAMP || isLooseForm(bareTokens(format))) return DateTime.invalid('not read');
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
 * The problem of a form that no stamp has.
 *
 * @param format the form
 * @param cell the first stamp of the file
 */
export function formProblem(format: string, cell: string): Omit<Problem, 'file'> {
  const problem = { severity: 'error', path: 'stampFormat', found: `“${shown(format)}”` } as const;
  if (isLooseForm(bareTokens(format))) return { ...problem, code: 'weather.loose-format' };
  return { ...problem, code: 'weather.stamp-format', allowed: `“${shown(cell, 40)}”` };
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
    findings.add(formProblem(format, cell(0)));
    return { minutes: fields.minute, hasYears: false, to24: false, form: 'not read' };
  }
  return numberStamps(fields, source, { form: format, path: 'the stamp', cell });
}
