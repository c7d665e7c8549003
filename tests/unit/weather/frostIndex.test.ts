import { expect, test } from 'vitest';
import { frostIndex } from '../../../src/weather/frostIndex.ts';
import { humidityRatioFromRelativeHumidity } from '../../../src/weather/humidAir/humidityRatio.ts';

const SEA_LEVEL = 101_325;
const atHumidity = (t: number, relativeHumidity: number, pressure = SEA_LEVEL) =>
  frostIndex(t, humidityRatioFromRelativeHumidity(t, relativeHumidity, pressure), pressure);

test('air of 2 °C at 84 % has the index 1, at any pressure', () => {
  for (const pressure of [70_000, 90_000, SEA_LEVEL]) expect(atHumidity(2, 84, pressure)).toBeCloseTo(1, 12);
});

test('from 8 °C upwards there is no frost, however damp the air', () => {
  expect(atHumidity(8, 100)).toBe(0);
  expect(atHumidity(25, 100)).toBe(0);
  expect(atHumidity(7.9, 100)).toBeGreaterThan(0);
});

test('air of 5 °C, whose coil is at −3 °C, keeps half of what settles; the rest runs off', () => {
  // The coil of air of 5 °C is at −3 °C: half of 6 K. 475.7 Pa over ice at −3 °C, 733 Pa at 84 % of 872.49 Pa, and for the
  // reference 593.0 and 368.7 Pa: 0.5 · (733 − 475.7)/(593 − 368.7) = 0.57; the nearby ratios differ by 0.2 %.
  expect(atHumidity(5, 84)).toBeGreaterThan(0.565);
  expect(atHumidity(5, 84)).toBeLessThan(0.58);
});

test('air drier than the ice of its coil leaves no frost', () => {
  expect(atHumidity(0, 45)).toBe(0);
  expect(frostIndex(-10, 0, SEA_LEVEL)).toBe(0);
});

test('the index ends at 1.5', () => {
  expect(frostIndex(2, 0.02, SEA_LEVEL)).toBe(1.5);
});
