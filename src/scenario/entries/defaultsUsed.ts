import type * as z from 'zod';
import { shownUnit } from './allowedText.ts';
import { type EntryPath, pathText } from './pathText.ts';
import { entryOf, fieldAt } from './schemaField.ts';

/** A value that the program assumed because a file does not give it. */
export interface DefaultUsed {
  readonly file: string;
  readonly path: string;
  readonly value: string | number | boolean;
  readonly unit?: string;
  /** The sentence that says what the value is. */
  readonly says: string;
}

/**
 * Every default that a schema put into what was parsed: of a section that was left out, each of its values.
 *
 * @param read the file's name, its schema, what it holds (`raw`) and what the schema made of it (`parsed`)
 * @returns in the order of the schema; lists without entries are not named
 */
export function defaultsUsed(read: {
  file: string;
  schema: z.core.$ZodType;
  raw: unknown;
  parsed: unknown;
}): DefaultUsed[] {
  const used: DefaultUsed[] = [];
  const look = (raw: unknown, parsed: unknown, path: EntryPath): void => {
    if (typeof parsed === 'object' && parsed !== null) {
      const steps = Array.isArray(parsed) ? parsed.map((_, i) => i) : Object.keys(parsed);
      for (const step of steps) look(entryOf(raw, step), entryOf(parsed, step), [...path, step]);
    } else if (raw === undefined && isPlain(parsed)) {
      const field = fieldAt(read.schema, path, read.parsed);
      const unit = shownUnit(field?.unit);
      used.push({
        file: read.file,
        path: pathText(path),
        value: parsed,
        ...(unit === undefined ? {} : { unit }),
        says: field?.says ?? '',
      });
    }
  };
  look(read.raw, read.parsed, []);
  return used;
}

function isPlain(value: unknown): value is string | number | boolean {
  return typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean';
}
