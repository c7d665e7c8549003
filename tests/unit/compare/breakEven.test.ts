import { describe, expect, test } from 'vitest';
import { breakEvenFactor, breakEvenPrice, type HeatPumpYear } from '../../../src/compare/breakEven.ts';

/** 3000 kWh at a mean of 0.30 give 9000 kWh of heat. */
const heatPump: HeatPumpYear = { cost: { electricity: 900, fuel: 0, service: 100 }, electricity: 3000, heat: 9000 };
/** 1300 a year. */
const boiler = { electricity: 20, fuel: 1130, service: 150 };

/** A number within rounding of some quotients; fails where there is only a word. */
const near = (found: number | string, expected: number) =>
  expect(Math.abs((typeof found === 'number' ? found : Number.NaN) - expected)).toBeLessThanOrEqual(1e-12);

describe('the break-even electricity price', () => {
  test('is what the boiler’s cost leaves for each of the heat pump’s kWh', () => {
    // (1300 − 100)/3000
    near(breakEvenPrice(heatPump, boiler), 0.4);
  });

  test('leaves less where a hybrid burns fuel', () => {
    // (1300 − 100 − 300)/3000
    near(breakEvenPrice({ ...heatPump, cost: { ...heatPump.cost, fuel: 300 } }, boiler), 0.3);
  });

  test('is nothing at all where just nothing is left', () => {
    near(breakEvenPrice({ ...heatPump, cost: { ...heatPump.cost, service: 1300 } }, boiler), 0);
  });

  test('is none where the boiler costs less than the heat pump’s fuel and service', () => {
    expect(breakEvenPrice({ ...heatPump, cost: { ...heatPump.cost, service: 1301 } }, boiler)).toBe('not even free');
  });

  test('is none without electricity', () => {
    expect(breakEvenPrice({ ...heatPump, electricity: 0 }, boiler)).toBe('no electricity');
  });
});

describe('the break-even seasonal factor', () => {
  test('is the heat over the electricity that the boiler’s cost would buy', () => {
    // (1300 − 100)/0.30 = 4000 kWh
    near(breakEvenFactor(heatPump, boiler), 2.25);
  });

  test('rises where a hybrid’s fuel leaves less for electricity', () => {
    // 900/0.30 = 3000 kWh
    near(breakEvenFactor({ ...heatPump, cost: { ...heatPump.cost, fuel: 300 } }, boiler), 3);
  });

  test.each([
    ['no heat', { ...heatPump, heat: 0 }],
    ['no electricity', { ...heatPump, electricity: 0 }],
    ['no price', { ...heatPump, cost: { ...heatPump.cost, electricity: 0 } }],
    ['no price', { ...heatPump, cost: { ...heatPump.cost, electricity: -5 } }],
    ['at no factor', { ...heatPump, cost: { ...heatPump.cost, service: 1300 } }],
    ['at no factor', { ...heatPump, cost: { ...heatPump.cost, service: 2000 } }],
  ] as const)('is none, for the reason: %s', (reason, year) => {
    expect(breakEvenFactor(year, boiler)).toBe(reason);
  });

  test('is none where what is left is too little for any number', () => {
    const bare = { ...heatPump, cost: { ...heatPump.cost, service: 0 } };
    expect(breakEvenFactor(bare, { electricity: 0, fuel: Number.MIN_VALUE, service: 0 })).toBe('at no factor');
  });
});
