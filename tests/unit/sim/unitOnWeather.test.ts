import { describe, expect, test } from 'vitest';
import { prepareMap } from '../../../src/sim/heatPumpMap.ts';
import { AT } from '../../../src/sim/hourScratch.ts';
import { readLevels } from '../../../src/sim/levels.ts';
import { layUnitOnWeather } from '../../../src/sim/unitOnWeather.ts';
import { column, expectNear, type PlanParts, roundTable, unitOf, weatherOf } from './planBuilder.ts';

const full = prepareMap(roundTable, 'carnotShare');

function lay(parts: PlanParts['unit'], temperature: number | Float64Array, relativeHumidity = 84) {
  return layUnitOnWeather(unitOf(full, parts), weatherOf({ hours: 24, temperature, relativeHumidity }));
}

describe('a unit on its weather', () => {
  test('may have a highest flow that follows the outdoor temperature', () => {
    const laid = lay({ highestFlow: { at: [-20, 0], value: [45, 65] } }, column(5, { 1: -10, 2: -30 }, 24));
    expect([...laid.highestFlow.subarray(0, 3)]).toEqual([65, 55, 45]);
  });

  test('runs at its lowest outdoor temperature and not below', () => {
    const laid = lay({ lowestOutdoorTemperature: -15 }, column(0, { 1: -15, 2: -15.01 }, 24));
    expect([...laid.tooCold.subarray(0, 3)]).toEqual([0, 0, 1]);
  });

  test('loses nothing to frost where the values are integrated', () => {
    const laid = lay({ defrost: { method: 'included' } }, 2);
    expect([laid.capacityLoss[0], laid.copLoss[0]]).toEqual([0, 0]);
  });

  test('loses by humidity its share at the reference, and half at most', () => {
    // φ = 1 at 2 °C and 84 % at sea level; φ is at most 1.5, so 0.4·φ would pass one half in damper air
    const laid = lay({ defrost: { method: 'humidity', capacityLoss: 0.1, copLoss: 0.12 } }, 2);
    expectNear(laid.capacityLoss[0], 0.1);
    expectNear(laid.copLoss[0], 0.12);
    const damp = lay({ defrost: { method: 'humidity', capacityLoss: 0.4, copLoss: 0.1 } }, 2, 100);
    expect(damp.capacityLoss[0]).toBe(0.5);
    expect(damp.copLoss[0]).toBeLessThan(0.15 + 1e-12);
  });

  test('loses by table what its factors leave, the ends held', () => {
    const laid = lay(
      {
        defrost: {
          method: 'table',
          capacity: { at: [0, 6], value: [0.9, 1] },
          cop: { at: [-5, 5], value: [0.8, 0.9] },
        },
      },
      column(3, { 1: 20 }, 24),
    );
    expectNear(laid.capacityLoss[0], 0.05);
    expectNear(laid.copLoss[0], 1 - 0.88);
    expect(laid.capacityLoss[1]).toBe(0);
    expectNear(laid.copLoss[1], 0.1);
  });
});

describe('both levels of a unit', () => {
  const levels = (parts: PlanParts['unit']) => {
    const hour = new Float64Array(AT.size);
    readLevels(lay(parts, 2), 0, 2, 35, hour);
    return {
      capacity: hour[AT.capacity],
      cop: hour[AT.cop],
      lowestCapacity: hour[AT.lowestCapacity],
      lowestCop: hour[AT.lowestCop],
    };
  };

  test('a lowest level given as shares follows full load', () => {
    // u = 0.6 at 35 °C: 8.4 kW
    const found = levels({ lowest: { given: 'share', capacity: 0.25, cop: 1.1 } });
    expectNear(found.capacity, 8.4);
    expectNear(found.lowestCapacity, 2.1);
    expectNear(found.lowestCop, 1.1 * found.cop!);
  });

  test('a lowest level of its own is read from its own table', () => {
    const table = { outdoor: [-10, 10], flow: [35, 55], capacity: [2, 2, 4, 4], cop: [3, 2, 6, 4] };
    const found = levels({ lowest: { given: 'table', map: prepareMap(table, 'carnotShare') } });
    expectNear(found.lowestCapacity, 0.4 * 2 + 0.6 * 4);
    // η of 3 at −10/35 (κ 311.15/55) and 6 at 10/35 (κ 311.15/35), κ at 2/35 311.15/43
    expectNear(found.lowestCop, (0.4 * ((3 * 55) / 311.15) + 0.6 * ((6 * 35) / 311.15)) * (311.15 / 43));
  });

  test('frost by humidity takes from the lowest level in proportion to its capacity', () => {
    const table = { outdoor: [-10, 10], flow: [35, 55], capacity: [2, 2, 4, 4], cop: [3, 2, 6, 4] };
    const lowest = { given: 'table', map: prepareMap(table, 'carnotShare') } as const;
    const free = levels({ lowest });
    const frosted = levels({ lowest, defrost: { method: 'humidity', capacityLoss: 0.1, copLoss: 0.12 } });
    const level = 3.2 / 8.4;
    expectNear(frosted.capacity, free.capacity! * 0.9);
    expectNear(frosted.cop, free.cop! * 0.88);
    expectNear(frosted.lowestCapacity, free.lowestCapacity! * (1 - 0.1 * level));
    expectNear(frosted.lowestCop, free.lowestCop! * (1 - 0.12 * level));
  });

  test('frost by table takes the same from both', () => {
    const at = (value: number) => ({ at: [0], value: [value] });
    const free = levels({});
    const frosted = levels({ defrost: { method: 'table', capacity: at(0.8), cop: at(0.7) } });
    expectNear(frosted.lowestCapacity, free.lowestCapacity! * 0.8);
    expectNear(frosted.lowestCop, free.lowestCop! * 0.7);
  });
});
