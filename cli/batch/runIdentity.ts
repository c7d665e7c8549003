import * as z from 'zod';
import type { Problem } from '../../src/core/problem.ts';
import type { BatchManifest } from '../../src/report/batchManifest.ts';
import { DiskSource } from '../diskSource.ts';

const identitySchema = z.object({
  version: z.string(),
  shard: z.number(),
  shards: z.number(),
  inputs: z.array(z.object({ file: z.string(), role: z.string(), sha256: z.string() })),
});

/** What tells one run from another: the same run goes on where it was stopped, any other is refused. */
export type RunIdentity = z.output<typeof identitySchema>;

/** The identity that a journal noted; undefined where it cannot be understood. */
export function notedIdentity(noted: unknown): RunIdentity | undefined {
  return identitySchema.safeParse(noted).data;
}

/** The identity of finished results, as far as their manifest tells it. */
export function finishedIdentity({ version, part, inputs }: BatchManifest): RunIdentity {
  return { version, shard: part?.shard ?? 1, shards: part?.shards ?? 1, inputs };
}

/**
 * How another run differs, in words.
 *
 * @param there the run whose results lie in the folder
 * @returns undefined where it is the same run
 */
export function differenceOf(there: RunIdentity | undefined, own: RunIdentity): string | undefined {
  if (there === undefined) return 'its record cannot be read';
  if (there.version !== own.version) return `it was made by version ${there.version}`;
  for (const { file, role, sha256 } of own.inputs) {
    const other = there.inputs.find((input) => input.role === role);
    if (role === 'homes' && other === undefined) return `it had no table of homes`;
    if (other?.sha256 !== sha256)
      return `${wordOf[role] ?? 'an input'} was ${other?.file ?? 'not there'} with other content than ${file} now`;
  }
  if (there.shard !== own.shard || there.shards !== own.shards) {
    return there.shards === 1 ? 'it ran the whole plan' : `it ran the part ${there.shard}/${there.shards}`;
  }
  return undefined;
}

const wordOf: Readonly<Record<string, string>> = {
  plan: 'its plan',
  scenario: 'its base scenario',
  homes: 'its table of homes',
};

/** An input that is no longer what it was when its results were made; undefined where all are. */
export function changedInput(inputs: BatchManifest['inputs']): string | undefined {
  const source = new DiskSource();
  return inputs.find(({ file, role, sha256 }) => {
    if (role === 'homes') return false;
    const now = source.read(file);
    return !('bytes' in now) || now.sha256 !== sha256;
  })?.file;
}

/** The problem that a folder holds another run. */
export function otherRun(folder: string, what: 'finished results' | 'unfinished results', found: string): Problem {
  return { code: 'batch.other-run', severity: 'error', file: folder, found, allowed: what };
}
