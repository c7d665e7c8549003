import { DateTime } from 'luxon';
import { describe, expect, it } from 'vitest';
import { zoneOffsets } from '../../../../src/core/zoneOffsets.ts';
import { keepsLocalClock, localToStandard } from '../../../../src/weather/read/localClock.ts';
import { type Hour, header, plainFile, plainRows, read, syntheticYear } from './syntheticYear.ts';

/** Stamps of a zone's own clock, written by the luxon library, for instants given in the zone's standard time. */
function clockOf(zone: string, standardOffset: number, format: string) {
  return (minute: number) => DateTime.fromMillis((minute - standardOffset) * 60_000, { zone }).toFormat(format);
}

function expectYear(series: ReturnType<typeof read>['series'], year: readonly Hour[]): void {
  expect(series?.hours).toBe(year.length);
  // The values are printed as they are, so they come back exactly.
  expect(year.findIndex((h, i) => h.temperature !== series?.temperature[i])).toBe(-1);
}

const zones = [
  { zone: 'Europe/Berlin', standardOffset: 60, south: false },
  { zone: 'America/New_York', standardOffset: -300, south: false },
  { zone: 'Australia/Lord_Howe', standardOffset: 630, south: true },
];

describe.each(zones)('a file on the local clock of $zone', ({ zone, standardOffset }) => {
  const year = syntheticYear();
  const local = clockOf(zone, standardOffset, "yyyy-MM-dd'T'HH:mm");

  it('is recognised by its clock changes and converted to standard time', () => {
    const { series, recognised, problems } = read(plainFile(year, local), {}, { zone, defaultOffsetMinutes: 0 });
    expect(problems.map((p) => p.code)).toEqual([]);
    expectYear(series, year);
    expect(series?.offsetMinutes).toBe(standardOffset);
    expect(recognised).toMatchObject({ clock: 'local', clockDecidedBy: 'recognised', sorted: false });
  });

  it('is converted where the settings say so, also on a leap year', () => {
    const leap = syntheticYear(2020);
    const { series, recognised } = read(plainFile(leap, local), { clock: 'local' }, { zone });
    expectYear(series, leap);
    expect(recognised.clockDecidedBy).toBe('settings');
  });

  it('is converted in half-hourly steps, each hour being the mean of its halves', () => {
    const halves = syntheticYear(2019, 30);
    const { series } = read(plainFile(halves, local), {}, { zone });
    const off = Array.from({ length: 8760 }, (_, i) => i).filter((i) => {
      const mean = (halves[2 * i]!.temperature + halves[2 * i + 1]!.temperature) / 2;
      return Math.abs(series!.temperature[i]! - mean) > 1e-12;
    });
    expect(off).toEqual([]);
  });

  it('is converted where its stamps mark the end of the hour', () => {
    const { series, recognised } = read(
      plainFile(year, (m) => local(m + 60)),
      { stamps: 'end' },
      { zone },
    );
    expectYear(series, year);
    expect(recognised.clock).toBe('local');
  });

  it('needs no zone where the stamps carry their offsets: the smallest is that of standard time', () => {
    const text = plainFile(year, clockOf(zone, standardOffset, "yyyy-MM-dd'T'HH:mmZZ"));
    const { series, recognised } = read(text, {}, { zone: undefined, defaultOffsetMinutes: 0 });
    expectYear(series, year);
    expect(series?.offsetMinutes).toBe(standardOffset);
    expect(recognised).toMatchObject({ clock: 'local', offsetFrom: 'stamps' });
  });

  it('is laid on another offset where the settings state one', () => {
    const text = plainFile(year, clockOf(zone, standardOffset, "yyyy-MM-dd'T'HH:mmZZ"));
    const { series } = read(text, { offset: standardOffset + 60 });
    expect(series?.offsetMinutes).toBe(standardOffset + 60);
    // One hour ahead: the first hour of the file is now the second of the year, the last one has wrapped to the front.
    expect(series?.temperature[1]).toBe(year[0]!.temperature);
    expect(series?.temperature[0]).toBe(year[8759]!.temperature);
  });
});

