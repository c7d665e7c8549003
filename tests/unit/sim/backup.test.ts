import { describe, expect, test } from 'vitest';
import { MARK } from '../../../src/sim/columns.ts';
import { simulateYear } from '../../../src/sim/year.ts';
import { column, expectNear, type PlanParts, planOf } from './planBuilder.ts';

const HOURS = 24;
const simulate = (parts: PlanParts) => simulateYear(planOf({ hours: HOURS, temperature: -10, ...parts }));
const boiler = { power: 20, isBoiler: true, efficiency: 0.9, hotWaterEfficiency: 0.8 };
const prices = (electricity: number, fuel: number) => ({
  sourcePrices: { electricity: column(electricity, {}, HOURS), fuel },
});

describe('a backup in parallel', () => {
  test('gives what the heat pump cannot, up to its power, and the rest is unmet', () => {
    // Q = 0.3·30 = 9 kW, C = 6 kW
    const enough = simulate({ house: { heatLoss: 0.3 }, backup: { power: 3.5 } });
    expectNear(enough.backupSpaceHeat[5], 3);
    expect(enough.unmetHeat[5]).toBe(0);
    expectNear(enough.electricity[5], 3 + 6 / 2.8);
    const weak = simulate({ house: { heatLoss: 0.3 }, backup: { power: 1 } });
    expectNear(weak.backupSpaceHeat[5], 1);
    expectNear(weak.unmetHeat[5], 2);
    expect(weak.marks[5]! & (MARK.backupForSpace | MARK.unmet)).toBe(MARK.backupForSpace | MARK.unmet);
  });

  test('leaves no trace in hours that it is not needed', () => {
    const c = simulate({ house: { heatLoss: 0.17 } });
    expect(new Set([...c.backupSpaceHeat, ...c.unmetHeat])).toEqual(new Set([0]));
    expect(c.marks[5]).toBe(MARK.heating);
  });
});

test('while the heat pump rests the backup carries all', () => {
  const c = simulate({ run: { resting: new Uint8Array(HOURS).fill(1, 5, 6) } });
  expect(c.heatPumpSpaceHeat[5]).toBe(0);
  expectNear(c.backupSpaceHeat[5], 6);
  expectNear(c.heatPumpSpaceHeat[6], 6);
});

describe('the cheaper source of an hour', () => {
  // −10 °C, 35 °C: Q = 6 kWh = C at COP 2.8; fuel at 0.09/0.9 = 0.1 a kWh of heat, electricity at 0.28/2.8 = 0.1
  test('is the heat pump at a tie', () => {
    const exact = { power: 20, isBoiler: true, efficiency: 0.5, hotWaterEfficiency: 1 };
    const table = { outdoor: [-10, 10], flow: [35], capacity: [8, 8], cop: [2, 4] };
    // 6/2·0.25 against 6/0.5·0.0625: 0.75 both, and every step is exact in binary
    const tie = simulate({ table, backup: exact, run: prices(0.25, 0.0625), interpolation: 'linear' });
    expect(tie.backupSpaceHeat[5]).toBe(0);
    const cheaper = simulate({ table, backup: exact, run: prices(0.25, 0.0624), interpolation: 'linear' });
    expectNear(cheaper.backupSpaceHeat[5], 6);
  });

  test('is the boiler, which leaves the heat pump standing and unmarked', () => {
    const c = simulate({ temperature: -12, house: { heatLoss: 0.01 }, backup: boiler, run: prices(0.4, 0.09) });
    expect(c.heatPumpSpaceHeat[5]).toBe(0);
    expect(c.heatPumpSpaceElectricity[5]).toBe(0);
    expect(c.starts[5]).toBe(0);
    // the heat pump would have cycled at a point colder than its map
    expect(c.marks[5]).toBe(MARK.heating | MARK.backupForSpace);
  });

  test('carries the top-up too', () => {
    // fixed flow of 57 °C at x = 6/6.4: spread 4.6875 K, return 52.3125; share (55 − 52.3125)/4.6875 = 0.573333333333
    const dear = simulate({ flow: 57, backup: boiler, run: prices(9, 0.09) });
    expectNear(dear.backupSpaceHeat[5], 6);
    const cheap = simulate({ flow: 57, backup: boiler, run: prices(0.01, 0.09) });
    expectNear(cheap.heatPumpSpaceHeat[5], 6 * 0.5733333333333333);
    expectNear(cheap.backupSpaceHeat[5], 6 * (1 - 0.5733333333333333));
  });

  test('a boiler too weak for the top-up leaves all else to the heat pump, and the rest unmet', () => {
    // L = 3.44, top-up 2.56 kWh; the boiler of 1 kW has 1, the heat pump its 3.44
    const c = simulate({ flow: 57, backup: { ...boiler, power: 1 }, run: prices(9, 0.09) });
    expectNear(c.backupSpaceHeat[5], 1);
    expectNear(c.heatPumpSpaceHeat[5], 3.44);
    expectNear(c.unmetHeat[5], 1.56);
  });

  test('makes nothing wait where the boiler carries the hour', () => {
    const quiet = column(1, { 5: 0.5 }, HOURS);
    const waits = simulate({ backup: boiler, run: { ...prices(0.01, 0.09), quietShare: quiet } });
    expectNear(waits.waitingHeat[5], 3);
    const carried = simulate({ backup: boiler, run: { ...prices(9, 0.09), quietShare: quiet } });
    expect(carried.waitingHeat[5]).toBe(0);
    expectNear(carried.backupSpaceHeat[5], 6);
  });

  test('is not asked where the heat pump can give nothing: its heat waits', () => {
    const c = simulate({ backup: boiler, run: { ...prices(9, 0.09), quietShare: column(1, { 5: 0 }, HOURS) } });
    expectNear(c.waitingHeat[5], 6);
    expect(c.backupSpaceHeat[5]).toBe(0);
    // in the next hour the boiler is cheaper and carries both
    expectNear(c.backupSpaceHeat[6], 12);
  });

  test('leaves the rooms what hot water leaves of the boiler', () => {
    const c = simulate({
      backup: { ...boiler, power: 4 },
      run: prices(9, 0.09),
      hotWater: { setPoint: 58, hysteresis: 1, draw: column(0, { 5: 0.5 }, HOURS) },
    });
    // 0.5 kWh lift the cylinder back to 58 °C, which only the boiler reaches
    expectNear(c.backupWaterHeat[5], 0.5);
    expectNear(c.backupSpaceHeat[5], 3.5);
    expectNear(c.heatPumpSpaceHeat[5], 2.5);
  });
});
