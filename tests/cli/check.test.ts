import { writeFileSync } from 'node:fs';
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
});
