import { describe, expect, it } from 'vitest';
import { fiveQuantiles } from '../../../../../src/batch/fiveQuantiles.ts';
import { partedValues } from '../../../../../src/batch/partedValues.ts';
import { axisSpreads, bestValues } from '../../../../../src/report/html/batch/axisSpread.ts';
import {
  homesOfYears,
  valueGroups,
  valueNames,
  valueOfJob,
  variedAxes,
} from '../../../../../src/report/html/batch/axisValues.ts';
import { edgeDecimals, valueClasses } from '../../../../../src/report/html/batch/valueClasses.ts';
import { batchReportOf, sampleBatch } from './batchReports.ts';

describe('five quantiles', () => {
  it('stand at their places among the sorted values, gaps left out', () => {
    // Type 7 of Hyndman and Fan 1996: of 0 … 100 the quantile p is 100·p.
    const values = Float64Array.from({ length: 101 }, (_, i) => (i * 37) % 101);
    expect(fiveQuantiles(Float64Array.of(...values, Number.NaN))).toEqual({
      ...{ count: 101, q05: 5, q25: 25, median: 50, q75: 75, q95: 95 },
    });
  });

  it('are none of nothing', () => {
    expect(fiveQuantiles(Float64Array.of(Number.NaN))).toBeUndefined();
  });
});

describe('values parted by groups', () => {
  it('keep their order, and those without a group or a value are left out', () => {
    const groups = [0, 1, 0, -1, 1, 7];
    const parts = partedValues(Float64Array.of(1, 2, 3, 4, Number.NaN, 6), 3, (place) => groups[place]!);
    expect(parts.map((part) => [...part])).toEqual([[1, 3], [2], []]);
  });
});

describe('axes of a batch', () => {
  const axes = [
    { name: 'a', values: ['x', 'y'] },
    { name: 'one', values: [1] },
    { name: 'b', values: [1, 2, 3] },
  ];

  it('give each job its values, the last axis changing first', () => {
    const jobs = [1, 2, 3, 4, 5, 6, 7];
    expect(jobs.map(valueOfJob({ axes }, 0))).toEqual([0, 0, 0, 1, 1, 1, 0]);
    expect(jobs.map(valueOfJob({ axes }, 2))).toEqual([0, 1, 2, 0, 1, 2, 0]);
  });

  it('count as varied where they have several values, the longest first', () => {
    expect(variedAxes({ axes })).toEqual([2, 0]);
  });

  it('give each year its home, of those that have years', () => {
    expect(homesOfYears(Float64Array.of(3, 4, 9, 10, 11), 2)).toEqual({ count: 3, of: Int32Array.of(0, 0, 1, 1, 2) });
  });

  it('call files by their own names where that tells them apart', () => {
    expect(valueNames({ name: 'u', values: ['a/x.yaml', 'b/y.yml'] })).toEqual(['x', 'y']);
    expect(valueNames({ name: 'u', values: ['a/x.yaml', 'b/x.yaml'] })).toEqual(['a/x.yaml', 'b/x.yaml']);
    expect(valueNames({ name: 'u', values: [true, 2] })).toEqual(['true', '2']);
  });

  it('keep their values apart where all have room', () => {
    expect(valueGroups(['1', '2'], 2)).toEqual({ names: ['1', '2'], size: 1 });
  });
});

describe('the spread by an axis', () => {
  const input = batchReportOf({
    homes: 5,
    axes: [{ name: 'unit', values: ['a', 'b', 'c'] }],
    year: (home, [unit]) =>
      unit === 'c' ? { fails: true } : { cost: (unit === 'a' ? 200 : 100) + home, h4: unit === 'a' ? 4 : 3 },
  });

  it('is that of the years with each value', () => {
    // Of 200 … 204 the quantile p is 200 + 4·p.
    const spread = { count: 5, q05: 200.2, q25: 201, median: 202, q75: 203, q95: 203.8 };
    expect(axisSpreads(input)).toMatchObject([
      { axis: 'unit', values: [{ name: 'a' }, { name: 'b' }, { name: 'c', spread: undefined }] },
    ]);
    for (const [key, value] of Object.entries(spread)) {
      expect(axisSpreads(input)[0]!.values[0]!.spread![key as 'q05']).toBeCloseTo(value, 9);
    }
  });

  it('names the value with the best median: least cost, greatest factor', () => {
    expect(bestValues(input)).toEqual([{ axis: 'unit', name: 'b', median: 102 }]);
    expect(bestValues({ ...input, by: 'seasonalFactor' })).toEqual([{ axis: 'unit', name: 'a', median: 4 }]);
  });

  it('compares nothing where one value alone has the figure', () => {
    const lonely = batchReportOf({
      axes: [{ name: 'unit', values: ['a', 'b'] }],
      year: (_, [unit]) => (unit === 'a' ? { cost: 1 } : { fails: true }),
    });
    expect(bestValues(lonely)).toEqual([]);
  });
});

describe('classes of values', () => {
  it('have round edges, hold every value once, and leave none out between', () => {
    const classes = valueClasses(Float64Array.of(0.1, 0.2, 0.3, 1.4, Number.NaN));
    expect(classes.map(({ count }) => count).reduce((a, b) => a + b)).toBe(4);
    for (let i = 1; i < classes.length; i++) expect(classes[i]!.from).toBe(classes[i - 1]!.to);
    // 0.1 and 0.3 lie on edges: each in the class that begins there.
    expect(classes.filter(({ count }) => count > 0).map(({ from }) => from)).toEqual([0.1, 0.2, 0.3, 1.4]);
    expect(edgeDecimals(classes)).toBe(1);
  });

  it('take values below zero, and values that are all the same', () => {
    expect(valueClasses(Float64Array.of(-250, 250))[0]!.from).toBeLessThanOrEqual(-250);
    expect(valueClasses(Float64Array.of(7, 7))).toEqual([{ from: 7, to: 7, count: 2 }]);
    expect(valueClasses(Float64Array.of())).toEqual([]);
  });

  it('are few, however many values there are', () => {
    expect(valueClasses(Float64Array.from({ length: 5000 }, (_, i) => Math.sqrt(i))).length).toBeLessThan(30);
  });
});

describe('the years of a batch', () => {
  const { years } = sampleBatch();

  it('are counted with those that failed and with the kinds of their warnings', () => {
    expect([years.rows, years.failed]).toEqual([72, 12]);
    // 10 homes run; 3 units of each at 55 °C; of home 3 all six years.
    expect(years.warnings).toEqual([
      ['map.outside', 30],
      ['size.far-under', 6],
    ]);
    expect(years.causes.map(({ code, years: count }) => [code, count])).toEqual([['batch.worker-failed', 12]]);
    expect(years.causes[0]!.examples[0]).toMatchObject({ home: 'home 11', problem: { place: 'homes.csv:12:2' } });
  });

  it('have ten at either end', () => {
    expect(years.best.length).toBe(10);
    expect(years.best[0]).toMatchObject({ value: 900, home: 'home 1', axes: ['units/middle-8.yaml', 35] });
    expect(years.worst[0]).toMatchObject({ value: 900 + 360 + 90 + 250, home: 'home 10' });
  });
});
