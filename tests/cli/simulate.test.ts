import { copyFileSync, existsSync, linkSync, mkdirSync, readFileSync, symlinkSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import Papa from 'papaparse';
import { beforeAll, describe, expect, it } from 'vitest';
import { resultSchema } from '../../src/report/resultSchema.ts';
import { type Ended, folderWithDemo, namesIn, PROBLEM_SHAPE, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';
const at = (name: string) => join(folder, name);
const textOf = (name: string) => readFileSync(at(name), 'utf8');

/** The house of the demo with one passage replaced, beside the original. */
function changedHouse(name: string, passage: string, by: string): string {
  const text = textOf(house);
  expect(text.split(passage).length).toBe(2);
  writeFileSync(at(`data/demo/${name}`), text.replace(passage, by));
  return `data/demo/${name}`;
}

/** Wrong input: exit code 2, nothing on standard output, problems of two lines, no stack, nothing written. */
async function refused(scenario: string): Promise<string> {
  const before = namesIn(folder);
  const { code, stdout, stderr } = await run(folder, 'simulate', scenario, '--json', 'r.json', '--hourly', 'h.csv');
  expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
  expect(stderr).toMatch(PROBLEM_SHAPE);
  expect(stderr).not.toMatch(STACK_LINE);
  expect(namesIn(folder)).toEqual(before);
  return stderr;
}

describe('simulate on the demo', () => {
  let printed: Ended;
  beforeAll(async () => {
    printed = await run(folder, 'simulate', house, '--json', 'one.json', '--hourly', 'one.csv');
  });

  it('prints the answer and nothing on standard error', () => {
    expect({ code: printed.code, stderr: printed.stderr }).toEqual({ code: 0, stderr: '' });
    expect(printed.stdout).toContain('a seasonal factor H4 of');
    for (const line of printed.stdout.split('\n')) expect([...line].length).toBeLessThanOrEqual(80);
  });

  it('writes a document that the result schema accepts', () => {
    const document = JSON.parse(textOf('one.json'));
    expect(resultSchema.safeParse(document).error).toBeUndefined();
    expect(document.inputs.length).toBe(8);
    expect(document.costs.length).toBe(4);
  });

  it('writes a row an hour, and a header that names the unit of every quantity', () => {
    const { data } = Papa.parse<string[]>(textOf('one.csv'), { skipEmptyLines: true });
    expect(data.length).toBe(8761);
    expect(new Set(data.map((row) => row.length)).size).toBe(1);
    for (const name of data[0]!.slice(3)) expect(name).toMatch(/^[a-z][A-Za-z]+ \[.+\]$/);
  });

  it('gives the same bytes again, with nothing but JSON on standard output when that is asked for', async () => {
    const again = await run(folder, 'simulate', house, '--json', '-', '--hourly', 'two.csv');
    expect({ code: again.code, stderr: again.stderr }).toEqual({ code: 0, stderr: '' });
    expect(again.stdout).toBe(textOf('one.json'));
    expect(textOf('two.csv')).toBe(textOf('one.csv'));
  });

  it('leaves no passing file behind', () => {
    expect(namesIn(folder)).toEqual(expect.arrayContaining(['data', 'one.csv', 'one.json']));
    expect(namesIn(folder).filter((name) => name.endsWith('.tmp'))).toEqual([]);
  });

  it('talks of warnings on standard error only', async () => {
    // At 900 W/K the unit is far too small: a warning, no fault.
    const scenario = changedHouse('leaky.yaml', 'value: 195', 'value: 900');
    const { code, stdout } = await run(folder, 'simulate', scenario, '--json', '-');
    expect(code).toBe(0);
    expect(JSON.parse(stdout).warnings.length).toBeGreaterThan(0);
  });
});

describe('simulate on wrong input', () => {
  it('tells of a scenario that is not there', async () => {
    expect(await refused('nix.yaml')).toContain('nix.yaml  there is no such file');
  });

  it('tells of a folder', async () => {
    expect(await refused('data')).toContain('data  this is a folder, not a file');
  });

  it('tells of an empty file', async () => {
    writeFileSync(at('empty.yaml'), '');
    expect(await refused('empty.yaml')).toContain('empty.yaml  the file is empty');
  });

  it('tells of a file that is no text', async () => {
    writeFileSync(
      at('picture.yaml'),
      Uint8Array.from({ length: 300 }, (_, i) => i % 7),
    );
    expect(await refused('picture.yaml')).toContain('picture.yaml');
  });

  it('tells of a bracket that is not closed, with its line', async () => {
    const scenario = changedHouse('bracket.yaml', 'circulation: { pumpPower: 35 }', 'circulation: { pumpPower: 35');
    expect(await refused(scenario)).toMatch(/^data\/demo\/bracket\.yaml:\d+:\d+ {2}/);
  });

  it('tells of a mistyped key with line, column and the nearest name', async () => {
    const scenario = changedHouse('key.yaml', 'floorArea: 138', 'florArea: 138');
    const line =
      textOf(scenario)
        .split('\n')
        .findIndex((text) => text.includes('florArea')) + 1;
    const problem = await refused(scenario);
    expect(problem).toContain(`data/demo/key.yaml:${line}:3  house.florArea`);
    expect(problem).toContain('floorArea');
  });

  it('tells of all faults of all files at once', async () => {
    const scenario = changedHouse('many.yaml', 'value: 195', 'value: -195');
    writeFileSync(at(scenario), textOf(scenario).replace('tariffs/night.yaml', 'tariffs/nowhere.yaml'));
    const problem = await refused(scenario);
    expect(problem).toMatch(/many\.yaml:\d+:\d+ {2}house\.heatLoss\.value is -195/);
  });

  it('tells where a missing weather file is named', async () => {
    const scenario = changedHouse('sky.yaml', 'file: weather.csv', 'file: sky.csv');
    const problem = await refused(scenario);
    expect(problem).toMatch(/sky\.csv/);
    expect(problem).toContain('weather.file');
  });

  it('tells of a weather file of which the end is missing', async () => {
    const lines = textOf('data/demo/weather.csv').split('\n').slice(0, 5000);
    writeFileSync(at('data/demo/short.csv'), `${lines.join('\n')}\n`);
    expect(await refused(changedHouse('short.yaml', 'file: weather.csv', 'file: short.csv'))).toContain('short.csv');
  });

  it('shows control characters of a file as escapes', async () => {
    const scenario = changedHouse('bell.yaml', 'floorArea: 138', '"floor\\u001b[31mArea": 138');
    expect(await refused(scenario)).toContain('\\u001b[31m');
  });
});

describe('simulate and its outputs', () => {
  it('refuses to write over its scenario, also by a link, and leaves it alone', async () => {
    const scenario = 'data/demo/mine.yaml';
    copyFileSync(at(house), at(scenario));
    symlinkSync('mine.yaml', at('data/demo/soft.yaml'));
    linkSync(at(scenario), at('data/demo/hard.yaml'));
    for (const output of [scenario, 'data/demo/soft.yaml', 'data/demo/hard.yaml']) {
      const { code, stdout, stderr } = await run(folder, 'simulate', scenario, '--json', output);
      expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
      expect(stderr).toContain(`${output}  the result would be written over this file, which is read as an input`);
      expect(textOf(scenario)).toBe(textOf(house));
    }
    expect(namesIn(at('data/demo')).filter((name) => name.endsWith('.tmp'))).toEqual([]);
  });

  it('refuses to write over a weather file that the scenario names', async () => {
    const before = textOf('data/demo/weather.csv');
    const { code } = await run(folder, 'simulate', house, '--hourly', 'data/demo/weather.csv');
    expect(code).toBe(2);
    expect(textOf('data/demo/weather.csv')).toBe(before);
  });

  it('tells of an output that cannot be written before it looks at the scenario, with exit code 3', async () => {
    mkdirSync(at('inner'), { recursive: true });
    const { code, stdout, stderr } = await run(
      folder,
      'simulate',
      'nix.yaml',
      '--json',
      'none/r.json',
      '--hourly',
      'inner',
    );
    expect({ code, stdout }).toEqual({ code: 3, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('none/r.json  the file cannot be written: its folder does not exist');
    expect(stderr).toContain('inner  a result cannot be written here: this is a folder');
    expect(existsSync(at('none'))).toBe(false);
  });
});
