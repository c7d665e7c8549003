import type { Problem } from '../../core/problem.ts';
import { seasonalFactors } from '../../sim/seasonalFactors.ts';
import { totalsOf } from '../../sim/totals.ts';
import { simulateYear } from '../../sim/year.ts';
import { heatingDegreeDays } from '../../weather/degreeDays.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import { heatLossOf, prepareHouse } from '../prepare/prepareHouse.ts';
import { prepareParts, preparePlan } from '../prepare/preparePlan.ts';
import type { Answer } from './answer.ts';
import { assumptionsOf } from './assumptions.ts';
import { carbonOf } from './carbon.ts';
import { boilerOf, costsOf, hybridFuelCost } from './costs.ts';
import { warningsOf } from './warnings.ts';

/**
 * Simulates a loaded scenario once, prices it on each of its tariffs, and sets it beside the boiler.
 *
 * @param loaded a scenario without errors
 * @param found warnings of loading, which the answer carries on
 * @returns the answer; or a problem where the lumped model cannot be built from the house
 */
export function makeAnswer(
  loaded: LoadedScenario,
  found: readonly Problem[] = [],
): { answer?: Answer; problems: Problem[] } {
  const { scenario, clock } = loaded;
  const present = loaded.tariffs[0]?.prepared;
  const prepared = prepareHouse(scenario.house, clock, present);
  if ('opaqueLoss' in prepared) return { problems: [opaqueProblem(loaded.file, prepared.opaqueLoss)] };
  const { house } = prepared;
  const parts = prepareParts(loaded);
  const plan = preparePlan(scenario, { ...parts, clock, house, present });
  const columns = simulateYear(plan);
  const totals = totalsOf(plan, columns);
  const boiler = boilerOf(loaded, plan, totals, columns);
  const fuelCost = hybridFuelCost(loaded, totals);
  const carbon = carbonOf(scenario, totals, boiler);
  const base = house.baseTemperature ?? house.nominalSetPoint - house.internalGains / house.heatLoss;
  const core = {
    loaded,
    plan,
    columns,
    totals,
    factors: seasonalFactors(totals.annual),
    heatLoss: heatLossOf(scenario.house).total,
    designLoad: house.designLoad,
    degreeDays: { base, ...heatingDegreeDays(parts.weather.temperature, base, 'hours') },
    costs: costsOf(loaded, columns, fuelCost, boiler),
    fuelCost,
    ...(boiler === undefined ? {} : { boiler }),
    ...(carbon === undefined ? {} : { carbon }),
  };
  return {
    answer: { ...core, warnings: warningsOf(core, found), assumptions: assumptionsOf(loaded, plan) },
    problems: [],
  };
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
