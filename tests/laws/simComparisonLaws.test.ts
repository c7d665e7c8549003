/**
 * Laws of MODEL section 15 that hold one run against another. Each says for which plans it is proved; where it is not
 * proved, it is not claimed.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { loadUnit } from '../../src/scenario/loadUnit.ts';
import { prepareUnit } from '../../src/scenario/prepare/prepareUnit.ts';
import { degreeHourNeed } from '../../src/sim/degreeHours.ts';
import type { MassParameters } from '../../src/sim/lumpedHouse.ts';
import type { PerformanceTable } from '../../src/sim/performanceTable.ts';
import { layUnitOnWeather } from '../../src/sim/unitOnWeather.ts';
import { simulateYear } from '../../src/sim/year.ts';
import type { YearPlan } from '../../src/sim/yearPlan.ts';
import { memoryFiles } from '../unit/scenario/memoryFiles.ts';
import {
  anyMass,
  anyParts,
  anyPlan,
  anyPrices,
  anyTable,
  anyWeather,
  between,
  emitters,
  ofDay,
  repeated,
  setFlow,
} from '../unit/sim/anyPlan.ts';
import { bytesOf, type PlanParts, planOf } from '../unit/sim/planBuilder.ts';

const RUNS = { seed: 20_250_216, numRuns: 60 };
/** Money or kWh of one hour, after a few additions. */
const ROUNDING = 1e-9;

type Prices = NonNullable<YearPlan['sourcePrices']>;

/** Cost of each hour. */
function costOf(plan: YearPlan, prices: Prices): Float64Array {
  const c = simulateYear(plan);
  return c.electricity.map((kWh, i) => kWh * prices.electricity[i]! + c.fuel[i]! * prices.fuel);
}

/** Plans without what lets heat wait (hot water, quiet hours), so that every hour stands alone. */
const unhurried: fc.Arbitrary<PlanParts> = anyParts.map(({ hotWater: _, ...parts }) => ({
  ...parts,
  run: { ...parts.run, quietShare: null },
}));

/** Without what is drawn only while the compressor does nothing. */
const withoutIdlePower = (parts: PlanParts): PlanParts => ({
  ...parts,
  unit: { ...parts.unit, standbyPower: 0, crankcasePower: 0 },
});

/*
 * Proved hour by hour, for prices of zero or above, where
 * – no heat waits (neither hot water nor quiet hours): else heat moves to another hour and its price; with prices that
 *   differ by the hour more heat loss may then cost less;
 * – standby and crankcase heater draw nothing: a little heat that wakes the compressor may save more standby than it takes;
 * – the flow does not follow the heat loss: a set flow, or emitters with an entered base (x = Q/Q_d then does not change);
 *   otherwise a hotter flow with less capacity means less cycling, and the law rests on the map;
 * – the lowest level takes no more power than full load (m ≤ g for shares; here m ≤ 0.6, g ≥ 0.9, and frost losses of at
 *   most 0.15·1.5, which change that ratio by less than a fifth), and off-power no more than the lowest level: then the
 *   electricity of an hour rises with its heat;
 * – the backup can carry what is left.
 */
describe('more heat loss never costs less', () => {
  const level = fc.record({ capacity: between(0.1, 0.6), cop: between(0.9, 1.3), frost: between(0, 0.15) });
  const raising = fc.oneof(
    setFlow.map((flow) => ({ flow, house: {} })),
    emitters.map((flow) => ({ flow, house: { baseTemperature: 15 } })),
  );

  /** The cost of each hour, and of each hour with more heat loss. */
  const costs = (anyOf: fc.Arbitrary<PlanParts>) =>
    fc
      .tuple(anyOf.map(withoutIdlePower), raising, level, between(1.0001, 1.8), ofDay(0, 0.6))
      .map(([parts, { flow, house }, { frost, ...share }, factor, day]) => {
        const prices = { electricity: repeated(day, parts.hours ?? 0), fuel: 0.1 };
        const unit: PlanParts['unit'] = {
          ...parts.unit,
          lowest: { given: 'share', ...share },
          defrost:
            parts.unit?.defrost?.method === 'humidity'
              ? { method: 'humidity', capacityLoss: frost, copLoss: frost }
              : (parts.unit?.defrost ?? { method: 'included' }),
          cycling:
            parts.unit?.cycling?.method === 'degradation' ? parts.unit.cycling : { method: 'offPower', power: 0.005 },
        };
        const backup = { ...parts.backup, power: 1000 };
        const { heatLoss = 0.2, designLoad = 6 } = parts.house ?? {};
        const costWith = (times: number) => {
          const loss = { mass: null, heatLoss: heatLoss * times, designLoad: designLoad * times };
          return costOf(planOf({ ...parts, flow, unit, backup, house: { ...parts.house, ...house, ...loss } }), prices);
        };
        return { less: costWith(1), more: costWith(factor) };
      });

  test('in any hour where heat does not wait', () => {
    const law = fc.property(costs(unhurried), ({ less, more }) => {
      expect(more.findIndex((cost, i) => cost < less[i]! - ROUNDING)).toBe(-1);
    });
    fc.assert(law, RUNS);
  });

  // not proved where heat waits for hours of another price, but no year was found that breaks it
  test('in the year, with hot water and quiet hours too', () => {
    const law = fc.property(costs(anyParts), ({ less, more }) => {
      const sum = (column: Float64Array) => column.reduce((total, cost) => total + cost, 0);
      expect(sum(more)).toBeGreaterThanOrEqual(sum(less) - 1e-6);
    });
    fc.assert(law, RUNS);
  });
});

