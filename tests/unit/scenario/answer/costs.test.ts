import { describe, expect, test } from 'vitest';
import { assumptionNote, warningNote } from '../../../../src/report/englishNotes.ts';
import { newColumns } from '../../../../src/sim/columns.ts';
import { simulateYear } from '../../../../src/sim/year.ts';
import { bill } from '../../../../src/tariffs/bill.ts';
import { answerOf, flatTariff, there } from './sampleAnswer.ts';

const gas =
  'boiler: { efficiency: 0.9, fuel: { kind: naturalGas, price: 0.1, standingPerYear: 120 }, pumpPower: 60, servicePerYear: 150 }';
const profile = 'household: { given: profile, kWhPerYear: 2500 }';
const files = { 'flat.yaml': flatTariff('Flat', 0.3, 100), 'low.yaml': flatTariff('Low', 0.1, 300) };
const sum = (column: Float64Array) => column.reduce((all, value) => all + value, 0);
// Sums of some ten thousand kWh in another order.
const DIGITS = 6;

describe('the year on a tariff', () => {
  const answer = answerOf({ sections: `${profile}\n${gas}`, tariffs: '[flat.yaml]', files });
  const cost = there(answer.costs[0]);
  const electricity = answer.totals.annual.electricity;

  test('has heating and household on one bill, and the household alone on another', () => {
    expect(cost.bill.kWh).toBeCloseTo(electricity + 2500, DIGITS);
    expect(cost.householdBill.kWh).toBeCloseTo(2500, DIGITS);
    // (2500·0.3 + 100)·1.2
    expect(cost.householdBill.total).toBeCloseTo(1020, DIGITS);
  });

  test('costs of the heating what it adds to the household’s bill', () => {
    expect(cost.heating.electricity).toBeCloseTo(electricity * 0.3 * 1.2, DIGITS);
    expect(cost.heating).toMatchObject({ fuel: 0, fuelEnergy: 0, service: 0 });
    expect(cost.heatingCost).toBeCloseTo(cost.bill.total - cost.householdBill.total, DIGITS);
  });

  test('costs of the boiler its fuel, its service and what its pump adds to that bill', () => {
    const boiler = there(answer.boiler);
    const hours = answer.columns.spaceHeatNeed.filter((need) => need > 0).length;
    expect(boiler.pumpElectricity).toBeCloseTo(0.06 * hours, DIGITS);
    const pump = boiler.pumpElectricity * 0.36;
    const fuel = (answer.totals.annual.spaceHeatNeed / 0.9) * 0.1 + 120;
    expect(there(cost.boiler).electricity).toBeCloseTo(pump, DIGITS);
    expect(there(cost.boiler).fuel).toBeCloseTo(fuel, DIGITS);
    expect(there(cost.boilerCost)).toBeCloseTo(fuel + 150 + pump, DIGITS);
    expect(cost.saving).toBe(there(cost.boilerCost) - cost.heatingCost);
  });

  test('counts the service of the heat pump that is entered for the whole life', () => {
    const wholeLife = 'wholeLife: { capital: 20000, servicePerYear: 160 }';
    const served = there(
      answerOf({ sections: `${profile}\n${gas}\n${wholeLife}`, tariffs: '[flat.yaml]', files }).costs[0],
    );
    expect(served.heating.service).toBe(160);
    expect(served.heatingCost).toBeCloseTo(cost.heatingCost + 160, DIGITS);
    expect(served.bill.total).toBe(cost.bill.total);
  });

  test('lets heating and household fill blocks together', () => {
    const blocks = 'name: Blocks\nblocks: { per: year, prices: [{ upTo: 2500, price: 0.2 }, { price: 0.5 }] }\n';
    const own = there(answerOf({ sections: profile, tariffs: '[b.yaml]', files: { 'b.yaml': blocks } }).costs[0]);
    // the household fills the first block by itself: all of the heating is in the second
    expect(own.heatingCost).toBeCloseTo(electricity * 0.5, DIGITS);
  });

  test('puts an electric boiler on the household’s bill, heat and pump', () => {
    const electric = 'boiler: { efficiency: 1, fuel: { kind: electricity }, pumpPower: 60 }';
    const { costs, boiler, totals } = answerOf({ sections: electric, tariffs: '[flat.yaml]', files });
    const { heatElectricity, pumpElectricity, fuel } = there(boiler);
    expect(fuel).toBe(0);
    expect(heatElectricity).toBeCloseTo(totals.annual.spaceHeatNeed, DIGITS);
    expect(there(costs[0]?.boilerCost)).toBeCloseTo((heatElectricity + pumpElectricity) * 0.36, DIGITS);
  });

  test('names what it assumes of the household', () => {
    const texts = (sections: string) =>
      answerOf({ sections })
        .assumptions.map(assumptionNote)
        .map(({ path, text }) => `${path} ${text}`);
    expect(texts('').join('\n')).toContain('household No electricity of a household is entered');
    expect(texts(profile).join('\n')).toContain('household.shares Even over the hours of the day.');
  });
});

