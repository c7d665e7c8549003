import { describe, expect, test } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { prepareTariff } from '../../../src/tariffs/prepareTariff.ts';
import type { Rate, Tariff } from '../../../src/tariffs/tariff.ts';
import { clockOf, ratesOf, tariffOf } from './sampleTariffs.ts';

const berlin = clockOf('Europe/Berlin', 60);
const rest: Rate = { name: 'rest', price: 0.3 };

/** The sentences about a tariff, and whether it could be prepared. */
function said(tariff: Tariff): { says: string[]; usable: boolean } {
  const { problems, prepared } = prepareTariff({ tariff, file: 't.yaml' }, berlin);
  return { says: problems.map((problem) => problemText(problem).split('\n')[0]), usable: prepared !== undefined };
}

describe('a tariff cannot be used', () => {
  test.each<[string, Tariff, string[]]>([
    ['without any price', tariffOf({}), ['t.yaml  this tariff has no price for electricity']],
    [
      'with times that no clock shows',
      ratesOf({ name: 'x', price: 1, from: '25:00', to: '7' }, { name: 'y', price: 1, from: '24:00' }, rest),
      [
        't.yaml  rates[0].from is 25:00, which is no time of day',
        't.yaml  rates[0].to is 7, which is no time of day',
        't.yaml  rates[1].from is 24:00, which is no time of day',
        't.yaml  rates[1].to is left out, the same as its beginning',
      ],
    ],
    [
      'with a rate that ends where it begins',
      ratesOf({ name: 'x', price: 1, from: '06:00', to: '06:00' }, rest),
      ['t.yaml  rates[0].to is 06:00, the same as its beginning'],
    ],
    [
      'with dates that do not exist',
      {
        ...ratesOf({ name: 'x', price: 1, dates: { from: '02-30', to: '2025-04-01' } }, rest),
        holidays: ['2025-02-29'],
      },
      [
        't.yaml  rates[0].dates.from is 02-30, a date that does not exist',
        't.yaml  rates[0].dates.to is 2025-04-01, a date that does not exist',
        't.yaml  holidays[0] is 2025-02-29, a date that does not exist',
      ],
    ],
    [
      // Saturdays and Sundays without a price; 4 January is the first, 104 such days, two of them with a clock change.
      'with minutes that no rate prices',
      ratesOf({ name: 'x', price: 1, weekdays: ['mon', 'tue', 'wed', 'thu', 'fri'] }),
      ['t.yaml  no rate covers sat 2025-01-04 00:00; in all 149760 minutes of the year have no price'],
    ],
    [
      'with minutes that no rate prices, in spite of a clock change',
      // 02:30 to 02:40 daily: not on 30 March, twice on 26 October: 365 · 10 minutes.
      ratesOf({ name: 'x', price: 1, from: '02:40', to: '02:30' }),
      ['t.yaml  no rate covers wed 2025-01-01 02:30; in all 3650 minutes of the year have no price'],
    ],
    [
      'with blocks out of order',
      tariffOf({ blocks: { per: 'month', prices: [{ upTo: 100, price: 1 }, { upTo: 50, price: 1 }, { price: 1 }] } }),
      ['t.yaml  blocks.prices[1].upTo is 50; allowed is more than 100 kWh'],
    ],
    [
      'with blocks that end, or have no end too early',
      tariffOf({ blocks: { per: 'month', prices: [{ price: 1 }, { upTo: 50, price: 1 }] } }),
      [
        't.yaml  blocks.prices[0].upTo is left out; allowed is more than 0 kWh',
        't.yaml  blocks.prices[1].upTo is 50; allowed is nothing in the last block',
      ],
    ],
    [
      'without the series that it names',
      tariffOf({ series: { file: 'p.csv', unit: 'perKWh', stamps: 'utc' } }),
      ['t.yaml  the price series p.csv could not be used, so this tariff cannot be priced'],
    ],
  ])('%s', (_, tariff, expected) => {
    expect(said(tariff)).toEqual({ says: expected, usable: false });
  });
});

describe('a tariff is used with a warning', () => {
  test.each<[string, Tariff, string]>([
    [
      'where a rate is never reached',
      ratesOf(rest, { name: 'late', price: 1, from: '20:00' }),
      'rates[1] (late) never applies in the year',
    ],
    [
      'where holidays matter and none is listed',
      ratesOf({ name: 'x', price: 1, holidays: 'never' }, { ...rest, holidays: 'only' }),
      'rates[0].holidays is never, but no holiday is listed',
    ],
    [
      'where all holidays are of other years',
      { ...ratesOf(rest), holidays: ['2024-12-25', '2026-12-25'] },
      'none of the dated holidays lies in the calendar year 2025; the first is 2024-12-25',
    ],
  ])('%s', (_, tariff, expected) => {
    const { says, usable } = said(tariff);
    expect(usable).toBe(true);
    expect(says[0]).toContain('t.yaml  warning: ');
    expect(says[0]).toContain(expected);
  });

  test('but not where the holidays that a rate asks for are listed', () => {
    const rates = [{ ...rest, holidays: 'never' } as const, { ...rest, holidays: 'only' } as const];
    expect(said(tariffOf({ rates, holidays: ['12-25'] })).says).toEqual([]);
  });

  test('but not where its holidays return every year, or one lies in the year', () => {
    expect(said({ ...ratesOf(rest), holidays: ['12-25'] }).says).toEqual([]);
    expect(said({ ...ratesOf(rest), holidays: ['2024-12-25', '2025-12-25'] }).says).toEqual([]);
  });
});

describe('all problems come at once', () => {
  test('and each says what to do', () => {
    const tariff = tariffOf({
      rates: [{ name: 'x', price: 1, from: '25:00' }],
      holidays: ['13-01'],
      blocks: { per: 'year', prices: [{ upTo: 1, price: 1 }] },
    });
    const { problems } = prepareTariff({ tariff, file: 't.yaml' }, berlin);
    expect(problems.map((problem) => problem.path)).toEqual(['rates[0].from', 'holidays[0]', 'blocks.prices[0].upTo']);
    for (const problem of problems) expect(problemText(problem)).toMatch(/\n {4}→ .{20}/);
  });
});
