import { GrowingColumn } from '../../../batch/growingColumn.ts';
import { type Criterion, type RankedRow, Ranking, rankedValue } from '../../../batch/ranking.ts';
import type { ToldProblem, ToldRow } from '../../batchJson.ts';

/** Rows that are listed at either end of the ranking. */
const TOP = 10;
/** Failed years of which a cause keeps the words. */
const EXAMPLES = 20;
/** Causes and kinds that are counted apart; a folder of our own has far fewer. */
const MOST_KINDS = 200;

/** What is taken of a year: the criteria of a ranking, and what is saved against the boiler on the first tariff. */
export type YearFigure = Criterion | 'saving';

const YEAR_FIGURES: readonly YearFigure[] = ['cost', 'carbon', 'seasonalFactor', 'backupHours', 'saving'];

/** A year that failed. */
export interface FailedYear {
  readonly job: number;
  readonly home: string;
  readonly problem: ToldProblem;
}

/** Why years failed: a code, how many it stopped, and some of them. */
export interface FailureCause {
  readonly code: string;
  years: number;
  readonly examples: FailedYear[];
}

/** The years of a batch as columns, and what was counted of them. */
export interface GatheredYears {
  readonly rows: number;
  readonly failed: number;
  /** Number of each year's job, counted from 1. */
  readonly jobs: Float64Array;
  /** NaN where a year has no such figure. */
  readonly figures: Readonly<Record<YearFigure, Float64Array>>;
  /** Currencies of the years, in the order in which they came. */
  readonly currencies: readonly string[];
  readonly best: readonly RankedRow[];
  readonly worst: readonly RankedRow[];
  /** Codes of warnings and the years that have them, most first. */
  readonly warnings: readonly (readonly [string, number])[];
  /** Most years first. */
  readonly causes: readonly FailureCause[];
}

/** Takes the rows of a batch one after the other; of a row it keeps a few numbers, so that memory holds any batch. */
export class YearsGatherer {
  readonly #by: Criterion;
  readonly #ranking: Ranking;
  readonly #jobs = new GrowingColumn();
  readonly #figures = new Map<YearFigure, GrowingColumn>(YEAR_FIGURES.map((figure) => [figure, new GrowingColumn()]));
  readonly #currencies = new Set<string>();
  readonly #warnings = new Map<string, number>();
  readonly #causes = new Map<string, FailureCause>();
  #failed = 0;

  /** @param by criterion of the ranking */
  constructor(by: Criterion) {
    this.#by = by;
    this.#ranking = new Ranking(by, [], TOP);
  }

  /** Takes a row; rows come in the order of their jobs. */
  add(row: ToldRow): void {
    this.#jobs.add(row.job);
    for (const [figure, column] of this.#figures) column.add(figureOf(row, figure) ?? Number.NaN);
    const value = rankedValue(row, this.#by);
    if (value !== undefined) this.#ranking.add({ job: row.job, home: row.home, axes: row.axes, value });
    if (row.result === undefined) {
      this.#fail(row);
      return;
    }
    if (this.#currencies.size < MOST_KINDS) this.#currencies.add(row.result.currency);
    for (const code of new Set(row.result.warnings)) {
      const years = this.#warnings.get(code) ?? 0;
      if (years > 0 || this.#warnings.size < MOST_KINDS) this.#warnings.set(code, years + 1);
    }
  }

  #fail({ job, home, problems }: ToldRow): void {
    this.#failed++;
    const [first] = problems;
    const problem = first ?? { code: '', place: '', text: '', remedy: '' };
    const cause = this.#causes.get(problem.code) ?? { code: problem.code, years: 0, examples: [] };
    if (cause.years === 0 && this.#causes.size === MOST_KINDS) return;
    this.#causes.set(problem.code, cause);
    cause.years++;
    if (cause.examples.length < EXAMPLES) cause.examples.push({ job, home, problem });
  }

  /** What was taken so far. */
  get years(): GatheredYears {
    const { best, worst } = this.#ranking.result();
    const column = (figure: YearFigure) => this.#figures.get(figure)?.values ?? new Float64Array(0);
    return {
      rows: this.#jobs.values.length,
      failed: this.#failed,
      jobs: this.#jobs.values,
      figures: {
        cost: column('cost'),
        carbon: column('carbon'),
        seasonalFactor: column('seasonalFactor'),
        backupHours: column('backupHours'),
        saving: column('saving'),
      },
      currencies: [...this.#currencies],
      ...{ best, worst },
      warnings: [...this.#warnings].sort(([, a], [, b]) => b - a),
      causes: [...this.#causes.values()].sort((a, b) => b.years - a.years),
    };
  }
}

function figureOf(row: ToldRow, figure: YearFigure): number | undefined {
  return figure === 'saving' ? row.result?.tariffs[0]?.saving : rankedValue(row, figure);
}
