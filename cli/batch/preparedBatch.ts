import { dirname, isAbsolute, join } from 'node:path';
import { optionCount, valuesOfOption } from '../../src/batch/axes.ts';
import { type BatchPlan, baseName, loadPlan } from '../../src/batch/batchPlan.ts';
import type { Change } from '../../src/batch/changes.ts';
import type { Home } from '../../src/batch/homesTable.ts';
import { JobFile } from '../../src/batch/jobFile.ts';
import { faultsOfAll, mostTariffs, variedPlaces } from '../../src/batch/varied.ts';
import { hasErrors, type Problem } from '../../src/core/problem.ts';
import type { Assumption } from '../../src/scenario/answer/assumption.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import { holdAgainst } from '../../src/scenario/entries/readEntries.ts';
import { InputFiles, type InputRecord } from '../../src/scenario/inputFiles.ts';
import { Kept } from '../../src/scenario/kept.ts';
import { type LoadedScenario, scenarioFrom } from '../../src/scenario/loadScenario.ts';
import { weathers } from '../../src/scenario/loadWeather.ts';
import { scenarioSchema } from '../../src/scenario/scenarioSchema.ts';
import { DiskSource } from '../diskSource.ts';
import { type HomesSurvey, surveyHomes } from './homesFile.ts';
import { sharedWeather, type WorkerSetup } from './workerSetup.ts';

/** A batch whose plan, base scenario and homes are understood, ready for workers. */
export interface PreparedBatch {
  readonly plan: BatchPlan;
  readonly survey?: HomesSurvey;
  readonly homes: number;
  readonly options: number;
  /** Homes × options. */
  readonly jobs: number;
  /** Plan, base scenario and table of homes: what tells one batch from another. */
  readonly inputs: readonly InputRecord[];
  /** Those of the first job. */
  readonly assumptions: readonly Assumption[];
  /** What the workers are given, but for the folder of the results. */
  readonly setup: Omit<WorkerSetup, 'results'>;
}

/**
 * Reads plan, base scenario and homes, and tries the first job, so that what is wrong with every job is told before the work
 * begins.
 *
 * @param planFile as the user gives it
 */
export function prepareBatch(planFile: string): { batch?: PreparedBatch; problems: Problem[] } {
  const source = new DiskSource();
  const files = new InputFiles(source, new Kept());
  const { plan, problems } = loadPlan(planFile, files);
  if (plan === undefined || hasErrors(problems)) return { problems };
  const inputs: InputRecord[] = files.records;
  const counted = surveyOf(plan);
  if (hasErrors(counted.problems)) return { problems: counted.problems };
  const { survey } = counted;
  if (survey !== undefined) inputs.push({ file: survey.header.file, role: 'homes', sha256: survey.sha256 });
  const trial = new Trial(plan, survey, files);
  const faults = trial.faults();
  if (faults.length > 0) return { problems: faults };
  const homes = survey?.homes ?? 1;
  const options = optionCount(plan.axes);
  const setup = {
    planFile,
    ...(survey === undefined ? {} : { homes: survey.headerRow }),
    tariffs: mostTariffs(plan, survey?.header),
    weather: trial.weather(),
  };
  const common = { plan, homes, options, jobs: homes * options, inputs, assumptions: trial.assumptions(), setup };
  return { batch: survey === undefined ? common : { ...common, survey }, problems };
}

/** The table of homes, its name relative to the folder of the plan. */
function surveyOf({ file, homes }: BatchPlan): ReturnType<typeof surveyHomes> {
  if (homes === undefined) return { problems: [] };
  const path = isAbsolute(homes.file) ? homes.file : join(dirname(file), homes.file);
  return surveyHomes(path, homes.nameColumn);
}

/** The first home, tried with the values of the axes. */
class Trial {
  readonly #plan: BatchPlan;
  readonly #survey: HomesSurvey | undefined;
  readonly #files: InputFiles;
  readonly #home: Home;
  readonly #first: { loaded?: LoadedScenario; problems: Problem[] };

  constructor(plan: BatchPlan, survey: HomesSurvey | undefined, files: InputFiles) {
    this.#plan = plan;
    this.#survey = survey;
    this.#files = files;
    this.#home = survey?.first ?? { name: baseName(plan), changes: [], problems: [] };
    this.#first = this.#load([]);
  }

  /** What would be wrong with every job. */
  faults(): Problem[] {
    const { base, file } = this.#plan;
    const varied = variedPlaces(this.#plan, this.#survey?.header);
    const own = [base.file, file, ...(this.#survey === undefined ? [] : [this.#survey.header.file])];
    const alone = holdAgainst(base, scenarioSchema).problems;
    return faultsOfAll([...alone, ...this.#first.problems], varied, own);
  }

  /** Weather of the first home and of every axis value that names weather, its columns in shared memory. */
  weather(): WorkerSetup['weather'] {
    for (const { values } of this.#plan.axes) {
      for (const { changes } of values) if (changes.some(namesWeather)) this.#load(changes);
    }
    const { kept } = this.#files;
    if (kept === undefined) return [];
    return weathers.entriesOf(kept).map(([key, result]) => [key, sharedWeather(result)] as const);
  }

  assumptions(): readonly Assumption[] {
    const { loaded } = this.#first;
    return loaded === undefined ? [] : (makeAnswer(loaded).answer?.assumptions ?? []);
  }

  #load(further: readonly Change[]): { loaded?: LoadedScenario; problems: Problem[] } {
    const option = valuesOfOption(this.#plan.axes, 0).flatMap(({ changes }) => changes);
    const job = new JobFile(new JobFile(this.#plan.base, this.#home.changes), [...option, ...further]);
    return scenarioFrom(holdAgainst(job, scenarioSchema), this.#files);
  }
}

function namesWeather({ path, value }: Change): boolean {
  return path[0] === 'weather' && (path[1] === 'file' || typeof value === 'object');
}
