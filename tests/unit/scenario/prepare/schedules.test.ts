import { describe, expect, test } from 'vitest';
import { stepsOfRule } from '../../../../src/scenario/prepare/schedules.ts';
import { clockOf, instantsOf, stepAt } from './preparedSample.ts';

const berlin = clockOf();
const count = (marks: Uint8Array) => marks.reduce((sum, mark) => sum + mark, 0);

describe('a rule by the time of day', () => {
  test('holds from its start to its end in civil time, summer time included', () => {
    const holds = stepsOfRule({ start: '06:00', end: '08:00' }, berlin);
    const days = instantsOf(berlin, holds);
    // UTC+1 in winter, UTC+2 in summer
    expect(days.slice(0, 3)).toEqual(['2025-01-01T05:00', '2025-01-01T06:00', '2025-01-02T05:00']);
    expect(days.filter((at) => at.startsWith('2025-07-01'))).toEqual(['2025-07-01T04:00', '2025-07-01T05:00']);
    expect(days).toHaveLength(2 * 365);
  });

  test('that ends before it starts runs across midnight', () => {
    const holds = stepsOfRule({ start: '22:00', end: '06:00' }, berlin);
    expect(holds.subarray(0, 24).join('')).toBe('111111000000000000000011');
  });

  test('may end at 24:00, or start at the beginning of the day', () => {
    expect(stepsOfRule({ start: '22:00', end: '24:00' }, berlin).subarray(0, 24).join('')).toBe(
      '000000000000000000000011',
    );
    expect(stepsOfRule({ start: '00:00', end: '02:00' }, berlin).subarray(0, 24).join('')).toBe(
      '110000000000000000000000',
    );
    expect(stepsOfRule({ start: '22:00', end: '00:00' }, berlin).subarray(0, 24).join('')).toBe(
      '000000000000000000000011',
    );
  });

  test('is read at the beginning of a step, so that a step that begins before it does not hold', () => {
    const holds = stepsOfRule({ start: '06:30', end: '08:30' }, berlin);
    expect(holds.subarray(0, 12).join('')).toBe('000000011000');
  });

  test('without times holds always', () => {
    expect(count(stepsOfRule({}, berlin))).toBe(8760);
  });
});

describe('a rule on the days on which the clocks change', () => {
  const night = instantsOf(berlin, stepsOfRule({ start: '01:00', end: '04:00' }, berlin));
  const between = (from: string, to: string) => night.filter((at) => at >= from && at < to);

  test('loses the missing hour in spring', () => {
    // 30 March 2025: 01:00 CET, then 03:00 CEST; 02:00 does not exist
    expect(between('2025-03-29T12:00', '2025-03-30T12:00')).toEqual(['2025-03-30T00:00', '2025-03-30T01:00']);
  });

  test('has the doubled hour twice in autumn', () => {
    // 26 October 2025: 01:00 and 02:00 CEST, then 02:00 and 03:00 CET
    expect(between('2025-10-25T12:00', '2025-10-26T12:00')).toEqual([
      '2025-10-25T23:00',
      '2025-10-26T00:00',
      '2025-10-26T01:00',
      '2025-10-26T02:00',
    ]);
  });

  test('keeps its civil time where the weather stands in another offset than the zone', () => {
    const clock = clockOf('Europe/Berlin', 0);
    const holds = stepsOfRule({ start: '07:00', end: '08:00' }, clock);
    expect(holds[stepAt(clock, '2025-01-10T06:00')]).toBe(1);
    expect(count(holds)).toBe(365);
  });

  test('is read in a zone of half hours at the civil half hour', () => {
    const clock = clockOf('Asia/Kolkata', 300);
    // steps begin at xx:30 of the zone
    const holds = stepsOfRule({ start: '07:30', end: '08:00' }, clock);
    expect(count(holds)).toBe(365);
    expect(count(stepsOfRule({ start: '07:00', end: '07:30' }, clock))).toBe(0);
  });
});

