import { describe, expect, test } from 'vitest';
import { bill } from '../../../src/tariffs/bill.ts';
import { blocksCost } from '../../../src/tariffs/blockPrices.ts';
import { clockOf, nightAndDay, prepared, ratesOf, steadyUse, stepAt, tariffOf } from './sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const flat = { rates: [{ name: 'flat', price: 0.3 }] };

// Sums over 8760 hours of about 1 kWh: rounding is some 1e-11 relative to a thousand, so 9 decimals.
const DIGITS = 9;

describe('energy', () => {
  test('of 8760 kWh at a flat 0.30 costs 2628', () => {
    const result = bill(prepared(tariffOf(flat), berlin), steadyUse(berlin));
    expect(result.energy).toBeCloseTo(2628, DIGITS);
    expect(result.total).toBeCloseTo(2628, DIGITS);
    expect(result.kWh).toBeCloseTo(8760, DIGITS);
  });

  test('is split by rate', () => {
    // 365 · 8 h at 0.20 = 584; 365 · 16 h at 0.30 = 1752.
    const { byRate, energy } = bill(prepared(nightAndDay, berlin), steadyUse(berlin));
    expect(byRate.night).toMatchObject({ kWh: 2920, hours: 2920 });
    expect(byRate.night.cost).toBeCloseTo(584, DIGITS);
    expect(byRate.day.cost).toBeCloseTo(1752, DIGITS);
    expect(energy).toBeCloseTo(2336, DIGITS);
  });

  test('is split by rate and month', () => {
    // February: 28 · 8 h at 0.20 = 44.8 in the night, 28 · 16 h at 0.30 = 134.4 by day.
    const { ofRateAndMonth, byRate } = bill(prepared(nightAndDay, berlin), steadyUse(berlin));
    const [night, day] = ['night', 'day'].map((rate) => 12 * Object.keys(byRate).indexOf(rate) + 1);
    expect(ofRateAndMonth.kWh[night!]).toBeCloseTo(224, DIGITS);
    expect(ofRateAndMonth.cost[night!]).toBeCloseTo(44.8, DIGITS);
    expect(ofRateAndMonth.cost[day!]).toBeCloseTo(134.4, DIGITS);
    expect(ofRateAndMonth.cost.reduce((sum, cost) => sum + cost, 0)).toBeCloseTo(2336, DIGITS);
  });

  test('of a step with two rates is split by minutes', () => {
    // One step of 6 kWh from 06:00 to 07:00, a third of it at 0.10.
    const tariff = ratesOf({ name: 'short', price: 0.1, from: '06:40', to: '07:00' }, { name: 'rest', price: 0.4 });
    const use = steadyUse(berlin, 0);
    use[6] = 6;
    const { byRate, energy } = bill(prepared(tariff, berlin), use);
    expect(byRate.short.kWh).toBeCloseTo(2, DIGITS);
    expect(byRate.short.cost).toBeCloseTo(0.2, DIGITS);
    expect(byRate.rest.cost).toBeCloseTo(1.6, DIGITS);
    expect(energy).toBeCloseTo(1.8, DIGITS);
  });

  test('is summed by civil month', () => {
    // March in Berlin has 31 · 24 − 1 hours, October one more than 31 · 24.
    const { monthly } = bill(prepared(tariffOf(flat), berlin), steadyUse(berlin));
    expect(monthly.map((month) => Math.round(month.kWh))).toEqual([
      744, 672, 743, 720, 744, 720, 744, 744, 720, 745, 720, 744,
    ]);
  });

  test('of the hours that the zone leaves in the neighbouring year belongs to that year’s month of this one', () => {
    const newYork = clockOf('America/New_York', 0);
    const use = steadyUse(newYork, 0);
    use[0] = 5;
    const { monthly } = bill(prepared(tariffOf(flat), newYork), use);
    expect(monthly[11].energy).toBeCloseTo(1.5, DIGITS);
    expect(monthly[0].energy).toBe(0);
  });

  test('may have a negative price', () => {
    const { energy, total } = bill(prepared(ratesOf({ name: 'paid', price: -0.01 }), berlin), steadyUse(berlin));
    expect(energy).toBeCloseTo(-87.6, DIGITS);
    expect(total).toBeCloseTo(-87.6, DIGITS);
  });

  test('keeps rates with odd names', () => {
    const tariff = ratesOf({ name: '__proto__', price: 0.2, from: '00:00', to: '12:00' }, { name: '2', price: 0.3 });
    const { byRate } = bill(prepared(tariff, berlin), steadyUse(berlin));
    expect(Object.keys(byRate).sort()).toEqual(['2', '__proto__']);
  });
});

