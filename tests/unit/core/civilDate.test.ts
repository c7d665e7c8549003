import { describe, expect, test } from 'vitest';
import {
  civilDay,
  dayExists,
  dayNumber,
  dayOfYear,
  isLeapYear,
  minuteOfDay,
  weekdayOf,
  writtenDate,
} from '../../../src/core/civilDate.ts';

describe('dates as written', () => {
  test('are read with their year or for every year', () => {
    expect(writtenDate('2025-12-24')).toEqual({ year: 2025, month: 12, dayOfMonth: 24 });
    expect(writtenDate('12-24')).toEqual({ month: 12, dayOfMonth: 24 });
    expect(writtenDate('02-29')).toEqual({ month: 2, dayOfMonth: 29 });
    expect(writtenDate('2024-02-29')).toEqual({ year: 2024, month: 2, dayOfMonth: 29 });
  });

  test.each(['2025-02-29', '1900-02-29', '04-31', '13-01', '00-10', '01-00', '1-1', '24.12.', '', '2025-12-24T00:00'])(
    'that do not exist are refused: %j',
    (text) => expect(writtenDate(text)).toBeUndefined(),
  );
});

describe('times of day', () => {
  test('are minutes from 0 to 1440', () => {
    expect(['00:00', '22:30', '24:00'].map(minuteOfDay)).toEqual([0, 1350, 1440]);
  });

  test.each(['24:01', '12:60', '7:00', '22', '', '22:30:00'])('that no clock shows are refused: %j', (text) =>
    expect(minuteOfDay(text)).toBeUndefined(),
  );
});

describe('days', () => {
  test('are counted from 1 January 1970, a Thursday, in both directions', () => {
    expect(dayNumber(1970, 3, 1)).toBe(59);
    expect([weekdayOf(0), weekdayOf(4), weekdayOf(-1), weekdayOf(-4)]).toEqual([4, 1, 3, 7]);
  });

  test('29 February exists by the Gregorian rule', () => {
    expect([2024, 2025, 1900, 2000].map(isLeapYear)).toEqual([true, false, false, true]);
  });

  test('days are numbered as the Gregorian calendar counts them', () => {
    expect(dayNumber(1970, 3, 1)).toBe(59);
    expect(civilDay(59)).toEqual({ year: 1970, month: 3, day: 1 });
    expect(dayOfYear({ month: 3, day: 1 }, false)).toBe(59);
    for (let day = -70_000; day < 90_000; day += 13) {
      const { year, month, day: dayOfMonth } = civilDay(day);
      expect(Date.UTC(year, month - 1, dayOfMonth)).toBe(day * 86_400_000);
      expect(dayNumber(year, month, dayOfMonth)).toBe(day);
    }
  });

  test('of a month have their number, 29 February in leap years', () => {
    for (const [year, month, day, exists] of [
      [2025, 1, 31, true],
      [2025, 4, 31, false],
      [2024, 2, 29, true],
      [2025, 2, 29, false],
      [2025, 13, 1, false],
      [2025, 0, 1, false],
      [2025, 6, 0, false],
      [2025, Number.NaN, 1, false],
    ] as const) {
      expect(dayExists(year, month, day), `${year}-${month}-${day}`).toBe(exists);
    }
  });

  test('of a year count from 0; in a common year 29 February is where 1 March is', () => {
    expect([1, 2, 3, 12].map((month) => dayOfYear({ month, day: 1 }, false))).toEqual([0, 31, 59, 334]);
    expect(dayOfYear({ month: 3, day: 1 }, true)).toBe(60);
    expect(dayOfYear({ month: 2, day: 29 }, false)).toBe(dayOfYear({ month: 3, day: 1 }, false));
  });
});
