import { expect } from 'vitest';
import type { Polyline } from '../../../src/core/polyline.ts';
import type { YearColumns } from '../../../src/sim/columns.ts';
import { curveSetting, type Emitters, emitterSetting, type FlowSetting } from '../../../src/sim/flowTemperature.ts';
import { type HeatPumpMap, type MapInterpolation, prepareMap } from '../../../src/sim/heatPumpMap.ts';
import type { HotWaterPlan } from '../../../src/sim/hotWaterPlan.ts';
import type { House } from '../../../src/sim/house.ts';
import { layMassOnWeather } from '../../../src/sim/massOnWeather.ts';
import type { PerformanceTable } from '../../../src/sim/performanceTable.ts';
import type { HeatPumpUnit } from '../../../src/sim/unit.ts';
import { layUnitOnWeather } from '../../../src/sim/unitOnWeather.ts';
import type { Backup, YearPlan } from '../../../src/sim/yearPlan.ts';
import { prepareWeather } from '../../../src/weather/prepareWeather.ts';
import type { PreparedWeather } from '../../../src/weather/series.ts';

/** One value for every hour, or a value by hour. */
export type ByHour = number | Float64Array;

/** What a test says of the weather; all of it has a value of its own where nothing is said. */
export interface WeatherParts {
  readonly hours?: number;
  readonly temperature?: ByHour;
  /** %, over water. */
  readonly relativeHumidity?: ByHour;
  /** W/m². */
  readonly radiation?: ByHour;
}

/** What a test says of a plan; every part has a plain value where nothing is said. */
export interface PlanParts extends WeatherParts {
  readonly house?: Partial<Omit<House, 'setPoint'>> & { readonly setPoint?: ByHour };
  /** Fixed flow, heating curve, or emitters. */
  readonly flow?: number | Polyline | Emitters;
  readonly table?: PerformanceTable;
  readonly interpolation?: MapInterpolation;
  readonly unit?: Partial<Omit<HeatPumpUnit, 'full'>>;
  readonly backup?: Partial<Backup>;
  readonly hotWater?: Partial<HotWaterParts>;
  readonly run?: Partial<
    Pick<YearPlan, 'quietShare' | 'inUseAllowance' | 'cycleWater' | 'circulationPower' | 'resting' | 'sourcePrices'>
  >;
}

type HotWaterParts = Omit<HotWaterPlan, 'draw' | 'coldWater' | 'allowed' | 'hygieneAsked'> & {
  readonly draw: ByHour;
  readonly coldWater: ByHour;
  readonly allowed: Uint8Array;
  readonly hygieneAsked: Uint8Array;
};

export const HOURS = 8760;

/** The map of the worked hours: invented round figures, kW and COP at −10 and 10 °C, 35 and 55 °C flow. */
export const roundTable: PerformanceTable = {
  outdoor: [-10, 10],
  flow: [35, 55],
  capacity: [6, 5, 10, 9],
  cop: [2.8, 2.0, 5.0, 3.2],
};

/** A column of one value, but for the hours named. */
export function column(usual: number, special: Readonly<Record<number, number>> = {}, hours = HOURS): Float64Array {
  const values = new Float64Array(hours).fill(usual);
  for (const [hour, value] of Object.entries(special)) values[Number(hour)] = value;
  return values;
}

const byHour = (value: ByHour, hours: number) => (typeof value === 'number' ? column(value, {}, hours) : value);

/** Weather at sea level. */
export function weatherOf(parts: WeatherParts = {}): PreparedWeather {
  const { hours = HOURS, temperature = 0, relativeHumidity = 80, radiation } = parts;
  return prepareWeather(
    {
      hours,
      offsetMinutes: 60,
      temperature: byHour(temperature, hours),
      humidity: { kind: 'relative', values: byHour(relativeHumidity, hours) },
      ...(radiation === undefined ? {} : { globalRadiation: byHour(radiation, hours) }),
    },
    { altitude: 0, defaultRelativeHumidity: 80 },
  );
}

