import type { YearColumns } from '../../../../src/sim/columns.ts';
import type { AirAsRead } from '../../../../src/sim/explain/explainAir.ts';
import { explainHour } from '../../../../src/sim/explain/explainHour.ts';
import type { FigureName } from '../../../../src/sim/explain/figures.ts';
import type { ExplainedStage } from '../../../../src/sim/explain/stage.ts';
import { prepareMap } from '../../../../src/sim/heatPumpMap.ts';
import { massParameters } from '../../../../src/sim/lumpedHouse.ts';
import { simulateYear } from '../../../../src/sim/year.ts';
import type { YearPlan } from '../../../../src/sim/yearPlan.ts';
import { column, type PlanParts, planOf, roundTable } from '../planBuilder.ts';

/** Relative humidity, %: frost grows, and none settles even in the cold. */
const DAMP = 88;
const DRY = 15;

/** Twenty days that swing from deep frost to warmth, by day and over the weeks. */
const HOURS = 480;
const temperature = Float64Array.from({ length: HOURS }, (_, i) => 3 - 16 * Math.cos(i / 60) - 4 * Math.cos(i / 3.82));
const radiation = Float64Array.from({ length: HOURS }, (_, i) => Math.max(0, 400 * Math.sin(((i % 24) - 6) / 3.82)));

const found = massParameters(120, 'medium', 220, { windows: 0.3, opaque: 0.5, ventilation: 0.2 });
if (!('mass' in found)) throw new Error(found.reason);
const { mass } = found;

const emitters = { flow: 50, return: 42, roomTemperature: 20, exponent: 1.3, lowestFlow: 28, highestFlow: 50 };
const base: PlanParts = {
  hours: HOURS,
  temperature,
  relativeHumidity: DAMP,
  radiation,
  house: { heatLoss: 0.22, designLoad: 7, internalGains: 0.3, solarAperture: 2 },
  flow: emitters,
  unit: { standbyPower: 0.01, crankcasePower: 0.02, crankcaseBelow: 3 },
  backup: { power: 1.5 },
  run: { circulationPower: 0.05, inUseAllowance: 0.1 },
};
const draw = Float64Array.from({ length: HOURS }, (_, i) => [0, 0, 0, 0, 0, 0, 0.4, 2.6, 0.3, 0.1][i % 24] ?? 0.15);
const closed = Uint8Array.from({ length: HOURS }, (_, i) => (i % 24 < 5 ? 0 : 1));
const hygieneAsked = Uint8Array.from({ length: HOURS }, (_, i) => (i % 168 === 30 ? 1 : 0));
const hotWater = { draw, lossCoefficient: 0.002, setPoint: 48, allowed: closed, hygieneAsked, hygieneTemperature: 62 };
const lowestTable = { ...roundTable, capacity: [2, 1.8, 3, 2.7], cop: [2.7, 2.1, 5.1, 3.3] };
const boiler = { power: 4, isBoiler: true, efficiency: 0.9, hotWaterEfficiency: 0.8 };
const prices = {
  electricity: column(0.3, Object.fromEntries([...Array(20)].map((_, d) => [d * 24 + 18, 0.6])), HOURS),
};

