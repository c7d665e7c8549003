import type { EntryPath } from '../scenario/entries/pathText.ts';
import type { Place } from '../scenario/yaml/yamlFile.ts';

/** Where something is written: in the plan, or in the table of homes. */
export interface Origin extends Partial<Place> {
  readonly file: string;
}

/** An entry of the base scenario that a job says otherwise. */
export interface Change {
  readonly path: EntryPath;
  /** What stands there; null takes the entry out. */
  readonly value: unknown;
  readonly origin: Origin;
}

/**
 * A scenario with some entries changed; what is not changed is shared with the original, which stays as it is.
 *
 * A section or list that the path leads through is made where there is none; a single value in its way is replaced.
 *
 * @param raw values of a scenario as written
 * @param changes the later wins
 * @example withChanges({ a: { b: 1, c: 2 } }, [{ path: ['a', 'b'], value: 3, origin }]) // { a: { b: 3, c: 2 } }
 */
export function withChanges(raw: unknown, changes: readonly Change[]): unknown {
  return changes.reduce((values, { path, value }) => withEntry(values, path, value), raw);
}

function withEntry(values: unknown, path: EntryPath, value: unknown): unknown {
  const [step, ...rest] = path;
  if (step === undefined) return value;
  const inner = entryAt(values, step);
  const entry = rest.length === 0 ? value : withEntry(inner, rest, value);
  if (typeof step === 'number') {
    const list: unknown[] = Array.isArray(values) ? [...values] : [];
    if (entry === null) list.splice(step, 1);
    else list[step] = entry;
    return list;
  }
  const section = isSection(values) ? { ...values } : {};
  if (entry === null) delete section[step];
  else define(section, step, entry);
  return section;
}

/** Sets a key as a plain one, whatever its name. */
function define(section: Record<string, unknown>, key: string, value: unknown): void {
  Object.defineProperty(section, key, { value, writable: true, enumerable: true, configurable: true });
}

function entryAt(values: unknown, step: string | number): unknown {
  if (typeof step === 'number') return Array.isArray(values) ? values[step] : undefined;
  return isSection(values) && Object.hasOwn(values, step) ? values[step] : undefined;
}

function isSection(values: unknown): values is Record<string, unknown> {
  return typeof values === 'object' && values !== null && !Array.isArray(values);
}

/**
 * The change that an entry comes from: the last one whose place is the entry, leads to it, or lies in it.
 *
 * @returns undefined where the base scenario says it
 */
export function changeAt(changes: readonly Change[], path: EntryPath): Change | undefined {
  return changes.findLast((change) => overlap(change.path, path));
}

/** Whether one of two places is the other or holds it. */
export function overlap(a: EntryPath, b: EntryPath): boolean {
  const shorter = Math.min(a.length, b.length);
  return a.slice(0, shorter).every((step, i) => String(step) === String(b[i]));
}
