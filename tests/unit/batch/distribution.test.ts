import { describe, expect, it } from 'vitest';
import { distribution } from '../../../src/batch/distribution.ts';
import { GrowingColumn } from '../../../src/batch/growingColumn.ts';

describe('the distribution of a figure', () => {
  it('has its mean and quantiles', () => {
    // 0 … 10 evenly: the quantile p lies at 10·p by linear interpolation (type 7 of Hyndman and Fan 1996)
    const values = Float64Array.from([10, 0, 5, 1, 9, 2, 8, 3, 7, 4, 6]);
    expect(distribution(values)).toEqual({
      ...{ count: 11, mean: 5, least: 0, q10: 1, q25: 2.5, median: 5, q75: 7.5, q90: 9, most: 10 },
    });
    expect(distribution(Float64Array.of(1, 2, 3, 4))?.median).toBe(2.5);
    // n = 4: the places 0.3, 0.75, 2.25 and 2.7 lie between two values; the mean of the two would be 6, 6, 24 and 24
    const uneven = distribution(Float64Array.of(4, 8, 16, 32));
    const quantiles = [uneven?.q10, uneven?.q25, uneven?.q75, uneven?.q90];
    for (const [i, expected] of [5.2, 7, 20, 27.2].entries()) expect(quantiles[i]).toBeCloseTo(expected, 12);
  });

  it('leaves out what is no number, and is nothing where nothing is left', () => {
    expect(distribution(Float64Array.of(Number.NaN, 4, Number.NaN))).toMatchObject({
      count: 1,
      mean: 4,
      least: 4,
      most: 4,
    });
    expect(distribution(Float64Array.of(Number.NaN))).toBeUndefined();
    expect(distribution(new Float64Array(0))).toBeUndefined();
  });

  it('leaves the values where they were', () => {
    const values = Float64Array.of(3, 1, 2);
    distribution(values);
    expect([...values]).toEqual([3, 1, 2]);
  });
});

describe('a growing column', () => {
  it('keeps every value in its order, however many come', () => {
    const column = new GrowingColumn();
    for (let i = 0; i < 5000; i++) column.add(i);
    expect(column.values.length).toBe(5000);
    expect(column.values.every((value, i) => value === i)).toBe(true);
  });
});
