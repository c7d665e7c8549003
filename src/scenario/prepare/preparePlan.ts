import { curveSetting, emitterSetting, type FlowSetting } from '../../sim/flowTemperature.ts';
import type { House } from '../../sim/house.ts';
import { layMassOnWeather } from '../../sim/massOnWeather.ts';
import type { HeatPumpUnit } from '../../sim/unit.ts';
import { layUnitOnWeather, type UnitOnWeather } from '../../sim/unitOnWeather.ts';
import type { Backup, SourcePrices, YearPlan } from '../../sim/yearPlan.ts';
import type { CivilClock } from '../../tariffs/civilClock.ts';
import type { PreparedTariff } from '../../tariffs/preparedTariff.ts';
import { prepareWeather } from '../../weather/prepareWeather.ts';
import type { PreparedWeather } from '../../weather/series.ts';
import { type Kept, KeptKind } from '../kept.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import type { Scenario } from '../scenarioSchema.ts';
import { prepareHotWater } from './prepareHotWater.ts';
import { polylineOf, prepareUnit } from './prepareUnit.ts';
import { stepsOfRule } from './schedules.ts';

/** What a plan is made of besides the scenario; weather and unit may be shared by many plans. */
export interface PlanParts {
  readonly weather: PreparedWeather;
  readonly unitOnWeather: UnitOnWeather;
  readonly clock: CivilClock;
  readonly house: House;
  /** The tariff that drives the mode `cheapest`: the first. */
  readonly present: PreparedTariff | undefined;
}

/** What the scenarios of a batch may have in common; a unit on a weather takes about a megabyte. */
const weathers = new KeptKind<PreparedWeather>(64);
const unitsOnWeather = new KeptKind<UnitOnWeather>(64);
const flowSettings = new KeptKind<FlowSetting>(64);
const quietColumns = new KeptKind<Float64Array>(64);

/**
 * Weather and unit of a loaded scenario, prepared.
 *
 * @param kept where the scenarios of a batch keep them
 */
export function prepareParts(loaded: LoadedScenario, kept?: Kept): Pick<PlanParts, 'weather' | 'unitOnWeather'> {
  const { altitude } = loaded.scenario.site;
  const defaultRelativeHumidity = loaded.scenario.weather.relativeHumidity;
  const site = { altitude, defaultRelativeHumidity };
  const { unit } = loaded;
  const { series } = loaded.weather;
  const weather = weathers.of(kept, kept?.key([series], site) ?? '', () => prepareWeather(series, site));
  const lay = () => layUnitOnWeather(prepareUnit(unit), weather);
  return { weather, unitOnWeather: unitsOnWeather.of(kept, kept?.key([unit, weather]) ?? '', lay) };
}

/**
 * The plan of one run.
 *
 * @param kept where the scenarios of a batch keep what they have in common
 */
export function preparePlan(scenario: Scenario, parts: PlanParts, kept?: Kept): YearPlan {
  const { weather, unitOnWeather, clock, house, present } = parts;
  return {
    weather,
    house,
    massOnWeather: house.mass === null ? null : layMassOnWeather(house.mass, house, weather),
    flow: keptFlowSetting(scenario, weather, kept),
    unitOnWeather,
    resting: restingHours(scenario, unitOnWeather, weather),
    quietShare: quietShares(scenario, clock, kept),
    inUseAllowance: scenario.heatPump.inUseAllowance,
    cycleWater: scenario.circulation.waterContent ?? usualCycleWater(unitOnWeather.unit),
    circulationPower: scenario.circulation.pumpPower / 1000,
    backup: backupOf(scenario),
    sourcePrices: sourcePricesOf(scenario, present),
    hotWater: scenario.hotWater === undefined ? null : prepareHotWater(scenario.hotWater, clock, kept),
  };
}

function keptFlowSetting({ flowTemperature, house }: Scenario, weather: PreparedWeather, kept?: Kept): FlowSetting {
  const { roomTemperature } = house.design;
  const make = () => flowSettingOf(flowTemperature, roomTemperature, weather);
  return flowSettings.of(kept, kept?.key([weather], flowTemperature, roomTemperature) ?? '', make);
}

