import { scaleBand, scaleLinear } from 'd3-scale';
import { stack, stackOffsetDiverging } from 'd3-shape';
import { bottomAxis, leftAxis, leftRoom, ticksOf, type Written } from './axes.ts';
import { CHART_WIDTH, type ChartText, chartFrame } from './chartFrame.ts';
import type { Markup } from './markup.ts';
import { type Look, surfaces } from './texture.ts';

/** One layer of the bars. */
export interface BarSeries {
  readonly look: Look;
  /** One a bar; may be negative, and then stands below the line. */
  readonly values: readonly number[];
}

/** Bars of several layers, one bar a category. */
export interface StackedBars extends ChartText {
  /** Short names below the bars, one each; an empty one writes nothing. */
  readonly labels: readonly string[];
  readonly series: readonly BarSeries[];
  /** What is measured, with its unit. */
  readonly quantity: string;
  /** What the bars stand for, under them; may be empty. */
  readonly categories: string;
  readonly written: Written;
  /** Whether things are counted, so that no tick stands between whole numbers. */
  readonly whole?: boolean;
}

const HEIGHT = 210;
/** Ticks that are wished for. */
const TICKS = 5;
const MARGINS = { right: 6, top: 20, bottom: 32 };

/**
 * Stacked bars: the first series stands on the line, each further one on those before it.
 *
 * @returns the drawing; bars without a value are left out
 *
 * Reference: d3-shape, stack with diverging offset: negative values are stacked below the line.
 */
export function stackedBars(chart: StackedBars): Markup {
  const { labels, series, quantity, categories, written, whole = false } = chart;
  const layers = stack<number, number>()
    .keys(series.map((_, i) => i))
    .value((bar, key) => series[key].values[bar])
    .offset(stackOffsetDiverging)(labels.map((_, bar) => bar));
  const ends = layers.flatMap((layer) => layer.flatMap(({ 0: from, 1: to }) => [from, to]));
  const least = Math.min(0, ...ends);
  const most = Math.max(0, ...ends);
  const y = scaleLinear([least, most > least ? most : least + 1], [HEIGHT - MARGINS.bottom, MARGINS.top]).nice(TICKS);
  const ticks = ticksOf(y, whole ? Math.min(TICKS, Math.max(1, most)) : TICKS, written);
  const left = leftRoom(ticks);
  const right = CHART_WIDTH - MARGINS.right;
  const x = scaleBand(
    labels.map((_, i) => i),
    [left, right],
  ).padding(0.25);
  const shapes = layers.map((layer, key) =>
    surfaces(
      layer.map(([from, to], bar) => ({
        x: x(bar) ?? 0,
        y: Math.min(y(from), y(to)),
        width: x.bandwidth(),
        height: Math.abs(y(from) - y(to)),
      })),
      series[key].look,
    ),
  );
  const across = [left, right] as const;
  const names = labels.map((label, i) => ({ place: (x(i) ?? 0) + x.bandwidth() / 2, label }));
  return chartFrame(chart, HEIGHT, [
    leftAxis(ticks, { place: left, across, title: quantity }),
    ...shapes,
    bottomAxis(
      names.filter(({ label }) => label !== ''),
      { place: least < 0 ? HEIGHT - MARGINS.bottom : y(0), across, title: categories },
    ),
  ]);
}
