import type { Tariff } from '../tariffs/tariff.ts';

/**
 * How a tariff states its taxes: inside its prices, listed to come on top, not at all, or one way in a part of the year
 * and another in the rest. Bills of tariffs that state them differently are not alike.
 */
export type TaxStatement = 'inPrices' | 'onTop' | 'notListed' | 'mixed';

/**
 * How the tariffs of a year state their taxes.
 *
 * @param tariffs one, or those of a change of supplier
 * @example taxStatementOf([tariff]) // 'onTop' where pricesStated is withoutTax and a tax is listed
 */
export function taxStatementOf(tariffs: readonly Pick<Tariff, 'pricesStated' | 'taxes'>[]): TaxStatement {
  const ways = new Set(tariffs.map(wayOf));
  const [first, ...others] = ways;
  return first === undefined || others.length > 0 ? 'mixed' : first;
}

function wayOf({ pricesStated, taxes }: Pick<Tariff, 'pricesStated' | 'taxes'>): TaxStatement {
  if (pricesStated === 'withTax') return 'inPrices';
  return taxes.length > 0 ? 'onTop' : 'notListed';
}
