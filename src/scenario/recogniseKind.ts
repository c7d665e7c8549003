import type * as z from 'zod';
import { planSchema } from './planSchema.ts';
import { readSchema } from './readSchema.ts';
import { scenarioSchema } from './scenarioSchema.ts';
import { tariffSchema } from './tariffSchema.ts';
import { unitSchema } from './unitSchema.ts';

/** Kinds of input files. */
export type FileKind = 'scenario' | 'unit' | 'tariff' | 'read' | 'plan' | 'weather' | 'priceSeries';

const structured: readonly { kind: FileKind; schema: z.ZodObject }[] = [
  { kind: 'scenario', schema: scenarioSchema },
  { kind: 'unit', schema: unitSchema },
  { kind: 'tariff', schema: tariffSchema },
  { kind: 'read', schema: readSchema },
  { kind: 'plan', schema: planSchema },
];

/** Words in the header of a table of prices, in the languages of most such files. */
const PRICE_WORDS = /price|preis|prijs|prix|precio|prezzo|tariff|€|\beur\b|\bct\b|cent\/|\/\s*[km]wh/i;
const TEMPERATURE_WORDS = /temp|°\s*[CF]|dry.?bulb|tair/i;

/** What a file was taken for, and the keys or header words that decided it. */
export interface RecognisedKind {
  readonly kind?: FileKind;
  /** Keys at the top of a structured file; empty for a table. */
  readonly keys: readonly string[];
}

/**
 * What kind of input file a text is, by what stands in it; the name of the file does not count.
 *
 * A text whose unindented lines are keys is a structured file, of that kind to which most of its keys belong; any other is a
 * table, of prices where its header speaks of prices and not of temperatures.
 *
 * @param text any text
 * @returns no kind for keys that belong to none
 */
export function recogniseKind(text: string): RecognisedKind {
  const lines = text.split(/\r\n|\n|\r/, 2000).filter((line) => line.trim() !== '' && !/^\s*(?:#|---|%)/.test(line));
  const top = lines.filter((line) => !/^[\s\-\]}]/.test(line));
  const keys = top.flatMap((line) => /^["']?([A-Za-z_]\w*)["']?\s*:(?:\s|$)/.exec(line)?.[1] ?? []);
  if (top.length === 0 || keys.length * 2 <= top.length) return { kind: tableKind(lines), keys: [] };
  const counts = structured.map(({ kind, schema }) => ({
    kind,
    count: keys.filter((key) => Object.hasOwn(schema.shape, key)).length,
  }));
  const best = counts.sort((a, b) => b.count - a.count)[0];
  return best === undefined || best.count === 0 ? { keys } : { kind: best.kind, keys };
}

function tableKind(lines: readonly string[]): FileKind {
  const header = lines.slice(0, 3).join('\n');
  return PRICE_WORDS.test(header) && !TEMPERATURE_WORDS.test(header) ? 'priceSeries' : 'weather';
}
