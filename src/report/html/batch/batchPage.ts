import { visibleText } from '../../../core/problem.ts';
import { type Markup, markup } from '../../charts/markup.ts';
import { heading, wrapped } from '../../layout.ts';
import { named } from '../named.ts';
import { pageShell } from '../pageShell.ts';
import { batchAnswer, batchSentences, failedSentence, sizeSentences } from './batchAnswer.ts';
import { batchAuditor } from './batchAuditor.ts';
import { batchMap } from './batchMap.ts';
import { batchRanking } from './batchRanking.ts';
import type { BatchReportInput } from './batchReportInput.ts';
import { histograms, spreadFigures } from './batchSpread.ts';
import { batchTrouble } from './batchTrouble.ts';

/**
 * The report of a batch as one page that needs nothing beside itself; its size does not grow with the years.
 *
 * @param input years as columns, manifest, words of a language
 * @returns HTML; the same input gives the same bytes
 */
export function batchPage(input: BatchReportInput): string {
  const { words, manifest, version } = input;
  return pageShell({
    language: words.language,
    title: `${words.batch.title} – ${visibleText(manifest.plan)}`,
    skip: words.skip,
    header: header(input),
    parts: [batchAnswer(input), optionsPart(input), batchTrouble(input), batchAuditor(input)],
    footer: words.footer(version),
  });
}

function header(input: BatchReportInput): Markup {
  const { words, manifest, date } = input;
  const { batch: said } = words;
  const links = [
    ['answer', words.client.title],
    ['options', said.options],
    ['trouble', said.trouble],
    ['auditor', words.auditor.title],
  ].map(([id, name]) => markup`<a href="#${id}">${name}</a> `);
  const day = date === undefined ? undefined : markup`<p class="note">${said.date(date)}</p>`;
  return markup`<header><p class="kicker">${said.title}</p><h1>${named(manifest.plan)}</h1><p class="note"><bdi>${sizeSentences(input).join(' ')}</bdi></p>${day}<nav aria-label="${words.contents}">${links}</nav></header>`;
}

/** Options beside one another, spreads, and the two ends of the ranking. */
function optionsPart(input: BatchReportInput): Markup {
  const { options, compared } = input.words.batch;
  const map = batchMap(input);
  const noMap = typeof map === 'string' ? markup`<p>${map}</p>` : undefined;
  const charts = [...(typeof map === 'string' ? [] : [map]), ...histograms(input), ...spreadFigures(input)];
  return markup`<section class="part" aria-labelledby="options"><h2 id="options">${options}</h2><section><h3>${compared}</h3>${noMap}<div class="charts">${charts}</div></section><section>${batchRanking(input)}</section></section>`;
}

/** What the report of a batch says in short, for the terminal: name, size and answer. */
export function batchText(input: BatchReportInput): string {
  const size = sizeSentences(input).join(' ');
  const answer = batchSentences(input).join(' ');
  return `${heading(visibleText(input.manifest.plan))}\n${wrapped(size)}\n\n${wrapped(answer)}\n\n${wrapped(failedSentence(input))}\n`;
}
