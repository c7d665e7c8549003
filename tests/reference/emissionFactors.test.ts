import { expect, test } from 'vitest';
import { carbonFactorOf, type Fuel } from '../../src/compare/fuel.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Carbon of fuels');
const factorsHeld = accuracy.comparison({
  what: 'kg of carbon dioxide per kWh of natural gas, heating oil and liquefied gas',
  source: 'Regulation (EU) 2018/2066 annex VI table 1',
  unit: 'kg/kWh',
  allowed: 1e-12,
  why: 'five decimals are the whole number',
});

/**
 * kg of carbon dioxide per kWh of net calorific value. Source: Commission Implementing Regulation (EU) 2018/2066, annex VI,
 * table 1, in t/TJ, which is divided by 277.777… MWh/TJ.
 */
const factors = [
  { kind: 'naturalGas', perTerajoule: 56.1, perKwh: 0.20196 },
  { kind: 'heatingOil', perTerajoule: 74.1, perKwh: 0.26676 },
  { kind: 'lpg', perTerajoule: 63.1, perKwh: 0.22716 },
] as const;

test.each(factors)('$kind burns to $perKwh kg a kWh of net calorific value', ({ kind, perTerajoule, perKwh }) => {
  const fuel: Fuel = { kind, price: 0.1, calorificValue: 'net', standingPerYear: 0, taxes: [] };
  const factor = carbonFactorOf(fuel) ?? 0;
  // five decimals are the whole number: t/TJ with one decimal times 3.6e-3
  expect(Math.abs(factor - perKwh)).toBeLessThanOrEqual(1e-12);
  factorsHeld.add(factor - perKwh);
  expect(Math.abs(factor - (perTerajoule * 3600) / 1e6)).toBeLessThanOrEqual(1e-12);
});
