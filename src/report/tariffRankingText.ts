import { visibleText } from '../core/problem.ts';
import { assumptionSection, inputSection, warningSection } from './answerText.ts';
import { figure, kWh, money } from './figures.ts';
import { heading, table, wrapped } from './layout.ts';
import type { TariffRankingDocument } from './tariffRankingSchema.ts';
import { englishTariffRanking, type TariffRankingWords } from './tariffRankingWords.ts';
import { english, type Words } from './words.ts';

type Ranking = TariffRankingDocument['rankings'][number];
type Ranked = Ranking['tariffs'][number];

/** Words of the ranking and of what it shares with other reports. */
interface InWords {
  readonly words: Words;
  readonly own: TariffRankingWords;
}

/**
 * A ranking of tariffs as a person reads it: the cheapest, the tariffs in their order with what they save and their dearest
 * week, the price at which the cheapest two change places, and the kWh in each rate.
 *
 * @returns lines of at most 80 columns where the names in them allow it, with a final newline
 */
export function tariffRankingText(
  document: TariffRankingDocument,
  words: Words = english,
  own: TariffRankingWords = englishTariffRanking,
): string {
  const named = namesOf(document, own);
  const sections = [
    [heading(own.title(visibleText(document.scenario))), wrapped(`${words.of}: ${visibleText(document.heatPumpUnit)}`)],
    [wrapped(answerOf(document, named, own))],
    ...document.rankings.map((ranking) => rankingSection(ranking, document, named, { words, own })),
    ratesSection(document, named, own),
    warningSection(document, words),
    assumptionSection(document, words),
    inputSection(document, words),
    [wrapped(words.cautions[0])],
  ];
  const shown = sections.filter((lines) => lines.length > 0).map((lines) => lines.join('\n'));
  return `${shown.join('\n\n')}\n`;
}

/** Name of each tariff by its file, with that file where two bear one name. */
type Names = (tariff: Pick<Ranked, 'tariff' | 'file'>) => string;

function namesOf({ rankings }: TariffRankingDocument, own: TariffRankingWords): Names {
  const all = rankings.flatMap(({ tariffs }) => tariffs.map(({ tariff }) => tariff));
  return ({ tariff, file }) => {
    const twice = all.indexOf(tariff) !== all.lastIndexOf(tariff);
    return visibleText(twice ? own.withFile({ tariff, file }) : tariff);
  };
}

function answerOf(document: TariffRankingDocument, named: Names, own: TariffRankingWords): string {
  const { currency, householdElectricity, heatingElectricity, rankings } = document;
  const [cheapest] = rankings[0].tariffs;
  const present = rankings[0].tariffs.find((ranked) => ranked.present) ?? cheapest;
  const said = { tariff: named(cheapest), total: money(cheapest.total, currency) };
  const saving = typeof cheapest.saving === 'number' ? cheapest.saving : 0;
  const all = rankings.flatMap(({ tariffs }) => tariffs);
  return [
    present.rank === 1
      ? own.presentIsCheapest({ tariff: named(present), total: money(present.total, currency) })
      : own.cheapest({ ...said, saving: money(saving, currency), present: named(present) }),
    own.onBill({
      all: kWh(householdElectricity + heatingElectricity),
      heating: kWh(heatingElectricity),
      household: kWh(householdElectricity),
    }),
    ...(all.some(({ kWh: other }) => Math.abs(other - present.kWh) > 0.5) ? [own.ownRuns] : []),
    ...(all.some(({ fuel }) => fuel !== 0) ? [own.withFuel] : []),
    ...(rankings.length > 1 ? [own.notAlike] : []),
  ].join(' ');
}

function rankingSection(
  { tariffs, changesOfPlace, taxesStated }: Ranking,
  { currency }: TariffRankingDocument,
  named: Names,
  { words, own }: InWords,
): string[] {
  const { columns } = own;
  const column = (title: string, of: (ranked: Ranked) => string, figures = true) => ({
    heading: title,
    figures,
    cells: tariffs.map(of),
  });
  const shown = table([
    column(columns.tariff, (ranked) => (ranked.present ? own.presentMark(named(ranked)) : named(ranked)), false),
    column(columns.total, ({ total }) => figure(total, 0)),
    column(columns.saving, ({ saving }) => (typeof saving === 'number' ? figure(saving, 0) : '–')),
    column(columns.week, ({ dearestWeek }) => weekWords(dearestWeek, { words, own })),
    column(columns.weekKWh, ({ dearestWeek }) => figure(dearestWeek.kWh, 0)),
    column(columns.weekCost, ({ dearestWeek: { cost } }) => figure(cost, 0)),
  ]);
  const [first] = changesOfPlace;
  const change = first === undefined ? [] : [wrapped(changeSentence(first, tariffs, { currency, named, own }))];
  return [heading(`${own.headings[taxesStated]}, ${currency}`), shown, wrapped(own.weekNote), ...change];
}

/** `13–19 January`, or `27 January – 2 February`. */
function weekWords({ from, to }: Ranked['dearestWeek'], { words, own }: InWords): string {
  const [first, last] = [from, to].map((date) => {
    const [, month, day] = date.split('-').map(Number);
    return { day: figure(day, 0), month: words.months[month - 1] };
  });
  if (first.month !== last.month) return own.days({ from: own.date(first), to: own.date(last) });
  return own.date({ day: own.daysOfMonth({ from: first.day, to: last.day }), month: last.month });
}

function changeSentence(
  { change, meanPrice, priceAtEquality, difference }: Ranking['changesOfPlace'][number],
  [one, other]: Ranking['tariffs'],
  { currency, named, own }: { currency: string; named: Names; own: TariffRankingWords },
): string {
  const names = { cheaper: named(one), dearer: named(other) };
  if (difference === 0) return own.equal(names);
  if (typeof change === 'string' || meanPrice === undefined || priceAtEquality === undefined) {
    return own.noChangeOfPlaces(names);
  }
  const perKWh = (value: number) => `${figure(value, 4)} ${currency}/kWh`;
  const share = `${figure(100 * change, 1)}\u00a0%`;
  return own.changeOfPlaces({ ...names, change: share, now: perKWh(meanPrice), equal: perKWh(priceAtEquality) });
}

function ratesSection({ rankings }: TariffRankingDocument, named: Names, own: TariffRankingWords): string[] {
  const lines = rankings.flatMap(({ tariffs }) =>
    tariffs.map((ranked) => {
      const rates = Object.entries(ranked.byRate).map(([rate, sums]) =>
        own.rate({ rate: visibleText(rate), kWh: kWh(sums.kWh) }),
      );
      return wrapped(rates.join('; '), `${named(ranked)}: `, '  ');
    }),
  );
  return [heading(own.headings.rates), ...lines];
}
