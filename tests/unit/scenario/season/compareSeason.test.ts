import { describe, expect, test } from 'vitest';
import { labelSchema } from '../../../../src/scenario/labelSchema.ts';
import { compareSeason } from '../../../../src/scenario/season/compareSeason.ts';
import type { SeasonResult } from '../../../../src/sim/season/seasonalSum.ts';
import { sampleLabel, sampleSeason } from './labelFiles.ts';

const result = (scop: number, efficiency: number): SeasonResult => ({
  ...{ scop, efficiency, scopOn: scop, heat: 1, electricity: 1, idleElectricity: 0, bins: [] },
});
const declared = (figures: { scop?: number; efficiency?: number }) =>
  labelSchema.parse({ ...sampleLabel, seasons: [{ ...sampleSeason, ...figures }] }).seasons[0]!;

describe('a map beside its label', () => {
  test.each([
    [4.31, true],
    [4.33, false],
    [3.69, true],
    [3.67, false],
  ])('with a SCOP of %f for a declared 4.00 agrees: %s (8 %% of 4 is 0.32)', (scop, agrees) => {
    const { map } = compareSeason(result(scop, 160), undefined, declared({ scop: 4 }));
    expect(map).toMatchObject({ of: 'scop', against: 'label', found: scop, expected: 4, agrees });
  });

  test('is told by the figure that lies farther off, where the label gives both', () => {
    const { map } = compareSeason(result(4, 157), undefined, declared({ scop: 4, efficiency: 175 }));
    expect(map).toMatchObject({ of: 'efficiency', expected: 175, agrees: false });
    expect(map?.share).toBeCloseTo(157 / 175 - 1, 12);
  });

  test('is held against the points where the label has no figure of its own', () => {
    const { map, points } = compareSeason(result(4, 157), result(3.5, 137), declared({}));
    expect(map).toMatchObject({ of: 'scop', against: 'points', expected: 3.5, agrees: false });
    expect(points).toBeUndefined();
  });

  test('is compared with nothing where nothing is declared', () => {
    expect(compareSeason(result(4, 157), undefined, undefined)).toEqual({});
  });
});

test('points are held to 1 % of their own label', () => {
  const agrees = (scop: number) => compareSeason(undefined, result(scop, 150), declared({ scop: 4 })).points?.agrees;
  expect([3.95, 3.97, 4.03, 4.05].map(agrees)).toEqual([false, true, true, false]);
});
