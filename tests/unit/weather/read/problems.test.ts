import { describe, expect, it } from 'vitest';
import { weatherProblems } from '../../../../src/core/problems/weatherProblems.ts';
import { problemText } from '../../../../src/core/problemText.ts';
import type { ReadSettings } from '../../../../src/weather/readSettings.ts';
import { type Hour, header, iso, pad, parts, plainFile, plainRows, read, syntheticYear } from './syntheticYear.ts';

const year = syntheticYear();
const plain = plainFile(year);
const lines = plain.trimEnd().split('\n');

/** The plain file with lines (counted from 1) replaced, or taken out where the replacement is nothing. */
function edited(changes: Record<number, string | undefined>): string {
  return lines.flatMap((line, i) => (i + 1 in changes ? (changes[i + 1] ?? []) : line)).join('\n');
}

function cells(line: number, change: (cells: string[]) => void): string {
  const row = lines[line - 1]!.split(',');
  change(row);
  return row.join(',');
}

/** The plain file with the temperature of some lines replaced. */
function withTemperature(changes: Record<number, string>): string {
  return edited(
    Object.fromEntries(
      Object.entries(changes).map(([line, value]) => [line, cells(Number(line), (row) => row.splice(1, 1, value))]),
    ),
  );
}

interface Case {
  readonly code: keyof typeof weatherProblems;
  readonly text: string;
  readonly settings?: ReadSettings;
  readonly zone?: string | null;
  /** The place of the problem in the file. */
  readonly line?: number;
  readonly column?: number;
  /** Words of its text. */
  readonly says: readonly (string | RegExp)[];
}

const stations = ['A', 'B'].flatMap((name) => plainRows(year).map((row) => `${name},${row}`));
const two = [header, ...plainRows(syntheticYear(2018)), ...plainRows(year)].join('\n');
const untimed = year.map((h) => `${h.temperature},${h.humidity}`);

const tableCases: Case[] = [
  { code: 'weather.long-line', text: `${plain}${'1,'.repeat(60_000)}`, line: 8762, says: ['120000 characters'] },
  {
    code: 'weather.too-many-columns',
    text: `${plain}${'1,'.repeat(1500)}`,
    line: 8762,
    says: ['1501 cells', 'at most 1000'],
  },
  { code: 'weather.too-many-lines', text: '1\n'.repeat(5_000_001), says: ['5000001 lines', 'at most 5000000'] },
  { code: 'weather.no-rows', text: 'There is nothing here.\nNothing at all.\n', says: ['no rows of numbers'] },
  {
    code: 'weather.no-such-column',
    text: plain,
    settings: { columns: { temperature: 'T_out' } },
    says: ['columns.temperature is “T_out”', 'column 2 “temperature”'],
  },
  {
    code: 'weather.no-such-column',
    text: plain,
    settings: { columns: { pressure: 9 } },
    says: ['columns.pressure is column 9'],
  },
  {
    code: 'weather.repeated-name',
    text: plain.replace(header, 'time,value,value,value,value'),
    settings: { columns: { temperature: 'value' } },
    says: ['“value”', 'columns 2, 3, 4, 5'],
  },
  {
    code: 'weather.no-temperature',
    text: plain.replace('temperature', 'wetness'),
    line: 1,
    says: ['column 2 “wetness”', 'columns: {temperature: …}'],
  },
  {
    code: 'weather.two-columns',
    text: plain.replace(header, 'time,temp min,temp max,c,d'),
    line: 1,
    says: ['could be the temperature', 'column 2 “temp min”, column 3 “temp max”', 'columns: {temperature: 2}'],
  },
  {
    code: 'weather.no-names',
    text: plain.replace(`${header}\n`, ''),
    says: ['column 2 (-5.5)', 'temperature: 2'],
  },
  {
    code: 'weather.column-holds-stamps',
    text: ['date,temp', ...year.map((h) => `${h.temperature},${iso(h.minute)}`)].join('\n'),
    line: 2,
    says: ['temperature should be here', '“2019-01-01T00:00” in column 2', 'exchanged'],
  },
  {
    code: 'weather.column-not-numbers',
    text: ['time,temperature,RH', ...year.map((h) => `${iso(h.minute)},cold,${h.humidity}`)].join('\n'),
    line: 2,
    says: ['temperature should be here', '“cold” in column 2'],
  },
  {
    code: 'weather.wide-row',
    text: edited({ 40: `${lines[39]},5` }),
    line: 40,
    says: ['6 cells', 'have 5'],
  },
  {
    code: 'weather.short-row',
    text: edited({ 40: lines[39]!.split(',').slice(0, 3).join(',') }),
    line: 40,
    says: ['3 cells', 'need 5'],
  },
  {
    code: 'weather.text-cell',
    text: withTemperature({ 40: 'warm' }),
    line: 40,
    column: 18,
    says: ['“warm”', 'temperature in column 2'],
  },
  {
    code: 'weather.several-stations',
    text: [`station,${header}`, ...stations].join('\n'),
    says: ['“A” (8760 rows), “B” (8760 rows)', 'station: {column: 1'],
  },
  {
    code: 'weather.no-such-station',
    text: [`station,${header}`, ...stations].join('\n'),
    settings: { station: { column: 'station', value: 'C' } },
    says: ['“C”', '“A” (8760 rows)'],
  },
];

