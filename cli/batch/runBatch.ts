import { availableParallelism } from 'node:os';
import { fileURLToPath } from 'node:url';
import Piscina from 'piscina';
import { figureColumns } from '../../src/batch/rowColumns.ts';
import type { Problem } from '../../src/core/problem.ts';
import type { TableShape } from '../../src/report/batchCsv.ts';
import { type BatchManifest, listedAxes, sortedInputs } from '../../src/report/batchManifest.ts';
import { assumptionNote } from '../../src/report/englishNotes.ts';
import type { InputRecord } from '../../src/scenario/inputFiles.ts';
import { removeOnInterruption } from '../interruption.ts';
import type { Io } from '../io.ts';
import { OutputFault } from '../outputFile.ts';
import type { ChunkDone, ChunkKept, ChunkTask, ChunkUnwritten } from './chunk.ts';
import { type ChunkRange, chunksOf, jobsOf, type Shard, taskOf } from './chunkPlan.ts';
import { type ChunkPool, runChunks } from './chunkRunner.ts';
import { surveyHomes } from './homesFile.ts';
import type { Journal } from './journal.ts';
import { lostJob } from './lostJob.ts';
import type { PreparedBatch } from './preparedBatch.ts';
import { Progress } from './progress.ts';
import { ResultsWriter } from './resultsFiles.ts';
import { openFolder } from './runFolder.ts';
import { otherRun } from './runIdentity.ts';
import { RunLock } from './runLock.ts';
import type { WorkerSetup } from './workerSetup.ts';

export interface RunAsked {
  /** Folder of the results. */
  readonly out: string;
  /** Worker threads; all cores when left out. */
  readonly workers?: number | undefined;
  readonly part?: Shard | undefined;
}

/**
 * Runs a batch, or what an earlier run has left of it, and writes its results.
 *
 * @returns the manifest of the results; or the problem that keeps the run from its folder
 * @throws OutputFault where a result cannot be written; what is finished stays
 */
export async function runBatch(batch: PreparedBatch, asked: RunAsked, io: Io): Promise<BatchManifest | Problem> {
  const lock = RunLock.take(asked.out);
  if (!(lock instanceof RunLock)) return lock;
  removeOnInterruption(lock);
  try {
    const range = chunksOf(batch.jobs, asked.part);
    const { shard, shards } = asked.part ?? { shard: 1, shards: 1 };
    const state = openFolder(asked.out, { version: io.version, shard, shards, inputs: [...batch.inputs] }, range);
    if (state.is === 'refused') return state.problem;
    if (state.is === 'finished') return state.manifest;
    const missing = tasksOf(batch, range, state.finished);
    await simulate(batch, { ...asked, io, journal: state.journal, missing, before: state.rows });
    const changed = homesChanged(batch);
    return changed ?? (await join(batch, { asked, range, journal: state.journal, version: io.version }));
  } finally {
    lock.discard();
  }
}

function* tasksOf(batch: PreparedBatch, { from, to }: ChunkRange, finished: ReadonlySet<number>): Generator<ChunkTask> {
  for (let chunk = from; chunk < to; chunk++) if (!finished.has(chunk)) yield taskOf(batch, chunk);
}

function shapeOf({ plan, survey, setup }: PreparedBatch): TableShape {
  return { axes: plan.axes.map(({ name }) => name), homes: survey !== undefined, tariffs: setup.tariffs };
}

/**
 * Memory of a worker for things that are soon let go, MB. The columns of a job live long, so more is filled before it is
 * needed, and a long batch would take more memory than a short one.
 */
const YOUNG_MEGABYTES = 8;

interface Simulation extends RunAsked {
  readonly io: Io;
  readonly journal: Journal;
  readonly missing: Iterable<ChunkTask>;
  /** Years that an earlier run has finished. */
  readonly before: number;
}

