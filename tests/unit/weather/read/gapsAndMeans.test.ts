import { describe, expect, it } from 'vitest';
import { header, iso, pad, parts, plainFile, plainRows, read, syntheticYear } from './syntheticYear.ts';

const year = syntheticYear();
const rows = plainRows(year);

/** The plain file with one cell of some hours replaced; column 1 is the temperature. */
function withCells(column: number, cells: Record<number, string>): string {
  return [
    header,
    ...rows.map((row, i) =>
      i in cells
        ? row
            .split(',')
            .map((cell, c) => (c === column ? cells[i]! : cell))
            .join(',')
        : row,
    ),
  ].join('\n');
}

describe('missing values', () => {
  it.each(['', ' ', '-', 'NA', 'NaN', 'null', 'n/a', '-999', '-9999', '9999', '999.9', '-999.9', '99999'])(
    'marked by %j are interpolated',
    (mark) => {
      const { series, recognised, problems } = read(withCells(1, { 500: mark, 501: mark }));
      expect(problems).toEqual([]);
      const [before, after] = [year[499]!.temperature, year[502]!.temperature];
      // One and two thirds of the way; 1e-12 is the rounding of these few operations.
      expect(series!.temperature[500]).toBeCloseTo(before + (after - before) / 3, 12);
      expect(series!.temperature[501]).toBeCloseTo(before + ((after - before) * 2) / 3, 12);
      expect(recognised.filled.find((f) => f.quantity === 'temperature')).toEqual({
        quantity: 'temperature',
        hours: 2,
        longest: 2,
        held: 0,
      });
      expect(recognised.lines).toContain('temperature: 2 hours interpolated, the longest gap 2 hours');
    },
  );

  it('are interpolated across the ends of the year, up to six hours', () => {
    const { series, problems } = read(withCells(1, { 8757: '', 8758: '', 8759: '', 0: '', 1: '', 2: '' }));
    expect(problems).toEqual([]);
    const [before, after] = [year[8756]!.temperature, year[3]!.temperature];
    expect(series!.temperature[0]).toBeCloseTo(before + ((after - before) * 4) / 7, 12);
  });

  it('are counted by column', () => {
    const { recognised } = read(withCells(2, { 10: '', 20: '', 21: '', 22: '' }));
    expect(recognised.filled.map(({ quantity, hours, longest }) => [quantity, hours, longest])).toEqual([
      ['temperature', 0, 0],
      ['relativeHumidity', 4, 3],
      ['globalRadiation', 0, 0],
      ['pressure', 0, 0],
    ]);
  });

  it('may have marks of their own', () => {
    const { problems, series } = read(withCells(1, { 500: '-77', 501: 'gone' }), { missing: [-77, 'gone'] });
    expect(problems).toEqual([]);
    expect(series!.temperature[500]).toBeCloseTo(
      year[499]!.temperature + (year[502]!.temperature - year[499]!.temperature) / 3,
      12,
    );
  });

  it('of a pressure are not 999 hPa', () => {
    expect(read(withCells(4, { 500: '999' })).series!.pressure![500]).toBe(99_900);
    expect(read(withCells(4, { 500: '999.9' })).series!.pressure![500]).toBeCloseTo(99_990, 9);
  });

  it('of a whole column leave it out, but for the temperature', () => {
    const empty = (column: number) => withCells(column, Object.fromEntries(rows.map((_, i) => [i, ''])));
    const { series, recognised } = read(empty(3));
    expect(series?.globalRadiation).toBeUndefined();
    expect(recognised.empty).toEqual(['globalRadiation']);
    expect(recognised.lines).toContain('global radiation: the column is empty and was left out');
    expect(read(empty(1)).problems[0]?.code).toBe('weather.long-gap');
  });

  it('that the file leaves out are filled only where the settings allow it', () => {
    const without = [header, ...rows.slice(1, 100), ...rows.slice(106)].join('\n');
    expect(read(without).problems.map((p) => p.code)).toEqual(['weather.absent-hours']);
    const { series, recognised } = read(without, { absentHours: 'fill' });
    expect(series!.temperature[0]).toBeCloseTo((year[8759]!.temperature + year[1]!.temperature) / 2, 12);
    expect(recognised.filled[0]).toMatchObject({ hours: 7, longest: 6 });
  });

  it('do not hide a long gap among hours that are left out elsewhere', () => {
    const text = withCells(1, Object.fromEntries(Array.from({ length: 7 }, (_, i) => [300 + i, '']))).split('\n');
    text.splice(50, 1);
    expect(read(text.join('\n')).problems.map((p) => p.code)).toEqual(['weather.absent-hours', 'weather.long-gap']);
  });
});

