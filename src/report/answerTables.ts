import { visibleText } from '../core/problem.ts';
import { factor, figure } from './figures.ts';
import { type Column, table } from './layout.ts';
import type { ResultDocument } from './resultSchema.ts';
import { lyingBar } from './terminal/blocks.ts';
import type { Words } from './words.ts';

type Cost = ResultDocument['costs'][0];

/** The tariffs side by side: what the bill is made of. */
export function billTable(costs: readonly Cost[], words: Words): string {
  const { columns } = words;
  const named = columnOf(costs);
  const taxed = costs.some(({ taxes }) => taxes !== 0);
  const shown = [
    named(columns.energy, ({ energy }) => energy),
    named(columns.standing, ({ standing }) => standing),
    ...whereAny(
      named(columns.demand, ({ demand }) => demand),
      costs.some(({ demand }) => demand !== 0),
    ),
    ...whereAny(
      named(columns.taxes, ({ taxes }) => taxes),
      taxed,
    ),
    ...whereAny(
      named(columns.credits, ({ credits }) => -credits),
      costs.some(({ credits }) => credits !== 0),
    ),
    named(columns.bill, ({ total }) => total),
  ];
  return table([namesOf(costs, words), ...shown]);
}

/** The tariffs side by side: the household's part of the bill, the heating's, the boiler and what is saved. */
export function heatingTable(costs: readonly Cost[], words: Words): string {
  const { columns } = words;
  const named = columnOf(costs);
  const shown = [
    named(columns.household, ({ household }) => household.total),
    named(columns.heating, ({ systemTotal }) => systemTotal),
    ...whereAny(
      named(columns.boiler, ({ boilerTotal }) => boilerTotal),
      costs[0].boilerTotal !== undefined,
    ),
    ...whereAny(
      named(columns.saving, ({ saving }) => saving),
      costs[0].saving !== undefined,
    ),
  ];
  return table([namesOf(costs, words), ...shown]);
}

function namesOf(costs: readonly Cost[], { columns }: Words): Column {
  return { heading: columns.tariff, figures: false, cells: costs.map(({ tariff }) => visibleText(tariff)) };
}

/** Columns of money; the currency stands in each cell only where the tariffs differ in it. */
function columnOf(costs: readonly Cost[]) {
  const sameCurrency = new Set(costs.map(({ currency }) => currency)).size === 1;
  return (heading: string, of: (cost: Cost) => number | undefined): Column => ({
    heading,
    figures: true,
    cells: costs.map((cost) => cellOf(of(cost), sameCurrency ? '' : ` ${cost.currency}`)),
  });
}

function whereAny(column: Column, shown: boolean): Column[] {
  return shown ? [column] : [];
}

function cellOf(value: number | undefined, currency: string): string {
  return value === undefined ? '–' : `${figure(value, 0)}${currency}`;
}

/** Letters of the longest bar. */
const BAR_WIDTH = 12;

/**
 * The months and the year: need, heat by source, electricity, seasonal factor.
 *
 * @param bars whether a bar of each month's electricity stands beside its figure
 */
export function monthTable({ monthly, annual }: ResultDocument, words: Words, bars = false): string {
  const { columns } = words;
  const rows = [...monthly, annual];
  const column = (heading: string, of: (row: (typeof rows)[0]) => string): Column => ({
    heading,
    figures: true,
    cells: rows.map(of),
  });
  const most = Math.max(...monthly.map(({ electricity }) => electricity.total));
  const barOf = (total: number) => (most === 0 ? '' : lyingBar(total, most, BAR_WIDTH));
  const bar: Column = {
    heading: '',
    figures: false,
    cells: [...monthly.map(({ electricity }) => barOf(electricity.total)), ''],
  };
  return table([
    { heading: columns.month, figures: false, cells: [...words.months, words.year] },
    column(columns.need, (row) => figure(row.spaceHeatNeed, 0)),
    column(bars ? inTwoLines(columns.heatPumpHeat) : columns.heatPumpHeat, (row) => figure(row.heatPumpHeat, 0)),
    column(bars ? inTwoLines(columns.backupHeat) : columns.backupHeat, (row) => figure(row.backupHeat, 0)),
    column(columns.electricity, (row) => figure(row.electricity.total, 0)),
    ...(bars ? [bar] : []),
    column(columns.factor, (row) => factor(row.seasonalFactor.h4)),
  ]);
}

/** A heading broken at its last blank, to save width. */
function inTwoLines(heading: string): string {
  return heading.replace(/ (?=\S+$)/, '\n');
}
