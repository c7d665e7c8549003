import { compensatedSum } from '../core/sum.ts';
import { blocksOfMonths } from './blockPrices.ts';
import type { CivilClock } from './civilClock.ts';
import type { PreparedPart, PreparedTariff } from './preparedTariff.ts';

/** What a year or a month of electricity costs; money in the tariff's currency. */
export interface BillSums {
  readonly kWh: number;
  /** Rates, series and blocks. */
  readonly energy: number;
  readonly standing: number;
  readonly demand: number;
  /** Taxes that come on top. */
  readonly taxes: number;
  /** What of them is on the energy. */
  readonly energyTaxes: number;
  /** Taxes that are inside the prices as stated: a part of energy, standing and demand, shown for information. */
  readonly taxesInside: number;
  /** Fixed credits, positive. */
  readonly credits: number;
  /** energy + standing + demand + taxes − credits; negative where credits or negative prices exceed the rest. */
  readonly total: number;
}

export interface RateSums {
  readonly kWh: number;
  /** Hours of the year in which the rate holds. */
  readonly hours: number;
  /** Energy cost, before taxes that come on top. */
  readonly cost: number;
}

export interface RateMonths {
  readonly kWh: Float64Array;
  readonly cost: Float64Array;
}

/** A year's bill. Costs by rate add up to the energy cost, months to the year, taxes by name to all taxes. */
export interface Bill extends BillSums {
  readonly byRate: Readonly<Record<string, RateSums>>;
  /** Energy by rate and civil month, before taxes that come on top: cell 12 · rate + month, rates in the order of `byRate`. */
  readonly ofRateAndMonth: RateMonths;
  /** Taxes by name, on top or inside. */
  readonly byTax: Readonly<Record<string, number>>;
  /** Twelve civil months, January first. */
  readonly monthly: readonly BillSums[];
}

/** Where the twelve months of each column begin in a ledger; kWh come first. */
const ENERGY = 12;
const STANDING = 24;
const DEMAND = 36;
const TAXES = 48;
const TAXES_INSIDE = 60;
const CREDITS = 72;
const ENERGY_TAXES = 84;
const LEDGER_LENGTH = 96;

/**
 * Sums that the parts of a year add to. One array for all months, since a bill is made thousands of times and small
 * arrays cost more than their sums.
 */
interface Ledger {
  /** Twelve months of each column, one column after the other: kWh, then as the constants say. */
  readonly months: Float64Array;
  readonly rates: RateMonths;
  readonly byTax: Map<string, number>;
}

/**
 * The bill for a year of electricity (MODEL section 12).
 *
 * @param prepared the tariff laid on the year
 * @param electricity all electricity on the bill, kWh a step; exactly as many values as the clock has hours, all finite
 * @returns money in the tariff's currency, and kWh
 * @example bill(prepared, electricity).total // 8760 kWh at a flat 0.30: 2628
 */
export function bill(prepared: PreparedTariff, electricity: Float64Array): Bill {
  const ledger = ledgerOf(prepared, electricity);
  const { months, rates } = ledger;
  const monthly: BillSums[] = [];
  for (let m = 0; m < 12; m++) monthly.push(sumsOf(months, m));
  const byRate = prepared.rateNames.map((name, r): [string, RateSums] => [
    name,
    {
      kWh: compensatedSum(rates.kWh, 12 * r, 12 * r + 12),
      hours: prepared.hoursOfRate[r],
      cost: compensatedSum(rates.cost, 12 * r, 12 * r + 12),
    },
  ]);
  return {
    ...sumsOf(yearOf(months), 0),
    byRate: Object.fromEntries(byRate),
    ofRateAndMonth: rates,
    byTax: Object.fromEntries(ledger.byTax),
    monthly,
  };
}

/**
 * What the bill for a year comes to, to the last digit, without its parts: a batch asks for it thousands of times.
 *
 * @param prepared the tariff laid on the year
 * @param electricity as for `bill`
 * @returns money in the tariff's currency
 * @example billTotal(prepared, electricity) // 8760 kWh at a flat 0.30: 2628
 */
export function billTotal(prepared: PreparedTariff, electricity: Float64Array): number {
  return sumsOf(yearOf(ledgerOf(prepared, electricity).months), 0).total;
}

function ledgerOf(prepared: PreparedTariff, electricity: Float64Array): Ledger {
  const cells = 12 * prepared.rateNames.length;
  const ledger: Ledger = {
    months: new Float64Array(LEDGER_LENGTH),
    rates: { kWh: new Float64Array(cells), cost: new Float64Array(cells) },
    byTax: new Map(),
  };
  for (const part of prepared.parts) chargePart(part, prepared, electricity, ledger);
  return ledger;
}

/** The year of each column, where its January would stand. */
function yearOf(months: Float64Array): Float64Array {
  const year = new Float64Array(LEDGER_LENGTH);
  for (let at = 0; at < LEDGER_LENGTH; at += 12) year[at] = compensatedSum(months, at, at + 12);
  return year;
}

function sumsOf(ledger: Float64Array, m: number): BillSums {
  const energy = ledger[ENERGY + m];
  const standing = ledger[STANDING + m];
  const demand = ledger[DEMAND + m];
  const taxes = ledger[TAXES + m];
  const credits = ledger[CREDITS + m];
  const total = energy + standing + demand + taxes - credits;
  const [energyTaxes, taxesInside] = [ledger[ENERGY_TAXES + m], ledger[TAXES_INSIDE + m]];
  return { kWh: ledger[m], energy, standing, demand, taxes, energyTaxes, taxesInside, credits, total };
}

