import { describe, expect, it } from 'vitest';
import { cosineOfTurns } from '../../../src/core/turn.ts';

describe('the cosine of an angle in turns', () => {
  // Exact values: Abramowitz and Stegun 1964, table 4.3.46 (multiples of 30° and 45°).
  it.each([
    [0, 1],
    [1 / 12, Math.sqrt(3) / 2],
    [1 / 8, Math.SQRT1_2],
    [1 / 6, 0.5],
    [1 / 4, 0],
    [1 / 3, -0.5],
    [1 / 2, -1],
    [3 / 4, 0],
    [-1 / 3, -0.5],
    [5, 1],
    [2.5, -1],
  ])('of %d is %d', (turns, value) => {
    // two roundings of numbers up to 1
    expect(Math.abs(cosineOfTurns(turns) - value)).toBeLessThan(2.3e-16);
  });

  it('is that of the language to rounding, all the way round', () => {
    for (let k = -5000; k <= 5000; k++) {
      const turns = k / 1777;
      // the language is asked for an angle that is rounded itself: up to 20 rad, 4e-15
      expect(Math.abs(cosineOfTurns(turns) - Math.cos(2 * Math.PI * turns))).toBeLessThan(5e-15);
    }
  });
});