/** Years in which everything happens that an explanation must speak of. */
export const explainedPlans: Record<string, YearPlan> = {
  'degree hours': planOf(base),
  'an entered base and a heating limit': planOf({
    ...base,
    house: { ...base.house, baseTemperature: 15.5, heatingLimit: 12, setPoint: column(20, { 100: 16 }, HOURS) },
    flow: { at: [-10, 15], value: [52, 30] },
  }),
  'a house with mass, and hot water': planOf({ ...base, house: { ...base.house, mass, heatingLimit: 14 }, hotWater }),
  'hot water with a hygiene run': planOf({ ...base, hotWater }),
  'a cylinder that a boiler heats too, and that runs short': planOf({
    ...base,
    backup: boiler,
    hotWater: { ...hotWater, volume: 40, draw: draw.map((kWh) => 1.5 * kWh) },
    unit: { ...base.unit, lowestOutdoorTemperature: -14 },
  }),
  'quiet hours': planOf({
    ...base,
    run: {
      ...base.run,
      quietShare: Float64Array.from({ length: HOURS }, (_, i) => (i % 24 < 6 ? 0.4 : i === 479 ? 0.5 : 1)),
    },
  }),
  'the cheaper of two sources': planOf({
    ...base,
    backup: boiler,
    hotWater,
    run: { ...base.run, sourcePrices: { ...prices, fuel: 0.11 } },
    unit: { ...base.unit, highestFlow: { at: [0], value: [45] } },
  }),
  'an alternative backup, in dry air': withRest(planOf({ ...base, relativeHumidity: DRY, backup: { power: 3 } }), -2),
  'a unit that stands still in the cold, and reaches its flow limit': planOf({
    ...base,
    unit: { ...base.unit, lowestOutdoorTemperature: -12, highestFlow: { at: [-15, 0], value: [38, 44] } },
  }),
  'frost by humidity, and a lowest level of its own': planOf({
    ...base,
    unit: {
      ...base.unit,
      defrost: { method: 'humidity', capacityLoss: 0.1, copLoss: 0.12 },
      lowest: { given: 'table', map: prepareMap(lowestTable, 'carnotShare') },
      cycling: { method: 'offPower', power: 0.02 },
    },
    hotWater: { ...hotWater, volume: 600, hysteresis: 12 },
  }),
  'frost by table, linear COP, a single-speed unit': planOf({
    ...base,
    interpolation: 'linear',
    flow: { ...emitters, lowestFlow: 22, flow: 60, highestFlow: 60 },
    unit: {
      ...base.unit,
      lowest: { given: 'share', capacity: 1, cop: 1 },
      highestFlow: { at: [0], value: [60] },
      defrost: {
        method: 'table',
        capacity: { at: [-5, 7], value: [0.9, 1] },
        cop: { at: [-5, 7], value: [0.85, 1] },
      },
    },
  }),
  'one flow column': planOf({
    ...base,
    table: { outdoor: [-7, 2, 7], flow: [40], capacity: [5, 6, 8], cop: [2.4, 3.1, 3.9] },
    unit: { ...base.unit, highestFlow: { at: [0], value: [55] } },
  }),
};

/** The same plan with the heat pump at rest below a temperature. */
export function withRest(plan: YearPlan, switchTemperature: number): YearPlan {
  return { ...plan, resting: Uint8Array.from(plan.weather.temperature, (air) => (air < switchTemperature ? 1 : 0)) };
}

function airOf(name: string): AirAsRead {
  const humidity = name.endsWith('dry air') ? DRY : DAMP;
  return { kind: 'relative', humidity, humidityMeasured: true, pressureMeasured: false };
}

/** One explained hour of a plan, with the year that it is of. */
export interface ExplainedCase {
  readonly name: string;
  readonly plan: YearPlan;
  readonly year: YearColumns;
  readonly i: number;
  readonly stages: readonly ExplainedStage[];
}

/** Every `step`-th hour of the plans above, and the last hour of each. */
export function* explainedCases(
  step: number,
  plans: Record<string, YearPlan> = explainedPlans,
): Generator<ExplainedCase> {
  for (const [name, plan] of Object.entries(plans)) {
    const year = simulateYear(plan);
    for (let i = 0; i < year.hours; i += step)
      yield { name, plan, year, i, stages: explainHour(plan, year, i, airOf(name)) };
    const last = year.hours - 1;
    yield { name, plan, year, i: last, stages: explainHour(plan, year, last, airOf(name)) };
  }
}

/** A figure of a stage; fails where the stage has none of that name. */
export function figureOf(stage: ExplainedStage | undefined, name: FigureName): number {
  const figure = stage?.figures.find((each) => each.name === name);
  if (figure === undefined) throw new Error(`no ${name} in ${stage?.stage}`);
  return figure.value;
}