describe('a hybrid that takes the cheaper source', () => {
  const tariffs = '[flat.yaml, low.yaml]';
  const answer = answerOf({ hybrid: true, sections: profile, tariffs, files });
  const [first, second] = answer.costs;

  test('is driven by the first tariff, and has a run of its own for every further one', () => {
    // at 0.30 with tax gas at 0.1/0.9 is often cheaper, at 0.10 hardly ever
    const again = newColumns(8760);
    const { plan, loaded } = answer;
    const prices = {
      ...there(plan.sourcePrices ?? undefined),
      electricity: there(loaded.tariffs[1]).prepared.marginalPrice,
    };
    simulateYear({ ...plan, sourcePrices: prices }, again);
    expect(first?.bill.kWh).toBeCloseTo(answer.totals.annual.electricity + 2500, DIGITS);
    expect(second?.bill.kWh).toBeCloseTo(sum(again.electricity) + 2500, DIGITS);
    expect(sum(again.fuel)).toBeLessThan(answer.totals.annual.fuel - 100);
    expect(second?.heating.fuel).toBeCloseTo(sum(again.fuel) * 0.1, DIGITS);
  });

  test('costs on the further tariff what it would cost there if that came first', () => {
    const swapped = answerOf({ hybrid: true, sections: profile, tariffs: '[low.yaml, flat.yaml]', files });
    expect(second?.heatingCost).toBeCloseTo(there(swapped.costs[0]).heatingCost, DIGITS);
    expect(first?.heatingCost).toBeCloseTo(there(swapped.costs[1]).heatingCost, DIGITS);
  });

  test('says so', () => {
    const notes = answer.assumptions.map(assumptionNote);
    expect(notes.find(({ path }) => path === 'backup.mode')?.text).toContain('a run of its own');
  });

  test('warns of a further tariff that is priced by blocks alone', () => {
    const blocks = { 'b.yaml': 'name: Blocks\nblocks: { per: year, prices: [{ price: 0.3 }] }\n' };
    const { warnings } = answerOf({ hybrid: true, tariffs: '[tariff.yaml, b.yaml]', files: blocks });
    const found = warnings.map(warningNote).find(({ code }) => code === 'scenario.cheapest-needs-price');
    expect(found?.text).toContain("the tariff 'Blocks' is priced by blocks alone");
    expect(found?.remedy).toContain('takes electricity as free');
  });
});

test('in every other mode all tariffs share one run', () => {
  const { costs } = answerOf({ tariffs: '[flat.yaml, low.yaml]', files });
  expect(costs[1]?.electricity).toBe(costs[0]?.electricity);
});

test('the bill of a scenario is that of its electricity on the tariff', () => {
  const { costs, loaded, columns } = answerOf({});
  const whole = bill(there(loaded.tariffs[0]).prepared, columns.electricity);
  expect(costs[0]?.bill.total).toBeCloseTo(whole.total, DIGITS);
});
