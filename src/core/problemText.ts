import { type Problem, visibleText } from './problem.ts';
import { type ProblemKind, problemCatalogue } from './problems/catalogue.ts';

/**
 * A problem in two lines: where and what, then the cure.
 *
 * @returns `house.yaml:14:11  heatPump.highestFlow is 400; …` and, on the second line, `→ …`, without a final newline
 */
export function problemText(problem: Problem): string {
  const kind: ProblemKind = problemCatalogue[problem.code];
  const place = [problem.file, problem.line, problem.column].filter((part) => part !== undefined).join(':');
  const mark = problem.severity === 'warning' ? 'warning: ' : '';
  const cure = problem.hint ?? fill(kind.cure, problem);
  return `${visibleText(place)}  ${mark}${fill(kind.says, problem)}\n    → ${visibleText(cure)}`;
}

function fill(template: string, problem: Problem): string {
  return template.replace(/\{(path|found|allowed|unit)\}/g, (_, name: 'path' | 'found' | 'allowed' | 'unit') =>
    visibleText(problem[name] ?? ''),
  );
}
