import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { HomesReader, surveyHomes } from '../cli/batch/homesFile.ts';
import { DiskSource } from '../cli/diskSource.ts';
import { loadPlan } from '../src/batch/batchPlan.ts';
import { JobFile } from '../src/batch/jobFile.ts';
import { JobRunner } from '../src/batch/runJob.ts';
import { SectionEntries } from '../src/batch/sectionEntries.ts';
import { batchLine } from '../src/report/batchCsv.ts';
import { batchJsonLine } from '../src/report/batchJson.ts';
import { answerRow, answerYear } from '../src/scenario/answer/makeAnswer.ts';
import { InputFiles } from '../src/scenario/inputFiles.ts';
import { Kept } from '../src/scenario/kept.ts';
import { type LoadedScenario, scenarioFrom } from '../src/scenario/loadScenario.ts';
import { newColumns } from '../src/sim/columns.ts';
import { totalsOf } from '../src/sim/totals.ts';
import { simulateYear } from '../src/sim/year.ts';

/** Homes of the large plan, and of the small one that memory is held against. */
const LARGE = 10_000;
const SMALL = 1000;
const ROUNDS = 3;

/**
 * Times a batch from end to end: years a second on one worker and on two, memory, and the share of a job that is not
 * simulation. Prints what it finds.
 */