describe('a colder series never needs less', () => {
  const colder = fc.tuple(anyParts, fc.array(between(0, 8), { minLength: 30, maxLength: 50 }));

  test('with degree hours, in any hour, the heating limit included', () => {
    const law = fc.property(colder, ([{ temperature, ...parts }, fall]) => {
      const mild = temperature as Float64Array;
      const cold = mild.map((value, i) => value - fall[i % fall.length]!);
      const house = { ...parts.house, mass: null };
      const need = (series: Float64Array) =>
        simulateYear(planOf({ ...parts, house, temperature: series })).spaceHeatNeed;
      const less = need(mild);
      expect(need(cold).findIndex((kWh, i) => kWh < less[i]! - ROUNDING)).toBe(-1);
    });
    fc.assert(law, RUNS);
  });

  const lumpedNeeds = (heatingLimits: readonly number[]) =>
    fc
      .tuple(colder, anyMass, fc.constantFrom(...heatingLimits))
      .map(([[{ temperature, ...parts }, fall], lumped, heatingLimit]) => {
        const mild = temperature as Float64Array;
        const cold = mild.map((value, i) => value - fall[i % fall.length]!);
        const house = { ...parts.house, ...lumped, heatingLimit };
        const needOf = (series: Float64Array) =>
          simulateYear(planOf({ ...parts, house, temperature: series })).unlimitedNeed;
        return { less: needOf(mild), more: needOf(cold) };
      });

  test('with a lumped house and unlimited heat, in any hour where there is no heating limit', () => {
    const law = fc.property(lumpedNeeds([Number.POSITIVE_INFINITY]), ({ less, more }) => {
      expect(more.findIndex((kWh, i) => kWh < less[i]! - ROUNDING)).toBe(-1);
    });
    fc.assert(law, RUNS);
  });

  // an hour may need less: the milder house has cooled down while its heating was off
  test('with a lumped house and a heating limit, in the year', () => {
    const law = fc.property(lumpedNeeds([16, 12]), ({ less, more }) => {
      const sum = (column: Float64Array) => column.reduce((total, kWh) => total + kWh, 0);
      expect(sum(more)).toBeGreaterThanOrEqual(sum(less) - 1e-6);
    });
    fc.assert(law, RUNS);
  });
});

/*
 * Proved hour by hour where
 * – no heat waits: else the boiler, which leaves nothing waiting, may carry in a dear hour what the heat pump would have
 *   worked off in a cheap one;
 * – the boiler can carry the whole hour: else the heat pump has the rest at a lower rate, and cycling may make that dearer
 *   than the average that was compared;
 * – standby and crankcase heater draw nothing while the compressor rests.
 * The pump draws the same in all three.
 */
test('the cheapest source never costs more than the heat pump with its backup, or than the boiler alone', () => {
  let byBoiler = 0;
  let byHeatPump = 0;
  const withPrices = unhurried.chain((parts) => anyPrices(parts.hours ?? 0).map((prices) => ({ parts, prices })));
  const law = fc.property(withPrices, ({ parts, prices }) => {
    const plan = planOf({ ...withoutIdlePower(parts), backup: { ...parts.backup, power: 1000, isBoiler: true } });
    const cheapest = costOf({ ...plan, sourcePrices: prices }, prices);
    const parallel = costOf(plan, prices);
    const boiler = costOf({ ...plan, resting: new Uint8Array(plan.weather.hours).fill(1) }, prices);
    expect(cheapest.findIndex((cost, i) => cost > Math.min(parallel[i]!, boiler[i]!) + ROUNDING)).toBe(-1);
    byBoiler += cheapest.reduce((count, cost, i) => count + (cost < parallel[i]! - ROUNDING ? 1 : 0), 0);
    byHeatPump += cheapest.reduce((count, cost, i) => count + (cost < boiler[i]! - ROUNDING ? 1 : 0), 0);
  });
  fc.assert(law, RUNS);
  // both sources were the cheaper one in many hours
  expect(Math.min(byBoiler, byHeatPump)).toBeGreaterThan(1000);
});

