import { batchProblems } from './batchProblems.ts';
import { fileProblems } from './fileProblems.ts';
import { hourProblems } from './hourProblems.ts';
import { labelProblems } from './labelProblems.ts';
import { mapProblems } from './mapProblems.ts';
import { readingProblems } from './readingProblems.ts';
import { reportProblems } from './reportProblems.ts';
import { scenarioProblems } from './scenarioProblems.ts';
import { tariffProblems } from './tariffProblems.ts';
import { weatherProblems } from './weatherProblems.ts';

/**
 * One kind of problem: a sentence and a cure, with `{path}`, `{found}`, `{allowed}` and `{unit}` as places to fill.
 * A cure may be overridden by the problem's own hint.
 */
export interface ProblemKind {
  readonly says: string;
  readonly cure: string;
}

/** Every kind of problem the program can report, by code. */
export const problemCatalogue = {
  ...fileProblems,
  ...weatherProblems,
  ...tariffProblems,
  ...scenarioProblems,
  ...mapProblems,
  ...readingProblems,
  ...labelProblems,
  ...hourProblems,
  ...batchProblems,
  ...reportProblems,
} as const satisfies Record<string, ProblemKind>;

export type ProblemCode = keyof typeof problemCatalogue;
