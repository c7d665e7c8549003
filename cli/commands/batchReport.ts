import { criterionOf } from '../../src/batch/ranking.ts';
import { nearestName } from '../../src/core/nearest.ts';
import type { Problem } from '../../src/core/problem.ts';
import type { BatchManifest } from '../../src/report/batchManifest.ts';
import { batchPage, batchText } from '../../src/report/html/batch/batchPage.ts';
import { type GatheredYears, YearsGatherer } from '../../src/report/html/batch/gatheredYears.ts';
import { inLanguage } from '../../src/report/language/inLanguage.ts';
import type { Language } from '../../src/report/language/languages.ts';
import { finishedBatch, resultIdentities, rowsIn } from '../batch/finishedBatch.ts';
import { EXIT, type Io } from '../io.ts';
import { tellProblems } from '../tellProblems.ts';
import { type ReportPlaces, writeReport } from '../writtenReport.ts';
import { wrongUse } from '../wrongUse.ts';

/** What is asked of the report of a batch. */
export interface AskedOfBatch {
  readonly folder: string;
  readonly date: string | undefined;
  readonly language: Language;
  /** As the user wrote them. */
  readonly by: string | undefined;
  readonly axes: string | undefined;
}

/** Writes the report of a finished batch. @throws OutputFault */
export async function batchReport(asked: AskedOfBatch, places: ReportPlaces, io: Io): Promise<number> {
  const { folder, date, language } = asked;
  const manifest = finishedBatch(folder);
  const identities = resultIdentities(folder);
  const clashes = places.outputs.overInputs(identities);
  const problems = 'code' in manifest ? [manifest] : clashes;
  if (problems.length > 0 || 'code' in manifest) return refuse(problems, io);
  const axes = asked.axes === undefined ? undefined : chosenAxes(asked.axes, manifest);
  if (typeof axes === 'string') return wrongUse(axes, 'report', io);
  const by = criterionOf(asked.by);
  const gatherer = new YearsGatherer(by);
  for (const row of rowsIn(folder, manifest)) {
    if ('code' in row) return refuse([row], io);
    gatherer.add(row);
  }
  const years: GatheredYears = gatherer.years;
  const input = { manifest, years, by, axes, date, version: io.version, ...inLanguage(language) };
  return writeReport({ page: batchPage(input), text: batchText(input) }, places, io);
}

async function refuse(problems: readonly Problem[], io: Io): Promise<number> {
  await tellProblems(problems, io);
  return EXIT.wrongInput;
}

/** Two axes of the batch, or what is wrong with their names. */
function chosenAxes(text: string, { axes }: BatchManifest): [string, string] | string {
  const known = axes.map(({ name }) => name);
  // A name may hold a comma, so the two are found among the names that there are.
  for (const first of known) {
    const second = known.find((name) => name !== first && text === `${first},${name}`);
    if (second !== undefined) return [first, second];
  }
  const names = text.split(',').map((name) => name.trim());
  const pair = names.length === 2 && names[0] !== names[1] && names.every((name) => known.includes(name));
  if (pair) return [names[0], names[1]];
  const stranger = names.find((name) => !known.includes(name));
  const near = stranger === undefined ? undefined : nearestName(stranger, known);
  if (near !== undefined) return `--axes is '${text}'; perhaps ${near} is meant`;
  if (known.length < 2) return `--axes needs two axes, and the batch has ${known.length}`;
  return `--axes is '${text}'; it is two of ${known.join(', ')} with a comma between them`;
}
