import type { Markup } from '../charts/markup.ts';
import { stackedBars } from '../charts/stackedBars.ts';
import { type Look, sample } from '../charts/texture.ts';
import type { ResultDocument } from '../resultSchema.ts';
import { chartFigure } from './chartFigure.ts';
import { figureColumns } from './dataTable.ts';
import type { ReportInput } from './reportInput.ts';

type Detail = ResultDocument['annual']['electricityDetail'];

/** The uses of electricity as they are stacked; standby and crankcase heater stand together. */
const USES = [
  { name: 'rooms', look: { tone: 1, texture: 'plain' }, of: (e: Detail) => e.heatPumpSpaceElectricity },
  { name: 'hotWater', look: { tone: 2, texture: 'rising' }, of: (e: Detail) => e.heatPumpWaterElectricity },
  { name: 'backup', look: { tone: 3, texture: 'falling' }, of: (e: Detail) => e.backupElectricity },
  { name: 'pump', look: { tone: 4, texture: 'plain' }, of: (e: Detail) => e.circulationElectricity },
  {
    name: 'standby',
    look: { tone: 5, texture: 'level' },
    of: (e: Detail) => e.standbyElectricity + e.crankcaseElectricity,
  },
] as const satisfies readonly { name: string; look: Look; of: (e: Detail) => number }[];

/** Electricity by month and use; uses that take none are left out. */
export function monthlyEnergy({ document, words, figures }: ReportInput): Markup {
  const { energy: said } = words;
  const { annual, monthly } = document;
  const uses = USES.filter(({ of }) => of(annual.electricityDetail) > 0);
  const rows = [...monthly, annual].map(({ electricityDetail, electricity }, i) => [
    words.months[i] ?? words.year,
    ...uses.map(({ of }) => figures.number(of(electricityDetail), 0)),
    figures.number(electricity.total, 0),
  ]);
  const most = monthly.reduce((best, month) => (month.electricity.total > best.electricity.total ? month : best));
  const says = said.says({
    month: words.months[most.month - 1],
    energy: figures.kWh(most.electricity.total),
    total: figures.kWh(annual.electricity.total),
  });
  return chartFigure({
    title: said.title,
    chart: stackedBars({
      id: 'monthly-energy',
      title: said.title,
      description: says,
      labels: words.monthLetters,
      series: uses.map(({ look, of }) => ({ look, values: monthly.map((month) => of(month.electricityDetail)) })),
      quantity: 'kWh',
      categories: '',
      written: figures.number,
    }),
    legend: uses.map(({ look, name }) => [sample(look), said.uses[name]]),
    says,
    table: {
      caption: said.caption,
      columns: figureColumns(words.month, [...uses.map(({ name }) => said.uses[name]), said.all]),
      rows,
      sum: true,
    },
    figures: words.figures,
  });
}
