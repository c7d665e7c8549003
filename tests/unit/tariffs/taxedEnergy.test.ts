import { expect, test } from 'vitest';
import { bill } from '../../../src/tariffs/bill.ts';
import { composeYear } from '../../../src/tariffs/composeYear.ts';
import { taxedEnergy } from '../../../src/tariffs/taxedEnergy.ts';
import { clockOf, prepared, steadyUse, tariffOf } from './sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const vat = [{ name: 'VAT', percent: 20 }];
// Sums over 8760 hours of about 1 kWh: rounding is some 1e-11 relative to a thousand.
const DIGITS = 9;

test('energy bears its own taxes and none of the standing charge', () => {
  // 8760 kWh at 0.30 and 20 % on top; the standing charge's tax is not the energy's
  const tariff = tariffOf({ rates: [{ name: 'flat', price: 0.3 }], standing: { perDay: 1 }, taxes: vat });
  expect(taxedEnergy(bill(prepared(tariff, berlin), steadyUse(berlin)))).toBeCloseTo(8760 * 0.36, DIGITS);
});

test('energy at negative prices bears a negative tax, whatever the standing charge brings in', () => {
  const tariff = tariffOf({ rates: [{ name: 'flat', price: -0.01 }], standing: { perYear: 87.6 }, taxes: vat });
  const made = bill(prepared(tariff, berlin), steadyUse(berlin));
  expect(taxedEnergy(made)).toBeCloseTo(-87.6 * 1.2, DIGITS);
  expect(made.taxes).toBeCloseTo(0, DIGITS);
});

test('prices that hold their tax are what the energy costs', () => {
  const tariff = tariffOf({ rates: [{ name: 'flat', price: 0.3 }], taxes: vat, pricesStated: 'withTax' });
  expect(taxedEnergy(bill(prepared(tariff, berlin), steadyUse(berlin)))).toBeCloseTo(2628, DIGITS);
});

test('of two suppliers in a month each has its own: 20 % on top until 15 March, inside with a standing charge from then on', () => {
  const before = tariffOf({ rates: [{ name: 'all', price: 0.25 }], taxes: vat });
  const after = tariffOf({
    ...{ rates: [{ name: 'all', price: 0.25 }], taxes: vat, pricesStated: 'withTax' as const },
    standing: { perYear: 120 },
  });
  const supplies = [
    { tariff: before, file: 'a.yaml', series: undefined, from: undefined },
    { tariff: after, file: 'b.yaml', series: undefined, from: '03-16' },
  ];
  const made = bill(composeYear(supplies, berlin).prepared!, steadyUse(berlin));
  // 74 days of 24 kWh with a fifth more, 291 days without; the hour that March lacks comes back in October
  expect(taxedEnergy(made)).toBeCloseTo(24 * 0.25 * (74 * 1.2 + 291), DIGITS);
  // March has 15 days of the first and, summer time beginning, 16 days less an hour of the second
  expect(taxedEnergy(made.monthly[2]!)).toBeCloseTo(0.25 * (15 * 24 * 1.2 + 16 * 24 - 1), DIGITS);
});
