import { describe, expect, test } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { readSeries } from '../../../src/tariffs/readSeries.ts';
import type { SeriesKind, SeriesSettings } from '../../../src/tariffs/timeSeries.ts';

const readings: SeriesKind = {
  one: 'reading',
  many: 'readings',
  section: 'household',
  valueKey: 'energyColumn',
  divisor: 1000,
  least: 0,
  most: 10,
  range: 'from 0 to 10 kWh a step',
};

function read(text: string, settings: Partial<SeriesSettings> = {}) {
  return readSeries({ text, file: 'm.csv', settings: { stamps: 'utc', ...settings }, kind: readings, zone: 'UTC' });
}

const lines = (...rows: string[]) => ['time,Wh', ...rows].join('\n');

describe('values over time of any kind', () => {
  test('are divided into the unit that is meant', () => {
    const { series, problems } = read(lines('2025-01-01T00:00,250', '2025-01-01T00:15,0'));
    expect(problems).toEqual([]);
    expect(series).toMatchObject({ stepMinutes: 15, values: Float64Array.of(0.25, 0) });
  });

  test('are spoken of by their own name, with their own limits', () => {
    const { problems } = read(lines('2025-01-01T00:00,-1', '2025-01-01T00:15,20000', '2025-01-01T00:30,x'));
    expect(problems.map((problem) => problemText(problem).split('\n')[0])).toEqual([
      'm.csv:2:18  -1 is no reading; allowed is a number with a decimal point, from 0 to 10 kWh a step',
      'm.csv:3:18  20000 is no reading; allowed is a number with a decimal point, from 0 to 10 kWh a step',
      'm.csv:4:18  x is no reading; allowed is a number with a decimal point, from 0 to 10 kWh a step',
    ]);
  });

  test('may be the least and the most that is possible', () => {
    const { series, problems } = read(lines('2025-01-01T00:00,0', '2025-01-01T00:15,10000'));
    expect(problems).toEqual([]);
    expect(series?.values).toEqual(Float64Array.of(0, 10));
  });

  test.each([
    [
      'a step that is too long',
      lines('2025-01-01T00:00,1', '2025-01-01T02:00,1'),
      'the readings are 120 minutes apart',
    ],
    [
      'a gap',
      lines('2025-01-01T00:00,1', '2025-01-01T01:00,1', '2025-01-01T03:00,1'),
      'before 2025-01-01T03:00 readings are missing: 1 of 60 minutes',
    ],
    ['one line', lines('2025-01-01T00:00,1'), 'the file has one line of readings; at least two lines are needed'],
  ])('are refused with %s', (_, text, expected) => {
    expect(read(text).problems.map(problemText).join()).toContain(expected);
  });

  test('are told which keys name their columns', () => {
    const text = 'time,a,b\n2025-01-01T00:00,1,1\n2025-01-01T01:00,1,1\n';
    const said = read(text, { timeColumn: 'time' }).problems.map(problemText).join();
    expect(said).toContain('the column of readings of household.energyColumn is not there; the file has time, a, b');
    expect(said).toContain('→ name the columns: timeColumn and energyColumn');
    expect(read(text, { timeColumn: 'time', valueColumn: 'b' }).problems).toEqual([]);
  });
});
