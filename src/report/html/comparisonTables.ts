import { lineChart } from '../charts/lineChart.ts';
import { type Markup, markup } from '../charts/markup.ts';
import { lineSample } from '../charts/texture.ts';
import type { ResultDocument } from '../resultSchema.ts';
import { chartFigure } from './chartFigure.ts';
import { dataTable, figureColumns, textColumns } from './dataTable.ts';
import { named } from './named.ts';
import type { ReportInput } from './reportInput.ts';

/** The tariffs side by side, what each is made of. */
export function tariffsSideBySide({ document, words, figures }: ReportInput): Markup {
  const { costs } = document;
  const { columns } = words;
  if (costs.length === 0) return markup`<p>${words.costs.none}</p>`;
  type Cost = ResultDocument['costs'][0];
  const shown: [string, (cost: Cost) => number | undefined][] = [
    [columns.energy, ({ energy }) => energy],
    [columns.standing, ({ standing }) => standing],
    [columns.demand, ({ demand }) => demand],
    [columns.taxes, ({ taxes }) => taxes],
    [columns.credits, ({ credits }) => -credits],
    [columns.bill, ({ total }) => total],
    [columns.household, ({ household }) => household.total],
    [columns.fuel, ({ systemFuel }) => systemFuel],
    [columns.service, ({ systemService }) => systemService],
    [columns.heating, ({ systemTotal }) => systemTotal],
    [columns.boiler, ({ boilerTotal }) => boilerTotal],
    [columns.saving, ({ saving }) => saving],
  ];
  const used = shown.filter(([, of]) => costs.some((cost) => (of(cost) ?? 0) !== 0));
  const currencies = new Set(costs.map(({ currency }) => currency));
  const cell = (value: number | undefined, currency: string) => {
    if (value === undefined) return '–';
    return currencies.size === 1 ? figures.number(value, 0) : figures.money(value, currency);
  };
  return dataTable({
    caption: words.costs.sideBySide([...currencies].join(', ')),
    columns: [
      ...figureColumns(
        columns.tariff,
        used.map(([heading]) => heading),
      ),
      ...textColumns(words.costs.taxesStated),
    ],
    rows: costs.map((cost) => [
      named(cost.tariff),
      ...used.map(([, of]) => cell(of(cost), cost.currency)),
      words.costs.taxWays[cost.taxesStated],
    ]),
  });
}

/** The boiler's year, part by part; nothing without one. */
export function boilerTable({ document, words, figures }: ReportInput): Markup | undefined {
  const { boiler, currency } = document;
  if (boiler === undefined) return undefined;
  const { boiler: said } = words;
  const { electricityCost: electricity, meanSpaceHeatEfficiency: efficiency } = boiler;
  const money = (value: number) => figures.money(value, currency);
  return dataTable({
    caption: said.title,
    columns: figureColumns(said.part, [said.amount]),
    rows: [
      [said.fuel, figures.kWh(boiler.fuel)],
      [said.efficiency, efficiency === 'no heat' ? '–' : figures.percent(efficiency, 1)],
      [said.fuelCost, money(boiler.fuelCost)],
      [said.standing, money(boiler.standing)],
      [said.taxes, money(boiler.taxes)],
      [said.service, money(boiler.service)],
      [said.electricity, electricity === 'no tariff' ? '–' : money(electricity)],
      [said.total, money(boiler.total)],
    ],
    sum: true,
  });
}

/** Carbon dioxide of the year; nothing where it was not asked. */
export function carbonTable({ document, words, figures }: ReportInput): Markup | undefined {
  const { carbon } = document;
  if (carbon.heatPump === 'not asked') return undefined;
  const { carbon: said } = words;
  const mass = (value: number | string) =>
    typeof value === 'number' ? `${figures.number(value, 0)} kg` : said.unknown;
  return dataTable({
    caption: said.title,
    columns: figureColumns(said.with, [said.year]),
    rows: [
      [said.heatPump, mass(carbon.heatPump)],
      ...(carbon.boiler === 'no boiler' ? [] : [[said.boiler, mass(carbon.boiler)]]),
    ],
  });
}

