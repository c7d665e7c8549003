import { englishProblems } from '../../../core/problemText.ts';
import { englishRecognised } from '../../../weather/read/recognisedWords.ts';
import { englishExplained } from '../../explainWords.ts';
import type { Messages } from '../messages.ts';
import { englishAssumptions } from './assumptions.ts';
import { englishBlank } from './blankFiles.ts';
import { englishKeys } from './keys.ts';
import { englishWarnings } from './warnings.ts';

const asItIs = (text: string): string => text;

/** What the program says beside the words of a report, in English. */
export const englishMessages: Messages = {
  problems: englishProblems,
  warnings: englishWarnings,
  assumptions: englishAssumptions,
  recognised: englishRecognised,
  explained: englishExplained,
  blank: englishBlank,
  keys: englishKeys,
  field: asItIs,
  unit: asItIs,
  range: asItIs,
};