describe('standing charges', () => {
  test('per day, month and year add up', () => {
    // 0.5 · 365 + 10 · 12 + 24 = 182.5 + 120 + 24 = 326.5
    const tariff = tariffOf({ ...flat, standing: { perDay: 0.5, perMonth: 10, perYear: 24 } });
    const result = bill(prepared(tariff, berlin), steadyUse(berlin, 0));
    expect(result.standing).toBeCloseTo(326.5, DIGITS);
    // January: 0.5 · 31 + 10 + 24 · 31/365.
    expect(result.monthly[0].standing).toBeCloseTo(15.5 + 10 + (24 * 31) / 365, DIGITS);
  });

  test('per day count 366 days in 8784 hours and 365 where 29 February is skipped', () => {
    const tariff = tariffOf({ ...flat, standing: { perDay: 1 } });
    const leap = clockOf('Europe/Berlin', 60, 2024, 8784);
    const skipped = clockOf('Europe/Berlin', 60, 2024);
    expect(bill(prepared(tariff, leap), steadyUse(leap)).standing).toBeCloseTo(366, DIGITS);
    expect(bill(prepared(tariff, skipped), steadyUse(skipped)).standing).toBeCloseTo(365, DIGITS);
    expect(bill(prepared(tariff, skipped), steadyUse(skipped)).monthly[1].standing).toBeCloseTo(28, DIGITS);
  });
});

describe('blocks', () => {
  const prices = [{ upTo: 100, price: 0.3 }, { upTo: 300, price: 0.2 }, { price: 0.1 }];

  test.each([
    [0, 0],
    [50, 15],
    [100, 30],
    [150, 40],
    [300, 70],
    [500, 90],
  ])('price %i kWh at %f', (kWh, cost) => {
    // 100 · 0.30 + 200 · 0.20 + 200 · 0.10 = 90
    expect(blocksCost(prices, kWh)).toBeCloseTo(cost, DIGITS);
  });

  test('alone are the price, by civil month', () => {
    // April: 720 kWh: 30 + 40 + 42 = 112. March, 743 kWh: 114.3.
    const tariff = tariffOf({ blocks: { per: 'month', prices } });
    const ready = prepared(tariff, berlin);
    const result = bill(ready, steadyUse(berlin));
    expect(result.monthly[3].energy).toBeCloseTo(112, DIGITS);
    expect(result.monthly[2].energy).toBeCloseTo(114.3, DIGITS);
    expect(result.byRate.blocks.cost).toBeCloseTo(result.energy, DIGITS);
    expect(ready.pricedByBlocksAlone).toBe(true);
    expect(ready.marginalPrice.every((price) => price === 0)).toBe(true);
  });

  test('per quarter fill in the order of the months', () => {
    // 0.1 kWh an hour: January 74.4 kWh at 0.30 = 22.32; February 67.2: 25.6 at 0.30 + 41.6 at 0.20 = 16.00.
    const tariff = tariffOf({ blocks: { per: 'quarter', prices } });
    const { monthly } = bill(prepared(tariff, berlin), steadyUse(berlin, 0.1));
    expect(monthly[0].energy).toBeCloseTo(22.32, DIGITS);
    expect(monthly[1].energy).toBeCloseTo(16, DIGITS);
    // April begins anew: 72 · 0.30.
    expect(monthly[3].energy).toBeCloseTo(21.6, DIGITS);
  });

  test('per year see the whole year', () => {
    // 8760 kWh: 30 + 40 + 8460 · 0.10 = 916
    const tariff = tariffOf({ blocks: { per: 'year', prices } });
    expect(bill(prepared(tariff, berlin), steadyUse(berlin)).energy).toBeCloseTo(916, DIGITS);
  });

  test('add to the rates, their cost shared among these by kWh', () => {
    // Rates 2336 as above, blocks 916; in each month night has a third of the kWh but for the clock changes: by month
    // cost · night/all. April to June and so on are exact thirds; checked on June: 112 in blocks.
    const tariff = tariffOf({ rates: nightAndDay.rates, blocks: { per: 'year', prices } });
    const result = bill(prepared(tariff, berlin), steadyUse(berlin));
    expect(result.energy).toBeCloseTo(2336 + 916, DIGITS);
    expect(result.byRate.night.cost + result.byRate.day.cost).toBeCloseTo(result.energy, DIGITS);
    const use = steadyUse(berlin, 0);
    use.fill(1, stepAt(berlin, '2025-06-01T00:00+02:00'), stepAt(berlin, '2025-07-01T00:00+02:00'));
    const june = bill(prepared({ ...tariff, blocks: { per: 'month', prices } }, berlin), use);
    expect(june.byRate.night.cost).toBeCloseTo(240 * 0.2 + 112 / 3, DIGITS);
  });
});

