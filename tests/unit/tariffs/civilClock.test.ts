import { DateTime } from 'luxon';
import { describe, expect, test } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { civilClock } from '../../../src/tariffs/civilClock.ts';
import { clockOf, stepAt } from './sampleTariffs.ts';

/** Civil time that a step shows, as text. */
function shownAt(clock: ReturnType<typeof clockOf>, step: number): string {
  const minutes = clock.minuteOfDay[step];
  const date = `${clock.month[step]}/${clock.dayOfMonth[step]}`;
  return `${date} ${Math.floor(minutes / 60)}:${String(minutes % 60).padStart(2, '0')}`;
}

describe('every step of a year agrees with luxon in', () => {
  // Zone, offset of the weather in minutes, year, hours. The zones: north, west, south, a half-hour change, a half-hour
  // zone, no change at all, a change on a Saturday evening (America/Santiago), and a zone that suspends summer time for a
  // month (Africa/Casablanca).
  test.each([
    ['Europe/Berlin', 60, 2025, 8760],
    ['Europe/Berlin', 0, 2025, 8760],
    ['America/New_York', -300, 2025, 8760],
    ['Pacific/Auckland', 720, 2025, 8760],
    ['Australia/Lord_Howe', 630, 2025, 8760],
    ['Australia/Lord_Howe', 600, 2025, 8760],
    ['America/St_Johns', -210, 2025, 8760],
    ['America/St_Johns', -180, 2024, 8784],
    ['Asia/Kolkata', 330, 2025, 8760],
    ['Asia/Kathmandu', 330, 2025, 8760],
    ['America/Santiago', -240, 2025, 8760],
    ['Africa/Casablanca', 60, 2025, 8760],
    ['Europe/Berlin', 60, 2024, 8784],
    ['Pacific/Auckland', 720, 2024, 8760],
  ])('%s at %i minutes on %i with %i hours', (zone, offset, year, hours) => {
    const clock = clockOf(zone, offset, year, hours);
    const wrong: string[] = [];
    for (let i = 0; i < hours; i++) {
      const t = DateTime.fromMillis(clock.startMillis[i], { zone });
      const same =
        clock.minuteOfDay[i] === t.hour * 60 + t.minute &&
        clock.weekday[i] === t.weekday &&
        clock.year[i] === t.year &&
        clock.month[i] === t.month &&
        clock.dayOfMonth[i] === t.day;
      if (!same) wrong.push(t.toString());
    }
    expect(wrong).toEqual([]);
  });
});

describe('steps are instants', () => {
  test('that begin at the file’s own midnight and follow one another by an hour', () => {
    const clock = clockOf('Europe/Berlin', 60);
    expect(clock.startMillis[0]).toBe(Date.UTC(2024, 11, 31, 23));
    const distances = new Set(Array.from(clock.startMillis.subarray(1), (t, i) => t - clock.startMillis[i]));
    expect([...distances]).toEqual([3_600_000]);
  });

  test('and stretches hold every minute once, whatever the clocks do', () => {
    for (const clock of [clockOf('Europe/Berlin', 60), clockOf('Australia/Lord_Howe', 600), clockOf('UTC', 0, 2024)]) {
      let next = 0;
      for (const { fromMinute, toMinute } of clock.stretches) {
        expect(fromMinute).toBe(next);
        expect(toMinute).toBeGreaterThan(fromMinute);
        next = toMinute;
      }
      expect(next).toBe(8760 * 60);
    }
  });
});

describe('clock changes', () => {
  test('leave out 02:00 on 30 March 2025 and repeat it on 26 October in Berlin', () => {
    // Directive 2000/84/EC: summer time runs from 01:00 UTC on the last Sunday of March to that of October.
    const clock = clockOf('Europe/Berlin', 60);
    const spring = stepAt(clock, '2025-03-30T00:00Z');
    expect([spring, spring + 1].map((i) => shownAt(clock, i))).toEqual(['3/30 1:00', '3/30 3:00']);
    const autumn = stepAt(clock, '2025-10-26T00:00Z');
    expect([autumn, autumn + 1, autumn + 2].map((i) => shownAt(clock, i))).toEqual([
      '10/26 2:00',
      '10/26 2:00',
      '10/26 3:00',
    ]);
  });

  test('come at 02:00 local time on 9 March and 2 November 2025 in New York', () => {
    // Energy Policy Act of 2005, section 110: second Sunday of March, first Sunday of November.
    const clock = clockOf('America/New_York', -300);
    const spring = stepAt(clock, '2025-03-09T06:00Z');
    expect([spring, spring + 1].map((i) => shownAt(clock, i))).toEqual(['3/9 1:00', '3/9 3:00']);
    const autumn = stepAt(clock, '2025-11-02T05:00Z');
    expect([autumn, autumn + 1].map((i) => shownAt(clock, i))).toEqual(['11/2 1:00', '11/2 1:00']);
  });

  test('run the other way round in Auckland', () => {
    // New Zealand Daylight Time Order 2007: from the last Sunday of September to the first Sunday of April, at 02:00
    // standard time; 1 January lies in summer time.
    const clock = clockOf('Pacific/Auckland', 720);
    expect(shownAt(clock, 0)).toBe('1/1 1:00');
    const autumn = stepAt(clock, '2025-04-05T13:00Z');
    expect([autumn, autumn + 1].map((i) => shownAt(clock, i))).toEqual(['4/6 2:00', '4/6 2:00']);
    const spring = stepAt(clock, '2025-09-27T13:00Z');
    expect([spring, spring + 1].map((i) => shownAt(clock, i))).toEqual(['9/28 1:00', '9/28 3:00']);
  });

  test('are half an hour on Lord Howe Island and may fall inside a step', () => {
    // Lord Howe: UTC+10:30, in summer UTC+11; IANA time zone database, zone Australia/Lord_Howe. On 5 October 2025 the
    // clock goes from 02:00 to 02:30. With weather in UTC+10 the step that begins at 01:30 holds both sides.
    const clock = clockOf('Australia/Lord_Howe', 600);
    const step = stepAt(clock, '2025-10-04T15:00Z');
    expect([step, step + 1].map((i) => shownAt(clock, i))).toEqual(['10/5 1:30', '10/5 3:00']);
    const after = clock.stretches.find((day) => day.fromMinute === step * 60 + 30);
    expect(after).toMatchObject({ minuteOfDay: 150, dayOfMonth: 5 });
  });

  test('do not occur in Kolkata, whose days all have 24 hours', () => {
    const clock = clockOf('Asia/Kolkata', 330);
    expect(clock.stretches).toHaveLength(365);
    expect(clock.minuteOfDay.every((minute, i) => minute === (i % 24) * 60)).toBe(true);
  });
});

