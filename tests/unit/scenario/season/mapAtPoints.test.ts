import { describe, expect, test } from 'vitest';
import { mapAtPoints } from '../../../../src/scenario/season/mapAtPoints.ts';
import { prepareMap } from '../../../../src/sim/heatPumpMap.ts';
import { mapSeason } from '../../../../src/sim/season/mapSeason.ts';
import type { SeasonCase } from '../../../../src/sim/season/seasonCase.ts';
import type { HeatPumpUnit } from '../../../../src/sim/unit.ts';

// Invented: 10 kW at full load, 4 kW at the lowest level; COP 4 and 5 at 35 °C flow.
const unit: HeatPumpUnit = {
  full: prepareMap({ outdoor: [-30, 20], flow: [35], capacity: [10, 10], cop: [4, 4] }, 'linear'),
  lowest: { given: 'share', capacity: 0.4, cop: 1.25 },
  defrost: { method: 'included' },
  cycling: { method: 'degradation', coefficient: 0.25 },
  lowestOutdoorTemperature: Number.NEGATIVE_INFINITY,
  highestFlow: { at: [0], value: [55] },
  standbyPower: 0,
  crankcasePower: 0,
  crankcaseBelow: Number.POSITIVE_INFINITY,
};
// load (16 − T)/2 kW
const rating = {
  climate: 'average',
  designLoad: 13,
  outlets: [
    [-10, 45],
    [2, 35],
    [12, 35],
  ],
} as const;
const points = [
  { outdoor: 12, capacity: 4.4, cop: 5.5, degradation: 0.9 },
  { outdoor: 2, capacity: 7, cop: 4.5, degradation: 0.9 },
  { outdoor: -22, capacity: 9, cop: 4, degradation: 0.9 },
];

describe('a declared point beside the map', () => {
  const [coldest, middle, warmest] = mapAtPoints(points, rating, unit);

  test('meets the map at its part load', () => {
    expect(middle).toMatchObject({ outdoor: 2, outlet: 35, load: 7, map: { capacity: 7 } });
    // half-way between the levels
    expect(middle!.map.cop).toBeCloseTo(4.5, 12);
    expect(middle!.capacityDeviation).toBeCloseTo(0, 12);
    expect(middle!.copDeviation).toBeCloseTo(0, 12);
  });

  test('meets it at the lowest level where the load is less, without any loss by cycling', () => {
    expect(warmest!.map).toEqual({ capacity: 4, cop: 5 });
    expect(warmest!.capacityDeviation).toBeCloseTo(0.1, 12);
    expect(warmest!.copDeviation).toBeCloseTo(0.1, 12);
  });

  test('meets it at full load where the load is more, at the outlet of the design temperature if it is colder', () => {
    expect(coldest).toMatchObject({ outdoor: -22, outlet: 45, load: 19, map: { capacity: 10 } });
    expect(coldest!.capacityDeviation).toBeCloseTo(-0.1, 12);
  });
});

test('a unit of a single speed is read at full load, whatever the load', () => {
  const single: HeatPumpUnit = { ...unit, lowest: { given: 'share', capacity: 1, cop: 1 } };
  const fixed = {
    ...rating,
    outlets: [
      [-10, 35],
      [12, 35],
    ],
  } as const;
  for (const { map } of mapAtPoints(points, fixed, single)) expect(map).toEqual({ capacity: 10, cop: 4 });
});

test('a point is read as its bin of the season is: with the same frost, and no flow above the highest', () => {
  const limited: HeatPumpUnit = {
    ...unit,
    full: prepareMap(
      { outdoor: [-30, 20], flow: [35, 55], capacity: [10, 9, 12, 11], cop: [3, 2, 5, 3] },
      'carnotShare',
    ),
    defrost: { method: 'humidity', capacityLoss: 0.1, copLoss: 0.2 },
    highestFlow: { at: [0], value: [38] },
  };
  const temperatures = [-8, -2, 0, 3, 12];
  const declared = temperatures.map((outdoor) => ({ outdoor, capacity: 5, cop: 3, degradation: 0.9 }));
  const seasonCase: SeasonCase = {
    ...{ season: 'average', application: 45, designLoad: 13, operatingLimit: -30, reversible: true },
    idle: { off: 0, thermostatOff: 0, standby: 0, crankcase: 0 },
  };
  // a degradation of 1 is no loss by cycling
  const { bins } = mapSeason(seasonCase, limited, rating.outlets, 1);
  for (const { outdoor, map } of mapAtPoints(declared, rating, limited)) {
    const bin = bins.find((each) => each.outdoor === outdoor)!;
    expect(map.cop).toBeCloseTo(bin.cop, 12);
    expect(map.capacity).toBeLessThanOrEqual(bin.capacity);
  }
});
