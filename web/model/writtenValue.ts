import { parseDocument } from 'yaml';
import type { Written } from './yamlEdit.ts';

/** How an entry is put in: a number, a word or text, yes or no, or values in the notation of the file. */
export type InputKind = 'number' | 'text' | 'choice' | 'truth' | 'values';

/**
 * What a field's text means.
 *
 * @param text as typed; a decimal comma counts as a point, a true minus sign as a minus
 * @param kind of the field
 * @returns undefined for an empty field; what is no number stays text, so that the schema can say what is wrong with it
 * @example writtenValue('1,5', 'number') // 1.5
 */
export function writtenValue(text: string, kind: InputKind): Written {
  const bare = text.trim();
  if (bare === '') return undefined;
  if (kind === 'number') return numberIn(bare) ?? bare;
  if (kind === 'truth') return bare === 'true';
  if (kind !== 'values') return kind === 'text' ? text : bare;
  const number = numberIn(bare);
  if (number !== undefined) return number;
  if (!/^[[{]/.test(bare)) return bare === 'false' ? false : bare;
  const document = parseDocument(bare, { version: '1.2', schema: 'core', logLevel: 'error' });
  return document.errors.length > 0 ? bare : (document.toJS({ maxAliasCount: 0 }) as Written);
}

/** A number as people write it, absent for anything else. */
export function numberIn(text: string): number | undefined {
  const plain = text
    .replace(/^−/, '-')
    .replace(/[\s\u00a0\u202f]/g, '')
    .replace(',', '.');
  return /^[-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?$/i.test(plain) ? Number(plain) : undefined;
}

/** A value as its field shows it, with the decimal sign of a language. */
export function fieldText(value: unknown, decimalSign: '.' | ','): string {
  if (value === undefined || value === null) return '';
  if (typeof value === 'number') return String(value).replace('.', decimalSign);
  if (typeof value === 'string') return value;
  return typeof value === 'object' ? JSON.stringify(value).replace(/,(?=\S)/g, ', ') : String(value);
}
