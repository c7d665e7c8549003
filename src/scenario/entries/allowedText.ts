import * as z from 'zod';
import { bare, choicesOf, type Field } from './schemaField.ts';

/** What a number of this unit is called in a sentence. */
const nouns: Readonly<Record<string, string>> = {
  '°C': 'a temperature',
  K: 'a temperature difference',
  kW: 'a power',
  W: 'a power',
  'W/K': 'a heat loss',
  'm²': 'an area',
  'm³': 'a volume',
  L: 'a volume',
  '%': 'a percentage',
  'W/(m²·K)': 'a U-value',
  'kg/kWh': 'a carbon factor',
  'money/kWh': 'a price',
};

/**
 * What may stand at an entry, as a clause for a message; the limits are those of the schema.
 *
 * @example allowedText(bare(z.number().min(-50).max(15).meta({ unit: '°C' }))) // 'a temperature lies between −50 and 15 °C'
 */
export function allowedText(field: Field): string {
  const { schema } = field;
  if (schema instanceof z.ZodNumber) return numberText(schema, field.unit);
  if (schema instanceof z.ZodString) return textText(schema, field.format);
  if (schema instanceof z.ZodEnum) return `it is one of ${listed(Object.values(schema.enum).map(String))}`;
  if (schema instanceof z.ZodBoolean) return 'it is true or false';
  if (schema instanceof z.ZodLiteral) return `it is ${[...schema.values].map(String).join(' or ')}`;
  if (schema instanceof z.ZodArray) return `it is a list of ${countText(schema)}`;
  if (schema instanceof z.ZodTuple) return `it is a list of ${schema.def.items.length} numbers, such as [-7, 45]`;
  if (schema instanceof z.ZodDiscriminatedUnion) {
    const key = schema.def.discriminator;
    return `it is a section whose ${key} is one of ${listed(schema.options.flatMap((form) => choicesOf(form, key)))}`;
  }
  if (schema instanceof z.ZodUnion) {
    return schema.options.map((form) => allowedText({ ...field, ...bare(form) })).join(', or ');
  }
  if (schema instanceof z.ZodObject) return `it is a section with ${listed(requiredKeys(schema))}`;
  return '';
}

/** Unit as messages show it: money is in the scenario's currency. */
export function shownUnit(unit: string | undefined): string | undefined {
  return unit?.replace(/^money\//, 'per ');
}

/** A number as messages show it, with the true minus sign. */
export function shownNumber(value: number): string {
  return String(value).replace('-', '−');
}

/** Words joined by commas and a last 'and'. */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words[0] ?? '';
  return `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
}

function numberText(schema: z.ZodNumber, unit: string | undefined): string {
  const whole = schema.isInt;
  if (!Number.isFinite(schema.minValue ?? Number.NaN)) return `it is a ${whole ? 'whole ' : ''}number`;
  const least = shownNumber(schema.minValue ?? Number.NEGATIVE_INFINITY);
  const most = shownNumber(schema.maxValue ?? Number.POSITIVE_INFINITY);
  const noun = (unit === undefined ? undefined : nouns[unit]) ?? 'it';
  const tail = unit === undefined ? '' : ` ${shownUnit(unit)}`;
  return `${noun} ${whole ? 'is a whole number' : 'lies'} between ${least} and ${most}${tail}`;
}

function textText(schema: z.ZodString, format: string | undefined): string {
  if (format !== undefined) return `it is ${format === 'file name' ? 'the name of a file' : `written ${format}`}`;
  return `it is a text of at most ${schema.maxLength ?? 200} letters`;
}

function countText(schema: z.ZodArray): string {
  let least = 0;
  let most = Number.POSITIVE_INFINITY;
  for (const check of schema.def.checks ?? []) {
    const { def } = check._zod;
    if (isLimit(def, 'minimum')) least = def.minimum;
    if (isLimit(def, 'maximum')) most = def.maximum;
    if (isLimit(def, 'length')) least = most = def.length;
  }
  if (least === most) return `${least} entries`;
  if (least === 0 && Number.isFinite(most)) return `at most ${most} entries`;
  return Number.isFinite(most) ? `${least} to ${most} entries` : `at least ${least} entries`;
}

function isLimit<K extends string>(def: object, name: K): def is Record<K, number> {
  return name in def && typeof (def as Record<string, unknown>)[name] === 'number';
}

function requiredKeys(schema: z.ZodObject): string[] {
  const required = Object.entries(schema.shape)
    .filter(
      ([, entry]) =>
        !(entry instanceof z.ZodOptional || entry instanceof z.ZodDefault || entry instanceof z.ZodPrefault),
    )
    .map(([key]) => key);
  return required.length > 0 ? required : Object.keys(schema.shape);
}
