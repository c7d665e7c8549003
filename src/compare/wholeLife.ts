import { wholePower } from '../core/power.ts';
import type { CostParts } from './annualCost.ts';

/** What a heat pump costs to buy, and how money and prices go on; rates are shares a year above inflation. */
export interface WholeLifeTerms {
  /** Money, installed, before the grant. */
  readonly capital: number;
  readonly grant: number;
  /** What the boiler would cost that need not be bought now. */
  readonly replacedBoiler: number;
  /** Whole years, 1 or more. */
  readonly years: number;
  /** Real discount rate, such as 0.03; above −1. */
  readonly discountRate: number;
  /** Real drifts of the prices, such as 0.01; above −1. Standing charges drift with theirs, service does not. */
  readonly electricityDrift: number;
  readonly fuelDrift: number;
}

/**
 * Years until the saving has paid the net capital; `at once` where there is none to be paid, whatever the saving; `never`
 * where the saving does not reach it.
 */
export type Payback = number | 'at once' | 'never';

/** One year of the whole life; money. */
export interface YearOfLife {
  /** Counted from 1. */
  readonly year: number;
  /** Boiler less heat pump in that year, at that year's real prices. */
  readonly saving: number;
  /** The saving's worth today. */
  readonly presentValue: number;
  /** Present values up to this year, less the net capital. */
  readonly balance: number;
}

/** Heat pump against boiler over the years; money of today. */
export interface WholeLife {
  /** Capital less grant less the boiler that need not be bought; may be negative. */
  readonly netCapital: number;
  readonly years: readonly YearOfLife[];
  /** The balance after the last year. */
  readonly netPresentValue: number;
  /** Net capital over the first year's saving, however many years that is. */
  readonly simplePayback: Payback;
  /** When the balance first comes to zero, linear within its year; `never` where not within the years looked at. */
  readonly discountedPayback: Payback;
}

/**
 * Heat pump against boiler over the years of its life.
 *
 * Year 1 is at today's prices and due at its end: saving_t is worth saving_t/(1 + r)^t, and a price of today has grown by
 * (1 + drift)^(t − 1).
 *
 * @param heatPump annual cost at today's prices
 * @param boiler annual cost at today's prices
 * @param terms capital, years, rates
 * @returns net present value and paybacks, with the years they come from
 * @example wholeLife(heatPump, boiler, terms).netPresentValue // 1000 for 20 years at 5 % for 10,000: 2462.21
 *
 * Reference: present-value factors of engineering economy, as in EN 15459-1:2017 (from memory); MODEL section 12.
 */
export function wholeLife(heatPump: CostParts, boiler: CostParts, terms: WholeLifeTerms): WholeLife {
  const netCapital = terms.capital - terms.grant - terms.replacedBoiler;
  const years: YearOfLife[] = [];
  let balance = -netCapital;
  for (let year = 1; year <= terms.years; year++) {
    const saving = costIn(year, boiler, terms) - costIn(year, heatPump, terms);
    const presentValue = saving / wholePower(1 + terms.discountRate, year);
    balance += presentValue;
    years.push({ year, saving, presentValue, balance });
  }
  return {
    netCapital,
    years,
    netPresentValue: balance,
    simplePayback: simplePayback(netCapital, costIn(1, boiler, terms) - costIn(1, heatPump, terms)),
    discountedPayback: discountedPayback(netCapital, years),
  };
}

/** Cost of one year at its real prices. */
function costIn(year: number, { electricity, fuel, service }: CostParts, terms: WholeLifeTerms): number {
  const grown = (drift: number) => wholePower(1 + drift, year - 1);
  return electricity * grown(terms.electricityDrift) + fuel * grown(terms.fuelDrift) + service;
}

function simplePayback(netCapital: number, saving: number): Payback {
  if (netCapital <= 0) return 'at once';
  const years = netCapital / saving;
  return saving > 0 && Number.isFinite(years) ? years : 'never';
}

function discountedPayback(netCapital: number, years: readonly YearOfLife[]): Payback {
  if (netCapital <= 0) return 'at once';
  let before = -netCapital;
  for (const { year, balance } of years) {
    if (balance >= 0) return year - 1 - before / (balance - before);
    before = balance;
  }
  return 'never';
}
