/**
 * Sum of a column with Neumaier's compensation, so that a year's total does not depend on the order of its months.
 *
 * @param values any finite numbers
 * @param from first index, included
 * @param to last index, excluded
 * @returns the sum in the unit of the values; 0 for an empty range
 * @example compensatedSum(Float64Array.of(1, 1e100, 1, -1e100)) // 2
 *
 * Reference: A. Neumaier, ZAMM 54 (1974) 39–51, algorithm II.
 */
export function compensatedSum(values: ArrayLike<number>, from = 0, to = values.length): number {
  let sum = 0;
  let lost = 0;
  for (let i = from; i < to; i++) {
    const value = values[i] as number;
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}
