import type { Markup } from '../charts/markup.ts';
import { stackedBars } from '../charts/stackedBars.ts';
import { type Look, sample } from '../charts/texture.ts';
import { chartFigure } from './chartFigure.ts';
import { dataTable, figureColumns } from './dataTable.ts';
import { named, shortName } from './named.ts';
import type { ReportInput } from './reportInput.ts';

const PARTS = [
  { name: 'energy', look: { tone: 1, texture: 'plain' } },
  { name: 'standing', look: { tone: 5, texture: 'level' } },
  { name: 'demand', look: { tone: 3, texture: 'falling' } },
  { name: 'taxes', look: { tone: 2, texture: 'rising' } },
] as const satisfies readonly { name: string; look: Look }[];

/**
 * What the heating adds to the electricity bill of the first tariff month by month, and its kWh and cost by rate on every
 * tariff; nothing without a tariff.
 */
export function costByMonth(input: ReportInput): Markup[] {
  const [present] = input.answer.costs;
  return present === undefined ? [] : [monthsOf(input, present), ratesOf(input)];
}

function monthsOf({ words, figures }: ReportInput, { bill, householdBill, tariff, currency }: Cost): Markup {
  const { costs: said } = words;
  const months = bill.monthly.map((month, m) => PARTS.map(({ name }) => month[name] - householdBill.monthly[m][name]));
  const year = PARTS.map((_, part) => months.reduce((sum, month) => sum + month[part], 0));
  const used = PARTS.flatMap((part, i) => (months.some((month) => Math.abs(month[i]) > 1e-9) ? [{ ...part, i }] : []));
  const title = said.byMonth(shortName(tariff));
  const total = (parts: readonly number[]) => parts.reduce((sum, value) => sum + value, 0);
  const says = said.byMonthSays(figures.money(total(year), currency));
  return chartFigure({
    title,
    chart: stackedBars({
      ...{ id: 'cost-by-month', title, description: says, labels: words.monthLetters, quantity: currency },
      series: used.map(({ look, i }) => ({ look, values: months.map((month) => month[i]) })),
      categories: '',
      written: figures.number,
    }),
    legend: used.map(({ look, name }) => [sample(look), words.columns[name]]),
    says,
    table: {
      caption: said.byMonthCaption(currency),
      columns: figureColumns(words.month, [...used.map(({ name }) => words.columns[name]), words.columns.sum]),
      rows: [...months, year].map((parts, m) => [
        words.months[m] ?? words.year,
        ...used.map(({ i }) => figures.number(parts[i], 2)),
        figures.number(total(parts), 2),
      ]),
      sum: true,
    },
    figures: words.figures,
  });
}

type Cost = ReportInput['answer']['costs'][0];

function ratesOf({ answer, words, figures }: ReportInput): Markup {
  const { costs: said } = words;
  const rows = answer.costs.flatMap(({ tariff, bill, householdBill, currency }) =>
    Object.entries(bill.byRate).map(([rate, { kWh, hours, cost }]) => {
      const household = householdBill.byRate[rate] ?? { kWh: 0, cost: 0 };
      return [
        named(tariff),
        named(rate),
        figures.number(hours, 0),
        figures.number(kWh - household.kWh, 0),
        figures.money(cost - household.cost, currency),
      ];
    }),
  );
  const columns = figureColumns(words.columns.tariff, [said.rate, said.rateHours, 'kWh', words.columns.energy]);
  return dataTable({
    caption: said.byRate,
    columns: columns.map((column, i) => (i === 1 ? { ...column, figures: false } : column)),
    rows,
  });
}
