import { describe, expect, test } from 'vitest';
import { lowestPermitted } from '../../src/scenario/season/lowestPermitted.ts';
import { outletPoints, outletTemperature } from '../../src/sim/season/outletTemperature.ts';
import { seasonalSum } from '../../src/sim/season/seasonalSum.ts';
import { cyclingCop, partLoadRatio, type SeasonCase } from '../../src/sim/season/seasonCase.ts';
import { type SeasonName, standardSeasons } from '../../src/weather/seasonBins.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Tables of the energy label');
const ratios = accuracy.comparison({
  what: 'part-load ratios of the three climates',
  source: 'Regulation (EU) 813/2013 annex III; those of colder and warmer by its formula',
  unit: '',
  allowed: 5e-5,
  why: 'printed to four digits',
});
const outlets = accuracy.comparison({
  what: 'outlet temperatures, variable outlet',
  source: 'EN 14825 (from memory); 52 °C at −7 °C Regulation (EU) 813/2013 annex I',
  unit: 'K',
  allowed: 5e-13,
  why: 'read at the points themselves',
});
const idleHours = accuracy.comparison({
  what: 'electricity of an idle power of one unit',
  source: 'Regulation (EU) 206/2012 annex II table 4',
  unit: 'h',
  allowed: 0,
  why: 'printed whole',
});
const cycling = accuracy.comparison({
  what: 'loss by cycling at capacity ratios of 0.5 and 0.25',
  source: 'EN 14825, air to water (from memory), worked out',
  unit: '',
  allowed: 5e-6,
  why: 'five printed digits',
});
const lowest = accuracy.comparison({
  what: 'lowest permitted η_s as SCOP',
  source: 'Regulation (EU) 813/2013 annex II; 3 points for controls (from memory)',
  unit: '',
  allowed: 5e-11,
  why: 'worked out exactly',
});

