import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { folderWithDemo, run } from './program.ts';

const folder = folderWithDemo();
const inFolder = (...names: string[]) => join(folder, ...names);

writeFileSync(
  inFolder('data/demo/small.yaml'),
  [
    'name: Small',
    'scenario: house.yaml',
    'axes:',
    '  - { given: values, name: loss, path: house.heatLoss.value, values: [120, 200, -5] }',
    '  - { given: values, name: unit, path: heatPump.unit, values: [units/quarkenfels-8.yaml, units/hollerwisch-6.yaml] }',
    '',
  ].join('\n'),
);

interface Row {
  job: number;
  axes: { loss: number; unit: string };
  figures?: Record<string, number>;
  tariffs?: { systemTotal: number }[];
}
let rows: Row[] = [];

beforeAll(async () => {
  await run(folder, 'batch', 'data/demo/small.yaml', '--out', 'small');
  rows = readFileSync(inFolder('small/results.jsonl'), 'utf8')
    .trimEnd()
    .split('\n')
    .map((line) => JSON.parse(line) as Row);
}, 120_000);

const ranked = async (...words: string[]) => {
  const { code, stdout } = await run(folder, 'rank', 'small', ...words, '--json', '-');
  expect(code).toBe(0);
  return JSON.parse(stdout);
};

describe('a ranking of a batch', () => {
  it('has the rows with the least cost first, and the most last, of those that have one', async () => {
    const costs = rows.flatMap(({ job, tariffs }) => (tariffs === undefined ? [] : [[tariffs[0]!.systemTotal, job]]));
    const sorted = costs.toSorted((a, b) => a[0]! - b[0]!);
    const { bestRows, worstRows, rows: count, unranked, spread } = await ranked('--top', '2');
    expect({ count, unranked }).toEqual({ count: 6, unranked: 2 });
    expect(bestRows.map(({ value, job }: Record<string, number>) => [value, job])).toEqual(sorted.slice(0, 2));
    expect(worstRows.map(({ value, job }: Record<string, number>) => [value, job])).toEqual(
      sorted.toReversed().slice(0, 2),
    );
    expect(spread).toMatchObject({ count: 4, least: sorted[0]![0], most: sorted[3]![0] });
  });

  it.each([
    ['carbon', 'carbonHeatPump', 1],
    ['seasonalFactor', 'h4', -1],
    ['backupHours', 'backupHours', 1],
  ])('by %s looks at %s', async (by, figure, sign) => {
    const values = rows.flatMap(({ figures }) => (figures === undefined ? [] : [figures[figure]!]));
    const { bestRows, figure: named } = await ranked('--by', by, '--top', '4');
    expect(named).toBe(figure);
    expect(bestRows.map(({ value }: Record<string, number>) => value)).toEqual(
      values.toSorted((a, b) => sign * (a - b)),
    );
  });

  it('sets the values of one axis side by side where it is asked for', async () => {
    const { axes } = await ranked('--axis', 'loss');
    expect(axes).toHaveLength(1);
    expect(axes[0].values.map(({ value, count }: Record<string, number>) => [value, count])).toEqual([
      [120, 2],
      [200, 2],
    ]);
  });

  it('is printed as tables', async () => {
    const { code, stdout, stderr } = await run(folder, 'rank', 'small', '--by', 'seasonalFactor');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toMatch(/^Seasonal factor H4: 4 years, the most first\n/);
    expect(stdout).toContain('2 years have no such figure and are left out.');
    for (const part of ['Best\n', 'Worst\n', 'By loss\n', 'By unit\n', 'Median']) expect(stdout).toContain(part);
  });

  it('is refused without results, and for an axis that is not there', async () => {
    expect(await run(folder, 'rank', 'data')).toMatchObject({
      code: 2,
      stderr: expect.stringMatching(/^data {2}the folder holds no finished results of a batch\n/),
    });
    expect((await run(folder, 'rank', 'small', '--axis', 'los')).stderr).toContain(
      "--axis is 'los'; perhaps loss is meant",
    );
    expect((await run(folder, 'rank', 'small', '--top', '0')).stderr).toContain("--top is '0'; it is a whole number");
    expect((await run(folder, 'rank', 'small', '--by', 'beauty')).code).toBe(2);
  });
});
