import type { Problem } from '../core/problem.ts';

/**
 * Problems file by file, in the order in which the files were first found wanting, each from its top to its bottom.
 *
 * @returns the same problems, each said once
 */
export function inFileOrder(problems: readonly Problem[]): Problem[] {
  const files = [...new Set(problems.map((problem) => problem.file))];
  const said = new Set<string>();
  return files.flatMap((file) =>
    problems
      .filter((problem) => problem.file === file)
      .sort((a, b) => (a.line ?? 0) - (b.line ?? 0) || (a.column ?? 0) - (b.column ?? 0))
      .filter((problem) => {
        const text = JSON.stringify(problem);
        if (said.has(text)) return false;
        said.add(text);
        return true;
      }),
  );
}
