import type { Problem } from '../core/problem.ts';

const MOST_SHOWN = 20;

/** The faults of one file: those shown, and how many there were beyond. */
export interface SeriesFaults {
  add(problem: Omit<Problem, 'severity' | 'file'>): void;
  /** The first twenty, and one that counts the rest. */
  list(): Problem[];
}

/** Collects the faults of a file of values over time; a fault in every line must not fill the screen, so only twenty are shown. */
export function seriesFaults(file: string): SeriesFaults {
  const shownFaults: Problem[] = [];
  let further = 0;
  return {
    add(problem) {
      if (shownFaults.length < MOST_SHOWN) shownFaults.push({ ...problem, severity: 'error', file });
      else further++;
    },
    list() {
      if (further === 0) return shownFaults;
      return [...shownFaults, { code: 'series.more', severity: 'error', file, found: String(further) }];
    },
  };
}
