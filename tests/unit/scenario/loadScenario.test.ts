import { describe, expect, test } from 'vitest';
import { loadScenario } from '../../../src/scenario/loadScenario.ts';
import { loadReadSettings } from '../../../src/scenario/loadWeather.ts';
import { inputOf, memoryFiles } from './memoryFiles.ts';
import { sampleFiles, scenarioText, tariffText, unitText, weatherText } from './sampleFiles.ts';

const load = (changes: Record<string, string> = {}) => loadScenario('house.yaml', memoryFiles(sampleFiles(changes)));

describe('a scenario', () => {
  test('is loaded with everything that it names', () => {
    const { loaded, problems } = load();
    expect(problems).toEqual([]);
    expect(loaded).toMatchObject({
      file: 'house.yaml',
      scenario: { name: 'Test house', currency: 'EUR' },
      unit: { file: 'unit.yaml', unit: { name: 'Test unit' } },
      weather: { file: 'weather.csv', series: { hours: 8760, offsetMinutes: 60 } },
      clock: { zone: 'Europe/Berlin', calendarYear: 2025, hours: 8760 },
    });
    expect(loaded?.tariffs.map(({ file, name, prepared }) => [file, name, prepared.price[0]])).toEqual([
      ['tariff.yaml', 'Test tariff', 0.2],
    ]);
  });

  test('keeps the record of its inputs with the sums of their bytes', () => {
    expect(load().loaded?.inputs).toEqual(
      [
        ['house.yaml', 'scenario'],
        ['weather.csv', 'weather'],
        ['unit.yaml', 'unit'],
        ['tariff.yaml', 'tariff'],
      ].map(([file = '', role]) => ({ file, role, sha256: inputOf(file, sampleFiles()[file] ?? '').sha256 })),
    );
  });

  test('names the defaults used in each of its files', () => {
    const defaults = load().loaded?.defaults.map(({ file, path, value }) => `${file} ${path} ${value}`);
    expect(defaults).toContain('house.yaml site.calendarYear 2025');
    expect(defaults).toContain('house.yaml circulation.pumpPower 0');
    expect(defaults).toContain('house.yaml backup.mode.kind parallel');
    expect(defaults).toContain('unit.yaml cycling.coefficient 0.25');
    expect(defaults).toContain('tariff.yaml pricesStated withoutTax');
    expect(defaults?.filter((text) => text.includes('altitude'))).toEqual([]);
  });

  test('does not name defaults that the weather file makes idle', () => {
    const paths = (weather: string) =>
      load({ 'house.yaml': scenarioText.replace(', altitude: 100', ''), 'weather.csv': weather }).loaded?.defaults.map(
        ({ path }) => path,
      );
    const dry = weatherText().replace('relative humidity %', 'wind m/s');
    expect(paths(dry)).toEqual(expect.arrayContaining(['weather.relativeHumidity', 'site.altitude']));
    expect(paths(weatherText())).not.toContain('weather.relativeHumidity');
    expect(paths(weatherText().replace('relative humidity %', 'pressure hPa').replaceAll(',80', ',980'))).not.toContain(
      'site.altitude',
    );
  });

  test('takes stamps without an offset in the standard time of its zone', () => {
    const text = scenarioText
      .replace('  read: { offset: "+01:00", stamps: begin }\n', '')
      .replace('Europe/Berlin', 'Asia/Kolkata');
    expect(load({ 'house.yaml': text }).loaded?.weather.series.offsetMinutes).toBe(330);
    const south = text.replace('Asia/Kolkata', 'Australia/Sydney');
    // Summer time on 1 January there: standard time is UTC+10.
    expect(load({ 'house.yaml': south }).loaded?.weather.series.offsetMinutes).toBe(600);
  });

  test('may use a price series', () => {
    const prices = ['time,price'];
    for (let i = -24; i < 8784; i++) prices.push(`${new Date(Date.UTC(2025, 0, 1, i)).toISOString()},${i % 24}`);
    const dynamic = 'name: d\nseries: { file: prices.csv, unit: perMWh }\n';
    const { loaded, problems } = load({ 'tariff.yaml': dynamic, 'prices.csv': prices.join('\n') });
    expect(problems).toEqual([]);
    // Hour 0 of the year begins 23:00 UTC of the day before.
    expect(Array.from(loaded?.tariffs[0]?.prepared.price.slice(0, 3) ?? [])).toEqual([-1, 0, 1].map((p) => p / 1000));
    expect(loaded?.inputs.map((input) => input.role)).toContain('priceSeries');
  });
});

