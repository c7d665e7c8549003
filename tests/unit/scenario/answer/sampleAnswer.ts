import { problemText } from '../../../../src/core/problemText.ts';
import type { Answer } from '../../../../src/scenario/answer/answer.ts';
import { makeAnswer } from '../../../../src/scenario/answer/makeAnswer.ts';
import { loadScenario } from '../../../../src/scenario/loadScenario.ts';
import { memoryFiles } from '../memoryFiles.ts';
import { lumpedText, sampleFiles, scenarioText } from '../sampleFiles.ts';

/** A scenario and files beside it. */
export interface Sample {
  /** Sections added to the sample scenario. */
  readonly sections?: string;
  /** List of tariffs, as a flow list. */
  readonly tariffs?: string;
  readonly files?: Record<string, string>;
  /** The lumped house with hot water and a hybrid in the mode `cheapest`, instead of the plain one. */
  readonly hybrid?: boolean;
}

/** The answer of a sample scenario; a test fails where it has errors. */
export function answerOf({ sections = '', tariffs = '[tariff.yaml]', files = {}, hybrid = false }: Sample): Answer {
  const base = hybrid ? lumpedText.replace('      - { name: cheap, raise: 1, rate: night }\n', '') : scenarioText;
  const text = base.replace('tariffs: [tariff.yaml]', `${sections}\ntariffs: ${tariffs}`);
  const source = memoryFiles({ ...sampleFiles(), ...files, 'house.yaml': text });
  const { loaded, problems } = loadScenario('house.yaml', source);
  if (loaded === undefined) throw new Error(problems.map(problemText).join('\n'));
  const made = makeAnswer(loaded, problems);
  if (made.answer === undefined) throw new Error(made.problems.map(problemText).join('\n'));
  return made.answer;
}

/** A flat tariff with a standing charge a year and 20 % tax on top. */
export function flatTariff(name: string, price: number, standing = 0): string {
  return `name: ${name}
rates: [{ name: all hours, price: ${price} }]
standing: { perYear: ${standing} }
taxes: [{ name: VAT, percent: 20 }]
`;
}

/** A value that must be there. */
export function there<T>(value: T | undefined): T {
  if (value === undefined) throw new Error('not there');
  return value;
}
