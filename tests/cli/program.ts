import { execFileSync, spawn } from 'node:child_process';
import { cpSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll } from 'vitest';

const project = new URL('../../', import.meta.url);
const main = fileURLToPath(new URL('dist/main.js', project));

/** What a run of the built program left. */
export interface Ended {
  readonly code: number | null;
  readonly signal: NodeJS.Signals | null;
  readonly stdout: string;
  readonly stderr: string;
}

/** A new folder that holds `data/demo`, removed after the tests of the file. */
export function folderWithDemo(): string {
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-'));
  cpSync(fileURLToPath(new URL('data/demo', project)), join(folder, 'data/demo'), { recursive: true });
  afterAll(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

/** Starts the built program; what it prints comes with its end. */
export function start(folder: string, words: readonly string[], env: Readonly<Record<string, string>> = {}) {
  if (!existsSync(main)) throw new Error('dist/main.js is missing: npm run build');
  const child = spawn(process.execPath, [main, ...words], { cwd: folder, env: { ...process.env, ...env } });
  const stdout: Buffer[] = [];
  const stderr: Buffer[] = [];
  child.stdout.on('data', (piece: Buffer) => stdout.push(piece));
  child.stderr.on('data', (piece: Buffer) => stderr.push(piece));
  const ended = new Promise<Ended>((resolve) => {
    child.on('close', (code, signal) =>
      resolve({
        ...{ code, signal },
        stdout: Buffer.concat(stdout).toString('utf8'),
        stderr: Buffer.concat(stderr).toString('utf8'),
      }),
    );
  });
  return { child, ended };
}

/** Runs the built program to its end. */
export function run(folder: string, ...words: string[]): Promise<Ended> {
  return start(folder, words).ended;
}

/** Names in a folder, hidden ones too. */
export function namesIn(folder: string): string[] {
  return readdirSync(folder).sort();
}

/** Two lines a problem: `file[:line[:column]]  what` and the cure behind an arrow. */
export const PROBLEM_SHAPE = /^(\S.* {2}\S.*\n {4}→ \S.*\n)+$/;

/** A line of a stack trace. */
export const STACK_LINE = /^ {4}at /m;

const PIPE_MAKER = 'mkfifo';

/** Makes a named pipe. */
export function makePipe(path: string): void {
  execFileSync(PIPE_MAKER, [path]);
}
