import { describe, expect, test } from 'vitest';
import { seasonalSum } from '../../../../src/sim/season/seasonalSum.ts';
import { partLoadRatio, type SeasonCase } from '../../../../src/sim/season/seasonCase.ts';

const seasonCase: SeasonCase = {
  season: 'average',
  application: 35,
  designLoad: 10,
  operatingLimit: -10,
  reversible: false,
  idle: { off: 0.01, thermostatOff: 0.02, standby: 0.5, crankcase: 0.03 },
};

describe('the seasonal sum', () => {
  test('gives the constant COP of a unit that carries all, before idle electricity', () => {
    const { scopOn, heat, electricity, idleElectricity } = seasonalSum(seasonCase, () => ({ capacity: 20, cop: 4 }));
    expect(scopOn).toBeCloseTo(4, 12);
    // 2066 published hours at the design load; 179·20 W + 3672·10 W + 3851·30 W
    expect(heat).toBe(20_660);
    expect(idleElectricity).toBeCloseTo(3.58 + 36.72 + 115.53, 10);
    expect(electricity).toBeCloseTo(20_660 / 4 + 155.83, 9);
  });

  test('is that of electric heat for a unit that gives nothing', () => {
    expect(seasonalSum(seasonCase, () => ({ capacity: 0, cop: 4 })).scopOn).toBeCloseTo(1, 12);
  });

  test('asks the unit for nothing below its operating limit', () => {
    const asked: number[] = [];
    seasonalSum({ ...seasonCase, operatingLimit: -5 }, (outdoor) => {
      asked.push(outdoor);
      return { capacity: 20, cop: 4 };
    });
    expect(asked[0]).toBe(-5);
    expect(asked).toHaveLength(21);
  });
});

test('no load is left at 16 °C and above', () => {
  expect(partLoadRatio(16, -10)).toBe(0);
  expect(partLoadRatio(20, -10)).toBe(0);
});
