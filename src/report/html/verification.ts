import type { ResultDocument } from '../resultSchema.ts';

/** A figure or word of a report that comes out otherwise when the report is made again. */
export interface Difference {
  /** Its place in the result document. */
  readonly path: string;
  /** As the report has it; absent where it has none. */
  readonly was?: string;
  /** As it comes out now; absent where nothing does. */
  readonly is?: string;
}

/** What became of the figures of a report. */
export interface HeldFigures {
  /** Figures and words that were held against each other. */
  readonly compared: number;
  readonly differences: readonly Difference[];
}

/** Figures may differ by so much of their size, for rounding of another machine. */
const ROUNDING = 1e-9;

/**
 * Holds the result of a report against the result as it comes out now.
 *
 * @param was the result in the report
 * @param is the result now
 * @returns every figure and word that differs; version and inputs are left out, they are held on their own
 */
export function heldFigures(was: ResultDocument, is: ResultDocument): HeldFigures {
  const { version: _was, inputs: _before, ...before } = was;
  const { version: _is, inputs: _now, ...now } = is;
  const earlier = leavesOf(before, '');
  const later = leavesOf(now, '');
  const differences: Difference[] = [];
  for (const [path, value] of earlier) {
    const other = later.get(path);
    if (other === undefined) differences.push({ path, was: String(value) });
    else if (!alike(value, other)) differences.push({ path, ...written(value, other) });
  }
  for (const [path, value] of later) if (!earlier.has(path)) differences.push({ path, is: String(value) });
  return { compared: new Set([...earlier.keys(), ...later.keys()]).size, differences };
}

type Leaf = string | number | boolean;

/** Every figure and word below a value, by its place: `costs[0].byRate.day.kWh`. */
function leavesOf(value: unknown, path: string): Map<string, Leaf> {
  if (typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean')
    return new Map([[path, value]]);
  if (typeof value !== 'object' || value === null) return new Map();
  const leaves = new Map<string, Leaf>();
  for (const [key, part] of Object.entries(value)) {
    const place = Array.isArray(value) ? `${path}[${key}]` : path === '' ? key : `${path}.${key}`;
    for (const [leaf, content] of leavesOf(part, place)) leaves.set(leaf, content);
  }
  return leaves;
}

/** Digits that are written of a figure, where they are enough to see the difference. */
const DIGITS = 7;

function written(was: Leaf, is: Leaf): { was: string; is: string } {
  const short = (value: Leaf) =>
    typeof value === 'number' ? String(Number(value.toPrecision(DIGITS))) : String(value);
  return short(was) === short(is) ? { was: String(was), is: String(is) } : { was: short(was), is: short(is) };
}

function alike(a: Leaf, b: Leaf): boolean {
  if (typeof a !== 'number' || typeof b !== 'number') return a === b;
  return Math.abs(a - b) <= ROUNDING * Math.max(1, Math.abs(a), Math.abs(b));
}

/** An input file of a report, and whether it is as it was. */
export interface HeldFile {
  readonly file: string;
  readonly held: boolean;
}

/**
 * Holds the input files of a report against those read now.
 *
 * @returns one an input of either, `held` where its SHA-256 is the same
 */
export function heldFiles(was: ResultDocument['inputs'], is: ResultDocument['inputs']): HeldFile[] {
  const hashOf = (list: ResultDocument['inputs'], file: string) => list.find((input) => input.file === file)?.sha256;
  const files = new Set([...was, ...is].map(({ file }) => file));
  return [...files].map((file) => ({ file, held: hashOf(was, file) === hashOf(is, file) }));
}

/** Letters around the first place at which two pages differ. */
const AROUND = 40;

/**
 * The first passage of a page that is not as it is made now.
 *
 * @param was text of the page
 * @param is text as it comes out now
 * @returns both passages; nothing where the pages are the same
 */
export function firstDifference(was: string, is: string): { was: string; is: string } | undefined {
  if (was === is) return undefined;
  let at = 0;
  while (at < was.length && was[at] === is[at]) at++;
  const from = Math.max(0, at - AROUND);
  return { was: was.slice(from, at + AROUND), is: is.slice(from, at + AROUND) };
}
