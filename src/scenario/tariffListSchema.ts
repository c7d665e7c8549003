import * as z from 'zod';
import { day, fileName, text } from './fields.ts';

const supply = z.strictObject({
  file: fileName('A tariff file.'),
  from: day(
    'Civil date on which this tariff begins, of the calendar year or of every year; the first has none.',
  ).optional(),
});

const change = z.strictObject({
  name: text('What results call the year; the names of the tariffs one after the other when left out.', 60).optional(),
  supplies: z
    .array(supply)
    .min(2)
    .max(5)
    .describe('The tariffs of the year in their order, each from its own date to that of the next.'),
});

/** Longest list of tariffs. */
export const MOST_TARIFFS = 50;

/** One tariff of a scenario. */
export const tariffEntrySchema = z.union([
  fileName('A tariff file.'),
  change.describe('A year with a change of supplier: several tariff files, one after the other.'),
]);

/** Electricity tariffs of a scenario. */
export const tariffListSchema = z
  .array(tariffEntrySchema)
  .max(MOST_TARIFFS)
  .describe(
    'Electricity tariffs to compare, each the name of a file or a change of supplier; the first is the present one.',
  )
  .default([]);
