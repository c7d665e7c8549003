import { describe, expect, it } from 'vitest';
import {
  type HeatingSignature,
  heatingSignature,
  heatLossOfSignature,
  type MeteredPeriod,
} from '../../../src/sim/heatingSignature.ts';

/** A period of equal days. */
const period = (mean: number, dailyUse: number, days = 10): MeteredPeriod => ({
  use: dailyUse * days,
  dayMeans: new Float64Array(days).fill(mean),
});

function signatureOf(periods: MeteredPeriod[]): HeatingSignature {
  const result = heatingSignature(periods);
  if ('refused' in result) throw new Error(result.refused);
  return result.signature;
}

describe('a house of four periods, worked by hand', () => {
  // Base 15 °C, 5 kWh a degree day, 8 kWh a day. Degree days a day x = 17, 11, 5, 0; on the line y = 93, 63, 33, 8. The three
  // heated periods are then moved by +1, −2, +1, which turns no line through three points at equal distances, so that base,
  // slope and base use stay and Σr² = 6.
  // x̄ = 8.25, ȳ = 49.25; Σ(x − x̄)² = 162.75; Σ(y − ȳ)² = 44.75² + 11.75² + 15.25² + 41.25² = 4074.75; one degree of freedom.
  // What a shift of the base would do to x is 1, 1, 1, 0. Freed of that, x spreads as about its mean over the three
  // heated periods alone: 6² + 0² + 6² = 72.
  const signature = signatureOf([period(-2, 94), period(4, 61), period(10, 34), period(20, 8)]);

  it('is found with its base, slope and base use', () => {
    expect(signature.baseTemperature).toBe(15);
    expect(signature.slope).toBeCloseTo(5, 12);
    expect(signature.baseUse).toBeCloseTo(8, 12);
  });

  it('has the quality of its line', () => {
    expect(signature.degreesOfFreedom).toBe(1);
    expect(signature.rSquared).toBeCloseTo(1 - 6 / 4074.75, 12);
    expect(signature.cvRmse).toBeCloseTo(Math.sqrt(6) / 49.25, 12);
    expect(signature.slopeError).toBeCloseTo(Math.sqrt(6 / 162.75), 12);
    expect(signature.slopeErrorWithBase).toBeCloseTo(Math.sqrt(6 / 72), 12);
    // t for 95 % and one degree of freedom is tan(0.95·π/2).
    expect(signature.slopeMargin).toBeCloseTo(Math.tan(0.475 * Math.PI) * Math.sqrt(6 / 72), 9);
  });

  it('tells each period what it lies off the line', () => {
    expect(signature.periods.map(({ residual }) => residual)).toEqual([
      expect.closeTo(1, 9),
      expect.closeTo(-2, 9),
      expect.closeTo(1, 9),
      expect.closeTo(0, 9),
    ]);
    expect(signature.periods[1]).toMatchObject({ days: 10, dailyUse: 61, degreeDays: 11, coldShare: 1 });
    expect(signature.periods[3]).toMatchObject({ degreeDays: 0, coldShare: 0 });
  });
});

describe('the weights of a signature', () => {
  it('are the days: a period counts as often as it has days', () => {
    const long = [period(-2, 94, 20), period(4, 61, 10), period(10, 34, 10), period(20, 8, 10)];
    const twice = [period(-2, 94), period(-2, 94), period(4, 61), period(10, 34), period(20, 8)];
    const [one, two] = [signatureOf(long), signatureOf(twice)];
    expect(one.baseTemperature).toBe(two.baseTemperature);
    expect(one.slope).toBeCloseTo(two.slope, 12);
    expect(one.rSquared).toBeCloseTo(two.rSquared, 12);
    // Heavier by days, but no further reading: two degrees of freedom against one.
    expect(one.slopeError).toBeCloseTo(two.slopeError * Math.SQRT2, 12);
  });
});

