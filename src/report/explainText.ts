import { visibleText } from '../core/problem.ts';
import { inputSection } from './answerText.ts';
import type { ExplainDocument, ExplainEntry } from './explainSchema.ts';
import { type ExplainWords, englishExplained } from './explainWords.ts';
import { significant } from './figures.ts';
import { heading, wrapped } from './layout.ts';
import { english, type Words } from './words.ts';

/** Letters left for the name of a figure and for its digits. */
const LABEL_WIDTH = 46;
const VALUE_WIDTH = 14;

/**
 * An explained hour as a person reads it: the hour, then stage by stage what held, the figures, and the formulas.
 *
 * @param document of one hour
 * @param words of the report in its language
 * @param explained words of the explanation in the same language; those of the stages stand in the document
 * @returns lines of at most 80 columns where the names in them allow it, with a final newline
 */
export function explainText(
  document: ExplainDocument,
  words: Words = english,
  explained: ExplainWords = englishExplained,
): string {
  const sections = [
    [
      heading(explained.title(visibleText(document.scenario))),
      wrapped(`${words.of}: ${visibleText(document.heatPumpUnit)}`),
    ],
    [wrapped(hourSentences(document.hour, explained).join(' ')), wrapped(explained.digits)],
    ...document.stages.map((stage) => stageSection(stage, explained)),
    inputSection(document, words),
    [wrapped(words.cautions.join(' '))],
  ];
  return `${sections.map((lines) => lines.join('\n')).join('\n\n')}\n`;
}

function hourSentences(hour: ExplainDocument['hour'], words: ExplainWords): string[] {
  const { asked, isBeginning, civilTime, stamp, weekday, tariff } = hour;
  const begins = words.hour({ weekday: words.weekdays[weekday - 1], civil: civilTime, standard: stamp });
  const within = isBeginning ? [] : [words.within({ asked: visibleText(asked), civil: civilTime })];
  if (tariff === undefined) return [begins, ...within];
  const said = { tariff: visibleText(tariff.name), rate: visibleText(tariff.rate) };
  const { price, unit } = tariff;
  const priced =
    price === undefined
      ? words.rateWithoutPrice(said)
      : words.rate({ ...said, price: `${significant(price)} ${unit}` });
  return [begins, ...within, priced];
}

/** A stage; one without figures takes one line. */
function stageSection(stage: ExplainEntry, words: ExplainWords): string[] {
  const findings = stage.findings.map(({ says }) => says);
  if (stage.figures.length === 0) return [wrapped(`${stage.title}: ${findings.join(' ')}`, '', '  ')];
  return [
    heading(stage.title),
    ...(findings.length === 0 ? [] : [wrapped(findings.join(' '))]),
    ...stage.figures.map(figureLine),
    ...stage.formulas.map((formula) => wrapped(formulaText(formula, words), '  ', '    ')),
  ];
}

function figureLine({ label, value, unit }: ExplainEntry['figures'][number]): string {
  const digits = significant(value).padStart(VALUE_WIDTH);
  return `  ${label.padEnd(LABEL_WIDTH)}${digits}${unit === '1' ? '' : ` ${unit}`}`;
}

function formulaText({ section, says, source }: ExplainEntry['formulas'][number], words: ExplainWords): string {
  return `${words.formula({ section, says })}${source === undefined ? '' : words.source(source)}`;
}
