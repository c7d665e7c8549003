import { describe, expect, test } from 'vitest';
import { prepareHouse } from '../../../../src/scenario/prepare/prepareHouse.ts';
import { flowSettingOf, preparePlan } from '../../../../src/scenario/prepare/preparePlan.ts';
import { emitterFlow } from '../../../../src/sim/flowTemperature.ts';
import { prepareMap } from '../../../../src/sim/heatPumpMap.ts';
import type { PerformanceTable } from '../../../../src/sim/performanceTable.ts';
import type { HeatPumpUnit } from '../../../../src/sim/unit.ts';
import { layUnitOnWeather } from '../../../../src/sim/unitOnWeather.ts';
import type { YearPlan } from '../../../../src/sim/yearPlan.ts';
import { prepareTariff } from '../../../../src/tariffs/prepareTariff.ts';
import { column, roundTable, unitOf, weatherOf } from '../../sim/planBuilder.ts';
import { clockOf, scenarioOf } from './preparedSample.ts';

const clock = clockOf();
const weather = weatherOf({ temperature: column(0, { 1: -16, 2: -5, 3: -5.1 }) });
const map = prepareMap(roundTable, 'carnotShare');

function planOf(sections: Record<string, unknown> = {}, unit: HeatPumpUnit = unitOf(map)): YearPlan {
  const scenario = scenarioOf(sections);
  const prepared = prepareHouse(scenario.house, clock, undefined);
  if (!('house' in prepared)) throw new Error('no house');
  const tariff = {
    name: 'flat',
    taxes: [{ name: 'VAT', percent: 10 }],
    credits: [],
    holidays: [],
    pricesStated: 'withoutTax' as const,
    rates: [{ name: 'flat', price: 0.3 }],
  };
  const { prepared: present } = prepareTariff({ tariff, file: 'tariff.yaml', series: undefined }, clock);
  return preparePlan(scenario, {
    weather,
    unitOnWeather: layUnitOnWeather(unit, weather),
    clock,
    house: prepared.house,
    present,
  });
}

const near = (actual: number | undefined, expected: number) =>
  expect(Math.abs((actual ?? Number.NaN) - expected)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(expected)));

describe('the water on which a short run works', () => {
  const table = (outdoor: number[], capacity: number[]): PerformanceTable => ({
    outdoor,
    flow: [35, 55],
    capacity,
    cop: capacity.map(() => 3),
  });
  const waterOf = (full: PerformanceTable, lowest?: PerformanceTable) => {
    const level = lowest && ({ given: 'table', map: prepareMap(lowest, 'carnotShare') } as const);
    return planOf({}, unitOf(prepareMap(full, 'carnotShare'), level && { lowest: level })).cycleWater;
  };

  test('is 20 L a kW of the lowest level at the row nearest 7 °C and the lowest flow', () => {
    // row 8 °C, 35 °C: 30 kW · 0.3 · 20 L
    near(waterOf(table([-10, 2, 8, 20], [10, 9, 20, 19, 30, 29, 40, 39])), 180);
  });

  test('takes the colder of two rows as near', () => {
    // 2 and 12 °C are both 5 K away
    near(waterOf(table([-10, 2, 12], [10, 9, 20, 19, 30, 29])), 120);
  });

  test('takes the lowest level from its own table where it has one', () => {
    near(waterOf(table([-10, 7], [10, 9, 20, 19]), table([0, 6, 12], [5, 4, 6, 5, 7, 6])), 120);
  });

  test('is 100 L at least', () => {
    expect(waterOf(table([-10, 7], [2, 2, 4, 4]))).toBe(100);
  });

  test('is the entered one where there is one', () => {
    expect(planOf({ circulation: { waterContent: 42 } }).cycleWater).toBe(42);
  });
});

