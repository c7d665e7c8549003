import type { BillSums } from './bill.ts';

/**
 * What the kilowatt-hours of a bill cost with the taxes on them, money; standing and demand charges, their taxes and credits
 * left out. Each supplier's energy has that supplier's taxes, also where two meet within a month.
 *
 * @example taxedEnergy(bill(laid, use)) // 1000 kWh at 0.30 and 20 % tax on top: 360
 */
export function taxedEnergy(sums: BillSums): number {
  return sums.energy + sums.energyTaxes;
}
