import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Problem } from '../../../src/core/problem.ts';
import { problemText } from '../../../src/core/problemText.ts';
import { zoneOffsets } from '../../../src/core/zoneOffsets.ts';
import { readPriceSeries } from '../../../src/tariffs/readPriceSeries.ts';
import { instantsOf, readStamp } from '../../../src/tariffs/seriesStamps.ts';
import type { PriceSeriesSettings } from '../../../src/tariffs/tariff.ts';
import { codes } from './sampleTariffs.ts';

const settings: PriceSeriesSettings = { file: 'prices.csv', unit: 'perKWh', stamps: 'withOffset' };

function read(text: string, over: Partial<PriceSeriesSettings> = {}, zone = 'Europe/Berlin') {
  return readPriceSeries({ text, file: 'prices.csv', settings: { ...settings, ...over }, zone });
}

/** Everything but the cure of each problem, the file's name left out. */
function said(problems: readonly Problem[]): string[] {
  return problems.map((problem) => problemText(problem).split('\n')[0].replace('prices.csv:', ''));
}

const hourly = 'time,price\n2025-01-01T00:00+01:00,0.25\n2025-01-01T01:00+01:00,0.20\n2025-01-01T02:00+01:00,-0.01\n';
const start = Date.UTC(2024, 11, 31, 23) / 60_000;

describe('a price file is read', () => {
  test('with offsets, names of columns and negative prices', () => {
    const { series, problems } = read(hourly);
    expect(problems).toEqual([]);
    expect(series).toMatchObject({ file: 'prices.csv', startMinute: start, stepMinutes: 60 });
    expect(Array.from(series?.prices ?? [])).toEqual([0.25, 0.2, -0.01]);
  });

  test.each([
    ['semicolon and decimal comma', 'time;price\n2025-01-01T00:00+01:00;0,25\n2025-01-01T01:00+01:00;-0,5\n', {}],
    ['semicolon and decimal comma without names', '2025-01-01T00:00+01:00;0,25\n2025-01-01T01:00+01:00;-0,5\n', {}],
    ['tab, no line end', 'time\tprice\n2025-01-01T00:00+01:00\t0.25\n2025-01-01T01:00+01:00\t-.5', {}],
    ['bar', '2025-01-01T00:00+01:00|0.25\n2025-01-01T01:00+01:00|-5e-1\n', {}],
    [
      'byte order mark and CRLF',
      '\ufefftime,price\r\n2025-01-01T00:00+01:00,0.25\r\n2025-01-01T01:00+01:00,-0.5\r\n',
      {},
    ],
    ['blank lines', '\n\ntime,price\n\n2025-01-01T00:00+01:00,0.25\n , \n2025-01-01T01:00+01:00,-0.5\n\n', {}],
    ['quoted decimal comma', '"2025-01-01T00:00+01:00","0,25"\n"2025-01-01T01:00+01:00","-0,5"\n', {}],
    ['Z and blanks for T', '2024-12-31 23:00Z,0.25\n2025-01-01 00:00:00Z,-0.5\n', {}],
    ['offsets without colon', '2025-01-01T00:00+0100,0.25\n2025-01-01T01:00+01,-0.5\n', {}],
    ['UTC by setting', '2024-12-31T23:00,0.25\n2025-01-01T00:00,-0.5\n', { stamps: 'utc' }],
    ['local time by setting', '2025-01-01T00:00,0.25\n2025-01-01T01:00,-0.5\n', { stamps: 'local' }],
    [
      'an offset in spite of the setting',
      '2024-12-31T18:00-05:00,0.25\n2024-12-31T19:00-05:00,-0.5',
      { stamps: 'local' },
    ],
    ['MWh', '2025-01-01T00:00+01:00,250\n2025-01-01T01:00+01:00,-500\n', { unit: 'perMWh' }],
    ['cents', '2025-01-01T00:00+01:00,25\n2025-01-01T01:00+01:00,-50\n', { unit: 'centsPerKWh' }],
    [
      'named columns among others',
      'a,when,b,money\n1,2025-01-01T00:00+01:00,2,0.25\n1,2025-01-01T01:00+01:00,2,-0.5\n',
      { timeColumn: 'when', priceColumn: 'money' },
    ],
  ] as [string, string, Partial<PriceSeriesSettings>][])('with %s', (_, text, over) => {
    const { series, problems } = read(text, over);
    expect(said(problems)).toEqual([]);
    expect(series).toMatchObject({ startMinute: start, stepMinutes: 60 });
    expect(Array.from(series?.prices ?? [])).toEqual([0.25, -0.5]);
  });

  test('by quarters of an hour', () => {
    const text = Array.from({ length: 5 }, (_, k) => `2025-01-01T0${Math.floor(k / 4)}:${(k % 4) * 15 || '00'}Z,${k}`);
    expect(read(text.join('\n')).series).toMatchObject({ stepMinutes: 15, prices: Float64Array.of(0, 1, 2, 3, 4) });
  });

  test('with thousands told from decimals by the setting', () => {
    const text = '2025-01-01T00:00Z;1,250\n2025-01-01T01:00Z;2,500\n';
    expect(read(text, { decimal: 'comma' }).series?.prices[0]).toBe(1.25);
    expect(said(read(text).problems)).toEqual(['1:19  the comma in 1,250 may divide decimals or thousands']);
  });
});

