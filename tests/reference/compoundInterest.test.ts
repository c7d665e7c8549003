import { describe, expect, test } from 'vitest';
import { type WholeLifeTerms, wholeLife } from '../../src/compare/wholeLife.ts';
import { accuracySection } from './accuracyRecord.ts';

// Sources. Factors: the compound-interest tables that stand at the back of texts on engineering economy, such as
// L. Blank and A. Tarquin, Engineering Economy: P/F and P/A with four decimals, A/P with five (from memory). The present-
// worth factors of 3 % are also those of the life-cycle costing of the US federal energy programme, NIST Handbook 135
// with its annual supplement, table A (from memory). Geometric gradient: the closed form of the same texts (from memory).

const terms: WholeLifeTerms = {
  capital: 0,
  grant: 0,
  replacedBoiler: 0,
  years: 1,
  discountRate: 0,
  electricityDrift: 0,
  fuelDrift: 0,
};
const nothing = { electricity: 0, fuel: 0, service: 0 };
const saves = (money: number) => ({ electricity: 0, fuel: money, service: 0 });
const near = (found: number | string, expected: number, tolerance: number) =>
  expect(Math.abs((typeof found === 'number' ? found : Number.NaN) - expected)).toBeLessThanOrEqual(tolerance);

/** The last of four printed decimals is good to half a unit. */
const FOUR_DECIMALS = 0.00005;
/** Closed forms of some tens of terms. */
const ROUNDING = 1e-12;

const accuracy = accuracySection(import.meta.url, 'Money over the years');
const presentWorth = accuracy.comparison({
  what: 'present worth of a saving of one a year, P/A',
  source: 'compound-interest tables of engineering economy (from memory)',
  unit: '',
  allowed: FOUR_DECIMALS,
  why: 'the last of four printed decimals',
});
const singleWorth = accuracy.comparison({
  what: 'present worth of a saving in one year, P/F',
  source: 'the same tables (from memory)',
  unit: '',
  allowed: FOUR_DECIMALS,
  why: 'the last of four printed decimals',
});
const recovery = accuracy.comparison({
  what: 'years until a capital is paid back by A/P',
  source: 'the same tables (from memory)',
  unit: 'a',
  allowed: 0.0022,
  why: 'half a unit of the fifth decimal, at the pace of the year that follows',
});
const gradients = accuracy.comparison({
  what: 'present worth of a drifting saving',
  source: 'closed form of the geometric gradient (from memory)',
  unit: '',
  allowed: 1e-8,
  why: 'tens of terms in floating point',
});
const byHand = accuracy.comparison({
  what: 'payback of 1000 by 300 a year at 10 %',
  source: 'worked by hand',
  unit: 'a',
  allowed: 1e-11,
  why: 'floating point',
});

describe('a saving of one money a year', () => {
  test.each([
    [0.01, 20, 18.0456],
    [0.02, 20, 16.3514],
    [0.03, 10, 8.5302],
    [0.03, 15, 11.9379],
    [0.03, 20, 14.8775],
    [0.04, 10, 8.1109],
    [0.04, 20, 13.5903],
    [0.05, 10, 7.7217],
    [0.05, 15, 10.3797],
    [0.05, 20, 12.4622],
    [0.06, 15, 9.7122],
    [0.07, 30, 12.409],
    [0.08, 25, 10.6748],
    [0.1, 10, 6.1446],
    [0.1, 20, 8.5136],
  ])('at %f over %i years is worth the table’s P/A = %f', (discountRate, years, factor) => {
    const { netPresentValue } = wholeLife(nothing, saves(1), { ...terms, discountRate, years });
    near(netPresentValue, factor, FOUR_DECIMALS);
    presentWorth.add(netPresentValue - factor);
  });

  test.each([
    [0.03, 10, 0.7441],
    [0.03, 20, 0.5537],
    [0.05, 10, 0.6139],
    [0.05, 20, 0.3769],
    [0.08, 10, 0.4632],
    [0.1, 5, 0.6209],
  ])('at %f in year %i alone is worth the table’s P/F = %f', (discountRate, years, factor) => {
    const last = wholeLife(nothing, saves(1), { ...terms, discountRate, years }).years.at(-1);
    near(last?.presentValue ?? Number.NaN, factor, FOUR_DECIMALS);
    singleWorth.add((last?.presentValue ?? Number.NaN) - factor);
  });
});

