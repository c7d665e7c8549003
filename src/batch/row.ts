import type { Problem } from '../core/problem.ts';
import type { RowAnswer } from '../scenario/answer/makeAnswer.ts';
import type { Warning } from '../scenario/answer/warning.ts';
import type { AxisValue } from './axes.ts';
import { rowFigures, type TariffFigure } from './rowColumns.ts';

/** What a tariff costs in one row; money in the row's currency. */
export type RowTariff = { readonly name: string } & {
  readonly [F in TariffFigure]?: number | undefined;
};

/** What was found for one job. */
export interface RowResult {
  readonly currency: string;
  /** Figures by the names of `rowFigures`, or the word for why there is none; what is not asked for is left out. */
  readonly figures: Readonly<Record<string, number | string>>;
  readonly tariffs: readonly RowTariff[];
  /** Codes of the warnings, in the order of the result. */
  readonly warnings: readonly string[];
}

/** One job: a home with one option of the axes. */
export interface Row {
  /** Counted from 1, home by home. */
  readonly job: number;
  readonly home: string;
  /** Line of the home in its table; absent without a table. */
  readonly homesLine?: number;
  /** A value of each axis. */
  readonly axes: readonly AxisValue['label'][];
  /** Absent where the job failed. */
  readonly result?: RowResult;
  /** Why it failed; empty where it did not. */
  readonly problems: readonly Problem[];
}

/** The figures of a row from the year of its scenario, unrounded. */
export function rowResult(answer: RowAnswer, warnings: readonly Warning[]): RowResult {
  const figures: Record<string, number | string> = {};
  for (const { name, of } of rowFigures) {
    const value = of(answer);
    if (value !== undefined) figures[name] = value;
  }
  return {
    currency: answer.loaded.scenario.currency,
    figures,
    tariffs: answer.costs.map(({ tariff, billTotal, heatingCost, boilerCost, saving }) => ({
      name: tariff,
      total: billTotal,
      systemTotal: heatingCost,
      ...(boilerCost === undefined ? {} : { boilerTotal: boilerCost }),
      ...(saving === undefined ? {} : { saving }),
    })),
    warnings: warnings.map(({ code }) => code),
  };
}
