import type { ProblemLanguage } from '../../core/problemText.ts';
import type { RecognisedWords } from '../../weather/read/recognisedWords.ts';
import type { ExplainWords } from '../explainWords.ts';
import type { AssumptionWords } from './assumptionWords.ts';
import type { BlankWords } from './english/blankFiles.ts';
import type { WarningWords } from './warningWords.ts';

/** What the program says beside the words of a report, in one language. */
export interface Messages {
  readonly problems: ProblemLanguage;
  readonly warnings: WarningWords;
  readonly assumptions: AssumptionWords;
  /** How a weather file was read. */
  readonly recognised: RecognisedWords;
  /** One hour with its figures. */
  readonly explained: ExplainWords;
  /** What stands in the files of a blank start. */
  readonly blank: BlankWords;
  /** Keys of the files and words of choices that are not just the key taken apart. */
  readonly keys: Readonly<Record<string, string>>;
  /** The sentence of a field, from its English one. */
  readonly field: (says: string) => string;
  /** A unit, and a usual range, as fields show them. */
  readonly unit: (unit: string) => string;
  readonly range: (usual: string) => string;
}
