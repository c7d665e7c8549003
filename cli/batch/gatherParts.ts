import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { figureValues } from '../../src/batch/figureValues.ts';
import type { Problem } from '../../src/core/problem.ts';
import { batchHeader } from '../../src/report/batchCsv.ts';
import { rowOfJsonLine } from '../../src/report/batchJson.ts';
import { type BatchManifest, sortedInputs } from '../../src/report/batchManifest.ts';
import { chunksOf, jobsOf } from './chunkPlan.ts';
import { fileLines } from './fileLines.ts';
import { manifestIn } from './manifestFile.ts';
import { RESULT_FILES, type ResultsWriter } from './resultsFiles.ts';

/** A part of a batch, finished. */
export interface FinishedPart {
  readonly folder: string;
  readonly manifest: BatchManifest;
  readonly part: NonNullable<BatchManifest['part']>;
}

/**
 * Reads the manifests of parts, and holds them against one another.
 *
 * @returns the parts in their order
 */
export function readParts(folders: readonly string[]): { parts: FinishedPart[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const parts: FinishedPart[] = [];
  for (const folder of folders) {
    const manifest = manifestIn(folder);
    const at = { severity: 'error', file: folder } as const;
    if (manifest === undefined || !existsSync(join(folder, RESULT_FILES.lines))) {
      problems.push({ ...at, code: 'batch.no-results' });
    } else if (manifest.part === undefined) {
      problems.push({ ...at, code: 'batch.not-a-part' });
    } else {
      const { part } = manifest;
      const difference = parts[0] && differenceOf(parts[0].manifest, manifest);
      const twice = parts.some((other) => other.part.shard === part.shard);
      if (difference !== undefined) problems.push({ ...at, code: 'batch.parts-differ', found: difference });
      else if (twice) problems.push({ ...at, code: 'batch.part-twice', found: `${part.shard}/${part.shards}` });
      parts.push({ folder, manifest, part });
    }
  }
  return { parts: parts.toSorted((a, b) => a.part.shard - b.part.shard), problems };
}

function differenceOf(first: BatchManifest, other: BatchManifest): string | undefined {
  if (first.version !== other.version) return `it was made by version ${other.version}, the first by ${first.version}`;
  if (first.part?.shards !== other.part?.shards) {
    return `it is one of ${other.part?.shards} parts, the first one of ${first.part?.shards}`;
  }
  for (const { file, role, sha256 } of other.inputs) {
    const known = first.inputs.find((input) => input.role === role && (input.file === file || role === 'plan'));
    if (known !== undefined && known.sha256 !== sha256) return `${file} had other content`;
  }
  return first.jobs === other.jobs ? undefined : `it is a part of ${other.jobs} years, the first of ${first.jobs}`;
}

/** Parts that are not there, as `3/16`, with their jobs. */
export function missingParts(parts: readonly FinishedPart[]): { readonly part: string; readonly jobs: string }[] {
  const [first] = parts;
  if (first === undefined) return [];
  const { shards } = first.part;
  const there = new Set(parts.map(({ part }) => part.shard));
  return Array.from({ length: shards }, (_, i) => i + 1).flatMap((shard) => {
    const { fromJob, toJob } = jobsOf(first.manifest.jobs, chunksOf(first.manifest.jobs, { shard, shards }));
    if (there.has(shard) || toJob < fromJob) return [];
    return [{ part: `${shard}/${shards}`, jobs: `${fromJob} to ${toJob}` }];
  });
}

/** The manifest of the joined parts; that of a whole run where no part is missing. */
export function joinedManifest(parts: readonly FinishedPart[], missing: readonly string[]): BatchManifest {
  const { part: _, ...common } = parts[0].manifest;
  const inputs = new Map(
    parts.flatMap(({ manifest }) => manifest.inputs.map((each) => [`${each.role} ${each.file}`, each])),
  );
  const sum = (key: 'rows' | 'failed') => parts.reduce((total, { manifest }) => total + manifest[key], 0);
  return {
    ...common,
    ...(missing.length === 0 ? {} : { missing: [...missing] }),
    ...{ rows: sum('rows'), failed: sum('failed') },
    inputs: sortedInputs([...inputs.values()]),
  };
}

/**
 * Adds the rows of a part to the joined results.
 *
 * @returns the problem that the part is not what its manifest says
 */
export function addPart(writer: ResultsWriter, { folder, manifest }: FinishedPart): Problem | undefined {
  const axes = manifest.axes.map(({ name }) => name);
  const shape = { axes, homes: manifest.homesFile !== undefined, tariffs: manifest.tariffs };
  const header = Buffer.from(batchHeader(shape));
  const nothing = new Uint8Array(0);
  let skip = header.length;
  for (const csv of fileLines(join(folder, RESULT_FILES.table))) {
    writer.add({ csv: csv.subarray(skip), json: '', figures: nothing });
    skip = 0;
  }
  let rows = 0;
  for (const json of fileLines(join(folder, RESULT_FILES.lines))) {
    const lines = json.toString('utf8').trimEnd().split('\n');
    const figures = lines.flatMap((line) => {
      const row = rowOfJsonLine(line, axes);
      return row === undefined ? [] : [figureValues(row, manifest.tariffs)];
    });
    rows += figures.length;
    writer.add({ csv: '', json, figures: new Uint8Array(Float64Array.from(figures.flat()).buffer) });
  }
  return rows === manifest.rows ? undefined : { code: 'batch.no-results', severity: 'error', file: folder };
}
