import { problemText } from '../../../../src/core/problemText.ts';
import type { Answer } from '../../../../src/scenario/answer/answer.ts';
import { makeAnswer } from '../../../../src/scenario/answer/makeAnswer.ts';
import { loadScenario } from '../../../../src/scenario/loadScenario.ts';
import { memoryFiles } from '../memoryFiles.ts';
import { sampleFiles } from '../sampleFiles.ts';

/** A file, a passage that stands in it once, and what stands there instead. */
export type Change = readonly [file: string, passage: string, by: string];

/** The answer of the sample scenario with passages of its files changed. */
export function changedAnswer(changes: readonly Change[], files: Record<string, string> = {}): Answer {
  const all = sampleFiles(files);
  for (const [file, passage, by] of changes) {
    const text = all[file] ?? '';
    if (text.split(passage).length !== 2) throw new Error(`'${passage}' does not stand in ${file} once`);
    all[file] = text.replace(passage, by);
  }
  const { loaded, problems } = loadScenario('house.yaml', memoryFiles(all));
  if (loaded === undefined) throw new Error(problems.map(problemText).join('\n'));
  const made = makeAnswer(loaded, problems);
  if (made.answer === undefined) throw new Error(made.problems.map(problemText).join('\n'));
  return made.answer;
}

/** Another number of the sample house, W/K. */
export const heatLossOf = (value: number): Change => ['house.yaml', 'value: 180', `value: ${value}`];

/** Entries added to the sample unit. */
export const unitWith = (entries: string): Change => [
  'unit.yaml',
  'name: Test unit\n',
  `name: Test unit\n${entries}\n`,
];

/** Sections added to the sample scenario. */
export const houseWith = (sections: string): Change => ['house.yaml', 'tariffs:', `${sections}\ntariffs:`];
