import { describe, expect, it } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { askedHour } from '../../../src/report/explainAsked.ts';
import { type CivilClock, civilClock } from '../../../src/tariffs/civilClock.ts';

function clockOf(zone: string, offsetMinutes: number, calendarYear = 2025, hours = 8760): CivilClock {
  const { clock } = civilClock({ hours, offsetMinutes, zone, calendarYear });
  if (clock === undefined) throw new Error('no clock');
  return clock;
}

const berlin = clockOf('Europe/Berlin', 60);
const textOf = (text: string, clock = berlin) => {
  const { problem } = askedHour(text, clock);
  if (problem === undefined) throw new Error('no problem');
  return problemText(problem);
};

describe('the hour asked', () => {
  it('is civil time of the site: 13 days and 6 hours into the year', () => {
    expect(askedHour('2025-01-14T06:00', berlin)).toEqual({ asked: { hour: 13 * 24 + 6, isBeginning: true } });
    expect(askedHour(' 2025-01-14 06:00 ', berlin).asked?.hour).toBe(318);
  });

  it('is an hour earlier in standard time while summer time holds', () => {
    // 1 July is day 181 of a common year, counted from 0; 15:00 in summer is 14:00 of UTC+1
    expect(askedHour('2025-07-01T15:00', berlin).asked?.hour).toBe(181 * 24 + 14);
  });

  it('is taken at its word where an offset is written', () => {
    for (const text of [
      '2025-07-01T15:00+02:00',
      '2025-07-01T14:00+01:00',
      '2025-07-01T13:00Z',
      '2025-07-01T07:00-06:00',
    ])
      expect(askedHour(text, berlin).asked?.hour, text).toBe(181 * 24 + 14);
  });

  it('is the one that holds the time where that is not its beginning', () => {
    expect(askedHour('2025-01-14T06:59', berlin)).toEqual({ asked: { hour: 318, isBeginning: false } });
    // half past five in Kolkata, with weather that begins its hours in UTC
    const kolkata = clockOf('Asia/Kolkata', 0);
    expect(askedHour('2025-01-14T06:00', kolkata)).toEqual({ asked: { hour: 13 * 24, isBeginning: false } });
    expect(askedHour('2025-01-14T05:30', kolkata)).toEqual({ asked: { hour: 13 * 24, isBeginning: true } });
  });

  it('is found at both ends of the year, and where civil time lies in the neighbouring year', () => {
    expect(askedHour('2025-01-01T00:00', berlin).asked?.hour).toBe(0);
    expect(askedHour('2025-12-31T23:59', berlin).asked?.hour).toBe(8759);
    const newYork = clockOf('America/New_York', 0);
    expect(askedHour('2024-12-31T19:00', newYork).asked?.hour).toBe(0);
  });

  it('skips 29 February as the weather does', () => {
    const leap = clockOf('Europe/Berlin', 60, 2024);
    expect(askedHour('2024-03-01T00:00', leap).asked?.hour).toBe(59 * 24);
    expect(askedHour('2024-02-29T00:00', clockOf('Europe/Berlin', 60, 2024, 8784)).asked?.hour).toBe(59 * 24);
  });
});

describe('no hour is found', () => {
  it('where the time cannot be read, or does not exist', () => {
    for (const text of [
      '',
      'now',
      '2025-01-14',
      '06:00',
      '2025-02-30T06:00',
      '2025-01-14T24:00',
      '2025-01-14T06:00+99:00',
    ])
      expect(textOf(text)).toBe(
        `--at  '${text}' is no date with a time of day that exists\n    → write it like 2025-01-14T06:00, with an offset such as +01:00 behind it where it is not civil time of the site`,
      );
  });

  it('where it occurs twice in autumn: both are named, and found when written so', () => {
    const text = textOf('2025-10-26T02:30');
    expect(text).toBe(
      '--at  2025-10-26T02:30 occurs twice on that day, as the clocks go back\n    → write 2025-10-26T02:30+02:00 for the first or 2025-10-26T02:30+01:00 for the second',
    );
    const [first, second] = [...text.matchAll(/2025-10-26T02:30\+\d\d:\d\d/g)].map(([each]) => askedHour(each, berlin));
    expect(second!.asked!.hour).toBe(first!.asked!.hour + 1);
  });

  it('where the clocks skip it in spring: the hour after is named', () => {
    expect(textOf('2025-03-30T02:00')).toBe(
      '--at  2025-03-30T02:00 does not occur: the clocks go forward over it\n    → the hour after it is 2025-03-30T03:00',
    );
    expect(askedHour('2025-03-30T03:00', berlin).asked?.hour).toBe(
      (askedHour('2025-03-30T01:00', berlin).asked?.hour ?? 0) + 1,
    );
  });

  it('where the change is in the other half of the year, or half an hour wide', () => {
    expect(textOf('2025-10-05T02:10', clockOf('Australia/Sydney', 600))).toContain(
      'the hour after it is 2025-10-05T03:00',
    );
    expect(textOf('2025-10-05T02:10', clockOf('Australia/Lord_Howe', 630))).toContain(
      'the hour after it is 2025-10-05T02:30',
    );
  });

  it('in another year: the calendar year is named', () => {
    expect(textOf('2019-01-14T06:00')).toBe(
      '--at  2019-01-14T06:00 is not in the calendar year of the scenario, 2025\n    → write a time of that year, or another site.calendarYear in the scenario',
    );
  });

  it('where the weather does not reach: the simulated hours are named', () => {
    expect(textOf('2024-02-29T06:00', clockOf('Europe/Berlin', 60, 2024))).toBe(
      '--at  2024-02-29T06:00 is not among the simulated hours, 2024-01-01T00:00+01:00 to 2024-12-31T23:00+01:00 in civil time, without 29 February\n    → ask for one of these',
    );
    // in Tokyo the weather's year in UTC begins at nine in the morning
    expect(textOf('2025-01-01T03:00', clockOf('Asia/Tokyo', 0))).toContain(
      '2025-01-01T09:00+09:00 to 2026-01-01T08:00',
    );
  });

  it('and a hostile time is shown harmlessly', () => {
    expect(textOf('\u001b[31m2025')).not.toContain('\u001b');
    expect(textOf('x'.repeat(5000)).length).toBeLessThan(300);
  });
});
