import { cpSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { folderWithDemo, namesIn, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();
const at = (...names: string[]) => join(folder, ...names);
const textOf = (name: string) => readFileSync(at(name), 'utf8');

writeFileSync(
  at('data/demo/small.yaml'),
  [
    'name: Small',
    'scenario: house.yaml',
    'axes:',
    '  - { given: values, name: loss, path: house.heatLoss.value, values: [120, 200, -5] }',
    '  - { given: values, name: unit, path: heatPump.unit, values: [units/quarkenfels-8.yaml, units/hollerwisch-6.yaml] }',
    '',
  ].join('\n'),
);

beforeAll(async () => {
  await run(folder, 'batch', 'data/demo/small.yaml', '--out', 'small');
  for (const k of [1, 2]) await run(folder, 'batch', 'data/demo/small.yaml', '--out', `part${k}`, '--shard', `${k}/2`);
  await run(folder, 'gather', 'part1', 'part2', '--out', 'gathered');
}, 120_000);

/** A copy of the results with one of its files changed. */
function changed(name: string, file: string, change: (text: string) => string): string {
  cpSync(at('small'), at(name), { recursive: true });
  writeFileSync(at(name, file), change(textOf(join(name, file))));
  return name;
}

async function refused(...words: string[]): Promise<string> {
  const { code, stdout, stderr } = await run(folder, 'report', ...words, '--out', 'never.html');
  expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
  expect(stderr).toMatch(/^\S.*\n {4}→ \S.*\n$/);
  expect(stderr).not.toMatch(STACK_LINE);
  expect(namesIn(folder).filter((name) => name === 'never.html' || name.endsWith('.tmp'))).toEqual([]);
  return stderr;
}

describe('report on the results of a batch', () => {
  it('writes one page and says its answer, the same bytes each time', async () => {
    const { code, stdout, stderr } = await run(folder, 'report', 'small', '--out', 'small.html');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toContain('one house × 6 options = 6 years');
    expect(stdout).toContain('2 years failed');
    expect(textOf('small.html')).toMatch(/^<!doctype html>\n<html lang="en">/);
    expect(textOf('small.html')).toContain('Medians by loss and unit');
    expect((await run(folder, 'report', 'small', '--out', '-')).stdout).toBe(textOf('small.html'));
  });

  it('has the figures of the results, and what they rest on', () => {
    const page = textOf('small.html');
    const costs = textOf('small/results.jsonl')
      .trimEnd()
      .split('\n')
      .flatMap((line) => (JSON.parse(line).tariffs ?? []).slice(0, 1))
      .map(({ systemTotal }: { systemTotal: number }) =>
        Math.round(systemTotal)
          .toString()
          .replace(/\B(?=\d{3}$)/, '\u202f'),
      );
    expect(costs).toHaveLength(4);
    // A home, and an option in each cell: the medians are the figures themselves.
    const drawn = [...page.matchAll(/class="mid on-(?:dark|light)">([^<]*)</g)].map(([, text]) => text);
    expect(drawn).toEqual(costs);
    const { inputs } = JSON.parse(textOf('small/manifest.json'));
    expect(inputs.length).toBeGreaterThan(5);
    for (const { sha256 } of inputs) expect(page).toContain(sha256);
    expect(page).toContain('house.heatLoss.value is -5');
  });

  it('is that of the whole when its parts were gathered', async () => {
    await run(folder, 'report', 'gathered', '--out', 'gathered.html');
    expect(textOf('gathered.html')).toBe(textOf('small.html'));
  });

  it('speaks of another figure, other axes and another language where that is asked for', async () => {
    const words = ['--by', 'seasonalFactor', '--axes', 'unit,loss', '--language', 'de', '--date', '2025-03-31'];
    const { code, stdout } = await run(folder, 'report', 'small', '--out', 'klein.html', ...words);
    expect(code).toBe(0);
    expect(stdout.replaceAll('\n', ' ')).toContain('Im Median am besten nach Jahresarbeitszahl H4');
    expect(textOf('klein.html')).toContain('Mediane nach unit und loss');
    expect(textOf('klein.html')).toContain('Datum: 2025-03-31');
  });

  it('of a part says which it is', async () => {
    const { code, stdout } = await run(folder, 'report', 'part1', '--out', 'part.html');
    expect(code).toBe(0);
    expect(stdout.replaceAll('\n', ' ')).toContain('part 1/2.');
  });

  it('is printed by a browser', async () => {
    const { code, stderr } = await run(folder, 'report', 'small', '--out', 'p.html', '--pdf', 'p.pdf');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(readFileSync(at('p.pdf')).toString('latin1', 0, 5)).toBe('%PDF-');
  });
});

describe('report on what is no finished batch', () => {
  it('refuses a folder without results, and one that is not finished', async () => {
    expect(await refused('data')).toMatch(/^data {2}the folder holds no finished results of a batch\n/);
    cpSync(at('small'), at('unfinished'), { recursive: true });
    mkdirSync(at('unfinished/work'));
    writeFileSync(at('unfinished/manifest.json'), '{');
    expect(await refused('unfinished')).toMatch(/^unfinished {2}the folder holds no finished results of a batch\n/);
  });

  it.each([
    [
      'a line that is none',
      (text: string) => text.replace('{"job":3', '{"jab":3'),
      ':3  these results are not what their manifest says: this line is no year of it',
    ],
    [
      'a line twice',
      (text: string) => text.replace(/^(.*\n)/, '$1$1'),
      ':2  these results are not what their manifest says: this line is no year of it',
    ],
    ['a year beyond the last', (text: string) => text.replace('{"job":6', '{"job":7'), ':6  these results'],
    ['too few lines', (text: string) => text.replace(/^.*\n/, ''), 'there are 5 years in place of 6'],
    ['a last line cut off', (text: string) => text.slice(0, -9), 'there are 5 years in place of 6'],
    ['nothing', () => '', 'there are 0 years in place of 6'],
  ])('refuses results with %s', async (what, change, says) => {
    const name = changed(what.replaceAll(' ', '-'), 'results.jsonl', change);
    const told = await refused(name);
    expect(told).toContain(`${name}/results.jsonl`);
    expect(told).toContain(says);
    expect(told).toContain('→ take the folder as it was written, or run the batch again into an empty one');
    expect((await run(folder, 'rank', name)).stderr).toBe(told);
  });

  it('refuses a manifest that does not hold together', async () => {
    const name = changed('other-sizes', 'manifest.json', (text) => text.replace('"options": 6', '"options": 5'));
    expect(await refused(name)).toContain('other-sizes/manifest.json  these results are not what their manifest says');
  });

  it('refuses to write over the results', async () => {
    const { code, stderr } = await run(folder, 'report', 'small', '--out', 'small/summary.csv');
    expect(code).toBe(2);
    expect(stderr).toContain('would be written over this file');
    expect(textOf('small/summary.csv')).toMatch(/^figure,/);
  });

  it('refuses axes that are not there, and options of a batch for a scenario', async () => {
    expect(await refused('small', '--axes', 'los,unit')).toContain("--axes is 'los,unit'; perhaps loss is meant");
    expect(await refused('small', '--axes', 'loss')).toContain('it is two of loss, unit with a comma between them');
    expect(await refused('small', '--axes', 'loss,loss')).toContain('it is two of loss, unit');
    expect(await refused('small', '--by', 'beauty')).toContain('beauty');
    expect(await refused('data/demo/house.yaml', '--by', 'cost')).toContain('--by is for the results of a batch');
    expect(await refused('data/demo/house.yaml', '--axes', 'a,b')).toContain('--axes is for the results of a batch');
    expect(existsSync(at('never.html'))).toBe(false);
  });
});
