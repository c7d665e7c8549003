import { type Markup, markup } from '../charts/markup.ts';
import { dataTable, figureColumns } from './dataTable.ts';
import type { ReportInput } from './reportInput.ts';

/** Seasonal factors with what each counts, in words, and what field studies of homes have shown. */
export function factorTable(input: ReportInput): Markup {
  const { document, words, figures } = input;
  const { factors: said } = words;
  const { h2, h3, h4 } = document.annual.seasonalFactor;
  const shown = dataTable({
    caption: said.caption,
    columns: figureColumns(said.factor, [said.value, said.counts]).map((column, i) =>
      i === 2 ? { ...column, figures: false } : column,
    ),
    rows: [
      ['H2', figures.factor(h2), said.h2],
      ['H3', figures.factor(h3), said.h3],
      ['H4', figures.factor(h4), said.h4],
    ],
  });
  return h4 === 'no heat' ? shown : markup`${shown}<p class="small">${said.studies(studies(input))}</p>`;
}

/** Factors of each place with as many digits as their sources state. */
function studies({ document: { fieldStudies }, words, figures }: ReportInput): string {
  const digits = (factor: number) => String(factor).split('.')[1]?.length ?? 0;
  return fieldStudies
    .map(({ place, factor }) => `${figures.number(factor, digits(factor))} (${words.factors.places[place] ?? place})`)
    .join(', ');
}

/** Months and year: degree days, need, heat by source, electricity, factor. */
export function monthTable({ document, words, figures }: ReportInput): Markup {
  const { monthTable: said } = words;
  const { monthly, annual, house } = document;
  const missing = annual.unmetHours > 0;
  const fuel = annual.fuel > 0;
  const rows = [...monthly, annual].map((row, i) => [
    words.months[i] ?? words.year,
    figures.number(row.degreeDays, 0),
    figures.number(row.spaceHeatNeed, 0),
    figures.number(row.heatPumpHeat, 0),
    figures.number(row.backupHeat, 0),
    ...(missing ? [figures.number(row.unmetHeat, 0)] : []),
    figures.number(row.electricity.total, 0),
    ...(fuel ? [figures.number(row.fuel, 0)] : []),
    figures.factor(row.seasonalFactor.h4),
  ]);
  const headings = [
    said.degreeDays,
    said.need,
    said.heatPumpHeat,
    said.backupHeat,
    ...(missing ? [said.unmet] : []),
    said.electricity,
    ...(fuel ? [said.fuel] : []),
    'H4',
  ];
  const base = `${figures.number(house.degreeDayBase, 1)} °C`;
  return markup`${dataTable({ caption: said.caption, columns: figureColumns(words.month, headings), rows, sum: true })}<p class="small">${said.base(base)}</p>`;
}

/** Figures of the house and of how the unit runs, each with its unit. */
export function runningTable({ document, words, figures }: ReportInput): Markup {
  const { running: said } = words;
  const { annual, house } = document;
  const hours = (value: number) => `${figures.number(value, 0)}\u00a0h`;
  const { hotWater } = annual;
  const rows: [string, string][] = [
    [said.heatLoss, `${figures.number(house.heatLoss, 0)}\u00a0W/K`],
    [said.designLoad, `${figures.number(house.designLoad, 1)}\u00a0kW`],
    [said.heatingHours, hours(annual.heatingHours)],
    [said.backupHours, hours(annual.backupHours)],
    [said.cyclingHours, hours(annual.cyclingHours)],
    [said.starts, figures.number(10 * Math.round(annual.starts / 10), 0)],
    [said.flowAboveLimit, hours(annual.flowAboveLimitHours)],
    [said.outsideMap, hours(annual.outsideMapHours)],
    [said.belowLowestFlow, hours(annual.belowLowestFlowHours)],
    [said.unmetHours, hours(annual.unmetHours)],
    [said.unmetHeat, figures.kWh(annual.unmetHeat)],
  ];
  if (typeof house.heatLossPerArea === 'number') {
    rows.splice(1, 0, [said.perArea, `${figures.number(house.heatLossPerArea, 2)}\u00a0W/(m²·K)`]);
  }
  if (annual.kelvinHoursBelow !== undefined) {
    rows.push([said.kelvinHours, `${figures.number(annual.kelvinHoursBelow, 0)}\u00a0K·h`]);
  }
  if (hotWater !== undefined) {
    rows.push(
      [said.waterAsked, figures.kWh(hotWater.hotWaterAsked)],
      [said.waterShort, figures.kWh(hotWater.hotWaterShort)],
      [said.cylinderLoss, figures.kWh(hotWater.cylinderLoss)],
    );
  }
  return dataTable({ caption: said.caption, columns: figureColumns(said.what, [said.value]), rows });
}
