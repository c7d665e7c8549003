import { describe, expect, test } from 'vitest';
import {
  dateText,
  dayNumber,
  isLeapYear,
  minuteOfDay,
  timeText,
  weekdayOf,
  writtenDate,
} from '../../../src/tariffs/civilDate.ts';

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

  test('are written with two digits for month and day', () => {
    expect(dateText(2025, 3, 1)).toBe('2025-03-01');
  });
});

describe('times of day', () => {
  test('are minutes from 0 to 1440', () => {
    expect(['00:00', '22:30', '24:00'].map(minuteOfDay)).toEqual([0, 1350, 1440]);
    expect(timeText(1350)).toBe('22:30');
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
});
