import { type ScaleLinear, scaleLinear } from 'd3-scale';
import { bottomAxis, ticksOf, type Written } from './axes.ts';
import { CHART_WIDTH, type ChartText, chartFrame, together } from './chartFrame.ts';
import { at, type Markup, markup } from './markup.ts';

/** One spread: five quantiles under a name. */
export interface QuantileBox {
  readonly name: string;
  readonly q05: number;
  readonly q25: number;
  readonly median: number;
  readonly q75: number;
  readonly q95: number;
}

/** Spreads below one another on one scale. */
export interface QuantileBoxes extends ChartText {
  /** At least one. */
  readonly boxes: readonly QuantileBox[];
  /** What is measured, with its unit. */
  readonly quantity: string;
  readonly decimals: number;
  readonly written: Written;
}

const ROW = 34;
/** Where names begin, and room at either side for half of a figure below the axis. */
const LEFT = 6;
const SIDE = 22;
const BOTTOM = 32;
/** Within a row: line of the text, middle of the box, and half its height. */
const TEXT = 12;
const MIDDLE = 22;
const HALF = 5;

/**
 * Spreads as lying boxes: a line from 5 to 95 %, a box from 25 to 75 %, a stroke at the median, whose figure stands at the
 * right. Nothing rests on colour.
 */
export function quantileBoxes(chart: QuantileBoxes): Markup {
  const { boxes, decimals, quantity, written } = chart;
  const least = Math.min(...boxes.map(({ q05 }) => q05));
  const most = Math.max(...boxes.map(({ q95 }) => q95));
  const right = CHART_WIDTH - SIDE;
  const x = scaleLinear([least, most > least ? most : least + 1], [SIDE, right]).nice(5);
  const foot = boxes.length * ROW;
  const ticks = ticksOf(x, 5, written);
  const grid = ticks.map(({ place }) => `M${at(place)} 0V${at(foot)}`).join('');
  const rows = boxes.map((box, i) => {
    const y = i * ROW;
    const name = markup`<text x="${LEFT}" y="${at(y + TEXT)}" class="said">${box.name}</text>`;
    const median = markup`<text x="${at(right)}" y="${at(y + TEXT)}" class="end unit">${written(box.median, decimals)}</text>`;
    return markup`${boxOf(box, x, y + MIDDLE)}${name}${median}`;
  });
  return chartFrame(chart, foot + BOTTOM, [
    markup`<path d="${grid}" class="grid"/>`,
    together(rows),
    bottomAxis(ticks, { place: foot, across: [LEFT, right], title: quantity }),
  ]);
}

function boxOf({ q05, q25, median, q75, q95 }: QuantileBox, x: ScaleLinear<number, number>, middle: number): Markup {
  const ends = [q05, q95].map((value) => `M${at(x(value))} ${at(middle - 3)}v6`).join('');
  const line = `M${at(x(q05))} ${at(middle)}H${at(x(q95))}`;
  const box = `M${at(x(q25))} ${at(middle - HALF)}H${at(x(q75))}v${2 * HALF}H${at(x(q25))}z`;
  return markup`<path d="${line}${ends}" class="axis"/><path d="${box}" class="box"/><path d="M${at(x(median))} ${at(middle - HALF - 1)}v${2 * HALF + 2}" class="median"/>`;
}
