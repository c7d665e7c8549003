import { describe, expect, it } from 'vitest';
import type { ReadSettings } from '../../../../src/weather/readSettings.ts';
import { type Hour, header, iso, pad, parts, plainFile, plainRows, read, syntheticYear } from './syntheticYear.ts';

const year = syntheticYear();

/** One way of writing the year down, and the settings that this way needs. */
interface Variant {
  readonly name: string;
  readonly text: string;
  readonly settings?: ReadSettings;
  /** Columns that this way writes; all four where it is absent. */
  readonly temperatureOnly?: boolean;
  /** Whether the rows carry no stamps. */
  readonly unstamped?: boolean;
}

type Line = (hour: Hour, row: number) => string;

function written(head: string | undefined, line: Line, hours: readonly Hour[] = year): string {
  const rows = hours.map(line);
  return `${(head === undefined ? rows : [head, ...rows]).join('\n')}\n`;
}

function stamped(stamp: (minute: number) => string): string {
  return plainFile(year, stamp);
}

const comma = (value: number) => String(value).replace('.', ',');
const us = (m: number) => `${parts(m).m}/${parts(m).d}/${parts(m).y} ${parts(m).h}:${pad(parts(m).min)}`;
const german = (m: number) => `${pad(parts(m).d)}.${pad(parts(m).m)}.${parts(m).y} ${pad(parts(m).h)}:00`;
const compact = (m: number) => iso(m).replace(/[-T:]/g, '');
const english = (m: number) => `${pad(parts(m).d)}-${month(m)}-${parts(m).y} ${pad(parts(m).h)}:00`;
const month = (m: number) =>
  ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'][parts(m).m - 1];
const twelve = (m: number) => {
  const { h } = parts(m);
  return `${us(m).split(' ')[0]} ${h % 12 === 0 ? 12 : h % 12}:00 ${h < 12 ? 'AM' : 'PM'}`;
};
const values = (h: Hour) => [h.temperature, h.humidity, h.radiation, h.pressure];

const delimiters: Variant[] = [
  {
    name: 'semicolons and decimal commas',
    text: written('Zeit;Lufttemperatur (°C);rel. Feuchte (%);Globalstrahlung (W/m²);Luftdruck (hPa)', (h) =>
      [german(h.minute), ...values(h).map(comma)].join(';'),
    ),
  },
  { name: 'tabs', text: written(header.replaceAll(',', '\t'), (h) => [iso(h.minute), ...values(h)].join('\t')) },
  {
    name: 'tabs with stamps that hold a blank',
    text: written(header.replaceAll(',', '\t'), (h) => [iso(h.minute).replace('T', ' '), ...values(h)].join('\t')),
  },
  { name: 'pipes', text: written(header.replaceAll(',', '|'), (h) => [iso(h.minute), ...values(h)].join('|')) },
  {
    name: 'runs of blanks',
    text: written(
      '  time   temperature  RH  GHI   pressure',
      (h) => `  ${[iso(h.minute), ...values(h)].join('    ')}  `,
    ),
  },
  {
    name: 'runs of blanks and tabs with decimal commas',
    settings: { delimiter: 'blanks' },
    text: written('date time temperature RH GHI pressure', (h) =>
      [iso(h.minute).replace('T', '  '), ...values(h).map(comma)].join(' \t '),
    ),
  },
  {
    name: 'decimal commas in quotation marks between commas',
    text: written(header, (h) => [iso(h.minute), ...values(h).map((v) => `"${comma(v)}"`)].join(',')),
  },
  { name: 'trailing delimiters', text: written(`${header},`, (h) => [iso(h.minute), ...values(h), ''].join(',')) },
  {
    name: 'trailing delimiters without one in the header',
    text: written(header, (h) => [iso(h.minute), ...values(h), ''].join(',')),
  },
  { name: 'carriage returns', text: stamped(iso).replaceAll('\n', '\r\n') },
  { name: 'carriage returns alone', text: stamped(iso).replaceAll('\n', '\r') },
  { name: 'a byte-order mark', text: `\ufeff${stamped(iso)}` },
  { name: 'trailing blank lines', text: `${stamped(iso)}\n  \n\n` },
  { name: 'no line end at the end', text: stamped(iso).trimEnd() },
  { name: 'Unicode minus signs', text: stamped(iso).replaceAll(',-', ',−') },
  {
    name: 'numbers with exponents',
    text: written(header, (h) => [iso(h.minute), ...values(h).map((v) => v.toExponential())].join(',')),
  },
  {
    name: 'blanks around the cells',
    text: written(header.replaceAll(',', ' , '), (h) => [iso(h.minute), ...values(h)].join(' , ')),
  },
];

