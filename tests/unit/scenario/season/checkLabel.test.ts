import { describe, expect, test } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import { loadUnit } from '../../../../src/scenario/loadUnit.ts';
import { memoryFiles } from '../memoryFiles.ts';
import {
  labelFile,
  sampleLabel,
  sampleSeason,
  type WrittenLabel,
  type WrittenOutlets,
  type WrittenSeason,
} from './labelFiles.ts';

/** Messages for a unit file with this label, each on one line, without place. */
function messages(label: WrittenLabel): string[] {
  const { problems } = loadUnit('unit.yaml', memoryFiles({ 'unit.yaml': labelFile(label) }));
  return problems.map((problem) =>
    problemText(problem)
      .replace(/^unit\.yaml:\d+:\d+ {2}/, '')
      .replace('\n    → ', ' → '),
  );
}

const withSeason = (changes: Partial<WrittenSeason>): WrittenLabel => ({
  ...sampleLabel,
  seasons: [{ ...sampleSeason, ...changes }],
});
const withPoint = (at: number, changes: object) =>
  withSeason({ points: sampleSeason.points!.map((point, i) => (i === at ? { ...point, ...changes } : point)) });

test('a sound label has no problem, with or without points', () => {
  expect(messages(sampleLabel)).toEqual([]);
  const { points: _, ...bare } = sampleSeason;
  expect(messages({ ...sampleLabel, seasons: [bare] })).toEqual([]);
});

test('a problem tells line and column of the entry', () => {
  const { problems } = loadUnit(
    'unit.yaml',
    memoryFiles({ 'unit.yaml': labelFile(withSeason({ bivalentTemperature: -12 })) }),
  );
  const lines = labelFile(withSeason({ bivalentTemperature: -12 })).split('\n');
  const line = lines.findIndex((text) => text.includes('bivalentTemperature')) + 1;
  expect(problems[0]).toMatchObject({ line, column: lines[line - 1]!.indexOf('-12') + 1 });
});

describe('a label is refused', () => {
  test('without idle powers, unless each season has its own', () => {
    const { idlePowers, ...without } = sampleLabel;
    expect(messages(without)).toEqual([
      'label.seasons[0] declares a season, but no idle powers are given → add idlePowers to the label: off, thermostatOff, standby and crankcase, in W, as the data sheet declares them',
    ]);
    expect(messages({ ...without, seasons: [{ ...sampleSeason, idlePowers }] })).toEqual([]);
  });

  test('with the same season twice', () => {
    expect(messages({ ...sampleLabel, seasons: [sampleSeason, sampleSeason] })).toEqual([
      'label.seasons[1] is average 55 °C once more; first in label.seasons[0] → keep one of the two',
    ]);
  });

  test('with the same outlets twice', () => {
    const outlets: WrittenOutlets = { climate: 'warmer', application: 45, points: [[7, 38]] };
    expect(messages({ ...sampleLabel, outlets: [outlets, { ...outlets }] })).toEqual([
      'label.outlets[1] is warmer 45 °C once more; first in label.outlets[0] → keep one of the two',
    ]);
  });

  test.each([
    [[], 'no point'],
    [[sampleSeason.points![0]!], 'one'],
    [[sampleSeason.points![0]!, sampleSeason.points![0]!], 'one'],
  ])('with fewer than two different outdoor temperatures (%#)', (points, found) => {
    expect(messages(withSeason({ points }))).toEqual([
      `label.seasons[0].points has ${found}; a season needs two different outdoor temperatures → add points of the data sheet, or take the list out`,
    ]);
  });

  test.each([{ capacity: 5.5 }, { cop: 2.05 }, { degradation: 0.95 }])('with a point repeated with %o', (changes) => {
    const points = [...sampleSeason.points!, { ...sampleSeason.points![1]!, ...changes }];
    expect(messages(withSeason({ points }))).toEqual([
      'label.seasons[0].points[5] is at −7 °C once more, with other values than label.seasons[0].points[1] → compare both with the data sheet and keep the right one',
    ]);
  });

  test('with T_biv below TOL', () => {
    const { points: _, ...bare } = sampleSeason;
    expect(messages({ ...sampleLabel, seasons: [{ ...bare, bivalentTemperature: -12 }] })).toEqual([
      'label.seasons[0].bivalentTemperature is −12 °C, below the operating limit of −10 °C: the unit cannot carry the load where it does not run → compare T_biv and TOL with the data sheet; they may be exchanged',
    ]);
  });

  test('with a COP above the Carnot COP at the outlet temperature of its point', () => {
    // 7 °C outdoors, 36 °C outlet: (36 + 276.15)/(36 − 7 + 10) = 8.00
    expect(messages(withPoint(3, { cop: 8.02 }))).toEqual([
      'label.seasons[0].points[3].cop: a COP of 8.02 is more than physics allows at this point (8.00) → look for a slip of the pen, and whether the outdoor temperature is the right one',
    ]);
    expect(messages(withPoint(3, { cop: 7.98 }))).toEqual([]);
  });

  test('with a COP that comes to nothing in mild weather', () => {
    // from 4.2 to 0.6 over 5 K: below zero from 13 °C on
    expect(messages(withPoint(4, { cop: 0.6, capacity: 1 }))).toEqual([
      'label.seasons[0].points: extended along the two warmest points, the COP comes to nothing in mild weather → compare COP and capacity of the two warmest points with the data sheet',
    ]);
  });

  test.each([-0.1, 1.1])('with a degradation of %f', (degradation) => {
    expect(messages(withSeason({ degradation }))[0]).toContain('it lies between 0 and 1');
    expect(messages(withPoint(0, { degradation }))[0]).toContain('it lies between 0 and 1');
  });

  test('with an unknown application, naming those there are', () => {
    const text = labelFile(sampleLabel).replace('application: 55', 'application: 50');
    const { problems } = loadUnit('unit.yaml', memoryFiles({ 'unit.yaml': text }));
    expect(problems.map(problemText)[0]).toContain('label.seasons[0].application is 50; it is 35 or 45 or 55 or 65');
  });
});

