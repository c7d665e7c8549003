import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { coolingDegreeDays, type DegreeDayMethod, heatingDegreeDays } from '../../src/weather/degreeDays.ts';
import { frostIndex } from '../../src/weather/frostIndex.ts';
import {
  humidityRatio,
  humidityRatioFromDewPoint,
  humidityRatioFromRelativeHumidity,
} from '../../src/weather/humidAir/humidityRatio.ts';
import { saturationPressureOverWater } from '../../src/weather/humidAir/saturationPressure.ts';
import { standardPressure } from '../../src/weather/humidAir/standardPressure.ts';
import { humidityRatioFromWetBulb } from '../../src/weather/humidAir/wetBulb.ts';

const RUNS = { seed: 20_250_101, numRuns: 60 };
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const anyNumber = fc.double({ noNaN: true, noDefaultInfinity: true });
/** Degree-day sums are some thousand K·d of 8760 rounded additions. */
const ROUNDING = 1e-8;

const base = between(5, 25);
const everyMethod: readonly DegreeDayMethod[] = ['hours', 'mean', 'minmax', 'fourcase', 'threshold'];
/** The methods that look at the base asked for. */
const based = fc.constantFrom<DegreeDayMethod>('hours', 'mean', 'minmax', 'fourcase');

/** A stretch of hours repeated until the year is full; its length is not a whole number of days. */
const year = fc
  .tuple(fc.array(between(-25, 40), { minLength: 25, maxLength: 70 }), fc.constantFrom(8760, 8784))
  .map(([stretch, hours]) => Float64Array.from({ length: hours }, (_, i) => stretch[i % stretch.length] as number));

describe('degree days', () => {
  test('the hours of a day never have less than its mean (Jensen)', () => {
    const law = fc.property(year, base, (temperature, b) => {
      const { monthly } = heatingDegreeDays(temperature, b, 'mean');
      heatingDegreeDays(temperature, b, 'hours').monthly.forEach((value, month) => {
        expect(value).toBeGreaterThanOrEqual((monthly[month] as number) - ROUNDING);
      });
    });
    fc.assert(law, RUNS);
  });

  test('a higher base never has fewer', () => {
    const law = fc.property(year, base, between(0, 10), based, (temperature, b, more, method) => {
      const lower = heatingDegreeDays(temperature, b, method).annual;
      expect(heatingDegreeDays(temperature, b + more, method).annual).toBeGreaterThanOrEqual(lower - ROUNDING);
    });
    fc.assert(law, RUNS);
  });

  test('a colder year never has fewer, by any method', () => {
    const law = fc.property(year, year, base, (temperature, other, b) => {
      const colder = temperature.map((t, i) => Math.min(t, other[i % other.length] as number));
      for (const method of everyMethod) {
        const milder = heatingDegreeDays(temperature, b, method).annual;
        expect(heatingDegreeDays(colder, b, method).annual, method).toBeGreaterThanOrEqual(milder - ROUNDING);
      }
    });
    fc.assert(law, RUNS);
  });

  test('temperatures and base may be counted from another zero', () => {
    const law = fc.property(year, base, between(-40, 40), based, (temperature, b, shift, method) => {
      const shifted = heatingDegreeDays(
        temperature.map((t) => t + shift),
        b + shift,
        method,
      ).annual;
      expect(Math.abs(shifted - heatingDegreeDays(temperature, b, method).annual)).toBeLessThan(ROUNDING);
    });
    fc.assert(law, RUNS);
  });

  test('temperatures and base in another unit give degree days in that unit', () => {
    const law = fc.property(year, base, between(0.1, 3), based, (temperature, b, scale, method) => {
      const scaled = heatingDegreeDays(
        temperature.map((t) => t * scale),
        b * scale,
        method,
      ).annual;
      expect(Math.abs(scaled - scale * heatingDegreeDays(temperature, b, method).annual)).toBeLessThan(ROUNDING);
    });
    fc.assert(law, RUNS);
  });

  test('heating less cooling is the distance of the year’s mean (or middle) from the base', () => {
    const law = fc.property(year, base, (temperature, b) => {
      const days = temperature.length / 24;
      const net = (method: DegreeDayMethod) =>
        heatingDegreeDays(temperature, b, method).annual - coolingDegreeDays(temperature, b, method).annual;
      let ofMeans = 0;
      let ofMiddles = 0;
      for (let day = 0; day < days; day++) {
        const hours = temperature.subarray(24 * day, 24 * day + 24);
        ofMeans += b - hours.reduce((sum, t) => sum + t, 0) / 24;
        ofMiddles += b - (Math.max(...hours) + Math.min(...hours)) / 2;
      }
      expect(Math.abs(net('hours') - ofMeans)).toBeLessThan(ROUNDING);
      expect(Math.abs(net('mean') - ofMeans)).toBeLessThan(ROUNDING);
      expect(Math.abs(net('minmax') - ofMiddles)).toBeLessThan(ROUNDING);
      expect(Math.abs(net('fourcase') - ofMiddles)).toBeLessThan(ROUNDING);
    });
    fc.assert(law, RUNS);
  });

  test('the months sum to the year, by any method', () => {
    const law = fc.property(year, base, fc.constantFrom(...everyMethod), (temperature, b, method) => {
      for (const { annual, monthly } of [
        heatingDegreeDays(temperature, b, method),
        coolingDegreeDays(temperature, b, method),
      ]) {
        expect(monthly).toHaveLength(12);
        expect(Math.min(...monthly)).toBeGreaterThanOrEqual(0);
        expect(Math.abs(monthly.reduce((sum, value) => sum + value, 0) - annual)).toBeLessThan(ROUNDING);
      }
    });
    fc.assert(law, RUNS);
  });

  test('a month knows nothing of the days of other months', () => {
    const law = fc.property(year, base, fc.constantFrom(...everyMethod), (temperature, b, method) => {
      const otherJanuary = temperature.map((t, i) => (i < 744 ? t - 5 : t));
      const before = heatingDegreeDays(temperature, b, method).monthly;
      expect(heatingDegreeDays(otherJanuary, b, method).monthly.slice(1)).toEqual(before.slice(1));
    });
    fc.assert(law, RUNS);
  });
});

