import type { Problem } from '../../core/problem.ts';

const MOST_SHOWN = 20;

/** A problem of the readings, without the name of their file. */
export type ReadingFault = Omit<Problem, 'file' | 'severity'>;

/** The faults of one file of readings. */
export interface ReadingFaults {
  add(fault: ReadingFault): void;
  any(): boolean;
  /** The first twenty, and one that counts the rest. */
  list(): Problem[];
}

/** Collects the faults of a file of readings; a fault in every line must not fill the screen. */
export function readingFaults(file: string): ReadingFaults {
  const shownFaults: Problem[] = [];
  let further = 0;
  return {
    add(fault) {
      if (shownFaults.length < MOST_SHOWN) shownFaults.push({ ...fault, severity: 'error', file });
      else further++;
    },
    any: () => shownFaults.length > 0,
    list() {
      if (further === 0) return shownFaults;
      return [...shownFaults, { code: 'readings.more', severity: 'error', file, found: String(further) }];
    },
  };
}
