import type { Bill } from '../../tariffs/bill.ts';
import type { Markup } from '../charts/markup.ts';
import { stackedBars } from '../charts/stackedBars.ts';
import { type Look, sample } from '../charts/texture.ts';
import { chartFigure } from './chartFigure.ts';
import { figureColumns } from './dataTable.ts';
import { named, shortName } from './named.ts';
import type { ReportInput } from './reportInput.ts';

/** Looks of the rates in their order; a tariff with more rates begins again, and its table tells them apart. */
const LOOKS: readonly Look[] = [
  { tone: 1, texture: 'plain' },
  { tone: 2, texture: 'rising' },
  { tone: 3, texture: 'falling' },
  { tone: 5, texture: 'level' },
  { tone: 4, texture: 'outline' },
];

/** What the heating adds to one rate of a tariff, January first. */
export interface MonthsOfRate {
  readonly rate: string;
  readonly kWh: readonly number[];
  /** Energy cost before taxes that come on top. */
  readonly cost: readonly number[];
}

/**
 * The heating by rate and month: the bill less the household's.
 *
 * @param bill of heating and household on one tariff
 * @param householdBill of the household alone on the same
 * @returns a rate each, in the order of the tariff
 */
export function monthsOfRates(bill: Bill, householdBill: Bill): MonthsOfRate[] {
  const added = (column: 'kWh' | 'cost', rate: number) =>
    Array.from({ length: 12 }, (_, m) => {
      const cell = 12 * rate + m;
      return bill.ofRateAndMonth[column][cell] - householdBill.ofRateAndMonth[column][cell];
    });
  return Object.keys(bill.byRate).map((rate, r) => ({ rate, kWh: added('kWh', r), cost: added('cost', r) }));
}

/** For each tariff of several rates the cost of the heating by month and rate, with the kWh in the table behind it. */
export function ratesByMonth(input: ReportInput): Markup[] {
  return input.answer.costs.flatMap((cost, place) => {
    const rates = monthsOfRates(cost.bill, cost.householdBill);
    return rates.length < 2 ? [] : [figureOf(input, cost, rates, place)];
  });
}

type Cost = ReportInput['answer']['costs'][0];

function figureOf(
  { words, figures }: ReportInput,
  { tariff, currency }: Cost,
  rates: readonly MonthsOfRate[],
  place: number,
): Markup {
  const { costs: said } = words;
  const title = said.byRateAndMonth(shortName(tariff));
  const total = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0);
  const shares = rates.map(({ cost }) => total(cost));
  const dearest = rates[shares.indexOf(Math.max(...shares))];
  const says = said.byRateAndMonthSays({
    rate: shortName(dearest.rate),
    cost: figures.money(total(dearest.cost), currency),
    kWh: figures.kWh(total(dearest.kWh)),
  });
  const lookOf = (rate: number) => LOOKS[rate % LOOKS.length];
  const rows = [...words.months, words.year].map((month, m) => {
    const at = (values: readonly number[]) => values[m] ?? total(values);
    return [
      month,
      ...rates.flatMap(({ kWh, cost }) => [figures.number(at(kWh), 0), figures.number(at(cost), 2)]),
      figures.number(total(rates.map(({ cost }) => at(cost))), 2),
    ];
  });
  return chartFigure({
    title,
    chart: stackedBars({
      ...{ id: `rates-${place + 1}`, title, description: says, labels: words.monthLetters, quantity: currency },
      series: rates.map(({ cost }, r) => ({ look: lookOf(r), values: cost })),
      categories: '',
      written: figures.number,
    }),
    legend: rates.map(({ rate }, r) => [sample(lookOf(r)), shortName(rate)]),
    says,
    table: {
      caption: title,
      columns: figureColumns(words.month, [
        ...rates.flatMap(({ rate }) => [named(`${rate}, kWh`), named(`${rate}, ${currency}`)]),
        words.columns.sum,
      ]),
      rows,
      sum: true,
    },
    figures: words.figures,
  });
}
