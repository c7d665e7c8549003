import type { DateTime } from 'luxon';
import { describe, expect, test } from 'vitest';
import type { CivilClock } from '../../../src/tariffs/civilClock.ts';
import type { PreparedTariff } from '../../../src/tariffs/preparedTariff.ts';
import type { Rate } from '../../../src/tariffs/tariff.ts';
import { clockOf, meanByMinutes, nightAndDay, prepared, ratesOf, stepAt, tariffOf } from './sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);

/** Sum of the prices of the steps whose civil date is this one. */
function priceOfDay(tariff: PreparedTariff, month: number, dayOfMonth: number): number {
  const { clock, price } = tariff;
  return price.reduce(
    (sum, p, i) => (clock.month[i] === month && clock.dayOfMonth[i] === dayOfMonth ? sum + p : sum),
    0,
  );
}

/** Price at the step that begins at an instant. */
function priceAt(tariff: PreparedTariff, iso: string): number {
  return tariff.price[stepAt(tariff.clock, iso)];
}

// Sums of at most 25 prices of one decimal or two: rounding stays far below 1e-12.
const DIGITS = 12;

test('a tariff laid on the year keeps its name and currency', () => {
  const { name, currency } = prepared(
    { ...ratesOf({ name: 'all', price: 0.3 }), name: 'Own', currency: 'EUR' },
    berlin,
  );
  expect([name, currency]).toEqual(['Own', 'EUR']);
});

describe('a night rate across midnight', () => {
  const tariff = prepared(nightAndDay, berlin);

  test('prices a plain day of 1 kW at 8 · 0.20 + 16 · 0.30 = 6.40', () => {
    expect(priceOfDay(tariff, 6, 11)).toBeCloseTo(6.4, DIGITS);
  });

  test('prices the day of 23 hours at 7 · 0.20 + 16 · 0.30 = 6.20: the missing hour is a night hour', () => {
    expect(priceOfDay(tariff, 3, 30)).toBeCloseTo(6.2, DIGITS);
  });

  test('prices the day of 25 hours at 9 · 0.20 + 16 · 0.30 = 6.60: the doubled hour is a night hour', () => {
    expect(priceOfDay(tariff, 10, 26)).toBeCloseTo(6.6, DIGITS);
  });

  test('keeps its civil hours when the weather has another offset than the zone', () => {
    // The same instants as in weather of the zone's winter time, one step later in the column.
    const other = prepared(nightAndDay, clockOf('Europe/Berlin', 0));
    expect(Array.from(other.price.subarray(0, 8759))).toEqual(Array.from(tariff.price.subarray(1)));
    // 31 December 23:00 UTC is 1 January 00:00 civil time: a night hour.
    expect(other.price[8759]).toBe(0.2);
  });

  test('names the rate of each step and counts its hours', () => {
    expect(tariff.rateNames).toEqual(['night', 'day']);
    expect([21, 22, 5, 6].map((hour) => tariff.rateOfStep[hour])).toEqual([1, 0, 0, 1]);
    // 365 days of 8 night hours; the missing and the doubled hour cancel.
    expect(Array.from(tariff.hoursOfRate)).toEqual([365 * 8, 365 * 16]);
  });
});

