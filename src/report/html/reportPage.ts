import { visibleText } from '../../core/problem.ts';
import { type Markup, markup } from '../charts/markup.ts';
import { auditorPart } from './auditorPart.ts';
import { clientPage } from './clientPage.ts';
import { dataBlock } from './dataBlock.ts';
import { named } from './named.ts';
import { pageShell } from './pageShell.ts';
import { professionalPart } from './professionalPart.ts';
import type { ReportInput } from './reportInput.ts';

/**
 * A report of one scenario as one page that needs nothing beside itself.
 *
 * @param input answer, document, texts of the inputs, words of a language
 * @returns HTML; the same input gives the same bytes
 */
export function reportPage(input: ReportInput): string {
  const { words, document } = input;
  return pageShell({
    language: words.language,
    title: `${words.title} – ${visibleText(document.scenario)}`,
    skip: words.skip,
    header: header(input),
    parts: [clientPage(input), professionalPart(input), auditorPart(input)],
    footer: words.footer(document.version),
    data: dataBlock(input),
  });
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