/** Adds one supplier's days to the ledger. */
function chargePart(part: PreparedPart, prepared: PreparedTariff, electricity: Float64Array, ledger: Ledger): void {
  const cells = energyCells(part, prepared.price, electricity);
  const { kWh, cost } = cells;
  const { months } = ledger;
  if (part.blocks) addBlocks(part, prepared.clock, cells);
  for (let cell = 0; cell < kWh.length; cell++) {
    const at = 12 * part.rateOfRule[(cell / 12) | 0] + (cell % 12);
    ledger.rates.kWh[at] += kWh[cell];
    ledger.rates.cost[at] += cost[cell];
  }
  const peaks = part.demandPrice === 0 ? undefined : highestOfMonths(part, prepared.clock, electricity);
  let taxed = 0;
  for (let m = 0; m < 12; m++) {
    const energy = sumOfMonth(cost, m);
    const demand = peaks ? part.demandPrice * peaks[m] * part.shareOfMonth[m] : 0;
    const charged = energy + part.standing[m] + demand;
    const base = part.taxInside ? charged / (1 + part.taxShare) : charged;
    const tax = base * part.taxShare;
    taxed += base;
    months[m] += sumOfMonth(kWh, m);
    months[ENERGY + m] += energy;
    months[STANDING + m] += part.standing[m];
    months[DEMAND + m] += demand;
    months[(part.taxInside ? TAXES_INSIDE : TAXES) + m] += tax;
    months[CREDITS + m] += part.credits[m];
    if (!part.taxInside) months[ENERGY_TAXES + m] += energy * part.taxShare;
  }
  for (const { name, share } of part.taxes) ledger.byTax.set(name, (ledger.byTax.get(name) ?? 0) + taxed * share);
}

interface EnergyCells {
  /** By cell rule · 12 + month. */
  readonly kWh: Float64Array;
  readonly cost: Float64Array;
}

/** The part's kWh and energy cost by rule and month, blocks apart. */
function energyCells(part: PreparedPart, price: Float64Array, electricity: Float64Array): EnergyCells {
  const { runs, mixed, rulePrice, hasSeries } = part;
  const kWh = new Float64Array(12 * rulePrice.length);
  const cost = new Float64Array(12 * rulePrice.length);
  for (let r = 0; r < runs.cell.length; r++) {
    const from = runs.from[r];
    const to = runs.to[r];
    if (!hasSeries) {
      kWh[runs.cell[r]] += sumOfRun(electricity, from, to);
      continue;
    }
    let used = 0;
    let paid = 0;
    for (let i = from; i < to; i++) {
      used += electricity[i];
      paid += electricity[i] * price[i];
    }
    kWh[runs.cell[r]] += used;
    cost[runs.cell[r]] += paid;
  }
  for (let k = 0; k < mixed.cell.length; k++) {
    kWh[mixed.cell[k]] += electricity[mixed.step[k]] * mixed.share[k];
    if (hasSeries) cost[mixed.cell[k]] += electricity[mixed.step[k]] * mixed.cost[k];
  }
  if (!hasSeries) for (let cell = 0; cell < cost.length; cell++) cost[cell] = kWh[cell] * rulePrice[(cell / 12) | 0];
  return { kWh, cost };
}

/** Sum of a run, four hours at a time, so that additions need not wait for one another. */
function sumOfRun(electricity: Float64Array, from: number, to: number): number {
  let sum = 0;
  let i = from;
  for (; i + 4 <= to; i += 4) {
    sum += electricity[i] + electricity[i + 1] + (electricity[i + 2] + electricity[i + 3]);
  }
  for (; i < to; i++) sum += electricity[i];
  return sum;
}

/** Sum over the rules of one month's cells. */
function sumOfMonth(cells: Float64Array, month: number): number {
  let sum = 0;
  for (let cell = month; cell < cells.length; cell += 12) sum += cells[cell];
  return sum;
}

/** Adds the blocks' cost of each month to the rules' cells, by kWh. */
function addBlocks({ blocks, shareOfMonth }: PreparedPart, clock: CivilClock, { kWh, cost }: EnergyCells): void {
  if (!blocks) return;
  const kWhOfMonth = Float64Array.from({ length: 12 }, (_, m) => sumOfMonth(kWh, m));
  const ofMonths = blocksOfMonths(blocks, kWhOfMonth, shareOfMonth, clock.daysOfMonth);
  for (let cell = 0; cell < kWh.length; cell++) {
    const all = kWhOfMonth[cell % 12];
    if (all > 0) cost[cell] += (ofMonths[cell % 12] * kWh[cell]) / all;
  }
}

/** Highest hourly kW of each civil month among the steps that begin on the part's days. */
function highestOfMonths({ days }: PreparedPart, clock: CivilClock, electricity: Float64Array): Float64Array {
  const highest = new Float64Array(12);
  const { month, civilDay } = clock;
  const { from, until } = days;
  let at = month[0];
  let most = 0;
  for (let i = 0; i < electricity.length; i++) {
    if (month[i] !== at) {
      highest[at - 1] = Math.max(highest[at - 1], most);
      at = month[i];
      most = 0;
    }
    if (electricity[i] > most && civilDay[i] >= from && civilDay[i] < until) most = electricity[i];
  }
  highest[at - 1] = Math.max(highest[at - 1], most);
  return highest;
}
