import { spawnSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { guardsOf } from './guards.ts';
import type { Mutant } from './mutants.ts';

/** What came of a mutant. */
export interface Verdict {
  readonly mutant: Mutant;
  /** The first tests that failed; absent where none did. */
  readonly noticedBy?: string;
}

/** A run that takes longer hangs, and that is noticed as well, ms; its tests run in threads, which end with it. */
const LONGEST_RUN = 600_000;

/** Runs tests in a folder; undefined when all of them passed. */
export function failureOf(
  folder: string,
  tests: readonly string[],
  shown: 'shown' | 'silent' = 'silent',
): 'fails' | 'hangs' | undefined {
  if (tests.length === 0) return undefined;
  const { status, error } = spawnSync(
    process.execPath,
    ['node_modules/vitest/vitest.mjs', 'run', '--pool=threads', ...tests],
    {
      cwd: folder,
      env: { ...process.env, NO_COLOR: '1' },
      stdio: shown === 'shown' ? 'inherit' : 'ignore',
      timeout: LONGEST_RUN,
      killSignal: 'SIGKILL',
    },
  );
  if (error !== undefined) return 'hangs';
  return status === 0 ? undefined : 'fails';
}

/** Breaks one line in the copy, runs the tests that may notice, and mends it again. */
export function judge(folder: string, mutant: Mutant): Verdict {
  const path = join(folder, mutant.file);
  const sound = readFileSync(path, 'utf8');
  writeFileSync(path, sound.slice(0, mutant.from) + mutant.becomes + sound.slice(mutant.to));
  try {
    for (const [name, tests] of stages(folder, mutant.file)) {
      const failure = failureOf(folder, tests);
      if (failure !== undefined) return { mutant, noticedBy: `${name}, ${failure}` };
    }
    return { mutant };
  } finally {
    writeFileSync(path, sound);
  }
}

/** The tests of a file: the nearest first, for most changes are noticed there. */
export function stages(folder: string, file: string): [name: string, tests: readonly string[]][] {
  const { near, far } = guardsOf(folder, file);
  const quick = (path: string) => !path.startsWith('tests/laws/');
  return [
    ['tests of the file', near.filter(quick)],
    ['tests of the room and published values', far.filter(quick)],
    ['laws', [...near, ...far].filter((path) => !quick(path))],
  ];
}
