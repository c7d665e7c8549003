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
import { costsOf } from './costs.ts';
import { heatingRuns } from './heatingRuns.ts';
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

/** An answer as far as a row of a batch needs it: no break-even, no other prices, no whole life. */
export type YearAnswer = Omit<BareAnswer, 'comparison'>;

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
 * @param batch what a batch uses again: prepared things, and the columns of a year that is no longer wanted
 * @returns the year; or a problem where the lumped model cannot be built from the house
 */
export function answerYear(
  loaded: LoadedScenario,
  { kept, used }: { readonly kept?: Kept; readonly used?: UsedColumns } = {},
): { year?: YearAnswer; problems: Problem[] } {
  const { scenario, clock } = loaded;
  const present = loaded.tariffs[0]?.prepared;
  const prepared = prepareHouse(scenario.house, clock, present, kept);
  if ('opaqueLoss' in prepared) return { problems: [opaqueProblem(loaded.file, prepared.opaqueLoss)] };
  const { house } = prepared;
  const parts = prepareParts(loaded, kept);
  const plan = preparePlan(scenario, { ...parts, clock, house, present }, kept);
  const columns = simulateYear(plan, used?.year);
  const totals = totalsOf(plan, columns);
  const boiler = boilerOf(loaded, { plan, totals, columns }, kept);
  const costs = costsOf(loaded, heatingRuns(loaded.tariffs, plan, columns, totals), boiler, {
    kept,
    billed: used?.billed,
  });
  const carbon = carbonOf(loaded, columns, totals, boiler);
  const base = house.baseTemperature ?? house.nominalSetPoint - house.internalGains / house.heatLoss;
  const year = {
    loaded,
    plan,
    columns,
    totals,
    factors: seasonalFactors(totals.annual),
    heatLoss: heatLossOf(scenario.house).total,
    designLoad: house.designLoad,
    degreeDays: { base, ...degreeDaysTo(base, parts.weather, kept) },
    costs,
    ...(boiler === undefined ? {} : { boiler }),
    ...(carbon === undefined ? {} : { carbon }),
  };
  return { year, problems: [] };
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
