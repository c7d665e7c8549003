import { describe, expect, test } from 'vitest';
import { type WholeLifeTerms, wholeLife } from '../../../src/compare/wholeLife.ts';

const terms: WholeLifeTerms = {
  capital: 1000,
  grant: 0,
  replacedBoiler: 0,
  years: 5,
  discountRate: 0,
  electricityDrift: 0,
  fuelDrift: 0,
};
const nothing = { electricity: 0, fuel: 0, service: 0 };
const saves = (money: number) => ({ electricity: 0, fuel: money, service: 0 });

/** A payback in years; a test fails where there is only a word. */
const years = (payback: number | string) => (typeof payback === 'number' ? payback : Number.NaN);

describe('the years of a whole life', () => {
  test('begin at today’s prices and drift from the second on, service not', () => {
    const heatPump = { electricity: 600, fuel: 0, service: 100 };
    const boiler = { electricity: 0, fuel: 1000, service: 150 };
    const life = wholeLife(heatPump, boiler, { ...terms, years: 3, electricityDrift: 0.2, fuelDrift: 0.1 });
    // fuel 1000, 1100, 1210; electricity 600, 720, 864; service 50 less in each
    const expected = [450, 430, 396];
    expect(life.years.map(({ year }) => year)).toEqual([1, 2, 3]);
    life.years.forEach(({ saving }, i) => {
      expect(saving).toBeCloseTo(expected[i] as number, 10);
    });
    expect(life.netPresentValue).toBeCloseTo(450 + 430 + 396 - 1000, 10);
  });

  test('are due at their end: the first is discounted by one year', () => {
    const { years: rows } = wholeLife(nothing, saves(110), { ...terms, years: 2, discountRate: 0.1 });
    expect(rows[0]?.presentValue).toBeCloseTo(100, 10);
    expect(rows[1]?.presentValue).toBeCloseTo(110 / 1.21, 10);
    expect(rows[1]?.balance).toBeCloseTo(100 + 110 / 1.21 - 1000, 10);
  });

  test('begin with the capital less the grant and the boiler that need not be bought', () => {
    const life = wholeLife(nothing, saves(300), { ...terms, grant: 250, replacedBoiler: 350 });
    expect(life.netCapital).toBe(400);
    expect(life.netPresentValue).toBe(5 * 300 - 400);
  });
});

describe('the simple payback', () => {
  test('is the net capital over the first year’s saving, without drift and discount, beyond the years too', () => {
    const { simplePayback } = wholeLife(nothing, saves(125), { ...terms, discountRate: 0.1, fuelDrift: 0.05 });
    expect(simplePayback).toBe(8);
  });

  test.each([0, -50])('is never reached at a saving of %d', (money) => {
    expect(wholeLife(nothing, saves(money), terms).simplePayback).toBe('never');
  });

  test('is never reached at a saving so small that no number holds the years', () => {
    expect(wholeLife(nothing, saves(Number.MIN_VALUE), terms).simplePayback).toBe('never');
  });
});

describe('the discounted payback', () => {
  test('lies within its year in proportion to what is lacking', () => {
    // 300 a year at 10 %: four years are worth 300·(1 − 1.1^−4)/0.1 = 950.9596, the fifth 186.2764
    const { discountedPayback } = wholeLife(nothing, saves(300), { ...terms, discountRate: 0.1 });
    expect(years(discountedPayback)).toBeCloseTo(4 + (1000 - 950.9596) / 186.2764, 5);
  });

  test('lies within the first year where that pays more than all', () => {
    // 2200/1.1 = 2000 for 1000
    const { discountedPayback } = wholeLife(nothing, saves(2200), { ...terms, discountRate: 0.1 });
    expect(years(discountedPayback)).toBeCloseTo(0.5, 12);
  });

  test('may be the very end of the last year', () => {
    expect(wholeLife(nothing, saves(200), terms).discountedPayback).toBe(5);
  });

  test('is never reached where interest eats the saving, though the simple one is', () => {
    // 90 a year for ever are worth 900 at 10 %
    const life = wholeLife(nothing, saves(90), { ...terms, years: 60, discountRate: 0.1 });
    expect(life.discountedPayback).toBe('never');
    expect(years(life.simplePayback)).toBeCloseTo(1000 / 90, 10);
  });

  test('is never reached where it lies beyond the years looked at', () => {
    expect(wholeLife(nothing, saves(199), terms).discountedPayback).toBe('never');
  });

  test('is the first of several, where the balance falls again', () => {
    // savings 600, 400, then less as electricity doubles: 0, −800
    const heatPump = { electricity: 200, fuel: 0, service: 0 };
    const boiler = { electricity: 0, fuel: 0, service: 800 };
    const life = wholeLife(heatPump, boiler, { ...terms, capital: 800, years: 4, electricityDrift: 1 });
    expect(life.discountedPayback).toBe(1.5);
    expect(life.netPresentValue).toBe(600 + 400 + 0 - 800 - 800);
  });
});

test.each([300, -300])('with nothing to be paid the heat pump pays at once, at a saving of %d', (money) => {
  const life = wholeLife(nothing, saves(money), { ...terms, grant: 400, replacedBoiler: 700 });
  expect(life.netCapital).toBe(-100);
  expect([life.simplePayback, life.discountedPayback]).toEqual(['at once', 'at once']);
  expect(life.netPresentValue).toBe(5 * money + 100);
});