const stampCases: Case[] = [
  {
    code: 'weather.stamp',
    text: edited({ 40: cells(40, (row) => row.splice(0, 1, '2019-02-30T14:00')) }),
    line: 40,
    says: ['“2019-02-30T14:00”'],
  },
  { code: 'weather.stamp', text: edited({ 40: cells(40, (row) => row.splice(0, 1, '')) }), line: 40, says: ['“”'] },
  {
    code: 'weather.day-month-order',
    text: plainFile(
      year.filter((h) => parts(h.minute).d <= 12),
      (m) => `${pad(parts(m).d)}/${pad(parts(m).m)}/2019 ${pad(parts(m).h)}:00`,
    ),
    line: 2,
    says: ['“01/01/2019 00:00”', 'day/month or month/day'],
  },
  {
    code: 'weather.stamp-format',
    text: plain,
    settings: { stampFormat: 'dd-MMM-yyyy HH:mm' },
    says: ['“dd-MMM-yyyy HH:mm”', '“2019-01-01T00:00”'],
  },
  {
    code: 'weather.stamp-format',
    text: plain.replaceAll(/^\d{4}-/gm, '1 Thermidor '),
    settings: { stampFormat: 'dd/MM/yyyy HH:mm' },
    says: ['“dd/MM/yyyy HH:mm”', '“1 Thermidor 01-01T00:00”'],
  },
  {
    code: 'weather.loose-format',
    text: `time,temperature\n${Array.from({ length: 30 }, () => '111111x,1.5').join('\n')}\n`,
    settings: { stampFormat: 'MdMdMd' },
    says: ['stampFormat', 'MdMdMd', 'twice'],
  },
  {
    code: 'weather.unread-stamps',
    text: plain.replaceAll(/^\d{4}-/gm, '1 Thermidor '),
    line: 2,
    says: ['column 1 “time”', '“1 Thermidor 01-01T00:00”', "'stampFormat'"],
  },
  {
    code: 'weather.some-offsets',
    text: plain.replace('2019-01-01T05:00', '2019-01-01T05:00Z'),
    line: 2,
    says: ['“2019-01-01T00:00”'],
  },
  {
    code: 'weather.row-count',
    text: ['temperature,RH', ...untimed.slice(1)].join('\n'),
    says: ['8759 rows', '8760 or 8784'],
  },
  { code: 'weather.several-years', text: two, says: ['2018 (8760 rows), 2019 (8760 rows)', 'year: …'] },
  { code: 'weather.no-such-year', text: two, settings: { year: 2017 }, says: ['2017', '2018 (8760 rows)'] },
  {
    code: 'weather.coarse-step',
    text: plainFile(year.filter((_, i) => i % 3 === 0)),
    says: ['3 hours apart', 'hourly'],
  },
  {
    code: 'weather.odd-step',
    text: plainFile(year.slice(0, 500), (m) => iso((m * 45) / 60)),
    says: ['45 minutes apart'],
  },
  {
    code: 'weather.off-step',
    text: plain.replace('2019-01-02T05:00', '2019-01-02T05:20'),
    line: 31,
    says: ['2019-01-02 05:20', '1 hour apart'],
  },
  { code: 'weather.clock-needs-zone', text: plain, settings: { clock: 'local' }, zone: null, says: ["'zone'"] },
  {
    code: 'weather.unknown-zone',
    text: plain,
    settings: { clock: 'local' },
    zone: 'Mars/Olympus',
    says: ['Mars/Olympus'],
  },
  {
    code: 'weather.clock-needs-year',
    text: ['temperature', ...year.map((h) => h.temperature)].join('\n'),
    settings: { clock: 'local' },
    says: ['no year'],
  },
  {
    code: 'weather.no-such-clock-time',
    text: plain,
    settings: { clock: 'local' },
    line: 2140,
    says: ['2019-03-31 02:00', 'Europe/Berlin'],
  },
  {
    code: 'weather.looks-end-stamped',
    text: plainFile(year, (m) => iso(m + 60)),
    says: ['2019-01-01 01:00 to 2020-01-01 00:00', 'stamps: end'],
  },
];

