import { type BoilerYear, boilerYear } from '../../compare/boiler.ts';
import { fuelCost } from '../../compare/fuel.ts';
import { type SpaceHeatEfficiency, usualHotWaterEfficiency } from '../../compare/spaceHeatInput.ts';
import type { YearColumns } from '../../sim/columns.ts';
import type { YearTotals } from '../../sim/totals.ts';
import type { YearPlan } from '../../sim/yearPlan.ts';
import { bill } from '../../tariffs/bill.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import { flowSettingOf } from '../prepare/preparePlan.ts';
import { polylineOf } from '../prepare/prepareUnit.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { TariffCost } from './answer.ts';

/** A year with the scenario's boiler, which meets the whole need; nothing without a boiler. */
export function boilerOf(
  loaded: LoadedScenario,
  plan: YearPlan,
  totals: YearTotals,
  c: YearColumns,
): BoilerYear | undefined {
  const { boiler } = loaded.scenario;
  if (boiler === undefined) return undefined;
  const efficiency = spaceHeatEfficiency(loaded.scenario, boiler.efficiency, plan);
  return boilerYear(
    {
      efficiency,
      hotWaterEfficiency: boiler.hotWaterEfficiency ?? usualHotWaterEfficiency(efficiency),
      fuel: boiler.fuel,
      pumpPower: boiler.pumpPower / 1000,
      servicePerYear: boiler.servicePerYear,
    },
    {
      spaceHeat: plan.house.mass === null ? c.spaceHeatNeed : c.unlimitedNeed,
      hotWater: totals.annual.hotWaterAsked,
      hotWaterByHour: plan.hotWater?.draw ?? new Float64Array(c.hours),
      cylinderLoss: boiler.cylinderLoss ?? totals.annual.cylinderLoss,
    },
  );
}

function spaceHeatEfficiency(
  { house }: Scenario,
  entry: NonNullable<Scenario['boiler']>['efficiency'],
  { weather, house: { designLoad } }: YearPlan,
): SpaceHeatEfficiency {
  if (typeof entry === 'number') return entry;
  return {
    overReturn: polylineOf(entry.byReturnTemperature),
    flow: flowSettingOf(entry.flowTemperature, house.design.roomTemperature, weather),
    designLoad,
  };
}

/** What the fuel of a hybrid costs in the year; 0 without one. */
export function hybridFuelCost(loaded: LoadedScenario, totals: YearTotals): number {
  const { backup } = loaded.scenario;
  return backup?.source === 'boiler' ? fuelCost(backup.fuel, totals.annual.fuel).total : 0;
}

/**
 * The year on each tariff. The heating's cost is the whole bill less the household's alone, the boiler's is its fuel and
 * service and what its pump adds to the household's bill (MODEL section 12).
 */
export function costsOf(
  loaded: LoadedScenario,
  c: YearColumns,
  fuel: number,
  boiler: BoilerYear | undefined,
): TariffCost[] {
  const household = new Float64Array(c.hours);
  return loaded.tariffs.map(({ file, tariff, prepared }) => {
    const whole = bill(prepared, c.electricity);
    const householdBill = bill(prepared, household);
    const heatingCost = whole.total - householdBill.total + fuel;
    const cost = {
      tariff: tariff.name,
      file,
      currency: tariff.currency ?? loaded.scenario.currency,
      pricesStated: tariff.pricesStated,
      bill: whole,
      householdBill,
      heatingCost,
    };
    if (boiler === undefined) return cost;
    const electricity = bill(prepared, boiler.electricity).total - householdBill.total;
    const boilerCost = boiler.cost.total + boiler.service + electricity;
    return { ...cost, boilerCost, saving: boilerCost - heatingCost };
  });
}
