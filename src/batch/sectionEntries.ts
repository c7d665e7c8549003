import type * as z from 'zod';
import { entryProblems } from '../scenario/entries/entryProblems.ts';
import type { EntriesResult } from '../scenario/entries/readEntries.ts';
import { entryOf } from '../scenario/entries/schemaField.ts';
import { type Scenario, scenarioSchema } from '../scenario/scenarioSchema.ts';
import type { JobFile } from './jobFile.ts';

/**
 * Holds scenarios against their schema. A section that a job leaves as it was is the same object as before, so it is held
 * against its part of the schema once for all jobs: what a scenario may hold is what its sections may hold, and no more keys.
 */
export class SectionEntries {
  readonly #sound = new WeakMap<object, unknown>();
  /** What a section is that nobody wrote: its default, or nothing. */
  readonly #leftOut = new Map<z.ZodType, { readonly value: unknown } | undefined>();

  /** @returns the scenario with its defaults filled in, none of them listed; or all that is wrong with it */
  of(file: JobFile): EntriesResult<Scenario> {
    const sections = this.#sections(file.raw);
    if (sections !== undefined) return { yaml: file, entries: { value: sections, defaults: [] }, problems: [] };
    const result = scenarioSchema.safeParse(file.raw);
    if (result.success) return { yaml: file, entries: { value: result.data, defaults: [] }, problems: [] };
    return { yaml: file, problems: entryProblems(file, scenarioSchema, result.error.issues) };
  }

  /** The scenario made of its sections; nothing where one of them is wrong or not known. */
  #sections(raw: unknown): Scenario | undefined {
    if (typeof raw !== 'object' || raw === null) return undefined;
    if (Object.keys(raw).some((key) => !Object.hasOwn(scenarioSchema.shape, key))) return undefined;
    const sections: Record<string, unknown> = {};
    for (const [key, schema] of Object.entries(scenarioSchema.shape)) {
      const section = this.#section(schema, entryOf(raw, key));
      if (section === undefined) return undefined;
      if (section.value !== undefined) sections[key] = section.value;
    }
    return sections as Scenario;
  }

  #section(schema: z.ZodType, raw: unknown): { readonly value: unknown } | undefined {
    if (raw === undefined && this.#leftOut.has(schema)) return this.#leftOut.get(schema);
    const isSection = typeof raw === 'object' && raw !== null;
    if (isSection && this.#sound.has(raw)) return { value: this.#sound.get(raw) };
    const result = schema.safeParse(raw);
    const section = result.success ? { value: result.data } : undefined;
    if (raw === undefined) this.#leftOut.set(schema, section);
    if (isSection && section !== undefined) this.#sound.set(raw, section.value);
    return section;
  }
}
