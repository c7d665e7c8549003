import { describe, expect, test } from 'vitest';
import { type DeclaredPoint, declaredSeason } from '../../../../src/sim/season/declaredSeason.ts';
import type { SeasonCase } from '../../../../src/sim/season/seasonCase.ts';

const seasonCase: SeasonCase = {
  season: 'average',
  application: 55,
  designLoad: 26,
  operatingLimit: -10,
  reversible: true,
  idle: { off: 0, thermostatOff: 0, standby: 0, crankcase: 0 },
};

// With a design load of 26 kW the load is (16 − T) kW: 26 at −10, 23 at −7, 14 at 2, 9 at 7, 4 at 12 °C.
const declared = (changes: Record<number, Partial<DeclaredPoint>> = {}): DeclaredPoint[] =>
  [
    { outdoor: -10, capacity: 20, cop: 2 },
    { outdoor: -7, capacity: 23, cop: 2.3 },
    { outdoor: 2, capacity: 14, cop: 3.2 },
    { outdoor: 7, capacity: 9, cop: 4.2 },
    { outdoor: 12, capacity: 4, cop: 5.2 },
  ].map((point) => ({ degradation: 0.9, ...point, ...changes[point.outdoor] }));

const bin = (outdoor: number, points = declared(), bivalent = -7, at = seasonCase) =>
  declaredSeason(at, points, bivalent).bins.find((each) => each.outdoor === outdoor)!;

describe('the COP of declared points', () => {
  test('is linear between two points', () => {
    // 2.3 + (3.2 − 2.3)·3/9
    expect(bin(-4).cop).toBeCloseTo(2.6, 12);
  });

  test('goes on along the two warmest points above them', () => {
    expect(bin(15).cop).toBeCloseTo(5.8, 12);
  });

  test('is held below the coldest point', () => {
    const points = declared().filter(({ outdoor }) => outdoor >= -7);
    expect(bin(-10, points).cop).toBe(2.3);
  });

  test('is degraded at the point itself, by its own coefficient', () => {
    // twice the part load of 4 kW: CR 0.5, with C_c 0.8 a factor of 0.5/(0.4 + 0.2)
    const points = declared({ 12: { capacity: 8, degradation: 0.8 } });
    expect(bin(12, points).cop).toBeCloseTo((5.2 * 0.5) / 0.6, 12);
    // half-way between the degraded and the whole COP
    expect(bin(7, points).cop).toBe(4.2);
  });

  test('does not depend on the order in which points stand, nor on one that is repeated', () => {
    const points = declared();
    const shuffled = [points[3]!, points[0]!, points[4]!, points[2]!, points[1]!, points[1]!];
    expect(declaredSeason(seasonCase, shuffled, -7)).toEqual(declaredSeason(seasonCase, points, -7));
  });
});

describe('capacity in the cold', () => {
  test('covers the load down to the bivalent temperature', () => {
    expect(bin(-7).supplementary).toBe(0);
  });

  test('falls linearly from there to the operating limit, electric heat at COP 1 doing the rest', () => {
    const { capacity, supplementary, electricity, hours, cop } = bin(-9);
    expect(capacity).toBeCloseTo(21, 12);
    expect(supplementary).toBeCloseTo(25 - 21, 12);
    expect(electricity).toBeCloseTo(hours * (21 / cop + 4), 10);
  });

  test('is nothing below the operating limit', () => {
    const above = { ...seasonCase, operatingLimit: -8 };
    expect(bin(-9, declared(), -7, above)).toMatchObject({ capacity: 0, supplementary: 25, electricity: 25 * 25 });
  });

  test('at a bivalent temperature that is no point is the load there', () => {
    // from 21 kW at −5 °C to 20 kW at −10 °C
    expect(bin(-8, declared(), -5).capacity).toBeCloseTo(20.4, 12);
  });
});

test('a unit twice as large in a house twice as large has the same seasonal figures', () => {
  const doubled = declared().map((point) => ({ ...point, capacity: 2 * point.capacity }));
  const small = declaredSeason(seasonCase, declared(), -7);
  const large = declaredSeason({ ...seasonCase, designLoad: 52 }, doubled, -7);
  expect(large.scop).toBeCloseTo(small.scop, 12);
  expect(large.electricity).toBeCloseTo(2 * small.electricity, 8);
});
