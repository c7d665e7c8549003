import { type ScaleLinear, scaleLinear } from 'd3-scale';
import { bottomAxis, leftAxis, ticksOf, type Written } from './axes.ts';
import { CHART_WIDTH, type ChartText, chartFrame, type Margins, together } from './chartFrame.ts';
import { contourLines, type Field } from './contourLines.ts';
import { at, type Markup, markup } from './markup.ts';

/** Amounts by cell of a plane, with lines of one value and points over them. */
export interface DensityField extends ChartText {
  /** Cells that hold something: their south-west corner and amount. */
  readonly cells: readonly { readonly x: number; readonly y: number; readonly amount: number }[];
  readonly cellWidth: number;
  readonly cellHeight: number;
  readonly contours: Field;
  readonly levels: readonly number[];
  /** What of the plane was entered: points, and the rectangle around them. */
  readonly points: readonly (readonly [number, number])[];
  readonly xRange: readonly [number, number];
  readonly yRange: readonly [number, number];
  readonly xTitle: string;
  readonly yTitle: string;
  readonly written: Written;
}

const HEIGHT = 250;
const MARGINS: Margins = { left: 30, right: 8, top: 20, bottom: 32 };
type Scale = ScaleLinear<number, number>;

/** A plane whose cells are the darker the more they hold, with labelled lines of one value and the points entered. */
export function densityField(chart: DensityField): Markup {
  const right = CHART_WIDTH - MARGINS.right;
  const x = scaleLinear(chart.xRange, [MARGINS.left, right]);
  const y = scaleLinear(chart.yRange, [HEIGHT - MARGINS.bottom, MARGINS.top]);
  const across = [MARGINS.left, right] as const;
  return chartFrame(chart, HEIGHT, [
    leftAxis(ticksOf(y, 6, chart.written), { place: MARGINS.left, across, title: chart.yTitle }),
    together(cellsOf(chart, x, y)),
    together(chart.levels.map((level) => contour(chart, level, x, y))),
    pointsOf(chart, x, y),
    bottomAxis(ticksOf(x, 7, chart.written), { place: HEIGHT - MARGINS.bottom, across, title: chart.xTitle }),
  ]);
}

/** Shades of a cell, the most of them where the most is. */
const SHADES = 6;

function cellsOf(chart: DensityField, x: Scale, y: Scale): Markup[] {
  const most = chart.cells.reduce((high, { amount }) => Math.max(high, amount), 0);
  const paths = Array.from({ length: SHADES }, () => '');
  for (const { x: west, y: south, amount } of chart.cells) {
    const shade = Math.min(SHADES - 1, Math.floor((amount / most) * SHADES));
    const width = x(west + chart.cellWidth) - x(west);
    const height = y(south) - y(south + chart.cellHeight);
    paths[shade] += `M${at(x(west))} ${at(y(south))}h${at(width)}v${at(-height)}h${at(-width)}z`;
  }
  return paths.map((path, shade) => (path === '' ? markup`` : markup`<path d="${path}" class="shade d${shade + 1}"/>`));
}

function contour(chart: DensityField, level: number, x: Scale, y: Scale): Markup {
  const segments = contourLines(chart.contours, level);
  if (segments.length === 0) return markup``;
  const path = segments.map(([x0, y0, x1, y1]) => `M${at(x(x0))} ${at(y(y0))}L${at(x(x1))} ${at(y(y1))}`).join('');
  // The label stands where the line leaves the plane at the top, the highest end of its pieces.
  const ends = segments.flatMap(([x0, y0, x1, y1]) => [
    { x: x0, y: y0 },
    { x: x1, y: y1 },
  ]);
  const top = ends.reduce((best, end) => (end.y > best.y ? end : best));
  const place = Math.min(Math.max(x(top.x), MARGINS.left + 10), CHART_WIDTH - MARGINS.right - 8);
  return markup`<path d="${path}" class="contour"/><text x="${at(place)}" y="${at(y(top.y) + 9)}" class="mid halo">${chart.written(level, Number.isInteger(level) ? 0 : 1)}</text>`;
}

function pointsOf({ points }: DensityField, x: Scale, y: Scale): Markup {
  const dots = points.map(([px, py]) => `M${at(x(px))} ${at(y(py))}h0`).join('');
  const xs = points.map(([px]) => x(px));
  const ys = points.map(([, py]) => y(py));
  const [west, east] = [Math.min(...xs), Math.max(...xs)];
  const [north, south] = [Math.min(...ys), Math.max(...ys)];
  const edge = `M${at(west)} ${at(south)}H${at(east)}V${at(north)}H${at(west)}z`;
  return markup`<path d="${edge}" class="edge"/><path d="${dots}" class="dots"/>`;
}