describe('other clocks, night from 22:00 to 06:00 at 0.20, day at 0.30', () => {
  // Dates as in the clock's tests; the day of 23 hours lacks one night hour, that of 25 hours has one more. On Lord Howe
  // the change is half an hour: 6.40 − 0.5 · 0.20 and 6.40 + 0.5 · 0.20.
  test.each([
    ['America/New_York', -300, [3, 9], 6.2, [11, 2], 6.6],
    ['Pacific/Auckland', 720, [9, 28], 6.2, [4, 6], 6.6],
    ['America/St_Johns', -210, [3, 9], 6.2, [11, 2], 6.6],
  ] as const)('%s', (zone, offset, [m1, d1], short, [m2, d2], long) => {
    const tariff = prepared(nightAndDay, clockOf(zone, offset));
    expect(priceOfDay(tariff, m1, d1)).toBeCloseTo(short, DIGITS);
    expect(priceOfDay(tariff, m2, d2)).toBeCloseTo(long, DIGITS);
  });

  test('Asia/Kolkata has 365 equal days', () => {
    const tariff = prepared(nightAndDay, clockOf('Asia/Kolkata', 330));
    const days = Array.from({ length: 365 }, (_, d) => tariff.price.slice(24 * d, 24 * d + 24).reduce((a, b) => a + b));
    for (const day of days) expect(day).toBeCloseTo(6.4, DIGITS);
  });

  test('Lord Howe in its own standard time: in summer a step begins at half past', () => {
    // Summer time is half an hour ahead: the step from 21:30 to 22:30 is half day, half night; so is 05:30 to 06:30.
    const tariff = prepared(nightAndDay, clockOf('Australia/Lord_Howe', 630));
    expect(priceAt(tariff, '2025-01-15T21:30+11:00')).toBeCloseTo(0.25, DIGITS);
    expect(priceAt(tariff, '2025-01-15T22:30+11:00')).toBe(0.2);
    expect(priceAt(tariff, '2025-07-15T22:00+10:30')).toBe(0.2);
    // 5 October, 02:00 to 02:30 missing: the 24 steps from midnight on end at 00:30 of the next day.
    expect(tariff.hoursOfRate[0]).toBeCloseTo(365 * 8, 9);
  });

  test('a step that holds the clock change is priced minute by minute', () => {
    // Lord Howe, weather in UTC+10. On 5 October 2025 civil time runs 01:30–02:00, then 02:30–03:00 in one step. A rate of
    // 1 from 02:00 to 02:45 holds 15 of its minutes, 02:30 to 02:45: price 0.25.
    const clock = clockOf('Australia/Lord_Howe', 600);
    const tariff = prepared(
      ratesOf({ name: 'change', price: 1, from: '02:00', to: '02:45' }, { name: 'rest', price: 0 }),
      clock,
    );
    expect(priceAt(tariff, '2025-10-04T15:00Z')).toBeCloseTo(0.25, DIGITS);
    // The day before it holds 02:00 to 02:30 of the step from 01:30, and 02:30 to 02:45 of the next.
    expect(priceAt(tariff, '2025-10-03T15:00Z')).toBeCloseTo(0.5, DIGITS);
    expect(priceAt(tariff, '2025-10-03T16:00Z')).toBeCloseTo(0.25, DIGITS);
  });
});

