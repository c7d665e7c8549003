import type { EntryPath } from '../../src/scenario/entries/pathText.ts';
import type { InputKind } from './writtenValue.ts';

/** A problem as the page shows it: what is wrong, what to do. */
export interface Told {
  readonly severity: 'error' | 'warning';
  readonly file: string;
  readonly place: string;
  readonly path: string;
  readonly says: string;
  readonly cure: string;
}

interface Entry {
  /** File that holds it. */
  readonly file: string;
  readonly path: EntryPath;
  /** The key in words. */
  readonly label: string;
  /** The sentence of the schema. */
  readonly says: string;
  readonly problems: readonly Told[];
  /** Stands behind the fold of its section. */
  readonly folded: boolean;
}

/** One field. */
export interface FieldNode extends Entry {
  readonly kind: 'field';
  readonly input: InputKind;
  readonly unit?: string;
  readonly usual?: string;
  readonly choices?: readonly { readonly value: string; readonly label: string }[];
  /** As it stands in the file; '' where it is left out. */
  readonly written: string;
  /** What is assumed where it is left out. */
  readonly assumed?: string;
  readonly required: boolean;
  /** A choice that changes which other fields there are. */
  readonly setsForm: boolean;
}

/** A section with fields. */
export interface SectionNode extends Entry {
  readonly kind: 'section';
  readonly present: boolean;
  /** May be taken out, or added. */
  readonly optional: boolean;
  readonly children: readonly FormNode[];
}

/** A list of sections. */
export interface ListNode extends Entry {
  readonly kind: 'list';
  readonly items: readonly { readonly path: EntryPath; readonly children: readonly FormNode[] }[];
}

export type FormNode = FieldNode | SectionNode | ListNode;
