import { describe, expect, it } from 'vitest';
import { fixedPower, generalPower, powerOf, wholePower } from '../../../src/core/power.ts';

const EXPONENTS = [0.25, 1 / 1.3, 1 / 1.1, 1];

describe('a general power', () => {
  it.each([
    [9, 0.5, 3],
    [32, 0.2, 2],
    [1, 7.25, 1],
  ])('of %d to %d is %d', (x, exponent, value) => {
    // |exponent · ln x| is below 1: two roundings
    expect(Math.abs(generalPower(x, exponent) / value - 1)).toBeLessThan(5e-16);
  });
});

describe('a whole power', () => {
  it('is what repeated products are', () => {
    for (const x of [1.5, 0.97, 1, 2, 0]) {
      let product = 1;
      for (let n = 0; n <= 60; n++) {
        // up to 60 roundings on either side
        expect(Math.abs(wholePower(x, n) - product)).toBeLessThanOrEqual(1.4e-14 * product);
        product *= x;
      }
    }
  });
});

describe('a prepared power', () => {
  it('is that of the language within a few roundings over all scales', () => {
    for (const exponent of EXPONENTS) {
      const power = fixedPower(exponent);
      for (let scale = -64; scale <= 15; scale++) {
        for (const mantissa of [1, 1.0039, 1.3, 1.5, 1.999]) {
          const x = mantissa * 2 ** scale;
          // table, series and scale: five roundings of 1.1e-16, and as many of the exponential
          expect(Math.abs(powerOf(power, x) / x ** exponent - 1)).toBeLessThan(1e-15);
        }
      }
    }
  });

  it('goes on beyond its table', () => {
    expect(powerOf(fixedPower(0.5), 2 ** 20)).toBeCloseTo(1024, 10);
    expect(powerOf(fixedPower(0.5), 2 ** 40)).toBeCloseTo(2 ** 20, 6);
  });
});