/** A flow setting from its entry; the room of the emitters is the design room where none is given. */
export function flowSettingOf(
  entry: Scenario['flowTemperature'],
  designRoom: number,
  weather: PreparedWeather,
): FlowSetting {
  if (entry.method === 'curve') return curveSetting(polylineOf(entry.points), weather);
  if (entry.method === 'fixed') return curveSetting({ at: [0], value: [entry.flow] }, weather);
  return emitterSetting({
    flow: entry.flow,
    return: entry.return,
    roomTemperature: entry.roomTemperature ?? designRoom,
    exponent: entry.exponent,
    lowestFlow: entry.lowestFlow,
    highestFlow: entry.highestFlow ?? entry.flow,
  });
}

/** Hours in which the heat pump rests: too cold for it, or below the switch temperature of an alternative backup. */
function restingHours(scenario: Scenario, onWeather: UnitOnWeather, weather: PreparedWeather): Uint8Array {
  const mode = scenario.backup?.mode;
  if (mode?.kind !== 'alternative') return onWeather.tooCold;
  return onWeather.tooCold.map((cold, i) => (cold === 1 || weather.temperature[i] < mode.switchTemperature ? 1 : 0));
}

function quietShares(scenario: Scenario, clock: CivilClock, kept?: Kept): Float64Array | null {
  const rules = scenario.heatPump.quietHours;
  if (rules.length === 0) return null;
  return quietColumns.of(kept, kept?.key([clock], rules) ?? '', () => quietColumn(rules, clock));
}

function quietColumn(rules: Scenario['heatPump']['quietHours'], clock: CivilClock): Float64Array {
  const shares = new Float64Array(clock.hours).fill(1);
  for (const rule of rules.toReversed()) {
    const holds = stepsOfRule(rule, clock);
    for (let i = 0; i < clock.hours; i++) if (holds[i] === 1) shares[i] = rule.capacity;
  }
  return shares;
}

/** Water on which a short run works: 20 L a kW of lowest level, at least 100 L (MODEL section 9; common practice, no source). */
const CYCLE_WATER_PER_KW = 20;
const LEAST_CYCLE_WATER = 100;
/** The lowest level is read at the grid row nearest this outdoor temperature, the colder at a tie, °C. */
const CYCLE_WATER_ROW = 7;

function usualCycleWater({ full, lowest }: HeatPumpUnit): number {
  const { outdoor, flow, capacity } = lowest.given === 'table' ? lowest.map : full;
  let row = 0;
  for (let r = 1; r < outdoor.length; r++) {
    if (Math.abs(outdoor[r] - CYCLE_WATER_ROW) < Math.abs(outdoor[row] - CYCLE_WATER_ROW)) row = r;
  }
  const kW = capacity[row * flow.length] * (lowest.given === 'share' ? lowest.capacity : 1);
  return Math.max(LEAST_CYCLE_WATER, CYCLE_WATER_PER_KW * kW);
}

function backupOf({ backup }: Scenario): Backup {
  if (backup === undefined) return { power: 0, isBoiler: false, efficiency: 1, hotWaterEfficiency: 1 };
  if (backup.source === 'electric') {
    return { power: backup.power, isBoiler: false, efficiency: 1, hotWaterEfficiency: 1 };
  }
  const hotWaterEfficiency = backup.hotWaterEfficiency ?? backup.efficiency;
  return { power: backup.power, isBoiler: true, efficiency: backup.efficiency, hotWaterEfficiency };
}

function sourcePricesOf({ backup }: Scenario, present: PreparedTariff | undefined): SourcePrices | null {
  if (backup?.source !== 'boiler' || backup.mode.kind !== 'cheapest' || present === undefined) return null;
  const taxes = backup.fuel.taxes.reduce((sum, tax) => sum + tax.percent, 0) / 100;
  return { electricity: present.marginalPrice, fuel: backup.fuel.price * (1 + taxes) };
}
