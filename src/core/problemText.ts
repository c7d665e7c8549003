import { type Problem, visibleText } from './problem.ts';
import { type ProblemCode, type ProblemKind, problemCatalogue } from './problems/catalogue.ts';

/** How a language says problems. */
export interface ProblemLanguage {
  /** Sentence and cure of every kind. */
  readonly kinds: Readonly<Record<ProblemCode, ProblemKind>>;
  /** What a problem of this kind holds in English words: its place, what was found, what is allowed, a cure of its own. */
  readonly phrase: (text: string, code: ProblemCode) => string;
}

/** What is wrong, without the place, and what to do about it. */
export interface SaidProblem {
  readonly says: string;
  readonly cure: string;
}

/** Problems in English, as they are made. */
export const englishProblems: ProblemLanguage = { kinds: problemCatalogue, phrase: (text) => text };

/** A problem in a language. */
export function saidIn(language: ProblemLanguage, problem: Problem): SaidProblem {
  const { code, hint } = problem;
  const { says, cure } = language.kinds[code];
  return {
    says: filled(says, problem, language),
    cure: hint === undefined ? filled(cure, problem, language) : visibleText(language.phrase(hint, code)),
  };
}

/**
 * A problem in two lines of English: where and what, then the cure.
 *
 * @returns `house.yaml:14:11  heatPump.highestFlow is 400; …` and, on the second line, `→ …`, without a final newline
 */
export function problemText(problem: Problem): string {
  const place = [problem.file, problem.line, problem.column].filter((part) => part !== undefined).join(':');
  const mark = problem.severity === 'warning' ? 'warning: ' : '';
  const { says, cure } = saidIn(englishProblems, problem);
  return `${visibleText(place)}  ${mark}${says}\n    → ${cure}`;
}

/** What is wrong, without the place, in English. */
export function problemSentence(problem: Problem): string {
  return saidIn(englishProblems, problem).says;
}

/** What to do about it, in English. */
export function problemCure(problem: Problem): string {
  return saidIn(englishProblems, problem).cure;
}

function filled(template: string, problem: Problem, { phrase }: ProblemLanguage): string {
  return template.replace(/\{(path|found|allowed|unit)\}/g, (_, name: 'path' | 'found' | 'allowed' | 'unit') =>
    visibleText(phrase(problem[name] ?? '', problem.code)),
  );
}
