import { readFileSync } from 'node:fs';
import type * as z from 'zod';
import { batchManifestSchema } from '../../src/report/batchManifest.ts';
import { explainSchema } from '../../src/report/explainSchema.ts';
import { resultSchema } from '../../src/report/resultSchema.ts';
import { seasonSchema } from '../../src/report/seasonSchema.ts';
import { tariffRankingSchema } from '../../src/report/tariffRankingSchema.ts';
import { planSchema } from '../../src/scenario/planSchema.ts';
import { readSchema } from '../../src/scenario/readSchema.ts';
import { scenarioSchema } from '../../src/scenario/scenarioSchema.ts';
import { tariffSchema } from '../../src/scenario/tariffSchema.ts';
import { unitSchema } from '../../src/scenario/unitSchema.ts';
import { editorSchema } from './editorSchema.ts';
import { keyTables } from './keyTables.ts';
import { readmeWithAnswer } from './readmeAnswer.ts';

/** The structured kinds of files, in the order of the docs. */
const kinds: readonly { name: string; title: string; schema: z.ZodObject }[] = [
  { name: 'scenario', title: 'A Winterledger scenario: one house', schema: scenarioSchema },
  { name: 'unit', title: 'A heat-pump unit for Winterledger', schema: unitSchema },
  { name: 'tariff', title: 'An electricity tariff for Winterledger', schema: tariffSchema },
  { name: 'read', title: 'How Winterledger reads a weather file', schema: readSchema },
  { name: 'plan', title: 'A plan of a Winterledger batch', schema: planSchema },
];

/** Documents that the program writes as JSON. */
const documents: readonly { name: string; title: string; schema: z.ZodObject }[] = [
  {
    name: 'result',
    title: 'The result of a Winterledger scenario, as simulate --json writes it',
    schema: resultSchema,
  },
  {
    name: 'tariff-ranking',
    title: 'A Winterledger ranking of tariffs, as tariffs --json writes it',
    schema: tariffRankingSchema,
  },
  { name: 'explain', title: 'One hour of a Winterledger year, as explain --json writes it', schema: explainSchema },
  {
    name: 'batch-manifest',
    title: 'The manifest beside the results of a Winterledger batch',
    schema: batchManifestSchema,
  },
  { name: 'season', title: 'A Winterledger label check, as season --json writes it', schema: seasonSchema },
];

/** Kinds without a table of keys: their prose says all. */
const withoutKeys = ['weather', 'prices', 'results'];

/**
 * Every file that follows from the schemas, with its content.
 *
 * @returns paths from the project's folder
 */
export function generatedFiles(): Map<string, string> {
  const files = new Map<string, string>();
  for (const { name, title, schema } of [...kinds, ...documents]) {
    files.set(`schemas/${name}.schema.json`, `${JSON.stringify(editorSchema(schema, title), null, 2)}\n`);
  }
  const sections = [
    prose('introduction'),
    ...kinds.map(({ name, schema }) => `${prose(name)}\n${keyTables(schema)}`),
    ...withoutKeys.map(prose),
  ];
  files.set('docs/formats.md', sections.join('\n'));
  files.set('README.md', readmeWithAnswer());
  return files;
}

function prose(name: string): string {
  return readFileSync(`scripts/formats/${name}.md`, 'utf8');
}
