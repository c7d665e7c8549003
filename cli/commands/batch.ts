import type { Problem } from '../../src/core/problem.ts';
import { figure } from '../../src/report/figures.ts';
import { chunksOf, jobsOf, type Shard } from '../batch/chunkPlan.ts';
import { type PreparedBatch, prepareBatch } from '../batch/preparedBatch.ts';
import { RESULT_FILES } from '../batch/resultsFiles.ts';
import { runBatch } from '../batch/runBatch.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

/** Threads beyond these are a slip of the pen. */
const MOST_WORKERS = 512;

/** Simulates every home of a plan with every option, and writes a row for each. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { out } = options;
  const use = (what: string) => wrongUse(what, 'batch', io);
  if (out === undefined) return use("option '--out' is needed: the folder for the results");
  const limit = wholeNumber(options.limit ?? '', Number.MAX_SAFE_INTEGER);
  if (limit === undefined) return use(`--limit is '${options.limit}'; it is a whole number of years above 0`);
  const workers = options.workers === undefined ? undefined : wholeNumber(options.workers, MOST_WORKERS);
  if (options.workers !== undefined && workers === undefined) {
    return use(`--workers is '${options.workers}'; it is a whole number from 1 to ${MOST_WORKERS}`);
  }
  const part = options.shard === undefined ? undefined : shardOf(options.shard);
  if (options.shard !== undefined && part === undefined) {
    return use(`--shard is '${options.shard}'; it is a part and how many there are, such as 3/16`);
  }
  const { batch, problems } = prepareBatch(files[0]);
  await tellProblems(problems, io);
  if (batch === undefined) return EXIT.wrongInput;
  await io.stdout.write(announcement(batch, part));
  if (batch.jobs > limit) {
    await tellProblems([tooMany(batch, limit)], io);
    return EXIT.wrongInput;
  }
  return simulate(batch, { out, workers, part }, io);
}

async function simulate(batch: PreparedBatch, asked: Parameters<typeof runBatch>[1], io: Io): Promise<number> {
  const result = await runBatch(batch, asked, io);
  if ('code' in result) {
    await tellProblems([result], io);
    return EXIT.wrongInput;
  }
  const { rows, failed } = result;
  const bad = failed === 0 ? '' : `; ${figure(failed, 0)} with a problem, named in its row`;
  await io.stdout.write(`${figure(rows - failed, 0)} years simulated${bad}\n`);
  await io.stdout.write(`${asked.out}: ${Object.values(RESULT_FILES).join(', ')}\n`);
  return failed === 0 ? EXIT.done : EXIT.partlyDone;
}

/** '100 homes × 3 options = 300 years'. */
function announcement({ homes, options, jobs }: PreparedBatch, part: Shard | undefined): string {
  const counted = (count: number, what: string) => `${figure(count, 0)} ${what}${count === 1 ? '' : 's'}`;
  const all = `${counted(homes, 'home')} × ${counted(options, 'option')} = ${counted(jobs, 'year')}`;
  if (part === undefined) return `${all}\n`;
  const { fromJob, toJob } = jobsOf(jobs, chunksOf(jobs, part));
  const years = toJob < fromJob ? 'no years' : `years ${figure(fromJob, 0)} to ${figure(toJob, 0)}`;
  return `${all}; part ${part.shard}/${part.shards}: ${years}\n`;
}

function tooMany({ plan, jobs }: PreparedBatch, limit: number): Problem {
  const counts = { found: String(jobs), allowed: String(limit) };
  return { code: 'batch.too-many-years', severity: 'error', file: plan.file, ...counts };
}

function wholeNumber(text: string, most: number): number | undefined {
  const number = /^\d{1,15}$/.test(text) ? Number(text) : 0;
  return number >= 1 && number <= most ? number : undefined;
}

function shardOf(text: string): Shard | undefined {
  const [, shard, shards] = /^(\d{1,6})\/(\d{1,6})$/.exec(text)?.map(Number) ?? [];
  return shard !== undefined && shards !== undefined && shard >= 1 && shard <= shards ? { shard, shards } : undefined;
}
