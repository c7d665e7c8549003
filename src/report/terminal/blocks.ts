const LYING = ['', '▏', '▎', '▍', '▌', '▋', '▊', '▉'] as const;
const STANDING = ['▁', '▂', '▃', '▄', '▅', '▆', '▇', '█'] as const;
const FULL = '█';

/**
 * A bar of block letters, to an eighth of a letter.
 *
 * @param value 0 or above; a value above 0 has a bar of an eighth at least
 * @param most the value of a whole bar, above 0
 * @param width letters of a whole bar
 * @example lyingBar(3, 4, 4) // '███'
 */
export function lyingBar(value: number, most: number, width: number): string {
  const eighths = Math.min(8 * width, Math.max(value > 0 ? 1 : 0, Math.round((8 * width * value) / most)));
  return `${FULL.repeat(eighths >> 3)}${LYING[eighths & 7]}`;
}

/** Ends of a scale. */
export interface Range {
  readonly least: number;
  readonly most: number;
}

/**
 * The lowest and the highest of some values.
 *
 * @param values finite, at least one
 * @returns both, in the unit of the values
 * @example rangeOf([3, 1, 2]).least // 1
 */
export function rangeOf(values: readonly number[]): Range {
  return { least: Math.min(...values), most: Math.max(...values) };
}

/**
 * A strip of values, as many letters each: the lowest of the range stands lowest.
 *
 * @param values finite
 * @param width letters of each value
 * @param range holds all values; where it has no width, all stand lowest
 * @example heightStrip([0, 1, 2], 1, { least: 0, most: 2 }) // '▁▅█'
 */
export function heightStrip(values: readonly number[], width: number, { least, most }: Range): string {
  const top = STANDING.length - 1;
  const heightOf = (value: number) => (most === least ? 0 : Math.round((top * (value - least)) / (most - least)));
  return values.map((value) => STANDING[heightOf(value)].repeat(width)).join('');
}
