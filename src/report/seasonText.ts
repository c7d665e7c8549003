import { visibleText } from '../core/problem.ts';
import { assumptionSection, inputSection, warningSection } from './answerText.ts';
import { figure, kWh } from './figures.ts';
import { heading, wrapped } from './layout.ts';
import type { SeasonDocument, SeasonEntry } from './seasonSchema.ts';
import { binTable, pointsTable, signedPercent } from './seasonTables.ts';
import { englishSeasons, type SeasonWords } from './seasonWords.ts';
import { english, type Words } from './words.ts';

/** What the text shows beside the answer, and in which words. */
export interface SeasonTextSettings {
  /** Whether every season is shown bin by bin. */
  readonly bins: boolean;
  readonly words?: Words;
  readonly seasonWords?: SeasonWords;
}

/**
 * A label check as a person reads it: a sentence or two for each season, what to look at, points and bins in tables, and
 * what it all rests on.
 *
 * @param document of one unit
 * @param settings whether the bins are shown
 * @returns lines of at most 80 columns where the names in them allow it, with a final newline
 */
export function seasonText(document: SeasonDocument, settings: SeasonTextSettings): string {
  const { words = english, seasonWords = englishSeasons, bins } = settings;
  const sections = [
    [heading(`${seasonWords.title}: ${visibleText(document.heatPumpUnit)}`)],
    ...document.seasons.map((season) => [wrapped(answerOf(season, seasonWords))]),
    warningSection(document, words),
    ...document.seasons.map((season) => pointsSection(season, seasonWords)),
    ...(bins ? document.seasons.map((season) => binSection(season, seasonWords)) : []),
    assumptionSection(document, words),
    inputSection(document, words),
    [wrapped(words.cautions.join(' '))],
  ];
  const shown = sections.filter((lines) => lines.length > 0).map((lines) => lines.join('\n'));
  return `${shown.join('\n\n')}\n`;
}

function nameOf({ climate, application }: SeasonEntry, words: SeasonWords): string {
  const level = words.applications[application];
  return words.ofSeason({ climate: words.climates[climate], application: `${application} °C`, level });
}

function answerOf(season: SeasonEntry, words: SeasonWords): string {
  const { map, points, label, lowestPermittedEfficiency: lowest } = season;
  const ofMap = typeof map === 'string' ? words.noMap : words.map({ ...figuresOf(map), ...amountsOf(map) });
  const ofPoints = typeof points === 'string' ? '' : words.points({ ...figuresOf(points), ...amountsOf(points) });
  const ofLabel = typeof label === 'string' ? '' : labelOf(label, words);
  return [
    `${nameOf(season, words)}: ${ofMap}${ofPoints}${ofLabel}.`,
    ...verdicts(season.comparison, words),
    ...(lowest === 'none set' ? [] : [words.permitted(percent(lowest))]),
  ].join(' ');
}

function figuresOf({ scop, efficiency }: { scop: number; efficiency: number }) {
  return { scop: figure(scop, 2), efficiency: percent(efficiency) };
}

function amountsOf({ electricity, designLoad }: { electricity: number; designLoad: number }) {
  return { electricity: kWh(electricity), load: `${figure(designLoad, 2)} kW` };
}

function labelOf({ scop, efficiency }: Exclude<SeasonEntry['label'], string>, words: SeasonWords): string {
  const figures = [
    ...(scop === undefined ? [] : [words.scop(figure(scop, 2))]),
    ...(efficiency === undefined ? [] : [words.efficiency(percent(efficiency))]),
  ];
  return figures.length === 0 ? '' : words.label(figures.join(', '));
}

function verdicts({ map, points }: SeasonEntry['comparison'], words: SeasonWords): string[] {
  const list: string[] = [];
  if (map !== 'nothing to compare') {
    list.push(map.agrees ? words.agree[map.against] : words.disagree[map.against](signedPercent(map.share)));
  }
  if (points !== 'nothing to compare') {
    list.push(points.agrees ? words.pointsAgree : words.pointsDisagree(signedPercent(points.share)));
  }
  return list;
}

function pointsSection(season: SeasonEntry, words: SeasonWords): string[] {
  if (season.pointsBesideMap.length === 0) return [];
  const title = heading(words.headings.points(nameOf(season, words)));
  return [title, pointsTable(season.pointsBesideMap, words), wrapped(words.pointsNote)];
}

function binSection(season: SeasonEntry, words: SeasonWords): string[] {
  return [heading(words.headings.bins(nameOf(season, words))), binTable(season, words), wrapped(words.binsNote)];
}

function percent(value: number): string {
  return `${figure(value, 0)}\u00a0%`;
}
