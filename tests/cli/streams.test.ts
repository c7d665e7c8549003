import { spawn } from 'node:child_process';
import { closeSync, openSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { folderWithDemo, makePipe, namesIn, run, STACK_LINE, start } from './program.ts';

const folder = folderWithDemo();
const house = 'data/demo/house.yaml';

describe('a reader that goes away', () => {
  it('is no fault, and files are written all the same', async () => {
    const { child, ended } = start(folder, ['simulate', house, '--json', '-', '--hourly', 'hours.csv']);
    child.stdout.destroy();
    const { code, stderr } = await ended;
    expect({ code, stderr }).toEqual({ code: 0, stderr: '' });
    expect(readFileSync(join(folder, 'hours.csv'), 'utf8').trimEnd().split('\n').length).toBe(8761);
  });

  it('is no fault on standard error either', async () => {
    const { child, ended } = start(folder, ['simulate', 'nix.yaml']);
    child.stderr.destroy();
    expect((await ended).code).toBe(2);
  });
});

describe('a standard output on a full disk', () => {
  it('is told with exit code 3', async () => {
    const full = openSync('/dev/full', 'w');
    const main = fileURLToPath(new URL('../../dist/main.js', import.meta.url));
    const child = spawn(process.execPath, [main, '--version'], { cwd: folder, stdio: ['ignore', full, 'pipe'] });
    let stderr = '';
    child.stderr?.on('data', (piece) => {
      stderr += piece;
    });
    const code = await new Promise((resolve) => child.on('close', resolve));
    closeSync(full);
    expect(code).toBe(3);
    expect(stderr).toContain('standard output  the file cannot be written: the disk is full');
    expect(stderr).not.toMatch(STACK_LINE);
  });
});

describe('an interruption', () => {
  it('leaves no passing file behind and ends as an interruption does', async () => {
    // Nobody reads the pipe: the program waits for a reader with its first output already begun.
    makePipe(join(folder, 'pipe'));
    const { child, ended } = start(folder, ['simulate', house, '--json', 'result.json', '--hourly', 'pipe']);
    while (!namesIn(folder).some((name) => name.endsWith('.tmp'))) await new Promise((later) => setTimeout(later, 10));
    child.kill('SIGINT');
    const { code, signal, stdout } = await ended;
    expect({ code, signal, stdout }).toEqual({ code: null, signal: 'SIGINT', stdout: '' });
    expect(namesIn(folder).filter((name) => /tmp$|^result/.test(name))).toEqual([]);
  });
});

describe('colours', () => {
  it('never go into a pipe', async () => {
    const { stderr } = await run(folder, 'simulate', 'nix.yaml');
    expect(stderr).toContain('nix.yaml  there is no such file');
    expect(stderr).not.toContain('\u001b');
  });
});
