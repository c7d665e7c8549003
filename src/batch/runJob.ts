import { hasErrors, type Problem } from '../core/problem.ts';
import { answerRow, type UsedColumns } from '../scenario/answer/makeAnswer.ts';
import { warningsOf } from '../scenario/answer/warnings.ts';
import type { InputFiles } from '../scenario/inputFiles.ts';
import type { Kept } from '../scenario/kept.ts';
import { scenarioFrom } from '../scenario/loadScenario.ts';
import { newColumns } from '../sim/columns.ts';
import { valuesOfOption } from './axes.ts';
import type { BatchPlan } from './batchPlan.ts';
import type { Home } from './homesTable.ts';
import { JobFile } from './jobFile.ts';
import { type Row, rowResult } from './row.ts';
import { SectionEntries } from './sectionEntries.ts';

/** What a worker keeps between jobs, so that each prepares only what is new in it. */
export class JobRunner {
  readonly #plan: BatchPlan;
  readonly #files: InputFiles;
  readonly #kept: Kept;
  readonly #entries = new SectionEntries();
  readonly #used = new Map<number, UsedColumns>();
  #home: { readonly home: Home; readonly file: JobFile } | undefined;

  /**
   * @param plan a plan without errors
   * @param files where the jobs' files come from; made with the same `kept`
   */
  constructor(plan: BatchPlan, files: InputFiles, kept: Kept) {
    this.#plan = plan;
    this.#files = files;
    this.#kept = kept;
  }

  /**
   * Simulates a home with an option of the axes. Never throws; what is wrong with it stands in its row.
   *
   * @param job its number, counted from 1
   * @param home as read from the table, or the base scenario itself
   * @param option counted from 0
   */
  run(job: number, home: Home, option: number): Row {
    const values = valuesOfOption(this.#plan.axes, option);
    const row = {
      job,
      home: home.name,
      ...(home.line === undefined ? {} : { homesLine: home.line }),
      axes: values.map(({ label }) => label),
    };
    if (home.problems.length > 0) return { ...row, problems: home.problems };
    const file = new JobFile(
      this.#homeFile(home),
      values.flatMap(({ changes }) => changes),
    );
    const { result, problems } = this.#simulate(file);
    return { ...row, ...(result === undefined ? {} : { result }), problems };
  }

  #homeFile(home: Home): JobFile {
    if (this.#home?.home !== home) this.#home = { home, file: new JobFile(this.#plan.base, home.changes) };
    return this.#home.file;
  }

  #simulate(file: JobFile): Pick<Row, 'result' | 'problems'> {
    const { loaded, problems } = scenarioFrom(this.#entries.of(file), this.#files);
    if (loaded === undefined) return { problems: errorsOf(problems) };
    const made = answerRow(loaded, { kept: this.#kept, used: this.#usedOf(loaded.clock.hours) });
    if (made.year === undefined) return { problems: errorsOf(made.problems) };
    return { result: rowResult(made.year, warningsOf(made.year, problems)), problems: [] };
  }

  #usedOf(hours: number): UsedColumns {
    const known = this.#used.get(hours) ?? { year: newColumns(hours), billed: new Float64Array(hours) };
    this.#used.set(hours, known);
    return known;
  }
}

function errorsOf(problems: readonly Problem[]): Problem[] {
  return hasErrors(problems) ? problems.filter(({ severity }) => severity === 'error') : [...problems];
}