const heads: Variant[] = [
  { name: 'lines before the header', text: `Station: Nowhere\nLatitude;52.1\n\nOwner "unknown"\n${stamped(iso)}` },
  { name: 'a single quotation mark before the header', text: `Height 5" above the roof\n${stamped(iso)}` },
  {
    name: 'a line of units below the header',
    text: stamped(iso).replace('\n', '\n,°C,%,W/m²,hPa\n'),
  },
  {
    name: 'two lines below the header',
    text: stamped(iso).replace('\n', '\nISO,°C,%,W/m2,mbar\nmean,mean,mean,mean,mean\n'),
  },
  { name: 'remarks after the data', text: `${stamped(iso)}\ntemperature: air at 2 m\nSource, of 2019: none\n` },
  {
    name: 'a header cell with a line end in quotation marks',
    text: stamped(iso).replace('relative humidity', '"relative\nhumidity"'),
  },
  {
    name: 'remarks of many lines in quotation marks',
    text: written(`note,${header}`, (h) => [`"${'so\n'.repeat(20)}"`, iso(h.minute), ...values(h)].join(',')),
  },
  {
    name: 'columns named by the settings',
    text: stamped(iso).replace(header, 'a,b,c,d,e'),
    settings: { columns: { temperature: 'b', relativeHumidity: 'C', globalRadiation: 4, pressure: 'e' } },
  },
  {
    name: 'no header, with columns by number',
    text: stamped(iso).replace(`${header}\n`, ''),
    settings: { columns: { temperature: 2, relativeHumidity: 3, globalRadiation: 4, pressure: 5 } },
  },
  {
    name: 'a header that is to be overlooked',
    text: `99,98,97,96,95\n${stamped(iso).replace(`${header}\n`, '')}`,
    settings: {
      header: false,
      skipLines: 1,
      columns: { temperature: 2, relativeHumidity: 3, globalRadiation: 4, pressure: 5 },
    },
  },
  {
    name: 'repeated names, with columns by number',
    text: stamped(iso).replace(header, 'time,value,value,value,value'),
    settings: { columns: { temperature: 2, relativeHumidity: 3, globalRadiation: 4, pressure: 5 } },
  },
  {
    name: 'no header and one column of numbers',
    text: written(undefined, (h) => `${iso(h.minute)},${h.temperature}`),
    temperatureOnly: true,
  },
  {
    name: 'a single column with its name',
    unstamped: true,
    text: written('T_out (°C)', (h) => String(h.temperature)),
    temperatureOnly: true,
  },
  {
    name: 'a single column without anything',
    unstamped: true,
    text: written(undefined, (h) => String(h.temperature)),
    temperatureOnly: true,
  },
  {
    name: 'hundreds of columns that are not wanted',
    text: written(`${header},${Array.from({ length: 300 }, (_, i) => `x${i}`).join(',')}`, (h) =>
      [iso(h.minute), ...values(h), ...Array.from({ length: 300 }, () => 7)].join(','),
    ),
  },
  {
    name: 'columns that name other quantities',
    text: written(
      'time,temperature,dew point,soil temperature,T max,relative humidity,global radiation,direct normal radiation,pressure,pressure msl,temperature flag',
      (h) => [iso(h.minute), h.temperature, -3, 8, 40, h.humidity, h.radiation, 5, h.pressure, 1013, 1].join(','),
    ),
  },
];

