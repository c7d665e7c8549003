import * as z from 'zod';
import { fileName, number, text } from './fields.ts';

const factor = (says: string) => number(0, 5, { says, unit: 'kg/kWh', usual: '0.02–0.6' });

const byRate = z.strictObject({
  given: z.literal('byRate'),
  factors: z
    .array(
      z.strictObject({
        rate: text('Name of a rate of the first tariff.', 60),
        factor: factor('Carbon of one kWh while the rate holds.'),
      }),
    )
    .min(1)
    .max(50)
    .describe('A factor for each rate of the first tariff.'),
});

const series = z.strictObject({
  given: z.literal('series'),
  file: fileName('CSV file with a column of stamps and one of factors, in one step of at most an hour.'),
  unit: z.enum(['kgPerKWh', 'gPerKWh']).describe('What the factors are stated in.'),
  stamps: z
    .enum(['withOffset', 'utc', 'local'])
    .describe("What a stamp without an offset means: a fault, UTC, or civil time of the site's zone.")
    .default('withOffset'),
  timeColumn: text('Name of the column of stamps; not needed in a file of two columns.').optional(),
  factorColumn: text('Name of the column of factors; not needed in a file of two columns.').optional(),
  decimal: z.enum(['point', 'comma']).describe('Decimal sign of the factors; left out, the file shows it.').optional(),
});

/** Carbon factors of electricity; those of fuels stand with the fuels. */
export const carbonSchema = z
  .strictObject({
    electricity: z
      .union([factor('Carbon of one kWh of electricity.'), z.discriminatedUnion('given', [byRate, series])])
      .describe('Carbon of one kWh of electricity: one factor, one for each rate of the first tariff, or a series.'),
  })
  .describe('Carbon factors; leave the section out to have none computed.');
