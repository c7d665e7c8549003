import { type Carpet, carpet } from '../charts/carpet.ts';
import type { Markup } from '../charts/markup.ts';
import { chartFigure } from './chartFigure.ts';
import { figureColumns } from './dataTable.ts';
import { shortName } from './named.ts';
import type { ReportInput } from './reportInput.ts';

const HOURS = 24;
/** Share of the hours that lie beyond each end of a ramp, so that a few odd hours do not flatten all others. */
const BEYOND = 0.002;

/**
 * Hours of the year as pictures: electricity, outdoor temperature, and the price of the first tariff whose price is not
 * the same in all hours.
 */
export function yearCarpets(input: ReportInput): Markup[] {
  const { answer, document, words } = input;
  const { carpets: said } = words;
  const { plan, columns, loaded } = answer;
  const varying = loaded.tariffs.find(({ prepared }) => prepared.price.some((price) => price !== prepared.price[0]));
  const list = [
    figureOf(input, {
      ...{ id: 'carpet-electricity', ramp: 'energy', title: said.electricity, quantity: 'kWh/h', decimals: 2 },
      ...{ values: columns.electricity, least: 0, says: said.electricitySays },
    }),
    figureOf(input, {
      ...{ id: 'carpet-outdoor', ramp: 'warmth', title: said.outdoor, quantity: '°C', decimals: 1 },
      ...{ values: plan.weather.temperature, says: said.outdoorSays },
    }),
  ];
  if (varying === undefined) return list;
  const quantity = `${varying.currency ?? document.currency}/kWh`;
  const price = figureOf(input, {
    ...{ id: 'carpet-price', ramp: 'price', title: said.price(shortName(varying.name)), quantity, decimals: 3 },
    ...{ values: varying.prepared.price, says: said.priceSays },
  });
  return [...list, price];
}

interface Hours extends Pick<Carpet, 'id' | 'ramp' | 'title' | 'quantity'> {
  readonly values: Float64Array;
  /** Value at the light end; that of the lowest hours where left out. */
  readonly least?: number;
  readonly decimals: number;
  readonly says: string;
}

function figureOf({ answer, words, figures }: ReportInput, hours: Hours): Markup {
  const { values, decimals, title, says } = hours;
  const written = (value: number) => figures.number(value, decimals);
  const { monthStart } = answer.plan.weather;
  const sorted = Float64Array.from(values).sort();
  const low = hours.least ?? sorted[Math.floor(BEYOND * sorted.length)];
  const high = sorted[Math.ceil((1 - BEYOND) * sorted.length) - 1];
  return chartFigure({
    title,
    chart: carpet({
      ...hours,
      description: says,
      range: high > low ? [low, high] : [low - 0.5, low + 0.5],
      months: words.monthLetters.map((label, month) => ({ day: monthStart[month] / HOURS, label })),
      written: figures.number,
    }),
    legend: [],
    says,
    table: {
      caption: words.carpets.caption(title),
      columns: figureColumns(words.carpets.hour, words.monthsShort),
      rows: Array.from({ length: HOURS }, (_, hour) => [
        `${String(hour).padStart(2, '0')}:00`,
        ...meansByMonth(values, monthStart, hour).map(written),
      ]),
    },
    figures: words.figures,
  });
}

/** Mean of an hour of the day over the days of each month. */
function meansByMonth(values: Float64Array, monthStart: Int32Array, hour: number): number[] {
  return Array.from({ length: 12 }, (_, month) => {
    let sum = 0;
    let days = 0;
    for (let i = monthStart[month] + hour; i < monthStart[month + 1]; i += HOURS) {
      sum += values[i];
      days++;
    }
    return sum / days;
  });
}
