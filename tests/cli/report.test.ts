import { chmodSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { type Ended, folderWithDemo, namesIn, PROBLEM_SHAPE, run, STACK_LINE, start } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';
const at = (name: string) => join(folder, name);
const textOf = (name: string) => readFileSync(at(name), 'utf8');

/** A program that stands for a browser and does what a shell line says. */
function standIn(name: string, line: string): string {
  writeFileSync(at(name), `#!/bin/sh\n${line}\n`);
  chmodSync(at(name), 0o755);
  return at(name);
}

async function refused(code: number, ...words: string[]): Promise<string> {
  const before = namesIn(folder);
  const ended = await run(folder, 'report', ...words);
  expect({ code: ended.code, stdout: ended.stdout }).toEqual({ code, stdout: '' });
  expect(ended.stderr).toMatch(/^\S.*\n {4}→ \S.*\n/);
  expect(ended.stderr).not.toMatch(STACK_LINE);
  expect(namesIn(folder)).toEqual(before);
  return ended.stderr;
}

describe('report on the demo', () => {
  let made: Ended;
  beforeAll(async () => {
    made = await run(folder, 'report', house, '--out', 'report.html');
  });

  it('writes one page and says its answer', () => {
    expect({ code: made.code, stderr: made.stderr }).toEqual({ code: 0, stderr: '' });
    expect(textOf('report.html')).toMatch(/^<!doctype html>\n<html lang="en">/);
    expect(made.stdout).toContain('kWh of heat for each kWh bought');
    expect(namesIn(folder)).toEqual(['data', 'report.html']);
  });

  it('gives the same bytes again, on standard output too, and then nothing else there', async () => {
    const { code, stdout, stderr } = await run(folder, 'report', house, '--out', '-');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout).toBe(textOf('report.html'));
  });

  it('writes German with a date where that is asked for', async () => {
    const words = ['--out', 'bericht.html', '--language', 'de', '--date', '2025-03-31'];
    const { code, stdout } = await run(folder, 'report', house, ...words);
    expect(code).toBe(0);
    expect(textOf('bericht.html')).toContain('<html lang="de">');
    expect(textOf('bericht.html')).toContain('2025-03-31');
    expect(stdout).toContain('Wärmepumpe');
  });
});

describe('report in wrong use', () => {
  it('needs an output', async () => {
    expect(await refused(2, house)).toContain('--out FILE is missing');
  });

  it.each(['2025-02-30', '31.3.2025', '2025-13-01', '<b>'])('refuses the date %s', async (date) => {
    expect(await refused(2, house, '--out', 'x.html', '--date', date)).toContain('is no date such as 2025-03-31');
  });

  it('refuses a language that it has not', async () => {
    expect(await refused(2, house, '--out', 'x.html', '--language', 'fr')).toContain('fr');
  });

  it('refuses a PDF on standard output', async () => {
    expect(await refused(2, house, '--out', 'x.html', '--pdf', '-')).toContain('a PDF needs a file');
  });

  it('tells of a scenario that is not there, or not sound, and writes nothing', async () => {
    expect(await refused(2, 'nix.yaml', '--out', 'x.html')).toContain('nix.yaml  there is no such file');
    writeFileSync(at('data/demo/bad.yaml'), textOf(house).replace('value: 195', 'value: -1'));
    expect(await refused(2, 'data/demo/bad.yaml', '--out', 'x.html')).toContain('house.heatLoss.value');
  });

  it('refuses to write over its scenario', async () => {
    expect(await refused(2, house, '--out', house)).toContain('would be written over this file');
  });
});

describe('report as PDF', () => {
  const printed = (browser: string, ...words: string[]) =>
    start(folder, ['report', house, '--out', 'p.html', '--pdf', ...words], { CHROMIUM: browser }).ended;

  it('tells when no browser is found, before it writes anything', async () => {
    const before = namesIn(folder);
    const { code, stdout, stderr } = await printed(at('no-browser'), 'p.pdf');
    expect({ code, stdout }).toEqual({ code: 3, stdout: '' });
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('p.pdf  no Chromium was found that could print the report as PDF');
    expect(namesIn(folder)).toEqual(before);
  });

  it('tells when the browser does not print, and leaves nothing behind', async () => {
    const browser = standIn('ends.sh', 'exit 7');
    const before = namesIn(folder);
    const { code, stderr } = await printed(browser, 'p.pdf');
    expect(code).toBe(3);
    expect(stderr).toMatch(PROBLEM_SHAPE);
    expect(stderr).toContain('did not print the report: it ended with code 7');
    expect(namesIn(folder)).toEqual(before);
  });

  it('tells of a folder, and of one name for both', async () => {
    mkdirSync(at('inner'), { recursive: true });
    const browser = standIn('idle.sh', 'exit 0');
    expect((await printed(browser, 'inner')).stderr).toContain(
      'inner  a result cannot be written here: this is a folder',
    );
    expect((await printed(browser, 'none/p.pdf')).stderr).toContain('its folder does not exist');
    const twice = await printed(browser, 'p.html');
    expect(twice.code).toBe(2);
    expect(twice.stderr).toContain('p.html  two results would be written to this same file');
    expect((await printed(browser, house)).code).toBe(2);
    expect(existsSync(at('p.html'))).toBe(false);
    expect(namesIn(folder).filter((name) => name.endsWith('.tmp'))).toEqual([]);
  });

  it('prints by a real browser', async () => {
    const { code, stderr } = await run(folder, 'report', house, '--out', 'p.html', '--pdf', 'p.pdf');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    const pdf = readFileSync(at('p.pdf'));
    expect(pdf.toString('latin1', 0, 5)).toBe('%PDF-');
    // Client, professional and auditor begin on a page of their own.
    expect(pdf.toString('latin1').match(/\/Type \/Page\b/g)?.length).toBeGreaterThanOrEqual(3);
    expect(textOf('p.html')).toBe(textOf('report.html'));
    expect(namesIn(folder).filter((name) => name.endsWith('.tmp'))).toEqual([]);
  });
});
