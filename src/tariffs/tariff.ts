import type { WEEKDAY_NAMES } from '../core/civilDate.ts';

export type Weekday = (typeof WEEKDAY_NAMES)[number];

/**
 * One rule of a tariff: a price and the minutes at which it holds. Of the list the first rule that matches a minute
 * prices it. Several rules may bear one name: they count as one rate in the bill.
 */
export interface Rate {
  readonly name: string;
  /** Money per kWh. */
  readonly price: number;
  /** HH:MM, included; absent: 00:00. */
  readonly from?: string | undefined;
  /** HH:MM, excluded; earlier than `from`: across midnight; absent: 24:00. */
  readonly to?: string | undefined;
  /** Weekdays of the minutes priced, also after midnight; absent: all. */
  readonly weekdays?: readonly Weekday[] | undefined;
  /** Months, 1 to 12; absent: all. */
  readonly months?: readonly number[] | undefined;
  /** Season, MM-DD to MM-DD, both included; may run across the new year. */
  readonly dates?: { readonly from: string; readonly to: string } | undefined;
  /**
   * `only` on holidays, `never` on them, or `also` on them whatever the weekday; absent: a holiday is a weekday like
   * any other.
   */
  readonly holidays?: 'only' | 'never' | 'also' | undefined;
}

/** How a file of prices over time is to be read. */
export interface PriceSeriesSettings {
  readonly file: string;
  readonly unit: 'perKWh' | 'perMWh' | 'centsPerKWh';
  /** What a stamp without its own offset means; with `withOffset` it is a fault. */
  readonly stamps: 'withOffset' | 'utc' | 'local';
  readonly timeColumn?: string | undefined;
  readonly priceColumn?: string | undefined;
  /** Absent: seen from the file. */
  readonly decimal?: 'point' | 'comma' | undefined;
}

/** One block: its price up to so many kWh in the period; the last block has no end. */
export interface Block {
  readonly upTo?: number | undefined;
  readonly price: number;
}

/** Prices by amount in a period, on all electricity of the bill; they add to rates and series where these are given. */
export interface Blocks {
  readonly per: 'month' | 'quarter' | 'year';
  readonly prices: readonly Block[];
}

/** What an electricity supplier asks; money in the tariff's currency, before tax unless stated otherwise. */
export interface Tariff {
  readonly name: string;
  readonly currency?: string | undefined;
  readonly note?: string | undefined;
  readonly rates?: readonly Rate[] | undefined;
  readonly series?: PriceSeriesSettings | undefined;
  readonly blocks?: Blocks | undefined;
  readonly standing?:
    | {
        readonly perDay?: number | undefined;
        readonly perMonth?: number | undefined;
        readonly perYear?: number | undefined;
      }
    | undefined;
  /** Money per kW of each civil month's highest hour. */
  readonly demand?: { readonly perKW: number } | undefined;
  readonly taxes: readonly { readonly name: string; readonly percent: number }[];
  /** Money a year, taken off after tax. */
  readonly credits: readonly { readonly name: string; readonly amount: number }[];
  /** YYYY-MM-DD, or MM-DD for every year. */
  readonly holidays: readonly string[];
  /** `withTax`: the taxes are inside the prices and only shown; `withoutTax`: they come on top. */
  readonly pricesStated: 'withTax' | 'withoutTax';
}

/** A price series as read: regular, without gaps. */
export interface PriceSeries {
  /** Name of the file as the user gave it. */
  readonly file: string;
  /** Beginning of the first price, minutes since 1970-01-01T00:00Z. */
  readonly startMinute: number;
  /** 1 to 60 whole minutes. */
  readonly stepMinutes: number;
  /** Money per kWh; may be negative. */
  readonly prices: Float64Array;
}
