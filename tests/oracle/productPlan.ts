import { curveSetting, emitterSetting, type FlowSetting } from '../../src/sim/flowTemperature.ts';
import { prepareMap } from '../../src/sim/heatPumpMap.ts';
import type { HotWaterPlan } from '../../src/sim/hotWaterPlan.ts';
import type { House } from '../../src/sim/house.ts';
import { massParameters } from '../../src/sim/lumpedHouse.ts';
import { layMassOnWeather } from '../../src/sim/massOnWeather.ts';
import type { PerformanceTable } from '../../src/sim/performanceTable.ts';
import type { HeatPumpUnit } from '../../src/sim/unit.ts';
import { layUnitOnWeather } from '../../src/sim/unitOnWeather.ts';
import type { SourcePrices, YearPlan } from '../../src/sim/yearPlan.ts';
import { frostIndex } from '../../src/weather/frostIndex.ts';
import type { PreparedWeather } from '../../src/weather/series.ts';
import { trailingDayMean } from '../../src/weather/trailingDayMean.ts';
import type {
  PlainBackup,
  PlainCase,
  PlainFlow,
  PlainHotWater,
  PlainHouse,
  PlainLine,
  PlainTable,
  PlainUnit,
  PlainWeather,
} from './plainCase.ts';
import { cycleWaterOf, isResting, mapsOf } from './plainUnit.ts';

const polyline = (line: PlainLine) => ({ at: line.map(([x]) => x), value: line.map(([, y]) => y) });
const bytes = (flags: readonly boolean[]) => Uint8Array.from(flags, (flag) => (flag ? 1 : 0));

/** A plain case as the product's plan, by way of the product's own preparation. */
export function productPlan(plain: PlainCase): YearPlan {
  const weather = weatherOf(plain.weather);
  const house = houseOf(plain.house);
  const { unit, backup } = plain;
  const unitOnWeather = layUnitOnWeather(unitOf(unit), weather);
  return {
    weather,
    house,
    massOnWeather: house.mass === null ? null : layMassOnWeather(house.mass, house, weather),
    flow: flowOf(plain.flow, weather),
    unitOnWeather,
    resting:
      backup.mode.kind === 'alternative'
        ? bytes(plain.weather.temperature.map((_, i) => isResting(plain, i)))
        : unitOnWeather.tooCold,
    quietShare: unit.quietShare === null ? null : Float64Array.from(unit.quietShare),
    inUseAllowance: unit.allowance,
    cycleWater: cycleWaterOf(unit, mapsOf(unit)),
    circulationPower: plain.pump / 1000,
    backup: {
      power: backup.power,
      isBoiler: backup.boiler !== null,
      efficiency: backup.boiler?.efficiency ?? 1,
      hotWaterEfficiency: backup.boiler?.hotWaterEfficiency ?? 1,
    },
    sourcePrices: pricesOf(backup),
    hotWater: plain.hotWater === null ? null : hotWaterOf(plain.hotWater),
  };
}

function weatherOf(weather: PlainWeather): PreparedWeather {
  const temperature = Float64Array.from(weather.temperature);
  const globalRadiation = Float64Array.from(weather.irradiance);
  const ratio = Float64Array.from(weather.humidityRatio);
  const pressure = Float64Array.from(weather.pressure);
  return {
    hours: temperature.length,
    offsetMinutes: 0,
    temperature,
    trailingMeanTemperature: trailingDayMean(temperature),
    globalRadiation,
    trailingMeanRadiation: trailingDayMean(globalRadiation),
    hasRadiation: true,
    humidityRatio: ratio,
    pressure,
    frostIndex: temperature.map((t, i) => frostIndex(t, ratio[i] as number, pressure[i] as number)),
    monthStart: Int32Array.from(weather.monthStart),
  };
}

function houseOf(house: PlainHouse): House {
  const { mass } = house;
  const lumped = mass === null ? null : massParameters(mass.floorArea, mass.massClass, house.heatLoss, mass);
  if (lumped !== null && !('mass' in lumped)) throw new Error(lumped.reason);
  return {
    heatLoss: house.heatLoss / 1000,
    designLoad: house.designLoad,
    setPoint: Float64Array.from(house.setPoint),
    nominalSetPoint: house.enteredBase?.atSetPoint ?? 20,
    baseTemperature: house.enteredBase?.base ?? null,
    internalGains: house.internalGains / 1000,
    solarAperture: house.solarAperture,
    heatingLimit: house.heatingLimit ?? Number.POSITIVE_INFINITY,
    mass: lumped === null ? null : lumped.mass,
  };
}

function flowOf(flow: PlainFlow, weather: PreparedWeather): FlowSetting {
  if (flow.kind === 'line') return curveSetting(polyline(flow.line), weather);
  return emitterSetting({
    flow: flow.flow,
    return: flow.return,
    roomTemperature: flow.room,
    exponent: flow.exponent,
    lowestFlow: flow.lowest,
    highestFlow: flow.highest,
  });
}

function mapOf(table: PlainTable, linear: boolean) {
  const printed: PerformanceTable = {
    outdoor: table.outdoor,
    flow: table.flow,
    capacity: table.capacity.flat(),
    cop: table.cop.flat(),
  };
  return prepareMap(printed, linear ? 'linear' : 'carnotShare');
}

function unitOf(unit: PlainUnit): HeatPumpUnit {
  const { lowest, defrost, cycling, full } = unit;
  return {
    full: mapOf(full, unit.linear),
    lowest:
      lowest.kind === 'table'
        ? { given: 'table', map: mapOf(lowest.table, unit.linear) }
        : { given: 'share', capacity: lowest.capacity, cop: lowest.cop },
    defrost: defrostOf(defrost),
    cycling:
      cycling.kind === 'offPower'
        ? { method: 'offPower', power: cycling.power / 1000 }
        : { method: 'degradation', coefficient: cycling.coefficient },
    lowestOutdoorTemperature: unit.lowestOutdoor ?? Number.NEGATIVE_INFINITY,
    highestFlow: polyline(unit.highestFlow ?? [[0, full.flow[full.flow.length - 1] as number]]),
    standbyPower: unit.standby / 1000,
    crankcasePower: unit.crankcase / 1000,
    crankcaseBelow: unit.crankcaseBelow ?? Number.POSITIVE_INFINITY,
  };
}

function defrostOf(defrost: PlainUnit['defrost']): HeatPumpUnit['defrost'] {
  if (defrost.kind === 'included') return { method: 'included' };
  if (defrost.kind === 'table') {
    return { method: 'table', capacity: polyline(defrost.capacity), cop: polyline(defrost.cop) };
  }
  return { method: 'humidity', capacityLoss: defrost.capacityLoss, copLoss: defrost.copLoss };
}

function pricesOf({ mode }: PlainBackup): SourcePrices | null {
  return mode.kind === 'cheapest' ? { electricity: Float64Array.from(mode.electricity), fuel: mode.fuel } : null;
}

function hotWaterOf(water: PlainHotWater): HotWaterPlan {
  return {
    volume: water.volume,
    setPoint: water.setPoint,
    hysteresis: water.hysteresis,
    lossCoefficient: water.lossCoefficient / 1000,
    surroundingTemperature: water.surroundings,
    draw: Float64Array.from(water.draw),
    coldWater: Float64Array.from(water.coldWater),
    allowed: bytes(water.allowed),
    hygieneAsked: bytes(water.hygieneAsked),
    hygieneTemperature: water.hygieneTemperature,
    immersionPower: water.immersion,
  };
}
