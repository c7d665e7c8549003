import { columnSum } from '../../core/columnSum.ts';
import { newColumns, type YearColumns } from '../../sim/columns.ts';
import type { YearTotals } from '../../sim/totals.ts';
import { simulateYear } from '../../sim/year.ts';
import type { YearPlan } from '../../sim/yearPlan.ts';
import type { LoadedTariff } from '../loadTariffs.ts';

/** What the heating takes in a year on one tariff. */
export interface HeatingRun {
  /** kWh a step. */
  readonly electricity: Float64Array;
  /** Fuel of a hybrid, kWh. */
  readonly fuel: number;
}

/**
 * What the heating takes on each tariff: the same on all, from one run; in the mode `cheapest` the first tariff drives that
 * run, and every further tariff has its own, for its costs.
 *
 * @param plan the plan that was run
 * @param c its columns
 * @returns in the order of the tariffs
 *
 * Reference: MODEL section 10.
 */
export function heatingRuns(
  tariffs: readonly LoadedTariff[],
  plan: YearPlan,
  c: YearColumns,
  totals: YearTotals,
): HeatingRun[] {
  const first: HeatingRun = { electricity: c.electricity, fuel: totals.annual.fuel };
  const { sourcePrices } = plan;
  if (sourcePrices === null) return tariffs.map(() => first);
  const again = newColumns(c.hours);
  return tariffs.map(({ prepared }, i) => {
    if (i === 0) return first;
    simulateYear({ ...plan, sourcePrices: { ...sourcePrices, electricity: prepared.marginalPrice } }, again);
    return { electricity: again.electricity.slice(), fuel: columnSum(again.fuel, 0, again.hours) };
  });
}
