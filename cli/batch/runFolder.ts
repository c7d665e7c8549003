import type { Problem } from '../../src/core/problem.ts';
import type { BatchManifest } from '../../src/report/batchManifest.ts';
import type { InputRecord } from '../../src/scenario/inputFiles.ts';
import type { ChunkRange } from './chunkPlan.ts';
import { Journal } from './journal.ts';
import { manifestIn } from './manifestFile.ts';
import { foreignFile } from './resultsFiles.ts';
import {
  changedInput,
  differenceOf,
  finishedIdentity,
  notedIdentity,
  otherRun,
  type RunIdentity,
} from './runIdentity.ts';

/** What a folder of results holds of a run before it begins. */
export type FolderState =
  | { readonly is: 'finished'; readonly manifest: BatchManifest }
  | { readonly is: 'open'; readonly journal: Journal; readonly finished: ReadonlySet<number>; readonly rows: number }
  | { readonly is: 'refused'; readonly problem: Problem };

/**
 * Looks at the folder of a run: nothing of it, a part of it, or all of it may be there. What belongs to another run, or rests
 * on files that have changed since, is refused.
 *
 * @param folder of the results
 * @param own what tells this run from others
 * @param range chunks of the run
 * @throws OutputFault where the journal cannot be written
 */
export function openFolder(folder: string, own: RunIdentity, range: ChunkRange): FolderState {
  const journal = new Journal(folder);
  const begun = journal.begun();
  if (begun !== undefined) return goOn(folder, journal, own, { begun, range });
  const manifest = manifestIn(folder);
  if (manifest !== undefined) {
    const difference = differenceOf(finishedIdentity(manifest), own) ?? changed(manifest.inputs);
    if (difference === undefined) return { is: 'finished', manifest };
    return { is: 'refused', problem: otherRun(folder, 'finished results', difference) };
  }
  const foreign = foreignFile(folder);
  if (foreign !== undefined) {
    return { is: 'refused', problem: { code: 'batch.foreign-file', severity: 'error', file: folder, found: foreign } };
  }
  journal.begin(own);
  return { is: 'open', journal, finished: new Set(), rows: 0 };
}

function goOn(
  folder: string,
  journal: Journal,
  own: RunIdentity,
  { begun, range }: { begun: unknown; range: ChunkRange },
): FolderState {
  const difference = differenceOf(notedIdentity(begun), own);
  if (difference !== undefined) return { is: 'refused', problem: otherRun(folder, 'unfinished results', difference) };
  const finished = new Set<number>();
  const inputs = new Map<string, InputRecord>();
  let rows = 0;
  for (let chunk = range.from; chunk < range.to; chunk++) {
    const kept = journal.chunk(chunk);
    if (kept === undefined) continue;
    finished.add(chunk);
    rows += kept.rows;
    for (const input of kept.inputs) inputs.set(`${input.role} ${input.file} ${input.sha256}`, input);
  }
  const other = changed([...inputs.values()]);
  if (other !== undefined) return { is: 'refused', problem: otherRun(folder, 'unfinished results', other) };
  return { is: 'open', journal, finished, rows };
}

function changed(inputs: BatchManifest['inputs']): string | undefined {
  const file = changedInput(inputs);
  return file === undefined ? undefined : `${file} has other content now`;
}
