import { describe, expect, test } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import type { SeasonDocument, SeasonEntry } from '../../../../src/report/seasonSchema.ts';
import { loadLabel } from '../../../../src/scenario/season/loadLabel.ts';
import { makeSeasons } from '../../../../src/scenario/season/makeSeasons.ts';
import { memoryFiles } from '../memoryFiles.ts';
import {
  checkedLabel,
  labelFile,
  sampleLabel,
  sampleSeason,
  type WrittenLabel,
  type WrittenOutlets,
} from './labelFiles.ts';

const first = ({ seasons }: SeasonDocument): SeasonEntry => seasons[0]!;
const mapOf = (entry: SeasonEntry) => {
  if (typeof entry.map === 'string') throw new Error(entry.map);
  return entry.map;
};
const pointsOf = (entry: SeasonEntry) => {
  if (typeof entry.points === 'string') throw new Error(entry.points);
  return entry.points;
};
const withSeason = (changes: object): WrittenLabel => ({ ...sampleLabel, seasons: [{ ...sampleSeason, ...changes }] });
const codes = (document: SeasonDocument) => document.warnings.map(({ code }) => code);
const textOf = (document: SeasonDocument, code: string) =>
  document.warnings.find((warning) => warning.code === code)?.text ?? '';

describe('a declared season', () => {
  test('is rated for its own design load, limit, degradation and idle powers, by map and by points', () => {
    const entry = first(checkedLabel(labelFile(withSeason({ degradation: 0.8 }))));
    for (const rating of [mapOf(entry), pointsOf(entry)]) {
      expect(rating).toMatchObject({ designLoad: 6, operatingLimit: -10, heat: 6 * 2066 });
      expect(rating.idlePowers).toEqual({ off: 10, thermostatOff: 15, standby: 10, crankcase: 0 });
      // 179 h at 15 W
      expect(rating.idleElectricity).toBeCloseTo(2.685, 10);
    }
    expect(mapOf(entry).degradation).toBe(0.8);
  });

  test('has idle powers of its own where they are given', () => {
    const own = { off: 1, thermostatOff: 2, standby: 3, crankcase: 4 };
    const entry = first(checkedLabel(labelFile(withSeason({ idlePowers: own }))));
    expect(mapOf(entry).idlePowers).toEqual(own);
    expect(pointsOf(entry).idlePowers).toEqual(own);
  });

  test('does not run its map below the unit’s own lowest temperature', () => {
    const limited = labelFile(sampleLabel, { limits: { lowestOutdoorTemperature: -5 } });
    const { operatingLimit, bins } = mapOf(first(checkedLabel(limited)));
    expect(operatingLimit).toBe(-5);
    expect(bins.filter(({ cop }) => cop === 'no heat').map(({ outdoor }) => outdoor)).toEqual([-10, -9, -8, -7, -6]);
  });

  test('without points is rated by its map alone', () => {
    const { points: _, ...bare } = sampleSeason;
    const document = checkedLabel(labelFile({ ...sampleLabel, seasons: [{ ...bare, scop: 3 }] }));
    expect(first(document).points).toBe('no points');
    expect(first(document).pointsBesideMap).toEqual([]);
    expect(first(document).comparison.map).toMatchObject({ against: 'label', expected: 3 });
  });

  test('uses outlet temperatures of the file before those that are kept', () => {
    const outlets: WrittenOutlets[] = [{ climate: 'average', application: 55, points: [[12, 55]] }];
    const fixed = mapOf(first(checkedLabel(labelFile({ ...sampleLabel, outlets }))));
    const variable = mapOf(first(checkedLabel(labelFile(sampleLabel))));
    expect(fixed.outlets).toEqual([
      { outdoor: -10, outlet: 55 },
      { outdoor: 12, outlet: 55 },
    ]);
    expect(fixed.scop).toBeLessThan(0.85 * variable.scop);
  });
});