describe('the base temperature', () => {
  it('is the lowest of those that fit alike', () => {
    // All days are colder than 8 °C: every base gives the same line.
    const winter = [period(-6, 80), period(-3, 68), period(0, 55), period(3, 41), period(5, 34)];
    expect(signatureOf(winter).baseTemperature).toBe(8);
  });

  it('counts degree days day by day, not by the mean of the period', () => {
    // Five days of 5 °C and five of 25 °C: to base 15 °C that is 5 K·d a day, though the mean is 15 °C.
    const mixed = { use: 10 * 33, dayMeans: Float64Array.of(5, 5, 5, 5, 5, 25, 25, 25, 25, 25) };
    const signature = signatureOf([period(-2, 93), period(4, 63), mixed, period(20, 8)]);
    expect(signature.baseTemperature).toBe(15);
    expect(signature.periods[2]).toMatchObject({ degreeDays: 5, coldShare: 0.5 });
  });
});

describe('a signature is refused', () => {
  it('for fewer than four periods', () => {
    expect(heatingSignature([period(-2, 94), period(4, 61), period(20, 8)])).toEqual({ refused: 'fewPeriods' });
    expect(heatingSignature([])).toEqual({ refused: 'fewPeriods' });
  });

  it('without a day below 22 °C', () => {
    const summer = [period(22, 8), period(24, 9), period(26, 8), period(23, 7)];
    expect(heatingSignature(summer)).toEqual({ refused: 'noColdDays' });
  });

  it('where all periods were equally cold', () => {
    expect(heatingSignature([period(4, 60), period(4, 62), period(4, 61), period(4, 63)])).toEqual({
      refused: 'alike',
    });
  });

  it('where two temperatures alone cannot tell slope from base', () => {
    expect(heatingSignature([period(4, 60), period(4, 62), period(20, 8), period(20, 9)])).toEqual({
      refused: 'alike',
    });
  });

  it('where the daily use is the same but for the last digit', () => {
    const odd = { use: 71.00000000000001, dayMeans: new Float64Array(10).fill(-2) };
    expect(heatingSignature([odd, period(4, 7.1), period(10, 7.1), period(20, 7.1)])).toMatchObject({
      refused: 'noSlope',
    });
  });

  it('where the use falls as it gets colder, or stays the same', () => {
    const falls = heatingSignature([period(-2, 8), period(4, 33), period(10, 63), period(20, 94)]);
    expect(falls).toMatchObject({ refused: 'noSlope' });
    expect('slope' in falls && falls.slope).toBeLessThan(0);
    const same = heatingSignature([period(-2, 7.1), period(4, 7.1), period(10, 7.1), period(20, 7.1)]);
    expect(same).toMatchObject({ refused: 'noSlope' });
    const nothing = heatingSignature([period(-2, 0), period(4, 0), period(10, 0), period(20, 0)]);
    expect(nothing).toMatchObject({ refused: 'noSlope' });
  });
});

describe('heatLossOfSignature', () => {
  it('turns kWh a degree day into W/K', () => {
    // 4.8 kWh/(K·d) · 0.9 / 24 h = 0.18 kW/K.
    const loss = heatLossOfSignature({ slope: 4.8, slopeError: 0.2, slopeErrorWithBase: 0.24, slopeMargin: 0.48 }, 0.9);
    expect(loss.value).toBeCloseTo(180, 9);
    expect(loss.standardError).toBeCloseTo(7.5, 9);
    expect(loss.standardErrorWithBase).toBeCloseTo(9, 9);
    expect(loss.low).toBeCloseTo(162, 9);
    expect(loss.high).toBeCloseTo(198, 9);
  });
});

it('refuses a use that is the same, warm or cold, on the mean, but not in each period', () => {
  // two cold periods and two warm ones, each pair with a use of 2 a day on the mean: a level line with a residual
  const result = heatingSignature([period(0, 1), period(0, 3), period(10, 1), period(10, 3)]);
  expect(result).toEqual({ refused: 'noSlope', slope: 0 });
});

it('counts as cold the days below the base, and not one that is just as warm', () => {
  // the house worked by hand, with a fifth period at its base of 15 °C and its base use of 8
  const { baseTemperature, periods } = signatureOf([
    ...[period(-2, 94), period(4, 61), period(10, 34), period(20, 8)],
    period(15, 8),
  ]);
  expect(baseTemperature).toBe(15);
  expect(periods.map(({ coldShare }) => coldShare)).toEqual([1, 1, 1, 0, 0]);
});
