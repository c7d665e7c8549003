import { visibleText } from '../core/problem.ts';
import { answerSentences } from './answerSentences.ts';
import { billTable, heatingTable, monthTable } from './answerTables.ts';
import { comparisonSection } from './comparisonSection.ts';
import { factor, figure, kWh } from './figures.ts';
import { heading, wrapped } from './layout.ts';
import type { ResultDocument } from './resultSchema.ts';
import { dayStrips } from './terminal/dayStrips.ts';
import type { HoursOfDay } from './terminal/hoursOfDay.ts';
import { weatherSummary } from './weatherSummary.ts';
import { english, type Words } from './words.ts';

/** Characters of a SHA-256 that are printed; the whole of it stands in the JSON document. */
const SHOWN_OF_HASH = 12;

/**
 * The result as a person reads it: the answer in sentences, tariffs, months, cautions, and what it all rests on.
 *
 * @param document of one scenario
 * @param words of the language it is written in
 * @param pictures the hours of the day, for a reader who sees block letters; months then have bars too
 * @returns lines of at most 80 columns where the names in them allow it, with a final newline; the same document gives
 *   the same text
 */
export function answerText(document: ResultDocument, words: Words = english, pictures?: HoursOfDay): string {
  const sections = [
    [heading(visibleText(document.scenario)), wrapped(`${words.of}: ${visibleText(document.heatPumpUnit)}`)],
    [wrapped(answerSentences(document, words).join(' '))],
    costSection(document, words),
    comparisonSection(document, words),
    [heading(words.headings.months), monthTable(document, words, pictures !== undefined)],
    pictures === undefined ? [] : dayStrips(pictures, words),
    figureSection(document, words),
    warningSection(document, words),
    assumptionSection(document, words),
    weatherSection(document, words),
    inputSection(document, words),
    [wrapped(words.cautions.join(' '))],
  ];
  const shown = sections.filter((lines) => lines.length > 0).map((lines) => lines.join('\n'));
  return `${shown.join('\n\n')}\n`;
}

function costSection({ costs }: ResultDocument, words: Words): string[] {
  if (costs.length === 0) return [];
  const currencies = new Set(costs.map(({ currency }) => currency));
  const title = currencies.size === 1 ? `${words.headings.costs}, ${costs[0].currency}` : words.headings.costs;
  const household = costs[0].household.kWh;
  const note = household > 0 ? words.billNote(kWh(household)) : words.billNoteAlone;
  return [heading(title), billTable(costs, words), wrapped(note), heatingTable(costs, words), wrapped(words.costsNote)];
}

function figureSection({ annual, house, fieldStudies }: ResultDocument, words: Words): string[] {
  const { h2, h3, h4 } = annual.seasonalFactor;
  const { heatLossPerArea, heatLoss, designLoad } = house;
  const sentences = [
    words.factors({ h2: factor(h2), h3: factor(h3), h4: factor(h4) }),
    ...(h4 === 'no heat' ? [] : [words.fieldStudies(listOf(fieldStudies, words))]),
    words.house({ heatLoss: `${figure(heatLoss, 0)} W/K`, designLoad: `${figure(designLoad, 1)} kW` }),
    ...(typeof heatLossPerArea === 'number' ? [words.housePerArea(`${figure(heatLossPerArea, 2)} W/(m²·K)`)] : []),
    words.starts(figure(10 * Math.round(annual.starts / 10), 0)),
    words.outside({ outside: figure(annual.outsideMapHours, 0), below: figure(annual.belowLowestFlowHours, 0) }),
  ];
  const { hotWater } = annual;
  if (hotWater !== undefined) {
    const { hotWaterAsked: asked, hotWaterShort: short, cylinderLoss: loss } = hotWater;
    sentences.push(words.hotWater({ asked: kWh(asked), short: kWh(short), loss: kWh(loss) }));
  }
  return sentences.map((sentence) => wrapped(sentence));
}

/** Factors of each place as their sources state them, with no more digits. */
function listOf(studies: ResultDocument['fieldStudies'], words: Words): string {
  const places = [...new Set(studies.map(({ place }) => place))];
  const shown = places.map((place) => {
    const factors = studies.filter((study) => study.place === place).map(({ factor }) => String(factor));
    return words.fieldStudy({ place, factors: factors.join(', ') });
  });
  return shown.join(', ');
}

/** What to look at before signing; nothing where there is nothing. */
export function warningSection({ warnings }: Pick<ResultDocument, 'warnings'>, words: Words): string[] {
  if (warnings.length === 0) return [];
  const lines = warnings.flatMap(({ text, remedy }) => [
    wrapped(visibleText(text), '! ', '  '),
    wrapped(visibleText(remedy), '  → ', '    '),
  ]);
  return [heading(words.headings.warnings), ...lines];
}

/** One line a part of the scenario, its values short: the sentences stand in the JSON document. */
export function assumptionSection({ assumptions }: Pick<ResultDocument, 'assumptions'>, words: Words): string[] {
  if (assumptions.length === 0) return [];
  const groups = new Map<string, string[]>();
  for (const { path, text } of assumptions) {
    const [group, ...rest] = path.split('.');
    const value = text.split('. ')[0].replace(/\.$/, '');
    const said = rest.length === 0 ? value : `${rest.join('.')} = ${value}`;
    groups.set(group, [...(groups.get(group) ?? []), said]);
  }
  const lines = [...groups].map(([group, said]) =>
    wrapped(visibleText(said.join('; ')), `${visibleText(group)}: `, '  '),
  );
  return [heading(words.headings.assumptions), ...lines];
}

function weatherSection({ weather }: ResultDocument, words: Words): string[] {
  return [heading(words.headings.weather), weatherSummary(weather, words)];
}

/** The files a result rests on. */
export function inputSection({ inputs }: Pick<ResultDocument, 'inputs'>, words: Words): string[] {
  const lines = inputs.map(({ file, sha256 }) => `${sha256.slice(0, SHOWN_OF_HASH)}  ${visibleText(file)}`);
  return [heading(words.headings.inputs), ...lines];
}