describe('weekdays, months and seasons', () => {
  const rest: Rate = { name: 'rest', price: 0 };

  test('a Friday night rate ends at Friday 24:00 and holds Friday from 00:00 to 06:00', () => {
    const tariff = prepared(
      ratesOf({ name: 'friday', price: 1, from: '22:00', to: '06:00', weekdays: ['fri'] }, rest),
      berlin,
    );
    // 13 June 2025 was a Friday.
    expect(priceAt(tariff, '2025-06-12T23:00+02:00')).toBe(0);
    expect(priceAt(tariff, '2025-06-13T00:00+02:00')).toBe(1);
    expect(priceAt(tariff, '2025-06-13T06:00+02:00')).toBe(0);
    expect(priceAt(tariff, '2025-06-13T23:00+02:00')).toBe(1);
    expect(priceAt(tariff, '2025-06-14T00:00+02:00')).toBe(0);
    expect(tariff.hoursOfRate[0]).toBe(52 * 8);
  });

  test('months are civil months', () => {
    const tariff = prepared(ratesOf({ name: 'july', price: 1, months: [7] }, rest), berlin);
    // July begins at 30 June 23:00 of the weather's winter time.
    expect(priceAt(tariff, '2025-06-30T22:00+01:00')).toBe(0);
    expect(priceAt(tariff, '2025-06-30T23:00+01:00')).toBe(1);
    expect(tariff.hoursOfRate[0]).toBe(31 * 24);
  });

  test('a season includes both its days and may run across the new year', () => {
    const tariff = prepared(ratesOf({ name: 'winter', price: 1, dates: { from: '11-15', to: '02-10' } }, rest), berlin);
    expect(priceAt(tariff, '2025-02-10T23:00+01:00')).toBe(1);
    expect(priceAt(tariff, '2025-02-11T00:00+01:00')).toBe(0);
    expect(priceAt(tariff, '2025-11-14T23:00+01:00')).toBe(0);
    expect(priceAt(tariff, '2025-11-15T00:00+01:00')).toBe(1);
    expect(tariff.hoursOfRate[0]).toBe((16 + 31 + 31 + 10) * 24);
  });

  test('a season within the year holds from its first day to its last', () => {
    const tariff = prepared(ratesOf({ name: 'summer', price: 1, dates: { from: '06-01', to: '06-30' } }, rest), berlin);
    expect(tariff.hoursOfRate[0]).toBe(30 * 24);
  });

  test('the first rate that matches wins', () => {
    const tariff = prepared(
      ratesOf(
        { name: 'noon', price: 2, from: '12:00', to: '13:00' },
        { name: 'light', price: 1, from: '06:00', to: '18:00' },
        rest,
      ),
      berlin,
    );
    expect([11, 12, 13, 18].map((hour) => tariff.price[hour])).toEqual([1, 2, 1, 0]);
  });

  test('a rate that ends at 00:00 or at 24:00 ends at midnight', () => {
    for (const to of ['00:00', '24:00']) {
      const tariff = prepared(ratesOf({ name: 'late', price: 1, from: '21:00', to }, rest), berlin);
      expect([20, 21, 23, 24].map((hour) => tariff.price[hour])).toEqual([0, 1, 1, 0]);
    }
  });

  test('rules of one name are one rate', () => {
    const tariff = prepared(
      ratesOf({ name: 'high', price: 2, from: '07:00', to: '09:00' }, rest, { name: 'high', price: 3 }),
      berlin,
    );
    expect(tariff.rateNames).toEqual(['high', 'rest']);
  });
});

describe('holidays', () => {
  const holidays = ['2025-12-25', '05-01'];
  // 25 December and 1 May 2025 were Thursdays.
  const workday = { name: 'work', price: 1, weekdays: ['mon', 'tue', 'wed', 'thu', 'fri'] } as const;
  const [christmas, may, plain] = ['2025-12-25T12:00+01:00', '2025-05-01T12:00+02:00', '2025-12-18T12:00+01:00'];

  test.each([
    ['never', [0, 0, 1]],
    ['only', [1, 1, 0]],
    [undefined, [1, 1, 1]],
  ] as const)('%s', (kind, expected) => {
    const rates = [
      { ...workday, holidays: kind },
      { name: 'rest', price: 0 },
    ];
    const tariff = prepared(tariffOf({ rates, holidays }), berlin);
    expect([christmas, may, plain].map((iso) => priceAt(tariff, iso))).toEqual(expected);
  });

  test('also: a weekend rate holds on them', () => {
    const rates = [
      { name: 'weekend', price: 1, weekdays: ['sat', 'sun'], holidays: 'also' } as const,
      { name: 'rest', price: 0 },
    ];
    const tariff = prepared(tariffOf({ rates, holidays }), berlin);
    expect([christmas, may, plain].map((iso) => priceAt(tariff, iso))).toEqual([1, 1, 0]);
    expect(priceAt(tariff, '2025-12-20T12:00+01:00')).toBe(1);
  });

  test('are those of the minute: one ends at midnight', () => {
    const rates = [
      { name: 'holiday', price: 1, from: '22:00', to: '06:00', holidays: 'only' } as const,
      { name: 'rest', price: 0 },
    ];
    const tariff = prepared(tariffOf({ rates, holidays }), berlin);
    expect(priceAt(tariff, '2025-12-25T23:00+01:00')).toBe(1);
    expect(priceAt(tariff, '2025-12-26T00:00+01:00')).toBe(0);
  });

  // Weather in UTC: its first 5 hours are 31 December 2024 in New York, its last 9 are 1 January 2026 in Tokyo.
  test.each([
    ['America/New_York', { ofYear: '2025-12-31', ofNeighbour: '2024-12-31', ofEveryYear: '12-31' }, [0, 5]],
    ['Asia/Tokyo', { ofYear: '2025-01-01', ofNeighbour: '2026-01-01', ofEveryYear: '01-01' }, [8751, 8760]],
  ] as const)('with a year are of that very year, in %s too', (zone, days, [from, to]) => {
    const rates = [{ name: 'holiday', price: 1, holidays: 'only' } as const, { name: 'rest', price: 0 }];
    const clock = clockOf(zone, 0);
    const hoursOf = (...listed: string[]) => {
      const { price, hoursOfRate } = prepared(tariffOf({ rates, holidays: listed }), clock);
      return { beyond: price.slice(from, to).reduce((sum, p) => sum + p, 0), year: hoursOfRate[0] };
    };
    // Of the holiday of the calendar year itself the series holds what the zone has not carried out of it.
    const beyond = to - from;
    const within = zone === 'Asia/Tokyo' ? 24 - 9 : 24 - 5;
    expect(hoursOf(days.ofYear)).toEqual({ beyond: 0, year: within });
    expect(hoursOf(days.ofNeighbour)).toEqual({ beyond, year: beyond });
    expect(hoursOf(days.ofEveryYear)).toEqual({ beyond, year: 24 });
    expect(hoursOf(days.ofYear, days.ofNeighbour)).toEqual({ beyond, year: 24 });
  });

  test('on 29 February do no harm in a common year', () => {
    const rates = [{ name: 'holiday', price: 1, holidays: 'only' } as const, { name: 'rest', price: 0 }];
    const tariff = prepared(tariffOf({ rates, holidays: ['02-29', '05-01'] }), berlin);
    expect(tariff.hoursOfRate[0]).toBe(24);
  });
});

