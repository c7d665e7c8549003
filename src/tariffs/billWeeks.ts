import { dayNumber } from '../core/civilDate.ts';
import { dateText } from '../core/stampText.ts';
import type { Bill } from './bill.ts';
import type { CivilClock } from './civilClock.ts';
import type { PreparedTariff } from './preparedTariff.ts';
import { taxedEnergy } from './taxedEnergy.ts';

/** A civil week of a bill, from Monday to Sunday; the first and the last of a year may have fewer days. */
export interface BillWeek {
  /** First and last civil day of it that lies in the year, YYYY-MM-DD. */
  readonly from: string;
  readonly to: string;
  readonly kWh: number;
  /** What the kilowatt-hours cost with the taxes on them, money. */
  readonly cost: number;
}

/**
 * The civil weeks of a bill.
 *
 * An hour belongs to the week in which it begins, and costs its own price with its taxes; what blocks ask in a month is
 * shared among its hours by kWh. Standing and demand charges and credits are left out.
 *
 * @param prepared the tariff laid on the year
 * @param electricity all electricity on the bill, kWh a step
 * @param made the bill of the two
 * @returns in the order of the year, at least 53
 */
export function billWeeks(prepared: PreparedTariff, electricity: Float64Array, made: Bill): BillWeek[] {
  const { clock, marginalPrice } = prepared;
  const costOfBlocks = blockPriceOfMonths(prepared, electricity, made);
  const weeks: { from: string; to: string; kWh: number; cost: number }[] = [];
  let monday = Number.NaN;
  for (const day of clock.stretches) {
    const date = dayNumber(day.year, day.month, day.dayOfMonth);
    const text = dateText(day.year, day.month, day.dayOfMonth);
    if (date - (day.weekday - 1) !== monday) weeks.push({ from: text, to: text, kWh: 0, cost: 0 });
    monday = date - (day.weekday - 1);
    const week = weeks[weeks.length - 1];
    week.to = text;
    const price = costOfBlocks[day.month - 1];
    for (let i = Math.ceil(day.fromMinute / 60); i * 60 < day.toMinute; i++) {
      week.kWh += electricity[i];
      week.cost += electricity[i] * (marginalPrice[i] + price);
    }
  }
  return weeks;
}

/** What blocks add to a kilowatt-hour of each civil month on the mean, taxes in; zero without blocks. */
function blockPriceOfMonths(prepared: PreparedTariff, electricity: Float64Array, made: Bill): Float64Array {
  const added = new Float64Array(12);
  if (prepared.parts.every(({ blocks }) => blocks === undefined)) return added;
  const { kWh, cost } = sumsOfMonths(prepared.clock, prepared.marginalPrice, electricity);
  made.monthly.forEach((month, m) => {
    if (kWh[m] > 0) added[m] = (taxedEnergy(month) - cost[m]) / kWh[m];
  });
  return added;
}

/** kWh of the hours that begin in each civil month, and what they cost by the hour. */
function sumsOfMonths({ month }: CivilClock, marginalPrice: Float64Array, electricity: Float64Array) {
  const kWh = new Float64Array(12);
  const cost = new Float64Array(12);
  for (let i = 0; i < electricity.length; i++) {
    kWh[month[i] - 1] += electricity[i];
    cost[month[i] - 1] += electricity[i] * marginalPrice[i];
  }
  return { kWh, cost };
}

/**
 * The dearest civil week of a bill.
 *
 * @returns of several that cost the same the earliest
 */
export function dearestWeek(prepared: PreparedTariff, electricity: Float64Array, made: Bill): BillWeek {
  return billWeeks(prepared, electricity, made).reduce((dearest, week) => (week.cost > dearest.cost ? week : dearest));
}
