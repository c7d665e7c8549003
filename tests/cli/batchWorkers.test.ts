import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { hostname, tmpdir } from 'node:os';
import { join } from 'node:path';
import Papa from 'papaparse';
import Piscina from 'piscina';
import { afterAll, describe, expect, it } from 'vitest';
import type { ChunkDone, ChunkTask } from '../../cli/batch/chunk.ts';
import { chunksOf, jobsOf } from '../../cli/batch/chunkPlan.ts';
import { runChunks } from '../../cli/batch/chunkRunner.ts';
import { lostJob } from '../../cli/batch/lostJob.ts';
import { prepareBatch } from '../../cli/batch/preparedBatch.ts';
import { durationText, Progress } from '../../cli/batch/progress.ts';
import { RunLock } from '../../cli/batch/runLock.ts';
import { OutputFault } from '../../cli/outputFile.ts';
import { batchHeader } from '../../src/report/batchCsv.ts';
import { namesIn } from './program.ts';

const folder = mkdtempSync(join(tmpdir(), 'winterledger-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const doneOf = ({ chunk, first, count }: ChunkTask): ChunkDone => ({
  ...{ chunk, rows: count, failed: 0, inputs: [] },
  csv: Array.from({ length: count }, (_, i) => `${first + i}\n`).join(''),
  json: '',
  figures: Float64Array.from({ length: count }, (_, i) => first + i),
});
const lost = ({ chunk, first }: ChunkTask): ChunkDone => ({
  ...doneOf({ chunk, first, count: 1 }),
  csv: 'lost\n',
  failed: 1,
});
const tasks = [0, 1, 2].map((chunk) => ({ chunk, first: 5 * chunk, count: 5 }));

/** What is kept, in the order of the chunks: what a worker has run whole, or what was joined from its jobs. */
async function results(run: (task: ChunkTask) => Promise<ChunkDone>) {
  const found: ChunkDone[] = [];
  const whole = async (task: ChunkTask) => {
    const chunk = await run(task);
    found.push(chunk);
    return chunk;
  };
  await runChunks({
    ...{ pool: { run: whole, runApart: run }, tasks, atOnce: 2, lost },
    keep: (chunk) => void found.push(chunk),
    done: async () => {},
  });
  return found.sort((a, b) => a.chunk - b.chunk);
}

describe('a chunk whose worker dies', () => {
  it('is run again job by job, so that only the job that killed it is lost', async () => {
    const asked: number[][] = [];
    const found = await results(async (task) => {
      asked.push([task.first, task.count]);
      if (task.first <= 7 && task.first + task.count > 7) throw new Error('the worker has ended');
      return doneOf(task);
    });
    expect(found.map(({ csv }) => csv)).toEqual(['0\n1\n2\n3\n4\n', '5\n6\nlost\n8\n9\n', '10\n11\n12\n13\n14\n']);
    expect(found.map(({ rows, failed }) => [rows, failed])).toEqual([
      [5, 0],
      [5, 1],
      [5, 0],
    ]);
    expect([...found[1]!.figures]).toEqual([5, 6, 7, 8, 9]);
    expect(asked.filter(([, count]) => count === 1).map(([first]) => first)).toEqual([5, 6, 7, 8, 9]);
  });

  it('is run by a new worker: one that ends itself, and one that uses up its memory', async () => {
    const code = `
      export default ({ chunk, first, count }) => {
        if (first <= 7 && first + count > 7) process.exit(1);
        const hoard = [];
        if (first <= 12 && first + count > 12) for (;;) hoard.push(new Array(1e5).fill(hoard.length));
        return { chunk, rows: count, failed: 0, csv: String(first), json: '', figures: new Float64Array(count), inputs: [] };
      };`;
    const filename = join(folder, 'dying.mjs');
    writeFileSync(filename, code);
    const pool = new Piscina<ChunkTask, ChunkDone>({
      filename,
      maxThreads: 2,
      resourceLimits: { maxOldGenerationSizeMb: 32 },
    });
    const found = await results((task) => pool.run(task));
    await pool.destroy();
    expect(found.map(({ csv }) => csv)).toEqual(['0', '56lost\n89', '1011lost\n1314']);
  });

  it('has a row with that problem for the job that is lost', () => {
    const { batch } = prepareBatch('data/demo/plan.yaml');
    const shape = { axes: ['unit', 'radiators'], homes: true, tariffs: 4 };
    const fault = Object.assign(new Error('x'), { code: 'ERR_WORKER_OUT_OF_MEMORY' });
    const place = batch!.survey!.marks[0]!;
    const { json, csv, failed } = lostJob(batch!, shape, { chunk: 0, first: 6, count: 1, place }, fault);
    expect(failed).toBe(1);
    expect(JSON.parse(json)).toMatchObject({
      job: 7,
      home: expect.stringContaining('Am Quellgrund 1'),
      axes: { unit: 'units/hollerwisch-6.yaml', radiators: 'as they are' },
      problems: [
        {
          code: 'batch.worker-failed',
          text: 'this year could not be simulated: its worker ran out of memory',
          remedy: expect.stringContaining('fewer --workers'),
        },
      ],
    });
    const cellsOf = (line: string) => Papa.parse<string[]>(line.trim()).data[0]!;
    expect(cellsOf(csv).length).toBe(cellsOf(batchHeader(shape)).length);
  });

  it('is not run again where its rows cannot be kept: that ends the work', async () => {
    let apart = 0;
    const pool = {
      run: async () => {
        throw new OutputFault('chunk-000001', Object.assign(new Error(), { code: 'ENOSPC' }));
      },
      runApart: async (task: ChunkTask) => {
        apart++;
        return doneOf(task);
      },
    };
    const work = runChunks({ pool, tasks, atOnce: 1, lost, keep: () => {}, done: async () => {} });
    await expect(work).rejects.toThrow('the disk is full');
    expect(apart).toBe(0);
  });

  it('is not kept where its worker is stopped because another could not write: no job killed it', async () => {
    const stopped = new AbortController();
    const abort = () =>
      new Promise<never>((_, reject) => {
        const fail = () => reject(new Error('The task has been aborted'));
        if (stopped.signal.aborted) fail();
        else stopped.signal.addEventListener('abort', fail);
      });
    const kept: ChunkDone[] = [];
    let apart = 0;
    const pool = {
      run: async ({ chunk }: ChunkTask) => {
        if (chunk > 0) return abort();
        throw new OutputFault('chunk-000001', Object.assign(new Error(), { code: 'ENOSPC' }));
      },
      runApart: () => {
        apart++;
        return abort();
      },
    };
    const work = runChunks({
      pool,
      tasks,
      atOnce: 2,
      lost,
      keep: (each) => void kept.push(each),
      done: async () => {},
    });
    await expect(work).rejects.toThrow('the disk is full');
    stopped.abort();
    // long enough for all that the stopped workers set off
    await new Promise((resolve) => setTimeout(resolve, 20));
    expect({ kept, apart }).toEqual({ kept: [], apart: 0 });
  });
});

