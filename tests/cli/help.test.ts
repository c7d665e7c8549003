import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { commandTable } from '../../cli/commandTable.ts';
import { folderWithDemo, run } from './program.ts';

const folder = folderWithDemo();

describe('the table of commands', () => {
  it('has every name once, and says something of everything', () => {
    const names = commandTable.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    expect(names).toEqual([
      'simulate',
      'explain',
      'tariffs',
      'degree-days',
      'fit',
      'season',
      'batch',
      'gather',
      'rank',
      'report',
      'verify',
      'sheet',
      'check',
    ]);
    for (const { options, says, argumentSays, examples } of commandTable) {
      expect(new Set(options.map(({ name }) => name)).size).toBe(options.length);
      for (const text of [says, argumentSays, ...options.map((option) => option.says)]) expect(text).toMatch(/\w{3}/);
      expect(examples.length).toBeGreaterThan(0);
    }
  });

  it.each(commandTable)('$name has its code where the table says', async ({ load }) => {
    expect((await load()).run).toBeTypeOf('function');
  });
});

describe('the help', () => {
  it('names every command, on standard output', async () => {
    const { code, stdout, stderr } = await run(folder, '--help');
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    for (const { name } of commandTable) expect(stdout).toContain(`\n  ${name} `);
  });

  it.each(commandTable)('of $name shows its options and its examples within 100 columns', async (entry) => {
    const { code, stdout } = await run(folder, entry.name, '--help');
    expect(code).toBe(0);
    for (const { name } of entry.options) expect(stdout).toContain(`--${name} `);
    for (const example of entry.examples) expect(stdout).toContain(`\n  ${example}\n`);
    for (const line of stdout.split('\n')) expect(line.length).toBeLessThanOrEqual(100);
  });

  it.each(commandTable.flatMap(({ examples }) => examples))('its example runs as it stands: %s', async (example) => {
    const [program, ...words] = example.split(' ');
    expect(program).toBe('winterledger');
    const { code, stdout, stderr } = await run(folder, ...words);
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(stdout.length).toBeGreaterThan(20);
  });

  it('stands on standard error, as wrong use, when no command is given', async () => {
    const { code, stdout, stderr } = await run(folder);
    expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
    expect(stderr).toContain('simulate');
  });
});

describe('the version', () => {
  it('is that of the package', async () => {
    const { version } = JSON.parse(readFileSync(new URL('../../package.json', import.meta.url), 'utf8'));
    expect(await run(folder, '--version')).toEqual({ code: 0, signal: null, stdout: `${version}\n`, stderr: '' });
  });
});