describe('files that a scenario names', () => {
  test('and that are not there are told where they are named', () => {
    const files = sampleFiles();
    for (const [name, place] of [
      ['weather.csv', { line: 4, column: 9, path: 'weather.file' }],
      ['unit.yaml', { line: 18, column: 9, path: 'heatPump.unit' }],
      ['tariff.yaml', { line: 20, column: 11, path: 'tariffs[0]' }],
    ] as const) {
      const { [name]: _, ...others } = files;
      const { problems, loaded } = loadScenario('house.yaml', memoryFiles(others));
      expect(loaded).toBeUndefined();
      expect(problems).toMatchObject([
        { code: 'file.missing', file: name, ...place, hint: expect.stringContaining('house.yaml') },
      ]);
    }
  });

  test('are all looked through, however wrong the others are', () => {
    const { problems } = load({
      'house.yaml': scenarioText.replace('return: 38', 'return: 50'),
      'unit.yaml': unitText.replace('4.2', '420'),
      'tariff.yaml': tariffText.replace('price: 0.3', 'price: x'),
      'weather.csv': weatherText({ hours: 100 }),
    });
    expect(new Set(problems.map((p) => p.file))).toEqual(
      new Set(['house.yaml', 'unit.yaml', 'tariff.yaml', 'weather.csv']),
    );
  });

  test('have their faults listed from top to bottom, each once', () => {
    const tariffs = scenarioText.replace('[tariff.yaml]', '[tariff.yaml, tariff.yaml]');
    const { problems } = load({
      'house.yaml': tariffs,
      'tariff.yaml': 'name: t\nrates:\n  - { name: a, price: x }\n  - { name: 5, price: 1 }\n',
    });
    expect(problems.map(({ file, line }) => [file, line])).toEqual([
      ['tariff.yaml', 3],
      ['tariff.yaml', 4],
    ]);
  });

  test('get places for what the tariff itself finds wrong', () => {
    const { problems } = load({
      'tariff.yaml': 'name: t\nrates:\n  - { name: a, price: 1, from: "06:00", to: "22:00" }\n',
    });
    expect(problems).toMatchObject([{ code: 'tariff.unpriced', file: 'tariff.yaml', line: 3 }]);
  });

  test('give warnings beside the loaded scenario', () => {
    const text = unitText.replace('A2       3.6  2.9', 'A2       3.6  1.9');
    const { problems, loaded } = load({ 'unit.yaml': text });
    expect(problems.every((p) => p.severity === 'warning')).toBe(true);
    expect(problems).not.toEqual([]);
    expect(loaded).toBeDefined();
  });
});

describe('settings for reading a weather file', () => {
  test('are loaded from a file of their own', () => {
    const { settings, problems, defaults } = loadReadSettings('r.yaml', memoryFiles({ 'r.yaml': 'stamps: end\n' }));
    expect(problems).toEqual([]);
    expect(settings).toEqual({ stamps: 'end', absentHours: 'refuse' });
    expect(defaults.map(({ path }) => path)).toEqual(['absentHours']);
  });

  test('are refused with their place', () => {
    const { settings, problems } = loadReadSettings('r.yaml', memoryFiles({ 'r.yaml': 'stamps: ends\n' }));
    expect(settings).toBeUndefined();
    expect(problems).toMatchObject([{ code: 'entry.not-a-choice', line: 1, column: 9, hint: 'perhaps end is meant' }]);
    expect(loadReadSettings('s.yaml', memoryFiles({})).problems).toMatchObject([{ code: 'file.missing' }]);
  });
});
