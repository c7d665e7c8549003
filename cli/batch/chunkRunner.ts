import type { ChunkDone, ChunkTask } from './chunk.ts';

/** Something that runs chunks elsewhere and may lose them: the pool of workers. */
export interface ChunkPool {
  run(task: ChunkTask): Promise<ChunkDone>;
}

export interface ChunkWork {
  readonly pool: ChunkPool;
  readonly tasks: Iterable<ChunkTask>;
  /** Chunks under way at once. */
  readonly atOnce: number;
  /** What stands for a job that no worker could finish. */
  readonly lost: (job: ChunkTask, fault: unknown) => ChunkDone;
  /** Takes a finished chunk; chunks come in any order. What it throws ends the work. */
  readonly done: (chunk: ChunkDone) => Promise<void>;
}

/**
 * Runs chunks, a few at once. A chunk whose worker dies is run again job by job, so that only the job that killed it is lost.
 */
export async function runChunks({ pool, tasks, atOnce, lost, done }: ChunkWork): Promise<void> {
  const queue = tasks[Symbol.iterator]();
  const runNext = async (): Promise<void> => {
    for (let next = queue.next(); next.done !== true; next = queue.next()) {
      await done(await runOne(pool, next.value, lost));
    }
  };
  const runs = Array.from({ length: atOnce }, runNext);
  try {
    await Promise.all(runs);
  } finally {
    queue.return?.();
  }
}

async function runOne(pool: ChunkPool, task: ChunkTask, lost: ChunkWork['lost']): Promise<ChunkDone> {
  try {
    return await pool.run(task);
  } catch {
    const parts: ChunkDone[] = [];
    for (let i = 0; i < task.count; i++) {
      const job = { ...task, first: task.first + i, count: 1 };
      parts.push(await pool.run(job).catch((fault: unknown) => lost(job, fault)));
    }
    return joined(task, parts);
  }
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
