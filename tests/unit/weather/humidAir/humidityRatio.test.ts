import { expect, test } from 'vitest';
import {
  humidityRatio,
  humidityRatioFromDewPoint,
  humidityRatioFromRelativeHumidity,
} from '../../../../src/weather/humidAir/humidityRatio.ts';
import { humidityRatioFromWetBulb } from '../../../../src/weather/humidAir/wetBulb.ts';

const SEA_LEVEL = 101_325;

test('the documented examples hold', () => {
  // Each within half of its last digit. 50 % at 20 °C: 0.0072617 also by the library psychrolib.
  expect(Math.abs(humidityRatio(1000, SEA_LEVEL) - 0.0061993)).toBeLessThanOrEqual(0.5e-7);
  expect(Math.abs(humidityRatioFromRelativeHumidity(20, 50, SEA_LEVEL) - 0.0072617)).toBeLessThanOrEqual(0.5e-7);
  expect(Math.abs(humidityRatioFromDewPoint(20, 10, SEA_LEVEL) - 0.0076301)).toBeLessThanOrEqual(0.5e-7);
  expect(Math.abs(humidityRatioFromWetBulb(7, 6, SEA_LEVEL) - 0.005386)).toBeLessThanOrEqual(0.5e-6);
});

test('relative humidity is held between 0 and 100 %', () => {
  expect(humidityRatioFromRelativeHumidity(5, -3, SEA_LEVEL)).toBe(0);
  expect(humidityRatioFromRelativeHumidity(5, 104, SEA_LEVEL)).toBe(
    humidityRatioFromRelativeHumidity(5, 100, SEA_LEVEL),
  );
});

test('a dew point or a wet bulb above the dry bulb is held at the dry bulb', () => {
  expect(humidityRatioFromDewPoint(5, 5.1, SEA_LEVEL)).toBe(humidityRatioFromDewPoint(5, 5, SEA_LEVEL));
  expect(humidityRatioFromWetBulb(5, 5.1, SEA_LEVEL)).toBe(humidityRatioFromWetBulb(5, 5, SEA_LEVEL));
  expect(humidityRatioFromWetBulb(-5, -4.9, SEA_LEVEL)).toBe(humidityRatioFromWetBulb(-5, -5, SEA_LEVEL));
});

test('a wet bulb at the dry bulb means air saturated over ice in frost and over water from 0 °C', () => {
  // 401.76 Pa over ice at −5 °C, 611.21 Pa over water at 0 °C (ASHRAE Fundamentals, chapter 1): good to 1e-5.
  expect(humidityRatioFromWetBulb(-5, -5, SEA_LEVEL)).toBeCloseTo((0.621945 * 401.76) / (SEA_LEVEL - 401.76), 7);
  expect(humidityRatioFromWetBulb(0, 0, SEA_LEVEL)).toBeCloseTo((0.621945 * 611.21) / (SEA_LEVEL - 611.21), 7);
  // Over water the air of −5 °C would have 421.9 Pa: 5 % more.
  expect(humidityRatioFromDewPoint(-5, -5, SEA_LEVEL)).toBeGreaterThan(
    1.04 * humidityRatioFromWetBulb(-5, -5, SEA_LEVEL),
  );
});

test('a wet bulb too low to be true means dry air', () => {
  expect(humidityRatioFromWetBulb(30, -20, SEA_LEVEL)).toBe(0);
});

test('vapour that would exceed the air pressure is held at 99 % of it', () => {
  // 0.621945 · 0.99 / 0.01 = 61.57.
  expect(humidityRatio(5e5, SEA_LEVEL)).toBeCloseTo(61.573, 3);
  expect(humidityRatio(-10, SEA_LEVEL)).toBe(0);
});

test('an impossible air pressure counts as 10 000 Pa', () => {
  expect(humidityRatio(500, 0)).toBe(humidityRatio(500, 10_000));
  expect(humidityRatio(500, -3)).toBe(humidityRatio(500, 10_000));
});
