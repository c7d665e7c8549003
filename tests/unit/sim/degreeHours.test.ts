import { describe, expect, test } from 'vitest';
import { degreeHourNeed } from '../../../src/sim/degreeHours.ts';
import { column, expectNear, houseOf, type PlanParts, weatherOf } from './planBuilder.ts';

function needOf(parts: Pick<PlanParts, 'house' | 'temperature' | 'radiation'>): Float64Array {
  const weather = weatherOf({ hours: 72, ...parts });
  const need = new Float64Array(72).fill(-1);
  degreeHourNeed(houseOf(parts.house, 72), weather, need);
  return need;
}

describe('degree hours', () => {
  test('the need is heat loss times the difference to the base, and never negative', () => {
    const temperature = column(30, { 1: 20, 2: 19, 3: -10 }, 72);
    expectNear(needOf({ temperature })[3], 0.2 * 30);
    expectNear(needOf({ temperature })[2], 0.2);
    expect([...needOf({ temperature }).subarray(0, 2)]).toEqual([0, 0]);
  });

  test('internal gains lower the base by what they warm the house', () => {
    // 0.4/0.2 = 2 K
    expectNear(needOf({ temperature: 0, house: { internalGains: 0.4 } })[7], 0.2 * 18);
  });

  test('the sun of the last 24 hours counts, each hour alike', () => {
    // 480 W/m² in one hour of the day: 20 W/m² in the mean of any 24; 5 m² take in 0.1 kW, 0.5 K
    const radiation = Float64Array.from({ length: 72 }, (_, i) => (i % 24 === 12 ? 480 : 0));
    const need = needOf({ temperature: 0, radiation, house: { solarAperture: 5 } });
    for (const hour of [0, 12, 13, 40]) expectNear(need[hour], 0.2 * 19.5);
  });

  test('an entered base moves with the set point', () => {
    const house = { baseTemperature: 15, nominalSetPoint: 20, setPoint: column(20, { 30: 16 }, 72) };
    expectNear(needOf({ temperature: 0, house })[29], 0.2 * 15);
    expectNear(needOf({ temperature: 0, house })[30], 0.2 * 11);
  });

  test('a base from gains follows the set point of the hour', () => {
    const house = { internalGains: 0.4, setPoint: column(20, { 30: 16 }, 72) };
    expectNear(needOf({ temperature: 0, house })[30], 0.2 * 14);
  });

  test('nothing is needed while the mean of the last day is at or above the heating limit', () => {
    // 12 °C, and from hour 24 on 18 °C: the mean reaches 15 °C with the twelfth warm hour
    const temperature = column(12, {}, 72).fill(18, 24);
    const need = needOf({ temperature: Float64Array.from(temperature), house: { heatingLimit: 15 } });
    expectNear(need[34], 0.2 * 2);
    expect(need[35]).toBe(0);
  });
});
