import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { explainSchema } from '../../src/report/explainSchema.ts';
import { folderWithDemo, namesIn, PROBLEM_SHAPE, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';
const at = (name: string) => join(folder, name);
const explain = (time: string, ...more: string[]) => run(folder, 'explain', house, '--at', time, ...more);

describe('explain on the demo', () => {
  it('prints the chain of the hour in the order of the model, within 80 columns', async () => {
    const { code, stdout, stderr } = await explain('2025-01-14T06:00');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    const titles = [
      'Outdoor air',
      'Need of the rooms',
      'Hot water',
      'Flow temperature',
      'Map of the unit',
      'Frost loss',
    ];
    const places = [...titles, 'Backup', 'Pump, standby', 'Electricity and fuel', 'Cost and carbon'].map((title) =>
      stdout.indexOf(`\n${title}`),
    );
    expect(places).toEqual([...places].sort((a, b) => a - b));
    expect(places[0]).toBeGreaterThan(0);
    for (const line of stdout.split('\n')) expect([...line].length, line).toBeLessThanOrEqual(80);
  });

  it('can be checked by hand: 195 W/K from base to outdoor temperature', async () => {
    const { stdout } = await explain('2025-01-14T06:00');
    const shown = (label: string) =>
      Number(new RegExp(`^  ${label} +(\\S+)`, 'm').exec(stdout)?.[1]?.replace('−', '-'));
    expect(shown('heat loss')).toBe(195);
    const byHand = 0.195 * (shown('base temperature') - shown('outdoor temperature'));
    // figures of six digits: a few units of the sixth
    expect(Math.abs(byHand / shown('space-heat need Q') - 1)).toBeLessThan(1e-5);
  });

  it('has the same digits as the hourly table of simulate', async () => {
    const { stdout } = await explain('2025-01-14T06:00', '--json', '-');
    const { stages } = explainSchema.parse(JSON.parse(stdout));
    const simulated = await run(folder, 'simulate', house, '--hourly', 'hours.csv');
    expect(simulated.code).toBe(0);
    const [header = '', ...rows] = readFileSync(at('hours.csv'), 'utf8').split('\n');
    const cells = rows.find((row) => row.startsWith('2025-01-14T06:00'))!.split(',');
    const byName = new Map(header.split(',').map((name, i) => [name.replace(/ \[.*/, ''), cells[i]]));
    const figures = stages.flatMap((stage) => stage.figures).filter(({ name }) => byName.has(name));
    expect(figures.length).toBeGreaterThan(20);
    for (const { name, value } of figures) expect(String(value), name).toBe(byName.get(name));
  });

  it('writes the same document to a file and to standard output', async () => {
    const { code, stdout } = await explain('2025-07-01T12:00', '--json', 'hour.json');
    expect(code).toBe(0);
    expect(stdout).toContain('One hour of');
    const printed = await explain('2025-07-01T12:00', '--json', '-');
    expect(readFileSync(at('hour.json'), 'utf8')).toBe(printed.stdout);
  });

  it('takes an offset at its word, and a time within an hour as that hour, and says so', async () => {
    const plain = await explain('2025-07-01T12:00');
    expect((await explain('2025-07-01T10:00Z')).stdout).toBe(plain.stdout);
    const within = await explain('2025-07-01T12:40');
    expect(within.code).toBe(0);
    expect(within.stdout.replace(/\s+/g, ' ')).toContain('2025-07-01T12:40 lies within this hour');
  });
});

describe('explain refuses', () => {
  it.each([
    ['2025-10-26T02:00', '2025-10-26T02:00+02:00 for the first or 2025-10-26T02:00+01:00 for the second'],
    ['2025-03-30T02:00', 'the hour after it is 2025-03-30T03:00'],
    ['2024-01-14T06:00', 'not in the calendar year of the scenario, 2025'],
    ['2026-01-01T00:30+01:00', 'not in the calendar year of the scenario, 2025'],
    ['2025-01-01T00:30+02:00', 'not among the simulated hours'],
    ['tomorrow', 'no date with a time of day'],
  ])('the time %s, in two lines, and writes nothing', async (time, says) => {
    const before = namesIn(folder);
    const { code, stdout, stderr } = await explain(time, '--json', 'never.json');
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain(says);
    expect(namesIn(folder)).toEqual(before);
  });

  it('to guess the hour', async () => {
    const { code, stdout, stderr } = await run(folder, 'explain', house);
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('--at TIME is missing');
  });

  it('a scenario with faults', async () => {
    const text = readFileSync(at(house), 'utf8');
    writeFileSync(at('data/demo/wrong.yaml'), text.replace('value: 195', 'value: -195'));
    const { code, stdout, stderr } = await run(folder, 'explain', 'data/demo/wrong.yaml', '--at', '2025-01-14T06:00');
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).not.toMatch(STACK_LINE);
    expect(stderr).toContain('wrong.yaml:');
  });

  it('to write its result over the scenario, or into a folder', async () => {
    const over = await explain('2025-01-14T06:00', '--json', house);
    expect(over.code).toBe(2);
    expect(over.stderr).toContain('the result would be written over this file');
    expect(readFileSync(at(house), 'utf8')).toContain('INVENTED');
    const folderAsFile = await explain('2025-01-14T06:00', '--json', 'data');
    expect(folderAsFile.code).toBe(3);
    expect(existsSync(at('data/demo'))).toBe(true);
  });
});