/** The constants of a lumped house with another capacity, kWh/K (ISO 13790 annex C). */
function withCapacity(mass: MassParameters, capacity: number): MassParameters {
  const half = (mass.h3 + mass.hMassOutdoor) / 2;
  const massPerHeat = 1 / (capacity + half);
  const keep = (capacity - half) * massPerHeat;
  const massFromAirHeat = mass.airToSurface * mass.surfaceToMass * massPerHeat;
  const atSurface = mass.airToSurface / (mass.hSurfaceMass + mass.hWindows + mass.h1);
  return {
    ...mass,
    capacity,
    massPerHeat,
    keep,
    massFromAirHeat,
    airFromMass: (atSurface * mass.hSurfaceMass * (1 + keep)) / 2,
    airPerHeat:
      atSurface * ((mass.hSurfaceMass * massFromAirHeat) / 2 + mass.airToSurface) +
      1 / (mass.hAirSurface + mass.hVentilation),
  };
}

test('a lumped house without gains needs, as its mass vanishes, what degree hours say', () => {
  const law = fc.property(anyWeather, anyMass, between(17, 23), (weather, { mass, heatLoss }, setPoint) => {
    // 1e-9 kWh/K: a step of the mass of some hundred kelvins, which Crank–Nicolson lets swing, carries 1e-7 kWh
    const house = { heatLoss, setPoint, mass: withCapacity(mass, 1e-9) };
    const plan = planOf({ ...weather, house });
    const expected = new Float64Array(weather.hours);
    degreeHourNeed(plan.house, plan.weather, expected);
    const found = simulateYear(plan).unlimitedNeed;
    expect(found.findIndex((kWh, i) => Math.abs(kWh - expected[i]!) > 1e-5)).toBe(-1);
  });
  fc.assert(law, RUNS);
});

describe('the order of an entered map', () => {
  /** A table as text, its rows and columns in the order given. */
  const textOf = (table: PerformanceTable, values: readonly (number | null)[], rows: number[], columns: number[]) =>
    [
      ['outdoor', ...columns.map((column) => table.flow[column])].join(', '),
      ...rows.map((row) =>
        [table.outdoor[row], ...columns.map((column) => values[row * table.flow.length + column]?.toFixed(3))].join(
          ', ',
        ),
      ),
    ]
      .map((line) => `      ${line}`)
      .join('\n');

  test('changes nothing', () => {
    const shuffled = anyTable.chain((table) => {
      const rows = table.outdoor.map((_, row) => row);
      const columns = table.flow.map((_, column) => column);
      const order = (list: number[]) => fc.shuffledSubarray(list, { minLength: list.length, maxLength: list.length });
      return fc.record({
        table: fc.constant(table),
        sorted: fc.constant({ rows, columns }),
        first: fc.record({ rows: order(rows), columns: order(columns) }),
        second: fc.record({ rows: order(rows), columns: order(columns) }),
      });
    });
    let compared = 0;
    const law = fc.property(shuffled, anyPlan, ({ table, sorted, first, second }, plan) => {
      const load = (a: typeof first, b: typeof second) => {
        const text = [
          'name: unit',
          'map:',
          '  fullLoad:',
          `    capacity: |\n${textOf(table, table.capacity, a.rows, a.columns)}`,
          `    cop: |\n${textOf(table, table.cop, b.rows, b.columns)}`,
          '',
        ].join('\n');
        const { loaded, problems } = loadUnit('unit.yaml', memoryFiles({ 'unit.yaml': text }));
        if (loaded === undefined) throw new Error(problems.map(({ code, found }) => `${code} ${found}`).join('; '));
        return simulateYear({ ...plan, unitOnWeather: layUnitOnWeather(prepareUnit(loaded), plan.weather) });
      };
      expect(bytesOf(load(first, second)).equals(bytesOf(load(sorted, sorted)))).toBe(true);
      compared++;
    });
    fc.assert(law, { ...RUNS, numRuns: 40 });
    expect(compared).toBe(40);
  });
});