async function simulate(
  batch: PreparedBatch,
  { out, workers: asked, part, io, journal, missing, before }: Simulation,
): Promise<void> {
  const threads = asked ?? availableParallelism();
  const { fromJob, toJob } = jobsOf(batch.jobs, chunksOf(batch.jobs, part));
  const progress = new Progress(io, toJob - fromJob + 1, before);
  const workers = new Piscina<ChunkTask, ChunkAnswer>({
    filename: fileURLToPath(new URL('./batchWorker.js', import.meta.url)),
    minThreads: 1,
    maxThreads: threads,
    idleTimeout: Number.POSITIVE_INFINITY,
    workerData: { ...batch.setup, results: out } satisfies WorkerSetup,
    resourceLimits: { maxYoungGenerationSizeMb: YOUNG_MEGABYTES },
  });
  const shape = shapeOf(batch);
  try {
    await runChunks({
      pool: poolOf(workers),
      tasks: missing,
      atOnce: 2 * threads,
      lost: (task, fault) => lostJob(batch, shape, task, fault),
      keep: (chunk) => journal.keep(chunk),
      done: ({ rows }) => progress.add(rows),
    });
  } finally {
    await progress.end();
    await workers.destroy();
  }
}

type ChunkAnswer = ChunkDone | ChunkKept | ChunkUnwritten;

/** The workers as a pool of chunks; what a worker could not write is a fault here too. */
function poolOf(workers: Piscina<ChunkTask, ChunkAnswer>): ChunkPool {
  return {
    run: async (task) => {
      const answer = await workers.run(task);
      if (!('unwritten' in answer)) return answer;
      const { file, code } = answer.unwritten;
      throw new OutputFault(file, Object.assign(new Error(code), { code }));
    },
    runApart: async (task) => {
      const answer = await workers.run({ ...task, apart: true });
      if ('csv' in answer) return answer;
      throw new Error('a worker has given no rows back');
    },
  };
}

/** A table of homes that is no longer what it was when the run began has given rows of two tables. */
function homesChanged({ survey }: PreparedBatch): Problem | undefined {
  if (survey === undefined) return undefined;
  const { file, nameColumn } = survey.headerRow;
  if (surveyHomes(file, nameColumn).survey?.sha256 === survey.sha256) return undefined;
  return { code: 'batch.homes-changed', severity: 'error', file };
}

interface Joining {
  readonly asked: RunAsked;
  readonly range: ChunkRange;
  readonly journal: Journal;
  readonly version: string;
}

/** Joins the finished chunks in their order. */
async function join(
  batch: PreparedBatch,
  { asked, range, journal, version }: Joining,
): Promise<BatchManifest | Problem> {
  const writer = new ResultsWriter(asked.out, journal.folder, shapeOf(batch));
  const inputs = new Map<string, InputRecord>(batch.inputs.map((input) => [keyOf(input), input]));
  let rows = 0;
  let failed = 0;
  for (let chunk = range.from; chunk < range.to; chunk++) {
    const kept = journal.chunk(chunk);
    if (kept === undefined) throw new Error(`the finished chunk ${chunk + 1} cannot be read any more`);
    writer.add(kept);
    rows += kept.rows;
    failed += kept.failed;
    for (const input of kept.inputs) {
      const known = inputs.get(keyOf(input));
      if (known !== undefined && known.sha256 !== input.sha256) {
        return otherRun(asked.out, 'unfinished results', `${input.file} was changed during the run`);
      }
      inputs.set(keyOf(input), input);
    }
  }
  const part = asked.part && { ...asked.part, ...jobsOf(batch.jobs, range) };
  const manifest = manifestOf(batch, { version, part, rows, failed, inputs: [...inputs.values()] });
  writer.finish(manifest);
  journal.remove();
  return manifest;
}

function keyOf({ file, role }: InputRecord): string {
  return `${role} ${file}`;
}

interface Joined extends Pick<BatchManifest, 'version' | 'rows' | 'failed'> {
  readonly part: BatchManifest['part'];
  readonly inputs: readonly InputRecord[];
}

function manifestOf(batch: PreparedBatch, { version, part, rows, failed, inputs }: Joined): BatchManifest {
  const { plan, survey, homes, options, jobs, setup, assumptions } = batch;
  return {
    version,
    plan: plan.name,
    planFile: plan.file,
    ...(survey === undefined ? {} : { homesFile: survey.header.file }),
    ...{ homes, options, jobs },
    axes: listedAxes(plan.axes),
    ...(part === undefined ? {} : { part }),
    tariffs: setup.tariffs,
    ...{ rows, failed },
    columns: figureColumns(setup.tariffs),
    inputs: sortedInputs(inputs),
    assumptions: assumptions.map(assumptionNote),
  };
}
