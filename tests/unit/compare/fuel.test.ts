import { describe, expect, test } from 'vitest';
import { carbonFactorOf, type Fuel, type FuelKind, fuelCost, fuelTaxShare } from '../../../src/compare/fuel.ts';

const gas: Fuel = { kind: 'naturalGas', price: 0.1, calorificValue: 'net', standingPerYear: 0, taxes: [] };
const near = (actual: number | undefined, expected: number) =>
  expect(Math.abs((actual ?? Number.NaN) - expected)).toBeLessThanOrEqual(1e-12 * Math.max(1, expected));

describe('the carbon factor of a fuel', () => {
  test('on net calorific value is the published one', () => {
    near(carbonFactorOf(gas), 0.20196);
  });

  // net over gross: IPCC Guidelines 2006, volume 2, 1.4.1.2, about 10 % less for gas and 5 % for oil; LPG 8 % (from memory)
  test.each([
    ['naturalGas', 0.20196 * 0.9],
    ['heatingOil', 0.26676 * 0.95],
    ['lpg', 0.22716 * 0.92],
  ] as const)('on gross calorific value is lower by what the vapour takes: %s', (kind, expected) => {
    near(carbonFactorOf({ ...gas, kind, calorificValue: 'gross' }), expected);
  });

  test('is the entered one where there is one, on the calorific value of the price', () => {
    expect(carbonFactorOf({ ...gas, calorificValue: 'gross', carbonFactor: 0.24 })).toBe(0.24);
    expect(carbonFactorOf({ ...gas, kind: 'pellets', carbonFactor: 0 })).toBe(0);
  });

  test.each<FuelKind>(['pellets', 'electricity', 'districtHeat', 'other'])('is unknown for %s', (kind) => {
    expect(carbonFactorOf({ ...gas, kind })).toBeUndefined();
  });
});

describe('the cost of a year of fuel', () => {
  test('is energy and standing charge, and the tax on both', () => {
    const cost = fuelCost({ ...gas, standingPerYear: 100, taxes: [{ name: 'VAT', percent: 20 }] }, 10_000);
    near(cost.energy, 1000);
    near(cost.standing, 100);
    near(cost.taxes, 220);
    near(cost.total, 1320);
  });

  test('taxes add up, they do not compound', () => {
    const taxes = [
      { name: 'VAT', percent: 20 },
      { name: 'levy', percent: 5 },
    ];
    near(fuelTaxShare({ ...gas, taxes }), 0.25);
    near(fuelCost({ ...gas, taxes }, 1000).total, 125);
  });

  test('has its standing charge without a single kWh', () => {
    near(fuelCost({ ...gas, standingPerYear: 80 }, 0).total, 80);
  });
});