describe('the demand charge', () => {
  test('is on the highest hour of each civil month', () => {
    // 1 kW all year, 5 kW in one hour that is 1 July 00:00 in civil time but 30 June in the weather's: 11 · 1 + 5 = 16 kW.
    const use = steadyUse(berlin);
    use[stepAt(berlin, '2025-07-01T00:00+02:00')] = 5;
    const result = bill(prepared(tariffOf({ ...flat, demand: { perKW: 2 } }), berlin), use);
    expect(result.demand).toBeCloseTo(32, DIGITS);
    expect(result.monthly.map((month) => month.demand)).toEqual([2, 2, 2, 2, 2, 2, 10, 2, 2, 2, 2, 2]);
  });

  test('sees the hours that the zone leaves in the next year', () => {
    const utc = clockOf('Europe/Berlin', 0);
    const use = steadyUse(utc);
    use[8759] = 7;
    const { monthly } = bill(prepared(tariffOf({ ...flat, demand: { perKW: 1 } }), utc), use);
    expect([monthly[0].demand, monthly[11].demand]).toEqual([7, 1]);
  });
});

describe('taxes and credits', () => {
  const taxes = [
    { name: 'VAT', percent: 20 },
    { name: 'levy', percent: 5 },
  ];
  const full = { ...flat, standing: { perYear: 100 }, demand: { perKW: 1 }, taxes };

  test('taxes add up, on energy, standing and demand', () => {
    // (2628 + 100 + 12) · 25 % = 685
    const result = bill(prepared(tariffOf(full), berlin), steadyUse(berlin));
    expect(result.taxes).toBeCloseTo(685, DIGITS);
    expect(result.total).toBeCloseTo(3425, DIGITS);
    expect(result.byTax.VAT).toBeCloseTo(548, DIGITS);
    expect(result.byTax.levy).toBeCloseTo(137, DIGITS);
    expect(result.taxesInside).toBe(0);
  });

  test('taxes inside the prices are shown and change nothing', () => {
    // 2740 holds 2740 · 0.25/1.25 = 548 of tax: 438.40 VAT, 109.60 levy.
    const result = bill(prepared(tariffOf({ ...full, pricesStated: 'withTax' }), berlin), steadyUse(berlin));
    expect(result.total).toBeCloseTo(2740, DIGITS);
    expect([result.taxes, result.taxesInside]).toEqual([0, expect.closeTo(548, DIGITS)]);
    expect(result.byTax.VAT).toBeCloseTo(438.4, DIGITS);
  });

  test('credits are taken off after tax and may exceed the bill', () => {
    const credits = [
      { name: 'rebate', amount: 3000 },
      { name: 'bonus', amount: 1000 },
    ];
    const result = bill(prepared(tariffOf({ ...full, credits }), berlin), steadyUse(berlin));
    expect(result.credits).toBeCloseTo(4000, DIGITS);
    expect(result.total).toBeCloseTo(3425 - 4000, DIGITS);
    expect(result.monthly[1].credits).toBeCloseTo((4000 * 28) / 365, DIGITS);
  });

  test('the marginal price holds taxes on top, and not those inside', () => {
    const onTop = prepared(tariffOf({ rates: nightAndDay.rates, taxes }), berlin);
    expect(onTop.marginalPrice[0]).toBeCloseTo(0.25, DIGITS);
    expect(onTop.marginalPrice[12]).toBeCloseTo(0.375, DIGITS);
    const inside = prepared(tariffOf({ rates: nightAndDay.rates, taxes, pricesStated: 'withTax' }), berlin);
    expect(inside.marginalPrice[12]).toBe(0.3);
  });

  test('the marginal price of a step with two rates is their mean with tax', () => {
    const rates = [
      { name: 'half', price: 0.1, from: '06:30', to: '07:00' },
      { name: 'rest', price: 0.3 },
    ];
    expect(prepared(tariffOf({ rates, taxes }), berlin).marginalPrice[6]).toBeCloseTo(0.25, DIGITS);
  });
});
