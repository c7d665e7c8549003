import { describe, expect, it } from 'vitest';
import { studentT } from '../../../src/sim/studentT.ts';
import { weightedLine } from '../../../src/sim/weightedLine.ts';

describe('weightedLine', () => {
  it('goes through points on a line whatever their weights', () => {
    const line = weightedLine({ x: [0, 1, 2], y: [1, 3, 5], weight: [1, 30, 7] });
    expect(line?.slope).toBeCloseTo(2, 12);
    expect(line?.intercept).toBeCloseTo(1, 12);
    expect(line?.residualSum).toBeCloseTo(0, 12);
  });

  it('keeps its digits far from zero', () => {
    // At 1e8 the sums of raw squares keep no digit of a spread of 2: products of 1e16 are spaced 2 apart.
    const line = weightedLine({ x: [1e8, 1e8 + 1, 1e8 + 2], y: [0.1, 0.3, 0.5], weight: [28, 30, 31] });
    expect(line?.slope).toBeCloseTo(0.2, 9);
  });

  it('knows no line through points one above the other', () => {
    expect(weightedLine({ x: [5, 5, 5], y: [1, 2, 3], weight: [1, 1, 1] })).toBeUndefined();
    expect(weightedLine({ x: [0, 0, 0], y: [1, 2, 3], weight: [1, 1, 1] })).toBeUndefined();
    expect(weightedLine({ x: [0.1 + 0.2, 0.3, 0.3], y: [1, 2, 3], weight: [1, 1, 1] })).toBeUndefined();
  });
});

describe('studentT', () => {
  it('gives no number where there is none to give', () => {
    expect(studentT(0.95, 0)).toBe(0);
    expect(studentT(1, 5)).toBe(0);
    expect(studentT(Number.NaN, 5)).toBe(0);
  });
});
