import type { Written } from './axes.ts';
import { CHART_WIDTH, type ChartText, chartFrame, together } from './chartFrame.ts';
import { colourRamp, RAMP_STEPS, type RampName } from './colourRamp.ts';
import type { Colour } from './indexedPng.ts';
import { at, type Markup, markup } from './markup.ts';
import { textWidth } from './textWidth.ts';

/** A figure by two things, each cell in a colour and with its figure in it. */
export interface HeatMap extends ChartText {
  /** Names at the left, and what they are of. */
  readonly rows: readonly string[];
  readonly rowTitle: string;
  /** Names above, and what they are of; `columnRoom` says how wide each may be. */
  readonly columns: readonly string[];
  readonly columnTitle: string;
  /** Row by row; a cell without a value stays empty. */
  readonly values: readonly (number | undefined)[];
  readonly ramp: RampName;
  readonly decimals: number;
  readonly written: Written;
}

const ROW = 21;
const TOP = 44;
const BOTTOM = 6;
const RIGHT = 4;
const GAP = 8;
/** Room for names at the left, in the units of the drawing. */
const LEAST_LEFT = 40;
const MOST_LEFT = 118;

/** Widest name that may stand at the left of a row. */
export const ROW_ROOM = MOST_LEFT - GAP;

function leftOf(rows: readonly string[]): number {
  return Math.min(MOST_LEFT, Math.max(LEAST_LEFT, ...rows.map((name) => textWidth(name) + GAP)));
}

/** Width of a column of the map. */
export function columnRoom(rows: readonly string[], columns: number): number {
  return (CHART_WIDTH - RIGHT - leftOf(rows)) / columns;
}

/** Most columns that leave room for a figure of such a width, whatever the names of the rows. */
export function mostColumns(widest: string): number {
  return Math.max(1, Math.floor((CHART_WIDTH - RIGHT - MOST_LEFT) / (textWidth(widest) + 4)));
}

/** A map of figures: the colour follows the figure, and the figure is written in the cell, so that no colour is needed. */
export function heatMap(chart: HeatMap): Markup {
  const left = leftOf(chart.rows);
  const width = columnRoom(chart.rows, chart.columns.length);
  const height = TOP + chart.rows.length * ROW + BOTTOM;
  const columns = chart.columns.map(
    (name, i) => markup`<text x="${at(left + (i + 0.5) * width)}" y="${TOP - 6}" class="mid">${name}</text>`,
  );
  const rows = chart.rows.map(
    (name, i) => markup`<text x="${at(left - 6)}" y="${at(TOP + (i + 0.5) * ROW + 3.7)}" class="end">${name}</text>`,
  );
  const titles = markup`<text x="2" y="${TOP - 6}" class="unit">${chart.rowTitle}</text><text x="${CHART_WIDTH - RIGHT}" y="${TOP - 26}" class="end unit">${chart.columnTitle}</text>`;
  return chartFrame(chart, height, [titles, together(columns), together(rows), together(cellsOf(chart, left, width))]);
}

function cellsOf({ columns, values, ramp, decimals, written }: HeatMap, left: number, width: number): Markup[] {
  const colours = colourRamp(ramp);
  const known = values.filter((value) => value !== undefined);
  const least = Math.min(...known);
  const most = Math.max(...known);
  return values.map((value, i) => {
    const x = left + (i % columns.length) * width;
    const y = TOP + Math.floor(i / columns.length) * ROW;
    const shape = markup`x="${at(x + 0.6)}" y="${at(y + 0.6)}" width="${at(width - 1.2)}" height="${at(ROW - 1.2)}"`;
    const place = markup`x="${at(x + width / 2)}" y="${at(y + ROW / 2 + 3.7)}"`;
    if (value === undefined) return markup`<rect ${shape} class="grid"/><text ${place} class="mid">–</text>`;
    const share = most > least ? (value - least) / (most - least) : 0;
    const colour = colours[Math.round(share * (RAMP_STEPS - 1))];
    const ink = isDark(colour) ? 'on-dark' : 'on-light';
    return markup`<rect ${shape} fill="rgb(${colour.join()})"/><text ${place} class="mid ${ink}">${written(value, decimals)}</text>`;
  });
}

/** Luminance at which black and white stand out alike. */
const MIDDLE = 0.179;

/**
 * Whether white is read better than black on a colour.
 *
 * @example isDark([20, 24, 66]) // true
 *
 * Reference: Web Content Accessibility Guidelines 2.2, relative luminance and contrast ratio; both are alike at 0.179.
 */
export function isDark([red, green, blue]: Colour): boolean {
  return 0.2126 * linear(red) + 0.7152 * linear(green) + 0.0722 * linear(blue) < MIDDLE;
}

/** Share of the light of a channel of sRGB. */
function linear(channel: number): number {
  const share = channel / 255;
  return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
}
