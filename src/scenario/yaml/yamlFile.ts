import type { LineCounter } from 'yaml';
import { type Document, isAlias, isCollection, isMap, isPair, isScalar, type Node, type Pair, Scalar } from 'yaml';
import type { Problem } from '../../core/problem.ts';
import { type EntryPath, pathText } from '../entries/pathText.ts';

/** A place in a file, both counted from 1. */
export interface Place {
  readonly line: number;
  readonly column: number;
}

/** What a problem says beside its place. */
export type Fault = Pick<Problem, 'code'> & Partial<Pick<Problem, 'severity' | 'found' | 'allowed' | 'unit' | 'hint'>>;

/** Plain values of a structured file, and the places where they stand. */
export interface YamlFile {
  readonly file: string;
  /** The values as written, without any default. */
  readonly raw: unknown;
  /** The file in which the entry at a path is written: `file`, unless the values come from several. */
  owner(path: EntryPath): string;
  /** Where the value at a path stands; for what is not there, the key of the deepest section that is. */
  place(path: EntryPath): Place;
  /** Where the key at a path stands. */
  keyPlace(path: EntryPath): Place;
  /** A problem at the value of a path. */
  problem(path: EntryPath, fault: Fault): Problem;
  /** A problem at the key of a path. */
  keyProblem(path: EntryPath, fault: Fault): Problem;
  /**
   * Places inside a text at a path, for tables written as text blocks.
   *
   * @returns a function from line and column of the text (counted from 1) to the place in the file; for other forms than a
   * literal block (`|`) every place is that of the text's beginning
   */
  textPlaces(path: EntryPath): (line: number, column: number) => Place;
  /** Whether the text at a path is a literal block, which keeps its lines. */
  isLiteralBlock(path: EntryPath): boolean;
}

/** A YAML file that could be parsed. */
export class ParsedYamlFile implements YamlFile {
  readonly file: string;
  readonly raw: unknown;
  readonly #document: Document;
  readonly #lines: LineCounter;
  readonly #text: string;

  constructor(file: string, parsed: { text: string; document: Document; lines: LineCounter; raw: unknown }) {
    this.file = file;
    this.raw = parsed.raw;
    this.#document = parsed.document;
    this.#lines = parsed.lines;
    this.#text = parsed.text;
  }

  owner(): string {
    return this.file;
  }

  place(path: EntryPath): Place {
    return this.#placeOf(this.#walk(path).offset);
  }

  keyPlace(path: EntryPath): Place {
    const { key, offset } = this.#walk(path);
    return this.#placeOf(key?.range?.[0] ?? offset);
  }

  problem(path: EntryPath, fault: Fault): Problem {
    return this.#problemAt(this.place(path), path, fault);
  }

  keyProblem(path: EntryPath, fault: Fault): Problem {
    return this.#problemAt(this.keyPlace(path), path, fault);
  }

  textPlaces(path: EntryPath): (line: number, column: number) => Place {
    const { node, offset } = this.#walk(path);
    const start = this.#placeOf(offset);
    if (!isScalar(node) || node.type !== Scalar.BLOCK_LITERAL || !node.range) return () => start;
    const header = this.#placeOf(node.range[0]).line;
    const indent = blockIndent(this.#text.slice(node.range[0], node.range[2]), String(node.value));
    return (line, column) => ({ line: header + line, column: indent + column });
  }

  isLiteralBlock(path: EntryPath): boolean {
    const { node } = this.#walk(path);
    return isScalar(node) && node.type === Scalar.BLOCK_LITERAL;
  }

  #problemAt(place: Place, path: EntryPath, fault: Fault): Problem {
    return { severity: 'error', ...fault, file: this.file, ...place, path: pathText(path) };
  }

  #placeOf(offset: number): Place {
    const { line, col } = this.#lines.linePos(offset);
    return { line: Math.max(1, line), column: Math.max(1, col) };
  }

  #walk(path: EntryPath): { node: Node | null | undefined; key: Node | undefined; offset: number } {
    let node: unknown = this.#document.contents;
    let key: Node | undefined;
    let offset = rangeStart(node) ?? 0;
    for (const step of path) {
      if (isAlias(node)) node = node.resolve(this.#document);
      if (!isCollection(node)) break;
      if (isMap(node)) {
        const pair = pairOf(node.items, step);
        if (pair === undefined) return { node: undefined, key: undefined, offset: rangeStart(key) ?? offset };
        key = pair.key as Node | undefined;
        node = pair.value;
      } else {
        key = undefined;
        node = node.items[Number(step)];
      }
      offset = rangeStart(node) ?? rangeStart(key) ?? offset;
    }
    if (isAlias(node)) node = node.resolve(this.#document);
    return { node: node as Node | null | undefined, key, offset };
  }
}

function pairOf(items: readonly unknown[], step: string | number): Pair | undefined {
  return items.find(
    (item): item is Pair => isPair(item) && String(isScalar(item.key) ? item.key.value : item.key) === String(step),
  );
}

function rangeStart(node: unknown): number | undefined {
  return isCollection(node) || isScalar(node) || isAlias(node) ? node.range?.[0] : undefined;
}

/** Columns that the lines of a literal block are indented by: what its first filled line has lost in the value. */
function blockIndent(source: string, value: string): number {
  return leadingBlanks(source.split('\n').slice(1)) - leadingBlanks(value.split('\n'));
}

function leadingBlanks(lines: readonly string[]): number {
  const filled = lines.find((line) => line.trim() !== '');
  return filled === undefined ? 0 : filled.length - filled.trimStart().length;
}
