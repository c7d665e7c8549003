import { DateTime } from 'luxon';
import { describe, expect, test } from 'vitest';
import type { Problem } from '../../../src/core/problem.ts';
import { problemText } from '../../../src/core/problemText.ts';
import { bill } from '../../../src/tariffs/bill.ts';
import { prepareTariff } from '../../../src/tariffs/prepareTariff.ts';
import { readPriceSeries } from '../../../src/tariffs/readPriceSeries.ts';
import type { PriceSeries, PriceSeriesSettings } from '../../../src/tariffs/tariff.ts';
import { clockOf, meanByMinutes, prepared, steadyUse, stepAt, tariffOf } from './sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const settings: PriceSeriesSettings = { file: 'prices.csv', unit: 'perKWh', stamps: 'withOffset' };

/** Everything but the cure of each problem, the file's name left out. */
function said(problems: readonly Problem[]): string[] {
  return problems.map((problem) => problemText(problem).split('\n')[0].replace('prices.csv:', ''));
}

/** A series that begins at an instant, price by number. */
function seriesOf(fromIso: string, stepMinutes: number, count: number, price: (k: number) => number): PriceSeries {
  const startMinute = DateTime.fromISO(fromIso).toMillis() / 60_000;
  return {
    file: 'prices.csv',
    startMinute,
    stepMinutes,
    prices: Float64Array.from({ length: count }, (_, k) => price(k)),
  };
}

