import type { AnnualCost } from '../../compare/annualCost.ts';
import type { BoilerYear } from '../../compare/boiler.ts';
import type { YearColumns } from '../../sim/columns.ts';
import type { SeasonalFactors } from '../../sim/seasonalFactors.ts';
import type { YearTotals } from '../../sim/totals.ts';
import type { YearPlan } from '../../sim/yearPlan.ts';
import type { Bill } from '../../tariffs/bill.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import type { LoadedTariff } from '../loadTariffs.ts';
import type { Assumption } from './assumption.ts';
import type { Comparison } from './comparison.ts';
import type { Warning } from './warning.ts';

/** One tariff: the whole bill, and the heating's part of it beside the boiler's on the same tariff. */
export interface TariffCost {
  readonly tariff: string;
  readonly file: string;
  readonly currency: string;
  readonly pricesStated: LoadedTariff['pricesStated'];
  readonly taxes: LoadedTariff['taxes'];
  /** All electricity on the bill, kWh a step. */
  readonly electricity: Float64Array;
  /** The whole bill: heating and household. */
  readonly bill: Bill;
  /** The bill of the household alone: standing charges only, where no household is entered. */
  readonly householdBill: Bill;
  /** Cost of the heating by its parts: bill less the household's, a hybrid's fuel, service entered for the whole life. */
  readonly heating: AnnualCost;
  /** All of it. */
  readonly heatingCost: number;
  /** Cost of the boiler by its parts: what its electricity adds to the household's bill, fuel, service; absent without one. */
  readonly boiler?: AnnualCost;
  /** All of it; absent without a boiler. */
  readonly boilerCost?: number;
  /** Boiler less heating; absent without a boiler. */
  readonly saving?: number;
}

/** Carbon of a year, kg; or why it is not known. */
export type Carbon = number | 'no factor' | 'no boiler';

/** Everything that was found for one scenario, before it is printed or written. */
export interface Answer {
  readonly loaded: LoadedScenario;
  readonly plan: YearPlan;
  readonly columns: YearColumns;
  readonly totals: YearTotals;
  readonly factors: SeasonalFactors;
  /** Heat loss, W/K. */
  readonly heatLoss: number;
  readonly designLoad: number;
  /** Heating degree hours to the set point's base, K·d, and that base. */
  readonly degreeDays: { readonly base: number; readonly annual: number; readonly monthly: readonly number[] };
  readonly costs: readonly TariffCost[];
  readonly boiler?: BoilerYear;
  /** On the first tariff; absent without a boiler or a tariff. */
  readonly comparison?: Comparison;
  readonly carbon?: { readonly heatPump: Carbon; readonly boiler: Carbon };
  readonly warnings: readonly Warning[];
  readonly assumptions: readonly Assumption[];
}

/** An answer before its warnings and assumptions. */
export type BareAnswer = Omit<Answer, 'warnings' | 'assumptions'>;

/** A year before its costs: what its warnings are about. */
export type SeenYear = Omit<BareAnswer, 'costs' | 'comparison'>;
