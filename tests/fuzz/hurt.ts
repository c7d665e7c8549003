import fc from 'fast-check';
import { type ByteEdit, byteEdit, type Encoding, editedBytes, encoded, encodings } from './byteEdits.ts';
import { editedTable, type TableEdit, tableEdit } from './tableEdits.ts';
import { edited, type TextEdit, textEdit } from './textEdits.ts';
import { editedTree, type TreeEdit, treeEdit } from './treeEdits.ts';

/** What was done to a sound file, short enough to be read in a report. */
export type Hurt =
  | { readonly how: 'tree'; readonly edits: readonly TreeEdit[] }
  | { readonly how: 'table'; readonly edits: readonly TableEdit[] }
  | { readonly how: 'text'; readonly edits: readonly TextEdit[] }
  | { readonly how: 'bytes'; readonly edits: readonly ByteEdit[] }
  | { readonly how: 'encoding'; readonly encoding: Encoding };

const few = <T>(edit: fc.Arbitrary<T>) => fc.array(edit, { minLength: 1, maxLength: 3 });

const text = few(textEdit).map((edits): Hurt => ({ how: 'text', edits }));
const bytes = few(byteEdit).map((edits): Hurt => ({ how: 'bytes', edits }));
const encoding = fc.constantFrom(...encodings).map((each): Hurt => ({ how: 'encoding', encoding: each }));
const tree = few(treeEdit).map((edits): Hurt => ({ how: 'tree', edits }));
const table = few(tableEdit).map((edits): Hurt => ({ how: 'table', edits }));

/** Ways to hurt a structured file. */
export const hurtYaml: fc.Arbitrary<Hurt> = fc.oneof(
  { weight: 8, arbitrary: tree },
  { weight: 6, arbitrary: text },
  { weight: 2, arbitrary: bytes },
  { weight: 1, arbitrary: encoding },
);

/** Ways to hurt a table. */
export const hurtTable: fc.Arbitrary<Hurt> = fc.oneof(
  { weight: 10, arbitrary: table },
  { weight: 3, arbitrary: text },
  { weight: 3, arbitrary: bytes },
  { weight: 1, arbitrary: encoding },
);

/** The bytes of a file that was hurt. */
export function hurtBytes(sound: string, hurt: Hurt): Uint8Array {
  const utf8 = (changed: string) => new TextEncoder().encode(changed);
  switch (hurt.how) {
    case 'tree':
      return utf8(editedTree(sound, hurt.edits));
    case 'table':
      return utf8(editedTable(sound, hurt.edits));
    case 'text':
      return utf8(edited(sound, hurt.edits));
    case 'bytes':
      return editedBytes(utf8(sound), hurt.edits);
    case 'encoding':
      return encoded(sound, hurt.encoding);
  }
}
