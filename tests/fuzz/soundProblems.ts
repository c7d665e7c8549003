import { hasErrors, type Problem } from '../../src/core/problem.ts';
import { problemText } from '../../src/core/problemText.ts';

/** Problems of a structured file always have their place. */
const ALWAYS_PLACED = /^(?:yaml\.(?!not-text)|entry\.)/;

/** Every problem names its file and its place, and can be worded without anything strange in it. */
export function expectSoundProblems(problems: readonly Problem[], written: string): void {
  for (const problem of problems) {
    const text = problemText(problem);
    expectSoundText(text, written);
    if (problem.file === '') throw new Error(`no file: ${text}`);
    const { line, column } = problem;
    const placed = ALWAYS_PLACED.test(problem.code)
      ? isPlace(line) && isPlace(column)
      : line === undefined || isPlace(line);
    if (!placed) throw new Error(`no place: ${problem.code} ${text}`);
  }
}

function isPlace(count: number | undefined): boolean {
  return Number.isInteger(count) && Number(count) >= 1;
}

/** Words of the language and of templates, which say that something was forgotten. */
const STRANGE = /\bundefined\b|\bNaN\b|\bInfinity\b|\[object|\{\w+\}/g;

// biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must not reach the terminal
const CONTROL = /[\u0000-\u0009\u000b-\u001f\u007f-\u009f\u2028\u2029\u202a-\u202e\u2066-\u2069]/;

/** A text for people has no strange word in it that did not stand in the file, and no control character. */
export function expectSoundText(text: string, written: string): void {
  for (const { 0: word, index } of text.matchAll(STRANGE)) {
    if (!written.includes(word)) throw new Error(`${word} in: ${near(text, index)}`);
  }
  const control = CONTROL.exec(text);
  if (control !== null) throw new Error(`a control character in: ${JSON.stringify(near(text, control.index))}`);
}

function near(text: string, index: number): string {
  return text.slice(Math.max(0, index - 150), index + 100);
}

/** Either there is a result, or an error says why there is none. */
export function expectAnswered(result: unknown, problems: readonly Problem[], written: string): void {
  expectSoundProblems(problems, written);
  if (result === undefined && !hasErrors(problems)) throw new Error('neither a result nor an error');
}
