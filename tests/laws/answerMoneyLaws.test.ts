import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { answerOf, there } from '../unit/scenario/answer/sampleAnswer.ts';

// What is always true of the money of a whole answer, on households, tariffs and boilers drawn at random. Each run simulates
// a year, so there are few.
const RUNS = { seed: 20_250_104, numRuns: 15 };
// Bills of some ten thousand of money, summed in another order.
const DIGITS = 6;

const cents = (most: number) => fc.integer({ min: 0, max: most }).map((value) => value / 100);
const shares = fc
  .array(fc.integer({ min: 0, max: 9 }), { minLength: 24, maxLength: 24 })
  .map((list) => [1, ...list.slice(1)]);
const household = fc
  .record({ kWhPerYear: fc.integer({ min: 0, max: 9000 }), shares })
  .map((entry) => `household: ${JSON.stringify({ given: 'profile', ...entry })}`);
const taxes = fc.integer({ min: 0, max: 25 }).map((percent) => [{ name: 'VAT', percent }]);
const standing = fc.record({ perDay: cents(80), perYear: cents(30_000) });
const flat = fc.record({
  name: fc.constant('Flat'),
  rates: cents(60).map((price) => [{ name: 'all', price }]),
  standing,
  taxes,
});
const banded = fc.record({
  name: fc.constant('Bands'),
  rates: fc.tuple(cents(60), cents(60)).map(([night, day]) => [
    { name: 'night', price: night, from: '22:00', to: '06:30' },
    { name: 'day', price: day },
  ]),
  standing,
  taxes,
});
const boiler = fc
  .record({
    price: cents(30),
    standingPerYear: cents(20_000),
    servicePerYear: cents(30_000),
    pumpPower: fc.integer({ min: 0, max: 200 }),
  })
  .map(
    ({ price, standingPerYear, servicePerYear, pumpPower }) =>
      `boiler: { efficiency: 0.9, fuel: { kind: naturalGas, price: ${price}, standingPerYear: ${standingPerYear} }, pumpPower: ${pumpPower}, servicePerYear: ${servicePerYear} }`,
  );
const wholeLife = fc
  .record({ capital: fc.integer({ min: 0, max: 40_000 }), servicePerYear: fc.integer({ min: 0, max: 400 }) })
  .map((entry) => `wholeLife: ${JSON.stringify(entry)}`);
const asYaml = (tariff: object) => ({ 't.yaml': JSON.stringify(tariff) });

describe('the money of an answer', () => {
  test('has one saving: boiler less heating, the middle of the table, and that of the first year', () => {
    const law = fc.property(household, banded, boiler, wholeLife, (home, tariff, other, life) => {
      const { costs, comparison } = answerOf({
        sections: `${home}\n${other}\n${life}`,
        tariffs: '[t.yaml]',
        files: asYaml(tariff),
      });
      const [cost] = costs;
      expect(cost?.saving).toBe(there(cost?.boilerCost) - there(cost?.heatingCost));
      expect(comparison?.sensitivity[4]?.annualSaving).toBe(cost?.saving);
      expect(comparison?.wholeLife?.years[0]?.saving).toBeCloseTo(there(cost?.saving), DIGITS);
      expect(comparison?.sensitivity[4]?.netPresentValue).toBe(comparison?.wholeLife?.netPresentValue);
    });
    fc.assert(law, RUNS);
  });

  test('has on a flat tariff a bill of the household’s and the heating’s kWh, each at its price and tax', () => {
    const law = fc.property(household, flat, (home, tariff) => {
      const { costs, totals } = answerOf({ sections: home, tariffs: '[t.yaml]', files: asYaml(tariff) });
      const cost = there(costs[0]);
      const perKWh = (tariff.rates[0]?.price ?? 0) * (1 + (tariff.taxes[0]?.percent ?? 0) / 100);
      expect(cost.heatingCost).toBeCloseTo(totals.annual.electricity * perKWh, DIGITS);
      expect(cost.bill.total).toBeCloseTo(cost.householdBill.total + cost.heatingCost, DIGITS);
    });
    fc.assert(law, RUNS);
  });

  test('has by rate the kWh of the household and of the heating added up', () => {
    const law = fc.property(household, banded, (home, tariff) => {
      const files = asYaml(tariff);
      const both = there(answerOf({ sections: home, tariffs: '[t.yaml]', files }).costs[0]);
      const alone = there(answerOf({ tariffs: '[t.yaml]', files }).costs[0]);
      for (const rate of ['night', 'day']) {
        const parts = there(alone.bill.byRate[rate]).kWh + there(both.householdBill.byRate[rate]).kWh;
        expect(there(both.bill.byRate[rate]).kWh).toBeCloseTo(parts, DIGITS);
      }
      // without blocks and demand charges the heating costs the same whatever the household takes
      expect(both.heatingCost).toBeCloseTo(alone.heatingCost, DIGITS);
    });
    fc.assert(law, RUNS);
  });

  test('is the same on a tariff and on two halves of the year of that tariff', () => {
    const law = fc.property(household, banded, fc.integer({ min: 2, max: 12 }), (home, tariff, month) => {
      const from = `${String(month).padStart(2, '0')}-13`;
      const { costs } = answerOf({
        sections: home,
        tariffs: `[t.yaml, { supplies: [{ file: t.yaml }, { file: t.yaml, from: ${from} }] }]`,
        files: asYaml(tariff),
      });
      const [whole, halves] = costs;
      expect(halves?.bill.total).toBeCloseTo(there(whole).bill.total, DIGITS);
      expect(halves?.heatingCost).toBeCloseTo(there(whole).heatingCost, DIGITS);
      expect(halves?.bill.standing).toBeCloseTo(there(whole).bill.standing, DIGITS);
    });
    fc.assert(law, RUNS);
  });
});
