import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Worker } from 'node:worker_threads';
import { build } from 'esbuild';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { folderWithDemo, start } from '../cli/program.ts';
import { conformanceCases, conformanceText } from './cases.ts';

// The same input gives the same bytes wherever and whenever it runs. Places are held against one another; nothing is
// compared with a result that was kept.

/** Machines that differ in what a program may take from them: time zone, language, both. */
const machines: readonly Readonly<Record<string, string>>[] = [
  { TZ: 'UTC', LC_ALL: 'C' },
  { TZ: 'Pacific/Auckland', LC_ALL: 'C.UTF-8' },
  { TZ: 'America/St_Johns', LC_ALL: 'de_DE.UTF-8', LANG: 'de_DE.UTF-8' },
  // its small i of I has no dot
  { TZ: 'Asia/Kathmandu', LC_ALL: 'tr_TR.UTF-8', LANG: 'tr_TR.UTF-8' },
];

const outer = mkdtempSync(join(tmpdir(), 'winterledger-'));
afterAll(() => rmSync(outer, { recursive: true, force: true }));
const bundle = join(outer, 'answering.mjs');
const names = Object.keys(conformanceCases);
let here: string[] = [];

beforeAll(async () => {
  here = Object.values(conformanceCases).map(conformanceText);
  await build({
    entryPoints: [fileURLToPath(new URL('answering.ts', import.meta.url))],
    ...{ outfile: bundle, bundle: true, minify: true, platform: 'node', format: 'esm', target: 'node20' },
    banner: { js: "import{createRequire as __cr}from'node:module';const require=__cr(import.meta.url);" },
  });
});

/** Names of the cases whose text differs from the one that this thread made. */
function differing(texts: readonly string[]): string[] {
  return names.filter((_, i) => texts[i] !== here[i]);
}

describe('the cases of conformance', () => {
  it('have three texts, each a year with heat in it', () => {
    expect(new Set(here).size).toBe(3);
    for (const text of here) {
      expect(text.trimEnd().split('\n').length).toBeGreaterThan(8760);
      const { annual } = JSON.parse(text.slice(0, text.indexOf('\nstamp,'))) as { annual: { spaceHeatNeed: number } };
      expect(annual.spaceHeatNeed).toBeGreaterThan(1000);
    }
  });

  it('have the same bytes when they are run again', () => {
    expect(differing(Object.values(conformanceCases).map(conformanceText))).toEqual([]);
  });

  it('have the same bytes in a thread of its own', async () => {
    const worker = new Worker(bundle);
    const text = await new Promise<string>((resolve, reject) => worker.on('message', resolve).on('error', reject));
    expect(differing(text.split('\0'))).toEqual([]);
  });

  it.each(machines)('have the same bytes in a process on a machine of %o', async (machine) => {
    const child = spawn(process.execPath, [bundle], { env: { ...process.env, ...machine } });
    let text = '';
    child.stdout.setEncoding('utf8').on('data', (piece: string) => {
      text += piece;
    });
    expect(await new Promise((resolve) => child.on('close', resolve))).toBe(0);
    expect(differing(text.split('\0'))).toEqual([]);
  });
});

describe('the program on the demo', () => {
  it('writes the same bytes on every machine, and each time', async () => {
    const folder = folderWithDemo();
    const words = ['simulate', 'data/demo/house.yaml', '--json', '-'];
    const ends = await Promise.all([{}, ...machines].map((machine) => start(folder, words, machine).ended));
    const [first] = ends;
    expect(first?.code).toBe(0);
    expect(JSON.parse(first?.stdout ?? '')).toHaveProperty('annual');
    for (const { stdout, stderr } of ends) {
      expect(stdout === first?.stdout).toBe(true);
      expect(stderr).toBe('');
    }
  });

  it('prints the same letters and writes the same hours on every machine', async () => {
    const folder = folderWithDemo();
    const ends = machines.map((machine, i) =>
      start(folder, ['simulate', 'data/demo/house.yaml', '--hourly', `${i}.csv`], machine),
    );
    const printed = await Promise.all(ends.map(async ({ ended }) => (await ended).stdout));
    expect(printed[0]).toContain('kWh');
    expect(new Set(printed).size).toBe(1);
    expect(new Set(machines.map((_, i) => readFileSync(join(folder, `${i}.csv`), 'utf8'))).size).toBe(1);
  });
});