describe('a season that is not declared', () => {
  test('is rated for what the map gives at the design temperature, by the unit’s own limit and powers', () => {
    const changes = {
      standbyPower: 8,
      crankcase: { power: 20 },
      limits: { lowestOutdoorTemperature: -20 },
    };
    const document = checkedLabel(labelFile(undefined, changes), { climate: 'colder', application: 35 });
    const map = mapOf(first(document));
    // the sample map at −22 °C: 5.0 kW at −15 °C, falling by (6.0 − 5.0)/8 a kelvin
    expect(map.designLoad).toBeCloseTo(5 - 7 / 8, 12);
    expect(map.operatingLimit).toBe(-20);
    expect(map.idlePowers).toEqual({ off: 8, thermostatOff: 8, standby: 8, crankcase: 20 });
    expect(first(document).label).toBe('not declared');
    const texts = document.assumptions.map(({ text }) => text).join('\n');
    for (const said of [
      'design load 4.13 kW, what the map gives at −22 °C',
      'operating limit −20 °C, from the limits of the unit',
      'degradation coefficient 0.9',
      '8 W in thermostat-off, standby and off mode and 20 W for the crankcase heater',
      'false, as no label is entered: the unit is taken to heat only.',
      'outlet temperatures of EN 14825 with variable outlet (outdoor/outlet, °C): −22/35, −7/30, 2/27, 7/25, 12/24',
    ]) {
      expect(texts).toContain(said);
    }
  });

  test('says so where the unit has no lowest outdoor temperature', () => {
    const document = checkedLabel(labelFile(undefined));
    expect(mapOf(first(document)).operatingLimit).toBe('none');
    expect(document.assumptions.map(({ text }) => text)).toContain(
      'no operating limit: the unit runs however cold it is.',
    );
  });

  test('has the idle powers of the label where the label declares other seasons', () => {
    const document = checkedLabel(labelFile(sampleLabel), { application: 35 });
    expect(mapOf(first(document)).idlePowers.thermostatOff).toBe(15);
  });
});

describe('defaults among the assumptions', () => {
  test('are those that a season looks at', () => {
    const paths = checkedLabel(labelFile(sampleLabel)).assumptions.map(({ path }) => path);
    expect(paths).toContain('label.seasons[0].degradation');
    expect(paths).toContain('map.lowestLevel.capacity');
    expect(paths.filter((path) => /^(cycling|standbyPower|crankcase)/.test(path))).toEqual([]);
  });
});

describe('unknown outlet temperatures', () => {
  const made = (label: WrittenLabel) => {
    const { loaded } = loadLabel('unit.yaml', memoryFiles({ 'unit.yaml': labelFile(label) }));
    return makeSeasons(loaded!, { climate: 'warmer', application: 45 });
  };
  const says =
    'the outlet temperatures of the warmer climate with 45 °C are not known, so the map cannot be rated for it; known are average 35, 45, 55, 65 °C; warmer 35, 55 °C; colder 35, 55 °C\n    → enter them in the label section, such as “outlets: [{ climate: warmer, application: 45, points: [[7, 38], [12, 30]] }]” with the values of EN 14825';

  test('are an error where nothing else can be said', () => {
    const { answer, problems } = made(sampleLabel);
    expect(answer).toBeUndefined();
    expect(problems.map(problemText)).toEqual([`unit.yaml  ${says}`]);
  });

  test('are a warning where points are declared, which are rated alone', () => {
    const season = { ...sampleSeason, climate: 'warmer', application: 45, operatingLimit: 2, bivalentTemperature: 2 };
    const points = sampleSeason.points!.slice(2).map((point) => ({ ...point, capacity: 6 }));
    const { answer, problems } = made(withSeason({ ...season, points }));
    expect(problems.map(problemText)).toEqual([`unit.yaml  warning: ${says}`]);
    expect(answer?.seasons[0]?.map).toBeUndefined();
    expect(answer?.seasons[0]?.points?.result.scop).toBeGreaterThan(2);
    expect(answer?.warnings.map(({ code }) => code)).toContain('label.unknown-outlets');
  });

  test('are no problem once they are entered', () => {
    const outlets: WrittenOutlets[] = [
      {
        climate: 'warmer',
        application: 45,
        points: [
          [7, 38],
          [12, 30],
        ],
      },
    ];
    const { answer, problems } = made({ ...sampleLabel, outlets });
    expect(problems).toEqual([]);
    expect(answer?.seasons[0]?.map?.outlets).toEqual([
      [2, 45],
      [7, 38],
      [12, 30],
    ]);
  });
});

