import { describe, expect, test } from 'vitest';
import { bill } from '../../../src/tariffs/bill.ts';
import { billWeeks, dearestWeek } from '../../../src/tariffs/billWeeks.ts';
import { taxedEnergy } from '../../../src/tariffs/taxedEnergy.ts';
import { clockOf, nightAndDay, prepared, ratesOf, steadyUse, stepAt, tariffOf } from './sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const flat = prepared(ratesOf({ name: 'flat', price: 0.3 }), berlin);
const weeksOf = (tariff = flat, use = steadyUse(berlin)) => billWeeks(tariff, use, bill(tariff, use));
const sum = (values: readonly number[]) => values.reduce((all, value) => all + value, 0);
// Sums of some hundred hours.
const DIGITS = 9;

describe('the civil weeks of a bill', () => {
  test('run from Monday to Sunday; the year’s first and last are as short as the year makes them', () => {
    const weeks = weeksOf();
    // 1 January 2025 is a Wednesday, 31 December too: five days, 51 whole weeks, three days.
    expect(weeks).toHaveLength(53);
    expect(weeks[0]).toMatchObject({ from: '2025-01-01', to: '2025-01-05' });
    expect(weeks[1]).toMatchObject({ from: '2025-01-06', to: '2025-01-12' });
    expect(weeks.at(-1)).toMatchObject({ from: '2025-12-29', to: '2025-12-31' });
    expect(weeks.map(({ kWh }) => kWh).slice(0, 2)).toEqual([120, 168]);
    expect(weeks.at(-1)?.kWh).toBe(72);
  });

  test('have an hour less and an hour more where the clocks change', () => {
    const byFirstDay = new Map(weeksOf().map(({ from, kWh }) => [from, kWh]));
    expect(byFirstDay.get('2025-03-24')).toBe(167);
    expect(byFirstDay.get('2025-10-20')).toBe(169);
  });

  test('hold the hours that the zone leaves in the neighbouring year in the week of their real date', () => {
    // Weather in UTC begins at 19:00 of 31 December 2024 in New York, a Tuesday of the same week as 1 January.
    const newYork = clockOf('America/New_York', 0);
    const tariff = prepared(ratesOf({ name: 'flat', price: 0.3 }), newYork);
    const [first] = billWeeks(tariff, steadyUse(newYork), bill(tariff, steadyUse(newYork)));
    expect(first).toMatchObject({ from: '2024-12-31', to: '2025-01-05', kWh: 125 });
  });

  test('cost what their hours cost by the rate that holds, with the taxes on top', () => {
    const taxed = prepared({ ...nightAndDay, taxes: [{ name: 'VAT', percent: 20 }] }, berlin);
    // seven nights of 8 h at 0.20 and seven days of 16 h at 0.30, 20 % on top: (11.2 + 33.6)·1.2
    expect(weeksOf(taxed)[1]?.cost).toBeCloseTo(53.76, DIGITS);
  });

  test('leave out standing and demand charges and credits', () => {
    const charged = tariffOf({
      rates: [{ name: 'flat', price: 0.3 }],
      standing: { perDay: 1 },
      demand: { perKW: 5 },
      credits: [{ name: 'bonus', amount: 100 }],
    });
    expect(weeksOf(prepared(charged, berlin))[1]?.cost).toBeCloseTo(168 * 0.3, DIGITS);
  });

  test('share what blocks ask in a month by kWh', () => {
    // January: 744 kWh, 100 at 0.50 and 644 at 0.10 = 114.4; a week of 168 kWh has 168/744 of it.
    const blocks = tariffOf({ blocks: { per: 'month', prices: [{ upTo: 100, price: 0.5 }, { price: 0.1 }] } });
    const tariff = prepared(blocks, berlin);
    expect(weeksOf(tariff)[1]?.cost).toBeCloseTo((114.4 * 168) / 744, DIGITS);
    const made = bill(tariff, steadyUse(berlin));
    expect(sum(weeksOf(tariff).map(({ cost }) => cost))).toBeCloseTo(taxedEnergy(made), 7);
  });

  test('add that share to what the rates ask', () => {
    // January as before: 114.4 by blocks on 744 kWh, and 0.30 by the rate on each of the 168 kWh of the week
    const blocks = { per: 'month', prices: [{ upTo: 100, price: 0.5 }, { price: 0.1 }] } as const;
    const both = prepared(tariffOf({ rates: [{ name: 'flat', price: 0.3 }], blocks }), berlin);
    expect(weeksOf(both)[1]?.cost).toBeCloseTo((114.4 * 168) / 744 + 168 * 0.3, DIGITS);
  });
});

describe('the dearest week', () => {
  test('is the one whose electricity costs most, which need not use most', () => {
    const use = steadyUse(berlin, 0);
    use[stepAt(berlin, '2025-02-11T03:00+01:00')] = 10; // night: 2.00
    use[stepAt(berlin, '2025-05-20T12:00+02:00')] = 8; // day: 2.40
    const tariff = prepared(nightAndDay, berlin);
    const week = dearestWeek(tariff, use, bill(tariff, use));
    expect(week).toMatchObject({ from: '2025-05-19', to: '2025-05-25', kWh: 8 });
    expect(week.cost).toBeCloseTo(2.4, DIGITS);
  });

  test('is the earliest of equal ones', () => {
    expect(dearestWeek(flat, steadyUse(berlin, 0), bill(flat, steadyUse(berlin, 0))).from).toBe('2025-01-01');
  });
});

test('the energy of a bill with its taxes has its share of them, and none of those inside the prices', () => {
  const parts = {
    rates: [{ name: 'flat', price: 0.3 }],
    standing: { perYear: 120 },
    taxes: [{ name: 'VAT', percent: 20 }],
  };
  // 8760 · 0.3 = 2628, on top 20 %
  expect(taxedEnergy(bill(prepared(tariffOf(parts), berlin), steadyUse(berlin)))).toBeCloseTo(3153.6, 7);
  const inside = prepared(tariffOf({ ...parts, pricesStated: 'withTax' }), berlin);
  expect(taxedEnergy(bill(inside, steadyUse(berlin)))).toBeCloseTo(2628, 7);
});
