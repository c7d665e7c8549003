import { describe, expect, test } from 'vitest';
import { prepareMap } from '../../../../src/sim/heatPumpMap.ts';
import { mapSeason } from '../../../../src/sim/season/mapSeason.ts';
import type { SeasonCase } from '../../../../src/sim/season/seasonCase.ts';
import type { HeatPumpUnit } from '../../../../src/sim/unit.ts';
import { frostIndex } from '../../../../src/weather/frostIndex.ts';
import { humidityRatioFromRelativeHumidity } from '../../../../src/weather/humidAir/humidityRatio.ts';

const seasonCase: SeasonCase = {
  season: 'average',
  application: 35,
  designLoad: 13,
  operatingLimit: -10,
  reversible: true,
  idle: { off: 0, thermostatOff: 0, standby: 0, crankcase: 0 },
};

// Invented: 10 kW and COP 4 everywhere on the grid; the load is (16 − T)/2 kW. The outlet is 35 °C throughout.
const flat = prepareMap(
  { outdoor: [-20, 20], flow: [35, 55], capacity: [10, 10, 10, 10], cop: [4, 4, 4, 4] },
  'linear',
);
const unit: HeatPumpUnit = {
  full: flat,
  lowest: { given: 'share', capacity: 0.4, cop: 1.25 },
  defrost: { method: 'included' },
  cycling: { method: 'degradation', coefficient: 0.25 },
  lowestOutdoorTemperature: Number.NEGATIVE_INFINITY,
  highestFlow: { at: [0], value: [55] },
  standbyPower: 0,
  crankcasePower: 0,
  crankcaseBelow: Number.POSITIVE_INFINITY,
};
const fixedOutlet = [
  [-10, 35],
  [12, 35],
] as const;

const bin = (outdoor: number, changed: Partial<HeatPumpUnit> = {}, degradation = 0.9) =>
  mapSeason(seasonCase, { ...unit, ...changed }, fixedOutlet, degradation).bins.find(
    (each) => each.outdoor === outdoor,
  )!;

describe('a season read from the map', () => {
  test('has the COP of full load where the load is more than the capacity, and electric heat for the rest', () => {
    expect(bin(-10)).toMatchObject({ load: 13, capacity: 10, cop: 4, supplementary: 3 });
  });

  test('has a COP linear in the load between the lowest level and full load', () => {
    // 7 kW, half-way from 4 kW at COP 5 to 10 kW at COP 4
    expect(bin(2).cop).toBeCloseTo(4.5, 12);
  });

  test('cycles below the lowest level by the form of the season, not by that of the year', () => {
    // 2 kW of 4: CR 0.5 with C_c 0.9 is a factor of 0.5/0.55 on the COP of 5
    expect(bin(12).cop).toBeCloseTo((5 * 0.5) / 0.55, 12);
    expect(bin(12, {}, 1).cop).toBeCloseTo(5, 12);
  });

  test('cycles from full load down where the unit has a single speed', () => {
    // 7 kW of 10
    expect(bin(2, { lowest: { given: 'share', capacity: 1, cop: 1 } }).cop).toBeCloseTo((4 * 0.7) / (0.63 + 0.1), 12);
  });

  test('finds the loss by frost at 85 % relative humidity and sea level', () => {
    const defrost = { method: 'humidity', capacityLoss: 0.1, copLoss: 0.12 } as const;
    const index = frostIndex(0, humidityRatioFromRelativeHumidity(0, 85, 101_325), 101_325);
    expect(index).toBeGreaterThan(0.5);
    expect(bin(0, { defrost, lowest: { given: 'share', capacity: 1, cop: 1 } }).capacity).toBeCloseTo(
      10 * (1 - 0.1 * index),
      12,
    );
  });

  test('reads an outlet that the unit cannot reach at its highest flow', () => {
    const sloped = prepareMap(
      { outdoor: [-20, 20], flow: [35, 55], capacity: [10, 10, 10, 10], cop: [4, 3, 4, 3] },
      'linear',
    );
    const hot = [
      [-10, 55],
      [12, 55],
    ] as const;
    const limited = { ...unit, full: sloped, highestFlow: { at: [0], value: [45] } };
    const { bins } = mapSeason(seasonCase, limited, hot, 0.9);
    expect(bins[0]!.cop).toBeCloseTo(3.5, 12);
  });
});
