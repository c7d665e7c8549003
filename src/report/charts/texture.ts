import { together } from './chartFrame.ts';
import { at, type Markup, markup } from './markup.ts';

/** A rectangle in the units of the drawing. */
export interface Rectangle {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** How a surface is told from its neighbours without colour. */
export type Texture = 'plain' | 'rising' | 'falling' | 'level' | 'outline';

/** A kind of surface or line: its colour by number, and its texture. */
export interface Look {
  /** 1 … 6, as in `chartStyle`. */
  readonly tone: number;
  readonly texture: Texture;
}

const SPACING = 5;

/** Rectangles of one look: one shape, and the strokes of its texture over it. */
export function surfaces(rectangles: readonly Rectangle[], { tone, texture }: Look): Markup {
  const seen = rectangles.filter(({ width, height }) => width > 0 && height > 0.05);
  if (seen.length === 0) return together([]);
  const shape = seen
    .map(({ x, y, width, height }) => `M${at(x)} ${at(y)}h${at(width)}v${at(height)}h${at(-width)}z`)
    .join('');
  if (texture === 'outline') return markup`<path d="${shape}" class="outline t${tone}"/>`;
  const strokes = seen.map((rectangle) => strokesOf(rectangle, texture)).join('');
  const over = strokes === '' ? undefined : markup`<path d="${strokes}" class="texture"/>`;
  return markup`<path d="${shape}" class="fill t${tone}"/>${over}`;
}

/**
 * Strokes of a texture, cut at the edges of a rectangle, as the data of a path. They are drawn, and not a pattern of the
 * page, so that the drawing needs no reference to anything.
 *
 * @example strokesOf({ x: 0, y: 0, width: 10, height: 4 }, 'level') // 'M0 2.5h10'
 */
export function strokesOf(rectangle: Rectangle, texture: Texture): string {
  if (texture === 'level') return levels(rectangle);
  if (texture === 'rising' || texture === 'falling') return diagonals(rectangle, texture === 'rising');
  return '';
}

function levels({ x, y, width, height }: Rectangle): string {
  let path = '';
  for (let down = SPACING / 2; down < height; down += SPACING) path += `M${at(x)} ${at(y + down)}h${at(width)}`;
  return path;
}

/** Lines at 45°: on each, the distance along the diagonal axis is constant, and both ends lie on the edges. */
function diagonals({ x, y, width, height }: Rectangle, rising: boolean): string {
  let path = '';
  for (let along = SPACING / 2; along < width + height; along += SPACING) {
    const left = Math.max(0, along - height);
    const right = Math.min(width, along);
    const downAt = (across: number) => (rising ? along - across : height - (along - across));
    path += `M${at(x + left)} ${at(y + downAt(left))}L${at(x + right)} ${at(y + downAt(right))}`;
  }
  return path;
}

/** A small sample of a look for a legend. */
export function sample(look: Look): Markup {
  const mark = surfaces([{ x: 1, y: 1, width: 16, height: 10 }], look);
  return markup`<svg class="sample" viewBox="0 0 18 12" aria-hidden="true">${mark}</svg>`;
}

/** A small sample of a line for a legend. */
export function lineSample(line: number): Markup {
  return markup`<svg class="sample" viewBox="0 0 18 12" aria-hidden="true"><path d="M0 6H18" class="line l${line}"/></svg>`;
}
