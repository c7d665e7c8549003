/**
 * A fault in the input, as data. The wording is made by `problemText` from the catalogue of kinds, so that every
 * message in the program says where, what was found, what is allowed and what to do.
 */
export interface Problem {
  readonly code: ProblemCode;
  readonly severity: 'error' | 'warning';
  /** Name of the file as the user gave it. */
  readonly file: string;
  /** Line, counted from 1; absent where a fault belongs to the whole file. */
  readonly line?: number;
  /** Column, counted from 1. */
  readonly column?: number;
  /** The place in a structured file (`heatPump.flowTemperature`), or the name of a column. */
  readonly path?: string;
  /** What stands there, shortened for showing. */
  readonly found?: string;
  /** What may stand there, in words. */
  readonly allowed?: string;
  readonly unit?: string;
  /** What to do, where the kind's own advice can be made more exact. */
  readonly hint?: string;
}

import type { ProblemCode } from './problems/catalogue.ts';

export type { ProblemCode };

/** Text that came from a file, cut and made harmless for a message: control characters shown as \uXXXX, at most 60 characters. */
export function shown(value: unknown, longest = 60): string {
  const text = typeof value === 'string' ? value : String(value);
  const visible = visibleText(text);
  return visible.length > longest ? `${visible.slice(0, longest - 1)}…` : visible;
}

/** Replaces C0 and C1 control characters, bidirectional overrides and line separators by visible escapes. */
export function visibleText(text: string): string {
  return text.replace(
    // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what this looks for
    /[\u0000-\u001f\u007f-\u009f\u200e\u200f\u2028\u2029\u202a-\u202e\u2066-\u2069\ufeff]/g,
    (c) => `\\u${c.charCodeAt(0).toString(16).padStart(4, '0')}`,
  );
}

/** Whether any of the problems stops the work. */
export function hasErrors(problems: readonly Problem[]): boolean {
  return problems.some((p) => p.severity === 'error');
}
