import fc from 'fast-check';
import { prepareMap } from '../../../src/sim/heatPumpMap.ts';
import { type MassParameters, massParameters } from '../../../src/sim/lumpedHouse.ts';
import type { PerformanceTable } from '../../../src/sim/performanceTable.ts';
import type { YearPlan } from '../../../src/sim/yearPlan.ts';
import { type PlanParts, planOf } from './planBuilder.ts';

/** Random plans for the laws: every option of the model, in ranges that a survey may hold. */

export const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const orNone = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined });

/** Most runs take twenty days, some a common or a leap year. */
export const anyHours = fc.constantFrom(480, 480, 480, 480, 8760, 8784);

/** A value for each hour of the day. */
export const ofDay = (min: number, max: number) => fc.array(between(min, max), { minLength: 24, maxLength: 24 });

/** Repeats a list until the year is full. */
export const repeated = (list: readonly number[], hours: number) =>
  Float64Array.from({ length: hours }, (_, i) => list[i % list.length]!);

export const anyWeather = fc
  .record({
    hours: anyHours,
    mean: between(-4, 14),
    season: between(0, 14),
    day: between(0, 6),
    noise: fc.array(between(-6, 6), { minLength: 25, maxLength: 60 }),
    relativeHumidity: between(40, 100),
    sun: fc.constantFrom(0, 300, 700),
  })
  .map(({ hours, mean, season, day, noise, relativeHumidity, sun }) => ({
    hours,
    relativeHumidity,
    temperature: repeated(noise, hours).map(
      (value, i) => value + mean - season * Math.cos((2 * Math.PI * i) / hours) - day * Math.cos(i / 3.82),
    ),
    radiation: Float64Array.from({ length: hours }, (_, i) => Math.max(0, sun * Math.sin(((i % 24) - 6) / 3.82))),
  }));

/** κ written out: COP of a point by its share of it. */
const kappa = (outdoor: number, flow: number) => (flow + 276.15) / Math.max(flow - outdoor + 10, 15);

/** Rising whole degrees. */
const axis = (min: number, max: number, least: number, most: number) =>
  fc
    .uniqueArray(fc.integer({ min, max }), { minLength: least, maxLength: most })
    .map((values) => values.toSorted((a, b) => a - b));

export const anyTable: fc.Arbitrary<PerformanceTable> = fc
  .record({ outdoor: axis(-25, 20, 2, 5), flow: axis(25, 65, 1, 4) })
  .chain(({ outdoor, flow }) => {
    const points = outdoor.length * flow.length;
    const values = (min: number, max: number) => fc.array(between(min, max), { minLength: points, maxLength: points });
    return fc.record({ size: between(3, 12), capacity: values(0.6, 1.4), share: values(0.2, 0.6) }).map((found) => ({
      outdoor,
      flow,
      capacity: found.capacity.map((factor) => factor * found.size),
      cop: found.share.map((share, i) => share * kappa(outdoor[Math.floor(i / flow.length)]!, flow[i % flow.length]!)),
    }));
  });

export const anyMass: fc.Arbitrary<{ mass: MassParameters; heatLoss: number }> = fc
  .record({
    floor: between(60, 250),
    massClass: fc.constantFrom('veryLight', 'light', 'medium', 'heavy', 'veryHeavy'),
    perFloor: between(0.6, 3),
    windows: between(0.05, 0.5),
    opaque: between(0, 0.7),
    ventilation: between(0.05, 0.5),
  })
  .map(({ floor, massClass, perFloor, ...parts }) => {
    const result = massParameters(floor, massClass, perFloor * floor, parts);
    if (!('mass' in result)) throw new Error(result.reason);
    return { mass: result.mass, heatLoss: (perFloor * floor) / 1000 };
  });

export const anyHouse = fc
  .record({
    heatLoss: between(0.05, 0.5),
    lumped: orNone(anyMass),
    designDifference: between(15, 40),
    setPoint: between(17, 23),
    baseTemperature: fc.option(between(10, 18)),
    internalGains: between(0, 0.6),
    solarAperture: between(0, 5),
    heatingLimit: fc.constantFrom(Number.POSITIVE_INFINITY, 16, 12),
  })
  .map(({ lumped, designDifference, ...house }) => ({
    ...house,
    ...(lumped ?? {}),
    designLoad: (lumped?.heatLoss ?? house.heatLoss) * designDifference,
    nominalSetPoint: 20,
  }));

export const setFlow = fc.oneof(
  between(22, 65),
  fc.tuple(between(35, 65), between(20, 35)).map(([cold, mild]) => ({ at: [-12, 15], value: [cold, mild] })),
);

export const emitters = fc
  .record({ flow: between(36, 70), spread: between(3, 12), exponent: between(1.05, 1.4), lowestFlow: between(18, 30) })
  .map(({ flow, spread, ...rest }) => ({
    ...rest,
    flow,
    return: flow - spread,
    roomTemperature: 20,
    highestFlow: flow + 3,
  }));