describe('clocks that are not local', () => {
  const year = syntheticYear();

  it('a file that leaves out the spring hour and doubles none keeps standard time with a gap', () => {
    const without = year.filter((h) => h.minute !== Date.UTC(2019, 2, 31, 2) / 60_000);
    const { series, recognised, problems } = read(plainFile(without), { absentHours: 'fill' });
    expect(problems).toEqual([]);
    expect(recognised.clock).toBe('standard');
    const hour = (59 + 30) * 24 + 2;
    expect(series?.temperature[hour]).toBeCloseTo((year[hour - 1]!.temperature + year[hour + 1]!.temperature) / 2, 12);
    expect(series?.temperature[hour + 1]).toBe(year[hour + 1]!.temperature);
  });

  it('a regular file keeps standard time even where the zone has summer time', () => {
    const { series, recognised } = read(plainFile(year));
    expectYear(series, year);
    expect(recognised.clock).toBe('standard');
    expect(series?.offsetMinutes).toBe(60);
  });

  it('a header that names UTC gives the offset', () => {
    const { series, recognised } = read(plainFile(year).replace('time,', 'time (UTC),'));
    expect(series?.offsetMinutes).toBe(0);
    expect(recognised.offsetFrom).toBe('header');
  });

  it('hours numbered 1 to 24 on a local clock count from the beginning of their hour', () => {
    const zone = 'Europe/Berlin';
    const text = [
      header.replace('time', 'year,month,day,hour'),
      ...plainRows(year, (m) => {
        const begin = DateTime.fromMillis((m - 60) * 60_000, { zone });
        return `${begin.year},${begin.month},${begin.day},${begin.hour + 1}`;
      }),
    ].join('\n');
    const { series, recognised, problems } = read(text);
    expect(problems).toEqual([]);
    expectYear(series, year);
    expect(recognised).toMatchObject({ clock: 'local', stamps: 'end', stampsDecidedBy: 'recognised' });
  });

  it('a local clock without a zone, with an unknown zone or without years is refused', () => {
    const codes = (text: string, zone: string | undefined) =>
      read(text, { clock: 'local' }, { zone }).problems.map((p) => p.code);
    expect(codes(plainFile(year), undefined)).toEqual(['weather.clock-needs-zone']);
    expect(codes(plainFile(year), 'Europe/Atlantis')).toEqual(['weather.unknown-zone']);
    expect(
      codes(
        plainFile(year, (m) => new Date(m * 60_000).toISOString().slice(5, 16).replace('-', '/').replace('T', ' ')),
        'Europe/Berlin',
      ),
    ).toEqual(['weather.clock-needs-year']);
  });

  it('a reading over which the clock is put forward is refused with its line', () => {
    const { problems } = read(plainFile(year), { clock: 'local' });
    const found = problems.filter((p) => p.code === 'weather.no-such-clock-time');
    // Line 1 is the header: 31 March 02:00 is hour 2138 of the year, counted from 0.
    expect(found).toMatchObject([
      { line: (59 + 30) * 24 + 2 + 2, found: '2019-03-31 02:00', allowed: 'Europe/Berlin' },
    ]);
  });
});

describe('the signs of a local clock', () => {
  const zone = 'Europe/Berlin';
  const minuteOf = (year: number) => Date.UTC(year, 0, 1) / 60_000;
  const spans = zoneOffsets(zone, minuteOf(2019), minuteOf(2021)) ?? [];
  const local = (year: number, from: number, to: number) =>
    Array.from({ length: to - from }, (_, i) => {
      const time = DateTime.fromMillis((minuteOf(year) + (from + i) * 60) * 60_000, { zone });
      return minuteOf(year) + (from + i) * 60 + time.offset;
    });
  const keeps = (readings: readonly number[]) => {
    const column = Float64Array.from(readings);
    const converted = localToStandard(column, { spans, standardOffset: 60, backwards: false });
    return keepsLocalClock(column, converted, 60, spans);
  };

  it('are a change in spring and one in autumn, not one of them', () => {
    expect(keeps(local(2019, 0, 8760))).toBe(true);
    expect(keeps(local(2019, 0, 4000))).toBe(false);
    expect(keeps(local(2019, 4000, 8760))).toBe(false);
  });

  it('do not hold where another year keeps standard time', () => {
    const standard = Array.from({ length: 8760 }, (_, i) => minuteOf(2020) + (i + 1) * 60);
    expect(keeps([...local(2019, 0, 8760), ...local(2020, 0, 8784)])).toBe(true);
    expect(keeps([...local(2019, 0, 8760), ...standard])).toBe(false);
  });
});