describe('a price series prices each step by its minutes', () => {
  const all = tariffOf({ series: settings });

  test('quarter hours are averaged', () => {
    // Prices 0, 1, 2, 3 in the quarters of each hour: mean 1.5.
    const series = seriesOf('2025-01-01T00:00+01:00', 15, 4 * 8760, (k) => k % 4);
    const tariff = prepared(all, berlin, series);
    expect(tariff.price.every((price) => price === 1.5)).toBe(true);
    expect(tariff.rateNames).toEqual(['series']);
  });

  test('hourly prices of a half-hour zone meet hourly weather at half past', () => {
    // Prices from midnight in Kolkata (UTC+5:30), weather in UTC+5: a step holds the second half of one price and the
    // first of the next.
    const kolkata = clockOf('Asia/Kolkata', 300);
    const series = seriesOf('2025-01-01T00:00+05:30', 60, 8760, (k) => k);
    const tariff = prepared(all, kolkata, series);
    expect(tariff.price[0]).toBe(0.5);
    expect(tariff.price[100]).toBe(100.5);
    // The last step's second half lies in the next year: the first price again.
    expect(tariff.price[8759]).toBe(8759 / 2);
  });

  test.each([
    [24, 0],
    [25, 1],
  ])('a day of them is the difference of two offsets, and more is another year: %d hours', (late, warnings) => {
    const begin = `2025-01-0${1 + Math.floor(late / 24)}T0${late % 24}:00+01:00`;
    const series = seriesOf(begin, 60, 8760, (k) => k);
    const { problems } = prepareTariff({ tariff: all, file: 't.yaml', series }, berlin);
    expect(said(problems)).toHaveLength(warnings);
    expect(said(problems).join()).toMatch(warnings === 0 ? /^$/ : /warning: for 25 hours the price of a year before/);
  });

  test('instants outside the series are looked up a year later or earlier', () => {
    // Weather in UTC begins an hour after the civil year of Berlin.
    const utc = clockOf('Europe/Berlin', 0);
    const series = seriesOf('2025-01-01T00:00+01:00', 60, 8760, (k) => k);
    const result = prepareTariff({ tariff: all, file: 't.yaml', series }, utc);
    expect(result.problems).toEqual([]);
    expect([0, 8758, 8759].map((i) => result.prepared?.price[i])).toEqual([1, 8759, 0]);
    const newYork = clockOf('America/New_York', -300);
    expect([0, 8754, 8755].map((i) => prepared(all, newYork, series).price[i])).toEqual([6, 0, 1]);
    // In Auckland the year begins 11 hours before that of Berlin: those are the series' last 11.
    const auckland = clockOf('Pacific/Auckland', 720);
    expect([0, 10, 11].map((i) => prepared(all, auckland, series).price[i])).toEqual([8749, 8759, 0]);
  });

  test('also in a leap year whose 29 February is skipped: a civil year then has 8784 hours', () => {
    const utc = clockOf('Europe/Berlin', 0, 2024);
    const series = seriesOf('2024-01-01T00:00+01:00', 60, 8784, (k) => k);
    // 31 December 23:00 UTC is 1 January 00:00: price 0. 1 March 00:00 UTC is price 60 · 24 + 1.
    expect([0, 1416, 8759].map((i) => prepared(all, utc, series).price[i])).toEqual([1, 1441, 0]);
  });

  test('a series of another year is used with a warning', () => {
    const series = seriesOf('2024-01-01T00:00+01:00', 60, 8784, () => 0.1);
    const { problems, prepared: made } = prepareTariff({ tariff: all, file: 't.yaml', series }, berlin);
    expect(made).toBeDefined();
    expect(said(problems)).toEqual([
      'prices.csv  warning: for 8760 hours the price of a year before or after was taken; the series holds 2023-12-31T23:00Z to 2024-12-31T23:00Z',
    ]);
  });

  test('a series that is too short is an error that names the first stamp it lacks', () => {
    const series = seriesOf('2025-01-01T00:00+01:00', 60, 8000, () => 0.1);
    const { problems, prepared: made } = prepareTariff({ tariff: all, file: 't.yaml', series }, berlin);
    expect(made).toBeUndefined();
    // 8000 hours after 31 December 23:00 UTC are 333 days and 8 hours: 30 November 07:00 UTC.
    expect(said(problems)).toEqual(['prices.csv  the price series does not reach 2025-11-30T07:00Z']);
  });

  test('a series that begins late and ends with the year lacks the months before it', () => {
    const series = seriesOf('2025-03-01T00:00+01:00', 60, 306 * 24, () => 0.3);
    const { prepared: made, problems } = prepareTariff({ tariff: all, file: 't.yaml', series }, berlin);
    expect(made).toBeUndefined();
    expect(said(problems).join()).toMatch(/2024-12-31T23:00/);
  });

  test('rates and series add, and the cost by rate holds the series of its minutes', () => {
    // Night 0.20 + series 0.1 at even hours of UTC, 0 at odd ones. 1 kWh in one step at 22:00 UTC+1 = 21:00 UTC.
    const rates = [
      { name: 'night', price: 0.2, from: '22:30', to: '06:00' },
      { name: 'day', price: 0.3 },
    ];
    const series = seriesOf('2025-01-01T00:00+01:00', 30, 2 * 8760, (k) => k % 2);
    const tariff = prepared(tariffOf({ rates, series: settings }), berlin, series);
    // 22:00–22:30 day 0.3 + 0; 22:30–23:00 night 0.2 + 1.
    const use = steadyUse(berlin, 0);
    use[22] = 2;
    const { byRate, energy } = bill(tariff, use);
    expect(byRate.day.cost).toBeCloseTo(0.3, 12);
    expect(byRate.night.cost).toBeCloseTo(1.2, 12);
    expect(energy).toBeCloseTo(1.5, 12);
    expect(tariff.price[22]).toBeCloseTo(0.75, 12);
  });

  test.each([
    ['Australia/Lord_Howe', 600, 20],
    ['Asia/Kathmandu', 330, 60],
    ['Europe/Berlin', 60, 45],
  ])('as if each minute were looked up: %s, weather at %i, steps of %i minutes', (zone, offset, stepMinutes) => {
    const clock = clockOf(zone, offset);
    const first = clock.startMillis[0] / 60_000 - 600;
    const count = Math.ceil((8760 * 60 + 1200) / stepMinutes);
    const prices = Float64Array.from({ length: count }, (_, k) => Math.sin(k));
    const tariff = prepared(all, clock, { file: 'p', startMinute: first, stepMinutes, prices });
    for (const step of [0, 1, 777, 6000, 8759]) {
      const mean = meanByMinutes(clock, step, (t) => prices[Math.floor((t.toMillis() / 60_000 - first) / stepMinutes)]);
      expect(tariff.price[step]).toBeCloseTo(mean, 12);
    }
  });

  test('a price file of a whole local year fits weather of the zone’s winter time', () => {
    // Every civil hour of 2025 in Berlin as luxon counts them, the price its number; instants must come out in order.
    let t = DateTime.fromISO('2025-01-01T00:00', { zone: 'Europe/Berlin' });
    const rows: string[] = [];
    while (t.year === 2025) {
      rows.push(`${t.toFormat("yyyy-MM-dd'T'HH:mm")};${rows.length}`);
      t = t.plus({ hours: 1 });
    }
    const { series, problems } = readPriceSeries({
      ...{ text: rows.join('\n'), file: 'prices.csv', zone: 'Europe/Berlin' },
      settings: { ...settings, stamps: 'local' },
    });
    expect(said(problems)).toEqual([]);
    const tariff = prepared(all, berlin, series);
    expect(tariff.price.every((price, i) => price === i)).toBe(true);
    expect(stepAt(berlin, '2025-12-31T23:00+01:00')).toBe(8759);
  });
});
