/**
 * Sum of a part of a long column: blocks of eight are added as a tree, and the blocks with Neumaier's compensation. As
 * good as compensating every value where the values of a block are of like size, at a fraction of the time.
 *
 * @param column finite values
 * @param from first index, included
 * @param to last index, excluded
 * @returns the sum in the unit of the column; 0 for an empty range
 * @example columnSum(Float64Array.of(1, 2, 3), 0, 3) // 6
 *
 * Reference: A. Neumaier, ZAMM 54 (1974) 39–51, algorithm II; N. Higham, SIAM J. Sci. Comput. 14 (1993), blocked sums.
 */
export function columnSum(column: Float64Array, from: number, to: number): number {
  let sum = 0;
  let lost = 0;
  let i = from;
  for (; i + 8 <= to; i += 8) {
    const block =
      column[i] +
      column[i + 1] +
      (column[i + 2] + column[i + 3]) +
      (column[i + 4] + column[i + 5] + (column[i + 6] + column[i + 7]));
    const next = sum + block;
    lost += Math.abs(sum) >= Math.abs(block) ? sum - next + block : block - next + sum;
    sum = next;
  }
  let rest = 0;
  for (; i < to; i++) rest += column[i];
  return sum + (lost + rest);
}