describe('the flow setting', () => {
  const emitters = { method: 'emitters', flow: 50, return: 42 };
  const settingOf = (flowTemperature: Record<string, unknown>, designRoom = 21) =>
    flowSettingOf(scenarioOf({ flowTemperature }).flowTemperature, designRoom, weather);

  test('of emitters stands on the design room, exponent 1.3, from 25 °C to the design flow', () => {
    const setting = settingOf(emitters);
    expect(setting).toMatchObject({ set: null, roomTemperature: 21, overTemperature: 25, spread: 8 });
    expect([setting.lowest, setting.highest]).toEqual([25, 50]);
    near(emitterFlow(setting, 0.5), 21 + 25 * 0.5 ** (1 / 1.3) + 2);
  });

  test('of emitters takes what is entered instead', () => {
    const entered = { roomTemperature: 23, exponent: 1.1, lowestFlow: 30, highestFlow: 58 };
    const setting = settingOf({ ...emitters, ...entered });
    expect([setting.roomTemperature, setting.lowest, setting.highest]).toEqual([23, 30, 58]);
    near(emitterFlow(setting, 0.5), 23 + 23 * 0.5 ** (1 / 1.1) + 2);
  });

  test('of a curve or a fixed flow is set hour by hour', () => {
    const curve = settingOf({
      method: 'curve',
      points: [
        [-16, 46],
        [16, 30],
      ],
    });
    expect([curve.set?.[0], curve.set?.[1]]).toEqual([38, 46]);
    expect(new Set(settingOf({ method: 'fixed', flow: 44 }).set)).toEqual(new Set([44]));
  });

  test('of the plan uses the room of the design conditions', () => {
    const house = {
      heatLoss: { given: 'coefficient', value: 200 },
      design: { outdoorTemperature: -12, roomTemperature: 22 },
      need: { model: 'degreeHours' },
    };
    expect(planOf({ house, flowTemperature: emitters }).flow.roomTemperature).toBe(22);
  });
});

describe('the backup', () => {
  const boiler = {
    source: 'boiler',
    power: 15,
    efficiency: 0.9,
    fuel: { kind: 'naturalGas', price: 0.08, taxes: [{ name: 'VAT', percent: 25 }] },
  };

  test('is none where none is entered', () => {
    expect(planOf().backup).toEqual({ power: 0, isBoiler: false, efficiency: 1, hotWaterEfficiency: 1 });
  });

  test('is an electric heater, or a boiler whose hot water has its own efficiency where entered', () => {
    expect(planOf({ backup: { source: 'electric', power: 6 } }).backup).toMatchObject({ power: 6, isBoiler: false });
    expect(planOf({ backup: boiler }).backup).toMatchObject({
      isBoiler: true,
      efficiency: 0.9,
      hotWaterEfficiency: 0.9,
    });
    expect(planOf({ backup: { ...boiler, hotWaterEfficiency: 0.75 } }).backup.hotWaterEfficiency).toBe(0.75);
  });

  test('in the mode cheapest has the prices of one kWh of each, taxes in', () => {
    const { sourcePrices } = planOf({ backup: { ...boiler, mode: { kind: 'cheapest' } } });
    near(sourcePrices?.fuel, 0.1);
    near(sourcePrices?.electricity[4000], 0.33);
    expect(planOf({ backup: boiler }).sourcePrices).toBeNull();
  });

  test('that is alternative lets the heat pump rest below the switch temperature, and where it is too cold for it', () => {
    const backup = { source: 'electric', power: 6, mode: { kind: 'alternative', switchTemperature: -5 } };
    // 0, −16, −5 and −5.1 °C
    expect([...planOf({ backup }).resting.subarray(0, 4)]).toEqual([0, 1, 0, 1]);
    const limited = unitOf(map, { lowestOutdoorTemperature: -10 });
    expect([...planOf({ backup: { source: 'electric', power: 6 } }, limited).resting.subarray(0, 4)]).toEqual([
      0, 1, 0, 0,
    ]);
    const low = { source: 'electric', power: 6, mode: { kind: 'alternative', switchTemperature: -20 } };
    expect([...planOf({ backup: low }, limited).resting.subarray(0, 4)]).toEqual([0, 1, 0, 0]);
  });
});

describe('the heat pump in the plan', () => {
  test('has quiet hours in civil time, the first rule that fits holding', () => {
    const quietHours = [
      { start: '23:00', end: '01:00', capacity: 0.3 },
      { start: '22:00', end: '06:00', capacity: 0.6 },
    ];
    const { quietShare } = planOf({ heatPump: { unit: 'unit.yaml', quietHours } });
    const day = quietShare?.subarray(0, 24) ?? [];
    expect([...day]).toEqual([0.3, 0.6, 0.6, 0.6, 0.6, 0.6, ...new Array(16).fill(1), 0.6, 0.3]);
    expect(planOf().quietShare).toBeNull();
  });

  test('bears its in-use allowance, and the pump is in kW', () => {
    const plan = planOf({ heatPump: { unit: 'unit.yaml', inUseAllowance: 0.08 }, circulation: { pumpPower: 45 } });
    expect(plan.inUseAllowance).toBe(0.08);
    near(plan.circulationPower, 0.045);
  });

  test('has no hot water where none is entered, and the mass on its weather where the house is lumped', () => {
    expect([planOf().hotWater, planOf().massOnWeather]).toEqual([null, null]);
    const house = {
      heatLoss: { given: 'coefficient', value: 200 },
      floorArea: 100,
      design: { outdoorTemperature: -12 },
      need: { model: 'lumped' },
    };
    expect(planOf({ house }).massOnWeather?.airAtRest).toHaveLength(8760);
  });
});
