import { cpSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { basename, join } from 'node:path';

/** Folders that are not copied: those of the installer, of git, and built ones. */
const LEFT_OUT = new Set(['node_modules', '.git', 'dist', 'coverage']);

/** Runs end at the first counterexample; making it smaller helps only people. */
const SETTINGS = `import fc from 'fast-check';\nfc.configureGlobal({ endOnFailure: true });\n`;
const CONFIG = `import { defineConfig } from 'vitest/config';
export default defineConfig({
  test: {
    include: ['tests/**/*.test.ts'],
    setupFiles: ['./oneCounterexample.ts'],
    testTimeout: 60_000,
    bail: 1,
    isolate: false,
    fileParallelism: false,
    reporters: ['dot'],
  },
});
`;

/** Copies the project into a new folder of its own, so that nothing that is broken there is ever seen elsewhere. */
export function privateCopy(root: string): string {
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-mutants-'));
  process.on('exit', () => rmSync(folder, { recursive: true, force: true }));
  cpSync(root, folder, { recursive: true, filter: (path) => path === root || !LEFT_OUT.has(basename(path)) });
  symlinkSync(join(root, 'node_modules'), join(folder, 'node_modules'));
  writeFileSync(join(folder, 'oneCounterexample.ts'), SETTINGS);
  writeFileSync(join(folder, 'vitest.config.ts'), CONFIG);
  return folder;
}
