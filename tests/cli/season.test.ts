import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { seasonSchema } from '../../src/report/seasonSchema.ts';
import { folderWithDemo, namesIn, PROBLEM_SHAPE, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();
const unit = 'data/demo/units/quarkenfels-8.yaml';
const at = (name: string) => join(folder, name);

/** The unit of the demo with one passage replaced, beside the original. */
function changedUnit(name: string, passage: string, by: string): string {
  const text = readFileSync(at(unit), 'utf8');
  expect(text.split(passage).length).toBe(2);
  writeFileSync(at(`data/demo/units/${name}`), text.replace(passage, by));
  return `data/demo/units/${name}`;
}

describe('season on the unit of the demo', () => {
  it('prints the answer for every declared season, within 80 columns, and nothing on standard error', async () => {
    const { code, stdout, stderr } = await run(folder, 'season', unit);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toContain('Average climate, 35 °C');
    expect(stdout).toContain('Average climate, 55 °C');
    expect(stdout).not.toContain('bin by bin');
    for (const line of stdout.split('\n')) expect([...line].length).toBeLessThanOrEqual(80);
  });

  it('has a label that fits its map and its own points, as the file says', async () => {
    const { stdout } = await run(folder, 'season', unit, '--json', '-');
    const { seasons } = seasonSchema.parse(JSON.parse(stdout));
    expect(seasons).toHaveLength(2);
    for (const { comparison } of seasons) {
      expect(comparison.map).toMatchObject({ against: 'label', agrees: true });
      expect(comparison.points).toMatchObject({ against: 'label', agrees: true });
    }
  });

  it('rates the chosen climate and application alone, and shows bins when asked', async () => {
    const { code, stdout } = await run(folder, 'season', unit, '--climate', 'colder', '--application', '35', '--bins');
    expect(code).toBe(0);
    expect(stdout).toContain('Colder climate, 35 °C (low temperature): bin by bin');
    expect(stdout).not.toContain('Average climate');
  });

  it('writes the same document to a file and to standard output', async () => {
    const { code, stdout } = await run(folder, 'season', unit, '--json', 'label.json');
    expect(code).toBe(0);
    expect(stdout).toContain('Label check');
    const printed = await run(folder, 'season', unit, '--json', '-');
    expect(readFileSync(at('label.json'), 'utf8')).toBe(printed.stdout);
  });
});

describe('season refuses', () => {
  it('what is wrong in the file, with its line and its cure, and writes nothing', async () => {
    const before = namesIn(folder);
    const wrong = changedUnit('wrong.yaml', 'capacity: 6.5, cop: 2.98', 'capacity: 6.5, cop: 9.8');
    const { code, stdout, stderr } = await run(folder, 'season', wrong, '--json', 'wrong.json');
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('a COP of 9.80 is more than physics allows');
    expect(stderr).not.toMatch(STACK_LINE);
    expect(namesIn(folder)).toEqual(before);
  });

  it('a season without outlet temperatures, naming those that are known', async () => {
    const { code, stderr } = await run(folder, 'season', unit, '--climate', 'warmer', '--application', '45');
    expect(code).toBe(2);
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('known are average 35, 45, 55, 65 °C');
  });

  it('an application that no label knows', async () => {
    const { code, stdout, stderr } = await run(folder, 'season', unit, '--application', '50');
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
  });

  it('to write its result over the unit', async () => {
    const { code, stderr } = await run(folder, 'season', unit, '--json', unit);
    expect(code).toBe(2);
    expect(stderr).toContain('the result would be written over this file');
    expect(readFileSync(at(unit), 'utf8')).toContain('INVENTED');
  });
});

it('a map that disagrees with its label is told, and is no failure', async () => {
  const off = changedUnit('off.yaml', 'scop: 4.18', 'scop: 4.9');
  const { code, stdout } = await run(folder, 'season', off);
  expect(code).toBe(0);
  expect(stdout.replace(/\s+/g, ' ')).toContain('Map and label do NOT agree');
});

it('a label does not change what simulate finds, nor what it names as assumed', async () => {
  const text = readFileSync(at(unit), 'utf8');
  const labelled = await run(folder, 'simulate', 'data/demo/house.yaml', '--json', '-');
  const { assumptions: with_, annual } = JSON.parse(labelled.stdout);
  writeFileSync(at(unit), text.slice(0, text.indexOf('\nlabel:')));
  const bare = await run(folder, 'simulate', 'data/demo/house.yaml', '--json', '-');
  writeFileSync(at(unit), text.replace('  reversible: false\n', ''));
  const defaulted = await run(folder, 'simulate', 'data/demo/house.yaml', '--json', '-');
  writeFileSync(at(unit), text);
  for (const { code, stdout } of [bare, defaulted]) {
    expect(code).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({ annual, assumptions: with_ });
  }
});
