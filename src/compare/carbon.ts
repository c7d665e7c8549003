import { columnSum } from '../core/columnSum.ts';
import { bill } from '../tariffs/bill.ts';
import type { PreparedTariff } from '../tariffs/preparedTariff.ts';

/** Carbon of one kWh while a rate of the tariff holds, kg/kWh. */
export interface RateFactor {
  /** Name of the rate. */
  readonly rate: string;
  readonly factor: number;
}

/**
 * Carbon of a year of electricity by an hourly factor.
 *
 * @param electricity kWh by hour
 * @param factors kg/kWh by hour, of the same length
 * @returns Σ kWh · factor, kg
 * @example carbonByHour(Float64Array.of(2, 1), Float64Array.of(0.1, 0.4)) // 0.6
 *
 * Reference: MODEL section 12.
 */
export function carbonByHour(electricity: Float64Array, factors: Float64Array): number {
  const carbon = electricity.map((kWh, i) => kWh * factors[i]);
  return columnSum(carbon, 0, carbon.length);
}

/**
 * Carbon of a year of electricity by a factor for each rate of a tariff, the kWh of a rate being those of the bill: by the
 * minute.
 *
 * @param electricity kWh by hour, of as many hours as the tariff's clock
 * @param prepared the tariff whose rates the factors name
 * @param factors kg/kWh; of a rate named twice the first holds
 * @returns Σ kWh of the rate · its factor, kg; 'no factor' where electricity falls into a rate that has none
 * @example carbonByRate(use, prepared, [{ rate: 'night', factor: 0.2 }, { rate: 'day', factor: 0.4 }]) // 1 kWh an hour, 8 of 24 at night: 2920
 *
 * Reference: MODEL section 12.
 */
export function carbonByRate(
  electricity: Float64Array,
  prepared: PreparedTariff,
  factors: readonly RateFactor[],
): number | 'no factor' {
  let carbon = 0;
  for (const [name, { kWh }] of Object.entries(bill(prepared, electricity).byRate)) {
    const factor = factors.find(({ rate }) => rate === name)?.factor;
    if (factor !== undefined) carbon += kWh * factor;
    else if (kWh !== 0) return 'no factor';
  }
  return carbon;
}
