import fc from 'fast-check';
import { expect, it } from 'vitest';
import { hasErrors } from '../../../../src/core/problem.ts';
import { problemText } from '../../../../src/core/problemText.ts';
import type { WeatherReading } from '../../../../src/weather/read/readWeather.ts';
import { header, iso, plainFile, plainRows, read, syntheticYear } from './syntheticYear.ts';

const year = syntheticYear();
const plain = plainFile(year);

/** A reading is either a series of finite values or errors, and every problem can be worded. */
function expectSound({ series, problems, recognised }: WeatherReading): void {
  expect(series === undefined).toBe(hasErrors(problems));
  const columns = [series?.temperature, series?.humidity?.values, series?.globalRadiation, series?.pressure];
  for (const column of columns) expect(column?.every(Number.isFinite) ?? true).toBe(true);
  for (const problem of problems) expect(problemText(problem)).not.toMatch(/undefined|NaN|\[object/);
  for (const line of recognised.lines) expect(line).not.toMatch(/undefined|NaN|\[object/);
}

it('any text gives a series or problems, never an exception', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary', maxLength: 400 }), (text) => {
      const reading = read(text);
      expectSound(reading);
      expect(reading.series).toBeUndefined();
    }),
    { seed: 1, numRuns: 300 },
  );
});

it('text made of what tables are made of gives problems, never an exception', () => {
  const piece = fc.constantFrom(
    '1',
    '-',
    ',',
    ';',
    '\t',
    ' ',
    '\n',
    '\n',
    '"',
    '.',
    '2019-01-01',
    '00:00',
    'T',
    '24',
    'temperature',
    'hour',
    '9999',
    '|',
    'Z',
    '+01:00',
    '1e9',
  );
  fc.assert(
    fc.property(fc.array(piece, { maxLength: 300 }), (pieces) => expectSound(read(pieces.join('')))),
    { seed: 2, numRuns: 500 },
  );
});

it('a good file with one damage anywhere gives a series or a problem, and no value that is none', () => {
  const damage = fc.record({
    at: fc.integer({ min: 0, max: plain.length - 1 }),
    cut: fc.integer({ min: 0, max: 60 }),
    put: fc.constantFrom(
      '',
      '"',
      ',',
      ',,,',
      '\n',
      '\n\n',
      '\0',
      '9',
      '-',
      'x',
      '"a\nb"',
      '\u2028',
      '9'.repeat(400),
      '1e308',
      '1e-320',
      'Infinity',
      '\r',
      ';',
      '💧',
    ),
  });
  fc.assert(
    fc.property(damage, ({ at, cut, put }) => expectSound(read(plain.slice(0, at) + put + plain.slice(at + cut)))),
    { seed: 3, numRuns: 150 },
  );
});

it('a line of two million cells is refused', () => {
  expect(read(`${header}\n${'1,'.repeat(2_000_000)}`).problems[0]).toMatchObject({
    code: 'weather.long-line',
    line: 2,
  });
});

it('a line without an end is refused', () => {
  expect(read('1'.repeat(20_000_000)).problems[0]?.code).toBe('weather.long-line');
});

it('quotation marks that never close do not swallow the file', () => {
  const { series, problems } = read(plain.replace('2019-06-01T00:00,', '"2019-06-01T00:00,'));
  expect(series).toBeUndefined();
  expect(problems).toMatchObject([{ code: 'weather.stamp', line: 3626 }]);
});

it('control characters from the file never reach a message', () => {
  const { problems } = read(plain.replace('2019-06-01T00:00', '2019\u001b[31m\u202eabc'));
  expect(problems).toHaveLength(1);
  // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must not occur
  expect(problems.map(problemText).join()).not.toMatch(/[\u001b\u202e]/);
});

it('names of columns that are names of the language are only names', () => {
  const rows = year.map((h) => `${iso(h.minute)},${h.temperature},1,2`);
  const { series } = read(['time,temperature,__proto__,constructor', ...rows].join('\n'));
  expect(series?.temperature[3]).toBe(year[3]!.temperature);
});

it('a quarter of a million rows of many stations are counted, not kept', () => {
  const rows = Array.from({ length: 30 }, (_, s) => plainRows(year).map((row) => `${s},${row}`)).flat();
  const { series, recognised } = read([`station,${header}`, ...rows].join('\n'), { station: { column: 1, value: 29 } });
  expect(recognised.rowsRead).toBe(8760);
  expect(series?.temperature[8]).toBe(year[8]!.temperature);
});
