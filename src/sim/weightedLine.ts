import { compensatedSum } from '../core/sum.ts';

/** Points with weights: three columns of equal length, weights above 0. */
export interface WeightedPoints {
  readonly x: ArrayLike<number>;
  readonly y: ArrayLike<number>;
  readonly weight: ArrayLike<number>;
}

/** The line y = intercept + slope·x of least weighted squares. */
export interface WeightedLine {
  readonly intercept: number;
  readonly slope: number;
  /** Σ w·(x − x̄)². */
  readonly spread: number;
  /** Σ w·(y − line)². */
  readonly residualSum: number;
  /** Σ w·(y − ȳ)². */
  readonly totalSum: number;
  readonly meanX: number;
  readonly meanY: number;
}

/** Spreads below this share of Σ w·x² are noise of rounding: the x are all alike. */
const LEAST_SPREAD = 1e-20;

/**
 * The line of least weighted squares, computed about the means so that large offsets cost no digits.
 *
 * @param points at least one; finite
 * @returns nothing where all x are alike
 * @example weightedLine({ x: [0, 1, 2], y: [1, 3, 5], weight: [1, 1, 1] })?.slope // 2
 *
 * Reference: T. F. Chan, G. H. Golub, R. J. LeVeque, The American Statistician 37 (1983) 242–247, two passes; sums after
 * Neumaier 1974.
 */
export function weightedLine({ x, y, weight }: WeightedPoints): WeightedLine | undefined {
  const over = (term: (i: number) => number) => compensatedSum(Float64Array.from(x, (_, i) => weight[i] * term(i)));
  const all = over(() => 1);
  const meanX = over((i) => x[i]) / all;
  const meanY = over((i) => y[i]) / all;
  const spread = over((i) => square(x[i] - meanX));
  if (!(spread > LEAST_SPREAD * over((i) => square(x[i])))) return undefined;
  const slope = over((i) => (x[i] - meanX) * (y[i] - meanY)) / spread;
  const residualSum = over((i) => square(y[i] - meanY - slope * (x[i] - meanX)));
  const totalSum = over((i) => square(y[i] - meanY));
  return { intercept: meanY - slope * meanX, slope, spread, residualSum, totalSum, meanX, meanY };
}

function square(x: number): number {
  return x * x;
}
