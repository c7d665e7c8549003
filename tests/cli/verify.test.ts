import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { folderWithDemo, PROBLEM_SHAPE, run, STACK_LINE } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';
const flat = 'data/demo/tariffs/flat.yaml';
const at = (name: string) => join(folder, name);
const textOf = (name: string) => readFileSync(at(name), 'utf8');

/** The report with one passage replaced. */
function changedReport(passage: string | RegExp, by: string): string {
  const text = textOf('report.html');
  const changed = text.replace(passage, by);
  expect(changed).not.toBe(text);
  writeFileSync(at('changed.html'), changed);
  return 'changed.html';
}

async function unreadable(file: string): Promise<string> {
  const { code, stdout, stderr } = await run(folder, 'verify', file);
  expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
  expect(stderr).toMatch(PROBLEM_SHAPE);
  expect(stderr).not.toMatch(STACK_LINE);
  return stderr;
}

beforeAll(async () => {
  await run(folder, 'report', house, '--out', 'report.html');
  await run(folder, 'report', house, '--out', 'bericht.html', '--language', 'de', '--date', '2025-03-31');
});

describe('verify', () => {
  it.each(['report.html', 'bericht.html'])('finds that all of %s holds', async (file) => {
    const { code, stdout, stderr } = await run(folder, 'verify', file);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toMatch(/Files: all \d+ are as they were\.\nFigures: all [\d\u202f]+ hold\.\nPage: word for word/);
    expect(stdout).toContain('All of the report holds.');
  });

  it('needs no scenario on the disk, for the report holds it', async () => {
    const scenario = textOf(house);
    rmSync(at(house));
    const { code } = await run(folder, 'verify', 'report.html');
    writeFileSync(at(house), scenario);
    expect(code).toBe(0);
  });

  it('names a file that has changed, and each figure that has', async () => {
    const tariff = textOf(flat);
    writeFileSync(at(flat), tariff.replace(/price: 0\.\d+/, 'price: 0.5'));
    const { code, stdout } = await run(folder, 'verify', 'report.html');
    writeFileSync(at(flat), tariff);
    expect(code).toBe(1);
    expect(stdout).toContain(`Files: 1 of 8 are not as they were.\n  ${flat}\n`);
    expect(stdout).toMatch(/ {2}costs\[0\]\.energy {2}[\d.]+ → [\d.]+\n/);
    expect(stdout).not.toMatch(/ {2}annual\./);
    expect(stdout).toContain('The report does not hold.');
  });

  it('does not hold where a file has changed though no figure has', async () => {
    const tariff = textOf(flat);
    writeFileSync(at(flat), `${tariff}# a remark\n`);
    const { code, stdout } = await run(folder, 'verify', 'report.html');
    writeFileSync(at(flat), tariff);
    expect(code).toBe(1);
    expect(stdout).toMatch(/Figures: all [\d\u202f]+ hold\./);
  });

  it('finds a figure that was changed in its data', async () => {
    const file = changedReport(/"heatLoss":195,/, '"heatLoss":295,');
    const { code, stdout } = await run(folder, 'verify', file);
    expect(code).toBe(1);
    expect(stdout).toContain('  house.heatLoss  295 → 195\n');
  });

  it('finds a sentence that was changed in its page alone', async () => {
    const file = changedReport('the rooms would lack no heat', 'the rooms would be wonderful');
    const { code, stdout } = await run(folder, 'verify', file);
    expect(code).toBe(1);
    expect(stdout).toContain('Page: it is not as it is made now.');
    expect(stdout).toContain('the rooms would be wonderful');
  });

  it('finds a scenario that was changed within the report', async () => {
    const file = changedReport('value: 195 }\\n', 'value: 196 }\\n');
    const { code, stdout } = await run(folder, 'verify', file);
    expect(code).toBe(1);
    expect(stdout).toContain(`  ${house}\n`);
    expect(stdout).toMatch(/ {2}annual\.spaceHeatNeed {2}[\d.]+ → [\d.]+\n/);
  });

  it('cannot read what is no report', async () => {
    expect(await unreadable('nix.html')).toContain('nix.html  there is no such file');
    expect(await unreadable(house)).toContain('this is no report of a house by Winterledger');
    const cut = textOf('report.html').slice(0, -2000);
    writeFileSync(at('cut.html'), cut);
    expect(await unreadable('cut.html')).toContain('cut.html  this is no report of a house by Winterledger');
    const broken = changedReport('"form":1', '"form":1,"more":2');
    expect(await unreadable(broken)).toContain('the data in this report are not what a report holds');
  });

  it('tells of a file of the report that is not there', async () => {
    const tariff = textOf(flat);
    rmSync(at(flat));
    const problem = await unreadable('report.html');
    writeFileSync(at(flat), tariff);
    expect(problem).toContain(flat);
  });
});
