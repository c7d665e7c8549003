import { expect, test } from 'vitest';
import { standardPressure } from '../../../../src/weather/humidAir/standardPressure.ts';

test('the documented example holds', () => {
  // Half of the last printed digit.
  expect(Math.abs(standardPressure(1000) - 89_875)).toBeLessThanOrEqual(0.5);
});

test('at sea level it is the standard pressure, below sea level more', () => {
  expect(standardPressure(0)).toBe(101_325);
  expect(standardPressure(-300)).toBeGreaterThan(101_325);
});

test('outside the range of the equation the end is held', () => {
  expect(standardPressure(90_000)).toBe(standardPressure(11_000));
  expect(standardPressure(-90_000)).toBe(standardPressure(-5000));
});
