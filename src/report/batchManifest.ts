import * as z from 'zod';
import type { AxisValue } from '../batch/axes.ts';

const count = z.int().min(0);

const input = z.strictObject({
  file: z.string(),
  role: z.string(),
  sha256: z.string().describe('SHA-256 of its bytes, hexadecimal.'),
});

const axis = z.strictObject({
  name: z.string(),
  values: z.array(z.union([z.string(), z.number(), z.boolean()])),
});

const column = z.strictObject({ name: z.string(), unit: z.string() });

/** What stands beside the results of a batch: what they are, and what they rest on. */
export const batchManifestSchema = z.strictObject({
  version: z.string().describe('Version of the program.'),
  plan: z.string().describe('Name of the plan.'),
  planFile: z.string(),
  homesFile: z.string().describe('Table of homes; absent where the base scenario is the one home.').optional(),
  homes: count.describe('Homes of the whole plan.'),
  options: count.describe('Options in each home: each value of one axis with each of the others.'),
  jobs: count.describe('Years of the whole plan, homes × options.'),
  axes: z.array(axis).describe('What was varied; the last axis changes first.'),
  part: z
    .strictObject({
      shard: count.describe('Which part, counted from 1.'),
      shards: count.describe('Parts of the whole plan.'),
      fromJob: count,
      toJob: count,
    })
    .describe('The part of the plan that these results are; absent where they are whole.')
    .optional(),
  missing: z.array(z.string()).describe('Parts that were not there when the results were gathered.').optional(),
  tariffs: count.describe('Most tariffs of any job.'),
  rows: count.describe('Rows of results.csv and lines of results.jsonl.'),
  failed: count.describe('Rows that have problems in place of figures.'),
  columns: z.array(column).describe('The figures and their units.'),
  inputs: z.array(input).describe('Every file that the results rest on.'),
  assumptions: z
    .array(z.strictObject({ path: z.string(), text: z.string() }))
    .describe('What the base scenario assumes because no file says otherwise; axes and homes may say otherwise.'),
});

export type BatchManifest = z.output<typeof batchManifestSchema>;

/** Inputs in a fixed order, whatever the order in which they were read. */
export function sortedInputs(inputs: Readonly<BatchManifest['inputs']>): BatchManifest['inputs'] {
  return inputs
    .map(({ file, role, sha256 }) => ({ file, role, sha256 }))
    .sort((a, b) => compare(a.file, b.file) || compare(a.role, b.role));
}

function compare(a: string, b: string): number {
  if (a === b) return 0;
  return a < b ? -1 : 1;
}

/** Axes as the manifest lists them. */
export function listedAxes(
  axes: readonly { readonly name: string; readonly values: readonly Pick<AxisValue, 'label'>[] }[],
): BatchManifest['axes'] {
  return axes.map(({ name, values }) => ({ name, values: values.map(({ label }) => label) }));
}