describe('finer rows', () => {
  it('make the mean of what is there', () => {
    const tens = syntheticYear(2019, 10);
    const text = plainRows(tens).map((row, i) => (i === 7 ? row.replace(/,[^,]*,/, ',,') : row));
    text.splice(8, 1);
    const { series, problems } = read([header, ...text].join('\n'));
    expect(problems).toEqual([]);
    const left = [6, 9, 10, 11].map((i) => tens[i]!.temperature);
    expect(series!.temperature[1]).toBeCloseTo(left.reduce((a, b) => a + b) / 4, 12);
  });

  it('of one minute are read', () => {
    const minutes = syntheticYear(2019, 1);
    const text = `time,T\n${minutes.map((h) => `${iso(h.minute)},${h.temperature}`).join('\n')}`;
    const { series, problems } = read(text);
    expect(problems).toEqual([]);
    const mean = minutes.slice(600, 660).reduce((sum, h) => sum + h.temperature, 0) / 60;
    expect(series!.temperature[10]).toBeCloseTo(mean, 10);
  });

  it('stamped at their end are shifted by their own step, the first wrapping to the end of the year', () => {
    const halves = syntheticYear(2019, 30);
    const text = [header, ...plainRows(halves, (m) => iso(m + 30).replace('2020', '2019'))].join('\n');
    const { series } = read(text, { stamps: 'end' });
    expect(series!.temperature[0]).toBeCloseTo((halves[0]!.temperature + halves[1]!.temperature) / 2, 12);
    expect(series!.temperature[8759]).toBeCloseTo((halves[17_518]!.temperature + halves[17_519]!.temperature) / 2, 12);
  });
});

describe('values at the edge of the possible', () => {
  it('humidity up to 105 % is held at 100 and radiation down to −20 at 0, and counted', () => {
    const text = [
      header,
      ...rows.map((row, i) =>
        i === 5 ? `${iso(year[5]!.minute)},1,105,-20,1000` : i === 6 ? `${iso(year[6]!.minute)},1,100.5,0,1000` : row,
      ),
    ].join('\n');
    const { series, recognised, problems } = read(text);
    expect(problems).toEqual([]);
    expect([...series!.humidity!.values.slice(5, 7), series!.globalRadiation![5]]).toEqual([100, 100, 0]);
    expect(recognised.filled.map(({ quantity, held }) => [quantity, held])).toEqual([
      ['temperature', 0],
      ['relativeHumidity', 2],
      ['globalRadiation', 1],
      ['pressure', 0],
    ]);
    expect(recognised.lines).toContain('relative humidity: 2 values held at 100 %');
  });

  it('a leap of 15 K that stays is no spike, and one that returns is', () => {
    const step = withCells(1, Object.fromEntries(rows.slice(4000).map((_, i) => [4000 + i, '45'])));
    expect(read(step).problems).toEqual([]);
    const stairs = {
      ...Object.fromEntries(rows.slice(4002).map((_, i) => [4002 + i, '41'])),
      3999: '5',
      4000: '8',
      4001: '24',
    };
    expect(read(withCells(1, stairs)).problems).toEqual([]);
    const spike = withCells(1, { 4000: String(Math.max(year[3999]!.temperature, year[4001]!.temperature) + 15) });
    expect(read(spike).problems.map((p) => [p.code, p.severity, p.line])).toEqual([['weather.spike', 'warning', 4002]]);
  });
});

describe('the kinds of humidity', () => {
  const humid = (names: string, cells: string) =>
    `time,temperature,${names}\n${year.map((h) => `${iso(h.minute)},${h.temperature},${cells}`).join('\n')}`;

  it.each([
    ['dew point,RH', '1,80', 'relative', 80],
    ['wet bulb,dew point', '2,1', 'dewPoint', 1],
    ['wet bulb temperature', '2', 'wetBulb', 2],
    ['RH,dew point', ',1', 'dewPoint', 1],
  ] as const)('of %s: the first of relative humidity, dew point and wet bulb', (names, cells, kind, value) => {
    const { series } = read(humid(names, cells));
    expect(series?.humidity?.kind).toBe(kind);
    expect(series?.humidity?.values[17]).toBe(value);
  });

  it('a column chosen or refused by the settings comes first', () => {
    expect(read(humid('dew point,RH', '1,80'), { columns: { dewPoint: 'dew point' } }).series?.humidity?.kind).toBe(
      'dewPoint',
    );
    expect(read(humid('dew point,RH', '1,80'), { columns: { relativeHumidity: false } }).series?.humidity?.kind).toBe(
      'dewPoint',
    );
    expect(
      read(humid('dew point,RH', '1,80'), { columns: { relativeHumidity: false, dewPoint: false } }).series?.humidity,
    ).toBeUndefined();
  });

  it('a dew point without a unit has that of the temperature', () => {
    const { series } = read(humid('dew point', '50').replace('temperature', 'temperature (°F)'));
    expect(series?.humidity?.values[0]).toBeCloseTo(10, 12);
  });
});

