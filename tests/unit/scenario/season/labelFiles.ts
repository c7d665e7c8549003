import { parse, stringify } from 'yaml';
import type * as z from 'zod';
import { seasonDocument } from '../../../../src/report/seasonDocument.ts';
import type { SeasonDocument } from '../../../../src/report/seasonSchema.ts';
import type { labelSchema } from '../../../../src/scenario/labelSchema.ts';
import type { Wanted } from '../../../../src/scenario/season/chooseRatings.ts';
import { loadLabel } from '../../../../src/scenario/season/loadLabel.ts';
import { makeSeasons } from '../../../../src/scenario/season/makeSeasons.ts';
import { memoryFiles } from '../memoryFiles.ts';
import { unitText } from '../sampleFiles.ts';

/** The label section of a unit file, as a person writes it. */
export type WrittenLabel = z.input<typeof labelSchema>;
export type WrittenOutlets = NonNullable<WrittenLabel['outlets']>[number];
export type WrittenSeason = NonNullable<WrittenLabel['seasons']>[number];

/** A unit file with a label section and, where given, other keys changed; the rest is that of the sample unit. */
export function labelFile(label: WrittenLabel | undefined, changes: object = {}): string {
  return stringify({ ...parse(unitText), ...changes, ...(label === undefined ? {} : { label }) });
}

/** The label check of a unit file, from its text to the JSON document. */
export function checkedLabel(text: string, wanted: Partial<Wanted> = {}): SeasonDocument {
  const { loaded, problems } = loadLabel('unit.yaml', memoryFiles({ 'unit.yaml': text }));
  if (loaded === undefined) throw new Error(JSON.stringify(problems));
  const made = makeSeasons(loaded, { climate: undefined, application: undefined, ...wanted });
  if (made.answer === undefined) throw new Error(JSON.stringify(made.problems));
  return seasonDocument(made.answer, '0');
}

/** An invented season of an invented label, near the sample unit's map. */
export const sampleSeason: WrittenSeason = {
  climate: 'average',
  application: 55,
  designLoad: 6,
  bivalentTemperature: -7,
  operatingLimit: -10,
  points: [
    { outdoor: -10, capacity: 5.3, cop: 1.85 },
    { outdoor: -7, capacity: 5.6, cop: 2.1 },
    { outdoor: 2, capacity: 3.3, cop: 3.1 },
    { outdoor: 7, capacity: 2.4, cop: 4.2 },
    { outdoor: 12, capacity: 2.4, cop: 5.2 },
  ],
};

export const sampleLabel: WrittenLabel = {
  reversible: true,
  idlePowers: { off: 10, thermostatOff: 15, standby: 10, crankcase: 0 },
  seasons: [sampleSeason],
};