const yearCases: Case[] = [
  {
    code: 'weather.duplicate',
    text: edited({ 41: cells(41, (row) => row.splice(0, 1, lines[39]!.split(',')[0]!)) }),
    line: 41,
    says: ['2019-01-02 14:00', 'line 40'],
  },
  {
    code: 'weather.repeated-row',
    text: edited({ 40: `${lines[39]}\n${lines[39]}` }),
    line: 41,
    says: ['same values as line 40'],
  },
  {
    code: 'weather.disorder',
    text: edited({ 40: lines[40], 41: lines[39] }),
    line: 41,
    says: ['2019-01-02 14:00', 'sorted'],
  },
  {
    code: 'weather.absent-hours',
    text: edited({ 40: undefined, 41: undefined }),
    line: 39,
    says: ['01-02 14:00 to 01-02 15:00 (2 hours)', 'absentHours: fill'],
  },
  { code: 'weather.absent-hours', text: edited({ 2: undefined }), says: ['01-01 00:00 (1 hour)'] },
  {
    code: 'weather.part-year',
    text: lines.slice(0, 1 + 31 * 24).join('\n'),
    line: 745,
    says: ['744 of the 8760 hours', '02-01 00:00 to 12-31 23:00 (8016 hours)'],
  },
  {
    code: 'weather.part-year',
    text: edited(Object.fromEntries(Array.from({ length: 7 }, (_, i) => [100 + i, undefined]))),
    settings: { absentHours: 'fill' },
    line: 99,
    says: ['8753 of the 8760 hours', '01-05 02:00 to 01-05 08:00 (7 hours)'],
  },
  {
    code: 'weather.long-gap',
    text: withTemperature(Object.fromEntries(Array.from({ length: 7 }, (_, i) => [100 + i, '']))),
    line: 99,
    says: ['01-05 02:00 to 01-05 08:00 (7 hours)', 'at most 6 hours', 'temperature in column 2'],
  },
];

