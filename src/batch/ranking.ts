import { type Distribution, distribution } from './distribution.ts';
import { GrowingColumn } from './growingColumn.ts';
import type { Row } from './row.ts';

/** What rows may be ranked by, whether little or much of it is good, and the decimals it is written with. */
export const criteria = {
  cost: { figure: 'tariff1.systemTotal', best: 'least', decimals: 0 },
  carbon: { figure: 'carbonHeatPump', best: 'least', decimals: 0 },
  seasonalFactor: { figure: 'h4', best: 'most', decimals: 2 },
  backupHours: { figure: 'backupHours', best: 'least', decimals: 0 },
} as const;

export type Criterion = keyof typeof criteria;

/** The criterion that a word names; the cost where it names none. */
export function criterionOf(word: string | undefined): Criterion {
  return word === 'carbon' || word === 'seasonalFactor' || word === 'backupHours' ? word : 'cost';
}

/** The figure by which a row is ranked; undefined where the row has none, or a word in its place. */
export function rankedValue({ result }: Pick<Row, 'result'>, by: Criterion): number | undefined {
  if (by === 'cost') return result?.tariffs[0]?.systemTotal;
  const value = result?.figures[criteria[by].figure];
  return typeof value === 'number' ? value : undefined;
}

/** A row as far as it is ranked. */
export interface RankedRow {
  readonly job: number;
  readonly home: string;
  readonly axes: readonly (string | number | boolean)[];
  readonly value: number;
}

/** Values of an axis side by side, the best mean first. */
export interface AxisRanking {
  readonly axis: string;
  readonly values: readonly { readonly value: string | number | boolean; readonly spread: Distribution }[];
}

/** Best and worst rows by a criterion, and how it is spread. */
export interface RankingResult {
  readonly spread: Distribution | undefined;
  readonly best: readonly RankedRow[];
  readonly worst: readonly RankedRow[];
  readonly axes: readonly AxisRanking[];
}

/** Ranks rows as they come; of all but the best and the worst only the value is kept. */
export class Ranking {
  readonly #axes: readonly string[];
  readonly #top: number;
  readonly #sign: number;
  readonly #values = new GrowingColumn();
  readonly #groups: {
    readonly labels: RankedRow['axes'][number][];
    readonly index: Map<unknown, number>;
    readonly of: GrowingColumn;
  }[];
  #best: RankedRow[] = [];
  #worst: RankedRow[] = [];

  /**
   * @param axes names of all axes of the rows
   * @param top rows that are listed at either end, at least 1
   */
  constructor(criterion: Criterion, axes: readonly string[], top: number) {
    this.#axes = axes;
    this.#top = top;
    this.#sign = criteria[criterion].best === 'least' ? 1 : -1;
    this.#groups = axes.map(() => ({ labels: [], index: new Map(), of: new GrowingColumn() }));
  }

  /** Takes a row; rows come in the order of their jobs, which decides between equals. */
  add(row: RankedRow): void {
    this.#values.add(row.value);
    this.#groups.forEach((group, a) => {
      const label = row.axes[a];
      const known = group.index.get(label) ?? group.labels.push(label) - 1;
      group.index.set(label, known);
      group.of.add(known);
    });
    this.#best = this.#inserted(this.#best, row, this.#sign);
    this.#worst = this.#inserted(this.#worst, row, -this.#sign);
  }

  #inserted(rows: RankedRow[], row: RankedRow, sign: number): RankedRow[] {
    const last = rows[rows.length - 1];
    if (rows.length === this.#top && last !== undefined && sign * row.value >= sign * last.value) return rows;
    const at = rows.findIndex((other) => sign * row.value < sign * other.value);
    return rows.toSpliced(at < 0 ? rows.length : at, 0, row).slice(0, this.#top);
  }

  /** @param only the one axis whose values are set side by side; every axis when left out */
  result(only?: string): RankingResult {
    const axes = this.#axes.flatMap((axis, a) => (only === undefined || axis === only ? [this.#axis(axis, a)] : []));
    return { spread: distribution(this.#values.values), best: this.#best, worst: this.#worst, axes };
  }

  #axis(axis: string, a: number): AxisRanking {
    const { labels, of } = this.#groups[a];
    const groupOf = of.values;
    const values = labels.flatMap((value, g) => {
      const spread = distribution(this.#values.values.filter((_, i) => groupOf[i] === g));
      return spread === undefined ? [] : [{ value, spread }];
    });
    return { axis, values: values.sort((x, y) => this.#sign * (x.spread.mean - y.spread.mean)) };
  }
}
