import { type BoilerFuel, carbonFactorOf } from '../../compare/fuel.ts';
import type { YearPlan } from '../../sim/yearPlan.ts';
import type { DefaultUsed } from '../entries/defaultsUsed.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import type { Assumption } from './answer.ts';

/** What the result rests on: every default that was used, and the rules of the model that filled a gap. */
export function assumptionsOf(loaded: LoadedScenario, plan: YearPlan): Assumption[] {
  return [...loaded.defaults.map(asAssumption), ...ofModel(loaded, plan), ...ofMoney(loaded)];
}

/** A default that was used, as something the result rests on. */
export function asAssumption({ path, value, unit, says }: DefaultUsed): Assumption {
  return { path, text: `${String(value)}${unit === undefined ? '' : ` ${unit}`}. ${says}`.trimEnd() };
}

function ofModel(loaded: LoadedScenario, plan: YearPlan): Assumption[] {
  const { scenario, weather, unit } = loaded;
  const list: Assumption[] = [];
  const add = (path: string, text: string) => list.push({ path, text });
  if (weather.series.humidity === undefined) {
    add('weather.file', `The file has no humidity: ${scenario.weather.relativeHumidity} % in every hour.`);
  }
  if (weather.series.pressure === undefined) {
    add('weather.file', `The file has no pressure: the standard atmosphere at ${scenario.site.altitude} m.`);
  }
  if (scenario.house.need.model === 'degreeHours' && scenario.house.need.baseTemperature === undefined) {
    add(
      'house.need',
      'The base temperature follows from set point, gains and heat loss; the house stores a day’s sun.',
    );
  }
  if (unit.unit.limits.highestFlow === undefined) {
    add('limits.highestFlow', `${plan.unitOnWeather.highestFlow[0]} °C, the highest flow of the unit’s map.`);
  }
  if (unit.unit.limits.lowestOutdoorTemperature === undefined) {
    add('limits.lowestOutdoorTemperature', 'None is entered: the unit runs however cold it is.');
  }
  if (scenario.circulation.waterContent === undefined) {
    add(
      'circulation.waterContent',
      `${plan.cycleWater.toFixed(0)} L, by rule of thumb (20 L a kW, at least 100 L; common practice, no source). Only the estimate of starts depends on it.`,
    );
  }
  if (scenario.hotWater?.draw.given === 'litres' && scenario.hotWater.draw.shares === undefined) {
    add('hotWater.draw.shares', 'Spread over the day as in tapping profile M.');
  }
  if (scenario.backup === undefined) add('backup', 'There is no backup heater.');
  return list;
}

/** What the bills and the comparison with the boiler rest on. */
function ofMoney({ scenario, tariffs }: LoadedScenario): Assumption[] {
  const { household, boiler, backup, hotWater, carbon } = scenario;
  const list: Assumption[] = [];
  const add = (path: string, text: string) => list.push({ path, text });
  if (household === undefined && tariffs.length > 0) {
    add('household', 'No electricity of a household is entered: the bill is that of the heating alone.');
  }
  if (household?.given === 'profile' && household.shares === undefined) {
    add('household.shares', 'Even over the hours of the day.');
  }
  if (backup?.mode.kind === 'cheapest' && tariffs.length > 1) {
    add(
      'backup.mode',
      'The first tariff drives the year; every further tariff has a run of its own, for its costs alone.',
    );
  }
  if (boiler !== undefined && hotWater !== undefined) {
    if (boiler.cylinderLoss === undefined) add('boiler.cylinderLoss', 'That of the heat pump’s run.');
    if (boiler.hotWaterEfficiency === undefined) {
      add('boiler.hotWaterEfficiency', 'That for space heat, of a condensing boiler at its hottest return.');
    }
  }
  if (carbon === undefined) return list;
  const fuels = { 'boiler.fuel': boiler?.fuel, 'backup.fuel': backup?.source === 'boiler' ? backup.fuel : undefined };
  for (const [path, fuel] of Object.entries(fuels)) list.push(...publishedFactor(path, fuel));
  return list;
}

function publishedFactor(path: string, fuel: BoilerFuel | undefined): Assumption[] {
  if (fuel === undefined || fuel.carbonFactor !== undefined) return [];
  const factor = carbonFactorOf(fuel);
  if (factor === undefined) return [];
  const says = `Regulation (EU) 2018/2066, on ${fuel.calorificValue} calorific value.`;
  return [{ path: `${path}.carbonFactor`, text: `${factor.toFixed(3)} kg/kWh. ${says}` }];
}
