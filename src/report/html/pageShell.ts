import { type Markup, markup, Markup as Raw } from '../charts/markup.ts';
import type { Language } from '../language/languages.ts';
import { pageStyle } from './pageStyle.ts';

/** Nothing is fetched and nothing runs: style and pictures stand in the file itself. */
const POLICY = "default-src 'none'; style-src 'unsafe-inline'; img-src data:; form-action 'none'; base-uri 'none'";

/** What a page holds. */
export interface PageShell {
  readonly language: Language;
  readonly title: string;
  /** Link to the first part, for those who go by keys. */
  readonly skip: string;
  readonly header: Markup;
  /** The first of them has a heading with the id `answer`. */
  readonly parts: readonly Markup[];
  readonly footer: string;
  /** Data that no browser shows. */
  readonly data?: Markup;
}

/**
 * A page that needs nothing beside itself: style, policy and frame of every report.
 *
 * @returns HTML; the same parts give the same bytes
 */
export function pageShell({ language, title, skip, header, parts, footer, data }: PageShell): string {
  const head = markup`<head><meta charset="utf-8"><meta http-equiv="Content-Security-Policy" content="${new Raw(POLICY)}"><meta name="viewport" content="width=device-width, initial-scale=1"><meta name="color-scheme" content="light dark"><meta name="referrer" content="no-referrer"><title>${title}</title><style>${new Raw(pageStyle)}</style></head>`;
  const lines = new Raw(parts.map(({ text }) => text).join('\n'));
  return markup`<!doctype html>
<html lang="${language}">${head}<body><a class="skip" href="#answer">${skip}</a>${header}<main>${lines}</main><footer><p>${footer}</p></footer>
${data}
</body></html>
`.text;
}
