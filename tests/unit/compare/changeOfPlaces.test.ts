import { describe, expect, test } from 'vitest';
import { type ChangeOfPlaces, changeOfPlaces, type PriceAtEquality } from '../../../src/compare/changeOfPlaces.ts';
import { bill } from '../../../src/tariffs/bill.ts';
import type { Tariff } from '../../../src/tariffs/tariff.ts';
import { clockOf, prepared, steadyUse, tariffOf } from '../tariffs/sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
// Quotients of sums of 8760 hours.
const DIGITS = 9;

const billOn = (parts: Partial<Tariff>, kW = 1) => bill(prepared(tariffOf(parts), berlin), steadyUse(berlin, kW));
const flat: Partial<Tariff> = { rates: [{ name: 'flat', price: 0.3 }] };

function numbers(change: ChangeOfPlaces): PriceAtEquality {
  if (typeof change === 'string') throw new Error(change);
  return change;
}

describe('two tariffs change places', () => {
  test('where the kWh prices of the cheaper one have risen by the difference of the year', () => {
    // 8760 kWh at 0.30 cost 2628; 87.6 more is one cent a kWh.
    const { meanPrice, priceAtEquality, change } = numbers(changeOfPlaces(billOn(flat), 87.6));
    expect(meanPrice).toBeCloseTo(0.3, DIGITS);
    expect(priceAtEquality).toBeCloseTo(0.31, DIGITS);
    expect(change).toBeCloseTo(0.01 / 0.3, DIGITS);
  });

  test('earlier where taxes come on top, for they rise with the price', () => {
    // with 20 % on top 72.…: 87.6/1.2 = 73 of 8760 kWh
    const taxed = { ...flat, standing: { perYear: 100 }, taxes: [{ name: 'VAT', percent: 20 }] };
    expect(numbers(changeOfPlaces(billOn(taxed), 87.6)).priceAtEquality).toBeCloseTo(0.3 + 73 / 8760, DIGITS);
  });

  test('at that price: the year then costs the same on both', () => {
    const taxed = { ...flat, demand: { perKW: 3 }, taxes: [{ name: 'VAT', percent: 7 }] };
    const cheaper = billOn(taxed);
    const { priceAtEquality } = numbers(changeOfPlaces(cheaper, 250));
    const risen = billOn({ ...taxed, rates: [{ name: 'flat', price: priceAtEquality }] });
    expect(risen.total).toBeCloseTo(cheaper.total + 250, 6);
  });

  test('at once where they cost the same', () => {
    expect(numbers(changeOfPlaces(billOn(flat), 0))).toMatchObject({ change: 0 });
  });

  test('never by price where no electricity is on the bill, or where it costs nothing in all', () => {
    expect(changeOfPlaces(billOn(flat, 0), 10)).toBe('no electricity');
    expect(changeOfPlaces(billOn({ rates: [{ name: 'paid', price: -0.1 }] }), 10)).toBe('no price');
    expect(changeOfPlaces(billOn({ rates: [{ name: 'free', price: 0 }] }), 10)).toBe('no price');
  });
});
