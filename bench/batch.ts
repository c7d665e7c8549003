import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { DiskSource } from '../cli/diskSource.ts';
import { valuesOfOption } from '../src/batch/axes.ts';
import { loadPlan } from '../src/batch/batchPlan.ts';
import { JobFile } from '../src/batch/jobFile.ts';
import { JobRunner } from '../src/batch/runJob.ts';
import { batchLine } from '../src/report/batchCsv.ts';
import { batchJsonLine } from '../src/report/batchJson.ts';
import { InputFiles } from '../src/scenario/inputFiles.ts';
import { Kept } from '../src/scenario/kept.ts';
import { newColumns } from '../src/sim/columns.ts';
import { totalsOf } from '../src/sim/totals.ts';
import { simulateYear } from '../src/sim/year.ts';
import { loadDemo, planOf } from './demo.ts';

/** Years of the large plan, and of the small one that memory is held against. */
const LARGE = 10_000;
const SMALL = 1000;
const ROUNDS = 3;

/**
 * Times a batch from end to end: years a second on one worker and on two, memory, and the share of a job that is not
 * simulation. Prints what it finds.
 */
export async function benchBatch(): Promise<void> {
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
    console.log(`\na batch of ${LARGE} years, medians of ${ROUNDS} interleaved runs`);
    console.log(
      `1 worker ${one.toFixed(0)} years a second, 2 workers ${two.toFixed(0)}: ${(two / one).toFixed(2)} times`,
    );
    console.log(
      `peak memory ${peak.toFixed(0)} MB, of ${SMALL} years ${ofSmall.peakMegabytes.toFixed(0)} MB: ${(peak / ofSmall.peakMegabytes).toFixed(2)} times`,
    );
    console.log(
      `${(100 * shareOutside(small)).toFixed(0)} % of a job is not its simulation (hours, months and totals)`,
    );
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** A plan over the demo house with so many years. */
function writePlan(folder: string, years: number): string {
  const path = join(folder, `plan-${years}.yaml`);
  const losses = years / 20;
  writeFileSync(
    path,
    [
      'name: bench',
      `scenario: ${resolve('data/demo/house.yaml')}`,
      'axes:',
      `  - { given: range, name: loss, path: house.heatLoss.value, from: 100, to: ${100 + (losses - 1) * 0.5}, step: 0.5 }`,
      '  - { given: range, name: flow, path: flowTemperature.flow, from: 46, to: 55, step: 1 }',
      '  - { given: values, name: unit, path: heatPump.unit, values: ' +
        `['${resolve('data/demo/units/quarkenfels-8.yaml')}', '${resolve('data/demo/units/hollerwisch-6.yaml')}'] }`,
      '',
    ].join('\n'),
  );
  return path;
}

/** Runs the built program to its end. Peak memory is known on Linux only; 0 elsewhere. */
async function timedRun(
  plan: string,
  out: string,
  workers: number,
): Promise<{ seconds: number; peakMegabytes: number }> {
  const begin = process.hrtime.bigint();
  const child = spawn(process.execPath, ['dist/main.js', 'batch', plan, '--out', out, '--workers', String(workers)]);
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

/** Share of a job's time outside the hours and their totals: the same years in one thread, as jobs and as prepared plans. */
function shareOutside(planFile: string): number {
  const kept = new Kept();
  const files = new InputFiles(new DiskSource(), kept);
  const { plan } = loadPlan(planFile, files);
  if (plan === undefined) throw new Error('the plan of the bench cannot be read');
  const runner = new JobRunner(plan, files, kept);
  const home = { name: 'bench', changes: [], problems: [] };
  const shape = { axes: plan.axes.map(({ name }) => name), homes: false, tariffs: 4 };
  let letters = 0;
  const job = (option: number) => {
    const row = runner.run(option + 1, home, option);
    letters += batchLine(row, shape).length + batchJsonLine(row, shape.axes).length;
  };
  const demo = planOf(loadDemo());
  const options = Array.from({ length: 50 }, (_, i) => i * 20);
  const plans = options.map((option) => {
    const changes = valuesOfOption(plan.axes, option).flatMap(({ changes: each }) => each);
    const { heatLoss } = (new JobFile(plan.base, changes).raw as { house: { heatLoss: { value: number } } }).house;
    const scale = heatLoss.value / 1000 / demo.house.heatLoss;
    return {
      ...demo,
      house: { ...demo.house, heatLoss: heatLoss.value / 1000, designLoad: demo.house.designLoad * scale },
    };
  });
  const columns = newColumns(demo.weather.hours);
  let whole = 0;
  let simulation = 0;
  for (let round = -2; round < 10; round++) {
    const start = process.hrtime.bigint();
    for (const option of options) job(option);
    const between = process.hrtime.bigint();
    for (const each of plans) letters += totalsOf(each, simulateYear(each, columns)).annual.electricity > 0 ? 1 : 0;
    if (round < 0) continue;
    whole += Number(between - start);
    simulation += Number(process.hrtime.bigint() - between);
  }
  if (letters === 0) throw new Error('nothing was simulated');
  return 1 - simulation / whole;
}
