import { describe, expect, test } from 'vitest';
import { CsvRecords, LONGEST_RECORD } from '../../src/batch/csvRecords.ts';
import { problemText } from '../../src/core/problemText.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { weatherFrom } from '../../src/scenario/loadWeather.ts';
import { readMeter } from '../../src/scenario/readings/readMeter.ts';
import { readPriceSeries } from '../../src/tariffs/readPriceSeries.ts';
import { inputOf, memoryFiles } from '../unit/scenario/memoryFiles.ts';
import { scenarioText, weatherText } from '../unit/scenario/sampleFiles.ts';

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

describe('a number that is none', () => {
  test('where a text belongs is not spelt in words of the language', () => {
    const { problems } = loadScenario('a.yaml', memoryFiles({ 'a.yaml': scenarioText.replace('Test house', '.inf') }));
    const text = problems.map(problemText).join('\n');
    expect(text).toContain(
      'a.yaml:1:7  name is not a finite number; it is a text of at most 200 letters\n    → put it in quotes',
    );
    expect(text).not.toMatch(/Infinity|NaN/);
  });

  test('and is all that a file holds is shown as it is written', () => {
    const { problems } = loadScenario('a.yaml', memoryFiles({ 'a.yaml': '-1e400' }));
    expect(problems.map(problemText).join()).toContain("a.yaml:1:1  the file holds only '-1e400'");
  });

  test('that only the change of its unit makes is shown as a number', () => {
    // −1.5e307 hPa is −1.5e309 Pa, beyond the numbers of the machine
    const weather = weatherText().replace(/80$/gm, '80,980').replace('humidity %', 'humidity %,pressure hPa');
    const spoilt = weather.replace('980\n', '-1.5e307\n');
    const { problems } = weatherFrom(inputOf('w.csv', spoilt), {}, {});
    const text = problems.map(problemText).join('\n');
    expect(text).toContain('is -1.79769e+308 Pa; possible is 45000 to 110000 Pa');
  });
});
