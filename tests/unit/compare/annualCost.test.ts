import { describe, expect, test } from 'vitest';
import { annualTotal, electricityCost, fuelParts } from '../../../src/compare/annualCost.ts';
import { fuelCost } from '../../../src/compare/fuel.ts';
import { bill } from '../../../src/tariffs/bill.ts';
import type { Tariff } from '../../../src/tariffs/tariff.ts';
import { clockOf, prepared, steadyUse, tariffOf } from '../tariffs/sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
// Sums of 8760 hours round by some 1e-11 of a few thousand.
const DIGITS = 7;

const parts: Partial<Tariff> = {
  rates: [{ name: 'flat', price: 0.3 }],
  standing: { perYear: 120 },
  demand: { perKW: 2 },
  taxes: [{ name: 'VAT', percent: 20 }],
  credits: [{ name: 'bonus', amount: 50 }],
};

/** A household of 1 kW, and a system of another kilowatt beside it. */
function costOn(tariff: Tariff) {
  const laid = prepared(tariff, berlin);
  return electricityCost(bill(laid, steadyUse(berlin, 2)), bill(laid, steadyUse(berlin, 1)));
}

describe('what a system’s electricity costs', () => {
  test('is what it adds to the bill: energy and demand with their taxes, no standing charge, no credit', () => {
    // 8760·0.3·1.2 = 3153.6; one kilowatt more in twelve months: 24·1.2 = 28.8
    expect(costOn(tariffOf(parts)).electricity).toBeCloseTo(3153.6 + 28.8, DIGITS);
  });

  test('counts as energy the kilowatt-hours with the taxes on them', () => {
    expect(costOn(tariffOf(parts)).electricityEnergy).toBeCloseTo(3153.6, DIGITS);
  });

  test('has its taxes inside where the prices are stated with them', () => {
    const { electricity, electricityEnergy } = costOn(tariffOf({ ...parts, pricesStated: 'withTax' }));
    expect(electricityEnergy).toBeCloseTo(2628, DIGITS);
    expect(electricity).toBeCloseTo(2628 + 24, DIGITS);
  });

  test('is nothing where nothing is charged', () => {
    const free = costOn(tariffOf({ rates: [{ name: 'free', price: 0 }], taxes: [{ name: 'VAT', percent: 20 }] }));
    expect(free).toEqual({ electricity: 0, electricityEnergy: 0 });
  });
});

describe('what a system’s fuel costs', () => {
  const gas = { kind: 'naturalGas', price: 0.1, calorificValue: 'gross', standingPerYear: 100 } as const;

  test('counts as energy the kilowatt-hours with the taxes on them', () => {
    const cost = fuelCost({ ...gas, taxes: [{ name: 'VAT', percent: 20 }] }, 9000);
    const found = fuelParts(cost);
    // (900 + 100)·1.2 and 900·1.2
    expect(found.fuel).toBeCloseTo(1200, 10);
    expect(found.fuelEnergy).toBeCloseTo(1080, 10);
  });

  test('is nothing without fuel and standing charge', () => {
    expect(fuelParts(fuelCost({ ...gas, standingPerYear: 0, taxes: [] }, 0))).toEqual({ fuel: 0, fuelEnergy: 0 });
  });
});

test('a year’s cost is its electricity, fuel and service', () => {
  expect(annualTotal({ electricity: 900, fuel: 200, service: 150 })).toBe(1250);
});