describe('outlets are refused', () => {
  const outlets = (points: [number, number][]): WrittenLabel => ({
    ...sampleLabel,
    outlets: [{ climate: 'colder', application: 65, points }],
  });

  test('colder than the design temperature, or at it with another outlet than the application', () => {
    const at = (outdoor: string) =>
      `label.outlets[0].points[0] is at ${outdoor} °C; at the design temperature of −22 °C the outlet is the application’s own, and it is not colder than that → write points above the design temperature, such as −7, 2, 7 and 12 °C`;
    expect(
      messages(
        outlets([
          [-25, 65],
          [7, 40],
        ]),
      ),
    ).toEqual([at('−25')]);
    expect(
      messages(
        outlets([
          [-22, 60],
          [7, 40],
        ]),
      ),
    ).toEqual([at('−22')]);
    expect(
      messages(
        outlets([
          [-22, 65],
          [7, 40],
        ]),
      ),
    ).toEqual([]);
  });

  test('without a point above the design temperature', () => {
    expect(messages(outlets([[-22, 65]]))).toEqual([
      'label.outlets[0].points has no point above the design temperature of −22 °C → write the points of EN 14825 above it, such as −7, 2, 7 and 12 °C',
    ]);
  });

  test('out of order', () => {
    expect(
      messages(
        outlets([
          [7, 40],
          [2, 48],
        ]),
      )[0],
    ).toContain('label.outlets[0].points[1] is at 2 °C, not above');
  });
});

describe('a label is warned of', () => {
  // Source: Regulation (EU) 813/2013: T_biv at most 2, 7, −7 °C, TOL at most −7, 2, −15 °C.
  test.each<[WrittenSeason['climate'], number, number]>([
    ['average', 2, -7],
    ['warmer', 7, 2],
    ['colder', -7, -15],
  ])('in the %s climate with T_biv above %i °C or TOL above %i °C', (climate, bivalent, limit) => {
    const { points: _, ...bare } = sampleSeason;
    const found = (bivalentTemperature: number, operatingLimit: number) =>
      messages({ ...sampleLabel, seasons: [{ ...bare, climate, bivalentTemperature, operatingLimit }] });
    const shown = (value: number) => String(value).replace('-', '−');
    expect(found(bivalent, limit)).toEqual([]);
    expect(found(bivalent + 1, limit)).toEqual([
      `warning: label.seasons[0].bivalentTemperature is ${shown(bivalent + 1)} °C; in this climate Regulation (EU) 813/2013 allows at most ${shown(bivalent)} °C → compare T_biv and the climate with the data sheet`,
    ]);
    expect(found(bivalent, limit + 1)).toEqual([
      `warning: label.seasons[0].operatingLimit is ${shown(limit + 1)} °C; in this climate Regulation (EU) 813/2013 allows at most ${shown(limit)} °C → compare TOL and the climate with the data sheet`,
    ]);
  });

  test('with a capacity far below the part load, though it is no colder than T_biv', () => {
    // part load at 2 °C: 6·14/26 = 3.23 kW; 90 % of it is 2.91
    expect(messages(withPoint(2, { capacity: 2.9 }))).toEqual([
      'warning: label.seasons[0].points[2].capacity is 2.9 kW, more than 10 % below the part load of 3.23 kW, though it is not colder than T_biv → compare the capacity, designLoad and bivalentTemperature with the data sheet',
    ]);
    expect(messages(withPoint(2, { capacity: 2.92 }))).toEqual([]);
    // colder than T_biv a shortfall is what T_biv says
    expect(messages(withPoint(0, { capacity: 4 }))).toEqual([]);
  });
});