describe('leap years', () => {
  it('a real year with 29 February has 8784 hours', () => {
    const leap = syntheticYear(2020);
    const { series } = read(plainFile(leap));
    expect(series?.hours).toBe(8784);
    expect(series?.temperature[59 * 24 + 5]).toBe(leap[59 * 24 + 5]!.temperature);
  });

  it('a year of 8760 hours under the stamps of a leap year skips its 29 February', () => {
    const leap = syntheticYear(2020).filter((h) => !(parts(h.minute).m === 2 && parts(h.minute).d === 29));
    const { series, problems } = read(plainFile(leap));
    expect(problems).toEqual([]);
    expect(series?.hours).toBe(8760);
    expect(series?.temperature[59 * 24]).toBe(leap[59 * 24]!.temperature);
  });

  it('24:00 of 28 February written as 29 February 00:00 makes no leap year', () => {
    const stamp = (m: number) => {
      const p = parts(m + 60, true);
      // The February of this typical year comes from a leap year, so its last midnight is written as 29 February.
      const february = p.m === 2 && p.d === 28 && p.h === 24;
      return february ? '2004-02-29T00:00' : iso(m + 60).replace(/^\d{4}/, p.m === 2 ? '2004' : '2005');
    };
    const text = plainFile(year, stamp);
    const { series, problems } = read(text, { stamps: 'end' });
    expect(problems).toEqual([]);
    expect(series?.hours).toBe(8760);
    expect(series?.temperature[59 * 24 - 1]).toBe(year[59 * 24 - 1]!.temperature);
    // Also where the stamps are taken as beginnings: the midnight is then the first hour of March.
    const begun = read(text, { stamps: 'begin' }).series;
    expect(begun?.hours).toBe(8760);
    expect(begun?.temperature[59 * 24]).toBe(year[59 * 24 - 1]!.temperature);
  });
});

describe('several years', () => {
  it('the named year may run some hours over its end because of its offset', () => {
    const text = [header, ...plainRows(year, (m) => `${iso(m - 60)}Z`)].join('\n');
    const { series, problems } = read(text, { year: 2019 });
    expect(problems).toEqual([]);
    expect(series?.offsetMinutes).toBe(0);
    // 23:00 UTC of 31 December 2018 stands for the last hour of the periodic year.
    expect(series?.temperature[8759]).toBe(year[0]!.temperature);
    expect(series?.temperature[0]).toBe(year[1]!.temperature);
  });

  it('a last row that opens the next year is named as such', () => {
    const text = `${plainFile(year)}2020-01-01T00:00,9,50,0,1000\n`;
    expect(read(text).problems).toMatchObject([
      { code: 'weather.several-years', found: '2019 (8760 rows), 2020 (1 row)' },
    ]);
    expect(read(text, { year: 2019 }).series?.temperature[0]).toBe(year[0]!.temperature);
  });
});

describe('order', () => {
  it('a file that runs backwards is sorted with a warning', () => {
    const { series, problems, recognised } = read([header, ...rows.toReversed()].join('\n'));
    expect(problems.map((p) => [p.code, p.severity])).toEqual([['weather.disorder', 'warning']]);
    expect(recognised.sorted).toBe(true);
    expect([...series!.temperature]).toEqual(year.map((h) => h.temperature));
  });

  it('months in another order are sorted with a warning', () => {
    const month = (m: number) => rows.filter((_, i) => parts(year[i]!.minute).m === m);
    const text = [header, ...[1, 3, 2, 4, 5, 6, 7, 8, 9, 10, 12, 11].flatMap(month)].join('\n');
    const { series, problems } = read(text);
    expect(problems.map((p) => p.code)).toEqual(['weather.disorder']);
    expect([...series!.temperature]).toEqual(year.map((h) => h.temperature));
  });
});

describe('hours to 24', () => {
  const hours = (from: number, odd: Record<number, string>) =>
    [
      'date,time,temperature',
      ...year.map((h, i) => {
        const p = parts(h.minute + from * 60, from === 1);
        return odd[i] ?? `${p.y}-${pad(p.m)}-${pad(p.d)},${pad(p.h)}:00,${h.temperature}`;
      }),
    ].join('\n');

  it('are the ends of their hours only where no hour is 0', () => {
    expect(read(hours(1, {})).recognised).toMatchObject({ stamps: 'end', stampsDecidedBy: 'recognised' });
    const one24 = read(hours(0, { 48: `2019-01-02,24:00,${year[48]!.temperature}` }));
    expect(one24.recognised).toMatchObject({ stamps: 'begin', stampsDecidedBy: 'assumed' });
    expect(one24.series?.temperature[48]).toBe(year[48]!.temperature);
  });
});
