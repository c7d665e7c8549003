import { type Alias, type Document, isAlias, isMap, isPair, isScalar, isSeq, type Node } from 'yaml';
import { type EntryPath, pathText } from '../entries/pathText.ts';

/** A key or reference that cannot be used. */
export interface KeyFault {
  readonly what: 'repeated' | 'not-a-word' | 'alias';
  readonly path: string;
  readonly offset: number;
  readonly found: string;
  /** Where a repeated key stands first. */
  readonly firstOffset?: number;
}

/**
 * Keys that stand twice in one section, keys that are no words, and references (`*name`) to nothing or to themselves.
 *
 * @param document a parsed document nested at most as deep as the guard allows
 */
export function keyFaults(document: Document): KeyFault[] {
  const faults: KeyFault[] = [];
  lookThrough({ document, faults, open: new Set() }, document.contents, []);
  return faults;
}

interface Search {
  readonly document: Document;
  readonly faults: KeyFault[];
  /** The collections around the node that is looked at. */
  readonly open: Set<unknown>;
}

function lookThrough(search: Search, node: unknown, path: EntryPath): void {
  if (isAlias(node)) {
    const target = node.resolve(search.document);
    if (target === undefined || search.open.has(target)) search.faults.push(aliasFault(node, path));
    return;
  }
  if (!isMap(node) && !isSeq(node)) return;
  search.open.add(node);
  if (isMap(node)) lookThroughMap(search, node.items, path);
  else node.items.forEach((item, i) => void lookThrough(search, item, [...path, i]));
  search.open.delete(node);
}

function lookThroughMap(search: Search, items: readonly unknown[], path: EntryPath): void {
  const seen = new Map<string, number>();
  for (const pair of items) {
    if (!isPair(pair)) continue;
    const offset = (pair.key as Node | null)?.range?.[0] ?? 0;
    if (!isScalar(pair.key)) {
      search.faults.push({ what: 'not-a-word', path: pathText(path), offset, found: '' });
      continue;
    }
    const key = String(pair.key.value);
    const here = [...path, key];
    const firstOffset = seen.get(key);
    if (firstOffset === undefined) seen.set(key, offset);
    else search.faults.push({ what: 'repeated', path: pathText(here), offset, found: key, firstOffset });
    lookThrough(search, pair.value, here);
  }
}

function aliasFault(alias: Alias, path: EntryPath): KeyFault {
  return { what: 'alias', path: pathText(path), offset: alias.range?.[0] ?? 0, found: `*${alias.source}` };
}
