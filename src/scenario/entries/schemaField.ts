import * as z from 'zod';
import type { EntryPath } from './pathText.ts';

/** What a schema says about one entry, with the wrappers of defaults and options taken off. */
export interface Field {
  readonly schema: z.core.$ZodType;
  /** The sentence that describes it. */
  readonly says?: string;
  readonly unit?: string;
  readonly usual?: string;
  /** How a text is written, such as HH:MM. */
  readonly format?: string;
}

/**
 * The entry of a schema at a path; where forms differ, that form which what is written asks for.
 *
 * @param root schema of the whole file
 * @param path as in a problem of the schema
 * @param raw what the file holds
 * @returns undefined where the schema knows nothing at the path
 */
export function fieldAt(root: z.core.$ZodType, path: EntryPath, raw: unknown): Field | undefined {
  let field = bare(root);
  let value = raw;
  for (const step of path) {
    const inner = stepInto(chooseForm(field, value), step);
    if (inner === undefined) return undefined;
    field = inner;
    value = entryOf(value, step);
  }
  return field;
}

/** A schema without its defaults and options, with what its outermost layers say. */
export function bare(schema: z.core.$ZodType): Field {
  const layers: z.core.$ZodType[] = [schema];
  let inner = schema;
  while (inner instanceof z.ZodDefault || inner instanceof z.ZodPrefault || inner instanceof z.ZodOptional) {
    inner = inner.def.innerType;
    layers.push(inner);
  }
  const said = (name: string): string | undefined => {
    const values = layers.map((layer) => z.globalRegistry.get(layer)?.[name]);
    return values.find((value): value is string => typeof value === 'string');
  };
  const texts = { says: said('description'), unit: said('unit'), usual: said('usual'), format: said('format') };
  return { schema: inner, ...defined(texts) };
}

/**
 * The form of an either-or that a value asks for: by its discriminating key, else by its kind. The field itself where it is
 * no either-or, or where nothing fits.
 */
export function chooseForm(field: Field, value: unknown): Field {
  const { schema } = field;
  if (schema instanceof z.ZodDiscriminatedUnion) {
    const key = schema.def.discriminator;
    const form = schema.options.find((option) => choicesOf(option, key).includes(String(entryOf(value, key))));
    return form === undefined ? field : { ...field, schema: form };
  }
  if (schema instanceof z.ZodUnion) {
    const form = schema.options.find((option) => kindOf(bare(option).schema) === kindOfValue(value));
    return form === undefined ? field : chooseForm({ ...field, ...bare(form) }, value);
  }
  return field;
}

/** Values that the discriminating key of one form may have. */
export function choicesOf(option: z.core.$ZodType, key: string): string[] {
  if (!(option instanceof z.ZodObject)) return [];
  const literal = option.shape[key];
  return literal instanceof z.ZodLiteral ? [...literal.values].map(String) : [];
}

/** The entry of a section or list under a key or position; undefined where there is none of its own. */
export function entryOf(value: unknown, step: string | number): unknown {
  if (typeof value !== 'object' || value === null || !Object.hasOwn(value, step)) return undefined;
  return (value as Record<string | number, unknown>)[step];
}

/** Kinds of entries, in the terms of a YAML file; `other` is an either-or, or nothing at all. */
export type EntryKind = 'section' | 'list' | 'number' | 'text' | 'truth' | 'other';

/** What a schema takes, in the terms of a YAML file. */
export function kindOf(schema: z.core.$ZodType): EntryKind {
  if (schema instanceof z.ZodObject || schema instanceof z.ZodDiscriminatedUnion) return 'section';
  if (schema instanceof z.ZodArray || schema instanceof z.ZodTuple) return 'list';
  if (schema instanceof z.ZodNumber) return 'number';
  if (schema instanceof z.ZodBoolean) return 'truth';
  if (schema instanceof z.ZodLiteral) return kindOfValue([...schema.values][0]);
  if (schema instanceof z.ZodString || schema instanceof z.ZodEnum) return 'text';
  return 'other';
}

/** What a value is, in the terms of a YAML file. */
export function kindOfValue(value: unknown): EntryKind {
  if (typeof value === 'number') return 'number';
  if (typeof value === 'string') return 'text';
  if (typeof value === 'boolean') return 'truth';
  if (Array.isArray(value)) return 'list';
  return typeof value === 'object' && value !== null ? 'section' : 'other';
}

function stepInto(field: Field, step: string | number): Field | undefined {
  const { schema } = field;
  if (schema instanceof z.ZodObject) {
    return Object.hasOwn(schema.shape, step) ? bare(schema.shape[step] as z.core.$ZodType) : undefined;
  }
  if (schema instanceof z.ZodArray) return { ...defined({ unit: field.unit }), ...bare(schema.def.element) };
  if (schema instanceof z.ZodTuple) {
    const item = schema.def.items[Number(step)];
    return item === undefined ? undefined : { ...defined({ unit: pairUnit(field.unit, Number(step)) }), ...bare(item) };
  }
  return undefined;
}

/** Unit of one value of a pair, from the list's unit such as '[°C, kW]'. */
function pairUnit(unit: string | undefined, position: number): string | undefined {
  return unit?.replace(/^\[|\]$/g, '').split(', ')[position];
}

function defined<T extends Record<string, string | undefined>>(texts: T): { [K in keyof T]?: string } {
  return Object.fromEntries(Object.entries(texts).filter(([, value]) => value !== undefined)) as {
    [K in keyof T]?: string;
  };
}
