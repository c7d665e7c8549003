import * as z from 'zod';
import { WEEKDAY_NAMES } from '../core/civilDate.ts';

/** Unit, usual range and a sentence of every number a file may hold, as the schemas, the docs and the page show them. */
interface FieldText {
  readonly says: string;
  readonly unit?: string;
  readonly usual?: string;
}

/** A number between two ends, both included. */
export function number(least: number, most: number, text: FieldText) {
  const meta: Record<string, string> = {};
  if (text.unit !== undefined) meta['unit'] = text.unit;
  if (text.usual !== undefined) meta['usual'] = text.usual;
  return z.number().min(least).max(most).describe(text.says).meta(meta);
}

/** A temperature in °C. */
export function temperature(least: number, most: number, says: string, usual?: string) {
  return number(least, most, usual === undefined ? { says, unit: '°C' } : { says, unit: '°C', usual });
}

/** A text of one to `longest` characters. */
export function text(says: string, longest = 200) {
  return z.string().min(1).max(longest).describe(says);
}

/** The name of a file, relative to the folder of the file that names it. */
export function fileName(says: string) {
  return z.string().min(1).max(1000).describe(says).meta({ format: 'file name' });
}

/** A time of day 'HH:MM'; '24:00' is the end of the day. */
export function timeOfDay(says: string) {
  return z
    .string()
    .regex(/^(?:[01]\d|2[0-3]):[0-5]\d$|^24:00$/)
    .describe(says)
    .meta({ format: 'HH:MM' });
}

/** A day 'YYYY-MM-DD', or 'MM-DD' for the same day of every year. */
export function day(says: string) {
  return z
    .string()
    .regex(/^(?:\d{4}-)?(?:0[1-9]|1[0-2])-(?:0[1-9]|[12]\d|3[01])$/)
    .describe(says)
    .meta({ format: 'YYYY-MM-DD or MM-DD' });
}

/** Days of the week. */
export function weekdays(says: string) {
  return z.array(z.enum(WEEKDAY_NAMES)).min(1).max(7).describe(says);
}

/** Points of a polyline, [x, y] pairs with x rising. */
export function polylinePoints(says: string, y: { least: number; most: number; unit?: string }) {
  return z
    .array(z.tuple([z.number().min(-60).max(60), z.number().min(y.least).max(y.most)]))
    .min(1)
    .max(50)
    .describe(says)
    .meta(y.unit === undefined ? {} : { unit: `[°C, ${y.unit}]` });
}