describe('what is said of a label', () => {
  const sound = checkedLabel(labelFile(sampleLabel));
  const scop = pointsOf(first(sound)).scop;

  test('is nothing but the extended map where all agree', () => {
    const document = checkedLabel(labelFile(withSeason({ scop })));
    expect(codes(document)).toEqual(['season.below-lowest-flow', 'season.outside-map']);
  });

  test('names a map that misses its label by more than 8 %, and the point that lies farthest off', () => {
    const mistyped = labelFile(withSeason({ scop: 4.6 }));
    const document = checkedLabel(mistyped);
    const { comparison } = first(document);
    expect(comparison.map).toMatchObject({ agrees: false, expected: 4.6 });
    expect(textOf(document, 'season.map-off-label')).toMatch(
      /^Average climate, 55 °C: the map gives a SCOP of [\d.]+, the label 4\.60 \(−[\d.]+ %\), more than the 8 % /,
    );
    expect(codes(document)).toContain('season.point-off-map');
  });

  test('names a mistyped COP as the point that lies farthest off the map', () => {
    // 2.1 at −7 °C written as 2.9
    const points = sampleSeason.points!.map((point) => (point.outdoor === -7 ? { ...point, cop: 2.9 } : point));
    const document = checkedLabel(labelFile(withSeason({ scop, points })));
    expect(codes(document)).toContain('season.points-off-label');
    expect(textOf(document, 'season.points-off-label')).toContain('they should meet within 1 %.');
    expect(textOf(document, 'season.point-off-map')).toMatch(
      /of the declared points the COP at −7 °C lies farthest off the map: 2\.90 declared, \d\.\d\d from the map at 52 °C outlet \(\+\d+\.\d %\)/,
    );
  });

  test('names one that is too low as well', () => {
    // 3.1 at 2 °C written as 1.3
    const points = sampleSeason.points!.map((point) => (point.outdoor === 2 ? { ...point, cop: 1.3 } : point));
    const document = checkedLabel(labelFile(withSeason({ scop, points })));
    expect(textOf(document, 'season.point-off-map')).toContain(
      'the COP at 2 °C lies farthest off the map: 1.30 declared',
    );
  });

  test('names a mistyped capacity too', () => {
    const points = sampleSeason.points!.map((point) => (point.outdoor === 7 ? { ...point, capacity: 24 } : point));
    const document = checkedLabel(labelFile(withSeason({ scop, points })));
    expect(textOf(document, 'season.point-off-map')).toContain(
      'the capacity at 7 °C lies farthest off the map: 24.00 kW declared',
    );
  });

  test('carries on what the loader finds odd in the map', () => {
    const text = labelFile(sampleLabel)
      .replace('A2        3.6', 'A2        6.3')
      .replace('A2       3.6', 'A2       6.3');
    expect(text).not.toBe(labelFile(sampleLabel));
    expect(codes(checkedLabel(text))[0]).toBe('map.looks-mistyped');
  });

  test('names an efficiency below the lowest permitted, in the average climate alone', () => {
    const low = checkedLabel(labelFile(withSeason({ efficiency: 109 })));
    expect(textOf(low, 'season.below-permitted')).toBe(
      'Average climate, 55 °C: an η_s of 109 % is below the 110 % that Regulation (EU) 813/2013 has asked for since 26 September 2017.',
    );
    expect(codes(checkedLabel(labelFile(withSeason({ efficiency: 110 }))))).not.toContain('season.below-permitted');
    const { points: _, ...bare } = sampleSeason;
    const colder = {
      ...bare,
      climate: 'colder',
      efficiency: 90,
      operatingLimit: -22,
      bivalentTemperature: -22,
    } as const;
    const cold = checkedLabel(labelFile({ ...sampleLabel, seasons: [colder] }));
    expect(codes(cold)).not.toContain('season.below-permitted');
    expect(first(cold).lowestPermittedEfficiency).toBe('none set');
  });

  test('counts the hours in which the map was extended', () => {
    // the sample map reaches from −15 to 7 °C and from 35 °C flow up: warmer than 7 °C are 348 + 335 + … + 74 = 1712 hours,
    // and of the application 35 only the one hour at the design temperature has an outlet of 35 °C
    const low = checkedLabel(labelFile(undefined), { application: 35 });
    expect(mapOf(first(low))).toMatchObject({ hoursOutsideMap: 1712, hoursBelowLowestFlow: 4909 });
    expect(textOf(low, 'season.outside-map')).toContain('in 1712 of 4910 hours');
    expect(textOf(low, 'season.below-lowest-flow')).toContain('in 4909 of 4910 hours');
  });

  test('counts the hours in which the outlet is hotter than the unit gives', () => {
    // 42 °C at 2 °C: colder than that are 1, 25, 23, 24, 27, 68, 91, 89, 165, 173, 240 and 280 hours
    const limited = labelFile(sampleLabel, { limits: { highestFlow: 42 } });
    const document = checkedLabel(limited);
    expect(mapOf(first(document)).hoursAboveHighestFlow).toBe(1206);
    expect(textOf(document, 'season.above-highest-flow')).toContain('in 1206 of 4910 hours');
  });
});
