import { type Criterion, criterionOf, Ranking, rankedValue } from '../../src/batch/ranking.ts';
import { nearestName } from '../../src/core/nearest.ts';
import type { Problem } from '../../src/core/problem.ts';
import type { BatchManifest } from '../../src/report/batchManifest.ts';
import { type RankedBatch, rankDocument, rankText } from '../../src/report/batchRankText.ts';
import { documentText } from '../../src/report/documentText.ts';
import { finishedBatch, rowsIn } from '../batch/finishedBatch.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

const MOST_ROWS = 1000;

/** Ranks the years of a batch. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { axis, json } = options;
  const top = /^\d{1,4}$/.test(options.top ?? '') ? Number(options.top) : 0;
  if (top < 1 || top > MOST_ROWS) {
    return wrongUse(`--top is '${options.top}'; it is a whole number from 1 to ${MOST_ROWS}`, 'rank', io);
  }
  const [folder] = files;
  const manifest = finishedBatch(folder);
  if ('code' in manifest) {
    await tellProblems([manifest], io);
    return EXIT.wrongInput;
  }
  const axes = manifest.axes.map(({ name }) => name);
  if (axis !== undefined && !axes.includes(axis)) return wrongUse(noSuchAxis(axis, axes), 'rank', io);
  const asked = { folder, manifest, by: criterionOf(options.by), axis, top };
  return withOutputs([json], io, (outputs) => rank(asked, { json, outputs, io }));
}

function noSuchAxis(axis: string, axes: readonly string[]): string {
  const near = nearestName(axis, axes);
  const known = axes.length === 0 ? 'the batch has none' : `there are ${axes.join(', ')}`;
  return `--axis is '${axis}'; ${near === undefined ? known : `perhaps ${near} is meant`}`;
}

interface Asked {
  readonly folder: string;
  readonly manifest: BatchManifest;
  readonly by: Criterion;
  readonly axis: string | undefined;
  readonly top: number;
}

interface Wanted {
  readonly json: string | undefined;
  readonly outputs: Outputs;
  readonly io: Io;
}

async function rank(asked: Asked, { json, outputs, io }: Wanted): Promise<number> {
  const ranked = rankedBatch(asked);
  if ('code' in ranked) {
    await tellProblems([ranked], io);
    return EXIT.wrongInput;
  }
  await outputs.write(json, [documentText(rankDocument(ranked, io.version))]);
  await outputs.finish();
  if (!outputs.takesStdout) await io.stdout.write(rankText(ranked));
  return EXIT.done;
}

function rankedBatch({ folder, manifest, by, axis, top }: Asked): RankedBatch | Problem {
  const axes = manifest.axes.map(({ name }) => name);
  const ranking = new Ranking(by, axes, top);
  let rows = 0;
  let unranked = 0;
  for (const row of rowsIn(folder, manifest)) {
    if ('code' in row) return row;
    const value = rankedValue(row, by);
    rows++;
    if (value === undefined) unranked++;
    else ranking.add({ job: row.job, home: row.home, axes: row.axes, value });
  }
  return { by, axes, rows, unranked, result: ranking.result(axis) };
}
