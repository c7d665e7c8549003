import { visibleText } from '../../core/problem.ts';
import { type ProblemLanguage, saidIn } from '../../core/problemText.ts';
import type { LoadingWarning, SeenWarning, Warning, WarningValues } from '../../scenario/answer/warning.ts';

/** A warning in sentences. */
export interface WarningText {
  /** What was seen, with its figure and unit. */
  readonly text: string;
  /** What usually helps. */
  readonly remedy: string;
}

/** The sentences of every kind of warning in one language. */
export type WarningWords = { readonly [C in keyof WarningValues]: (values: WarningValues[C]) => WarningText };

/**
 * A warning in the sentences of a language.
 *
 * @param words of the language
 * @param problems how it says problems, for what was found while the files were read
 */
export function warningText(warning: Warning, words: WarningWords, problems: ProblemLanguage): WarningText {
  return 'problem' in warning ? loadingText(warning, problems) : seenText(warning, words);
}

function seenText<C extends keyof WarningValues>({ code, values }: SeenWarning<C>, words: WarningWords): WarningText {
  return words[code](values);
}

function loadingText({ problem }: LoadingWarning, problems: ProblemLanguage): WarningText {
  const place = [problem.file, problem.line].filter((part) => part !== undefined).join(':');
  const { says, cure } = saidIn(problems, problem);
  return { text: `${visibleText(place)}: ${says}`, remedy: cure };
}
