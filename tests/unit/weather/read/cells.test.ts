import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cellKind, columnKind } from '../../../../src/weather/read/cellKinds.ts';
import { columnLabel } from '../../../../src/weather/read/columnPlan.ts';
import { offsetOfHeader, plainWords, quantityOf } from '../../../../src/weather/read/columnWords.ts';
import { guessDecimal, guessDelimiter } from '../../../../src/weather/read/delimiter.ts';
import { hourRuns } from '../../../../src/weather/read/hourRuns.ts';
import { plainLines } from '../../../../src/weather/read/measureText.ts';
import { missingMarks } from '../../../../src/weather/read/missingMarks.ts';
import { parseNumber } from '../../../../src/weather/read/parseNumber.ts';
import { rangeOf } from '../../../../src/weather/read/rangeOf.ts';
import { type StampParts, scanStamp } from '../../../../src/weather/read/scanStamp.ts';
import { findRowOrder } from '../../../../src/weather/read/timeStep.ts';
import { timesOfDay } from '../../../../src/weather/read/timesOfDay.ts';
import { unitOfHeader } from '../../../../src/weather/read/unitWords.ts';

const POINT = 46;
const COMMA = 44;
const seed = 20190701;

describe('a number in a cell', () => {
  it('is what the language itself reads, for every finite number in its shortest print', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        // Negative zero and positive zero are one value here.
        expect(parseNumber(String(value), POINT)).toBe(Number(String(value)));
        expect(parseNumber(String(value).replace('.', ','), COMMA)).toBe(Number(String(value)));
      }),
      { seed, numRuns: 500 },
    );
  });

  it('may have blanks around it, signs, a Unicode minus, and either decimal mark', () => {
    expect(parseNumber(' +3.50\u00a0', POINT)).toBe(3.5);
    expect(parseNumber('−3,5', COMMA)).toBe(-3.5);
    expect(parseNumber('-.5', POINT)).toBe(-0.5);
    expect(parseNumber('5.', POINT)).toBe(5);
    expect(parseNumber('1.25e-2', POINT)).toBe(0.0125);
  });

  it.each([
    '',
    ' ',
    '-',
    '.',
    '1.2.3',
    '1,5',
    '1 000',
    '0x10',
    'Infinity',
    'NaN',
    '1e',
    '1e999',
    '5 °C',
    '--5',
    '12:00',
  ])('is not %j', (cell) => {
    expect(parseNumber(cell, POINT)).toBeNaN();
  });

  it('is not one with the other decimal mark, or with a comma at its end', () => {
    expect(parseNumber('1.5', COMMA)).toBeNaN();
    expect(parseNumber('5,', COMMA)).toBeNaN();
  });
});

describe('a stamp in a cell', () => {
  const parts: StampParts = { order: 'none', year: 0, first: 0, second: 0, minute: 0, offset: 0 };
  const scan = (cell: string) => (scanStamp(cell, parts) ? { ...parts } : undefined);
  const date = { order: 'year-month-day', year: 2019, first: 7, second: 1 };
  const at = { ...date, minute: 870, offset: Number.NaN };

  it.each([
    ['2019-07-01T14:30+02:00', { ...at, offset: 120 }],
    ['2019-07-01 14:30:00.000 -0530', { ...at, offset: -330 }],
    ['2019-07-01T14:30−03', { ...at, offset: -180 }],
    ['2019-07-01T14:30:00Z', { ...at, offset: 0 }],
    ['2019-07-01 14:30 UTC', { ...at, offset: 0 }],
    ['2019-07-01T14:30', at],
    ['2019/7/1 14:30', at],
    ['2019.07.01, 14:30', at],
    ['201907011430', at],
    ['20190701143000', at],
    ['20190701:1430', at],
    ['20190701T1430', at],
    ['2019070124', { ...at, minute: 1440 }],
    ['2019-07-01', { ...date, minute: Number.NaN, offset: Number.NaN }],
    ['1.7.2019 14:30', { ...at, order: 'day-month', first: 1, second: 7 }],
    ['1.7.19', { order: 'day-month', year: 2019, first: 1, second: 7, minute: Number.NaN, offset: Number.NaN }],
    ['01.07. 14:30', { ...at, order: 'day-month', year: Number.NaN, first: 1, second: 7 }],
    ['7/1/2019 2:30 PM', { ...at, order: 'open' }],
    ['7/1/2019 12:30 a.m.', { ...at, order: 'open', minute: 30 }],
    ['07/01 24:00', { ...at, order: 'open', year: Number.NaN, minute: 1440 }],
    ['14:30', { order: 'none', year: Number.NaN, first: 0, second: 0, minute: 870, offset: Number.NaN }],
  ])('%s is read', (cell, wanted) => {
    expect(scan(cell)).toEqual(wanted);
  });

  it.each([
    '',
    'x',
    '5.3',
    '-5',
    '2019',
    '2019-07',
    '2019-07-01T25:00',
    '2019-07-01T14:60',
    '2019-07-01T24:30',
    '2019-07-01Q14:30',
    '2019-07-01T14:30+15:00',
    '2019-07-01 13:00 PM',
    '1-2-3-4-5-6-7-8-9-10',
    '2019-07-01T14:30+1:2:3',
    '1/2',
    '99999999'.repeat(6),
  ])('%j is none, or one without a time', (cell) => {
    expect(scan(cell)?.minute ?? Number.NaN).toBeNaN();
  });

  it('in any of the forms comes back as printed', () => {
    const forms: ((y: string, m: string, d: string, time: string) => string)[] = [
      (y, m, d, time) => `${y}-${m}-${d}T${time}`,
      (y, m, d, time) => `${y}/${m}/${d} ${time}:00`,
      (y, m, d, time) => `${y}${m}${d}${time.replace(':', '')}`,
    ];
    fc.assert(
      fc.property(
        fc.constantFrom(...forms),
        fc.integer({ min: 1800, max: 2199 }),
        fc.integer({ min: 1, max: 12 }),
        fc.integer({ min: 1, max: 28 }),
        fc.integer({ min: 0, max: 1439 }),
        (form, y, m, d, minute) => {
          const two = (value: number) => String(value).padStart(2, '0');
          const text = form(String(y), two(m), two(d), `${two(Math.floor(minute / 60))}:${two(minute % 60)}`);
          expect(scan(text)).toEqual({
            order: 'year-month-day',
            year: y,
            first: m,
            second: d,
            minute,
            offset: Number.NaN,
          });
        },
      ),
      { seed, numRuns: 300 },
    );
  });
});

