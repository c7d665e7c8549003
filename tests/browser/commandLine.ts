import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll } from 'vitest';

const program = fileURLToPath(new URL('../../dist/main.js', import.meta.url));

/** What the command line writes, run in a folder. */
export function written(where: string, ...words: string[]): string {
  return execFileSync(process.execPath, [program, ...words], {
    cwd: where,
    encoding: 'utf8',
    maxBuffer: 64 * 1024 * 1024,
  });
}

/** A folder of its own that holds these files; it is gone after the tests of the file. */
export function folderOf(files: Readonly<Record<string, string>>): string {
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-sheet-test-'));
  for (const [name, text] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, name)), { recursive: true });
    writeFileSync(join(folder, name), text);
  }
  folders.push(folder);
  return folder;
}

const folders: string[] = [];
afterAll(() => {
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
});
