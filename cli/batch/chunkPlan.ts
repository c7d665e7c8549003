import { type ChunkTask, JOBS_A_CHUNK } from './chunk.ts';
import { markBefore } from './homesFile.ts';
import type { PreparedBatch } from './preparedBatch.ts';

/** Chunks of a batch, or of a part of it: from one, included, to another, excluded. */
export interface ChunkRange {
  readonly from: number;
  readonly to: number;
}

/** A part of a batch, as `--shard 3/16` asks for it. */
export interface Shard {
  /** Counted from 1. */
  readonly shard: number;
  readonly shards: number;
}

/** The chunks of a part: parts follow one another, and differ by one chunk at most. */
export function chunksOf(jobs: number, part: Shard | undefined): ChunkRange {
  const chunks = Math.ceil(jobs / JOBS_A_CHUNK);
  if (part === undefined) return { from: 0, to: chunks };
  const { shard, shards } = part;
  return { from: Math.floor(((shard - 1) * chunks) / shards), to: Math.floor((shard * chunks) / shards) };
}

/** Jobs of a range of chunks, counted from 1, both included; the last is below the first where there is none. */
export function jobsOf(jobs: number, { from, to }: ChunkRange): { readonly fromJob: number; readonly toJob: number } {
  return { fromJob: from * JOBS_A_CHUNK + 1, toJob: Math.min(jobs, to * JOBS_A_CHUNK) };
}

/** What a worker is asked to do for a chunk. */
export function taskOf({ jobs, options, survey }: PreparedBatch, chunk: number): ChunkTask {
  const first = chunk * JOBS_A_CHUNK;
  const task = { chunk, first, count: Math.min(JOBS_A_CHUNK, jobs - first) };
  return survey === undefined ? task : { ...task, place: markBefore(survey, Math.floor(first / options)) };
}