describe('local stamps', () => {
  const rows = (stamps: string[]) => stamps.map((stamp, k) => `${stamp},${k}`).join('\n');

  test('pass over the hour that is missing and through the one that is doubled', () => {
    const spring = read(rows(['2025-03-30T01:00', '2025-03-30T03:00', '2025-03-30T04:00']), { stamps: 'local' });
    expect(said(spring.problems)).toEqual([]);
    expect(spring.series?.startMinute).toBe(Date.UTC(2025, 2, 30, 0) / 60_000);
    const autumn = read(
      rows([
        '2025-10-26T01:30',
        '2025-10-26T02:00',
        '2025-10-26T02:30',
        '2025-10-26T02:00',
        '2025-10-26T02:30',
        '2025-10-26T03:00',
      ]),
      { stamps: 'local' },
    );
    expect(said(autumn.problems)).toEqual([]);
    expect(autumn.series).toMatchObject({ startMinute: Date.UTC(2025, 9, 25, 23, 30) / 60_000, stepMinutes: 30 });
  });

  test('must hold the doubled hour twice', () => {
    const { problems } = read(
      rows(['2025-10-26T01:00', '2025-10-26T02:00', '2025-10-26T03:00', '2025-10-26T04:00', '2025-10-26T05:00']),
      { stamps: 'local' },
    );
    expect(said(problems)).toEqual(['3:1  before 2025-10-26T03:00 prices are missing: 1 of 60 minutes']);
  });

  test('must not hold the missing hour', () => {
    const { problems } = read(rows(['2025-03-30T01:00', '2025-03-30T02:00', '2025-03-30T03:00']), { stamps: 'local' });
    expect(said(problems)).toEqual([
      '2:1  2025-03-30T02:00 does not exist in Europe/Berlin: the clocks were put forward over it',
    ]);
  });

  test('have one instant, none or two', () => {
    const from = Date.UTC(2025, 0, 1) / 60_000;
    const spans = zoneOffsets('Europe/Berlin', from, from + 365 * 1440) ?? [];
    const clock = (...[month, day, hour]: number[]) => Date.UTC(2025, month - 1, day, hour) / 60_000;
    expect(instantsOf(clock(6, 1, 12), spans)).toEqual([clock(6, 1, 10)]);
    expect(instantsOf(clock(3, 30, 2), spans)).toEqual([]);
    expect(instantsOf(clock(10, 26, 2), spans)).toEqual([clock(10, 26, 0), clock(10, 26, 1)]);
  });
});

