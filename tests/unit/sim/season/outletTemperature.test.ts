import { describe, expect, test } from 'vitest';
import { outletPoints, outletTemperature } from '../../../../src/sim/season/outletTemperature.ts';

describe('outlet temperatures', () => {
  test('begin at the design temperature with the application itself', () => {
    expect(outletPoints('average', 55)?.[0]).toEqual([-10, 55]);
    expect(outletPoints('colder', 35)?.[0]).toEqual([-22, 35]);
  });

  test('are linear between their points, and go on along the two warmest', () => {
    const points = outletPoints('average', 35)!;
    expect(outletTemperature(points, 4.5)).toBeCloseTo(28.5, 12);
    expect(outletTemperature(points, 15)).toBeCloseTo(24 - (3 * 3) / 5, 12);
  });

  test('are not kept for the warmer and colder climate with 45 and 65 °C', () => {
    for (const climate of ['warmer', 'colder'] as const) {
      expect(outletPoints(climate, 45)).toBeUndefined();
      expect(outletPoints(climate, 65)).toBeUndefined();
    }
  });
});
