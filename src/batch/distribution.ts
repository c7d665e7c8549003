import { quantileSorted } from 'simple-statistics';
import { compensatedSum } from '../core/sum.ts';

/** How the values of a figure are spread. */
export interface Distribution {
  readonly count: number;
  readonly mean: number;
  readonly least: number;
  readonly q10: number;
  readonly q25: number;
  readonly median: number;
  readonly q75: number;
  readonly q90: number;
  readonly most: number;
}

/**
 * Count, mean and quantiles of values.
 *
 * @param values any numbers; those that are NaN are left out
 * @returns undefined where there is no value
 * @example distribution(Float64Array.of(1, 2, 3, 4))?.median // 2.5
 *
 * Reference: Hyndman and Fan 1996, Sample quantiles in statistical packages, The American Statistician 50(4), 361–365,
 * type 7: the quantile p of n sorted values stands at the place (n − 1)·p, counted from 0, by linear interpolation.
 */
export function distribution(values: Float64Array): Distribution | undefined {
  const known = values.filter((value) => !Number.isNaN(value)).sort();
  if (known.length === 0) return undefined;
  const sorted = Array.from(known);
  const at = (share: number) => quantileSorted(sorted, share);
  return {
    count: sorted.length,
    mean: compensatedSum(known) / sorted.length,
    least: sorted[0],
    q10: at(0.1),
    q25: at(0.25),
    median: at(0.5),
    q75: at(0.75),
    q90: at(0.9),
    most: sorted[sorted.length - 1],
  };
}
