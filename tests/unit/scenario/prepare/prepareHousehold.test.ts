import { describe, expect, test } from 'vitest';
import { profileOfHousehold } from '../../../../src/scenario/prepare/prepareHousehold.ts';
import { clockOf, stepAt } from '../../tariffs/sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const sum = (column: Float64Array = new Float64Array()) => column.reduce((all, value) => all + value, 0);
/** Shares with one hour of the day alone. */
const only = (hour: number) => Array.from({ length: 24 }, (_, h) => (h === hour ? 1 : 0));
const profileOf = (parts: { shares?: number[]; weekendShares?: number[] }, kWhPerYear = 2900, clock = berlin) =>
  profileOfHousehold({ given: 'profile', kWhPerYear, ...parts }, clock);

describe('a household by profile', () => {
  test('is even over the hours where no shares are given', () => {
    expect(profileOf({}, 8760)?.every((kWh) => kWh === 1)).toBe(true);
  });

  test('comes to its year exactly, whatever its shares add up to and however many hours the days have', () => {
    const shares = Array.from({ length: 24 }, (_, h) => 3 + h);
    for (const zone of ['Europe/Berlin', 'Australia/Lord_Howe', 'America/St_Johns']) {
      // 8760 values of some 0.3 kWh: rounding is some 1e-13 relative
      expect(sum(profileOf({ shares }, 2900, clockOf(zone, 0)))).toBeCloseTo(2900, 8);
    }
  });

  test('follows the clock on the wall, at which the hour of a step begins', () => {
    const column = profileOf({ shares: only(18) }, 365);
    expect(column?.[stepAt(berlin, '2025-01-15T18:00+01:00')]).toBeCloseTo(1, 12);
    expect(column?.[stepAt(berlin, '2025-07-15T18:00+02:00')]).toBeCloseTo(1, 12);
    expect(column?.[stepAt(berlin, '2025-07-15T18:00+01:00')]).toBe(0);
  });

  test('has no share in the hour that is skipped and twice in the one that is repeated', () => {
    // 365 days, less 30 March, and 26 October twice: 365 hours of one share
    const column = profileOf({ shares: only(2) }, 365);
    const hours = (column ?? new Float64Array()).filter((kWh) => kWh > 0);
    expect(hours).toHaveLength(365);
    const onDay = (from: string, count: number) => {
      const at = stepAt(berlin, from);
      return column?.slice(at, at + count).filter((kWh) => kWh > 0).length;
    };
    expect(onDay('2025-03-30T00:00+01:00', 23)).toBe(0);
    expect(onDay('2025-10-26T00:00+02:00', 25)).toBe(2);
  });

  test('has weekends on the scale of the other days', () => {
    // 1 in every hour of a working day, 2 of a weekend: 104 weekend days of 24 h with one less and one more
    const one = Array.from({ length: 24 }, () => 1);
    const weekendShares = one.map(() => 2);
    const weekend = 104 * 24;
    const column = profileOf({ shares: one, weekendShares }, 8760 + weekend);
    expect(column?.[stepAt(berlin, '2025-01-03T12:00+01:00')]).toBeCloseTo(1, 12);
    expect(column?.[stepAt(berlin, '2025-01-04T12:00+01:00')]).toBeCloseTo(2, 12);
    expect(column?.[stepAt(berlin, '2025-01-05T23:00+01:00')]).toBeCloseTo(2, 12);
    expect(column?.[stepAt(berlin, '2025-01-06T00:00+01:00')]).toBeCloseTo(1, 12);
  });

  test('has no column where its shares are all zero', () => {
    expect(profileOf({ shares: only(24) })).toBeUndefined();
  });
});
