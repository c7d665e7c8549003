import { describe, expect, it } from 'vitest';
import { Ranking } from '../../../src/batch/ranking.ts';

const row = (job: number, value: number, unit: string) => ({ job, home: `home ${job}`, axes: [unit, job % 2], value });

function ranked(by: 'cost' | 'seasonalFactor', values: number[], top = 2, only?: string) {
  const ranking = new Ranking(by, ['unit', 'parity'], top);
  for (const [i, value] of values.entries()) ranking.add(row(i + 1, value, i < 2 ? 'large' : 'small'));
  return ranking.result(only);
}

describe('a ranking', () => {
  it('by cost has the least first, and the most last', () => {
    const { best, worst, spread } = ranked('cost', [900, 700, 1200, 800]);
    expect(best.map(({ value }) => value)).toEqual([700, 800]);
    expect(worst.map(({ value }) => value)).toEqual([1200, 900]);
    expect(spread).toMatchObject({ count: 4, mean: 900, median: 850 });
  });

  it('by the seasonal factor has the most first', () => {
    const { best, worst } = ranked('seasonalFactor', [3.1, 2.9, 3.4, 2.5]);
    expect(best.map(({ value }) => value)).toEqual([3.4, 3.1]);
    expect(worst.map(({ value }) => value)).toEqual([2.5, 2.9]);
  });

  it('puts the earlier job before its equals, at either end', () => {
    const { best, worst } = ranked('cost', [5, 5, 5], 2);
    expect(best.map(({ job }) => job)).toEqual([1, 2]);
    expect(worst.map(({ job }) => job)).toEqual([1, 2]);
  });

  it('sets the values of each axis side by side, the best mean first', () => {
    const { axes } = ranked('cost', [900, 700, 1200, 800]);
    expect(axes.map(({ axis, values }) => [axis, values.map(({ value, spread }) => [value, spread.mean])])).toEqual([
      [
        'unit',
        [
          ['large', 800],
          ['small', 1000],
        ],
      ],
      // jobs 1 and 3: 900 and 1200; jobs 2 and 4: 700 and 800
      [
        'parity',
        [
          [0, 750],
          [1, 1050],
        ],
      ],
    ]);
  });

  it('sets one axis alone side by side where it is asked for', () => {
    expect(ranked('cost', [1, 2], 1, 'parity').axes.map(({ axis }) => axis)).toEqual(['parity']);
  });

  it('of nothing has no spread and no rows', () => {
    expect(ranked('cost', [])).toEqual({ spread: undefined, best: [], worst: [], axes: expect.anything() });
  });
});