describe('a step that holds minutes of two rates', () => {
  test('costs the mean over its minutes', () => {
    // 06:40 to 07:00 at 0.10, the other 40 minutes at 0.40: (20 · 0.10 + 40 · 0.40)/60 = 0.30.
    const tariff = prepared(
      ratesOf({ name: 'short', price: 0.1, from: '06:40', to: '07:00' }, { name: 'rest', price: 0.4 }),
      berlin,
    );
    expect(tariff.price[6]).toBeCloseTo(0.3, DIGITS);
    expect(tariff.rateOfStep[6]).toBe(1);
    expect(tariff.hoursOfRate[0]).toBeCloseTo(365 / 3, 9);
  });

  test.each([
    ['Europe/Berlin', 60],
    ['Australia/Lord_Howe', 600],
    ['America/St_Johns', -180],
    ['Asia/Kathmandu', 330],
    ['Pacific/Auckland', 720],
  ])('is priced as if each minute were looked up: %s, weather at %i minutes', (zone, offset) => {
    const clock: CivilClock = clockOf(zone, offset);
    const tariff = prepared(
      ratesOf(
        { name: 'a', price: 0.11, from: '22:20', to: '02:35', weekdays: ['sun', 'wed'] },
        { name: 'b', price: 0.37, from: '02:10', to: '03:05', months: [3, 4, 9, 10, 11] },
        { name: 'c', price: 0.23, from: '17:25', to: '00:00' },
        { name: 'd', price: 0.41 },
      ),
      clock,
    );
    const ruleAt = (t: DateTime): number => {
      const m = t.hour * 60 + t.minute;
      if ((m >= 1340 || m < 155) && (t.weekday === 7 || t.weekday === 3)) return 0.11;
      if (m >= 130 && m < 185 && [3, 4, 9, 10, 11].includes(t.month)) return 0.37;
      return m >= 1045 ? 0.23 : 0.41;
    };
    // Two days around each change of the clocks (those above), and both ends of the year.
    const around = clock.stretches.filter((day) => day.minuteOfDay !== 0).map((day) => Math.floor(day.fromMinute / 60));
    const starts = [0, 8712, ...around.map((step) => Math.max(0, Math.min(8712, step - 24)))];
    let compared = 0;
    for (const start of starts) {
      for (let i = start; i < start + 48; i++) {
        expect(tariff.price[i]).toBeCloseTo(meanByMinutes(clock, i, ruleAt), DIGITS);
        compared++;
      }
    }
    expect(compared).toBeGreaterThanOrEqual(96);
  });
});
