import type * as z from 'zod';
import { planSchema } from './planSchema.ts';
import { readSchema } from './readSchema.ts';
import { scenarioSchema } from './scenarioSchema.ts';
import { type RecognisedTable, type TableKind, tableKind } from './tableKind.ts';
import { tariffSchema } from './tariffSchema.ts';
import { unitSchema } from './unitSchema.ts';

/** Kinds of input files. */
export type FileKind = StructuredKind | TableKind;

/** Kinds of files of keys and values. */
export type StructuredKind = 'scenario' | 'unit' | 'tariff' | 'read' | 'plan';

const structured: readonly { kind: StructuredKind; schema: z.ZodObject }[] = [
  { kind: 'scenario', schema: scenarioSchema },
  { kind: 'unit', schema: unitSchema },
  { kind: 'tariff', schema: tariffSchema },
  { kind: 'read', schema: readSchema },
  { kind: 'plan', schema: planSchema },
];

/** What a file was taken for, and what decided it. */
export type RecognisedKind =
  | { readonly kind: TableKind; readonly table: RecognisedTable }
  | {
      /** Absent for keys that belong to no kind. */
      readonly kind?: StructuredKind;
      readonly table?: undefined;
      /** Keys at the top of the file. */
      readonly keys: readonly string[];
    };

/**
 * What kind of input file a text is, by what stands in it; the name of the file does not count.
 *
 * A text whose unindented lines are keys is a structured file, of that kind to which most of its keys belong; any other is a
 * table, whose header shows its kind.
 *
 * @param text any text
 * @returns no kind for keys that belong to none
 */
export function recogniseKind(text: string): RecognisedKind {
  const lines = text.split(/\r\n|\n|\r/, 2000).filter((line) => line.trim() !== '' && !/^\s*(?:#|---|%)/.test(line));
  const top = lines.filter((line) => !/^[\s\-\]}]/.test(line));
  const keys = top.flatMap((line) => /^["']?([A-Za-z_]\w*)["']?\s*:(?:\s|$)/.exec(line)?.[1] ?? []);
  if (top.length === 0 || keys.length * 2 <= top.length) {
    const table = tableKind(lines);
    return { kind: table.kind, table };
  }
  const counts = structured.map(({ kind, schema }) => ({
    kind,
    count: keys.filter((key) => Object.hasOwn(schema.shape, key)).length,
  }));
  const best = counts.sort((a, b) => b.count - a.count)[0];
  return best === undefined || best.count === 0 ? { keys } : { kind: best.kind, keys };
}
