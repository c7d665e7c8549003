import { type BoilerYear, boilerYear } from '../../compare/boiler.ts';
import { type SpaceHeatEfficiency, usualHotWaterEfficiency } from '../../compare/spaceHeatInput.ts';
import type { YearColumns } from '../../sim/columns.ts';
import type { YearTotals } from '../../sim/totals.ts';
import type { YearPlan } from '../../sim/yearPlan.ts';
import { type Kept, KeptKind } from '../kept.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import { flowSettingOf } from '../prepare/preparePlan.ts';
import { polylineOf } from '../prepare/prepareUnit.ts';
import type { Scenario } from '../scenarioSchema.ts';

/** A year that a boiler would be run through. */
interface BoilerRun {
  readonly plan: YearPlan;
  readonly totals: YearTotals;
  readonly columns: YearColumns;
}

/** Boilers of a batch: the options of a home often leave its need what it is. */
const boilers = new KeptKind<BoilerYear>(8);

/**
 * A year with the scenario's boiler, which meets the whole need; nothing without a boiler.
 *
 * @param kept where the scenarios of a batch keep it
 */
export function boilerOf(loaded: LoadedScenario, run: BoilerRun, kept?: Kept): BoilerYear | undefined {
  const { boiler, house, hotWater } = loaded.scenario;
  if (boiler === undefined) return undefined;
  const { hotWaterAsked, cylinderLoss } = run.totals.annual;
  // the need follows from house and weather, whatever the heat pump does with it
  const key = kept?.key(needsOf(loaded, run.plan), house, boiler, hotWater, hotWaterAsked, cylinderLoss) ?? '';
  return boilers.of(kept, key, () => yearOf(loaded, boiler, run));
}

/** The set points may follow the rates of the first tariff. */
function needsOf({ clock, tariffs }: LoadedScenario, { weather }: YearPlan): object[] {
  const [present] = tariffs;
  return present === undefined ? [weather, clock] : [weather, clock, present.prepared];
}

function yearOf(
  loaded: LoadedScenario,
  boiler: NonNullable<Scenario['boiler']>,
  { plan, totals, columns: c }: BoilerRun,
): BoilerYear {
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
      cylinderLossByHour: boiler.cylinderLoss === undefined ? c.cylinderLoss : undefined,
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
