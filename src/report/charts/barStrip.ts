import { at, type Markup, markup } from './markup.ts';
import { type Look, surfaces } from './texture.ts';

const LENGTH = 400;
const THICKNESS = 14;

/**
 * One lying bar of a list, to scale with the others of the list; what it stands for is written beside it.
 *
 * @param value may be negative, and then lies left of the line
 * @param range least and greatest value of the list, 0 between them or at an end
 * @param look of its surface
 */
export function barStrip(value: number, [least, most]: readonly [number, number], look: Look): Markup {
  const scale = most > least ? (LENGTH - 2) / (most - least) : 0;
  const zero = 1 - least * scale;
  const end = zero + value * scale;
  const bar = { x: Math.min(zero, end), y: 1, width: Math.abs(end - zero), height: THICKNESS - 2 };
  const line = markup`<path d="M${at(zero)} 0V${THICKNESS}" class="axis"/>`;
  return markup`<svg class="strip" viewBox="0 0 ${LENGTH} ${THICKNESS}" aria-hidden="true">${surfaces([bar], look)}${line}</svg>`;
}
