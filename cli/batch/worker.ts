import { workerData } from 'piscina';
import { optionCount } from '../../src/batch/axes.ts';
import { baseName, loadPlan } from '../../src/batch/batchPlan.ts';
import { figureValues } from '../../src/batch/figureValues.ts';
import type { Home } from '../../src/batch/homesTable.ts';
import type { Row } from '../../src/batch/row.ts';
import { JobRunner } from '../../src/batch/runJob.ts';
import { batchLine } from '../../src/report/batchCsv.ts';
import { batchJsonLine } from '../../src/report/batchJson.ts';
import { InputFiles } from '../../src/scenario/inputFiles.ts';
import { Kept } from '../../src/scenario/kept.ts';
import { weathers } from '../../src/scenario/loadWeather.ts';
import { DiskSource } from '../diskSource.ts';
import { faultCode } from '../faultWords.ts';
import { OutputFault } from '../outputFile.ts';
import type { ChunkDone, ChunkKept, ChunkTask, ChunkUnwritten } from './chunk.ts';
import { HomesReader } from './homesFile.ts';
import { Journal } from './journal.ts';
import type { WorkerSetup } from './workerSetup.ts';

/** The code of a worker thread: it reads the plan once, then simulates chunks of jobs as they are given to it. */
const setup: WorkerSetup = workerData;
const kept = new Kept();
weathers.put(kept, setup.weather);
const files = new InputFiles(new DiskSource(), kept);
const { plan, problems } = loadPlan(setup.planFile, files);
if (plan === undefined) throw new Error(`the plan cannot be read any more: ${problems[0]?.code ?? ''}`);
const journal = new Journal(setup.results);
const runner = new JobRunner(plan, files, kept);
const reader = setup.homes === undefined ? undefined : new HomesReader(setup.homes);
const options = optionCount(plan.axes);
const axes = plan.axes.map(({ name }) => name);
const shape = { axes, homes: reader !== undefined, tariffs: setup.tariffs };
const baseHome: Home = { name: baseName(plan), changes: [], problems: [] };

/** Simulates a chunk and keeps its rows, or gives them back. */
export default function runChunk(task: ChunkTask): ChunkDone | ChunkKept | ChunkUnwritten {
  const done = simulateChunk(task);
  if (task.apart === true) return done;
  const { chunk, rows, failed } = done;
  try {
    journal.keep(done);
  } catch (fault) {
    if (fault instanceof OutputFault) return { unwritten: { file: fault.problem.file, code: faultCode(fault.cause) } };
    throw fault;
  }
  return { chunk, rows, failed };
}

function simulateChunk({ chunk, first, count, place }: ChunkTask): ChunkDone {
  const csv: string[] = [];
  const json: string[] = [];
  const figures: number[] = [];
  let failed = 0;
  const take = (row: Row) => {
    csv.push(batchLine(row, shape));
    json.push(batchJsonLine(row, axes));
    figures.push(...figureValues(row, setup.tariffs));
    if (row.problems.length > 0) failed++;
  };
  for (const { index, home } of homesOf(place)) {
    const from = Math.max(first, index * options);
    const to = Math.min(first + count, (index + 1) * options);
    for (let job = from; job < to; job++) take(runner.run(job + 1, home, job - index * options));
    if (to === first + count) break;
  }
  const texts = { csv: csv.join(''), json: json.join('') };
  return { chunk, rows: csv.length, failed, ...texts, figures: Float64Array.from(figures), inputs: files.records };
}

function homesOf(place: ChunkTask['place']): Iterable<{ readonly index: number; readonly home: Home }> {
  if (reader === undefined || place === undefined) return [{ index: 0, home: baseHome }];
  return reader.homesFrom(place);
}
