import { describe, expect, test } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { bill } from '../../../src/tariffs/bill.ts';
import { composeYear, type Supply } from '../../../src/tariffs/composeYear.ts';
import type { PreparedTariff } from '../../../src/tariffs/preparedTariff.ts';
import type { Tariff } from '../../../src/tariffs/tariff.ts';
import { clockOf, codes, nightAndDay, ratesOf, steadyUse, stepAt, tariffOf } from './sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const first = tariffOf({ name: 'A', rates: [{ name: 'flat', price: 0.3 }] });
const second = tariffOf({ name: 'B', rates: [{ name: 'flat', price: 0.2 }] });
// Sums over a year of some thousand: 9 decimals.
const DIGITS = 9;

function supply(tariff: Tariff, from?: string): Supply {
  return { tariff, file: `${tariff.name}.yaml`, from };
}

function composed(supplies: Supply[], clock = berlin): PreparedTariff {
  const result = composeYear(supplies, clock);
  if (!result.prepared) throw new Error(codes(result.problems));
  return result.prepared;
}

describe('a change of supplier', () => {
  test('on 1 July prices each half by its own tariff, from civil midnight on', () => {
    const year = composed([supply(first), supply(second, '07-01')]);
    const change = stepAt(berlin, '2025-07-01T00:00+02:00');
    expect([year.price[change - 1], year.price[change]]).toEqual([0.3, 0.2]);
    // January to June have 181 days, less the hour missing in March: 4343 h at 0.30; the rest of 8760 h at 0.20.
    const { energy, byRate } = bill(year, steadyUse(berlin));
    expect(energy).toBeCloseTo(4343 * 0.3 + 4417 * 0.2, DIGITS);
    expect(byRate.flat).toMatchObject({ hours: 8760 });
    expect(year.name).toBe('A, then B');
  });

  test('keeps the rates of both, equal names being one', () => {
    const year = composed([supply(first), supply(nightAndDay, '2025-07-01'), supply(second, '12-01')]);
    expect(year.rateNames).toEqual(['flat', 'night', 'day']);
    const names = [0, stepAt(berlin, '2025-07-01T23:00+02:00'), 8759].map((i) => year.rateNames[year.rateOfStep[i]]);
    expect(names).toEqual(['flat', 'night', 'flat']);
    expect(year.hoursOfRate.reduce((a, b) => a + b)).toBeCloseTo(8760, DIGITS);
  });

  test('shares standing charges and credits by days', () => {
    // A from 1 January to 10 April: 100 days; B 265.
    const a = { ...first, standing: { perDay: 1, perMonth: 30, perYear: 365 }, credits: [{ name: 'c', amount: 73 }] };
    const { standing, credits, monthly } = bill(composed([supply(a), supply(second, '04-11')]), steadyUse(berlin));
    // 100 · 1; three months and 10 of April's 30 days; 365 · 100/365.
    expect(standing).toBeCloseTo(100 + 30 * (3 + 10 / 30) + 100, DIGITS);
    expect(monthly[3].standing).toBeCloseTo(10 + 10 + 10, DIGITS);
    expect(credits).toBeCloseTo(20, DIGITS);
  });

  test('shares the ends of blocks and the month’s demand charge by days', () => {
    // April, 10 of 30 days: the block of 300 kWh ends at 100. 240 kWh in those days: 100 · 0.5 + 140 · 0.1 = 64.
    const a = tariffOf({
      name: 'A',
      blocks: { per: 'month', prices: [{ upTo: 300, price: 0.5 }, { price: 0.1 }] },
      demand: { perKW: 3 },
    });
    const use = steadyUse(berlin, 0).fill(
      1,
      stepAt(berlin, '2025-04-01T00:00+02:00'),
      stepAt(berlin, '2025-05-01T00:00+02:00'),
    );
    const year = composed([supply(a), supply(tariffOf({ ...second, demand: { perKW: 6 } }), '04-11')]);
    const { monthly } = bill(year, use);
    expect(monthly[3].energy).toBeCloseTo(64 + 480 * 0.2, DIGITS);
    expect(monthly[3].demand).toBeCloseTo((3 * 10) / 30 + (6 * 20) / 30, DIGITS);
    // A peak on 20 April is the second supplier's alone.
    use[stepAt(berlin, '2025-04-20T12:00+02:00')] = 5;
    expect(bill(year, use).monthly[3].demand).toBeCloseTo((3 * 10) / 30 + (5 * 6 * 20) / 30, DIGITS);
  });

  test('taxes each part by its own taxes', () => {
    const a = { ...first, taxes: [{ name: 'VAT', percent: 10 }] };
    const b = { ...second, taxes: [{ name: 'VAT', percent: 20 }], pricesStated: 'withTax' } as const;
    const year = composed([supply(a), supply(b, '07-01')]);
    const { taxes, taxesInside, byTax } = bill(year, steadyUse(berlin));
    expect(taxes).toBeCloseTo(4343 * 0.03, DIGITS);
    expect(taxesInside).toBeCloseTo((4417 * 0.2 * 0.2) / 1.2, DIGITS);
    expect(byTax.VAT).toBeCloseTo(taxes + taxesInside, DIGITS);
    expect(year.marginalPrice[0]).toBeCloseTo(0.33, DIGITS);
    expect(year.marginalPrice[8759]).toBe(0.2);
  });

  test('may fall within a step, which then belongs to both', () => {
    // Kolkata with weather in UTC+5: civil midnight is at half past.
    const clock = clockOf('Asia/Kolkata', 300);
    const year = composed([supply(first), supply(second, '07-01')], clock);
    const step = stepAt(clock, '2025-06-30T23:30+05:30');
    expect(year.price[step]).toBeCloseTo(0.25, DIGITS);
    const use = steadyUse(clock, 0);
    use[step] = 4;
    const { energy, monthly } = bill(year, use);
    expect(energy).toBeCloseTo(1, DIGITS);
    expect([monthly[5].kWh, monthly[6].kWh]).toEqual([2, 2]);
  });

  test('needs a price only for each supplier’s own days', () => {
    // Nor is it a fault that a rate of the days before never applies.
    const summer = ratesOf(
      { name: 'spring', price: 0.2, dates: { from: '03-01', to: '05-31' } },
      { name: 'summer', price: 0.1, months: [7, 8, 9, 10, 11, 12] },
    );
    expect(composeYear([supply(first), supply(summer, '07-01')], berlin).problems).toEqual([]);
    expect(codes(composeYear([supply(first), supply(summer, '06-30')], berlin).problems)).toBe('tariff.unpriced');
  });
});

