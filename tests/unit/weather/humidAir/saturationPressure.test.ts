import { expect, test } from 'vitest';
import {
  saturationPressureOverIce,
  saturationPressureOverWater,
} from '../../../../src/weather/humidAir/saturationPressure.ts';

test('the documented examples hold', () => {
  // Half of the last printed digit.
  expect(Math.abs(saturationPressureOverWater(20) - 2338.8)).toBeLessThanOrEqual(0.05);
  expect(Math.abs(saturationPressureOverIce(-10) - 259.9)).toBeLessThanOrEqual(0.005);
});

test('below freezing, supercooled water holds more vapour than ice, and the more so the colder', () => {
  const excess = [-5, -10, -20, -40].map((t) => saturationPressureOverWater(t) / saturationPressureOverIce(t));
  expect(excess[0]).toBeGreaterThan(1.04);
  for (let i = 1; i < excess.length; i++) expect(excess[i]).toBeGreaterThan(excess[i - 1] as number);
});

test('outside the range of the equations the end is held', () => {
  expect(saturationPressureOverWater(-300)).toBe(saturationPressureOverWater(-100));
  expect(saturationPressureOverWater(1e300)).toBe(saturationPressureOverWater(200));
  expect(saturationPressureOverIce(-300)).toBe(saturationPressureOverIce(-100));
  expect(saturationPressureOverIce(5)).toBe(saturationPressureOverIce(0));
});