describe('a rule by the day', () => {
  test('holds on its weekdays, those of the step itself after midnight', () => {
    const holds = stepsOfRule({ start: '23:00', end: '01:00', weekdays: ['sat'] }, berlin);
    // the first Saturday of 2025 is 4 January: its first hour and its last
    expect(instantsOf(berlin, holds).slice(0, 3)).toEqual(['2025-01-03T23:00', '2025-01-04T22:00', '2025-01-10T23:00']);
  });

  test('holds on several weekdays', () => {
    // 1 January 2025 is a Wednesday: 52 Saturdays and 52 Sundays; one has 23 hours and one 25
    expect(count(stepsOfRule({ weekdays: ['sat', 'sun'] }, berlin))).toBe(104 * 24);
  });

  test('holds from its first to its last day, both included', () => {
    const holds = stepsOfRule({ from: '02-10', to: '02-12' }, berlin);
    const at = instantsOf(berlin, holds);
    expect([at[0], at.at(-1), at.length]).toEqual(['2025-02-09T23:00', '2025-02-12T22:00', 72]);
  });

  test('of every year may run across the new year', () => {
    const at = instantsOf(berlin, stepsOfRule({ from: '12-30', to: '01-02' }, berlin));
    expect(at).toHaveLength(4 * 24);
    expect(at[0]).toBe('2024-12-31T23:00');
    expect(at[47]).toBe('2025-01-02T22:00');
    expect(at[48]).toBe('2025-12-29T23:00');
  });

  test('of a written year holds in that year', () => {
    const at = instantsOf(berlin, stepsOfRule({ from: '2025-12-20', to: '2026-01-06' }, berlin));
    expect([at[0], at.length]).toEqual(['2025-12-19T23:00', 12 * 24]);
    expect(count(stepsOfRule({ from: '2024-12-20', to: '2025-01-06' }, berlin))).toBe(6 * 24);
    expect(count(stepsOfRule({ from: '2023-02-01', to: '2023-02-06' }, berlin))).toBe(0);
  });

  // Weather in UTC: its first 5 hours are 31 December 2024 in New York, its last 9 are 1 January 2026 in Tokyo.
  test.each([
    {
      ...{ zone: 'America/New_York', beyond: [0, 5], within: 5 * 24 - 5 },
      ...{ ofYear: ['2025-12-27', '2025-12-31'], ofNeighbour: ['2024-12-27', '2024-12-31'] },
    },
    {
      ...{ zone: 'Asia/Tokyo', beyond: [8751, 8760], within: 5 * 24 - 9 },
      ...{ ofYear: ['2025-01-01', '2025-01-05'], ofNeighbour: ['2026-01-01', '2026-01-05'] },
    },
  ])('of a written year leaves out the hours of $zone in the neighbouring one', (hours) => {
    const clock = clockOf(hours.zone, 0);
    const countsOf = ([from, to]: string[]) => {
      const holds = stepsOfRule({ from, to }, clock);
      return { beyond: count(holds.subarray(...hours.beyond)), year: count(holds) };
    };
    const beyond = hours.beyond[1]! - hours.beyond[0]!;
    expect(countsOf(hours.ofYear)).toEqual({ beyond: 0, year: hours.within });
    expect(countsOf(hours.ofNeighbour)).toEqual({ beyond, year: beyond });
    expect(countsOf(hours.ofYear.map((date) => date.slice(5)))).toEqual({ beyond, year: 5 * 24 });
  });

  test('of written years across a new year holds in the hours of the neighbouring one', () => {
    const newYork = clockOf('America/New_York', 0);
    // 5 hours of 31 December 2024, then 6 days of January 2025
    expect(count(stepsOfRule({ from: '2024-12-20', to: '2025-01-06' }, newYork))).toBe(5 + 6 * 24);
    const tokyo = clockOf('Asia/Tokyo', 0);
    // 12 days of December 2025, then 9 hours of 1 January 2026
    expect(count(stepsOfRule({ from: '2025-12-20', to: '2026-01-06' }, tokyo))).toBe(12 * 24 + 9);
  });

  test('holds within all of its limits at once', () => {
    const rule = { start: '12:00', end: '13:00', weekdays: ['mon'], from: '03-01', to: '03-31' } as const;
    // Mondays of March 2025: 3, 10, 17, 24, 31, the last in summer time
    expect(instantsOf(berlin, stepsOfRule(rule, berlin))).toEqual([
      '2025-03-03T11:00',
      '2025-03-10T11:00',
      '2025-03-17T11:00',
      '2025-03-24T11:00',
      '2025-03-31T10:00',
    ]);
  });
});
