import * as z from 'zod';
import { nearestName } from '../core/nearest.ts';
import { shown } from '../core/problem.ts';
import { listed } from '../scenario/entries/allowedText.ts';
import { type EntryPath, pathOfText, pathText } from '../scenario/entries/pathText.ts';
import { bare, type Field, fieldAt, kindOf } from '../scenario/entries/schemaField.ts';
import { scenarioSchema } from '../scenario/scenarioSchema.ts';

/** A place that a scenario can have: in every form of its sections, what may stand there. */
export interface ScenarioPlace {
  readonly path: EntryPath;
  readonly fields: readonly Field[];
}

/** Why a text names no place: the keys known where it goes astray, and the nearest of them. */
export interface NoPlace {
  readonly known: string;
  readonly near?: string;
}

/**
 * The place in a scenario that a text names, whatever form its sections have: `house.heatLoss.outdoorTemperature` is one though
 * the base scenario may give a coefficient.
 *
 * @param text in the notation of `pathText`
 */
export function scenarioPlace(text: string): ScenarioPlace | NoPlace {
  const path = pathOfText(text);
  let fields: Field[] = [bare(scenarioSchema)];
  for (const [depth, step] of path.entries()) {
    const forms = fields.flatMap((field) => formsOf(field));
    const holders = forms.filter(({ schema }) => isList(schema) === (typeof step === 'number'));
    const inner = holders.flatMap((form) => fieldAt(form.schema, [step], undefined) ?? []);
    if (inner.length === 0) return noPlace(path.slice(0, depth), step, forms);
    fields = inner;
  }
  if (path.length === 0 || pathText(path) !== text) return noPlace([], text, [bare(scenarioSchema)]);
  return { path, fields };
}

/** Sections or lists in every form in which they may be written. */
function formsOf(field: Field): Field[] {
  const { schema } = field;
  if (!(schema instanceof z.ZodUnion)) return [field];
  return schema.options.flatMap((option) => formsOf(bare(option)));
}

function isList(schema: z.core.$ZodType): boolean {
  return schema instanceof z.ZodArray || schema instanceof z.ZodTuple;
}

function noPlace(before: EntryPath, step: string | number, forms: readonly Field[]): NoPlace {
  const keys = forms.flatMap(({ schema }) => (schema instanceof z.ZodObject ? Object.keys(schema.shape) : []));
  const known = [...new Set(keys)];
  const near = nearestName(String(step), known);
  const inList = forms.some(({ schema }) => isList(schema));
  return {
    known: known.length > 0 ? listed(known) : inList ? 'positions in brackets, such as [0]' : 'nothing further',
    ...(near === undefined ? {} : { near: pathText([...before, near]) }),
  };
}

/** What a place holds where it can hold no single value: 'a section' or 'a list'. */
export function notSingle({ fields }: ScenarioPlace): string | undefined {
  const kinds = fields.flatMap(formsOf).map(({ schema }) => kindOf(schema));
  if (kinds.some((kind) => kind !== 'section' && kind !== 'list')) return undefined;
  return kinds.includes('section') ? 'a section' : 'a list';
}

/** Whether the name of a file stands at a place. */
export function namesFile({ fields }: ScenarioPlace): boolean {
  return fields.flatMap(formsOf).some(({ format }) => format === 'file name');
}

const PLAIN_NUMBER = /^[-+−]?(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][-+]?\d{1,3})?$/;

/**
 * What a cell of a table says at a place: a number, yes or no, or a text, as the place asks for.
 *
 * @param text of the cell, blanks around it taken off
 * @param decimalComma whether the table writes 1,5 for one and a half; a decimal point is understood all the same
 * @returns the text itself where it is not what the place asks for, so that the message can show it
 */
export function cellValue({ fields }: ScenarioPlace, text: string, decimalComma: boolean): string | number | boolean {
  const kinds = fields.flatMap(formsOf).map(({ schema }) => kindOf(schema));
  if (kinds.includes('number')) {
    const number = decimalComma ? text.replace(/^([^.,]*),(\d+)$/, '$1.$2') : text;
    if (PLAIN_NUMBER.test(number)) return Number(number.replace('−', '-'));
  }
  if (kinds.includes('truth') && /^(?:true|false)$/i.test(text)) return text.toLowerCase() === 'true';
  return text;
}

/** A text from a file, in quotes for a message. */
export function quoted(text: string): string {
  return `'${shown(text)}'`;
}
