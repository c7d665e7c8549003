import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { afterAll, afterEach, expect, type RunnerTestFile } from 'vitest';
import { accuracyPage, PAGE, sectionsOf } from './accuracyPage.ts';

/** What was compared with what; one row of docs/accuracy.md. */
export interface Compared {
  readonly what: string;
  /** In words: document, year, table; 'from memory' where nobody looked it up. */
  readonly source: string;
  /** Unit of the deviation; % where it is a share. */
  readonly unit: string;
  /** Largest deviation that the test lets pass, in that unit. */
  readonly allowed: number;
  /** Why that much and no more. */
  readonly why: string;
}

/** Takes the deviations of one row. */
export interface Comparison {
  /** One value more was compared, or several of which the worst was so far off, in the unit of the row, with any sign. */
  add(deviation: number, values?: number): void;
}

interface Recorded extends Compared {
  rows: number;
  largest: number;
}

/** Deviations below this come from the order in which a machine adds and from its library of functions. */
const ROUNDING = 1e-9;
const writes = process.env.MODE === 'accuracy';

/**
 * The part of docs/accuracy.md that a file of reference tests stands for. When its tests have run, the page must say what
 * they found; `npm run accuracy` writes it. A run of some of the tests only is not held against the page.
 *
 * @param file the test's `import.meta.url`
 * @param title heading of the section
 * @example accuracySection(import.meta.url, 'Humid air').comparison({ what: 'pressure', … }).add(0.002)
 */
export function accuracySection(file: string, title: string): { comparison(compared: Compared): Comparison } {
  const recorded: Recorded[] = [];
  let run: RunnerTestFile | undefined;
  afterEach(({ task }) => {
    run = task.file;
  });
  afterAll(() => {
    if (run === undefined || !allPassed(run)) return;
    const name = file.slice(file.lastIndexOf('/') + 1);
    const section = sectionText(title, recorded);
    if (writes) write(name, section);
    expect(sectionsOf(readPage()).get(name), 'docs/accuracy.md; npm run accuracy writes it').toBe(section);
  });
  return {
    comparison(compared) {
      const row = { ...compared, rows: 0, largest: 0 };
      recorded.push(row);
      return {
        add(deviation, values = 1) {
          row.rows += values;
          row.largest = Math.max(row.largest, Math.abs(deviation));
        },
      };
    },
  };
}

type Task = RunnerTestFile | RunnerTestFile['tasks'][number];

function allPassed(task: Task): boolean {
  return 'tasks' in task ? task.tasks.every(allPassed) : task.result?.state === 'pass';
}

function sectionText(title: string, recorded: readonly Recorded[]): string {
  const rows = recorded.map(({ what, source, unit, allowed, why, rows: count, largest }) => {
    expect(count, `${what}: nothing was compared`).toBeGreaterThan(0);
    expect(largest, what).toBeLessThanOrEqual(allowed);
    return `| ${what} | ${source} | ${count} | ${deviationText(largest, allowed, unit)} | ${measure(allowed, unit)} | ${why} |`;
  });
  const head = '| what | held against | values | largest deviation | allowed | why so much |';
  return [`## ${title}`, '', head, '|---|---|---|---|---|---|', ...rows].join('\n');
}

/** What lies at rounding is not told apart, so that another machine finds the same. */
function deviationText(largest: number, allowed: number, unit: string): string {
  if (allowed === 0) return 'none';
  return largest < ROUNDING ? 'rounding' : measure(largest, unit);
}

function measure(value: number, unit: string): string {
  return `${Number(value.toPrecision(2))} ${unit}`.trim();
}

function readPage(): string {
  return existsSync(pageFile) ? readFileSync(pageFile, 'utf8') : '';
}

const pageFile = fileURLToPath(new URL(`../../${PAGE}`, import.meta.url));

function write(name: string, section: string): void {
  const sections = sectionsOf(readPage());
  sections.set(name, section);
  writeFileSync(pageFile, accuracyPage(sections));
}
