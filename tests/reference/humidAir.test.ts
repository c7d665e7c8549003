import { describe, expect, test } from 'vitest';
import {
  saturationPressureOverIce,
  saturationPressureOverWater,
} from '../../src/weather/humidAir/saturationPressure.ts';
import { standardPressure } from '../../src/weather/humidAir/standardPressure.ts';
import { humidityRatioFromWetBulb } from '../../src/weather/humidAir/wetBulb.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Humid air and water');
const overIce = accuracy.comparison({
  what: 'saturation pressure over ice, −20 … −5 °C',
  source: 'ASHRAE Handbook Fundamentals chapter 1 equation 5, evaluated apart from this project',
  unit: 'Pa',
  allowed: 0.005,
  why: 'half of the last printed digit',
});
const overWater = accuracy.comparison({
  what: 'saturation pressure over water, 0 … 100 °C',
  source: 'ASHRAE Handbook Fundamentals chapter 1 equation 6, evaluated apart from this project',
  unit: 'Pa',
  allowed: 0.05,
  why: 'half of the last printed digit, 0.05 or 0.005 Pa',
});
const iceTable = accuracy.comparison({
  what: 'saturation pressure over ice',
  source: 'a published table in millimetres of mercury',
  unit: '%',
  allowed: 0.3,
  why: 'an older formulation, three digits',
});
const boiling = accuracy.comparison({
  what: 'saturation pressure at boiling points, 60 … 100 °C',
  source: 'IAPWS-95',
  unit: '%',
  allowed: 0.1,
  why: 'agreement claimed between the formulations',
});
const ratio = accuracy.comparison({
  what: 'humidity ratio at rating points of heat pumps',
  source: 'EN 14511-2 points by the ASHRAE equations',
  unit: '%',
  allowed: 0.05,
  why: 'printed to 0.0005 g/kg',
});
const relative = accuracy.comparison({
  what: 'relative humidity there, over water and ice',
  source: 'EN 14511-2 points by the ASHRAE equations',
  unit: 'points',
  allowed: 0.05,
  why: 'half of the last printed digit',
});
const atmosphere = accuracy.comparison({
  what: 'pressure of the standard atmosphere, 0 … 3000 m',
  source: 'ISO 2533, published pressures',
  unit: 'Pa',
  allowed: 1,
  why: 'printed whole; the constants of the short equation are rounded',
});
const constants = accuracy.comparison({
  what: 'the same, −400 … 4000 m',
  source: 'ISO 2533, equation of its constants',
  unit: '%',
  allowed: 2e-5,
  why: 'the lapse rate of the short equation is rounded',
});

const SEA_LEVEL = 101_325;
const PASCAL_OF_ONE_MMHG = 133.322;

/** Asserts that `actual` lies within a share of `expected`. */
function expectWithin(actual: number, expected: number, share: number): void {
  expect(Math.abs(actual / expected - 1), `${actual} against ${expected}`).toBeLessThanOrEqual(share);
}

describe('saturation pressure', () => {
  test('over ice it equals the values worked out from the Hyland–Wexler equation as ASHRAE prints it', () => {
    // Source: ASHRAE Handbook Fundamentals, chapter 1, equation 5, evaluated apart from this project.
    const table: [number, number][] = [
      [-20, 103.26],
      [-15, 165.3],
      [-10, 259.9],
      [-7, 338.19],
      [-5, 401.76],
    ];
    // Half of the last printed digit, 0.005 Pa.
    for (const [t, p] of table) expect(Math.abs(saturationPressureOverIce(t) - p)).toBeLessThanOrEqual(0.005);
    for (const [t, p] of table) overIce.add(saturationPressureOverIce(t) - p);
    expect(table).toHaveLength(5);
  });

  test('over water it equals the values worked out from the Hyland–Wexler equation as ASHRAE prints it', () => {
    // Source: ASHRAE Handbook Fundamentals, chapter 1, equation 6, evaluated apart from this project.
    const table: [number, number, number][] = [
      [0, 611.21, 2],
      [2, 705.95, 2],
      [5, 872.49, 2],
      [7, 1001.96, 2],
      [10, 1228.0, 1],
      [20, 2338.8, 1],
      [25, 3169.2, 1],
      [60, 19943.8, 1],
      [100, 101418.7, 1],
    ];
    // Half of the last printed digit.
    for (const [t, p, digits] of table) {
      expect(Math.abs(saturationPressureOverWater(t) - p)).toBeLessThanOrEqual(0.5 * 10 ** -digits);
      overWater.add(saturationPressureOverWater(t) - p);
    }
    expect(table).toHaveLength(9);
  });

  test('over ice it agrees with a published table in millimetres of mercury', () => {
    // Source: a published table of the vapour pressure of ice, mmHg at −20 … −5 °C.
    const table: [number, number][] = [
      [-20, 0.776],
      [-15, 1.241],
      [-10, 1.95],
      [-7, 2.537],
      [-5, 3.013],
    ];
    // 0.3 %: the table stands on an older formulation of ice (0.2 % off at −20 °C) and prints 0.776 to 0.06 %.
    for (const [t, mmHg] of table) expectWithin(saturationPressureOverIce(t), mmHg * PASCAL_OF_ONE_MMHG, 0.003);
    for (const [t, mmHg] of table) iceTable.add(100 * (saturationPressureOverIce(t) / mmHg / PASCAL_OF_ONE_MMHG - 1));
    expect(table).toHaveLength(5);
  });

  test('over water it meets the air pressure at the boiling points of the international steam formulation', () => {
    // Source: IAPWS-95, saturation temperatures in °C at pressures in kPa.
    const table: [number, number][] = [
      [101.325, 99.974],
      [90, 96.687],
      [70, 89.932],
      [50, 81.317],
      [20, 60.058],
    ];
    // 0.1 %, the agreement claimed between the two formulations; it is worth 0.03 K, less than a weather station tells.
    for (const [kPa, t] of table) expectWithin(saturationPressureOverWater(t), kPa * 1000, 0.001);
    for (const [kPa, t] of table) boiling.add(100 * (saturationPressureOverWater(t) / kPa / 1000 - 1));
    expect(table).toHaveLength(5);
  });
});

