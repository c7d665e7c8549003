import picocolors from 'picocolors';
import type { Problem } from '../src/core/problem.ts';
import { problemText } from '../src/core/problemText.ts';
import type { Io } from './io.ts';

/** Prints problems on standard error, two lines each: what and where, then the cure. */
export async function tellProblems(problems: readonly Problem[], io: Io): Promise<void> {
  const colours = picocolors.createColors(io.colour);
  const texts = problems.map((problem) => {
    const [what, cure] = problemText(problem).split('\n');
    const paint = problem.severity === 'error' ? colours.red : colours.yellow;
    return `${paint(what)}\n${cure}\n`;
  });
  if (texts.length > 0) await io.stderr.write(texts.join(''));
}
