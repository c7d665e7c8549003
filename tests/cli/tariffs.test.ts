import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { tariffRankingSchema } from '../../src/report/tariffRankingSchema.ts';
import { folderWithDemo, PROBLEM_SHAPE, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';
const at = (name: string) => join(folder, name);
const text = readFileSync(at(house), 'utf8');

/** A house beside the demo's that lists no tariff, and so nothing that needs one. */
const bare = 'data/demo/bare.yaml';
writeFileSync(at(bare), text.replace(/tariffs:\n(?: {2}- .*\n)+/, '').replace(/^wholeLife:\n(?: {2}.*\n)+/m, ''));
const other = 'data/demo/tariffs/other.yaml';
writeFileSync(at(other), 'name: Other\nrates: [{ name: all, price: 0.25 }]\ntaxes: [{ name: VAT, percent: 20 }]\n');

describe('tariffs', () => {
  it('ranks the tariffs of the scenario and those named beside it, and writes what its schema says', async () => {
    const { code, stdout, stderr } = await run(folder, 'tariffs', house, other, '--json', 'r.json');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    for (const line of stdout.split('\n')) expect([...line].length).toBeLessThanOrEqual(80);
    const document = tariffRankingSchema.parse(JSON.parse(readFileSync(at('r.json'), 'utf8')));
    const names = document.rankings[0]?.tariffs.map(({ tariff }) => tariff);
    expect(names).toHaveLength(5);
    for (const name of names ?? []) expect(stdout).toContain(name);
    expect(document.inputs.some(({ file, role }) => file === other && role === 'tariff')).toBe(true);
  });

  it('counts a tariff once that the scenario lists already, and gives the same bytes again', async () => {
    const one = await run(folder, 'tariffs', house, '--json', '-');
    const two = await run(
      folder,
      'tariffs',
      house,
      'data/demo/tariffs/night.yaml',
      './data/demo/tariffs/flat.yaml',
      '--json',
      '-',
    );
    const ranking = (stdout: string) => tariffRankingSchema.parse(JSON.parse(stdout)).rankings;
    expect(ranking(two.stdout)).toEqual(ranking(one.stdout));
    expect((await run(folder, 'tariffs', house, '--json', '-')).stdout).toBe(one.stdout);
  });

  it('has bills that are those of simulate', async () => {
    const ranked = await run(folder, 'tariffs', house, '--json', '-');
    const simulated = await run(folder, 'simulate', house, '--json', '-');
    const bills = (JSON.parse(simulated.stdout) as { costs: { file: string; total: number }[] }).costs;
    for (const { file, bill } of tariffRankingSchema.parse(JSON.parse(ranked.stdout)).rankings[0]?.tariffs ?? []) {
      expect(bill).toBe(bills.find((cost) => cost.file === file)?.total);
    }
  });

  it('takes the first tariff named for the present one where the scenario lists none', async () => {
    const { code, stdout } = await run(folder, 'tariffs', bare, other, 'data/demo/tariffs/night.yaml', '--json', '-');
    expect(code).toBe(0);
    expect(tariffRankingSchema.parse(JSON.parse(stdout)).present).toBe('Other');
  });

  it('refuses to rank nothing', async () => {
    const { code, stdout, stderr } = await run(folder, 'tariffs', bare);
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('bare.yaml  no tariff is named, neither in the scenario nor beside it');
  });

  it('tells of a tariff that is not there, or is wrong, and writes nothing', async () => {
    writeFileSync(at('wrong.yaml'), 'name: Wrong\nrates: [{ name: x, price: cheap }]\n');
    const { code, stdout, stderr } = await run(folder, 'tariffs', house, 'nix.yaml', 'wrong.yaml');
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).not.toMatch(STACK_LINE);
    expect(stderr).toContain('nix.yaml  there is no such file');
    expect(stderr).toContain("wrong.yaml:2:27  rates[0].price is 'cheap'");
  });

  it('warns of tariffs that state their taxes differently and ranks them apart', async () => {
    writeFileSync(at('inside.yaml'), 'name: Inside\npricesStated: withTax\nrates: [{ name: all, price: 0.3 }]\n');
    const { code, stdout, stderr } = await run(folder, 'tariffs', house, 'inside.yaml');
    expect(code).toBe(0);
    expect(stderr).toContain('inside.yaml:2:15  warning: the prices of this tariff hold the taxes');
    expect(stdout.replace(/\s+/g, ' ')).toContain('are ranked apart');
  });

  it('refuses to write its result over a tariff that it reads', async () => {
    const before = readFileSync(at(other), 'utf8');
    const { code } = await run(folder, 'tariffs', house, other, '--json', other);
    expect(code).toBe(2);
    expect(readFileSync(at(other), 'utf8')).toBe(before);
  });
});
