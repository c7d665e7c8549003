import type { Problem } from '../../core/problem.ts';
import type { YearColumns } from '../../sim/columns.ts';
import { seasonalFactors } from '../../sim/seasonalFactors.ts';
import { totalsOf } from '../../sim/totals.ts';
import { simulateYear } from '../../sim/year.ts';
import { type DegreeDays, heatingDegreeDays } from '../../weather/degreeDays.ts';
import type { PreparedWeather } from '../../weather/series.ts';
import { type Kept, KeptKind } from '../kept.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import { heatLossOf, prepareHouse } from '../prepare/prepareHouse.ts';
import { prepareParts, preparePlan } from '../prepare/preparePlan.ts';
import type { Answer, BareAnswer } from './answer.ts';
import { assumptionsOf } from './assumptions.ts';
import { boilerOf } from './boilerOf.ts';
import { carbonOf } from './carbon.ts';
import { comparisonOf } from './comparison.ts';
import { type CostTotals, costsOf, costTotalsOf } from './costs.ts';
import { type HeatingRun, heatingRuns } from './heatingRuns.ts';
import { warningsOf } from './warnings.ts';

/**
 * Simulates a loaded scenario once, prices it on each of its tariffs, and sets it beside the boiler. In the mode `cheapest`
 * every tariff but the first has a run of its own, for its costs.
 *
 * @param loaded a scenario without errors
 * @param found warnings of loading, which the answer carries on
 * @returns the answer; or a problem where the lumped model cannot be built from the house
 */
export function makeAnswer(
  loaded: LoadedScenario,
  found: readonly Problem[] = [],
): { answer?: Answer; problems: Problem[] } {
  const { year, problems } = answerYear(loaded);
  if (year === undefined) return { problems };
  const { costs, plan, totals } = year;
  const comparison = costs[0] && comparisonOf(loaded.scenario, totals, costs[0]);
  const core = { ...year, ...(comparison === undefined ? {} : { comparison }) };
  return {
    answer: { ...core, warnings: warningsOf(core, found), assumptions: assumptionsOf(loaded, plan) },
    problems: [],
  };
}

/** An answer before break-even, other prices and whole life. */
export type YearAnswer = Omit<BareAnswer, 'comparison'>;

/** An answer as far as a row of a batch needs it: of the costs the totals alone. */
export type RowAnswer = Omit<YearAnswer, 'costs'> & { readonly costs: readonly CostTotals[] };

/** Columns that a year writes over. */
export interface UsedColumns {
  readonly year: YearColumns;
  /** All electricity on the bill. */
  readonly billed: Float64Array;
}

/**
 * The year of a loaded scenario: simulated, priced, beside the boiler.
 *
 * @param loaded a scenario without errors
 * @param kept prepared things that are used again
 * @returns the year; or a problem where the lumped model cannot be built from the house
 */
export function answerYear(loaded: LoadedScenario, kept?: Kept): { year?: YearAnswer; problems: Problem[] } {
  const { ran, problems } = runYear(loaded, { kept });
  if (ran === undefined) return { problems };
  const { runs, ...year } = ran;
  return { year: { ...year, costs: costsOf(loaded, runs, year.boiler, kept) }, problems: [] };
}

/**
 * The same for a row of a batch.
 *
 * @param batch what a batch uses again: prepared things, and the columns of a year that is no longer wanted
 */
export function answerRow(
  loaded: LoadedScenario,
  { kept, used }: { readonly kept: Kept; readonly used: UsedColumns },
): { year?: RowAnswer; problems: Problem[] } {
  const { ran, problems } = runYear(loaded, { kept, columns: used.year });
  if (ran === undefined) return { problems };
  const { runs, ...year } = ran;
  const costs = costTotalsOf(loaded, runs, year.boiler, { kept, billed: used.billed });
  return { year: { ...year, costs }, problems: [] };
}

/** A year before its costs, and what the heating takes on each tariff. */
type RanYear = Omit<YearAnswer, 'costs'> & { readonly runs: readonly HeatingRun[] };

function runYear(
  loaded: LoadedScenario,
  { kept, columns: used }: { readonly kept?: Kept | undefined; readonly columns?: YearColumns },
): { ran?: RanYear; problems: Problem[] } {
  const { scenario, clock } = loaded;
  const present = loaded.tariffs[0]?.prepared;
  const prepared = prepareHouse(scenario.house, clock, present, kept);
  if ('opaqueLoss' in prepared) return { problems: [opaqueProblem(loaded.file, prepared.opaqueLoss)] };
  const { house } = prepared;
  const parts = prepareParts(loaded, kept);
  const plan = preparePlan(scenario, { ...parts, clock, house, present }, kept);
  const columns = simulateYear(plan, used);
  const totals = totalsOf(plan, columns);
  const boiler = boilerOf(loaded, { plan, totals, columns }, kept);
  const carbon = carbonOf(loaded, columns, totals, boiler);
  const base = house.baseTemperature ?? house.nominalSetPoint - house.internalGains / house.heatLoss;
  const ran = {
    loaded,
    plan,
    columns,
    totals,
    factors: seasonalFactors(totals.annual),
    heatLoss: heatLossOf(scenario.house).total,
    designLoad: house.designLoad,
    degreeDays: { base, ...degreeDaysTo(base, parts.weather, kept) },
    runs: heatingRuns(loaded.tariffs, plan, columns, totals),
    ...(boiler === undefined ? {} : { boiler }),
    ...(carbon === undefined ? {} : { carbon }),
  };
  return { ran, problems: [] };
}

/** Degree days of a batch, by weather and base. */
const degreeDays = new KeptKind<DegreeDays>(64);

function degreeDaysTo(base: number, weather: PreparedWeather, kept?: Kept): DegreeDays {
  const count = () => heatingDegreeDays(weather.temperature, base, 'hours');
  return degreeDays.of(kept, kept?.key([weather], base) ?? '', count);
}

function opaqueProblem(file: string, { found, most }: { found: number; most: number }): Problem {
  return {
    code: 'house.opaque-loss',
    severity: 'error',
    file,
    path: 'house.heatLoss',
    found: found.toFixed(0),
    allowed: most.toFixed(0),
    unit: 'W/K',
  };
}
