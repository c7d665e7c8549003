/** Least and greatest of some numbers. */
export interface NumberRange {
  readonly least: number;
  readonly most: number;
}

/**
 * Least and greatest value of a column, what is not a number left aside.
 *
 * @returns Infinity and −Infinity where there is no number: only for comparing, never a result
 * @example rangeOf([3, Number.NaN, 1]) // { least: 1, most: 3 }
 */
export function rangeOf(values: ArrayLike<number>): NumberRange {
  let least = Number.POSITIVE_INFINITY;
  let most = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < values.length; i++) {
    const value = values[i] as number;
    if (value < least) least = value;
    if (value > most) most = value;
  }
  return { least, most };
}
