import { visibleText } from '../core/problem.ts';
import { figure } from './figures.ts';
import type { FitDocument } from './fitResultSchema.ts';
import { englishFit, type FitWords } from './fitWords.ts';
import { heading, table, wrapped } from './layout.ts';

/** Characters of a SHA-256 that are printed; the whole of it stands in the JSON document. */
const SHOWN_OF_HASH = 12;

/**
 * A heat loss by readings as a person reads it: the answer, the lines for the scenario, doubts, periods, and what it rests on.
 *
 * @param document of one fit
 * @param words of the language it is written in
 * @returns lines of at most 80 columns where the names in them allow it, with a final newline
 */
export function fitText(document: FitDocument, words: FitWords = englishFit): string {
  const sections = [
    [heading(visibleText(words.title(document.scenario))), wrapped(answer(document, words))],
    linesSection(document, words),
    doubtSection(document, words),
    [heading(words.headings.periods), periodTable(document, words)],
    [heading(words.headings.readings), wrapped(visibleText(readings(document, words)))],
    [heading(words.headings.weather), wrapped(visibleText(weather(document, words)))],
    inputSection(document, words),
    [wrapped(words.cautions.join(' '))],
  ];
  const shown = sections.filter((lines) => lines.length > 0).map((lines) => lines.join('\n'));
  return `${shown.join('\n\n')}\n`;
}

function answer({ heatLoss, signature, believed, asked }: FitDocument, words: FitWords): string {
  const { value, standardError, low, high, entered } = heatLoss;
  const loss = (watts: number, unit = ' W/K') => `${figure(watts, Math.abs(watts) < 100 ? 1 : 0)}${unit}`;
  const said = { value: loss(value), error: loss(standardError, ''), low: loss(low, ''), high: loss(high, '') };
  const isWithin = entered >= low && entered <= high;
  const { baseTemperature, baseUse, rSquared, cvRmse } = signature;
  const sentences = [
    words.loss(said),
    isWithin ? words.within(loss(entered)) : words.outside(loss(entered)),
    words.base({ base: `${figure(baseTemperature, 1)} °C`, use: `${figure(baseUse, 1)} kWh` }),
    words.line({ rSquared: figure(rSquared, 2), cvRmse: percent(cvRmse) }) +
      words.asked({
        rSquared: figure(asked.rSquared, 2),
        cvRmse: percent(asked.cvRmse),
        guideline: percent(asked.guidelineCvRmse),
      }),
  ];
  return [...sentences, ...(believed ? [] : [words.notBelieved])].join(' ');
}

function percent(share: number): string {
  return `${figure(100 * share, 0)} %`;
}

function linesSection({ scenarioLines }: FitDocument, words: FitWords): string[] {
  return scenarioLines.length === 0 ? [] : [heading(words.headings.lines), ...scenarioLines];
}

function doubtSection({ doubts }: FitDocument, words: FitWords): string[] {
  if (doubts.length === 0) return [];
  const lines = doubts.flatMap(({ text, remedy }) => [
    wrapped(visibleText(text), '! ', '  '),
    wrapped(visibleText(remedy), '  → ', '    '),
  ]);
  return [heading(words.headings.doubts), ...lines];
}

function periodTable({ periods }: FitDocument, { columns }: FitWords): string {
  const figures = (title: string, cells: string[]) => ({ heading: title, figures: true, cells });
  return table([
    { heading: columns.period, figures: false, cells: periods.map(({ from, to }) => `${from} – ${to}`) },
    figures(
      columns.days,
      periods.map(({ days }) => figure(days, 0)),
    ),
    figures(
      columns.degreeDays,
      periods.map(({ degreeDays }) => figure(degreeDays, 1)),
    ),
    figures(
      columns.use,
      periods.map(({ dailyUse }) => figure(dailyUse, 1)),
    ),
    figures(
      columns.onLine,
      periods.map(({ onLine }) => figure(onLine, 1)),
    ),
    figures(
      columns.residual,
      periods.map(({ residual }) => figure(residual, 1)),
    ),
  ]);
}

function readings({ readings: read }: FitDocument, words: FitWords): string {
  const { file, kind, unit, kWhPerUnit, efficiency, efficiencyFrom, estimated, unused } = read;
  const parts = [words.rows({ rows: figure(read.rows, 0), kind: words.kinds[kind], unit })];
  if (kWhPerUnit !== 1) parts.push(words.factor({ unit, factor: `${figure(kWhPerUnit, 2)} kWh` }));
  parts.push(words.efficiency[efficiencyFrom](figure(efficiency, 2)));
  if (estimated > 0) parts.push(words.estimated(figure(estimated, 0)));
  if (unused.length > 0) {
    parts.push(words.unused(unused.map(({ from, to }) => `${from}${words.to}${to}`).join(', ')));
  }
  return `${file}: ${parts.join('; ')}.`;
}

function weather({ weather: { files, covers, filledHours } }: FitDocument, words: FitWords): string {
  const names = files.map(({ file }) => file).join(', ');
  const parts = [words.covers({ file: names, days: covers })];
  if (filledHours > 0) parts.push(words.filled(figure(filledHours, 0)));
  return `${parts.join('; ')}. ${words.takenByDate}.`;
}

function inputSection({ inputs }: FitDocument, words: FitWords): string[] {
  const lines = inputs.map(({ file, sha256 }) => `${sha256.slice(0, SHOWN_OF_HASH)}  ${visibleText(file)}`);
  return [heading(words.headings.inputs), ...lines];
}