describe('what is wrong with a change of supplier', () => {
  const text = (supplies: Supply[]) =>
    composeYear(supplies, berlin).problems.map((problem) => problemText(problem).split('\n')[0].trim());

  test('dates out of order', () => {
    expect(text([supply(first), supply(second, '07-01'), supply(first, '07-01')])).toEqual([
      'supplies[2].from is 07-01; allowed is a date after that of the supplier before',
    ]);
    expect(text([supply(first), supply(second, '01-01')])).toHaveLength(1);
  });

  test('a date for the first supplier, none for the next, one that does not exist, one of another year', () => {
    expect(text([supply(first, '02-01'), supply(second)])).toEqual([
      'supplies[0].from is 02-01; allowed is nothing for the first supplier',
      'supplies[1].from is left out, a date that does not exist',
    ]);
    expect(text([supply(first), supply(second, '02-30')])).toEqual([
      'supplies[1].from is 02-30, a date that does not exist',
    ]);
    expect(text([supply(first), supply(second, '2024-07-01')])).toEqual([
      'supplies[1].from is 2024-07-01; allowed is a date of the calendar year 2025',
    ]);
  });

  test('two currencies', () => {
    const pounds = { ...second, currency: 'GBP' };
    expect(text([supply({ ...first, currency: 'EUR' }), supply(pounds, '07-01')])).toEqual([
      'B.yaml  the currency is GBP, that of the supplier before is EUR',
    ]);
  });

  test('more suppliers than a byte can tell the rates of', () => {
    const many = ['02-01', '03-01', '04-01', '05-01', '06-01'].map((from) => supply(second, from));
    expect(text([supply(first), ...many])).toEqual(['supplies is 6 suppliers; allowed is at most 5 a year']);
  });
});
