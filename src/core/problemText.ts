import { type Problem, visibleText } from './problem.ts';
import { type ProblemKind, problemCatalogue } from './problems/catalogue.ts';

/**
 * A problem in two lines: where and what, then the cure.
 *
 * @returns `house.yaml:14:11  heatPump.highestFlow is 400; …` and, on the second line, `→ …`, without a final newline
 */
export function problemText(problem: Problem): string {
  const place = [problem.file, problem.line, problem.column].filter((part) => part !== undefined).join(':');
  const mark = problem.severity === 'warning' ? 'warning: ' : '';
  return `${visibleText(place)}  ${mark}${problemSentence(problem)}\n    → ${problemCure(problem)}`;
}

/** What is wrong, without the place. */
export function problemSentence(problem: Problem): string {
  const kind: ProblemKind = problemCatalogue[problem.code];
  return fill(kind.says, problem);
}

/** What to do about it. */
export function problemCure(problem: Problem): string {
  const kind: ProblemKind = problemCatalogue[problem.code];
  return visibleText(problem.hint ?? fill(kind.cure, problem));
}

function fill(template: string, problem: Problem): string {
  return template.replace(/\{(path|found|allowed|unit)\}/g, (_, name: 'path' | 'found' | 'allowed' | 'unit') =>
    visibleText(problem[name] ?? ''),
  );
}
