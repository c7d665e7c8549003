import * as z from 'zod';
import type { Row } from '../batch/row.ts';
import { problemCure, problemSentence } from '../core/problemText.ts';
import { placeText } from './batchCsv.ts';

const label = z.union([z.string(), z.number(), z.boolean()]);
const money = z.number().optional();

/** A line of `results.jsonl`. */
const lineSchema = z.object({
  job: z.int().min(1),
  home: z.string(),
  homesLine: z.int().min(1).optional(),
  axes: z.record(z.string(), label),
  currency: z.string().optional(),
  figures: z.record(z.string(), z.union([z.number(), z.string()])).optional(),
  tariffs: z
    .array(z.object({ name: z.string(), total: money, systemTotal: money, boilerTotal: money, saving: money }))
    .optional(),
  warnings: z.array(z.string()).optional(),
  problems: z.array(z.object({ code: z.string(), place: z.string(), text: z.string(), remedy: z.string() })).optional(),
});

/** A problem as a line of results tells it, in words. */
export interface ToldProblem {
  readonly code: string;
  /** Where it stands: 'homes.csv:17:5'. */
  readonly place: string;
  readonly text: string;
  readonly remedy: string;
}

/** A row as a line of results tells it. */
export interface ToldRow extends Omit<Row, 'problems'> {
  readonly problems: readonly ToldProblem[];
}

/**
 * A row as one line of JSON, figures in full precision.
 *
 * @param axes names of the axes, for the keys of the values
 */
export function batchJsonLine(row: Row, axes: readonly string[]): string {
  const { job, home, homesLine, result, problems } = row;
  const document = {
    job,
    home,
    ...(homesLine === undefined ? {} : { homesLine }),
    axes: Object.fromEntries(axes.map((name, a) => [name, row.axes[a]])),
    ...(result ?? {}),
    problems: problems.map((problem) => ({
      code: problem.code,
      place: placeText(problem),
      text: problemSentence(problem),
      remedy: problemCure(problem),
    })),
  };
  return `${JSON.stringify(document)}\n`;
}

/**
 * The row that a line of JSON tells.
 *
 * @param axes names of the axes, in the order of the values
 * @returns undefined where the line is none that `batchJsonLine` writes
 */
export function rowOfJsonLine(line: string, axes: readonly string[]): ToldRow | undefined {
  const parsed = lineSchema.safeParse(jsonOf(line)).data;
  if (parsed === undefined) return undefined;
  const { job, home, homesLine, currency, figures, tariffs, warnings, problems } = parsed;
  const row = {
    ...{ job, home, axes: axes.map((name) => parsed.axes[name] ?? ''), problems: problems ?? [] },
    ...(homesLine === undefined ? {} : { homesLine }),
  };
  if (currency === undefined || figures === undefined || tariffs === undefined) return row;
  return { ...row, result: { currency, figures, tariffs, warnings: warnings ?? [] } };
}

function jsonOf(line: string): unknown {
  try {
    return JSON.parse(line);
  } catch {
    return undefined;
  }
}