/** The temperature at which a rising function has a value, by halving. */
function whereEqual(rising: (t: number) => number, value: number, from: number, to: number): number {
  let low = from;
  let high = to;
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (rising(middle) < value) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

const outdoor = between(-30, 40);
const percent = between(1, 100);
const airPressure = between(70_000, 105_000);

describe('humid air', () => {
  test('relative humidity, dew point and back: the humidity ratio is the same', () => {
    const law = fc.property(outdoor, percent, airPressure, (t, relativeHumidity, p) => {
      const ratio = humidityRatioFromRelativeHumidity(t, relativeHumidity, p);
      const vapour = (ratio * p) / (0.621945 + ratio);
      const dewPoint = whereEqual(saturationPressureOverWater, vapour, -100, t + 1);
      expect(Math.abs(humidityRatioFromDewPoint(t, dewPoint, p) / ratio - 1)).toBeLessThan(1e-9);
    });
    fc.assert(law, RUNS);
  });

  test('saturation pressure rises with temperature', () => {
    const law = fc.property(between(-60, 99), between(0.001, 10), (t, step) => {
      expect(saturationPressureOverWater(t + step)).toBeGreaterThan(saturationPressureOverWater(t));
    });
    fc.assert(law, RUNS);
  });

  test('the wet bulb lies between the dew point and the dry bulb', () => {
    const law = fc.property(between(1, 40), percent, airPressure, (t, relativeHumidity, p) => {
      const ratio = humidityRatioFromRelativeHumidity(t, relativeHumidity, p);
      const vapour = (ratio * p) / (0.621945 + ratio);
      const dewPoint = whereEqual(saturationPressureOverWater, vapour, -100, t + 1);
      // A wet bulb as low as the dew point would mean drier air, one as high as the dry bulb saturated air.
      if (dewPoint >= 0) expect(humidityRatioFromWetBulb(t, dewPoint, p)).toBeLessThanOrEqual(ratio + 1e-12);
      expect(humidityRatioFromWetBulb(t, t, p)).toBeGreaterThanOrEqual(ratio - 1e-12);
    });
    fc.assert(law, RUNS);
  });

  test('the same vapour is a larger share of thinner air', () => {
    const law = fc.property(between(50, 5000), between(0, 3000), between(10, 1000), (vapour, low, step) => {
      const above = humidityRatio(vapour, standardPressure(low + step));
      expect(above).toBeGreaterThan(humidityRatio(vapour, standardPressure(low)));
    });
    fc.assert(law, RUNS);
  });

  test('more water never makes less frost, and the index stays between 0 and 1.5', () => {
    const law = fc.property(between(-30, 12), percent, between(0, 50), airPressure, (t, relativeHumidity, more, p) => {
      const less = frostIndex(t, humidityRatioFromRelativeHumidity(t, relativeHumidity, p), p);
      const damper = frostIndex(t, humidityRatioFromRelativeHumidity(t, relativeHumidity + more, p), p);
      expect(less).toBeGreaterThanOrEqual(0);
      expect(damper).toBeGreaterThanOrEqual(less);
      expect(damper).toBeLessThanOrEqual(1.5);
    });
    fc.assert(law, { ...RUNS, numRuns: 300 });
  });

  test('no finite reading, however wrong, gives a ratio or an index that is not a number', () => {
    const law = fc.property(anyNumber, anyNumber, anyNumber, (a, b, c) => {
      const ratios = [
        humidityRatio(a, b),
        humidityRatioFromRelativeHumidity(a, b, c),
        humidityRatioFromDewPoint(a, b, c),
        humidityRatioFromWetBulb(a, b, c),
      ];
      for (const ratio of ratios) {
        expect(Number.isFinite(ratio)).toBe(true);
        expect(ratio).toBeGreaterThanOrEqual(0);
        const index = frostIndex(a, ratio, c);
        expect(index).toBeGreaterThanOrEqual(0);
        expect(index).toBeLessThanOrEqual(1.5);
      }
      expect(frostIndex(a, b, c)).toBeLessThanOrEqual(1.5);
      expect(standardPressure(a)).toBeGreaterThan(0);
    });
    fc.assert(law, { ...RUNS, numRuns: 1000 });
  });
});
