import * as z from 'zod';
import { fileName, text } from './fields.ts';

const axisName = text('Name of the axis: what the column of its values is called in the results.', 60);

const place = z
  .string()
  .min(1)
  .max(200)
  .describe('What is varied: a place in the scenario, such as house.heatLoss.value, heatPump.unit or tariffs[0].')
  .meta({ format: 'as keys joined by points, positions of lists in brackets from 0' });

const scalar = z.union([z.number(), z.string().max(1000), z.boolean()]);

const byValues = z.strictObject({
  given: z.literal('values'),
  name: axisName,
  path: place,
  values: z
    .array(scalar)
    .min(1)
    .max(10_000)
    .describe('The values, one after the other; names of files are relative to the folder of the plan.'),
});

const byRange = z.strictObject({
  given: z.literal('range'),
  name: axisName,
  path: place,
  from: z.number().describe('First value.'),
  to: z.number().describe('Last value; reached where the steps come out even.'),
  step: z.number().describe('From one value to the next; below zero for a falling row.'),
});

const option = z.strictObject({
  name: text('What the option is called in the results.', 100),
  set: z
    .record(z.string().min(1).max(200), z.unknown())
    .describe('Places in the scenario and what stands there, sections and lists too; null takes an entry out.'),
});

const byOptions = z.strictObject({
  given: z.literal('options'),
  name: axisName,
  options: z.array(option).min(1).max(1000).describe('The options, each a few entries that belong together.'),
});

/** A batch: one scenario in many variants, many homes, or both. */
export const planSchema = z.strictObject({
  name: text('Name of the batch.'),
  note: text('Anything the reader of the results should know.', 2000).optional(),
  scenario: fileName('The base scenario: whatever no axis and no home says stands there.'),
  homes: z
    .strictObject({
      file: fileName('Table of homes as CSV: a row a home, a column a place in the scenario.'),
      nameColumn: text('Column that holds the name or number of a home.', 100).default('home'),
    })
    .describe('Homes to simulate; the base scenario alone when left out.')
    .optional(),
  axes: z
    .array(z.discriminatedUnion('given', [byValues, byRange, byOptions]))
    .max(12)
    .describe('What is varied in each home; every value of an axis is combined with every value of the others.')
    .default([]),
});

export type Plan = z.output<typeof planSchema>;
