import { quantileSorted } from 'simple-statistics';

/** How the values of a figure are spread, in five places. */
export interface FiveQuantiles {
  readonly count: number;
  readonly q05: number;
  readonly q25: number;
  readonly median: number;
  readonly q75: number;
  readonly q95: number;
}

/**
 * Count and five quantiles of values.
 *
 * @param values any numbers; those that are NaN are left out
 * @returns undefined where there is no value
 * @example fiveQuantiles(Float64Array.of(1, 2, 3, 4))?.q25 // 1.75
 *
 * Reference: Hyndman and Fan 1996, Sample quantiles in statistical packages, The American Statistician 50(4), 361–365,
 * type 7: the quantile p of n sorted values stands at the place (n − 1)·p, counted from 0, by linear interpolation.
 */
export function fiveQuantiles(values: Float64Array): FiveQuantiles | undefined {
  const sorted = Array.from(values.filter((value) => !Number.isNaN(value)).sort());
  if (sorted.length === 0) return undefined;
  const at = (share: number) => quantileSorted(sorted, share);
  return { count: sorted.length, q05: at(0.05), q25: at(0.25), median: at(0.5), q75: at(0.75), q95: at(0.95) };
}