/** Heat pump against boiler over the years; nothing where no whole life is entered. */
export function wholeLifeFigure({ document, words, figures }: ReportInput): Markup | undefined {
  const { wholeLife, currency } = document;
  if (wholeLife === undefined) return undefined;
  const { wholeLife: said } = words;
  const { years, netCapital, netPresentValue, simplePayback, discountedPayback } = wholeLife;
  const payback = (value: number | 'at once' | 'never') =>
    typeof value === 'number' ? said.years(figures.number(value, 1)) : said.paybacks[value];
  const balances = [-netCapital, ...years.map(({ balance }) => balance)];
  const says = said.says({
    years: figures.number(years.length, 0),
    value: figures.money(netPresentValue, currency),
    capital: figures.money(netCapital, currency),
    simple: payback(simplePayback),
    discounted: payback(discountedPayback),
  });
  return chartFigure({
    title: said.title,
    chart: lineChart({
      ...{ id: 'whole-life', title: said.title, description: says, steps: false, marks: [] },
      series: [{ kind: 1, x: balances.map((_, year) => year), y: balances }],
      ...{ xRange: [0, years.length], xTitle: said.year, yTitle: currency },
      written: figures.number,
    }),
    legend: [[lineSample(1), said.balance]],
    says,
    table: {
      caption: said.caption(currency),
      columns: figureColumns(said.year, [said.saving, said.presentValue, said.balance]),
      rows: years.map(({ year, saving, presentValue, balance }) => [
        figures.number(year, 0),
        ...[saving, presentValue, balance].map((value) => figures.number(value, 0)),
      ]),
    },
    figures: words.figures,
  });
}

/** The saving at other energy prices, and where both cost the same; nothing without a boiler and a tariff. */
export function priceTable({ document, words, figures }: ReportInput): Markup | undefined {
  const { sensitivity, costs } = document;
  if (sensitivity === undefined || costs.length === 0) return undefined;
  const { prices: said } = words;
  const changes = [...new Set(sensitivity.map(({ fuelChange }) => fuelChange))];
  const written = (change: number) => (change === 0 ? said.today : `${figures.signed(100 * change, 0)} %`);
  const table = dataTable({
    caption: said.caption(costs[0].currency),
    columns: figureColumns(
      said.electricity,
      changes.map((change) => `${said.fuel} ${written(change)}`),
    ),
    rows: [...new Set(sensitivity.map(({ electricityChange }) => electricityChange))].map((electricityChange) => [
      written(electricityChange),
      ...sensitivity
        .filter((row) => row.electricityChange === electricityChange)
        .map(({ annualSaving }) => figures.signed(annualSaving, 0)),
    ]),
  });
  return markup`${table}<p class="small">${breakEvenSentence(document, words, figures)}</p>`;
}

/** Where heat pump and boiler would cost the same; empty where that cannot be said. */
export function breakEvenSentence(
  { breakEven, costs }: ResultDocument,
  words: ReportInput['words'],
  figures: ReportInput['figures'],
): string {
  if (breakEven === undefined) return '';
  const { electricityPrice, meanElectricityPrice, seasonalFactor, heatOverElectricity } = breakEven;
  if (typeof electricityPrice === 'string' || typeof meanElectricityPrice === 'string') return words.prices.noBreakEven;
  if (typeof seasonalFactor === 'string' || typeof heatOverElectricity === 'string') return words.prices.noBreakEven;
  const price = (value: number) => `${figures.number(value, 3)} ${costs[0].currency}/kWh`;
  return words.prices.breakEven({
    price: price(electricityPrice),
    mean: price(meanElectricityPrice),
    factor: figures.factor(seasonalFactor),
    present: figures.factor(heatOverElectricity),
  });
}
