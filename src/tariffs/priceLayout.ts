import type { PreparedPart } from './preparedTariff.ts';
import type { RateSlice } from './rateSlices.ts';
import type { SeriesMeans } from './seriesMeans.ts';

/** Columns of the year that the parts of a tariff fill together. */
export interface PriceColumns {
  readonly price: Float64Array;
  readonly marginalPrice: Float64Array;
  readonly rateOfStep: Uint8Array;
  readonly hoursOfRate: Float64Array;
}

export interface LayoutInput {
  readonly slices: readonly RateSlice[];
  /** Money per kWh, and the rate, of each rule. */
  readonly rulePrice: Float64Array;
  readonly rateOfRule: Uint8Array;
  readonly series?: SeriesMeans | undefined;
  /** What taxes on top make of a price: 1 + their shares. */
  readonly taxFactor: number;
}

/**
 * Lays slices of minutes on steps: runs of whole steps, and the pieces of steps that two slices share; fills the price
 * columns on the way.
 *
 * @param columns of the whole year; what other parts wrote stays
 */
export function layPrices(input: LayoutInput, columns: PriceColumns): Pick<PreparedPart, 'runs' | 'mixed'> {
  const { rulePrice, rateOfRule, series, taxFactor } = input;
  const runs = { from: [] as number[], to: [] as number[], cell: [] as number[] };
  const mixed = { step: [] as number[], cell: [] as number[], share: [] as number[], cost: [] as number[] };

  const layRun = ({ rule, month }: RateSlice, from: number, to: number): void => {
    runs.from.push(from);
    runs.to.push(to);
    runs.cell.push(12 * rule + month);
    columns.rateOfStep.fill(rateOfRule[rule], from, to);
    for (let i = from; i < to; i++) {
      const price = series ? rulePrice[rule] + series.meanOf(i, 0, 60) : rulePrice[rule];
      columns.price[i] = price;
      columns.marginalPrice[i] = price * taxFactor;
    }
  };

  /** Minutes [from, to) of one step. */
  const layPiece = ({ rule, month }: RateSlice, step: number, from: number, to: number): void => {
    const share = (to - from) / 60;
    const cost = share * (series ? rulePrice[rule] + series.meanOf(step, from, to) : rulePrice[rule]);
    mixed.step.push(step);
    mixed.cell.push(12 * rule + month);
    mixed.share.push(share);
    mixed.cost.push(cost);
    if (from === 0) columns.rateOfStep[step] = rateOfRule[rule];
    columns.price[step] += cost;
    columns.marginalPrice[step] += cost * taxFactor;
  };

  for (const slice of input.slices) {
    const { from, to, rule } = slice;
    columns.hoursOfRate[rateOfRule[rule]] += (to - from) / 60;
    const firstWhole = Math.ceil(from / 60);
    const endWhole = Math.floor(to / 60);
    if (firstWhole > endWhole) {
      layPiece(slice, endWhole, from - 60 * endWhole, to - 60 * endWhole);
      continue;
    }
    if (from < 60 * firstWhole) layPiece(slice, firstWhole - 1, from - 60 * (firstWhole - 1), 60);
    if (firstWhole < endWhole) layRun(slice, firstWhole, endWhole);
    if (to > 60 * endWhole) layPiece(slice, endWhole, 0, to - 60 * endWhole);
  }
  return {
    runs: { from: Int32Array.from(runs.from), to: Int32Array.from(runs.to), cell: Int32Array.from(runs.cell) },
    mixed: {
      step: Int32Array.from(mixed.step),
      cell: Int32Array.from(mixed.cell),
      share: Float64Array.from(mixed.share),
      cost: Float64Array.from(mixed.cost),
    },
  };
}
