import { describe, expect, it } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import { dayText } from '../../../../src/scenario/readings/readingDates.ts';
import { readMeter } from '../../../../src/scenario/readings/readMeter.ts';
import type { DecimalName } from '../../../../src/weather/readSettings.ts';

const read = (text: string, decimal?: DecimalName) => readMeter(text, 'meter.csv', decimal);
const textsOf = (text: string) => read(text).problems.map(problemText);

/** Rows as date and value, to be compared at a glance. */
function rowsOf(text: string, decimal?: DecimalName): string[] {
  const { meter, problems } = read(text, decimal);
  expect(problems.map(problemText)).toEqual([]);
  return (meter?.rows ?? []).map(({ day, value }) => `${dayText(day)} ${value}`);
}

describe('a file of readings is understood', () => {
  it.each([
    ['commas and ISO dates', 'date,reading kWh\n2024-01-01,100\n2024-02-01,205.5\n'],
    ['semicolons, decimal commas and day.month.year', 'Datum;Zählerstand kWh\n1.1.2024;100\n01.02.2024;205,5\n'],
    ['tabs, two-digit years and a byte-order mark', '\ufeffdate\treading kWh\r\n1.1.24\t100\r\n1.2.24\t205.5\r\n'],
    [
      'remarks, blank lines and quotation marks',
      '# cellar\n\ndate,reading kWh\n\n"2024-01-01","100"\n2024-02-01,205.5',
    ],
    ['times of day, which do not count', 'date,reading kWh\n2024-01-01 18:30,100\n2024-02-01 07:00,205.5\n'],
    ['slashes, where a day beyond the twelfth tells', 'date,reading kWh\n1/1/2024,100\n1/2/2024,205.5\n13/2/2024,300'],
    ['slashes with the month first', 'date,reading kWh\n1/1/2024,100\n2/1/2024,205.5\n2/13/2024,300\n'],
    ['the newest reading on top', 'date,reading kWh\n2024-02-01,205.5\n2024-01-01,100\n'],
  ])('with %s', (_, text) => {
    expect(rowsOf(text).slice(0, 2)).toEqual(['2024-01-01 100', '2024-02-01 205.5']);
  });

  it('by its names: kind, unit and marks', () => {
    const { meter } = read(
      'date;meter reading m³;estimated;exchange\n2024-01-01;100;;\n2024-02-01;200;x;no\n2024-02-02;5;;yes',
    );
    expect(meter).toMatchObject({ kind: 'reading', unit: 'm³', headerLine: 1 });
    expect(meter?.rows.map(({ estimated, exchange }) => [estimated, exchange])).toEqual([
      [false, false],
      [true, false],
      [false, true],
    ]);
    expect(read('date,use MWh\n2024-01-01,\n2024-02-01,1.5').meter).toMatchObject({ kind: 'use', unit: 'MWh' });
    expect(read('date,filled litres\n2024-01-01,900\n2024-02-01,1500').meter).toMatchObject({
      kind: 'fill',
      unit: 'litre',
    });
    expect(read('date,reading\n2024-01-01,900\n2024-02-01,1500').meter?.unit).toBeUndefined();
  });

  it('by the reading, where the use stands beside it', () => {
    expect(read('date,use kWh,reading kWh\n2024-01-01,,100\n2024-02-01,50,150').meter?.kind).toBe('reading');
  });

  it('by the oldest line as the first, also where it stands last', () => {
    expect(rowsOf('date,use kWh\n2024-03-01,70\n2024-02-01,50\n2024-01-01,\n')).toEqual([
      '2024-01-01 0',
      '2024-02-01 50',
      '2024-03-01 70',
    ]);
    expect(textsOf('date,use kWh\n2024-03-01,\n2024-02-01,50\n2024-01-01,60\n')[0]).toContain(
      'use kWh is an empty cell',
    );
  });

  it('with the decimal mark that the user states', () => {
    expect(rowsOf('date;reading m³\n2024-01-01;12.345\n2024-02-01;12.845\n', 'point')).toEqual([
      '2024-01-01 12.345',
      '2024-02-01 12.845',
    ]);
  });
});

