import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { folderWithDemo, PROBLEM_SHAPE, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();

describe('check', () => {
  it('says what each file was taken for, and is done with exit code 0 when all are in order', async () => {
    const files = ['house.yaml', 'units/hollerwisch-6.yaml', 'tariffs/night.yaml', 'tariffs/prices.csv'];
    writeFileSync(join(folder, 'read.yaml'), 'skipLines: 2\n');
    const { code, stdout, stderr } = await run(
      folder,
      'check',
      ...files.map((file) => `data/demo/${file}`),
      'read.yaml',
    );
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    const verdicts = stdout.split('\n').filter((line) => /^\S/.test(line));
    expect(verdicts).toEqual([
      'data/demo/house.yaml  taken for a scenario: in order',
      'data/demo/units/hollerwisch-6.yaml  taken for a heat-pump unit: in order',
      'data/demo/tariffs/night.yaml  taken for a tariff: in order',
      'data/demo/tariffs/prices.csv  taken for a price series: in order',
      'read.yaml  taken for read settings: in order',
    ]);
  });

  it('knows the tables of a meter, of readings, of carbon and of homes by their headers', async () => {
    writeFileSync(join(folder, 'meter.csv'), 'time,kWh\n2025-01-01T00:00Z,0.3\n2025-01-01T01:00Z,0.2\n');
    writeFileSync(join(folder, 'carbon.csv'), 'time,carbon g/kWh\n2025-01-01T00:00Z,400\n2025-01-01T01:00Z,300\n');
    const { code, stdout, stderr } = await run(
      folder,
      ...['check', 'meter.csv', 'carbon.csv', 'data/demo/meter.csv', 'data/demo/homes.csv'],
    );
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout.split('\n').filter((line) => /^\S/.test(line))).toEqual([
      'meter.csv  taken for the meter of a household: in order',
      'carbon.csv  taken for carbon factors of electricity: in order',
      'data/demo/meter.csv  taken for meter readings: in order',
      'data/demo/homes.csv  taken for a table of homes: in order',
    ]);
    writeFileSync(join(folder, 'homes.csv'), 'home,house.heatLos.value\nA,1\n');
    writeFileSync(join(folder, 'rows.csv'), 'home,house.heatLoss.value\nA,1\nB\nC,2,3\n');
    const wrong = await run(folder, 'check', 'homes.csv', 'rows.csv');
    expect(wrong.code).toBe(2);
    expect(wrong.stderr).toContain("homes.csv:1:6  column 'house.heatLos.value' is no place in a scenario");
    expect(wrong.stderr).toContain('rows.csv:3  cells in this row: 1; names of columns: 2');
    expect(wrong.stderr).toContain('rows.csv:4  cells in this row: 3;');
  });

  it('lists the faults of every file, goes on behind a bad one, and ends with exit code 2', async () => {
    writeFileSync(join(folder, 'tariff.yaml'), 'name: x\nrates: [{ name: all, prize: 0.3 }]\n');
    const files = ['nix.yaml', 'tariff.yaml', 'data', 'data/demo/weather.csv'];
    const { code, stdout, stderr } = await run(folder, 'check', ...files);
    expect(code).toBe(2);
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).not.toMatch(STACK_LINE);
    expect(stderr).toContain('nix.yaml  there is no such file');
    expect(stderr).toMatch(/tariff\.yaml:2:\d+ {2}rates\[0\]\.prize/);
    expect(stderr).toContain('data  this is a folder, not a file');
    expect(stdout).toContain('nix.yaml  not recognised: 1 fault\n');
    expect(stdout).toMatch(/tariff\.yaml {2}taken for a tariff: \d faults?\n/);
    expect(stdout).toContain('data/demo/weather.csv  taken for weather: in order\n');
    expect(stdout).toContain('    temperature: column 2');
  });

  it('lists the faults of a scenario and of all that it names in one run', async () => {
    const house = readFileSync(join(folder, 'data/demo/house.yaml'), 'utf8');
    writeFileSync(
      join(folder, 'data/demo/many.yaml'),
      house
        .replace('pumpPower: 35', 'pumpPower: -1')
        .replace('Europe/Berlin', 'Europe/Berln')
        .replace('units/quarkenfels-8.yaml', 'units/none.yaml')
        .replace('file: weather.csv', 'file: wether.csv')
        .replace('return: 42', 'return: 52'),
    );
    const { code, stderr } = await run(folder, 'check', 'data/demo/many.yaml');
    expect(code).toBe(2);
    expect(stderr).toMatch(PROBLEM_SHAPE);
    const told = stderr.split('\n').filter((line) => /^\S/.test(line));
    expect(told).toEqual([
      expect.stringMatching(/many\.yaml:\d+:9 {2}.*Europe\/Berln/),
      expect.stringMatching(
        /many\.yaml:\d+:9 {2}flowTemperature\.flow is 50 °C; it must lie above the return temperature/,
      ),
      expect.stringMatching(/many\.yaml:\d+:27 {2}circulation\.pumpPower is -1/),
      expect.stringMatching(/units\/none\.yaml:.* {2}there is no such file/),
      expect.stringMatching(/wether\.csv:.* {2}there is no such file/),
    ]);
  });
});
