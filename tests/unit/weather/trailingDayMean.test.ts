import { describe, expect, test } from 'vitest';
import { trailingDayMean } from '../../../src/weather/trailingDayMean.ts';

/** The mean written down plainly: hours i−23 … i, before the first the last of the year. */
function directMean(values: Float64Array, i: number): number {
  let sum = 0;
  for (let back = 0; back < 24; back++) sum += values[(i - back + values.length) % values.length] as number;
  return sum / 24;
}

describe('the mean of the last 24 hours', () => {
  test('equals the plain mean in every hour, the year taken as periodic', () => {
    const values = Float64Array.from({ length: 8784 }, (_, i) => 9 + 10 * Math.sin(i / 1398) + 6 * Math.sin(i * 1.7));
    const means = trailingDayMean(values);
    let worst = 0;
    for (let i = 0; i < values.length; i++)
      worst = Math.max(worst, Math.abs((means[i] as number) - directMean(values, i)));
    expect(means).toHaveLength(8784);
    // 1e-12 of the values, some 10 °C: the plain mean itself rounds 24 times.
    expect(worst).toBeLessThan(1e-11);
  });

  test('looks back over the turn of the year', () => {
    const values = new Float64Array(8760);
    values[8759] = 24;
    const means = trailingDayMean(values);
    expect([...means.subarray(0, 24)]).toEqual([...new Array(23).fill(1), 0]);
    expect(means[8758]).toBe(0);
    expect(means[8759]).toBe(1);
  });

  test('is exactly nothing when the last 24 hours had nothing, after a year of large and small values', () => {
    const values = Float64Array.from({ length: 8760 }, (_, i) => (i < 8000 ? 900 * Math.abs(Math.sin(i)) : 0));
    const means = trailingDayMean(values);
    expect([...means.subarray(8023)]).toEqual(new Array(737).fill(0));
  });

  test('is exactly 15 for readings in tenths whose mean is 15, so that a heating limit of 15 °C is met', () => {
    // An invented day that adds up to 360.0 on paper; a plain sum of it misses 360 by an ulp in most of its windows.
    const dayOfTenths = [
      15.8, 21.5, 18.9, 19.9, 15.4, 6.2, 23.6, 6.4, 17.3, 18.6, 23.4, 13.7, 7.7, 17.4, 9.3, 13.6, 15, 16.5, 9.9, 9.9,
      7.8, 23.6, 18.2, 10.4,
    ];
    const values = Float64Array.from({ length: 8760 }, (_, i) => dayOfTenths[i % 24] as number);
    expect([...new Set(trailingDayMean(values))]).toEqual([15]);
  });
});