describe('stamps', () => {
  test('are whole minutes of ISO 8601', () => {
    expect(readStamp('1970-01-02T00:30+18:00')).toEqual({ clockMinute: 1470, offsetMinutes: 1080 });
    expect(readStamp('1970-01-02T00:30+18:01')).toBeUndefined();
    expect(readStamp('1970-01-02T00:30+01:00')).toEqual({ clockMinute: 1470, offsetMinutes: 60 });
    expect(readStamp('1970-01-01 01:00:00.000-03:30')).toEqual({ clockMinute: 60, offsetMinutes: -210 });
    expect(readStamp('1970-01-01T01:00')).toEqual({ clockMinute: 60 });
  });

  test.each([
    '01.01.2025 00:00',
    '2025-02-29T00:00Z',
    '2025-01-01T24:00Z',
    '2025-01-01T00:60Z',
    '2025-01-01T00:00:30Z',
    '2025-01-01',
    '9999-01-01T00:00Z',
    '1969-12-31T23:00Z',
    '2025-01-01T00:00+19:00',
    '2025-01-01T00:00 CET',
    '1735686000',
  ])('of other forms are refused: %s', (text) => expect(readStamp(text)).toBeUndefined());
});

describe('what is wrong in a price file is said with line and column', () => {
  const lines = (...cells: string[]) => ['time,price', ...cells].join('\n');
  const row = (hour: number, price = '0.2') => `2025-01-01T${String(hour).padStart(2, '0')}:00Z,${price}`;

  test.each([
    [
      'a gap',
      lines(row(0), row(1), row(4), row(5)),
      ['4:1  before 2025-01-01T04:00Z prices are missing: 2 of 60 minutes'],
    ],
    ['a repeat', lines(row(0), row(1), row(1), row(2)), ['4:1  2025-01-01T01:00Z occurs a second time']],
    [
      'only repeats',
      lines(row(1), row(1), row(1)),
      ['3:1  2025-01-01T01:00Z occurs a second time', '4:1  2025-01-01T01:00Z occurs a second time'],
    ],
    ['disorder', lines(row(0), row(1), row(0), row(1), row(2)), ['4:1  2025-01-01T00:00Z stands after a later stamp']],
    [
      'an irregular step',
      lines(row(0), row(1), '2025-01-01T01:40Z,1', '2025-01-01T02:40Z,1', '2025-01-01T03:40Z,1'),
      ['4:1  2025-01-01T01:40Z is out of step; the prices are 60 minutes apart'],
    ],
    [
      'too long a step',
      lines(row(0), row(2), row(4)),
      ['2:1  the prices are 120 minutes apart; allowed is at most 60 minutes'],
    ],
    [
      'text and an empty cell',
      lines(row(0, 'n/a'), row(1, ''), row(2, '1 000'), row(3)),
      [
        '2:19  n/a is no price; allowed is a number with a decimal point, up to a million per kWh',
        '3:19  an empty cell is no price; allowed is a number with a decimal point, up to a million per kWh',
        '4:19  1 000 is no price; allowed is a number with a decimal point, up to a million per kWh',
      ],
    ],
    [
      'a price beyond sense and infinity',
      lines(row(0, '1e7'), row(1, 'Infinity'), row(2, '1e999')),
      [
        '2:19  1e7 is no price; allowed is a number with a decimal point, up to a million per kWh',
        '3:19  Infinity is no price; allowed is a number with a decimal point, up to a million per kWh',
        '4:19  1e999 is no price; allowed is a number with a decimal point, up to a million per kWh',
      ],
    ],
    [
      'a row that ends early',
      lines(row(0), '2025-01-01T01:00Z', row(2)),
      ['3:18  an empty cell is no price; allowed is a number with a decimal point, up to a million per kWh'],
    ],
    [
      'both decimal signs',
      'time;price\n2025-01-01T00:00Z;0,25\n2025-01-01T01:00Z;0.25\n',
      ['2:19  0,25 is no price; allowed is a number with a decimal point, up to a million per kWh'],
    ],
    [
      'a stamp without offset and one that is none',
      lines(row(0), '2025-01-01T01:00,1', '"tomorrow",2', row(3)),
      [
        '3:1  2025-01-01T01:00 is no stamp; allowed is YYYY-MM-DDTHH:MM with Z or an offset such as +01:00',
        '4:1  tomorrow is no stamp; allowed is YYYY-MM-DDTHH:MM with Z or an offset such as +01:00',
      ],
    ],
    ['one line', lines(row(0)), ['prices.csv  the file has one line of prices; at least two lines are needed']],
    ['nothing', ' \n\n', ['prices.csv  the file has no line of prices; at least two lines are needed']],
    [
      'an open quotation mark',
      lines(row(0), `"${row(1)}`, row(2)),
      ['3  a quotation mark is not closed or stands in the wrong place'],
    ],
  ])('%s', (_, text, expected) => {
    const { series, problems } = read(text);
    expect(series).toBeUndefined();
    expect(said(problems)).toEqual(expected);
  });

  test('columns that are not there or not named', () => {
    const text = 'when,money,more\n2025-01-01T00:00Z,1,2\n2025-01-01T01:00Z,1,2\n';
    expect(said(read(text).problems)).toEqual([
      '1  the column of stamps of series.timeColumn is not there; the file has when, money, more',
      '1  the column of prices of series.priceColumn is not there; the file has when, money, more',
    ]);
    expect(said(read(text, { timeColumn: 'when', priceColumn: 'cost' }).problems)).toEqual([
      '1  the column cost of series.priceColumn is not there; the file has when, money, more',
    ]);
    const twice = 'when,money,money\n2025-01-01T00:00Z,1,2\n2025-01-01T01:00Z,1,2\n';
    expect(codes(read(twice, { timeColumn: 'when', priceColumn: 'money' }).problems)).toBe('series.column');
  });

  test('the line counts what a quoted cell hides', () => {
    const text =
      'note,time,price\n"two\nlines",2025-01-01T00:00Z,1\n"a, b",2025-01-01T01:00Z,x\n,2025-01-01T02:00Z,1\n';
    const { problems } = read(text, { timeColumn: 'time', priceColumn: 'price' });
    expect(problems).toMatchObject([{ line: 4, column: 26, found: 'x' }]);
  });

  test('an open quotation mark below blank lines is found in its own line', () => {
    expect(said(read(`\n\ntime,price\n\n${row(0)}\n"${row(1)}\n${row(2)}\n`).problems)).toEqual([
      '6  a quotation mark is not closed or stands in the wrong place',
    ]);
  });

  test('whatever stands in the file: no exception, and prices that are not numbers never come out', () => {
    const cell = fc.constantFrom('2025-01-01T00:00Z', '2025-01-01T01:00Z', '0,5', '0.5', '', '"', 'x', '=1+1', '1e400');
    const mark = fc.constantFrom(',', ';', '\t', '\n', '\r\n', '|');
    const text = fc
      .array(fc.oneof(cell, mark, fc.string({ maxLength: 5 })), { maxLength: 30 })
      .map((all) => all.join(''));
    fc.assert(
      fc.property(text, fc.constantFrom('withOffset', 'utc', 'local' as const), (file, stamps) => {
        const { series, problems } = read(file, { stamps });
        expect(series === undefined).toBe(problems.length > 0);
        for (const price of series?.prices ?? []) expect(Number.isFinite(price)).toBe(true);
      }),
      { seed: 20_252, numRuns: 3000 },
    );
  });

  test('at most twenty faults, and how many more there are', () => {
    const text = lines(...Array.from({ length: 24 }, (_, h) => row(h, 'x')));
    const { problems } = read(text);
    expect(problems).toHaveLength(21);
    expect(said(problems).at(-1)).toBe('prices.csv  there are 4 more faults in this file');
  });

  test('control characters of the file are made visible', () => {
    expect(said(read(lines(row(0, '\u001b[31m'), row(1))).problems)[0]).toContain('\\u001b[31m is no price');
  });
});
