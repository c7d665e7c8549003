import { visibleText } from '../../core/problem.ts';
import { type Markup, markup, Markup as Raw } from '../charts/markup.ts';
import { auditorPart } from './auditorPart.ts';
import { clientPage } from './clientPage.ts';
import { dataBlock } from './dataBlock.ts';
import { named } from './named.ts';
import { pageStyle } from './pageStyle.ts';
import { professionalPart } from './professionalPart.ts';
import type { ReportInput } from './reportInput.ts';

/** Nothing is fetched and nothing runs: style and pictures stand in the file itself. */
const POLICY = "default-src 'none'; style-src 'unsafe-inline'; img-src data:; form-action 'none'; base-uri 'none'";

/**
 * A report of one scenario as one page that needs nothing beside itself.
 *
 * @param input answer, document, texts of the inputs, words of a language
 * @returns HTML; the same input gives the same bytes
 */
export function reportPage(input: ReportInput): string {
  const { words, document } = input;
  const title = markup`${words.title} – ${visibleText(document.scenario)}`;
  const head = markup`<head><meta charset="utf-8"><meta http-equiv="Content-Security-Policy" content="${new Raw(POLICY)}"><meta name="viewport" content="width=device-width, initial-scale=1"><meta name="color-scheme" content="light dark"><meta name="referrer" content="no-referrer"><title>${title}</title><style>${new Raw(pageStyle)}</style></head>`;
  return markup`<!doctype html>
<html lang="${words.language}">${head}<body><a class="skip" href="#answer">${words.skip}</a>${header(input)}<main>${clientPage(input)}
${professionalPart(input)}
${auditorPart(input)}</main><footer><p>${words.footer(document.version)}</p></footer>
${dataBlock(input)}
</body></html>
`.text;
}

function header({ words, document, answer }: ReportInput): Markup {
  const { note } = answer.loaded.scenario;
  const said = note === undefined ? undefined : markup`<p class="note">${named(note.replace(/\s+/g, ' '))}</p>`;
  const links = [
    ['answer', words.client.title],
    ['professional', words.professional.title],
    ['auditor', words.auditor.title],
  ].map(([id, name]) => markup`<a href="#${id}">${name}</a> `);
  return markup`<header><p class="kicker">${words.title}</p><h1>${named(document.scenario)}</h1>${said}<nav aria-label="${words.contents}">${links}</nav></header>`;
}
