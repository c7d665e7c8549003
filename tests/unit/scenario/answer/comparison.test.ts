import { describe, expect, test } from 'vitest';
import { answerOf, flatTariff, there } from './sampleAnswer.ts';

const gas =
  'boiler: { efficiency: 0.9, fuel: { kind: naturalGas, price: 0.12, standingPerYear: 120 }, servicePerYear: 150 }';
const life =
  'wholeLife: { capital: 20000, grant: 7000, replacedBoiler: 8000, years: 15, discountRate: 4, electricityDrift: 1, servicePerYear: 90 }';
const sample = { tariffs: '[flat.yaml]', files: { 'flat.yaml': flatTariff('Flat', 0.25, 100) } };
// Sums of some thousand of money.
const DIGITS = 6;

describe('heat pump against boiler on the first tariff', () => {
  const answer = answerOf({ ...sample, sections: `household: { given: profile, kWhPerYear: 2500 }\n${gas}\n${life}` });
  const comparison = there(answer.comparison);
  const cost = there(answer.costs[0]);
  const { annual } = answer.totals;

  test('breaks even where the boiler’s cost less the heat pump’s service buys its electricity', () => {
    const left = there(cost.boilerCost) - 90;
    expect(comparison.breakEven.price).toBeCloseTo(left / annual.electricity, DIGITS);
    // the mean price of its kWh: 0.25 and 20 % tax
    expect(comparison.breakEven.meanPrice).toBeCloseTo(0.3, DIGITS);
    const heat = annual.heatPumpSpaceHeat + annual.backupSpaceHeat;
    expect(comparison.breakEven.factor).toBeCloseTo((heat * 0.3) / left, DIGITS);
    expect(comparison.breakEven.heatOverElectricity).toBeCloseTo(heat / annual.electricity, DIGITS);
  });

  test('has today’s saving in the middle of the table, and nine rows', () => {
    expect(comparison.sensitivity).toHaveLength(9);
    expect(comparison.sensitivity[4]?.annualSaving).toBe(cost.saving);
    expect(comparison.sensitivity[4]?.netPresentValue).toBe(comparison.wholeLife?.netPresentValue);
  });

  test('saves by a fifth of the kWh’s cost more where electricity is a fifth cheaper', () => {
    const cheaper = there(comparison.sensitivity[1]);
    expect(cheaper).toMatchObject({ electricityChange: -0.2, fuelChange: 0 });
    expect(cheaper.annualSaving - there(cost.saving)).toBeCloseTo(0.2 * annual.electricity * 0.3, DIGITS);
  });

  test('takes rates in per cent and counts capital less grant less the boiler not bought', () => {
    const { terms, netCapital, years } = there(comparison.wholeLife);
    expect(terms).toMatchObject({ discountRate: 0.04, electricityDrift: 0.01, fuelDrift: 0 });
    expect(netCapital).toBe(5000);
    expect(years).toHaveLength(15);
    expect(years[0]?.saving).toBeCloseTo(there(cost.saving), DIGITS);
    expect(years[0]?.presentValue).toBeCloseTo(there(cost.saving) / 1.04, DIGITS);
  });

  test('has no net present value without a whole life, and no comparison without a boiler or a tariff', () => {
    const plain = there(answerOf({ ...sample, sections: gas }).comparison);
    expect(plain.wholeLife).toBeUndefined();
    expect(plain.sensitivity.every((row) => row.netPresentValue === undefined)).toBe(true);
    expect(answerOf(sample).comparison).toBeUndefined();
    expect(answerOf({ sections: gas, tariffs: '[]' }).comparison).toBeUndefined();
  });
});
