import { spawn } from 'node:child_process';
import {
  closeSync,
  mkdirSync,
  openSync,
  readFileSync,
  symlinkSync,
  truncateSync,
  writeFileSync,
  writeSync,
} from 'node:fs';
import { join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { type Ended, folderWithDemo, makePipe, PROBLEM_SHAPE, STACK_LINE } from '../cli/program.ts';

// Files made to do harm, given to the built program. Each run may take so many seconds of the processor and no more: the
// system ends it then, and the exit code is not the one expected. A machine that is busy otherwise changes nothing.

const MOST_SECONDS = 4;

const folder = folderWithDemo();
const main = fileURLToPath(new URL('../../dist/main.js', import.meta.url));
const house = readFileSync(join(folder, 'data/demo/house.yaml'), 'utf8');

function put(name: string, text: string): string {
  writeFileSync(join(folder, name), text);
  return name;
}

/** Runs the built program under a limit of processor time; with nothing on its standard input. */
function attack(...words: string[]): Promise<Ended> {
  const script = `ulimit -t ${MOST_SECONDS}; exec "$@"`;
  const child = spawn('bash', ['-c', script, 'bash', process.execPath, main, ...words], {
    cwd: folder,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const said = { stdout: '', stderr: '' };
  for (const stream of ['stdout', 'stderr'] as const) {
    child[stream].setEncoding('utf8').on('data', (piece: string) => {
      said[stream] += piece;
    });
  }
  return new Promise((resolve) => child.on('close', (code, signal) => resolve({ code, signal, ...said })));
}

/** Refused as wrong input, in the shape of a problem, with nothing else said. */
async function expectRefused(words: string[], message: string): Promise<void> {
  const { code, stdout, stderr } = await attack(...words);
  expect({ code, stdout }).toEqual({ code: 2, stdout: '' });
  expect(stderr).toContain(message);
  expect(stderr).toMatch(PROBLEM_SHAPE);
  expect(stderr).not.toMatch(STACK_LINE);
}

describe('structured files that grow when they are read', () => {
  it('are refused: references to references to references', async () => {
    const levels = [...'bcdefghi'].map((name, i) => `${name}: &${name} [${`*${'abcdefgh'[i]},`.repeat(9)}]`);
    const bomb = put('bomb.yaml', `a: &a [x, x, x, x, x, x, x, x, x]\n${levels.join('\n')}\n`);
    await expectRefused(['simulate', bomb], 'cannot be used: a reference follows its anchor');
  });

  it.each([
    ['lists', `name: ${'['.repeat(20_000)}${']'.repeat(20_000)}`],
    ['sections', `name: ${'{a: '.repeat(20_000)}1${'}'.repeat(20_000)}`],
    ['indents', Array.from({ length: 1200 }, (_, i) => `${' '.repeat(i)}a:`).join('\n')],
  ])('are refused: %s in one another thousands deep', async (_, text) => {
    const deep = put('deep.yaml', text);
    await expectRefused(['simulate', deep], 'sections stand within sections, more than 64 levels');
  });

  it('are refused: tags that would make something of a text', async () => {
    const tagged = put('tag.yaml', house.replace('currency: EUR', 'currency: !!js/function "x"'));
    await expectRefused(['simulate', tagged], "'!!js/function' has no meaning here");
  });
});

describe('keys that are names of the language', () => {
  it('are unknown keys like any other', async () => {
    const keys = '__proto__: { a: 1 }\nconstructor: { prototype: { a: 1 } }\ntoString: 5\nhasOwnProperty: 1\n';
    const { code, stderr } = await attack('simulate', put('data/demo/keys.yaml', `${house}${keys}`));
    expect(code).toBe(2);
    for (const key of ['__proto__', 'constructor', 'toString', 'hasOwnProperty']) {
      expect(stderr).toContain(`  ${key} is not known here\n`);
    }
  });

  it('may name rates and taxes, whose sums are complete', async () => {
    const tariff = readFileSync(join(folder, 'data/demo/tariffs/night.yaml'), 'utf8');
    const names = {
      'name: night,': 'name: "__proto__",',
      'name: day,': 'name: constructor,',
      'name: VAT': 'name: toString',
    };
    const named = Object.entries(names).reduce((text, [from, to]) => text.replace(from, to), tariff);
    put('data/demo/tariffs/named.yaml', named);
    const scenario = put('data/demo/named.yaml', house.replace('tariffs/flat.yaml', 'tariffs/named.yaml'));
    const { code, stdout } = await attack('simulate', scenario, '--json', '-');
    expect(code).toBe(0);
    const [cost] = (JSON.parse(stdout) as { costs: Record<string, Record<string, { cost: number }> & number>[] }).costs;
    const byRate = Object.entries(cost!.byRate!);
    expect(byRate.map(([name]) => name)).toEqual(['__proto__', 'constructor']);
    // two sums of some hundred
    expect(byRate.reduce((sum, [, rate]) => sum + rate.cost, 0)).toBeCloseTo(Number(cost!.energy), 9);
    expect(Object.keys(cost!.byTax!)).toEqual(['toString']);
    expect(Number(cost!.byTax!.toString)).toBeCloseTo(Number(cost!.taxes), 9);
  });
});

describe('files that are too much', () => {
  it.each([
    ['big.csv', 'the file has 2147.5 MB; at most 200 MB is read'],
    ['big.yaml', 'the file has 2147.5 MB; at most 1 MB is read'],
  ])('are refused by their size, without being read: %s of 2 GB', async (name, message) => {
    truncateSync(join(folder, put(name, '')), 2 ** 31);
    await expectRefused([name.endsWith('csv') ? 'degree-days' : 'simulate', name], message);
  });

  it.each([
    ['weather', 'time,temperature °C', ['degree-days', 'line.csv'], 'this line has 100000000 characters'],
    ['prices', 'time,price EUR/kWh', ['check', 'line.csv'], 'this line has 100000000 characters'],
    [
      'readings',
      'date,reading kWh',
      ['fit', 'data/demo/house.yaml', '--readings', 'line.csv'],
      'this line has 100000000 characters',
    ],
  ])('are refused soon: a line of 100 MB in a file of %s', async (_, header, words, message) => {
    const million = '1,'.repeat(500_000);
    const file = openSync(join(folder, 'line.csv'), 'w');
    writeSync(file, `${header}\n`);
    for (let i = 0; i < 100; i++) writeSync(file, million);
    closeSync(file);
    const { code, stderr } = await attack(...words);
    expect(code).toBe(2);
    expect(stderr).toContain(message);
    expect(stderr.length).toBeLessThan(2000);
  });

  it('are refused soon: four million lines of prices', async () => {
    const file = openSync(join(folder, 'lines.csv'), 'w');
    writeSync(file, 'time,price EUR/kWh\n');
    const lines = '2025-01-01T00:00Z,1\n'.repeat(40_000);
    for (let i = 0; i < 100; i++) writeSync(file, lines);
    closeSync(file);
    const { code, stderr } = await attack('check', 'lines.csv');
    expect(code).toBe(2);
    expect(stderr).toContain('the file has 4000001 lines; at most 600000 are read');
  });
});

describe('names that lead to no file', () => {
  it.each([
    ['a folder', 'dir.csv', 'this is a folder, not a file'],
    ['a pipe that nobody writes', 'pipe.csv', 'this is a pipe, not a file'],
    ['links in a circle', 'first.csv', 'links lead in a circle'],
    ['a device without end', '/dev/zero', 'this is a device, not a file'],
  ])('are refused and never waited for: %s', async (kind, name, message) => {
    if (kind === 'a folder') mkdirSync(join(folder, name));
    if (kind === 'a pipe that nobody writes') makePipe(join(folder, name));
    if (kind === 'links in a circle') {
      symlinkSync('second.csv', join(folder, 'first.csv'));
      symlinkSync('first.csv', join(folder, 'second.csv'));
    }
    await expectRefused(['degree-days', name], message);
    const path = resolve(folder, name);
    const scenario = put('data/demo/leads.yaml', house.replace('file: weather.csv', `file: ${path}`));
    await expectRefused(['simulate', scenario], message);
  });
});

describe('names that would do something where they are shown', () => {
  const evil = '=HYPERLINK("http://x")\\e]8;;x\\a\\e[31m<script>\\u202e\\x9b2J&amp;|';
  const quoted = `"${evil.replaceAll('"', '\\"')}"`;
  const tariff = readFileSync(join(folder, 'data/demo/tariffs/night.yaml'), 'utf8')
    .replace('name: Night rate (invented)', `name: ${quoted}`)
    .replace('name: night,', 'name: "=1+1",')
    .replace('name: day,', 'name: "@SUM(A1)\\e[2J",');
  put('data/demo/tariffs/evil.yaml', tariff);
  const scenario = put(
    'data/demo/evil.yaml',
    house.replace(/^name: .*$/m, `name: ${quoted}`).replace('tariffs/flat.yaml', 'tariffs/evil.yaml'),
  );
  // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must not come out
  const acting = /[\u0000-\u0009\u000b-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069]/;

  it.each([
    ['simulate', [scenario]],
    ['tariffs', [scenario]],
    ['explain', [scenario, '--at', '2025-01-14T06:00']],
    ['check', [scenario]],
  ])('reach the terminal as letters alone: %s', async (command, words) => {
    const { code, stdout, stderr } = await attack(command, ...words);
    expect(code).toBe(0);
    expect(stdout).toContain('\\u001b');
    expect(`${stdout}${stderr}`).not.toMatch(acting);
  });

  it('reach a spreadsheet as text alone', async () => {
    const { code, stdout } = await attack('simulate', scenario, '--hourly', '-');
    expect(code).toBe(0);
    expect(stdout).not.toMatch(acting);
    const rows = Papa.parse<Record<string, string>>(stdout, { header: true, skipEmptyLines: true }).data;
    expect(rows).toHaveLength(8760);
    const cells = new Set(rows.map(({ rate }) => rate));
    expect([...cells].sort()).toEqual(["'=1+1", "'@SUM(A1)\\u001b[2J"]);
    const formulas = rows.flatMap((row) => Object.values(row)).filter((cell) => /^[=+@\t]|^-[^\d.]/.test(cell));
    expect(formulas).toEqual([]);
  });

  it('are the same letters again in JSON, escaped where JSON asks for it', async () => {
    const { code, stdout } = await attack('simulate', scenario, '--json', '-');
    expect(code).toBe(0);
    // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must be escaped
    expect(stdout).not.toMatch(/[\u0000-\u0009\u000b-\u001f]/);
    const { scenario: name } = JSON.parse(stdout) as { scenario: string };
    expect(name).toBe('=HYPERLINK("http://x")\u001b]8;;x\u0007\u001b[31m<script>\u202e\u009b2J&amp;|');
  });

  it('are made harmless in a problem and in the name of a file too', async () => {
    const { code, stderr } = await attack('simulate', '\u001b[31mx\u202e\n.yaml');
    expect(code).toBe(2);
    expect(stderr).toContain('\\u001b[31mx\\u202e\\u000a.yaml  there is no such file');
    expect(stderr).not.toMatch(acting);
  });
});
