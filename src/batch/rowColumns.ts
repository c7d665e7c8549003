import type { RowAnswer } from '../scenario/answer/makeAnswer.ts';

/** A figure of a result that every row of a batch has; its name is that of the nomenclature. */
export interface RowFigure {
  readonly name: string;
  readonly unit: string;
  /** The figure, or the word for why there is none; undefined where the scenario does not ask for it. */
  readonly of: (answer: RowAnswer) => number | string | undefined;
}

/** The main figures of a year, in the order of the columns. */
export const rowFigures: readonly RowFigure[] = [
  { name: 'heatLoss', unit: 'W/K', of: ({ heatLoss }) => heatLoss },
  { name: 'designLoad', unit: 'kW', of: ({ designLoad }) => designLoad },
  { name: 'degreeDays', unit: 'K·d', of: ({ degreeDays }) => degreeDays.annual },
  { name: 'spaceHeatNeed', unit: 'kWh', of: ({ totals }) => totals.annual.spaceHeatNeed },
  {
    name: 'heatPumpHeat',
    unit: 'kWh',
    of: ({ totals: { annual } }) => annual.heatPumpSpaceHeat + annual.heatPumpWaterHeat,
  },
  { name: 'backupHeat', unit: 'kWh', of: ({ totals: { annual } }) => annual.backupSpaceHeat + annual.backupWaterHeat },
  { name: 'unmetHeat', unit: 'kWh', of: ({ totals }) => totals.annual.unmetHeat },
  { name: 'hotWaterAsked', unit: 'kWh', of: ({ totals }) => totals.annual.hotWaterAsked },
  { name: 'hotWaterShort', unit: 'kWh', of: ({ totals }) => totals.annual.hotWaterShort },
  { name: 'electricity', unit: 'kWh', of: ({ totals }) => totals.annual.electricity },
  { name: 'fuel', unit: 'kWh', of: ({ totals }) => totals.annual.fuel },
  { name: 'h2', unit: '1', of: ({ factors }) => factors.h2 },
  { name: 'h3', unit: '1', of: ({ factors }) => factors.h3 },
  { name: 'h4', unit: '1', of: ({ factors }) => factors.h4 },
  { name: 'heatingHours', unit: 'h', of: ({ totals }) => totals.hours.heating },
  { name: 'backupHours', unit: 'h', of: ({ totals }) => totals.hours.backup },
  { name: 'unmetHours', unit: 'h', of: ({ totals }) => totals.hours.unmet },
  { name: 'outsideMapHours', unit: 'h', of: ({ totals }) => totals.hours.outsideMap },
  { name: 'hotWaterShortHours', unit: 'h', of: ({ totals }) => totals.hours.hotWaterShort },
  { name: 'starts', unit: '1', of: ({ totals }) => totals.starts },
  { name: 'boilerFuel', unit: 'kWh', of: ({ boiler }) => boiler?.fuel },
  { name: 'carbonHeatPump', unit: 'kg', of: ({ carbon }) => carbon?.heatPump },
  { name: 'carbonBoiler', unit: 'kg', of: ({ carbon }) => carbon?.boiler },
];

/** What a tariff costs in a row, by the keys of the result's `costs`. */
export const tariffFigures = ['total', 'systemTotal', 'boilerTotal', 'saving'] as const;

export type TariffFigure = (typeof tariffFigures)[number];

/** Name of a tariff's figure in a row, the tariffs counted from 1: 'tariff1.systemTotal'. */
export function tariffColumn(tariff: number, figure: TariffFigure): string {
  return `tariff${tariff + 1}.${figure}`;
}

/** A column of figures: what it is called, and its unit. */
export interface FigureColumn {
  readonly name: string;
  readonly unit: string;
}

/** Every column of figures in a batch of so many tariffs, in the order of the table. */
export function figureColumns(tariffs: number): FigureColumn[] {
  const costs = Array.from({ length: tariffs }, (_, t) =>
    tariffFigures.map((figure) => ({ name: tariffColumn(t, figure), unit: 'money' })),
  );
  return [...rowFigures.map(({ name, unit }) => ({ name, unit })), ...costs.flat()];
}

/** Columns of a row that are neither axes nor figures. */
const FIXED = ['job', 'home', 'homesLine', 'currency', 'warnings', 'warningCodes'].concat(
  'problemCodes',
  'problems',
  'problemPlaces',
);

/** Names that an axis cannot have. */
export const RESERVED_NAMES: ReadonlySet<string> = new Set([
  ...FIXED,
  ...figureColumns(50).map(({ name }) => name),
  ...Array.from({ length: 50 }, (_, t) => `tariff${t + 1}`),
]);
