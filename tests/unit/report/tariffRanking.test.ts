import { describe, expect, it } from 'vitest';
import { documentText } from '../../../src/report/documentText.ts';
import { tariffRankingDocument } from '../../../src/report/tariffRankingDocument.ts';
import { type TariffRankingDocument, tariffRankingSchema } from '../../../src/report/tariffRankingSchema.ts';
import { tariffRankingText } from '../../../src/report/tariffRankingText.ts';
import { rankTariffs } from '../../../src/scenario/answer/rankTariffs.ts';
import { answerOf, flatTariff, type Sample } from '../scenario/answer/sampleAnswer.ts';
import { demoAnswer } from './demoAnswer.ts';

const answer = demoAnswer();
const demo = tariffRankingDocument(answer, rankTariffs(answer), '1.2.3');

const files = {
  'middle.yaml': flatTariff('Middle', 0.3),
  'cheap.yaml': flatTariff('Cheap', 0.2),
  'twin.yaml': `note: another file\n${flatTariff('Middle', 0.3)}`,
  'inside.yaml': `${flatTariff('Inside', 0.36)}pricesStated: withTax\n`,
};

function documentOf(tariffs: string, more: Sample = {}): TariffRankingDocument {
  const made = answerOf({ tariffs, files, ...more });
  return tariffRankingDocument(made, rankTariffs(made), '1');
}

/** The text with plain blanks, its broken lines joined. */
const textOf = (document: TariffRankingDocument) =>
  tariffRankingText(document)
    .replaceAll(/[\u202f\u00a0]/g, ' ')
    .replace(/\n {2}(?=\S)/g, ' ')
    .replace(/\n(?=[^│├└┌─\n])/g, ' ');

describe('the ranking as a document', () => {
  it('is what its schema says', () => {
    expect(tariffRankingSchema.safeParse(JSON.parse(documentText(demo))).error).toBeUndefined();
    const mixed = documentOf('[middle.yaml, cheap.yaml, inside.yaml]', { hybrid: true });
    expect(tariffRankingSchema.safeParse(JSON.parse(documentText(mixed))).error).toBeUndefined();
  });

  it('has the tariffs in the order of their totals, the bill of each, and its kWh by rate', () => {
    const [ranking] = demo.rankings;
    expect(ranking!.tariffs).toHaveLength(4);
    expect(ranking!.changesOfPlace).toHaveLength(3);
    ranking!.tariffs.forEach((ranked, i) => {
      const cost = answer.costs.find(({ file }) => file === ranked.file)!;
      expect(ranked.rank).toBe(i + 1);
      expect(ranked.bill).toBe(cost.bill.total);
      expect(ranked.total).toBe(cost.bill.total);
      expect(ranked.byRate).toEqual(cost.bill.byRate);
      expect(ranked.total).toBeGreaterThanOrEqual(ranking!.tariffs[Math.max(0, i - 1)]!.total);
    });
    expect(demo.present).toBe('Flat (invented)');
    expect(demo.householdElectricity).toBeCloseTo(2900, 8);
  });

  it('gives tariffs that cost the same one rank', () => {
    const [ranking] = documentOf('[middle.yaml, twin.yaml, cheap.yaml]').rankings;
    expect(ranking!.tariffs.map(({ rank }) => rank)).toEqual([1, 2, 2]);
  });
});

describe('the ranking as a person reads it', () => {
  const text = textOf(
    documentOf('[middle.yaml, cheap.yaml]', { sections: 'household: { given: profile, kWhPerYear: 2000 }' }),
  );

  it('keeps to 80 columns', () => {
    for (const line of tariffRankingText(demo).split('\n')) expect([...line].length, line).toBeLessThanOrEqual(80);
  });

  it('says which tariff is cheapest, by how much, and what is on the bill', () => {
    expect(text).toMatch(
      /The year would cost least on Cheap: [\d ]+ EUR, [\d ]+ EUR less than on Middle, the present tariff\./,
    );
    expect(text).toMatch(/On the bill are [\d ]+ kWh: [\d ]+ kWh of the heating and 2 000 kWh of the household\./);
    expect(textOf(documentOf('[cheap.yaml, middle.yaml]'))).toMatch(
      /The year costs least on the present tariff, Cheap: [\d ]+ EUR\./,
    );
  });

  it('marks the present tariff, and shows the dearest week with its days, kWh and cost', () => {
    expect(text).toMatch(/│ Middle \(present\) +│ +[\d ]+ │ +0 │/);
    expect(text).toMatch(/│ Cheap +│ +[\d ]+ │ +[\d ]+ │ +\d+(?:–\d+ | \w+ – \d+ )\w+ │ +\d+ │ +\d+ │/);
  });

  it('says at which price the cheapest two change places', () => {
    // flat at 0.20 and 0.30 before tax
    expect(text).toContain(
      'Cheap and Middle change places where every kWh price of Cheap rises by 50.0 %: from 0.2000 EUR/kWh to 0.3000 EUR/kWh on the mean',
    );
    expect(textOf(documentOf('[middle.yaml, twin.yaml]'))).toContain('cost the same.');
    const free = { 'free.yaml': flatTariff('Free', 0) };
    expect(textOf(documentOf('[middle.yaml, free.yaml]', { files: { ...files, ...free } }))).toContain(
      'No rise of its kWh prices would make Free as dear as Middle',
    );
  });

  it('shows the kWh in each rate', () => {
    const kWh = Math.round(
      demo.rankings[0]!.tariffs.find(({ tariff }) => tariff.startsWith('Night'))!.byRate.night!.kWh,
    );
    expect(textOf(demo)).toContain(`Night rate (invented): night ${String(kWh).replace(/(?=\d{3}$)/, ' ')} kWh; day`);
  });

  it('names the file of tariffs of one name', () => {
    expect(textOf(documentOf('[middle.yaml, twin.yaml]'))).toContain('Middle [middle.yaml]');
  });

  it('ranks tariffs that state their taxes differently apart, and says so', () => {
    const apart = textOf(documentOf('[middle.yaml, cheap.yaml, inside.yaml]'));
    expect(apart).toContain('are ranked apart: their bills are not alike');
    expect(apart).toContain('Taxes on top of the prices, EUR');
    expect(apart).toContain('Taxes inside the prices, EUR');
    expect(apart).toMatch(/│ Inside +│ +[\d ]+ │ +– │/);
    expect(text).not.toContain('ranked apart');
  });

  it('says of a hybrid that its totals hold the fuel, and that tariffs have runs of their own', () => {
    const hybrid = textOf(documentOf('[middle.yaml, cheap.yaml]', { hybrid: true }));
    expect(hybrid).toContain('The totals hold the fuel of the hybrid.');
    expect(hybrid).toContain('further tariffs have runs of their own');
  });

  it('makes text from files harmless', () => {
    const bad = '\u001b[31mred\u202e';
    const [ranking] = demo.rankings;
    const tariffs = ranking!.tariffs.map((ranked) => ({
      ...ranked,
      tariff: bad,
      file: bad,
      byRate: { [bad]: { kWh: 1, hours: 1, cost: 1 } },
    }));
    const printed = tariffRankingText({
      ...demo,
      scenario: bad,
      heatPumpUnit: bad,
      rankings: [{ ...ranking!, tariffs }],
    });
    expect(printed).not.toContain('\u001b');
    expect(printed).not.toContain('\u202e');
  });
});