describe('the look of a cell', () => {
  it.each([
    ['20190101:0010', 'stamp'],
    ['2019010100', 'stamp'],
    ['20190101', 'date'],
    ['20191301', 'number'],
    ['01.02.2019', 'date'],
    ['13:00', 'time'],
    ['1,5', 'number'],
    ['n/a', 'blank'],
    ['-', 'blank'],
    ['NNW', 'text'],
  ])('of %s is %s', (cell, kind) => {
    expect(cellKind(cell)).toBe(kind);
  });

  it('of a column is what nine in ten of its filled cells are', () => {
    expect(columnKind(['1.5', '', '2'])).toBe('number');
    expect(columnKind([...Array(9).fill('1'), 'warm'])).toBe('number');
    expect(columnKind([...Array(8).fill('1'), 'warm'])).toBe('text');
    expect(columnKind(['', '-'])).toBe('blank');
  });
});

describe('the words of a header', () => {
  it.each([
    ['Außentemperatur [°C]', 'temperature'],
    ['Lufttemperatur', 'temperature'],
    ['temp', 'temperature'],
    ['T2m', 'temperature'],
    ['T_out', 'temperature'],
    ['airTemp', 'temperature'],
    ['Dry-bulb (C)', 'temperature'],
    ['température extérieure', 'temperature'],
    ['TT_TU', 'temperature'],
    ['Taupunkttemperatur', 'dewPoint'],
    ['Point de rosée', 'dewPoint'],
    ['dewpoint_2m', 'dewPoint'],
    ['Wet bulb temperature', 'wetBulb'],
    ['Feuchtkugeltemperatur', 'wetBulb'],
    ['RH', 'relativeHumidity'],
    ['relHum', 'relativeHumidity'],
    ['Luftfeuchtigkeit (%)', 'relativeHumidity'],
    ['humidité relative', 'relativeHumidity'],
    ['G(h)', 'globalRadiation'],
    ['G [W/m²]', 'globalRadiation'],
    ['GHI', 'globalRadiation'],
    ['Rayonnement global', 'globalRadiation'],
    ['Luftdruck', 'pressure'],
    ['p [hPa]', 'pressure'],
    ['surface_pressure (hPa)', 'pressure'],
  ])('%s names the %s', (name, quantity) => {
    expect(quantityOf(name)).toEqual({ quantity, extreme: false });
  });

  it.each([
    'soil temperature',
    'apparent_temperature',
    'Temperature flag',
    'QN_9',
    'direct normal radiation',
    'Diffusstrahlung',
    'IR(h)',
    'pressure_msl',
    'Dampfdruck',
    'vapour pressure',
    'absolute humidity',
    'P',
    'G',
    'wind speed',
    'solar elevation',
    'time',
    '',
  ])('%j names none of the quantities', (name) => {
    expect(quantityOf(name)).toBeUndefined();
  });

  it('tell a minimum or maximum from a value', () => {
    expect(quantityOf('T max')).toEqual({ quantity: 'temperature', extreme: true });
    expect(quantityOf('Tmin')?.extreme).toBe(true);
    expect(quantityOf('temperature, 10 min mean')?.extreme).toBe(false);
  });

  it('are compared without case, accents, signs and units', () => {
    expect(plainWords('relHum_2m [%]')).toBe('rel hum 2m');
  });

  it.each([
    ['temperature', 'Lufttemperatur in Grad Celsius', 'C'],
    ['temperature', 'temp_degC', 'C'],
    ['temperature', 'tempF', 'F'],
    ['temperature', 'T [K]', 'K'],
    ['temperature', 'Temperatur (0,1 °C)', '0.1C'],
    ['temperature', 'temperature', undefined],
    ['relativeHumidity', 'RH (%)', 'percent'],
    ['relativeHumidity', 'RH (0-1)', 'fraction'],
    ['globalRadiation', 'GHI W m-2', 'W/m2'],
    ['globalRadiation', 'GHI (kWh/m²)', 'kWh/m2'],
    ['globalRadiation', 'GHI (Wh/m²)', 'Wh/m2'],
    ['globalRadiation', 'GHI [J/cm^2]', 'J/cm2'],
    ['globalRadiation', 'GHI [MJ/m²]', 'MJ/m2'],
    ['pressure', 'Luftdruck [hPa]', 'hPa'],
    ['pressure', 'pressure mbar', 'hPa'],
    ['pressure', 'pressure_kPa', 'kPa'],
    ['pressure', 'pressure, Pa', 'Pa'],
    ['pressure', 'pressure (mm Hg)', 'mmHg'],
    ['pressure', 'pressure (inHg)', 'inHg'],
  ] as const)('give the %s of %j the unit %s', (quantity, text, unit) => {
    expect(unitOfHeader(quantity, text)).toBe(unit);
  });

  it('may name the offset of the stamps', () => {
    expect(offsetOfHeader('time (UTC+05:30)')).toBe(330);
    expect(offsetOfHeader('time(UTC)')).toBe(0);
    expect(offsetOfHeader('Zeit GMT-3')).toBe(-180);
    expect(offsetOfHeader('Zeit')).toBeUndefined();
    expect(offsetOfHeader('outcome')).toBeUndefined();
  });
});

