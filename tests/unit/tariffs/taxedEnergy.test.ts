import { expect, test } from 'vitest';
import { taxedEnergyOf } from '../../../src/tariffs/taxedEnergy.ts';

const month = { kWh: 10, energy: 0, standing: 0, demand: 0, taxes: 0, taxesInside: 0, credits: 0, total: 0 };

test('energy that was paid for with just the standing charge bears no tax', () => {
  // a month in which negative prices bring in what the supplier asks: 5 − 5 is charged, and nothing is taxed
  expect(taxedEnergyOf({ ...month, energy: -5, standing: 5 })).toBe(-5);
  expect(taxedEnergyOf(month)).toBe(0);
});

test('taxes are shared between energy and standing charge by their size', () => {
  // 30 of 40 charged, so three quarters of the 8 of tax
  expect(taxedEnergyOf({ ...month, energy: 30, standing: 10, taxes: 8 })).toBe(36);
});
