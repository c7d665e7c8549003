import * as z from 'zod';
import type { Problem } from '../../core/problem.ts';
import type { InputBytes } from '../fileSource.ts';
import { parseYaml } from '../yaml/parseYaml.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { type DefaultUsed, defaultsUsed } from './defaultsUsed.ts';
import { entryProblems } from './entryProblems.ts';

/** A structured file held against its schema. */
export interface ReadEntries<T> {
  /** What the file says, with the defaults filled in. */
  readonly value: T;
  readonly defaults: DefaultUsed[];
}

/** The file where it could be parsed, its entries where they are sound, and what is wrong. */
export interface EntriesResult<T> {
  readonly yaml?: YamlFile;
  readonly entries?: ReadEntries<T>;
  readonly problems: Problem[];
}

/**
 * Reads a structured file: parses it, holds it against its schema, fills the defaults in. Never throws.
 *
 * @param input the file
 * @param schema the schema of its kind
 */
export function readEntries<S extends z.ZodType>(input: InputBytes, schema: S): EntriesResult<z.output<S>> {
  const parsed = parseYaml(input);
  if (!('yaml' in parsed)) return { problems: parsed.problems };
  return holdAgainst(parsed.yaml, schema);
}

/** Holds a parsed file against a schema and fills the defaults in. */
export function holdAgainst<S extends z.ZodType>(yaml: YamlFile, schema: S): EntriesResult<z.output<S>> {
  z.config({ jitless: true });
  const result = schema.safeParse(yaml.raw);
  if (!result.success) return { yaml, problems: entryProblems(yaml, schema, result.error.issues) };
  const defaults = defaultsUsed({ file: yaml.file, schema, raw: yaml.raw, parsed: result.data });
  return { yaml, entries: { value: result.data, defaults }, problems: [] };
}
