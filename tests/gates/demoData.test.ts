import { readdirSync, readFileSync } from 'node:fs';
import Papa from 'papaparse';
import { max, mean, min, sampleCorrelation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { demoFiles } from '../../scripts/demo/demoFiles.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { loadUnit } from '../../src/scenario/loadUnit.ts';
import { scenarioSchema } from '../../src/scenario/scenarioSchema.ts';
import { tariffSchema } from '../../src/scenario/tariffSchema.ts';
import { unitSchema } from '../../src/scenario/unitSchema.ts';

const folder = new URL('../../data/demo/', import.meta.url);
const textOf = (name: string) => readFileSync(new URL(name, folder), 'utf8');
const table = (name: string) =>
  Papa.parse<string[]>(textOf(name), { comments: '#', skipEmptyLines: true }).data.slice(1);

const weather = table('weather.csv');
const [temperature, humidity, radiation, pressure] = [1, 2, 3, 4].map((column) =>
  weather.map((row) => Number(row[column])),
);
const prices = table('tariffs/prices.csv').map((row) => Number(row[1]));
const dailyMeans = (hourly: number[]) =>
  Array.from({ length: 365 }, (_, day) => mean(hourly.slice(24 * day, 24 * day + 24)));

describe('the generated files of the demo', () => {
  it.each(demoFiles())('$name is what its script makes, byte for byte', ({ name, text }) => {
    const committed = readFileSync(new URL(`../../${name}`, import.meta.url));
    expect(committed.equals(Buffer.from(text, 'utf8'))).toBe(true);
  });

  it('every file says that it is invented', () => {
    const names = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((name) => /\.\w+$/.test(name));
    expect(names.length).toBeGreaterThanOrEqual(10);
    for (const name of names) expect(textOf(name).slice(0, 400).toLowerCase(), name).toContain('invented');
  });
});

// The ranges below are what the demo is meant to be: a damp central-European town with a design temperature of −12 °C.
// They are wide enough for another seed and too narrow for another climate; common practice, no source.
describe('the invented weather', () => {
  it('has the 8760 hours of a common year in order', () => {
    const stamps = weather.map((row) => Date.parse(`${row[0]}Z`));
    expect(stamps.length).toBe(8760);
    expect(stamps[0]).toBe(Date.UTC(2025, 0, 1));
    expect(stamps.slice(1).every((stamp, i) => stamp - stamps[i]! === 3_600_000)).toBe(true);
  });

  it('has the temperatures of its climate', () => {
    expect(mean(temperature!)).toBeGreaterThan(8.5);
    expect(mean(temperature!)).toBeLessThan(9.6);
    expect(min(temperature!)).toBeGreaterThan(-14.5);
    expect(min(temperature!)).toBeLessThan(-12.5);
    expect(max(temperature!)).toBeGreaterThan(28);
    expect(max(temperature!)).toBeLessThan(35);
    const belowDesign = temperature!.filter((t) => t < -12).length;
    expect(belowDesign).toBeGreaterThan(5);
    expect(belowDesign).toBeLessThan(60);
  });

  it('has degree days of its climate', () => {
    // Room 20 °C on days with a mean below 15 °C, the German convention; towns of 9 °C lie near 3,800 K·d (from memory).
    const degreeDays = dailyMeans(temperature!).reduce((sum, t) => sum + (t < 15 ? 20 - t : 0), 0);
    expect(degreeDays).toBeGreaterThan(3500);
    expect(degreeDays).toBeLessThan(4000);
  });

  it('has many damp hours about freezing, in which coils frost', () => {
    const damp = temperature!.filter((t, i) => t >= -3 && t <= 5 && humidity![i]! > 85).length / 8760;
    expect(damp).toBeGreaterThan(0.12);
    expect(damp).toBeLessThan(0.25);
    expect(min(humidity!)).toBeGreaterThan(20);
    expect(max(humidity!)).toBeLessThanOrEqual(100);
  });

  it('has the sun of central Europe, and none by night', () => {
    const yearly = radiation!.reduce((sum, g) => sum + g, 0) / 1000;
    expect(yearly).toBeGreaterThan(1000);
    expect(yearly).toBeLessThan(1200);
    expect(max(radiation!)).toBeLessThan(1000);
    // At 49° north the sun is down from nine in the evening to three in the morning of standard time all year.
    const night = radiation!.filter((_, i) => i % 24 >= 21 || i % 24 < 3);
    expect(max(night)).toBe(0);
    expect(min(radiation!)).toBe(0);
    expect(radiation!.filter((g) => g > 0).length / 8760).toBeGreaterThan(0.48);
  });

  it('has the pressure of its altitude', () => {
    // Standard atmosphere at 420 m: 963.9 hPa (ISO 2533); lows and highs of 30 hPa are usual.
    expect(Math.abs(mean(pressure!) - 963.9)).toBeLessThan(2);
    expect(min(pressure!)).toBeGreaterThan(930);
    expect(max(pressure!)).toBeLessThan(995);
  });

  it('changes slowly from hour to hour and keeps its weather for days', () => {
    expect(sampleCorrelation(temperature!.slice(1), temperature!.slice(0, -1))).toBeGreaterThan(0.98);
    const daily = dailyMeans(temperature!);
    const fromMonth = daily.map((t, day) => t - mean(daily.slice(Math.max(0, day - 15), day + 16)));
    const persistence = sampleCorrelation(fromMonth.slice(1), fromMonth.slice(0, -1));
    expect(persistence).toBeGreaterThan(0.5);
    expect(persistence).toBeLessThan(0.9);
  });
});

describe('the invented prices', () => {
  it('are half-hours of civil 2025, dearest in the evening and sometimes below zero at noon', () => {
    expect(prices.length).toBe(2 * 8760);
    expect(mean(prices)).toBeGreaterThan(0.06);
    expect(mean(prices)).toBeLessThan(0.1);
    expect(min(prices)).toBeGreaterThan(-0.15);
    expect(max(prices)).toBeLessThan(0.3);
    const negative = prices.map((price, i) => (price < 0 ? Math.floor(i / 2) % 24 : -1)).filter((hour) => hour >= 0);
    expect(negative.length / prices.length).toBeGreaterThan(0.02);
    expect(negative.length / prices.length).toBeLessThan(0.08);
    expect(negative.filter((hour) => hour >= 9 && hour <= 15).length / negative.length).toBeGreaterThan(0.8);
  });
});

describe('the invented house, units and tariffs', () => {
  const yamlIn = (folderName: string) =>
    readdirSync(new URL(folderName, folder))
      .filter((name) => name.endsWith('.yaml'))
      .map((name) => `${folderName}${name}`);

  it('are valid', () => {
    const found = [
      ['house.yaml', scenarioSchema],
      ...yamlIn('units/').map((name) => [name, unitSchema] as const),
      ...yamlIn('tariffs/').map((name) => [name, tariffSchema] as const),
    ] as const;
    expect(found.length).toBe(7);
    for (const [name, schema] of found) expect(schema.safeParse(parse(textOf(name))).error, name).toBeUndefined();
  });

  // Files are named relative to the one that names them, as on the disk.
  const source = {
    read: (name: string, from = '') => {
      const url = new URL(name, new URL(from, folder));
      return { name: url.pathname.slice(folder.pathname.length), bytes: readFileSync(url), sha256: '' };
    },
  };

  it('the units load without a fault or a doubt about their values', () => {
    for (const name of yamlIn('units/')) {
      const { loaded, problems } = loadUnit(name, source);
      expect(problems).toEqual([]);
      expect(loaded?.fullLoad.capacity.length, name).toBeGreaterThanOrEqual(21);
    }
  });

  it('the house loads with everything it names, without a fault or a doubt', () => {
    const { loaded, problems } = loadScenario('house.yaml', source);
    expect(problems).toEqual([]);
    expect(loaded?.tariffs.length).toBe(4);
    expect(loaded?.weather.series.offsetMinutes).toBe(60);
  });
});
