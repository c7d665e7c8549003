import type { Bill } from '../tariffs/bill.ts';
import { taxedEnergy } from '../tariffs/taxedEnergy.ts';

/** Less electricity than this in a year is none, kWh: a mean price of it would mean nothing. */
const LEAST_ELECTRICITY = 0.001;

/** How far the kWh prices of the cheaper of two tariffs may rise before the other is as cheap. */
export interface PriceAtEquality {
  /** Mean price of its kWh now, before taxes that come on top, money/kWh. */
  readonly meanPrice: number;
  /** The same where both cost alike. */
  readonly priceAtEquality: number;
  /** The one over the other less one, a share: 0.05 where every price of a kWh rises by 5 %. */
  readonly change: number;
}

/** `no electricity` where none is on the bill, `no price` where its kWh cost nothing or less in all. */
export type ChangeOfPlaces = PriceAtEquality | 'no electricity' | 'no price';

/**
 * The price at which two tariffs change places: all prices of a kilowatt-hour of the cheaper one rise by one share, with
 * the taxes on them, until the year costs the same on both; standing and demand charges, credits and the electricity used
 * stay as they are.
 *
 * @param cheaper its bill
 * @param difference what the year costs less on it than on the other, money, 0 or above
 * @returns mean prices now and where both cost alike, and the change between them
 * @example changeOfPlaces(bill(laid, use), 87.6) // 8760 kWh at 0.30 without tax: change 87.6/2628, priceAtEquality 0.31
 *
 * Reference: MODEL section 12 for the whole bill that is compared.
 */
export function changeOfPlaces(cheaper: Bill, difference: number): ChangeOfPlaces {
  if (cheaper.kWh < LEAST_ELECTRICITY) return 'no electricity';
  const charged = taxedEnergy(cheaper);
  const change = difference / charged;
  if (charged <= 0 || !Number.isFinite(change)) return 'no price';
  const meanPrice = cheaper.energy / cheaper.kWh;
  return { meanPrice, priceAtEquality: meanPrice * (1 + change), change };
}
