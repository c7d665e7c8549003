import { describe, expect, test } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { readPriceSeries } from '../../../src/tariffs/readPriceSeries.ts';
import { seriesSize } from '../../../src/tariffs/seriesSize.ts';

const settings = { file: 'p.csv', unit: 'perKWh', stamps: 'withOffset' } as const;

describe('a file of values over time', () => {
  test('is not taken apart with a line of ten million cells', () => {
    const text = `time,price\n2025-01-01T00:00Z,${'1,'.repeat(10_000_000)}`;
    const { series, problems } = readPriceSeries({ text, file: 'p.csv', settings, zone: 'UTC' });
    expect(series).toBeUndefined();
    // 18 characters of stamp and comma, then two a cell
    expect(problems.map(problemText)).toEqual([
      'p.csv:2  this line has 20000018 characters; at most 10000 are read\n    → this is no table with one value a line: export the data again as CSV text',
    ]);
  });

  test.each(['\n', '\r', '\r\n'])('is counted by its lines, however they end: %j', (end) => {
    expect(seriesSize(`1,2${end}`.repeat(600_000), 'p.csv')).toBeUndefined();
    const problem = seriesSize(`1,2${end}`.repeat(600_001), 'p.csv');
    expect(problem && problemText(problem)).toBe(
      "p.csv  the file has 600001 lines; at most 600000 are read\n    → cut the file to the scenario's calendar year",
    );
  });

  test.each(['\n', '\r', '\r\n'])('has the place of a long line, however lines end: %j', (end) => {
    expect(seriesSize(`a${end}b${end}${'c'.repeat(10_000)}`, 'p.csv')).toBeUndefined();
    expect(seriesSize(`a${end}b${end}${'c'.repeat(10_001)}${end}d`, 'p.csv')).toMatchObject({
      line: 3,
      found: '10001',
    });
  });
});
