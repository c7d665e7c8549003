import { describe, expect, test } from 'vitest';
import { CsvRecords, LONGEST_RECORD } from '../../src/batch/csvRecords.ts';
import { problemText } from '../../src/core/problemText.ts';
import { readMeter } from '../../src/scenario/readings/readMeter.ts';
import { readPriceSeries } from '../../src/tariffs/readPriceSeries.ts';

// What trying found, each as small as it could be made; every one of them failed before it was mended.

describe('a line without end', () => {
  const cells = '1,'.repeat(1_000_000);

  test('in a table of prices is refused before it is parted into its cells', () => {
    const settings = { file: 'p.csv', unit: 'perKWh', stamps: 'withOffset' } as const;
    const { problems } = readPriceSeries({ text: `time,price\n${cells}`, file: 'p.csv', settings, zone: 'UTC' });
    expect(problems.map(problemText).join()).toContain('this line has 2000000 characters; at most 10000 are read');
  });

  test('in a table of readings too', () => {
    const { problems } = readMeter(`date,reading kWh\n${cells}`, 'm.csv', undefined);
    expect(problems.map(problemText).join()).toContain('this line has 2000000 characters; at most 10000 are read');
  });

  test('in a table of homes is not gathered up: each further block would be copied behind all that came before', () => {
    const records = new CsvRecords();
    const block = new Uint8Array(LONGEST_RECORD + 1).fill(0x31);
    const rows = [...records.push(block), ...records.push(block), ...records.push(block)];
    expect(rows.length).toBeGreaterThan(0);
    expect(rows[0]!.line).toBe(1);
    expect(rows[0]!.bytes.length).toBeGreaterThan(LONGEST_RECORD);
  });
});
