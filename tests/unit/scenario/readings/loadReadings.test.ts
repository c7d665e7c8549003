import { describe, expect, it } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import { readingsProblems } from '../../../../src/scenario/readings/loadReadings.ts';
import { memoryFiles } from '../memoryFiles.ts';
import { scenarioText } from '../sampleFiles.ts';
import { load, monthlyUse, monthlyWeather, withReadings } from './readingsOfHouse.ts';

const means = [-1, 1, 5, 9, 13, 17, 19, 18, 14, 9, 4, 0];
const year = {
  'real.csv': monthlyWeather(means),
  'house.yaml': withReadings('{ efficiency: 0.9, weather: [real.csv] }'),
};
const textsOf = (changes: Record<string, string>) => load({ ...year, ...changes }).problems.map(problemText);

describe('readings of a house', () => {
  it('come with the weather of their own days', () => {
    const { readings, problems } = load({ ...year, 'meter.csv': monthlyUse([90, 80, 60, 40, 20]) });
    expect(problems).toEqual([]);
    expect(readings?.metered.map(({ use, dayMeans }) => [use, dayMeans.length, dayMeans[0], dayMeans.at(-1)])).toEqual([
      [2790, 31, -1, -1],
      [2320, 29, 1, 1],
      [1860, 31, 5, 5],
      [1200, 30, 9, 9],
      [620, 31, 13, 13],
    ]);
    expect(readings?.energy).toEqual({ kWhPerUnit: 1, efficiency: 0.9, efficiencyFrom: 'readings' });
    expect(readings?.inputs.map(({ file, role }) => `${role} ${file}`)).toEqual([
      'readings meter.csv',
      'weather real.csv',
      'scenario house.yaml',
    ]);
  });

  it('become kWh by the energy of their unit', () => {
    const meter = 'date;reading m³\n2024-01-01;1000,5\n2024-02-01;1201,5\n';
    const house = withReadings('{ efficiency: 0.9, kWhPerUnit: 10.5, weather: [real.csv] }');
    expect(load({ ...year, 'house.yaml': house, 'meter.csv': meter }).readings?.metered[0]?.use).toBeCloseTo(
      201 * 10.5,
      9,
    );
    const mega = 'date,use MWh\n2024-01-01,\n2024-02-01,2.5\n';
    expect(load({ ...year, 'meter.csv': mega }).readings?.metered[0]?.use).toBe(2500);
  });

  it('take efficiency and weather of the scenario where none are stated for them', () => {
    const house = `${scenarioText}boiler: { efficiency: 0.8, fuel: { kind: naturalGas, price: 0.1 } }\n`;
    const meter = 'date,use kWh\n2025-01-01,\n2025-02-01,2000\n';
    const { readings } = load({ 'house.yaml': house, 'meter.csv': meter });
    expect(readings?.energy).toEqual({ kWhPerUnit: 1, efficiency: 0.8, efficiencyFrom: 'boiler' });
    expect(readings?.weather.files.map(({ file }) => file)).toEqual(['weather.csv']);
  });

  it('may lie in several weather files, of one year each', () => {
    const next = monthlyWeather(means)
      .replaceAll('2024-', '2023-')
      .replace(/^2023-02-29.*\n/gm, '');
    const house = withReadings('{ efficiency: 0.9, weather: [real.csv, before.csv] }');
    const meter = 'date,use kWh\n2023-12-15,\n2024-01-15,2500\n';
    const { readings } = load({ ...year, 'before.csv': next, 'house.yaml': house, 'meter.csv': meter });
    expect([...(readings?.metered[0]?.dayMeans ?? [])]).toEqual([...Array(17).fill(0), ...Array(14).fill(-1)]);
  });
});

describe('readings of a house are refused', () => {
  const meter = monthlyUse([90, 80, 60, 40, 20]);

  it('where the weather does not cover a period, with what it covers', () => {
    const late = 'date,use kWh\n2024-11-01,\n2024-12-01,2000\n2025-01-01,2500\n2025-02-01,2500\n2025-03-01,2200\n';
    expect(textsOf({ 'meter.csv': late })).toEqual([
      expect.stringContaining(
        'meter.csv:5  the weather does not cover 2 periods, the first 2025-01-01 to 2025-01-31; it holds 2024-01-01 to 2024-12-31',
      ),
    ]);
    expect(textsOf({ 'meter.csv': late })[0]).toContain('a typical year does not serve');
  });

  it('without their unit, its energy, or with two of them', () => {
    const unit = (name: string) => `date,${name}\n2024-01-01,1\n2024-02-01,2\n`;
    const factor = { 'house.yaml': withReadings('{ efficiency: 0.9, kWhPerUnit: 10, weather: [real.csv] }') };
    expect(textsOf({ 'meter.csv': unit('reading') })).toEqual([
      expect.stringContaining(
        'meter.csv:1  column 2 “reading” names no unit, and the scenario gives no energy of one unit',
      ),
    ]);
    expect(textsOf({ 'meter.csv': unit('reading m3') })).toEqual([
      expect.stringContaining('meter.csv:1  column 2 “reading m3” is in m³, but the energy of one m³ is not known'),
    ]);
    expect(textsOf({ ...factor, 'meter.csv': unit('reading kWh') })).toEqual([
      expect.stringContaining('meter.csv:1  column 2 “reading kWh” is in kWh, but readings.kWhPerUnit is 10'),
    ]);
    expect(textsOf({ ...factor, 'meter.csv': unit('reading') })).toEqual([]);
  });

  it('without an efficiency', () => {
    expect(textsOf({ 'meter.csv': meter, 'house.yaml': withReadings('{ weather: [real.csv] }') })).toEqual([
      expect.stringContaining('house.yaml  the efficiency with which the metered energy became heat is not known'),
    ]);
  });

  it('with all problems of all files at once', () => {
    const house = withReadings('{ weather: [gone.csv, real.csv] }');
    const texts = textsOf({ 'house.yaml': house, 'meter.csv': 'date,reading kWh\n2024-01-01,1\n2024-02-01,x\n' });
    expect(texts).toHaveLength(3);
    expect(texts.join('\n')).toContain('meter.csv:3:12  reading kWh is “x”');
    expect(texts.join('\n')).toContain('the efficiency with which');
    expect(texts.join('\n')).toContain(
      'gone.csv  there is no such file\n    → named in house.yaml under readings.weather',
    );
  });

  it('by themselves, where the scenario is not sound', () => {
    const source = memoryFiles({ 'meter.csv': 'date,reading kWh\n2024-01-01,x\n' });
    expect(readingsProblems('meter.csv', source).map(problemText)[0]).toContain('reading kWh is “x”');
    expect(readingsProblems('gone.csv', source).map(problemText)[0]).toContain('there is no such file');
  });
});
