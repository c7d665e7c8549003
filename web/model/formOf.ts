import * as z from 'zod';
import type { Messages } from '../../src/report/language/messages.ts';
import { shownUnit } from '../../src/scenario/entries/allowedText.ts';
import { type EntryPath, pathText } from '../../src/scenario/entries/pathText.ts';
import { bare, chooseForm, entryOf, type Field, kindOf } from '../../src/scenario/entries/schemaField.ts';
import type { FieldNode, FormNode, ListNode, SectionNode, Told } from './formNode.ts';
import { isMainEntry } from './mainEntries.ts';
import { fieldText, type InputKind } from './writtenValue.ts';

/** What a form is made for. */
export interface FormContext {
  readonly file: string;
  readonly problems: readonly Told[];
  /** A key or a word of a choice as people say it. */
  readonly named: (word: string) => string;
  /** Sentences, units and usual ranges in the language of the page. */
  readonly said: Pick<Messages, 'field' | 'unit' | 'range'>;
  readonly decimalSign: '.' | ',';
}

/**
 * The form of one entry of a file, made from its schema.
 *
 * @param schema of the entry
 * @param raw what stands there
 * @param path of it in the file
 * @param context file, problems, words
 */
export function formOf(schema: z.core.$ZodType, raw: unknown, path: EntryPath, context: FormContext): FormNode {
  const field = bare(schema);
  const inner = field.schema;
  if (inner instanceof z.ZodObject) return sectionOf(schema, field, raw, { path, context });
  if (inner instanceof z.ZodDiscriminatedUnion) return sectionOf(schema, field, raw, { path, context });
  if (inner instanceof z.ZodArray && isSection(inner.def.element)) return listOf(schema, field, raw, { path, context });
  return leafOf(schema, field, raw, { path, context });
}

interface Place {
  readonly path: EntryPath;
  readonly context: FormContext;
}

function isSection(schema: z.core.$ZodType): boolean {
  return kindOf(bare(schema).schema) === 'section';
}

function entryBase(schema: z.core.$ZodType, field: Field, { path, context }: Place) {
  const required = !isOptional(schema);
  return {
    ...{
      file: context.file,
      path,
      label: context.named(String(path.at(-1) ?? '')),
      says: context.said.field(field.says ?? ''),
    },
    folded: !required && !isMainEntry(path),
  };
}

function problemsAt({ path, context }: Place, below: boolean): Told[] {
  const at = pathText(path);
  return context.problems.filter(
    (told) => told.path === at || (below && (told.path.startsWith(`${at}.`) || told.path.startsWith(`${at}[`))),
  );
}

function sectionOf(schema: z.core.$ZodType, field: Field, raw: unknown, place: Place): SectionNode {
  const optional = schema instanceof z.ZodOptional;
  const present = raw !== undefined || !optional;
  return {
    kind: 'section',
    ...entryBase(schema, field, place),
    ...{
      optional,
      present,
      problems: problemsAt(place, false),
      children: present ? childrenOf(field, raw, place) : [],
    },
  };
}

/** The fields of a section, those of the form that is chosen. */
export function childrenOf(field: Field, raw: unknown, { path, context }: Place): FormNode[] {
  const { schema } = field;
  const value = raw === undefined || raw === null ? startOf(schema) : raw;
  const form = chooseForm(field, value).schema;
  const key = schema instanceof z.ZodDiscriminatedUnion ? schema.def.discriminator : undefined;
  if (form instanceof z.ZodDiscriminatedUnion || !(form instanceof z.ZodObject)) {
    return key === undefined ? [] : [formChoice(field, key, value, { path, context })];
  }
  return Object.entries(form.shape).map(([name, inner]) =>
    name === key
      ? formChoice(field, name, value, { path, context })
      : formOf(inner, entryOf(value, name), [...path, name], context),
  );
}

/** What an either-or begins as where nothing is written: nothing, so that a choice is asked for. */
function startOf(schema: z.core.$ZodType): unknown {
  return schema instanceof z.ZodDiscriminatedUnion ? {} : undefined;
}

function formChoice(field: Field, key: string, raw: unknown, { path, context }: Place): FieldNode {
  const { schema } = field;
  const options = schema instanceof z.ZodDiscriminatedUnion ? schema.options : [];
  const words = options.flatMap((option) => {
    const literal = option instanceof z.ZodObject ? option.shape[key] : undefined;
    return literal instanceof z.ZodLiteral ? [...literal.values].map(String) : [];
  });
  const place = { path: [...path, key], context };
  return {
    ...{ kind: 'field', file: context.file, path: place.path, label: context.named(key), says: '' },
    ...{ input: 'choice', choices: words.map((value) => ({ value, label: context.named(value) })) },
    written: fieldText(entryOf(raw, key), '.'),
    ...{ required: true, setsForm: true, folded: false, problems: problemsAt(place, true) },
  };
}

function listOf(schema: z.core.$ZodType, field: Field, raw: unknown, place: Place): ListNode {
  const { path, context } = place;
  const element = field.schema instanceof z.ZodArray ? bare(field.schema.def.element) : field;
  const entries = Array.isArray(raw) ? raw : [];
  return {
    kind: 'list',
    ...entryBase(schema, field, place),
    problems: problemsAt(place, false),
    items: entries.map((entry, i) => ({
      path: [...path, i],
      children: childrenOf(element, entry, { path: [...path, i], context }),
    })),
  };
}

function leafOf(schema: z.core.$ZodType, field: Field, raw: unknown, place: Place): FieldNode {
  const { context } = place;
  const inner = field.schema;
  const assumed = schema instanceof z.ZodDefault ? schema.def.defaultValue : undefined;
  const words = inner instanceof z.ZodEnum ? Object.values(inner.enum).map(String) : wordsOf(inner);
  const input = inputKind(inner);
  const decimal = input === 'number' ? context.decimalSign : '.';
  const unit = shownUnit(field.unit);
  return {
    kind: 'field',
    ...entryBase(schema, field, place),
    input,
    ...(unit === undefined ? {} : { unit: context.said.unit(unit) }),
    ...(field.usual === undefined ? {} : { usual: context.said.range(field.usual) }),
    ...(words === undefined ? {} : { choices: words.map((value) => ({ value, label: context.named(value) })) }),
    written: fieldText(raw, decimal),
    ...(assumed === undefined || isEmptyList(assumed) ? {} : { assumed: assumedText(assumed, input, context) }),
    ...{ required: !isOptional(schema), setsForm: false, problems: problemsAt(place, true) },
  };
}

function assumedText(assumed: unknown, input: InputKind, { named, decimalSign }: FormContext): string {
  return input === 'choice' ? named(String(assumed)) : fieldText(assumed, input === 'number' ? decimalSign : '.');
}

function isEmptyList(value: unknown): boolean {
  return Array.isArray(value) && value.length === 0;
}

function wordsOf(schema: z.core.$ZodType): string[] | undefined {
  return schema instanceof z.ZodLiteral ? [...schema.values].map(String) : undefined;
}

function inputKind(schema: z.core.$ZodType): InputKind {
  if (schema instanceof z.ZodNumber) return 'number';
  if (schema instanceof z.ZodEnum || schema instanceof z.ZodLiteral) return 'choice';
  if (schema instanceof z.ZodBoolean) return 'truth';
  return schema instanceof z.ZodString ? 'text' : 'values';
}

function isOptional(schema: z.core.$ZodType): boolean {
  return schema instanceof z.ZodOptional || schema instanceof z.ZodDefault || schema instanceof z.ZodPrefault;
}
