import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { folderWithDemo, run } from './program.ts';

const folder = folderWithDemo();
const RESULTS = ['manifest.json', 'results.csv', 'results.jsonl', 'summary.csv'];
const inFolder = (...names: string[]) => join(folder, ...names);
const bytesOf = (out: string) => RESULTS.map((name) => readFileSync(inFolder(out, name), 'utf8'));

writeFileSync(
  inFolder('data/demo/loss.yaml'),
  'name: T\nscenario: house.yaml\naxes: [{ given: range, name: loss, path: house.heatLoss.value, from: -2, to: 217, step: 1 }]\n',
);
writeFileSync(
  inFolder('data/demo/other.yaml'),
  'name: O\nscenario: house.yaml\naxes: [{ given: range, name: loss, path: house.heatLoss.value, from: 1, to: 100, step: 1 }]\n',
);

beforeAll(async () => {
  // 220 years with a loss of −2, −1 and 0 among them, in chunks of 50: parts of 50, 50, 50 and 70 years
  await run(folder, 'batch', 'data/demo/loss.yaml', '--out', 'whole');
  for (const k of [1, 2, 3, 4])
    await run(folder, 'batch', 'data/demo/loss.yaml', '--out', `part${k}`, '--shard', `${k}/4`);
  await run(folder, 'batch', 'data/demo/other.yaml', '--out', 'other', '--shard', '1/4');
}, 120_000);

describe('the parts of a batch', () => {
  it('are joined to the bytes of the whole, in whatever order they are named', async () => {
    const { code, stdout, stderr } = await run(folder, 'gather', 'part3', 'part1', 'part4', 'part2', '--out', 'joined');
    expect({ code, stderr }).toEqual({ code: 1, stderr: '' });
    expect(stdout).toContain('220 years of 4 parts, 3 of them with a problem');
    expect(bytesOf('joined')).toEqual(bytesOf('whole'));
    expect(existsSync(inFolder('joined/gathering'))).toBe(false);
  });

  it('that are missing are named, with their years', async () => {
    const { code, stdout, stderr } = await run(folder, 'gather', 'part1', 'part3', '--out', 'some');
    expect(code).toBe(1);
    expect(stdout).toContain('100 years of 2 parts');
    expect(stderr).toBe(
      'some  part 2/4 is missing: the years 51 to 100\n    → run it with --shard 2/4, and gather again\n' +
        'some  part 4/4 is missing: the years 151 to 220\n    → run it with --shard 4/4, and gather again\n',
    );
    const manifest = JSON.parse(readFileSync(inFolder('some/manifest.json'), 'utf8'));
    expect(manifest).toMatchObject({ missing: ['2/4', '4/4'], rows: 100, failed: 3, jobs: 220 });
    const whole = readFileSync(inFolder('whole/results.csv'), 'utf8').split('\n');
    const some = readFileSync(inFolder('some/results.csv'), 'utf8').split('\n');
    expect(some).toEqual([...whole.slice(0, 51), ...whole.slice(101, 151), '']);
  });

  it('may be gathered again when they are there', async () => {
    await run(folder, 'gather', 'part1', 'part2', 'part3', 'part4', '--out', 'some');
    expect(bytesOf('some')).toEqual(bytesOf('whole'));
  });

  it('are refused when they belong to different batches, are named twice, or are none', async () => {
    const { code, stderr } = await run(folder, 'gather', 'part1', 'other', '--out', 'never');
    expect(code).toBe(2);
    expect(stderr).toMatch(
      /^other {2}this part does not belong to the first one: data\/demo\/other.yaml had other content\n/,
    );
    expect((await run(folder, 'gather', 'part1', 'part1', '--out', 'never')).stderr).toBe(
      'part1  part 1/4 is there already\n    → name each part once\n',
    );
    expect((await run(folder, 'gather', 'whole', '--out', 'never')).stderr).toMatch(
      /^whole {2}these results are whole already/,
    );
    expect((await run(folder, 'gather', 'nowhere', '--out', 'never')).stderr).toMatch(
      /^nowhere {2}the folder holds no finished results of a batch\n/,
    );
    expect(existsSync(inFolder('never'))).toBe(false);
  });

  it('are not joined over one of themselves, nor over other files', async () => {
    expect((await run(folder, 'gather', 'part1', 'part2', '--out', 'part2')).code).toBe(2);
    expect((await run(folder, 'gather', 'part1')).stderr).toContain("option '--out' is needed");
    mkdirSync(inFolder('mine'));
    writeFileSync(inFolder('mine/summary.csv'), 'mine');
    expect((await run(folder, 'gather', 'part1', '--out', 'mine')).stderr).toContain(
      'a file summary.csv that no batch has written',
    );
    await run(folder, 'batch', 'data/demo/other.yaml', '--out', 'finished');
    expect((await run(folder, 'gather', 'part1', '--out', 'finished')).stderr).toContain(
      'finished results of another run',
    );
  });

  it('that were cut short are refused', async () => {
    const lines = inFolder('part2/results.jsonl');
    const text = readFileSync(lines, 'utf8');
    writeFileSync(lines, text.slice(0, text.length / 2));
    const { code, stderr } = await run(folder, 'gather', 'part1', 'part2', '--out', 'cut');
    writeFileSync(lines, text);
    expect(code).toBe(2);
    expect(stderr).toMatch(/^part2 {2}the folder holds no finished results/);
    expect(existsSync(inFolder('cut/manifest.json'))).toBe(false);
  });
});