const stamps: Variant[] = [
  { name: 'ISO with a blank and seconds', text: stamped((m) => `${iso(m).replace('T', ' ')}:00`) },
  { name: 'ISO with parts of seconds just before the hour', text: stamped((m) => `${iso(m - 1)}:59.998`) },
  { name: 'ISO with an offset', text: stamped((m) => `${iso(m)}+01:00`) },
  {
    name: 'ISO in UTC of a site that is ahead',
    text: stamped((m) => `${iso(m - 60)}Z`),
    settings: { offset: '+01:00' },
  },
  { name: 'slashes, year first', text: stamped((m) => iso(m).replaceAll('-', '/').replace('T', ' ')) },
  { name: 'days with points', text: stamped(german) },
  { name: 'days with points and years of two digits', text: stamped((m) => german(m).replace('2019', '19')) },
  { name: 'month before day', text: stamped(us) },
  { name: 'twelve-hour clock', text: stamped(twelve) },
  { name: 'day before month with slashes', text: stamped((m) => german(m).replaceAll('.', '/')) },
  { name: 'month and day without a year', text: stamped((m) => us(m).replace('/2019', '')) },
  { name: 'compact digits', text: stamped(compact) },
  { name: 'compact digits with a colon', text: stamped((m) => `${compact(m).slice(0, 8)}:${compact(m).slice(8)}`) },
  { name: 'compact digits with the hour alone', text: stamped((m) => compact(m).slice(0, 10)) },
  { name: 'a form of its own', text: stamped(english), settings: { stampFormat: 'dd-MMM-yyyy HH:mm' } },
  {
    name: 'stamps at half past the hour',
    text: stamped((m) => iso(m + 30)),
  },
  {
    name: 'months of different years',
    text: stamped((m) => iso(m).replace('2019', String(2001 + parts(m).m))),
  },
  {
    name: 'date and time in two columns',
    text: written(`date,${header}`, (h) =>
      [iso(h.minute).slice(0, 10), iso(h.minute).slice(11), ...values(h)].join(','),
    ),
  },
  {
    name: 'dates written as stamps of midnight, and a time',
    text: written(`date,${header}`, (h) =>
      [`${iso(h.minute).slice(0, 10)} 00:00:00`, iso(h.minute).slice(11), ...values(h)].join(','),
    ),
  },
  {
    name: 'a date and an hour run together with minutes',
    text: written(`date,${header.replace('time', 'hour')}`, (h) =>
      [iso(h.minute).slice(0, 10), String(parts(h.minute).h * 100), ...values(h)].join(','),
    ),
  },
  {
    name: 'year, month, day and hour in columns',
    text: written(header.replace('time', 'Year,Month,Day,Hour'), (h) => {
      const p = parts(h.minute);
      return [p.y, p.m, p.d, p.h, ...values(h)].join(',');
    }),
  },
  {
    name: 'month, day and hours from 1 to 24, with a minute of 60',
    text: written(header.replace('time', 'month,day,hour,minute'), (h) => {
      const p = parts(h.minute + 60, true);
      return [p.m, p.d, p.h, 60, ...values(h)].join(',');
    }),
  },
  {
    name: 'year, month, day and hour without a header',
    text: written(undefined, (h) => {
      const p = parts(h.minute + 60, true);
      return [p.y, p.m, p.d, p.h, ...values(h)].join(',');
    }),
    settings: { columns: { temperature: 5, relativeHumidity: 6, globalRadiation: 7, pressure: 8 } },
  },
  {
    name: 'hours of the year from 0',
    text: written(header.replace('time', 'hour of year'), (h, i) => [i, ...values(h)].join(',')),
  },
  {
    name: 'hours of the year from 1',
    text: written(header.replace('time', 'hour'), (h, i) => [i + 1, ...values(h)].join(',')),
  },
  {
    name: 'a row number without a name',
    text: written(header.replace('time', ''), (h, i) => [i, ...values(h)].join(',')),
  },
  { name: 'no stamps', unstamped: true, text: written(header.replace('time,', ''), (h) => values(h).join(',')) },
  { name: 'the end of the hour, stated', text: stamped((m) => iso(m + 60)), settings: { stamps: 'end' } },
  {
    name: 'the end of the hour, each stamp of its own year',
    text: stamped((m) => iso(m + 60).replace(/^\d{4}/, '2019')),
    settings: { stamps: 'end' },
  },
  {
    name: 'the end of the hour, recognised by 24:00',
    text: stamped((m) => {
      const p = parts(m + 60, true);
      return `${p.y}-${pad(p.m)}-${pad(p.d)} ${pad(p.h)}:00`;
    }),
  },
  {
    name: 'midnight without its time',
    text: stamped((m) => german(m).replace(' 00:00', '')),
  },
];

const order: Variant[] = [
  {
    name: 'a year that begins in July',
    text: [header, ...plainRows(year).slice(4344), ...plainRows(year).slice(0, 4344)].join('\n'),
  },
  {
    name: 'one of two stations',
    text: written(`station,${header}`, (h) =>
      ['007', iso(h.minute), ...values(h)].join(',').concat('\n', ['8', iso(h.minute), 1, 2, 3, 1004].join(',')),
    ),
    settings: { station: { column: 'station', value: 7 } },
  },
  {
    name: 'one of three years',
    text: [2018, 2019, 2020].reduce(
      (text, y) =>
        `${text}\n${plainRows(y === 2019 ? year : syntheticYear(y).map((h) => ({ ...h, temperature: h.temperature + 1 }))).join('\n')}`,
      header,
    ),
    settings: { year: 2019 },
  },
];

