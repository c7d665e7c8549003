import { type Document, isCollection, isScalar, parseDocument, Scalar } from 'yaml';
import type { EntryPath } from '../../src/scenario/entries/pathText.ts';

/** What may be written at a place: undefined takes it out. */
export type Written = string | number | boolean | readonly Written[] | { readonly [key: string]: Written } | undefined;

/** Words that would not be texts if they stood without quotes. */
const NOT_TEXTS = /^(?:true|false|null|~|)$/i;
const PLAIN_TEXT = /^[\p{L}_][\p{L}\p{N}_ ./()-]*[\p{L}\p{N}_)]$|^\p{L}$/u;

/**
 * A structured file with one entry changed: comments, the order of the keys and all other entries stay.
 *
 * A plain value in place of another is written into its very place; else the document is changed and written anew.
 *
 * @param text YAML
 * @param path of the entry; sections on the way are made where they are missing
 * @param value to write; undefined takes the entry out
 * @returns the new text; undefined where the text cannot be parsed
 * @example withEntry('a: 1 # one\n', ['a'], 2) // 'a: 2 # one\n'
 */
export function withEntry(text: string, path: EntryPath, value: Written): string | undefined {
  const document: Document = parseDocument(text, {
    version: '1.2',
    schema: 'core',
    logLevel: 'error',
    prettyErrors: false,
  });
  if (document.errors.length > 0) return undefined;
  const inPlace = replaced(text, document, path, value);
  if (inPlace !== undefined) return inPlace;
  if (!isCollection(document.contents)) document.contents = document.createNode({});
  if (value === undefined) document.deleteIn(path);
  else {
    makeWay(document, path);
    document.setIn(path, nodeOf(document, value));
  }
  return document.toString({ lineWidth: 0 });
}

function replaced(text: string, document: Document, path: EntryPath, value: Written): string | undefined {
  if (typeof value !== 'string' && typeof value !== 'number' && typeof value !== 'boolean') return undefined;
  if (typeof value === 'string' && value.includes('\n')) return undefined;
  const node = reachable(document, path) ? document.getIn(path, true) : undefined;
  if (!isScalar(node) || !node.range || node.range[0] === node.range[1]) return undefined;
  if (node.type === Scalar.BLOCK_LITERAL || node.type === Scalar.BLOCK_FOLDED || node.anchor !== undefined)
    return undefined;
  return text.slice(0, node.range[0]) + scalarText(value) + text.slice(node.range[1]);
}

function scalarText(value: string | number | boolean): string {
  if (typeof value !== 'string') return String(value);
  return PLAIN_TEXT.test(value) && !NOT_TEXTS.test(value) ? value : JSON.stringify(value);
}

/** Whether every entry above the path is a section or list. */
function reachable(document: Document, path: EntryPath): boolean {
  return path.every((_, depth) => depth === 0 || isCollection(document.getIn(path.slice(0, depth), true)));
}

/** Makes the sections above a path where something else stands there, or nothing. */
function makeWay(document: Document, path: EntryPath): void {
  for (let depth = 1; depth < path.length; depth++) {
    const above = path.slice(0, depth);
    if (isCollection(document.getIn(above, true))) continue;
    document.setIn(above, document.createNode(typeof path[depth] === 'number' ? [] : {}));
  }
}

function nodeOf(document: Document, value: Written) {
  const node = document.createNode(value);
  if (isScalar(node) && typeof value === 'string' && value.includes('\n')) node.type = Scalar.BLOCK_LITERAL;
  return node;
}
