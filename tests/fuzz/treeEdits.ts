import fc from 'fast-check';
import {
  type Document,
  isMap,
  isNode,
  isSeq,
  type Pair,
  parseDocument,
  type Scalar,
  visit,
  type YAMLMap,
  type YAMLSeq,
} from 'yaml';
import { factor, hostileWord } from './hostileWords.ts';
import { place } from './textEdits.ts';

/** A change of the values of a structured file, its writing staying sound: so it comes past the parser to what is meant. */
export type TreeEdit = Readonly<{
  at: number;
  other: number;
  factor: number;
  value: unknown;
  key: string;
  how: TreeHow;
}>;

type TreeHow = (typeof treeHows)[number];

const treeHows = [
  ...(['scale', 'scale', 'scale', 'value', 'number', 'key', 'remove', 'double', 'wrap', 'unwrap', 'move'] as const),
  ...(['long', 'deep', 'empty'] as const),
];

const value: fc.Arbitrary<unknown> = fc.oneof(
  hostileWord,
  fc.double(),
  fc.integer({ min: -40, max: 120 }),
  fc.constantFrom(null, true, false, -0, Number.MAX_VALUE, Number.MIN_VALUE, 2 ** 53, ''),
);

export const treeEdit: fc.Arbitrary<TreeEdit> = fc.record({
  at: place,
  other: place,
  factor,
  value,
  key: hostileWord,
  how: fc.constantFrom(...treeHows),
});

interface Found {
  readonly scalars: Scalar[];
  readonly pairs: { readonly map: YAMLMap; readonly pair: Pair }[];
  readonly lists: YAMLSeq[];
}

/** Makes some changes to the values of a structured file. */
export function editedTree(text: string, edits: readonly TreeEdit[]): string {
  const document = parseDocument(text);
  const made = (plain: unknown) => document.createNode(plain);
  for (const edit of edits) {
    const found = nodesOf(document);
    const scalar = found.scalars[Math.floor(edit.at * found.scalars.length)];
    const chosen = found.pairs[Math.floor(edit.at * found.pairs.length)];
    const list = found.lists[Math.floor(edit.at * found.lists.length)];
    if (edit.how === 'scale' || edit.how === 'number') changeNumber(found.scalars, edit);
    else if (edit.how === 'value' && scalar !== undefined) setValue(scalar, edit.value);
    else if (edit.how === 'long' || edit.how === 'double') changeList(list, edit, made);
    else if (chosen !== undefined) changePair(chosen, found, { edit, made });
  }
  return document.toString({ lineWidth: 0 });
}

function nodesOf(document: Document): Found {
  const found: Found = { scalars: [], pairs: [], lists: [] };
  visit(document, {
    Scalar: (key, node) => {
      if (key !== 'key') found.scalars.push(node);
    },
    Pair: (_, pair, path) => {
      const map = path.at(-1);
      if (isMap(map)) found.pairs.push({ map, pair });
    },
    Seq: (_, node) => {
      found.lists.push(node);
    },
  });
  return found;
}

/** The value would be written again as it stood in the file. */
function setValue(scalar: Scalar, plain: unknown): void {
  delete scalar.source;
  delete scalar.type;
  scalar.value = plain;
}

function changeNumber(scalars: readonly Scalar[], { at, how, factor: by, value: other }: TreeEdit): void {
  const numbers = scalars.filter(({ value: known }) => typeof known === 'number');
  const chosen = numbers[Math.floor(at * numbers.length)];
  if (chosen !== undefined) setValue(chosen, how === 'scale' ? Number(chosen.value) * by : other);
}

function changeList(list: YAMLSeq | undefined, { how, other }: TreeEdit, made: Maker): void {
  if (list === undefined) return;
  const entries: unknown[] = list.toJSON();
  const more = how === 'double' ? entries : Array.from({ length: Math.floor(other * 600) }, () => entries[0]);
  list.items.push(...more.map(made));
}

function changePair(
  { map, pair }: Found['pairs'][number],
  found: Found,
  { edit, made }: { edit: TreeEdit; made: Maker },
): void {
  const { how, other, key } = edit;
  if (how === 'remove') map.items.splice(map.items.indexOf(pair), 1);
  else if (how === 'key') pair.key = made(key);
  else if (how === 'empty') pair.value = made(other < 0.3 ? null : isSeq(pair.value) ? [] : {});
  else if (how === 'wrap') pair.value = other < 0.5 ? made([pair.value]) : made({ [key]: pair.value });
  else if (how === 'unwrap') pair.value = isSeq(pair.value) ? (pair.value.items[0] ?? null) : null;
  else if (how === 'deep') pair.value = made(deep(Math.floor(other * 90)));
  else if (how === 'move') pair.value = made(plainOf(found.pairs[Math.floor(other * found.pairs.length)]?.pair.value));
}

type Maker = (plain: unknown) => unknown;

function plainOf(node: unknown): unknown {
  return isNode(node) ? node.toJSON() : node;
}

function deep(levels: number): unknown {
  let inner: unknown = 1;
  for (let i = 0; i < levels; i++) inner = i % 2 === 0 ? [inner] : { a: inner };
  return inner;
}
