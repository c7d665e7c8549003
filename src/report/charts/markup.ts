/** Text of a page in which everything is escaped that has to be; made by `markup` alone. */
export class Markup {
  readonly text: string;

  constructor(text: string) {
    this.text = text;
  }
}

/** What may stand in the gaps of a template: text is escaped, markup stands as it is, nothing is left out. */
export type Piece = Markup | string | number | undefined | readonly Piece[];

/**
 * A piece of HTML or of SVG in HTML. Text in its gaps is escaped, so that no name from a file can become markup.
 *
 * @param parts the template; a gap in an attribute stands between double quotes
 * @param pieces text, numbers, markup, lists of them
 * @example markup`<b>${'<i>'}</b>`.text // '<b>&lt;i&gt;</b>'
 */
export function markup(parts: TemplateStringsArray, ...pieces: readonly Piece[]): Markup {
  let text = parts[0];
  for (let i = 0; i < pieces.length; i++) text += textOf(pieces[i]) + parts[i + 1];
  return new Markup(text);
}

function textOf(piece: Piece): string {
  if (piece === undefined) return '';
  if (piece instanceof Markup) return piece.text;
  if (typeof piece === 'string') return escaped(piece);
  return typeof piece === 'number' ? String(piece) : piece.map(textOf).join('');
}

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/**
 * Text as it may stand between tags and in attributes; halves of characters, which no file can hold, become U+FFFD.
 *
 * @example escaped('a < b & "c"') // 'a &lt; b &amp; &quot;c&quot;'
 */
export function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => ENTITIES[sign]).replace(/\p{Surrogate}/gu, '\ufffd');
}

/**
 * A coordinate of a drawing, in tenths: short, and the same on every machine.
 *
 * @example at(3.14159) // '3.1'
 */
export function at(value: number): string {
  const tenths = Math.round(value * 10);
  return String(tenths === 0 ? 0 : tenths / 10);
}