describe('a file of readings is refused', () => {
  const two = '2024-01-01,100\n2024-02-01,200\n';

  it.each([
    ['', 'meter.csv  no readings were found'],
    ['date,reading kWh\n', 'meter.csv  no readings were found'],
    [
      `when,reading kWh\n${two}`,
      'meter.csv:1  no column for the date was recognised; the first line has when, reading kWh',
    ],
    [`date,kWh\n${two}`, 'meter.csv:1  no column for the reading, the use or the fill was recognised'],
    [two, 'meter.csv:1  the first line has 2024-01-01, 100 where the names of the columns should be'],
    [
      'date,use kWh,fill L\n2024-01-01,100,1\n2024-02-01,200,2\n',
      'meter.csv:1  more than one column could be the use or the fill: column 2 “use kWh”, column 3 “fill L”',
    ],
    [
      'date,reading day,reading kWh\n2024-01-01,1,1\n2024-02-01,2,2\n',
      'meter.csv:1  more than one column could be the date: column 1 “date”, column 2 “reading day”',
    ],
    [
      'date,reading kWh\n2024-01-01,100\n2024-02-30,200\n',
      'meter.csv:3:1  the date is “2024-02-30”; a date is written as 2024-03-31 or 31.3.2024, from 1970 to 2100',
    ],
    ['date,reading kWh\n,100\n2024-02-01,200\n', 'meter.csv:2:1  the date is an empty cell'],
    ['date,reading kWh\n1924-01-01,100\n2024-02-01,200\n', 'meter.csv:2:1  the date is “1924-01-01”'],
    [
      'date,reading kWh\n1/2/2024,100\n1/3/2024,200\n',
      'meter.csv:2:1  the dates, such as “1/2/2024”, may be day/month or month/day, and nothing in the file decides it',
    ],
    [
      'date,reading kWh\n2024-01-01,100\n2024-03-01,200\n2024-02-01,300\n',
      'meter.csv:4:1  the date 2024-02-01 comes after 2024-03-01, which stands in the line before',
    ],
    [
      'date,reading kWh\n2024-01-01,100\n2024-01-01,200\n',
      'meter.csv:3:1  2024-01-01 stands here a second time; first in line 2',
    ],
    [
      'date,use kWh,exchange\n2024-01-01,100,\n2024-01-01,200,x\n',
      'meter.csv:3:1  2024-01-01 stands here a second time; first in line 2',
    ],
    ['date,"reading\nkWh"\n2024-01-01,100\n2024-02-01,none\n', 'meter.csv:4:12  '],
    [
      'date,reading kWh\n2024-01-01,100\n2024-02-01,about 200\n',
      'meter.csv:3:12  reading kWh is “about 200”; it is a number from 0 with a decimal point',
    ],
    ['date,reading kWh\n2024-01-01,100\n2024-02-01,-5\n', 'meter.csv:3:12  reading kWh is “-5”'],
    ['date,reading kWh\n2024-01-01,\n2024-02-01,5\n', 'meter.csv:2:12  reading kWh is an empty cell'],
    ['date,use kWh\n2024-01-01,5\n2024-02-01,\n', 'meter.csv:3:12  use kWh is an empty cell'],
    [
      'date;reading kWh\n2024-01-01;12.345\n2024-02-01;13.456\n',
      'meter.csv:2:12  the values, such as “12.345”, may be thousands or have three decimals, and nothing in the file decides it',
    ],
    [
      'date,reading kWh,estimated\n2024-01-01,100,\n2024-02-01,200,perhaps\n',
      'meter.csv:3:16  estimated is “perhaps”; it is x, or empty',
    ],
  ])('%j', (text, expected) => {
    const texts = textsOf(text);
    expect(texts).toHaveLength(1);
    expect(texts[0]).toContain(expected);
    expect(read(text).meter).toBeUndefined();
  });

  it('when it is far too long', () => {
    expect(textsOf(`date,reading kWh\n${'2024-01-01,1\n'.repeat(20_000)}`)[0]).toContain(
      'the file has 20002 lines; at most 20000 are read',
    );
  });

  it('with twenty problems, and the rest counted', () => {
    const rows = Array.from({ length: 30 }, (_, i) => `2024-01-${String(i + 1).padStart(2, '0')},none`);
    const texts = textsOf(`date,reading kWh\n${rows.join('\n')}`);
    expect(texts).toHaveLength(21);
    expect(texts[20]).toContain('meter.csv  10 more problems are not listed');
  });
});

it('a line without end is refused before it is taken apart', () => {
  // 10 characters of the date, then two a cell
  expect(textsOf(`date,reading kWh\n2024-01-01${',1'.repeat(10_000_000)}\n`)).toEqual([
    'meter.csv:2  this line has 20000010 characters; at most 10000 are read\n    → this is no table with one reading a line: export the data again as CSV text',
  ]);
});
