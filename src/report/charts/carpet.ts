import { scaleLinear } from 'd3-scale';
import { type Tick, ticksOf, type Written } from './axes.ts';
import { base64 } from './base64.ts';
import { CHART_WIDTH, type ChartText, chartFrame, together } from './chartFrame.ts';
import { colourRamp, RAMP_STEPS, type RampName } from './colourRamp.ts';
import { indexedPng } from './indexedPng.ts';
import { at, type Markup, markup } from './markup.ts';

/** A year of hours as a picture: a column a day, the hours of the day from the bottom up. */
export interface Carpet extends ChartText {
  /** One a hour, whole days. */
  readonly values: ArrayLike<number>;
  /** Values at the ends of the ramp; what lies beyond has the colour of the end. */
  readonly range: readonly [number, number];
  readonly ramp: RampName;
  /** First day of each month, counted from 0, and its short name. */
  readonly months: readonly { readonly day: number; readonly label: string }[];
  /** What is measured, with its unit. */
  readonly quantity: string;
  readonly written: Written;
}

const LEFT = 24;
const RIGHT = 6;
const TOP = 14;
const FIELD = 96;
const HEIGHT = 152;
const SCALE_WIDTH = 130;
const HOURS = 24;

/** A year as a carpet, with the scale of its colours below it. */
export function carpet(chart: Carpet): Markup {
  const width = CHART_WIDTH - LEFT - RIGHT;
  const days = Math.floor(chart.values.length / HOURS);
  const x = scaleLinear([0, days], [LEFT, LEFT + width]);
  const field = picture(pointsOf(chart, days), days, HOURS, chart.ramp);
  return chartFrame(chart, HEIGHT, [
    imageAt(field, { x: LEFT, y: TOP, width, height: FIELD }),
    hourLabels(),
    monthLabels(chart.months.map(({ day, label }) => ({ place: x(day), label }))),
    scaleBar(chart),
  ]);
}

/** Numbers of the palette, hour 23 in the top row. */
function pointsOf({ values, range: [least, most] }: Carpet, days: number): Uint8Array {
  const points = new Uint8Array(days * HOURS);
  for (let hour = 0; hour < days * HOURS; hour++) {
    const share = most > least ? (values[hour] - least) / (most - least) : 0;
    const row = HOURS - 1 - (hour % HOURS);
    points[row * days + Math.floor(hour / HOURS)] = Math.round(Math.min(1, Math.max(0, share)) * (RAMP_STEPS - 1));
  }
  return points;
}

/** A picture as the address of its own content. */
function picture(points: Uint8Array, width: number, height: number, ramp: RampName): string {
  return `data:image/png;base64,${base64(indexedPng({ width, height, points, palette: colourRamp(ramp) }))}`;
}

function imageAt(source: string, place: { x: number; y: number; width: number; height: number }): Markup {
  const { x, y, width, height } = place;
  return markup`<image href="${source}" x="${x}" y="${y}" width="${at(width)}" height="${height}" preserveAspectRatio="none" class="pixels"/>`;
}

function hourLabels(): Markup {
  return together(
    [0, 6, 12, 18, HOURS].map(
      (hour) =>
        markup`<text x="${LEFT - 4}" y="${at(TOP + FIELD * (1 - hour / HOURS) + 3.5)}" class="end">${hour}</text>`,
    ),
  );
}

function monthLabels(ticks: readonly Tick[]): Markup {
  const bottom = TOP + FIELD;
  const lines = ticks.map(({ place }) => `M${at(place)} ${bottom}v3`).join('');
  const labels = ticks.map(({ place, label }) => markup`<text x="${at(place + 2)}" y="${bottom + 12}">${label}</text>`);
  return markup`<path d="${lines}" class="axis"/>${together(labels)}`;
}

function scaleBar({ range, ramp, quantity, written }: Carpet): Markup {
  const top = HEIGHT - 22;
  const left = CHART_WIDTH - RIGHT - SCALE_WIDTH;
  const steps = Uint8Array.from({ length: RAMP_STEPS }, (_, i) => i);
  const bar = imageAt(picture(steps, RAMP_STEPS, 1, ramp), { x: left, y: top, width: SCALE_WIDTH, height: 8 });
  const scale = scaleLinear(range, [left, left + SCALE_WIDTH]);
  const labels = ticksOf(scale, 3, written).map(
    ({ place, label }) => markup`<text x="${at(place)}" y="${top + 19}" class="mid">${label}</text>`,
  );
  return markup`${bar}${together(labels)}<text x="${left - 8}" y="${top + 8}" class="end unit">${quantity}</text>`;
}
