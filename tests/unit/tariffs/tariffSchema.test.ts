import { describe, expect, test } from 'vitest';
import * as z from 'zod';
import { tariffSchema } from '../../../src/scenario/tariffSchema.ts';
import type { Tariff } from '../../../src/tariffs/tariff.ts';

const flat = { name: 'flat', rates: [{ name: 'all day', price: 0.3 }] };

/** Paths of what the schema refuses. */
function refused(value: unknown): string[] {
  const { error } = tariffSchema.safeParse(value);
  return (error?.issues ?? []).map((issue) => issue.path.join('.'));
}

describe('the tariff schema', () => {
  test('gives what the tariffs’ room takes, with its defaults', () => {
    const tariff: Tariff = tariffSchema.parse(flat);
    expect(tariff).toEqual({ ...flat, taxes: [], credits: [], holidays: [], pricesStated: 'withoutTax' });
  });

  test('takes a tariff with everything in it', () => {
    const full = {
      ...flat,
      currency: 'EUR',
      note: 'offer of March',
      rates: [
        {
          ...{ name: 'night', price: -0.01, from: '22:00', to: '24:00', weekdays: ['mon'], months: [1, 12] },
          ...{ dates: { from: '11-01', to: '03-31' }, holidays: 'also' },
        },
      ],
      series: { file: 'p.csv', unit: 'perMWh', stamps: 'local', timeColumn: 't', priceColumn: 'p', decimal: 'comma' },
      blocks: { per: 'quarter', prices: [{ upTo: 100, price: 0.3 }, { price: 0.2 }] },
      standing: { perDay: 0.4, perMonth: 5, perYear: 60 },
      demand: { perKW: 4 },
      taxes: [{ name: 'VAT', percent: 20 }],
      credits: [{ name: 'rebate', amount: 100 }],
      holidays: ['12-25', '2025-04-18'],
      pricesStated: 'withTax',
    };
    expect(tariffSchema.parse(full)).toEqual(full);
  });

  test.each<[unknown, string]>([
    [{ ...flat, rates: [] }, 'rates'],
    [{ ...flat, rates: [{ name: 'x', price: '0.3' }] }, 'rates.0.price'],
    [{ ...flat, rates: [{ name: 'x', price: Number.POSITIVE_INFINITY }] }, 'rates.0.price'],
    [{ ...flat, rates: [{ name: '', price: 1 }] }, 'rates.0.name'],
    [{ ...flat, rates: [{ name: 'x', price: 1, from: '7:00' }] }, 'rates.0.from'],
    [{ ...flat, rates: [{ name: 'x', price: 1, weekdays: ['Monday'] }] }, 'rates.0.weekdays.0'],
    [{ ...flat, rates: [{ name: 'x', price: 1, months: [13] }] }, 'rates.0.months.0'],
    [{ ...flat, rates: [{ name: 'x', price: 1, dates: { from: '2025-01-01', to: '02-01' } }] }, 'rates.0.dates.from'],
    [{ ...flat, series: { file: 'p.csv' } }, 'series.unit'],
    [{ ...flat, blocks: { per: 'week', prices: [{ price: 1 }] } }, 'blocks.per'],
    [{ ...flat, blocks: { per: 'year', prices: [{ upTo: 0, price: 1 }] } }, 'blocks.prices.0.upTo'],
    [{ ...flat, standing: { perDay: -1 } }, 'standing.perDay'],
    [{ ...flat, taxes: [{ name: 'x', percent: -1 }] }, 'taxes.0.percent'],
    [{ ...flat, credits: [{ name: 'x', amount: -1 }] }, 'credits.0.amount'],
    [{ ...flat, holidays: ['25.12.'] }, 'holidays.0'],
    [{ ...flat, rate: 1 }, ''],
  ])('refuses %j', (value, path) => expect(refused(value)).toEqual([path]));

  test('describes every field of its JSON Schema', () => {
    const schema = z.toJSONSchema(tariffSchema, { target: 'draft-7', io: 'input' });
    const bare: string[] = [];
    const visit = (node: z.core.JSONSchema._JSONSchema, path: string): void => {
      if (typeof node === 'boolean') return;
      for (const [key, field] of Object.entries(node.properties ?? {})) {
        if (typeof field === 'boolean' || !field.description) bare.push(`${path}.${key}`);
        visit(field, `${path}.${key}`);
      }
      if (node.items && !Array.isArray(node.items)) visit(node.items, `${path}[]`);
    };
    visit(schema, '');
    expect(bare).toEqual([]);
    expect(Object.keys(schema.properties ?? {})).toHaveLength(12);
  });
});
