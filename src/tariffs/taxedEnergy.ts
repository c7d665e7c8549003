import type { Bill, BillSums } from './bill.ts';

/**
 * What the kilowatt-hours of a bill cost with the taxes on them, money; standing and demand charges and credits left out.
 *
 * The taxes that come on top are shared within each month between energy, standing and demand charges; where two suppliers
 * with different taxes meet within a month, that month's share is their mean.
 *
 * @example taxedEnergy(bill(laid, use)) // 1000 kWh at 0.30 and 20 % tax on top: 360
 */
export function taxedEnergy({ monthly }: Bill): number {
  return monthly.reduce((sum, month) => sum + taxedEnergyOf(month), 0);
}

/** The same for one month. */
export function taxedEnergyOf({ energy, standing, demand, taxes }: BillSums): number {
  const charged = energy + standing + demand;
  return energy * (1 + (charged === 0 ? 0 : taxes / charged));
}