const anyUnit: fc.Arbitrary<NonNullable<PlanParts['unit']>> = fc.record({
  lowest: fc.oneof(
    fc.record({ given: fc.constant('share' as const), capacity: between(0.1, 1), cop: between(0.7, 1.3) }),
    anyTable.map((table) => ({ given: 'table' as const, map: prepareMap(table, 'carnotShare') })),
  ),
  defrost: fc.oneof(
    fc.constant({ method: 'included' as const }),
    fc.record({ method: fc.constant('humidity' as const), capacityLoss: between(0, 0.4), copLoss: between(0, 0.4) }),
    fc.tuple(between(0.5, 1), between(0.5, 1)).map(([capacity, cop]) => ({
      method: 'table' as const,
      capacity: { at: [0, 7], value: [capacity, 1] },
      cop: { at: [-3, 5], value: [cop, 1] },
    })),
  ),
  cycling: fc.oneof(
    fc.record({ method: fc.constant('degradation' as const), coefficient: between(0, 0.5) }),
    fc.record({ method: fc.constant('offPower' as const), power: between(0, 0.1) }),
  ),
  lowestOutdoorTemperature: fc.constantFrom(Number.NEGATIVE_INFINITY, -7),
  highestFlow: between(40, 70).map((flow) => ({ at: [-15, 5], value: [flow - 5, flow] })),
  standbyPower: between(0, 0.03),
  crankcasePower: between(0, 0.05),
  crankcaseBelow: fc.constantFrom(Number.POSITIVE_INFINITY, 5),
});

const anyBackup = fc.record({
  power: between(0, 12),
  isBoiler: fc.boolean(),
  efficiency: between(0.7, 1.05),
  hotWaterEfficiency: between(0.6, 1),
});

const anyHotWater = (hours: number): fc.Arbitrary<NonNullable<PlanParts['hotWater']>> =>
  fc
    .record({
      volume: between(50, 500),
      setPoint: between(42, 62),
      hysteresis: between(0, 10),
      lossCoefficient: between(0, 0.004),
      surroundingTemperature: between(5, 25),
      draw: ofDay(0, 1.5),
      coldWater: between(5, 15),
      closed: fc.uniqueArray(fc.integer({ min: 0, max: 23 }), { maxLength: 20 }),
      hygieneHour: orNone(fc.integer({ min: 0, max: 167 })),
      hygieneTemperature: between(62, 70),
      immersionPower: between(0, 6),
    })
    .map(({ draw, closed, hygieneHour, ...rest }) => ({
      ...rest,
      draw: repeated(draw, hours),
      allowed: Uint8Array.from({ length: hours }, (_, i) => (closed.includes(i % 24) ? 0 : 1)),
      hygieneAsked: Uint8Array.from({ length: hours }, (_, i) => (i % 168 === hygieneHour ? 1 : 0)),
    }));

const anyRun = (hours: number) =>
  fc
    .record({
      quiet: fc.option(fc.array(fc.constantFrom(0, 0.4, 0.7, 1), { minLength: 24, maxLength: 24 })),
      inUseAllowance: between(0, 0.3),
      cycleWater: between(20, 400),
      circulationPower: between(0, 0.1),
    })
    .map(({ quiet, ...rest }) => ({ ...rest, quietShare: quiet === null ? null : repeated(quiet, hours) }));

/** Prices by the hour of the day, and of fuel. */
export const anyPrices = (hours: number) =>
  fc
    .record({ electricity: ofDay(0, 0.6), fuel: between(0, 0.2) })
    .map(({ electricity, fuel }) => ({ electricity: repeated(electricity, hours), fuel }));

/** Parts of a plan of anything the model knows but the mode of the backup. */
export const anyParts: fc.Arbitrary<PlanParts> = anyWeather.chain((weather) =>
  fc
    .record({
      house: anyHouse,
      flow: fc.oneof(setFlow, emitters),
      table: anyTable,
      interpolation: fc.constantFrom('carnotShare' as const, 'linear' as const),
      unit: anyUnit,
      backup: anyBackup,
      run: anyRun(weather.hours),
      hotWater: orNone(anyHotWater(weather.hours)),
    })
    .map(({ hotWater, ...parts }) => ({ ...weather, ...parts, ...(hotWater === undefined ? {} : { hotWater }) })),
);

/** A plan in any mode: parallel, alternative, or with a boiler where that is cheaper. */
export const anyPlan: fc.Arbitrary<YearPlan> = anyParts.chain((parts) =>
  fc
    .record({ switchTemperature: orNone(between(-8, 5)), prices: orNone(anyPrices(parts.hours ?? 0)) })
    .map(({ switchTemperature, prices }) => {
      const plan = planOf(parts);
      const resting =
        switchTemperature === undefined
          ? plan.resting
          : plan.resting.map((cold, i) => (cold === 1 || plan.weather.temperature[i]! < switchTemperature ? 1 : 0));
      return { ...plan, resting, sourcePrices: plan.backup.isBoiler && prices !== undefined ? prices : null };
    }),
);
