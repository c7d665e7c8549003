import type { Problem, ProblemCode } from '../../core/problem.ts';

/** So many problems of one kind are listed; the rest are counted. */
export const MOST_OF_A_KIND = 20;

/** A problem without the name of its file. */
export type Finding = Omit<Problem, 'file'>;

/** Collects the problems of one file. */
export interface Findings {
  add(finding: Finding): void;
  /** Whether an error was found, of one kind or of any. */
  failed(code?: ProblemCode): boolean;
  /** The first of each kind in the order of discovery, with a count of the rest. */
  list(): Problem[];
}

/**
 * An empty collection of problems of one file.
 *
 * @param file name of the file as the user gave it
 * @returns a collection that lists at most 20 problems of a kind and counts the rest
 */
export function createFindings(file: string): Findings {
  const found: Problem[] = [];
  const counts = new Map<ProblemCode, number>();
  const severities = new Map<ProblemCode, Problem['severity']>();
  return {
    add(finding) {
      const count = (counts.get(finding.code) ?? 0) + 1;
      counts.set(finding.code, count);
      if (severities.get(finding.code) !== 'error') severities.set(finding.code, finding.severity);
      if (count <= MOST_OF_A_KIND) found.push({ file, ...finding });
    },
    failed(code) {
      if (code !== undefined) return severities.get(code) === 'error';
      return [...severities.values()].includes('error');
    },
    list() {
      const rest = [...counts].filter(([, count]) => count > MOST_OF_A_KIND);
      return [
        ...found,
        ...rest.map(
          ([code, count]): Problem => ({
            code: 'weather.more',
            severity: severities.get(code) ?? 'error',
            file,
            path: code,
            found: String(count - MOST_OF_A_KIND),
          }),
        ),
      ];
    },
  };
}