const units: Variant[] = [
  {
    name: '°F in the header',
    text: unit('temperature', 'temp [°F]', (v) => (v * 1.8 + 32).toFixed(10), 'temperature'),
  },
  { name: 'K in the header', text: unit('temperature', 'T (K)', (v) => (v + 273.15).toFixed(10), 'temperature') },
  { name: 'K by the values', text: unit('temperature', 'temperature', (v) => (v + 273.15).toFixed(10), 'temperature') },
  {
    name: 'tenths of a degree',
    text: unit('temperature', 'temperature in 0.1 °C', (v) => (v * 10).toFixed(0), 'temperature'),
  },
  {
    name: 'tenths of a degree by the settings',
    text: unit('temperature', 'temperature', (v) => (v * 10).toFixed(0), 'temperature'),
    settings: { units: { temperature: '0.1C' } },
  },
  { name: 'humidity from 0 to 1', text: unit('relative humidity', 'RH', (v) => (v / 100).toFixed(12), 'humidity') },
  { name: 'Pa', text: unit('pressure', 'pressure_Pa', (v) => (v * 100).toFixed(8), 'pressure') },
  { name: 'Pa by the values', text: unit('pressure', 'pressure', (v) => (v * 100).toFixed(8), 'pressure') },
  { name: 'kPa', text: unit('pressure', 'Pressure (kPa)', (v) => (v / 10).toFixed(10), 'pressure') },
  {
    name: 'mmHg by the values',
    text: unit('pressure', 'pressure', (v) => (v / 1.33322387415).toFixed(12), 'pressure'),
  },
  { name: 'inHg', text: unit('pressure', 'pressure inHg', (v) => (v / 33.86388640341).toFixed(14), 'pressure') },
  { name: 'Wh/m²', text: unit('global radiation', 'GHI (Wh/m²)', String, 'radiation') },
  {
    name: 'kJ/m²',
    text: unit('global radiation', 'Globalstrahlung [kJ/m^2]', (v) => (v * 3.6).toFixed(10), 'radiation'),
  },
  { name: 'J/cm²', text: unit('global radiation', 'G(h) [J/cm²]', (v) => (v * 0.36).toFixed(12), 'radiation') },
  {
    name: 'MJ/m² by the settings',
    text: unit('global radiation', 'GHI', (v) => (v * 0.0036).toFixed(14), 'radiation'),
    settings: { units: { globalRadiation: 'MJ/m2' } },
  },
];

function unit(
  name: string,
  as: string,
  print: (value: number) => string,
  key: 'temperature' | 'humidity' | 'radiation' | 'pressure',
): string {
  return written(header.replace(name, as), (h) => {
    const cells = {
      temperature: String(h.temperature),
      humidity: String(h.humidity),
      radiation: String(h.radiation),
      pressure: String(h.pressure),
    };
    cells[key] = print(h[key]);
    return [iso(h.minute), cells.temperature, cells.humidity, cells.radiation, cells.pressure].join(',');
  });
}

describe.each([
  ['delimiters and signs', delimiters],
  ['headers and columns', heads],
  ['stamps', stamps],
  ['order', order],
  ['units', units],
])('one year in different %s', (_, variants) => {
  it.each(variants)('is the same with $name', ({ text, settings, temperatureOnly, unstamped }) => {
    const { series, problems, recognised } = read(text, settings);
    expect(problems.filter((p) => p.severity === 'error')).toEqual([]);
    expect(series?.hours).toBe(8760);
    // A year without stamps is read in the order of the file: this must not be how a stamped one comes out right.
    expect(recognised.stampForm?.startsWith('none') ?? false).toBe(unstamped ?? false);
    // 1e-9 in each quantity's own unit: printing with ten and more digits and converting back keeps that.
    const firstFar = (found: Float64Array | undefined, wanted: (h: Hour) => number, far = 1e-9) =>
      found === undefined ? 'no column' : year.findIndex((h, i) => !(Math.abs(found[i]! - wanted(h)) <= far));
    expect(firstFar(series?.temperature, (h) => h.temperature)).toBe(-1);
    if (temperatureOnly) return;
    expect(series?.humidity?.kind).toBe('relative');
    expect(firstFar(series?.humidity?.values, (h) => h.humidity)).toBe(-1);
    expect(firstFar(series?.globalRadiation, (h) => h.radiation)).toBe(-1);
    // Pa: 1e-7 is 1e-12 of the value, what the printed digits of the mercury columns leave.
    expect(firstFar(series?.pressure, (h) => h.pressure * 100, 1e-7)).toBe(-1);
  });
});
