import { type ScaleLinear, scaleLinear } from 'd3-scale';
import { area, curveLinear, curveStepAfter, line } from 'd3-shape';
import { bottomAxis, leftAxis, leftRoom, type Tick, ticksOf, type Written } from './axes.ts';
import { CHART_WIDTH, type ChartText, chartFrame } from './chartFrame.ts';
import { at, type Markup, markup } from './markup.ts';

/** A line, or the surface between two lines. */
export interface LineSeries {
  /** Kind of line, 1 … 4, or of surface, 1 … 6, as in `chartStyle`. */
  readonly kind: number;
  readonly x: readonly number[];
  readonly y: readonly number[];
  /** Lower edge of a surface; a line has none. */
  readonly from?: readonly number[];
}

/** A place in the drawing that is marked and named. */
export interface Mark {
  readonly x: number;
  readonly label: string;
}

/** Lines and surfaces over a quantity that runs from left to right. */
export interface LineChart extends ChartText {
  readonly series: readonly LineSeries[];
  /** Whether a value holds until the next one. */
  readonly steps: boolean;
  readonly xRange: readonly [number, number];
  /** Places below the drawing and what is written there; round numbers where left out. */
  readonly xTicks?: readonly { readonly at: number; readonly label: string }[];
  readonly xTitle: string;
  readonly yTitle: string;
  readonly marks: readonly Mark[];
  readonly written: Written;
  readonly height?: number;
}

const HEIGHT = 210;
const MARGINS = { right: 8, top: 20, bottom: 32 };

/** A chart of lines and surfaces, the first series below the others; 0 is always on the scale. */
export function lineChart(chart: LineChart): Markup {
  const height = chart.height ?? HEIGHT;
  const values = chart.series.flatMap(({ y, from }) => [...y, ...(from ?? [])]);
  const least = values.reduce((low, value) => Math.min(low, value), 0);
  const most = values.reduce((high, value) => Math.max(high, value), 0);
  const y = scaleLinear([least, most > least ? most : least + 1], [height - MARGINS.bottom, MARGINS.top]).nice(5);
  const ticks = ticksOf(y, 5, chart.written);
  const across = [leftRoom(ticks), CHART_WIDTH - MARGINS.right] as const;
  const x = scaleLinear(chart.xRange, across);
  return chartFrame(chart, height, [
    leftAxis(ticks, { place: across[0], across, title: chart.yTitle }),
    ...chart.series.map((series) => shapeOf(series, x, y, chart.steps)),
    ...chart.marks.map(({ x: place, label }) => markOf(x(place), label, height)),
    bottomAxis(bottomTicks(chart, x), { place: height - MARGINS.bottom, across, title: chart.xTitle }),
  ]);
}

function bottomTicks({ xTicks, written }: LineChart, x: ScaleLinear<number, number>): Tick[] {
  if (xTicks === undefined) return ticksOf(x, 6, written);
  return xTicks.map(({ at: value, label }) => ({ place: x(value), label }));
}

type Scale = ScaleLinear<number, number>;

function shapeOf(series: LineSeries, x: Scale, y: Scale, steps: boolean): Markup {
  const { kind, from } = series;
  const points = series.x.map((_, i) => i);
  const curve = steps ? curveStepAfter : curveLinear;
  if (from === undefined) {
    const path = line<number>(
      (i) => x(series.x[i]),
      (i) => y(series.y[i]),
    )
      .curve(curve)
      .digits(1)(points);
    return markup`<path d="${path ?? ''}" class="line l${kind}"/>`;
  }
  const surface = area<number>(
    (i) => x(series.x[i]),
    (i) => y(from[i]),
    (i) => y(series.y[i]),
  )
    .curve(curve)
    .digits(1);
  return markup`<path d="${surface(points) ?? ''}" class="fill t${kind}"/>`;
}

/** A line down the drawing with its name, which leans to the side that has room. */
function markOf(x: number, label: string, height: number): Markup {
  const leansLeft = x > CHART_WIDTH / 2;
  return markup`<path d="M${at(x)} ${MARGINS.top}V${at(height - MARGINS.bottom)}" class="mark"/><text x="${at(x + (leansLeft ? -4 : 4))}" y="${MARGINS.top + 9}" class="${leansLeft ? 'end ' : ''}said">${label}</text>`;
}
