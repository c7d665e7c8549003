/**
 * The part of the library papaparse that src uses. Its own types bring those of node with them, and src would then compile
 * with `process` and the rest; so src/tsconfig.json reads these instead, while everything together is held to its own.
 */
interface Settings {
  readonly delimiter?: string;
  readonly newline?: '\n';
  readonly fastMode?: boolean;
  readonly preview?: number;
  readonly skipEmptyLines?: boolean;
}

interface Parsed<Row> {
  readonly data: Row[];
  readonly errors: readonly { readonly type: string; readonly row?: number }[];
}

declare const Papa: {
  parse<Row>(text: string, settings?: Settings): Parsed<Row>;
  unparse(
    rows: readonly (readonly unknown[])[],
    settings?: { readonly newline?: string; readonly escapeFormulae?: boolean | RegExp },
  ): string;
};

export default Papa;
