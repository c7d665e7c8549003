import * as z from 'zod';
import { bare, choicesOf } from '../../scenario/entries/schemaField.ts';
import { scenarioSchema } from '../../scenario/scenarioSchema.ts';
import { tariffSchema } from '../../scenario/tariffSchema.ts';
import { unitSchema } from '../../scenario/unitSchema.ts';

/** The schemas whose fields are shown to people, each with what their places begin with. */
const SHOWN: readonly (readonly [string, z.core.$ZodType])[] = [
  ['', scenarioSchema],
  ['unit', unitSchema],
  ['tariff', tariffSchema],
];

let known: ReadonlyMap<string, string> | undefined;

/**
 * The place of every sentence that describes a field: keys joined by points; of an either-or the word of its form, or its
 * number counted from 0; of a list as a whole and of its entries the same, but for `[]` behind a sentence about one entry.
 * What one sentence says in several places has the first of them.
 *
 * @example fieldPlaces().get('U-value.') // 'house.heatLoss.elements.elements.uValue'
 */
export function fieldPlaces(): ReadonlyMap<string, string> {
  if (known === undefined) {
    const places = new Map<string, string>();
    for (const [start, schema] of SHOWN) look(schema, start, places);
    known = places;
  }
  return known;
}

function look(schema: z.core.$ZodType, place: string, places: Map<string, string>, entry = ''): void {
  const { schema: inner, says } = bare(schema);
  if (says !== undefined && !places.has(says)) places.set(says, place + entry);
  const below = (key: string | number) => (place === '' ? String(key) : `${place}.${key}`);
  if (inner instanceof z.ZodObject) {
    for (const [key, field] of Object.entries(inner.shape)) look(field, below(key), places);
  } else if (inner instanceof z.ZodDiscriminatedUnion) {
    const key = inner.def.discriminator;
    for (const form of inner.options) look(form, below(choicesOf(form, key)[0] ?? ''), places);
  } else if (inner instanceof z.ZodUnion) {
    inner.options.forEach((form, i) => {
      look(form, below(i), places);
    });
  } else if (inner instanceof z.ZodTuple) {
    inner.def.items.forEach((item, i) => {
      look(item, below(i), places);
    });
  } else if (inner instanceof z.ZodArray) look(inner.def.element, place, places, '[]');
}