describe('the reference seasons', () => {
  // Source: Regulation (EU) 813/2013 annex III, part-load ratios; those of colder and warmer worked out from its formula.
  test.each<[SeasonName, [number, number][]]>([
    [
      'average',
      [
        [-7, 0.8846],
        [2, 0.5385],
        [7, 0.3462],
        [12, 0.1538],
      ],
    ],
    [
      'colder',
      [
        [-15, 0.8158],
        [-7, 0.6053],
        [2, 0.3684],
        [7, 0.2368],
        [12, 0.1053],
      ],
    ],
    [
      'warmer',
      [
        [2, 1],
        [7, 0.6429],
        [12, 0.2857],
      ],
    ],
  ])('the %s climate has the published part-load ratios', (season, published) => {
    for (const [outdoor, ratio] of published) {
      // printed to four digits: half of the last one
      expect(Math.abs(partLoadRatio(outdoor, standardSeasons[season].designTemperature) - ratio)).toBeLessThanOrEqual(
        5e-5,
      );
      ratios.add(partLoadRatio(outdoor, standardSeasons[season].designTemperature) - ratio);
    }
  });

  // Source: EN 14825, variable outlet (from memory); 52 °C at −7 °C: Regulation (EU) 813/2013 annex I (52).
  test.each<[SeasonName, 35 | 45 | 55 | 65, [number, number][]]>([
    [
      'average',
      35,
      [
        [-10, 35],
        [-7, 34],
        [2, 30],
        [7, 27],
        [12, 24],
      ],
    ],
    [
      'average',
      45,
      [
        [-10, 45],
        [-7, 43],
        [2, 37],
        [7, 33],
        [12, 28],
      ],
    ],
    [
      'average',
      55,
      [
        [-10, 55],
        [-7, 52],
        [2, 42],
        [7, 36],
        [12, 30],
      ],
    ],
    [
      'average',
      65,
      [
        [-10, 65],
        [-7, 61],
        [2, 49],
        [7, 41],
        [12, 32],
      ],
    ],
    [
      'warmer',
      35,
      [
        [2, 35],
        [7, 31],
        [12, 26],
      ],
    ],
    [
      'warmer',
      55,
      [
        [2, 55],
        [7, 46],
        [12, 34],
      ],
    ],
    [
      'colder',
      35,
      [
        [-22, 35],
        [-7, 30],
        [2, 27],
        [7, 25],
        [12, 24],
      ],
    ],
    [
      'colder',
      55,
      [
        [-22, 55],
        [-7, 44],
        [2, 37],
        [7, 32],
        [12, 30],
      ],
    ],
  ])('the %s climate with %i °C has the outlet temperatures of the standard', (season, application, published) => {
    const kept = outletPoints(season, application)!;
    for (const [outdoor, outlet] of published) expect(outletTemperature(kept, outdoor)).toBeCloseTo(outlet, 12);
    for (const [outdoor, outlet] of published) outlets.add(outletTemperature(kept, outdoor) - outlet);
  });

  // Source: Regulation (EU) 206/2012 annex II table 4, as printed: thermostat off, standby, off, crankcase heater.
  test.each<[SeasonName, boolean, [number, number, number, number]]>([
    ['average', true, [179, 0, 0, 179]],
    ['average', false, [179, 0, 3672, 3851]],
    ['warmer', true, [755, 0, 0, 755]],
    ['warmer', false, [755, 0, 4345, 4476]],
    ['colder', true, [131, 0, 0, 131]],
    ['colder', false, [131, 0, 2189, 2944]],
  ])(
    'in the %s climate a unit (reversible: %s) draws its idle powers in the published hours',
    (season, reversible, hours) => {
      (['thermostatOff', 'standby', 'off', 'crankcase'] as const).forEach((kind, i) => {
        const idle = { off: 0, thermostatOff: 0, standby: 0, crankcase: 0, [kind]: 1 };
        const seasonCase: SeasonCase = { ...constantCase, season, reversible, idle };
        const { idleElectricity } = seasonalSum(seasonCase, () => ({ capacity: 100, cop: 3 }));
        expect(idleElectricity).toBe(hours[i]);
        idleHours.add(idleElectricity - (hours[i] as number));
      });
    },
  );

  test('cycling takes what the standard says it takes', () => {
    // Source: EN 14825, air to water (from memory), worked out: 0.5/(0.9·0.5 + 0.1), 0.25/(0.9·0.25 + 0.1); five digits.
    expect(cyclingCop(1, 0.5, 0.9)).toBeCloseTo(0.90909, 5);
    expect(cyclingCop(1, 0.25, 0.9)).toBeCloseTo(0.76923, 5);
    cycling.add(cyclingCop(1, 0.5, 0.9) - 0.90909);
    cycling.add(cyclingCop(1, 0.25, 0.9) - 0.76923);
    expect(cyclingCop(3, 1, 0.9)).toBeCloseTo(3, 12);
  });

  // Source: Regulation (EU) 813/2013 annex II, lowest η_s since 26 September 2017; SCOP worked out with CC = 2.5 and the 3
  // points for controls of an air-source unit (from memory).
  test.each<[35 | 55, number, number]>([
    [35, 125, 3.2],
    [55, 110, 2.825],
  ])('with %i °C the lowest permitted η_s of %i %% is a SCOP of %f', (application, lowestEfficiency, scop) => {
    expect(lowestPermitted({ climate: 'average', application })).toBe(lowestEfficiency);
    const result = seasonalSum({ ...constantCase, application }, () => ({ capacity: 100, cop: scop }));
    expect(result.scop).toBeCloseTo(scop, 12);
    expect(result.efficiency).toBeCloseTo(lowestEfficiency, 10);
    lowest.add(result.efficiency - lowestEfficiency);
  });
});

const constantCase: SeasonCase = {
  season: 'average',
  application: 35,
  designLoad: 5,
  operatingLimit: -22,
  reversible: true,
  idle: { off: 0, thermostatOff: 0, standby: 0, crankcase: 0 },
};
