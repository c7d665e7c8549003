import type * as z from 'zod';
import { entryOf } from './entries/schemaField.ts';
import { type Scenario, scenarioSchema } from './scenarioSchema.ts';

/** Sections whose entries are looked at one by one, so that a fault in one entry hides no other. */
const OPENED = ['site', 'weather', 'house', 'heatPump'] as const;

type EntriesOf<S extends keyof Scenario & string> = {
  readonly [K in keyof Scenario[S] & string as `${S}.${K}`]: Scenario[S][K];
};

/** A scenario in parts: its sections, and the entries of some of them by their paths. */
export type ScenarioParts = Scenario &
  EntriesOf<'site'> &
  EntriesOf<'weather'> &
  EntriesOf<'house'> &
  EntriesOf<'heatPump'>;

/** Parts that are sound; one that has a fault has no key at all. */
export type SoundParts = Readonly<Partial<ScenarioParts>>;

/** The parts of a sound scenario. */
export function partsOf(scenario: Scenario): ScenarioParts {
  const parts: Record<string, unknown> = {};
  for (const key of Object.keys(scenarioSchema.shape)) parts[key] = entryOf(scenario, key);
  for (const section of OPENED) {
    for (const key of Object.keys(scenarioSchema.shape[section].shape)) {
      parts[`${section}.${key}`] = entryOf(scenario[section], key);
    }
  }
  return parts as ScenarioParts;
}

/** The sound parts of what a file holds, each with its defaults; an optional part that is left out is sound. */
export function soundPartsOf(raw: unknown): SoundParts {
  const parts = soundEntries(scenarioSchema, raw);
  for (const section of OPENED) {
    const entries = soundEntries(scenarioSchema.shape[section], entryOf(raw, section));
    for (const [key, value] of Object.entries(entries)) parts[`${section}.${key}`] = value;
  }
  return parts;
}

/** Entries of a section that are sound. Beside a key that is not known, what is left out may be just what it was meant for. */
function soundEntries(schema: z.ZodObject, raw: unknown): Record<string, unknown> {
  if (typeof raw !== 'object' || raw === null) return {};
  const isKnown = Object.keys(raw).every((key) => Object.hasOwn(schema.shape, key));
  const sound: Record<string, unknown> = {};
  for (const [key, field] of Object.entries(schema.shape)) {
    if (!isKnown && !Object.hasOwn(raw, key)) continue;
    const result = (field as z.ZodType).safeParse(entryOf(raw, key));
    if (result.success) sound[key] = result.data;
  }
  return sound;
}
