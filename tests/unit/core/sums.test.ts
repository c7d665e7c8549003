import { describe, expect, test } from 'vitest';
import { columnSum } from '../../../src/core/columnSum.ts';
import { compensatedSum } from '../../../src/core/sum.ts';

describe.each([
  ['compensatedSum', compensatedSum],
  ['columnSum', columnSum],
])('%s', (_, sum) => {
  const numbers = Float64Array.from({ length: 50 }, (_, i) => i + 1);

  test('sums a part, its first index in and its last out', () => {
    // whole numbers, exact: n(n + 1)/2
    expect(sum(numbers, 0, 50)).toBe(1275);
    for (const [from, to] of [
      [0, 7],
      [0, 8],
      [3, 20],
      [9, 50],
      [49, 50],
    ] as const) {
      expect(sum(numbers, from, to), `${from} … ${to}`).toBe((to * (to + 1)) / 2 - (from * (from + 1)) / 2);
    }
  });

  test('is 0 for nothing', () => {
    expect(sum(numbers, 5, 5)).toBe(0);
    expect(sum(new Float64Array(0), 0, 0)).toBe(0);
  });

  test('keeps what is small beside what is large and goes again', () => {
    // 2^60 and its opposite; the ones between would be lost, as a number of that size has steps of 256
    const column = new Float64Array(64).fill(1);
    column.fill(2 ** 60 / 8, 8, 16);
    column.fill(-(2 ** 60) / 8, 40, 48);
    expect(sum(column, 0, 64)).toBe(48);
    expect(column.reduce((total, value) => total + value, 0)).not.toBe(48);
  });

  test('sums a year of tenths as exactly as a number can hold it', () => {
    const year = new Float64Array(8760).fill(0.1);
    // 0.1 is held as 0.1 + 5.55e-18; 8760 of them are 876 + 4.9e-14, and 876 has steps of 1.1e-13
    expect(Math.abs(sum(year, 0, 8760) - 876)).toBeLessThanOrEqual(1.2e-13);
  });
});

test('compensatedSum takes all where no part is named, and any row of numbers', () => {
  expect(compensatedSum([1, 2, 3, 4])).toBe(10);
  expect(compensatedSum([1, 2, 3, 4], 2)).toBe(7);
  expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2);
});
