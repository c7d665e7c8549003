import { DateTime } from 'luxon';
import { describe, expect, it } from 'vitest';
import { civilStamps, standardStamp } from '../../../src/report/hourStamps.ts';
import { civilClock } from '../../../src/tariffs/civilClock.ts';

const clockOf = (zone: string, offsetMinutes: number, calendarYear = 2025, hours = 8760) =>
  civilClock({ hours, offsetMinutes, zone, calendarYear }).clock!;

describe('the standard time of an hour', () => {
  it('is counted from 1 January with the offset of the file', () => {
    const clock = clockOf('Europe/Berlin', 60);
    expect(standardStamp(clock, 0)).toBe('2025-01-01T00:00+01:00');
    expect(standardStamp(clock, 8759)).toBe('2025-12-31T23:00+01:00');
    // 31 + 28 days before 1 March, 30 more to 31 March: no hour is skipped on the Sunday of the clock change (30 March).
    expect(standardStamp(clock, 24 * (31 + 28 + 29) + 2)).toBe('2025-03-30T02:00+01:00');
  });

  it('skips 29 February where a common year lies on a leap year', () => {
    const clock = clockOf('UTC', 0, 2024);
    expect(standardStamp(clock, 24 * 59 - 1)).toBe('2024-02-28T23:00+00:00');
    expect(standardStamp(clock, 24 * 59)).toBe('2024-03-01T00:00+00:00');
  });

  it('writes offsets west of Greenwich and of half an hour', () => {
    expect(standardStamp(clockOf('America/St_Johns', -210), 1)).toBe('2025-01-01T01:00-03:30');
    expect(standardStamp(clockOf('Asia/Kolkata', 330), 1)).toBe('2025-01-01T01:00+05:30');
  });
});

describe('the civil time of an hour', () => {
  it.each([
    ['Europe/Berlin', 60],
    ['America/New_York', -300],
    ['Australia/Lord_Howe', 630],
    ['Asia/Kolkata', 330],
    ['Europe/London', 60],
  ])('is what the time-zone library says in every hour: %s', (zone, offset) => {
    const clock = clockOf(zone, offset);
    const stamps = civilStamps(clock);
    expect(stamps.length).toBe(8760);
    const wrong = stamps.filter((stamp, hour) => {
      const time = DateTime.fromMillis(clock.startMillis[hour]!, { zone });
      return stamp !== time.toFormat("yyyy-MM-dd'T'HH:mmZZ");
    });
    expect(wrong).toEqual([]);
  });

  it('names the doubled hour twice, with two offsets, and the missing one never', () => {
    const stamps = civilStamps(clockOf('Europe/Berlin', 60));
    expect(stamps.filter((stamp) => stamp.startsWith('2025-10-26T02:'))).toEqual([
      '2025-10-26T02:00+02:00',
      '2025-10-26T02:00+01:00',
    ]);
    expect(stamps.filter((stamp) => stamp.startsWith('2025-03-30T02:'))).toEqual([]);
    expect(new Set(stamps).size).toBe(8760);
  });
});
