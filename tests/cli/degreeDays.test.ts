import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { folderWithDemo, PROBLEM_SHAPE, run } from './program.ts';

const folder = folderWithDemo();
const weather = 'data/demo/weather.csv';
const rows = Papa.parse<string[]>(readFileSync(join(folder, weather), 'utf8'), { comments: '#', skipEmptyLines: true });
const temperature = rows.data.slice(1).map((row) => Number(row[1]));

const jsonOf = async (...words: string[]) => {
  const { code, stdout, stderr } = await run(folder, 'degree-days', ...words, '--json', '-');
  expect({ code, stderr: code === 0 ? '' : stderr }).toEqual({ code: 0, stderr: '' });
  return JSON.parse(stdout);
};

describe('degree-days', () => {
  it('counts the hours below the base, and its months add up to the year', async () => {
    const { base, method, annual, monthly, weather: read } = await jsonOf(weather, '--base', '15.5');
    expect({ base, method }).toEqual({ base: 15.5, method: 'hours' });
    // ISO 15927-6, summed here straight from the file; 1e-6 K·d allows for another order of the sum.
    const expected = temperature.reduce((sum, t) => sum + Math.max(0, 15.5 - t), 0) / 24;
    expect(Math.abs(annual - expected)).toBeLessThan(1e-6);
    expect(monthly.length).toBe(12);
    expect(Math.abs(monthly.reduce((sum: number, month: number) => sum + month, 0) - annual)).toBeLessThan(1e-9);
    const january = temperature.slice(0, 31 * 24).reduce((sum, t) => sum + Math.max(0, 15.5 - t), 0) / 24;
    expect(Math.abs(monthly[0] - january)).toBeLessThan(1e-6);
    expect(read.recognised.length).toBeGreaterThan(3);
    expect(read.file).toBe(weather);
  });

  it('takes a base below zero and a method of its own', async () => {
    const { base, method, annual } = await jsonOf(weather, '--base', '-5', '--method', 'mean');
    expect({ base, method }).toEqual({ base: -5, method: 'mean' });
    let expected = 0;
    for (let day = 0; day < 365; day++) {
      const mean = temperature.slice(24 * day, 24 * day + 24).reduce((sum, t) => sum + t, 0) / 24;
      expected += Math.max(0, -5 - mean);
    }
    expect(Math.abs(annual - expected)).toBeLessThan(1e-6);
  });

  it('counts for heating unless cooling is asked, and says which', async () => {
    expect((await jsonOf(weather, '--base', '22')).kind).toBe('heating');
    const { kind, base, annual, monthly } = await jsonOf(weather, '--cooling', '--base', '22');
    expect({ kind, base }).toEqual({ kind: 'cooling', base: 22 });
    // The hours above the base, summed here straight from the file; 1e-6 K·d allows for another order of the sum.
    const above = (temperatures: number[]) => temperatures.reduce((sum, t) => sum + Math.max(0, t - 22), 0) / 24;
    expect(annual).toBeGreaterThan(1);
    expect(Math.abs(annual - above(temperature))).toBeLessThan(1e-6);
    expect(Math.abs(monthly[6] - above(temperature.slice(181 * 24, 212 * 24)))).toBeLessThan(1e-6);
    const { stdout } = await run(folder, 'degree-days', weather, '--cooling', '--base', '22');
    expect(stdout).toMatch(/^Cooling degree days to 22\.0 °C, hours\n/);
    expect(stdout).toContain('lies above the base');
  });

  it('prints months, year, how it counted and what it recognised', async () => {
    const { code, stdout } = await run(folder, 'degree-days', weather, '--method', 'threshold');
    expect(code).toBe(0);
    const text = stdout.replace(/\s+/g, ' ');
    expect(text).toContain('18 °C (European statistics)');
    expect(text).toContain('temperature: column 2');
    expect(stdout).toMatch(/│ December +│ +[\d.]+ │\n│ Year +│ +\d\u202f\d{3}\.\d │/);
  });

  it('reads a file as its settings say, and names both files', async () => {
    const hours = temperature.map((t) => `${t.toFixed(1).replace('.', ',')}`).join('\n');
    writeFileSync(join(folder, 'plain.txt'), `remark\nremark\n${hours}\n`);
    writeFileSync(
      join(folder, 'read.yaml'),
      'skipLines: 2\nheader: false\ndecimal: comma\ndelimiter: semicolon\ncolumns: { temperature: 1 }\n',
    );
    const { annual, inputs } = await jsonOf('plain.txt', '--base', '10', '--read', 'read.yaml');
    const expected = temperature.reduce((sum, t) => sum + Math.max(0, 10 - t), 0) / 24;
    expect(Math.abs(annual - expected)).toBeLessThan(1e-6);
    expect(inputs.map(({ role }: { role: string }) => role).sort()).toEqual(['read', 'weather']);
  });

  it('tells of what is wrong with file and settings at once, with exit code 2', async () => {
    writeFileSync(join(folder, 'wrong.yaml'), 'skipLine: 2\n');
    const { code, stdout, stderr } = await run(folder, 'degree-days', 'nix.csv', '--read', 'wrong.yaml');
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('wrong.yaml:1:1  skipLine');
    expect(stderr).toContain('nix.csv  there is no such file');
  });

  it('refuses to write over the weather file', async () => {
    const { code, stderr } = await run(folder, 'degree-days', weather, '--json', weather);
    expect(code).toBe(2);
    expect(stderr).toContain('read as an input');
  });
});
