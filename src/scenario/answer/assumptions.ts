import type { YearPlan } from '../../sim/yearPlan.ts';
import type { DefaultUsed } from '../entries/defaultsUsed.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import type { Assumption } from './answer.ts';

/** What the result rests on: every default that was used, and the rules of the model that filled a gap. */
export function assumptionsOf(loaded: LoadedScenario, plan: YearPlan): Assumption[] {
  return [...loaded.defaults.map(asAssumption), ...ofModel(loaded, plan)];
}

/** A default that was used, as something the result rests on. */
export function asAssumption({ path, value, unit, says }: DefaultUsed): Assumption {
  return { path, text: `${String(value)}${unit === undefined ? '' : ` ${unit}`}. ${says}` };
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
