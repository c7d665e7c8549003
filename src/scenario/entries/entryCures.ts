import * as z from 'zod';
import { nearestName } from '../../core/nearest.ts';
import { shown } from '../../core/problem.ts';
import { shownUnit } from './allowedText.ts';
import { type Field, kindOf } from './schemaField.ts';

/** Advice for a number that lies outside its range, where a slip of the unit explains it; undefined elsewhere. */
export function rangeCure(field: Field, found: number): string | undefined {
  if (!(field.schema instanceof z.ZodNumber)) return undefined;
  const most = field.schema.maxValue ?? Number.POSITIVE_INFINITY;
  if (found <= most) return undefined;
  if (field.unit === undefined && most <= 5 && fits(field.schema, found / 100))
    return `write ${plain(found / 100)} for ${found} %`;
  if (field.unit === 'kW' && fits(field.schema, found / 1000)) return `write ${plain(found / 1000)} for ${found} W`;
  return undefined;
}

/** Advice for a value of the wrong kind. */
export function kindCure(field: Field, found: unknown): string | undefined {
  const wanted = kindOf(field.schema);
  if (field.schema instanceof z.ZodNumber && typeof found === 'string') return numberCure(field, field.schema, found);
  if (wanted === 'number') return typeof found === 'number' ? undefined : 'write one number';
  if (wanted === 'text') return textCure(field, found);
  if (wanted === 'list') return 'write a list: [a, b], or each entry on a line of its own behind “- ”';
  return wanted === 'section' ? 'write its keys on the lines below, indented' : undefined;
}

/** Advice for a word that is none of the choices. */
export function choiceCure(found: unknown, choices: readonly string[]): string | undefined {
  const near = typeof found === 'string' ? nearestName(found, choices) : undefined;
  return near === undefined ? undefined : `perhaps ${near} is meant`;
}

/** Advice for a text in the wrong form. */
export function formatCure(format: string | undefined, found: string): string | undefined {
  if (format === 'HH:MM') {
    const time = /^(\d{1,2})[:.h]?(\d{2})?$/.exec(found.trim());
    return time && Number(time[1]) < 24 ? `write '${two(time[1])}:${two(time[2])}'` : undefined;
  }
  if (format?.startsWith('YYYY-MM-DD')) {
    const date = /^(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})$/.exec(found.trim());
    if (date) return `write ${date[1]}-${two(date[2])}-${two(date[3])}`;
    const european = /^(\d{1,2})\.\s?(\d{1,2})\.\s?(\d{4})$/.exec(found.trim());
    if (european) return `write ${european[3]}-${two(european[2])}-${two(european[1])}`;
  }
  return undefined;
}

function numberCure(field: Field, schema: z.ZodNumber, found: string): string {
  const unit = field.unit === undefined ? '' : `; the unit is ${shownUnit(field.unit)}`;
  const written = /^\s*([-+−]?\d[\d_ ]*(?:[.,]\d+)?)\s*(\D{0,12})$/.exec(found);
  if (written === null) return `write a number${unit}`;
  const number = Number((written[1] ?? '').replace(/[_ ]/g, '').replace('−', '-').replace(',', '.'));
  if (written[2] === '%' && field.unit !== '%' && fits(schema, number / 100))
    return `write ${plain(number / 100)} for ${found.trim()}`;
  if (written[2] !== '') return `write ${plain(number)}, without a unit${unit}`;
  return /,/.test(found) ? `write ${plain(number)}, with a decimal point` : `write ${plain(number)}, as a plain number`;
}

function textCure(field: Field, found: unknown): string | undefined {
  if (typeof found !== 'number') return undefined;
  // .inf and .nan are numbers in YAML; how they were written is not known here
  if (!Number.isFinite(found)) return 'put it in quotes';
  return formatCure(field.format, String(found)) ?? `put it in quotes: '${shown(found)}'`;
}

function fits(schema: z.ZodNumber, value: number): boolean {
  return (
    value >= (schema.minValue ?? Number.NEGATIVE_INFINITY) && value <= (schema.maxValue ?? Number.POSITIVE_INFINITY)
  );
}

/** A number without the digits that binary fractions add. */
function plain(value: number): string {
  return String(Number(value.toPrecision(12)));
}

function two(digits: string | undefined): string {
  return (digits ?? '').padStart(2, '0');
}
