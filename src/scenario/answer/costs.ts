import { type AnnualCost, annualTotal, electricityCost, fuelParts } from '../../compare/annualCost.ts';
import type { BoilerYear } from '../../compare/boiler.ts';
import { fuelCost } from '../../compare/fuel.ts';
import { type Bill, bill, billTotal } from '../../tariffs/bill.ts';
import type { PreparedTariff } from '../../tariffs/preparedTariff.ts';
import { type Kept, KeptKind } from '../kept.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import type { TariffCost } from './answer.ts';
import type { HeatingRun } from './heatingRuns.ts';

/** What the fuel of a hybrid costs in a year, and of it the energy with its taxes; nothing without one. */
function hybridFuelCost(loaded: LoadedScenario, fuel: number): Pick<AnnualCost, 'fuel' | 'fuelEnergy'> {
  const { backup } = loaded.scenario;
  return backup?.source === 'boiler' ? fuelParts(fuelCost(backup.fuel, fuel)) : { fuel: 0, fuelEnergy: 0 };
}

/** What a row of a batch says of a tariff; the same figures as in `TariffCost`. */
export interface CostTotals {
  readonly tariff: string;
  /** The whole bill. */
  readonly billTotal: number;
  readonly heatingCost: number;
  /** Absent without a boiler, as is the saving. */
  readonly boilerCost?: number;
  readonly saving?: number;
}

/** What a batch uses again: what it keeps of bills, and a column for all electricity on the bill. */
interface UsedForCosts {
  readonly kept?: Kept | undefined;
  readonly billed?: Float64Array | undefined;
}

/**
 * The totals alone of the year on each tariff, to the last digit those of `costsOf`.
 *
 * @param runs what the heating takes on each tariff
 * @param boiler the year with the boiler, where there is one
 */
export function costTotalsOf(
  loaded: LoadedScenario,
  runs: readonly HeatingRun[],
  boiler: BoilerYear | undefined,
  { kept, billed }: UsedForCosts,
): CostTotals[] {
  const { household, scenario } = loaded;
  const service = scenario.wholeLife?.servicePerYear ?? 0;
  const withBoiler = boiler && keptSum(household, boiler.electricity, kept);
  const onBill = billedOf(household, billed);
  return loaded.tariffs.map(({ name, prepared }, i) => {
    const whole = billTotal(prepared, onBill(runs[i]));
    const ofHousehold = keptTotal(prepared, household, kept);
    const { fuel } = hybridFuelCost(loaded, runs[i].fuel);
    const heatingCost = annualTotal({ electricity: whole - ofHousehold, fuel, service });
    const cost = { tariff: name, billTotal: whole, heatingCost };
    if (boiler === undefined || withBoiler === undefined) return cost;
    const electricity = keptTotal(prepared, withBoiler, kept) - ofHousehold;
    const boilerCost = annualTotal({ electricity, fuel: boiler.cost.total, service: boiler.service });
    return { ...cost, boilerCost, saving: boilerCost - heatingCost };
  });
}

/**
 * The year on each tariff: heating and household on one bill. The heating costs that bill less the household's alone, the
 * fuel of a hybrid and its service; the boiler its fuel and service and what its electricity adds to the household's bill.
 *
 * @param runs what the heating takes on each tariff
 * @param boiler the year with the boiler, where there is one
 * @param kept where the scenarios of a batch keep the bills of household and boiler
 *
 * Reference: MODEL section 12.
 */
export function costsOf(
  loaded: LoadedScenario,
  runs: readonly HeatingRun[],
  boiler: BoilerYear | undefined,
  kept?: Kept,
): TariffCost[] {
  const { household, scenario } = loaded;
  const service = scenario.wholeLife?.servicePerYear ?? 0;
  const withBoiler = boiler && keptSum(household, boiler.electricity, kept);
  const onBill = billedOf(household);
  return loaded.tariffs.map((tariff, i) => {
    const { prepared } = tariff;
    const electricity = onBill(runs[i]);
    const whole = bill(prepared, electricity);
    const householdBill = keptBill(prepared, household, kept);
    const heating = {
      ...electricityCost(whole, householdBill),
      ...hybridFuelCost(loaded, runs[i].fuel),
      service,
    };
    const heatingCost = annualTotal(heating);
    const cost = {
      tariff: tariff.name,
      file: tariff.file,
      currency: tariff.currency ?? scenario.currency,
      pricesStated: tariff.pricesStated,
      taxes: tariff.taxes,
      electricity,
      bill: whole,
      householdBill,
      heating,
      heatingCost,
    };
    if (boiler === undefined || withBoiler === undefined) return cost;
    const boilerParts = {
      ...electricityCost(keptBill(prepared, withBoiler, kept), householdBill),
      ...fuelParts(boiler.cost),
      service: boiler.service,
    };
    const boilerCost = annualTotal(boilerParts);
    return { ...cost, boiler: boilerParts, boilerCost, saving: boilerCost - heatingCost };
  });
}

/**
 * All electricity on the bill of a run; on most scenarios all tariffs share one run, and so one column.
 *
 * @param column written over for each run; without it each run has a column of its own
 */
function billedOf(household: Float64Array, column?: Float64Array): (run: HeatingRun) => Float64Array {
  let last: { run: HeatingRun; electricity: Float64Array } | undefined;
  return (run) => {
    if (last?.run !== run) last = { run, electricity: sumOf(household, run.electricity, column) };
    return last.electricity;
  };
}

/** Bills and columns that the scenarios of a batch have in common; those of the heating itself differ from year to year. */
const bills = new KeptKind<Bill>(256);
const totals = new KeptKind<number>(256);
const sums = new KeptKind<Float64Array>(16);

function keptBill(prepared: PreparedTariff, electricity: Float64Array, kept?: Kept): Bill {
  return bills.of(kept, kept?.key([prepared, electricity]) ?? '', () => bill(prepared, electricity));
}

function keptTotal(prepared: PreparedTariff, electricity: Float64Array, kept?: Kept): number {
  return totals.of(kept, kept?.key([prepared, electricity]) ?? '', () => billTotal(prepared, electricity));
}

function keptSum(a: Float64Array, b: Float64Array, kept?: Kept): Float64Array {
  return sums.of(kept, kept?.key([a, b]) ?? '', () => sumOf(a, b));
}

function sumOf(a: Float64Array, b: Float64Array, sum: Float64Array = new Float64Array(a.length)): Float64Array {
  for (let i = 0; i < sum.length; i++) sum[i] = a[i] + b[i];
  return sum;
}
