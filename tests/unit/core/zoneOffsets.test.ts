import { describe, expect, test } from 'vitest';
import { zoneOffsets } from '../../../src/core/zoneOffsets.ts';

const minuteOf = (...[year, month, day, hour]: number[]) => Date.UTC(year, month - 1, day, hour) / 60_000;

describe('the offsets of a zone', () => {
  test('are one span where nothing changes', () => {
    const spans = zoneOffsets('Europe/Berlin', 28_927_680, 29_000_000);
    expect(spans).toEqual([{ fromMinute: 28_927_680, offsetMinutes: 60 }]);
  });

  test('change to the minute, in Berlin at 01:00 UTC on the last Sundays of March and October', () => {
    // Directive 2000/84/EC.
    expect(zoneOffsets('Europe/Berlin', minuteOf(2025, 1, 1, 0), minuteOf(2026, 1, 1, 0))).toEqual([
      { fromMinute: minuteOf(2025, 1, 1, 0), offsetMinutes: 60 },
      { fromMinute: minuteOf(2025, 3, 30, 1), offsetMinutes: 120 },
      { fromMinute: minuteOf(2025, 10, 26, 1), offsetMinutes: 60 },
    ]);
  });

  test('change also on the last day that is asked for', () => {
    const spans = zoneOffsets('Europe/Berlin', minuteOf(2025, 3, 29, 18), minuteOf(2025, 3, 30, 1));
    expect(spans?.map((span) => span.offsetMinutes)).toEqual([60, 120]);
  });

  test('of an unknown zone do not exist', () => {
    expect(zoneOffsets('Europe/Atlantis', 0, 1440)).toBeUndefined();
  });
});
