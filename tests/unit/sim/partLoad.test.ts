import { describe, expect, test } from 'vitest';
import { AT } from '../../../src/sim/hourScratch.ts';
import { priceRate } from '../../../src/sim/partLoad.ts';
import { expectNear, type PlanParts, planOf } from './planBuilder.ts';

/** Electricity and starts of a rate: full load 8 kW at COP 3, lowest level 2 kW at COP 4 where nothing else is said. */
function price(given: number, share: number, parts: PlanParts = {}, level = { kW: 2, cop: 4 }) {
  const hour = new Float64Array(AT.size);
  hour[AT.capacity] = 8;
  hour[AT.cop] = 3;
  hour[AT.lowestCapacity] = level.kW;
  hour[AT.lowestCop] = level.cop;
  priceRate(planOf({ hours: 24, ...parts }), given, share, hour);
  return { kWh: hour[AT.electricity], starts: hour[AT.starts] };
}

describe('between the lowest level and full load', () => {
  test('the COP is linear in the rate, and nothing starts', () => {
    // halfway, at 5 kW: COP 3.5
    expectNear(price(5, 1).kWh, 5 / 3.5);
    expect(price(5, 1).starts).toBe(0);
    expectNear(price(8, 1).kWh, 8 / 3);
    expectNear(price(2, 1).kWh, 2 / 4);
  });

  test('the rate is that of what hot water leaves of the hour', () => {
    // 2.5 kWh in half an hour: 5 kW
    expectNear(price(2.5, 0.5).kWh, 2.5 / 3.5);
  });

  test('the in-use allowance lowers every COP', () => {
    expectNear(price(5, 1, { run: { inUseAllowance: 0.2 } }).kWh, 5 / (3.5 * 0.8));
    expectNear(price(1, 1, { run: { inUseAllowance: 0.2 } }).kWh, 1 / (4 * 0.875 * 0.8));
  });
});

describe('below the lowest level', () => {
  test('degradation takes C_d of the COP for the pauses', () => {
    // CR = 0.5: 4·(1 − 0.25·0.5) = 3.5
    expectNear(price(1, 1).kWh, 1 / 3.5);
    expectNear(price(1, 1, { unit: { cycling: { method: 'degradation', coefficient: 0.4 } } }).kWh, 1 / 3.2);
  });

  test('off-power is drawn in the pauses of what hot water leaves of the hour', () => {
    // 0.5 kWh in half an hour: r = 1 kW, CR = 0.5; 0.06 kW for 0.5·0.5 h
    const unit = { cycling: { method: 'offPower', power: 0.06 } } as const;
    expectNear(price(0.5, 0.5, { unit }).kWh, 0.5 / 4 + 0.06 * 0.25);
  });

  test('starts follow from the heat that the pauses leave in the water', () => {
    // CR = 0.5: 2·0.25·1/(100·1.163e-3·5) = 0.5/0.5815
    expectNear(price(1, 1).starts, 0.5 / 0.5815);
    expectNear(price(0.5, 0.5, { run: { cycleWater: 50 } }).starts, (0.5 * 0.5) / (0.5815 / 2));
  });

  test('there are at most six starts an hour', () => {
    expect(price(1, 1, { run: { cycleWater: 1 } }).starts).toBe(6);
  });
});

describe('a lowest level at or above full load', () => {
  test.each([
    ['above', 9],
    ['at', 8],
  ])('is a single-speed unit that cycles below full load: %s', (_, kW) => {
    // CR = 0.5 of 8 kW at COP 3: 3·0.875 = 2.625
    expectNear(price(4, 1, {}, { kW, cop: 2 }).kWh, 4 / 2.625);
    expectNear(price(8, 1, {}, { kW, cop: 2 }).kWh, 8 / 3);
  });
});
