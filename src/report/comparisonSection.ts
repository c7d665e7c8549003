import { visibleText } from '../core/problem.ts';
import { factor, figure, money } from './figures.ts';
import { type Column, heading, table, wrapped } from './layout.ts';
import type { ResultDocument } from './resultSchema.ts';
import type { Words } from './words.ts';

type WholeLife = NonNullable<ResultDocument['wholeLife']>;
type Sensitivity = NonNullable<ResultDocument['sensitivity']>;

/** Heat pump against boiler on the first tariff: break-even, whole life, other prices; nothing without a boiler. */
export function comparisonSection(document: ResultDocument, words: Words): string[] {
  const { costs, sensitivity, wholeLife, breakEven } = document;
  const [first] = costs;
  if (first === undefined || sensitivity === undefined || breakEven === undefined) return [];
  const { currency } = first;
  return [
    heading(`${words.headings.comparison(visibleText(first.tariff))}, ${currency}`),
    wrapped(wholeLife === undefined ? words.sensitivity : words.sensitivityOverLife),
    sensitivityTable(sensitivity, words),
    '',
    wrapped(breakEvenSentence(breakEven, currency, words)),
    ...(wholeLife === undefined ? [] : lifeSentences(wholeLife, currency, words).map((text) => wrapped(text))),
  ];
}

function breakEvenSentence(
  breakEven: NonNullable<ResultDocument['breakEven']>,
  currency: string,
  words: Words,
): string {
  const { electricityPrice: price, meanElectricityPrice: now, seasonalFactor, heatOverElectricity } = breakEven;
  if (price === 'not even free') return words.notEvenFree;
  if (price === 'no electricity' || now === 'no electricity') return words.noElectricity;
  const perKWh = (value: number) => `${figure(value, 3)} ${currency}/kWh`;
  const begin = words.breakEvenPrice({ price: perKWh(price), now: perKWh(now) });
  if (typeof seasonalFactor !== 'number' || typeof heatOverElectricity !== 'number')
    return `${begin}${words.noBreakEvenFactor}`;
  return begin + words.breakEvenFactor({ factor: factor(seasonalFactor), now: factor(heatOverElectricity) });
}

function lifeSentences(life: WholeLife, currency: string, words: Words): string[] {
  const years = figure(life.years.length, 0);
  const { simplePayback: simple, discountedPayback: discounted } = life;
  return [
    words.wholeLife({
      years,
      rate: `${figure(100 * life.discountRate, 1)}\u00a0%`,
      capital: money(life.netCapital, currency),
      value: money(life.netPresentValue, currency),
    }),
    words.payback({
      simple: simple === 'never' ? words.paybackNever.simple : paybackWords(simple, words, life.years.length),
      discounted:
        discounted === 'never'
          ? words.paybackNever.discounted(years)
          : paybackWords(discounted, words, life.years.length),
    }),
  ];
}

/** @param life years that are looked at */
function paybackWords(payback: number | 'at once', words: Words, life: number): string {
  if (payback === 'at once') return words.paybackAtOnce;
  return words.paybackYears(figure(payback, 1)) + (payback > life ? words.paybackBeyondLife : '');
}

/** Rows of electricity prices, columns of fuel prices. */
function sensitivityTable(rows: Sensitivity, words: Words): string {
  const changes = [...new Set(rows.map(({ electricityChange }) => electricityChange))];
  const names: Column = {
    heading: '',
    figures: false,
    cells: changes.map((change) => words.electricityAt(changeWords(change, words))),
  };
  const columns = changes.map((change) => ({
    heading: words.fuelAt(changeWords(change, words)),
    figures: true,
    cells: rows.filter(({ fuelChange }) => fuelChange === change).map(cellOf),
  }));
  return table([names, ...columns]);
}

function cellOf({ annualSaving, netPresentValue }: Sensitivity[number]): string {
  const saved = figure(annualSaving, 0);
  return netPresentValue === undefined ? saved : `${saved} / ${figure(netPresentValue, 0)}`;
}

function changeWords(change: number, words: Words): string {
  return change === 0 ? words.asNow : `${change > 0 ? '+' : ''}${figure(100 * change, 0)}\u00a0%`;
}
