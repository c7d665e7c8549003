import { englishProblems } from '../core/problemText.ts';
import type { Assumption } from '../scenario/answer/assumption.ts';
import type { Warning } from '../scenario/answer/warning.ts';
import { assumptionText } from './language/assumptionWords.ts';
import { englishAssumptions } from './language/english/assumptions.ts';
import { englishWarnings } from './language/english/warnings.ts';
import { warningText } from './language/warningWords.ts';

/** A warning as documents hold it: its code, and its sentences in English. */
export function warningNote(warning: Warning): { code: string; text: string; remedy: string } {
  return { code: warning.code, ...warningText(warning, englishWarnings, englishProblems) };
}

/** Something a result rests on, as documents hold it: its place, and its sentence in English. */
export function assumptionNote(assumption: Assumption): { path: string; text: string } {
  return { path: assumption.path, text: assumptionText(assumption, englishAssumptions) };
}
