import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { problemCatalogue } from '../../../../src/core/problems/catalogue.ts';
import { englishMessages } from '../../../../src/report/language/english/messages.ts';
import { fieldPlaces } from '../../../../src/report/language/fieldPlaces.ts';
import { germanFields } from '../../../../src/report/language/german/fields.ts';
import { germanKeys } from '../../../../src/report/language/german/keys.ts';
import { germanMessages } from '../../../../src/report/language/german/messages.ts';
import { germanProblems } from '../../../../src/report/language/german/problems.ts';
import { bare } from '../../../../src/scenario/entries/schemaField.ts';
import { scenarioSchema } from '../../../../src/scenario/scenarioSchema.ts';
import { tariffSchema } from '../../../../src/scenario/tariffSchema.ts';
import { unitSchema } from '../../../../src/scenario/unitSchema.ts';

describe('the sentences of fields in German', () => {
  it('are there for every sentence of a schema, and for nothing else', () => {
    const places = [...fieldPlaces().values()];
    expect(places.length).toBeGreaterThan(200);
    expect(Object.keys(germanFields).sort()).toEqual([...places].sort());
  });

  it('are found by the English sentence', () => {
    expect(germanMessages.field('U-value.')).toBe('U-Wert.');
    expect(germanMessages.field('Room temperature that is kept.')).toBe('Raumtemperatur, die gehalten wird.');
    expect(germanMessages.field('Of no field.')).toBe('Of no field.');
  });
});

describe('the names of keys and choices in German', () => {
  /** What a schema is made of. */
  function partsOf(inner: z.core.$ZodType): readonly z.core.$ZodType[] {
    if (inner instanceof z.ZodObject) return Object.values(inner.shape);
    if (inner instanceof z.ZodUnion) return inner.options;
    if (inner instanceof z.ZodTuple) return inner.def.items;
    return inner instanceof z.ZodArray ? [inner.def.element] : [];
  }

  /** Keys and words of choices of a schema. */
  function wordsOf(schema: z.core.$ZodType): string[] {
    const inner = bare(schema).schema;
    const own: unknown[] = [];
    if (inner instanceof z.ZodObject) own.push(...Object.keys(inner.shape));
    if (inner instanceof z.ZodEnum) own.push(...Object.values(inner.enum));
    if (inner instanceof z.ZodLiteral) own.push(...inner.values);
    return [...own.map(String), ...partsOf(inner).flatMap(wordsOf)];
  }

  it('are there for all but units, signs and numbers, and for nothing else', () => {
    const words = new Set([scenarioSchema, unitSchema, tariffSchema].flatMap(wordsOf));
    const signs = /^(?:[A-Z]+|.*\d.*|[kM]?Wh|[hk]?Pa|(?:mm|in)Hg|false)$/;
    const needed = [...words].filter((word) => !signs.test(word));
    expect(needed.length).toBeGreaterThan(150);
    expect(Object.keys(germanKeys).sort()).toEqual(needed.sort());
  });
});

describe('the problems in German', () => {
  const gaps = (text: string) => [...text.matchAll(/\{\w+\}/g)].map(([gap]) => gap);

  it('have the same codes', () => {
    expect(Object.keys(germanProblems.kinds).sort()).toEqual(Object.keys(problemCatalogue).sort());
  });

  it('have the same places to fill in sentence and cure', () => {
    for (const [code, english] of Object.entries(problemCatalogue)) {
      const german = germanProblems.kinds[code as keyof typeof problemCatalogue];
      expect(new Set(gaps(german.says)), code).toEqual(new Set(gaps(english.says)));
      expect(new Set(gaps(german.cure)), code).toEqual(new Set(gaps(english.cure)));
    }
  });
});

describe('the other messages in German', () => {
  /** Every word with its place; functions are left to the tests of what they say. */
  const wordsOf = (value: object, place = ''): [string, string][] =>
    Object.entries(value).flatMap(([key, part]): [string, string][] => {
      if (typeof part === 'string') return [[`${place}${key}`, part]];
      return typeof part === 'object' ? wordsOf(part, `${place}${key}.`) : [];
    });

  it('differ from the English ones wherever those are prose', () => {
    const { explained, recognised } = germanMessages;
    const german = new Map(wordsOf({ explained, recognised }));
    const prose = wordsOf({ explained: englishMessages.explained, recognised: englishMessages.recognised }).filter(
      ([place, text]) => (text.match(/[a-z]{2,} /g) ?? []).length > 1 && !place.endsWith('.source'),
    );
    expect(prose.length).toBeGreaterThan(150);
    expect(prose.filter(([place, text]) => (german.get(place) ?? text) === text)).toEqual([]);
  });
});
