import { type FiveQuantiles, fiveQuantiles } from '../../../batch/fiveQuantiles.ts';
import { type Markup, markup } from '../../charts/markup.ts';
import { dataTable, textColumns } from '../dataTable.ts';
import { bestValues } from './axisSpread.ts';
import type { BatchReportInput } from './batchReportInput.ts';
import { cellName, currencyOf, textName, written } from './writtenFigures.ts';

/** Values of an axis that are named one by one. */
const MOST_NAMED = 8;

/** The answer in three sentences: what the years do, what they cost, which option does best. */
export function batchSentences(input: BatchReportInput): [string, string, string] {
  return [heatSentence(input), costSentence(input), bestSentence(input)];
}

function heatSentence({ years, words, figures }: BatchReportInput): string {
  const { answer: said } = words.batch;
  const factor = fiveQuantiles(years.figures.seasonalFactor);
  const hours = fiveQuantiles(years.figures.backupHours);
  if (factor === undefined || hours === undefined) return said.noHeat;
  return said.heat({
    ...{ factor: figures.number(factor.median, 2), from: figures.number(factor.q25, 2) },
    ...{ to: figures.number(factor.q75, 2), hours: figures.number(hours.median, 0) },
    ...{ hoursFrom: figures.number(hours.q25, 0), hoursTo: figures.number(hours.q75, 0) },
  });
}

function costSentence(input: BatchReportInput): string {
  const { years, words, figures } = input;
  const { answer: said } = words.batch;
  const cost = fiveQuantiles(years.figures.cost);
  if (cost === undefined) return said.noCost;
  const money = (value: number) => figures.money(value, currencyOf(input));
  const whole = (value: number) => figures.number(value, 0);
  const costs = said.cost({ cost: money(cost.median), from: whole(cost.q25), to: whole(cost.q75) });
  const saving = fiveQuantiles(years.figures.saving);
  if (saving === undefined) return `${costs}.`;
  const cheaper = years.figures.saving.filter((value) => value > 0).length;
  const facts = {
    ...{ saving: money(Math.abs(saving.median)), from: whole(saving.q25), to: whole(saving.q75) },
    share: figures.percent(cheaper / saving.count),
  };
  return costs + (saving.median < 0 ? said.loss(facts) : said.saving(facts));
}

function bestSentence(input: BatchReportInput): string {
  const { words, by } = input;
  const best = bestValues(input);
  if (best.length === 0) return words.batch.answer.noBest;
  const named = best.map(({ axis, name, median }) => `${textName(axis)} ${textName(name)} (${written(input, median)})`);
  return `${words.batch.answer.best(words.batch.criteria[by])}: ${named.join(', ')}.`;
}

/** How large the batch was, and what of it is here. */
export function sizeSentences({ manifest, words, figures, years }: BatchReportInput): string[] {
  const { batch: said } = words;
  const whole = (value: number) => figures.number(value, 0);
  const { homes, options, jobs, part, missing } = manifest;
  const sizes = { homes: whole(homes), options: whole(options), jobs: whole(jobs) };
  const lines = [`${homes === 1 ? said.sizeOfOne(sizes) : said.size(sizes)}.`];
  if (part !== undefined) {
    const { shard, shards, fromJob, toJob } = part;
    lines.push(said.part({ part: `${shard}/${shards}`, from: whole(fromJob), to: whole(toJob) }));
  }
  if (missing !== undefined) lines.push(said.missing(missing.map((each) => textName(each)).join(', ')));
  if (years.currencies.length > 1) lines.push(said.severalCurrencies);
  return lines;
}

/** How many years failed, by cause. */
export function failedSentence({ years, words, figures }: BatchReportInput): string {
  const { answer: said } = words.batch;
  if (years.failed === 0) return said.noneFailed;
  const causes = years.causes.slice(0, MOST_NAMED);
  const named = causes.map(({ code, years: count }) => `${textName(code)} ${figures.number(count, 0)}`).join(', ');
  const rest = years.causes.length - causes.length;
  const more = rest > 0 ? `, ${words.batch.more(figures.number(rest, 0))}` : '';
  return `${said.failed(figures.number(years.failed, 0))}: ${named}${more}.`;
}

/** The first page: what the batch was, and its answer. */
export function batchAnswer(input: BatchReportInput): Markup {
  const sentences = batchSentences(input).map((sentence) => markup`<p class="answer"><bdi>${sentence}</bdi></p>`);
  return markup`<section class="sheet" aria-labelledby="answer"><h2 id="answer">${input.words.client.title}</h2>${sentences}${tiles(input)}<p><bdi>${failedSentence(input)}</bdi></p>${varied(input)}</section>`;
}

function tiles(input: BatchReportInput): Markup | undefined {
  const { years, words, figures } = input;
  const { tiles: said } = words.batch;
  const currency = currencyOf(input);
  const list: [string, FiveQuantiles | undefined, number, string][] = [
    [said.factor, fiveQuantiles(years.figures.seasonalFactor), 2, 'H4'],
    [said.cost, fiveQuantiles(years.figures.cost), 0, currency],
    [said.saved, fiveQuantiles(years.figures.saving), 0, currency],
    [said.backup, fiveQuantiles(years.figures.backupHours), 0, 'h'],
    [said.carbon, fiveQuantiles(years.figures.carbon), 0, 'kg CO₂'],
  ];
  const entries = list.flatMap(([name, spread, decimals, unit]) =>
    spread === undefined
      ? []
      : [markup`<div><dt>${name}</dt><dd>${figures.number(spread.median, decimals)} <small>${unit}</small></dd></div>`],
  );
  return entries.length === 0 ? undefined : markup`<dl class="tiles">${entries}</dl>`;
}

function varied({ manifest, words, figures }: BatchReportInput): Markup {
  const { batch: said } = words;
  if (manifest.axes.length === 0) return markup`<h3>${said.varied}</h3><p>${said.nothingVaried}</p>`;
  const table = dataTable({
    caption: said.variedCaption,
    columns: textColumns(said.axis, said.values),
    rows: manifest.axes.map(({ name, values }) => {
      const rest = values.length - MOST_NAMED;
      const named = values
        .slice(0, MOST_NAMED)
        .map((value, i) => markup`${i === 0 ? '' : ' · '}${cellName(String(value))}`);
      return [cellName(name), rest > 0 ? markup`${named} ${said.more(figures.number(rest, 0))}` : markup`${named}`];
    }),
  });
  return markup`<h3>${said.varied}</h3>${table}`;
}
