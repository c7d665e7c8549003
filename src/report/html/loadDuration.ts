import { together } from '../charts/chartFrame.ts';
import { lineChart, type Mark } from '../charts/lineChart.ts';
import { type Markup, markup } from '../charts/markup.ts';
import { lineSample, sample } from '../charts/texture.ts';
import { chartFigure } from './chartFigure.ts';
import { figureColumns } from './dataTable.ts';
import type { ReportInput } from './reportInput.ts';

/** Steps of a curve: enough for its shape. */
const STEPS = 120;
/** Hours after which the table has a row. */
const TABLE_HOURS = [0, 12, 24, 50, 100, 250, 500, 1000, 2000, 3000, 4000, 5000, 6000, 7000, 8000];
/** Hours around a rank over which capacity is averaged for the table. */
const TABLE_REACH = 12;
/** Kilowatts by which need may exceed capacity without counting: rounding only. */
const ROUNDING = 1e-9;
/** The hours around the crossing are drawn again where they are so small a part of all, over so many times their number. */
const SMALL_PART = 0.15;
const AROUND = 4;

/** Hours with need by falling need, with what the unit could give in them. */
export interface Duration {
  /** Falling, kW. */
  readonly need: Float64Array;
  /** Full capacity of the same hours, kW. */
  readonly capacity: Float64Array;
  /** Hours in which the need exceeds it. */
  readonly shortHours: number;
  /** Outdoor temperature of the warmest of them; absent where there is none. */
  readonly warmestShort?: number;
}

/**
 * The load-duration curve of the rooms, and the unit's capacity in the same hours.
 *
 * @param answer of one scenario
 * @returns only hours with need; empty where there is none
 */
export function durationOf({ columns: c, plan }: ReportInput['answer']): Duration {
  const hours = Array.from(c.spaceHeatNeed.keys()).filter((i) => c.spaceHeatNeed[i] > 0);
  hours.sort((a, b) => c.spaceHeatNeed[b] - c.spaceHeatNeed[a]);
  const short = hours.filter((i) => c.spaceHeatNeed[i] > c.capacity[i] + ROUNDING);
  const warmest = short.reduce((high, i) => Math.max(high, plan.weather.temperature[i]), Number.NEGATIVE_INFINITY);
  return {
    need: Float64Array.from(hours, (i) => c.spaceHeatNeed[i]),
    capacity: Float64Array.from(hours, (i) => c.capacity[i]),
    shortHours: short.length,
    ...(short.length === 0 ? {} : { warmestShort: warmest }),
  };
}

/** The curve as a figure; a sentence where the rooms need no heat. */
export function loadDuration(input: ReportInput): Markup {
  const { words, figures } = input;
  const { duration: said } = words;
  const duration = durationOf(input.answer);
  const { need, capacity, shortHours, warmestShort } = duration;
  if (need.length === 0) return markup`<p>${said.none}</p>`;
  const written = (value: number) => figures.number(value, 1);
  const temperature = warmestShort === undefined ? '' : `${written(warmestShort)} °C`;
  const says = shortHours === 0 ? said.enough : said.short({ hours: figures.number(shortHours, 0), temperature });
  const close = shortHours > 0 && shortHours < SMALL_PART * need.length;
  const part = Math.min(need.length, AROUND * shortHours);
  const rows = TABLE_HOURS.filter((hour) => hour < need.length).map((hour) => [
    figures.number(hour, 0),
    written(need[hour]),
    written(mean(capacity, Math.max(0, hour - TABLE_REACH), Math.min(need.length, hour + TABLE_REACH))),
  ]);
  return chartFigure({
    title: said.title,
    chart: together([
      curves(input, duration, { id: 'load-duration', title: said.title, description: says, hours: need.length }),
      ...(close
        ? [curves(input, duration, { id: 'load-peak', title: said.peak, description: said.peakSays, hours: part })]
        : []),
    ]),
    legend: [
      [sample({ tone: 6, texture: 'plain' }), said.need],
      [lineSample(2), said.capacity],
    ],
    says: close ? `${says} ${said.peakSays}` : says,
    table: {
      caption: said.caption,
      columns: figureColumns(said.rank, [`${said.need}, kW`, `${said.capacity}, kW`]),
      rows,
    },
    figures: words.figures,
  });
}

interface Part {
  readonly id: string;
  readonly title: string;
  readonly description: string;
  /** So many of the hours with the greatest need. */
  readonly hours: number;
}

/** Need and capacity over the hours with the greatest need. */
function curves({ words, figures }: ReportInput, { need, capacity, shortHours }: Duration, part: Part): Markup {
  const { hours } = part;
  const count = Math.min(STEPS, hours);
  const bins = Array.from({ length: count }, (_, i) => [
    Math.floor((i * hours) / count),
    Math.floor(((i + 1) * hours) / count),
  ]);
  const centres = bins.map(([from, to]) => (from + to) / 2);
  const meansOf = (values: Float64Array) => bins.map(([from, to]) => mean(values, from, to));
  const marks: Mark[] =
    shortHours === 0 || shortHours > hours ? [] : [{ x: shortHours, label: `${figures.number(shortHours, 0)} h` }];
  return lineChart({
    ...part,
    series: [
      {
        kind: 6,
        x: [0, ...centres, hours],
        y: [need[0], ...meansOf(need), need[hours - 1]],
        from: Array.from({ length: count + 2 }, () => 0),
      },
      { kind: 2, x: centres, y: meansOf(capacity) },
    ],
    ...{ steps: false, xRange: [0, hours], xTitle: words.duration.hours, yTitle: 'kW', marks },
    written: figures.number,
  });
}

function mean(values: Float64Array, from: number, to: number): number {
  return values.subarray(from, to).reduce((sum, value) => sum + value, 0) / Math.max(1, to - from);
}
