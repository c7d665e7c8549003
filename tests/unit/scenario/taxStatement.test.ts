import { describe, expect, test } from 'vitest';
import { taxStatementOf } from '../../../src/scenario/taxStatement.ts';

const vat = [{ name: 'VAT', percent: 19 }];

describe('how taxes are stated', () => {
  test.each([
    ['inside the prices, listed or not', [{ pricesStated: 'withTax', taxes: vat }], 'inPrices'],
    [
      'inside the prices of all suppliers',
      [
        { pricesStated: 'withTax', taxes: [] },
        { pricesStated: 'withTax', taxes: vat },
      ],
      'inPrices',
    ],
    ['on top', [{ pricesStated: 'withoutTax', taxes: vat }], 'onTop'],
    ['not at all', [{ pricesStated: 'withoutTax', taxes: [] }], 'notListed'],
    [
      'in two ways in a year',
      [
        { pricesStated: 'withTax', taxes: vat },
        { pricesStated: 'withoutTax', taxes: vat },
      ],
      'mixed',
    ],
  ] as const)('%s', (_, tariffs, expected) => {
    expect(taxStatementOf(tariffs)).toBe(expected);
  });
});
