import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fixedPower, powerOf } from '../../../src/core/power.ts';

/**
 * Relative error beside the general power of the language, which is itself good to about one unit in the last place: a few
 * 1e-16 as the prepared power promises, so 1e-15.
 */
const ROUNDING = 1e-15;
const error = (exponent: number, x: number) => Math.abs(powerOf(fixedPower(exponent), x) / x ** exponent - 1);

describe('the power 1/n of the emitters, prepared', () => {
  test('is the general power to rounding, for every exponent and share of load', () => {
    const anyExponent = fc.double({ min: 1 / 1.6, max: 1, noNaN: true });
    const anyLoad = fc.oneof(
      fc.double({ min: 0.001, max: 2, noNaN: true }),
      fc.double({ min: -63, max: 17, noNaN: true }).map((power) => 2 ** power),
    );
    const law = fc.property(anyExponent, anyLoad, (exponent, x) => {
      expect(error(exponent, x)).toBeLessThanOrEqual(ROUNDING);
    });
    fc.assert(law, { seed: 20_250_217, numRuns: 5000 });
  });

  test('holds at the ends of its intervals and scales', () => {
    const edges = [...Array(129).keys()].flatMap((j) => [1 + j / 128, (1 + j / 128) * (1 - 1e-15), (1 + j / 128) / 8]);
    const worst = Math.max(...edges.map((x) => error(1 / 1.3, x)), error(1 / 1.3, 2 ** 16), error(1 / 1.3, 2 ** -64));
    expect(worst).toBeLessThanOrEqual(ROUNDING);
  });

  test('of nothing is nothing, and the square root of nine is three', () => {
    expect(powerOf(fixedPower(1 / 1.3), 0)).toBe(0);
    expect(powerOf(fixedPower(1 / 1.3), 2 ** -65)).toBe(0);
    expect(Math.abs(powerOf(fixedPower(0.5), 9) - 3)).toBeLessThanOrEqual(ROUNDING * 3);
  });
});