describe('humidity at the rating points of heat pumps', () => {
  // Source: EN 14511-2 rating points by dry and wet bulb; humidity from the ASHRAE chapter 1 equations at 101 325 Pa.
  test.each([
    { dry: 2, wet: 1, gramPerKilogram: 3.654, overWater: 83.84 },
    { dry: 7, wet: 6, gramPerKilogram: 5.386, overWater: 86.82 },
    { dry: 12, wet: 11, gramPerKilogram: 7.751, overWater: 88.93 },
    { dry: -7, wet: -8, gramPerKilogram: 1.552, overWater: 69.7 },
  ])('air of $dry °C with a wet bulb of $wet °C has $gramPerKilogram g/kg, $overWater % over water', (point) => {
    const humidity = humidityRatioFromWetBulb(point.dry, point.wet, SEA_LEVEL);
    // 0.05 %: the ratio is printed to 0.0005 g/kg, 0.03 % of the driest point.
    expectWithin(1000 * humidity, point.gramPerKilogram, 0.0005);
    ratio.add(100 * ((1000 * humidity) / point.gramPerKilogram - 1));
    const vapour = (humidity * SEA_LEVEL) / (0.621945 + humidity);
    relative.add((100 * vapour) / saturationPressureOverWater(point.dry) - point.overWater);
    // 0.05 points: half of the last digit of the coarsest value.
    expect(Math.abs((100 * vapour) / saturationPressureOverWater(point.dry) - point.overWater)).toBeLessThanOrEqual(
      0.05,
    );
  });

  test('air of −7 °C with a wet bulb of −8 °C is at 74.6 % over ice', () => {
    const humidity = humidityRatioFromWetBulb(-7, -8, SEA_LEVEL);
    const vapour = (humidity * SEA_LEVEL) / (0.621945 + humidity);
    relative.add((100 * vapour) / saturationPressureOverIce(-7) - 74.6);
    // Half of the last printed digit.
    expect(Math.abs((100 * vapour) / saturationPressureOverIce(-7) - 74.6)).toBeLessThanOrEqual(0.05);
  });
});

test('the standard atmosphere has its published pressures', () => {
  // Source: ISO 2533 standard atmosphere, pressure in Pa at geopotential altitude in m.
  const table: [number, number][] = [
    [0, 101_325],
    [500, 95_461],
    [1000, 89_875],
    [2000, 79_495],
    [3000, 70_108],
  ];
  // 1 Pa: values are printed whole, and the rounded constants of the short equation cost half a pascal at 3000 m.
  for (const [z, p] of table) expect(Math.abs(standardPressure(z) - p)).toBeLessThanOrEqual(1);
  for (const [z, p] of table) atmosphere.add(standardPressure(z) - p);
  expect(table).toHaveLength(5);
});

test('the short equation of the standard atmosphere is that of its constants', () => {
  // Source: ISO 2533: 288.15 K and 101 325 Pa at sea level, 6.5 K less per km, g = 9.80665 m/s², R = 287.05287 J/(kg·K).
  const altitudes = Array.from({ length: 45 }, (_, i) => 100 * i - 400);
  for (const z of altitudes) {
    const exact = SEA_LEVEL * (1 - (0.0065 * z) / 288.15) ** (9.80665 / (287.05287 * 0.0065));
    // 2e-7: the lapse of 2.25577e-5 per m is rounded by 2e-7 of itself, worth 1e-7 of the pressure at 4000 m.
    expectWithin(standardPressure(z), exact, 2e-7);
    constants.add(100 * (standardPressure(z) / exact - 1));
  }
  expect(altitudes[44]).toBe(4000);
});
