import { decodeText } from '../../core/decodeText.ts';
import { hasErrors, type Problem } from '../../core/problem.ts';
import { makeAnswer } from '../../scenario/answer/makeAnswer.ts';
import { type FileSource, isProblem } from '../../scenario/fileSource.ts';
import type { InputRole } from '../../scenario/inputFiles.ts';
import { loadScenario } from '../../scenario/loadScenario.ts';
import { inLanguage } from '../language/inLanguage.ts';
import type { Language } from '../language/languages.ts';
import { resultDocument } from '../resultDocument.ts';
import type { InputText, ReportInput } from './reportInput.ts';

/** How a report is to be made. */
export interface ReportSettings {
  readonly language: Language;
  /** Printed as it stands; absent: a line for the hand. */
  readonly date: string | undefined;
  /** Version of the program that the report names. */
  readonly version: string;
}

/** Files whose text stands in the report. */
const STRUCTURED: readonly InputRole[] = ['scenario', 'unit', 'tariff', 'read'];

/**
 * Simulates a scenario and gathers what its report is made of.
 *
 * @param name of the scenario file, as the user gives it
 * @param source where files come from; each is asked for a second time, for its text
 * @returns everything for `reportPage`, unless a problem is an error
 */
export function makeReport(
  name: string,
  source: FileSource,
  { language, date, version }: ReportSettings,
): { input?: ReportInput; problems: Problem[] } {
  const { loaded, problems } = loadScenario(name, source);
  if (loaded === undefined) return { problems };
  const made = makeAnswer(loaded, problems);
  const found = [...problems, ...made.problems];
  const scenario = source.read(name);
  if (made.answer === undefined || hasErrors(made.problems) || isProblem(scenario)) return { problems: found };
  const texts = loaded.inputs.flatMap(({ file, role }): InputText[] => {
    const read = STRUCTURED.includes(role) ? source.read(file) : undefined;
    return read === undefined || isProblem(read) ? [] : [{ file, text: decodeText(read.bytes).text }];
  });
  const document = resultDocument(made.answer, version);
  return { input: { answer: made.answer, document, scenario, texts, date, ...inLanguage(language) }, problems: found };
}
