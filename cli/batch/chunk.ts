import type { InputRecord } from '../../src/scenario/inputFiles.ts';
import type { HomePlace } from './homesFile.ts';

/** Jobs that are given to a worker at once, and written at once. */
export const JOBS_A_CHUNK = 50;

/** Jobs that follow one another. */
export interface ChunkTask {
  readonly chunk: number;
  /** First job, counted from 0. */
  readonly first: number;
  readonly count: number;
  /** Where to begin to read homes; absent without a table of homes. */
  readonly place?: HomePlace;
  /** Whether the rows are given back, since they are but a part of a chunk, instead of kept by the worker. */
  readonly apart?: boolean;
}

/** A chunk that its worker has kept: so the rows of a long batch never pass through one thread. */
export interface ChunkKept {
  readonly chunk: number;
  readonly rows: number;
  readonly failed: number;
}

/** A chunk that its worker could not keep: the file, and the code of the system's fault. */
export interface ChunkUnwritten {
  readonly unwritten: { readonly file: string; readonly code: string };
}

/** What became of a chunk: its rows in both forms, and its figures. */
export interface ChunkDone {
  readonly chunk: number;
  readonly rows: number;
  readonly failed: number;
  readonly csv: string;
  readonly json: string;
  /** Row by row, as `figureValues` gives them. */
  readonly figures: Float64Array;
  /** Files that were read so far for jobs of this worker. */
  readonly inputs: readonly InputRecord[];
}