/** Degree hours to a base of 20 °C, 200 W/K, 6.4 kW at −12 °C. */
export function houseOf(parts: PlanParts['house'] = {}, hours = HOURS): House {
  return {
    heatLoss: 0.2,
    designLoad: 6.4,
    nominalSetPoint: 20,
    baseTemperature: null,
    internalGains: 0,
    solarAperture: 0,
    heatingLimit: Number.POSITIVE_INFINITY,
    mass: null,
    ...parts,
    setPoint: byHour(parts.setPoint ?? 20, hours),
  };
}

/** A unit that modulates down to 30 % of full load, at the same COP; no frost, no limits but 55 °C flow, no idle power. */
export function unitOf(full: HeatPumpMap, parts: PlanParts['unit'] = {}): HeatPumpUnit {
  return {
    full,
    lowest: { given: 'share', capacity: 0.3, cop: 1 },
    defrost: { method: 'included' },
    cycling: { method: 'degradation', coefficient: 0.25 },
    lowestOutdoorTemperature: Number.NEGATIVE_INFINITY,
    highestFlow: { at: [0], value: [55] },
    standbyPower: 0,
    crankcasePower: 0,
    crankcaseBelow: Number.POSITIVE_INFINITY,
    ...parts,
  };
}

/** 200 L at 50 °C without draws or losses. */
export function hotWaterOf(parts: PlanParts['hotWater'] = {}, hours = HOURS): HotWaterPlan {
  return {
    volume: 200,
    setPoint: 50,
    hysteresis: 5,
    lossCoefficient: 0,
    surroundingTemperature: 15,
    allowed: new Uint8Array(hours).fill(1),
    hygieneAsked: new Uint8Array(hours),
    hygieneTemperature: 60,
    immersionPower: 3,
    ...parts,
    draw: byHour(parts.draw ?? 0, hours),
    coldWater: byHour(parts.coldWater ?? 10, hours),
  };
}

function flowOf(flow: number | Polyline | Emitters, weather: PreparedWeather): FlowSetting {
  if (typeof flow === 'number') return curveSetting({ at: [0], value: [flow] }, weather);
  return 'at' in flow ? curveSetting(flow, weather) : emitterSetting(flow);
}

/** A plan that is plain in all that is not said: fixed flow of 35 °C, an electric backup without bound. */
export function planOf(parts: PlanParts = {}): YearPlan {
  const weather = weatherOf(parts);
  const { hours } = weather;
  const house = houseOf(parts.house, hours);
  const unit = unitOf(prepareMap(parts.table ?? roundTable, parts.interpolation ?? 'carnotShare'), parts.unit);
  const unitOnWeather = layUnitOnWeather(unit, weather);
  return {
    weather,
    house,
    massOnWeather: house.mass === null ? null : layMassOnWeather(house.mass, house, weather),
    flow: flowOf(parts.flow ?? 35, weather),
    unitOnWeather,
    resting: unitOnWeather.tooCold,
    quietShare: null,
    inUseAllowance: 0,
    cycleWater: 100,
    circulationPower: 0,
    backup: { power: 1000, isBoiler: false, efficiency: 1, hotWaterEfficiency: 1, ...parts.backup },
    sourcePrices: null,
    hotWater: parts.hotWater === undefined ? null : hotWaterOf(parts.hotWater, hours),
    ...parts.run,
  };
}

/** Holds a figure to a worked one: 1e-9 of it, as the worked figures have eleven digits or more. */
export function expectNear(actual: number | undefined, worked: number, tolerance = 1e-9): void {
  const distance = Math.abs((actual ?? Number.NaN) - worked);
  expect(distance, `${actual} beside ${worked}`).toBeLessThanOrEqual(tolerance * Math.max(Math.abs(worked), 1e-3));
}

/** All columns of a year as bytes: equal only if every figure is, to the last bit. */
export function bytesOf(columns: YearColumns): Buffer {
  return Buffer.concat(
    Object.values(columns).flatMap((values) => (typeof values === 'number' ? [] : [Buffer.from(values.buffer)])),
  );
}
