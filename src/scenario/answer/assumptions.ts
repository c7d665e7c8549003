import { type BoilerFuel, carbonFactorOf } from '../../compare/fuel.ts';
import type { YearPlan } from '../../sim/yearPlan.ts';
import type { DefaultUsed } from '../entries/defaultsUsed.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import type { Assumption, DefaultAssumption, RuleAssumption } from './assumption.ts';

/** What the result rests on: every default that was used, and the rules of the model that filled a gap. */
export function assumptionsOf(loaded: LoadedScenario, plan: YearPlan): Assumption[] {
  return [...loaded.defaults.map(defaultAssumption), ...ofModel(loaded, plan), ...ofMoney(loaded)];
}

/** A default that was used, as something the result rests on. */
export function defaultAssumption(used: DefaultUsed): DefaultAssumption {
  return { path: used.path, code: 'default', used };
}

function ofModel(loaded: LoadedScenario, plan: YearPlan): RuleAssumption[] {
  const { scenario, weather, unit } = loaded;
  const list: RuleAssumption[] = [];
  if (weather.series.humidity === undefined) {
    const values = { humidity: scenario.weather.relativeHumidity };
    list.push({ path: 'weather.file', code: 'weather.no-humidity', values });
  }
  if (weather.series.pressure === undefined) {
    list.push({ path: 'weather.file', code: 'weather.no-pressure', values: { altitude: scenario.site.altitude } });
  }
  if (scenario.house.need.model === 'degreeHours' && scenario.house.need.baseTemperature === undefined) {
    list.push({ path: 'house.need', code: 'house.base-from-gains', values: {} });
  }
  if (unit.unit.limits.highestFlow === undefined) {
    const values = { flow: plan.unitOnWeather.highestFlow[0] };
    list.push({ path: 'limits.highestFlow', code: 'limits.flow-of-map', values });
  }
  if (unit.unit.limits.lowestOutdoorTemperature === undefined) {
    list.push({ path: 'limits.lowestOutdoorTemperature', code: 'limits.no-lowest-outdoor', values: {} });
  }
  if (scenario.circulation.waterContent === undefined) {
    const values = { water: plan.cycleWater };
    list.push({ path: 'circulation.waterContent', code: 'circulation.water-by-rule', values });
  }
  if (scenario.hotWater?.draw.given === 'litres' && scenario.hotWater.draw.shares === undefined) {
    list.push({ path: 'hotWater.draw.shares', code: 'hot-water.profile-of-day', values: {} });
  }
  if (scenario.backup === undefined) list.push({ path: 'backup', code: 'backup.none', values: {} });
  return list;
}

/** What the bills and the comparison with the boiler rest on. */
function ofMoney({ scenario, tariffs }: LoadedScenario): RuleAssumption[] {
  const { household, boiler, backup, hotWater, carbon } = scenario;
  const list: RuleAssumption[] = [];
  if (household === undefined && tariffs.length > 0) {
    list.push({ path: 'household', code: 'household.none', values: {} });
  }
  if (household?.given === 'profile' && household.shares === undefined) {
    list.push({ path: 'household.shares', code: 'household.even', values: {} });
  }
  if (backup?.mode.kind === 'cheapest' && tariffs.length > 1) {
    list.push({ path: 'backup.mode', code: 'backup.first-tariff-drives', values: {} });
  }
  if (boiler !== undefined && hotWater !== undefined) {
    if (boiler.cylinderLoss === undefined) {
      list.push({ path: 'boiler.cylinderLoss', code: 'boiler.cylinder-loss', values: {} });
    }
    if (boiler.hotWaterEfficiency === undefined) {
      list.push({ path: 'boiler.hotWaterEfficiency', code: 'boiler.hot-water-efficiency', values: {} });
    }
  }
  if (carbon === undefined) return list;
  const fuels = { 'boiler.fuel': boiler?.fuel, 'backup.fuel': backup?.source === 'boiler' ? backup.fuel : undefined };
  for (const [path, fuel] of Object.entries(fuels)) list.push(...publishedFactor(path, fuel));
  return list;
}

function publishedFactor(path: string, fuel: BoilerFuel | undefined): RuleAssumption[] {
  if (fuel === undefined || fuel.carbonFactor !== undefined) return [];
  const factor = carbonFactorOf(fuel);
  if (factor === undefined) return [];
  const { calorificValue } = fuel;
  return [{ path: `${path}.carbonFactor`, code: 'fuel.published-factor', values: { factor, calorificValue } }];
}
