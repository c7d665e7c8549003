import type { CivilClock } from './civilClock.ts';
import type { DayRange } from './rateSlices.ts';
import type { Blocks } from './tariff.ts';

/**
 * A tariff laid on one year, made once and used for many bills. A year with a change of supplier has several parts;
 * every minute of the year belongs to exactly one.
 */
export interface PreparedTariff {
  readonly name: string;
  readonly currency?: string | undefined;
  readonly clock: CivilClock;
  /** Names of the rates, each once; `series` or `blocks` where the tariff names none. */
  readonly rateNames: readonly string[];
  /** Rate at each step's beginning, index into `rateNames`. */
  readonly rateOfStep: Uint8Array;
  /** Hours of the year by rate; their sum is the hours of the year. */
  readonly hoursOfRate: Float64Array;
  /** Mean price of each step from rates and series, before taxes that come on top, money per kWh. */
  readonly price: Float64Array;
  /**
   * What one kWh more costs in each step, taxes included, money per kWh; blocks, standing and demand charges are not
   * seen.
   */
  readonly marginalPrice: Float64Array;
  /** Whether some part has blocks for its only price, so that `marginalPrice` is 0 there. */
  readonly pricedByBlocksAlone: boolean;
  readonly parts: readonly PreparedPart[];
}

/** The days of one supplier. */
export interface PreparedPart {
  readonly days: DayRange;
  /** Share of each civil month's days that lie in this part. */
  readonly shareOfMonth: Float64Array;
  /** Price of each rule, money per kWh, and the rate it counts as. */
  readonly rulePrice: Float64Array;
  readonly rateOfRule: Uint8Array;
  /** Whether a price series adds to the rules' prices: then whole steps are priced by `PreparedTariff.price`. */
  readonly hasSeries: boolean;
  /** Whole steps that follow one another under one rule in one month: [from, to) and the cell rule · 12 + month. */
  readonly runs: { readonly from: Int32Array; readonly to: Int32Array; readonly cell: Int32Array };
  /** Steps that hold minutes of several rules, months or parts: an entry a piece. */
  readonly mixed: {
    readonly step: Int32Array;
    readonly cell: Int32Array;
    /** Share of the step's minutes. */
    readonly share: Float64Array;
    /** Price of the piece times its share, money per kWh of the whole step. */
    readonly cost: Float64Array;
  };
  readonly blocks?: Blocks | undefined;
  /** Standing charge of each month, before taxes that come on top. */
  readonly standing: Float64Array;
  /** Fixed credits of each month. */
  readonly credits: Float64Array;
  /** Money per kW of each month's highest hour; 0 where there is no demand charge. */
  readonly demandPrice: number;
  readonly taxes: readonly { readonly name: string; readonly share: number }[];
  /** The taxes' shares added up. */
  readonly taxShare: number;
  /** Whether the taxes are inside the prices. */
  readonly taxInside: boolean;
}
