import { type BatchPlan, loadPlan } from '../../src/batch/batchPlan.ts';
import { CsvRecords } from '../../src/batch/csvRecords.ts';
import { type Home, homeOf, homesHeader, isBlank, isRemark } from '../../src/batch/homesTable.ts';
import type { Row } from '../../src/batch/row.ts';
import { JobRunner } from '../../src/batch/runJob.ts';
import type { Problem } from '../../src/core/problem.ts';
import { isProblem } from '../../src/scenario/fileSource.ts';
import { InputFiles } from '../../src/scenario/inputFiles.ts';
import type { HurtFiles } from './hurtFiles.ts';
import { expectAnswered, expectSoundProblems } from './soundProblems.ts';

/** Homes of the table that are simulated; the first ones. */
const HOMES = 2;

/** `batch`, without its folders and threads: the plan, the table of homes, the years of the first homes with the first option. */
export function tryBatch(source: HurtFiles): boolean {
  const { written, kept } = source;
  const files = new InputFiles(source, kept);
  const { plan, problems } = loadPlan('plan.yaml', files);
  expectAnswered(plan, problems, written);
  if (plan === undefined) return false;
  const table = homesOf(plan, source);
  expectAnswered(table.homes, table.problems, written);
  const runner = new JobRunner(plan, files, kept);
  const rows = (table.homes ?? []).slice(0, HOMES).map((home, i) => runner.run(i + 1, home, 0));
  for (const row of rows) expectSoundRow(row, written);
  return rows.some(({ result }) => result !== undefined);
}

function homesOf({ homes }: BatchPlan, source: HurtFiles): { homes?: Home[]; problems: Problem[] } {
  if (homes === undefined) return { homes: [], problems: [] };
  const input = source.read(homes.file);
  if (isProblem(input)) return { problems: [input] };
  const records = new CsvRecords();
  const rows = [...records.push(input.bytes), ...records.end()].filter((row) => !isBlank(row));
  const first = rows.findIndex((row) => !isRemark(row));
  const named = rows[first];
  if (named === undefined) return { homes: [], problems: [] };
  const { header, problems } = homesHeader(named, input.name, homes.nameColumn);
  if (header === undefined) return { problems };
  return { homes: rows.slice(first + 1).map((row, i) => homeOf(header, row, i + 1)), problems };
}

/** A row has finite figures, or problems that say why not. */
function expectSoundRow({ result, problems }: Row, written: string): void {
  expectAnswered(result, problems, written);
  expectSoundProblems(problems, written);
  if (result === undefined) return;
  const figures = [...Object.values(result.figures), ...result.tariffs.flatMap((tariff) => Object.values(tariff))];
  for (const figure of figures) {
    if (typeof figure === 'number' && !Number.isFinite(figure)) throw new Error(`a row with ${figure}`);
  }
}
