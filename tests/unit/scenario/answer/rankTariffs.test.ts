import { describe, expect, test } from 'vitest';
import { rankTariffs } from '../../../../src/scenario/answer/rankTariffs.ts';
import { answerOf, flatTariff, type Sample, there } from './sampleAnswer.ts';

const files = {
  'dear.yaml': flatTariff('Dear', 0.4),
  'cheap.yaml': flatTariff('Cheap', 0.2),
  'middle.yaml': flatTariff('Middle', 0.3),
  'twin.yaml': `note: another file\n${flatTariff('Twin', 0.3)}`,
  'inside.yaml': `${flatTariff('Inside', 0.36)}pricesStated: withTax\n`,
  'bare.yaml': 'name: Bare\nrates: [{ name: all, price: 0.1 }]\n',
};
const rank = (tariffs: string, more: Sample = {}) =>
  rankTariffs(answerOf({ tariffs, files, sections: 'household: { given: profile, kWhPerYear: 2000 }', ...more }));
const names = (ranking: ReturnType<typeof rank>[number] | undefined) => ranking?.tariffs.map(({ cost }) => cost.tariff);

describe('tariffs are ranked', () => {
  const [ranking] = rank('[dear.yaml, cheap.yaml, middle.yaml]');

  test('on the whole bill, the cheapest first, with what each saves against the present one', () => {
    expect(names(ranking)).toEqual(['Cheap', 'Middle', 'Dear']);
    const [cheap, middle, dear] = there(ranking).tariffs;
    expect([cheap?.present, middle?.present, dear?.present]).toEqual([false, false, true]);
    expect(cheap?.total).toBe(cheap?.cost.bill.total);
    expect(cheap?.saving).toBe(there(dear).total - there(cheap).total);
    expect(dear?.saving).toBe(0);
    // one price at all hours: half the price, half the bill
    expect(there(cheap).total).toBeCloseTo(there(dear).total / 2, 6);
  });

  test('with the price at which neighbours change places', () => {
    const { neighbours } = there(ranking);
    expect(neighbours.map(({ cheaper, dearer }) => `${cheaper.cost.tariff} ${dearer.cost.tariff}`)).toEqual([
      'Cheap Middle',
      'Middle Dear',
    ]);
    // flat at 0.20 and 0.30: half as much again
    expect(neighbours[0]?.change).toMatchObject({
      change: expect.closeTo(0.5, 9),
      priceAtEquality: expect.closeTo(0.3, 9),
    });
  });

  test('with their dearest week', () => {
    const { dearestWeek } = there(there(ranking).tariffs[0]);
    // the sample's cold lies in the middle of January
    expect(dearestWeek.from.slice(0, 7)).toMatch(/^2025-0[12]$/);
    expect(dearestWeek.cost).toBeCloseTo(dearestWeek.kWh * 0.24, 9);
  });

  test('in the order of the scenario where they cost the same', () => {
    expect(names(rank('[twin.yaml, middle.yaml, cheap.yaml]')[0])).toEqual(['Cheap', 'Twin', 'Middle']);
    expect(names(rank('[middle.yaml, twin.yaml, cheap.yaml]')[0])).toEqual(['Cheap', 'Middle', 'Twin']);
  });

  test('only among those that state their taxes in one way, the present one’s first', () => {
    const rankings = rank('[middle.yaml, bare.yaml, inside.yaml, cheap.yaml]');
    expect(rankings.map((each) => [each.taxes, names(each)])).toEqual([
      ['onTop', ['Cheap', 'Middle']],
      ['notListed', ['Bare']],
      ['inPrices', ['Inside']],
    ]);
    expect(rankings[1]?.tariffs[0]?.saving).toBe('not alike');
    expect(rankings[2]?.tariffs[0]?.saving).toBe('not alike');
  });

  test('each for itself where a change of supplier mixes ways', () => {
    const mixed = (date: string) => `{ supplies: [{ file: middle.yaml }, { file: inside.yaml, from: ${date} }] }`;
    const rankings = rank(`[${mixed('03-01')}, ${mixed('07-01')}, cheap.yaml]`);
    expect(rankings.map(({ taxes, tariffs }) => [taxes, tariffs.length])).toEqual([
      ['mixed', 1],
      ['mixed', 1],
      ['onTop', 1],
    ]);
    expect(rankings[0]?.tariffs[0]?.saving).toBe(0);
    expect(rankings[1]?.tariffs[0]?.saving).toBe('not alike');
  });

  test('of a hybrid with its fuel, for each run burns its own', () => {
    const tariffs = rank('[dear.yaml, cheap.yaml]', { hybrid: true })[0]?.tariffs ?? [];
    for (const { total, cost } of tariffs) expect(total).toBeCloseTo(cost.bill.total + cost.heating.fuel, 9);
    const [cheap, dear] = tariffs;
    expect(there(cheap).cost.heating.fuel).toBeLessThan(there(dear).cost.heating.fuel);
  });
});
