import { describe, expect, test } from 'vitest';
import { carnotCop, plainCarnotCop } from '../../../src/sim/carnot.ts';
import { expectNear } from './planBuilder.ts';

describe('κ, the Carnot COP with approach temperatures', () => {
  test('at 7 °C outdoors and 35 °C flow it is 311.15/38', () => {
    // (35 + 3 + 273.15)/(35 − 7 + 10)
    expectNear(carnotCop(7, 35), 311.15 / 38);
  });

  test('it never sees a lift of less than 15 K', () => {
    // 30 °C flow at 25 °C and at 40 °C outdoors: lift 15 K both
    expectNear(carnotCop(25, 30), 306.15 / 15);
    expectNear(carnotCop(40, 30), 306.15 / 15);
    expectNear(carnotCop(24, 30), 306.15 / 16);
  });
});

describe('the plain Carnot COP', () => {
  test('between 0 °C and 50 °C it is 323.15/50', () => {
    expectNear(plainCarnotCop(0, 50), 6.463);
  });

  test('where the flow is no warmer than the air there is no bound', () => {
    expect(plainCarnotCop(30, 30)).toBe(Number.MAX_VALUE);
    expect(plainCarnotCop(31, 30)).toBe(Number.MAX_VALUE);
  });

  test('it lies above κ wherever κ sees its own lift', () => {
    for (const outdoor of [-20, 0, 15]) expect(plainCarnotCop(outdoor, 45)).toBeGreaterThan(carnotCop(outdoor, 45));
  });
});
