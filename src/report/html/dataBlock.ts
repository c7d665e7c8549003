import * as z from 'zod';
import { decodeText } from '../../core/decodeText.ts';
import { base64 } from '../charts/base64.ts';
import { type Markup, markup, Markup as Raw } from '../charts/markup.ts';
import { LANGUAGES } from '../language/languages.ts';
import { resultSchema } from '../resultSchema.ts';
import type { ReportInput } from './reportInput.ts';

const OPENING = '<script type="application/json" id="winterledger-report">';
const CLOSING = '</script>';
/** Form of the block, should it ever change. */
const FORM = 1;
/** Longest name and content of a scenario that are read from a block, letters. */
const LONGEST_NAME = 4096;
const LONGEST_CONTENT = 1_500_000;

const blockSchema = z.strictObject({
  form: z.literal(FORM),
  language: z.enum(LANGUAGES),
  date: z.string().max(LONGEST_NAME).optional(),
  /** The scenario as it was read: its text, or its bytes where it is not plain UTF-8. */
  scenario: z.strictObject({
    file: z.string().min(1).max(LONGEST_NAME),
    content: z.string().max(LONGEST_CONTENT),
    written: z.enum(['text', 'base64']),
  }),
  result: resultSchema,
});

/** What a report holds of its making, so that it can be made again. */
export type DataBlock = z.output<typeof blockSchema>;

/** The block as it stands in the page: data, which no browser runs. */
export function dataBlock({ document, scenario, words, date }: ReportInput): Markup {
  const block: DataBlock = {
    form: FORM,
    language: words.language,
    ...(date === undefined ? {} : { date }),
    scenario: { file: scenario.name, ...contentOf(scenario.bytes) },
    result: document,
  };
  // Escaped so that no text in it can end the block, begin a comment, or turn the direction of what is read.
  const json = JSON.stringify(block).replace(/[<>&\u200e\u200f\u2028-\u202e\u2066-\u2069\ufeff]/g, unicodeEscape);
  return markup`${new Raw(OPENING)}${new Raw(json)}${new Raw(CLOSING)}`;
}

function contentOf(bytes: Uint8Array): Pick<DataBlock['scenario'], 'content' | 'written'> {
  const { text, encoding } = decodeText(bytes);
  return encoding === 'UTF-8' ? { content: text, written: 'text' } : { content: base64(bytes), written: 'base64' };
}

function unicodeEscape(sign: string): string {
  return `\\u${sign.charCodeAt(0).toString(16).padStart(4, '0')}`;
}

/**
 * The block of a report, from any text at all.
 *
 * @param page text of the file
 * @returns the block; or `absent` where there is none or more than one, `broken` where it is not what a report holds
 */
export function readDataBlock(page: string): DataBlock | 'absent' | 'broken' {
  const [before, after, ...others] = page.split(OPENING);
  if (before === undefined || after === undefined || others.length > 0) return 'absent';
  const end = after.indexOf(CLOSING);
  if (end < 0) return 'absent';
  try {
    const block = blockSchema.safeParse(JSON.parse(after.slice(0, end)));
    return block.success ? block.data : 'broken';
  } catch {
    return 'broken';
  }
}