test.each([
  [0.05, 10, 0.1295],
  [0.05, 20, 0.08024],
  [0.1, 10, 0.16275],
])(
  'at %f a capital of one is paid back after %i years by the table’s A/P = %f a year',
  (discountRate, years, factor) => {
    const life = wholeLife(nothing, saves(factor), { ...terms, capital: 1, discountRate, years: years + 5 });
    // Half a unit of the fifth decimal, as a share of the factor, is lacking or left of a worth of one, and is made up at the
    // pace of the year that follows.
    const pace = factor / (1 + discountRate) ** (years + 1);
    near(life.discountedPayback, years, 0.000005 / factor / pace);
    recovery.add(Number(life.discountedPayback) - years);
  },
);

describe('a saving that drifts', () => {
  const gradient = (g: number, i: number, n: number) => (1 - ((1 + g) / (1 + i)) ** n) / (i - g);

  test.each([
    [0.02, 0.03, 20],
    [-0.01, 0.04, 15],
    [0.06, 0.03, 25],
    [0.01, 0, 10],
  ])('by %f at %f over %i years is worth the geometric gradient', (fuelDrift, discountRate, years) => {
    const life = wholeLife(nothing, saves(1), { ...terms, fuelDrift, discountRate, years });
    near(life.netPresentValue, gradient(fuelDrift, discountRate, years), 100 * ROUNDING);
    gradients.add(life.netPresentValue - gradient(fuelDrift, discountRate, years));
  });

  test('as fast as the discount is worth n/(1 + i)', () => {
    const life = wholeLife(nothing, saves(1), { ...terms, fuelDrift: 0.03, discountRate: 0.03, years: 20 });
    near(life.netPresentValue, 20 / 1.03, 100 * ROUNDING);
  });

  test('with two drifts is the difference of two gradients, and service an annuity', () => {
    const heatPump = { electricity: 900, fuel: 0, service: 130 };
    const boiler = { electricity: 0, fuel: 1500, service: 200 };
    const drifts = { electricityDrift: 0.01, fuelDrift: 0.025, discountRate: 0.04 };
    const life = wholeLife(heatPump, boiler, { ...terms, ...drifts, capital: 11_000, grant: 3000, years: 18 });
    const worth = 1500 * gradient(0.025, 0.04, 18) - 900 * gradient(0.01, 0.04, 18) + 70 * gradient(0, 0.04, 18);
    near(life.netPresentValue, worth - 8000, 1e-8);
    gradients.add(life.netPresentValue - (worth - 8000));
  });
});

test('1000 paid back by 300 a year at 10 % takes 4.2633 years, worked by hand and linear within the fifth', () => {
  // Powers of 1.1: 1.1, 1.21, 1.331, 1.4641, 1.61051. Present values of 300: 272.7273, 247.9339, 225.3944, 204.9040,
  // 186.2764; together after four years 300·(1 − 1/1.4641)/0.1 = 950.9596. Lacking 49.0404, of 186.2764: exactly
  // (1000·1.61051/300 − (1.61051 − 1.1)/0.1) = 5.36836667 − 5.1051 = 0.26326667.
  const life = wholeLife(nothing, saves(300), { ...terms, capital: 1000, discountRate: 0.1, years: 10 });
  near(life.discountedPayback, 4 + (1000 * 1.61051) / 300 - 5.1051, 1e-11);
  byHand.add(Number(life.discountedPayback) - (4 + (1000 * 1.61051) / 300 - 5.1051));
  near(life.simplePayback, 10 / 3, ROUNDING);
});
