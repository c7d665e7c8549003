import type { ScaleLinear } from 'd3-scale';
import { together } from './chartFrame.ts';
import { at, type Markup, markup } from './markup.ts';

/** A place on an axis with what is written there. */
export interface Tick {
  /** In the units of the drawing. */
  readonly place: number;
  readonly label: string;
}

/** A number as the language of the page writes it. */
export type Written = (value: number, decimals: number) => string;

/**
 * Ticks of a scale at round numbers, with as many decimals as their step asks for.
 *
 * @param scale from quantity to drawing
 * @param count about so many
 */
export function ticksOf(scale: ScaleLinear<number, number>, count: number, written: Written): Tick[] {
  const values = scale.ticks(count);
  const step = values.length > 1 ? values[1] - values[0] : 1;
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + ROUNDING));
  return values.map((value) => ({ place: scale(value), label: written(value, decimals) }));
}

/** The logarithm of a step such as 0.1 may lie a rounding below its whole number. */
const ROUNDING = 1e-9;

/** Width of a digit of the labels, and what stands between them and the drawing. */
const DIGIT = 6.1;
const GAP = 8;
const LEAST_ROOM = 24;

/** Room that figures at the left need, in the units of the drawing. */
export function leftRoom(ticks: readonly Tick[]): number {
  return Math.max(LEAST_ROOM, ...ticks.map(({ label }) => label.length * DIGIT + GAP));
}

/** Where an axis stands and what it says. */
export interface AxisPlace {
  /** The axis' own place: x of a vertical one, y of a horizontal one. */
  readonly place: number;
  /** From where to where lines run across the drawing at its ticks; none where both are the same. */
  readonly across: readonly [number, number];
  /** What it measures, with its unit. */
  readonly title: string;
}

/** Figures at the left with lines across the drawing; the title stands above them. */
export function leftAxis(ticks: readonly Tick[], { place, across, title }: AxisPlace): Markup {
  const lines = ticks.map(({ place: y }) => `M${at(across[0])} ${at(y)}H${at(across[1])}`).join('');
  const labels = ticks.map(
    ({ place: y, label }) => markup`<text x="${at(place - 4)}" y="${at(y + 3.5)}" class="end">${label}</text>`,
  );
  return markup`<path d="${lines}" class="grid"/>${together(labels)}<text x="2" y="10" class="unit">${title}</text>`;
}

/** Figures below the drawing; the title stands under them at the right. */
export function bottomAxis(ticks: readonly Tick[], { place, across, title }: AxisPlace): Markup {
  const line = `M${at(across[0])} ${at(place)}H${at(across[1])}`;
  const marks = ticks.map(({ place: x }) => `M${at(x)} ${at(place)}v3`).join('');
  const labels = ticks.map(
    ({ place: x, label }) => markup`<text x="${at(x)}" y="${at(place + 13)}" class="mid">${label}</text>`,
  );
  const name = markup`<text x="${at(across[1])}" y="${at(place + 26)}" class="end unit">${title}</text>`;
  return markup`<path d="${line}${marks}" class="axis"/>${together(labels)}${title === '' ? undefined : name}`;
}
