import * as z from 'zod';
import { fileName, number, text } from './fields.ts';

const shares = (says: string) => z.array(z.number().min(0).max(1000)).length(24).describe(says);

const profile = z.strictObject({
  given: z.literal('profile'),
  kWhPerYear: number(0, 1_000_000, {
    says: 'Electricity of the household in a year, without the heating; the profile is brought to it exactly.',
    unit: 'kWh/year',
    usual: '1500–5000',
  }),
  shares: shares(
    'Shares of the 24 civil hours of a day; they need not add up to one. Even over the hours when left out.',
  ).optional(),
  weekendShares: shares(
    'The same for Saturday and Sunday, on the scale of shares: a larger sum is a weekend that uses more. As shares when left out.',
  ).optional(),
});

const meter = z.strictObject({
  given: z.literal('meter'),
  file: fileName(
    'CSV file with a column of stamps, which mark the beginning of a step, and one of the energy used in each step of at most an hour.',
  ),
  unit: z.enum(['kWh', 'Wh']).describe('What the energies are stated in.'),
  stamps: z
    .enum(['withOffset', 'utc', 'local'])
    .describe("What a stamp without an offset means: a fault, UTC, or civil time of the site's zone.")
    .default('withOffset'),
  timeColumn: text('Name of the column of stamps; not needed in a file of two columns.').optional(),
  energyColumn: text('Name of the column of energies; not needed in a file of two columns.').optional(),
  decimal: z.enum(['point', 'comma']).describe('Decimal sign of the energies; left out, the file shows it.').optional(),
});

/** Electricity that is on the bill beside the heating. */
export const householdSchema = z
  .discriminatedUnion('given', [profile, meter])
  .describe('Electricity of the household without the heating: it is on the same bill, and shares blocks and peaks.');

/** What a scenario says of its household. */
export type HouseholdEntry = z.output<typeof householdSchema>;
