import { describe, expect, it } from 'vitest';
import { contourLines } from '../../../../src/report/charts/contourLines.ts';

const axis = (from: number, to: number, steps: number) =>
  Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps);

describe('lines of one value', () => {
  it('lie on the straight line of a field that rises evenly', () => {
    const x = axis(-2, 3, 5);
    const y = axis(0, 4, 4);
    // f = 2x + y; on the line y = 1 − 2x.
    const values = y.flatMap((b) => x.map((a) => 2 * a + b));
    const segments = contourLines({ x, y, values }, 1);
    expect(segments.length).toBeGreaterThan(3);
    for (const [x0, y0, x1, y1] of segments) {
      expect(y0).toBeCloseTo(1 - 2 * x0, 12);
      expect(y1).toBeCloseTo(1 - 2 * x1, 12);
    }
  });

  it('make a closed circle around a hill, its length that of the circle', () => {
    const x = axis(-2, 2, 80);
    const values = x.flatMap((b) => x.map((a) => a * a + b * b));
    // Not 1, on whose circle some corners of cells lie.
    const segments = contourLines({ x, y: x, values }, 1.013);
    const length = segments.reduce((sum, [x0, y0, x1, y1]) => sum + Math.hypot(x1 - x0, y1 - y0), 0);
    // Chords of cells of 0.05 fall short of the arc by less than (0.07/2)²/6 of it: 0.02 %.
    expect(Math.abs(length / (2 * Math.PI * Math.sqrt(1.013)) - 1)).toBeLessThan(1e-3);
    const ends = new Map<string, number>();
    for (const [x0, y0, x1, y1] of segments) {
      for (const end of [`${x0.toFixed(9)} ${y0.toFixed(9)}`, `${x1.toFixed(9)} ${y1.toFixed(9)}`]) {
        ends.set(end, (ends.get(end) ?? 0) + 1);
      }
    }
    expect([...ends.values()].filter((count) => count !== 2)).toEqual([]);
  });

  it('go around the high corners of a saddle whose middle is low, and the low ones whose middle is high', () => {
    const saddle = { x: [0, 1], y: [0, 1], values: [1, 0, 0, 1] };
    // Above 0.5 the middle is low: a line around each high corner, (0, 0) and (1, 1).
    const around = (level: number) =>
      contourLines(saddle, level).map(([x0, y0, x1, y1]) => Math.round(((x0 + x1) / 2 + (y0 + y1) / 2) * 10) / 10);
    expect(around(0.8).sort()).toEqual([0.2, 1.8]);
    expect(around(0.2).sort()).toEqual([1, 1]);
  });

  it('are none where the field does not reach the value', () => {
    expect(contourLines({ x: [0, 1], y: [0, 1], values: [0, 1, 2, 3] }, 7)).toEqual([]);
  });
});
