import { type Problem, shown } from '../core/problem.ts';
import type { Block, Blocks } from './tariff.ts';

const MONTHS_OF_PERIOD = { month: 1, quarter: 3, year: 12 } as const;

/**
 * What blocks ask for an amount in one period.
 *
 * @param prices blocks in rising order, the last without an end
 * @param kWh amount, >= 0; below 0 it costs nothing
 * @param share how much of the period the tariff is in force, 0 to 1: the blocks' ends shrink with it
 * @returns money before tax
 * @example blocksCost([{ upTo: 100, price: 0.3 }, { price: 0.2 }], 150) // 100·0.3 + 50·0.2 = 40
 */
export function blocksCost(prices: readonly Block[], kWh: number, share = 1): number {
  let cost = 0;
  let below = 0;
  for (const { upTo, price } of prices) {
    const end = upTo === undefined ? kWh : Math.min(kWh, upTo * share);
    if (end > below) cost += (end - below) * price;
    below = Math.max(below, end);
  }
  return cost;
}

/**
 * What blocks ask month by month. Within a quarter or a year the blocks fill in the order of the months.
 *
 * @param kWh of each civil month, in the days that the tariff is in force
 * @param shareOfMonth share of each month's days that the tariff is in force
 * @param daysOfMonth days of each whole month
 * @returns 12 sums of money, before tax
 */
export function blocksOfMonths(
  blocks: Blocks,
  kWh: ArrayLike<number>,
  shareOfMonth: ArrayLike<number>,
  daysOfMonth: readonly number[],
): Float64Array {
  const costs = new Float64Array(12);
  const length = MONTHS_OF_PERIOD[blocks.per];
  for (let first = 0; first < 12; first += length) {
    let inForce = 0;
    let days = 0;
    for (let m = first; m < first + length; m++) {
      inForce += shareOfMonth[m] * daysOfMonth[m];
      days += daysOfMonth[m];
    }
    let used = 0;
    let before = 0;
    for (let m = first; m < first + length; m++) {
      used += kWh[m];
      const cost = blocksCost(blocks.prices, used, inForce / days);
      costs[m] = cost - before;
      before = cost;
    }
  }
  return costs;
}

/** Faults in the order of blocks: ends must rise, and only the last block has none. */
export function blockProblems(blocks: Blocks | undefined, file: string): Problem[] {
  const problems: Problem[] = [];
  let below = 0;
  blocks?.prices.forEach(({ upTo }, i) => {
    const place = { file, path: `blocks.prices[${i}].upTo`, found: shown(upTo ?? 'left out'), unit: 'kWh' };
    const isLast = i === blocks.prices.length - 1;
    if (isLast && upTo !== undefined) {
      problems.push({ code: 'tariff.block-order', severity: 'error', ...place, allowed: 'nothing in the last block' });
    }
    if (!isLast && !(upTo !== undefined && upTo > below)) {
      const allowed = `more than ${below} kWh`;
      problems.push({ code: 'tariff.block-order', severity: 'error', ...place, allowed });
    }
    below = upTo ?? below;
  });
  return problems;
}
