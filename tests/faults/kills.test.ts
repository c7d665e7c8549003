import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { folderWithDemo, namesIn, run, start } from '../cli/program.ts';

const HOMES = 1000;
const KILLS = 20;
const MOST_RUNS = 3 * KILLS;
const SEED = 20261201;

const folder = folderWithDemo();
const RESULTS = ['results.csv', 'results.jsonl', 'summary.csv', 'manifest.json'];

/** A plan of many homes with a year each; short, since what counts is where it is broken off. */
function writePlan(): void {
  const homes = Array.from({ length: HOMES }, (_, i) => `home ${i + 1},${90 + (i % 250)},${45 + (i % 11)}`);
  const header = 'home,house.heatLoss.value,flowTemperature.flow';
  writeFileSync(join(folder, 'many.csv'), `${header}\n${homes.join('\n')}\n`);
  writeFileSync(join(folder, 'plan.yaml'), 'name: kills\nscenario: data/demo/house.yaml\nhomes: { file: many.csv }\n');
}

const bytesOf = (out: string) => RESULTS.map((name) => readFileSync(join(folder, out, name), 'utf8'));

/** Begins the batch, or goes on with it, and kills it after so many ms. @returns whether it was killed before its end */
async function killedAfter(moment: number): Promise<boolean> {
  const { child, ended } = start(folder, ['batch', 'plan.yaml', '--out', 'broken', '--workers', '2']);
  const timer = setTimeout(() => child.kill('SIGKILL'), moment);
  const { signal } = await ended;
  clearTimeout(timer);
  return signal === 'SIGKILL';
}

describe('a batch that is killed outright', () => {
  it('at twenty random moments ends with the bytes of one that never was, by the same command', {
    timeout: 240_000,
  }, async () => {
    writePlan();
    const begin = performance.now();
    const whole = await run(folder, 'batch', 'plan.yaml', '--out', 'whole', '--workers', '2');
    const lasts = performance.now() - begin;
    expect(whole.code).toBe(0);
    // a run that goes on has less before it: its end comes before some of the moments, and then all begins anew
    const moments = fc.sample(fc.double({ min: 0.05, max: 0.8, noNaN: true }), { numRuns: MOST_RUNS, seed: SEED });
    let killed = 0;
    for (const moment of moments) {
      if (killed === KILLS) break;
      if (await killedAfter(moment * lasts)) {
        killed++;
        continue;
      }
      expect(bytesOf('broken')).toEqual(bytesOf('whole'));
      rmSync(join(folder, 'broken'), { recursive: true });
    }
    expect(killed).toBe(KILLS);
    const last = await run(folder, 'batch', 'plan.yaml', '--out', 'broken', '--workers', '2');
    expect(last.code).toBe(0);
    expect(bytesOf('broken')).toEqual(bytesOf('whole'));
    expect(namesIn(join(folder, 'broken'))).toEqual(namesIn(join(folder, 'whole')));
  });
});