describe('the parts of a batch', () => {
  it.each([
    [1234, 16],
    [50, 3],
    [1, 1],
  ])('of %i years in %i follow one another without gap', (jobs, shards) => {
    const parts = Array.from({ length: shards }, (_, i) => chunksOf(jobs, { shard: i + 1, shards }));
    expect(parts[0]!.from).toBe(0);
    expect(parts.at(-1)!.to).toBe(Math.ceil(jobs / 50));
    for (let i = 1; i < shards; i++) expect(parts[i]!.from).toBe(parts[i - 1]!.to);
    const years = parts.map((part) => jobsOf(jobs, part)).map(({ fromJob, toJob }) => Math.max(0, toJob - fromJob + 1));
    expect(years.reduce((sum, each) => sum + each, 0)).toBe(jobs);
  });
});

describe('the lock of a folder', () => {
  const out = join(folder, 'locked');
  const write = (holder: object) => {
    mkdirSync(out, { recursive: true });
    writeFileSync(join(out, 'batch.lock'), JSON.stringify(holder));
  };

  it('is held by one run at a time, and given back', () => {
    const lock = RunLock.take(out);
    expect(lock).toBeInstanceOf(RunLock);
    (lock as RunLock).discard();
    expect(namesIn(out)).toEqual([]);
  });

  it('of a process that has died is taken over', () => {
    // numbers of processes lie below 2^22 on Linux
    write({ pid: 2 ** 30, host: hostname(), began: '1' });
    const lock = RunLock.take(out);
    expect(lock).toBeInstanceOf(RunLock);
    (lock as RunLock).discard();
    write({ nothing: 'that can be understood' });
    expect(RunLock.take(out)).toBeInstanceOf(RunLock);
  });

  it.runIf(process.platform === 'linux')('of a process whose number was given to another is taken over', () => {
    write({ pid: process.ppid, host: hostname(), began: '1' });
    expect(RunLock.take(out)).toBeInstanceOf(RunLock);
  });

  it('of another machine is left alone', () => {
    write({ pid: 1, host: 'elsewhere', began: '' });
    expect(RunLock.take(out)).toMatchObject({ code: 'batch.folder-busy', found: 'process 1 on elsewhere' });
  });
});

describe('the progress of a batch', () => {
  const written: string[] = [];
  const sink = { write: async (text: string) => void written.push(text) };
  const io = { stdout: sink, stderr: sink, colour: false, version: '1' };

  it('is a line with the time left on a terminal', async () => {
    const progress = new Progress({ ...io, terminal: true }, 200, 50);
    await progress.add(50);
    expect(written.join('')).toMatch(/100 of 200 years, 50 %, \d+ s left$/);
    await progress.end();
  });

  it('is silent elsewhere', async () => {
    written.length = 0;
    const progress = new Progress(io, 200, 0);
    await progress.add(200);
    await progress.end();
    expect(written).toEqual([]);
  });

  it('counts seconds, minutes and hours', () => {
    expect([400, 61_000, 7_260_000].map(durationText)).toEqual(['1 s', '1 min 1 s', '2 h 1 min']);
  });
});
