import type { Answer } from '../../scenario/answer/answer.ts';
import type { InputBytes } from '../../scenario/fileSource.ts';
import type { InLanguage } from '../language/inLanguage.ts';
import type { ResultDocument } from '../resultSchema.ts';

/** A structured input file as text. */
export interface InputText {
  readonly file: string;
  readonly text: string;
}

/** Everything that a report is made of. */
export interface ReportInput extends InLanguage {
  readonly answer: Answer;
  readonly document: ResultDocument;
  /** The scenario's own file. */
  readonly scenario: InputBytes;
  /** The scenario and the other structured files. */
  readonly texts: readonly InputText[];
  /** Date that is printed, as the user wrote it; absent: a line for the hand. */
  readonly date: string | undefined;
}
