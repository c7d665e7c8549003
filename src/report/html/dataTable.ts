import { type Markup, markup, type Piece } from '../charts/markup.ts';

/** A column of a table: its heading, and whether its cells are figures, which stand to the right. */
export interface TableColumn {
  readonly heading: Piece;
  readonly figures: boolean;
}

/** A table with what it is called; the first cell of each row names the row. */
export interface DataTable {
  readonly caption: string;
  readonly columns: readonly TableColumn[];
  readonly rows: readonly (readonly Piece[])[];
  /** Whether the last row is the sum of the others. */
  readonly sum?: boolean;
}

/** A table that may be wider than the page: then it is moved within its own frame, also by keys. */
export function dataTable({ caption, columns, rows, sum = false }: DataTable): Markup {
  const head = columns.map(({ heading, figures }) => markup`<th scope="col"${numeric(figures)}>${heading}</th>`);
  const lines = rows.map((cells, row) => {
    const [name, ...others] = cells;
    const rest = others.map((cell, i) => markup`<td${numeric(columns[i + 1].figures)}>${cell}</td>`);
    const last = sum && row === rows.length - 1 ? markup` class="sum"` : undefined;
    return markup`<tr${last}><th scope="row"${numeric(columns[0].figures)}>${name}</th>${rest}</tr>`;
  });
  return markup`<div class="wide" role="region" tabindex="0" aria-label="${caption}"><table><caption>${caption}</caption><thead><tr>${head}</tr></thead><tbody>${lines}</tbody></table></div>`;
}

function numeric(figures: boolean): Markup | undefined {
  return figures ? markup` class="n"` : undefined;
}

/** Columns of figures behind a first one of names. */
export function figureColumns(first: string, headings: readonly Piece[]): TableColumn[] {
  return [{ heading: first, figures: false }, ...headings.map((heading) => ({ heading, figures: true }))];
}

/** Columns of text. */
export function textColumns(...headings: readonly string[]): TableColumn[] {
  return headings.map((heading) => ({ heading, figures: false }));
}