describe('small parts of the reader', () => {
  it('a column is named by its number and its header', () => {
    expect(columnLabel(1, ['date', 'T_out'])).toBe('column 2 “T_out”');
  });

  it('delimiter and decimal mark are guessed from lines of the table', () => {
    expect(guessDelimiter(['01.01.2019 00:00;1,5', '01.01.2019 01:00;1,2'])).toBe('semicolon');
    expect(guessDelimiter(['2019-01-01 00:00,1.5', '2019-01-01 01:00,1.2'])).toBe('comma');
    expect(guessDelimiter(['2019-01-01 00:00 1,5 80', '2019-01-01 01:00 1,2 81'])).toBe('blanks');
    expect(guessDecimal([['1,5', '80']])).toBe('comma');
    expect(guessDecimal([['1.5', '80']])).toBe('point');
    expect(guessDecimal([['15', '80']])).toBeUndefined();
  });

  it('line ends become line feeds', () => {
    expect(plainLines('a\r\nb\rc')).toBe('a\nb\nc');
  });

  it('marks of a missing value depend on the quantity', () => {
    expect(missingMarks('temperature', []).numbers.has(-9999)).toBe(true);
    expect(missingMarks('temperature', []).numbers.has(999.9)).toBe(true);
    expect(missingMarks('pressure', []).numbers.has(999.9)).toBe(false);
    expect(missingMarks('pressure', ['999.9']).numbers.has(999.9)).toBe(true);
  });

  it('the range of numbers leaves out what is none', () => {
    expect(rangeOf([3, Number.NaN, 1])).toEqual({ least: 1, most: 3 });
  });

  it('the commonest step is that of the rows', () => {
    expect(findRowOrder(Float64Array.of(0, 60, 120, 500, 560))).toEqual({ step: 60, backwards: false });
    expect(findRowOrder(Float64Array.of(120, 60, 0))).toEqual({ step: 60, backwards: true });
    expect(findRowOrder(Float64Array.of(7))).toBeUndefined();
  });

  it('times of day may be whole hours or run together with their minutes', () => {
    expect([...timesOfDay(['0', '30', '1330'], POINT)]).toEqual([0, 30, 810]);
    expect([...timesOfDay(['0', '1', '24'], POINT)]).toEqual([0, 60, 1440]);
    expect([...timesOfDay(['13:30', 'x', '1360'], POINT)]).toEqual([810, Number.NaN, Number.NaN]);
  });

  it('runs of hours go over the end of the year', () => {
    expect(hourRuns(24, (hour) => hour === 23 || hour === 0)).toEqual([{ first: 23, length: 2 }]);
    expect(hourRuns(24, (hour) => hour === 5 || hour > 21)).toEqual([
      { first: 5, length: 1 },
      { first: 22, length: 2 },
    ]);
    expect(hourRuns(24, () => true)).toEqual([{ first: 0, length: 24 }]);
    expect(hourRuns(24, () => false)).toEqual([]);
  });
});