const valueCases: Case[] = [
  {
    code: 'weather.impossible-value',
    text: withTemperature({ 40: '61' }),
    line: 40,
    column: 18,
    says: ['is 61 °C', '-90 to 60 °C'],
  },
  { code: 'weather.impossible-value', text: withTemperature({ 40: '-90.5' }), line: 40, says: ['is -90.5 °C'] },
  {
    code: 'weather.impossible-value',
    text: edited({ 40: cells(40, (row) => row.splice(2, 1, '106')) }),
    line: 40,
    says: ['is 106 %', '0 to 105 %'],
  },
  {
    code: 'weather.impossible-value',
    text: edited({ 40: cells(40, (row) => row.splice(3, 1, '1601')) }),
    line: 40,
    says: ['is 1601 W/m²'],
  },
  {
    code: 'weather.impossible-value',
    text: edited({ 40: cells(40, (row) => row.splice(3, 1, '-21')) }),
    line: 40,
    says: ['is -21 W/m²'],
  },
  {
    code: 'weather.impossible-value',
    text: edited({ 40: cells(40, (row) => row.splice(4, 1, '449')) }),
    line: 40,
    says: ['is 44900 Pa', '45000 to 110000 Pa'],
  },
  {
    code: 'weather.column-implausible',
    text: plain.replace(header, 'time,RH,temperature,GHI,pressure [hPa]').replace('temperature', 'temperature (K)'),
    line: 2,
    says: ['most values of the temperature in column 3', "'units'"],
  },
  { code: 'weather.spike', text: withTemperature({ 40: '40' }), line: 40, says: ['40.0 °C', /\d\d\.\d K away/] },
  {
    code: 'weather.unit-guessed',
    text: ['time,temp', ...year.map((h) => `${iso(h.minute)},${(h.temperature * 1.8 + 32).toFixed(2)}`)].join('\n'),
    line: 1,
    says: ['°F', "'units'"],
  },
  {
    code: 'weather.more',
    text: withTemperature(Object.fromEntries(Array.from({ length: 25 }, (_, i) => [100 + i * 3, 'x1']))),
    says: ['5 more of weather.text-cell'],
  },
];

describe.each([
  ['table', tableCases],
  ['stamps', stampCases],
  ['year', yearCases],
  ['values', valueCases],
])('problems of the %s', (_, cases) => {
  it.each(cases)('$code is found, placed and worded', ({ code, text, settings, zone, line, column, says }) => {
    const { series, problems } = read(text, settings, zone === undefined ? {} : { zone: zone ?? undefined });
    const found = problems.filter((p) => p.code === code);
    expect(found.length, JSON.stringify(problems.slice(0, 3))).toBeGreaterThan(0);
    const [first] = found;
    if (line !== undefined) expect(first!.line).toBe(line);
    if (column !== undefined) expect(first!.column).toBe(column);
    const words = problemText(first!);
    for (const part of says) {
      if (typeof part === 'string') expect(words).toContain(part);
      else expect(words).toMatch(part);
    }
    expect(words).not.toMatch(/[{}](?:path|found|allowed|unit)|undefined|NaN/);
    expect(series === undefined).toBe(problems.some((p) => p.severity === 'error'));
  });
});

it('every kind of problem of weather files is produced above', () => {
  const produced = new Set([...tableCases, ...stampCases, ...yearCases, ...valueCases].map(({ code }) => code));
  expect(Object.keys(weatherProblems).filter((code) => !produced.has(code as Case['code']))).toEqual([]);
});

it('an empty file is one problem', () => {
  expect(read(' \n\n').problems.map((p) => p.code)).toEqual(['file.empty']);
});

it('problems of different kinds are reported together', () => {
  const text = withTemperature({ 40: 'warm', 50: '99' }).replace('2019-02-01T00:00', '2019-02-01Q00:00');
  expect(new Set(read(text).problems.map((p) => p.code))).toEqual(
    new Set(['weather.text-cell', 'weather.impossible-value', 'weather.stamp']),
  );
});

it('of one kind twenty are listed and the rest counted', () => {
  const many = Object.fromEntries(Array.from({ length: 120 }, (_, i) => [100 + i * 2, 'x1']));
  const { problems } = read(withTemperature(many));
  expect(problems.filter((p) => p.code === 'weather.text-cell')).toHaveLength(20);
  expect(problems.find((p) => p.code === 'weather.more')).toMatchObject({ found: '100', severity: 'error' });
});

it('names the line where quoted cells hold line ends', () => {
  const rows = year.map((h: Hour, i) => `"a\nb",${iso(h.minute)},${i === 99 ? '"hot"' : h.temperature}`);
  const { problems } = read(['note,time,temperature', ...rows].join('\n'));
  // The header is line 1 and each row takes two lines: row 100 begins on line 2 + 99·2.
  expect(problems).toMatchObject([{ code: 'weather.text-cell', line: 200, found: '“hot”' }]);
});