describe('the year is periodic', () => {
  test('where the zone leaves hours in the next year: they keep their weekday and month', () => {
    // 31 December 2025 23:00 UTC is Thursday 1 January 2026 00:00 in Berlin.
    const clock = clockOf('Europe/Berlin', 0);
    expect(shownAt(clock, 0)).toBe('1/1 1:00');
    expect([shownAt(clock, 8759), clock.weekday[8759], clock.civilDay[8759]]).toEqual(['1/1 0:00', 4, 0]);
  });

  test('where the zone leaves hours in the year before', () => {
    // 1 January 2025 00:00 UTC is Tuesday 31 December 2024 19:00 in New York.
    const clock = clockOf('America/New_York', 0);
    expect([shownAt(clock, 0), clock.weekday[0], clock.civilDay[0]]).toEqual(['12/31 19:00', 2, 364]);
    expect([shownAt(clock, 5), clock.weekday[5], clock.civilDay[5]]).toEqual(['1/1 0:00', 3, 0]);
  });
});

describe('leap years', () => {
  test('8760 hours on 2024 skip 29 February, the weekday being that of the real date', () => {
    // 28 February 2024 was a Wednesday, 1 March a Friday.
    const clock = clockOf('Europe/Berlin', 60, 2024);
    expect([shownAt(clock, 1415), clock.weekday[1415], clock.civilDay[1415]]).toEqual(['2/28 23:00', 3, 58]);
    expect([shownAt(clock, 1416), clock.weekday[1416], clock.civilDay[1416]]).toEqual(['3/1 0:00', 5, 59]);
    expect([shownAt(clock, 8759), clock.civilDay[8759]]).toEqual(['12/31 23:00', 364]);
    expect(clock.daysOfMonth.reduce((sum, days) => sum + days)).toBe(365);
  });

  test('what another offset leaves of the skipped day counts as 28 February', () => {
    // Skipped is 29 February of UTC; 00:00 Berlin time on that day is 23:00 UTC on the 28th, which is there.
    const clock = clockOf('Europe/Berlin', 0, 2024);
    expect([shownAt(clock, 1415), clock.weekday[1415], clock.civilDay[1415]]).toEqual(['2/29 0:00', 4, 58]);
    expect([shownAt(clock, 1416), clock.weekday[1416], clock.civilDay[1416]]).toEqual(['3/1 1:00', 5, 59]);
  });

  test('8784 hours on 2024 hold 29 February', () => {
    const clock = clockOf('Europe/Berlin', 60, 2024, 8784);
    expect([shownAt(clock, 1416), clock.weekday[1416], clock.civilDay[1416]]).toEqual(['2/29 0:00', 4, 59]);
    expect([clock.civilDay[8783], clock.daysOfMonth[1]]).toEqual([365, 29]);
  });

  test('8784 hours on a common year are an error, also on 2100', () => {
    for (const calendarYear of [2025, 2100]) {
      const { clock, problem } = civilClock({ hours: 8784, offsetMinutes: 60, zone: 'Europe/Berlin', calendarYear });
      expect(clock).toBeUndefined();
      expect(problem && problemText(problem)).toContain('8784 hours, but calendarYear is a year without 29 February');
    }
  });
});

describe('what cannot be a clock', () => {
  const good = { hours: 8760, offsetMinutes: 60, zone: 'Europe/Berlin', calendarYear: 2025 };

  test.each(['Europe/Atlantis', '', 'Berlin', '../etc/passwd', '\u202eniltreB'])('zone %j', (zone) => {
    const { problem } = civilClock({ ...good, zone });
    expect(problem).toMatchObject({ code: 'clock.unknown-zone', path: 'zone', severity: 'error' });
    expect(problem && problemText(problem)).toContain('no time zone of the IANA list');
  });

  test.each([8759, 0, 17520, Number.NaN])('%d hours', (hours) => {
    const { problem } = civilClock({ ...good, hours });
    expect(problem?.code).toBe('clock.hours');
    expect(problem && problemText(problem)).toContain(`the weather has ${hours} hours; a year has 8760, or 8784`);
  });

  test.each([1969, 2101, 2025.5, Number.NaN])('year %d', (calendarYear) => {
    const { problem } = civilClock({ ...good, calendarYear });
    expect(problem?.code).toBe('clock.calendar-year');
    expect(problem && problemText(problem)).toContain(`${calendarYear}; allowed is a year from 1970 to 2100`);
  });
});
