import { type Markup, markup } from '../../charts/markup.ts';
import { dataTable, textColumns } from '../dataTable.ts';
import { inEnglish } from '../named.ts';
import type { BatchReportInput } from './batchReportInput.ts';
import type { FailedYear, GatheredYears } from './gatheredYears.ts';
import { cellName } from './writtenFigures.ts';

/** Failed years that are shown, of all causes together. */
const MOST_EXAMPLES = 20;
/** Kinds of warnings, and causes, that are listed. */
const MOST_LISTED = 40;
/** Letters of a sentence that came with the results. */
const LONGEST_SENTENCE = 400;

/** Warnings by how many years have them, and failed years by cause. */
export function batchTrouble(input: BatchReportInput): Markup {
  const { words } = input;
  const { batch: said } = words;
  return markup`<section class="part" aria-labelledby="trouble"><h2 id="trouble">${said.trouble}</h2><section><h3>${said.warningsTitle}</h3>${warnings(input)}</section><section><h3>${said.failuresTitle}</h3>${failures(input)}</section></section>`;
}

function warnings({ years, words, figures }: BatchReportInput): Markup {
  const { batch: said } = words;
  if (years.warnings.length === 0) return markup`<p>${said.noWarnings}</p>`;
  return dataTable({
    caption: said.warningsCaption,
    columns: [
      ...textColumns(said.warning, said.meaning),
      { heading: said.years, figures: true },
      { heading: said.share, figures: true },
    ],
    rows: years.warnings
      .slice(0, MOST_LISTED)
      .map(([code, count]) => [
        markup`<code>${cellName(code)}</code>`,
        said.meanings[code],
        figures.number(count, 0),
        figures.percent(count / years.rows, 1),
      ]),
  });
}

function failures({ years, words, figures }: BatchReportInput): Markup {
  const { batch: said } = words;
  if (years.failed === 0) return markup`<p>${said.answer.noneFailed}</p>`;
  const causes = dataTable({
    caption: said.causesCaption,
    columns: [...textColumns(said.cause), { heading: said.years, figures: true }],
    rows: years.causes
      .slice(0, MOST_LISTED)
      .map(({ code, years: count }) => [markup`<code>${cellName(code)}</code>`, figures.number(count, 0)]),
  });
  const examples = dataTable({
    caption: said.examplesCaption(figures.number(MOST_EXAMPLES, 0)),
    columns: textColumns(said.ranking.home, said.ranking.job, said.place, said.found, said.remedy),
    rows: examplesOf(years).map(({ home, job, problem }) => [
      cellName(home),
      figures.number(job, 0),
      cellName(problem.place),
      inEnglish(problem.text.slice(0, LONGEST_SENTENCE)),
      inEnglish(problem.remedy.slice(0, LONGEST_SENTENCE)),
    ]),
  });
  return markup`${causes}${examples}`;
}

/**
 * Failed years to be shown: of each cause about the same number.
 *
 * @returns at most twenty, the most frequent cause first
 */
export function examplesOf({ causes }: Pick<GatheredYears, 'causes'>): FailedYear[] {
  const turns = Array.from({ length: MOST_EXAMPLES }, (_, turn) => turn);
  const taken = new Set(
    turns.flatMap((turn) => causes.flatMap(({ examples }) => examples.slice(turn, turn + 1))).slice(0, MOST_EXAMPLES),
  );
  return causes.flatMap(({ examples }) => examples.filter((example) => taken.has(example)));
}