export async function benchBatch(say: (line: string) => void): Promise<void> {
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-bench-'));
  try {
    const [small, large] = [SMALL, LARGE].map((years) => writePlan(folder, years));
    const seconds: number[][] = [[], []];
    let peak = 0;
    for (let round = 0; round < ROUNDS; round++) {
      for (const workers of [1, 2]) {
        const run = await timedRun(large, join(folder, `out-${round}-${workers}`), workers);
        seconds[workers - 1].push(run.seconds);
        if (workers === 2) peak = Math.max(peak, run.peakMegabytes);
      }
    }
    const ofSmall = await timedRun(small, join(folder, 'out-small'), 2);
    const [one, two] = seconds.map((each) => LARGE / each.toSorted((a, b) => a - b)[ROUNDS >> 1]);
    say(`\na batch of ${LARGE} years, medians of ${ROUNDS} interleaved runs`);
    say(`1 worker ${one.toFixed(0)} years a second, 2 workers ${two.toFixed(0)}: ${(two / one).toFixed(2)} times`);
    say(
      `peak memory ${peak.toFixed(0)} MB, of ${SMALL} years ${ofSmall.peakMegabytes.toFixed(0)} MB: ${(peak / ofSmall.peakMegabytes).toFixed(2)} times`,
    );
    const alone = await timedRun(large, join(folder, 'out-alone'), 1, '1/2');
    const apart = await Promise.all(
      ['1/2', '2/2'].map((shard) => timedRun(large, join(folder, `out-${shard[0]}`), 1, shard)),
    );
    const gained = (2 * alone.seconds) / Math.max(...apart.map(({ seconds: each }) => each));
    say(`two programs at once, each on its half, as much as this machine gives: ${gained.toFixed(2)} times`);
    const options = await timedRun(writeOptions(folder), join(folder, 'out-options'), 2);
    const { simulation, pricing, bareLoop } = partsOfJob(small);
    const ofBareLoops = (LARGE / options.seconds) * (bareLoop / 2);
    say(
      `${LARGE} options of one home on 2 workers: ${(LARGE / options.seconds).toFixed(0)} years a second, ${(100 * ofBareLoops).toFixed(0)} % of two bare loops`,
    );
    const percent = (share: number) => `${(100 * share).toFixed(0)} %`;
    say(
      `of a job, ${percent(simulation)} is simulation (hours, months, totals), ${percent(pricing)} pricing (bills, boiler, carbon), ${percent(1 - simulation - pricing)} all else`,
    );
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** A plan over the demo house with so many homes, a year each. */
function writePlan(folder: string, homes: number): string {
  const rows = Array.from({ length: homes }, (_, i) => {
    const unit = resolve(`data/demo/units/${i % 2 === 0 ? 'quarkenfels-8' : 'hollerwisch-6'}.yaml`);
    return `home ${i + 1},${100 + (i % 500) * 0.5},${46 + (i % 10)},${unit}`;
  });
  const header = 'home,house.heatLoss.value,flowTemperature.flow,heatPump.unit';
  writeFileSync(join(folder, `homes-${homes}.csv`), `${header}\n${rows.join('\n')}\n`);
  const path = join(folder, `plan-${homes}.yaml`);
  const base = resolve('data/demo/house.yaml');
  writeFileSync(path, `name: bench\nscenario: ${base}\nhomes: { file: homes-${homes}.csv }\n`);
  return path;
}

/** A plan of as many options of the demo house: heat loss, unit and flow temperature, each with each. */
function writeOptions(folder: string): string {
  const path = join(folder, 'plan-options.yaml');
  const unit = (name: string) => resolve(`data/demo/units/${name}.yaml`);
  writeFileSync(
    path,
    `name: bench
scenario: ${resolve('data/demo/house.yaml')}
axes:
  - { name: loss, given: range, path: house.heatLoss.value, from: 150, to: 199, step: 1 }
  - { name: unit, given: values, path: heatPump.unit, values: [${unit('quarkenfels-8')}, ${unit('hollerwisch-6')}] }
  - { name: flow, given: range, path: flowTemperature.flow, from: 45.1, to: 55, step: 0.1 }
`,
  );
  return path;
}

/** Runs the built program to its end. Peak memory is known on Linux only; 0 elsewhere. */
async function timedRun(
  plan: string,
  out: string,
  workers: number,
  shard = '1/1',
): Promise<{ seconds: number; peakMegabytes: number }> {
  const begin = process.hrtime.bigint();
  const words = ['batch', plan, '--out', out, '--workers', String(workers), '--shard', shard];
  const child = spawn(process.execPath, ['dist/main.js', ...words]);
  let peakMegabytes = 0;
  const look = setInterval(() => {
    peakMegabytes = Math.max(peakMegabytes, peakOf(child.pid ?? 0));
  }, 50);
  const code = await new Promise((ended) => child.on('close', ended));
  clearInterval(look);
  if (code !== 0) throw new Error(`the batch ended with ${code}`);
  return { seconds: Number(process.hrtime.bigint() - begin) / 1e9, peakMegabytes };
}

function peakOf(pid: number): number {
  try {
    return Number(/VmHWM:\s+(\d+)/.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1] ?? 0) / 1024;
  } catch {
    return 0;
  }
}

/** Shares of a job's time, and seconds of a year in the bare loop. */
interface PartsOfJob {
  readonly simulation: number;
  readonly pricing: number;
  readonly bareLoop: number;
}

/**
 * How a job's time is parted: each home as a job, and beside it what of that is simulation (hours, months, totals) and
 * pricing (bills, boiler, carbon), the same plan in one thread.
 */
function partsOfJob(planFile: string): PartsOfJob {
  const kept = new Kept();
  const files = new InputFiles(new DiskSource(), kept);
  const { plan } = loadPlan(planFile, files);
  const { survey } = surveyHomes(join(dirname(planFile), `homes-${SMALL}.csv`), 'home');
  if (plan === undefined || survey === undefined) throw new Error('the plan of the bench cannot be read');
  const runner = new JobRunner(plan, files, kept);
  const homes = [...new HomesReader(survey.headerRow).homesFrom(survey.marks[0])].map(({ home }) => home);
  const entries = new SectionEntries();
  const scenarios = homes.map(({ changes }) => {
    const { loaded } = scenarioFrom(entries.of(new JobFile(plan.base, changes)), files);
    const { year } = loaded === undefined ? {} : answerYear(loaded, kept);
    if (loaded === undefined || year === undefined) throw new Error('a home of the bench cannot be simulated');
    return { loaded, plan: year.plan };
  });
  const hours = scenarios[0].plan.weather.hours;
  const used = { year: newColumns(hours), billed: new Float64Array(hours) };
  const shape = { axes: [], homes: true, tariffs: 4 };
  const taken = { job: 0, simulation: 0, answer: 0 };
  let sink = 0;
  const timed = (run: () => number): number => {
    const start = process.hrtime.bigint();
    sink += run();
    return Number(process.hrtime.bigint() - start);
  };
  // A job and its parts in turn, so that the machine's speed meets all alike; the first round warms up.
  for (let i = -homes.length; i < homes.length; i++) {
    const at = (i + homes.length) % homes.length;
    const { loaded, plan: year } = scenarios[at];
    const job = timed(() => {
      const row = runner.run(at + 1, homes[at], 0);
      return batchLine(row, shape).length + batchJsonLine(row, shape.axes).length;
    });
    const simulation = timed(() => totalsOf(year, simulateYear(year, used.year)).annual.electricity);
    // without `kept`'s memory of this home's boiler: a home is new to a batch
    const answer = timed(
      () => answerRow({ ...loaded, scenario: renewed(loaded.scenario) }, { kept, used }).problems.length,
    );
    if (i < 0) continue;
    taken.job += job;
    taken.simulation += simulation;
    taken.answer += answer;
  }
  if (!Number.isFinite(sink)) throw new Error('a year has no finite figure');
  return {
    simulation: taken.simulation / taken.job,
    pricing: (taken.answer - taken.simulation) / taken.job,
    bareLoop: taken.simulation / 1e9 / homes.length,
  };
}

/** The same scenario with a house of its own, as each home has one. */
function renewed(scenario: LoadedScenario['scenario']): LoadedScenario['scenario'] {
  return { ...scenario, house: { ...scenario.house } };
}
