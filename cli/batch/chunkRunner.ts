import { OutputFault } from '../outputFile.ts';
import type { ChunkDone, ChunkKept, ChunkTask } from './chunk.ts';

/** Something that runs chunks elsewhere and may lose them: the pool of workers. */
export interface ChunkPool {
  /** Runs a chunk and keeps its rows. @throws OutputFault where they cannot be kept */
  run(task: ChunkTask): Promise<ChunkKept>;
  /** Runs a part of a chunk. */
  runApart(task: ChunkTask): Promise<ChunkDone>;
}

export interface ChunkWork {
  readonly pool: ChunkPool;
  readonly tasks: Iterable<ChunkTask>;
  /** Chunks under way at once. */
  readonly atOnce: number;
  /** What stands for a job that no worker could finish. */
  readonly lost: (job: ChunkTask, fault: unknown) => ChunkDone;
  /** Keeps a chunk that was run in parts. @throws OutputFault */
  readonly keep: (chunk: ChunkDone) => void;
  /** Hears of a chunk that is kept; they come in any order. What it throws ends the work. */
  readonly done: (chunk: ChunkKept) => Promise<void>;
}

/**
 * Runs chunks, a few at once. A chunk whose worker dies is run again job by job, so that only the job that killed it is lost.
 * Chunks that are under way when the work ends by a fault are not kept: their workers are stopped, and no job killed them.
 *
 * @throws OutputFault where a chunk cannot be kept
 */
export async function runChunks(work: ChunkWork): Promise<void> {
  const queue = work.tasks[Symbol.iterator]();
  const state = { ended: false };
  const runNext = async (): Promise<void> => {
    for (let next = queue.next(); next.done !== true; next = queue.next()) {
      const kept = await runOne(next.value, work, state);
      if (kept === undefined) return;
      await work.done(kept);
    }
  };
  try {
    await Promise.all(Array.from({ length: work.atOnce }, runNext));
  } finally {
    state.ended = true;
    queue.return?.();
  }
}

/** @returns nothing where the work has ended meanwhile */
async function runOne(
  task: ChunkTask,
  { pool, lost, keep }: ChunkWork,
  state: { readonly ended: boolean },
): Promise<ChunkKept | undefined> {
  try {
    return await pool.run(task);
  } catch (fault) {
    if (fault instanceof OutputFault) throw fault;
  }
  const parts: ChunkDone[] = [];
  for (let i = 0; i < task.count && !state.ended; i++) {
    const job = { ...task, first: task.first + i, count: 1 };
    parts.push(await pool.runApart(job).catch((fault: unknown) => lost(job, fault)));
  }
  if (state.ended) return undefined;
  const whole = joined(task, parts);
  keep(whole);
  return whole;
}

function joined({ chunk }: ChunkTask, parts: readonly ChunkDone[]): ChunkDone {
  const inputs = new Map(parts.flatMap((part) => part.inputs.map((input) => [`${input.role} ${input.file}`, input])));
  return {
    chunk,
    rows: parts.reduce((sum, { rows }) => sum + rows, 0),
    failed: parts.reduce((sum, { failed }) => sum + failed, 0),
    csv: parts.map(({ csv }) => csv).join(''),
    json: parts.map(({ json }) => json).join(''),
    figures: Float64Array.from(parts.flatMap(({ figures }) => [...figures])),
    inputs: [...inputs.values()],
  };
}
